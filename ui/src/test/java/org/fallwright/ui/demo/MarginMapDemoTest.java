package org.fallwright.ui.demo;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Random;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.MarginMap;
import org.fallwright.core.plan.MarginMap.Cut;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.raster.ContourLines;
import org.fallwright.core.site.Position;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.LineString;

/** The margin map of the demo against the setups that stand where it says. */
class MarginMapDemoTest {
  private static final long SEED = 31;

  private final DemoSite demo = DemoSite.asItIs();
  private final MarginMap map = map(DemoSite.ROW_4);

  @Test
  void openCellsHaveTheMarginOfASetupThatStandsThere() {
    Random random = new Random(SEED);
    List<Integer> open = map.atLeast(0);
    assertThat(open).hasSizeGreaterThan(3000);
    for (int k = 0; k < 40; k++) {
      int cell = open.get(random.nextInt(open.size()));
      Judged there = standing(map.margin().middle(cell));
      assertThat(map.margin().at(cell))
          .as("seed %d, at %s", SEED, map.margin().middle(cell))
          .isCloseTo(there.figures().pullMargin(), within(0.002 * there.figures().pullMargin()));
      assertThat(there.checks())
          .as("line from %s", map.margin().middle(cell))
          .filteredOn(c -> c.id().startsWith("line clear of"))
          .noneMatch(c -> c.ratio() < 1);
    }
  }

  @Test
  void groundIsCutOutForTheReasonThatASetupThereMeets() {
    Random random = new Random(SEED + 1);
    int looked = 0;
    for (int k = 0; looked < 60 && k < 40_000; k++) {
      int cell = random.nextInt(map.margin().columns() * map.margin().rows());
      Position at = map.margin().middle(cell);
      if (map.cut(cell) == Cut.LINE_FOULED) {
        assertThat(standing(at).checks())
            .as("seed %d, at %s", SEED + 1, at)
            .anyMatch(
                c -> c.id().startsWith("line clear of") && c.verdict() == Verdict.NOT_WORKABLE);
        looked++;
      } else if (map.cut(cell) == Cut.OUT_OF_REACH) {
        assertThat(DemoSite.check(standing(at), "line length").ratio()).isLessThan(1);
        looked++;
      } else if (map.cut(cell) == Cut.NO_LEVER) {
        assertThat(standing(at).figures().pullMargin()).isNaN();
        looked++;
      }
    }
    assertThat(looked).as("seed " + (SEED + 1)).isEqualTo(60);
  }

  @Test
  void everyReasonOccursButThatOfARuleWithoutException() {
    assertThat(map.counts().keySet())
        .containsExactlyInAnyOrder(
            Cut.OPEN,
            Cut.TREE_CAN_LAND,
            Cut.THING_THERE,
            Cut.WIRE_NEAR,
            Cut.NO_LEVER,
            Cut.OUT_OF_REACH,
            Cut.LINE_FOULED);
    DemoSite strict = demo.with(s -> s.put("rule_set", "DE-DGUV"));
    MarginMap german =
        MarginMap.of(new Judge(strict.site(), DemoSite.sources()), DemoSite.ROW_4, 100, 1);
    assertThat(german.counts()).containsKey(Cut.TOO_NEAR);
    for (int cell : german.atLeast(0)) {
      assertThat(german.margin().middle(cell).distanceTo(new Position(16, 24)))
          .isGreaterThanOrEqualTo(2 * 17.5 - 0.1);
    }
  }

  @Test
  void contoursRunWhereTheMarginIsTheirs() {
    List<LineString> workable = ContourLines.of(map.margin(), 1.25);
    assertThat(workable).isNotEmpty();
    for (LineString line : workable) {
      Coordinate middle = line.getCoordinateN(line.getNumPoints() / 2);
      double there = standing(new Position(middle.x, middle.y)).figures().pullMargin();
      assertThat(there).isCloseTo(1.25, within(0.01));
    }
  }

  @Test
  void whatHasNoMapIsRefusedInOneSentence() {
    assertThatThrownBy(() -> map(DemoSite.ROW_6)).hasMessageContaining("pulls direct");
    assertThatThrownBy(() -> map(DemoSite.ROW_8)).hasMessageContaining("S1 is an anchor");
  }

  private MarginMap map(Setup setup) {
    return MarginMap.of(new Judge(demo.site(), DemoSite.sources()), setup, 100, 1);
  }

  /** Row 4 from another place, on the same ground. */
  private Judged standing(Position at) {
    return demo.with(
            s -> {
              ObjectNode spot = DemoSite.entry(s.get("spots"), "V1");
              ArrayNode place = ((ObjectNode) spot.get("place")).putArray("at");
              place.add(at.eastM()).add(at.northM());
              spot.putNull("heading_deg");
            })
        .judge(DemoSite.ROW_4);
  }
}
