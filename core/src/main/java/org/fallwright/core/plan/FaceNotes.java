package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.units.DisplayUnits;

/**
 * What is said of the face: when it shuts, how deep it is, where the back cut lies. The hinge sits
 * in its corner, so it shuts when the stem has turned by the face's opening. Says what is published
 * and refuses nothing; whether it opens far enough for the movement is a check of its own.
 *
 * <p>Sources: OSHA Logging eTool, Kinds of notches (open face from 70 degrees, shuts just before
 * the tree lands; conventional and Humboldt 45 degrees, shut in mid-fall; depth 1/4 to 1/3); WAC
 * 296-54-53910(10) (1/4); Michigan R 408.15336(3) (1/3); 29 CFR 1910.266(h)(2)(vii) (back cut).
 */
final class FaceNotes {
  private FaceNotes() {}

  static List<String> of(CutPlan cut, DisplayUnits in, TreeSide t) {
    List<String> notes = new ArrayList<>();
    double least = Allowances.OPEN_FACE_LEAST.value();
    String opens = degrees(cut.faceOpeningDeg());
    if (cut.face() == CutPlan.Face.OPEN) {
      if (cut.faceOpeningDeg() < least) {
        notes.add(
            String.format(
                Locale.ROOT,
                "An open face opens %s or more; this one %s: it shuts earlier.",
                degrees(least),
                opens));
      }
    } else {
      notes.add(
          String.format(
              Locale.ROOT,
              "The %s face shuts when the stem has turned %s%s. %s; the pull's movement ends at %s.",
              cut.face().said(),
              opens,
              cut.faceOpeningDeg() < least
                  ? ", in mid-fall: from there the hinge breaks and guides no more"
                  : "",
              t.commitRad() > 0
                  ? "The tree goes by itself from " + in.angle(t.commitRad())
                  : "The tree goes by itself as it stands",
              in.angle(t.endRad())));
      notes.add(
          "Back cut above the face's corner, except where the tree is pulled (29 CFR"
              + " 1910.266(h)(2)(vii)); other places have rules of their own.");
    }
    double depth = cut.faceFraction();
    if (depth < Allowances.FACE_DEPTH_LEAST.value() || depth > Allowances.FACE_DEPTH_MOST.value()) {
      notes.add(
          String.format(
              Locale.ROOT,
              "The face is %.2f of the diameter deep; published are 0.25 to 0.33 (OSHA Logging"
                  + " eTool), 0.25 (WAC 296-54-53910) and about 0.33 (Michigan R 408.15336).",
              depth));
    }
    return notes;
  }

  private static String degrees(double deg) {
    return DisplayUnits.METRIC.angle(Math.toRadians(deg));
  }
}
