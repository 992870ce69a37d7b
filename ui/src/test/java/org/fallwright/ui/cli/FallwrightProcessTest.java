package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.fallwright.ui.demo.DemoSite;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The program as a process of its own, as a script would call it. */
class FallwrightProcessTest {
  @TempDir private Path folder;

  private record Ended(int status, String out, String err) {}

  @Test
  void resultsAndStatusReachTheCaller() throws Exception {
    Ended ended = run("check", DemoSite.FILE.toString());
    assertThat(ended.err).isEmpty();
    assertThat(ended.status).isZero();
    assertThat(ended.out).contains("Oak behind the house").contains("°");
  }

  @Test
  void messagesGoToTheStandardErrorWithoutAStackTrace() throws Exception {
    Ended ended = run("plan", folder.resolve("none.fallsite.json").toString());
    assertThat(ended.status).isEqualTo(2);
    assertThat(ended.out).isEmpty();
    assertThat(ended.err.lines().toList()).singleElement().asString().doesNotContain("\tat ");
  }

  @Test
  void withoutADisplayTheDesktopIsRefusedAndHelpStandsIn() throws Exception {
    Ended open = run("open", DemoSite.FILE.toString());
    assertThat(open.status).isEqualTo(2);
    assertThat(open.err.strip()).isEqualTo("There is no display, so the desktop cannot be opened.");
    Ended plain = run();
    assertThat(plain.status).isZero();
    assertThat(plain.out).contains("Usage: fallwright");
  }

  @Test
  void theFoldersCanBeNamedByProperties() throws Exception {
    Ended ended = run(List.of("-Dfallwright.plugins=" + folder), "sources");
    assertThat(ended.status).isZero();
    assertThat(ended.out).contains("Plugins in use: 0");
  }

  private Ended run(String... args) throws IOException, InterruptedException {
    return run(List.of(), args);
  }

  private Ended run(List<String> properties, String... args)
      throws IOException, InterruptedException {
    List<String> call = new ArrayList<>();
    call.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    call.addAll(List.of("-Djava.awt.headless=true", "-Dfile.encoding=UTF-8"));
    call.addAll(properties);
    call.addAll(List.of("-cp", classPath(), Fallwright.class.getName()));
    call.addAll(List.of(args));
    Path out = folder.resolve("out.txt");
    Path err = folder.resolve("err.txt");
    Process p =
        new ProcessBuilder(call).redirectOutput(out.toFile()).redirectError(err.toFile()).start();
    int status = p.waitFor();
    return new Ended(status, Files.readString(out), Files.readString(err));
  }

  /** The class path of this test; where it is hidden in a manifest, as the runner states it. */
  private static String classPath() {
    return System.getProperty("surefire.test.class.path", System.getProperty("java.class.path"));
  }
}
