package org.fallwright.core.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.fallwright.core.site.Anchor.Soil;
import org.junit.jupiter.api.Test;

class SpeciesTableTest {
  @Test
  void anUnknownSpeciesIsRefusedWithWhatComesNear() {
    assertThatThrownBy(() -> SpeciesTable.of("red-oak"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageStartingWith("species is \"red-oak\"; it must be one of the table, such as ")
        .hasMessageContaining("northern-red-oak");
    assertThatThrownBy(() -> SpeciesTable.of("norway-spruse"))
        .hasMessageContaining("norway-spruce");
    assertThatThrownBy(() -> SpeciesTable.of(null)).isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void whatIsNotKnownOfASpeciesIsFilledInAndSaysSo() {
    Species elm = SpeciesTable.of("american-elm");
    assertThat(elm.crushPa().value()).isCloseTo(0.42 * elm.morPa().value(), within(1.0));
    assertThat(elm.crushPa().kind()).isEqualTo(Kind.PLANNING_ALLOWANCE);
    assertThat(elm.crushPa().note()).startsWith("none known for this species");
    assertThat(elm.assumed()).contains(elm.crushPa(), elm.shearPa(), elm.knotFactor());
    assertThat(elm.assumed()).doesNotContain(elm.morPa(), elm.greenDensity());
    Species oak = SpeciesTable.of("northern-red-oak");
    assertThat(oak.assumed()).doesNotContain(oak.crushPa(), oak.shearPa());
  }

  /** The allowances for shear and crushing stay at or below every ratio that was read. */
  @Test
  void theStandInsForStrengthAreNoBetterThanAnySpeciesRead() {
    for (Species s : SpeciesTable.all()) {
      assertThat(s.shearPa().value() / s.morHolds())
          .as(s.key())
          .isGreaterThanOrEqualTo(Allowances.SHEAR_OVER_RUPTURE.value() - 1e-9);
      assertThat(s.crushPa().value() / s.morHolds())
          .as(s.key())
          .isGreaterThanOrEqualTo(Allowances.CRUSH_OVER_RUPTURE.value() - 1e-2);
    }
  }

  @Test
  void aSpeciesWithoutPullingTestsHasTheLeastRootPlateAndIsMarked() {
    Figure oak = SpeciesTable.of("white-oak").rootPlate(Soil.FREE_DRAINING_MINERAL, true);
    assertThat(oak).isEqualTo(Allowances.ROOT_PLATE_LEAST);
    assertThat(oak.kind()).isEqualTo(Kind.PLANNING_ALLOWANCE);
    for (Species s : SpeciesTable.all()) {
      for (Soil soil : Soil.values()) {
        double shallow = s.rootPlate(soil, false).value();
        assertThat(shallow).as(s.key()).isGreaterThanOrEqualTo(oak.value());
        assertThat(s.rootPlate(soil, true).value()).as(s.key()).isGreaterThanOrEqualTo(shallow);
      }
    }
  }

  @Test
  void sourcesThatDisagreeOnDensityBothStay() {
    Species fir = SpeciesTable.of("douglas-fir-coast");
    assertThat(fir.densityLow()).isEqualTo(609);
    assertThat(fir.greenDensity().value()).isEqualTo(689);
    assertThat(fir.densityHigh()).isEqualTo(850);
  }

  /** Low where the wood must hold, high where it resists; nothing else tells the two apart. */
  @Test
  void sourcesThatDisagreeOnRuptureBothStay() {
    Species sitka = SpeciesTable.of("sitka-spruce");
    assertThat(sitka.morHolds()).isEqualTo(34e6);
    assertThat(sitka.morResists()).isEqualTo(39.3e6);
    Species elm = SpeciesTable.of("american-elm");
    assertThat(elm.morHolds()).isEqualTo(elm.morResists()).isEqualTo(elm.morPa().value());
    for (Species s : SpeciesTable.all()) {
      assertThat(s.morPa().value()).as(s.key()).isBetween(s.morHolds(), s.morResists());
    }
  }

  @Test
  void everySpeciesHasItsOwnNameInBothLanguages() {
    assertThat(SpeciesTable.all().stream().map(Species::spanish).distinct())
        .hasSize(SpeciesTable.all().size());
    assertThat(SpeciesTable.of("northern-red-oak").spanish()).isEqualTo("roble rojo americano");
  }

  @Test
  void aBareBroadleafHasLessDragAndAConiferHasNot() {
    Species oak = SpeciesTable.of("northern-red-oak");
    assertThat(oak.drag(4, true)).isEqualTo(0.4);
    assertThat(oak.drag(4, false)).isCloseTo(0.28, within(1e-12));
    Species pine = SpeciesTable.of("scots-pine");
    assertThat(pine.drag(12, false)).isEqualTo(pine.drag(12, true));
  }

  @Test
  void thereAreEnoughSpeciesAndEachHasItsOwnName() {
    assertThat(SpeciesTable.all()).hasSizeGreaterThanOrEqualTo(90);
    assertThat(SpeciesTable.all().stream().map(Species::name).distinct())
        .hasSize(SpeciesTable.all().size());
    assertThat(SpeciesTable.all().stream().map(Species::key))
        .contains(
            "northern-red-oak",
            "white-oak",
            "paper-birch",
            "norway-spruce",
            "eastern-white-pine",
            "loblolly-pine",
            "black-cherry",
            "douglas-fir-coast",
            "sugar-maple",
            "white-ash",
            "yellow-poplar",
            "american-beech");
  }
}
