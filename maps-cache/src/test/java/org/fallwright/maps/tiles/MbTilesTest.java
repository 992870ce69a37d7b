package org.fallwright.maps.tiles;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.Arrays;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class MbTilesTest {
  private static final About ABOUT =
      new About(
          "meadow", "drawn by us", "2026-06-01", "for a test", new Bounds(-41, 44, -39, 46), 3, 5);

  @TempDir Path folder;

  @Test
  void whatIsWrittenIsRead() throws IOException {
    Path file = written("a.mbtiles");
    try (MbTiles tiles = MbTiles.open(file)) {
      assertThat(tiles.about()).isEqualTo(ABOUT);
      assertThat(tiles.minZoom()).isEqualTo(3);
      assertThat(tiles.maxZoom()).isEqualTo(5);
      assertThat(text(tiles.tile(3, 2, 1))).isEqualTo("three");
      assertThat(text(tiles.tile(5, 31, 0))).isEqualTo("five");
      assertThat(tiles.tile(3, 2, 6)).isEmpty();
      assertThatThrownBy(() -> tiles.tile(3, 8, 0)).hasMessageContaining("tile x is 8");
    }
    try (var files = Files.list(folder)) {
      assertThat(files).as("nothing is left beside it").containsExactly(file);
    }
  }

  /** MBTiles 1.3: the row is counted from the south, so the tile at the top of zoom 5 is row 31. */
  @Test
  void rowsInTheFileCountFromTheSouth() throws IOException, SQLException {
    Path file = written("a.mbtiles");
    try (Connection c = DriverManager.getConnection("jdbc:sqlite:" + file);
        Statement s = c.createStatement();
        ResultSet r =
            s.executeQuery("SELECT tile_column, tile_row FROM tiles WHERE zoom_level = 5")) {
      assertThat(r.next()).isTrue();
      assertThat(r.getInt(1)).isEqualTo(31);
      assertThat(r.getInt(2)).isEqualTo(31);
    }
  }

  @ParameterizedTest
  @CsvSource({
    "name, meadow",
    "format, jpg",
    "'bounds', '-41.000000000,44.000000000,-39.000000000,46.000000000'",
    "center, '-40.000000000,45.000000000,3'",
    "minzoom, 3",
    "maxzoom, 5",
    "attribution, drawn by us",
    "description, for a test",
    "type, baselayer",
    "version, 1"
  })
  void metadataHasTheKeysOfTheSpecification(String key, String value)
      throws IOException, SQLException {
    Path file = written("a.mbtiles");
    try (Connection c = DriverManager.getConnection("jdbc:sqlite:" + file);
        Statement s = c.createStatement();
        ResultSet r = s.executeQuery("SELECT value FROM metadata WHERE name = '" + key + "'")) {
      assertThat(r.next()).isTrue();
      assertThat(r.getString(1)).isEqualTo(value);
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"a b.mbtiles", "wärts #1 100%.mbtiles", "a?mode=memory.mbtiles"})
  void oddFileNamesOpenThatFileAndMakeNoOther(String name) throws IOException {
    Path file = written(name);
    try (MbTiles tiles = MbTiles.open(file)) {
      assertThat(text(tiles.tile(3, 2, 1))).isEqualTo("three");
    }
    try (var files = Files.list(folder)) {
      assertThat(files).containsExactly(file);
    }
  }

  @Test
  void boundsAndZoomsNotStatedComeFromTheTiles() throws IOException, SQLException {
    Path file = written("a.mbtiles");
    change(file, "DELETE FROM metadata WHERE name IN ('bounds', 'minzoom', 'maxzoom')");
    try (MbTiles tiles = MbTiles.open(file)) {
      assertThat(tiles.minZoom()).isEqualTo(3);
      assertThat(tiles.maxZoom()).isEqualTo(5);
      assertThat(tiles.about().bounds().east()).isEqualTo(180);
      assertThat(tiles.about().bounds().north()).isCloseTo(85.051129, within(1e-6));
      assertThat(tiles.about().bounds().west()).isEqualTo(168.75);
    }
  }

  @Test
  void aMissingFileIsToldAndNotMade() {
    Path file = folder.resolve("gone.mbtiles");
    assertThatThrownBy(() -> MbTiles.open(file))
        .isInstanceOf(IOException.class)
        .hasMessage("base map " + file + " is not there");
    assertThat(file).doesNotExist();
  }

  @Test
  void aFileThatIsNoDatabaseIsTold() throws IOException {
    Path file = folder.resolve("letter.mbtiles");
    Files.writeString(file, "Dear customer, ".repeat(500));
    refused(file, "is damaged or no tile set in the MBTiles form");
    Files.writeString(file, "");
    refused(file, "is damaged or no tile set in the MBTiles form");
  }

  @Test
  void aFileCutShortIsTold() throws IOException {
    Path file = written("a.mbtiles");
    byte[] all = Files.readAllBytes(file);
    Files.write(file, Arrays.copyOf(all, 5000));
    refused(file, "is damaged");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "UPDATE metadata SET value = 'pbf' WHERE name = 'format' | its tiles are \"pbf\"",
        "DELETE FROM metadata WHERE name = 'format' | format is null",
        "DELETE FROM metadata WHERE name = 'name' | name is null",
        "UPDATE metadata SET value = '1,2' WHERE name = 'bounds' | bounds is \"1,2\"",
        "UPDATE metadata SET value = '5,0,-5,1' WHERE name = 'bounds' | east is -5",
        "UPDATE metadata SET value = 'NaN,0,1,1' WHERE name = 'bounds' | west is not a number",
        "UPDATE metadata SET value = 'deep' WHERE name = 'maxzoom' | maxzoom is \"deep\"",
        "UPDATE metadata SET value = '2' WHERE name = 'maxzoom' | maxzoom is 2",
        "DELETE FROM tiles | it has no tiles"
      })
  void faultyContentIsTold(String change, String told) throws IOException, SQLException {
    Path file = written("a.mbtiles");
    change(file, change);
    refused(file, told);
  }

  @Test
  void anUnfinishedSetLeavesTheOldOne() throws IOException {
    Path file = written("a.mbtiles");
    byte[] before = Files.readAllBytes(file);
    try (MbTilesWriter writer = new MbTilesWriter(file, ABOUT, "png")) {
      writer.put(3, 0, 0, new byte[] {1});
    }
    assertThat(Files.readAllBytes(file)).isEqualTo(before);
    try (var files = Files.list(folder)) {
      assertThat(files).containsExactly(file);
    }
  }

  @Test
  void aTileWrittenTwiceIsRefused() throws IOException {
    Path file = folder.resolve("a.mbtiles");
    try (MbTilesWriter writer = new MbTilesWriter(file, ABOUT, "png")) {
      writer.put(3, 0, 0, new byte[] {1});
      assertThatThrownBy(() -> writer.put(3, 0, 0, new byte[] {1}))
          .isInstanceOf(IOException.class)
          .hasMessageContaining("tile 3/0/0")
          .hasMessageContaining(file.toString());
    }
  }

  private Path written(String name) throws IOException {
    Path file = folder.resolve(name);
    try (MbTilesWriter writer = new MbTilesWriter(file, ABOUT, "jpg")) {
      writer.put(3, 2, 1, "three".getBytes(StandardCharsets.UTF_8));
      writer.put(5, 31, 0, "five".getBytes(StandardCharsets.UTF_8));
      writer.finish();
    }
    return file;
  }

  private static void change(Path file, String sql) throws SQLException {
    try (Connection c = DriverManager.getConnection("jdbc:sqlite:" + file);
        Statement s = c.createStatement()) {
      assertThat(s.executeUpdate(sql)).isPositive();
    }
  }

  private static void refused(Path file, String told) {
    assertThatThrownBy(() -> MbTiles.open(file))
        .isInstanceOf(IOException.class)
        .hasMessageStartingWith("base map " + file + " ")
        .hasMessageContaining(told)
        .hasMessageNotContaining("\n");
  }

  private static String text(Optional<byte[]> tile) {
    return new String(tile.orElseThrow(), StandardCharsets.UTF_8);
  }
}
