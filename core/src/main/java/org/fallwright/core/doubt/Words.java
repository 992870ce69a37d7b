package org.fallwright.core.doubt;

import java.util.Locale;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.statics.Spread;
import org.fallwright.core.units.DisplayUnits;

/** The doubt in plain words, in the site's units. */
final class Words {
  private static final double COMFORTABLE = Allowances.WORKABLE_RATIO.value();

  private final DisplayUnits in;
  private final Reckoned r;
  private final boolean stumpDerived;

  /**
   * @param stumpDerived whether the diameter at the cut is from DBH and flare
   */
  Words(DisplayUnits in, Reckoned r, boolean stumpDerived) {
    this.in = in;
    this.stumpDerived = stumpDerived;
    this.r = r;
  }

  /**
   * A step of an input that anybody can picture.
   *
   * @param amount in the input's own unit
   * @param more the words for so much more
   * @param less the words for so much less
   */
  record Step(double amount, String more, String less) {}

  /** What an error does. */
  record Off(String words, double margin) {}

  /** How often, in plain words. */
  static String times(double share) {
    if (share >= 0.995) {
      return "more than 99 times in 100";
    }
    if (share >= 0.975 || share > 0.005 && share < 0.03) {
      long n = Math.round(100 * share);
      return "about " + (n == 1 ? "once" : n + " times") + " in 100";
    }
    if (share <= 0.005) {
      return "less than once in 100";
    }
    long n = Math.round(20 * share);
    return "about " + (n == 1 ? "once" : n + " times") + " in 20";
  }

  /**
   * How often the pull is enough, and what gives first.
   *
   * @param margin margin of the verdict
   * @param entered margin with everything as entered
   */
  String sentence(Verdict verdict, Outcomes o, double margin, double entered) {
    StringBuilder s = new StringBuilder();
    String word = verdict.word();
    s.append(Character.toUpperCase(word.charAt(0))).append(word.substring(1)).append(". ");
    s.append("The pull is enough ").append(times(o.enoughAtLeast()));
    if (o.enough() == o.enoughAtLeast()) {
      s.append('.');
    } else {
      s.append(" if the ground grips as badly as it may, ")
          .append(times(o.enough()))
          .append(" over all that it may.");
    }
    if (entered >= COMFORTABLE && margin < COMFORTABLE) {
      s.append(" By the entered figures alone the margin would read ")
          .append(shown(entered))
          .append("; with what they may be off it is ")
          .append(shown(margin))
          .append('.');
    }
    if (o.neverLetsGo() > 0) {
      s.append(" The hinge never lets go ").append(times(o.neverLetsGo())).append('.');
    }
    s.append(
        o.fails().isEmpty()
            ? " Nothing gives in any of the trials; nearest to it is "
            : " What gives first most often is ");
    return s.append(o.failsFirst()).append('.').toString();
  }

  /** A value of an input; of the setup's own inputs by their planned value and spread. */
  String value(Input input, double at) {
    Spread s = r.pull().spread();
    return switch (input) {
      case MASS -> in.mass(at * r.tree().massKg());
      case MASS_CENTRE -> in.length(r.tree().massCentreM() + at);
      case LEAN -> in.angle(Math.toRadians(at));
      case LEAN_AZIMUTH -> String.format(Locale.ROOT, "%03.0f°", (at + 720) % 360);
      case HINGE_FACTOR, DRAG, DENSITY -> String.format(Locale.ROOT, "%.2f times", at);
      case RUPTURE -> in.stress(r.pull().wood().morPa() * (1 + at * s.morCv()));
      case THICKNESS -> in.smallLength(r.pull().cut().thicknessM() * (1 + at * s.thicknessRel()));
      case STUMP -> in.smallLength(stumpDerived ? at * r.tree().stumpDiameterM() : at);
      case DBH -> in.smallLength(at);
      case HEIGHT -> in.length(at);
      case GUST -> in.speed(Math.max(0, at));
      case ATTACH ->
          in.length(
              r.pull().line().attachHeightM() + r.pull().tree().cutHeightM() + at * s.attachM());
      case BEARING -> in.length(Math.abs(at * s.bearingM())) + (at < 0 ? " left" : " right");
      case GRIP -> at < 0.5 ? "near its least" : "near its most";
    };
  }

  /** Spread of an input in the unit of its step. */
  double width(Input input, May may) {
    Spread s = r.pull().spread();
    return switch (input) {
      case THICKNESS -> s.thicknessRel() * r.pull().cut().thicknessM();
      case ATTACH -> s.attachM();
      case BEARING -> s.bearingM();
      case STUMP -> may.spread() * (stumpDerived ? r.tree().stumpDiameterM() : 1);
      default -> may.even() ? 2 * may.spread() : may.spread();
    };
  }

  /** A step that a person can well be off by. */
  Step step(Input input) {
    return switch (input) {
      case MASS -> both(0.1, "a tenth", "heavier", "lighter");
      case MASS_CENTRE -> both(0.5, in.length(0.5), "higher", "lower");
      case LEAN -> both(1, "a degree", "more", "less");
      case LEAN_AZIMUTH -> both(10, "ten degrees", "to the right", "to the left");
      case THICKNESS -> both(0.005, in.smallLength(0.005), "thicker", "thinner");
      case STUMP, DBH -> both(0.02, in.smallLength(0.02), "more", "less");
      case GUST -> both(2, "a gust", in.speed(2) + " stronger", in.speed(2) + " weaker");
      case ATTACH, HEIGHT -> both(0.5, in.length(0.5), "higher", "lower");
      case BEARING -> both(0.5, in.length(0.5), "to the right", "to the left");
      default -> throw new IllegalArgumentException(input + " cannot be measured");
    };
  }

  private static Step both(double amount, String what, String more, String less) {
    return new Step(amount, what + " " + more, what + " " + less);
  }

  /** What to measure, and what an error of it does. */
  Doubt.Measure measure(Input input, double now, Off off, double halved) {
    String task = Character.toUpperCase(input.task().charAt(0)) + input.task().substring(1);
    boolean lower = !shown(off.margin()).equals(shown(now)) && off.margin() < now;
    String does =
        lower
            ? off.words() + " takes the margin from " + shown(now) + " to " + shown(off.margin())
            : "even " + off.words() + " leaves the margin at " + shown(off.margin());
    return new Doubt.Measure(input, task + ": " + does + ".", off.margin(), halved);
  }

  /** What trying the grip can bring. */
  Doubt.Measure grip(double least, double most, double halved) {
    return new Doubt.Measure(
        Input.GRIP,
        "Try the grip with a pull against a fixed point before any cut: the margin is "
            + shown(least)
            + " at the least read for such ground and "
            + shown(most)
            + " at the most.",
        least,
        halved);
  }

  private static String shown(double margin) {
    return Double.isFinite(margin) ? DisplayUnits.ratio(margin) : "no pull needed";
  }
}
