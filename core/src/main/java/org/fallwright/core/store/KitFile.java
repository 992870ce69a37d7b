package org.fallwright.core.store;

import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.fallwright.core.kit.Kit;
import org.fallwright.core.site.Site;

/**
 * Reads and writes the kit file (JSON, UTF-8), by the same rules as {@link SiteFile}. The same kit
 * always gives the same bytes, and what has been written reads back as the same kit.
 */
public final class KitFile {
  /** What the name of a kit file ends in. */
  public static final String EXTENSION = ".fallkit.json";

  private static final Document<Kit> KIT =
      new Document<>(Kit.class, "kit", Kit.VERSION, UnaryOperator.identity());

  private KitFile() {}

  /**
   * Reads a kit.
   *
   * @throws SiteFileException with one sentence that names the file, the field, the value and the
   *     limit
   */
  public static Kit read(Path file) throws SiteFileException {
    return KIT.read(file);
  }

  /**
   * The kit that a site names, where its file lies beside the site's; else empty.
   *
   * @throws SiteFileException where it is there and cannot be read
   */
  public static Optional<Kit> beside(Site site, Path siteFile) throws SiteFileException {
    if (site.kit() == null) {
      return Optional.empty();
    }
    Path file;
    try {
      file = siteFile.toAbsolutePath().resolveSibling(site.kit());
    } catch (InvalidPathException e) {
      return Optional.empty();
    }
    return Files.isRegularFile(file) ? Optional.of(read(file)) : Optional.empty();
  }

  /** As {@link #read(Path)}, from bytes; {@code name} is for messages. */
  public static Kit read(byte[] bytes, String name) throws SiteFileException {
    return KIT.read(bytes, name);
  }

  /**
   * Writes a kit so that the file holds either the old kit or the new one, whole.
   *
   * @throws SiteFileException with one sentence; the old file is then untouched
   */
  public static void write(Kit kit, Path file) throws SiteFileException {
    KIT.write(kit, file);
  }

  /**
   * The bytes of a kit's file.
   *
   * @throws IllegalArgumentException if a plugin's parameters hold what JSON cannot
   */
  public static byte[] bytes(Kit kit) {
    return KIT.bytes(kit);
  }
}
