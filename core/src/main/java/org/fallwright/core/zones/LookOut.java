package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Target;
import org.locationtech.jts.geom.Coordinate;

/**
 * A place for the look-out: outside the people ring, off every zone and off things on the ground,
 * with the stump and the person at the source in sight past the buildings; of those the one nearest
 * to square off the lay, from where the whole fall is seen.
 *
 * <p>Own reckoning. Tries every 5° on rings 1, 6, 11, … m outside the people ring. Leaves out what
 * ground and plants hide.
 */
public final class LookOut {
  private static final int STEP_DEG = 5;
  private static final double OUTSIDE_M = 1;
  private static final double STEP_M = 5;

  private final List<Edges> blocking = new ArrayList<>();
  private final List<Edges> notOn = new ArrayList<>();

  public LookOut(List<Target> targets) {
    for (Target t : targets) {
      Edges e = new Edges(t.shape().geometry());
      if (t.kind() == Target.Kind.STRUCTURE) {
        blocking.add(e);
      }
      if (t.kind() != Target.Kind.PLANTING && t.kind() != Target.Kind.BURIED) {
        notOn.add(e);
      }
    }
  }

  /**
   * The place, or none.
   *
   * @param zones zones and line of the setup
   * @param ringM radius of the people ring [m]
   * @param operator where the source is worked; null: nobody is there
   */
  public Optional<Position> find(EscapeRoutes.Zones zones, double ringM, Position operator) {
    Position stump = zones.footprint().stump();
    double lay = zones.footprint().layDeg();
    int rings = (int) Allowances.LOOK_OUT_RINGS.value();
    for (int ring = 0; ring < rings; ring++) {
      double radius = ringM + OUTSIDE_M + ring * STEP_M;
      for (int off = 0; off <= 90; off += STEP_DEG) {
        for (double bearing : new double[] {90 - off, -90 + off, 90 + off, -90 - off}) {
          Position p = stump.along(lay + bearing, radius);
          if (zones.free(p) && stands(p) && sees(p, stump) && sees(p, operator)) {
            return Optional.of(p);
          }
        }
      }
    }
    return Optional.empty();
  }

  private boolean stands(Position p) {
    Coordinate c = new Coordinate(p.eastM(), p.northM());
    return notOn.stream().allMatch(e -> e.distanceTo(c) > OUTSIDE_M);
  }

  private boolean sees(Position from, Position to) {
    if (to == null) {
      return true;
    }
    Edges sight =
        new Edges(
            Shape.FACTORY.createLineString(
                new Coordinate[] {
                  new Coordinate(from.eastM(), from.northM()),
                  new Coordinate(to.eastM(), to.northM())
                }));
    return blocking.stream().noneMatch(b -> sight.gapTo(b).distanceM() <= 0);
  }
}
