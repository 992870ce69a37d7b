package org.fallwright.maps.demo;

import java.awt.geom.AffineTransform;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageWriteParam;
import javax.imageio.ImageWriter;
import org.fallwright.core.site.Origin;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.frame.WebMercator;
import org.fallwright.maps.tiles.About;
import org.fallwright.maps.tiles.Bounds;
import org.fallwright.maps.tiles.MbTilesWriter;

/**
 * Draws the demonstration site "oak behind the house" from above and writes it as a tile set.
 *
 * <p>The same ground comes out each time: all unevenness comes from fixed seeds. The least thing
 * drawn is about 0.15 m across, so that the finest zoom looks like a good aerial photograph and not
 * like a drawing.
 */
public final class DemoGround {
  /** Where the invented site's plane lies: in open sea. */
  public static final Origin ORIGIN = new Origin(45, -40);

  /** The ground shown [m]: x east, y north. */
  public static final Rectangle2D AREA = new Rectangle2D.Double(-110, -80, 240, 240);

  /** The part of it shown at the finest zoom [m]. */
  public static final Rectangle2D CORE = new Rectangle2D.Double(-65, -35, 150, 150);

  /** Coarsest and finest zoom. */
  public static final int MIN_ZOOM = 16;

  public static final int MAX_ZOOM = 21;

  private static final float QUALITY = 0.72f;

  private final SiteFrame frame = new SiteFrame(ORIGIN);

  /** Writes the tile set to the file named first, or to its place in the project. */
  public static void main(String[] args) throws IOException {
    Path file = Path.of(args.length > 0 ? args[0] : "basemaps/oak-behind-the-house.mbtiles");
    new DemoGround().write(file);
    System.out.println(file + ": " + Files.size(file) / 1024 + " KiB");
  }

  /** Draws every tile and writes the set. */
  public void write(Path file) throws IOException {
    try (MbTilesWriter writer = new MbTilesWriter(file, about(), "jpg")) {
      for (int zoom = MIN_ZOOM; zoom <= MAX_ZOOM; zoom++) {
        Rectangle2D shown = zoom == MAX_ZOOM ? CORE : AREA;
        int[] range = tilesOver(shown, zoom);
        for (int y = range[1]; y <= range[3]; y++) {
          for (int x = range[0]; x <= range[2]; x++) {
            writer.put(zoom, x, y, jpeg(tile(zoom, x, y)));
          }
        }
      }
      writer.finish();
    }
  }

  /** What the tile set says of itself. */
  public About about() {
    LatLon southWest = frame.toEarth(AREA.getMinX(), AREA.getMinY());
    LatLon northEast = frame.toEarth(AREA.getMaxX(), AREA.getMaxY());
    return new About(
        "Oak behind the house",
        "Drawn by the Fallwright project; no real place",
        "2026 (drawn, not photographed)",
        "Ground of the demonstration site, drawn by a program. Its coordinates lie in open sea.",
        new Bounds(southWest.lonDeg(), southWest.latDeg(), northEast.lonDeg(), northEast.latDeg()),
        MIN_ZOOM,
        MAX_ZOOM);
  }

  /** Draws one tile. */
  public BufferedImage tile(int zoom, int x, int y) {
    Point2D[] corner = new Point2D[3];
    for (int i = 0; i < 3; i++) {
      corner[i] =
          frame.toPlanePoint(WebMercator.place((x + i % 2) * 256.0, (y + i / 2) * 256.0, zoom));
    }
    double side = WebMercator.TILE;
    return draw(
        new AffineTransform(
            (corner[1].getX() - corner[0].getX()) / side,
            (corner[1].getY() - corner[0].getY()) / side,
            (corner[2].getX() - corner[0].getX()) / side,
            (corner[2].getY() - corner[0].getY()) / side,
            corner[0].getX(),
            corner[0].getY()));
  }

  /** Draws 256 x 256 pixels laid on the plane by an affine map from pixels to metres. */
  private static BufferedImage draw(AffineTransform toPlane) {
    int side = WebMercator.TILE;
    // enough samples a pixel that they lie no farther apart than 0.08 m, at most 4 x 4
    double pixel = Math.sqrt(Math.abs(toPlane.getDeterminant()));
    int fine = (int) Math.max(1, Math.min(4, Math.ceil(pixel / 0.08)));
    BufferedImage image = new BufferedImage(side, side, BufferedImage.TYPE_INT_RGB);
    Tint t = new Tint();
    double[] p = new double[2];
    for (int row = 0; row < side; row++) {
      for (int column = 0; column < side; column++) {
        double r = 0;
        double g = 0;
        double b = 0;
        for (int k = 0; k < fine * fine; k++) {
          p[0] = column + (k % fine + 0.5) / fine;
          p[1] = row + (k / fine + 0.5) / fine;
          toPlane.transform(p, 0, p, 0, 1);
          paint(p[0], p[1], t);
          r += t.r;
          g += t.g;
          b += t.b;
        }
        double n = (double) fine * fine;
        image.setRGB(column, row, level(r / n) << 16 | level(g / n) << 8 | level(b / n));
      }
    }
    return image;
  }

  /** The colour of a point of the ground as seen from above. */
  private static void paint(double e, double n, Tint t) {
    double roof = Roofs.height(e, n);
    double shade;
    if (roof > 0) {
      Roofs.paint(e, n, roof, t);
      shade = Crowns.shade(e, n, roof);
    } else {
      Growth.paint(e, n, t);
      Ways.paint(e, n, t);
      shade = Math.max(Crowns.shade(e, n, 0), Fences.shade(e, n));
    }
    t.shade(Roofs.shades(e, n, roof) ? 1 : shade);
    if (roof == 0) {
      Fences.paint(e, n, t);
    }
    Crowns.paint(e, n, roof, t);
    // a little haze
    t.cover(0.62, 0.66, 0.72, 0.05);
  }

  private static int level(double share) {
    return (int) Math.round(255 * Math.max(0, Math.min(1, share)));
  }

  private int[] tilesOver(Rectangle2D area, int zoom) {
    LatLon nw = frame.toEarth(area.getMinX(), area.getMaxY());
    LatLon se = frame.toEarth(area.getMaxX(), area.getMinY());
    return new int[] {
      (int) WebMercator.pixelX(nw.lonDeg(), zoom) / WebMercator.TILE,
      (int) WebMercator.pixelY(nw.latDeg(), zoom) / WebMercator.TILE,
      (int) WebMercator.pixelX(se.lonDeg(), zoom) / WebMercator.TILE,
      (int) WebMercator.pixelY(se.latDeg(), zoom) / WebMercator.TILE
    };
  }

  private static byte[] jpeg(BufferedImage image) throws IOException {
    ImageWriter writer = ImageIO.getImageWritersByFormatName("jpeg").next();
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (var stream = ImageIO.createImageOutputStream(out)) {
      ImageWriteParam how = writer.getDefaultWriteParam();
      how.setCompressionMode(ImageWriteParam.MODE_EXPLICIT);
      how.setCompressionQuality(QUALITY);
      writer.setOutput(stream);
      writer.write(null, new IIOImage(image, null, null), how);
    } finally {
      writer.dispose();
    }
    return out.toByteArray();
  }
}
