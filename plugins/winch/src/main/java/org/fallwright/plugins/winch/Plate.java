package org.fallwright.plugins.winch;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Map;
import org.fallwright.core.line.Wraps;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.plugins.api.ParameterReader;

/**
 * What is stated of a winch, read and held against itself. What its kind has not is null, and so is
 * what is not stated.
 *
 * @param kind its kind
 * @param ratedN rated pull [N]
 * @param ratedOn what that counts for, see {@link WinchDescription}
 * @param overloadN pull at which its overload device acts, on the bare drum [N]
 * @param brakeN what its brake or pawl holds, on the bare drum [N]
 * @param wireM all its wire [m]; 0 for a capstan
 * @param wire its wire's strength
 * @param strokeM wire of a stroke or turn, on the bare drum [m]
 * @param drive what a hand brings
 * @param speedMps line speed, on the bare drum [m/s]
 * @param remote whether it is worked from afar
 * @param reel drum and wire on it
 * @param tail how a capstan is worked
 * @param machine what it sits on, on a spot
 */
record Plate(
    Kind kind,
    double ratedN,
    String ratedOn,
    Double overloadN,
    Double brakeN,
    double wireM,
    Wire wire,
    Double strokeM,
    HandDrive drive,
    Double speedMps,
    boolean remote,
    Reel reel,
    Tail tail,
    Parked machine) {
  /** Most layers that are reckoned with. */
  static final int MOST_LAYERS = 20;

  /** Share of the hand's work that comes out where nothing is stated: the low end. From memory. */
  private static final double GEAR_LEAST = 0.7;

  private static final Map<String, Wraps> CONTACTS =
      Map.of(
          "polyester-metal", Wraps.POLYESTER_ON_METAL,
          "hmpe-metal", Wraps.HMPE_ON_METAL,
          "wire-greasy", Wraps.WIRE_ON_GREASY_STEEL,
          "wire-dry", Wraps.WIRE_ON_DRY_STEEL);

  /**
   * Strength of the winch's own wire.
   *
   * @param breakingN breaking load [N]
   * @param termination what its end leaves of that
   */
  record Wire(double breakingN, double termination) {}

  /**
   * How a capstan's tail is worked.
   *
   * @param capstan drum and turns
   * @param tailN what a person keeps up on the tail [N]
   * @param grabN rated load of a rope grab on the loaded line; null: none [N]
   * @param grabFactor its standard's factor
   */
  record Tail(Capstan capstan, double tailN, Double grabN, double grabFactor) {}

  static Plate read(SourceDescription description, ObjectNode node) {
    ParameterReader in = new ParameterReader(description, node);
    Kind kind = Kind.of(in.choice("kind"));
    double ratedN = in.number("rated_N");
    double wireM = kind == Kind.CAPSTAN ? 0 : in.number("wire_m");
    Double machine = in.numberOrNull("machine_kg");
    String ratedOn = in.isStated("rated_on") ? in.choice("rated_on") : WinchDescription.BARE;
    Reel reel = kind.drum() ? Reel.read(in, wireM) : null;
    Plate plate =
        new Plate(
            kind,
            ratedN,
            ratedOn,
            in.numberOrNull("overload_N"),
            in.numberOrNull("brake_N"),
            wireM,
            wire(in),
            in.numberOrNull("stroke_m"),
            drive(in, kind, bareN(ratedN, ratedOn, reel)),
            in.numberOrNull("line_speed_mps"),
            in.isStated("remote") && in.flag("remote"),
            reel,
            kind == Kind.CAPSTAN ? tail(in) : null,
            machine == null ? null : new Parked(machine));
    plate.checkOverload();
    return plate;
  }

  /** Pull on the bare drum; without a drum the rated pull [N]. */
  double bareN() {
    return bareN(ratedN, ratedOn, reel);
  }

  private static double bareN(double ratedN, String ratedOn, Reel reel) {
    return reel == null || ratedOn.equals(WinchDescription.BARE)
        ? ratedN
        : ratedN * reel.drum().radiusRatio(reel.fullLayers());
  }

  /** Topmost layer at the end of a haul, the fullest; 1 without a drum. */
  int layer(double lineInM, double pathM) {
    return reel == null ? 1 : reel.topLayer(lineInM, pathM);
  }

  /** What a pull on the bare drum is on a layer [N]. */
  double onLayerN(double bareN, int layer) {
    return reel == null ? bareN : reel.drum().pullN(bareN, layer);
  }

  /** Rated pull on a layer [N]. */
  double ratedOnLayerN(int layer) {
    double least = onLayerN(bareN(), layer);
    return ratedOn.equals(WinchDescription.ANY) ? Math.min(ratedN, least) : least;
  }

  /** Line for a metre on the bare drum, on a layer. */
  double further(int layer) {
    return reel == null ? 1 : reel.drum().radiusRatio(layer);
  }

  /** Wire that it can have out [m]. */
  double usableWireM() {
    return reel == null ? wireM : reel.outM();
  }

  private void checkOverload() {
    if (overloadN != null && overloadN < bareN() * (1 - 1e-9)) {
      throw new IllegalArgumentException(
          "overload_N is "
              + overloadN
              + " N; it must be at least "
              + (bareN() == ratedN ? "rated_N" : "the pull on the bare drum")
              + ", "
              + bareN()
              + " N");
    }
  }

  private static Wire wire(ParameterReader in) {
    if (!in.isStated("wire_breaking_N")) {
      return null;
    }
    return new Wire(in.number("wire_breaking_N"), in.number("wire_termination"));
  }

  private static HandDrive drive(ParameterReader in, Kind kind, double bareN) {
    if (in.isStated("hand_N") && in.isStated("lever_m")) {
      throw new IllegalArgumentException(
          "hand_N is "
              + in.number("hand_N")
              + " N and lever_m is "
              + in.number("lever_m")
              + " m; only one of the two may be stated");
    }
    if (in.isStated("hand_N")) {
      return HandDrive.plate(in.number("hand_N"), bareN);
    }
    if (!in.isStated("lever_m")) {
      return null;
    }
    return HandDrive.lever(
        in.number("lever_m"),
        kind.crank() ? 360 : in.number("swing_deg"),
        in.number("stroke_m"),
        in.isStated("gear_efficiency") ? in.number("gear_efficiency") : GEAR_LEAST);
  }

  private static Tail tail(ParameterReader in) {
    return new Tail(
        new Capstan(CONTACTS.get(in.choice("contact")), in.number("turns")),
        in.number("tail_N"),
        in.numberOrNull("grab_N"),
        in.isStated("grab_factor") ? in.number("grab_factor") : 1);
  }
}
