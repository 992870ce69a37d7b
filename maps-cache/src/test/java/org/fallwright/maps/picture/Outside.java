package org.fallwright.maps.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Arrays;
import org.junit.jupiter.api.Assumptions;

/**
 * Runs a program of the GDAL project as a second opinion. A test that needs one is skipped where it
 * is not installed, and fails there if the environment says {@code FALLWRIGHT_GDAL_NEEDED=true}.
 */
final class Outside {
  private Outside() {}

  /** What it prints. */
  static String run(Path folder, String input, String... command) throws Exception {
    Process p;
    try {
      p = new ProcessBuilder(command).directory(folder.toFile()).redirectErrorStream(true).start();
    } catch (IOException e) {
      assertThat(System.getenv("FALLWRIGHT_GDAL_NEEDED")).as(command[0]).isNotEqualTo("true");
      Assumptions.abort(command[0] + " is not installed");
      throw e;
    }
    try (var in = p.getOutputStream()) {
      in.write(input.getBytes(StandardCharsets.UTF_8));
    }
    String out = new String(p.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    assertThat(p.waitFor()).as(Arrays.toString(command) + "\n" + out).isZero();
    return out;
  }
}
