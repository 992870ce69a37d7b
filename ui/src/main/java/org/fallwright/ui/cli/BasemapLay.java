package org.fallwright.ui.cli;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.site.Picture;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.SiteFile;
import org.fallwright.core.store.SiteFileException;
import org.fallwright.maps.tiles.About;
import org.fallwright.maps.tiles.TileSets;
import org.fallwright.maps.tiles.TileStore;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(
    name = "lay",
    description =
        "Lay a base map under a site, or over the pictures it has; the file is written again.")
final class BasemapLay extends Subcommand {
  @Parameters(index = "0", paramLabel = "SITE", description = "The site file.")
  private Path file;

  @Parameters(index = "1", paramLabel = "NAME", description = "Name of a base map.")
  private String name;

  @Option(
      names = "--over",
      description = "Over the pictures the site has; without it, in their place.")
  private boolean over;

  @Option(
      names = "--opacity",
      defaultValue = "1",
      description = "0, not seen, to 1, covering what lies under it (${DEFAULT-VALUE}).")
  private double opacity;

  BasemapLay(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    Site site = Planned.read(file);
    try {
      Path place =
          home.maps()
              .find(name, file)
              .orElseThrow(() -> new Refused("No base map " + name + " is at hand."));
      About about;
      try (TileStore store = TileSets.open(place)) {
        about = store.about();
      }
      List<Picture.Layer> layers = new ArrayList<>();
      if (over && site.picture() != null) {
        layers.addAll(site.picture().layers());
        layers.removeIf(l -> l.file().equals(name));
      }
      layers.add(
          new Picture.Layer(
              name,
              about.taken().isEmpty() ? null : about.taken(),
              about.attribution().isEmpty() ? about.name() : about.attribution(),
              0,
              0,
              opacity));
      write(site.withPicture(Picture.of(layers)), file);
      out()
          .println(file + ": " + layers.size() + (layers.size() == 1 ? " picture." : " pictures."));
      return Exit.DONE;
    } catch (IllegalArgumentException e) {
      throw new Refused(e.getMessage() + ".");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static void write(Site site, Path file) {
    try {
      SiteFile.write(site, file);
    } catch (SiteFileException e) {
      throw new Refused(e.getMessage());
    }
  }
}
