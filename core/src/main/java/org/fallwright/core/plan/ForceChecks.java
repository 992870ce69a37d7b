package org.fallwright.core.plan;

import java.util.Locale;
import java.util.function.Supplier;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.statics.Part;
import org.fallwright.core.statics.Ratios;
import org.fallwright.core.statics.Start;
import org.fallwright.core.statics.Status;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.units.DisplayUnits;

/** The checks of the force balance: movement, pull, hold, hinge and every part. */
final class ForceChecks {
  private final Site site;
  private final DisplayUnits in;
  private final Grade grade;

  ForceChecks(Site site, DisplayUnits in, Grade grade) {
    this.site = site;
    this.in = in;
    this.grade = grade;
  }

  private Position stump() {
    return site.tree().stump().at();
  }

  /** The hinge lets go and the line keeps its lever; said in every case. */
  void movement(TreeSide t, double attachAboveHingeM) {
    double asked = Allowances.LEVER_LEAST.value() * attachAboveHingeM;
    if (t.status() == Status.HINGE_NEVER_LETS_GO) {
      grade.factored(
          "hinge lets go",
          t.hingeNm(),
          t.hingeNm() + t.windNm(),
          "N·m",
          0,
          stump(),
          () ->
              Double.isNaN(t.thicknessThatWouldM())
                  ? "The hinge never lets go: the wind alone beats the tree's weight."
                  : "The hinge never lets go; one of "
                      + in.smallLength(t.thicknessThatWouldM())
                      + " would.");
    } else {
      grade.factored(
          "hinge lets go",
          Math.toDegrees(t.commitRad()),
          Allowances.MOVEMENT_CAP.value(),
          "deg",
          Double.POSITIVE_INFINITY,
          stump(),
          () -> "The tree's own weight takes it at " + in.angle(t.commitRad()) + ".");
      boolean lost = t.status() == Status.LEVER_LOST;
      grade.factored(
          "lever",
          t.leverMinM(),
          asked,
          "m",
          Math.max(0, t.leverMinM() / asked),
          stump(),
          () ->
              lost
                  ? "The line loses its lever on the hinge at "
                      + in.angle(t.leverLostRad())
                      + ": it pulls the wrong way for this lay."
                  : "The line keeps at least " + in.length(t.leverMinM()) + " of lever.");
    }
    if (Double.isFinite(t.endRad())) {
      double face =
          Math.max(
              Math.toDegrees(t.commitRad()) + Allowances.FACE_OVER_COMMIT.value(),
              Math.toDegrees(t.endRad()) + Allowances.FACE_OVER_MOVEMENT.value());
      double open = site.cut().faceOpeningDeg();
      grade.plain(
          "face opening",
          open,
          face,
          "deg",
          open / face,
          stump(),
          () ->
              String.format(
                  Locale.ROOT,
                  "The face opens %.0f degrees; %.0f are asked so that it does not shut first.",
                  open,
                  face));
    }
  }

  /** Pull, hold, hinge. */
  void pull(Ratios r, TreeSide t, PullOffer offer, Supplier<String> source) {
    grade.plain(
        "pull",
        r.source().lowN(),
        t.planN(),
        "N",
        r.pull(),
        null,
        () ->
            t.planN() == 0
                ? "No pull is needed for this lay."
                : "The pull to plan for is "
                    + in.both(u -> u.forceAtLeast(t.planN()))
                    + " at the tree; "
                    + source.get()
                    + " gives "
                    + in.both(u -> u.forceAtMost(r.source().lowN()))
                    + " ("
                    + offer.limit().what().english()
                    + ").");
    if (t.holdN() > t.planN()) {
      double most = Math.min(r.ceiling().tensionN(), r.source().lowN());
      grade.factored(
          "tension window",
          most,
          t.workingN(),
          "N",
          most / t.workingN(),
          null,
          () ->
              "Holding the tree asks for more than pulling it: "
                  + in.both(u -> u.forceAtLeast(t.workingN()))
                  + ".");
    }
    Supplier<String> rests =
        () ->
            String.format(
                Locale.ROOT,
                "Not asked: sitting back, the tree rests on its stump (%.2f).",
                t.restShare());
    grade.plain(
        "hold",
        r.source().holdN(),
        t.holdN(),
        "N",
        r.hold(),
        null,
        () ->
            r.holdAsked()
                ? "Without its hinge the tree pulls back with "
                    + in.both(u -> u.forceAtLeast(t.holdN()))
                    + "; "
                    + source.get()
                    + " holds "
                    + in.both(u -> u.forceAtMost(r.source().holdN()))
                    + "."
                : rests.get());
    grade.plain(
        "hold stability",
        r.holding().stability(),
        Allowances.HOLD_STABILITY_ASKED.value(),
        "",
        r.holdStability(),
        null,
        () ->
            !r.holdAsked()
                ? rests.get()
                : !r.source().captured()
                    ? "A constant force can pull a tree over; it can never hold one."
                    : String.format(
                        Locale.ROOT,
                        "The line is %.1f times as stiff as the tree is unstable.",
                        r.holding().stability()));
    start(r, t);
    hinge(r, t);
  }

