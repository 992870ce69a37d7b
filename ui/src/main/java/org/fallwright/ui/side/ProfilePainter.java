package org.fallwright.ui.side;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.LinePoint;
import org.fallwright.core.site.Site;
import org.fallwright.ui.map.Labels;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.map.Pen;
import org.fallwright.ui.map.ScaleBar;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.Messages;

/**
 * Draws the profile along the lay of a setup, to one scale in both directions, the lay to the
 * right. Without a setup it shows the plane the tree leans in, leaning to the left.
 */
public final class ProfilePainter {
  /** Least share of the tree's height shown behind the stump. */
  private static final double BEHIND = 0.8;

  /** What lies flat on the ground is drawn without a name [m]. */
  private static final double LOW_M = 0.3;

  private final Site site;
  private final Judged chosen;
  private final Amounts amounts;
  private final Palette palette;
  private final LayPlane plane;

  /**
   * @param chosen the setup, or null
   */
  public ProfilePainter(Site site, Judged chosen, Amounts amounts, Palette palette) {
    this.site = site;
    this.chosen = chosen;
    this.amounts = amounts;
    this.palette = palette;
    double lay =
        chosen != null
            ? chosen.setup().layDeg()
            : (site.tree().leanAzimuthDeg().value() + 180) % 360;
    plane = new LayPlane(site, lay);
  }

  /** Paints the profile into a frame [pixels]; the graphics is left as it was. */
  public void paint(Graphics2D graphics, Rectangle2D frame) {
    Graphics2D g = (Graphics2D) graphics.create();
    try {
      g.clip(frame);
      Pen pen = new Pen(g, palette.halo());
      Labels labels = new Labels(frame);
      ProfileView view = view(frame, pen.unit());
      String title = Messages.text("profile.title", amounts.azimuth(plane.layDeg()));
      double pad = 8 * pen.unit();
      Rectangle2D text = pen.extent(title);
      Rectangle2D head =
          new Rectangle2D.Double(
              frame.getMinX() + pad / 2,
              frame.getMinY() + pad / 2,
              text.getWidth() + pad,
              text.getHeight() + pad / 2);
      labels.keepFree(head);
      labels.keepFree(
          new Rectangle2D.Double(
              frame.getMinX(),
              frame.getMaxY() - 22 * pen.unit(),
              frame.getWidth(),
              22 * pen.unit()));
      ground(pen, view, frame);
      targets(pen, view, labels);
      tree().paint(pen, view, labels);
      wires(pen, view, labels);
      line(pen, view, labels);
      labels.paint(pen);
      pen.plate(head);
      pen.textAround(title, head.getCenterX(), head.getCenterY(), palette.ink());
    } finally {
      g.dispose();
    }
  }

  private ProfileTree tree() {
    return new ProfileTree(site, plane, amounts, palette);
  }

  private ProfileView view(Rectangle2D frame, double unit) {
    double h = site.tree().heightM().value();
    double behind = ProfileTree.crownRadius(site.tree()) - tree().crownAlong(site.tree());
    double from = -Math.max(BEHIND * h, behind + 2);
    double to = h + 4;
    if (chosen != null && chosen.line().size() > 1) {
      to = Math.max(to, plane.s(chosen.line().get(1).at()) + 3);
    }
    double low = 0;
    double high = h;
    for (LayPlane.GroundPoint p : plane.ground()) {
      if (p.s() >= from && p.s() <= to) {
        low = Math.min(low, p.z());
        high = Math.max(high, p.z());
      }
    }
    double ruler = 26 * unit;
    Rectangle2D inner =
        new Rectangle2D.Double(
            frame.getX() + 10 * unit,
            frame.getY() + 10 * unit,
            frame.getWidth() - 20 * unit,
            frame.getHeight() - ruler - 10 * unit);
    return ProfileView.fitting(from, to, low, high, inner);
  }

  private void ground(Pen pen, ProfileView view, Rectangle2D frame) {
    double left = view.s(frame.getMinX());
    double right = view.s(frame.getMaxX());
    List<LayPlane.GroundPoint> known = plane.ground();
    Path2D surface = new Path2D.Double();
    to(surface, view.at(left, plane.groundAt(left)));
    Path2D sure = new Path2D.Double();
    for (LayPlane.GroundPoint p : known) {
      Point2D at = view.at(p.s(), p.z());
      to(sure, at);
      if (p.s() > left && p.s() < right) {
        to(surface, at);
      }
    }
    to(surface, view.at(right, plane.groundAt(right)));
    Path2D body = new Path2D.Double(surface);
    body.lineTo(frame.getMaxX(), frame.getMaxY());
    body.lineTo(frame.getMinX(), frame.getMaxY());
    body.closePath();
    pen.fill(body, Palette.clear(palette.earth(), 45));
    // solid where heights are known, dashed where the ground is only taken as level
    pen.plain(surface, palette.earth(), 1.4, 4, 4);
    if (known.size() > 1) {
      pen.plain(sure, palette.earth(), 2.4);
    }
    ruler(pen, view, frame, left, right);
  }

  private static void to(Path2D path, Point2D at) {
    if (path.getCurrentPoint() == null) {
      path.moveTo(at.getX(), at.getY());
    } else {
      path.lineTo(at.getX(), at.getY());
    }
  }

