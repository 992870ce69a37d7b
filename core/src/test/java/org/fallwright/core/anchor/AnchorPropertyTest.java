package org.fallwright.core.anchor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.fallwright.core.tree.StemVolume;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class AnchorPropertyTest {
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void twoLegsGiveBackTheLoad(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < 200; i++) {
      double a = 1 + 70 * random.nextDouble();
      double b = 1 + 70 * random.nextDouble();
      double r = 1000 * random.nextDouble();
      TwoLegs legs = TwoLegs.share(r, a, b);
      double along =
          legs.firstN() * Math.cos(Math.toRadians(a))
              + legs.secondN() * Math.cos(Math.toRadians(b));
      double across =
          legs.firstN() * Math.sin(Math.toRadians(a))
              - legs.secondN() * Math.sin(Math.toRadians(b));
      assertThat(along).as("seed %d", seed).isCloseTo(r, within(1e-8));
      assertThat(across).as("seed %d", seed).isCloseTo(0, within(1e-8));
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {11, 12, 13, 14})
  void higherSlingsAndWetterGroundNeverHoldMore(long seed) {
    Random random = new Random(seed);
    WoodFigures wood = new WoodFigures(50e6, 0.16, 900, 77.4, StemVolume.PINE);
    for (int i = 0; i < 200; i++) {
      double dbh = 0.25 + random.nextDouble();
      double height = 5 + 25 * random.nextDouble();
      double z = 3 * random.nextDouble();
      Capacity low = capacity(dbh, height, z, false, wood);
      Capacity high = capacity(dbh, height, z + random.nextDouble(), false, wood);
      Capacity wet = capacity(dbh, height, z, true, wood);
      assertThat(high.strengthN()).as("seed %d", seed).isLessThanOrEqualTo(low.strengthN());
      assertThat(wet.strengthN()).as("seed %d", seed).isLessThanOrEqualTo(low.strengthN());
      assertThat(low.strengthN()).as("seed %d", seed).isPositive();
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {21, 22, 23, 24})
  void aSteeperLineOrSlopeNeverHoldsMore(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < 200; i++) {
      double grip = random.nextDouble();
      double slope = -20 + 30 * random.nextDouble();
      double rise = 20 * random.nextDouble();
      double base = LockedWheels.slidesAtN(2000, grip, slope, rise);
      double steeper = LockedWheels.slidesAtN(2000, grip, slope + 5, rise);
      double scaled = LockedWheels.slidesAtN(4000, grip, slope, rise);
      assertThat(steeper).as("seed %d", seed).isLessThanOrEqualTo(base);
      assertThat(scaled).as("seed %d", seed).isCloseTo(2 * base, within(1e-6));
    }
  }

  private static Capacity capacity(
      double dbh, double height, double sling, boolean wet, WoodFigures wood) {
    return AnchorCapacity.of(
        Anchors.sound(dbh, height, sling, wet), new AnchorLoad(0, false), Anchors.figures(wood, 0));
  }
}
