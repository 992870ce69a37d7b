package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.fallwright.core.plan.StandingPlace.Role;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.zones.OperatorStand;

/** The places of the crew, found by geometry and numbered from the stump outwards. */
final class CrewPlaces {
  private CrewPlaces() {}

  static List<StandingPlace> of(
      Site site,
      DisplayUnits in,
      Landing.Zones z,
      OperatorStand operator,
      Optional<Position> lookOut) {
    List<StandingPlace> places = new ArrayList<>();
    Position stump = site.tree().stump().at();
    add(
        places,
        Role.FELLER,
        stump,
        z.waysOut().isEmpty()
            ? "No way out is clear: nobody cuts here."
            : "Inside every zone: only until the tree moves, then out.");
    for (Position end : z.waysOut()) {
      double off = Math.IEEEremainder(stump.azimuthTo(end) - z.footprint().layDeg(), 360);
      add(
          places,
          Role.WAY_OUT,
          end,
          in.length(stump.distanceTo(end))
              + " from the stump, "
              + in.angle(Math.toRadians(Math.abs(off)))
              + (off < 0 ? " left" : " right")
              + " of the lay; outside footprint, sit-back zone, the line's angle and where its ends"
              + " fly, clear to walk.");
    }
    if (operator != null) {
      add(
          places,
          Role.OPERATOR,
          operator.at(),
          in.length(stump.distanceTo(operator.at()))
              + " from the stump, "
              + switch (operator.shelter()) {
                case OFF_AXIS -> "beside the line, away from the inside of its angle.";
                case IN_VEHICLE -> "in the vehicle, on the line's axis.";
                case ON_AXIS -> "on the line's axis.";
              });
    }
    lookOut.ifPresent(
        p ->
            add(
                places,
                Role.LOOK_OUT,
                p,
                in.length(stump.distanceTo(p))
                    + " from the stump, outside the people ring and every zone; stump"
                    + (operator == null ? "" : " and source")
                    + " in sight past the buildings drawn."));
    return places;
  }

  private static void add(List<StandingPlace> places, Role role, Position at, String why) {
    places.add(new StandingPlace(places.size() + 1, role, at, why));
  }
}
