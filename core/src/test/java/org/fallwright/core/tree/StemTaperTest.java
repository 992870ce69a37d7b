package org.fallwright.core.tree;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.StemDiameter;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class StemTaperTest {
  /** By hand: 0.58/0.94 at 0.30 m, 0.52 at 1.3 m, 0.42 at 6.0, 0.30 at 10.5, nothing at 17.5 m. */
  @ParameterizedTest
  @CsvSource({
    "0, 0.617021",
    "0.30, 0.617021",
    "0.80, 0.568511",
    "1.3, 0.52",
    "3.65, 0.47",
    "6.0, 0.42",
    "8.25, 0.36",
    "10.5, 0.30",
    "14.0, 0.15",
    "17.5, 0"
  })
  void overBark(double heightM, double diameterM) {
    StemTaper taper = StemTaper.of(SampleTree.oak(), SampleTree.CUT);
    assertThat(taper.overBarkM(heightM)).isCloseTo(diameterM, within(1e-6));
    assertThat(taper.insideBarkM(heightM)).isCloseTo(0.94 * diameterM, within(1e-6));
  }

  @Test
  void aboveTheTreeThereIsNoStem() {
    StemTaper taper = StemTaper.of(SampleTree.oak(), SampleTree.CUT);
    assertThatThrownBy(() -> taper.overBarkM(17.6))
        .hasMessage("height_m is 17.6 m; it must be from 0 to 17.5 m");
  }

  @Test
  void dbhWinsOverAFurtherDiameterAtItsHeight() {
    List<StemDiameter> twice = List.of(new StemDiameter(1.3, 0.9), new StemDiameter(17.5, 0.2));
    StemTaper taper =
        StemTaper.of(
            SampleTree.oak(Quantity.measured(0.52), Quantity.measured(0.58), twice, null, null),
            SampleTree.CUT);
    assertThat(taper.overBarkM(1.3)).isEqualTo(0.52);
    assertThat(taper.overBarkM(17.5)).isZero();
  }

  @Test
  void aStumpNotMeasuredIsFlaredFromDbh() {
    assertThat(
            StemTaper.stumpInsideBarkM(
                SampleTree.oak(Quantity.measured(0.50), null, List.of(), null, null)))
        .isCloseTo(0.517, within(1e-12));
  }

  /** The exact sum of cone stumps against a thousand thin slices. */
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void volumeIsThatOfItsSlices(long seed) {
    Random random = new Random(seed);
    double dbh = 0.1 + random.nextDouble();
    List<StemDiameter> more =
        List.of(
            new StemDiameter(2 + 3 * random.nextDouble(), 0.9 * dbh),
            new StemDiameter(6 + 6 * random.nextDouble(), 0.6 * dbh));
    StemTaper taper =
        StemTaper.of(
            SampleTree.oak(Quantity.measured(dbh), null, more, null, null), SampleTree.CUT);
    int slices = 20_000;
    double dz = 17.5 / slices;
    double sum = 0;
    for (int i = 0; i < slices; i++) {
      double d = taper.overBarkM((i + 0.5) * dz);
      sum += Math.PI / 4 * d * d * dz;
    }
    assertThat(taper.volumeM3()).as("seed %d", seed).isCloseTo(sum, within(1e-6 * sum));
  }
}
