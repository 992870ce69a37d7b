package org.fallwright.core.worksheet;

import static org.fallwright.core.worksheet.Dimension.ANGLE;
import static org.fallwright.core.worksheet.Dimension.LENGTH;
import static org.fallwright.core.worksheet.Dimension.SMALL_LENGTH;

import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.statics.TreeSide;

/** Where the line runs, its lever on the hinge, and both at any angle of the tree. */
final class PathLines {
  private final Workings w;
  private final Reckoned r;

  PathLines(Workings w, Reckoned r) {
    this.w = w;
    this.r = r;
  }

  void write() {
    TreeSide side = r.statics().treeSide();
    String small = w.fit(SMALL_LENGTH, LENGTH);
    w.section("Line and lever as found standing");
    for (int i = 1; i < r.points().size(); i++) {
      String where = r.judged().line().get(i).id() + " from the stump's middle, ";
      w.work("e_" + i, where + "to the east", "X_" + i + " − X_0", LENGTH, Basis.GEOMETRY);
      w.work("n_" + i, where + "to the north", "Y_" + i + " − Y_0", LENGTH, Basis.GEOMETRY);
      w.work(
          "z_" + i, where + "above the hinge", "Z_" + i + " − Z_0 − h_c", LENGTH, Basis.GEOMETRY);
    }
    w.work("w_a", "line on the tree above the hinge", "h_a − h_c", LENGTH, Basis.GEOMETRY);
    w.work(
        "u_a",
        "line on the tree ahead of the hinge",
        "w_a × tan(λ) × cos(γ − β) − u_h" + small,
        LENGTH,
        Basis.GEOMETRY);
    w.work(
        "v_a",
        "line on the tree to the right of the hinge",
        "w_a × tan(λ) × sin(γ − β)",
        LENGTH,
        Basis.GEOMETRY);
    w.work(
        "P_u",
        "first bearing point ahead of the hinge",
        "e_1 × sin(β) + n_1 × cos(β) − u_h" + small,
        LENGTH,
        Basis.GEOMETRY);
    w.work(
        "P_v",
        "first bearing point to the right of the hinge",
        "e_1 × cos(β) − n_1 × sin(β)",
        LENGTH,
        Basis.GEOMETRY);
    leg("0", "as found standing", "u_a", "w_a");
    w.work(
        "α",
        "rise of the first leg towards the tree",
        "asin((w_a − z_1) ÷ L_0)",
        ANGLE,
        Basis.GEOMETRY);
    w.compare("ℓ_0", side.leverM(), LENGTH);
    if (side.movable()) {
      w.compare("α", Math.toDegrees(side.riseRad()), ANGLE);
    }
    w.section("Lever with the tree sat back on the kerf");
    w.work(
        "u_s",
        "line on the tree ahead of the hinge",
        "u_a × cos(δ) − w_a × sin(δ)",
        LENGTH,
        Basis.GEOMETRY);
    w.work(
        "w_s",
        "line on the tree above the hinge",
        "u_a × sin(δ) + w_a × cos(δ)",
        LENGTH,
        Basis.GEOMETRY);
    leg("s", "sat back", "u_s", "w_s");
    w.compare("ℓ_s", side.leverSitM(), LENGTH);
  }

  /** Attachment, leg and lever with the tree turned by the angle of that sign. */
  void turned(String at, String angle, String when) {
    w.work(
        "u_" + at,
        "line on the tree ahead of the hinge, " + when,
        "u_a × cos(" + angle + ") + w_a × sin(" + angle + ")",
        LENGTH,
        Basis.GEOMETRY);
    w.work(
        "w_" + at,
        "line on the tree above the hinge, " + when,
        "w_a × cos(" + angle + ") − u_a × sin(" + angle + ")",
        LENGTH,
        Basis.GEOMETRY);
    leg(at, when, "u_" + at, "w_" + at);
  }

  private void leg(String at, String when, String u, String up) {
    w.work(
        "L_" + at,
        "length of the first leg, " + when,
        "√((P_u − " + u + ")^2 + (P_v − v_a)^2 + (z_1 − " + up + ")^2)",
        LENGTH,
        Basis.GEOMETRY);
    w.work(
        "ℓ_" + at,
        "lever of the line on the hinge, " + when,
        "(" + up + " × P_u − " + u + " × z_1) ÷ L_" + at,
        LENGTH,
        Basis.STATICS);
  }
}
