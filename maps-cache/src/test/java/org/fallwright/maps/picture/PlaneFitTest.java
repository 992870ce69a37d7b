package org.fallwright.maps.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.fallwright.core.site.Position;
import org.junit.jupiter.api.Test;

class PlaneFitTest {
  @Test
  void aKnownLengthAndNorthLayAPicture() {
    // 100 pixels to the right are 20 m; true north points to the right edge, so "right" is north
    PlaneFit fit =
        PlaneFit.ofLength(
            new Point2D.Double(0, 0),
            new Point2D.Double(100, 0),
            20,
            90,
            new ControlPoint(10, 10, new Position(5, 7)));
    assertThat(at(fit, 10, 10).distance(5, 7)).isLessThan(1e-9);
    assertThat(at(fit, 110, 10).distance(5, 27)).isLessThan(1e-9);
    // down in the picture is then west turned over: with north to the right, up is west
    assertThat(at(fit, 10, 0).distance(3, 7)).isLessThan(1e-9);
    assertThat(fit.northDeg()).isCloseTo(90, within(1e-9));
    assertThat(fit.metresPerPixel()).isCloseTo(0.2, within(1e-12));
    assertThat(fit.errorM()).isNaN();
  }

  @Test
  void pointsOfAScaleAndTurnGiveItBackWithoutMisses() {
    for (long seed = 1; seed <= 200; seed++) {
      Random random = new Random(seed);
      PlaneFit truth = random(random);
      List<ControlPoint> points = points(truth, random, 2 + random.nextInt(5));
      PlaneFit fit = PlaneFit.of(points, false);
      assertThat(at(fit, 333, 444).distance(at(truth, 333, 444)))
          .as("seed %d", seed)
          .isLessThan(1e-6);
      assertThat(fit.worstM()).as("seed %d", seed).isLessThan(1e-6);
      assertThat(Double.isNaN(fit.errorM())).isEqualTo(points.size() == 2);
    }
  }

  @Test
  void noOtherScaleOrTurnFitsBetter() {
    for (long seed = 1; seed <= 50; seed++) {
      Random random = new Random(seed);
      List<ControlPoint> points = new ArrayList<>();
      for (ControlPoint p : points(random(random), random, 5)) {
        points.add(
            new ControlPoint(
                p.x(),
                p.y(),
                new Position(
                    p.at().eastM() + random.nextGaussian(),
                    p.at().northM() + random.nextGaussian())));
      }
      PlaneFit best = PlaneFit.of(points, false);
      double least = squares(best, points);
      double stretched = squares(PlaneFit.of(points, true), points);
      assertThat(stretched).as("seed %d", seed).isLessThanOrEqualTo(least + 1e-9);
      for (int i = 0; i < 20; i++) {
        var other = new java.awt.geom.AffineTransform(best.pixelToPlane());
        other.rotate(random.nextGaussian() * 1e-3);
        double scale = 1 + random.nextGaussian() * 1e-3;
        other.scale(scale, scale);
        other.translate(random.nextGaussian(), random.nextGaussian());
        PlaneFit nudged = new PlaneFit(other, List.of(), Double.NaN, java.util.OptionalInt.empty());
        assertThat(squares(nudged, points)).as("seed %d", seed).isGreaterThanOrEqualTo(least);
      }
      assertThat(best.errorM()).isCloseTo(Math.sqrt(least / 6), within(1e-9));
    }
  }

  @Test
  void aMistypedPointIsSuspected() {
    PlaneFit truth = random(new Random(3));
    List<ControlPoint> points = new ArrayList<>(points(truth, new Random(8), 5));
    ControlPoint p = points.get(2);
    points.set(
        2, new ControlPoint(p.x(), p.y(), new Position(p.at().eastM(), p.at().northM() + 5)));
    assertThat(PlaneFit.of(points, false).suspect()).hasValue(2);
    assertThat(PlaneFit.of(points(truth, new Random(8), 5), false).suspect()).isEmpty();
  }

  @Test
  void pointsThatFixNothingAreRefused() {
    ControlPoint p = new ControlPoint(5, 5, new Position(1, 1));
    assertThatThrownBy(() -> PlaneFit.of(List.of(p), false))
        .hasMessageContaining("number of control points is 1");
    assertThatThrownBy(() -> PlaneFit.of(List.of(p, p), false)).hasMessageContaining("one point");
    List<ControlPoint> line =
        List.of(
            p,
            new ControlPoint(105, 105, new Position(11, -9)),
            new ControlPoint(205, 205, new Position(21, -19)));
    assertThatThrownBy(() -> PlaneFit.of(line, true)).hasMessageContaining("one line");
    assertThat(PlaneFit.of(line, false).worstM()).isLessThan(1e-9);
  }

  @Test
  void tiesMoveByTheirMeanAndTellWhatIsLeft() {
    Ties ties =
        Ties.of(
            List.of(
                new Ties.Tie(new Position(0, 0), new Position(2, -1)),
                new Ties.Tie(new Position(10, 0), new Position(13, -1))));
    assertThat(ties.eastM()).isEqualTo(2.5);
    assertThat(ties.northM()).isEqualTo(-1);
    assertThat(ties.missesM()).containsExactly(0.5, 0.5);
  }

  private static Point2D at(PlaneFit fit, double x, double y) {
    return fit.pixelToPlane().transform(new Point2D.Double(x, y), null);
  }

  private static double squares(PlaneFit fit, List<ControlPoint> points) {
    return points.stream()
        .mapToDouble(p -> at(fit, p.x(), p.y()).distanceSq(p.at().eastM(), p.at().northM()))
        .sum();
  }

  private static PlaneFit random(Random random) {
    return PlaneFit.ofLength(
        new Point2D.Double(0, 0),
        new Point2D.Double(3, 4),
        0.5 + random.nextDouble(),
        random.nextDouble() * 360 - 180,
        new ControlPoint(
            random.nextInt(1000),
            random.nextInt(1000),
            new Position(random.nextInt(100), random.nextInt(100))));
  }

  private static List<ControlPoint> points(PlaneFit truth, Random random, int count) {
    List<ControlPoint> points = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      double x = random.nextInt(400) + 500 * (i % 2);
      double y = random.nextInt(400) + 500 * (i / 2 % 2);
      Point2D p = at(truth, x, y);
      points.add(new ControlPoint(x, y, new Position(p.getX(), p.getY())));
    }
    return points;
  }
}
