package org.fallwright.core.worksheet;

import static org.fallwright.core.worksheet.Dimension.FORCE;
import static org.fallwright.core.worksheet.Dimension.LENGTH;
import static org.fallwright.core.worksheet.Dimension.NUMBER;
import static org.fallwright.core.worksheet.Dimension.STIFFNESS;

import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.statics.Part;
import org.fallwright.core.statics.Ratios;
import org.fallwright.core.statics.TreeSide;

/** Every part at plan and at the most the source can do, the ceiling, the source and its margin. */
final class PartLines {
  private final Workings w;
  private final Reckoned r;
  private final Ratios ratios;
  private final TreeSide side;
  private final Deque<String> anchors;

  PartLines(Workings w, Reckoned r, Deque<String> anchors) {
    this.w = w;
    this.r = r;
    ratios = r.ratios();
    side = r.statics().treeSide();
    this.anchors = anchors;
  }

  void write() {
    List<Part> parts = ratios.parts();
    List<String> ceilings = new ArrayList<>();
    for (int i = 0; i < parts.size(); i++) {
      part(i + 1, parts.get(i));
      ceilings.add("C_" + (i + 1));
    }
    w.section("Ceiling");
    w.note(
        "The least tension at the tree that brings a part to what it is allowed as planned: "
            + ratios.ceiling().part()
            + ".");
    w.work(
        "C",
        "ceiling",
        ceilings.size() == 1 ? "C_1" : "min(" + String.join(", ", ceilings) + ")",
        FORCE,
        Basis.STATICS);
    w.compare("C", ratios.ceiling().tensionN(), FORCE);
    source();
    for (int i = 0; i < parts.size(); i++) {
      high(i + 1, parts.get(i));
    }
  }

  private void part(int i, Part p) {
    w.section("As planned: " + p.name());
    strength(i, p);
    loads(i, p);
    w.work(
        "x_" + i, "the greater of the two", "max(y_" + i + ", j_" + i + ")", NUMBER, Basis.STATICS);
    w.work("A_" + i, "load allowed as planned", "B_" + i + " ÷ F_" + i, FORCE, Basis.RULE);
    w.work("U_" + i, "load as planned", "T_work × x_" + i, FORCE, Basis.STATICS);
    w.work(
        "C_" + i,
        "tension at the tree that brings it there",
        "A_" + i + " ÷ x_" + i,
        FORCE,
        Basis.STATICS);
    double exact = ratios.byCheck().get(p.name() + " at plan");
    if (Double.isFinite(exact)) {
      w.work(
          "R_" + i,
          p.name() + ", allowed over load as planned",
          "A_" + i + " ÷ U_" + i,
          NUMBER,
          Basis.RULE);
      w.compare("R_" + i, exact, NUMBER);
    }
  }

  private void strength(int i, Part p) {
    String b = "B_" + i;
    String f = "F_" + i;
    String factor = "factor asked as planned";
    if (p.name().equals("stem")) {
      w.work(b, "strength", "B_stem", FORCE, Basis.BEAM_THEORY);
      w.given(f, factor, Allowances.STEM_FACTOR, NUMBER);
    } else if (p.name().startsWith("anchor ")) {
      w.work(b, "strength", anchors.removeFirst(), FORCE, Basis.STATICS);
      w.given(f, factor, p.designFactor(), NUMBER, Basis.PLANNING_ALLOWANCE);
    } else if (p.name().equals("line " + r.line().line().id())) {
      new GearLines(w).line(r.line());
      w.work(b, "strength", "b_l × q_e × q_k × q_n × q_j × q_a", FORCE, Basis.COMMON_PRACTICE);
      w.given(f, factor, p.designFactor(), NUMBER, Basis.COMMON_PRACTICE);
    } else if (r.rated().containsKey(p.name())) {
      new GearLines(w).rated(i, r.rated().get(p.name()));
      w.work(b, "strength", "E_" + i + " × F_" + i, FORCE, Basis.COMMON_PRACTICE);
    } else {
      w.given(b, "strength", p.strengthN(), FORCE, Basis.SOURCE);
      w.given(f, factor, p.designFactor(), NUMBER, Basis.SOURCE);
    }
  }

  /** Its load for each unit of tension at the tree. */
  private void loads(int i, Part p) {
    int block = redirect(p);
    String haul = "load for each unit of tension at the tree, hauling";
    boolean atTheTree = p.name().startsWith("load cell ") && p.hauling() == 1;
    if (p.name().equals("stem") || atTheTree) {
      w.given("y_" + i, haul, p.hauling(), NUMBER, Basis.STATICS);
    } else if (block > 0) {
      w.work("y_" + i, haul, "p_h" + block, NUMBER, Basis.STATICS);
    } else {
      double perEnd = p.hauling() / r.loads().sourceEndPerTree();
      if (perEnd == 1) {
        w.work("y_" + i, haul, "i_e", NUMBER, Basis.STATICS);
      } else {
        w.given(
            "t_" + i, "load for each unit at the source's line end", perEnd, NUMBER, Basis.SOURCE);
        w.work("y_" + i, haul, "i_e × t_" + i, NUMBER, Basis.STATICS);
      }
    }
    if (block > 0 && p.holding() == r.loads().blocks().get(block - 1).holding()) {
      w.work("j_" + i, "the same, holding", "p_o" + block, NUMBER, Basis.STATICS);
    } else {
      w.given(
          "j_" + i,
          "the same, holding",
          p.holding(),
          NUMBER,
          block > 0 ? Basis.RULE_SET : Basis.STATICS);
    }
  }

