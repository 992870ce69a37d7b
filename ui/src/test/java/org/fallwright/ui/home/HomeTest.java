package org.fallwright.ui.home;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class HomeTest {
  @TempDir private Path folder;

  @Test
  void theBuildHoldsPluginsBaseMapAndDemo() {
    Home home = Home.found();
    assertThat(home.plugins()).isDirectory();
    assertThat(home.demoSite()).isRegularFile();
    assertThat(home.picture(DemoSite.asItIs().site(), home.demoSite())).isPresent();
    assertThat(home.version()).matches("\\d+\\.\\d+\\.\\d+");
  }

  @Test
  void aPictureBesideTheSiteFileComesBeforeTheBaseMaps() throws IOException {
    Path sites = Files.createDirectory(folder.resolve("sites"));
    Path maps = Files.createDirectory(folder.resolve("maps"));
    Home home = new Home(folder, maps, folder, "0.1.0");
    Site site = picture("ground.mbtiles");
    Path file = sites.resolve("a.fallsite.json");
    assertThat(home.picture(site, file)).isEmpty();
    Path shared = Files.createFile(maps.resolve("ground.mbtiles"));
    assertThat(home.picture(site, file)).contains(shared);
    Path beside = Files.createFile(sites.resolve("ground.mbtiles"));
    assertThat(home.picture(site, file)).contains(beside);
  }

  @Test
  void aPictureIsANameNotAWayToOtherFolders() throws IOException {
    Files.createFile(folder.resolve("secret"));
    Path maps = Files.createDirectory(folder.resolve("maps"));
    Home home = new Home(folder, maps, folder, "0.1.0");
    Path file = maps.resolve("a.fallsite.json");
    assertThat(home.picture(picture("../secret"), file)).isEmpty();
    assertThat(home.picture(picture(folder.resolve("secret").toString()), file)).isEmpty();
    assertThat(home.picture(picture("no\0name"), file)).isEmpty();
  }

  private static Site picture(String name) {
    return DemoSite.asItIs()
        .with(tree -> ((ObjectNode) tree.get("picture")).put("file", name))
        .site();
  }
}
