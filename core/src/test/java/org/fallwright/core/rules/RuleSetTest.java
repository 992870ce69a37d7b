package org.fallwright.core.rules;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.function.Function;
import org.junit.jupiter.api.Test;

class RuleSetTest {
  private static final RuleSets ALL = RuleSets.shipped();
  private static final List<Function<RuleSet, Rule>> EVERY =
      List.of(
          RuleSet::peopleRadiusFactor,
          RuleSet::stricterPeopleRadiusFactor,
          RuleSet::operatorRadiusFactor,
          RuleSet::teamException,
          RuleSet::leftStandingFactor,
          RuleSet::escapeLengthM,
          RuleSet::escapeBearingDeg,
          RuleSet::escapeOutsideCrown,
          RuleSet::fibreFactor,
          RuleSet::lineTwiceSource,
          RuleSet::redirectAnchorTwiceT,
          RuleSet::redirectGearOverSource,
          RuleSet::redirectStropOverSource,
          RuleSet::chokerOverSource,
          RuleSet::freeHandRule,
          RuleSet::extraAdviceTwoH,
          RuleSet::operatorBesideWinchM,
          RuleSet::moreOnSlopes);

  @Test
  void thereAreSevenSets() {
    assertThat(ALL.keys())
        .containsExactly("US-OSHA", "US-EM385", "UK", "DE-DGUV", "CA-BC", "AU", "NZ");
    assertThatThrownBy(() -> ALL.byKey("XX"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("US-OSHA");
  }

  @Test
  void theDateOfReadingIsYearAndMonth() {
    assertThat(ALL.dateRead()).matches("20\\d\\d-\\d\\d");
  }

  @Test
  void everySetAnswersEverything() {
    for (String key : ALL.keys()) {
      for (Function<RuleSet, Rule> ask : EVERY) {
        Rule rule = ask.apply(ALL.byKey(key));
        assertThat(rule.citation()).isNotBlank();
        assertThat(rule.fallback()).isEqualTo(rule.fallbackFrom() != null);
        assertThat(rule.fallbackFrom()).isNotEqualTo(key);
      }
    }
  }

  @Test
  void aFallbackIsTheStrictestOfAllSets() {
    for (Function<RuleSet, Rule> ask : EVERY) {
      List<Rule> rules = ALL.keys().stream().map(k -> ask.apply(ALL.byKey(k))).toList();
      for (Rule fallback : rules.stream().filter(Rule::fallback).toList()) {
        for (Rule other : rules) {
          boolean leastIsStrictest = fallback.basis().startsWith("whether people needed");
          double stricter =
              leastIsStrictest
                  ? other.value() - fallback.value()
                  : fallback.value() - other.value();
          assertThat(stricter).as(fallback.basis()).isNotNegative();
        }
      }
    }
  }

  @Test
  void aBlankCellSaysWhereItsRuleIsFrom() {
    Rule nz = ALL.byKey("NZ").operatorRadiusFactor();
    assertThat(nz.fallback()).isTrue();
    assertThat(nz.fallbackFrom()).isEqualTo("DE-DGUV");
    assertThat(nz.comparison()).isEqualTo(Comparison.MORE_THAN);
    assertThat(ALL.byKey("UK").lineTwiceSource().value()).isEqualTo(2);
    assertThat(ALL.byKey("UK").lineTwiceSource().fallbackFrom()).isEqualTo("DE-DGUV");
    assertThat(ALL.byKey("US-OSHA").lineTwiceSource().value()).isZero();
  }

  @Test
  void aSetListsEveryRuleWithWhatCounts() {
    for (String key : ALL.keys()) {
      RuleSet set = ALL.byKey(key);
      assertThat(set.entries()).as(key).hasSizeGreaterThan(25);
      for (RuleSet.Entry e : set.entries()) {
        e.own().ifPresent(own -> assertThat(e.used()).as(e.item()).contains(own));
        if (e.own().isEmpty() && e.used().isPresent()) {
          assertThat(e.used().get().fallback()).as(key + " " + e.item()).isTrue();
        }
      }
    }
    // a place's advice on its own lines is nobody else's rule
    assertThat(entry("NZ", "consult_poles").used()).isEmpty();
    assertThat(entry("UK", "consult_poles").used()).isPresent();
    assertThat(entry("NZ", "operator_radius").used().orElseThrow().fallbackFrom())
        .isEqualTo("DE-DGUV");
  }

  private static RuleSet.Entry entry(String key, String item) {
    return ALL.byKey(key).entries().stream()
        .filter(e -> e.item().equals(item))
        .findFirst()
        .orElseThrow();
  }

  @Test
  void whatIsFromMemoryAsksToBeVerified() {
    assertThat(Status.FROM_MEMORY.words()).isEqualTo("from memory, verify");
    assertThat(Status.READ.words()).isEqualTo("read");
  }

  @Test
  void onlyTheFederalSetHasATeamException() {
    for (String key : ALL.keys()) {
      assertThat(ALL.byKey(key).teamException().yes()).as(key).isEqualTo(key.equals("US-OSHA"));
    }
  }

  @Test
  void anUnknownVoltageHasNoDistance() {
    for (String key : ALL.keys()) {
      assertThat(ALL.byKey(key).approachDistanceM(null)).as(key).isEmpty();
      assertThat(ALL.byKey(key).approachDistanceM(1200.0)).as(key).isEmpty();
    }
  }

  @Test
  void noSetKeepsLessThanTheTableThatHoldsForAll() {
    for (String key : ALL.keys()) {
      double last = 0;
      for (double kv = 0.1; kv <= 1000; kv += 0.7) {
        double metres = ALL.byKey(key).approachDistanceM(kv).orElseThrow().value();
        double floor = ALL.table("US-EM385").distance(kv).orElseThrow().value();
        assertThat(metres).as("%s at %.1f kV", key, kv).isGreaterThanOrEqualTo(floor);
        // the end of a set's own table may hand over to the others, never to a shorter distance
        assertThat(metres).as("%s at %.1f kV", key, kv).isGreaterThanOrEqualTo(last);
        last = metres;
      }
    }
  }

  @Test
  void aSetWithoutATableTakesTheGreatestOfAll() {
    Rule de = ALL.byKey("DE-DGUV").approachDistanceM(12.47).orElseThrow();
    assertThat(de.fallback()).isTrue();
    assertThat(de.value()).isEqualTo(6.4);
    assertThat(de.fallbackFrom()).isEqualTo("AU");
    Rule bc = ALL.byKey("CA-BC").approachDistanceM(12.47).orElseThrow();
    assertThat(bc.fallbackFrom()).isEqualTo("US-EM385");
    Rule low = ALL.byKey("CA-BC").approachDistanceM(0.4).orElseThrow();
    assertThat(low.value()).isEqualTo(bc.value());
  }

  @Test
  void aWireBetweenOneAndTwoLengthsIsAmberOnlyWhereARuleAsks() {
    // 17.5 m tree, wire at 26.5 m, 3.05 m asked
    assertThat(WireReach.of(26.5, 17.5, 3.05, ALL.byKey("US-OSHA"))).isEqualTo(WireReach.ADVICE);
    assertThat(WireReach.of(26.5, 17.5, 3.05, ALL.byKey("CA-BC"))).isEqualTo(WireReach.AMBER);
    assertThat(WireReach.of(20.0, 17.5, 3.05, ALL.byKey("CA-BC"))).isEqualTo(WireReach.STOP);
    assertThat(WireReach.of(20.55, 17.5, 3.05, ALL.byKey("NZ"))).isEqualTo(WireReach.STOP);
    assertThat(WireReach.of(38.1, 17.5, 3.05, ALL.byKey("CA-BC"))).isEqualTo(WireReach.BEYOND);
  }
}
