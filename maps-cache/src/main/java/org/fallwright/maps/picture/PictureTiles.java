package org.fallwright.maps.picture;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Point2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageWriteParam;
import javax.imageio.ImageWriter;
import org.fallwright.core.units.Range;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.WebMercator;
import org.fallwright.maps.tiles.About;
import org.fallwright.maps.tiles.Bounds;
import org.fallwright.maps.tiles.MbTilesWriter;
import org.fallwright.maps.tiles.TileImage;

/**
 * Makes a tile set of a picture.
 *
 * <p>The finest zoom is the coarsest whose pixels are no larger on the ground than 1.2 of the
 * picture's. Of each tile every 32nd pixel is taken back to the picture exactly and the others lie
 * evenly between (at zoom 12 and finer that is right to a hundredth of a pixel); colours are
 * bilinear between the picture's pixels, at its edge they are those of the nearest. Each coarser
 * zoom is the mean of the one before. Tiles seen through in part are PNG, the others JPEG.
 *
 * <p>What is done is kept: a run that was stopped, or failed, is taken up where it was.
 */
public final class PictureTiles {
  private static final int STEP = 32;
  private static final int NODES = WebMercator.TILE / STEP + 1;
  private static final float QUALITY = 0.85f;
  private static final int KEPT_EVERY = 64;

  /** Bytes a tile comes to, about: for telling beforehand whether there is room. */
  private static final long BYTES_A_TILE = 30_000;

  /** Is told how far the work is; answers whether it is to go on. */
  @FunctionalInterface
  public interface Progress {
    boolean goOn(long done, long of);
  }

  private final GroundPicture picture;
  private final int maxZoom;
  private final int minZoom;
  private final int[] range;
  private final About about;

  /**
   * Plans it.
   *
   * @param name what the set is called
   * @param attribution whom the picture is owed to
   * @param taken when it was taken, as its source states it; empty: not stated
   * @param finest finest zoom wanted; 0: by the picture's own pixels
   */
  public PictureTiles(
      GroundPicture picture, String name, String attribution, String taken, int finest) {
    this.picture = Range.present("picture", picture);
    Range.check("finest zoom", finest, 0, WebMercator.DEEPEST, "");
    this.maxZoom = finest > 0 ? finest : zoomOf(picture);
    this.range = tilesOver(maxZoom);
    int coarsest = maxZoom;
    while (coarsest > 0
        && ((range[2] >> maxZoom - coarsest) > (range[0] >> maxZoom - coarsest)
            || (range[3] >> maxZoom - coarsest) > (range[1] >> maxZoom - coarsest))) {
      coarsest--;
    }
    this.minZoom = coarsest;
    this.about =
        new About(
            name,
            attribution,
            taken,
            "Made from a picture laid by: " + picture.how(),
            bounds(),
            minZoom,
            maxZoom);
  }

  public About about() {
    return about;
  }

  /** How many tiles it can come to at most. */
  public long tiles() {
    long sum = 0;
    for (int z = minZoom; z <= maxZoom; z++) {
      int up = maxZoom - z;
      sum +=
          ((long) (range[2] >> up) - (range[0] >> up) + 1)
              * ((range[3] >> up) - (range[1] >> up) + 1);
    }
    return sum;
  }

  /** About how large the set will be [bytes]. */
  public long bytes() {
    return tiles() * BYTES_A_TILE;
  }

  /**
   * Makes the set, or goes on with it.
   *
   * @param mark what it is made from and how; an unfinished set of another mark is thrown away
   * @return whether it is finished; if not, it was stopped and can be gone on with
   */
  public boolean write(Path file, String mark, Progress progress) throws IOException {
    long done = 0;
    long of = tiles();
    try (MbTilesWriter writer = MbTilesWriter.resumable(file, about, "jpg", mark)) {
      boolean anything = false;
      for (int z = maxZoom; z >= minZoom; z--) {
        int up = maxZoom - z;
        for (int y = range[1] >> up; y <= range[3] >> up; y++) {
          for (int x = range[0] >> up; x <= range[2] >> up; x++) {
            if (done % KEPT_EVERY == 0) {
              writer.keep();
              if (!progress.goOn(done, of)) {
                return false;
              }
            }
            anything |= make(writer, z, x, y);
            done++;
          }
        }
      }
      if (!anything) {
        throw new IOException("the picture shows nothing, so there is no base map");
      }
      writer.finish();
    }
    progress.goOn(of, of);
    return true;
  }

  private boolean make(MbTilesWriter writer, int z, int x, int y) throws IOException {
    if (writer.tile(z, x, y).isPresent()) {
      return true;
    }
    BufferedImage image = z == maxZoom ? render(x, y) : halved(writer, z, x, y);
    if (image == null) {
      return false;
    }
    writer.put(z, x, y, encoded(image));
    return true;
  }

