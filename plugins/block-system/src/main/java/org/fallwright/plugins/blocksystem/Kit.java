package org.fallwright.plugins.blocksystem;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.reference.Allowances;
import org.fallwright.plugins.api.ParameterReader;

/**
 * What is stated of a block system, read and held against itself.
 *
 * @param rigs modes that it can be rigged in
 * @param fromFixed whether the last haul part leaves a fixed block
 * @param movingK tension passed on by a sheave of the moving block
 * @param fixedK the same of the fixed block
 * @param secondK the same of a second tackle; 0: there is none
 * @param roomM room between the blocks at the start [m]; null: not stated
 * @param blockN ultimate strength of a block [N]
 * @param blockFactor its standard's factor
 * @param lineN strength of the line with its ends [N]
 * @param lineFactor least factor on it
 * @param stiffnessN its stiffness EA [N]
 * @param lineM its length [m]
 * @param secondLineM length of a second tackle's line [m]; 0: there is none
 * @param capture rope grab; null: none
 */
record Kit(
    List<String> rigs,
    boolean fromFixed,
    double movingK,
    double fixedK,
    double secondK,
    Double roomM,
    double blockN,
    double blockFactor,
    double lineN,
    double lineFactor,
    double stiffnessN,
    double lineM,
    double secondLineM,
    Capture capture) {
  /** Least stiffness that a haul line may be given [N]. */
  private static final double SOFTEST_N = 1e3;

  /**
   * A device that holds by itself.
   *
   * @param ratedN rated load [N]
   * @param factor its standard's factor
   * @param onHaulPart whether it sits on the haul part, else on the pull line
   */
  record Capture(double ratedN, double factor, boolean onHaulPart) {
    /** Load on it per newton at the load. */
    double share(Rig rig) {
      return onHaulPart ? rig.haulHolding() : 1;
    }
  }

  static Kit read(SourceDescription description, ObjectNode parameters) {
    ParameterReader in = new ParameterReader(description, parameters);
    List<String> rigs = in.choices("parts");
    boolean compound = rigs.stream().anyMatch(r -> r.contains("x"));
    double factor = in.number("block_factor");
    boolean wire = in.isStated("line_wire_rope") && in.flag("line_wire_rope");
    return new Kit(
        rigs,
        in.choice("form").equals(BlockDescription.FIXED),
        passedOn(in, "moving"),
        passedOn(in, "fixed"),
        compound ? passedOn(in, "second") : 0,
        in.numberOrNull("room_m"),
        in.number("block_rated_N") * factor,
        factor,
        in.number("line_breaking_N") * in.number("line_termination"),
        (wire ? Allowances.WIRE_FACTOR : Allowances.FIBRE_FACTOR).value(),
        in.number("line_stiffness_N"),
        in.number("line_length_m"),
        compound ? in.number("second_line_length_m") : 0,
        capture(in));
  }

  /** Of a block: its own figure, else that of its kind, else that of all blocks. */
  private static double passedOn(ParameterReader in, String block) {
    String stated = block + "_efficiency";
    String kind = block + "_sheave";
    if (in.isStated(stated) && in.isStated(kind)) {
      throw new IllegalArgumentException(
          stated
              + " is "
              + in.number(stated)
              + " and "
              + kind
              + " is \""
              + in.choice(kind)
              + "\"; only one of the two may be stated");
    }
    if (in.isStated(stated)) {
      return in.number(stated);
    }
    return in.isStated(kind)
        ? BlockDescription.sheaveOf(in.choice(kind)).low()
        : in.number("efficiency");
  }

  private static Capture capture(ParameterReader in) {
    if (!in.isStated("capture_N")) {
      for (String key : List.of("capture_factor", "capture_at")) {
        if (in.isStated(key)) {
          throw new IllegalArgumentException(
              key + " is stated; it must be left out where capture_N is not stated");
        }
      }
      return null;
    }
    return new Capture(
        in.number("capture_N"),
        in.isStated("capture_factor") ? in.number("capture_factor") : 1,
        in.choice("capture_at").equals(BlockDescription.ON_HAUL_PART));
  }

  /**
   * The system in a mode.
   *
   * @throws IllegalArgumentException if it cannot be rigged so
   */
  Rig rig(String mode) {
    if (!rigs.contains(mode)) {
      throw new IllegalArgumentException(
          "mode is \"" + mode + "\"; this block system is rigged with " + rigs);
    }
    String[] parts = mode.split("x");
    int first = Integer.parseInt(parts[0]);
    if (parts.length == 1) {
      return Rig.simple(new Tackle(first, movingK, fixedK, fromFixed));
    }
    int second = Integer.parseInt(parts[1]);
    return new Rig(
        new Tackle(first, movingK, fixedK, false), new Tackle(second, secondK, fromFixed));
  }

  /** The line that the last haul part belongs to, as one leg that gives way as the system does. */
  HaulLine haulLine(Rig rig) {
    double softest = SOFTEST_N * rig.softerBy();
    if (stiffnessN < softest) {
      throw new IllegalArgumentException(
          String.format(
              Locale.ROOT,
              "line_stiffness_N is %.0f N; it must be at least %.0f N for a compound of %d parts",
              stiffnessN,
              softest,
              rig.parts()));
    }
    return new HaulLine(
        rig.parts(), stiffnessN / rig.softerBy(), rig.compound() ? secondLineM : lineM);
  }
}
