package org.fallwright.core.site;

import com.fasterxml.jackson.annotation.JsonSubTypes;
import com.fasterxml.jackson.annotation.JsonTypeInfo;
import org.fallwright.core.units.Range;

/** A candidate anchor. */
@JsonTypeInfo(use = JsonTypeInfo.Id.NAME, property = "type")
@JsonSubTypes({
  @JsonSubTypes.Type(value = Anchor.StandingTree.class, name = "tree"),
  @JsonSubTypes.Type(value = Anchor.Stump.class, name = "stump"),
  @JsonSubTypes.Type(value = Anchor.ParkedVehicle.class, name = "vehicle"),
  @JsonSubTypes.Type(value = Anchor.RatedPoint.class, name = "rated")
})
public sealed interface Anchor {
  /** Its name on the plan. */
  String id();

  /** Where it stands. */
  Place place();

  /** Height of the sling or fastening above the ground there [m]. */
  double slingHeightM();

  /** Why it was rejected on the site; null: it was not. */
  String rejected();

  /** Whose land it stands on; null: not stated. */
  String land();

  /** Soil classes of the published pulling tests. */
  enum Soil {
    FREE_DRAINING_MINERAL,
    GLEYED_MINERAL,
    PEATY_MINERAL,
    DEEP_PEAT
  }

  /** Condition of a tree or stump as seen on the site. */
  enum Condition {
    SOUND,
    DEAD,
    DECAYED,
    LOOSENED,
    CUT_ROOTS
  }

  /**
   * A standing tree.
   *
   * @param species key of the species table
   * @param dbhM stem diameter over bark at 1.3 m [m]
   * @param heightM its height [m]
   * @param crownBaseM height of the crown's base [m]
   * @param crownRadiusM radius of the crown [m]
   * @param soil soil class
   * @param deepRooting whether roots go deeper than 80 cm
   * @param saturated whether the ground is saturated
   * @param condition as seen
   * @param tieBack whether it is tied back to a second anchor
   */
  record StandingTree(
      String id,
      Place place,
      double slingHeightM,
      String rejected,
      String land,
      String species,
      double dbhM,
      double heightM,
      double crownBaseM,
      double crownRadiusM,
      Soil soil,
      boolean deepRooting,
      boolean saturated,
      Condition condition,
      boolean tieBack)
      implements Anchor {
    public StandingTree {
      common(id, place, slingHeightM, 10);
      Range.text("species", species);
      Range.check("dbh_m", dbhM, 0.02, 4, "m");
      Range.check("height_m", heightM, 1, 120, "m");
      Range.check("crown_base_m", crownBaseM, 0, heightM, "m");
      Range.check("crown_radius_m", crownRadiusM, 0.1, 40, "m");
      Range.present("soil", soil);
      Range.present("condition", condition);
    }
  }

  /**
   * A stump, reckoned from the tree that stood on it.
   *
   * @param species key of the species table
   * @param diameterM stump diameter [m]
   * @param onceHeightM height of the tree that stood there [m]
   * @param onceMassKg stem mass of that tree [kg]; null: from diameter, height and density
   */
  record Stump(
      String id,
      Place place,
      double slingHeightM,
      String rejected,
      String land,
      String species,
      double diameterM,
      double onceHeightM,
      Double onceMassKg,
      Soil soil,
      boolean deepRooting,
      boolean saturated,
      Condition condition)
      implements Anchor {
    public Stump {
      common(id, place, slingHeightM, 3);
      Range.text("species", species);
      Range.check("diameter_m", diameterM, 0.02, 4, "m");
      Range.check("once_height_m", onceHeightM, 1, 120, "m");
      Range.checkOrNull("once_mass_kg", onceMassKg, 1, 200_000, "kg");
      Range.present("soil", soil);
      Range.present("condition", condition);
    }
  }

  /**
   * A vehicle parked as an anchor, all wheels locked.
   *
   * @param massKg its mass [kg]
   * @param surface key of the surface table
   * @param wet whether the surface is wet
   * @param uphillDeg slope of the ground along the line, positive where it rises away from the tree
   * @param ratedPointN rated load of the point the line is fixed to [N]
   */
  record ParkedVehicle(
      String id,
      Place place,
      double slingHeightM,
      String rejected,
      String land,
      double massKg,
      String surface,
      boolean wet,
      double uphillDeg,
      double ratedPointN)
      implements Anchor {
    public ParkedVehicle {
      common(id, place, slingHeightM, 3);
      Range.check("mass_kg", massKg, 200, 60_000, "kg");
      Range.text("surface", surface);
      Range.check("uphill_deg", uphillDeg, -30, 30, "degrees");
      Range.check("rated_point_N", ratedPointN, 100, 1e6, "N");
    }
  }

  /**
   * A point whose allowed load somebody vouches for.
   *
   * @param breakingLoadN breaking load vouched for [N]
   * @param vouchedBy who vouches for it
   */
  record RatedPoint(
      String id,
      Place place,
      double slingHeightM,
      String rejected,
      String land,
      double breakingLoadN,
      String vouchedBy)
      implements Anchor {
    public RatedPoint {
      common(id, place, slingHeightM, 10);
      Range.check("breaking_load_N", breakingLoadN, 100, 1e7, "N");
      Range.text("vouched_by", vouchedBy);
    }
  }

  private static void common(String id, Place place, double slingHeightM, double highest) {
    Range.text("id", id);
    Range.present("place", place);
    Range.check("sling_height_m", slingHeightM, 0, highest, "m");
  }
}
