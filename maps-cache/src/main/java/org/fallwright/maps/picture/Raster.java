package org.fallwright.maps.picture;

import java.io.IOException;

/** The pixels of a picture, got at one by one. For one thread. */
public interface Raster extends AutoCloseable {
  int width();

  int height();

  /**
   * Colour of a pixel, 8 bits each of opacity, red, green and blue; 0 where the picture shows
   * nothing.
   *
   * @throws IOException one sentence naming the file, if that part of it cannot be read
   */
  int argb(int x, int y) throws IOException;

  @Override
  void close() throws IOException;
}
