package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import javax.imageio.ImageIO;
import org.fallwright.core.site.Origin;
import org.fallwright.core.site.Position;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.home.Home;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The command that says where else a source could stand. */
class StandCommandTest {
  @TempDir private Path folder;

  private Path site;

  private record Said(int status, String out, String err) {}

  @BeforeEach
  void writeSite() throws IOException {
    site = folder.resolve("oak.fallsite.json");
    DemoSite direct =
        DemoSite.asItIs()
            .only("pickup", "V1")
            .lays(90, 7)
            .with(s -> ((ObjectNode) s.get("offer")).put("redirects", 0));
    Files.write(site, direct.bytes());
  }

  @Test
  void theGroundIsSummedUpAndAddsUpToTheSquare() {
    Said said = run("stand", site.toString(), "--setup", "1", "--lay", "7");
    assertThat(said.err).isEmpty();
    assertThat(said.status).isZero();
    assertThat(said.out)
        .contains("pickup on lay 7.0")
        .contains("pull margin 1.25 or more:")
        .contains("the tree can come to lie there:")
        .contains("greatest margin ")
        .contains("Only the pull margin is in this figure.");
    double square = 0;
    for (String line : said.out.lines().filter(l -> l.endsWith(" ft²")).toList()) {
      square += Double.parseDouble(line.replaceAll(".*: ([0-9,]+) ft²", "$1").replace(",", ""));
    }
    assertThat(square).isCloseTo(201 * 201 / 0.3048 / 0.3048, within(2500.0));
  }

  @Test
  void gridLinesAndPictureAreWritten() throws IOException {
    Path asc = folder.resolve("m.asc");
    Path lines = folder.resolve("m.geojson");
    Path png = folder.resolve("m.png");
    for (Path out : List.of(asc, lines, png)) {
      Said said =
          run("stand", site.toString(), "--setup", "1", "--lay", "7", "--out", out.toString());
      assertThat(said.err).isEmpty();
      assertThat(said.status).isZero();
    }
    List<String> grid = Files.readAllLines(asc);
    assertThat(grid).hasSize(6 + 201);
    assertThat(grid.get(0)).isEqualTo("ncols 201");
    // V1 stands at 21.5 E, 66 N; its own margin is that of row 4
    String[] row = grid.get(6 + 200 - (66 + 76)).split(" ");
    assertThat(Double.parseDouble(row[22 + 84])).isCloseTo(1.33, within(0.01));

    JsonNode root = new ObjectMapper().readTree(lines.toFile());
    SiteFrame frame = new SiteFrame(new Origin(45, -40));
    Set<Double> levels = new HashSet<>();
    for (JsonNode f : root.get("features")) {
      levels.add(f.at("/properties/pull_margin").asDouble());
      JsonNode first = f.at("/geometry/coordinates/0");
      Position p = frame.toPlane(first.get(1).asDouble(), first.get(0).asDouble());
      assertThat(p.distanceTo(new Position(16, 24))).isLessThan(142);
    }
    assertThat(levels).contains(0.5, 1.0, 1.25);

    BufferedImage image = ImageIO.read(png.toFile());
    Set<Integer> colours = new HashSet<>();
    for (int x = 0; x < image.getWidth(); x += 5) {
      for (int y = 0; y < image.getHeight(); y += 5) {
        colours.add(image.getRGB(x, y));
      }
    }
    assertThat(colours).hasSizeGreaterThan(50);
  }

  @Test
  void whatCannotBeIsOneSentence() {
    assertThat(run("stand", site.toString(), "--setup", "9").err)
        .isEqualToIgnoringNewLines("--setup is 9; this plan has setups 1 to 2.");
    assertThat(run("stand", site.toString(), "--setup", "1", "--cell", "0.01").err)
        .isEqualToIgnoringNewLines("--cell is 0.01; it must be from 0.25 to 10 m.");
    assertThat(run("stand", site.toString(), "--setup", "1", "--lay", "400").err)
        .isEqualToIgnoringNewLines("--lay is 400.0; it must be from 0 to 360 degrees.");
    Said said = run("stand", site.toString(), "--setup", "1", "--out", "m.gif");
    assertThat(said.status).isEqualTo(2);
    assertThat(said.err)
        .isEqualToIgnoringNewLines("--out is m.gif; its name must end in .png, .asc or .geojson.");
  }

  private static Said run(String... args) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int status = Fallwright.run(home(), s -> {}, args, new PrintWriter(out), new PrintWriter(err));
    return new Said(status, out.toString(), err.toString());
  }

  private static Home home() {
    return Home.found();
  }
}
