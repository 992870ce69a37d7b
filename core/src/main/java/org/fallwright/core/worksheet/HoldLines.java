package org.fallwright.core.worksheet;

import static org.fallwright.core.worksheet.Dimension.ANGLE;
import static org.fallwright.core.worksheet.Dimension.AREA;
import static org.fallwright.core.worksheet.Dimension.FORCE;
import static org.fallwright.core.worksheet.Dimension.FORCE_SQUARED;
import static org.fallwright.core.worksheet.Dimension.LENGTH;
import static org.fallwright.core.worksheet.Dimension.MOMENT;
import static org.fallwright.core.worksheet.Dimension.NUMBER;
import static org.fallwright.core.worksheet.Dimension.SMALL_LENGTH;

import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.statics.Holding;
import org.fallwright.core.statics.TreeSide;

/** Hold stability, the pretension window, take-up and what can be seen of it. */
final class HoldLines {
  private final Workings w;
  private final Reckoned r;
  private final TreeSide side;
  private final Holding holding;
  private final boolean captured;
  private final boolean massStated;
  private final Rises rises;
  private final PathLines path;

  HoldLines(Workings w, Reckoned r, boolean massStated, Rises rises, PathLines path) {
    this.w = w;
    this.r = r;
    side = r.statics().treeSide();
    holding = r.ratios().holding();
    captured = r.ratios().source().captured();
    this.massStated = massStated;
    this.rises = rises;
    this.path = path;
  }

  void write() {
    stability();
    pretension();
    takeUp();
    face();
  }

  private void stability() {
    w.section("Hold stability");
    w.note(
        captured
            ? "The source keeps the line's far end where it is."
            : "The source gives a constant force and keeps nothing where it is, so the line's stiffness"
                + " does not count.");
    w.allow("z_95", Allowances.PERCENTILE_SDS, NUMBER);
    w.given(
        "s_m",
        "standard deviation of the mass over the mass",
        r.pull().spread().massRel(),
        NUMBER,
        massStated ? Basis.ENTERED : Basis.PLANNING_ALLOWANCE);
    w.work("W_h", "weight, 95th percentile", "W × (1 + z_95 × s_m)", FORCE, Basis.SPREAD);
    w.work("y_s", "moment arm product, sat back", "w_s × P_u − u_s × z_1", AREA, Basis.GEOMETRY);
    w.work(
        "y_d", "its slope for a radian of turn", "0 − u_s × P_u − w_s × z_1", AREA, Basis.GEOMETRY);
    w.work(
        "L_d",
        "slope of the leg's length for a radian",
        "((z_1 − w_s) × u_s − (P_u − u_s) × w_s) ÷ L_s",
        LENGTH,
        Basis.GEOMETRY);
    w.work(
        "ℓ_d",
        "slope of the lever for a radian",
        "y_d ÷ L_s − y_s × L_d ÷ L_s^2",
        LENGTH,
        Basis.GEOMETRY);
    w.work(
        "s_h",
        "hold stability",
        "("
            + (captured ? "K × ℓ_s^2 − " : "0 − ")
            + "T_hold × ℓ_d) ÷ (W_h × (w_g × cos(δ) + u_g × sin(δ)))",
        NUMBER,
        Basis.STATICS);
    w.compare("s_h", holding.stability(), NUMBER);
    w.given("s_k0", "hold stability asked", Allowances.HOLD_STABILITY_ASKED, NUMBER);
    if (holding.stability() > 1) {
      w.work(
          "T_jerk",
          "tension that can come if the line is slack when the hinge lets go",
          "2 × T_hold × s_h ÷ (s_h − 1)",
          FORCE,
          Basis.STATICS);
      w.compare("T_jerk", holding.peakN(0, side.holdN()), FORCE);
    }
  }

