package org.fallwright.maps.tiles;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FolderTilesTest {
  @TempDir Path folder;

  @Test
  void picturesAreReadInPlace() throws IOException {
    put(10, 500, 300, "png");
    put(11, 1000, 601, "jpg");
    put(11, 1001, 602, "jpeg");
    Files.writeString(folder.resolve("readme.txt"), "not a tile");
    FolderTiles tiles = FolderTiles.open(folder);
    assertThat(tiles.about().minZoom()).isEqualTo(10);
    assertThat(tiles.about().maxZoom()).isEqualTo(11);
    assertThat(tiles.about().bounds()).isEqualTo(Bounds.ofTiles(11, 1000, 601, 1001, 602));
    assertThat(tiles.tile(11, 1001, 602)).hasValue(new byte[] {11});
    assertThat(tiles.tile(11, 1001, 601)).isEmpty();
    assertThat(tiles.about().name()).isEqualTo(folder.getFileName().toString());
  }

  @Test
  void rowsFromTheSouthAreTurned() throws IOException {
    put(3, 4, 1, "png");
    Files.writeString(
        folder.resolve("metadata.json"),
        "{\"scheme\": \"tms\", \"name\": \"ground\", \"attribution\": \"the county\","
            + " \"date\": \"2021\"}");
    FolderTiles tiles = FolderTiles.open(folder);
    assertThat(tiles.tile(3, 4, 6)).isPresent();
    assertThat(tiles.tile(3, 4, 1)).isEmpty();
    assertThat(tiles.about().bounds()).isEqualTo(Bounds.ofTiles(3, 4, 6, 4, 6));
    assertThat(tiles.about().attribution()).isEqualTo("the county");
    assertThat(tiles.about().taken()).isEqualTo("2021");
    int[] found = new int[3];
    tiles.forEach(
        (z, x, y) -> {
          found[0] = z;
          found[1] = x;
          found[2] = y;
        });
    assertThat(found).containsExactly(3, 4, 6);
  }

  @Test
  void aFolderWithoutTilesIsNamed() {
    assertThatThrownBy(() -> TileSets.open(folder))
        .isInstanceOf(IOException.class)
        .hasMessageContaining(folder + " is no tile set");
  }

  private void put(int zoom, int x, int y, String end) throws IOException {
    Path column = Files.createDirectories(folder.resolve(zoom + "/" + x));
    Files.write(column.resolve(y + "." + end), new byte[] {(byte) zoom});
  }
}
