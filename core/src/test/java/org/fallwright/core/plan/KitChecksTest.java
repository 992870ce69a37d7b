package org.fallwright.core.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.fallwright.core.line.LineFigures;
import org.fallwright.core.line.Point3;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.LeftBehind;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;
import org.junit.jupiter.api.Test;

/** What is short, and the least that mends it; two lines joined. The path is 30.7 m. */
class KitChecksTest {
  private static final Setup DIRECT =
      new Setup(0, 6, 0.03, "L2", List.of(), "steady", "pull", "R1", null);

  private static Site site(double l1, double l2, Consumer<ObjectNode> more) {
    return TinySite.site(
        2000,
        s -> {
          s.put("display", "metric");
          ArrayNode lines = (ArrayNode) s.at("/gear/lines");
          ((ObjectNode) lines.get(0)).put("length_m", l1);
          ((ObjectNode) lines.get(1)).put("length_m", l2);
          more.accept(s);
        });
  }

  private static String why(Site site, Setup setup, String id) {
    return new Judge(site, TinySite.SOURCES)
        .judge(setup).checks().stream()
            .filter(c -> c.id().equals(id))
            .map(Check::why)
            .findFirst()
            .orElse("no such check");
  }

  private static void spot(ObjectNode s) {
    TinySite.add(
        s,
        "spots",
        """
        {"id": "S", "place": {"at": [0, 30], "ground_m": 0, "fix": "tapes", "stated_error_m": null},
         "heading_deg": null, "surface": "compact-gravel", "wet": false, "grade_deg": 0,
         "run_out_m": null, "land": null}""");
    ((ArrayNode) s.at("/gear/sources/0/places")).add("S");
  }

  @Test
  void atAnAnchorNobodyCanStandNearer() {
    assertThat(why(site(80, 31.5, s -> {}), DIRECT, "line length"))
        .isEqualTo(
            "Line L2 reaches 31.5 m; the path with wraps and tails needs 32.7 m: it takes 1.50 m"
                + " more of line.");
  }

  @Test
  void atASpotTheLeastChangeIsToStandNearer() {
    Setup at = new Setup(0, 6, 0.03, "L2", List.of(), "steady", "pull", "S", null);
    assertThat(why(site(80, 31.5, KitChecksTest::spot), at, "line length"))
        .endsWith(": stand 1.50 m nearer.");
    assertThat(why(site(80, 31.5, KitChecksTest::spot).in(Site.Display.US), at, "line length"))
        .endsWith(": stand 5 ft 0 in nearer.");
  }

  @Test
  void aLineLeftBehindThatWouldDoIsNamedWithItsPlace() {
    Site left = site(80, 31.5, s -> {}).leaving(new LeftBehind("L1", "Truck 2"));
    assertThat(why(left, DIRECT, "line length")).endsWith(": take L1 (80.0 m, on Truck 2).");
    Site short1 = site(32, 31.5, s -> {}).leaving(new LeftBehind("L1", null));
    assertThat(why(short1, DIRECT, "line length")).endsWith(" more of line.");
  }

  @Test
  void missingSlingsAndConnectorsAreCounted() {
    Site none = site(80, 45, s -> ((ObjectNode) s.at("/gear/slings/0")).put("count", 0));
    assertThat(why(none, DIRECT, "slings")).isEqualTo("1 slings needed, 0 at hand: 1 more sling.");
    Site left = site(80, 45, s -> {}).leaving(new LeftBehind("Shackles", "the yard"));
    assertThat(why(left, DIRECT, "connectors"))
        .isEqualTo("1 connectors needed, 0 at hand: take Shackles (4 of them, on the yard).");
  }

