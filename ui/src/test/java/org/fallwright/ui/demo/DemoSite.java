package org.fallwright.ui.demo;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.fasterxml.jackson.databind.node.TextNode;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Arrays;
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
import org.fallwright.core.site.Target;
import org.fallwright.core.store.SiteFile;
import org.fallwright.core.store.SiteFileException;
import org.fallwright.plugins.host.PluginFolder;
import org.fallwright.ui.app.CorePlanning;

/** The demo site with the plugins from their archives, as it is and with single entries changed. */
public final class DemoSite {
  /** The site file in the tree. */
  public static final Path FILE = Path.of("demo", "oak-behind-the-house.fallsite.json");

  private static final PluginFolder PLUGINS =
      PluginFolder.open(Path.of("target", "plugins"), "0.1.0");

  private static final Map<Site.Display, DemoSite> COARSE = new EnumMap<>(Site.Display.class);

  /** The pick-up with all wheels driven, straight from the driveway. */
  public static final Setup ROW_4 = direct(7, "pickup", "awd", "V1");

  /** The hand winch at the spruce, the line over the oak. */
  public static final Setup ROW_6 = redirected(3, "hand-winch", "pull", "A3", "A1");

  /** The same over the birch on wet ground. */
  public static final Setup ROW_7 = redirected(342, "hand-winch", "pull", "A3", "A2");

  /** The hand winch at the pine stump, past the shed. */
  public static final Setup ROW_8 = direct(39, "hand-winch", "pull", "S1");

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
   * searched once; in the other units judged again, as the desktop does.
   */
  public static synchronized DemoSite coarse(Site.Display units) {
    if (!COARSE.containsKey(units)) {
      DemoSite demo = asItIs().in(units).lays(10, 3, 7, 342);
      if (units != Site.Display.US) {
        Plan searched = coarse(Site.Display.US).plan();
        demo.plan = new CorePlanning(PLUGINS).again(demo.site(), searched);
      }
      COARSE.put(units, demo);
    }
    return COARSE.get(units);
  }

  /** The same in other units. */
  public DemoSite in(Site.Display units) {
    return with(s -> s.put("display", units.name().toLowerCase(Locale.ROOT)));
  }

  /** The same with another grid of lays and further ones. */
  public DemoSite lays(double step, double... more) {
    return with(
        s -> {
          ObjectNode offer = (ObjectNode) s.get("offer");
          ArrayNode lays = offer.put("lay_step_deg", step).putArray("lays_deg");
          Arrays.stream(more).forEach(lays::add);
        });
  }

  /** The same with one source at one place and few lays: searched in a moment. */
  public DemoSite only(String source, String place) {
    return with(s -> {
          ArrayNode sources = (ArrayNode) s.at("/gear/sources");
          ObjectNode kept = entry(sources, source);
          kept.putArray("places").add(place);
          sources.removeAll().add(kept);
        })
        .lays(90, 3);
  }

  /** The same with one more thing in a list of the file, such as {@code /targets}. */
  public DemoSite and(String list, String json) {
    return with(s -> ((ArrayNode) s.at(list)).add(parsed(json)));
  }

  /** The same as if nobody had looked for one kind of thing. */
  public DemoSite notLooked(String what) {
    return with(
        s -> {
          for (JsonNode l : s.get("looked")) {
            if (l.get("what").asText().equals(what)) {
              ((ObjectNode) l).put("found", "not-looked").putNull("by");
            }
          }
        });
  }

  /** The same with the voltage of its wire stated by nobody. */
  public DemoSite voltageBlank() {
    return with(s -> entry(s.get("wires"), "W1").putNull("voltage_kv").putNull("voltage_said_by"));
  }

  /** An entry of the list of targets: two metres high, to be missed by one. */
  public static String target(String id, Target.Kind kind, String shape) {
    return """
        {"id": %s, "kind": "%s", "shape": {%s}, "fix": "tapes", "stated_error_m": null,
         "ground_m": 0, "height_m": 2, "required_distance_m": 1, "occupied": false,
         "may_be_hit": false, "movable": false}"""
        .formatted(
            TextNode.valueOf(id), kind.name().toLowerCase(Locale.ROOT).replace('_', '-'), shape);
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

  /** A text of the file's form as a tree. */
  public static JsonNode parsed(String json) {
    try {
      return new ObjectMapper().readTree(json);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  public Site site() {
    try {
      return SiteFile.read(new ByteArrayInputStream(bytes()), "demo");
    } catch (SiteFileException e) {
      throw new AssertionError(e);
    }
  }

  /** The site file. */
  public byte[] bytes() {
    return tree.toString().getBytes(StandardCharsets.UTF_8);
  }

  /** What the planner finds; searched once. */
  public synchronized Plan plan() {
    if (plan == null) {
      plan = new Planner(PLUGINS).plan(site());
    }
    return plan;
  }

  /** The best of the plan's setups that have a verdict. */
  public Judged best(Verdict verdict) {
    return plan().ranked().stream().filter(j -> j.verdict() == verdict).findFirst().orElseThrow();
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
