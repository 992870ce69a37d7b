package org.fallwright.ui.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.rendering.PDFRenderer;
import org.apache.pdfbox.text.PDFTextStripper;
import org.apache.pdfbox.text.TextPosition;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.PartLoad;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;
import org.fallwright.ui.DemoLike;
import org.fallwright.ui.map.GroundPainter;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

class SheetFileTest {
  private static final int DPI = 300;
  private static final double MM_PER_PIXEL = 25.4 / DPI;

  @ParameterizedTest
  @EnumSource(Paper.class)
  void onePageOfThePaperAskedFor(Paper paper) throws IOException {
    try (PDDocument doc = open(sheet(paper, metric(), DemoLike.plan(metric()), 1).pdf())) {
      assertThat(doc.getNumberOfPages()).isEqualTo(1);
      assertThat((double) doc.getPage(0).getMediaBox().getWidth())
          .isCloseTo(paper.width(), within(0.01));
      assertThat((double) doc.getPage(0).getMediaBox().getHeight())
          .isCloseTo(paper.height(), within(0.01));
    }
  }

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
    byte[] pdf = sheet(paper, metric(), DemoLike.plan(metric()), 1).pdf();
    BufferedImage page = rendered(pdf);
    double label = checkBarLabel(words(pdf)).getMinY() * DPI / 72;
    double mm = 0;
    for (int y = (int) (label - 0.15 * DPI); y < label; y++) {
      mm = Math.max(mm, run(page, y, page.getWidth() * 6 / 10) * MM_PER_PIXEL);
    }
    assertThat(mm).isCloseTo(100, within(0.3));
  }

  @Test
  void aDistanceOnTheGroundMeasuresAsTheScaleSays() throws IOException {
    Site site = withWires(metric(), 0, 30);
    byte[] pdf = sheet(Paper.A4, site, DemoLike.plan(site), 1).pdf();
    Matcher scale = Pattern.compile("Scale 1:(\\d+)").matcher(text(pdf));
    assertThat(scale.find()).isTrue();
    BufferedImage page = rendered(pdf);
    int[] columns = new int[page.getWidth()];
    for (int x = 0; x < page.getWidth(); x++) {
      for (int y = 0; y < page.getHeight(); y++) {
        columns[x] += near(page.getRGB(x, y), new Color(0x5A2391)) ? 1 : 0;
      }
    }
    double west = peak(columns, 0, page.getWidth() / 3);
    double east = peak(columns, page.getWidth() / 3, page.getWidth());
    double wanted = 30_000.0 / Integer.parseInt(scale.group(1));
    assertThat((east - west) * MM_PER_PIXEL).isCloseTo(wanted, within(0.3));
  }

  @Test
  void thePageSaysWhatTheSetupIsAndHowItStands() throws IOException {
    String text = text(sheet(Paper.LETTER, metric(), DemoLike.plan(metric()), 1).pdf());
    assertThat(text)
        .contains("Oak behind the house")
        .contains("Setup 1 of 4")
        .contains("open face 70°")
        .contains("003° true")
        .contains("rules US-OSHA")
        .contains("workable")
        .contains("5.05 kN")
        .contains("4.73 kN")
        .contains("6.36 kN")
        .contains("15.7 kN")
        .contains("1.46 = least it gives / plan for")
        .contains("Going when")
        .contains("House (people)")
        .contains("anchor at plan 0.67: Root plate of A2 in wet ground.")
        .contains("Not looked for: buried services")
        .contains("No plugin answers for the source \"old capstan\".")
        .contains("Never leave a tree cut and standing.")
        .contains("Blank ground: no picture.")
        .contains("Check bar: 100 mm");
  }

  @Test
  void theUnitsAreTheSitesWithTheOthersBeside() throws IOException {
    Site us = DemoLike.site(Site.Display.US);
    String text = text(sheet(Paper.LETTER, us, DemoLike.plan(us), 1).pdf());
    assertThat(text).contains("1,430 lbf").contains("6.36 kN").contains("planned to 8.9 mph");
  }

  @Test
  void everyVerdictStandsInItsWord() throws IOException {
    Site site = metric();
    for (Verdict v : Verdict.values()) {
      Judged j = DemoLike.judged(site, 3, "hand winch", "A3", List.of("A1"), v, 1.1);
      Plan plan = new Plan(List.of(j), 1, Map.of(v, 1), Map.of(), Map.of(), List.of());
      assertThat(text(sheet(Paper.A4, site, plan, 1).pdf())).contains(v.word());
    }
  }

  @Test
  void theSameInputGivesTheSameBytes() throws IOException {
    Site site = metric();
    Plan plan = DemoLike.plan(site);
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
    SheetFile sheet = sheet(Paper.LETTER, metric(), DemoLike.plan(metric()), 1);
    byte[] png = sheet.png();
    BufferedImage read = ImageIO.read(new ByteArrayInputStream(png));
    assertThat(read.getWidth()).isEqualTo(1700);
    assertThat(read.getHeight()).isEqualTo(2200);
    // pHYs: 200 dpi are 7874 pixels a metre, 0x1EC2
    assertThat(new String(png, java.nio.charset.StandardCharsets.ISO_8859_1))
        .contains("pHYs\0\0\u001e\u00c2\0\0\u001e\u00c2\u0001");
    BufferedImage pdf;
    try (PDDocument doc = open(sheet.pdf())) {
      pdf = new PDFRenderer(doc).renderImageWithDPI(0, SheetFile.DPI);
    }
    assertThat(differing(read, pdf)).as("share of pixels that differ much").isLessThan(0.02);
  }

  @Test
  void thePageIsLegibleWithoutColour() throws IOException {
    BufferedImage page = rendered(sheet(Paper.A4, metric(), DemoLike.plan(metric()), 1).pdf());
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

  @Test
  void namesWithSignsThatNoTypefaceHasDoNotBreakThePage() throws IOException {
    Site base = metric();
    List<Target> targets = new ArrayList<>(base.targets());
    targets.add(
        new Target(
            "Tank \uD83D\uDEE2\u0007 \u202E\u05D0",
            Target.Kind.OTHER,
            new Shape.Circle(new Position(20, 18), 1),
            Fix.TAPES,
            null,
            0,
            1,
            1,
            false,
            false,
            false));
    Site site =
        named(with(base, targets, base.wires()), "Eiche \uD83C\uDF33 \n hinterm Haus\u0000");
    SheetFile sheet = sheet(Paper.A4, site, DemoLike.plan(site), 1);
    assertThat(text(sheet.pdf())).contains("Eiche ?").contains("hinterm Haus").contains("workable");
    assertThat(sheet.png()).isNotEmpty();
  }

  static Stream<Arguments3> pages() {
    Site plain = metric();
    Site longNamed = named(longNames(DemoLike.site(Site.Display.US)), "Very long name ".repeat(13));
    return Stream.of(Paper.values())
        .flatMap(
            p ->
                Stream.of(
                    new Arguments3(p, plain, DemoLike.plan(plain)),
                    new Arguments3(p, longNamed, crowded(longNamed))));
  }

  record Arguments3(Paper paper, Site site, Plan plan) {}

  @ParameterizedTest
  @MethodSource("pages")
  void noTextIsSmallOrOffThePageOrOverAnother(Arguments3 a) throws IOException {
    byte[] pdf = sheet(a.paper, a.site, a.plan, 1).pdf();
    List<Words> words = words(pdf);
    for (Words w : words) {
      assertThat(w.size).as(w.text).isGreaterThanOrEqualTo(6.99f);
    }
    // labels of the plan keep apart by rules of their own
    List<Words> page =
        words.stream().filter(w -> Math.abs(w.size - SheetPainter.LABELS) > 0.01).toList();
    assertThat(page).hasSizeGreaterThan(60);
    Rectangle2D inside =
        new Rectangle2D.Double(20, 20, a.paper.width() - 40, a.paper.height() - 40);
    assertThat(page).allMatch(w -> inside.contains(w.box));
    for (int i = 0; i < page.size(); i++) {
      for (int k = i + 1; k < page.size(); k++) {
        Rectangle2D both = page.get(i).box.createIntersection(page.get(k).box);
        assertThat(both.getWidth() > 0.5 && both.getHeight() > 1.2)
            .as("\"%s\" over \"%s\"", page.get(i).text, page.get(k).text)
            .isFalse();
      }
    }
  }

  private record Words(String text, Rectangle2D box, float size) {}

  private static Rectangle2D checkBarLabel(List<Words> words) {
    return words.stream().filter(w -> w.text.startsWith("Check bar")).findFirst().orElseThrow().box;
  }

  /** Runs of text with their boxes. */
  private static List<Words> words(byte[] pdf) throws IOException {
    List<Words> all = new ArrayList<>();
    try (PDDocument doc = open(pdf)) {
      PDFTextStripper stripper =
          new PDFTextStripper() {
            @Override
            protected void writeString(String text, List<TextPosition> places) {
              // the stripper joins neighbours on one line: part them by size and by gaps
              Words last = null;
              for (TextPosition p : places) {
                if (p.getUnicode().isBlank()) {
                  continue;
                }
                Rectangle2D box =
                    new Rectangle2D.Double(
                        p.getXDirAdj(),
                        p.getYDirAdj() - p.getHeightDir(),
                        p.getWidthDirAdj(),
                        p.getHeightDir());
                if (last != null
                    && Math.abs(last.size - p.getYScale()) < 0.01
                    && Math.abs(last.box.getMaxY() - box.getMaxY()) < 0.1
                    && Math.abs(box.getMinX() - last.box.getMaxX()) < 4) {
                  all.remove(all.size() - 1);
                  last = new Words(text, last.box.createUnion(box), last.size);
                } else {
                  last = new Words(text, box, p.getYScale());
                }
                all.add(last);
              }
            }
          };
      stripper.getText(doc);
    }
    return all;
  }

  private static Plan crowded(Site site) {
    Judged j = DemoLike.judged(site, 3, "hand winch", "A3", List.of("A1"), Verdict.TIGHT, 1.1);
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
            30, new PartLoad("part of a long name ".repeat(9), 120_000, 1_760_000, 1e6, 5, 1.5));
    Judged more =
        new Judged(
            j.setup(),
            j.verdict(),
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

  private static Site longNames(Site site) {
    List<Target> targets = new ArrayList<>(site.targets());
    for (int i = 0; i < 12; i++) {
      targets.add(
          new Target(
              "Shed number " + i + " with a name that does not end".repeat(3),
              Target.Kind.STRUCTURE,
              new Shape.Circle(new Position(16 + i / 4.0, 12), 0.5),
              Fix.PICTURE,
              null,
              0,
              2,
              1,
              true,
              false,
              false));
    }
    return with(site, targets, site.wires());
  }

  private static Site withWires(Site site, double... easts) {
    List<Wire> wires = new ArrayList<>();
    for (double e : easts) {
      wires.add(
          new Wire(
              "W" + e,
              12.47,
              "owner",
              Wire.State.ENERGIZED,
              List.of(
                  new Wire.Pole(new Position(e, -50), 0, 9),
                  new Wire.Pole(new Position(e, 150), 0, 9)),
              0.8,
              Fix.TAPES,
              null));
    }
    return with(site, site.targets(), wires);
  }

  private static Site metric() {
    return DemoLike.site(Site.Display.METRIC);
  }

  private static Site named(Site s, String name) {
    return copy(s, name, s.targets(), s.wires());
  }

  private static Site with(Site s, List<Target> targets, List<Wire> wires) {
    return copy(s, s.name(), targets, wires);
  }

  private static Site copy(Site s, String name, List<Target> targets, List<Wire> wires) {
    return new Site(
        s.version(),
        name,
        s.origin(),
        s.display(),
        s.ruleSet(),
        s.declinationDeg(),
        s.picture(),
        s.tree(),
        s.cut(),
        targets,
        wires,
        s.looked(),
        s.dropZones(),
        s.anchors(),
        s.spots(),
        s.gear(),
        s.conditions(),
        s.offer());
  }

  private static SheetFile sheet(Paper paper, Site site, Plan plan, int rank) {
    return new SheetFile(paper, site, plan, rank, GroundPainter.NONE, null, "9.9.9");
  }

  private static PDDocument open(byte[] pdf) throws IOException {
    return Loader.loadPDF(pdf);
  }

  private static String text(byte[] pdf) {
    try (PDDocument doc = open(pdf)) {
      return new PDFTextStripper().getText(doc).replaceAll("\\s+", " ");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static BufferedImage rendered(byte[] pdf) throws IOException {
    try (PDDocument doc = open(pdf)) {
      return new PDFRenderer(doc).renderImageWithDPI(0, DPI);
    }
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

  private static boolean near(int rgb, Color c) {
    Color p = new Color(rgb);
    return Math.abs(p.getRed() - c.getRed())
            + Math.abs(p.getGreen() - c.getGreen())
            + Math.abs(p.getBlue() - c.getBlue())
        < 60;
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
