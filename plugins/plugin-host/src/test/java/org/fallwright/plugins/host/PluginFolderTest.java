package org.fallwright.plugins.host;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import ch.qos.logback.classic.Level;
import ch.qos.logback.classic.Logger;
import ch.qos.logback.classic.spi.ILoggingEvent;
import ch.qos.logback.core.read.ListAppender;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.jar.JarOutputStream;
import org.fallwright.core.pull.PullSource;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.slf4j.LoggerFactory;

/** Each broken archive lies beside a good one, which must stay in use. */
class PluginFolderTest {
  private static final String VERSION = "0.1.0";

  @TempDir Path folder;
  private PluginFolder opened;
  private final ListAppender<ILoggingEvent> log = new ListAppender<>();
  private final Logger pf4j = (Logger) LoggerFactory.getLogger("org.pf4j");

  @BeforeEach
  void listen() {
    log.start();
    pf4j.setLevel(Level.ALL);
    pf4j.addAppender(log);
  }

  @AfterEach
  void noStackTraceWasLogged() {
    pf4j.detachAppender(log);
    pf4j.setLevel(null);
    if (opened != null) {
      opened.close();
    }
    assertThat(log.list).noneMatch(e -> e.getThrowableProxy() != null);
  }

  @Test
  void listsWhatIsThereInTheOrderOfSourceIds() throws IOException {
    good("z.jar", "zebra");
    Archive.of("second")
        .says("Plugin-Provider", "A stable")
        .says("Plugin-Requires", ">=0.1.0 & <1.0.0")
        .source("donkey")
        .source("ass", "sample.Other", "", "return offer(1);")
        .writeTo(folder.resolve("a.jar"));
    Files.writeString(folder.resolve("readme.txt"), "not a plugin");
    open();
    assertThat(ids()).containsExactly("ass", "donkey", "zebra");
    assertThat(opened.loaded())
        .containsExactly(
            new LoadedPlugin("second", "1.2.3", "A stable", 2, List.of("donkey", "ass")),
            new LoadedPlugin("zebra-plugin", "1.2.3", "", 2, List.of("zebra")));
    assertThat(opened.notLoaded()).isEmpty();
    assertThat(opened.byId("donkey")).isPresent();
    assertThat(opened.byId("mule")).isEmpty();
  }

  @Test
  void aMissingFolderHasNoSourcesAndSaysSo() {
    Path nowhere = folder.resolve("nowhere");
    opened = PluginFolder.open(nowhere, VERSION);
    assertThat(opened.all()).isEmpty();
    assertThat(opened.notLoaded())
        .containsExactly(
            new NotLoaded(
                nowhere.toString(), "The folder of plugins is not there, so none is in use."));
  }

  @Test
  void anEmptyFolderHasNoSourcesAndNothingIsWrong() {
    open();
    assertThat(opened.all()).isEmpty();
    assertThat(opened.notLoaded()).isEmpty();
  }

  @Test
  void garbage() throws IOException {
    good();
    Files.write(folder.resolve("bad.jar"), "this is no archive".repeat(50).getBytes(UTF_8));
    onlyTheGoodOneStays("It cannot be read as a plugin archive: ");
  }

  @Test
  void anEmptyFile() throws IOException {
    good();
    Files.createFile(folder.resolve("bad.jar"));
    onlyTheGoodOneStays("It cannot be read as a plugin archive: ");
  }

  @Test
  void truncated() throws IOException {
    good();
    Path jar = Archive.of("cut").source("cut").writeTo(folder.resolve("bad.jar"));
    byte[] whole = Files.readAllBytes(jar);
    Files.write(jar, Arrays.copyOf(whole, whole.length / 2));
    onlyTheGoodOneStays("It cannot be read as a plugin archive: ");
  }

  @Test
  void noManifest() throws IOException {
    good();
    try (JarOutputStream out =
        new JarOutputStream(Files.newOutputStream(folder.resolve("bad.jar")))) {
      out.putNextEntry(new java.util.zip.ZipEntry("nothing"));
      out.closeEntry();
    }
    onlyTheGoodOneStays("It has no manifest, so it is not a plugin.");
  }

  @Test
  void noPluginId() throws IOException {
    good();
    bad(Archive.of("x").silent("Plugin-Id").source("x"));
    onlyTheGoodOneStays("Its manifest names no Plugin-Id.");
  }

  @Test
  void noPluginVersion() throws IOException {
    good();
    bad(Archive.of("x").silent("Plugin-Version").source("x"));
    onlyTheGoodOneStays("Its manifest names no Plugin-Version.");
  }

  @Test
  void duplicatePluginId() throws IOException {
    Archive.of("good-plugin").source("good").writeTo(folder.resolve("a.jar"));
    bad(Archive.of("good-plugin").source("other"));
    onlyTheGoodOneStays("Its plugin id \"good-plugin\" is taken by a.jar.");
  }

