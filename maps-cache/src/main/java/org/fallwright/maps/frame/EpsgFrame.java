package org.fallwright.maps.frame;

import java.awt.geom.Point2D;
import java.nio.file.Path;
import org.fallwright.core.units.Range;
import org.geotools.api.referencing.FactoryException;
import org.geotools.api.referencing.crs.CoordinateReferenceSystem;
import org.geotools.api.referencing.operation.MathTransform;
import org.geotools.api.referencing.operation.TransformException;
import org.geotools.referencing.CRS;
import org.geotools.referencing.crs.DefaultGeographicCRS;

/**
 * A foreign coordinate system named by its EPSG code, for data that comes in from outside.
 *
 * <p>Coordinates are always given as x (east or longitude) before y (north or latitude), whatever
 * order the code's own definition has, in the system's own unit (metres, feet or degrees). A system
 * without a known shift to WGS 84 is refused, not guessed at.
 *
 * <p>The first look-up in a run opens the coordinate system database: one to two seconds and 33 MB
 * in the folder for temporary files, or in that of {@link #keepDatabaseIn}. Never call it on the
 * event thread.
 */
public final class EpsgFrame {
  private final String code;
  private final String name;
  private final MathTransform toEarth;
  private final MathTransform fromEarth;

  private EpsgFrame(String code, String name, MathTransform toEarth, MathTransform fromEarth) {
    this.code = code;
    this.name = name;
    this.toEarth = toEarth;
    this.fromEarth = fromEarth;
  }

  /** Names the folder the database is unpacked into; only works before the first look-up. */
  public static void keepDatabaseIn(Path folder) {
    System.setProperty("EPSG-HSQL.directory", folder.toString());
  }

  /**
   * Looks a code up, such as {@code EPSG:32617}.
   *
   * @throws IllegalArgumentException if it is not known, not a plane or latitude-longitude system,
   *     or has no known shift to WGS 84
   */
  public static EpsgFrame of(String code) {
    Range.text("coordinate system", code);
    try {
      return of(code, CRS.decode(code, true));
    } catch (FactoryException e) {
      throw unknown(code, e);
    }
  }

  /**
   * Takes a system that a file defines itself, x before y.
   *
   * @param code what it is called in messages
   * @throws IllegalArgumentException as above
   */
  public static EpsgFrame of(String code, CoordinateReferenceSystem crs) {
    try {
      if (crs.getCoordinateSystem().getDimension() != 2) {
        throw new IllegalArgumentException(
            "coordinate system " + code + " is not one of east and north alone");
      }
      MathTransform toEarth = CRS.findMathTransform(crs, DefaultGeographicCRS.WGS84);
      return new EpsgFrame(code, crs.getName().getCode(), toEarth, toEarth.inverse());
    } catch (FactoryException | TransformException e) {
      throw unknown(code, e);
    }
  }

  private static IllegalArgumentException unknown(String code, Exception cause) {
    return new IllegalArgumentException(
        "coordinate system "
            + code
            + " is not known, or there is no known way from it to latitude and longitude",
        cause);
  }

  public String code() {
    return code;
  }

  /** The system's name in the database. */
  public String name() {
    return name;
  }

  /** The place on WGS 84 of x (east or longitude), y (north or latitude) in the system's unit. */
  public LatLon toEarth(double x, double y) {
    double[] c = {x, y};
    transform(toEarth, c, "x " + x + ", y " + y);
    return new LatLon(c[1], c[0]);
  }

  /** x (east or longitude) and y (north or latitude), in the system's unit, of a place. */
  public Point2D fromEarth(LatLon place) {
    double[] c = {place.lonDeg(), place.latDeg()};
    transform(fromEarth, c, "latitude " + place.latDeg() + ", longitude " + place.lonDeg());
    return new Point2D.Double(c[0], c[1]);
  }

  private void transform(MathTransform by, double[] c, String what) {
    try {
      by.transform(c, 0, c, 0, 1);
    } catch (TransformException e) {
      throw new IllegalArgumentException(what + " lies outside the reach of " + code, e);
    }
    if (!Double.isFinite(c[0]) || !Double.isFinite(c[1])) {
      throw new IllegalArgumentException(what + " lies outside the reach of " + code);
    }
  }
}
