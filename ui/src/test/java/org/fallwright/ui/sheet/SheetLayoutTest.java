package org.fallwright.ui.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ArrayNode;
import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.PartLoad;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.fallwright.ui.demo.DemoSite;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The sheet as a drawing: true to size and scale, legible, nothing over anything else. */
class SheetLayoutTest {
  private static final DemoSite DEMO =
      DemoSite.asItIs().in(Site.Display.METRIC).only("hand-winch", "A3");

  @Test
  void paperSizesAreThoseOfTheStandards() {
    // ISO 216: 210 mm x 297 mm; letter: 8.5 in x 11 in
    assertThat(Paper.A4.width() / 72 * 25.4).isCloseTo(210, within(1e-9));
    assertThat(Paper.A4.height() / 72 * 25.4).isCloseTo(297, within(1e-9));
    assertThat(Paper.LETTER.width() / 72).isEqualTo(8.5);
    assertThat(Paper.LETTER.height() / 72).isEqualTo(11);
    assertThat(Paper.points(25.4)).isCloseTo(72, within(1e-9));
  }

  @ParameterizedTest
  @EnumSource(Paper.class)
  void theCheckBarMeasuresAHundredMillimetres(Paper paper) throws IOException {
    PrintedPage printed = PrintedPage.of(paper, DEMO);
    BufferedImage page = printed.drawn();
    double label =
        PrintedPage.row(
            printed.words().stream()
                .filter(w -> w.text().startsWith("Check bar"))
                .findFirst()
                .orElseThrow()
                .box()
                .getMinY());
    double mm = 0;
    for (int y = (int) (label - PrintedPage.row(0.15 * 72)); y < label; y++) {
      mm = Math.max(mm, PrintedPage.millimetres(run(page, y, page.getWidth() * 6 / 10)));
    }
    assertThat(mm).isCloseTo(100, within(0.3));
  }

  @Test
  void aDistanceOnTheGroundMeasuresAsTheScaleSays() throws IOException {
    DemoSite twoWires =
        DEMO.with(s -> ((ArrayNode) s.get("wires")).removeAll())
            .and("/wires", wire(0))
            .and("/wires", wire(30));
    PrintedPage printed = PrintedPage.of(Paper.A4, twoWires);
    Matcher scale = Pattern.compile("Scale 1:(\\d+)").matcher(printed.text());
    assertThat(scale.find()).isTrue();
    BufferedImage page = printed.drawn();
    int[] columns = new int[page.getWidth()];
    for (int x = 0; x < page.getWidth(); x++) {
      for (int y = 0; y < page.getHeight(); y++) {
        columns[x] += PrintedPage.near(page.getRGB(x, y), new Color(0x5A2391)) ? 1 : 0;
      }
    }
    double west = peak(columns, 0, page.getWidth() / 3);
    double east = peak(columns, page.getWidth() / 3, page.getWidth());
    double wanted = 30_000.0 / Integer.parseInt(scale.group(1));
    assertThat(PrintedPage.millimetres(east - west)).isCloseTo(wanted, within(0.3));
  }

  @Test
  void thePageIsLegibleWithoutColour() throws IOException {
    BufferedImage page = PrintedPage.of(Paper.A4, DEMO).drawn();
    // what is drawn in colour is dark enough to stand out in grey as well
    int pale = 0;
    int coloured = 0;
    for (int y = 0; y < page.getHeight(); y += 3) {
      for (int x = 0; x < page.getWidth(); x += 3) {
        Color c = new Color(page.getRGB(x, y));
        float[] hsb = Color.RGBtoHSB(c.getRed(), c.getGreen(), c.getBlue(), null);
        if (hsb[1] > 0.75) {
          coloured++;
          pale += 0.3 * c.getRed() + 0.59 * c.getGreen() + 0.11 * c.getBlue() > 140 ? 1 : 0;
        }
      }
    }
    assertThat(coloured).isGreaterThan(500);
    assertThat((double) pale / coloured).isLessThan(0.02);
  }

  static Stream<Case> pages() {
    DemoSite plain = DemoSite.coarse(Site.Display.METRIC);
    DemoSite us = DemoSite.coarse(Site.Display.US);
    DemoSite longNamed = longNames();
    return Stream.of(Paper.values())
        .flatMap(
            p ->
                Stream.of(
                    new Case(p, plain.site(), plain.plan()),
                    new Case(p, us.site(), us.plan()),
                    new Case(p, longNamed.site(), longNamed.plan()),
                    new Case(p, longNamed.site(), crowded(longNamed.plan().ranked().get(0)))));
  }

  record Case(Paper paper, Site site, Plan plan) {}