  @Test
  void requiresANewerProgram() throws IOException {
    good();
    bad(Archive.of("x").says("Plugin-Requires", ">=2.0.0").source("x"));
    onlyTheGoodOneStays("It asks for version >=2.0.0 of the program, and this is 0.1.0.");
  }

  @Test
  void requiresWhatCannotBeRead() throws IOException {
    good();
    bad(Archive.of("x").says("Plugin-Requires", "recent").source("x"));
    onlyTheGoodOneStays("Its Plugin-Requires \"recent\" cannot be read as versions.");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '\'',
      value = {
        "1 | 'It was built for pull contract \"1\"; this program takes contract 2.'",
        "3 | 'It was built for pull contract \"3\"; this program takes contract 2.'",
        "two | 'It was built for pull contract \"two\"; this program takes contract 2.'",
        "'' | Its manifest names no Pull-Contract; this program takes contract 2.",
      })
  void anotherContractIsRefusedBeforeAClassOfItIsRun(String stated, String reason)
      throws IOException {
    good();
    Archive other = Archive.of("x").silent("Pull-Contract");
    if (!stated.isEmpty()) {
      other.says("Pull-Contract", stated);
    }
    System.clearProperty("sample.ran");
    bad(
        other.source(
            "x",
            "sample.Bad",
            "static { System.setProperty(\"sample.ran\", \"\"); }",
            "return null;"));
    onlyTheGoodOneStays(reason);
    assertThat(System.getProperty("sample.ran")).isNull();
  }

  @Test
  void dependsOnAnAbsentPlugin() throws IOException {
    good();
    bad(Archive.of("x").says("Plugin-Dependencies", "gone@1.0.0").source("x"));
    onlyTheGoodOneStays("It needs the plugin \"gone\", which is not in use.");
  }

  @Test
  void dependsOnAnOlderPluginThanThereIs() throws IOException {
    good();
    bad(Archive.of("x").says("Plugin-Dependencies", "good-plugin@>=3.0.0").source("x"));
    onlyTheGoodOneStays(
        "It needs the plugin \"good-plugin\" in version >=3.0.0, which 1.2.3 does not meet.");
  }

  @Test
  void dependsOnAPluginWhoseVersionCannotBeRead() throws IOException {
    good();
    Archive.of("odd").says("Plugin-Version", "newish").source("odd").writeTo(file("odd.jar"));
    bad(Archive.of("x").says("Plugin-Dependencies", "odd@>=1.0.0").source("x"));
    open();
    assertThat(ids()).containsExactly("good", "odd");
    assertThat(opened.notLoaded())
        .containsExactly(
            new NotLoaded(
                "bad.jar",
                "It needs the plugin \"odd\" in version >=1.0.0, which newish does not meet."));
  }

  @Test
  void dependenciesInARingAndOneThatNeedsTheRing() throws IOException {
    good();
    Archive.of("a").says("Plugin-Dependencies", "b").source("a").writeTo(file("ring1.jar"));
    Archive.of("b").says("Plugin-Dependencies", "a").source("b").writeTo(file("ring2.jar"));
    Archive.of("c").says("Plugin-Dependencies", "b").source("c").writeTo(file("ring3.jar"));
    open();
    assertThat(ids()).containsExactly("good");
    assertThat(opened.notLoaded())
        .extracting(NotLoaded::name)
        .containsExactly("ring1.jar", "ring2.jar", "ring3.jar");
    assertThat(opened.notLoaded())
        .extracting(NotLoaded::reason)
        .containsOnly("It and plugins that it needs depend on each other in a ring.");
  }

  @Test
  void aDependencyThatIsThereIsMet() throws IOException {
    good();
    Archive.of("x")
        .says("Plugin-Dependencies", "good-plugin@>=1.0.0, gone?")
        .source("x")
        .writeTo(file("a.jar"));
    open();
    assertThat(ids()).containsExactly("good", "x");
    assertThat(opened.notLoaded()).isEmpty();
  }

  @Test
  void pluginClassMissing() throws IOException {
    good();
    bad(Archive.of("x").says("Plugin-Class", "sample.Gone").source("x"));
    onlyTheGoodOneStays("It failed to start: ClassNotFoundException (sample.Gone).");
  }

  @Test
  void pluginClassIsNoPlugin() throws IOException {
    good();
    bad(Archive.of("x").says("Plugin-Class", "java.lang.String").source("x"));
    onlyTheGoodOneStays("It failed to start: ClassCastException");
  }

