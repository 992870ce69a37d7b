package org.fallwright.plugins.host;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Path;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Sources from real archives that load well and misbehave when asked. */
class GuardedSourceTest {
  @TempDir Path folder;
  private PluginFolder opened;

  @AfterEach
  void close() {
    opened.close();
  }

  @Test
  void aGoodAnswerComesThrough() throws IOException {
    PullSource source = source("return offer(request.pull().takeUpM());");
    assertThat(source.offer(request()).lowN()).isEqualTo(2);
    assertThat(source.modes(parameters())).containsExactly("pull");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '\'',
      value = {
        "throw new IllegalStateException(\"jam\"); | failed to work out its pull: IllegalStateException (jam).",
        "throw new StackOverflowError(); | failed to work out its pull: StackOverflowError.",
        "throw new NoSuchMethodError(\"a\\nb\"); | failed to work out its pull: NoSuchMethodError (a).",
        "return null; | gives no pull at all, not even none.",
        "return offer(Double.NaN); | gives an impossible pull: IllegalArgumentException (low_N is not a number N; it must be from 0 to 10000000 N).",
        "return offer(-1); | gives an impossible pull: IllegalArgumentException (low_N is -1 N; it must be from 0 to 10000000 N).",
        "return offer(300); | gives an impossible pull: IllegalArgumentException (high_N is 200 N; it must be from 300 to 100000000 N).",
        "new PullOffer.Part(\"hook\", 0, 3, 2, 1, 1); return null; | gives an impossible pull: IllegalArgumentException (strength_N is 0 N; it must be from 1 to 1000000000 N).",
        "Integer.parseInt(\"x\"); return null; | 'failed to work out its pull: NumberFormatException (For input string: \"x\").'",
        "throw new IllegalArgumentException(); | failed to work out its pull: IllegalArgumentException.",
        "throw new RuntimeException() { public String getMessage() { throw new Error(); } }; | failed to work out its pull: .",
      })
  void aFaultNamesThePluginInOneSentence(String body, String sentence) throws IOException {
    PullSource source = source(body);
    assertThatExceptionOfType(SourceFault.class)
        .isThrownBy(() -> source.offer(request()))
        .withMessage("The plugin \"x\" " + sentence);
  }

  @Test
  void whatIsWrongWithTheParametersComesThrough() throws IOException {
    PullSource source =
        source(
            "new org.fallwright.plugins.api.ParameterReader(describe(), request.parameters())"
                + ".number(\"strength_N\"); return offer(1);");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> source.offer(request()))
        .withMessage("strength_N is missing; it must be a number from 0 to 1000 N");
  }

  @ParameterizedTest
  @CsvSource({"null", "List.of()", "'List.of(\"a\", \"a\")'", "List.of(\" \")"})
  void modesMustBeUsable(String answer) throws IOException {
    PullSource source = withModes("return " + answer + ";");
    assertThatExceptionOfType(SourceFault.class)
        .isThrownBy(() -> source.modes(parameters()))
        .withMessage("The plugin \"x\" lists no usable modes.");
  }

  @Test
  void modesThatThrow() throws IOException {
    PullSource source = withModes("throw new AssertionError(\"odd\");");
    assertThatExceptionOfType(SourceFault.class)
        .isThrownBy(() -> source.modes(parameters()))
        .withMessage("The plugin \"x\" failed to list its modes: AssertionError (odd).");
  }

  @Test
  void aSourceCannotChangeTheSitesParameters() throws IOException {
    PullSource source = source("request.parameters().removeAll(); return offer(1);");
    PullRequest request = request();
    request.parameters().put("strength_N", 7);
    source.offer(request);
    assertThat(request.parameters().get("strength_N").intValue()).isEqualTo(7);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '\'',
      value = {
        "null | describes its pull source by nothing at all.",
        "new SourceDescription(\"y\", new Wording(\"y\", \"y\"), Set.of(), false, List.of()) | 'failed to describe its pull source: IllegalArgumentException (places, how many is 0; it must be from 1 to 2).'",
        "new SourceDescription(\"y\", new Wording(\"y\", \"y\"), Set.of(PlaceKind.SPOT), false, List.of(Parameter.flag(\"a\", new Wording(\"y\", \"y\"), null))) | 'failed to describe its pull source: IllegalArgumentException (help is null; it must be stated).'",
      })
  void aPoorDescriptionIsNotLoaded(String description, String sentence) throws IOException {
    Archive.of("x")
        .with(
            "sample.Poor",
            "package sample; import java.util.*; import org.fallwright.core.pull.*;"
                + " import org.fallwright.core.pull.SourceDescription.*;"
                + " public class Poor implements org.fallwright.plugins.api.PullSourceExtension {"
                + " public SourceDescription describe() { return "
                + description
                + "; }"
                + " public List<String> modes(com.fasterxml.jackson.databind.node.ObjectNode p) {"
                + " return List.of(); }"
                + " public PullOffer offer(PullRequest r) { return null; } }")
        .extension("sample.Poor")
        .writeTo(folder.resolve("x.jar"));
    opened = PluginFolder.open(folder, "0.1.0");
    assertThat(opened.notLoaded())
        .containsExactly(new NotLoaded("x.jar", "The plugin \"x\" " + sentence));
  }

  private PullSource source(String offerBody) throws IOException {
    return loaded(Archive.of("x").source("x", "sample.Fine", "", offerBody));
  }

  private PullSource withModes(String body) throws IOException {
    return loaded(Archive.of("x").source("x").modes(body));
  }

  private PullSource loaded(Archive archive) throws IOException {
    archive.writeTo(folder.resolve("x.jar"));
    opened = PluginFolder.open(folder, "0.1.0");
    assertThat(opened.notLoaded()).isEmpty();
    return opened.byId("x").orElseThrow();
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
