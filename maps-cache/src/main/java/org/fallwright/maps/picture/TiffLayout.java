package org.fallwright.maps.picture;

import java.io.EOFException;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.HashMap;
import java.util.Map;

/**
 * How the first page of a TIFF file is stored: read to tell a file that is cut short, which picture
 * libraries fill up with black, and to read it piece by piece.
 *
 * <p>Source: TIFF 6.0 (Adobe, 1992), sections 2, 8 and 15; the 64-bit form as libtiff's page on
 * BigTIFF describes it; tag 42113, the value of no data, as the GDAL driver's page has it.
 *
 * @param pieceWidth width of a tile, or of the picture where it is stored in strips [pixels]
 * @param pieceHeight height of a tile or strip [pixels]
 * @param offsets where each piece begins; 0 together with a length of 0: nothing there
 * @param lengths how long each is [bytes]
 * @param alpha whether there is a band of opacity
 * @param noData the value of all bands that stands for nothing; NaN: none
 * @param dateTime when it was made, as the file states it; empty: not stated
 * @param georeferenced whether it has tags that lay it on a coordinate system
 */
record TiffLayout(
    int width,
    int height,
    int pieceWidth,
    int pieceHeight,
    int bits,
    int compression,
    int photometric,
    long[] offsets,
    long[] lengths,
    boolean alpha,
    double noData,
    String dateTime,
    boolean georeferenced) {

  private static final int MOST_ENTRIES = 4096;
  private static final long MOST_BYTES = 64_000_000;

  /** A tag's values: numbers, or the bytes of a text. */
  private record Entry(long[] numbers, String text) {}

  /** Whether it is stored as it is, so that any part can be read for itself. */
  boolean uncompressed() {
    return compression == 1;
  }

  int across() {
    return (width + pieceWidth - 1) / pieceWidth;
  }

  int down() {
    return (height + pieceHeight - 1) / pieceHeight;
  }

  /** Whether a piece was left out on purpose: nothing there. */
  boolean leftOut(int column, int row) {
    int i = row * across() + column;
    return offsets[i] == 0 && lengths[i] == 0;
  }

  /**
   * Reads a file's layout and holds it against the file's length.
   *
   * @throws IOException one sentence naming the file, if it is no TIFF file or cut short
   */
  static TiffLayout of(Path file) throws IOException {
    if (!Files.isRegularFile(file)) {
      throw new IOException("picture " + file + " is not there");
    }
    try (FileChannel in = FileChannel.open(file, StandardOpenOption.READ)) {
      Reader reader = new Reader(in);
      return layout(reader.entries(), in.size(), file);
    } catch (EOFException e) {
      throw new IOException("picture " + file + " is cut short: its head is not whole", e);
    } catch (IllegalArgumentException e) {
      throw new IOException("picture " + file + " cannot be read: " + e.getMessage(), e);
    }
  }

  private static TiffLayout layout(Map<Integer, Entry> tags, long size, Path file)
      throws IOException {
    int width = (int) number(tags, 256, "width", -1);
    int height = (int) number(tags, 257, "height", -1);
    boolean tiled = tags.containsKey(322);
    int pieceWidth = tiled ? (int) number(tags, 322, "tile width", -1) : width;
    int pieceHeight =
        tiled
            ? (int) number(tags, 323, "tile height", -1)
            : (int) Math.min(height, number(tags, 278, "rows in a strip", height));
    if (width < 1 || height < 1 || pieceWidth < 1 || pieceHeight < 1) {
      throw new IllegalArgumentException("its size is not stated");
    }
    Entry offsets = tags.get(tiled ? 324 : 273);
    Entry lengths = tags.get(tiled ? 325 : 279);
    if (offsets == null || lengths == null || offsets.numbers.length != lengths.numbers.length) {
      throw new IllegalArgumentException("it does not say where its pieces are");
    }
    long bits = 0;
    for (long b : tags.containsKey(258) ? tags.get(258).numbers : new long[] {1}) {
      bits = Math.max(bits, b);
    }
    boolean alpha = false;
    if (tags.containsKey(338)) {
      for (long kind : tags.get(338).numbers) {
        alpha |= kind == 1 || kind == 2;
      }
    }
    double noData = Double.NaN;
    try {
      noData = tags.containsKey(42113) ? Double.parseDouble(text(tags, 42113)) : Double.NaN;
    } catch (NumberFormatException e) {
      throw new IllegalArgumentException("its value of no data is not a number", e);
    }
    TiffLayout layout =
        new TiffLayout(
            width,
            height,
            pieceWidth,
            pieceHeight,
            (int) bits,
            (int) number(tags, 259, "compression", 1),
            (int) number(tags, 262, "kind of colour", 1),
            offsets.numbers,
            lengths.numbers,
            alpha,
            noData,
            tags.containsKey(306) ? text(tags, 306) : "",
            tags.containsKey(34735));
    layout.whole(size, file);
    return layout;
  }

  private void whole(long size, Path file) throws IOException {
    if (offsets.length < (long) across() * down()) {
      throw new IllegalArgumentException("it has fewer pieces than its size needs");
    }
    long needed = 0;
    int missing = 0;
    for (int i = 0; i < offsets.length; i++) {
      long end = offsets[i] + lengths[i];
      missing += end > size ? 1 : 0;
      needed = Math.max(needed, end);
    }
    if (missing > 0) {
      throw new IOException(
          "picture "
              + file
              + " is cut short: it has "
              + size
              + " bytes and needs "
              + needed
              + "; "
              + missing
              + " of its "
              + offsets.length
              + " pieces are missing. Copy it again");
    }
  }

  private static long number(Map<Integer, Entry> tags, int tag, String what, long otherwise) {
    Entry e = tags.get(tag);
    if (e == null || e.numbers.length == 0) {
      if (otherwise < 0) {
        throw new IllegalArgumentException("its " + what + " is not stated");
      }
      return otherwise;
    }
    if (e.numbers[0] < 0 || e.numbers[0] > Integer.MAX_VALUE) {
      throw new IllegalArgumentException("its " + what + " is " + e.numbers[0]);
    }
    return e.numbers[0];
  }

  private static String text(Map<Integer, Entry> tags, int tag) {
    String text = tags.get(tag).text;
    return text == null ? "" : text.replace("\0", "").trim();
  }

  /** Reads the entries of the first page, in the 32-bit and the 64-bit form. */
  private static final class Reader {
    private final FileChannel in;
    private final ByteOrder order;
    private final boolean big;

    Reader(FileChannel in) throws IOException {
      this.in = in;
      ByteBuffer head = bytes(0, 4, ByteOrder.BIG_ENDIAN);
      int mark = head.getShort();
      this.order = mark == 0x4949 ? ByteOrder.LITTLE_ENDIAN : ByteOrder.BIG_ENDIAN;
      int version = head.order(order).getShort();
      if (mark != 0x4949 && mark != 0x4D4D || version != 42 && version != 43) {
        throw new IllegalArgumentException("it is no TIFF file");
      }
      this.big = version == 43;
    }

    Map<Integer, Entry> entries() throws IOException {
      long at = big ? bytes(8, 8, order).getLong() : Integer.toUnsignedLong(int32(4));
      long count = big ? bytes(at, 8, order).getLong() : bytes(at, 2, order).getShort() & 0xffff;
      if (count < 1 || count > MOST_ENTRIES) {
        throw new IllegalArgumentException("its head has " + count + " entries");
      }
      int step = big ? 20 : 12;
      ByteBuffer all = bytes(at + (big ? 8 : 2), (int) count * step, order);
      Map<Integer, Entry> found = new HashMap<>();
      for (int i = 0; i < count; i++) {
        int from = i * step;
        int tag = all.getShort(from) & 0xffff;
        int type = all.getShort(from + 2) & 0xffff;
        long values = big ? all.getLong(from + 4) : Integer.toUnsignedLong(all.getInt(from + 4));
        int size = size(type);
        if (size > 0 && values >= 0 && values <= MOST_BYTES / size) {
          found.put(tag, entry(all, from + (big ? 12 : 8), type, size, (int) values));
        }
      }
      return found;
    }

    private Entry entry(ByteBuffer all, int field, int type, int size, int values)
        throws IOException {
      int length = size * values;
      ByteBuffer data;
      if (length <= (big ? 8 : 4)) {
        data = all.duplicate().order(order).position(field);
      } else {
        long at = big ? all.getLong(field) : Integer.toUnsignedLong(all.getInt(field));
        data = bytes(at, length, order);
      }
      if (type == 2) {
        byte[] text = new byte[length];
        data.get(text);
        return new Entry(new long[0], new String(text, StandardCharsets.ISO_8859_1));
      }
      long[] numbers = new long[values];
      for (int i = 0; i < values; i++) {
        numbers[i] =
            switch (type) {
              case 1 -> data.get() & 0xff;
              case 3 -> data.getShort() & 0xffff;
              case 4 -> Integer.toUnsignedLong(data.getInt());
              default -> data.getLong();
            };
      }
      return new Entry(numbers, null);
    }

    /** Bytes of a value of the types that are of use here; 0: another type. */
    private static int size(int type) {
      return switch (type) {
        case 1, 2 -> 1;
        case 3 -> 2;
        case 4 -> 4;
        case 16 -> 8;
        default -> 0;
      };
    }

    private int int32(long at) throws IOException {
      return bytes(at, 4, order).getInt();
    }

    private ByteBuffer bytes(long at, int length, ByteOrder in2) throws IOException {
      if (at < 0 || at + length > in.size()) {
        throw new EOFException();
      }
      ByteBuffer b = ByteBuffer.allocate(length).order(in2);
      while (b.hasRemaining()) {
        if (in.read(b, at + b.position()) < 0) {
          throw new EOFException();
        }
      }
      return b.flip();
    }
  }
}
