package org.fallwright.core.answers;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Figures;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.units.DisplayUnits;

/**
 * One figure of two setups, or of one setup before and after, as a person reads it.
 *
 * @param name what it is called
 * @param first of the first; "-" where it has none
 * @param second of the second
 */
public record FigureRow(String name, String first, String second) {
  private static final String NONE = "-";

  /** The rows that read otherwise in the second than in the first, in a fixed order. */
  public static List<FigureRow> differing(
      DisplayUnits in, Judge one, Judged first, Judge other, Judged second) {
    Map<String, String> a = read(in, one, first);
    Map<String, String> b = read(in, other, second);
    List<String> names = new ArrayList<>(a.keySet());
    b.keySet().stream().filter(n -> !a.containsKey(n)).forEach(names::add);
    return names.stream()
        .map(n -> new FigureRow(n, a.getOrDefault(n, NONE), b.getOrDefault(n, NONE)))
        .filter(r -> !r.first.equals(r.second))
        .toList();
  }

  private static Map<String, String> read(DisplayUnits in, Judge judge, Judged j) {
    Setup s = j.setup();
    Figures f = j.figures();
    Map<String, String> r = new LinkedHashMap<>();
    r.put("verdict", j.verdict().word());
    r.put("weakest", j.weakest().id() + ", " + ratio(j.weakest().ratio()));
    r.put("source", Uses.words(s));
    r.put("lay", String.format(Locale.ROOT, "%05.1f°", s.layDeg()));
    r.put("line at", in.length(s.attachHeightM()));
    r.put("hinge", in.smallLength(s.hingeThicknessM()));
    r.put("line", s.line());
    r.put("pull needed", in.forceAtLeast(f.pullNeededN()));
    r.put("pull to plan for", in.forceAtLeast(f.pullPlanN()));
    r.put("gives", in.forceAtMost(f.sourceLowN()));
    r.put("pull margin", ratio(f.pullMargin()));
    r.put("hold tension", in.forceAtLeast(f.holdN()));
    r.put("hold stability", ratio(f.holdStability()));
    r.put("ceiling", in.forceAtMost(f.ceilingN()));
    r.put("stop reading", f.leansOnStopReading() ? in.forceAtMost(f.stopReadingN()) : NONE);
    r.put(
        "clearance",
        Double.isNaN(f.clearanceM()) || f.clearanceTarget() == null
            ? NONE
            : in.length(f.clearanceM()) + " to " + f.clearanceTarget());
    r.put("line length", in.length(f.lineLengthM()));
    r.put("parts", String.valueOf(j.loads().size()));
    r.put("people at the source", String.valueOf(people(judge, j)));
    r.put("take-up", in.length(f.takeUpM()));
    r.put("travel at the source", in.length(f.sourceTravelM()));
    r.put("line in when it goes", in.length(f.lineInAtCommitM()));
    r.put("gape when it goes", in.smallLength(f.gapeM()));
    r.put("steering share", String.format(Locale.ROOT, "%.2f", f.steeringShare()));
    for (Check c : j.checks()) {
      if (c.id().startsWith("anchor ")) {
        r.put(c.id(), ratio(c.ratio()));
      }
    }
    return r;
  }

  /** People who work the source. */
  static int people(Judge judge, Judged j) {
    return judge.reckon(j.setup()).offer().operators();
  }

  private static String ratio(double r) {
    return Double.isNaN(r) ? NONE : Double.isInfinite(r) ? "nothing asked" : DisplayUnits.ratio(r);
  }
}
