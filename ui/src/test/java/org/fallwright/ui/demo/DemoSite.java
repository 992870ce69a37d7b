package org.fallwright.ui.demo;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.SiteFile;
import org.fallwright.plugins.host.PluginFolder;

/** The demo site with the plugins from their archives, as it is and with single entries changed. */
public final class DemoSite {
  /** The site file in the tree. */
  public static final Path FILE = Path.of("demo", "oak-behind-the-house.fallsite.json");

  private static final PluginFolder PLUGINS =
      PluginFolder.open(Path.of("target", "plugins"), "0.1.0");

  private final ObjectNode tree;

  private DemoSite(ObjectNode tree) {
    this.tree = tree;
  }

  public static PullSources sources() {
    return PLUGINS;
  }

  public static DemoSite asItIs() {
    try {
      return new DemoSite((ObjectNode) new ObjectMapper().readTree(FILE.toFile()));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** A copy with something changed in the file. */
  public DemoSite with(Consumer<ObjectNode> change) {
    ObjectNode copy = tree.deepCopy();
    change.accept(copy);
    return new DemoSite(copy);
  }

  /** The entry of a list that has that id. */
  static ObjectNode entry(JsonNode list, String id) {
    for (JsonNode n : list) {
      if (n.get("id").asText().equals(id)) {
        return (ObjectNode) n;
      }
    }
    throw new IllegalArgumentException("the demo site has no " + id);
  }

  public Site site() {
    try {
      byte[] bytes = tree.toString().getBytes(java.nio.charset.StandardCharsets.UTF_8);
      return SiteFile.read(new ByteArrayInputStream(bytes), "demo");
    } catch (org.fallwright.core.store.SiteFileException e) {
      throw new AssertionError(e);
    }
  }

  Judged judge(Setup setup) {
    return new Judge(site(), PLUGINS).judge(setup);
  }

  static Setup direct(double lay, String source, String mode, String place) {
    return new Setup(lay, 10.5, 0.045, "L1", List.of(), source, mode, place, null);
  }

  static Setup redirected(double lay, String source, String mode, String place, String over) {
    return new Setup(lay, 10.5, 0.045, "L1", List.of(over), source, mode, place, null);
  }

  static Setup tackle(double lay, String parts, String driver, String mode, String place) {
    return new Setup(
        lay,
        10.5,
        0.045,
        "L1",
        List.of(),
        "tackle",
        parts,
        "A1",
        new Setup.Driver(driver, mode, place));
  }

  static Check check(Judged j, String id) {
    return j.checks().stream()
        .filter(c -> c.id().equals(id))
        .findFirst()
        .orElseThrow(
            () ->
                new AssertionError(
                    id + " is not among " + j.checks().stream().map(Check::id).toList()));
  }

  /** The checks that are not workable, for messages. */
  static List<String> failing(Judged j) {
    return j.checks().stream()
        .filter(c -> c.verdict() != Verdict.WORKABLE)
        .map(c -> c.id() + " " + c.verdict().word() + " " + c.ratio() + ": " + c.why())
        .toList();
  }
}
