package org.fallwright.plugins.winch;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.Parameter;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.SourceDescription.ValueKind;
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
          "winch",
          Set.of(PlaceKind.ANCHOR),
          false,
          List.of(
              new Parameter(
                  "kind",
                  "Kind",
                  ValueKind.CHOICE,
                  "",
                  0,
                  0,
                  List.of(THROUGH_ROPE, HAND_DRUM, POWERED_DRUM)),
              Parameter.number("rated_N", "Rated pull, on the bare drum", "N", 500, 1e6),
              Parameter.number(
                  "overload_N", "Overload device acts at (if there is one)", "N", 500, 3e6),
              Parameter.number("wire_m", "Wire on it", "m", 0, 500),
              Parameter.number("stroke_m", "Wire a stroke (by hand)", "m", 0.001, 1),
              Parameter.number("drum_m", "Bare drum, diameter", "m", 0.02, 1),
              Parameter.number("rope_m", "Wire, diameter (drum)", "m", 0.002, 0.06),
              new Parameter(
                  "layer", "Layers on a full drum", ValueKind.WHOLE_NUMBER, "", 1, 20, List.of()),
              Parameter.number(
                  "line_speed_mps", "Line speed on the bare drum (powered)", "m/s", 0.001, 3)));

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
    String layers =
        winch.drum == null || winch.layers == 1 ? "" : " on layer " + winch.layers + " of its drum";
    return new PullOffer(
        lowN,
        settingN * DEVICE_SPREAD,
        lowN,
        true,
        "rated pull of the winch" + layers,
        1,
        powered,
        powered ? STOP_S * winch.drum.speedMps(winch.bareSpeedMps, winch.layers) : winch.strokeM,
        winch.wireM,
        1,
        1,
        1,
        List.of(),
        List.of(),
        notes(winch, request.takeUpM() * request.travelRatio()));
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
      String said = "the kind \"" + kind + "\"";
      if (!onDrum) {
        reader.refuse("drum_m", said);
        reader.refuse("rope_m", said);
        reader.refuse("layer", said);
      }
      reader.refuse(powered ? "stroke_m" : "line_speed_mps", said);
      double ratedN = reader.number("rated_N");
      Double overloadN = reader.isStated("overload_N") ? reader.number("overload_N") : null;
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