  /** Number of the redirect whose block, hardware or anchor this is; 0: none. */
  private int redirect(Part p) {
    List<String> ids = r.judged().setup().redirects();
    for (int j = 0; j < ids.size(); j++) {
      if ((p.name().endsWith(" at " + ids.get(j))
              || p.name().endsWith("anchor " + ids.get(j))
              || p.name().equals("rated point of " + ids.get(j)))
          && p.hauling() == r.loads().blocks().get(j).hauling()) {
        return j + 1;
      }
    }
    return 0;
  }

  private void source() {
    PullOffer o = r.offer();
    w.section("What the source gives");
    w.given("S_l", "pull to count on at its line end: " + o.limit(), o.lowN(), FORCE, Basis.SOURCE);
    w.given("S_o", "what it holds at its low", o.holdN(), FORCE, Basis.SOURCE);
    w.given("S_t", "the most it can bring on the parts", o.highN(), FORCE, Basis.SOURCE);
    w.work("S_l1", "pull to count on at the tree", "S_l ÷ i_e", FORCE, Basis.STATICS);
    switch (ratios.source().stop()) {
      case NONE -> {
        w.work("S_low", "source low at the tree", "S_l1", FORCE, Basis.STATICS);
        w.work("S_hold", "what it holds", "S_o", FORCE, Basis.STATICS);
        w.work("S_high", "source high at the tree", "S_t", FORCE, Basis.STATICS);
      }
      case READER -> {
        w.note("A person reads the load cell and stops the source at the ceiling.");
        w.given(
            "s_r",
            "line that still comes in after the stop",
            ratios.source().overrunM(),
            LENGTH,
            Basis.SOURCE);
        w.allow("q_o", Allowances.OVERSHOOT, NUMBER);
        String units = Workings.fit(w.unit(STIFFNESS) * w.unit(LENGTH) / w.unit(FORCE));
        w.work("S_low", "source low at the tree", "min(S_l1, C)", FORCE, Basis.PLANNING_ALLOWANCE);
        w.work("S_hold", "what it holds", "S_o", FORCE, Basis.STATICS);
        w.work(
            "S_high",
            "source high at the tree",
            "min(S_t, C + q_o × K_p × s_r" + units + ")",
            FORCE,
            Basis.PLANNING_ALLOWANCE);
        w.work("S_stop", "reading to stop at, at the tree", "C", FORCE, Basis.STATICS);
        for (int i = 0; i < ratios.parts().size(); i++) {
          if (ratios.parts().get(i).name().startsWith("load cell ")) {
            w.work(
                "S_read",
                "the same where the load cell sits, " + r.judged().figures().stopReadingAt(),
                "S_stop × min(y_" + (i + 1) + ", j_" + (i + 1) + ")",
                FORCE,
                Basis.RULE);
            w.compare("S_read", r.judged().figures().stopReadingN(), FORCE);
          }
        }
      }
      case DEVICE -> {
        w.allow("q_d0", Allowances.DEVICE_LOW, NUMBER);
        w.allow("q_d1", Allowances.DEVICE_HIGH, NUMBER);
        w.work(
            "S_low",
            "source low at the tree",
            "min(S_l1, q_d0 × C)",
            FORCE,
            Basis.PLANNING_ALLOWANCE);
        w.work("S_hold", "what it holds", "min(S_o, q_d0 × C)", FORCE, Basis.PLANNING_ALLOWANCE);
        w.work(
            "S_high",
            "source high at the tree",
            "min(S_t, q_d1 × C)",
            FORCE,
            Basis.PLANNING_ALLOWANCE);
      }
    }
    w.compare("S_low", ratios.source().lowN(), FORCE);
    w.compare("S_hold", ratios.source().holdN(), FORCE);
    w.compare("S_high", ratios.source().highN(), FORCE);
    w.section("Margins");
    if (side.planN() > 0) {
      w.work("margin", "pull margin", "S_low ÷ T_plan", NUMBER, Basis.RULE);
      w.compare("margin", ratios.byCheck().get("pull"), NUMBER);
    } else {
      w.note(
          "No pull is needed for this lay, so there is no pull margin. Beware of a stem that splits at the cut.");
    }
    if (ratios.holdAsked()) {
      w.work("i_o", "hold margin", "S_hold ÷ T_hold", NUMBER, Basis.RULE);
      w.compare("i_o", ratios.byCheck().get("hold"), NUMBER);
      w.work("i_s", "hold stability over what is asked", "s_h ÷ s_k0", NUMBER, Basis.RULE);
    } else {
      w.note("Hold and hold stability are not asked here.");
    }
    if (side.workingN() > 0) {
      w.work(
          "i_w",
          "top of the tension window over the working tension",
          "min(C, S_low) ÷ T_work",
          NUMBER,
          Basis.RULE);
    }
  }

  private void high(int i, Part p) {
    w.section("At the most the source can do: " + p.name());
    w.given("Q_" + i, "last factor", p.lastFactor(), NUMBER, last(p));
    w.work("G_" + i, "load allowed then", "B_" + i + " ÷ Q_" + i, FORCE, Basis.RULE);
    w.work("V_" + i, "load then", "S_high × j_" + i, FORCE, Basis.STATICS);
    double exact = ratios.byCheck().get(p.name() + " at high");
    if (Double.isFinite(exact)) {
      w.work(
          "r_" + i,
          p.name() + ", allowed over load then",
          "G_" + i + " ÷ V_" + i,
          NUMBER,
          Basis.RULE);
      w.compare("r_" + i, exact, NUMBER);
    }
  }

  private static Basis last(Part p) {
    double usual =
        p.name().startsWith("anchor ")
            ? Allowances.ANCHOR_LAST_FACTOR.value()
            : Allowances.LAST_FACTOR.value();
    return p.lastFactor() == usual ? Basis.PLANNING_ALLOWANCE : Basis.RULE_SET;
  }
}