  private void start(Ratios r, TreeSide t) {
    if (r.holding().start() != Start.RUNS || !r.holdAsked()) {
      return;
    }
    grade.tightAtBest(
        "start",
        r.holding().pretensionTopN(),
        t.holdN(),
        "N",
        stump(),
        () ->
            "Held at "
                + in.force(t.holdN())
                + " it goes as soon as the hinge is ready: be away before the last wood is cut.");
  }

  private void hinge(Ratios r, TreeSide t) {
    share(
        false,
        "steering",
        t.steerShare(),
        Ratios.HINGE_SHARE,
        r.steering(),
        "Side lean, wind and line take %.1f %% of the hinge's side strength; %.0f %% may be used.");
    share(
        true,
        "hinge turning",
        t.turnShare(),
        Ratios.HINGE_SHARE,
        r.turning(),
        "The line turns the hinge with %.1f %% of its strength; %.0f %% may be used.");
    share(
        true,
        "hinge crushing",
        t.crushShare(),
        Ratios.CRUSH_SHARE,
        r.crushing(),
        "Weight and line press the hinge to %.1f %% of its strength; %.0f %% may be used.");
  }

  private void share(
      boolean factored, String id, double share, double most, double ratio, String why) {
    double shown = Math.max(0, share);
    Supplier<String> text = () -> String.format(Locale.ROOT, why, 100 * shown, 100 * most);
    if (factored) {
      grade.factored(id, shown, most, "", ratio, stump(), text);
    } else {
      grade.plain(id, shown, most, "", ratio, stump(), text);
    }
  }

  /** Every part, at plan and at the most the source can do. */
  void parts(Ratios r, TreeSide t) {
    for (int i = 0; i < r.parts().size(); i++) {
      Part p = r.parts().get(i);
      double plan = t.workingN() * p.atPlan();
      double high = r.source().highN() * p.holding();
      double allowed = p.strengthN() / p.designFactor();
      double last = p.strengthN() / p.lastFactor();
      Position at = grade.full() ? at(p.name()) : null;
      grade.factored(
          p.name() + " at plan",
          allowed,
          plan,
          "N",
          r.atPlan()[i],
          at,
          () ->
              capital(p.name())
                  + " bears "
                  + in.both(u -> u.forceAtLeast(plan))
                  + " as planned; "
                  + in.both(u -> u.forceAtMost(allowed))
                  + " are allowed.");
      grade.factored(
          p.name() + " at high",
          last,
          high,
          "N",
          r.atHigh()[i],
          at,
          () ->
              capital(p.name())
                  + " bears "
                  + in.both(u -> u.forceAtLeast(high))
                  + " if the source stalls, slips or jerks; "
                  + in.both(u -> u.forceAtMost(last))
                  + " are the most.");
    }
  }

  private static String capital(String name) {
    return Character.toUpperCase(name.charAt(0)) + name.substring(1);
  }

  private Position at(String part) {
    if (part.equals("stem")) {
      return stump();
    }
    String id = part.substring(part.lastIndexOf(' ') + 1);
    return site.anchor(id).map(a -> a.place().at()).orElse(null);
  }
}
