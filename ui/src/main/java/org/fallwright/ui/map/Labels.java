package org.fallwright.ui.map;

import java.awt.Color;
import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * Puts labels beside their points so that none covers another: the most important first, each at
 * the first free place of a ring of places about its point, nearest ring first. A label that finds
 * no free place is left out, unless it must be shown: then it takes the place where it covers
 * least.
 */
public final class Labels {
  /** Directions tried, best first: right, left, above, below, then the corners. */
  private static final double[][] SIDES = {
    {1, 0}, {-1, 0}, {0, -1}, {0, 1}, {1, -1}, {1, 1}, {-1, -1}, {-1, 1}
  };

  private static final double[] RINGS = {0, 1.2, 2.6, 4.4, 7};

  /**
   * A label wanted.
   *
   * @param at the point it belongs to [pixels]
   * @param clearance distance kept from that point [pixels]; negative: the text sits on the point
   * @param rank importance, 0 first
   * @param must whether it is shown even where it covers something
   */
  public record Wanted(
      String text, Point2D at, double clearance, int rank, boolean must, Color colour) {}

  /** A label with its place: the box of its text. */
  public record Placed(Wanted label, Rectangle2D box) {}

  private final Rectangle2D frame;
  private final List<Wanted> wanted = new ArrayList<>();
  private final List<Rectangle2D> taken = new ArrayList<>();

  public Labels(Rectangle2D frame) {
    this.frame = frame;
  }

  /** Keeps a place free of labels. */
  public void keepFree(Rectangle2D box) {
    taken.add(box);
  }

  /** Keeps a square about a point free of labels. */
  public void keepFree(Point2D at, double half) {
    keepFree(new Rectangle2D.Double(at.getX() - half, at.getY() - half, 2 * half, 2 * half));
  }

  public void want(Wanted label) {
    if (frame.contains(label.at())) {
      wanted.add(label);
    }
  }

  /** Places all labels; their size is that of their text in the pen's font. */
  public List<Placed> place(Pen pen) {
    List<Placed> placed = new ArrayList<>();
    wanted.sort(Comparator.comparingInt(Wanted::rank));
    for (Wanted w : wanted) {
      Rectangle2D size = pen.extent(w.text());
      double pad = 2 * pen.unit();
      spot(w, size.getWidth() + 2 * pad, size.getHeight() + pad)
          .ifPresent(
              box -> {
                taken.add(box);
                placed.add(new Placed(w, box));
              });
    }
    return placed;
  }

  /** Places and draws all labels, with a thin lead to its point where a label stands off. */
  public void paint(Pen pen) {
    List<Placed> placed = place(pen);
    for (Placed p : placed) {
      Point2D at = p.label().at();
      double x = Math.max(p.box().getMinX(), Math.min(at.getX(), p.box().getMaxX()));
      double y = Math.max(p.box().getMinY(), Math.min(at.getY(), p.box().getMaxY()));
      double off = at.distance(x, y);
      if (off > Math.max(0, p.label().clearance()) + 10 * pen.unit()) {
        pen.stroke(new Line2D.Double(at.getX(), at.getY(), x, y), p.label().colour(), 0.8);
      }
    }
    for (Placed p : placed) {
      pen.plate(p.box());
      pen.textAround(
          p.label().text(), p.box().getCenterX(), p.box().getCenterY(), p.label().colour());
    }
  }

  private Optional<Rectangle2D> spot(Wanted w, double width, double height) {
    Rectangle2D best = null;
    double least = Double.POSITIVE_INFINITY;
    if (w.clearance() < 0) {
      Rectangle2D on = box(w.at().getX(), w.at().getY(), width, height);
      double c = covered(on);
      if (c == 0) {
        return Optional.of(on);
      }
      best = on;
      least = c;
    }
    double start = Math.max(0, w.clearance());
    for (double ring : RINGS) {
      for (double[] side : SIDES) {
        double off = start + ring * height;
        double corner = side[0] != 0 && side[1] != 0 ? 0.75 : 1;
        Rectangle2D b =
            box(
                w.at().getX() + side[0] * (off * corner + width / 2),
                w.at().getY() + side[1] * (off * corner + height / 2),
                width,
                height);
        double c = covered(b);
        if (c == 0) {
          return Optional.of(b);
        }
        if (c < least) {
          least = c;
          best = b;
        }
      }
    }
    return w.must() ? Optional.ofNullable(best) : Optional.empty();
  }

  /** Area of a box that is covered already or lies outside the frame. */
  private double covered(Rectangle2D box) {
    Rectangle2D inside = box.createIntersection(frame);
    double area = box.getWidth() * box.getHeight();
    double sum = inside.isEmpty() ? 3 * area : 3 * (area - inside.getWidth() * inside.getHeight());
    sum = sum < 1e-6 * area ? 0 : sum;
    for (Rectangle2D t : taken) {
      Rectangle2D both = t.createIntersection(box);
      if (!both.isEmpty()) {
        sum += both.getWidth() * both.getHeight();
      }
    }
    return sum;
  }

  private static Rectangle2D box(double cx, double cy, double width, double height) {
    return new Rectangle2D.Double(cx - width / 2, cy - height / 2, width, height);
  }
}
