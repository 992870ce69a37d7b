package org.fallwright.ui.map;

import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.plan.MarginMap;
import org.fallwright.core.raster.ContourLines;
import org.fallwright.core.raster.Raster;
import org.fallwright.core.site.Position;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.LineString;

/**
 * Draws a margin map over the plan: open ground by the verdict of the pull margin - workable ground
 * with dots, tight ground with slanted lines, ground from where the source pulls too little with
 * nothing - and the lines on which the margin has a round value, with that value.
 */
public final class MarginPainter {
  /** Margins whose lines are drawn; 1 and 1.25 part the verdicts. */
  static final double[] LEVELS = {0.25, 0.5, 0.75, 1, 1.25, 1.5, 2, 3, 4};

  private static final int TINT = 90;
  private static final double LABEL_EVERY = 220;

  private MarginPainter() {}

  /** Paints the map; the graphics is left as it was. */
  public static void paint(Graphics2D graphics, Viewport view, MarginMap map, Palette palette) {
    Graphics2D g = (Graphics2D) graphics.create();
    try {
      g.clip(view.frame());
      Pen pen = new Pen(g, palette.halo());
      Shape workable = ground(view, map, 1.25, Double.POSITIVE_INFINITY);
      Shape tight = ground(view, map, 1, 1.25);
      pen.fill(workable, Palette.clear(palette.workable(), TINT));
      pen.dots(workable, palette.workable(), 9, 2);
      pen.fill(tight, Palette.clear(palette.tight(), TINT));
      pen.hatch(tight, palette.tight(), 7, 1, 45);
      pen.fill(ground(view, map, 0, 1), Palette.clear(palette.notWorkable(), TINT / 2));
      Labels labels = new Labels(view.frame());
      for (double level : LEVELS) {
        boolean edge = level == 1 || level == 1.25;
        for (LineString line : ContourLines.of(map.margin(), level)) {
          Path2D path = new Path2D.Double();
          path.append(view.toPixels(line), false);
          pen.stroke(path, palette.ink(), edge ? 2.2 : 1);
          label(pen, view, labels, line, String.format(Locale.ROOT, "%.2f", level), palette);
        }
      }
      labels.paint(pen);
    } finally {
      g.dispose();
    }
  }

  /**
   * Explains the map in the upper left corner of a drawing.
   *
   * @param words what the three kinds of open ground and the blank ground are, in this order
   */
  public static void key(Graphics2D graphics, Palette palette, List<String> words) {
    Graphics2D g = (Graphics2D) graphics.create();
    try {
      Pen pen = new Pen(g, palette.halo());
      double u = pen.unit();
      double widest = words.stream().mapToDouble(w -> pen.extent(w).getWidth()).max().orElse(0);
      Rectangle2D plate =
          new Rectangle2D.Double(12 * u, 12 * u, widest + 50 * u, (words.size() * 20 + 8) * u);
      pen.plate(plate);
      for (int i = 0; i < words.size(); i++) {
        double y = (18 + 20 * i) * u;
        Rectangle2D box = new Rectangle2D.Double(20 * u, y, 26 * u, 13 * u);
        switch (i) {
          case 0 -> {
            pen.fill(box, Palette.clear(palette.workable(), TINT));
            pen.dots(box, palette.workable(), 9, 2);
          }
          case 1 -> {
            pen.fill(box, Palette.clear(palette.tight(), TINT));
            pen.hatch(box, palette.tight(), 7, 1, 45);
          }
          case 2 -> pen.fill(box, Palette.clear(palette.notWorkable(), TINT / 2));
          default -> {}
        }
        pen.plain(box, palette.ink(), 1);
        pen.text(words.get(i), 54 * u, y + 11 * u, palette.ink());
      }
    } finally {
      g.dispose();
    }
  }

  private static void label(
      Pen pen, Viewport view, Labels labels, LineString line, String text, Palette palette) {
    double along = 0;
    Point2D last = null;
    for (Coordinate c : line.getCoordinates()) {
      Point2D at = view.toPixel(c.x, c.y);
      along += last == null ? LABEL_EVERY * pen.unit() / 2 : at.distance(last);
      last = at;
      if (along >= LABEL_EVERY * pen.unit() && view.frame().contains(at)) {
        labels.want(new Labels.Wanted(text, at, 1 * pen.unit(), 2, false, palette.ink()));
        along = 0;
      }
    }
  }

  /** The open cells with a margin from one to below another, row by row in runs. */
  private static Shape ground(Viewport view, MarginMap map, double from, double below) {
    Raster r = map.margin();
    Path2D area = new Path2D.Double();
    for (int row = 0; row < r.rows(); row++) {
      int start = -1;
      for (int c = 0; c <= r.columns(); c++) {
        double m = c < r.columns() ? r.at(c, row) : Double.NaN;
        boolean in = m >= from && (m < below || Double.isInfinite(m) && Double.isInfinite(below));
        if (in && start < 0) {
          start = c;
        } else if (!in && start >= 0) {
          run(area, view, r, row, start, c - 1);
          start = -1;
        }
      }
    }
    return area;
  }

  private static void run(Path2D area, Viewport view, Raster r, int row, int from, int to) {
    double half = r.stepM() / 2;
    Position a = r.middle(row * r.columns() + from);
    Position b = r.middle(row * r.columns() + to);
    List<Point2D> corners =
        List.of(
            view.toPixel(a.eastM() - half, a.northM() - half),
            view.toPixel(b.eastM() + half, b.northM() - half),
            view.toPixel(b.eastM() + half, b.northM() + half),
            view.toPixel(a.eastM() - half, a.northM() + half));
    area.moveTo(corners.get(0).getX(), corners.get(0).getY());
    corners.subList(1, 4).forEach(p -> area.lineTo(p.getX(), p.getY()));
    area.closePath();
  }
}
