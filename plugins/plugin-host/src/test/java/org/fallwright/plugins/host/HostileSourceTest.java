package org.fallwright.plugins.host;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Path;
import java.time.Duration;
import java.util.concurrent.CancellationException;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.SourceFault;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Real archives that hang or play tricks. Those that hang end once the test tells them to, so that
 * they do not burn a processor for the tests that follow.
 */
class HostileSourceTest {
  private static final String END = "fallwright.test.end";
  private static final String HANG = "while (System.getProperty(\"" + END + "\") == null) {} ";
  private static final Duration LIMIT = Duration.ofMillis(1500);

  @TempDir Path folder;
  private PluginFolder opened;

  @AfterEach
  void end() {
    System.setProperty(END, "");
    opened.close();
    System.clearProperty(END);
  }

  private void open(Archive archive) throws IOException {
    Archive.of("good")
        .source("good", "sample.Good", "", "return offer(1);")
        .writeTo(folder.resolve("good.jar"));
    archive.writeTo(folder.resolve("x.jar"));
    opened = PluginFolder.open(folder, "0.1.0", LIMIT);
  }

  private PullSource loaded(Archive archive) throws IOException {
    open(archive);
    assertThat(opened.notLoaded()).isEmpty();
    return opened.byId("x").orElseThrow();
  }

