package org.fallwright.ui.map;

import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.geom.RoundRectangle2D;
import java.util.List;
import java.util.Optional;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Spot;
import org.fallwright.ui.text.Messages;

/** Candidate anchors by kind, with the mark of what is known against them, and numbered spots. */
final class SupportsPainter {
  /** A check whose place is this near a point speaks of that point [m]. */
  private static final double SAME_PLACE_M = 0.05;

  private SupportsPainter() {}

  static void anchors(Canvas c) {
    for (Anchor a : c.scene().site().anchors()) {
      if (a instanceof Anchor.TwoLegs l) {
        legs(c, l);
      }
    }
    for (Anchor a : c.scene().site().anchors()) {
      Point2D at = c.at(a.place().at());
      Color ink = c.palette().ink();
      Pen pen = c.pen();
      double size = 7;
      if (a instanceof Anchor.StandingTree t) {
        Shape crown = c.circle(a.place().at(), t.crownRadiusM());
        pen.stroke(crown, c.palette().tree(), 1, 2, 3);
        pen.solid(pen.disc(at, 6), c.palette().halo(), c.palette().tree(), 1.6);
        pen.fill(pen.disc(at, 3), c.palette().tree());
      } else if (a instanceof Anchor.Stump) {
        pen.solid(pen.disc(at, 6), c.palette().halo(), c.palette().earth(), 1.6);
        pen.plain(pen.disc(at, 3.4), c.palette().earth(), 1);
        pen.fill(pen.disc(at, 1), c.palette().earth());
      } else if (a instanceof Anchor.ParkedVehicle) {
        Shape box = pen.put(new Rectangle2D.Double(-7, -4.5, 14, 9), at, 0);
        pen.solid(box, c.palette().halo(), ink, 1.6);
        pen.plain(pen.put(new Line2D.Double(2, -4.5, 2, 4.5), at, 0), ink, 1.4);
      } else if (a instanceof Anchor.Pickets) {
        pickets(pen, at, ink);
      } else if (a instanceof Anchor.BuriedLog) {
        log(pen, at, c.palette().halo(), c.palette().earth());
      } else if (a instanceof Anchor.TwoLegs) {
        pen.solid(pen.disc(at, 5), c.palette().halo(), ink, 1.6);
        pen.fill(pen.put(new Ellipse2D.Double(-4, -1.5, 3, 3), at, 0), ink);
        pen.fill(pen.put(new Ellipse2D.Double(1, -1.5, 3, 3), at, 0), ink);
      } else {
        Path2D diamond = new Path2D.Double();
        diamond.moveTo(0, -7);
        diamond.lineTo(7, 0);
        diamond.lineTo(0, 7);
        diamond.lineTo(-7, 0);
        diamond.closePath();
        pen.solid(pen.put(diamond, at, 0), c.palette().halo(), ink, 1.6);
      }
      c.labels().keepFree(at, size * c.unit());
      c.must(words(a), at, size + 2, 2, ink);
    }
  }

  /** Three stakes that slant away from the pull, lashed together. */
  private static void pickets(Pen pen, Point2D at, Color ink) {
    Path2D stakes = new Path2D.Double();
    for (int x = -6; x <= 6; x += 6) {
      stakes.moveTo(x + 2, -6);
      stakes.lineTo(x - 2, 6);
    }
    stakes.moveTo(-5.5, -2.5);
    stakes.lineTo(7.5, -2.5);
    pen.stroke(pen.put(stakes, at, 0), ink, 1.6);
  }

  /** A log that lies across, with earth over it. */
  private static void log(Pen pen, Point2D at, Color halo, Color earth) {
    pen.solid(pen.put(new RoundRectangle2D.Double(-8, -1, 16, 7, 6, 6), at, 0), halo, earth, 1.6);
    Path2D ground = new Path2D.Double();
    ground.moveTo(-9, -4);
    ground.lineTo(9, -4);
    for (int x = -6; x <= 6; x += 4) {
      ground.moveTo(x, -4);
      ground.lineTo(x - 2, -1.5);
    }
    pen.stroke(pen.put(ground, at, 0), earth, 1.2);
  }