  /** A tile of the finest zoom; null where the picture shows nothing. */
  private BufferedImage render(int tileX, int tileY) throws IOException {
    Point2D[] nodes = new Point2D[NODES * NODES];
    for (int j = 0; j < NODES; j++) {
      for (int i = 0; i < NODES; i++) {
        nodes[j * NODES + i] =
            picture.placing().toPixel(place(tileX + i * STEP / 256.0, tileY + j * STEP / 256.0));
      }
    }
    int side = WebMercator.TILE;
    int fine = finer(nodes);
    int[] out = new int[side * side];
    boolean anything = false;
    for (int y = 0; y < side; y++) {
      for (int x = 0; x < side; x++) {
        int argb = fine == 1 ? at(nodes, x + 0.5, y + 0.5) : mean(nodes, x, y, fine);
        out[y * side + x] = argb;
        anything |= argb >>> 24 != 0;
      }
    }
    if (!anything) {
      return null;
    }
    BufferedImage image = new BufferedImage(side, side, BufferedImage.TYPE_INT_ARGB);
    image.setRGB(0, 0, side, side, out, 0, side);
    return image;
  }

  /** Samples along a side of a pixel, so that no pixel of the picture is passed over. */
  private static int finer(Point2D[] nodes) {
    double apart = Math.max(nodes[0].distance(nodes[1]), nodes[0].distance(nodes[NODES])) / STEP;
    return (int) Math.max(1, Math.min(8, Math.ceil(apart - 0.5)));
  }

  private int mean(Point2D[] nodes, int x, int y, int fine) throws IOException {
    int[] sum = new int[4];
    for (int j = 0; j < fine; j++) {
      for (int i = 0; i < fine; i++) {
        int argb = at(nodes, x + (i + 0.5) / fine, y + (j + 0.5) / fine);
        int alpha = argb >>> 24;
        sum[0] += alpha;
        sum[1] += (argb >> 16 & 255) * alpha;
        sum[2] += (argb >> 8 & 255) * alpha;
        sum[3] += (argb & 255) * alpha;
      }
    }
    return sum[0] == 0
        ? 0
        : sum[0] / (fine * fine) << 24
            | sum[1] / sum[0] << 16
            | sum[2] / sum[0] << 8
            | sum[3] / sum[0];
  }

  /** The picture's colour at a point of the tile, bilinear. */
  private int at(Point2D[] nodes, double x, double y) throws IOException {
    int i = Math.min(NODES - 2, (int) (x / STEP));
    int j = Math.min(NODES - 2, (int) (y / STEP));
    double fx = x / STEP - i;
    double fy = y / STEP - j;
    Point2D a = nodes[j * NODES + i];
    Point2D b = nodes[j * NODES + i + 1];
    Point2D c = nodes[(j + 1) * NODES + i];
    Point2D d = nodes[(j + 1) * NODES + i + 1];
    double u = between(a.getX(), b.getX(), c.getX(), d.getX(), fx, fy);
    double v = between(a.getY(), b.getY(), c.getY(), d.getY(), fx, fy);
    int width = picture.raster().width();
    int height = picture.raster().height();
    if (!(u >= 0 && v >= 0 && u < width && v < height)) {
      return 0;
    }
    int nearest = picture.raster().argb((int) u, (int) v);
    if (nearest >>> 24 == 0) {
      return 0;
    }
    int x0 = (int) Math.floor(u - 0.5);
    int y0 = (int) Math.floor(v - 0.5);
    if (x0 < 0 || y0 < 0 || x0 + 1 >= width || y0 + 1 >= height) {
      return nearest;
    }
    int p = picture.raster().argb(x0, y0);
    int q = picture.raster().argb(x0 + 1, y0);
    int r = picture.raster().argb(x0, y0 + 1);
    int s = picture.raster().argb(x0 + 1, y0 + 1);
    if ((p & q & r & s) >>> 24 != 255) {
      return nearest;
    }
    double gx = u - 0.5 - x0;
    double gy = v - 0.5 - y0;
    int argb = 255 << 24;
    for (int shift = 0; shift <= 16; shift += 8) {
      double value =
          between(p >> shift & 255, q >> shift & 255, r >> shift & 255, s >> shift & 255, gx, gy);
      argb |= (int) Math.round(value) << shift;
    }
    return argb;
  }

  private static double between(double a, double b, double c, double d, double fx, double fy) {
    return (a * (1 - fx) + b * fx) * (1 - fy) + (c * (1 - fx) + d * fx) * fy;
  }

