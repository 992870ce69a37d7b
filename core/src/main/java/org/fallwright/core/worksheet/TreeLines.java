package org.fallwright.core.worksheet;

import static org.fallwright.core.worksheet.Dimension.ANGLE;
import static org.fallwright.core.worksheet.Dimension.AREA;
import static org.fallwright.core.worksheet.Dimension.DENSITY;
import static org.fallwright.core.worksheet.Dimension.FORCE;
import static org.fallwright.core.worksheet.Dimension.LENGTH;
import static org.fallwright.core.worksheet.Dimension.MASS;
import static org.fallwright.core.worksheet.Dimension.MOMENT;
import static org.fallwright.core.worksheet.Dimension.NUMBER;
import static org.fallwright.core.worksheet.Dimension.SMALL_LENGTH;
import static org.fallwright.core.worksheet.Dimension.SPEED;
import static org.fallwright.core.worksheet.Dimension.STRESS;

import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Site;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.units.Units;

/** The hinge's shape and the moments of hinge, weight and wind. */
final class TreeLines {
  private final Workings w;
  private final Site site;
  private final Reckoned r;
  private final String crownTerm;

  TreeLines(Workings w, Site site, Reckoned r, String crownTerm) {
    this.w = w;
    this.site = site;
    this.r = r;
    this.crownTerm = crownTerm;
  }

  void write() {
    cut();
    weight();
    wind();
    hinge();
  }

  private void cut() {
    TreeSide side = r.statics().treeSide();
    w.section("Shape of the cut");
    w.work("R", "radius at the cut", "D_s ÷ 2", SMALL_LENGTH, Basis.GEOMETRY);
    w.work("a", "depth of the face", "f_a × D_s", SMALL_LENGTH, Basis.GEOMETRY);
    w.work(
        "u_h",
        "hinge's middle ahead of the stump's middle",
        "R − a − t ÷ 2",
        SMALL_LENGTH,
        Basis.GEOMETRY);
    w.work("B_c", "depth of the back cut", "D_s − a − t", SMALL_LENGTH, Basis.GEOMETRY);
    w.work("b_m", "width of the stem there", "2 × √(R^2 − u_h^2)", SMALL_LENGTH, Basis.GEOMETRY);
    boolean hole = r.pull().tree().shellM() != null && hole() > 0;
    String whole = site.cut().hingeWidthM() != null ? "min(b_e, b_m)" : "b_m";
    w.allow("q_s", Allowances.STEERING_WIDTH_SHARE, NUMBER);
    if (hole) {
      w.work(
          "b_h",
          "width of the hollow there",
          "2 × √((R − s_w)^2 − u_h^2)",
          SMALL_LENGTH,
          Basis.GEOMETRY);
      w.work(
          "b",
          "hinge width against the pull",
          "max(0, " + whole + " − b_h)",
          SMALL_LENGTH,
          Basis.GEOMETRY);
    } else {
      w.work("b", "hinge width against the pull", whole, SMALL_LENGTH, Basis.GEOMETRY);
    }
    if (r.pull().tree().deadOrDecayed()) {
      w.given(
          "b_s",
          "steering width: dead or decayed wood steers nothing",
          0,
          SMALL_LENGTH,
          Basis.RULE);
    } else if (hole) {
      w.work(
          "b_s",
          "steering width",
          "max(0, min(q_s × D_s, " + whole + ") − b_h)",
          SMALL_LENGTH,
          Basis.PLANNING_ALLOWANCE);
    } else {
      w.work("b_s", "steering width", "min(q_s × D_s, b)", SMALL_LENGTH, Basis.PLANNING_ALLOWANCE);
    }
    if (site.cut().wedges()) {
      w.given("δ", "how far the tree sits back: not at all, wedges are set", 0, ANGLE, Basis.RULE);
    } else {
      w.work(
          "δ", "how far the tree sits back on the kerf", "atan(s_k ÷ B_c)", ANGLE, Basis.GEOMETRY);
    }
    w.compare("b", side.hinge().widthM(), SMALL_LENGTH);
    w.compare("b_s", side.hinge().steerWidthM(), SMALL_LENGTH);
    w.compare("u_h", side.hinge().offsetM(), SMALL_LENGTH);
    w.compare("δ", Math.toDegrees(side.hinge().sitBackRad()), ANGLE);
  }

  private double hole() {
    double radius = r.tree().stumpDiameterM() / 2 - r.pull().tree().shellM();
    double u = r.statics().treeSide().hinge().offsetM();
    return radius > Math.abs(u) ? Math.sqrt(radius * radius - u * u) : 0;
  }

