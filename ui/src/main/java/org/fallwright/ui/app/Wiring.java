package org.fallwright.ui.app;

import java.io.IOException;
import java.nio.file.Path;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.SiteFile;
import org.fallwright.ui.home.SiteMaps;
import org.fallwright.ui.task.Planning;

/**
 * What the window is given.
 *
 * @param planning plans a site
 * @param sites reads and writes a site file
 * @param pictures finds the picture under the plan
 * @param demo the demonstration site's file; null: none at hand
 */
public record Wiring(Planning planning, Sites sites, Pictures pictures, Path demo) {
  /** Reads and writes a site file; called off the event thread. */
  @FunctionalInterface
  public interface Sites {
    /**
     * @throws IOException with one sentence for the person at the screen
     */
    Site read(Path file) throws IOException;

    /**
     * Writes a site file, whole.
     *
     * @throws IOException with one sentence for the person at the screen
     */
    default void write(Site site, Path file) throws IOException {
      SiteFile.write(site, file);
    }
  }

  /** Finds the tiles of the picture that a site names; called off the event thread. */
  @FunctionalInterface
  public interface Pictures {
    /** The tiles of all that could be opened, and what could not. */
    SiteMaps.Opened open(Site site, Path siteFile);
  }
}
