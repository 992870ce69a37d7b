package org.fallwright.ui.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.fallwright.core.kit.Kit;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.LeftBehind;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.KitFile;
import org.fallwright.core.store.SiteFileException;

/** Kits as the commands find and use them. */
final class Kits {
  private Kits() {}

  static Kit read(Path file) {
    try {
      return KitFile.read(file);
    } catch (SiteFileException e) {
      throw new Refused(e.getMessage());
    }
  }

  /** The kit that a site names; empty where it names none, or its file is not beside the site's. */
  static Optional<Kit> of(Site site, Path siteFile) {
    try {
      return KitFile.beside(site, siteFile);
    } catch (SiteFileException e) {
      throw new Refused(e.getMessage());
    }
  }

  /** The site with more things left behind. */
  static Site without(Site site, Path siteFile, List<String> items) {
    Site left = site;
    for (String item : items) {
      String where = of(site, siteFile).flatMap(k -> k.trucksOf(item)).orElse(null);
      try {
        left = left.leaving(new LeftBehind(item, where));
      } catch (IllegalArgumentException e) {
        throw new Refused(
            "--without names \""
                + item
                + "\"; the gear holds "
                + String.join(", ", site.gear().items().stream().map(Gear.Item::id).toList())
                + ".");
      }
    }
    return left;
  }
}
