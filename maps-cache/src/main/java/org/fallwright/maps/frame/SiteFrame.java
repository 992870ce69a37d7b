package org.fallwright.maps.frame;

import java.awt.geom.Point2D;
import org.fallwright.core.site.Origin;
import org.fallwright.core.site.Position;
import org.fallwright.core.units.Range;
import org.geotools.api.parameter.ParameterValueGroup;
import org.geotools.api.referencing.FactoryException;
import org.geotools.api.referencing.operation.MathTransform;
import org.geotools.api.referencing.operation.TransformException;
import org.geotools.referencing.operation.DefaultMathTransformFactory;

/**
 * The site plane on the earth.
 *
 * <p>What it answers: which latitude and longitude a point of the plan has, and where on the plan a
 * latitude and longitude lies. The plane is a transverse Mercator projection of the WGS 84
 * ellipsoid (semi-axes 6 378 137 m and 6 356 752.314 245 m) whose central meridian and latitude of
 * origin pass through the site's origin, scale factor 1, no false origin.
 *
 * <p>Lengths on the plane are too long by about 1/2 (east / earth radius)²: 0.012 mm in a kilometre
 * from 1 km east of the origin, 0.3 mm from 5 km. Grid north leaves true north by about (longitude
 * difference) x sin(latitude): 0.01 degrees 1 km east of the origin at 45 degrees.
 *
 * <p>Longitudes are reckoned from the origin's meridian the short way round, so a site on the 180th
 * meridian is one piece. Heights are not part of it.
 *
 * <p>Source: projection of J. P. Snyder, Map Projections: A Working Manual (USGS Professional Paper
 * 1395), by the GeoTools transform of that name; no coordinate system database is opened.
 */
public final class SiteFrame {
  private static final double SEMI_MAJOR = 6378137.0;
  private static final double SEMI_MINOR = 6356752.314245179;

  private final Origin origin;
  private final MathTransform toPlane;
  private final MathTransform toEarth;

  public SiteFrame(Origin origin) {
    this.origin = Range.present("origin", origin);
    try {
      DefaultMathTransformFactory factory = new DefaultMathTransformFactory();
      ParameterValueGroup p = factory.getDefaultParameters("Transverse_Mercator");
      p.parameter("semi_major").setValue(SEMI_MAJOR);
      p.parameter("semi_minor").setValue(SEMI_MINOR);
      // Longitudes are handed over as differences from the origin's, see above.
      p.parameter("central_meridian").setValue(0.0);
      p.parameter("latitude_of_origin").setValue(origin.latDeg());
      p.parameter("scale_factor").setValue(1.0);
      p.parameter("false_easting").setValue(0.0);
      p.parameter("false_northing").setValue(0.0);
      toPlane = factory.createParameterizedTransform(p);
      toEarth = toPlane.inverse();
    } catch (FactoryException | TransformException e) {
      throw new IllegalStateException("the transverse Mercator transform could not be set up", e);
    }
  }

  public Origin origin() {
    return origin;
  }

  /**
   * The point of the site plane at a latitude [degrees north] and longitude [degrees east].
   *
   * @throws IllegalArgumentException if it lies farther from the origin than a position may
   */
  public Position toPlane(double latDeg, double lonDeg) {
    Point2D p = toPlanePoint(new LatLon(latDeg, lonDeg));
    return new Position(p.getX(), p.getY());
  }

  /** As {@link #toPlane(double, double)}. */
  public Position toPlane(LatLon place) {
    return toPlane(place.latDeg(), place.lonDeg());
  }

  /** The latitude and longitude of a point of the site plane. */
  public LatLon toEarth(Position p) {
    return toEarth(p.eastM(), p.northM());
  }

  /**
   * The point of the plane [m east, m north] at a place that may lie beyond the reach of a
   * position, such as the corner of a coarse map tile.
   *
   * @throws IllegalArgumentException if it lies too far round the earth for the projection
   */
  public Point2D toPlanePoint(LatLon place) {
    double[] c = {shortWayRound(place.lonDeg() - origin.lonDeg()), place.latDeg()};
    transform(toPlane, c, "latitude " + place.latDeg() + ", longitude " + place.lonDeg());
    return new Point2D.Double(c[0], c[1]);
  }

  /**
   * The latitude and longitude of a point [m east, m north] that may lie beyond a position's reach.
   */
  public LatLon toEarth(double eastM, double northM) {
    double[] c = {eastM, northM};
    transform(toEarth, c, eastM + " m east, " + northM + " m north");
    return new LatLon(c[1], shortWayRound(c[0] + origin.lonDeg()));
  }

  private void transform(MathTransform by, double[] c, String what) {
    try {
      by.transform(c, 0, c, 0, 1);
    } catch (TransformException e) {
      throw new IllegalArgumentException(
          what + " is too far from the site's origin to lie on its plane", e);
    }
  }

  private static double shortWayRound(double lonDeg) {
    return Math.IEEEremainder(lonDeg, 360);
  }
}
