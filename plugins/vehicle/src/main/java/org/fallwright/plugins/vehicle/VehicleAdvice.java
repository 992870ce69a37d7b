package org.fallwright.plugins.vehicle;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.pull.PullOffer.Finding;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.plugins.api.Amount;
import org.fallwright.plugins.vehicle.Chassis.AxleLoad;

/** What is checked and said of a vehicle's pull beside its figures. */
final class VehicleAdvice {
  /** Clear way beyond the travel [m]. Planning allowance. */
  private static final double RUN_OUT_SPARE_M = Allowances.RUN_OUT_SPARE.value();

  /** Most that the line may be off the heading [deg]. Planning allowance. */
  private static final double OFF_HEADING_DEG = Allowances.LINE_OFF_HEADING_MOST.value();

  /** Least share of its level load that the front axle needs to steer. Planning allowance. */
  private static final double FRONT_SHARE_TO_STEER = Allowances.FRONT_AXLE_LEAST.value();

  /** A run at a slack line, no faster than one walks [m/s]. */
  private static final double WALK_MPS = 1.4;

  /** Ratio of a check that asks nothing. */
  private static final double MOST_RATIO = 1e6;

  private final PullRequest request;
  private final VehicleFigures figures;
  private final Footing footing;
  private final Parked parked;
  private final Vehicle.Pull low;
  private final Part towPoint;

  VehicleAdvice(
      PullRequest request,
      VehicleFigures figures,
      Footing footing,
      Parked parked,
      Vehicle.Pull low,
      Part towPoint) {
    this.request = request;
    this.figures = figures;
    this.footing = footing;
    this.parked = parked;
    this.low = low;
    this.towPoint = towPoint;
  }

  private double runOutAskedM() {
    return request.pull().lineInM() + RUN_OUT_SPARE_M;
  }

  List<Finding> checks() {
    List<Finding> checks = new ArrayList<>();
    Double there = request.stand().runOutM();
    if (there != null) {
      double asked = runOutAskedM();
      checks.add(
          new Finding(
              "run-out",
              there,
              asked,
              "m",
              Math.min(MOST_RATIO, there / asked),
              String.format(
                  Locale.ROOT,
                  "%s clear ahead of the vehicle, %s asked: its travel and %s.",
                  Amount.length(there),
                  Amount.length(asked),
                  Amount.length(RUN_OUT_SPARE_M))));
    }
    if (request.stand().offHeadingRad() != null) {
      double off = Math.toDegrees(request.stand().offHeadingRad());
      checks.add(
          new Finding(
              "heading",
              off,
              OFF_HEADING_DEG,
              "deg",
              off > OFF_HEADING_DEG / MOST_RATIO ? OFF_HEADING_DEG / off : MOST_RATIO,
              String.format(
                  Locale.ROOT,
                  "The line is %.0f degrees off the vehicle's heading; at most %.0f.",
                  off,
                  OFF_HEADING_DEG)));
    }
    return checks;
  }

  List<String> notes() {
    List<String> notes = new ArrayList<>();
    notes.add(
        "Creep steadily with the line tight already; a run-up is outside this reckoning and"
            + " forbidden.");
    runUp(notes);
    notes.add("Engine and gearing are not checked; the wheels' grip alone is.");
    steering(notes);
    if (towPoint.strengthN() / towPoint.designFactor() < low.traction().tensionN()) {
      notes.add(
          "The wheels can pull more than the tow point is rated for: stop at its rated load.");
    }
    if (request.stand().runOutM() == null) {
      notes.add(
          String.format(
              Locale.ROOT,
              "The clear way ahead is not stated; this pull asks for %s.",
              Amount.length(runOutAskedM())));
    }
    if (figures.standIn() != null) {
      notes.add(
          "Figures of the class "
              + figures.standIn().key
              + " stand in where the vehicle's own are not stated: planning allowances, light for the"
              + " pull and heavy for the parts.");
    }
    if (footing.saysNothingOfDifferentials()) {
      notes.add(
          "Nothing is said of the differentials; with open ones the worst wheel sets the pull.");
    }
    if (footing.soil() != null) {
      notes.add(
          footing.soil().measured()
              ? "The pull goes by the soil's cone index, for field tyres on soil without sward that is"
                  + " neither loose nor wet through."
              : "The soil was not measured: a usual cone index counts, and never more than the"
                  + " ground's grip.");
    }
    notes.add(
        switch (parked) {
          case REAR_BRAKE ->
              "Standing, it holds by the rear wheels alone; chocks at every wheel make it hold with"
                  + " all.";
          case CHOCKS ->
              "Chocks keep the wheels from rolling; they count for nothing against sliding.";
          case ALL_WHEELS -> "What it holds standing asks for all wheels kept from rolling.";
        });
    return notes;
  }

  private void steering(List<String> notes) {
    PullRequest.Stand stand = request.stand();
    AxleLoad front =
        low.chassis().front(stand.lineRiseRad() + stand.uphillRad(), stand.uphillRad());
    double steersUpTo = front.fallsToAtN(FRONT_SHARE_TO_STEER * low.chassis().frontLevelN());
    if (steersUpTo < low.traction().tensionN()) {
      notes.add(
          "From "
              + DisplayUnits.METRIC.both(u -> u.forceAtMost(steersUpTo))
              + " on, the pull leaves the front axle too light to steer.");
    }
  }

  private void runUp(List<String> notes) {
    double stiffness = request.pull().pathStiffness();
    if (stiffness > 0) {
      double jerk =
          Vehicle.surgeN(
              WALK_MPS, figures.loading().get(0).massKg(), stiffness, request.pull().travelRatio());
      notes.add(
          "A run at a slack line, at walking pace even, would put "
              + DisplayUnits.METRIC.both(u -> u.force(jerk))
              + " on it.");
    }
  }
}
