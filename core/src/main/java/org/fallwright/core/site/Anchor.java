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
  @JsonSubTypes.Type(value = Anchor.RatedPoint.class, name = "rated"),
  @JsonSubTypes.Type(value = Anchor.Pickets.class, name = "pickets"),
  @JsonSubTypes.Type(value = Anchor.BuriedLog.class, name = "deadman"),
  @JsonSubTypes.Type(value = Anchor.TwoLegs.class, name = "two-legs")
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

  /**
   * How pickets or pins are set. Wooden pickets are 3 in thick and 5 ft long, 3 to 4 ft in the
   * ground; the words count those lashed together, from the load backwards.
   */
  enum Holdfast {
    SINGLE,
    ONE_ONE,
    ONE_ONE_ONE,
    TWO_ONE,
    THREE_TWO_ONE,
    /** Steel pickets of 25 mm by 1.5 m in one row. */
    STEEL_ROW,
    /** Steel pins 1 in thick, 36 in in the ground. */
    THIN_PINS,
    /** Steel pins 3 in thick, 36 in in the ground. */
    THICK_PINS;

    /** Whether it is of wooden pickets, whose number its word gives. */
    public boolean wooden() {
      return compareTo(STEEL_ROW) < 0;
    }
  }

  /** Ground classes of the published tables of pickets and pins. */
  enum PicketSoil {
    UNDISTURBED_LOAM,
    COHESIVE_POOR,
    COHESIVE_AVERAGE,
    COHESIVE_GOOD,
    SAND_LOOSE,
    SAND_MEDIUM,
    SAND_DENSE
  }

  /** Ground classes of the published table of deadmen. */
  enum DeadmanSoil {
    LOAM,
    /** Fine-grained, sandy or very wet. */
    SOFT
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

  /**
   * Pickets or pins driven into the ground.
   *
   * @param holdfast how they are set
   * @param count how many steel pickets or pins; 1 where the pickets are wooden
   * @param soil ground class
   * @param wet whether the ground is wet
   */
  record Pickets(
      String id,
      Place place,
      double slingHeightM,
      String rejected,
      String land,
      Holdfast holdfast,
      int count,
      PicketSoil soil,
      boolean wet)
      implements Anchor {
    public Pickets {
      common(id, place, slingHeightM, 0.3);
      Range.present("holdfast", holdfast);
      Range.check("count", count, 1, 10, "");
      if (holdfast.wooden() && count != 1) {
        throw new IllegalArgumentException(
            "count is "
                + count
                + "; it must be 1 with wooden pickets, whose number the holdfast gives");
      }
      Range.present("soil", soil);
    }
  }

  /**
   * A log or timber buried across the pull, its line led to the surface in a trench of its own.
   *
   * @param depthM mean depth of its face [m]
   * @param faceHeightM height of its face; a log's diameter [m]
   * @param lengthM its length [m]
   * @param lineRun metres that the trench of its line runs for each metre that it rises, 1 to 4
   * @param soil ground class
   */
  record BuriedLog(
      String id,
      Place place,
      double slingHeightM,
      String rejected,
      String land,
      double depthM,
      double faceHeightM,
      double lengthM,
      int lineRun,
      DeadmanSoil soil)
      implements Anchor {
    public BuriedLog {
      common(id, place, slingHeightM, 0.3);
      Range.check("depth_m", depthM, 0.91, 3, "m");
      Range.check("face_height_m", faceHeightM, 0.1, 1, "m");
      Range.check("length_m", lengthM, 0.5, 6, "m");
      Range.check("line_run", lineRun, 1, 4, "");
      Range.present("soil", soil);
    }
  }

  /**
   * A point held by two legs, each to an anchor of its own.
   *
   * @param place where the legs meet
   * @param slingHeightM height at which they meet above the ground there [m]
   * @param first id of the anchor of one leg
   * @param second id of the anchor of the other
   */
  record TwoLegs(
      String id,
      Place place,
      double slingHeightM,
      String rejected,
      String land,
      String first,
      String second)
      implements Anchor {
    public TwoLegs {
      common(id, place, slingHeightM, 10);
      Range.text("first", first);
      Range.text("second", second);
      if (first.equals(second)) {
        throw new IllegalArgumentException(
            "second is \"" + second + "\", as the first; each leg must have its own anchor");
      }
    }
  }

  private static void common(String id, Place place, double slingHeightM, double highest) {
    Range.text("id", id);
    Range.present("place", place);
    Range.check("sling_height_m", slingHeightM, 0, highest, "m");
  }
}
