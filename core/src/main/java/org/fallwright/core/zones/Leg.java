package org.fallwright.core.zones;

import java.util.Set;
import org.fallwright.core.site.Position;
import org.fallwright.core.units.Range;

/**
 * A straight leg of the line.
 *
 * @param from one end in plan
 * @param fromElevationM its elevation above the site's height datum [m]
 * @param to the other end in plan
 * @param toElevationM its elevation [m]
 * @param fastenedTo ids of the things that it ends at: trees, anchors, spots, targets
 */
public record Leg(
    Position from,
    double fromElevationM,
    Position to,
    double toElevationM,
    Set<String> fastenedTo) {
  public Leg {
    Range.present("from", from);
    Range.check("from_elevation_m", fromElevationM, -500, 9200, "m");
    Range.present("to", to);
    Range.check("to_elevation_m", toElevationM, -500, 9200, "m");
    fastenedTo = Set.copyOf(Range.present("fastened_to", fastenedTo));
  }

  Segment3 segment() {
    return Segment3.between(from, fromElevationM, to, toElevationM);
  }
}
