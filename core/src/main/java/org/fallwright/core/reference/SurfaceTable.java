package org.fallwright.core.reference;

import com.fasterxml.jackson.core.type.TypeReference;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.fallwright.core.units.Range;

/** The kinds of ground that the planner knows, each dry and wet. */
public final class SurfaceTable {
  private static final Map<String, Row> ROWS =
      Table.read("surfaces.json", new TypeReference<Map<String, Row>>() {});

  private SurfaceTable() {}

  /**
   * Returns what tyres and boots do on that ground. Where grip helps, the low of the state asked
   * for counts; where more grip loads the parts, the high of the dry state counts, wet or not.
   *
   * @throws IllegalArgumentException naming the key and the nearest keys there are
   */
  public static Surface of(String key, boolean wet) {
    Row row = Table.row(ROWS, "surface", key);
    State state = wet ? row.wet() : row.dry();
    return new Surface(
        key,
        wet,
        row.name() + (wet ? ", wet" : ", dry"),
        state.tyreLow().value(),
        row.tyreHigh().value(),
        state.rolling().value(),
        state.boot().low().value(),
        row.dry().boot().high().value(),
        state.boot().person().value(),
        row.dry().boot().person().value());
  }

  /** Keys of every ground, in the order of the table. */
  public static List<String> keys() {
    return List.copyOf(ROWS.keySet());
  }

  /** Every figure of that ground in that state, with its kind and source. */
  public static List<Figure> figures(String key, boolean wet) {
    Row row = Table.row(ROWS, "surface", key);
    State s = wet ? row.wet() : row.dry();
    List<Figure> all = new ArrayList<>();
    String of = key + (wet ? ".wet." : ".dry.");
    all.add(figure(of, "tyre-low", s.tyreLow(), ""));
    all.add(figure(of, "tyre-high", row.tyreHigh(), ""));
    all.add(figure(of, "rolling", s.rolling(), ""));
    all.add(figure(of, "boot-low", s.boot().low(), ""));
    all.add(figure(of, "boot-high", row.dry().boot().high(), ""));
    all.add(figure(of, "person-low", s.boot().person(), "N"));
    all.add(figure(of, "person-high", row.dry().boot().person(), "N"));
    return List.copyOf(all);
  }

  private static Figure figure(String of, String what, Cell c, String unit) {
    return new Figure(of + what, c.value(), unit, c.kind(), c.source(), what + " of " + of);
  }

  private record Cell(double value, String source, Kind kind) {}

  /** Traction classes of boots, each with the pull of one person that goes with it. */
  private enum Boot {
    ICY(0.05, 0.10, 110),
    SLICK(0.15, 0.25, 110),
    LOW(0.25, 0.25, 110),
    MEDIUM(0.6, 0.6, 200),
    HIGH(0.9, 0.9, 310);

    private final double low;
    private final double high;
    private final double personN;

    Boot(double low, double high, double personN) {
      this.low = low;
      this.high = high;
      this.personN = personN;
    }

    Cell low() {
      return new Cell(low, "", Kind.PLANNING_ALLOWANCE);
    }

    Cell high() {
      return new Cell(high, "", Kind.PLANNING_ALLOWANCE);
    }

    Cell person() {
      return new Cell(personN, "mil-std-1472", Kind.FROM_MEMORY);
    }
  }

  private record State(Cell tyreLow, Cell rolling, Boot boot) {}

  private record Row(String name, Cell tyreHigh, State dry, State wet) {
    private Row {
      Range.text("name", name);
    }
  }
}
