package org.fallwright.core.plan;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.databind.ObjectWriter;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.TakenException;

/**
 * Writes the plan document: what the planner found, for other programs to read. SI throughout, the
 * unit in each field's name. A number is written with nine significant digits; one that is infinite
 * or that nobody can say is written as null. The same plan gives the same bytes: the document holds
 * no time, place or machine.
 */
public final class PlanJson {
  /** Name of the format, first field of the document. */
  public static final String FORMAT = "fallwright-plan";

  /** Version written. */
  public static final int VERSION = 2;

  private static final MathContext DIGITS = new MathContext(9);
  private static final ObjectWriter WRITER = writer();

  /**
   * What the document says beside the plan itself.
   *
   * @param program version of the program
   * @param cautions cautions that go with every plan
   * @param notChecked what the plan does not look at
   * @param notByPulling the sentence that pulling is not the method here; null where it may be
   * @param doubt how far the figures of the leading setups can be trusted; may be empty
   */
  public record Header(
      String program,
      List<String> cautions,
      List<String> notChecked,
      String notByPulling,
      List<ObjectNode> doubt) {
    public Header {
      cautions = List.copyOf(cautions);
      notChecked = List.copyOf(notChecked);
      doubt = List.copyOf(doubt);
    }

    /** A header of a plan whose method is not spoken of. */
    public Header(String program, List<String> cautions, List<String> notChecked) {
      this(program, cautions, notChecked, null, List.of());
    }
  }

  private PlanJson() {}

  /** The document, UTF-8, ending with a line feed. */
  public static byte[] write(Site site, Plan plan, Header header) {
    ObjectNode doc = JsonNodeFactory.instance.objectNode();
    doc.put("format", FORMAT);
    doc.put("version", VERSION);
    doc.put("program", header.program());
    doc.put("units", "SI");
    doc.put("site", site.name());
    doc.put("rule_set", site.ruleSet());
    doc.put("setups_judged", plan.judged());
    ObjectNode verdicts = doc.putObject("by_verdict");
    for (Verdict v : Verdict.values()) {
      verdicts.put(v.word(), plan.byVerdict().getOrDefault(v, 0));
    }
    doc.put("not_by_pulling", known(header.notByPulling()));
    ObjectNode binding = doc.putObject("by_binding_check");
    new TreeMap<>(plan.byBindingCheck()).forEach(binding::put);
    ArrayNode setups = doc.putArray("setups");
    int rank = 0;
    for (Judged j : plan.ranked()) {
      setups.add(setup(++rank, j));
    }
    ObjectNode rejected = doc.putObject("best_rejected");
    for (Map.Entry<String, Judged> e : new TreeMap<>(plan.bestRejected()).entrySet()) {
      rejected.set(e.getKey(), setup(null, e.getValue()));
    }
    ArrayNode exceptions = doc.putArray("exceptions");
    for (TakenException e : site.exceptions()) {
      ObjectNode one = exceptions.addObject();
      one.put("check", e.check());
      one.put("by", e.by());
      one.put("why", e.why());
      one.put("when", e.when());
    }
    ArrayNode doubt = doc.putArray("doubt");
    header.doubt().forEach(doubt::add);
    texts(doc, "notes", plan.notes());
    texts(doc, "not_checked", header.notChecked());
    texts(doc, "cautions", header.cautions());
    try {
      return (WRITER.writeValueAsString(doc) + "\n").getBytes(StandardCharsets.UTF_8);
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("a tree of values could not be written", e);
    }
  }

  private static ObjectNode setup(Integer rank, Judged j) {
    ObjectNode o = JsonNodeFactory.instance.objectNode();
    o.put("rank", rank);
    o.put("verdict", j.verdict().word());
    o.put("sentence", j.sentence());
    choices(o, j.setup());
    figures(o, j.figures());
    ObjectNode weakest = o.putObject("weakest");
    weakest.put("check", j.weakest().id());
    number(weakest, "ratio", j.weakest().ratio());
    number(o, "standing", j.standing());
    ArrayNode checks = o.putArray("checks");
    j.checks().forEach(c -> checks.add(check(c)));
    ArrayNode loads = o.putArray("loads");
    j.loads().forEach(l -> loads.add(load(l)));
    points(o, "path", j.line());
    points(o, "haul_path", j.haul());
    o.set("zones", ZonesJson.of(j.ground()));
    texts(o, "notes", j.notes());
    return o;
  }

  private static void choices(ObjectNode o, Setup s) {
    number(o, "lay_deg", s.layDeg());
    number(o, "attach_height_m", s.attachHeightM());
    number(o, "hinge_thickness_m", s.hingeThicknessM());
    o.put("line", s.line());
    texts(o, "blocks", s.redirects());
    o.put("source", s.source());
    o.put("source_mode", s.mode());
    o.put("source_at", s.place());
    Setup.Driver d = s.driver();
    if (d == null) {
      o.putNull("driver");
    } else {
      ObjectNode driver = o.putObject("driver");
      driver.put("source", d.source());
      driver.put("source_mode", d.mode());
      driver.put("source_at", d.place());
    }
  }

