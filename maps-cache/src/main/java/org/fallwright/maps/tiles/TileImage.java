package org.fallwright.maps.tiles;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.EOFException;
import java.io.IOException;
import java.util.Iterator;
import javax.imageio.IIOException;
import javax.imageio.ImageIO;
import javax.imageio.ImageReader;
import javax.imageio.stream.ImageInputStream;

/**
 * Reads a tile's picture whole or not at all. A JPEG cut short is otherwise filled up with grey or
 * black and only a warning tells.
 */
public final class TileImage {
  private static final long MOST_PIXELS = 4096L * 4096;

  private TileImage() {}

  /**
   * The picture.
   *
   * @throws IOException one short clause, without the tile's name, if any of it cannot be read
   */
  public static BufferedImage read(byte[] bytes) throws IOException {
    try (ImageInputStream in = ImageIO.createImageInputStream(new ByteArrayInputStream(bytes))) {
      Iterator<ImageReader> readers = ImageIO.getImageReaders(in);
      if (!readers.hasNext()) {
        throw new IOException("it is no picture");
      }
      ImageReader reader = readers.next();
      String[] fault = new String[1];
      try {
        // The JPEG library's own words for data that were missing or made no sense.
        reader.addIIOReadWarningListener(
            (source, warning) -> {
              if (warning.startsWith("Premature") || warning.startsWith("Corrupt")) {
                fault[0] = warning;
              }
            });
        reader.setInput(in, true, true);
        if ((long) reader.getWidth(0) * reader.getHeight(0) > MOST_PIXELS) {
          throw new IOException("it has more than 4096 x 4096 pixels");
        }
        BufferedImage image = reader.read(0);
        if (fault[0] != null) {
          throw new IOException("its picture is cut short or damaged");
        }
        return image;
      } catch (IIOException | EOFException e) {
        throw new IOException("its picture is cut short or damaged", e);
      } finally {
        reader.dispose();
      }
    } catch (RuntimeException e) {
      throw new IOException("its picture is cut short or damaged", e);
    }
  }
}
