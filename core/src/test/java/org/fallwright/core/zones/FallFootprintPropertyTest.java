package org.fallwright.core.zones;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.util.AffineTransformation;
import org.locationtech.jts.operation.union.UnaryUnionOp;

/** The footprint against its definition, copies of the outline turned about the stump. */
class FallFootprintPropertyTest {
  private static FallOutline randomTree(Random r) {
    double h = 3 + 30 * r.nextDouble();
    return new FallOutline(
        h,
        h * 0.7 * r.nextDouble(),
        0.3 + 0.6 * h * r.nextDouble(),
        0.1 + 1.5 * r.nextDouble(),
        r.nextInt(4) == 0 ? 0 : 20 * r.nextDouble(),
        360 * r.nextDouble());
  }

  /** The outline as felled to the north, its crown cornered on the ellipse. */
  private static List<Geometry> outline(FallOutline t, double slope) {
    double w = t.stumpDiameterM() / 2;
    double top = t.reachM();
    double butt = -t.buttM();
    Geometry stem =
        Shape.FACTORY.createPolygon(
            new Coordinate[] {
              new Coordinate(-w, butt),
              new Coordinate(w, butt),
              new Coordinate(w, top),
              new Coordinate(-w, top),
              new Coordinate(-w, butt)
            });
    Coordinate[] c = new Coordinate[361];
    for (int i = 0; i <= 360; i++) {
      double a = Math.toRadians(i % 360);
      c[i] =
          new Coordinate(
              t.crownRadiusM() * Math.cos(a),
              (t.crownBaseM() + top) / 2 + (top - t.crownBaseM()) / 2 * Math.sin(a));
    }
    Geometry crown = Shape.FACTORY.createPolygon(c);
    List<Geometry> all = new ArrayList<>(List.of(stem, crown));
    AffineTransformation push = AffineTransformation.shearInstance(slope, 0);
    all.add(push.transform(stem));
    all.add(push.transform(crown));
    return all;
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20})
  void holdsEveryTurnedOutlineAndHardlyMore(long seed) {
    Random r = new Random(seed);
    FallOutline tree = randomTree(r);
    double lay = 360 * r.nextDouble();
    FallFootprint f = FallFootprint.of(tree, Things.at(0, 0), lay, 1.2 * r.nextDouble(), 0);
    double slope =
        Math.tan(Math.toRadians(tree.leanDeg()))
            * Math.sin(Math.toRadians(tree.leanAzimuthDeg() - lay));
    List<Geometry> turned = new ArrayList<>();
    int copies = 40;
    for (int i = 0; i <= copies; i++) {
      double off = f.halfAngleDeg() * (2.0 * i / copies - 1);
      AffineTransformation turn = AffineTransformation.rotationInstance(-Math.toRadians(lay + off));
      outline(tree, slope).forEach(g -> turned.add(turn.transform(g)));
    }
    Geometry all = UnaryUnionOp.union(turned);
    String what = "seed " + seed + " " + tree;
    assertThat(all.difference(f.geometry().buffer(1e-6)).getArea()).as(what).isLessThan(1e-9);
    assertThat(f.geometry().getArea()).as(what).isLessThan(all.getArea() * 1.006);
    assertThat(f.geometry().isValid()).as(what).isTrue();
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void aSlideCoversTheOutlineAsItLiesAndAsItHasSlid(long seed) {
    Random r = new Random(seed);
    FallOutline tree = randomTree(r);
    double slide = 10 * r.nextDouble();
    FallFootprint f = FallFootprint.of(tree, Things.at(0, 0), 0, 0, slide);
    Geometry allowed = f.geometry().buffer(1e-6);
    for (int i = 0; i <= 4; i++) {
      AffineTransformation on = AffineTransformation.translationInstance(0, slide * i / 4);
      for (Geometry g : outline(tree, 0)) {
        assertThat(on.transform(g).difference(allowed).getArea())
            .as("seed " + seed + " " + tree)
            .isLessThan(1e-9);
      }
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void turningOrMirroringTheSiteTurnsOrMirrorsTheFootprint(long seed) {
    Random r = new Random(seed);
    FallOutline t = randomTree(r);
    double lay = 360 * r.nextDouble();
    double turn = 360 * r.nextDouble();
    double share = r.nextDouble();
    Geometry here = FallFootprint.of(t, Things.at(0, 0), lay, share, 0).geometry();
    Geometry turned =
        FallFootprint.of(lean(t, t.leanAzimuthDeg() + turn), Things.at(0, 0), lay + turn, share, 0)
            .geometry();
    Geometry mirrored =
        FallFootprint.of(lean(t, 360 - t.leanAzimuthDeg()), Things.at(0, 0), 360 - lay, share, 0)
            .geometry();
    Geometry expectTurned =
        AffineTransformation.rotationInstance(-Math.toRadians(turn)).transform(here);
    Geometry expectMirrored = AffineTransformation.scaleInstance(-1, 1).transform(here);
    // Which of two equally far corners an arc starts from is chance: its corners differ by mm.
    double corners = 5e-4 * here.getArea();
    assertThat(turned.symDifference(expectTurned).getArea()).as("seed " + seed).isLessThan(corners);
    assertThat(mirrored.symDifference(expectMirrored).getArea())
        .as("seed " + seed)
        .isLessThan(corners);
  }

  /** A crown drawn as a circle about the stem lies as the round crown does. */
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void aCrownDrawnRoundIsTheRoundCrown(long seed) {
    Random r = new Random(seed);
    FallOutline round = randomTree(r);
    double lay = 360 * r.nextDouble();
    Position axis = round.axisInCrown(Things.at(0, 0), 0.3);
    Geometry circle =
        Shape.FACTORY
            .createPoint(new Coordinate(axis.eastM(), axis.northM()))
            .buffer(round.crownRadiusM(), 32);
    Geometry drawn =
        FallFootprint.of(round.drawn(circle, Things.at(0, 0), 0.3), Things.at(0, 0), lay, 0.3, 0)
            .geometry();
    Geometry plain = FallFootprint.of(round, Things.at(0, 0), lay, 0.3, 0).geometry();
    assertThat(drawn.symDifference(plain).getArea())
        .as("seed " + seed)
        .isLessThan(0.01 * plain.getArea());
  }

  /** Every turn of the drawn crown, stretched corner by corner, lies inside, with the stem. */
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10})
  void holdsEveryTurnOfADrawnCrown(long seed) {
    Random r = new Random(seed);
    FallOutline tree = drawn(r, 0, false);
    double lay = 360 * r.nextDouble();
    double slide = r.nextBoolean() ? 0 : 6 * r.nextDouble();
    FallFootprint f = FallFootprint.of(tree, Things.at(0, 0), lay, r.nextDouble(), slide);
    double hind = Double.POSITIVE_INFINITY;
    double fore = Double.NEGATIVE_INFINITY;
    for (Position c : tree.crown()) {
      double s = c.eastM() * sin(lay) + c.northM() * cos(lay);
      hind = Math.min(hind, s);
      fore = Math.max(fore, s);
    }
    double push = Math.tan(Math.toRadians(tree.leanDeg())) * sin(tree.leanAzimuthDeg() - lay);
    Geometry allowed = f.geometry().buffer(1e-6);
    for (Position c : tree.crown()) {
      double s = c.eastM() * sin(lay) + c.northM() * cos(lay);
      double aside = c.eastM() * cos(lay) - c.northM() * sin(lay);
      double along =
          tree.crownBaseM() + (s - hind) / (fore - hind) * (tree.reachM() - tree.crownBaseM());
      for (int i = -4; i <= 4; i++) {
        double turned = lay + i / 4.0 * f.halfAngleDeg();
        for (double p : new double[] {aside, aside + along * push}) {
          double e = along * sin(turned) + p * cos(turned);
          double n = along * cos(turned) - p * sin(turned);
          assertThat(allowed.covers(Shape.FACTORY.createPoint(new Coordinate(e, n))))
              .as("seed %d, corner %s, turn %d", seed, c, i)
              .isTrue();
        }
      }
    }
    assertThat(f.geometry().isValid()).as("seed " + seed).isTrue();
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void turningOrMirroringADrawnCrownTurnsOrMirrorsItsFootprint(long seed) {
    double lay = 360 * new Random(seed).nextDouble();
    double turn = 77;
    Geometry here =
        FallFootprint.of(drawn(new Random(seed), 0, false), Things.at(0, 0), lay, 0.4, 3)
            .geometry();
    Geometry turned =
        FallFootprint.of(drawn(new Random(seed), turn, false), Things.at(0, 0), lay + turn, 0.4, 3)
            .geometry();
    Geometry mirrored =
        FallFootprint.of(drawn(new Random(seed), 0, true), Things.at(0, 0), 360 - lay, 0.4, 3)
            .geometry();
    double corners = 5e-4 * here.getArea();
    assertThat(
            turned
                .symDifference(
                    AffineTransformation.rotationInstance(-Math.toRadians(turn)).transform(here))
                .getArea())
        .as("seed " + seed)
        .isLessThan(corners);
    assertThat(
            mirrored
                .symDifference(AffineTransformation.scaleInstance(-1, 1).transform(here))
                .getArea())
        .as("seed " + seed)
        .isLessThan(corners);
  }

  /** A leaning tree with a crown of some corners about its stem, turned, then mirrored. */
  private static FallOutline drawn(Random r, double turnDeg, boolean mirrored) {
    double lean = 15 * r.nextDouble();
    double azimuth = 360 * r.nextDouble();
    FallOutline t = new FallOutline(5 + 20 * r.nextDouble(), 2, 2, 0.4, lean, 0);
    int corners = 3 + r.nextInt(6);
    List<Position> about = new ArrayList<>();
    for (int i = 0; i < corners; i++) {
      double a = (i + 0.8 * r.nextDouble()) * 360 / corners;
      double d = 1 + 5 * r.nextDouble();
      about.add(Things.at(0, 0).along(mirrored ? -a - turnDeg : a + turnDeg, d));
    }
    double toward = mirrored ? 360 - azimuth : (azimuth + turnDeg) % 360;
    FallOutline leaning =
        new FallOutline(
            t.heightM(), t.crownBaseM(), t.crownRadiusM(), t.stumpDiameterM(), lean, toward);
    Position axis = leaning.axisInCrown(Things.at(0, 0), 0.3);
    Shape.Polygon outline =
        new Shape.Polygon(
            about.stream()
                .map(p -> Things.at(p.eastM() + axis.eastM(), p.northM() + axis.northM()))
                .toList());
    return leaning.drawn(outline.geometry(), Things.at(0, 0), 0.3);
  }

  private static double sin(double deg) {
    return Math.sin(Math.toRadians(deg));
  }

  private static double cos(double deg) {
    return Math.cos(Math.toRadians(deg));
  }

  private static FallOutline lean(FallOutline t, double azimuth) {
    return new FallOutline(
        t.heightM(), t.crownBaseM(), t.crownRadiusM(), t.stumpDiameterM(), t.leanDeg(), azimuth);
  }
}
