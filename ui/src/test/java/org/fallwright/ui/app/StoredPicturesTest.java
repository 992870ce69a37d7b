package org.fallwright.ui.app;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Path;
import org.fallwright.core.site.Site;
import org.fallwright.maps.tiles.TileStore;
import org.fallwright.ui.demo.DemoSite;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class StoredPicturesTest {
  private static final Path BASE_MAPS = Path.of("..", "maps-cache", "basemaps");

  @TempDir Path folder;

  @Test
  void aPictureAmongTheBaseMapsIsFound() throws Exception {
    try (TileStore store = open("oak-behind-the-house.mbtiles")) {
      assertThat(store).isNotNull();
    }
  }

  @Test
  void aPictureThatIsNotHereGivesBlankGround() throws IOException {
    assertThat(open("elsewhere.mbtiles")).isNull();
  }

  @Test
  void aPathInPlaceOfANameIsRefused() {
    assertThatThrownBy(() -> open("../oak-behind-the-house.mbtiles"))
        .isInstanceOf(IOException.class)
        .hasMessageContaining("plain name");
  }

  private TileStore open(String picture) throws IOException {
    Site with =
        DemoSite.asItIs().with(s -> ((ObjectNode) s.get("picture")).put("file", picture)).site();
    return new StoredPictures(BASE_MAPS).open(with, folder.resolve("x.fallsite.json"));
  }
}
