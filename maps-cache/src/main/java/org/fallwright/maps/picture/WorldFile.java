package org.fallwright.maps.picture;

import java.awt.geom.AffineTransform;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

/**
 * The six lines beside a picture that lay its pixels on a coordinate system: x per column, y per
 * column, x per row, y per row, and x and y of the middle of the upper left pixel. They do not say
 * which system.
 *
 * <p>Source: the world file convention as the Library of Congress describes it (Sustainability of
 * Digital Formats, ESRI World File).
 */
public final class WorldFile {
  private WorldFile() {}

  /** The world file beside a picture: {@code .pgw} for {@code .png} and so on, or {@code .wld}. */
  public static Optional<Path> beside(Path picture) {
    String name = picture.getFileName().toString();
    int dot = name.lastIndexOf('.');
    if (dot < 0) {
      return Optional.empty();
    }
    String stem = name.substring(0, dot + 1);
    String end = name.substring(dot + 1).toLowerCase(Locale.ROOT);
    Set<String> ends = new LinkedHashSet<>();
    if (end.length() >= 3) {
      ends.add("" + end.charAt(0) + end.charAt(end.length() - 1) + "w");
    }
    ends.add(end + "w");
    ends.add("wld");
    return ends.stream()
        .flatMap(e -> List.of(stem + e, stem + e.toUpperCase(Locale.ROOT)).stream())
        .map(picture::resolveSibling)
        .filter(Files::isRegularFile)
        .findFirst();
  }

  /**
   * Reads one.
   *
   * @return from pixels, counted from the corner, to the system's x and y
   */
  public static AffineTransform read(Path file) throws IOException {
    List<String> lines =
        Files.readString(file, StandardCharsets.ISO_8859_1)
            .lines()
            .map(String::trim)
            .filter(l -> !l.isEmpty())
            .toList();
    if (lines.size() < 6) {
      throw new IOException(
          "world file " + file + " has " + lines.size() + " numbers; it must have six");
    }
    double[] v = new double[6];
    for (int i = 0; i < 6; i++) {
      try {
        v[i] = Double.parseDouble(lines.get(i));
      } catch (NumberFormatException e) {
        throw new IOException(
            "world file "
                + file
                + ", line "
                + (i + 1)
                + ": \""
                + lines.get(i)
                + "\" is not a number",
            e);
      }
      if (!Double.isFinite(v[i])) {
        throw new IOException("world file " + file + ", line " + (i + 1) + " is not a number");
      }
    }
    AffineTransform t = new AffineTransform(v);
    if (t.getDeterminant() == 0) {
      throw new IOException("world file " + file + " gives the picture's pixels no size");
    }
    t.translate(-0.5, -0.5);
    return t;
  }
}
