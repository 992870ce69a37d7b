package org.fallwright.plugins.api;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import javax.tools.Diagnostic;
import javax.tools.DiagnosticCollector;
import javax.tools.JavaCompiler;
import javax.tools.JavaFileObject;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Who writes a plugin has nothing but the contract's comments: none is missing, none is broken. */
class ContractJavadocTest {
  private static final String SOURCES = "src/main/java/org/fallwright/";

  /** Its components are described where the record begins, and asked for there. */
  private static final Pattern COMPACT_CONSTRUCTOR = Pattern.compile("\\s*public \\w+ \\{");

  @TempDir private Path classes;

  @Test
  void whatAPullSourceMustAnswerIsDescribed() throws IOException {
    assertThat(complaints(Path.of("../../core", SOURCES, "core/pull"))).isEmpty();
  }

  @Test
  void whatAPluginBuildsOnIsDescribed() throws IOException {
    assertThat(complaints(Path.of(SOURCES, "plugins/api"))).isEmpty();
  }

  @Test
  void aMissingCommentIsFound(@TempDir Path folder) throws IOException {
    Files.writeString(
        folder.resolve("Rope.java"),
        """
        /**
         * A rope.
         *
         * @param lengthM its length [m]
         */
        public record Rope(double lengthM, double massKg) {
          public Rope {}

          /** Twice as long. */
          public Rope doubled() {
            return new Rope(2 * lengthM, 2 * massKg);
          }

          /** Kinds. */
          public enum Kind { TWISTED }
        }
        """);

    assertThat(complaints(folder))
        .extracting(c -> c.split(": ")[0])
        .containsExactlyInAnyOrder("Rope.java:6", "Rope.java:7", "Rope.java:10", "Rope.java:15");
  }

  private List<String> complaints(Path folder) throws IOException {
    JavaCompiler javac = ToolProvider.getSystemJavaCompiler();
    DiagnosticCollector<JavaFileObject> found = new DiagnosticCollector<>();
    try (StandardJavaFileManager files = javac.getStandardFileManager(found, null, null);
        Stream<Path> in = Files.list(folder)) {
      List<Path> sources = in.filter(p -> p.toString().endsWith(".java")).sorted().toList();
      assertThat(sources).isNotEmpty();
      javac
          .getTask(
              null,
              files,
              found,
              List.of(
                  "-proc:none",
                  "-Xdoclint:all/public",
                  "-Xmaxwarns",
                  "1000",
                  "-d",
                  classes.toString()),
              null,
              files.getJavaFileObjectsFromPaths(sources))
          .call();
    }
    return found.getDiagnostics().stream()
        .filter(d -> !repeatsTheRecord(d))
        .map(ContractJavadocTest::told)
        .toList();
  }

  private static boolean repeatsTheRecord(Diagnostic<? extends JavaFileObject> d) {
    return d.getSource() != null
        && d.getMessage(null).contains("@param")
        && COMPACT_CONSTRUCTOR.matcher(line(d)).matches();
  }

  private static String line(Diagnostic<? extends JavaFileObject> d) {
    try (Stream<String> lines = d.getSource().getCharContent(true).toString().lines()) {
      return lines.skip(d.getLineNumber() - 1).findFirst().orElse("");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static String told(Diagnostic<? extends JavaFileObject> d) {
    String file =
        d.getSource() == null ? "" : Path.of(d.getSource().getName()).getFileName().toString();
    return file + ":" + d.getLineNumber() + ": " + d.getMessage(null);
  }
}
