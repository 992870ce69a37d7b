package org.fallwright.ui.app;

import java.nio.file.Path;
import org.fallwright.core.site.Site;
import org.fallwright.ui.home.SiteMaps;

/**
 * Pictures as tile sets: looked for beside the site file, then among the base maps.
 *
 * @param maps where
 */
public record StoredPictures(SiteMaps maps) implements Wiring.Pictures {
  /** Those of the folders given, in their order. */
  public static StoredPictures in(Path... baseMaps) {
    return new StoredPictures(SiteMaps.in(baseMaps));
  }

  @Override
  public SiteMaps.Opened open(Site site, Path siteFile) {
    return maps.open(site, siteFile);
  }
}
