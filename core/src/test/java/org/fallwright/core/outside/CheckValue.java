package org.fallwright.core.outside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/**
 * A figure from outside this program against which it is held. Each one that is met leaves a row in
 * {@code target/check-values} of its module, from which the page of all of them is written.
 *
 * <p>Figures worked out beforehand by this project's own models are none: they are not from
 * outside.
 */
public final class CheckValue {
  /** Where the rows go, from the folder of the module whose test runs. */
  public static final Path FOLDER = Path.of("target", "check-values");

  /** Columns of a row. */
  public static final List<String> COLUMNS =
      List.of(
          "kind", "source", "what", "unit", "theirs", "ours", "difference", "tolerance", "test");

  /** What the figure is. */
  public enum Kind {
    /** Printed in the source. */
    PUBLISHED,
    /** Worked by hand from the source's formula or figures. */
    WORKED,
    /** Ascribed to the source from memory. */
    FROM_MEMORY
  }

  private static final Set<String> STARTED = new HashSet<>();

  private final Kind kind;
  private final String source;
  private final String what;
  private final double theirs;
  private final String unit;

  private CheckValue(Kind kind, String source, String what, double theirs, String unit) {
    this.kind = kind;
    this.source = text("source", source);
    this.what = text("what", what);
    this.theirs = theirs;
    this.unit = unit;
    assertThat(theirs).as("theirs of %s, %s", source, what).isFinite();
  }

  /** A figure printed in a source; {@code source} says who, when, what, and the table or page. */
  public static CheckValue of(String source, String what, double theirs, String unit) {
    return new CheckValue(Kind.PUBLISHED, source, what, theirs, unit);
  }

  /** The same figure, worked by hand from what the source prints. */
  public CheckValue worked() {
    return new CheckValue(Kind.WORKED, source, what, theirs, unit);
  }

  /** The same figure, ascribed to the source from memory. */
  public CheckValue fromMemory() {
    return new CheckValue(Kind.FROM_MEMORY, source, what, theirs, unit);
  }

  /** Holds ours to theirs within a difference in the same unit; 0: the very same. */
  public void isMet(double ours, double tolerance) {
    assertThat(ours).as(as()).isCloseTo(theirs, within(tolerance));
    row(ours, plain(tolerance));
  }

  /** Holds ours to theirs within a share of theirs, such as 0.01. */
  public void isMetWithinShare(double ours, double share) {
    assertThat(ours).as(as()).isCloseTo(theirs, within(share * Math.abs(theirs)));
    row(ours, plain(100 * share) + " %");
  }

  /** Ours stays on the safe side of theirs, at or below it. */
  public void isNotExceeded(double ours) {
    assertThat(ours).as(as()).isLessThanOrEqualTo(theirs);
    row(ours, "not above");
  }

  /** Ours stays on the safe side of theirs, at or above it. */
  public void isReached(double ours) {
    assertThat(ours).as(as()).isGreaterThanOrEqualTo(theirs);
    row(ours, "not below");
  }

  private String as() {
    return source + ": " + what;
  }

  private void row(double ours, String tolerance) {
    String test =
        StackWalker.getInstance(StackWalker.Option.RETAIN_CLASS_REFERENCE)
            .walk(
                frames ->
                    frames
                        .map(StackWalker.StackFrame::getDeclaringClass)
                        .filter(c -> c != CheckValue.class)
                        .findFirst()
                        .orElseThrow()
                        .getName());
    write(
        test,
        String.join(
            "\t",
            kind.name(),
            source,
            what,
            unit,
            plain(theirs),
            plain(ours),
            plain(ours - theirs),
            tolerance,
            test));
  }

  /** Appends a row; the first of a run replaces the file of the run before. */
  private static synchronized void write(String test, String row) {
    try {
      Files.createDirectories(FOLDER);
      Path file = FOLDER.resolve(test + ".tsv");
      if (STARTED.add(test)) {
        Files.deleteIfExists(file);
      }
      Files.writeString(file, row + "\n", StandardOpenOption.CREATE, StandardOpenOption.APPEND);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static String plain(double value) {
    if (value == 0) {
      return "0";
    }
    String digits = String.format(Locale.ROOT, "%.6g", value);
    return new java.math.BigDecimal(digits).stripTrailingZeros().toPlainString();
  }

  private static String text(String field, String text) {
    assertThat(text).as(field).isNotBlank().doesNotContain("\t", "\n", "|");
    return text;
  }
}
