package org.fallwright.core.tree;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MassCentreReferenceTest {
  /** Worked apart from this code from the same model; three digits of the height. */
  @ParameterizedTest
  @CsvSource({
    "PARABOLOID, 0.20, 0.35, 0.45, 0.395",
    "PARABOLOID, 0.22, 0.50, 0.35, 0.409",
    "PARABOLOID, 0.22, 0.30, 0.35, 0.380",
    "PARABOLOID, 0.30, 0.25, 0.45, 0.410",
    "PARABOLOID, 0.10, 0.60, 0.40, 0.376",
    "CONE, 0.20, 0.35, 0.45, 0.329",
    "CONE, 0.30, 0.25, 0.45, 0.351"
  })
  void shareOfTheHeight(StemForm stem, double crown, double base, double centre, double share) {
    double z = MassCentre.ofPartsM(stem, crown, base * 20, centre, 20);
    assertThat(z / 20).isCloseTo(share, within(6e-4));
  }

  @Test
  void aTreeWithoutCrownHasItsStemsCentre() {
    assertThat(MassCentre.ofPartsM(StemForm.CONE, 0, 5, 0.4, 20)).isEqualTo(5);
    assertThat(MassCentre.ofPartsM(StemForm.CONE, 1, 20, 0.4, 20)).isEqualTo(20);
    assertThatThrownBy(() -> MassCentre.ofPartsM(StemForm.CONE, 0.2, 21, 0.4, 20))
        .hasMessageContaining("crown_base_m is 21 m");
  }
}
