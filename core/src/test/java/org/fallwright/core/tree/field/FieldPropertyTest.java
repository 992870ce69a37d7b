package org.fallwright.core.tree.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.fallwright.core.units.Units;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FieldPropertyTest {
  private static double in(Random r, double least, double most) {
    return least + r.nextDouble() * (most - least);
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3})
  void bothScalesGiveTheSame(long seed) {
    Random r = new Random(seed);
    for (int i = 0; i < 100; i++) {
      double top = in(r, 5, 60);
      double base = in(r, -30, 4);
      double d = in(r, 5, 60);
      double degrees = new TapedHeight(d, Reading.degrees(top), Reading.degrees(base)).heightM();
      double percent =
          new TapedHeight(
                  d,
                  Reading.percent(Units.percentOfDegrees(top)),
                  Reading.percent(Units.percentOfDegrees(base)))
              .heightM();
      assertThat(percent).as("seed %d", seed).isCloseTo(degrees, within(1e-9 * degrees));
    }
  }

  /** What is read of a leaner, put right, is its height again; towards reads more, away less. */
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3})
  void theErrorOfALeanIsTakenOutAgain(long seed) {
    Random r = new Random(seed);
    for (int i = 0; i < 100; i++) {
      double height = in(r, 5, 40);
      double lean = in(r, -15, 15);
      double d = in(r, height, 2 * height);
      double eye = in(r, -3, 3);
      double read = TapedHeight.readM(height, lean, d, eye);
      TapedHeight taped =
          new TapedHeight(
              d, Reading.percent(100 * (read - eye) / d), Reading.percent(-100 * eye / d));
      assertThat(taped.heightOfLeanerM(lean))
          .as("seed %d, lean %s", seed, lean)
          .isCloseTo(height, within(1e-9 * height));
      assertThat(Math.signum(read - height)).as("seed %d", seed).isEqualTo(Math.signum(lean));
    }
  }

  /** A tree set up with its tip aside, read from its true place, gets its height back. */
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3})
  void aTipAsideIsReckonedWith(long seed) {
    Random r = new Random(seed);
    for (int i = 0; i < 100; i++) {
      double height = in(r, 5, 40);
      double lean = in(r, -20, 20);
      double d = in(r, height, 2 * height);
      double eye = in(r, -3, height + 5);
      double off = Math.hypot(d, height * Math.tan(Math.toRadians(lean)));
      TapedHeight taped =
          new TapedHeight(
              d, Reading.percent(100 * (height - eye) / off), Reading.percent(-100 * eye / d));
      assertThat(taped.heightSquareToLeanM(lean))
          .as("seed %d, lean %s", seed, lean)
          .isCloseTo(height, within(1e-9 * height));
    }
  }

  /** Two views of any tree from any two sides give its lean back; turning all turns the lean. */
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3})
  void twoViewsGiveTheLeanBack(long seed) {
    Random r = new Random(seed);
    for (int i = 0; i < 100; i++) {
      Lean lean = new Lean(in(r, 0.1, 30), in(r, 0, 360));
      double one = in(r, 0, 360);
      double other = (one + (r.nextBoolean() ? 1 : -1) * in(r, 60, 120) + 360) % 360;
      Lean seen = Lean.byTwoViews(view(lean, one), view(lean, other));
      assertThat(seen.deg()).as("seed %d", seed).isCloseTo(lean.deg(), within(1e-6));
      double apart = Math.abs(seen.azimuthDeg() - lean.azimuthDeg());
      assertThat(Math.min(apart, 360 - apart)).as("seed %d", seed).isCloseTo(0, within(1e-6));
    }
  }

  private static SideView view(Lean lean, double azimuth) {
    return new SideView(azimuth, Reading.degrees(lean.partDeg(azimuth + 90)));
  }
}
