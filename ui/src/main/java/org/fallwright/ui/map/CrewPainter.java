package org.fallwright.ui.map;

import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import org.fallwright.core.plan.ClearFirst;
import org.fallwright.core.plan.Ground;
import org.fallwright.core.plan.StandingPlace;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Target;
import org.fallwright.ui.text.Messages;
import org.locationtech.jts.geom.Geometry;

/**
 * What the crew looks for on the plan: dark discs with the number of each standing place, a box to
 * tick at each thing to be cleared before the work, a hook in each tree that the falling one can
 * hang up in. Told apart by shape, so that they read in grey.
 */
final class CrewPainter {
  private CrewPainter() {}

  static void places(Canvas c, Ground ground) {
    for (StandingPlace p : ground.places()) {
      Point2D at = c.at(p.at());
      if (p.role() == StandingPlace.Role.FELLER) {
        // beside the stump, which has a sign of its own
        at = new Point2D.Double(at.getX() - 15 * c.unit(), at.getY() + 3 * c.unit());
      }
      if (!c.view().frame().contains(at)) {
        continue;
      }
      Color ink = c.palette().ink();
      c.pen().solid(c.pen().disc(at, 7.5), ink, c.palette().halo(), 1.4);
      Color light = new Color(c.palette().halo().getRGB());
      Pen plain = new Pen(c.pen().graphics(), Palette.clear(ink, 0));
      plain.textAround(String.valueOf(p.number()), at.getX(), at.getY(), light);
      c.labels().keepFree(at, 8 * c.unit());
      if (p.role() == StandingPlace.Role.OPERATOR || p.role() == StandingPlace.Role.LOOK_OUT) {
        String words =
            p.role() == StandingPlace.Role.OPERATOR
                ? Messages.text("plan.place.source")
                : Messages.text("plan.place.look-out");
        c.must(words, at, 9, 3, ink);
      }
    }
  }

  static void clearFirst(Canvas c, Ground ground) {
    for (ClearFirst f : ground.clearFirst()) {
      Point2D at = c.at(f.at());
      if (c.view().frame().contains(at)) {
        Shape box = c.pen().put(new Rectangle2D.Double(-4.5, -4.5, 9, 9), at, 0);
        c.pen().solid(box, c.palette().halo(), c.palette().ink(), 1.7);
        c.labels().keepFree(at, 5 * c.unit());
        if (f.kind() == ClearFirst.Kind.DOOR || f.kind() == ClearFirst.Kind.PERSON) {
          c.label(f.id(), at, 6, 4, c.palette().ink());
        }
      }
    }
  }

  static void hangUps(Canvas c, Ground ground) {
    for (String id : ground.hangUps()) {
      Geometry crown = crown(c, id);
      if (crown == null) {
        continue;
      }
      Color red = c.palette().notWorkable();
      c.pen().stroke(c.view().toPixels(crown), red, 2.6, 7, 2, 2, 2);
      Point2D at = c.view().toPixel(crown.getCentroid().getX(), crown.getCentroid().getY());
      Path2D hook = new Path2D.Double();
      hook.moveTo(0, -9);
      hook.lineTo(0, 3);
      hook.curveTo(0, 9, -8, 9, -8, 2);
      c.pen().stroke(c.pen().put(hook, at, 0), red, 2.4);
      c.pen().stroke(c.pen().put(new Line2D.Double(-8, 2, -5, 4), at, 0), red, 2);
      c.must(Messages.text("plan.hang-up", id), at, 11, 1, red);
    }
  }

  private static Geometry crown(Canvas c, String id) {
    for (Target t : c.scene().site().targets()) {
      if (t.id().equals(id)) {
        return t.shape().geometry();
      }
    }
    for (Anchor a : c.scene().site().anchors()) {
      if (a.id().equals(id) && a instanceof Anchor.StandingTree t) {
        return new org.fallwright.core.site.Shape.Circle(a.place().at(), t.crownRadiusM())
            .geometry();
      }
    }
    return null;
  }
}
