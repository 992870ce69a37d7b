package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.SiteFile;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.home.Home;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The kit, load-out and plan-without commands on the demo site with one source and few lays. */
class KitCommandTest {
  private static final Path KIT = Path.of("demo", "two-trucks.fallkit.json");

  @TempDir private Path folder;
  private Path site;
  private Path kit;

  private record Said(int status, String out, String err) {}

  @BeforeEach
  void writeFiles() throws IOException {
    site = folder.resolve("oak.fallsite.json");
    SiteFile.write(DemoSite.asItIs().only("hand-winch", "A3").site(), site);
    kit = Files.copy(KIT, folder.resolve("two-trucks.fallkit.json"));
  }

  private static Said run(Object... args) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int status =
        Fallwright.run(
            Home.found(),
            p -> {},
            List.of(args).stream().map(Object::toString).toArray(String[]::new),
            new PrintWriter(out),
            new PrintWriter(err));
    return new Said(status, out.toString(), err.toString());
  }

  @Test
  void theKitIsListedByTruckInBothUnits() {
    Said said = run("kit", kit);
    assertThat(said.status()).isZero();
    assertThat(said.out())
        .contains("Truck 2, chipper truck", "1 × L1, hmpe 12 mm, pull line, 80.0 m")
        .contains("2 × Shackles", "A. F.: feller, first aid, 82 kg, 1.75 m");
    assertThat(run("kit", kit, "--units", "us").out()).contains("262 ft", "26,900 lbf");
  }

  @Test
  void thingsAreCopiedIntoASiteOrRefused() throws IOException {
    Site bare =
        SiteFile.read(site)
            .withGear(
                new Gear(List.of(), List.of(), List.of(), List.of(), null, List.of()),
                null,
                List.of());
    SiteFile.write(bare, site);
    Said said = run("kit", kit, "--into", site, "--only", "L2,pickup", "--at", "V1");
    assertThat(said.status()).as(said.err()).isZero();
    assertThat(said.out()).contains("2 things copied from the kit, L2, pickup.");
    assertThat(SiteFile.read(site).source("pickup").orElseThrow().places()).containsExactly("V1");
    byte[] before = Files.readAllBytes(site);
    Said again = run("kit", kit, "--into", site, "--only", "L2");
    assertThat(again.status()).isEqualTo(Exit.BAD_INPUT);
    assertThat(again.err().strip())
        .isEqualTo(
            "\"L2\" is in the site's gear already; name what else to take, or give one of the two"
                + " another name.");
    assertThat(Files.readAllBytes(site)).isEqualTo(before);
    assertThat(run("kit", kit, "--only", "L2").err()).contains("--only and --at go with --into.");
    assertThat(run("kit", site).err().strip())
        .isEqualTo("oak.fallsite.json is a site file, not a kit file.");
  }

  @Test
  void whereSiteAndKitDifferIsSaid() throws IOException {
    assertThat(run("kit", kit, "--against", site).out().strip())
        .isEqualTo("The site's gear is as the kit has it.");
    Files.writeString(
        site, Files.readString(site).replace("\"length_m\": 45.0", "\"length_m\": 44.0"));
    Said said = run("kit", kit, "--against", site);
    assertThat(said.status()).isZero();
    assertThat(said.out().strip())
        .isEqualTo("L2: length is 144 ft on the site and 148 ft in the kit.");
  }

  @Test
  void aPlanWithoutAThingLeavesTheFileAsItIs() throws IOException {
    byte[] before = Files.readAllBytes(site);
    Said said = run("plan", site, "--without", "L1,LC1");
    assertThat(said.status()).isZero();
    assertThat(said.out())
        .contains("Left behind and not counted on: L1 (Truck 2), LC1 (Truck 1).", "line L2");
    assertThat(Files.readAllBytes(site)).isEqualTo(before);
    Said unknown = run("plan", site, "--without", "L9");
    assertThat(unknown.status()).isEqualTo(Exit.BAD_INPUT);
    assertThat(unknown.err()).startsWith("--without names \"L9\"; the gear holds L1, L2, L3");
  }

  @Test
  void theLoadOutIsWrittenAsTextAndOnPaper() throws IOException {
    Said text = run("loadout", site, "--setup", 1);
    assertThat(text.status()).isZero();
    assertThat(text.out())
        .startsWith("# Load-out: Oak behind the house")
        .contains("- [ ] 2 × Slings, round sling for an anchor, rated 6,740 lbf, shelf left 2");
    Path md = folder.resolve("list.md");
    assertThat(run("loadout", site, "--setup", 1, "--out", md).out()).contains("6 things to load");
    assertThat(md).hasContent(text.out());
    Path pdf = folder.resolve("list.pdf");
    assertThat(run("loadout", site, "--out", pdf, "--paper", "a4").status()).isZero();
    byte[] first = Files.readAllBytes(pdf);
    assertThat(run("loadout", site, "--out", pdf, "--paper", "a4").status()).isZero();
    assertThat(Files.readAllBytes(pdf)).isEqualTo(first);
    try (PDDocument doc = Loader.loadPDF(first)) {
      assertThat(new PDFTextStripper().getText(doc))
          .contains("Truck 1", "Needed", "Spare, may stay", "hand-winch", "seen 2025-03-14")
          .doesNotContain("safe");
    }
  }

  @Test
  void whatCannotBeListedIsRefused() throws IOException {
    assertThat(run("loadout", site, "--setup", 99).err()).contains("this plan has setups 1 to ");
    assertThat(run("loadout", site, "--out", "x.doc").err())
        .contains("its name must end in .md, .txt or .pdf.");
    assertThat(run("loadout", site, "--kit", folder.resolve("no.json")).err())
        .contains("no.json cannot be read");
    Files.writeString(kit, "{}");
    assertThat(run("loadout", site, "--setup", 1).err())
        .contains("two-trucks.fallkit.json: version is missing");
    Files.delete(kit);
    assertThat(run("loadout", site, "--setup", 1).out()).contains("No kit file is at hand");
  }
}
