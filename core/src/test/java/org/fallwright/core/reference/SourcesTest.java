package org.fallwright.core.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.fallwright.core.tree.MassEquation;
import org.junit.jupiter.api.Test;

class SourcesTest {
  private static Stream<Figure> everyFigure() {
    return Stream.of(
            Allowances.all().stream(),
            Hardware.all().stream(),
            SpeciesTable.all().stream().flatMap(s -> s.figures().stream()),
            SurfaceTable.keys().stream()
                .flatMap(
                    k ->
                        Stream.concat(
                            SurfaceTable.figures(k, true).stream(),
                            SurfaceTable.figures(k, false).stream())))
        .flatMap(f -> f);
  }

  @Test
  void everySourceNamedIsInTheList() {
    assertThat(everyFigure().map(Figure::source).filter(s -> !s.isEmpty()).distinct())
        .hasSizeGreaterThan(15)
        .allSatisfy(key -> assertThat(Sources.of(key).citation()).isNotBlank());
    for (int group = 1; group <= 10; group++) {
      assertThat(Sources.of(MassEquation.of(group).source()).citation()).isNotBlank();
    }
  }

  /** A source nobody names is left over from something removed. */
  @Test
  void everySourceInTheListIsNamed() {
    Set<String> named =
        Stream.concat(
                everyFigure().map(Figure::source),
                // named by the equations that stand in code
                Stream.of("jenkins-2003", "chojnacky-2014", "fonweban-2012"))
            .collect(Collectors.toSet());
    assertThat(Sources.all().keySet()).allMatch(named::contains);
  }

  @Test
  void whatIsFromMemoryIsNeverCalledPublished() {
    assertThat(everyFigure().filter(f -> !f.source().isEmpty()))
        .allSatisfy(
            f ->
                assertThat(f.kind() == Kind.FROM_MEMORY)
                    .as("%s, source %s", f.key(), f.source())
                    .isEqualTo(Sources.of(f.source()).seen() == Sources.Seen.FROM_MEMORY));
  }

  @Test
  void aSecondHandSourceSaysWhereItWasSeen() {
    assertThat(Sources.all().values())
        .filteredOn(s -> s.seen() == Sources.Seen.SECONDARY)
        .allMatch(s -> !s.through().isBlank());
  }

  @Test
  void anUnknownSourceIsRefusedByName() {
    assertThatThrownBy(() -> Sources.of("nobody-1999")).hasMessageContaining("nobody-1999");
  }

  @Test
  void aPublishedFigureWithoutSourceIsRefused() {
    assertThatThrownBy(() -> new Figure("x", 1, "m", Kind.PUBLISHED, "", "a note"))
        .hasMessage("x is published and names no source");
  }
}