  @ParameterizedTest
  @MethodSource("pages")
  void noTextIsSmallOrOffThePageOrOverAnother(Case a) throws IOException {
    List<PrintedPage.Words> words = PrintedPage.of(a.paper, a.site, a.plan, 1).words();
    for (PrintedPage.Words w : words) {
      assertThat(w.size()).as(w.text()).isGreaterThanOrEqualTo(6.99f);
    }
    // labels of the plan keep apart by rules of their own
    List<PrintedPage.Words> page =
        words.stream().filter(w -> Math.abs(w.size() - SheetPainter.LABELS) > 0.01).toList();
    assertThat(page).hasSizeGreaterThan(60);
    Rectangle2D inside =
        new Rectangle2D.Double(20, 20, a.paper.width() - 40, a.paper.height() - 40);
    assertThat(page).allMatch(w -> inside.contains(w.box()));
    for (int i = 0; i < page.size(); i++) {
      for (int k = i + 1; k < page.size(); k++) {
        Rectangle2D both = page.get(i).box().createIntersection(page.get(k).box());
        assertThat(both.getWidth() > 0.5 && both.getHeight() > 1.2)
            .as("\"%s\" over \"%s\"", page.get(i).text(), page.get(k).text())
            .isFalse();
      }
    }
  }

  /** Sheds of long names where the tree comes down, on a site of a long name. */
  private static DemoSite longNames() {
    DemoSite demo =
        DemoSite.asItIs()
            .only("hand-winch", "A3")
            .with(s -> s.put("name", "Very long name ".repeat(13)));
    for (int i = 0; i < 12; i++) {
      demo =
          demo.and(
              "/targets",
              DemoSite.target(
                  "Shed number " + i + " with a name that does not end".repeat(3),
                  Target.Kind.STRUCTURE,
                  "\"type\": \"circle\", \"centre\": [%s, 36], \"radius_m\": 0.5"
                      .formatted(16 + i / 4.0)));
    }
    return demo;
  }

  /** More of everything than a real plan ever has. */
  private static Plan crowded(Judged j) {
    List<Check> checks =
        new ArrayList<>(
            Collections.nCopies(
                20,
                new Check(
                    "check of many words " + "long ".repeat(20),
                    1,
                    1,
                    "",
                    1.1,
                    Verdict.TIGHT,
                    null,
                    "A reason of many words. ".repeat(12))));
    List<PartLoad> loads =
        Collections.nCopies(
            30,
            new PartLoad(
                "part of a long name ".repeat(9), 120_000, 1_760_000, 200_000, 1e6, 5, 1.5));
    Judged more =
        new Judged(
            j.setup(),
            Verdict.TIGHT,
            j.weakest(),
            j.standing(),
            j.standings(),
            j.failing(),
            "Tight. " + "A sentence that goes on and on. ".repeat(20),
            j.figures(),
            checks,
            loads,
            j.line(),
            j.haul(),
            j.ground(),
            Collections.nCopies(20, "A note of many words. ".repeat(12)));
    return new Plan(
        List.of(more),
        1,
        Map.of(Verdict.TIGHT, 1),
        Map.of(),
        Map.of(),
        Collections.nCopies(25, "A remark about the whole plan. ".repeat(6)));
  }

  private static String wire(int east) {
    return """
        {"id": "W at %1$d", "voltage_kv": 12.47, "voltage_said_by": "owner", "state": "energized",
         "poles": [{"at": [%1$d, -50], "ground_m": 0, "height_m": 9},
                   {"at": [%1$d, 150], "ground_m": 0, "height_m": 9}],
         "sag_m": 0.8, "fix": "tapes", "stated_error_m": null}"""
        .formatted(east);
  }

  /** Longest run of dark pixels in a row, left of a limit. */
  private static int run(BufferedImage page, int y, int limit) {
    int best = 0;
    int run = 0;
    for (int x = 0; x < limit; x++) {
      run = (page.getRGB(x, y) & 0xFF) < 128 ? run + 1 : 0;
      best = Math.max(best, run);
    }
    return best;
  }

  /** Middle of the column with the most marks and its neighbours. */
  private static double peak(int[] columns, int from, int to) {
    int best = from;
    for (int x = from; x < to; x++) {
      best = columns[x] > columns[best] ? x : best;
    }
    double sum = 0;
    double weight = 0;
    for (int x = Math.max(from, best - 6); x < Math.min(to, best + 7); x++) {
      if (columns[x] > columns[best] / 2) {
        sum += (double) x * columns[x];
        weight += columns[x];
      }
    }
    return sum / weight;
  }
}
