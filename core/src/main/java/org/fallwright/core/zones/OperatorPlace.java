package org.fallwright.core.zones;

import java.util.List;
import org.fallwright.core.site.Position;

/**
 * How a person at the pull source stands to the zones.
 *
 * @param outsideFootprint whether the tree cannot come to lie there
 * @param outsideBights whether the place is outside every inner angle of the line
 * @param offAxis whether the place is off the axis of the last leg
 * @param fromStumpM distance from the stump [m]
 */
public record OperatorPlace(
    boolean outsideFootprint, boolean outsideBights, boolean offAxis, double fromStumpM) {
  public static OperatorPlace of(
      Position person, FallFootprint footprint, List<Bight> bights, Recoil recoil) {
    return new OperatorPlace(
        !footprint.contains(person),
        bights.stream().noneMatch(b -> b.contains(person)),
        !recoil.onLastLeg(person),
        footprint.stump().distanceTo(person));
  }
}