  private void pretension() {
    double phi =
        Math.max(
            Math.toRadians(Allowances.CREEP_LEAST.value()),
            Math.min(
                Math.toRadians(Allowances.CREEP_MOST.value()),
                side.commitRad() * Allowances.CREEP_OVER_COMMIT.value()));
    w.section("Top of the pretension window");
    w.note("In calm air: the hinge alone holds against line and weight.");
    w.allow("φ_k1", Allowances.CREEP_LEAST, ANGLE);
    w.allow("φ_k2", Allowances.CREEP_MOST, ANGLE);
    w.allow("q_φ", Allowances.CREEP_OVER_COMMIT, NUMBER);
    w.work(
        "φ_t",
        "angle within which a held tree must stop",
        "max(φ_k1, min(φ_k2, q_φ × φ_c))",
        ANGLE,
        Basis.PLANNING_ALLOWANCE);
    path.turned("t", "φ_t", "at that angle");
    w.work(
        "M_gt",
        "weight's moment at that angle",
        "W × (u_g × cos(φ_t) + w_g × sin(φ_t))",
        MOMENT,
        Basis.STATICS);
    w.work(
        "N_m",
        "tension at which the hinge lets the tree move there, at the means",
        "(M_hm × σ_w ÷ σ_r − M_gt) ÷ ℓ_t",
        FORCE,
        Basis.STATICS);
    rises.write(
        "N_5",
        "tension that lets it move",
        "N_m",
        r.statics().worked().letsGo(phi),
        FORCE,
        FORCE_SQUARED,
        false);
    w.work(
        "T_up",
        "top of the pretension window",
        "max(0, N_5)" + (captured ? " + K_p × (L_0 − L_t)" : ""),
        FORCE,
        Basis.STATICS);
    w.compare("T_up", holding.pretensionTopN(), FORCE);
    w.section("Whether it starts by itself, held at the hold tension");
    w.work(
        "N_m0",
        "tension at which the hinge lets the tree move from where it stands, at the means",
        "(M_hm × σ_w ÷ σ_r − M_g0) ÷ ℓ_0",
        FORCE,
        Basis.STATICS);
    rises.write(
        "N_50",
        "tension that lets it start",
        "N_m0",
        r.statics().worked().letsGo(0),
        FORCE,
        FORCE_SQUARED,
        false);
    w.note(
        "The hold tension below the greater of 0 and N_50: it does not start; else up to T_up: it moves a little and stops;"
            + " else it runs. Here: "
            + holding.start().word()
            + ".");
  }

  private void takeUp() {
    w.section("Line to take in, and what can be seen of it");
    path.turned("c", "φ_c", "at the commit angle");
    w.work("ΔL", "line that shortens over the movement", "L_s − L_m", LENGTH, Basis.GEOMETRY);
    w.work(
        "ΔL_c", "line that shortens up to the commit angle", "L_s − L_c", LENGTH, Basis.GEOMETRY);
    w.work("T_in", "take-up at the tree", "ΔL + T_work ÷ K_p + s_0", LENGTH, Basis.STATICS);
    w.given(
        "i_v",
        "travel at the source for line at its end",
        r.offer().travel().ratio(),
        NUMBER,
        Basis.SOURCE);
    w.work("X_in", "travel at the source", "i_v × T_in", LENGTH, Basis.GEOMETRY);
    w.work("L_in", "line in from slack when the tree goes", "s_0 + ΔL_c", LENGTH, Basis.GEOMETRY);
    String kerf = w.has("s_k") ? "s_k" : "kerf";
    if (!w.has("s_k")) {
      w.given(kerf, "width of the saw kerf", r.pull().cut().kerfM(), SMALL_LENGTH, Basis.ENTERED);
    }
    w.work(
        "gape",
        "gape of the back cut when the tree goes",
        kerf + " + B_c × φ_c × π ÷ 180",
        SMALL_LENGTH,
        Basis.GEOMETRY);
    w.compare("ΔL", side.shorteningM(), LENGTH);
    w.compare("ΔL_c", side.shorteningToCommitM(), LENGTH);
    w.compare("T_in", side.takeUpM(), LENGTH);
    w.compare("gape", side.gapeM(), SMALL_LENGTH);
  }

  private void face() {
    w.section("Opening of the face");
    w.allow("φ_f1", Allowances.FACE_OVER_COMMIT, ANGLE);
    w.allow("φ_f2", Allowances.FACE_OVER_MOVEMENT, ANGLE);
    w.work("F_k", "opening asked", "max(φ_c + φ_f1, φ_m + φ_f2)", ANGLE, Basis.PLANNING_ALLOWANCE);
    w.work("i_f", "opening there is over that", "F_o ÷ F_k", NUMBER, Basis.RULE);
  }
}
