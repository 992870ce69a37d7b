package org.fallwright.plugins.handline;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Standing;
import org.fallwright.core.pull.PullOffer.Where;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.Wording;
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
          new Wording("hand line", "cuerda jalada a mano"),
          Set.of(PlaceKind.SPOT),
          false,
          List.of(
              Parameter.wholeNumber(
                  "people",
                  1,
                  20,
                  new Wording("People", "Personas"),
                  new Wording(
                      "How many pull; more than seven add nothing.",
                      "Cuántas jalan; más de siete no agregan nada.")),
              Parameter.number(
                  "person_mass_kg",
                  "kg",
                  30,
                  200,
                  new Wording("Mass of a person", "Peso de una persona (kg)"),
                  new Wording(
                      "Of the lightest who pulls, without gear.",
                      "De la más ligera que jala, sin equipo.")),
              Parameter.number(
                  "stature_m",
                  "m",
                  1.2,
                  2.3,
                  new Wording("Stature", "Estatura"),
                  new Wording(
                      "Height of the shortest who pulls.", "Estatura de la más baja que jala.")),
              Parameter.number(
                      "lean_back_deg",
                      "deg",
                      0,
                      45,
                      new Wording("Lean back of the body", "Inclinación del cuerpo hacia atrás"),
                      new Wording(
                          "From upright, away from the tree, feet planted.",
                          "Desde la vertical, alejándose del árbol, con los pies firmes."))
                  .preset(20),
              Parameter.number(
                      "hand_height_m",
                      "m",
                      0.3,
                      2,
                      new Wording("Hands above the feet", "Altura de las manos"),
                      new Wording(
                          "Height of the line in the hands above the soles.",
                          "Altura de la cuerda en las manos desde la suela."))
                  .preset(1),
              Parameter.number(
                      "hand_ahead_m",
                      "m",
                      -0.5,
                      1,
                      new Wording(
                          "Hands ahead of the feet, to the tree",
                          "Manos delante de los pies, hacia el árbol"),
                      new Wording(
                          "Along the ground; negative where the hands are behind the feet.",
                          "A lo largo del suelo; negativo si las manos quedan atrás de los pies."))
                  .preset(0.3),
              Parameter.flag(
                  "captured",
                  new Wording("An anchored device holds", "La sostiene un aparato anclado"),
                  new Wording(
                      "Whether a device on an anchor keeps the line when people let go.",
                      "Si un aparato en un anclaje sostiene la cuerda cuando la gente"
                          + " afloja."))));

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
    PullRequest.Stand stand = request.stand();
    Surface ground = stand.ground();
    if (ground == null) {
      throw new IllegalArgumentException(
          "ground is not stated; a hand line needs the ground that its people stand on");
    }
    double rise = stand.lineRiseRad();
    double slope = stand.uphillRad();
    PersonPull low =
        new PersonPull(
            Math.min(crew.tipN(0, rise), crew.tipN(-crew.handAheadM, rise)),
            PersonPull.slipN(crew.massKg, ground.bootLow(), rise, slope),
            ground.personLowN());
    double lowN = low.leastN() * Crew.persons(crew.people);
    double oneHighN =
        Math.min(
            PersonPull.slipN(crew.massKg, ground.bootHigh(), rise, slope), ground.personHighN());
    return PullOffer.giving(lowN, oneHighN * crew.people * HIGH_FACTOR, low.limit())
        .holds(lowN, crew.captured)
        .overrun(OVERRUN_M)
        .people(
            new Standing(
                new Wording("pulls on the line", "jala la cuerda"),
                Where.AT_SOURCE,
                crew.people,
                0))
        .notes(notes(crew))
        .done();
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
