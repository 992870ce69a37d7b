package org.fallwright.core.site;

import java.util.ArrayList;
import java.util.List;

/**
 * A quantity of a site that somebody entered, and where it belongs.
 *
 * @param field its field in the site file, such as "tree.lean_deg"
 * @param name what it is called in a sentence, such as "lean"
 * @param unit SI unit of the value; degrees for an angle
 * @param quantity what was entered
 * @param component name of the record's component; the tree's, or that of the conditions
 */
public record Entry(String field, String name, String unit, Quantity quantity, String component) {
  /** Every quantity that was entered, in the order of the file. */
  public static List<Entry> of(Site site) {
    SubjectTree t = site.tree();
    List<Entry> all = new ArrayList<>();
    add(all, "tree.dbh_m", "stem diameter", "m", t.dbhM(), "dbhM");
    add(
        all,
        "tree.stump_diameter_m",
        "diameter at the cut",
        "m",
        t.stumpDiameterM(),
        "stumpDiameterM");
    add(all, "tree.height_m", "height", "m", t.heightM(), "heightM");
    add(all, "tree.lean_deg", "lean", "deg", t.leanDeg(), "leanDeg");
    add(all, "tree.lean_azimuth_deg", "way it leans", "deg", t.leanAzimuthDeg(), "leanAzimuthDeg");
    add(all, "tree.mass_kg", "mass", "kg", t.massKg(), "massKg");
    add(
        all,
        "tree.mass_centre_m",
        "height of the mass centre",
        "m",
        t.massCentreM(),
        "massCentreM");
    add(all, "conditions.gust_mps", "gust", "m/s", site.conditions().gustMps(), "gustMps");
    return all;
  }

  private static void add(
      List<Entry> all, String field, String name, String unit, Quantity q, String component) {
    if (q != null) {
      all.add(new Entry(field, name, unit, q, component));
    }
  }

  /**
   * The site with another figure in this place.
   *
   * @throws IllegalArgumentException where the site refuses it
   */
  public Site put(Site site, Quantity other) {
    return field.startsWith("tree.")
        ? Copy.with(site, "tree", Copy.with(site.tree(), component, other))
        : Copy.with(site, "conditions", Copy.with(site.conditions(), component, other));
  }
}
