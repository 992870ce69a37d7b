package org.fallwright.ui.cli;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.UUID;

/** Writes files whole or not at all: beside their place first, then into it. */
final class WholeFile {
  private WholeFile() {}

  /**
   * @throws Refused one sentence; what was there before is then untouched
   */
  static void write(Path file, byte[] bytes) {
    if (Files.isDirectory(file)) {
      throw new Refused(file + " cannot be written: it is a folder.");
    }
    Path target = file.toAbsolutePath();
    Path beside = target.resolveSibling("." + target.getFileName() + "." + UUID.randomUUID());
    try {
      Files.write(beside, bytes);
      try {
        Files.move(
            beside, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
      } catch (AtomicMoveNotSupportedException e) {
        Files.move(beside, target, StandardCopyOption.REPLACE_EXISTING);
      }
    } catch (IOException e) {
      discard(beside);
      throw new Refused(file + " cannot be written: " + reason(e, target) + ".");
    }
  }

  private static String reason(IOException e, Path target) {
    if (e instanceof NoSuchFileException || !Files.isDirectory(target.getParent())) {
      return "the folder " + target.getParent() + " is not there";
    }
    if (e instanceof AccessDeniedException) {
      return "that is not allowed here";
    }
    return e.getMessage();
  }

  private static void discard(Path beside) {
    try {
      Files.deleteIfExists(beside);
    } catch (IOException e) {
      // the sentence about the file itself says enough
      return;
    }
  }
}