  @Test
  void pluginConstructorThrows() throws IOException {
    good();
    bad(withPluginClass("public Main() { throw new IllegalStateException(\"no fuel\"); }"));
    onlyTheGoodOneStays("It failed to start: IllegalStateException (no fuel).");
  }

  @Test
  void startThrows() throws IOException {
    good();
    bad(withPluginClass("public void start() { throw new IllegalStateException(\"no spark\"); }"));
    onlyTheGoodOneStays("It failed to start: IllegalStateException (no spark).");
  }

  @Test
  void startThrowsAnError() throws IOException {
    good();
    bad(withPluginClass("public void start() { throw new AssertionError(\"seized\"); }"));
    onlyTheGoodOneStays("It failed to start: AssertionError (seized).");
  }

  @Test
  void extensionClassMissing() throws IOException {
    good();
    bad(Archive.of("x").extension("sample.Gone"));
    onlyTheGoodOneStays(
        "Its extension sample.Gone cannot be made: ClassNotFoundException (sample.Gone).");
  }

  @Test
  void extensionConstructorThrows() throws IOException {
    good();
    bad(
        Archive.of("x")
            .source(
                "x",
                "sample.Bad",
                "public Bad() { throw new NoClassDefFoundError(\"oil\"); }",
                "return null;"));
    onlyTheGoodOneStays("Its extension sample.Bad cannot be made: NoClassDefFoundError (oil).");
  }

  @Test
  void extensionIsNoPullSource() throws IOException {
    good();
    bad(
        Archive.of("x")
            .with("sample.Odd", "package sample; public class Odd {}")
            .extension("sample.Odd"));
    onlyTheGoodOneStays(
        "Its extension sample.Odd cannot be made: ClassCastException (it is not built on the"
            + " program's own extension point).");
  }

  @Test
  void extensionBuiltOnItsOwnCopyOfTheExtensionPoint() throws IOException {
    good();
    bad(
        Archive.of("x")
            .with(
                "org.fallwright.plugins.api.PullSourceExtension",
                "package org.fallwright.plugins.api; public interface PullSourceExtension"
                    + " extends org.fallwright.core.pull.PullSource, org.pf4j.ExtensionPoint {}")
            .source("x"));
    onlyTheGoodOneStays(
        "Its extension sample.Fine cannot be made: ClassCastException (it is not built on the"
            + " program's own extension point).");
  }

  @Test
  void noExtensionAtAll() throws IOException {
    good();
    bad(Archive.of("x"));
    onlyTheGoodOneStays("It offers no pull source.");
  }

  @Test
  void describeThrows() throws IOException {
    good();
    bad(Archive.of("x").source("Not An Id"));
    onlyTheGoodOneStays(
        "The plugin \"x\" failed to describe its pull source: IllegalArgumentException (id is");
  }

  @Test
  void sameSourceIdFromAnotherPlugin() throws IOException {
    Archive.of("good-plugin").source("good").writeTo(file("a.jar"));
    bad(Archive.of("x").source("good").source("extra", "sample.Extra", "", "return null;"));
    open();
    assertThat(ids()).containsExactly("extra", "good");
    assertThat(opened.loaded())
        .containsExactly(
            new LoadedPlugin("good-plugin", "1.2.3", "", 2, List.of("good")),
            new LoadedPlugin("x", "1.2.3", "", 2, List.of("extra")));
    assertThat(opened.notLoaded())
        .containsExactly(new NotLoaded("bad.jar", "Its pull source id \"good\" is taken already."));
  }

  private void onlyTheGoodOneStays(String reasonStart) {
    open();
    assertThat(ids()).containsExactly("good");
    assertThat(opened.loaded()).extracting(LoadedPlugin::id).containsExactly("good-plugin");
    assertThat(opened.notLoaded()).hasSize(1);
    NotLoaded left = opened.notLoaded().get(0);
    assertThat(left.name()).isEqualTo("bad.jar");
    assertThat(left.reason()).startsWith(reasonStart).endsWith(".").doesNotContain("\n");
  }

  private static Archive withPluginClass(String member) {
    return Archive.of("x")
        .says("Plugin-Class", "sample.Main")
        .with(
            "sample.Main",
            "package sample; public class Main extends org.pf4j.Plugin { " + member + " }")
        .source("x");
  }

  private void good() throws IOException {
    good("good.jar", "good");
  }

  private void good(String file, String sourceId) throws IOException {
    Archive.of(sourceId + "-plugin").source(sourceId).writeTo(file(file));
  }

  private void bad(Archive archive) throws IOException {
    archive.writeTo(file("bad.jar"));
  }

  private Path file(String name) {
    return folder.resolve(name);
  }

  private void open() {
    opened = PluginFolder.open(folder, VERSION);
  }

  private List<String> ids() {
    return opened.all().stream().map(PullSource::describe).map(d -> d.id()).toList();
  }
}
