package org.fallwright.maps.tiles;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.Arrays;
import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.fallwright.core.units.Range;
import org.fallwright.maps.frame.WebMercator;
import org.sqlite.SQLiteConfig;

/**
 * A tile set in one file, by the MBTiles 1.3 specification (an SQLite database whose rows are
 * numbered from the south). Opened for reading only: the file is never made, changed or locked.
 *
 * <p>One connection, used by one thread at a time; a look-up takes well under a millisecond. Of the
 * metadata only {@code name} and {@code format} have to be there; bounds and zooms that are not
 * stated are taken from the tiles themselves. The row {@code date}, when the picture was taken, is
 * an addition of this program that the specification leaves room for.
 */
public final class MbTiles implements TileStore {
  private static final Set<String> PICTURES = Set.of("png", "jpg", "jpeg");

  private final Path file;
  private final Connection connection;
  private final PreparedStatement query;
  private final About about;

  private MbTiles(Path file, Connection connection) throws SQLException {
    this.file = file;
    this.connection = connection;
    Map<String, String> stated = metadata(connection);
    String format = Range.present("format", stated.get("format")).toLowerCase(Locale.ROOT);
    if (!PICTURES.contains(format)) {
      throw new IllegalArgumentException(
          "its tiles are \"" + format + "\"; only pictures in png or jpg can be drawn");
    }
    this.about = about(stated, connection);
    this.query =
        connection.prepareStatement(
            "SELECT tile_data FROM tiles WHERE zoom_level = ? AND tile_column = ? AND tile_row ="
                + " ?");
  }

  /**
   * Opens a tile set.
   *
   * @throws IOException one sentence naming the file, if it is missing, damaged or no tile set
   */
  public static MbTiles open(Path file) throws IOException {
    if (!Files.isRegularFile(file)) {
      throw new IOException("base map " + file + " is not there");
    }
    Connection connection = null;
    try {
      SQLiteConfig config = new SQLiteConfig();
      config.setReadOnly(true);
      connection = config.createConnection("jdbc:sqlite:" + file.toAbsolutePath());
      return new MbTiles(file, connection);
    } catch (SQLException | IllegalArgumentException e) {
      closeQuietly(connection, e);
      String why =
          e instanceof SQLException
              ? needsItsFolder(file)
                  ? "cannot be read in place: it was left in a state that needs a folder that can"
                      + " be written to"
                  : "is damaged or no tile set in the MBTiles form"
              : "cannot be used: " + e.getMessage();
      throw new IOException("base map " + file + " " + why, e);
    }
  }

  /** Whether it is a database with a log beside it (bytes 18 and 19), in a read-only folder. */
  private static boolean needsItsFolder(Path file) {
    try (var in = Files.newInputStream(file)) {
      byte[] head = in.readNBytes(20);
      return head.length == 20
          && head[18] == 2
          && !Files.isWritable(file.toAbsolutePath().getParent());
    } catch (IOException e) {
      return false;
    }
  }

  @Override
  public About about() {
    return about;
  }

  @Override
  public synchronized Optional<byte[]> tile(int zoom, int x, int y) throws IOException {
    int across = WebMercator.tilesAcross(zoom);
    Range.check("tile x", x, 0, across - 1.0, "");
    Range.check("tile y", y, 0, across - 1.0, "");
    try {
      query.setInt(1, zoom);
      query.setInt(2, x);
      query.setInt(3, across - 1 - y);
      try (ResultSet row = query.executeQuery()) {
        return row.next() ? Optional.ofNullable(row.getBytes(1)) : Optional.empty();
      }
    } catch (SQLException e) {
      throw new IOException(
          "base map " + file + " is damaged: tile " + zoom + "/" + x + "/" + y + " cannot be read",
          e);
    }
  }

  @Override
  public synchronized void forEach(Each each) throws IOException {
    try (Statement s = connection.createStatement();
        ResultSet r =
            s.executeQuery(
                "SELECT zoom_level, tile_column, tile_row FROM tiles ORDER BY zoom_level")) {
      while (r.next()) {
        int zoom = r.getInt(1);
        int across = WebMercator.tilesAcross(zoom);
        each.tile(zoom, r.getInt(2), across - 1 - r.getInt(3));
      }
    } catch (SQLException | IllegalArgumentException e) {
      throw new IOException("base map " + file + " is damaged: its tiles cannot be listed", e);
    }
  }

  @Override
  public synchronized void close() throws IOException {
    try {
      connection.close();
    } catch (SQLException e) {
      throw new IOException("base map " + file + " could not be closed", e);
    }
  }

  private static void closeQuietly(Connection connection, Exception cause) {
    try {
      if (connection != null) {
        connection.close();
      }
    } catch (SQLException e) {
      cause.addSuppressed(e);
    }
  }

  private static Map<String, String> metadata(Connection c) throws SQLException {
    Map<String, String> rows = new HashMap<>();
    try (Statement s = c.createStatement();
        ResultSet r = s.executeQuery("SELECT name, value FROM metadata")) {
      while (r.next()) {
        if (r.getString(1) != null && r.getString(2) != null) {
          rows.put(r.getString(1), r.getString(2));
        }
      }
    }
    return rows;
  }

  private static About about(Map<String, String> stated, Connection c) throws SQLException {
    int min;
    int max;
    try (Statement s = c.createStatement();
        ResultSet r = s.executeQuery("SELECT min(zoom_level), max(zoom_level) FROM tiles")) {
      r.next();
      min = r.getInt(1);
      max = r.getInt(2);
      if (r.wasNull()) {
        throw new IllegalArgumentException("it has no tiles");
      }
    }
    return new About(
        Range.present("name", stated.get("name")),
        stated.getOrDefault("attribution", ""),
        stated.getOrDefault("date", ""),
        stated.getOrDefault("description", ""),
        stated.containsKey("bounds") ? parse(stated.get("bounds")) : tiled(c, max),
        zoom(stated, "minzoom", min),
        zoom(stated, "maxzoom", max));
  }

  private static int zoom(Map<String, String> stated, String key, int found) {
    String text = stated.get(key);
    try {
      return text == null ? found : Integer.parseInt(text.trim());
    } catch (NumberFormatException e) {
      throw new IllegalArgumentException(
          key + " is \"" + text + "\"; it must be a whole number", e);
    }
  }

  private static Bounds parse(String text) {
    try {
      double[] v = Arrays.stream(text.split(",")).mapToDouble(Double::parseDouble).toArray();
      if (v.length == 4) {
        return new Bounds(v[0], v[1], v[2], v[3]);
      }
    } catch (NumberFormatException e) {
      // told below, in the same words
    }
    throw new IllegalArgumentException(
        "bounds is \"" + text + "\"; it must be west,south,east,north in degrees");
  }

  private static Bounds tiled(Connection c, int zoom) throws SQLException {
    try (PreparedStatement s =
        c.prepareStatement(
            "SELECT min(tile_column), max(tile_row), max(tile_column), min(tile_row)"
                + " FROM tiles WHERE zoom_level = ?")) {
      s.setInt(1, zoom);
      try (ResultSet r = s.executeQuery()) {
        r.next();
        int last = WebMercator.tilesAcross(zoom) - 1;
        return Bounds.ofTiles(
            zoom, r.getInt(1), last - r.getInt(2), r.getInt(3), last - r.getInt(4));
      }
    }
  }
}
