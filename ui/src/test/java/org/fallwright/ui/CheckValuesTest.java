package org.fallwright.ui;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.fallwright.core.outside.CheckValue;
import org.junit.jupiter.api.Test;

/**
 * Gathers every figure from outside that the tests of the modules before this one have met, and
 * writes them as one page, {@code target/check-values.md}.
 */
class CheckValuesTest {
  private static final Path PAGE = Path.of("target", "check-values.md");
  private static final List<Path> MODULES =
      Stream.of(
              "core",
              "maps-cache",
              "plugins/hand-line",
              "plugins/vehicle",
              "plugins/winch",
              "plugins/block-system")
          .map(m -> Path.of("..", m))
          .toList();

  /**
   * A row as recorded.
   *
   * @param module folder of the module
   * @param cells its cells, in the order of {@link CheckValue#COLUMNS}
   */
  private record Row(String module, List<String> cells) {
    String kind() {
      return cells.get(0);
    }

    String source() {
      return cells.get(1);
    }
  }

  @Test
  void onePageHoldsThemAll() throws IOException {
    List<Row> rows = new ArrayList<>();
    for (Path module : MODULES) {
      rows.addAll(rows(module));
    }
    assertThat(rows)
        .allSatisfy(
            r -> {
              assertThat(r.cells()).as("%s", r).hasSameSizeAs(CheckValue.COLUMNS);
              assertThat(r.source()).as("%s", r).isNotBlank();
            });
    assertThat(rows)
        .filteredOn(r -> r.module().endsWith("core") && r.kind().equals("PUBLISHED"))
        .as("run the tests of the core first")
        .hasSizeGreaterThanOrEqualTo(200);
    Files.writeString(PAGE, page(rows));
  }

  /** Rows of test classes that are still there. */
  private static List<Row> rows(Path module) throws IOException {
    Path folder = module.resolve(CheckValue.FOLDER);
    assertThat(folder).as("run the tests of %s first", module).isDirectory();
    List<Row> rows = new ArrayList<>();
    try (Stream<Path> files = Files.list(folder)) {
      for (Path file : files.sorted().toList()) {
        String test = file.getFileName().toString().replaceAll("\\.tsv$", "");
        Path compiled =
            module.resolve("target/test-classes").resolve(test.replace('.', '/') + ".class");
        if (Files.exists(compiled)) {
          Files.readAllLines(file)
              .forEach(l -> rows.add(new Row(module.toString(), List.of(l.split("\t", -1)))));
        }
      }
    }
    return rows;
  }

  private static String page(List<Row> rows) {
    StringBuilder page = new StringBuilder();
    page.append("# Figures from outside, and ours\n\n")
        .append(
            "Every row was met in this build. Figures of the project's own models are not among")
        .append(" them.\nPUBLISHED: printed in the source. WORKED: worked by hand from what the")
        .append(" source prints.\nFROM_MEMORY: ascribed to it from memory, the source not read.\n")
        .append("A tolerance \"not above\" or \"not below\" is that of ours.\n");
    count(page, "kind", rows.stream().collect(counting(Row::kind)));
    count(page, "source", rows.stream().collect(counting(Row::source)));
    page.append("\n## Rows\n\n| ")
        .append(String.join(" | ", CheckValue.COLUMNS))
        .append(" |\n|")
        .append("---|".repeat(CheckValue.COLUMNS.size()))
        .append('\n');
    rows.stream()
        .map(Row::cells)
        .sorted(
            Comparator.<List<String>, String>comparing(c -> c.get(1))
                .thenComparing(c -> c.get(2))
                .thenComparing(c -> String.join("\t", c)))
        .forEach(c -> page.append("| ").append(String.join(" | ", c)).append(" |\n"));
    return page.toString();
  }

  private static java.util.stream.Collector<Row, ?, Map<String, Long>> counting(
      java.util.function.Function<Row, String> by) {
    return Collectors.groupingBy(by, TreeMap::new, Collectors.counting());
  }

  private static void count(StringBuilder page, String by, Map<String, Long> counts) {
    page.append("\n| ").append(by).append(" | rows |\n|---|---|\n");
    counts.forEach((k, n) -> page.append("| ").append(k).append(" | ").append(n).append(" |\n"));
    long all = counts.values().stream().mapToLong(n -> n).sum();
    page.append("| all | ").append(all).append(" |\n");
  }
}
