package org.fallwright.ui.side;

import java.awt.Color;
import java.awt.geom.AffineTransform;
import java.awt.geom.Arc2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.tree.CrownOutline;
import org.fallwright.ui.map.Labels;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.map.Pen;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.Messages;

/** The tree in the profile: as it leans now, and where its tip comes down. */
record ProfileTree(Site site, LayPlane plane, Amounts amounts, Palette palette) {

  void paint(Pen pen, ProfileView view, Labels labels) {
    SubjectTree t = site.tree();
    double h = t.heightM().value();
    double k = slope(t);
    double cut = site.cut().heightM();
    Color green = palette.tree();
    fallen(pen, view, labels, t, h);

    double half = (t.stumpDiameterM() == null ? t.dbhM() : t.stumpDiameterM()).value() / 2;
    half = Math.max(half, 1.6 * pen.unit() / view.pixelsPerMetre());
    Path2D stem = new Path2D.Double();
    move(stem, view.at(-half, 0));
    move(stem, view.at(h * k, h));
    move(stem, view.at(half, 0));
    stem.closePath();
    double middle = (t.crownBaseM() + h) / 2;
    double radius = crownRadius(t);
    Ellipse2D round =
        new Ellipse2D.Double(-radius, -(h - t.crownBaseM()) / 2, 2 * radius, h - t.crownBaseM());
    Point2D centre = view.at(crownAlong(t), middle);
    AffineTransform lean =
        new AffineTransform(
            view.pixelsPerMetre(),
            0,
            k * view.pixelsPerMetre(),
            -view.pixelsPerMetre(),
            centre.getX(),
            centre.getY());
    var crown = lean.createTransformedShape(round);
    pen.fill(crown, Palette.clear(green, 45));
    pen.stroke(crown, green, 1.6);
    pen.solid(stem, palette.earth(), palette.ink(), 1.2);
    Point2D top = view.at(h * k, h);
    Line2D hinge =
        new Line2D.Double(view.at(cut * k - 1.6 * half, cut), view.at(cut * k + 1.6 * half, cut));
    pen.stroke(hinge, palette.ink(), 1.6);
    want(labels, pen, Messages.text("profile.height", amounts.length(h)), top, 3, false);
    want(
        labels,
        pen,
        Messages.text("profile.cut", amounts.small(cut)),
        view.at(cut * k - 1.6 * half, cut),
        4,
        false);
    breast(pen, view, labels, k, half);
    for (double z = 0; z < h; z += Math.max(0.5, 8 * pen.unit() / view.pixelsPerMetre())) {
      labels.keepFree(view.at(z * k, z), 3 * pen.unit());
    }
  }

  /** Where DBH is measured: a tick square to the stem, its label on the side the tree leans to. */
  private void breast(Pen pen, ProfileView view, Labels labels, double k, double half) {
    double z =
        SubjectTree.BREAST_HEIGHT_M * Math.cos(Math.toRadians(site.tree().leanDeg().value()));
    double reach = half + 4 * pen.unit() / view.pixelsPerMetre();
    double side = k < 0 ? -reach : reach;
    double along = Math.hypot(1, k);
    Point2D under = view.at(z * k + side / along, z - side * k / along);
    Point2D over = view.at(z * k - side / along, z + side * k / along);
    pen.stroke(new Line2D.Double(under, over), palette.ink(), 1.6);
    labels.keepFree(under, 2 * pen.unit());
    labels.keepFree(over, 2 * pen.unit());
    want(
        labels,
        pen,
        Messages.text("profile.dbh", amounts.length(SubjectTree.BREAST_HEIGHT_M)),
        under,
        1,
        false);
  }

  /** The way of the tip and the tree as it would lie. */
  private void fallen(Pen pen, ProfileView view, Labels labels, SubjectTree t, double h) {
    Color ink = palette.lay();
    double base = plane.groundAt(h);
    Point2D foot = view.at(0, site.cut().heightM());
    Point2D tip = view.at(h, base);
    double r = h * view.pixelsPerMetre();
    double from = 90 - Math.toDegrees(Math.atan(slope(t)));
    double to = Math.toDegrees(Math.atan2(base - site.cut().heightM(), h));
    pen.stroke(
        new Arc2D.Double(foot.getX() - r, foot.getY() - r, 2 * r, 2 * r, to, from - to, Arc2D.OPEN),
        ink,
        1.1,
        2,
        5);
    pen.stroke(new Line2D.Double(foot, tip), ink, 1.6, 8, 4);
    double turn = -Math.atan2(base - site.cut().heightM(), h);
    double along = (h - t.crownBaseM()) * view.pixelsPerMetre();
    double high = 2 * crownRadius(t) * view.pixelsPerMetre();
    var crown =
        AffineTransform.getRotateInstance(turn, tip.getX(), tip.getY())
            .createTransformedShape(
                new Arc2D.Double(
                    tip.getX() - along, tip.getY() - high / 2, along, high, 0, 180, Arc2D.OPEN));
    pen.stroke(crown, ink, 1.2, 8, 4);
    pen.solid(pen.disc(tip, 3.4), palette.halo(), ink, 1.8);
    labels.want(
        new Labels.Wanted(
            Messages.text("profile.tip", amounts.length(h)), tip, 5 * pen.unit(), 1, true, ink));
  }

  private void want(Labels labels, Pen pen, String words, Point2D at, int rank, boolean must) {
    labels.want(new Labels.Wanted(words, at, 5 * pen.unit(), rank, must, palette.ink()));
  }

  /** Offset along the lay for each metre of height. */
  private double slope(SubjectTree t) {
    return Math.tan(Math.toRadians(t.leanDeg().value()))
        * Math.cos(Math.toRadians(t.leanAzimuthDeg().value() - plane.layDeg()));
  }

  /** Where the middle of the crown hangs, along the lay from the stump [m]. */
  double crownAlong(SubjectTree t) {
    if (t.crownOutline() != null) {
      Position middle = CrownOutline.of(t.crownOutline()).middle();
      Position stump = t.stump().at();
      return along(middle.eastM() - stump.eastM(), middle.northM() - stump.northM());
    }
    double onAxis = (t.crownBaseM() + t.heightM().value()) / 2 * slope(t);
    return t.crownOffsetM() == null
        ? onAxis
        : onAxis + along(t.crownOffsetM().eastM(), t.crownOffsetM().northM());
  }

  /** Radius of the crown [m]; of a circle as large as its outline where one was drawn. */
  static double crownRadius(SubjectTree t) {
    return t.crownOutline() == null
        ? t.crownRadiusM()
        : CrownOutline.of(t.crownOutline()).radiusM();
  }

  private double along(double eastM, double northM) {
    double a = Math.toRadians(plane.layDeg());
    return eastM * Math.sin(a) + northM * Math.cos(a);
  }

  private static void move(Path2D p, Point2D to) {
    if (p.getCurrentPoint() == null) {
      p.moveTo(to.getX(), to.getY());
    } else {
      p.lineTo(to.getX(), to.getY());
    }
  }
}
