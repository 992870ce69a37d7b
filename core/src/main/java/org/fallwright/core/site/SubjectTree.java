package org.fallwright.core.site;

import java.util.List;
import org.fallwright.core.units.Range;

/**
 * The tree to be pulled over.
 *
 * @param id its name on the plan
 * @param species key of the species table
 * @param stump middle of the stump
 * @param dbhM stem diameter over bark, square to the stem, {@link #BREAST_HEIGHT_M} along it from
 *     the ground: on a leaning stem along its underside, the side it leans towards; on a slope from
 *     the uphill side [m]
 * @param stumpDiameterM stem diameter inside the bark at the cut [m]; null: from DBH and flare
 * @param diameters further stem diameters
 * @param heightM height above the ground [m]
 * @param crownBaseM height of the crown's base above the ground [m]
 * @param crownRadiusM radius of the crown [m]
 * @param leanDeg lean of the stem axis from the vertical [degrees]
 * @param leanAzimuthDeg direction the tree leans towards [degrees from true north]
 * @param massKg green mass above the cut [kg]; null: from the mass equation
 * @param massCentreM height of the mass centre above the ground [m]; null: 0.40 of the height
 * @param sections what its weighed pieces add up to, in place of mass and mass centre; null: not
 *     weighed
 * @param crownShare share of the mass that is crown [0 to 1]; null: by DBH, where an offset or an
 *     outline of the crown is given
 * @param crownOffsetM offset of the crown's middle from the stem axis, [east, north] [m]; null:
 *     none
 * @param crownOutline the crown seen from above, on the site plane, in place of its offset; null:
 *     not drawn
 * @param crownAreaM2 frontal area of the crown [m²]; null: ellipse of its width and depth
 * @param shellM thickness of the sound shell at the cut and up the stem [m]; null: sound through
 * @param deadOrDecayed whether the wood at the hinge is dead or decayed
 * @param inLeaf whether the crown is in leaf
 * @param iceOrWet whether ice, wet snow or rain loads the crown
 * @param massBy how a mass that was neither entered nor weighed is reckoned
 */
public record SubjectTree(
    String id,
    String species,
    Place stump,
    Quantity dbhM,
    Quantity stumpDiameterM,
    List<StemDiameter> diameters,
    Quantity heightM,
    double crownBaseM,
    double crownRadiusM,
    Quantity leanDeg,
    Quantity leanAzimuthDeg,
    Quantity massKg,
    Quantity massCentreM,
    List<WeighedSection> sections,
    Double crownShare,
    Position crownOffsetM,
    Shape.Polygon crownOutline,
    Double crownAreaM2,
    Double shellM,
    boolean deadOrDecayed,
    boolean inLeaf,
    boolean iceOrWet,
    MassBy massBy) {
  /** How a mass that was not entered is reckoned. */
  public enum MassBy {
    /** Published equation by DBH and species. */
    EQUATION,
    /** Volume of the stem by its measured diameters, green density and the crown's share. */
    STEM
  }

  /** Where DBH is measured, along the stem from the ground [m]; common practice. */
  public static final double BREAST_HEIGHT_M = 1.3;

  /** Farthest a point of the crown's outline may lie from the stump [m]. */
  public static final double OUTLINE_FARTHEST = 100;

  public SubjectTree {
    Range.text("id", id);
    Range.text("species", species);
    Range.present("stump", stump);
    Range.present("dbh_m", dbhM).within("dbh_m", 0.05, 4, "m");
    if (stumpDiameterM != null) {
      stumpDiameterM.within("stump_diameter_m", 0.05, 6, "m");
    }
    diameters = List.copyOf(Range.present("diameters", diameters));
    Range.present("height_m", heightM).within("height_m", 2, 120, "m");
    Range.check("crown_base_m", crownBaseM, 0, heightM.value(), "m");
    Range.check("crown_radius_m", crownRadiusM, 0.1, 40, "m");
    Range.present("lean_deg", leanDeg).within("lean_deg", 0, 45, "degrees");
    Range.present("lean_azimuth_deg", leanAzimuthDeg).within("lean_azimuth_deg", 0, 360, "degrees");
    if (massKg != null) {
      massKg.within("mass_kg", 10, 500_000, "kg");
    }
    if (massCentreM != null) {
      massCentreM.within("mass_centre_m", 0.5, heightM.value(), "m");
    }
    if (sections != null) {
      sections = List.copyOf(sections);
      if (sections.isEmpty()) {
        throw new IllegalArgumentException("sections is empty; it must have at least one, or null");
      }
      for (WeighedSection s : sections) {
        Range.check("sections.mid_height_m", s.midHeightM(), 0, heightM.value(), "m");
      }
      double together = sections.stream().mapToDouble(WeighedSection::massKg).sum();
      Range.check("sections.mass_kg, added up,", together, 10, 500_000, "kg");
      oneOf("sections", sections, "mass_kg", massKg);
      oneOf("sections", sections, "mass_centre_m", massCentreM);
    }
    if (crownOutline != null) {
      double far =
          crownOutline.points().stream().mapToDouble(stump.at()::distanceTo).max().orElseThrow();
      Range.check("crown_outline.points farthest off the stump", far, 0, OUTLINE_FARTHEST, "m");
    }
    oneOf("crown_outline", crownOutline, "crown_offset_m", crownOffsetM);
    Range.checkOrNull("crown_share", crownShare, 0, 1, "");
    Range.checkOrNull("crown_area_m2", crownAreaM2, 0, 5000, "m²");
    Range.checkOrNull("shell_m", shellM, 0.001, 3, "m");
    Range.present("mass_by", massBy);
    for (StemDiameter d : diameters) {
      Range.check("diameters.height_m", d.heightM(), 0, heightM.value(), "m");
    }
  }

  /**
   * The same tree with its dimensions found otherwise.
   *
   * @param dbh [m]
   * @param atCut diameter inside the bark at the cut [m]; NaN: from DBH and flare
   * @param height [m]
   * @param lean [degrees]
   * @param towards direction of the lean [degrees]
   */
  public SubjectTree measuring(
      double dbh, double atCut, double height, double lean, double towards) {
    return new SubjectTree(
        id,
        species,
        stump,
        Quantity.measured(dbh),
        Double.isNaN(atCut) ? null : Quantity.measured(atCut),
        diameters,
        Quantity.measured(height),
        crownBaseM,
        crownRadiusM,
        Quantity.measured(lean),
        Quantity.measured(towards),
        massKg,
        massCentreM,
        sections,
        crownShare,
        crownOffsetM,
        crownOutline,
        crownAreaM2,
        shellM,
        deadOrDecayed,
        inLeaf,
        iceOrWet,
        massBy);
  }

  private static void oneOf(String field, Object stated, String other, Object alsoStated) {
    if (stated != null && alsoStated != null) {
      throw new IllegalArgumentException(
          field + " is stated and so is " + other + "; one of them must be null");
    }
  }
}
