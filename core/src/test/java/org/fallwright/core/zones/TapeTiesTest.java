package org.fallwright.core.zones;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.TapeTie;
import org.fallwright.core.site.Target;
import org.junit.jupiter.api.Test;

class TapeTiesTest {
  /** Stump and house from an aerial picture: 3 m each. */
  private static final Place STUMP = new Place(Things.at(0, 0), 0, Fix.PICTURE, null);

  private static final Target HOUSE =
      new Target(
          "House",
          Target.Kind.STRUCTURE,
          Things.polygon(0, 10, 10, 10, 10, 18, 0, 18),
          Fix.PICTURE,
          null,
          0,
          5,
          1.5,
          true,
          false,
          false);

  private static TapeTie to(double east, double north, double taped) {
    return new TapeTie("T1", null, "House", Things.at(east, north), taped, null);
  }

  private static double error(TapeTie... ties) {
    return new TapeTies(List.of(ties), "T1", STUMP, List.of(HOUSE)).errorM(HOUSE);
  }

  @Test
  void withoutTapesBothErrorsCount() {
    assertThat(error()).isEqualTo(6);
  }

  @Test
  void oneTapeSaysNothingAcrossItself() {
    TapeTies one = new TapeTies(List.of(to(0, 10, 10)), "T1", STUMP, List.of(HOUSE));
    assertThat(one.errorM(HOUSE)).isEqualTo(6);
    assertThat(one.oneWayOnly(HOUSE)).isTrue();
  }

  /**
   * By hand: the corners stand at azimuths 0 and 45 degrees; 0.2 m each way leaves sqrt(0.04 + 0.04
   * + 0.08 cos 45) / sin 45 = 0.5226 m.
   */
  @Test
  void twoTapesThatCrossCapTheError() {
    double error = error(to(0, 10, 10), to(10, 10, Math.sqrt(200)));
    assertThat(error).isCloseTo(0.5226, within(1e-4));
    // the order of the ends does not matter
    TapeTie back = new TapeTie("House", Things.at(0, 10), "T1", null, 10, null);
    assertThat(error(back, to(10, 10, Math.sqrt(200)))).isCloseTo(error, within(1e-12));
  }

  @Test
  void tapesThatHardlyCrossCapNothing() {
    assertThat(error(to(0, 10, 10), to(2, 10, Math.sqrt(104)))).isEqualTo(6);
  }

  @Test
  void aTapeThatIsOffTheDrawingLeavesItsDifferenceToo() {
    double exact = error(to(0, 10, 10), to(10, 10, Math.sqrt(200)));
    assertThat(error(to(0, 10, 10.7), to(10, 10, Math.sqrt(200)))).isGreaterThan(exact + 0.7);
  }

  @Test
  void aTapeThatContradictsTheDrawingCountsAgainstIt() {
    TapeTies off =
        new TapeTies(
            List.of(to(0, 10, 18), to(10, 10, Math.sqrt(200))), "T1", STUMP, List.of(HOUSE));
    assertThat(off.disagreementM(HOUSE)).hasValue(8);
    assertThat(off.errorM(HOUSE)).isEqualTo(8);
  }

  /** Whatever is taped within its error, the true place is no farther off than is said. */
  @Test
  void theTruePlaceIsNeverFartherThanSaid() {
    for (long seed = 1; seed <= 200; seed++) {
      Random r = new Random(seed);
      double ex = 2 * r.nextDouble() - 1;
      double ny = 2 * r.nextDouble() - 1;
      TapeTie[] ties = new TapeTie[2];
      double[][] corners = {{0, 10}, {10, 10}};
      for (int i = 0; i < 2; i++) {
        double off = 0.4 * r.nextDouble() - 0.2;
        Position truth = Things.at(corners[i][0] + ex, corners[i][1] + ny);
        ties[i] = to(corners[i][0], corners[i][1], Things.at(0, 0).distanceTo(truth) + off);
      }
      // a metre off at ten metres turns the tape's direction a little: a tenth of a metre for that
      assertThat(error(ties) + 0.15).as("seed %d", seed).isGreaterThan(Math.hypot(ex, ny));
    }
  }

  @Test
  void tiesOfOtherThingsAndLooserTiesChangeNothing() {
    TapeTie other = new TapeTie("T1", null, "A1", null, 29, null);
    assertThat(error(other)).isEqualTo(6);
    TapeTie loose = new TapeTie("T1", null, "House", Things.at(0, 10), 10, 8.0);
    TapeTie loose2 = new TapeTie("T1", null, "House", Things.at(10, 10), Math.sqrt(200), 8.0);
    assertThat(error(loose, loose2)).as("never more than without").isEqualTo(6);
  }
}
