package org.fallwright.plugins.winch;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.Parameter.Choice;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Limit;
import org.fallwright.core.pull.PullOffer.Standing;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.reference.Allowances;
import org.fallwright.plugins.api.ParameterReader;
import org.fallwright.plugins.api.PullSourceExtension;
import org.pf4j.Extension;

/**
 * A winch on an anchor.
 *
 * <p>Low: the rated pull, on a drum on the fullest layer that the rope can lie on. High, for the
 * parts: the setting of the overload device times {@link #DEVICE_SPREAD}; where none is stated the
 * winch is taken to stall at {@link #STALL} times its rated pull on the bare drum, with the same
 * spread on top. Holding: what its grip or brake is rated for, on a drum on the fullest layer.
 */
@Extension
public final class Winch implements PullSourceExtension {
  /** How far above its setting an overload device may act. Planning allowance. */
  private static final double DEVICE_SPREAD = Allowances.WINCH_HIGH.value();

  /** Stall over rated pull where no overload device is stated. Planning allowance. */
  private static final double STALL = Allowances.WINCH_NO_DEVICE.value();

  /** How long a powered winch still turns after "stop" [s]. Planning allowance. */
  private static final double STOP_S = Allowances.OVERRUN_POWERED_WINCH.value();

  /**
   * Wraps of wire that must stay on a drum. Published: five in an army winch manual (TM
   * 9-2320-279-10-2) and in Alberta's OHS Code guide, s. 299; three elsewhere.
   */
  private static final int WRAPS_LEFT = 5;

  private static final String THROUGH_ROPE = "hand-through-rope";
  private static final String HAND_DRUM = "hand-drum";
  private static final String POWERED_DRUM = "powered-drum";

  private static final SourceDescription DESCRIPTION =
      new SourceDescription(
          "winch",
          new Wording("winch", "malacate (winche)"),
          Set.of(PlaceKind.ANCHOR),
          false,
          List.of(
              Parameter.choice(
                  "kind",
                  new Wording("Kind", "Tipo"),
                  new Wording(
                      "How it takes in its wire and who drives it.",
                      "Cómo recoge su cable de acero y quién lo mueve."),
                  Choice.of(
                      THROUGH_ROPE,
                      "by hand, the wire runs through",
                      "manual de palanca, el cable de acero pasa por él"),
                  Choice.of(HAND_DRUM, "by hand, on a drum", "manual, de tambor"),
                  Choice.of(POWERED_DRUM, "powered, on a drum", "de motor, de tambor")),
              Parameter.number(
                  "rated_N",
                  "N",
                  500,
                  1e6,
                  new Wording("Rated pull, on the bare drum", "Tiro marcado, con el tambor vacío"),
                  new Wording(
                      "As stamped on it; of a drum winch with one layer of wire.",
                      "El que lleva marcado; si es de tambor, con una sola capa de cable.")),
              Parameter.number(
                      "overload_N",
                      "N",
                      500,
                      3e6,
                      new Wording("Overload device acts at", "Seguro de sobrecarga: actúa a"),
                      new Wording(
                          "Where a shear pin, clutch or valve gives way; leave it out where there is"
                              + " none.",
                          "Donde cede el pasador, embrague o válvula; déjelo vacío si no tiene."))
                  .mayBeLeftOut(),
              Parameter.number(
                  "wire_m",
                  "m",
                  0,
                  500,
                  new Wording("Wire on it", "Cable de acero que tiene"),
                  new Wording(
                      "Wire of its own that can be drawn out towards the tree.",
                      "Cable propio que se puede sacar hacia el árbol.")),
              Parameter.number(
                      "stroke_m",
                      "m",
                      0.001,
                      1,
                      new Wording("Wire a stroke", "Cable por palancada"),
                      new Wording(
                          "Wire that one stroke of the lever, or one turn of the crank, takes in.",
                          "Cable que recoge una palancada o una vuelta de la manivela."))
                  .onlyWhere("kind", THROUGH_ROPE, HAND_DRUM),
              Parameter.number(
                      "drum_m",
                      "m",
                      0.02,
                      1,
                      new Wording("Bare drum, diameter", "Diámetro del tambor vacío"),
                      new Wording("Without any wire on it.", "Sin cable encima."))
                  .onlyWhere("kind", HAND_DRUM, POWERED_DRUM),
              Parameter.number(
                      "rope_m",
                      "m",
                      0.002,
                      0.06,
                      new Wording("Wire, diameter", "Diámetro del cable de acero"),
                      new Wording("Of the wire on the drum.", "Del cable que va en el tambor."))
                  .onlyWhere("kind", HAND_DRUM, POWERED_DRUM),
              Parameter.wholeNumber(
                      "layer",
                      1,
                      20,
                      new Wording("Layers on a full drum", "Capas con el tambor lleno"),
                      new Wording(
                          "Each layer of wire makes the drum thicker and the pull less.",
                          "Cada capa de cable hace más grueso el tambor y quita tiro."))
                  .onlyWhere("kind", HAND_DRUM, POWERED_DRUM),
              Parameter.number(
                      "line_speed_mps",
                      "m/s",
                      0.001,
                      3,
                      new Wording("Line speed on the bare drum", "Velocidad con el tambor vacío"),
                      new Wording(
                          "Wire taken in a second, with one layer.",
                          "Cable que recoge por segundo, con una capa."))
                  .onlyWhere("kind", POWERED_DRUM)));