  /** Each of two legs, from where they meet to its anchor; under the symbols. */
  private static void legs(Canvas c, Anchor.TwoLegs l) {
    Point2D at = c.at(l.place().at());
    for (String id : List.of(l.first(), l.second())) {
      c.scene()
          .site()
          .anchor(id)
          .ifPresent(
              a ->
                  c.pen()
                      .stroke(
                          new Line2D.Double(at, c.at(a.place().at())),
                          c.palette().ink(),
                          1.2,
                          5,
                          3));
    }
  }

  /** Marks go on top of everything that may stand at an anchor. */
  static void marks(Canvas c) {
    for (Anchor a : c.scene().site().anchors()) {
      mark(c, a).ifPresent(v -> beside(c, v, c.at(a.place().at())));
    }
  }

  private static String words(Anchor a) {
    return a.rejected() == null ? a.id() : Messages.text("plan.rejected", a.id(), a.rejected());
  }

  /** What is known of an anchor: the worst check at its place, else what was seen of it. */
  static Optional<Verdict> mark(Canvas c, Anchor a) {
    Optional<Verdict> seen = refused(a) ? Optional.of(Verdict.NOT_WORKABLE) : Optional.empty();
    Judged chosen = c.scene().chosen();
    if (chosen == null) {
      return seen;
    }
    Optional<Verdict> judged =
        chosen.checks().stream()
            .filter(k -> k.place() != null && near(k.place(), a.place().at()))
            .map(Check::verdict)
            .reduce(Verdict::worse);
    return judged.isPresent() ? judged : seen;
  }

  /** Whether an anchor is ruled out before any sum. */
  static boolean refused(Anchor a) {
    Anchor.Condition condition =
        a instanceof Anchor.StandingTree t
            ? t.condition()
            : a instanceof Anchor.Stump s ? s.condition() : Anchor.Condition.SOUND;
    return a.rejected() != null || condition != Anchor.Condition.SOUND;
  }

  static void spots(Canvas c) {
    int n = 0;
    for (Spot s : c.scene().site().spots()) {
      n++;
      Point2D at = c.at(s.place().at());
      Pen pen = c.pen();
      Color ink = c.palette().ink();
      if (s.headingDeg() != null) {
        Point2D way = c.view().direction(s.headingDeg());
        double l = 17 * c.unit();
        Point2D tip = new Point2D.Double(at.getX() + way.getX() * l, at.getY() + way.getY() * l);
        pen.stroke(new Line2D.Double(at, tip), ink, 1.4);
        pen.stroke(pen.head(tip, way, 6), ink, 1.4);
      }
      Shape box = pen.put(new Rectangle2D.Double(-7, -7, 14, 14), at, 0);
      pen.solid(box, c.palette().halo(), ink, 1.4);
      pen.textAround(String.valueOf(n), at.getX(), at.getY(), ink);
      c.labels().keepFree(at, 8 * c.unit());
      String state = s.wet() ? Messages.text("plan.spot.wet", s.id()) : s.id();
      c.must(state, at, 10, 3, ink);
    }
  }

  private static void beside(Canvas c, Verdict v, Point2D at) {
    double off = 9 * c.unit();
    Point2D to = new Point2D.Double(at.getX() + off, at.getY() - off);
    c.pen().fill(c.pen().disc(to, 7), c.palette().halo());
    VerdictMark.paint(c.pen(), v, to.getX(), to.getY(), 0.8, c.palette().of(v));
    c.labels().keepFree(to, 7 * c.unit());
  }

  private static boolean near(Position p, Position q) {
    return p.distanceTo(q) < SAME_PLACE_M;
  }
}
