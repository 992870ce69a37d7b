package org.fallwright.maps.tiles;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Optional;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.IntConsumer;
import org.fallwright.core.units.Range;
import org.fallwright.maps.frame.WebMercator;

/**
 * A tile set in a folder, one picture file a tile: {@code zoom/x/y.png}, {@code .jpg} or {@code
 * .jpeg}, Web Mercator, read in place and never changed.
 *
 * <p>y is counted from the north, unless {@code metadata.json} says {@code "scheme": "tms"} or the
 * folder holds a {@code tilemapresource.xml}, which goes with rows counted from the south. Name,
 * attribution, date and description are taken from {@code metadata.json} where it has them.
 */
public final class FolderTiles implements TileStore {
  private static final String[] ENDS = {".png", ".jpg", ".jpeg"};

  private final Path folder;
  private final boolean fromSouth;
  private final About about;

  private FolderTiles(Path folder) throws IOException {
    this.folder = folder;
    Path file = folder.resolve("metadata.json");
    JsonNode stated = new ObjectMapper().createObjectNode();
    if (Files.isRegularFile(file)) {
      try {
        stated = new ObjectMapper().readTree(file.toFile());
      } catch (com.fasterxml.jackson.core.JsonProcessingException e) {
        throw new IOException("base map " + folder + ": its metadata.json is not JSON", e);
      }
    }
    String scheme = stated.path("scheme").asText("");
    Path xml = folder.resolve("tilemapresource.xml");
    this.fromSouth = scheme.isEmpty() ? Files.isRegularFile(xml) : scheme.equals("tms");
    if (scheme.isEmpty() && fromSouth && !Files.readString(xml).contains("mercator")) {
      throw new IOException(
          "base map " + folder + " is not cut in Web Mercator tiles, as its resource file says");
    }
    TreeMap<Integer, TreeSet<Integer>> columns = new TreeMap<>();
    for (int zoom : numbers(folder)) {
      TreeSet<Integer> x =
          zoom > WebMercator.DEEPEST ? new TreeSet<>() : numbers(folder.resolve("" + zoom));
      if (!x.isEmpty()) {
        columns.put(zoom, x);
      }
    }
    if (columns.isEmpty()) {
      throw new IOException(
          "folder " + folder + " is no tile set: it holds no zoom/x/y pictures to zoom 22");
    }
    this.about =
        new About(
            stated.path("name").asText(folder.getFileName().toString()),
            stated.path("attribution").asText(""),
            stated.path("date").asText(""),
            stated.path("description").asText(""),
            bounds(columns.lastKey(), columns.lastEntry().getValue()),
            columns.firstKey(),
            columns.lastKey());
  }

  /**
   * Opens a folder.
   *
   * @throws IOException one sentence naming it, if it holds no tiles or cannot be read
   */
  public static FolderTiles open(Path folder) throws IOException {
    try {
      return new FolderTiles(folder.toAbsolutePath().normalize());
    } catch (IllegalArgumentException e) {
      throw new IOException("base map " + folder + " cannot be used: " + e.getMessage(), e);
    } catch (UncheckedIOException e) {
      throw new IOException("base map " + folder + " cannot be read", e.getCause());
    }
  }

  @Override
  public About about() {
    return about;
  }

  @Override
  public Optional<byte[]> tile(int zoom, int x, int y) throws IOException {
    int across = WebMercator.tilesAcross(zoom);
    Range.check("tile x", x, 0, across - 1.0, "");
    Range.check("tile y", y, 0, across - 1.0, "");
    Path column = folder.resolve(zoom + "/" + x);
    int row = fromSouth ? across - 1 - y : y;
    for (String end : ENDS) {
      Path file = column.resolve(row + end);
      if (Files.isRegularFile(file)) {
        try {
          return Optional.of(Files.readAllBytes(file));
        } catch (IOException e) {
          throw new IOException("base map tile " + file + " cannot be read", e);
        }
      }
    }
    return Optional.empty();
  }

  @Override
  public void forEach(Each each) throws IOException {
    for (int zoom : numbers(folder)) {
      if (zoom <= WebMercator.DEEPEST) {
        for (int x : numbers(folder.resolve("" + zoom))) {
          for (int row : numbers(folder.resolve(zoom + "/" + x))) {
            int across = WebMercator.tilesAcross(zoom);
            if (x < across && row < across) {
              each.tile(zoom, x, fromSouth ? across - 1 - row : row);
            }
          }
        }
      }
    }
  }

  @Override
  public void close() {
    // nothing is held open
  }

  private Bounds bounds(int zoom, TreeSet<Integer> columns) throws IOException {
    int across = WebMercator.tilesAcross(zoom);
    int[] rows = {Integer.MAX_VALUE, Integer.MIN_VALUE};
    IntConsumer add =
        row -> {
          rows[0] = Math.min(rows[0], row);
          rows[1] = Math.max(rows[1], row);
        };
    for (int x : columns) {
      numbers(folder.resolve(zoom + "/" + x)).forEach(add::accept);
    }
    if (rows[0] > rows[1]) {
      throw new IOException("folder " + folder + " holds no pictures at its finest zoom " + zoom);
    }
    int north = fromSouth ? across - 1 - rows[1] : rows[0];
    int south = fromSouth ? across - 1 - rows[0] : rows[1];
    return Bounds.ofTiles(zoom, columns.first(), north, columns.last(), south);
  }

  /** The whole numbers among the names in a folder, the ends of picture files left out. */
  private static TreeSet<Integer> numbers(Path in) throws IOException {
    TreeSet<Integer> found = new TreeSet<>();
    if (!Files.isDirectory(in)) {
      return found;
    }
    try (DirectoryStream<Path> names = Files.newDirectoryStream(in)) {
      for (Path p : names) {
        String name = p.getFileName().toString();
        String stem =
            Arrays.stream(ENDS)
                .filter(name::endsWith)
                .findFirst()
                .map(end -> name.substring(0, name.length() - end.length()))
                .orElse(name);
        if (stem.matches("\\d{1,7}")) {
          found.add(Integer.parseInt(stem));
        }
      }
    }
    return found;
  }
}
