package org.fallwright.maps.tiles;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.UUID;
import java.util.concurrent.ConcurrentHashMap;
import org.fallwright.core.units.Range;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.WebMercator;
import org.sqlite.SQLiteConfig;
import org.sqlite.SQLiteErrorCode;

/**
 * Writes a tile set by the MBTiles 1.3 specification. The set is built beside its place under a
 * passing name, {@code ….part}, and put there by {@link #finish}, in place of a set of that name.
 * Closed unfinished, it leaves nothing behind, unless it was begun as one to be taken up again.
 *
 * <p>One process at a time: a file in the folder for passing files is locked meanwhile.
 */
public final class MbTilesWriter implements AutoCloseable {
  /** Free space that is never filled up [bytes]; planning allowance. */
  private static final long KEPT_FREE = 50_000_000;

  private static final String MARK = "fallwright_import";

  /**
   * Sets being written by this process: closing any opening of a locked file would let go of the
   * lock that another opening of the same process holds.
   */
  private static final Set<Path> WRITING = ConcurrentHashMap.newKeySet();

  private final Path file;
  private final Path building;
  private final boolean kept;
  private final FileChannel lock;
  private Connection connection;
  private PreparedStatement insert;
  private PreparedStatement query;

  /**
   * Begins a tile set.
   *
   * @param file where it will be
   * @param about what it says of itself
   * @param format of the tiles: {@code jpg} or {@code png}
   */
  public MbTilesWriter(Path file, About about, String format) throws IOException {
    this(file, about, format, null, Files.getFileStore(parent(file)).getUsableSpace());
  }

  private MbTilesWriter(Path file, About about, String format, String mark, long free)
      throws IOException {
    if (!"jpg".equals(format) && !"png".equals(format)) {
      throw new IllegalArgumentException("format is " + format + "; it must be jpg or png");
    }
    this.file = file;
    this.building = building(file);
    this.kept = mark != null;
    this.lock = locked(file);
    try {
      if (!kept || !mark.equals(markOf(building))) {
        discard();
      }
      boolean fresh = !Files.exists(building);
      connection = new SQLiteConfig().createConnection("jdbc:sqlite:" + building.toAbsolutePath());
      try (Statement s = connection.createStatement()) {
        long room = Math.max(0, free - KEPT_FREE) / 4096;
        long held = fresh ? 0 : Files.size(building) / 4096;
        s.execute("PRAGMA max_page_count = " + Math.max(1, Math.min(room + held, 1L << 31)));
      }
      connection.setAutoCommit(false);
      if (fresh) {
        tables();
        write(about, format, mark);
        connection.commit();
      }
      insert = connection.prepareStatement("INSERT INTO tiles VALUES (?, ?, ?, ?)");
      query =
          connection.prepareStatement(
              "SELECT tile_data FROM tiles"
                  + " WHERE zoom_level = ? AND tile_column = ? AND tile_row = ?");
    } catch (SQLException e) {
      IOException told = told(e);
      closeQuietly(told);
      throw told;
    } catch (IOException e) {
      closeQuietly(e);
      throw e;
    }
  }

  /**
   * Begins a tile set, or takes an unfinished one up again.
   *
   * @param mark what it is made from and how; an unfinished set with another mark is thrown away
   */
  public static MbTilesWriter resumable(Path file, About about, String format, String mark)
      throws IOException {
    long free = Files.getFileStore(parent(file)).getUsableSpace();
    return resumable(file, about, format, mark, free);
  }

  /** As above, with the free space [bytes] given. */
  static MbTilesWriter resumable(Path file, About about, String format, String mark, long free)
      throws IOException {
    return new MbTilesWriter(file, about, format, Range.text("mark", mark), free);
  }

  /** Where a set is built. */
  public static Path building(Path file) {
    return file.resolveSibling(file.getFileName() + ".part");
  }

  /** Adds the picture file of a tile, numbered as in {@link TileStore#tile}. */
  public void put(int zoom, int x, int y, byte[] picture) throws IOException {
    int across = WebMercator.tilesAcross(zoom);
    Range.check("tile x", x, 0, across - 1.0, "");
    Range.check("tile y", y, 0, across - 1.0, "");
    try {
      insert.setInt(1, zoom);
      insert.setInt(2, x);
      insert.setInt(3, across - 1 - y);
      insert.setBytes(4, picture);
      insert.executeUpdate();
    } catch (SQLException e) {
      if (e.getErrorCode() == SQLiteErrorCode.SQLITE_CONSTRAINT.code) {
        throw new IOException(
            "tile " + zoom + "/" + x + "/" + y + " is in base map " + file + " already", e);
      }
      throw told(e);
    }
  }

  /** A tile that is there already. */
  public Optional<byte[]> tile(int zoom, int x, int y) throws IOException {
    int across = WebMercator.tilesAcross(zoom);
    try {
      query.setInt(1, zoom);
      query.setInt(2, x);
      query.setInt(3, across - 1 - y);
      try (ResultSet row = query.executeQuery()) {
        return row.next() ? Optional.ofNullable(row.getBytes(1)) : Optional.empty();
      }
    } catch (SQLException e) {
      throw told(e);
    }
  }

  /** Makes sure that what was put so far is there after a break. */
  public void keep() throws IOException {
    try {
      connection.commit();
    } catch (SQLException e) {
      throw told(e);
    }
  }

  /** Puts the finished set in its place. */
  public void finish() throws IOException {
    try {
      try (Statement s = connection.createStatement()) {
        s.execute("DELETE FROM metadata WHERE name = '" + MARK + "'");
      }
      connection.commit();
      connection.close();
    } catch (SQLException e) {
      throw told(e);
    }
    Files.move(building, file, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.ATOMIC_MOVE);
  }

