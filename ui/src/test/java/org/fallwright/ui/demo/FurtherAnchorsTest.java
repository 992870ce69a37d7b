package org.fallwright.ui.demo;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.fallwright.ui.demo.DemoSite.check;
import static org.fallwright.ui.demo.DemoSite.direct;
import static org.fallwright.ui.demo.DemoSite.redirected;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.PartLoad;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.junit.jupiter.api.Test;

/** Two-legged, picket and buried anchors on the demo site, and whose land an anchor is on. */
class FurtherAnchorsTest {
  private static final DemoSite DEMO = DemoSite.asItIs();
  private static final Setup ON_LEGS = direct(0, "hand-winch", "pull", "B1");

  private static ObjectNode anchor(ObjectNode site, String type, String id, double e, double n) {
    ObjectNode a = ((ArrayNode) site.get("anchors")).addObject();
    a.put("type", type).put("id", id);
    ObjectNode place = a.putObject("place");
    place.putArray("at").add(e).add(n);
    place.put("ground_m", 0.7).put("fix", "tapes").putNull("stated_error_m");
    a.put("sling_height_m", 0.1).putNull("rejected").put("land", "owner");
    ((ArrayNode) DemoSite.entry(site.get("gear").get("sources"), "hand-winch").get("places"))
        .add(id);
    return a;
  }

  private static DemoSite withLegs(String first, String second) {
    return DEMO.with(
        s -> {
          anchor(s, "two-legs", "B1", 14, 49).put("first", first).put("second", second);
          DemoSite.entry(s.get("gear").get("slings"), "Slings").put("count", 4);
        });
  }

  private static PartLoad part(Judged j, String name) {
    return j.loads().stream().filter(p -> p.part().equals(name)).findFirst().orElseThrow();
  }

  @Test
  void twoLegsShareTheWinchsLoad() {
    Judged j = withLegs("A1", "A2").judge(ON_LEGS);
    double whole = part(j, "connector at B1").atPlanN();
    double one = part(j, "anchor A1").atPlanN();
    double other = part(j, "anchor A2").atPlanN();
    assertThat(part(j, "sling at A1").atPlanN()).isCloseTo(one, within(1e-6 * one));
    // two sides of a triangle
    assertThat(one + other).isGreaterThan(whole);
    assertThat(Math.abs(one - other)).isLessThan(whole);
    assertThat(check(j, "usable B1").verdict()).isEqualTo(Verdict.WORKABLE);
    assertThat(check(j, "slings").limit()).isEqualTo(2);
    assertThat(check(j, "connectors").limit()).isEqualTo(3);
    assertThat(j.notes()).anyMatch(n -> n.startsWith("Both legs of B1"));
  }

  @Test
  void aLoadOutsideTheLegsIsRefused() {
    Judged j = withLegs("A2", "A3").judge(ON_LEGS);
    assertThat(j.verdict()).isEqualTo(Verdict.NOT_WORKABLE);
    assertThat(check(j, "usable B1").why()).contains("B1 is refused").contains("slack");
  }

  @Test
  void anAnchorThatBearsTwiceIsLoadedByBoth() {
    Setup twice = redirected(0, "hand-winch", "pull", "B1", "A1");
    Setup once = redirected(0, "hand-winch", "pull", "S1", "A1");
    double both = part(withLegs("A1", "A2").judge(twice), "anchor A1").atPlanN();
    assertThat(both).isGreaterThan(part(DEMO.judge(once), "anchor A1").atPlanN());
  }

  @Test
  void picketsHoldLittleAndABuriedLogMore() {
    DemoSite site =
        DEMO.with(
            s -> {
              anchor(s, "pickets", "P1", 16, 75)
                  .put("holdfast", "three-two-one")
                  .put("count", 1)
                  .put("soil", "undisturbed-loam")
                  .put("wet", false);
              anchor(s, "deadman", "D1", 16, 75.5)
                  .put("depth_m", 1.6)
                  .put("face_height_m", 0.45)
                  .put("length_m", 1.8)
                  .put("line_run", 4)
                  .put("soil", "loam");
            });
    Judged pickets = site.judge(direct(0, "hand-winch", "pull", "P1"));
    assertThat(part(pickets, "anchor P1").strengthN()).isCloseTo(17_793, within(1.0));
    assertThat(check(pickets, "anchor P1 at plan").verdict()).isEqualTo(Verdict.NOT_WORKABLE);
    Judged log = site.judge(direct(0, "hand-winch", "pull", "D1"));
    assertThat(check(log, "anchor D1 at plan").verdict()).isEqualTo(Verdict.WORKABLE);
  }

  @Test
  void landThatIsNotStatedIsAsked() {
    Setup setup = redirected(3, "hand-winch", "pull", "A3", "A1");
    assertThat(DEMO.judge(setup).notes()).noneMatch(n -> n.contains("whose land"));
    DemoSite silent = DEMO.with(s -> DemoSite.entry(s.get("anchors"), "A1").putNull("land"));
    assertThat(silent.judge(setup).notes())
        .contains("Ask whose land A1 is on; it is not stated.")
        .noneMatch(n -> n.contains("whose land A3"));
  }
}
