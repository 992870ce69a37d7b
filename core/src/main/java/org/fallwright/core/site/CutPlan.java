package org.fallwright.core.site;

import java.util.List;
import org.fallwright.core.units.Range;

/**
 * How the tree is to be cut, with the hinge thicknesses on offer.
 *
 * @param heightM height of the hinge above the ground at the stump [m]
 * @param face kind of face cut
 * @param faceFraction face depth as a share of the stem diameter at the cut
 * @param faceOpeningDeg opening of the face [degrees]
 * @param hingeThicknessesM hinge thicknesses on offer [m]
 * @param hingeHow how well the thickness will be kept
 * @param hingeWidthM whole hinge width, holes included [m]; null: the chord
 * @param kerfM width of the saw kerf [m]
 * @param wedges whether wedges are set behind the tree
 */
public record CutPlan(
    double heightM,
    Face face,
    double faceFraction,
    double faceOpeningDeg,
    List<Double> hingeThicknessesM,
    How hingeHow,
    Double hingeWidthM,
    double kerfM,
    boolean wedges) {
  /**
   * Kinds of face cut. With the hinge in its corner each shuts once the stem turned its opening.
   */
  public enum Face {
    /** Wide open, both cuts sloping, back cut level with the corner. */
    OPEN("open"),
    /** Level floor, sloping roof. */
    CONVENTIONAL("conventional"),
    /** Level roof, floor sloping into the stump. */
    HUMBOLDT("Humboldt");

    private final String said;

    Face(String said) {
      this.said = said;
    }

    /** The kind as it stands in a sentence. */
    public String said() {
      return said;
    }
  }

  public CutPlan {
    Range.check("height_m", heightM, 0, 5, "m");
    Range.present("face", face);
    Range.check("face_fraction", faceFraction, 0.05, 0.6, "");
    Range.check("face_opening_deg", faceOpeningDeg, 10, 120, "degrees");
    hingeThicknessesM = List.copyOf(Range.present("hinge_thicknesses_m", hingeThicknessesM));
    if (hingeThicknessesM.isEmpty()) {
      throw new IllegalArgumentException("hinge_thicknesses_m is empty; it must have at least one");
    }
    hingeThicknessesM.forEach(t -> Range.check("hinge_thicknesses_m", t, 0.005, 0.5, "m"));
    Range.present("hinge_how", hingeHow).usualOnly("hinge_how");
    Range.checkOrNull("hinge_width_m", hingeWidthM, 0.02, 6, "m");
    Range.check("kerf_m", kerfM, 0, 0.05, "m");
  }
}
