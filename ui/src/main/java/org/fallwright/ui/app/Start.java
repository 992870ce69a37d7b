package org.fallwright.ui.app;

import java.nio.file.Files;
import java.nio.file.Path;
import javax.swing.SwingUtilities;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.store.SiteFile;
import org.fallwright.ui.home.Home;

/** Opens the desktop with the planner, the site reader and the base maps of an installation. */
public final class Start {
  private Start() {}

  /**
   * Opens the window; returns at once.
   *
   * @param sources the pull sources
   * @param demo the demonstration's site file; left out where it is not there
   * @param baseMaps folder of the base maps
   * @param site the site file to open; null: none
   */
  public static void open(PullSources sources, Path demo, Path baseMaps, Path site) {
    Wiring wiring =
        new Wiring(
            new CorePlanning(sources),
            SiteFile::read,
            StoredPictures.in(Home.ownMaps(), baseMaps),
            demo != null && Files.isRegularFile(demo) ? demo : null);
    SwingUtilities.invokeLater(
        () -> {
          Look.DAY.use();
          MainWindow window = new MainWindow(wiring, Look.DAY);
          window.setVisible(true);
          if (site != null) {
            window.open(site);
          }
        });
  }
}
