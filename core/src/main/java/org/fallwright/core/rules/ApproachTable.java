package org.fallwright.core.rules;

import java.util.List;
import java.util.Optional;
import org.fallwright.core.units.Range;

/**
 * A table of distances to keep from live wires: either bands of voltage (upper limits inclusive),
 * or a base distance and a growth for each 10 kV above a voltage.
 *
 * @param key stable name
 * @param basis what voltage and distance are measured on
 * @param toGround whether it asks the voltage to ground, taken as that between phases over √3
 * @param bands pairs of upper voltage [kV] and distance [m]; null: it grows
 * @param baseM distance up to {@code fromKv} [m]; null with bands
 * @param fromKv voltage it grows from [kV]; null with bands
 * @param growthM growth for each 10 kV [m]; null with bands
 * @param stepped whether a begun 10 kV counts whole; null with bands
 * @param highestKv voltage it ends at [kV], on its own basis
 * @param citation the text it is from
 * @param status how well that text was read
 */
public record ApproachTable(
    String key,
    String basis,
    boolean toGround,
    List<List<Double>> bands,
    Double baseM,
    Double fromKv,
    Double growthM,
    Boolean stepped,
    double highestKv,
    String citation,
    Status status) {
  /** Room for rounding where a voltage stands exactly on a step [steps]. */
  private static final double EXACT = 1e-9;

  public ApproachTable {
    Range.text("key", key);
    Range.text("basis", basis);
    Range.text("citation", citation);
    Range.present("status", status);
    if (bands == null && (baseM == null || fromKv == null || growthM == null || stepped == null)) {
      throw new IllegalArgumentException(key + " has neither bands nor a growth");
    }
    bands = bands == null ? null : List.copyOf(bands);
  }

  /**
   * Distance for a voltage between phases [kV], in m; empty where the table says nothing.
   *
   * @param kvPhaseToPhase voltage between phases [kV]
   */
  public Optional<Rule> distance(double kvPhaseToPhase) {
    Range.check("kv", kvPhaseToPhase, 0.01, 1500, "kV");
    double kv = toGround ? kvPhaseToPhase / Math.sqrt(3) : kvPhaseToPhase;
    if (kv > highestKv) {
      return Optional.empty();
    }
    double metres = bands == null ? grown(kv) : banded(kv);
    return Optional.of(
        new Rule(metres, "m", Comparison.MORE_THAN, basis, citation, status, false, null));
  }

  private double grown(double kv) {
    double steps = Math.max(0, kv - fromKv) / 10;
    return baseM + growthM * (stepped ? Math.ceil(steps - EXACT) : steps);
  }

  private double banded(double kv) {
    return bands.stream()
        .filter(b -> kv <= b.get(0))
        .findFirst()
        .orElseThrow(() -> new IllegalStateException(key + " ends below " + highestKv + " kV"))
        .get(1);
  }
}
