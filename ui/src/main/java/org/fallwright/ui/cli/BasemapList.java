package org.fallwright.ui.cli;

import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.site.Site;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.store.MapShelf;
import org.fallwright.maps.store.Readiness;
import org.fallwright.maps.tiles.About;
import org.fallwright.ui.home.Home;
import org.fallwright.ui.home.SiteMaps;
import org.fallwright.ui.map.PlanPainter;
import org.locationtech.jts.geom.Envelope;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

@Command(
    name = "list",
    description =
        "List the base maps at hand with size, age, date and source; with --site also whether that"
            + " site can do without a signal.")
final class BasemapList extends Subcommand {
  @Option(names = "--site", paramLabel = "SITE", description = "A site file.")
  private Path file;

  BasemapList(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    try {
      int count = 0;
      for (MapShelf shelf : home.maps().shelves()) {
        List<MapShelf.Held> all = shelf.list();
        if (!all.isEmpty()) {
          out().println(shelf.folder());
          all.forEach(this::row);
          count += all.size();
        }
      }
      if (count == 0) {
        out().println("No base map is at hand: sites lie on blank ground.");
      }
      return file == null ? Exit.DONE : ready(Planned.read(file));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private void row(MapShelf.Held h) {
    String age = days(h.changed());
    if (h.about() == null) {
      out().println("  %-32s %9s  %s  %s.".formatted(h.name(), size(h.bytes()), age, h.fault()));
      return;
    }
    About a = h.about();
    out()
        .println(
            String.format(
                Locale.ROOT,
                "  %-32s %9s  %s  %.2f m a pixel, taken %s, %s",
                h.name(),
                size(h.bytes()),
                age,
                a.metresPerPixel(),
                a.taken().isEmpty() ? "on a date not known" : a.taken(),
                a.attribution().isEmpty() ? "source not stated" : a.attribution()));
    if (!h.place().getFileName().toString().equals(h.name())) {
      out().println("  " + " ".repeat(32) + " read in place at " + h.place());
    }
  }

  private int ready(Site site) throws IOException {
    SiteMaps.Opened opened = home.maps().open(site, file);
    if (opened.fault() != null) {
      err().println(opened.fault());
    }
    if (opened.ground() == null) {
      out().println("Ready without signal: no, the site lies on blank ground.");
      return Exit.DONE;
    }
    try (var ground = opened.ground()) {
      Envelope e = PlanPainter.extent(site, null);
      Rectangle2D area =
          new Rectangle2D.Double(e.getMinX(), e.getMinY(), e.getWidth(), e.getHeight());
      Readiness r = Readiness.of(ground, new SiteFrame(site.origin()), area);
      boolean yes = r.ready() && opened.fault() == null;
      out()
          .println(
              String.format(
                  Locale.ROOT,
                  "Ready without signal: %s. %.0f %% of the site is shown to %.1f m a pixel or"
                      + " finer, %.0f %% only coarser, %.0f %% not at all.",
                  yes ? "yes" : "no",
                  Math.floor(100 * r.shown()),
                  Readiness.FINE_M,
                  Math.ceil(100 * r.coarse()),
                  Math.floor(100 * (1 - r.shown() - r.coarse()) + 0.5)));
      if (r.fault() != null) {
        out().println("Damaged: " + r.fault() + ".");
      }
    }
    return Exit.DONE;
  }

  static String size(long bytes) {
    return bytes < 10_000_000
        ? String.format(Locale.ROOT, "%.1f MB", bytes / 1e6)
        : String.format(Locale.ROOT, "%.0f MB", bytes / 1e6);
  }

  private static String days(Instant then) {
    long days = Math.max(0, Duration.between(then, Instant.now()).toDays());
    return "%4d days old".formatted(days);
  }
}