  /** The mean of the four tiles of the next finer zoom; null where there is none. */
  private static BufferedImage halved(MbTilesWriter writer, int z, int x, int y)
      throws IOException {
    int half = WebMercator.TILE / 2;
    BufferedImage image = null;
    Graphics2D g = null;
    for (int k = 0; k < 4; k++) {
      Optional<byte[]> child = writer.tile(z + 1, 2 * x + k % 2, 2 * y + k / 2);
      if (child.isPresent()) {
        if (image == null) {
          image =
              new BufferedImage(WebMercator.TILE, WebMercator.TILE, BufferedImage.TYPE_INT_ARGB);
          g = image.createGraphics();
          g.setRenderingHint(
              RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_BILINEAR);
        }
        g.drawImage(TileImage.read(child.get()), k % 2 * half, k / 2 * half, half, half, null);
      }
    }
    if (g != null) {
      g.dispose();
    }
    return image;
  }

  private static byte[] encoded(BufferedImage image) throws IOException {
    int side = image.getWidth();
    boolean opaque = true;
    int[] pixels = image.getRGB(0, 0, side, side, null, 0, side);
    for (int p : pixels) {
      opaque &= p >>> 24 == 255;
    }
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    if (!opaque) {
      ImageIO.write(image, "png", out);
      return out.toByteArray();
    }
    BufferedImage rgb = new BufferedImage(side, side, BufferedImage.TYPE_INT_RGB);
    rgb.setRGB(0, 0, side, side, pixels, 0, side);
    ImageWriter writer = ImageIO.getImageWritersByFormatName("jpeg").next();
    try (var stream = ImageIO.createImageOutputStream(out)) {
      ImageWriteParam how = writer.getDefaultWriteParam();
      how.setCompressionMode(ImageWriteParam.MODE_EXPLICIT);
      how.setCompressionQuality(QUALITY);
      writer.setOutput(stream);
      writer.write(null, new IIOImage(rgb, null, null), how);
    } finally {
      writer.dispose();
    }
    return out.toByteArray();
  }

  private LatLon place(double tileX, double tileY) {
    double side = WebMercator.TILE;
    double most = side * WebMercator.tilesAcross(maxZoom);
    return WebMercator.place(Math.min(most, tileX * side), Math.min(most, tileY * side), maxZoom);
  }

  private static int zoomOf(GroundPicture picture) {
    double x = picture.raster().width() / 2.0;
    double y = picture.raster().height() / 2.0;
    int z = WebMercator.DEEPEST;
    Point2D middle = world(picture.placing().toEarth(x, y), z);
    Point2D right = world(picture.placing().toEarth(x + 1, y), z);
    Point2D down = world(picture.placing().toEarth(x, y + 1), z);
    double across = Math.min(middle.distance(right), middle.distance(down));
    int coarser = (int) Math.floor(Math.log(1.2 * across) / Math.log(2));
    return Math.max(0, Math.min(z, z - coarser));
  }

  private static Point2D world(LatLon p, int zoom) {
    return new Point2D.Double(
        WebMercator.pixelX(p.lonDeg(), zoom), WebMercator.pixelY(p.latDeg(), zoom));
  }

  /** First and last tile that the picture's edge touches: x, y, x, y. */
  private int[] tilesOver(int zoom) {
    int[] r = {Integer.MAX_VALUE, Integer.MAX_VALUE, 0, 0};
    int most = WebMercator.tilesAcross(zoom) - 1;
    for (Point2D edge : edge()) {
      LatLon p = picture.placing().toEarth(edge.getX(), edge.getY());
      Point2D w = world(p, zoom);
      int x = (int) Math.max(0, Math.min(most, w.getX() / WebMercator.TILE));
      int y = (int) Math.max(0, Math.min(most, w.getY() / WebMercator.TILE));
      r[0] = Math.min(r[0], x);
      r[1] = Math.min(r[1], y);
      r[2] = Math.max(r[2], x);
      r[3] = Math.max(r[3], y);
    }
    if (zoom > 8 && r[2] - r[0] > most / 2) {
      throw new IllegalArgumentException("the picture lies across the 180th meridian");
    }
    return r;
  }

  private Bounds bounds() {
    double west = 180;
    double south = 90;
    double east = -180;
    double north = -90;
    for (Point2D edge : edge()) {
      LatLon p = picture.placing().toEarth(edge.getX(), edge.getY());
      west = Math.min(west, p.lonDeg());
      east = Math.max(east, p.lonDeg());
      south = Math.min(south, p.latDeg());
      north = Math.max(north, p.latDeg());
    }
    return new Bounds(west, south, east, north);
  }

  private Point2D[] edge() {
    int n = 32;
    double width = picture.raster().width();
    double height = picture.raster().height();
    Point2D[] points = new Point2D[4 * n];
    for (int i = 0; i < n; i++) {
      double t = (double) i / n;
      points[i] = new Point2D.Double(t * width, 0);
      points[n + i] = new Point2D.Double(width, t * height);
      points[2 * n + i] = new Point2D.Double((1 - t) * width, height);
      points[3 * n + i] = new Point2D.Double(0, (1 - t) * height);
    }
    return points;
  }
}