  @Override
  public void close() throws IOException {
    try {
      if (connection != null) {
        connection.close();
      }
      if (!kept) {
        discard();
      }
    } catch (SQLException e) {
      throw new IOException("base map " + building + " could not be closed", e);
    } finally {
      if (lock.isOpen()) {
        unlock();
      }
    }
  }

  private void closeQuietly(IOException cause) {
    try {
      close();
    } catch (IOException e) {
      cause.addSuppressed(e);
    }
  }

  private void discard() throws IOException {
    Files.deleteIfExists(building);
    Files.deleteIfExists(building.resolveSibling(building.getFileName() + "-journal"));
  }

  private IOException told(SQLException e) {
    boolean full =
        e.getErrorCode() == SQLiteErrorCode.SQLITE_FULL.code
            || e.getErrorCode() == SQLiteErrorCode.SQLITE_IOERR.code;
    String why = full ? "the disk is full or cannot be written to" : "its file refuses it";
    String rest = kept ? "; what is done so far is kept for another try" : "";
    return new IOException("base map " + file + " could not be written: " + why + rest, e);
  }

  private static Path parent(Path file) throws IOException {
    Path folder = file.toAbsolutePath().getParent();
    if (!Files.isDirectory(folder)) {
      throw new IOException("folder " + folder + " is not there");
    }
    return folder;
  }

  private static FileChannel locked(Path file) throws IOException {
    String busy = "base map " + file + " is being written by another run just now";
    if (!Files.isWritable(parent(file))) {
      throw new IOException("folder " + parent(file) + " cannot be written to");
    }
    Path at = lockOf(file);
    if (!WRITING.add(at)) {
      throw new IOException(busy);
    }
    FileChannel channel = null;
    boolean got = false;
    try {
      Files.createDirectories(at.getParent());
      channel = FileChannel.open(at, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
      got = channel.tryLock() != null;
      if (!got) {
        throw new IOException(busy);
      }
      return channel;
    } catch (FileSystemException e) {
      throw new IOException("folder " + at.getParent() + " cannot be written to", e);
    } finally {
      if (!got) {
        WRITING.remove(at);
        if (channel != null) {
          channel.close();
        }
      }
    }
  }

  private void unlock() throws IOException {
    lock.close();
    WRITING.remove(lockOf(file));
  }

  /** In the folder for passing files, by the set's path: it is never deleted, only locked. */
  private static Path lockOf(Path file) throws IOException {
    String path = parent(file).toRealPath().resolve(file.getFileName()).toString();
    String name = UUID.nameUUIDFromBytes(path.getBytes(StandardCharsets.UTF_8)) + ".lock";
    String user = System.getProperty("user.name", "").replaceAll("\\W", "_");
    return Path.of(System.getProperty("java.io.tmpdir"), "fallwright-" + user, name)
        .toAbsolutePath();
  }

  /** The mark of an unfinished set, or null. */
  private static String markOf(Path part) {
    if (!Files.isRegularFile(part)) {
      return null;
    }
    SQLiteConfig config = new SQLiteConfig();
    try (Connection c = config.createConnection("jdbc:sqlite:" + part.toAbsolutePath());
        Statement s = c.createStatement();
        ResultSet r = s.executeQuery("SELECT value FROM metadata WHERE name = '" + MARK + "'")) {
      return r.next() ? r.getString(1) : null;
    } catch (SQLException e) {
      // not one of ours, or damaged: it is begun anew
      return null;
    }
  }

  private void tables() throws SQLException {
    try (Statement s = connection.createStatement()) {
      s.execute("CREATE TABLE metadata (name TEXT, value TEXT)");
      s.execute("CREATE UNIQUE INDEX metadata_index ON metadata (name)");
      s.execute(
          "CREATE TABLE tiles"
              + " (zoom_level INTEGER, tile_column INTEGER, tile_row INTEGER, tile_data BLOB)");
      s.execute("CREATE UNIQUE INDEX tile_index ON tiles (zoom_level, tile_column, tile_row)");
    }
  }

  private void write(About about, String format, String mark) throws SQLException {
    Bounds b = about.bounds();
    LatLon centre = b.centre();
    try (PreparedStatement row =
        connection.prepareStatement("INSERT INTO metadata VALUES (?, ?)")) {
      row(row, "name", about.name());
      row(row, "format", format);
      row(row, "bounds", degrees(b.west(), b.south(), b.east(), b.north()));
      row(row, "center", degrees(centre.lonDeg(), centre.latDeg()) + "," + about.minZoom());
      row(row, "minzoom", Integer.toString(about.minZoom()));
      row(row, "maxzoom", Integer.toString(about.maxZoom()));
      row(row, "type", "baselayer");
      row(row, "version", "1");
      row(row, "attribution", about.attribution());
      row(row, "description", about.description());
      row(row, "date", about.taken());
      row(row, MARK, mark == null ? "" : mark);
    }
  }

  private static void row(PreparedStatement row, String name, String value) throws SQLException {
    if (!value.isEmpty()) {
      row.setString(1, name);
      row.setString(2, value);
      row.executeUpdate();
    }
  }

  private static String degrees(double... values) {
    StringBuilder text = new StringBuilder();
    for (double v : values) {
      text.append(text.isEmpty() ? "" : ",").append(String.format(Locale.ROOT, "%.9f", v));
    }
    return text.toString();
  }
}
