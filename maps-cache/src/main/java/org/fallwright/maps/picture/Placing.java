package org.fallwright.maps.picture;

import java.awt.geom.AffineTransform;
import java.awt.geom.NoninvertibleTransformException;
import java.awt.geom.Point2D;
import org.fallwright.maps.frame.EpsgFrame;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.SiteFrame;

/** Where the pixels of a picture lie on the earth, and the other way round. */
public interface Placing {
  LatLon toEarth(double x, double y);

  Point2D toPixel(LatLon place);

  /**
   * By a coordinate system.
   *
   * @param pixelToModel from pixels to the system's own x and y
   */
  static Placing in(EpsgFrame system, AffineTransform pixelToModel) {
    AffineTransform back = inverse(pixelToModel);
    return new Placing() {
      @Override
      public LatLon toEarth(double x, double y) {
        Point2D m = pixelToModel.transform(new Point2D.Double(x, y), null);
        return system.toEarth(m.getX(), m.getY());
      }

      @Override
      public Point2D toPixel(LatLon place) {
        return back.transform(system.fromEarth(place), null);
      }
    };
  }

  /**
   * On a site's plane.
   *
   * @param pixelToPlane from pixels to metres east and north of the site's origin
   */
  static Placing on(SiteFrame site, AffineTransform pixelToPlane) {
    AffineTransform back = inverse(pixelToPlane);
    return new Placing() {
      @Override
      public LatLon toEarth(double x, double y) {
        Point2D m = pixelToPlane.transform(new Point2D.Double(x, y), null);
        return site.toEarth(m.getX(), m.getY());
      }

      @Override
      public Point2D toPixel(LatLon place) {
        return back.transform(site.toPlanePoint(place), null);
      }
    };
  }

  private static AffineTransform inverse(AffineTransform t) {
    try {
      return t.createInverse();
    } catch (NoninvertibleTransformException e) {
      throw new IllegalArgumentException("the picture's pixels have no size on the ground", e);
    }
  }
}
