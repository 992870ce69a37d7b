package org.fallwright.plugins.api;

import static org.assertj.core.api.Assertions.assertThat;

import com.sun.source.doctree.DocCommentTree;
import com.sun.source.doctree.ParamTree;
import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.Tree;
import com.sun.source.tree.VariableTree;
import com.sun.source.util.DocTrees;
import com.sun.source.util.JavacTask;
import com.sun.source.util.TreePathScanner;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import javax.lang.model.element.Modifier;
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

  /** A record's components are described where it begins, and {@link Components} asks there. */
  private static final Pattern COMPACT_CONSTRUCTOR = Pattern.compile("\\s*public \\w+ \\{");

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

  private static List<String> complaints(Path folder) throws IOException {
    JavaCompiler javac = ToolProvider.getSystemJavaCompiler();
    DiagnosticCollector<JavaFileObject> found = new DiagnosticCollector<>();
    List<String> undescribed = new ArrayList<>();
    try (StandardJavaFileManager files = javac.getStandardFileManager(found, null, null);
        Stream<Path> in = Files.list(folder)) {
      List<Path> sources = in.filter(p -> p.toString().endsWith(".java")).sorted().toList();
      assertThat(sources).isNotEmpty();
      JavacTask task =
          (JavacTask)
              javac.getTask(
                  null,
                  files,
                  found,
                  List.of("-proc:none", "-Xdoclint:all/public", "-Xmaxwarns", "1000"),
                  null,
                  files.getJavaFileObjectsFromPaths(sources));
      Iterable<? extends CompilationUnitTree> units = task.parse();
      task.analyze();
      new Components(DocTrees.instance(task), undescribed).scan(units, null);
    }
    return Stream.concat(
            found.getDiagnostics().stream()
                .filter(d -> !repeatsTheRecord(d))
                .map(ContractJavadocTest::told),
            undescribed.stream())
        .toList();
  }

  /** Finds record components without a description, which javac's own check passes over. */
  private static final class Components extends TreePathScanner<Void, Void> {
    private final DocTrees trees;
    private final List<String> undescribed;

    Components(DocTrees trees, List<String> undescribed) {
      this.trees = trees;
      this.undescribed = undescribed;
    }

    @Override
    public Void visitClass(ClassTree type, Void none) {
      if (type.getKind() == Tree.Kind.RECORD) {
        Set<String> described = described();
        for (Tree member : type.getMembers()) {
          if (member instanceof VariableTree v
              && !v.getModifiers().getFlags().contains(Modifier.STATIC)
              && !described.contains(v.getName().toString())) {
            undescribed.add(place(type) + ": no @param for " + v.getName());
          }
        }
      }
      return super.visitClass(type, none);
    }

    private Set<String> described() {
      DocCommentTree comment = trees.getDocCommentTree(getCurrentPath());
      return comment == null
          ? Set.of()
          : comment.getBlockTags().stream()
              .filter(t -> t instanceof ParamTree p && !p.getDescription().isEmpty())
              .map(t -> ((ParamTree) t).getName().toString())
              .collect(Collectors.toSet());
    }

    private String place(Tree tree) {
      CompilationUnitTree unit = getCurrentPath().getCompilationUnit();
      long at = trees.getSourcePositions().getStartPosition(unit, tree);
      return name(unit.getSourceFile()) + ":" + unit.getLineMap().getLineNumber(at);
    }
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
    String file = d.getSource() == null ? "" : name(d.getSource());
    return file + ":" + d.getLineNumber() + ": " + d.getMessage(null);
  }

  private static String name(JavaFileObject file) {
    return Path.of(file.getName()).getFileName().toString();
  }
}
