package org.fallwright.maps.store;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.fallwright.core.units.Range;
import org.fallwright.maps.tiles.About;
import org.fallwright.maps.tiles.TileImage;
import org.fallwright.maps.tiles.TileSets;
import org.fallwright.maps.tiles.TileStore;

/**
 * A folder of base maps. Each is a file in the MBTiles form, a folder of z/x/y pictures, or a note
 * that says where one of those lies on this machine, so that it is read in place: {@code
 * NAME.elsewhere}, a text file of one line, the path.
 *
 * @param folder where they are
 */
public record MapShelf(Path folder) {
  private static final String ELSEWHERE = ".elsewhere";
  private static final String UNFINISHED = ".part";
  private static final int MOST_NAMED = 20;

  /**
   * A base map on the shelf.
   *
   * @param name by which a site names it
   * @param place where its tiles are
   * @param unfinished whether it was begun and not finished
   * @param bytes how much disk it takes
   * @param changed when it came or was last written
   * @param about what it says of itself; null: it cannot be read
   * @param fault why not, one sentence; null: it can
   */
  public record Held(
      String name,
      Path place,
      boolean unfinished,
      long bytes,
      Instant changed,
      About about,
      String fault) {}

  /**
   * What a look at every tile found.
   *
   * @param tiles how many there are
   * @param damaged how many cannot be read
   * @param named the first of them, one line each
   */
  public record Verified(long tiles, long damaged, List<String> named) {}

  public MapShelf {
    Range.present("folder", folder);
  }

  /** All base maps, by name; a folder that is not there holds none. */
  public List<Held> list() throws IOException {
    if (!Files.isDirectory(folder)) {
      return List.of();
    }
    List<Path> paths;
    try (Stream<Path> all = Files.list(folder)) {
      paths =
          all.filter(p -> !p.getFileName().toString().startsWith("."))
              .sorted(Comparator.comparing(p -> p.getFileName().toString()))
              .toList();
    } catch (UncheckedIOException e) {
      throw new IOException("folder " + folder + " cannot be read", e.getCause());
    }
    List<Held> held = new ArrayList<>();
    for (Path p : paths) {
      String name = p.getFileName().toString();
      if (Files.isDirectory(p)
          || name.endsWith(".mbtiles")
          || name.endsWith(ELSEWHERE)
          || name.endsWith(UNFINISHED)) {
        held.add(held(p));
      }
    }
    return held;
  }

  /** Where the tiles of a base map are, by its plain name; empty: not on this shelf. */
  public Optional<Path> find(String name) throws IOException {
    Path plain;
    try {
      plain = Path.of(name);
    } catch (InvalidPathException e) {
      return Optional.empty();
    }
    if (plain.isAbsolute() || plain.getNameCount() != 1 || name.startsWith(".")) {
      return Optional.empty();
    }
    Path here = folder.resolve(plain);
    if (Files.isRegularFile(here) || Files.isDirectory(here)) {
      return Optional.of(here);
    }
    Path note = folder.resolve(name + ELSEWHERE);
    return Files.isRegularFile(note) ? Optional.of(pointed(note)) : Optional.empty();
  }

  /** Notes where a base map lies, so that it is read in place. */
  public void point(String name, Path place) throws IOException {
    Files.createDirectories(folder);
    Files.writeString(
        folder.resolve(name + ELSEWHERE),
        place.toAbsolutePath().normalize() + "\n",
        StandardCharsets.UTF_8);
  }

  /** Reads every tile of a base map. */
  public static Verified verify(Path place) throws IOException {
    long[] count = new long[2];
    List<String> named = new ArrayList<>();
    try (TileStore store = TileSets.open(place)) {
      List<int[]> tiles = new ArrayList<>();
      store.forEach((z, x, y) -> tiles.add(new int[] {z, x, y}));
      for (int[] t : tiles) {
        count[0]++;
        try {
          TileImage.read(store.tile(t[0], t[1], t[2]).orElse(new byte[0]));
        } catch (IOException e) {
          if (++count[1] <= MOST_NAMED) {
            named.add("tile " + t[0] + "/" + t[1] + "/" + t[2] + ": " + e.getMessage());
          }
        }
      }
    }
    return new Verified(count[0], count[1], List.copyOf(named));
  }

  /**
   * Takes a base map off the shelf: deletes its file or folder, or the note of where it lies, but
   * never what lies elsewhere.
   *
   * @return the bytes set free
   */
  public long remove(String name) throws IOException {
    Held held =
        list().stream()
            .filter(h -> h.name.equals(name))
            .findFirst()
            .orElseThrow(() -> new IOException("no base map " + name + " is in " + folder));
    Path note = folder.resolve(name + ELSEWHERE);
    if (Files.isRegularFile(note)) {
      Files.delete(note);
      return 0;
    }
    if (Files.isDirectory(held.place) && held.about == null) {
      throw new IOException("folder " + held.place + " is no base map; it is left alone");
    }
    try (Stream<Path> all = Files.walk(held.place)) {
      for (Path p : all.sorted(Comparator.reverseOrder()).toList()) {
        Files.delete(p);
      }
    } catch (IOException | UncheckedIOException e) {
      throw new IOException("base map " + held.place + " cannot be removed", e);
    }
    return held.bytes;
  }

  private Held held(Path p) throws IOException {
    String file = p.getFileName().toString();
    boolean elsewhere = file.endsWith(ELSEWHERE);
    boolean unfinished = file.endsWith(UNFINISHED);
    String name = elsewhere ? file.substring(0, file.length() - ELSEWHERE.length()) : file;
    Path place = p;
    About about = null;
    String fault = null;
    try {
      place = elsewhere ? pointed(p) : p;
      if (unfinished) {
        fault = "it is not finished; add it again to go on";
      } else {
        try (TileStore store = TileSets.open(place)) {
          about = store.about();
        }
      }
    } catch (IOException e) {
      fault = e.getMessage();
    }
    boolean there = Files.exists(place);
    return new Held(
        name,
        place,
        unfinished,
        there ? bytes(place) : 0,
        Files.getLastModifiedTime(there ? place : p).toInstant(),
        about,
        fault);
  }

  private static Path pointed(Path note) throws IOException {
    try {
      return Path.of(Files.readString(note, StandardCharsets.UTF_8).strip());
    } catch (InvalidPathException e) {
      throw new IOException("note " + note + " does not name a place", e);
    }
  }

  private static long bytes(Path place) throws IOException {
    try (Stream<Path> all = Files.walk(place)) {
      return all.filter(Files::isRegularFile).mapToLong(p -> p.toFile().length()).sum();
    } catch (UncheckedIOException e) {
      throw new IOException("base map " + place + " cannot be read", e.getCause());
    }
  }

  /** The file that a base map of this name is written to; its folder is made. */
  public Path file(String name) throws IOException {
    String plain = name.endsWith(".mbtiles") ? name : name + ".mbtiles";
    if (!Path.of(plain).equals(Path.of(plain).getFileName()) || plain.startsWith(".")) {
      throw new IOException("\"" + name + "\" is not a plain name for a base map");
    }
    try {
      Files.createDirectories(folder);
    } catch (IOException e) {
      throw new IOException("folder " + folder + " cannot be made", e);
    }
    return folder.resolve(plain);
  }
}
