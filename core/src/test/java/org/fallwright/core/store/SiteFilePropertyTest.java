package org.fallwright.core.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.stream.LongStream;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Laws of the site file on random sites; a failure names the seed. */
class SiteFilePropertyTest {
  static LongStream seeds() {
    return LongStream.range(1, 101);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void savingAndLoadingIsAnIdentity(long seed) throws IOException {
    Site site = new RandomSites(seed).site();
    byte[] bytes = SiteFile.bytes(site);
    Site again = SiteFile.read(bytes, "seed " + seed);
    assertThat(again).as("seed %d", seed).isEqualTo(site);
    assertThat(SiteFile.bytes(again)).as("seed %d", seed).isEqualTo(bytes);
    assertThat(SiteFile.bytes(new RandomSites(seed).site())).as("seed %d", seed).isEqualTo(bytes);
  }

  @Test
  void theSameHoldsThroughTheDisk(@TempDir Path folder) throws IOException {
    Path file = folder.resolve("job" + SiteFile.EXTENSION);
    for (long seed = 1; seed <= 10; seed++) {
      Site site = new RandomSites(seed).site();
      SiteFile.write(site, file);
      assertThat(SiteFile.read(file)).as("seed %d", seed).isEqualTo(site);
    }
  }
}
