package org.fallwright.core.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Each fault in a file is refused with one sentence: file, field, value, limit. The faults are in
 * faults.txt: what stands in the frozen sample, what is put there instead, what is said.
 */
class SiteFileFaultsTest {
  private static final Pattern FAULT = Pattern.compile("- (.*)\n\\+ (.*)\n= (.*)\n");

  static Stream<Arguments> faults() throws IOException {
    return faults("faults.txt");
  }

  static Stream<Arguments> faults(String list) throws IOException {
    return FAULT
        .matcher(Samples.resource(list))
        .results()
        .map(m -> Arguments.of(lines(m.group(1)), lines(m.group(2)), m.group(3)));
  }

  @Test
  void theListIsReadWhole() throws IOException {
    String all = Samples.resource("faults.txt");
    assertThat(faults())
        .hasSizeGreaterThan(25)
        .hasSize((int) all.lines().filter(this::said).count());
  }

  @ParameterizedTest(name = "{2}")
  @MethodSource("faults")
  void isRefusedInOneSentence(String stands, String instead, String said) throws IOException {
    String bad =
        Samples.present().replaceFirst(Pattern.quote(stands), Matcher.quoteReplacement(instead));
    assertThat(bad).as("the fault must change the sample").isNotEqualTo(Samples.present());

    assertThatThrownBy(() -> SiteFile.read(Samples.utf8(bad), "job.json"))
        .isInstanceOf(SiteFileException.class)
        .hasMessage(said)
        .message()
        .matches("job\\.json[ :,].*[^.]\\.")
        .doesNotContain("jackson", "Exception", "Source:", "`", "\n");
  }

  /** A file that breaks off anywhere is refused, and never with anything but the one sentence. */
  @Test
  void everyTruncationIsRefused() throws IOException {
    String whole = Samples.present().stripTrailing();
    for (int length : List.of(0, 1, 2, 10, whole.length() / 2, whole.length() - 1)) {
      assertThatThrownBy(() -> SiteFile.read(Samples.utf8(whole.substring(0, length)), "job.json"))
          .as("cut to %d characters", length)
          .isInstanceOf(SiteFileException.class)
          .message()
          .matches("job\\.json(,| is empty).*\\.");
    }
  }

  private boolean said(String line) {
    return line.startsWith("= ");
  }

  private static String lines(String text) {
    return text.replace("\\n", "\n");
  }
}
