package org.fallwright.ui.map;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.locationtech.jts.geom.Coordinate;

class PlanPainterTest {
  private static final Color GRASS = new Color(0x5E7A45);
  private static final Rectangle2D FRAME = new Rectangle2D.Double(20, 20, 700, 700);

  private static final DemoSite DEMO = DemoSite.asItIs();
  private final Site site = DEMO.site();
  private final Position stump = site.tree().stump().at();
  private final Judged best = DEMO.judge(DemoSite.ROW_6);
  private final Viewport view = Viewport.fitting(PlanPainter.extent(site, best), 0, FRAME);

  @Test
  void theFootprintHasAnOutlineAndDots() {
    BufferedImage image = paint(scene(PlanLayer.FOOTPRINT));
    Point2D middle = view.toPixel(stump.along(3, 12.5));
    assertThat(share(image, middle, 40, Palette.DAY.footprint())).isBetween(0.005, 0.2);
    for (Coordinate c : best.ground().footprint().getBoundary().getCoordinates()) {
      Point2D edge = view.toPixel(c.getX(), c.getY());
      assertThat(share(image, edge, 5, Palette.DAY.footprint())).as("%s", c).isGreaterThan(0.15);
    }
  }

  @Test
  void theSitBackZoneIsHatchedAndTheLandBesideItIsNot() {
    BufferedImage image = paint(scene(PlanLayer.SIT_BACK));
    Point2D behind = view.toPixel(stump.along(188, 14));
    assertThat(share(image, behind, 30, GRASS)).isLessThan(0.5);
    Point2D ahead = view.toPixel(stump.along(8, 14));
    assertThat(share(image, ahead, 30, GRASS)).isEqualTo(1);
  }

  @Test
  void theBightIsCrossHatchedInsideTheLinesAngleOnly() {
    BufferedImage image = paint(scene(PlanLayer.BIGHTS));
    assertThat(share(image, view.toPixel(8, 48), 20, GRASS)).isLessThan(0.5);
    assertThat(share(image, view.toPixel(30, 48), 20, GRASS)).isEqualTo(1);
  }

  @Test
  void theRingIsDashed() {
    BufferedImage image = paint(scene(PlanLayer.PEOPLE_RING));
    int ink = 0;
    int bare = 0;
    for (int a = 0; a < 360; a++) {
      Point2D p = view.toPixel(stump.along(a, best.ground().peopleRadiusM()));
      if (FRAME.contains(p)) {
        boolean dark = share(image, p, 1, Palette.DAY.ink()) > 0.3;
        ink += dark ? 1 : 0;
        bare += dark ? 0 : 1;
      }
    }
    assertThat(ink).isGreaterThan(60);
    assertThat(bare).isGreaterThan(30);
  }

  @Test
  void theLineRunsFromTheTreeOverTheBlockToTheSource() {
    BufferedImage image = paint(scene(PlanLayer.LINE));
    Position a1 = site.anchor("A1").orElseThrow().place().at();
    Position a3 = site.anchor("A3").orElseThrow().place().at();
    for (double t : new double[] {0.2, 0.4, 0.8}) {
      Point2D on =
          view.toPixel(
              a1.eastM() + t * (a3.eastM() - a1.eastM()),
              a1.northM() + t * (a3.northM() - a1.northM()));
      assertThat(share(image, on, 2, Palette.DAY.line())).as("leg at " + t).isGreaterThan(0.3);
    }
  }

  @Test
  void aDarkStrokeHasALightHalo() {
    BufferedImage image = paint(scene(PlanLayer.WIRES));
    Point2D on = view.toPixel(42.5, 60);
    int halo = 0;
    for (int x = (int) on.getX() - 4; x <= on.getX() + 4; x++) {
      halo += bright(image.getRGB(x, (int) on.getY())) ? 1 : 0;
    }
    assertThat(halo).isGreaterThanOrEqualTo(1);
  }

  @Test
  void nothingIsPaintedOutsideTheFrameAndTheGraphicsStaysAsItWas() {
    BufferedImage image = blank();
    Graphics2D g = graphics(image);
    AffineTransform before = g.getTransform();
    new PlanPainter(PlanScene.of(site, best)).paint(g, view);
    assertThat(g.getTransform()).isEqualTo(before);
    assertThat(g.getClip()).isNull();
    for (int i = 0; i < image.getWidth(); i++) {
      assertThat(image.getRGB(i, 10)).isEqualTo(GRASS.getRGB());
      assertThat(image.getRGB(10, i)).isEqualTo(GRASS.getRGB());
    }
  }

