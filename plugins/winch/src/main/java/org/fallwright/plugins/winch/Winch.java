package org.fallwright.plugins.winch;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.line.WireBend;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Finding;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.pull.PullOffer.Standing;
import org.fallwright.core.pull.PullOffer.Where;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.reference.Allowances;
import org.fallwright.plugins.api.PullSourceExtension;
import org.pf4j.Extension;

/**
 * A winch on an anchor, or on a machine that stands on a spot.
 *
 * <p>Low: the least of its {@link Bounds}. High, for the parts: the setting of the overload device
 * times {@link #DEVICE_SPREAD}; where none is stated the winch is taken to stall at {@link #STALL}
 * times its pull on the bare drum, with the same spread on top; a hand that would tire and a
 * machine that would slide first are not counted on. Holding: see {@link Bounds#holdN}; a capstan's
 * tail gives a constant force unless a rope grab holds the line.
 *
 * <p>Its wire counts as a part of the pull line, stretch included. Left out: wire that winds up
 * unevenly, heat and duty of a motor, tipping of a machine.
 */
@Extension
public final class Winch implements PullSourceExtension {
  /** How far above its setting an overload device may act. Planning allowance. */
  private static final double DEVICE_SPREAD = Allowances.WINCH_HIGH.value();

  /** Stall over the pull on the bare drum where no device is stated. Planning allowance. */
  static final double STALL = Allowances.WINCH_NO_DEVICE.value();

  /** How long a powered winch still turns after "stop" [s]. Planning allowance. */
  private static final double STOP_S = Allowances.OVERRUN_POWERED_WINCH.value();

  /** Least factor on a wire rope that pulls. Common practice. */
  private static final double WIRE_FACTOR = Allowances.WIRE_FACTOR.value();

  /** Least factor on every part at the most the source can do. Planning allowance. */
  private static final double LAST_FACTOR = Allowances.LAST_FACTOR.value();

  /** Most that the line may be off the long axis of the machine [deg]. Planning allowance. */
  private static final double OFF_AXIS_DEG = Allowances.LINE_OFF_HEADING_MOST.value();

  /** Ratio of a check that asks nothing. */
  private static final double MOST_RATIO = 1e6;

  private static final double HALF_METRE = 0.5;
  private static final String PULL = "pull";
  private static final SourceDescription DESCRIPTION = WinchDescription.of();

  @Override
  public SourceDescription describe() {
    return DESCRIPTION;
  }

  @Override
  public List<String> modes(ObjectNode parameters) {
    Plate.read(DESCRIPTION, parameters);
    return List.of(PULL);
  }

  @Override
  public double lineHeightM(ObjectNode parameters) {
    return parameters.hasNonNull("line_height_m")
        ? parameters.get("line_height_m").doubleValue()
        : HALF_METRE;
  }

  @Override
  public PullOffer offer(PullRequest request) {
    Plate winch = Plate.read(DESCRIPTION, request.parameters());
    if (!request.mode().equals(PULL)) {
      throw new IllegalArgumentException(
          "mode is \"" + request.mode() + "\"; it must be \"pull\" for a winch");
    }
    double pathM = request.line() == null ? request.stand().legM() : request.line().pathM();
    int layer = winch.layer(request.pull().lineInM(), pathM);
    Bounds bounds = Bounds.of(winch, layer, request.stand());
    double settingN = winch.overloadN() == null ? STALL * winch.bareN() : winch.overloadN();
    boolean onGround = request.stand().ground() != null;
    return PullOffer.giving(bounds.lowN(), settingN * DEVICE_SPREAD, bounds.limit())
        .holds(bounds.holdN(), bounds.captured())
        .travel(1, winch.kind() == Kind.CAPSTAN ? null : winch.usableWireM())
        .powered(winch.kind().powered())
        .overrun(
            winch.further(layer)
                * (winch.kind().powered() ? STOP_S * winch.speedMps() : winch.strokeM()))
        .wire(winch.usableWireM())
        .anchor(onGround ? 0 : 1, onGround ? 0 : 1)
        .people(standing(winch))
        .parts(parts(winch))
        .checks(checks(request))
        .notes(WinchNotes.of(winch, layer, request))
        .done();
  }

  private static Standing standing(Plate winch) {
    if (winch.kind() == Kind.CAPSTAN) {
      return Standing.one("keeps the tail tight", "mantiene tensa la punta de la cuerda");
    }
    Wording role = new Wording("works the winch", "maneja el malacate");
    return new Standing(role, winch.remote() ? Where.AWAY : Where.AT_SOURCE, 1, 0);
  }

  private static List<Part> parts(Plate winch) {
    List<Part> parts = new ArrayList<>();
    if (winch.wire() != null) {
      double bend =
          winch.reel() == null
              ? 1
              : WireBend.keeps(winch.reel().drum().barrelM() / winch.reel().drum().ropeM());
      double strength = winch.wire().breakingN() * winch.wire().termination() * bend;
      parts.add(new Part("winch wire", strength, WIRE_FACTOR, LAST_FACTOR, 1, 1));
    }
    if (winch.tail() != null && winch.tail().grabN() != null) {
      double factor = winch.tail().grabFactor();
      parts.add(new Part("rope grab", winch.tail().grabN() * factor, factor, LAST_FACTOR, 0, 1));
    }
    return parts;
  }

  /** The wire must leave the machine near its long axis, over either end. */
  private static List<Finding> checks(PullRequest request) {
    Double off = request.stand().offHeadingRad();
    if (off == null) {
      return List.of();
    }
    double offAxis = Math.toDegrees(Math.min(off, Math.PI - off));
    return List.of(
        new Finding(
            "heading",
            offAxis,
            OFF_AXIS_DEG,
            "deg",
            offAxis > OFF_AXIS_DEG / MOST_RATIO ? OFF_AXIS_DEG / offAxis : MOST_RATIO,
            String.format(
                Locale.ROOT,
                "The line is %.0f degrees off the long axis of the winch's machine; at most %.0f.",
                offAxis,
                OFF_AXIS_DEG)));
  }
}
