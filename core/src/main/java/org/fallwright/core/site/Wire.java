package org.fallwright.core.site;

import java.util.List;
import org.fallwright.core.units.Range;

/**
 * An overhead line: spans between poles, each sagging by the same amount.
 *
 * @param id its name on the plan
 * @param voltageKv voltage, phase to phase [kV]; null: not known
 * @param voltageSaidBy who stated the voltage; null: nobody
 * @param state energized, or made dead and earthed by its owner
 * @param poles the points the conductor hangs from, in order
 * @param sagM sag at mid-span [m]
 * @param fix how the poles were set
 * @param statedErrorM own position error [m], or null for that of the fix
 */
public record Wire(
    String id,
    Double voltageKv,
    String voltageSaidBy,
    State state,
    List<Pole> poles,
    double sagM,
    Fix fix,
    Double statedErrorM) {
  /** State of the line as its owner has put it in writing. */
  public enum State {
    ENERGIZED,
    DEAD_AND_EARTHED
  }

  /**
   * A point the conductor hangs from.
   *
   * @param at position
   * @param groundM elevation of the ground there [m]
   * @param heightM height of the conductor above that ground [m]
   */
  public record Pole(Position at, double groundM, double heightM) {
    public Pole {
      Range.present("at", at);
      Range.check("ground_m", groundM, -500, 9000, "m");
      Range.check("height_m", heightM, 1, 200, "m");
    }
  }

  public Wire {
    Range.text("id", id);
    Range.checkOrNull("voltage_kv", voltageKv, 0.01, 1500, "kV");
    Range.present("state", state);
    poles = List.copyOf(Range.present("poles", poles));
    if (poles.size() < 2) {
      throw new IllegalArgumentException(
          "poles has " + poles.size() + " entries; a wire must have at least 2");
    }
    Range.check("sag_m", sagM, 0, 50, "m");
    Range.present("fix", fix);
    Range.checkOrNull("stated_error_m", statedErrorM, 0, 100, "m");
  }

  /** The same wire, its voltage stated by nobody. */
  public Wire unstated() {
    return new Wire(id, null, null, state, poles, sagM, fix, statedErrorM);
  }

  /** Position error [m]. */
  public double errorM() {
    return statedErrorM != null ? statedErrorM : fix.errorM();
  }
}
