package org.fallwright.core.reference;

import static org.assertj.core.api.Assertions.assertThat;

import java.lang.reflect.Modifier;
import java.util.Arrays;
import java.util.HashSet;
import java.util.Set;
import org.fallwright.core.outside.CheckValue;
import org.junit.jupiter.api.Test;

class AllowancesTest {
  private static final Set<String> UNITS =
      Set.of("", "m", "m/s", "s", "deg", "kg/m³", "N·m/kg", "N", "Pa");

  @Test
  void everyRuleConstantSaysWhatItIsForAndInWhatUnit() {
    assertThat(Allowances.all())
        .allSatisfy(
            f -> {
              assertThat(f.note()).as(f.key()).hasSizeGreaterThan(10);
              assertThat(f.unit()).as(f.key()).isIn(UNITS);
            });
  }

  @Test
  void noTwoRuleConstantsShareAKey() {
    Set<String> keys = new HashSet<>();
    assertThat(Allowances.all()).allMatch(f -> keys.add(f.key()));
  }

  @Test
  void everyConstantOfTheClassIsInTheList() {
    assertThat(
            Arrays.stream(Allowances.class.getFields())
                .filter(f -> Modifier.isStatic(f.getModifiers()) && f.getType() == Figure.class)
                .map(
                    f -> {
                      try {
                        return (Figure) f.get(null);
                      } catch (IllegalAccessException e) {
                        throw new AssertionError(e);
                      }
                    }))
        .hasSizeGreaterThan(80)
        .allMatch(Allowances.all()::contains);
  }

  @Test
  void anAllowanceOfOursClaimsNoSource() {
    assertThat(Allowances.all())
        .filteredOn(f -> f.kind() == Kind.PLANNING_ALLOWANCE || f.kind() == Kind.COMMON_PRACTICE)
        .allMatch(f -> f.source().isEmpty());
  }

  @Test
  void whatBelongsTogetherStaysInOrder() {
    double least = Allowances.HINGE_K_LEAST.value();
    double most = Allowances.HINGE_K_MOST.value();
    assertThat(Allowances.HINGE_K_MEAN.value()).isEqualTo((least + most) / 2);
    assertThat(Allowances.HINGE_K_P05.value()).isEqualTo(least + 0.05 * (most - least));
    assertThat(Allowances.HINGE_K_P95.value()).isEqualTo(least + 0.95 * (most - least));
    assertThat(Allowances.HOLD_STABILITY_WORKABLE.value())
        .isEqualTo(Allowances.HOLD_STABILITY_ASKED.value() * Allowances.WORKABLE_RATIO.value());
    assertThat(Allowances.REST_LEAST.value()).isLessThan(Allowances.REST_LEAST_WEDGED.value());
    assertThat(Allowances.DEVICE_LOW.value()).isLessThan(1);
    assertThat(Allowances.DEVICE_HIGH.value()).isGreaterThan(1);
  }

  @Test
  void publishedProportionsAreThoseOfTheirSources() {
    CheckValue.of("OSHA Logging eTool, hinge", "hinge width over diameter", 0.8, "")
        .isMet(Allowances.HINGE_WIDTH_SHARE.value(), 0);
    CheckValue.of("OSHA Logging eTool, hinge", "hinge thickness over diameter", 0.1, "")
        .isMet(Allowances.HINGE_THICKNESS_SHARE.value(), 0);
    // leaves add from 40 to 100 % to bare branches; the least of it counts
    CheckValue.of("Drag of leafy willow and robinia, 2011", "bare over leafy", 1 / 1.4, "")
        .isMet(Allowances.LEAFLESS_DRAG.value(), 0.015);
    CheckValue.of("Mayhead 1973", "least wind of the fits", 10, "m/s")
        .isMet(Allowances.WIND_CLAMP.value(), 0);
    CheckValue.of("ISO 2533, sea level and 15 °C", "density of air", 1.225, "kg/m³")
        .fromMemory()
        .isMet(Allowances.AIR_DENSITY.value(), 0.01);
  }
}
