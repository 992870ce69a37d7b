package org.fallwright.plugins.host;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.io.IOException;
import java.io.OutputStream;
import java.net.URI;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.jar.Attributes;
import java.util.jar.JarEntry;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;
import java.util.stream.Stream;
import javax.tools.DiagnosticCollector;
import javax.tools.JavaCompiler;
import javax.tools.JavaFileObject;
import javax.tools.SimpleJavaFileObject;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;

/** A real plugin archive, compiled and packed for one test. */
final class Archive {
  private final Map<String, String> manifest = new LinkedHashMap<>();
  private final Map<String, String> sources = new LinkedHashMap<>();
  private final List<String> extensions = new ArrayList<>();

  /** An archive with this plugin id, version 1.2.3 and contract 2. */
  static Archive of(String pluginId) {
    return new Archive()
        .says("Plugin-Id", pluginId)
        .says("Plugin-Version", "1.2.3")
        .says("Pull-Contract", "2");
  }

  Archive says(String key, String value) {
    manifest.put(key, value);
    return this;
  }

  Archive silent(String key) {
    manifest.remove(key);
    return this;
  }

  /** Adds a class, its package line included. */
  Archive with(String className, String source) {
    sources.put(className, source);
    return this;
  }

  /** Lists a class as an extension. */
  Archive extension(String className) {
    extensions.add(className);
    return this;
  }

  /** A well-behaved source of this id as an extension. */
  Archive source(String sourceId) {
    return source(sourceId, "sample.Fine", "", "return offer(100);");
  }

  /** A source with its own members and its own body of {@code offer}. */
  Archive source(String sourceId, String className, String members, String offerBody) {
    String name = className.substring(className.lastIndexOf('.') + 1);
    String code =
        """
        package sample;
        import com.fasterxml.jackson.databind.node.ObjectNode;
        import java.util.*;
        import org.fallwright.core.pull.*;
        import org.fallwright.core.pull.SourceDescription.*;
        public class NAME implements org.fallwright.plugins.api.PullSourceExtension {
          static final Wording TWICE = new Wording("said", "dicho");
          MEMBERS
          public SourceDescription describe() {
            return new SourceDescription("ID", TWICE, Set.of(PlaceKind.SPOT), false,
                List.of(Parameter.number("strength_N", "N", 0, 1000, TWICE, TWICE).mayBeLeftOut()));
          }
          public List<String> modes(ObjectNode p) { return List.of("pull"); }
          public PullOffer offer(PullRequest request) { BODY }
          PullOffer offer(double low) {
            return PullOffer.giving(low, 200, new PullOffer.Limit(TWICE, TWICE)).done();
          }
        }
        """
            .replace("NAME", name)
            .replace("MEMBERS", members)
            .replace("ID", sourceId)
            .replace("BODY", offerBody);
    return with(className, code).extension(className);
  }

  /** Gives the sources their own body of {@code modes}. */
  Archive modes(String body) {
    sources.replaceAll((name, code) -> code.replace("return List.of(\"pull\");", body));
    return this;
  }

  /** Compiles and packs it. */
  Path writeTo(Path jar) throws IOException {
    Path classes = Files.createTempDirectory(jar.getParent(), "classes");
    compileTo(classes);
    Manifest lines = new Manifest();
    lines.getMainAttributes().put(Attributes.Name.MANIFEST_VERSION, "1.0");
    manifest.forEach(lines.getMainAttributes()::putValue);
    try (OutputStream out = Files.newOutputStream(jar);
        JarOutputStream entries = new JarOutputStream(out, lines);
        Stream<Path> files = Files.walk(classes)) {
      for (Path file : files.filter(Files::isRegularFile).toList()) {
        entries.putNextEntry(new JarEntry(classes.relativize(file).toString().replace('\\', '/')));
        Files.copy(file, entries);
        entries.closeEntry();
      }
      entries.putNextEntry(new JarEntry("META-INF/extensions.idx"));
      entries.write(String.join("\n", extensions).getBytes(UTF_8));
      entries.closeEntry();
    }
    return jar;
  }

  private void compileTo(Path classes) throws IOException {
    if (sources.isEmpty()) {
      return;
    }
    JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
    DiagnosticCollector<JavaFileObject> told = new DiagnosticCollector<>();
    List<JavaFileObject> units = new ArrayList<>();
    sources.forEach(
        (name, code) ->
            units.add(
                new SimpleJavaFileObject(
                    URI.create("string:///" + name.replace('.', '/') + ".java"),
                    JavaFileObject.Kind.SOURCE) {
                  @Override
                  public CharSequence getCharContent(boolean ignoreEncodingErrors) {
                    return code;
                  }
                }));
    try (StandardJavaFileManager files = compiler.getStandardFileManager(told, null, UTF_8)) {
      List<String> options =
          List.of(
              "-proc:none", "-d", classes.toString(), "-cp", System.getProperty("java.class.path"));
      if (!compiler.getTask(null, files, told, options, null, units).call()) {
        throw new IllegalStateException("test plugin does not compile: " + told.getDiagnostics());
      }
    }
  }
}