  @Test
  void theStepNearerShortensTheLegByWhatIsMissing() {
    Point3 leg = new Point3(0, -30, 5);
    double shorter = 1.2;
    double level = 30 - Math.sqrt(Math.pow(leg.length() - shorter, 2) - 25);
    assertThat(level).isBetween(1.0, 1.5);
    assertThat(Nearer.by(leg, shorter, DisplayUnits.METRIC)).contains("stand 1.50 m nearer");
    assertThat(Nearer.by(leg, 27, DisplayUnits.METRIC)).isEmpty();
    assertThat(Nearer.up(2, DisplayUnits.METRIC)).isEqualTo("2.00 m");
  }

  @Test
  void whatIsLeftBehindIsJudgedAsIfItWereNotThere() {
    Site all = site(80, 45, s -> {});
    Site without = site(80, 45, s -> ((ArrayNode) s.at("/gear/lines")).remove(0));
    Plan a = new Planner(TinySite.SOURCES).plan(all.leaving(new LeftBehind("L1", null)));
    Plan b = new Planner(TinySite.SOURCES).plan(without);
    assertThat(a.ranked()).isEqualTo(b.ranked());
    assertThat(a.byVerdict()).isEqualTo(b.byVerdict());
    assertThat(a.notes()).contains("Left behind and not counted on: L1.");
    Plan none =
        new Planner(TinySite.SOURCES)
            .plan(all.leaving(new LeftBehind("L1", null)).leaving(new LeftBehind("L2", null)));
    assertThat(none.ranked()).isEmpty();
    assertThat(none.notes()).contains("No pull line is at hand, so nothing can be pulled.");
  }

  @Test
  void twoLinesAreJoinedWhereNoneReachesAlone() {
    Site two = site(20, 15, s -> {});
    List<Setup> ways = ways(two);
    assertThat(ways).extracting(Setup::line).contains("L2 + L1", "L1 + L2");
    Judge judge = new Judge(two, TinySite.SOURCES);
    Judged j = judge.judge(DIRECT.withLine("L1 + L2"));
    assertThat(j.checks()).extracting(Check::id).contains("line length").doesNotContain("joint");
    assertThat(j.loads())
        .extracting(PartLoad::part)
        .contains("line L1 + L2", "connector at joint of L1 + L2");
    assertThat(why(two, DIRECT.withLine("L1 + L2"), "connectors")).startsWith("2 connectors");
    Site reaching = site(80, 15, s -> {});
    List<Setup> enough = ways(reaching);
    assertThat(enough).extracting(Setup::line).doesNotContain("L2 + L1", "L1 + L2");
  }

  @Test
  void joinedLinesAreAsStrongAsTheWeakerAndStretchBoth() {
    Site two =
        site(20, 15, s -> ((ObjectNode) s.at("/gear/lines/1")).put("breaking_load_N", 60000.0));
    Gear.Line joined = JoinedLines.whole(two, "L1 + L2", null);
    LineFigures weak = LineFigures.of(two.gear().lines().get(1), null);
    LineFigures strong = LineFigures.of(two.gear().lines().get(0), null);
    LineFigures both = LineFigures.of(joined, null);
    assertThat(both.strengthN()).isEqualTo(weak.strengthN()).isLessThan(strong.strengthN());
    assertThat(joined.lengthM()).isEqualTo(35);
    assertThat(35 / both.stiffnessN())
        .isCloseTo(20 / strong.stiffnessN() + 15 / weak.stiffnessN(), within(1e-15));
    assertThat(JoinedLines.parts(two, "L2")).hasSize(1);
  }

  private static List<Setup> ways(Site site) {
    Places places = new Places(site);
    Ways ways = new Ways(site, TinySite.SOURCES, new LeftOut(site));
    List<Setup> all = new ArrayList<>();
    for (Ways.End end : ways.ends()) {
      for (int group = 0; group < ways.groups(); group++) {
        for (List<String> path : ways.paths(end, group)) {
          Route route = Route.of(places, end.way(path, ""), end.source(), end.driver());
          ways.lines(end, path, route).forEach(line -> all.add(end.way(path, line)));
        }
      }
    }
    return all;
  }
}
