package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import javax.imageio.ImageIO;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.fallwright.core.site.Picture;
import org.fallwright.core.store.SiteFile;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.home.Home;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class BasemapCommandTest {
  private static final Path DEMO =
      Path.of("..", "maps-cache", "basemaps", "oak-behind-the-house.mbtiles");

  /** Four corners of the plan below, 0.1 m a pixel, north up. */
  private static final String[] POINTS = {
    "--point",
    "0,0,-20,50",
    "--point",
    "800,0,60,50",
    "--point",
    "800,600,60,-10",
    "--point",
    "0,600,-20,-10"
  };

  @TempDir private Path folder;
  private Path site;
  private Path plan;
  private String before;

  private record Said(int status, String out, String err) {}

  @BeforeEach
  void prepare() throws Exception {
    before = System.setProperty("fallwright.ownmaps", folder.resolve("own").toString());
    site = folder.resolve("oak.fallsite.json");
    SiteFile.write(DemoSite.asItIs().site(), site);
    plan = folder.resolve("plan.png");
    BufferedImage image = new BufferedImage(800, 600, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(Color.WHITE);
    g.fillRect(0, 0, 800, 600);
    g.setColor(Color.BLUE);
    g.fillRect(260, 350, 210, 135);
    g.dispose();
    ImageIO.write(image, "png", plan.toFile());
  }

  @AfterEach
  void restore() {
    if (before == null) {
      System.clearProperty("fallwright.ownmaps");
    } else {
      System.setProperty("fallwright.ownmaps", before);
    }
  }

  @Test
  void aScannedPlanIsLaidByItsPointsListedCheckedLaidOverMovedAndRemoved() throws Exception {
    Said added = add("--as", "plan", "--source", "owner's plan", "--taken", "1998");
    assertThat(added.err).doesNotContain("fault");
    assertThat(added.status).isZero();
    assertThat(added.out).contains("point 4: 0.00 m off").contains("0.100 m a pixel, north ");
    assertThat(run("basemap", "list").out)
        .contains("plan.mbtiles")
        .contains("taken 1998, owner's plan")
        .contains("oak-behind-the-house.mbtiles");
    assertThat(run("basemap", "verify", "plan.mbtiles").out).contains("all whole.");

    Said over = run("basemap", "lay", site, "plan.mbtiles", "--over", "--opacity", "0.5");
    assertThat(over.out).contains("2 pictures.");
    assertThat(run("basemap", "shift", site, "--picture", "plan.mbtiles", "--east", "1.5").status)
        .isZero();
    Picture.Layer top = SiteFile.read(site).picture().over().get(0);
    assertThat(top)
        .isEqualTo(new Picture.Layer("plan.mbtiles", "1998", "owner's plan", 1.5, 0, 0.5));
    assertThat(run("basemap", "list", "--site", site).out).contains("Ready without signal: yes.");
    assertThat(run("check", site).err).isEmpty();

    assertThat(run("basemap", "remove", "plan.mbtiles").out).contains("is removed");
    assertThat(run("check", site).err).contains("Not drawn: base map plan.mbtiles was not found.");
    assertThat(run("basemap", "remove", "plan.mbtiles").status).isEqualTo(Exit.BAD_INPUT);
  }

  @Test
  void tiesMoveThePictureAndTellWhatIsLeft() throws Exception {
    Said said = run("basemap", "shift", site, "--tie", "6,2,7,4", "--tie", "27,2,30,4");
    assertThat(said.out)
        .contains("tie 1: 1.00 m off after moving")
        .contains("The ties do not agree")
        .contains("is moved 2.00 m east and 2.00 m north.");
    assertThat(SiteFile.read(site).picture().shiftEastM()).isEqualTo(2);
    Said off = run("basemap", "shift", site, "--east", "900");
    assertThat(off.status).isEqualTo(Exit.BAD_INPUT);
    assertThat(off.err).contains("shift_east_m is 900");
  }

  @Test
  void aPageOfADocumentIsLaidByALengthAndANorth() throws Exception {
    Path pdf = folder.resolve("plan.pdf");
    try (PDDocument document = new PDDocument()) {
      PDPage page = new PDPage();
      document.addPage(page);
      try (PDPageContentStream on = new PDPageContentStream(document, page)) {
        on.addRect(100, 100, 200, 300);
        on.fill();
      }
      document.save(pdf.toFile());
    }
    Said said =
        run(
            "basemap",
            "add",
            pdf,
            "--source",
            "owner",
            "--site",
            site,
            "--length",
            "100,100,300,100,20",
            "--north",
            "10",
            "--point",
            "400,400,10,20");
    assertThat(said.err).doesNotContain("fault");
    assertThat(said.status).isZero();
    assertThat(said.out).containsPattern("Page 1 is 1[67]\\d\\d x 2200 pixels\\.");
    Said none = run("basemap", "add", pdf, "--source", "owner");
    assertThat(none.err).contains("A page needs control points");
  }

  @Test
  void aTileSetIsReadInPlace() {
    Said said = run("basemap", "add", DEMO, "--as", "demo");
    assertThat(said.out).contains("demo is read in place at ").contains("zoom 16 to 21");
    assertThat(run("basemap", "list").out).contains("read in place at ");
    assertThat(run("basemap", "remove", "demo").status).isZero();
    assertThat(DEMO).exists();
  }

  @Test
  void badInputIsOneSentence() throws IOException {
    byte[] all = Files.readAllBytes(plan);
    Files.write(plan, Arrays.copyOf(all, all.length / 2));
    assertThat(add("--source", "owner").err).contains("plan.png is cut short or damaged");
    assertThat(run("basemap", "add", plan, "--source", "x").err).contains("plan.png");
    assertThat(run("basemap", "add", folder.resolve("none.png"), "--source", "x").err)
        .contains("none.png is not there");
    assertThat(run("basemap", "add", plan).err).contains("Give --source");
    assertThat(run("basemap").err).contains("needs one of its commands");
    assertThat(run("basemap", "lay", site, "nowhere").err).contains("No base map nowhere");
  }

  private Said add(String... more) {
    Object[] all =
        java.util.stream.Stream.of(
                new Object[] {"basemap", "add", plan, "--site", site},
                (Object[]) POINTS,
                (Object[]) more)
            .flatMap(Arrays::stream)
            .toArray();
    return run(all);
  }

  private Said run(Object... args) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    Home home =
        new Home(folder.resolve("plugins"), DEMO.getParent(), folder.resolve("demo"), "0.1.0");
    int status =
        Fallwright.run(
            home,
            (Path p) -> {},
            Arrays.stream(args).map(Object::toString).toArray(String[]::new),
            new PrintWriter(out),
            new PrintWriter(err));
    return new Said(status, out.toString(), err.toString());
  }
}
