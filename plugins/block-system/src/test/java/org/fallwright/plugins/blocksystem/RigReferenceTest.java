package org.fallwright.plugins.blocksystem;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.fallwright.core.line.Sheave;
import org.fallwright.core.outside.CheckValue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RigReferenceTest {
  /** Hand-worked products of sums of powers: both tackles hauled from their moving blocks. */
  @ParameterizedTest
  @CsvSource({
    "3, 2, 0.95, 5.562",
    "3, 2, 0.90, 5.149",
    "3, 2, 0.80, 4.392",
    "3, 3, 0.95, 8.137",
    "3, 3, 0.90, 7.344",
    "3, 3, 0.80, 5.954",
    "3, 3, 0.50, 3.062",
  })
  void compoundsByPartsAndEfficiency(int first, int second, double k, double gain) {
    Rig rig = new Rig(new Tackle(first, k, false), new Tackle(second, k, false));
    CheckValue.of("Product of sums of powers of k", first + " by " + second + ", k " + k, gain, "")
        .worked()
        .isMet(rig.gain(), 0.00051);
    assertThat(rig.parts()).isEqualTo(first * second);
  }

  /**
   * A light-artillery handbook loses a tenth to each sheave: two double blocks give 3 1/3, a double
   * and a treble 4. The k of a tenth comes within 6 % of both, on the low side.
   */
  @ParameterizedTest
  @CsvSource({"4, 3.3333", "5, 4"})
  void aTenthASheave(int parts, double published) {
    double k = Sheave.TACKLE.low();
    double ours = new Tackle(parts, k, true).gain();
    CheckValue.of(
            "Handbook for Light Artillery", parts + " parts at a tenth a sheave", published, "")
        .isNotExceeded(ours);
    assertThat(ours).isCloseTo(published, within(0.06 * published));
  }

  /** A university rescue course: 3:1 over connectors in place of pulleys behaves as about 2:1. */
  @Test
  void threeToOneOverConnectors() {
    double ours = new Tackle(3, Sheave.CONNECTOR.low(), false).gain();
    CheckValue.of("University of Oregon, mechanical advantage", "3:1 without pulleys", 2, "")
        .isNotExceeded(ours);
    assertThat(ours).isGreaterThan(1.5);
  }

  /** Quick form 1/(1 + S x/100), 4 sheaves of 9 %: 2.941, which is lower than ours of 3.24. */
  @Test
  void theQuickFormIsLower() {
    CheckValue.of("Quick form of block friction, after Kemp and Young", "4 on 4, 9 %", 2.941, "")
        .worked()
        .isReached(new Tackle(4, 1 / 1.09, true).gain());
  }

  /** Nine parts move 13.5 m of haul for 1.5 m of load. */
  @Test
  void nineTimesTheWay() {
    Rig rig = new Rig(new Tackle(3, 0.9, false), new Tackle(3, 0.9, false));
    CheckValue.of("Parts times way", "9 parts, load moves 1.5 m", 13.5, "m")
        .worked()
        .isMet(rig.parts() * 1.5, 0);
  }

  /** A rescue handbook's throws: 10 ft of a 3:1 need a second stage of 30 ft. */
  @Test
  void theSecondStageMustTravelThreeTimesAsFar() {
    Rig rig = new Rig(new Tackle(3, 0.9, false), new Tackle(2, 0.9, false));
    double throwOfFirst = Throw.of(rig, 30 + Throw.CLOSE_M).metres();
    CheckValue.of(
            "Rope-rescue training, mechanical advantage systems",
            "throw of a 3:1 with 30 ft for the second stage",
            10,
            "ft")
        .isMet(throwOfFirst, 1e-9);
  }

  /**
   * Worked apart: the compliance of both tackles, the second three times as long, against one leg
   * of six parts with the stiffness divided.
   */
  @Test
  void oneLegGivesWayAsTheCompoundDoes() {
    Rig rig = new Rig(new Tackle(3, 0.9, false), new Tackle(2, 0.9, false));
    double ea = 400_000;
    double apart = 3;
    double first = 3 * apart * (1 / 3.0) * (1 / 3.0) / ea;
    double second = 2 * (3 * apart) * (1 / 6.0) * (1 / 6.0) / ea;
    double oneLeg = 6 * apart * (1 / 6.0) * (1 / 6.0) / (ea / rig.softerBy());
    assertThat(oneLeg).isCloseTo(first + second, within(1e-15));
  }
}
