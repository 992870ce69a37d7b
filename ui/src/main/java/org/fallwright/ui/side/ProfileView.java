package org.fallwright.ui.side;

import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;

/**
 * Metres of the profile to pixels, one scale both ways.
 *
 * @param from least distance along the lay shown [m]
 * @param to greatest [m]
 * @param x0 pixel of the stump's middle
 * @param y0 pixel of the ground at the stump
 */
record ProfileView(double from, double to, double x0, double y0, double pixelsPerMetre) {
  /** The view that shows a range of distances and heights [m], as large as a frame lets it. */
  static ProfileView fitting(double from, double to, double low, double high, Rectangle2D frame) {
    double across = to - from;
    double k = Math.max(0.1, Math.min(frame.getWidth() / across, frame.getHeight() / (high - low)));
    double spare = (frame.getWidth() / k - across) / 2;
    double x0 = frame.getMinX() + (spare - from) * k;
    double y0 = frame.getMaxY() + low * k;
    return new ProfileView(from - spare, to + spare, x0, y0, k);
  }

  Point2D at(double s, double z) {
    return new Point2D.Double(x0 + s * pixelsPerMetre, y0 - z * pixelsPerMetre);
  }

  /** Distance along the lay of a pixel column [m]. */
  double s(double x) {
    return (x - x0) / pixelsPerMetre;
  }
}