  private void weight() {
    TreeSide side = r.statics().treeSide();
    String small = w.fit(SMALL_LENGTH, LENGTH);
    w.section("Weight and lean");
    w.note(
        "From the hinge's middle: u along the lay, v to its right, w up. A back lean has u_g below 0.");
    w.work("w_g", "mass centre above the hinge", "h_g − h_c", LENGTH, Basis.GEOMETRY);
    w.work(
        "o_E",
        "mass centre east of the stump's middle",
        "w_g × tan(λ) × sin(γ)" + (crownTerm.isEmpty() ? "" : crownTerm + "c_E"),
        LENGTH,
        Basis.GEOMETRY);
    w.work(
        "o_N",
        "mass centre north of it",
        "w_g × tan(λ) × cos(γ)" + (crownTerm.isEmpty() ? "" : crownTerm + "c_N"),
        LENGTH,
        Basis.GEOMETRY);
    w.work(
        "u_g",
        "mass centre ahead of the hinge",
        "o_E × sin(β) + o_N × cos(β) − u_h" + small,
        LENGTH,
        Basis.GEOMETRY);
    w.work(
        "v_g",
        "mass centre to the right of the hinge",
        "o_E × cos(β) − o_N × sin(β)",
        LENGTH,
        Basis.GEOMETRY);
    w.work("W", "weight, with g = 9.80665 m/s²", "m" + mass(), FORCE, Basis.STATICS);
    w.work(
        "M_g0",
        "weight's moment as found standing, + towards the lay",
        "W × u_g",
        MOMENT,
        Basis.STATICS);
    w.work(
        "M_gs",
        "weight's moment sat back",
        "W × (u_g × cos(δ) − w_g × sin(δ))",
        MOMENT,
        Basis.STATICS);
    w.compare("M_g0", side.weightNm(), MOMENT);
  }

  /** A pound of mass weighs a pound-force, so in those units nothing is to be done. */
  private String mass() {
    return Workings.fit(w.unit(MASS) * Units.GRAVITY / w.unit(FORCE));
  }

  private void wind() {
    TreeSide side = r.statics().treeSide();
    w.section("Moment of the wind");
    w.allow("V_l", Allowances.GUST_LEAST, SPEED);
    w.allow("V_k", Allowances.WIND_CLAMP, SPEED);
    w.work("V_r", "gust reckoned with", "max(V, V_l)", SPEED, Basis.PLANNING_ALLOWANCE);
    String mps = Workings.fit(w.unit(SPEED));
    String leaf = w.has("q_l") ? "q_l × " : "";
    w.work(
        "C_d",
        "drag coefficient",
        leaf + "C_0 ÷ (max(V_k, V_r)" + mps + ")^N_d",
        NUMBER,
        Basis.PUBLISHED);
    w.work(
        "w_k",
        "middle of the crown above the hinge",
        "(h_b + H) ÷ 2 − h_c",
        LENGTH,
        Basis.GEOMETRY);
    double speed = w.unit(SPEED);
    double units = w.unit(DENSITY) * w.unit(AREA) * speed * speed * w.unit(LENGTH) / w.unit(MOMENT);
    w.work(
        "M_v",
        "moment of the wind, whatever its direction",
        "0.5 × ρ × C_d × A_c × V_r^2 × w_k" + Workings.fit(units),
        MOMENT,
        Basis.STATICS);
    if (site.conditions().windTowardDeg() == null) {
      w.work(
          "M_w", "against the lay; no direction is given, so all of it", "M_v", MOMENT, Basis.RULE);
      w.work(
          "M_a", "across the lay; no direction is given, so all of it", "M_v", MOMENT, Basis.RULE);
    } else {
      w.work("M_w", "against the lay", "max(0, 0 − M_v × cos(θ_w − β))", MOMENT, Basis.STATICS);
      w.work("M_a", "across the lay", "abs(M_v × sin(θ_w − β))", MOMENT, Basis.STATICS);
    }
    w.compare("M_w", side.windNm(), MOMENT);
    w.compare("M_a", side.windAsideNm(), MOMENT);
  }

  private void hinge() {
    w.section("Moment of the hinge");
    w.note("Beam theory: no published test of a felling hinge is known.");
    double small = w.unit(SMALL_LENGTH);
    String units = Workings.fit(w.unit(STRESS) * small * small * small / w.unit(MOMENT));
    w.allow("k", Allowances.HINGE_K_LEAST, NUMBER);
    w.allow("k_m", Allowances.HINGE_K_MEAN, NUMBER);
    w.work(
        "M_h",
        "moment that bends the hinge",
        "k × σ_r × b × t^2 ÷ 6" + units,
        MOMENT,
        Basis.BEAM_THEORY);
    w.work(
        "M_hm",
        "the same with the hinge factor in the middle of its spread",
        "k_m × σ_r × b × t^2 ÷ 6" + units,
        MOMENT,
        Basis.BEAM_THEORY);
    w.compare("M_h", r.statics().treeSide().hingeNm(), MOMENT);
  }
}
