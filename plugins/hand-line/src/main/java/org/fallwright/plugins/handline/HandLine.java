package org.fallwright.plugins.handline;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.Parameter;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.SourceDescription.ValueKind;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Surface;
import org.fallwright.plugins.api.ParameterReader;
import org.fallwright.plugins.api.PullSourceExtension;
import org.pf4j.Extension;

/**
 * People on a hand line.
 *
 * <p>Low: each person the least of tipping, slipping and strength on the low figures of the ground,
 * times the crew's group factor. Hands held towards the tree shorten a rising line's lever about
 * the feet and so help; the low gives that no credit, while hands behind the feet count against it.
 * High, for the parts: every person slips on the high grip or reaches the strongest published pull,
 * without group loss, and however far they may lean back, since a lean is easily greater than the
 * one entered; then times {@link #HIGH_FACTOR}.
 *
 * <p>Holding: what they pull at their low. Where a device captures the line, its own rating is not
 * known here, so that no more is counted either; but the end stays where it is.
 */
@Extension
public final class HandLine implements PullSourceExtension {
  /** Over the strongest steady pull, for jerks. Planning allowance. */
  private static final double HIGH_FACTOR = Allowances.HAND_HIGH.value();

  /** Line that still comes in after "stop": a hand-over-hand haul [m]. Planning allowance. */
  private static final double OVERRUN_M = 0.3;

  /** Lean beyond which a line that goes slack throws a person on the back. Planning allowance. */
  private static final double LEAN_TO_WARN_DEG = 20;

  private static final SourceDescription DESCRIPTION =
      new SourceDescription(
          "hand-line",
          "hand line",
          Set.of(PlaceKind.SPOT),
          false,
          List.of(
              new Parameter("people", "People", ValueKind.WHOLE_NUMBER, "", 1, 20, List.of()),
              Parameter.number("person_mass_kg", "Mass of a person", "kg", 30, 200),
              Parameter.number("stature_m", "Stature", "m", 1.2, 2.3),
              Parameter.number("lean_back_deg", "Lean back of the body", "deg", 0, 45),
              Parameter.number("hand_height_m", "Hands above the feet", "m", 0.3, 2),
              Parameter.number(
                  "hand_ahead_m", "Hands ahead of the feet, to the tree", "m", -0.5, 1),
              new Parameter(
                  "captured", "An anchored device holds", ValueKind.FLAG, "", 0, 0, List.of())));

  @Override
  public SourceDescription describe() {
    return DESCRIPTION;
  }

  @Override
  public List<String> modes(ObjectNode parameters) {
    read(parameters);
    return List.of("pull");
  }

  @Override
  public double lineHeightM(ObjectNode parameters) {
    return new ParameterReader(DESCRIPTION, parameters).number("hand_height_m");
  }

  @Override
  public PullOffer offer(PullRequest request) {
    Parameters crew = read(request.parameters());
    if (!request.mode().equals("pull")) {
      throw new IllegalArgumentException(
          "mode is \"" + request.mode() + "\"; it must be \"pull\" for a hand line");
    }
    Surface ground = request.ground();
    if (ground == null) {
      throw new IllegalArgumentException(
          "ground is not stated; a hand line needs the ground that its people stand on");
    }
    double rise = request.lineRiseRad();
    double slope = request.uphillRad();
    PersonPull low =
        new PersonPull(
            Math.min(crew.tipN(0, rise), crew.tipN(-crew.handAheadM, rise)),
            PersonPull.slipN(crew.massKg, ground.bootLow(), rise, slope),
            ground.personLowN());
    double lowN = low.leastN() * Crew.persons(crew.people);
    double oneHighN =
        Math.min(
            PersonPull.slipN(crew.massKg, ground.bootHigh(), rise, slope), ground.personHighN());
    return new PullOffer(
        lowN,
        oneHighN * crew.people * HIGH_FACTOR,
        lowN,
        crew.captured,
        low.limit(),
        1,
        false,
        OVERRUN_M,
        0,
        0,
        0,
        crew.people,
        List.of(),
        List.of(),
        notes(crew));
  }

  private static List<String> notes(Parameters crew) {
    List<String> notes = new ArrayList<>();
    notes.add("Never put the line round a body or a hand.");
    if (crew.captured) {
      notes.add(
          "The anchor and the rating of the device that captures the line are not checked here; no"
              + " more is counted as held than the crew pulls.");
    } else {
      notes.add(
          "This is free-hand pulling: nothing but the people keeps the line, and people can sway or"
              + " lose the tree during the cut.");
    }
    if (crew.leanBackDeg > LEAN_TO_WARN_DEG) {
      notes.add("Leaning back so far, the people fall on their backs if the line goes slack.");
    }
    return notes;
  }

  private static Parameters read(ObjectNode parameters) {
    ParameterReader reader = new ParameterReader(DESCRIPTION, parameters);
    return new Parameters(
        reader.wholeNumber("people"),
        reader.number("person_mass_kg"),
        reader.number("stature_m"),
        reader.number("lean_back_deg"),
        reader.number("hand_height_m"),
        reader.number("hand_ahead_m"),
        reader.flag("captured"));
  }

  private record Parameters(
      int people,
      double massKg,
      double statureM,
      double leanBackDeg,
      double handHeightM,
      double handAheadM,
      boolean captured) {
    double tipN(double handXM, double riseRad) {
      return PersonPull.tipN(
          massKg, statureM, Math.toRadians(leanBackDeg), handHeightM, handXM, riseRad);
    }
  }
}
