package org.fallwright.core.reference;

import com.fasterxml.jackson.core.type.TypeReference;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.fallwright.core.units.Range;

/**
 * Every figure of ropes, ends, chain, slings, connectors, sheaves, friction and ground anchors that
 * the planner knows, in the unit its source prints, with what stands behind it. The classes of
 * {@code core.line} and {@code core.anchor} reckon with these rows and no others.
 */
public final class Hardware {
  private static final Map<String, Figure> ALL = read();

  private Hardware() {}

  /** Every row, in the order of the table. */
  public static List<Figure> all() {
    return List.copyOf(ALL.values());
  }

  /**
   * The row of that key.
   *
   * @throws IllegalArgumentException naming the key and the nearest keys there are
   */
  public static Figure of(String key) {
    return Table.row(ALL, "hardware", key);
  }

  /** The row of that key, where there is one. */
  public static Optional<Figure> find(String key) {
    return Optional.ofNullable(ALL.get(key));
  }

  /** Value of the row of that key, in the row's unit. */
  public static double value(String key) {
    return of(key).value();
  }

  private record Row(double value, String unit, Kind kind, String source, String note) {
    private Row {
      Range.present("unit", unit);
    }
  }

  private static Map<String, Figure> read() {
    Map<String, Figure> figures = new LinkedHashMap<>();
    Table.read("hardware.json", new TypeReference<Map<String, Row>>() {})
        .forEach(
            (key, r) ->
                figures.put(
                    key, new Figure(key, r.value(), r.unit(), r.kind(), r.source(), r.note())));
    return figures;
  }
}
