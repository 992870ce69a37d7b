package org.fallwright.ui.app;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.fallwright.core.site.Picture;
import org.fallwright.core.site.Site;
import org.fallwright.maps.tiles.LayeredGround;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.home.SiteMaps;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class StoredPicturesTest {
  private static final String DEMO = "oak-behind-the-house.mbtiles";
  private static final Path BASE_MAPS = Path.of("..", "maps-cache", "basemaps");

  @TempDir Path folder;

  @Test
  void aPictureAmongTheBaseMapsIsFound() throws Exception {
    SiteMaps.Opened opened = open(named(DEMO));
    try (LayeredGround ground = opened.ground()) {
      assertThat(ground.maxZoom()).isEqualTo(21);
      assertThat(opened.fault()).isNull();
    }
  }

  @Test
  void aPictureThatIsNotHereGivesBlankGroundAndSaysSo() {
    SiteMaps.Opened opened = open(named("elsewhere.mbtiles"));
    assertThat(opened.ground()).isNull();
    assertThat(opened.fault()).isEqualTo("Blank ground: base map elsewhere.mbtiles was not found.");
  }

  @Test
  void aPathInPlaceOfANameIsRefused() {
    assertThat(open(named("../" + DEMO)).ground()).isNull();
    assertThat(open(named("../" + DEMO)).fault()).contains("is not the plain name");
  }

  @Test
  void aDamagedFileIsNamedAndTheOthersAreDrawn() throws IOException {
    Files.writeString(folder.resolve("plan.mbtiles"), "no database");
    Picture both =
        Picture.of(
            List.of(
                new Picture.Layer(DEMO, null, "us", 0, 0, 1),
                new Picture.Layer("plan.mbtiles", null, "us", 0, 0, 0.5)));
    SiteMaps.Opened opened = open(DemoSite.asItIs().site().withPicture(both));
    try (LayeredGround ground = opened.ground()) {
      assertThat(ground.name()).isEqualTo("Oak behind the house");
    }
    assertThat(opened.fault())
        .startsWith("Not drawn: base map ")
        .endsWith("plan.mbtiles is damaged or no tile set in the MBTiles form.");
  }

  @Test
  void aSiteWithoutPicturesHasNoFault() {
    assertThat(open(DemoSite.asItIs().site().withPicture(null))).isEqualTo(SiteMaps.Opened.NOTHING);
  }

  private static Site named(String picture) {
    return DemoSite.asItIs().with(s -> ((ObjectNode) s.get("picture")).put("file", picture)).site();
  }

  private SiteMaps.Opened open(Site site) {
    return StoredPictures.in(BASE_MAPS).open(site, folder.resolve("x.fallsite.json"));
  }
}
