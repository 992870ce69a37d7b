package org.fallwright.core.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.fallwright.core.edit.Edits;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WorkingCopyTest {
  @TempDir private Path folder;

  private Path file;
  private Site demo;

  @BeforeEach
  void write() throws IOException {
    file = folder.resolve("job.fallsite.json");
    Files.writeString(file, Samples.demo());
    demo = SiteFile.read(file);
  }

  @Test
  void changesAreKeptUntilTheyAreSaved() throws IOException {
    Site changed = Edits.move("A1", 1, 0).on(demo);
    try (WorkingCopy copy = WorkingCopy.of(file)) {
      assertThat(copy.unsaved()).isEmpty();
      copy.keep(changed);
    }
    assertThat(SiteFile.read(file)).isEqualTo(demo);
    try (WorkingCopy copy = WorkingCopy.of(file)) {
      assertThat(copy.unsaved()).contains(changed);
      copy.save(changed);
      assertThat(copy.unsaved()).isEmpty();
    }
    assertThat(SiteFile.read(file)).isEqualTo(changed);
    try (Stream<Path> left = Files.list(folder)) {
      assertThat(left).containsExactly(file);
    }
  }

  @Test
  void changesMayBeGivenUp() throws IOException {
    try (WorkingCopy copy = WorkingCopy.of(file)) {
      copy.keep(Edits.move("A1", 1, 0).on(demo));
      copy.giveUp();
      assertThat(copy.unsaved()).isEmpty();
    }
    assertThat(SiteFile.read(file)).isEqualTo(demo);
  }

  @Test
  void aSecondWindowIsToldSo() throws IOException {
    try (WorkingCopy copy = WorkingCopy.of(file)) {
      assertThatThrownBy(() -> WorkingCopy.of(file))
          .isInstanceOf(SiteFileException.class)
          .hasMessage("job.fallsite.json is open in another window; close it there first.");
      copy.keep(demo);
    }
    WorkingCopy.of(file).close();
  }

  @Test
  void aDraftThatCannotBeReadIsSaidAndStays() throws IOException {
    Path draft = folder.resolve(".job.fallsite.json.draft");
    Files.writeString(draft, "{ half");
    try (WorkingCopy copy = WorkingCopy.of(file)) {
      assertThatThrownBy(copy::unsaved).isInstanceOf(SiteFileException.class);
      assertThat(draft).exists();
    }
  }

  /** A program that is killed while it changes a site over and over loses nothing it had kept. */
  @Test
  void aKilledProgramLosesNothing() throws Exception {
    Process program =
        new ProcessBuilder(
                List.of(
                    Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                    "-cp",
                    System.getProperty("java.class.path"),
                    Changing.class.getName(),
                    file.toString()))
            .redirectError(ProcessBuilder.Redirect.DISCARD)
            .start();
    int kept = 0;
    try (var said = program.inputReader()) {
      while (kept < 20) {
        String line = said.readLine();
        assertThat(line).isNotNull();
        kept = Integer.parseInt(line);
      }
      assertThatThrownBy(() -> WorkingCopy.of(file)).hasMessageContaining("another window");
    }
    program.destroyForcibly();
    assertThat(program.waitFor(30, TimeUnit.SECONDS)).isTrue();
    try (WorkingCopy copy = WorkingCopy.of(file)) {
      double moved =
          copy.unsaved().orElseThrow().anchor("A1").orElseThrow().place().at().eastM() - 17.5;
      assertThat(Math.round(moved * 100)).isGreaterThanOrEqualTo(kept);
    }
    assertThat(SiteFile.read(file)).isEqualTo(demo);
  }

  /** Moves an anchor by a centimetre, keeps the site and says how often it did. */
  public static final class Changing {
    public static void main(String[] args) throws IOException {
      try (WorkingCopy copy = WorkingCopy.of(Path.of(args[0]))) {
        Site site = SiteFile.read(copy.file());
        for (int i = 1; ; i++) {
          site = Edits.move("A1", 0.01, 0).on(site);
          copy.keep(site);
          System.out.println(i);
        }
      }
    }
  }
}