  private void refused(Archive archive, String reason) throws IOException {
    open(archive);
    assertThat(opened.loaded()).extracting(LoadedPlugin::id).containsExactly("good");
    assertThat(opened.notLoaded()).containsExactly(new NotLoaded("x.jar", reason));
    assertThat(opened.byId("good").orElseThrow().offer(request()).lowN()).isEqualTo(1);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        HANG + "return null;",
        "try { Thread.sleep(60_000); } catch (InterruptedException e) {} return null;"
      })
  void anOfferThatHangsIsGivenUpAndTheSourceNotAskedAgain(String body) throws IOException {
    PullSource source = loaded(Archive.of("x").source("x", "sample.Fine", "", body));
    String sentence =
        "The plugin \"x\" failed to work out its pull: no answer within 1.5 s; it is not asked"
            + " again.";
    assertThatExceptionOfType(SourceFault.class)
        .isThrownBy(() -> source.offer(request()))
        .withMessage(sentence)
        .matches(f -> f.sourceId().equals("x"));
    System.setProperty(END, "");
    assertThatExceptionOfType(SourceFault.class)
        .isThrownBy(() -> source.modes(parameters()))
        .withMessage(sentence);
    assertThat(opened.byId("good").orElseThrow().offer(request()).lowN()).isEqualTo(1);
  }

  @Test
  void aPieceOfWorkWithManyCallsIsGivenUpOnlyWhereOneOfThemHangs() throws IOException {
    PullSource source =
        loaded(
            Archive.of("x")
                .source(
                    "x",
                    "sample.Fine",
                    "static int n;",
                    "if (n++ == 500) { " + HANG + "}" + " return offer(1);"));
    PullSource good = opened.byId("good").orElseThrow();
    String done =
        opened.asking(
            () -> {
              sleep(LIMIT.multipliedBy(2)); // long, but in no plugin
              return "low " + good.offer(request()).lowN();
            });
    assertThat(done).isEqualTo("low 1.0");
    assertThatExceptionOfType(SourceFault.class)
        .isThrownBy(
            () ->
                opened.asking(
                    () -> {
                      double last = 0;
                      for (int i = 0; i < 1000; i++) {
                        last = source.offer(request()).lowN();
                      }
                      return last;
                    }))
        .withMessageStartingWith("The plugin \"x\" failed to work out its pull: no answer within");
    assertThatExceptionOfType(SourceFault.class).isThrownBy(() -> source.offer(request()));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> opened.asking(() -> good.modes(parameters().put("ears", 1))));
  }

  private static void sleep(Duration time) {
    try {
      Thread.sleep(time.toMillis());
    } catch (InterruptedException e) {
      throw new AssertionError(e);
    }
  }

  @Test
  void modesThatHang() throws IOException {
    PullSource source =
        loaded(Archive.of("x").source("x").modes(HANG + "return List.of(\"pull\");"));
    assertThatExceptionOfType(SourceFault.class)
        .isThrownBy(() -> source.modes(parameters()))
        .withMessage(
            "The plugin \"x\" failed to list its modes: no answer within 1.5 s; it is not asked"
                + " again.");
  }

  @Test
  void whoeverIsToldToStopWhileWaitingStopsAndTheSourceIsNotBlamed() throws IOException {
    PullSource source =
        loaded(Archive.of("x").source("x", "sample.Fine", "", HANG + "return offer(1);"));
    Thread.currentThread().interrupt();
    assertThatExceptionOfType(CancellationException.class)
        .isThrownBy(() -> source.offer(request()));
    assertThat(Thread.interrupted()).isTrue();
    System.setProperty(END, "");
    assertThat(source.offer(request()).lowN()).isEqualTo(1);
  }

  @Test
  void aDescriptionThatHangs() throws IOException {
    refused(
        Archive.of("x").source("x").describes(HANG),
        "The plugin \"x\" failed to describe its pull source: no answer within 1.5 s; it is not"
            + " asked again.");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '\'',
      value = {
        "static int n = 0; static { while (n == 0 && System.getProperty(\""
            + END
            + "\") == null) {} } | TooLong (no answer within 1.5 s)",
        "static int n = 1 / Integer.parseInt(\"0\"); | ArithmeticException (/ by zero)",
        "public Fine() { throw new StackOverflowError(); } | StackOverflowError",
        "private Fine() {} | NoSuchMethodException (sample.Fine.<init>())",
      })
  void aClassThatCannotBeMade(String members, String cause) throws IOException {
    refused(
        Archive.of("x").source("x", "sample.Fine", members, "return null;"),
        "Its extension sample.Fine cannot be made: " + cause + ".");
  }

  @Test
  void aStartThatHangs() throws IOException {
    refused(
        Archive.of("x")
            .says("Plugin-Class", "sample.Main")
            .with(
                "sample.Main",
                "package sample; public class Main extends org.pf4j.Plugin { public void start() { "
                    + HANG
                    + "} }")
            .source("x"),
        "It failed to start: TooLong (no answer within 1.5 s).");
  }

  @Test
  void aDescriptionThatChanges() throws IOException {
    refused(
        Archive.of("x")
            .source("x", "sample.Fine", "int n;", "return null;")
            .describes(
                "return new SourceDescription(\"x\" + n++, TWICE, Set.of(PlaceKind.SPOT), false,"
                    + " List.of());"),
        "The plugin \"x\" describes its pull source differently each time it is asked.");
  }

  @Test
  void aDescriptionWithoutEnd() throws IOException {
    refused(
        Archive.of("x")
            .source("x")
            .describes(
                "return new SourceDescription(\"x\", TWICE, Set.of(PlaceKind.SPOT), false,"
                    + " Collections.nCopies(9999, Parameter.flag(\"a\", TWICE, TWICE)));"),
        "The plugin \"x\" failed to describe its pull source: IllegalArgumentException (parameters,"
            + " how many is 9999; it must be from 0 to 60).");
  }

  @Test
  void aClassThatIsNotInTheArchive() throws IOException {
    PullSource source =
        loaded(
            Archive.of("x")
                .withoutPacking(
                    "sample.Gone", "package sample; class Gone { static int n() { return 1; } }")
                .source("x", "sample.Fine", "", "return offer(Gone.n());"));
    assertThatExceptionOfType(SourceFault.class)
        .isThrownBy(() -> source.offer(request()))
        .withMessage(
            "The plugin \"x\" failed to work out its pull: ClassNotFoundException (sample.Gone).");
  }

  @Test
  void modesWithoutEnd() throws IOException {
    PullSource source =
        loaded(
            Archive.of("x").source("x").modes("return Collections.nCopies(2_000_000_000, null);"));
    assertThatExceptionOfType(SourceFault.class)
        .isThrownBy(() -> source.modes(parameters()))
        .withMessage("The plugin \"x\" lists no usable modes.");
  }

  @Test
  void parametersAreCheckedBeforeAPluginThatDoesNotCheckThem() throws IOException {
    PullSource source = loaded(Archive.of("x").source("x"));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> source.modes(parameters().put("strength_N", 1001)))
        .withMessage("strength_N is 1001 N; it must be from 0 to 1000 N");
  }

  @Test
  void whatDoesNotHangOnTheSetupIsAskedOnceForEachParameters() throws IOException {
    PullSource source =
        loaded(
            Archive.of("x")
                .source("x", "sample.Fine", "static int n;", "return null;")
                .modes("return List.of(\"mode \" + n++);"));
    assertThat(source.modes(parameters())).containsExactly("mode 0");
    assertThat(source.modes(parameters())).containsExactly("mode 0");
    assertThat(source.modes(parameters().put("strength_N", 1))).containsExactly("mode 1");
  }

  private static ObjectNode parameters() {
    return JsonNodeFactory.instance.objectNode();
  }

  private static PullRequest request() {
    return new PullRequest(
        parameters(),
        "pull",
        new PullRequest.Stand(null, 0, 0, null, 1, 20, null),
        new PullRequest.Pull(0, 1, 2, null),
        null,
        null);
  }
}
