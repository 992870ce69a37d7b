package org.fallwright.maps.picture;

import it.geosolutions.imageioimpl.plugins.tiff.TIFFImageReaderSpi;
import java.awt.Rectangle;
import java.awt.color.ColorSpace;
import java.awt.image.BufferedImage;
import java.awt.image.ColorModel;
import java.awt.image.IndexColorModel;
import java.io.IOException;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import javax.imageio.ImageReadParam;
import javax.imageio.ImageReader;
import javax.imageio.stream.FileImageInputStream;

/**
 * A TIFF picture of any size, read piece by piece; the pieces last used are kept in an eighth of
 * the memory.
 *
 * <p>Nothing is shown where the file says so (opacity, a value of no data, a piece left out) and
 * where a whole piece is pure black, which is how pictures mark ground they do not have, and how
 * damaged copies look.
 */
public final class TiffRaster implements Raster {
  /** Rows read at a time where the file has strips or is one piece. */
  private static final int ROWS = 128;

  private static final long LEAST_KEPT = 16_000_000;

  private final Path file;
  private final TiffLayout layout;
  private final ImageReader reader;
  private final FileImageInputStream stream;
  private final int blockWidth;
  private final int blockHeight;
  private final Map<Long, int[]> blocks;
  private long lastKey = -1;
  private int[] last;
  private int black;

  private TiffRaster(Path file) throws IOException {
    this.file = file;
    this.layout = TiffLayout.of(file);
    if (layout.bits() > 8) {
      throw new IOException(
          "picture "
              + file
              + " has "
              + layout.bits()
              + " bits a colour; it must have 8. Save it again with 8");
    }
    if (layout.photometric() == 5 || layout.photometric() > 6) {
      throw new IOException(
          "picture " + file + " is in colours other than grey, palette, RGB or YCbCr");
    }
    blockWidth = layout.pieceWidth();
    int rows = layout.pieceHeight();
    boolean strips = blockWidth >= layout.width();
    blockHeight = !strips ? rows : layout.uncompressed() ? ROWS : rows * Math.max(1, ROWS / rows);
    long most = Math.max(LEAST_KEPT, Runtime.getRuntime().maxMemory() / 8);
    long bytes = 4L * blockWidth * blockHeight;
    if (bytes > most) {
      throw new IOException(
          "picture "
              + file
              + " is stored in pieces of "
              + blockWidth
              + " x "
              + blockHeight
              + " pixels, too large to read one by one; save it again in tiles");
    }
    int kept = (int) Math.max(2, Math.min(4096, most / bytes));
    blocks =
        new LinkedHashMap<>(64, 0.75f, true) {
          private static final long serialVersionUID = 1;

          @Override
          protected boolean removeEldestEntry(Map.Entry<Long, int[]> eldest) {
            return size() > kept;
          }
        };
    reader = new TIFFImageReaderSpi().createReaderInstance();
    stream = new FileImageInputStream(file.toFile());
    reader.setInput(stream, false, true);
  }

  /**
   * Opens a file.
   *
   * @throws IOException one sentence naming it, if it is cut short or cannot be read
   */
  public static TiffRaster open(Path file) throws IOException {
    return new TiffRaster(file);
  }

  TiffLayout layout() {
    return layout;
  }

  /** How many pieces read so far were left blank because they are pure black. */
  public int blackPieces() {
    return black;
  }

  @Override
  public int width() {
    return layout.width();
  }

  @Override
  public int height() {
    return layout.height();
  }

  @Override
  public int argb(int x, int y) throws IOException {
    int column = x / blockWidth;
    int row = y / blockHeight;
    long key = (long) row << 32 | column;
    if (key != lastKey) {
      int[] block = blocks.get(key);
      if (block == null) {
        block = read(column, row);
        blocks.put(key, block);
      }
      last = block;
      lastKey = key;
    }
    return last.length == 0
        ? 0
        : last[(y - row * blockHeight) * blockWidth + x - column * blockWidth];
  }

  @Override
  public void close() throws IOException {
    reader.dispose();
    stream.close();
  }

  /** The pixels of a block; of length 0 where nothing is shown. */
  private int[] read(int column, int row) throws IOException {
    boolean pieces = blockHeight == layout.pieceHeight();
    if (pieces && layout.leftOut(column, row)) {
      return new int[0];
    }
    Rectangle area =
        new Rectangle(column * blockWidth, row * blockHeight, blockWidth, blockHeight)
            .intersection(new Rectangle(layout.width(), layout.height()));
    int[] pixels = new int[blockWidth * blockHeight];
    // a strip at a time: the library mixes up some strips that are read together
    int step = layout.uncompressed() ? blockHeight : layout.pieceHeight();
    boolean anything = false;
    boolean opaque = false;
    for (int y = 0; y < area.height; y += step) {
      Rectangle part =
          new Rectangle(area.x, area.y + y, area.width, Math.min(step, area.height - y));
      fill(decoded(part), pixels, y);
    }
    for (int p : pixels) {
      anything |= (p & 0xffffff) != 0 && p >>> 24 != 0;
      opaque |= p >>> 24 != 0;
    }
    if (!anything && opaque) {
      black++;
    }
    return anything ? pixels : new int[0];
  }

  private BufferedImage decoded(Rectangle area) throws IOException {
    boolean[] cut = new boolean[1];
    BufferedImage image;
    try {
      reader.removeAllIIOReadWarningListeners();
      reader.addIIOReadWarningListener(
          (source, warning) ->
              cut[0] |= warning.startsWith("Premature") || warning.startsWith("Corrupt"));
      ImageReadParam how = reader.getDefaultReadParam();
      how.setSourceRegion(area);
      image = reader.read(0, how);
    } catch (IOException | RuntimeException e) {
      throw damaged(area, e);
    }
    if (cut[0]) {
      throw damaged(area, null);
    }
    return image;
  }

  private IOException damaged(Rectangle area, Exception cause) {
    return new IOException(
        "picture "
            + file
            + " is damaged: its part at column "
            + area.x
            + ", row "
            + area.y
            + " cannot be read",
        cause);
  }

  /** Copies an image into a block, at its left edge from a row on. */
  private void fill(BufferedImage image, int[] pixels, int from) {
    ColorModel model = image.getColorModel();
    int bands = image.getRaster().getNumBands();
    boolean direct =
        !(model instanceof IndexColorModel)
            && model.getComponentSize(0) == 8
            && (bands < 3 || model.getColorSpace().getType() == ColorSpace.TYPE_RGB);
    int width = image.getWidth();
    int[] row = new int[width * bands];
    for (int y = 0; y < image.getHeight(); y++) {
      if (direct) {
        image.getRaster().getPixels(0, y, width, 1, row);
      }
      for (int x = 0; x < width; x++) {
        pixels[(from + y) * blockWidth + x] =
            direct ? pixel(row, x * bands, bands) : image.getRGB(x, y);
      }
    }
  }

  private int pixel(int[] row, int at, int bands) {
    int colours = bands >= 3 ? 3 : 1;
    boolean nothing = !Double.isNaN(layout.noData());
    for (int b = 0; b < colours && nothing; b++) {
      nothing = row[at + b] == layout.noData();
    }
    if (nothing) {
      return 0;
    }
    int alpha = layout.alpha() && bands == colours + 1 ? row[at + colours] : 255;
    int red = row[at];
    int green = colours == 3 ? row[at + 1] : red;
    int blue = colours == 3 ? row[at + 2] : red;
    return alpha << 24 | red << 16 | green << 8 | blue;
  }
}
