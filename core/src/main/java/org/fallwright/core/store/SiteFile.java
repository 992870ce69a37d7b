package org.fallwright.core.store;

import java.io.InputStream;
import java.nio.file.Path;
import org.fallwright.core.site.Site;

/**
 * Reads and writes the site file (JSON, UTF-8). The same site always gives the same bytes, and what
 * has been written reads back as the same site.
 */
public final class SiteFile {
  /** What the name of a site file ends in. */
  public static final String EXTENSION = ".fallsite.json";

  /** Largest file that is read [bytes]. */
  public static final int LARGEST = Document.LARGEST;

  private static final Document<Site> SITE =
      new Document<>(Site.class, "site", Site.VERSION, Migrations::toPresent);

  private SiteFile() {}

  /**
   * Reads a site.
   *
   * @throws SiteFileException with one sentence that names the file, the field, the value and the
   *     limit
   */
  public static Site read(Path file) throws SiteFileException {
    return SITE.read(file);
  }

  /** As {@link #read(Path)}, from a stream that the caller closes; {@code name} is for messages. */
  public static Site read(InputStream in, String name) throws SiteFileException {
    return SITE.read(in, name);
  }

  /** As {@link #read(Path)}, from bytes; {@code name} is for messages. */
  public static Site read(byte[] bytes, String name) throws SiteFileException {
    return SITE.read(bytes, name);
  }

  /**
   * Writes a site so that the file holds either the old site or the new one, whole: the bytes go to
   * a file beside it that then takes its place.
   *
   * @throws SiteFileException with one sentence; the old file is then untouched
   */
  public static void write(Site site, Path file) throws SiteFileException {
    SITE.write(site, file);
  }

  /**
   * The bytes of a site's file.
   *
   * @throws IllegalArgumentException if a plugin's parameters hold what JSON cannot
   */
  public static byte[] bytes(Site site) {
    return SITE.bytes(site);
  }
}