  private static void figures(ObjectNode o, Figures f) {
    number(o, "pull_needed_N", f.pullNeededN());
    number(o, "pull_plan_N", f.pullPlanN());
    number(o, "hold_tension_N", f.holdN());
    number(o, "working_tension_N", f.workingN());
    number(o, "rest_share", f.restShare());
    number(o, "hold_stability", f.holdStability());
    o.put("starts_itself", known(f.startsItself()));
    number(o, "pretension_top_N", f.pretensionTopN());
    number(o, "source_low_N", f.sourceLowN());
    number(o, "source_high_N", f.sourceHighN());
    number(o, "ceiling_N", f.ceilingN());
    o.put("ceiling_part", known(f.ceilingPart()));
    number(o, "pull_margin", f.pullMargin());
    number(o, "clearance_m", f.clearanceM());
    o.put("clearance_target", f.clearanceTarget());
    number(o, "commit_deg", f.commitDeg());
    number(o, "movement_end_deg", f.movementEndDeg());
    number(o, "take_up_m", f.takeUpM());
    number(o, "line_in_at_commit_m", f.lineInAtCommitM());
    number(o, "source_travel_m", f.sourceTravelM());
    number(o, "line_rise_deg", f.lineRiseDeg());
    number(o, "lever_m", f.leverM());
    number(o, "steering_share", f.steeringShare());
    number(o, "turn_share", f.turnShare());
    number(o, "gape_m", f.gapeM());
    number(o, "line_length_m", f.lineLengthM());
    o.put("leans_on_stop_reading", f.leansOnStopReading());
    number(o, "stop_reading_N", f.stopReadingN());
    o.put("stop_reading_at", known(f.stopReadingAt()));
    number(o, "source_end_per_tree", f.sourceEndPerTree());
    o.put("runs_on_stretch", f.runsOnStretch());
    o.put("sampled", f.sampled());
  }

  private static ObjectNode check(Check c) {
    ObjectNode o = JsonNodeFactory.instance.objectNode();
    o.put("id", c.id());
    number(o, "value", c.value());
    number(o, "limit", c.limit());
    o.put("unit", c.unit());
    number(o, "ratio", c.ratio());
    o.put("verdict", c.verdict().word());
    if (c.place() == null) {
      o.putNull("place");
    } else {
      place(o, "place", c.place());
    }
    o.put("why", c.why());
    return o;
  }

  private static ObjectNode load(PartLoad l) {
    ObjectNode o = JsonNodeFactory.instance.objectNode();
    o.put("part", l.part());
    number(o, "at_plan_N", l.atPlanN());
    number(o, "at_high_N", l.atHighN());
    number(o, "at_ceiling_N", l.atCeilingN());
    number(o, "strength_N", l.strengthN());
    number(o, "design_factor", l.designFactor());
    number(o, "last_factor", l.lastFactor());
    return o;
  }

  private static void points(ObjectNode o, String name, List<LinePoint> points) {
    ArrayNode all = o.putArray(name);
    for (LinePoint p : points) {
      ObjectNode point = all.addObject();
      point.put("role", p.role().name().toLowerCase(Locale.ROOT));
      point.put("id", p.id());
      place(point, "at", p.at());
      number(point, "elevation_m", p.elevationM());
    }
  }

  static void place(ObjectNode o, String name, Position p) {
    o.putArray(name).add(rounded(p.eastM())).add(rounded(p.northM()));
  }

  private static void texts(ObjectNode o, String name, List<String> texts) {
    ArrayNode all = o.putArray(name);
    texts.forEach(all::add);
  }

  private static String known(String text) {
    return text == null || text.isBlank() ? null : text;
  }

  /** Puts a number as the document has them: nine digits, null where it is not finite. */
  public static void number(ObjectNode o, String name, double value) {
    o.put(name, Double.isFinite(value) ? rounded(value) : null);
  }

  private static BigDecimal rounded(double value) {
    return value == 0 ? BigDecimal.ZERO : new BigDecimal(value).round(DIGITS).stripTrailingZeros();
  }

  private static ObjectWriter writer() {
    DefaultIndenter lines = new DefaultIndenter("  ", "\n");
    return JsonMapper.builder()
        .enable(StreamWriteFeature.WRITE_BIGDECIMAL_AS_PLAIN)
        .build()
        .writer(new DefaultPrettyPrinter().withObjectIndenter(lines).withArrayIndenter(lines));
  }
}
