package org.fallwright.ui.map;

import static org.assertj.core.api.Assertions.assertThat;

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
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;
import org.fallwright.ui.DemoLike;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class PlanPainterTest {
  private static final Color GRASS = new Color(0x5E7A45);
  private static final Rectangle2D FRAME = new Rectangle2D.Double(20, 20, 700, 700);

  private final Site site = DemoLike.site(Site.Display.US);
  private final Plan plan = DemoLike.plan(site);
  private final Judged best = plan.ranked().get(0);
  private final Viewport view = Viewport.fitting(PlanPainter.extent(site, best), 0, FRAME);

  @Test
  void theFootprintHasAnOutlineAndDots() {
    BufferedImage image = paint(scene(PlanLayer.FOOTPRINT));
    Point2D middle = view.toPixel(DemoLike.STUMP.along(3, 12.5));
    assertThat(share(image, middle, 40, Palette.DAY.footprint())).isBetween(0.005, 0.2);
    Point2D edge = view.toPixel(DemoLike.STUMP.along(3, 12.5).along(270, 6.05));
    assertThat(share(image, edge, 5, Palette.DAY.footprint())).isGreaterThan(0.15);
  }

  @Test
  void theSitBackZoneIsHatchedAndTheLandBesideItIsNot() {
    BufferedImage image = paint(scene(PlanLayer.SIT_BACK));
    Point2D behind = view.toPixel(DemoLike.STUMP.along(188, 14));
    assertThat(share(image, behind, 30, GRASS)).isLessThan(0.5);
    Point2D ahead = view.toPixel(DemoLike.STUMP.along(8, 14));
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
      Point2D p = view.toPixel(DemoLike.STUMP.along(a, 35));
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
    List<Shape> shapes =
        List.of(
            new Shape.Circle(new Position(10, 30), 5),
            new Shape.Line(List.of(new Position(0, 25), new Position(20, 35))),
            new Shape.Polygon(
                List.of(new Position(5, 25), new Position(15, 25), new Position(10, 35))));
    for (Shape s : shapes) {
      Target t = new Target("X", kind, s, Fix.TAPES, null, 0, 2, 1, false, false, false);
      Site one = with(List.of(t), site.wires(), site.anchors());
      BufferedImage image = paint(PlanScene.of(one, null).showing(Set.of(PlanLayer.TARGETS)));
      assertThat(same(image, blank())).as(kind + " " + s).isFalse();
    }
  }

  @Test
  void everyKindOfAnchorLooksDifferent() {
    Place at = new Place(new Position(16, 30), 0, Fix.TAPES, null);
    List<Anchor> kinds =
        List.of(
            site.anchor("A1").orElseThrow(),
            site.anchor("S1").orElseThrow(),
            new Anchor.ParkedVehicle("P1", at, 0.5, null, null, 2500, "grass", false, 0, 30_000),
            new Anchor.RatedPoint("R1", at, 0.5, null, null, 50_000, "owner"));
    List<BufferedImage> images = new ArrayList<>();
    for (Anchor a : kinds) {
      Site one = with(List.of(), site.wires(), List.of(a));
      BufferedImage i = paint(PlanScene.of(one, null).showing(Set.of(PlanLayer.ANCHORS)));
      assertThat(images).noneMatch(other -> same(i, other));
      images.add(i);
    }
  }

  @Test
  void anAnchorCarriesTheMarkOfItsWorstCheckElseOfItsCondition() {
    Canvas judged = canvas(PlanScene.of(site, best));
    Canvas unjudged = canvas(PlanScene.of(site, null));
    Anchor a1 = site.anchor("A1").orElseThrow();
    Anchor a2 = site.anchor("A2").orElseThrow();
    assertThat(SupportsPainter.mark(judged, a1))
        .contains(org.fallwright.core.plan.Verdict.WORKABLE);
    assertThat(SupportsPainter.mark(judged, a2))
        .contains(org.fallwright.core.plan.Verdict.NOT_WORKABLE);
    assertThat(SupportsPainter.mark(unjudged, a1)).isEmpty();
    assertThat(SupportsPainter.mark(unjudged, a2))
        .as("rejected on the site")
        .contains(org.fallwright.core.plan.Verdict.NOT_WORKABLE);
  }

  @Test
  void anUnknownVoltageIsSaidInWords() {
    Wire w = site.wires().get(0);
    Wire blank = new Wire("W1", null, null, w.state(), w.poles(), w.sagM(), w.fix(), null);
    Site unknown = with(site.targets(), List.of(blank), site.anchors());
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

  private Site with(List<Target> targets, List<Wire> wires, List<Anchor> anchors) {
    return new Site(
        site.version(),
        site.name(),
        site.origin(),
        site.display(),
        site.ruleSet(),
        site.declinationDeg(),
        null,
        site.tree(),
        site.cut(),
        targets,
        wires,
        site.looked(),
        List.of(),
        anchors,
        site.spots(),
        new org.fallwright.core.site.Gear(
            List.of(), List.of(), List.of(), List.of(), null, List.of()),
        site.conditions(),
        site.offer());
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
