package org.fallwright.ui.home;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.fallwright.core.site.Picture;
import org.fallwright.core.site.Site;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.store.MapShelf;
import org.fallwright.maps.tiles.LayeredGround;
import org.fallwright.maps.tiles.TileSets;

/**
 * Where the pictures of a site are looked for: beside its file, then on the shelves of base maps.
 *
 * @param shelves first the person's own, last those that come with the program
 */
public record SiteMaps(List<MapShelf> shelves) {
  /**
   * The pictures of a site as far as they could be opened.
   *
   * @param ground what is drawn; null: blank ground
   * @param fault which of them are not drawn and why, in sentences; null: all are, or the site
   *     names none
   */
  public record Opened(LayeredGround ground, String fault) {
    /** A site without pictures. */
    public static final Opened NOTHING = new Opened(null, null);
  }

  public SiteMaps {
    shelves = List.copyOf(shelves);
  }

  /** The shelves in these folders. */
  public static SiteMaps in(Path... folders) {
    return new SiteMaps(List.of(folders).stream().map(MapShelf::new).toList());
  }

  /** The tiles of a base map by its plain name; empty: it is not here. */
  public Optional<Path> find(String name, Path siteFile) throws IOException {
    if (!isPlain(name)) {
      return Optional.empty();
    }
    Path beside = siteFile.toAbsolutePath().resolveSibling(name);
    if (Files.isRegularFile(beside) || Files.isDirectory(beside)) {
      return Optional.of(beside);
    }
    for (MapShelf shelf : shelves) {
      Optional<Path> found = shelf.find(name);
      if (found.isPresent()) {
        return found;
      }
    }
    return Optional.empty();
  }

  /** Opens the pictures of a site; what cannot be opened is told and left out. */
  public Opened open(Site site, Path siteFile) {
    if (site.picture() == null) {
      return Opened.NOTHING;
    }
    List<LayeredGround.Layer> layers = new ArrayList<>();
    List<String> faults = new ArrayList<>();
    for (Picture.Layer l : site.picture().layers()) {
      try {
        Optional<Path> place = find(l.file(), siteFile);
        if (place.isPresent()) {
          layers.add(
              new LayeredGround.Layer(
                  TileSets.open(place.get()), l.shiftEastM(), l.shiftNorthM(), l.opacity()));
        } else {
          faults.add(
              isPlain(l.file())
                  ? "base map " + l.file() + " was not found."
                  : "base map "
                      + l.file()
                      + " is not the plain name of a file beside the site file or among the base"
                      + " maps.");
        }
      } catch (IOException e) {
        faults.add(e.getMessage() + ".");
      }
    }
    if (faults.isEmpty()) {
      return new Opened(new LayeredGround(layers, new SiteFrame(site.origin())), null);
    }
    String words = String.join(" ", faults);
    return layers.isEmpty()
        ? new Opened(null, "Blank ground: " + words)
        : new Opened(
            new LayeredGround(layers, new SiteFrame(site.origin())), "Not drawn: " + words);
  }

  private static boolean isPlain(String name) {
    try {
      Path p = Path.of(name);
      return !p.isAbsolute() && p.getNameCount() == 1 && p.equals(p.getFileName());
    } catch (InvalidPathException e) {
      return false;
    }
  }
}
