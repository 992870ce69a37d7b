package org.fallwright.maps.tiles;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.imageio.ImageIO;

/** A small tile store in memory that counts what it is asked. */
final class Painted implements TileStore {
  final Map<String, byte[]> tiles = new HashMap<>();
  final List<String> asked = new ArrayList<>();
  private final About about;

  Painted(int minZoom, int maxZoom) {
    about = new About("painted", "", "", "", new Bounds(-180, -85, 180, 85), minZoom, maxZoom);
  }

  Painted with(int zoom, int x, int y, BufferedImage image) {
    return with(zoom, x, y, png(image));
  }

  Painted with(int zoom, int x, int y, byte[] file) {
    tiles.put(zoom + "/" + x + "/" + y, file);
    return this;
  }

  @Override
  public About about() {
    return about;
  }

  @Override
  public Optional<byte[]> tile(int zoom, int x, int y) {
    String key = zoom + "/" + x + "/" + y;
    asked.add(key);
    return Optional.ofNullable(tiles.get(key));
  }

  @Override
  public void forEach(Each each) throws IOException {
    for (String key : tiles.keySet()) {
      String[] n = key.split("/");
      each.tile(Integer.parseInt(n[0]), Integer.parseInt(n[1]), Integer.parseInt(n[2]));
    }
  }

  @Override
  public void close() {}

  /** Four squares: red NW, green NE, blue SW, white SE. */
  static BufferedImage quarters() {
    BufferedImage image = new BufferedImage(256, 256, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    Color[] colours = {Color.RED, Color.GREEN, Color.BLUE, Color.WHITE};
    for (int i = 0; i < 4; i++) {
      g.setColor(colours[i]);
      g.fillRect(128 * (i % 2), 128 * (i / 2), 128, 128);
    }
    g.dispose();
    return image;
  }

  static BufferedImage plain(Color colour) {
    BufferedImage image = new BufferedImage(256, 256, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(colour);
    g.fillRect(0, 0, 256, 256);
    g.dispose();
    return image;
  }

  static byte[] png(BufferedImage image) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try {
      ImageIO.write(image, "png", out);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return out.toByteArray();
  }
}
