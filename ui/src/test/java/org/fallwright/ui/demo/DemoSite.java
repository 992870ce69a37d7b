package org.fallwright.ui.demo;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Consumer;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
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

  private static final Map<Site.Display, DemoSite> COARSE = new EnumMap<>(Site.Display.class);

  private final ObjectNode tree;
  private Plan plan;

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

  /**
   * The demo in some units, with a coarser grid of lays and those of its rows: one for all tests,
   * searched once.
   */
  public static synchronized DemoSite coarse(Site.Display units) {
    return COARSE.computeIfAbsent(
        units,
        u ->
            asItIs()
                .with(
                    s -> {
                      s.put("display", u.name().toLowerCase(Locale.ROOT));
                      ObjectNode offer = (ObjectNode) s.get("offer");
                      offer.put("lay_step_deg", 10.0).withArray("lays_deg").add(3).add(7).add(342);
                    }));
  }

  /** A copy with something changed in the file. */
  public DemoSite with(Consumer<ObjectNode> change) {
    ObjectNode copy = tree.deepCopy();
    change.accept(copy);
    return new DemoSite(copy);
  }

  /** The entry of a list that has that id. */
  public static ObjectNode entry(JsonNode list, String id) {
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

  /** What the planner finds; searched once. */
  public synchronized Plan plan() {
    if (plan == null) {
      plan = new Planner(PLUGINS).plan(site());
    }
    return plan;
  }

  public Judged judge(Setup setup) {
    return new Judge(site(), PLUGINS).judge(setup);
  }

  public static Setup direct(double lay, String source, String mode, String place) {
    return new Setup(lay, 10.5, 0.045, "L1", List.of(), source, mode, place, null);
  }

  public static Setup redirected(
      double lay, String source, String mode, String place, String over) {
    return new Setup(lay, 10.5, 0.045, "L1", List.of(over), source, mode, place, null);
  }

  public static Setup tackle(double lay, String parts, String driver, String mode, String place) {
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

  public static Check check(Judged j, String id) {
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
