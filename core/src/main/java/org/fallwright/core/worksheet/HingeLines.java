package org.fallwright.core.worksheet;

import static org.fallwright.core.worksheet.Dimension.FORCE;
import static org.fallwright.core.worksheet.Dimension.MOMENT;
import static org.fallwright.core.worksheet.Dimension.NUMBER;
import static org.fallwright.core.worksheet.Dimension.SMALL_LENGTH;
import static org.fallwright.core.worksheet.Dimension.STRESS;

import java.util.Locale;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.statics.Worked;

/** What the hinge carries besides bending along the fall: steering, turning, crushing. */
final class HingeLines {
  private final Workings w;
  private final TreeSide side;
  private final Worked worked;
  private final Rises rises;

  HingeLines(Workings w, Reckoned r, Rises rises) {
    this.w = w;
    side = r.statics().treeSide();
    worked = r.statics().worked();
    this.rises = rises;
  }

  void write() {
    w.section("Steering share of the hinge");
    if (side.hinge().steerWidthM() == 0) {
      w.note("No wood of the hinge steers: whatever it is asked to carry aside is too much.");
      return;
    }
    steering();
    turning();
    crushing();
  }

  private String units() {
    double small = w.unit(SMALL_LENGTH);
    return Workings.fit(w.unit(STRESS) * small * small * small / w.unit(MOMENT));
  }

  private static String at(boolean satBack) {
    return satBack ? "s" : "m";
  }

  private static String when(boolean satBack) {
    return satBack ? "sat back" : "at the end of the movement";
  }

  private void component(String symbol, String name, String formula) {
    if (!w.has(symbol)) {
      w.work(symbol, "the leg's direction " + name, formula, NUMBER, Basis.GEOMETRY);
    }
  }

  private void aside(String at, String when) {
    component("e_v" + at, "to the right, " + when, "(P_v − v_a) ÷ L_" + at);
  }

  private void steering() {
    Worked.HingeCase c = worked.steering();
    String at = at(c.satBack());
    w.note(
        "Both signs, with and without tension, sat back and at the end of the movement were tried; this is the greatest.");
    aside(at, when(c.satBack()));
    component("e_w" + at, "upwards, " + when(c.satBack()), "(z_1 − w_" + at + ") ÷ L_" + at);
    w.work(
        "Q_s",
        "strength of the hinge against a side moment",
        "σ_w × t × b_s^2 ÷ 6" + units(),
        MOMENT,
        Basis.BEAM_THEORY);
    boolean loose = c.tensionN() == 0;
    String line =
        loose ? "" : String.format(Locale.ROOT, "T_work × (w_%1$s × e_v%1$s − v_a × e_w%1$s)", at);
    String moment =
        c.sign() > 0
            ? "W × v_g" + (loose ? "" : " + " + line)
            : "0 − W × v_g" + (loose ? "" : " − " + line);
    w.work(
        "M_s",
        "side moment, " + (loose ? "no tension in the line, " : "") + when(c.satBack()),
        moment + " + M_a",
        MOMENT,
        Basis.STATICS);
    w.work("x_s", "steering share at the means", "M_s ÷ Q_s", NUMBER, Basis.BEAM_THEORY);
    rises.write("x_s95", "steering share", "x_s", c.share(), NUMBER, NUMBER, true);
    w.compare("x_s95", side.steerShare(), NUMBER);
    w.given("x_sk", "most of it that may be used", Allowances.STEERING_MOST, NUMBER);
  }

  private void turning() {
    w.section("Turning share of the hinge");
    if (side.workingN() == 0) {
      w.note("There is no tension in the line, so it turns nothing.");
      return;
    }
    Worked.HingeCase c = worked.turning();
    String at = at(c.satBack());
    w.note("Both signs, sat back and at the end of the movement were tried; this is the greatest.");
    aside(at, when(c.satBack()));
    component("e_u" + at, "along the lay, " + when(c.satBack()), "(P_u − u_" + at + ") ÷ L_" + at);
    w.work(
        "Q_t",
        "strength of the hinge against turning",
        "τ_w × t × b_s^2 ÷ 6" + units(),
        MOMENT,
        Basis.BEAM_THEORY);
    String arms =
        c.sign() > 0 ? "(u_%1$s × e_v%1$s − v_a × e_u%1$s)" : "(v_a × e_u%1$s − u_%1$s × e_v%1$s)";
    w.work(
        "M_t",
        "turning moment, " + when(c.satBack()),
        "T_work × " + String.format(Locale.ROOT, arms, at),
        MOMENT,
        Basis.STATICS);
    w.work("x_t", "turning share at the means", "M_t ÷ Q_t", NUMBER, Basis.BEAM_THEORY);
    rises.write("x_t95", "turning share", "x_t", c.share(), NUMBER, NUMBER, true);
    w.compare("x_t95", side.turnShare(), NUMBER);
    w.given("x_tk", "most of it that may be used", Allowances.TURNING_MOST, NUMBER);
  }

  private void crushing() {
    w.section("Crushing of the hinge");
    double small = w.unit(SMALL_LENGTH);
    String units = Workings.fit(w.unit(STRESS) * small * small / w.unit(FORCE));
    w.work(
        "G_c",
        "push on the hinge",
        "W_h" + (side.riseRad() > 0 ? " + T_work × sin(α)" : ""),
        FORCE,
        Basis.STATICS);
    w.work("x_p", "crushing share", "G_c ÷ (σ_c × b_s × t" + units + ")", NUMBER, Basis.STATICS);
    w.compare("x_p", side.crushShare(), NUMBER);
    w.given("x_pk", "most of it that may be used", Allowances.CRUSHING_MOST, NUMBER);
  }
}
