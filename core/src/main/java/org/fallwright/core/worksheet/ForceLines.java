package org.fallwright.core.worksheet;

import static org.fallwright.core.worksheet.Dimension.ANGLE;
import static org.fallwright.core.worksheet.Dimension.ANGLE_SQUARED;
import static org.fallwright.core.worksheet.Dimension.FORCE;
import static org.fallwright.core.worksheet.Dimension.FORCE_SQUARED;
import static org.fallwright.core.worksheet.Dimension.LENGTH;
import static org.fallwright.core.worksheet.Dimension.NUMBER;
import static org.fallwright.core.worksheet.Dimension.SMALL_LENGTH;

import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.statics.Status;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.statics.Worked;

/** Commit angle, movement, pull needed, pull to plan for, hold and rest. */
final class ForceLines {
  private final Workings w;
  private final TreeSide side;
  private final Worked worked;
  private final Rises rises;
  private final PathLines path;

  ForceLines(Workings w, Reckoned r, Rises rises, PathLines path) {
    this.w = w;
    side = r.statics().treeSide();
    worked = r.statics().worked();
    this.rises = rises;
    this.path = path;
  }

  /** The movement; the forces follow only where there is one. */
  void write() {
    commit();
    if (!side.movable()) {
      return;
    }
    pull();
    hold();
  }

  private void commit() {
    w.section("Where the weight alone takes over");
    w.work("q", "mass centre from the hinge", "√(u_g^2 + w_g^2)", LENGTH, Basis.GEOMETRY);
    w.work(
        "φ_0",
        "angle of the mass centre off upright over the hinge, below 0 behind it",
        "atan(u_g ÷ w_g)",
        ANGLE,
        Basis.GEOMETRY);
    w.work(
        "x_c",
        "hinge and wind over the most that the weight can bring",
        "(M_h + M_w) ÷ (W × q)",
        NUMBER,
        Basis.STATICS);
    if (side.status() == Status.HINGE_NEVER_LETS_GO) {
      w.note(
          "The share x_c is not below 1: hinge and wind are never beaten by the weight, so this hinge"
              + " never lets go and nothing more is worked.");
      return;
    }
    w.work("φ_c", "commit angle", "max(0 − δ, asin(x_c) − φ_0)", ANGLE, Basis.STATICS);
    w.compare("φ_c", Math.toDegrees(side.commitRad()), ANGLE);
    w.section("End of the movement");
    w.allow("φ_k", Allowances.MOVEMENT_CAP, ANGLE);
    w.work(
        "φ_m0",
        "commit angle at the means",
        "asin(min(1, (M_hm + M_w) ÷ (W × q))) − φ_0",
        ANGLE,
        Basis.STATICS);
    rises.write(
        "φ_95",
        "commit angle",
        "φ_m0",
        worked.commit().in(Math::toDegrees),
        ANGLE,
        ANGLE_SQUARED,
        true);
    w.work(
        "φ_m", "end of the movement", "max(φ_c, min(φ_k, φ_95))", ANGLE, Basis.PLANNING_ALLOWANCE);
    w.compare("φ_m", Math.toDegrees(side.endRad()), ANGLE);
    path.turned("m", "φ_m", "at the end of the movement");
    w.allow("q_ℓ", Allowances.LEVER_LEAST, NUMBER);
    w.work(
        "ℓ_k",
        "least lever asked over the movement",
        "q_ℓ × w_a",
        LENGTH,
        Basis.PLANNING_ALLOWANCE);
    w.given(
        "ℓ_n",
        "least lever found at 65 equally spaced angles, each worked like ℓ_m",
        side.leverMinM(),
        LENGTH,
        Basis.STATICS);
    if (side.status() == Status.LEVER_LOST) {
      w.note(
          "The lever is lost over the movement: the line pulls the wrong way for this lay, and nothing more is worked.");
    }
  }

  private void pull() {
    w.section("Pull needed and pull to plan for");
    w.work(
        "T_0",
        "pull that moves the tree, sat back",
        "(M_h + M_w − M_gs) ÷ ℓ_s",
        FORCE,
        Basis.STATICS);
    w.work("T_need", "pull needed", "max(0, T_0)", FORCE, Basis.STATICS);
    w.compare("T_need", side.neededN(), FORCE);
    w.work("T_m", "pull at the means", "(M_hm + M_w − M_gs) ÷ ℓ_s", FORCE, Basis.STATICS);
    rises.write("T_95", "pull", "T_m", worked.need(), FORCE, FORCE_SQUARED, true);
    w.work("T_plan", "pull to plan for", "max(0, T_need, T_95)", FORCE, Basis.STATICS);
    w.compare("T_plan", side.planN(), FORCE);
  }

  private void hold() {
    w.section("Hold and working tension");
    w.note("No credit is given to the hinge.");
    w.work(
        "H_m",
        "tension that holds the tree at the means",
        "(M_w − M_gs) ÷ ℓ_s",
        FORCE,
        Basis.STATICS);
    rises.write("H_95", "hold", "H_m", worked.hold(), FORCE, FORCE_SQUARED, true);
    w.work("T_hold", "hold tension", "max(0, H_95)", FORCE, Basis.STATICS);
    w.work("T_work", "working tension", "max(T_plan, T_hold)", FORCE, Basis.STATICS);
    w.compare("T_hold", side.holdN(), FORCE);
    w.compare("T_work", side.workingN(), FORCE);
    w.section("Rest on the stump");
    w.work(
        "r_m",
        "back lean against what the stump's edge holds, at the means",
        "(M_w − M_gs) ÷ (W × (B_c + t ÷ 2)" + w.fit(SMALL_LENGTH, LENGTH) + ")",
        NUMBER,
        Basis.STATICS);
    rises.write("r_95", "rest", "r_m", worked.rest(), NUMBER, NUMBER, true);
    w.compare("r_95", side.restShare(), NUMBER);
    w.given(
        "r_k", "rest below which the tree still rests on its stump", Allowances.REST_LEAST, NUMBER);
    w.given("r_kw", "the same where wedges are set", Allowances.REST_LEAST_WEDGED, NUMBER);
  }
}