  /** Distances from the stump along the lower edge. */
  private void ruler(Pen pen, ProfileView view, Rectangle2D frame, double left, double right) {
    double step = ScaleBar.roundLength(amounts, 110 * pen.unit() / view.pixelsPerMetre());
    double base = frame.getMaxY() - 5 * pen.unit();
    for (double s = Math.ceil(left / step) * step; s <= right; s += step) {
      double x = view.at(s, 0).getX();
      String words = amounts.roundLength(Math.abs(s));
      double half = pen.extent(words).getWidth() / 2;
      if (x - half < frame.getMinX() || x + half > frame.getMaxX()) {
        continue;
      }
      pen.plain(
          new Line2D.Double(x, base - 18 * pen.unit(), x, base - 12 * pen.unit()),
          palette.ink(),
          1);
      pen.text(words, x - half, base, palette.ink());
    }
  }

  private void targets(Pen pen, ProfileView view, Labels labels) {
    for (LayPlane.Standing t : plane.targets(view.from(), view.to(), site.tree().crownRadiusM())) {
      double top = plane.z(t.target().groundM() + t.target().heightM());
      double bottom = plane.z(t.target().groundM());
      Point2D a = view.at(t.from(), top);
      Point2D b = view.at(t.to(), bottom);
      Rectangle2D box =
          new Rectangle2D.Double(
              a.getX(),
              a.getY(),
              Math.max(2 * pen.unit(), b.getX() - a.getX()),
              Math.max(2 * pen.unit(), b.getY() - a.getY()));
      if (t.aside() > 0) {
        pen.stroke(box, palette.target(), 1.1, 3, 3);
      } else {
        pen.fill(box, Palette.clear(palette.target(), 70));
        pen.stroke(box, palette.target(), 1.6);
      }
      String name = t.target().id();
      double near = t.from() > 0 ? t.from() : t.to() < 0 ? -t.to() : 0;
      String words =
          t.aside() > 0
              ? Messages.text("profile.target.aside", name, amounts.length(t.aside()))
              : t.to() < 0
                  ? Messages.text("profile.target.behind", name, amounts.length(near))
                  : Messages.text("profile.target.ahead", name, amounts.length(near));
      if (t.target().heightM() < LOW_M) {
        continue;
      }
      labels.want(
          new Labels.Wanted(
              words,
              new Point2D.Double(box.getCenterX(), box.getMinY()),
              4 * pen.unit(),
              t.aside() > 0 ? 5 : 2,
              t.target().occupied(),
              palette.target()));
    }
  }

  private void wires(Pen pen, ProfileView view, Labels labels) {
    for (LayPlane.Crossing w : plane.wires(view.from(), view.to())) {
      Point2D at = view.at(w.s(), w.z());
      Point2D foot = view.at(w.s(), plane.groundAt(w.s()));
      pen.plain(new Line2D.Double(at, foot), palette.wire(), 1, 14, 4, 2, 4);
      pen.solid(pen.disc(at, 4.5), palette.halo(), palette.wire(), 2);
      pen.fill(pen.disc(at, 1.8), palette.wire());
      double clear = w.z() - plane.groundAt(w.s());
      labels.want(
          new Labels.Wanted(
              Messages.text("profile.wire", w.wire().id(), amounts.length(clear)),
              at,
              7 * pen.unit(),
              0,
              true,
              palette.wire()));
    }
  }

  private void line(Pen pen, ProfileView view, Labels labels) {
    if (chosen == null || chosen.line().size() < 2) {
      return;
    }
    LinePoint a = chosen.line().get(0);
    LinePoint p = chosen.line().get(1);
    Point2D from = view.at(plane.s(a.at()), plane.z(a.elevationM()));
    Point2D to = view.at(plane.s(p.at()), plane.z(p.elevationM()));
    pen.stroke(new Line2D.Double(from, to), palette.line(), 2.6);
    pen.solid(pen.disc(from, 4), palette.halo(), palette.line(), 1.8);
    pen.solid(pen.disc(to, 5), palette.halo(), palette.line(), 2);
    Point2D mid = between(from, to, 0.55);
    double d = from.distance(to);
    if (d > 1) {
      Point2D way =
          new Point2D.Double((to.getX() - from.getX()) / d, (to.getY() - from.getY()) / d);
      pen.solid(pen.fullHead(mid, way, 11), palette.line(), palette.line(), 0.8);
    }
    for (double t = 0; t <= 1; t += 0.04) {
      labels.keepFree(between(from, to, t), 2.5 * pen.unit());
    }
    labels.want(
        new Labels.Wanted(
            Messages.text("profile.line-at", amounts.length(chosen.setup().attachHeightM())),
            from,
            6 * pen.unit(),
            1,
            true,
            palette.line()));
    labels.want(
        new Labels.Wanted(
            Messages.text(
                "profile.leg",
                amounts.angle(chosen.figures().lineRiseDeg()),
                amounts.length(a.at().distanceTo(p.at()))),
            mid,
            8 * pen.unit(),
            2,
            true,
            palette.line()));
    labels.want(new Labels.Wanted(end(p), to, 7 * pen.unit(), 1, true, palette.line()));
  }

  private String end(LinePoint p) {
    double aside = plane.r(p.at());
    if (Math.abs(aside) < 0.5) {
      return p.id();
    }
    return Messages.text(
        aside > 0 ? "profile.end.right" : "profile.end.left",
        p.id(),
        amounts.length(Math.abs(aside)));
  }

  private static Point2D between(Point2D a, Point2D b, double t) {
    return new Point2D.Double(
        a.getX() + (b.getX() - a.getX()) * t, a.getY() + (b.getY() - a.getY()) * t);
  }
}
