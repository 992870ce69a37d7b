package org.fallwright.core.store;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/** Texts that the tests of this package read. */
final class Samples {
  private static final Path DEMO = Path.of("../ui/demo/oak-behind-the-house.fallsite.json");

  private Samples() {}

  /** The frozen file of form 1; it must never be changed. */
  static String formOne() throws IOException {
    return resource("frozen-1.fallsite.json");
  }

  /** A file of the present form with something of everything. */
  static String present() throws IOException {
    return resource("sample-2.fallsite.json");
  }

  static String demo() throws IOException {
    return Files.readString(DEMO);
  }

  static String resource(String name) throws IOException {
    try (InputStream in = Samples.class.getResourceAsStream(name)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    }
  }

  static byte[] utf8(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }
}
