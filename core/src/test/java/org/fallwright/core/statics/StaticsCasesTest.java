package org.fallwright.core.statics;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The statics against what an independent model computed from the same rules for invented trees:
 * every figure to one part in a million. They show that two readings of the rules agree, not that
 * the rules are right.
 */
class StaticsCasesTest {
  static List<IndependentCases.Case> cases() {
    return IndependentCases.read();
  }

  @ParameterizedTest
  @MethodSource("cases")
  void everyFigureAgrees(IndependentCases.Case c) {
    Statics s = new Statics(c.pull());
    TreeSide t = s.treeSide();
    Map<String, Object> ours = new LinkedHashMap<>();
    ours.put("status", t.status().word());
    ours.put("hinge_offset_m", t.hinge().offsetM());
    ours.put("hinge_width_m", t.hinge().widthM());
    ours.put("steer_width_m", t.hinge().steerWidthM());
    ours.put("sit_back_deg", Math.toDegrees(t.hinge().sitBackRad()));
    ours.put("hinge_moment_Nm", t.hingeNm());
    ours.put("wind_moment_Nm", t.windNm());
    ours.put("wind_side_moment_Nm", t.windAsideNm());
    ours.put("u_g_m", t.ugM());
    ours.put("v_g_m", t.vgM());
    ours.put("weight_moment_0_Nm", t.weightNm());
    ours.put("commit_deg", Math.toDegrees(t.commitRad()));
    ours.put("movement_end_deg", Math.toDegrees(t.endRad()));
    ours.put("lever_min_m", t.leverMinM());
    ours.put("lever_lost_deg", Math.toDegrees(t.leverLostRad()));
    ours.put("thickness_that_would_m", t.thicknessThatWouldM());
    if (t.movable()) {
      Ratios r = Ratios.of(s, c.wedges(), c.source(), c.parts());
      ours.put("lever_0_m", t.leverM());
      ours.put("lever_sit_m", t.leverSitM());
      ours.put("pull_needed_N", t.neededN());
      ours.put("pull_plan_N", t.planN());
      ours.put("hold_tension_N", t.holdN());
      ours.put("working_tension_N", t.workingN());
      ours.put("rest_share", t.restShare());
      ours.put("hold_stability", r.holding().stability());
      ours.put("line_stiffness_N_per_m", t.lineNPerM());
      ours.put("path_stiffness_N_per_m", t.pathNPerM());
      ours.put("shortening_m", t.shorteningM());
      ours.put("take_up_m", t.takeUpM());
      ours.put("runs_on_stretch", t.neededN() / t.pathNPerM() > t.shorteningToCommitM());
      ours.put("starts_itself", r.holding().start().word());
      ours.put("pretension_top_N", r.holding().pretensionTopN());
      ours.put("gape_m", t.gapeM());
      ours.put("line_rise_deg", Math.toDegrees(t.riseRad()));
      ours.put("length_m", t.lengthM());
      ours.put("steer_share", t.steerShare());
      ours.put("turn_share", t.turnShare());
      ours.put("crush_share", t.crushShare());
      ours.put("stem_break_N", t.stemBreakN());
      ours.put("stem_weakest_m", t.stemWeakestM());
      ours.put("ceiling_N", r.ceiling().tensionN());
      ours.put("ceiling_part", r.ceiling().part());
      ours.put("source_high_N", r.source().highN());
      ours.put("source_low_N", r.source().lowN());
      compare(c.name() + ".checks", c.expected().get("checks"), r.byCheck(), List.of());
    }
    compare(c.name(), c.expected(), ours, List.of("checks", "blocks", "source_end_per_tree"));
  }

  private static void compare(
      String name, JsonNode expected, Map<String, ?> ours, List<String> elsewhere) {
    int compared = 0;
    for (var e : (Iterable<Map.Entry<String, JsonNode>>) expected.properties()) {
      if (elsewhere.contains(e.getKey())) {
        continue;
      }
      String what = name + " " + e.getKey();
      Object mine = ours.get(e.getKey());
      assertThat(mine).as(what).isNotNull();
      JsonNode theirs = e.getValue();
      compared++;
      if (theirs.isNull()) {
        assertThat((Double) mine).as(what).matches(x -> x.isNaN() || x.isInfinite(), "none");
      } else if (theirs.isNumber()) {
        double want = theirs.asDouble();
        assertThat((Double) mine)
            .as(what)
            .isCloseTo(
                want, org.assertj.core.data.Offset.offset(Math.max(1e-9, 1e-6 * Math.abs(want))));
      } else if (theirs.isBoolean()) {
        assertThat(mine).as(what).isEqualTo(theirs.asBoolean());
      } else {
        assertThat(mine).as(what).isEqualTo(theirs.asText());
      }
    }
    assertThat(compared).as(name + " compared something").isPositive();
  }
}
