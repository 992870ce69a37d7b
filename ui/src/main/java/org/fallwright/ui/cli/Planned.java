package org.fallwright.ui.cli;

import java.io.IOException;
import java.nio.file.Path;
import org.fallwright.core.advice.NotByPulling;
import org.fallwright.core.doubt.DoubtJson;
import org.fallwright.core.doubt.Doubted;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.PlanJson;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.SiteFile;
import org.fallwright.core.store.SiteFileException;
import org.fallwright.plugins.host.PluginFolder;
import org.fallwright.ui.home.Home;
import org.fallwright.ui.sheet.Cautions;
import org.fallwright.ui.sheet.Paper;
import org.fallwright.ui.sheet.SheetFile;
import org.fallwright.ui.sheet.SitePicture;

/**
 * A site with its plan.
 *
 * @param file the site's file
 */
record Planned(Home home, Path file, Site site, Plan plan) {
  /** Reads a site and plans it. */
  static Planned of(Home home, Path file) {
    return of(home, file, read(file));
  }

  static Planned of(Home home, Path file, Site site) {
    try (PluginFolder sources = PluginFolder.open(home.plugins(), home.version())) {
      return new Planned(home, file, site, Doubted.plan(site, sources));
    } catch (IllegalArgumentException e) {
      throw new Refused(file.getFileName() + ": " + e.getMessage());
    }
  }

  static Site read(Path file) {
    try {
      return SiteFile.read(file);
    } catch (SiteFileException e) {
      throw new Refused(e.getMessage());
    }
  }

  byte[] json() {
    try (PluginFolder sources = PluginFolder.open(home.plugins(), home.version())) {
      return PlanJson.write(
          site,
          plan,
          new PlanJson.Header(
              home.version(),
              Cautions.ALWAYS,
              Cautions.LEFT_OUT,
              NotByPulling.of(plan).map(NotByPulling::sentence).orElse(null),
              DoubtJson.of(site, sources, plan)));
    }
  }

  /** The sheet of a setup, as the kind of file that the name's end says. */
  byte[] sheet(int rank, Paper paper, Path out) {
    try (SitePicture picture = SitePicture.open(home, site, file)) {
      SheetFile sheet =
          new SheetFile(
              paper, site, plan, rank, picture.painter(), picture.fault(), home.version());
      return SheetCommand.isPdf(out) ? sheet.pdf() : sheet.png();
    } catch (IOException e) {
      throw new Refused("The sheet cannot be drawn: " + e.getMessage() + ".");
    }
  }
}
