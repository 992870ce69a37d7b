package org.fallwright.ui.demo;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;
import org.fallwright.plugins.host.PluginFolder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The demo's whole search, with every plugin and with one taken away. */
class DemoPlanTest {
  private static final Path ARCHIVES = Path.of("target", "plugins");

  private static Plan plan(PullSources sources, Site site) {
    return new Planner(sources).plan(site);
  }

  private static Map<Setup, Verdict> verdicts(Plan p) {
    return p.ranked().stream().collect(Collectors.toMap(Judged::setup, Judged::verdict));
  }

  @Test
  void everyVerdictAppearsEachForItsOwnReason() {
    Plan p = plan(DemoSite.sources(), DemoSite.asItIs().site());
    assertThat(p.byVerdict())
        .containsOnlyKeys(Verdict.WORKABLE, Verdict.TIGHT, Verdict.NOT_WORKABLE);
    assertThat(p.ranked().get(0).verdict()).isEqualTo(Verdict.WORKABLE);
    assertThat(p.byBindingCheck().keySet())
        .contains("pull", "steering", "clear of Shed", "clear of F1", "anchor A2 at plan")
        .hasSizeGreaterThanOrEqualTo(4);
    assertThat(
            p.ranked().stream()
                .filter(j -> j.verdict() == Verdict.WORKABLE)
                .map(j -> j.setup().source()))
        .contains("hand-winch", "pickup", "tackle");
    for (int i = 1; i < p.ranked().size(); i++) {
      assertThat(p.ranked().get(i).verdict())
          .isGreaterThanOrEqualTo(p.ranked().get(i - 1).verdict());
    }
  }

  @Test
  void takingAnArchiveAwayTakesItsSetupsAwayAndNothingElse(@TempDir Path folder)
      throws IOException {
    DemoSite demo = DemoSite.coarse(Site.Display.US);
    Site site = demo.site();
    Map<Setup, Verdict> all = verdicts(demo.plan());
    Map<String, String> sourceOf =
        Map.of(
            "fallwright-winch", "hand-winch",
            "fallwright-vehicle", "pickup",
            "fallwright-hand-line", "crew",
            "fallwright-block-system", "tackle");
    for (Map.Entry<String, String> gone : sourceOf.entrySet()) {
      Path some = Files.createDirectory(folder.resolve(gone.getKey()));
      for (Path jar : archives()) {
        if (!jar.getFileName().toString().startsWith(gone.getKey())) {
          Files.copy(jar, some.resolve(jar.getFileName()));
        }
      }
      try (PluginFolder sources = PluginFolder.open(some, "0.1.0")) {
        Plan p = plan(sources, site);
        Map<Setup, Verdict> left =
            all.entrySet().stream()
                .filter(e -> !uses(e.getKey(), gone.getValue()))
                .collect(Collectors.toMap(Map.Entry::getKey, Map.Entry::getValue));
        assertThat(left).as(gone.getKey()).isNotEmpty().hasSizeLessThan(all.size());
        assertThat(verdicts(p)).as(gone.getKey()).isEqualTo(left);
        assertThat(p.notes()).anyMatch(n -> n.contains("\"" + gone.getValue() + "\""));
      }
    }
  }

  private static boolean uses(Setup s, String source) {
    return s.source().equals(source) || s.driver() != null && s.driver().source().equals(source);
  }

  private static List<Path> archives() throws IOException {
    try (var files = Files.list(ARCHIVES)) {
      List<Path> jars = files.filter(p -> p.toString().endsWith(".jar")).toList();
      assertThat(jars.stream().map(Path::getFileName).map(Object::toString))
          .as("the four archives, built by this build")
          .hasSize(4);
      return jars;
    }
  }
}