  @Test
  void aLayerThatIsOffIsNotPainted() {
    BufferedImage image = paint(PlanScene.of(site, best).showing(Set.of()));
    assertThat(share(image, new Point2D.Double(370, 370), 330, GRASS)).isEqualTo(1);
  }

  @Test
  void theGroundIsPaintedUnderEverything() {
    BufferedImage image =
        paint(
            PlanScene.of(site, best)
                .over(
                    (g, v) -> {
                      g.setColor(Color.MAGENTA);
                      g.fill(v.frame());
                    }));
    assertThat(image.getRGB(25, 700)).isEqualTo(Color.MAGENTA.getRGB());
    assertThat(image.getRGB(5, 700)).isEqualTo(GRASS.getRGB());
  }

  @Test
  void otherUnitsGiveOtherLabelsAndOnlyLabels() {
    PlanScene us = PlanScene.of(site, best);
    PlanScene metric = us.in(new Amounts(Site.Display.METRIC));
    assertThat(same(paint(us), paint(metric))).isFalse();
    Set<PlanLayer> bare = EnumSet.complementOf(EnumSet.of(PlanLayer.LABELS));
    assertThat(same(paint(us.showing(bare)), paint(metric.showing(bare)))).isTrue();
  }

  @Test
  void everySetupOfThePlanIsPaintedTurnedAndUnturned() {
    Plan plan = DemoSite.coarse(Site.Display.US).plan();
    assertThat(plan.ranked()).extracting(Judged::verdict).contains(Verdict.TIGHT);
    List<Judged> all = new ArrayList<>(plan.ranked());
    all.addAll(plan.bestRejected().values());
    BufferedImage without = paint(PlanScene.of(site, null));
    for (Judged j : all) {
      assertThat(same(paint(PlanScene.of(site, j)), without)).as(j.setup().toString()).isFalse();
      BufferedImage turned = blank();
      new PlanPainter(PlanScene.of(site, j).in(Palette.GREY))
          .paint(
              graphics(turned),
              Viewport.fitting(PlanPainter.extent(site, j), j.setup().layDeg() - 90, FRAME));
      assertThat(same(turned, blank())).isFalse();
    }
  }

  @ParameterizedTest
  @EnumSource(Target.Kind.class)
  void everyKindOfTargetShowsInEveryShape(Target.Kind kind) {
    List<String> shapes =
        List.of(
            "\"type\": \"circle\", \"centre\": [10, 30], \"radius_m\": 5",
            "\"type\": \"line\", \"points\": [[0, 25], [20, 35]]",
            "\"type\": \"polygon\", \"points\": [[5, 25], [15, 25], [10, 35]]");
    for (String shape : shapes) {
      Site one = without("/targets").and("/targets", DemoSite.target("X", kind, shape)).site();
      assertThat(one.targets()).hasSize(1);
      BufferedImage image = paint(PlanScene.of(one, null).showing(Set.of(PlanLayer.TARGETS)));
      assertThat(same(image, blank())).as(kind + " " + shape).isFalse();
    }
  }

  @Test
  void everyKindOfAnchorLooksDifferent() {
    List<String> kinds =
        List.of(
            entry("A1"),
            entry("S1"),
            """
            {"type": "vehicle", "id": "P1", "mass_kg": 2500, "surface": "grass", "wet": false,
             "uphill_deg": 0, "rated_point_N": 30000}""",
            """
            {"type": "rated", "id": "R1", "breaking_load_N": 50000, "vouched_by": "owner"}""");
    List<BufferedImage> images = new ArrayList<>();
    for (String a : kinds) {
      Site one = without("/gear/sources").with(s -> s.putArray("anchors").add(here(a))).site();
      BufferedImage i = paint(PlanScene.of(one, null).showing(Set.of(PlanLayer.ANCHORS)));
      assertThat(same(i, blank())).isFalse();
      assertThat(images).noneMatch(other -> same(i, other));
      images.add(i);
    }
  }

