package org.fallwright.maps.tiles;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class MbTilesWriterTest {
  private static final About ABOUT = new About("set", "us", "", "", new Bounds(0, 0, 1, 1), 10, 12);

  @TempDir Path folder;

  @Test
  void aFullDiskIsToldAndWhatIsDoneIsKept() throws IOException {
    Path set = folder.resolve("set.mbtiles");
    byte[] tile = new byte[50_000];
    new Random(1).nextBytes(tile);
    // room for 4 MB beside what is never filled up
    try (MbTilesWriter writer = MbTilesWriter.resumable(set, ABOUT, "jpg", "m", 54_000_000)) {
      assertThatThrownBy(
              () -> {
                for (int i = 0; i < 1000; i++) {
                  writer.put(12, i, 0, tile);
                  writer.keep();
                }
              })
          .isInstanceOf(IOException.class)
          .hasMessageContaining("set.mbtiles could not be written: the disk is full")
          .hasMessageContaining("kept for another try");
    }
    assertThat(set).doesNotExist();
    assertThat(Files.size(MbTilesWriter.building(set))).isBetween(3_000_000L, 4_100_000L);
    try (MbTilesWriter writer = MbTilesWriter.resumable(set, ABOUT, "jpg", "m")) {
      assertThat(writer.tile(12, 3, 0)).hasValue(tile);
      writer.put(12, 999, 0, tile);
      writer.finish();
    }
    try (MbTiles tiles = MbTiles.open(set)) {
      assertThat(tiles.tile(12, 999, 0)).hasValue(tile);
    }
  }

  @Test
  void oneRunWritesAtATime() throws Exception {
    Path set = folder.resolve("set.mbtiles");
    try (MbTilesWriter first = new MbTilesWriter(set, ABOUT, "jpg")) {
      first.put(12, 1, 1, new byte[] {1});
      assertThatThrownBy(() -> new MbTilesWriter(set, ABOUT, "jpg"))
          .isInstanceOf(IOException.class)
          .hasMessage("base map " + set + " is being written by another run just now");
      // and so in another process
      Process other =
          new ProcessBuilder(
                  Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                  "-cp",
                  System.getProperty("java.class.path"),
                  Second.class.getName(),
                  set.toString())
              .redirectErrorStream(true)
              .start();
      String said = new String(other.getInputStream().readAllBytes());
      assertThat(other.waitFor()).as(said).isEqualTo(7);
      assertThat(said).contains("is being written by another run just now");
      first.finish();
    }
    try (MbTiles tiles = MbTiles.open(set)) {
      assertThat(tiles.tile(12, 1, 1)).isPresent();
    }
  }

  /** Another process that wants to write the same set. */
  static final class Second {
    public static void main(String[] args) {
      try (MbTilesWriter writer = new MbTilesWriter(Path.of(args[0]), ABOUT, "jpg")) {
        writer.put(12, 2, 2, new byte[] {2});
        writer.finish();
      } catch (IOException e) {
        System.out.println(e.getMessage());
        System.exit(7);
      }
    }
  }

  @Test
  void aFolderThatIsNotThereIsNamed() {
    Path set = folder.resolve("none/set.mbtiles");
    assertThatThrownBy(() -> new MbTilesWriter(set, ABOUT, "jpg"))
        .hasMessageContaining("none is not there");
  }
}
