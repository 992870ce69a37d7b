package org.fallwright.maps.tiles;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.AffineTransform;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.fallwright.core.units.Range;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.frame.WebMercator;

/**
 * Draws the base map under a rectangle of the site plane, at any scale and turned any way.
 *
 * <p>Each tile is laid on the plane by the affine map of three of its corners. At zoom 16 and
 * finer, up to 60° of latitude, no point of it is then more than 0.05 m from its place; coarser
 * tiles err by less than a twentieth of their own pixel.
 *
 * <p>Reads the disk and works at once, in the caller's thread; not for the event thread.
 */
public final class GroundPainter {
  /** Zoom steps below the coarsest zoom stored at which nothing is drawn any more. */
  private static final int TOO_COARSE = 4;

  private static final int MOST_PIXELS = 60_000_000;

  /**
   * What was drawn.
   *
   * @param tiles how many tiles; 0: the store has nothing there, or nothing so coarse
   * @param blurred whether any of them was enlarged beyond the resolution of its source
   * @param sourceMetresPerPixel ground length of a pixel of the coarsest source used [m]; 0 if no
   *     tile was drawn
   */
  public record Drawn(int tiles, boolean blurred, double sourceMetresPerPixel) {}

  /** A tile and its way from its pixels to user space. */
  private record Laid(BufferedImage image, AffineTransform place) {
    AffineTransform enlarged() {
      AffineTransform larger = new AffineTransform(place);
      double half = WebMercator.TILE / 2.0;
      larger.translate(half, half);
      larger.scale((half + 1) / half, (half + 1) / half);
      larger.translate(-half, -half);
      return larger;
    }
  }

  private final LayeredGround ground;
  private final SiteFrame frame;

  public GroundPainter(TileStore store, SiteFrame frame) {
    this(LayeredGround.of(store), frame);
  }

  public GroundPainter(LayeredGround ground, SiteFrame frame) {
    this.ground = Range.present("ground", ground);
    this.frame = Range.present("frame", frame);
  }

  /**
   * Draws the base map of {@code area}, and nothing outside it.
   *
   * @param g where to draw; the zoom is chosen for the pixels of its own device space
   * @param planeToUser from the site plane [m east, m north] to the user space of {@code g}
   * @param area rectangle of the site plane; x is metres east, y metres north of its south-west
   *     corner
   * @throws IOException if the store cannot be read
   */
  public Drawn paint(Graphics2D g, AffineTransform planeToUser, Rectangle2D area)
      throws IOException {
    AffineTransform planeToDevice = new AffineTransform(g.getTransform());
    planeToDevice.concatenate(planeToUser);
    double metresPerPixel = 1 / Math.sqrt(Math.abs(planeToDevice.getDeterminant()));
    Range.check("metres per pixel", metresPerPixel, 1e-4, 1e4, "m");
    int wanted = zoomFor(metresPerPixel);
    if (wanted < ground.minZoom() - TOO_COARSE) {
      return new Drawn(0, false, 0);
    }
    int zoom = Math.max(ground.minZoom(), Math.min(wanted, ground.maxZoom()));

    Graphics2D on = (Graphics2D) g.create();
    try {
      on.clip(planeToUser.createTransformedShape(area));
      on.setRenderingHint(
          RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_BILINEAR);
      return paintTiles(on, planeToUser, area, zoom, wanted);
    } finally {
      on.dispose();
    }
  }

