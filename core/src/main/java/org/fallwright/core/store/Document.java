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
import java.util.Map;
import java.util.UUID;
import java.util.function.UnaryOperator;

/**
 * A kind of document: how its files (JSON, UTF-8) are read and written. The same content always
 * gives the same bytes, and what has been written reads back as the same content.
 *
 * @param <T> record that holds the content
 * @param type the same
 * @param noun what the content is called
 * @param present the form that is written; newer ones are refused
 * @param lift brings a tree of an older form to the present one
 */
record Document<T>(Class<T> type, String noun, int present, UnaryOperator<JsonNode> lift) {
  /** A field by which each kind of content is known from the others. */
  static final Map<String, String> MARKS = Map.of("site", "tree", "kit", "trucks");

  /** Largest file that is read [bytes]. */
  static final int LARGEST = 20_000_000;

  /** What its file is called. */
  String file() {
    return noun + " file";
  }

  /**
   * Reads a file.
   *
   * @throws SiteFileException with one sentence that names the file, the field, the value and the
   *     limit
   */
  T read(Path file) throws SiteFileException {
    String name = nameOf(file);
    if (Files.isDirectory(file)) {
      throw new SiteFileException(name + " is a folder, not a " + file() + ".");
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
  T read(InputStream in, String name) throws SiteFileException {
    try {
      return read(in.readNBytes(LARGEST + 1), name);
    } catch (SiteFileException e) {
      throw e;
    } catch (IOException e) {
      throw new SiteFileException(name + " cannot be read: " + reason(e) + ".", e);
    }
  }

  /** As {@link #read(Path)}, from bytes; {@code name} is for messages. */
  T read(byte[] bytes, String name) throws SiteFileException {
    if (bytes.length > LARGEST) {
      throw new SiteFileException(
          name
              + " is too large for a "
              + file()
              + "; at most "
              + LARGEST / 1_000_000
              + " MB are read.");
    }
    JsonNode root = lift.apply(Tree.parse(text(bytes, name), name, this));
    return new Binding<>(this, name).bind(root);
  }

  /**
   * Writes content so that the file holds either the old content or the new, whole: the bytes go to
   * a file beside it that then takes its place.
   *
   * @throws SiteFileException with one sentence; the old file is then untouched
   */
  void write(T content, Path file) throws SiteFileException {
    String name = nameOf(file);
    byte[] bytes;
    try {
      bytes = bytes(content);
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
   * The bytes of a file.
   *
   * @throws IllegalArgumentException if a plugin's parameters hold what JSON cannot
   */
  byte[] bytes(T content) {
    try {
      byte[] body = SiteJson.WRITER.writeValueAsBytes(content);
      byte[] line = Arrays.copyOf(body, body.length + 1);
      line[body.length] = '\n';
      return line;
    } catch (JsonProcessingException e) {
      throw new IllegalArgumentException("a plugin's parameters hold what is not JSON", e);
    }
  }

  private String text(byte[] bytes, String name) throws SiteFileException {
    try {
      String text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
      return text.startsWith("\uFEFF") ? text.substring(1) : text;
    } catch (CharacterCodingException e) {
      throw new SiteFileException(name + " is not UTF-8 text; a " + file() + " must be.", e);
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
