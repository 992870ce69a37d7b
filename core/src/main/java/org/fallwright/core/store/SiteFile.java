package org.fallwright.core.store;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.Arrays;
import java.util.UUID;
import org.fallwright.core.site.Site;

/**
 * Reads and writes the site file (JSON, UTF-8). The same site always gives the same bytes, and what
 * has been written reads back as the same site.
 */
public final class SiteFile {
  /** What the name of a site file ends in. */
  public static final String EXTENSION = ".fallsite.json";

  /** Largest file that is read [bytes]. */
  public static final int LARGEST = 20_000_000;

  private SiteFile() {}

  /**
   * Reads a site.
   *
   * @throws SiteFileException with one sentence that names the file, the field, the value and the
   *     limit
   */
  public static Site read(Path file) throws SiteFileException {
    String name = nameOf(file);
    if (Files.isDirectory(file)) {
      throw new SiteFileException(name + " is a folder, not a site file.");
    }
    try (InputStream in = Files.newInputStream(file)) {
      return read(in, name);
    } catch (SiteFileException e) {
      throw e;
    } catch (IOException e) {
      throw new SiteFileException(name + " cannot be read: " + reason(e) + ".", e);
    }
  }

  /** As {@link #read(Path)}, from a stream that the caller closes; {@code name} is for messages. */
  public static Site read(InputStream in, String name) throws SiteFileException {
    try {
      return read(in.readNBytes(LARGEST + 1), name);
    } catch (SiteFileException e) {
      throw e;
    } catch (IOException e) {
      throw new SiteFileException(name + " cannot be read: " + reason(e) + ".", e);
    }
  }

  /** As {@link #read(Path)}, from bytes; {@code name} is for messages. */
  public static Site read(byte[] bytes, String name) throws SiteFileException {
    if (bytes.length > LARGEST) {
      throw new SiteFileException(
          name + " is too large for a site file; at most " + LARGEST / 1_000_000 + " MB are read.");
    }
    JsonNode root = Migrations.toPresent(Tree.parse(text(bytes, name), name));
    return Binding.site(root, name);
  }

  /**
   * Writes a site so that the file holds either the old site or the new one, whole: the bytes go to
   * a file beside it that then takes its place.
   *
   * @throws SiteFileException with one sentence; the old file is then untouched
   */
  public static void write(Site site, Path file) throws SiteFileException {
    String name = nameOf(file);
    byte[] bytes;
    try {
      bytes = bytes(site);
    } catch (IllegalArgumentException e) {
      throw new SiteFileException(name + " cannot be written: " + e.getMessage() + ".", e);
    }
    read(bytes, name);
    Path beside = null;
    try {
      Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
      beside = target.resolveSibling("." + name + "." + UUID.randomUUID() + ".tmp");
      try (FileChannel out =
          FileChannel.open(beside, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
        ByteBuffer rest = ByteBuffer.wrap(bytes);
        while (rest.hasRemaining()) {
          out.write(rest);
        }
        out.force(true);
      }
      Files.move(
          beside, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    } catch (IOException e) {
      discard(beside, e);
      throw new SiteFileException(name + " cannot be written: " + reason(e) + ".", e);
    }
  }

  /**
   * The bytes of a site's file.
   *
   * @throws IllegalArgumentException if a plugin's parameters hold what JSON cannot
   */
  public static byte[] bytes(Site site) {
    try {
      byte[] body = SiteJson.WRITER.writeValueAsBytes(site);
      byte[] line = Arrays.copyOf(body, body.length + 1);
      line[body.length] = '\n';
      return line;
    } catch (JsonProcessingException e) {
      throw new IllegalArgumentException("a plugin's parameters hold what is not JSON", e);
    }
  }

  private static String text(byte[] bytes, String name) throws SiteFileException {
    try {
      String text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
      return text.startsWith("\uFEFF") ? text.substring(1) : text;
    } catch (CharacterCodingException e) {
      throw new SiteFileException(name + " is not UTF-8 text; a site file must be.", e);
    }
  }

  private static String nameOf(Path file) {
    return file.getFileName() == null ? file.toString() : file.getFileName().toString();
  }

  private static void discard(Path beside, IOException e) {
    try {
      if (beside != null) {
        Files.deleteIfExists(beside);
      }
    } catch (IOException left) {
      e.addSuppressed(left);
    }
  }

  private static String reason(IOException e) {
    if (e instanceof NoSuchFileException) {
      return "there is no such file or folder";
    }
    if (e instanceof AccessDeniedException) {
      return "this user is not allowed to";
    }
    if (e instanceof NotDirectoryException) {
      return "its folder is not a folder";
    }
    return "the disk or the network reported a fault";
  }
}
