package org.fallwright.maps.picture;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Iterator;
import javax.imageio.ImageIO;
import javax.imageio.ImageReadParam;
import javax.imageio.ImageReader;
import javax.imageio.stream.ImageInputStream;

/**
 * A plain picture, whole in memory. One with more pixels than a quarter of the memory can hold is
 * read coarser: every second pixel of every second row, or every third, and so on; its size is
 * still told, and its pixels are still asked for, in pixels of the file.
 */
public final class HeldRaster implements Raster {
  private final BufferedImage image;
  private final int width;
  private final int height;
  private final int step;

  private HeldRaster(BufferedImage image, int width, int height, int step) {
    this.image = image;
    this.width = width;
    this.height = height;
    this.step = step;
  }

  /** A picture made elsewhere, such as a page of a document. */
  public static HeldRaster of(BufferedImage image) {
    return new HeldRaster(image, image.getWidth(), image.getHeight(), 1);
  }

  /** Reads a picture file (PNG, JPEG and whatever else the platform reads). */
  public static HeldRaster read(Path file) throws IOException {
    return read(file, Runtime.getRuntime().maxMemory() / 16);
  }

  static HeldRaster read(Path file, long mostPixels) throws IOException {
    if (!Files.isRegularFile(file)) {
      throw new IOException("picture " + file + " is not there");
    }
    try (ImageInputStream in = ImageIO.createImageInputStream(file.toFile())) {
      Iterator<ImageReader> readers = in == null ? null : ImageIO.getImageReaders(in);
      if (readers == null || !readers.hasNext()) {
        throw new IOException("picture " + file + " is of a kind that cannot be read");
      }
      ImageReader reader = readers.next();
      boolean[] cut = new boolean[1];
      try {
        reader.addIIOReadWarningListener(
            (source, warning) ->
                cut[0] |= warning.startsWith("Premature") || warning.startsWith("Corrupt"));
        reader.setInput(in, true, true);
        int width = reader.getWidth(0);
        int height = reader.getHeight(0);
        int step = 1;
        while ((long) (width / step) * (height / step) > mostPixels) {
          step++;
        }
        ImageReadParam how = reader.getDefaultReadParam();
        how.setSourceSubsampling(step, step, 0, 0);
        BufferedImage image = reader.read(0, how);
        if (cut[0]) {
          throw new IOException("picture " + file + " is cut short or damaged");
        }
        return new HeldRaster(image, width, height, step);
      } catch (IOException e) {
        throw cut[0] ? e : new IOException("picture " + file + " is cut short or damaged", e);
      } catch (RuntimeException e) {
        throw new IOException("picture " + file + " is cut short or damaged", e);
      } finally {
        reader.dispose();
      }
    }
  }

  @Override
  public int width() {
    return width;
  }

  @Override
  public int height() {
    return height;
  }

  /** How many pixels of the file stand in one that is kept, along a side. */
  public int step() {
    return step;
  }

  @Override
  public int argb(int x, int y) {
    return image.getRGB(
        Math.min(x / step, image.getWidth() - 1), Math.min(y / step, image.getHeight() - 1));
  }

  @Override
  public void close() {
    // nothing is held open
  }
}
