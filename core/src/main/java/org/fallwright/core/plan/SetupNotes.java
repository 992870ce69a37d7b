package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.line.ElasticLine;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Site;
import org.fallwright.core.statics.Ratios;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.units.DisplayUnits;

/** Remarks and warnings of one setup that are no checks. */
final class SetupNotes {
  private SetupNotes() {}

  static List<String> of(
      Site site, DisplayUnits in, Setup setup, TreeSide t, Ratios r, PullOffer offer) {
    List<String> notes = new ArrayList<>();
    double rule = Allowances.HINGE_THICKNESS_SHARE.value() * site.tree().dbhM().value();
    if (Math.abs(setup.hingeThicknessM() - rule) > 0.1 * rule) {
      notes.add(
          "The hinge is "
              + in.smallLength(setup.hingeThicknessM())
              + " thick; a tenth of the diameter would be "
              + in.smallLength(rule)
              + ".");
    }
    notes.addAll(FaceNotes.of(site.cut(), in, t));
    if (t.planN() == 0) {
      notes.add("The tree leans the way it is to go: beware of a stem that splits at the cut.");
    }
    if (t.neededN() / t.pathNPerM() > t.shorteningToCommitM() && t.neededN() > 0) {
      notes.add(
          "The line's own stretch carries the tree until it goes: it cannot be stopped half way.");
    }
    if (r.holdAsked()) {
      double peak = r.holding().peakN(0, t.holdN());
      notes.add(
          "If the line is slack when the hinge lets go, "
              + (Double.isInfinite(peak)
                  ? "nothing bounds the jerk: no line of this stiffness holds it."
                  : "up to " + in.both(u -> u.forceAtLeast(peak)) + " can come on it."));
    }
    ElasticLine line = ElasticLine.of(t.workingN(), t.lineNPerM());
    notes.add(
        String.format(
            Locale.ROOT,
            "The loaded line stretches %s and stores %s. Nobody on its axis, past its ends or inside its angle%s.",
            in.length(line.stretchM()),
            in.energy(line.energyJ()),
            offer.operators() > 0 ? "; who works the source accepts it by name" : ""));
    return notes;
  }
}
