package org.fallwright.core.raster;

import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import org.fallwright.core.site.Position;
import org.fallwright.core.units.Range;

/**
 * A figure at the middles of equal square cells, rows from south to north, in each row from west to
 * east.
 */
public final class Raster {
  private static final int MOST_CELLS = 4_000_000;

  private final Position first;
  private final double stepM;
  private final int columns;
  private final int rows;
  private final double[] values;

  /**
   * Works a figure out for every cell, on all processors; {@code figure} is asked by cell number.
   *
   * @param first middle of the most south-westerly cell
   * @param stepM size of a cell [m]
   * @param columns cells from west to east, at least 2
   * @param rows cells from south to north, at least 2
   */
  public Raster(Position first, double stepM, int columns, int rows, IntToDoubleFunction figure) {
    this.first = Range.present("first", first);
    this.stepM = Range.check("step_m", stepM, 0.05, 1000, "m");
    Range.check("columns", columns, 2, MOST_CELLS, "");
    Range.check("rows", rows, 2, MOST_CELLS, "");
    Range.check("cells", (double) columns * rows, 4, MOST_CELLS, "");
    this.columns = columns;
    this.rows = rows;
    values = IntStream.range(0, columns * rows).parallel().mapToDouble(figure).toArray();
  }

  /** Cells from west to east. */
  public int columns() {
    return columns;
  }

  /** Cells from south to north. */
  public int rows() {
    return rows;
  }

  /** Size of a cell [m]. */
  public double stepM() {
    return stepM;
  }

  /** The figure of a cell; NaN: none. */
  public double at(int cell) {
    return values[cell];
  }

  /** The figure of the cell in a column and a row; NaN: none. */
  public double at(int column, int row) {
    return values[row * columns + column];
  }

  /** The figure of the cell that holds a position; NaN: none, or off the raster. */
  public double at(Position p) {
    long column = Math.round((p.eastM() - first.eastM()) / stepM);
    long row = Math.round((p.northM() - first.northM()) / stepM);
    return column < 0 || row < 0 || column >= columns || row >= rows
        ? Double.NaN
        : at((int) column, (int) row);
  }

  /** Middle of a cell. */
  public Position middle(int cell) {
    return middle(first, stepM, columns, cell);
  }

  /** Middle of a cell of a raster that is yet to be made. */
  public static Position middle(Position first, double stepM, int columns, int cell) {
    return new Position(
        first.eastM() + stepM * (cell % columns), first.northM() + stepM * (cell / columns));
  }
}
