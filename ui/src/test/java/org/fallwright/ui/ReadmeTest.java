package org.fallwright.ui;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** What the README says is so. */
class ReadmeTest {
  private static final Path TOP = Path.of("..").toAbsolutePath().normalize();

  @Test
  void everyClassOfTheTableIsThere() throws IOException {
    List<String> names =
        Pattern.compile("\\| `(org\\.fallwright\\.[\\w.]+)` \\|")
            .matcher(Files.readString(TOP.resolve("README.md")))
            .results()
            .map(MatchResult::group)
            .map(g -> g.substring(3, g.length() - 3))
            .toList();
    assertThat(names).hasSizeGreaterThan(20);
    for (String name : names) {
      assertThatCode(() -> Class.forName(name, false, getClass().getClassLoader()))
          .as(name)
          .doesNotThrowAnyException();
    }
  }

  @Test
  void theJobComesFirst() throws IOException {
    List<String> lines = Files.readAllLines(TOP.resolve("README.md"));
    assertThat(lines.get(2)).startsWith("Fallwright is an offline desktop planner for arborists");
  }

  @Test
  void everyFileItLinksToIsThere() throws IOException {
    List<String> links =
        Pattern.compile("\\]\\(([^)#:]+)\\)")
            .matcher(Files.readString(TOP.resolve("README.md")))
            .results()
            .map(m -> m.group(1))
            .toList();
    assertThat(links).isNotEmpty();
    assertThat(links).allSatisfy(l -> assertThat(TOP.resolve(l)).exists());
  }

  @Test
  void theTopLevelHoldsNothingElse() throws IOException {
    try (var top = Files.list(TOP)) {
      assertThat(
              top.map(p -> p.getFileName().toString())
                  .filter(n -> !n.startsWith(".") && !n.equals("target")))
          .containsExactlyInAnyOrder(
              "pom.xml", "README.md", "DEVELOPERS.md", "core", "plugins", "ui", "maps-cache");
    }
  }
}