  @Test
  void anAnchorCarriesTheMarkOfItsWorstCheckElseOfItsCondition() {
    Anchor a1 = site.anchor("A1").orElseThrow();
    Anchor a2 = site.anchor("A2").orElseThrow();
    Canvas six = canvas(PlanScene.of(site, best));
    assertThat(SupportsPainter.mark(six, a1)).contains(Verdict.WORKABLE);
    assertThat(SupportsPainter.mark(six, a2)).as("no part of it").isEmpty();
    Canvas seven = canvas(PlanScene.of(site, DEMO.judge(DemoSite.ROW_7)));
    assertThat(SupportsPainter.mark(seven, a2)).contains(Verdict.NOT_WORKABLE);
    Site rejected =
        DEMO.with(s -> DemoSite.entry(s.get("anchors"), "A2").put("rejected", "moved when kicked"))
            .site();
    Canvas unjudged = canvas(PlanScene.of(rejected, null));
    assertThat(SupportsPainter.mark(unjudged, rejected.anchor("A1").orElseThrow())).isEmpty();
    assertThat(SupportsPainter.mark(unjudged, rejected.anchor("A2").orElseThrow()))
        .as("rejected on the site")
        .contains(Verdict.NOT_WORKABLE);
  }

  @Test
  void anUnknownVoltageIsSaidInWords() {
    Site unknown = DEMO.voltageBlank().site();
    Set<PlanLayer> layers = Set.of(PlanLayer.WIRES, PlanLayer.LABELS);
    assertThat(
            same(
                paint(PlanScene.of(site, null).showing(layers)),
                paint(PlanScene.of(unknown, null).showing(layers))))
        .isFalse();
  }

  private Canvas canvas(PlanScene scene) {
    return new Canvas(scene, view, new Pen(graphics(blank()), Color.WHITE), new Labels(FRAME));
  }

  /** The demo with a list of its file emptied. */
  private static DemoSite without(String list) {
    return DEMO.with(s -> ((ArrayNode) s.at(list)).removeAll());
  }

  private static String entry(String anchor) {
    List<String> found = new ArrayList<>();
    DEMO.with(s -> found.add(DemoSite.entry(s.get("anchors"), anchor).toString()));
    return found.get(0);
  }

  /** An anchor of the file at one and the same place. */
  private static ObjectNode here(String anchor) {
    ObjectNode a = (ObjectNode) DemoSite.parsed(anchor);
    a.put("sling_height_m", 0.3).putNull("rejected").putNull("land");
    a.set(
        "place",
        DemoSite.parsed(
            """
            {"at": [16, 30], "ground_m": 0, "fix": "tapes", "stated_error_m": null}"""));
    return a;
  }

  private PlanScene scene(PlanLayer layer) {
    return PlanScene.of(site, best).showing(Set.of(layer));
  }

  private BufferedImage paint(PlanScene scene) {
    BufferedImage image = blank();
    new PlanPainter(scene).paint(graphics(image), view);
    return image;
  }

  private static BufferedImage blank() {
    BufferedImage image = new BufferedImage(740, 740, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(GRASS);
    g.fillRect(0, 0, 740, 740);
    return image;
  }

  private static Graphics2D graphics(BufferedImage image) {
    Graphics2D g = image.createGraphics();
    g.setFont(new Font(Font.DIALOG, Font.PLAIN, 12));
    return g;
  }

  /** Share of the pixels in a square that are about a colour. */
  private static double share(BufferedImage image, Point2D at, int half, Color c) {
    int hits = 0;
    int all = 0;
    for (int x = (int) at.getX() - half; x <= at.getX() + half; x++) {
      for (int y = (int) at.getY() - half; y <= at.getY() + half; y++) {
        Color p = new Color(image.getRGB(x, y));
        int off =
            Math.abs(p.getRed() - c.getRed())
                + Math.abs(p.getGreen() - c.getGreen())
                + Math.abs(p.getBlue() - c.getBlue());
        hits += off < 60 ? 1 : 0;
        all++;
      }
    }
    return (double) hits / all;
  }

  private static boolean bright(int rgb) {
    Color c = new Color(rgb);
    return c.getRed() > 200 && c.getGreen() > 200 && c.getBlue() > 200;
  }

  private static boolean same(BufferedImage a, BufferedImage b) {
    for (int y = 0; y < a.getHeight(); y++) {
      for (int x = 0; x < a.getWidth(); x++) {
        if (a.getRGB(x, y) != b.getRGB(x, y)) {
          return false;
        }
      }
    }
    return true;
  }
}
