package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * A thing that the tree must not hit, or may hit only knowingly.
 *
 * @param id its name on the plan
 * @param kind what it is
 * @param shape its outline
 * @param fix how the outline was set
 * @param statedErrorM own position error [m], or null for that of the fix
 * @param groundM elevation of the ground there [m]
 * @param heightM its height above the ground [m]
 * @param requiredDistanceM distance asked between it and the falling tree [m]; 0 where nothing is
 * @param occupied whether people may be in it
 * @param mayBeHit whether the owner has said that it may be hit
 * @param movable whether it can be moved before the work
 */
public record Target(
    String id,
    Kind kind,
    Shape shape,
    Fix fix,
    Double statedErrorM,
    double groundM,
    double heightM,
    double requiredDistanceM,
    boolean occupied,
    boolean mayBeHit,
    boolean movable) {
  /** Kinds of target. */
  public enum Kind {
    STRUCTURE,
    FENCE,
    ROAD,
    CAR,
    PLANTING,
    TREE,
    BURIED,
    PLACE_OF_PEOPLE,
    OTHER
  }

  public Target {
    Range.text("id", id);
    Range.present("kind", kind);
    Range.present("shape", shape);
    Range.present("fix", fix);
    Range.checkOrNull("stated_error_m", statedErrorM, 0, 100, "m");
    Range.check("ground_m", groundM, -500, 9000, "m");
    Range.check("height_m", heightM, 0, 300, "m");
    Range.check("required_distance_m", requiredDistanceM, 0, 100, "m");
  }

  /** Position error [m]. */
  public double errorM() {
    return statedErrorM != null ? statedErrorM : fix.errorM();
  }
}
