package org.fallwright.core.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.fallwright.core.outside.CheckValue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SurfaceTableTest {
  @Test
  void wetIsNeverBetterAndTheHighIsThatOfTheDryState() {
    assertThat(SurfaceTable.keys()).hasSizeGreaterThanOrEqualTo(8);
    for (String key : SurfaceTable.keys()) {
      Surface wet = SurfaceTable.of(key, true);
      Surface dry = SurfaceTable.of(key, false);
      assertThat(wet.tyreLow()).as(key).isLessThanOrEqualTo(dry.tyreLow());
      assertThat(wet.bootLow()).as(key).isLessThanOrEqualTo(dry.bootLow());
      assertThat(wet.personLowN()).as(key).isLessThanOrEqualTo(dry.personLowN());
      assertThat(wet.rolling()).as(key).isGreaterThanOrEqualTo(dry.rolling());
      assertThat(wet.tyreHigh()).as(key).isEqualTo(dry.tyreHigh());
      assertThat(wet.bootHigh()).as(key).isEqualTo(dry.bootHigh());
      assertThat(wet.personHighN()).as(key).isEqualTo(dry.personHighN());
    }
  }

  @Test
  void anUnknownGroundIsRefusedWithWhatComesNear() {
    assertThatThrownBy(() -> SurfaceTable.of("gravel", true))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("\"gravel\"")
        .hasMessageContaining("compact-gravel");
  }

  /**
   * Noon 1994, averages, as tabulated in public: wet grass 0.20, gravel and dirt road 0.35, dry
   * asphalt 0.65, dry and wet concrete 0.75 and 0.60. Tree Rescue Manual 2022: tyres on grass 0.35.
   */
  @ParameterizedTest
  @CsvSource({
    "grass, true, 0.20",
    "grass, false, 0.35",
    "compact-gravel, true, 0.35",
    "earth, false, 0.35",
    "asphalt, false, 0.65",
    "concrete, false, 0.75",
    "concrete, true, 0.60"
  })
  void publishedTyreGrip(String key, boolean wet, double grip) {
    String source =
        key.equals("grass") && !wet
            ? "Arboriculture Australia 2022, Tree Rescue Manual p. 214"
            : "Noon 1994, coefficients of traction, by a public table";
    CheckValue.of(source, key + (wet ? ", wet" : ", dry") + ", tyre grip", grip, "")
        .isMet(SurfaceTable.of(key, wet).tyreLow(), 0);
  }

  /** Navin et al. 1996 (abstract): traction on packed snow 0.20 car, 0.15 truck; ice 0.08, 0.04. */
  @Test
  void snowAndIceAreTakenAtTheLeastMeasured() {
    String source = "Navin et al. 1996 (abstract), trucks";
    CheckValue.of(source, "packed snow, traction", 0.15, "")
        .isMet(SurfaceTable.of("snow", false).tyreLow(), 0);
    CheckValue.of(source, "ice, traction", 0.04, "")
        .isMet(SurfaceTable.of("ice", false).tyreLow(), 0);
  }

  @Test
  void aPersonOnGrassPullsByTheTractionClass() {
    assertThat(SurfaceTable.of("grass", true).personLowN()).isEqualTo(110);
    assertThat(SurfaceTable.of("grass", true).personHighN()).isEqualTo(200);
    assertThat(SurfaceTable.of("asphalt", false).personLowN()).isEqualTo(310);
    assertThat(SurfaceTable.figures("grass", true))
        .filteredOn(f -> f.key().endsWith("person-low"))
        .allMatch(f -> f.kind() == Kind.FROM_MEMORY);
  }
}
