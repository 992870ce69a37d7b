package org.fallwright.maps.tiles;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.Locale;
import org.fallwright.core.units.Range;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.WebMercator;
import org.sqlite.SQLiteConfig;

/**
 * Writes a tile set by the MBTiles 1.3 specification. The set is built beside its place under a
 * passing name and put there by {@link #finish}, in place of a set of that name; closed unfinished,
 * it leaves nothing behind.
 */
public final class MbTilesWriter implements AutoCloseable {
  private final Path file;
  private final Path building;
  private final Connection connection;
  private final PreparedStatement insert;

  /**
   * Begins a tile set.
   *
   * @param file where it will be
   * @param about what it says of itself
   * @param format of every tile: {@code jpg} or {@code png}
   */
  public MbTilesWriter(Path file, About about, String format) throws IOException {
    if (!"jpg".equals(format) && !"png".equals(format)) {
      throw new IllegalArgumentException("format is " + format + "; it must be jpg or png");
    }
    this.file = file;
    this.building = file.resolveSibling(file.getFileName() + ".part");
    Files.deleteIfExists(building);
    try {
      connection = new SQLiteConfig().createConnection("jdbc:sqlite:" + building.toAbsolutePath());
      connection.setAutoCommit(false);
      try (Statement s = connection.createStatement()) {
        s.execute("CREATE TABLE metadata (name TEXT, value TEXT)");
        s.execute("CREATE UNIQUE INDEX metadata_index ON metadata (name)");
        s.execute(
            "CREATE TABLE tiles"
                + " (zoom_level INTEGER, tile_column INTEGER, tile_row INTEGER, tile_data BLOB)");
        s.execute("CREATE UNIQUE INDEX tile_index ON tiles (zoom_level, tile_column, tile_row)");
      }
      write(about, format);
      insert = connection.prepareStatement("INSERT INTO tiles VALUES (?, ?, ?, ?)");
    } catch (SQLException e) {
      throw new IOException("base map " + file + " could not be written", e);
    }
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
      throw new IOException(
          "tile " + zoom + "/" + x + "/" + y + " could not be written to base map " + file, e);
    }
  }

  /** Puts the finished set in its place. */
  public void finish() throws IOException {
    try {
      connection.commit();
      connection.close();
    } catch (SQLException e) {
      throw new IOException("base map " + file + " could not be written", e);
    }
    Files.move(building, file, StandardCopyOption.REPLACE_EXISTING);
  }

  @Override
  public void close() throws IOException {
    try {
      connection.close();
    } catch (SQLException e) {
      throw new IOException("base map " + building + " could not be closed", e);
    }
    Files.deleteIfExists(building);
  }

  private void write(About about, String format) throws SQLException {
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
