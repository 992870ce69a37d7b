package org.fallwright.ui.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.List;
import java.util.Map;
import javax.imageio.ImageIO;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.map.GroundPainter;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** What the sheet's files are and say. */
class SheetFileTest {
  private static final DemoSite DEMO =
      DemoSite.asItIs().in(Site.Display.METRIC).only("hand-winch", "A3");

  @ParameterizedTest
  @EnumSource(Paper.class)
  void onePageOfThePaperAskedFor(Paper paper) throws IOException {
    try (PDDocument doc = PrintedPage.of(paper, DEMO).open()) {
      assertThat(doc.getNumberOfPages()).isEqualTo(1);
      assertThat((double) doc.getPage(0).getMediaBox().getWidth())
          .isCloseTo(paper.width(), within(0.01));
      assertThat((double) doc.getPage(0).getMediaBox().getHeight())
          .isCloseTo(paper.height(), within(0.01));
    }
  }

  @Test
  void thePageSaysWhatTheSetupIsAndHowItStands() throws IOException {
    DemoSite demo =
        DEMO.notLooked("buried-services")
            .and(
                "/gear/sources",
                """
                {"id": "old capstan", "plugin": "capstan", "places": ["A1"], "drivers": [],
                 "driver_places": [], "parameters": {}}""");
    assertThat(PrintedPage.of(Paper.LETTER, demo).text())
        .contains("Oak behind the house")
        .contains("Setup 1 of " + demo.plan().ranked().size())
        .contains("000° true (003° magnetic)")
        .contains("open face 70°")
        .contains("rules US-OSHA")
        .contains("workable")
        .contains("5.04 kN")
        .contains("4.73 kN")
        .contains("6.36 kN")
        .contains("15.7 kN")
        .contains("1.46 = least it gives / plan for")
        .contains("Going when")
        .contains("House (people)")
        .contains("Every check is workable.")
        .contains("Not looked for: buried services")
        .contains("Source \"old capstan\" is left out: no plugin \"capstan\" is loaded.")
        .contains("Never leave a tree cut and standing.")
        .contains("Picture: drawn by the project, taken on a date not known. No survey.")
        .contains("Check bar: 100 mm");
    assertThat(PrintedPage.of(Paper.A4, DEMO.with(s -> s.putNull("picture"))).text())
        .contains("Blank ground: no picture.");
  }

  @Test
  void whatIsNotClearStandsWithItsRatioAndReason() throws IOException {
    Plan plan = DEMO.plan();
    int rank = 1;
    while (!plan.ranked().get(rank - 1).setup().redirects().equals(List.of("A2"))) {
      rank++;
    }
    String text = PrintedPage.of(Paper.A4, DEMO.site(), plan, rank).text();
    assertThat(text)
        .contains("Setup " + rank + " of " + plan.ranked().size())
        .doesNotContain("Every check is workable.");
    assertThat(plan.ranked().get(rank - 1).checks())
        .filteredOn(c -> c.verdict() == Verdict.NOT_WORKABLE)
        .extracting(Check::id)
        .contains("anchor A2 at plan", "anchor A2 at high")
        .allSatisfy(id -> assertThat(text).contains(id + " 0."));
    assertThat(text).contains("allowed.").contains("if the source stalls, slips or jerks;");
  }

  @Test
  void theUnitsAreTheSitesWithTheOthersBeside() throws IOException {
    assertThat(PrintedPage.of(Paper.LETTER, DEMO.in(Site.Display.US)).text())
        .contains("1,430 lbf")
        .contains("6.36 kN")
        .contains("planned to 8.9 mph");
  }

  @Test
  void everyVerdictStandsInItsWord() throws IOException {
    Map<Verdict, DemoSite> sites =
        Map.of(
            Verdict.WORKABLE, DEMO,
            Verdict.TIGHT, DemoSite.asItIs().only("hand-winch", "A1"),
            Verdict.NOT_WORKABLE, DemoSite.asItIs().only("crew", "HC"),
            Verdict.CANNOT_JUDGE, DEMO.voltageBlank());
    assertThat(sites).containsOnlyKeys(Verdict.values());
    for (Map.Entry<Verdict, DemoSite> e : sites.entrySet()) {
      Judged best = e.getValue().plan().ranked().get(0);
      assertThat(best.verdict()).isEqualTo(e.getKey());
      assertThat(PrintedPage.of(Paper.A4, e.getValue()).text())
          .contains(e.getKey().word())
          .contains(best.sentence());
    }
  }

  @Test
  void theSameInputGivesTheSameBytes() throws IOException {
    Site site = DEMO.site();
    Plan plan = DEMO.plan();
    GroundPainter ground =
        (g, view) -> {
          g.setColor(Color.GREEN);
          g.fill(new Rectangle2D.Double(100, 200, 50, 50));
        };
    assertThat(new SheetFile(Paper.A4, site, plan, 1, ground, null, "0").pdf())
        .isEqualTo(new SheetFile(Paper.A4, site, plan, 1, ground, null, "0").pdf());
    assertThat(new SheetFile(Paper.A4, site, plan, 1, ground, null, "0").png())
        .isEqualTo(new SheetFile(Paper.A4, site, plan, 1, ground, null, "0").png());
  }

  @Test
  void thePictureIsThePageAtItsResolution() throws IOException {
    SheetFile sheet = PrintedPage.sheet(Paper.LETTER, DEMO.site(), DEMO.plan(), 1);
    byte[] png = sheet.png();
    BufferedImage read = ImageIO.read(new ByteArrayInputStream(png));
    assertThat(read.getWidth()).isEqualTo(1700);
    assertThat(read.getHeight()).isEqualTo(2200);
    // pHYs: 200 dpi are 7874 pixels a metre, 0x1EC2
    assertThat(new String(png, java.nio.charset.StandardCharsets.ISO_8859_1))
        .contains("pHYs\0\0\u001e\u00c2\0\0\u001e\u00c2\u0001");
    BufferedImage pdf = new PrintedPage(sheet.pdf()).drawn(SheetFile.DPI);
    assertThat(differing(read, pdf)).as("share of pixels that differ much").isLessThan(0.02);
  }

  @Test
  void namesWithSignsThatNoTypefaceHasDoNotBreakThePage() throws IOException {
    DemoSite demo =
        DEMO.with(s -> s.put("name", "Eiche \uD83C\uDF33 \n hinterm Haus\u0000"))
            .and(
                "/targets",
                DemoSite.target(
                    "Tank \uD83D\uDEE2\u0007 \u202E\u05D0",
                    Target.Kind.OTHER,
                    "\"type\": \"circle\", \"centre\": [20, 18], \"radius_m\": 1"));
    SheetFile sheet = PrintedPage.sheet(Paper.A4, demo.site(), demo.plan(), 1);
    assertThat(new PrintedPage(sheet.pdf()).text())
        .contains("Eiche ?")
        .contains("hinterm Haus")
        .contains("workable");
    assertThat(sheet.png()).isNotEmpty();
  }

  private static double differing(BufferedImage a, BufferedImage b) {
    int w = Math.min(a.getWidth(), b.getWidth());
    int h = Math.min(a.getHeight(), b.getHeight());
    int n = 0;
    for (int y = 0; y < h; y++) {
      for (int x = 0; x < w; x++) {
        n += Math.abs((a.getRGB(x, y) >> 8 & 0xFF) - (b.getRGB(x, y) >> 8 & 0xFF)) > 128 ? 1 : 0;
      }
    }
    return (double) n / ((double) w * h);
  }
}