  @Override
  public SourceDescription describe() {
    return DESCRIPTION;
  }

  @Override
  public List<String> modes(ObjectNode parameters) {
    Parameters.read(parameters);
    return List.of("pull");
  }

  @Override
  public PullOffer offer(PullRequest request) {
    Parameters winch = Parameters.read(request.parameters());
    if (!request.mode().equals("pull")) {
      throw new IllegalArgumentException(
          "mode is \"" + request.mode() + "\"; it must be \"pull\" for a winch");
    }
    boolean powered = winch.strokeM == null;
    double ratedN = winch.ratedN;
    double lowN = winch.drum == null ? ratedN : winch.drum.pullN(ratedN, winch.layers);
    double settingN = winch.overloadN == null ? STALL * ratedN : winch.overloadN;
    return PullOffer.giving(lowN, settingN * DEVICE_SPREAD, limit(winch))
        .holds(lowN, true)
        .powered(powered)
        .overrun(
            powered
                ? STOP_S * winch.drum.speedMps(winch.bareSpeedMps, winch.layers)
                : winch.strokeM)
        .wire(winch.wireM)
        .people(Standing.one("works the winch", "maneja el malacate"))
        .notes(notes(winch, request.pull().lineInM()))
        .done();
  }

  private static Limit limit(Parameters winch) {
    if (winch.drum == null || winch.layers == 1) {
      return new Limit(
          new Wording("rated pull of the winch", "tiro marcado del malacate"),
          new Wording(
              "The winch is rated for no more than this.", "El malacate no está hecho para más."));
    }
    return new Limit(
        new Wording(
            "rated pull of the winch on layer " + winch.layers + " of its drum",
            "tiro marcado del malacate en la capa " + winch.layers + " del tambor"),
        new Wording(
            "The wire already on the drum makes it thicker, so the winch pulls less than its plate"
                + " says.",
            "El cable que ya está en el tambor lo hace más grueso: el malacate jala menos de lo que"
                + " dice su placa."));
  }

  private static List<String> notes(Parameters winch, double travelM) {
    List<String> notes = new ArrayList<>();
    if (winch.strokeM != null) {
      notes.add(
          String.format(
              Locale.ROOT,
              "About %.0f strokes of %.0f mm take in %.2f m.",
              Math.ceil(travelM / winch.strokeM),
              winch.strokeM * 1000,
              travelM));
    }
    if (winch.drum != null) {
      notes.add("Keep at least " + WRAPS_LEFT + " wraps of wire on the drum.");
    }
    notes.add(
        winch.overloadN == null
            ? "No overload device is stated: the winch is taken to stall at "
                + STALL
                + " times its rated pull on the bare drum."
            : "If the overload device gives way, stop: never replace it by a stronger one.");
    return notes;
  }

  /** The parameters, those that the kind has not null. */
  private record Parameters(
      double ratedN,
      Double overloadN,
      double wireM,
      Double strokeM,
      Drum drum,
      int layers,
      double bareSpeedMps) {
    static Parameters read(ObjectNode node) {
      ParameterReader reader = new ParameterReader(DESCRIPTION, node);
      String kind = reader.choice("kind");
      boolean powered = kind.equals(POWERED_DRUM);
      boolean onDrum = !kind.equals(THROUGH_ROPE);
      double ratedN = reader.number("rated_N");
      Double overloadN = reader.numberOrNull("overload_N");
      if (overloadN != null && overloadN < ratedN) {
        throw new IllegalArgumentException(
            "overload_N is " + overloadN + " N; it must be at least rated_N, " + ratedN + " N");
      }
      return new Parameters(
          ratedN,
          overloadN,
          reader.number("wire_m"),
          powered ? null : reader.number("stroke_m"),
          onDrum ? new Drum(reader.number("drum_m"), reader.number("rope_m")) : null,
          onDrum ? reader.wholeNumber("layer") : 1,
          powered ? reader.number("line_speed_mps") : 0);
    }
  }
}
