package org.fallwright.maps.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.fallwright.maps.demo.DemoGround;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.tiles.LayeredGround;
import org.fallwright.maps.tiles.MbTilesWriter;
import org.fallwright.maps.tiles.TileSets;
import org.fallwright.maps.tiles.TileStore;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class MapShelfTest {
  private static final Path DEMO = Path.of("basemaps", "oak-behind-the-house.mbtiles");

  @TempDir Path folder;

  @Test
  void aShelfThatIsNotThereHoldsNothing() throws IOException {
    assertThat(new MapShelf(folder.resolve("none")).list()).isEmpty();
  }

  @Test
  void whatLiesElsewhereIsReadInPlaceAndOnlyForgotten() throws IOException {
    MapShelf shelf = new MapShelf(folder);
    shelf.point("demo", DEMO);
    assertThat(shelf.find("demo")).hasValue(DEMO.toAbsolutePath());
    MapShelf.Held held = shelf.list().get(0);
    assertThat(held.name()).isEqualTo("demo");
    assertThat(held.bytes()).isEqualTo(Files.size(DEMO));
    assertThat(held.about().maxZoom()).isEqualTo(21);
    assertThat(shelf.remove("demo")).isZero();
    assertThat(DEMO).exists();
    assertThat(shelf.list()).isEmpty();
  }

  @Test
  void aPlaceThatIsGoneIsToldInTheList() throws IOException {
    MapShelf shelf = new MapShelf(folder);
    shelf.point("stick", folder.resolve("away/ground.mbtiles"));
    assertThat(shelf.list().get(0).fault()).contains("ground.mbtiles is not there");
  }

  @Test
  void everyTileIsReadAndTheDamagedAreNamed() throws IOException {
    assertThat(MapShelf.verify(DEMO).damaged()).isZero();
    Path set = folder.resolve("bad.mbtiles");
    try (TileStore demo = TileSets.open(DEMO);
        MbTilesWriter writer = new MbTilesWriter(set, demo.about(), "jpg")) {
      int[] n = new int[1];
      List<int[]> all = new java.util.ArrayList<>();
      demo.forEach((z, x, y) -> all.add(new int[] {z, x, y}));
      for (int[] t : all) {
        byte[] picture = demo.tile(t[0], t[1], t[2]).orElseThrow();
        boolean cut = n[0]++ == 5;
        writer.put(
            t[0], t[1], t[2], cut ? java.util.Arrays.copyOf(picture, picture.length / 2) : picture);
      }
      writer.finish();
      MapShelf.Verified found = MapShelf.verify(set);
      int[] t = all.get(5);
      assertThat(found.tiles()).isEqualTo(all.size());
      assertThat(found.damaged()).isEqualTo(1);
      assertThat(found.named())
          .containsExactly(
              "tile %d/%d/%d: its picture is cut short or damaged".formatted(t[0], t[1], t[2]));
    }
    assertThat(new MapShelf(folder).remove("bad.mbtiles")).isPositive();
    assertThat(folder).isEmptyDirectory();
  }

  @Test
  void aNameIsNoWayToOtherFolders() throws IOException {
    Files.createDirectories(folder.resolve("shelf"));
    Files.writeString(folder.resolve("secret"), "x");
    MapShelf shelf = new MapShelf(folder.resolve("shelf"));
    assertThat(shelf.find("../secret")).isEmpty();
    assertThat(shelf.find(folder.resolve("secret").toString())).isEmpty();
    assertThatThrownBy(() -> shelf.remove("../secret")).isInstanceOf(IOException.class);
    assertThatThrownBy(() -> shelf.file("../x")).hasMessageContaining("not a plain name");
  }

  @Test
  void aSiteIsReadyWhereAllOfItIsShownFinely() throws IOException {
    SiteFrame frame = new SiteFrame(DemoGround.ORIGIN);
    try (LayeredGround ground = LayeredGround.of(TileSets.open(DEMO))) {
      Readiness inside = Readiness.of(ground, frame, new Rectangle2D.Double(-40, -20, 100, 120));
      assertThat(inside.ready()).isTrue();
      Readiness beyond = Readiness.of(ground, frame, new Rectangle2D.Double(-40, -20, 900, 120));
      assertThat(beyond.ready()).isFalse();
      assertThat(beyond.shown()).isBetween(0.1, 0.4);
    }
  }
}
