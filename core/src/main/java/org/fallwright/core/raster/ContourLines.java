package org.fallwright.core.raster;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.site.Position;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.operation.linemerge.LineMerger;

/**
 * The lines on which a raster's figure has one value.
 *
 * <p>Marching squares: between the middles of four neighbouring cells the figure runs in straight
 * lines along the sides; each square holds none, one or two pieces of the line. Where two corners
 * that face each other are above and the others below, the mean of the four decides how the pieces
 * lie. A square with a corner that has no figure holds none, so that lines end where the figure
 * does. A published method (Lorensen and Cline 1987, in two dimensions).
 */
public final class ContourLines {
  private static final GeometryFactory FACTORY = new GeometryFactory();

  private final Raster raster;
  private final double level;
  private final List<LineString> pieces = new ArrayList<>();

  private ContourLines(Raster raster, double level) {
    this.raster = raster;
    this.level = level;
  }

  /** The lines of one level, joined as far as they join; coordinates are east and north [m]. */
  public static List<LineString> of(Raster raster, double level) {
    ContourLines lines = new ContourLines(raster, level);
    for (int row = 0; row + 1 < raster.rows(); row++) {
      for (int column = 0; column + 1 < raster.columns(); column++) {
        lines.square(column, row);
      }
    }
    LineMerger merger = new LineMerger();
    merger.add(lines.pieces);
    List<LineString> joined = new ArrayList<>();
    for (Object line : merger.getMergedLineStrings()) {
      joined.add((LineString) line);
    }
    return joined;
  }

  private void square(int c, int r) {
    // corners counter-clockwise from the south-west; side i runs from corner i to the next
    double[] at = {
      raster.at(c, r), raster.at(c + 1, r), raster.at(c + 1, r + 1), raster.at(c, r + 1)
    };
    int above = 0;
    for (int i = 0; i < 4; i++) {
      if (Double.isNaN(at[i])) {
        return;
      }
      above += at[i] >= level ? 1 << i : 0;
    }
    switch (above) {
      case 0, 15 -> {}
      case 1, 14 -> piece(c, r, at, 3, 0);
      case 2, 13 -> piece(c, r, at, 0, 1);
      case 4, 11 -> piece(c, r, at, 1, 2);
      case 8, 7 -> piece(c, r, at, 2, 3);
      case 3, 12 -> piece(c, r, at, 3, 1);
      case 6, 9 -> piece(c, r, at, 0, 2);
      default -> {
        boolean middleAbove = (at[0] + at[1] + at[2] + at[3]) / 4 >= level;
        boolean about13 = above == 5 == middleAbove;
        piece(c, r, at, about13 ? 0 : 3, about13 ? 1 : 0);
        piece(c, r, at, about13 ? 2 : 1, about13 ? 3 : 2);
      }
    }
  }

  private void piece(int c, int r, double[] at, int from, int to) {
    Coordinate a = cut(c, r, at, from);
    Coordinate b = cut(c, r, at, to);
    if (!a.equals2D(b)) {
      pieces.add(FACTORY.createLineString(new Coordinate[] {a, b}));
    }
  }

  /** Where the level cuts a side; both squares of a side reckon it from the same corner. */
  private Coordinate cut(int c, int r, double[] at, int side) {
    int from = side;
    int to = (side + 1) % 4;
    if (side >= 2) {
      from = to;
      to = side;
    }
    double share = (level - at[from]) / (at[to] - at[from]);
    Position a = corner(c, r, from);
    Position b = corner(c, r, to);
    return new Coordinate(
        a.eastM() + share * (b.eastM() - a.eastM()),
        a.northM() + share * (b.northM() - a.northM()));
  }

  private Position corner(int c, int r, int i) {
    int column = c + (i == 1 || i == 2 ? 1 : 0);
    int row = r + (i >= 2 ? 1 : 0);
    return raster.middle(row * raster.columns() + column);
  }
}
