package org.fallwright.maps.picture;

import java.util.List;
import org.fallwright.core.site.Position;
import org.fallwright.core.units.Range;

/**
 * How far a picture lies off, by points whose true place was taped: the mean of how far each must
 * be moved, and how far each still misses after that.
 *
 * @param eastM how far the picture is to be moved east [m]
 * @param northM how far north [m]
 * @param missesM what is left at each tie [m]
 */
public record Ties(double eastM, double northM, List<Double> missesM) {
  /**
   * A point seen in the picture.
   *
   * @param seen where the picture, not moved, shows it
   * @param taped where it is
   */
  public record Tie(Position seen, Position taped) {
    public Tie {
      Range.present("place seen", seen);
      Range.present("place taped", taped);
    }
  }

  /** The shift by one tie or more. */
  public static Ties of(List<Tie> ties) {
    Range.check("number of ties", ties.size(), 1, 20, "");
    double east = 0;
    double north = 0;
    for (Tie t : ties) {
      east += (t.taped.eastM() - t.seen.eastM()) / ties.size();
      north += (t.taped.northM() - t.seen.northM()) / ties.size();
    }
    double e = east;
    double n = north;
    return new Ties(
        east,
        north,
        ties.stream()
            .map(
                t ->
                    Math.hypot(
                        t.taped.eastM() - t.seen.eastM() - e,
                        t.taped.northM() - t.seen.northM() - n))
            .toList());
  }

  /** The greatest miss left [m]. */
  public double worstM() {
    return missesM.stream().mapToDouble(Double::doubleValue).max().orElse(0);
  }
}
