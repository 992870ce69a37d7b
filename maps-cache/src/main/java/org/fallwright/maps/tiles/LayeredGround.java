package org.fallwright.maps.tiles;

import java.awt.AlphaComposite;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Collectors;
import org.fallwright.core.units.Range;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.frame.WebMercator;

/**
 * Several tile sets over each other, each moved by some metres and seen through in part: tiles as
 * the map on screen and the sheet draw them.
 *
 * <p>A shift in metres is taken to world pixels at the site's origin and rounded to whole pixels of
 * the zoom asked for: a picture is then off by at most half a pixel of what is drawn. What no set
 * shows is left transparent.
 */
public final class LayeredGround implements AutoCloseable {
  /**
   * One tile set.
   *
   * @param store where its tiles come from
   * @param shiftEastM how far it is moved east [m]
   * @param shiftNorthM how far it is moved north [m]
   * @param opacity 0 to 1
   */
  public record Layer(TileStore store, double shiftEastM, double shiftNorthM, double opacity) {
    public Layer {
      Range.present("store", store);
      Range.check("shift_east_m", shiftEastM, -1000, 1000, "m");
      Range.check("shift_north_m", shiftNorthM, -1000, 1000, "m");
      Range.check("opacity", opacity, 0, 1, "");
    }
  }

  /** A layer, its tiles, and its shift as a share of the world's side, to the east and south. */
  private record Laid(Layer layer, TilePyramid pyramid, double eastShare, double southShare) {
    boolean plain() {
      return eastShare == 0 && southShare == 0 && layer.opacity == 1;
    }
  }

  private final List<Laid> layers;

  /**
   * @param layers from below upwards
   * @param frame the site plane; null only where nothing is moved
   */
  public LayeredGround(List<Layer> layers, SiteFrame frame) {
    Range.check("layers", layers.size(), 1, 50, "");
    this.layers = layers.stream().map(l -> laid(l, frame)).toList();
  }

  /** A single tile set as it is. */
  public static LayeredGround of(TileStore store) {
    return new LayeredGround(List.of(new Layer(store, 0, 0, 1)), null);
  }

  /** The names of the sets, from below upwards. */
  public String name() {
    return layers.stream().map(l -> l.layer.store.about().name()).collect(Collectors.joining(", "));
  }

  /** The coarsest zoom that any set stores. */
  public int minZoom() {
    return layers.stream().mapToInt(l -> l.layer.store.minZoom()).min().orElseThrow();
  }

  /** The finest zoom that any set stores. */
  public int maxZoom() {
    return layers.stream().mapToInt(l -> l.layer.store.maxZoom()).max().orElseThrow();
  }

  /** The first damaged tile met with so far, as one sentence. */
  public Optional<String> fault() {
    return layers.stream()
        .map(l -> l.pyramid.fault().orElse(null))
        .filter(Objects::nonNull)
        .findFirst();
  }

  /** The picture of a tile; empty where no set shows anything. */
  public Optional<TilePyramid.Ground> tile(int zoom, int x, int y) throws IOException {
    if (layers.size() == 1 && layers.get(0).plain()) {
      return layers.get(0).pyramid.tile(zoom, x, y);
    }
    int side = WebMercator.TILE;
    BufferedImage image = new BufferedImage(side, side, BufferedImage.TYPE_INT_ARGB);
    Graphics2D g = image.createGraphics();
    int finest = -1;
    try {
      for (Laid laid : layers) {
        finest = Math.max(finest, draw(g, laid, zoom, x, y));
      }
    } finally {
      g.dispose();
    }
    return finest < 0
        ? Optional.empty()
        : Optional.of(new TilePyramid.Ground(image, finest, finest < zoom));
  }

  /** Draws a layer's share of a tile; the zoom of the finest source used, or -1. */
  private static int draw(Graphics2D g, Laid laid, int zoom, int x, int y) throws IOException {
    int side = WebMercator.TILE;
    double world = (double) side * WebMercator.tilesAcross(zoom);
    long right = Math.round(laid.eastShare * world);
    long down = Math.round(laid.southShare * world);
    int firstX = Math.toIntExact(Math.floorDiv((long) x * side - right, side));
    int firstY = Math.toIntExact(Math.floorDiv((long) y * side - down, side));
    int spareX = Math.floorMod(right, side) == 0 ? 0 : 1;
    int spareY = Math.floorMod(down, side) == 0 ? 0 : 1;
    g.setComposite(AlphaComposite.getInstance(AlphaComposite.SRC_OVER, (float) laid.layer.opacity));
    int finest = -1;
    for (int ty = firstY; ty <= firstY + spareY; ty++) {
      for (int tx = firstX; tx <= firstX + spareX; tx++) {
        Optional<TilePyramid.Ground> found = laid.pyramid.tile(zoom, tx, ty);
        if (found.isPresent()) {
          g.drawImage(
              found.get().image(),
              (int) ((long) (tx - x) * side + right),
              (int) ((long) (ty - y) * side + down),
              null);
          finest = Math.max(finest, found.get().sourceZoom());
        }
      }
    }
    return finest;
  }

  @Override
  public void close() throws IOException {
    IOException first = null;
    for (Laid laid : layers) {
      try {
        laid.layer.store.close();
      } catch (IOException e) {
        first = first == null ? e : first;
      }
    }
    if (first != null) {
      throw first;
    }
  }

  private static Laid laid(Layer layer, SiteFrame frame) {
    double east = 0;
    double south = 0;
    if (layer.shiftEastM != 0 || layer.shiftNorthM != 0) {
      LatLon from = frame.toEarth(0, 0);
      LatLon to = frame.toEarth(layer.shiftEastM, layer.shiftNorthM);
      double side = WebMercator.TILE;
      east = Math.IEEEremainder(to.lonDeg() - from.lonDeg(), 360) / 360;
      south = (WebMercator.pixelY(to.latDeg(), 0) - WebMercator.pixelY(from.latDeg(), 0)) / side;
    }
    return new Laid(layer, new TilePyramid(layer.store), east, south);
  }
}