  /**
   * The base map of {@code area} as a picture with north up, ground without tiles in white.
   *
   * @param metresPerPixel ground length of a pixel [m]
   */
  public BufferedImage picture(Rectangle2D area, double metresPerPixel) throws IOException {
    double width = Math.ceil(area.getWidth() / metresPerPixel - 1e-9);
    double height = Math.ceil(area.getHeight() / metresPerPixel - 1e-9);
    Range.check("pixels of the picture", width * height, 1, MOST_PIXELS, "");
    BufferedImage image = new BufferedImage((int) width, (int) height, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(Color.WHITE);
    g.fillRect(0, 0, image.getWidth(), image.getHeight());
    AffineTransform northUp =
        new AffineTransform(
            1 / metresPerPixel,
            0,
            0,
            -1 / metresPerPixel,
            -area.getMinX() / metresPerPixel,
            area.getMaxY() / metresPerPixel);
    paint(g, northUp, area);
    g.dispose();
    return image;
  }

  /**
   * From the pixels of a tile (256 a side, y south) to the site plane [m east, m north]: exact at
   * the north-west, north-east and south-west corners.
   */
  static AffineTransform tileToPlane(SiteFrame frame, int zoom, int x, int y) {
    Point2D nw = corner(frame, zoom, x, y);
    Point2D ne = corner(frame, zoom, x + 1, y);
    Point2D sw = corner(frame, zoom, x, y + 1);
    return new AffineTransform(
        (ne.getX() - nw.getX()) / WebMercator.TILE,
        (ne.getY() - nw.getY()) / WebMercator.TILE,
        (sw.getX() - nw.getX()) / WebMercator.TILE,
        (sw.getY() - nw.getY()) / WebMercator.TILE,
        nw.getX(),
        nw.getY());
  }

  private Drawn paintTiles(
      Graphics2D on, AffineTransform planeToUser, Rectangle2D area, int zoom, int wanted)
      throws IOException {
    Rectangle2D pixels = pixelsOf(area, zoom);
    int x1 = tileOf(pixels.getMaxX());
    int y1 = tileOf(pixels.getMaxY());
    int across = WebMercator.tilesAcross(zoom);
    List<Laid> laid = new ArrayList<>();
    int coarsest = zoom;
    for (int y = tileOf(pixels.getMinY()); y <= y1; y++) {
      for (int x = tileOf(pixels.getMinX()); x <= x1; x++) {
        int within = Math.floorMod(x, across);
        Optional<TilePyramid.Ground> found = ground.tile(zoom, within, y);
        if (found.isPresent()) {
          AffineTransform place = new AffineTransform(planeToUser);
          place.concatenate(tileToPlane(frame, zoom, within, y));
          laid.add(new Laid(found.get().image(), place));
          coarsest = Math.min(coarsest, found.get().sourceZoom());
        }
      }
    }
    // first a pixel too large all round, so that rounding leaves no bare line between tiles
    // (not where tiles can be seen through, which would then be laid on twice)
    if (laid.stream().noneMatch(tile -> tile.image.getColorModel().hasAlpha())) {
      laid.forEach(tile -> on.drawImage(tile.image, tile.enlarged(), null));
    }
    laid.forEach(tile -> on.drawImage(tile.image, tile.place, null));
    int count = laid.size();
    double source = count == 0 ? 0 : WebMercator.metresPerPixel(frame.origin().latDeg(), coarsest);
    return new Drawn(count, count > 0 && coarsest < wanted, source);
  }

  /** The world pixels under a rectangle of the plane, in one piece across the 180th meridian. */
  private Rectangle2D pixelsOf(Rectangle2D area, int zoom) {
    double side = (double) WebMercator.TILE * WebMercator.tilesAcross(zoom);
    double origin = WebMercator.pixelX(frame.origin().lonDeg(), zoom);
    Rectangle2D pixels = null;
    for (int i = 0; i <= 2; i++) {
      for (int j = 0; j <= 2; j++) {
        LatLon p =
            frame.toEarth(
                area.getMinX() + i * area.getWidth() / 2,
                area.getMinY() + j * area.getHeight() / 2);
        double east = Math.IEEEremainder(WebMercator.pixelX(p.lonDeg(), zoom) - origin, side);
        double y = WebMercator.pixelY(p.latDeg(), zoom);
        if (pixels == null) {
          pixels = new Rectangle2D.Double(origin + east, y, 0, 0);
        } else {
          pixels.add(origin + east, y);
        }
      }
    }
    return pixels;
  }

  /** The zoom whose pixels come nearest to a ground length. */
  private int zoomFor(double metresPerPixel) {
    double whole = WebMercator.metresPerPixel(frame.origin().latDeg(), 0);
    return (int) Math.round(Math.log(whole / metresPerPixel) / Math.log(2));
  }

  private static int tileOf(double pixel) {
    return (int) Math.floor(pixel / WebMercator.TILE);
  }

  private static Point2D corner(SiteFrame frame, int zoom, int x, int y) {
    return frame.toPlanePoint(
        WebMercator.place((double) x * WebMercator.TILE, (double) y * WebMercator.TILE, zoom));
  }
}
