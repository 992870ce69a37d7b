package org.fallwright.core.plan;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Set;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Predicate;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceFault;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

/** A source that fails somewhere in a search is out of the whole plan; all else stays as it was. */
class LeftOutTest {
  private static final String NOTE = "Source \"shaky\" is left out: The plugin \"q\" broke.";

  /** Gives what the steady source gives until asked once too often. */
  private record Shaky(String id, boolean driven, Predicate<String> fails) implements PullSource {
    private void on(String question) {
      if (fails.test(question)) {
        throw new SourceFault(id, "The plugin \"q\" broke.", null);
      }
    }

    @Override
    public SourceDescription describe() {
      return new SourceDescription(
          id,
          new Wording(id, id),
          Set.of(SourceDescription.PlaceKind.ANCHOR),
          driven,
          new TinySite.Steady().describe().parameters());
    }

    @Override
    public List<String> modes(ObjectNode parameters) {
      on("modes");
      return List.of("pull");
    }

    @Override
    public HaulLine haulLine(ObjectNode parameters, String mode) {
      return driven ? new HaulLine(2, 220_000, 80) : null;
    }

    @Override
    public PullOffer offer(PullRequest request) {
      on("offer");
      return new TinySite.Steady().offer(request);
    }
  }

  private static Site site() {
    return TinySite.site(
        2000,
        s -> {
          TinySite.add(
              s,
              "anchors",
              """
              {"type": "rated", "id": "R2",
               "place": {"at": [6, 34], "ground_m": 0, "fix": "tapes", "stated_error_m": null},
               "sling_height_m": 1, "rejected": null, "land": null,
               "breaking_load_N": 200000, "vouched_by": "A"}""");
          ArrayNode sources = (ArrayNode) s.at("/gear/sources");
          ObjectNode shaky = sources.get(0).deepCopy();
          sources.add(shaky.put("id", "shaky").put("plugin", "shaky"));
          ObjectNode tackle = sources.get(0).deepCopy();
          tackle.put("id", "tackle").put("plugin", "tackle");
          tackle.putArray("drivers").add("shaky").add("steady");
          tackle.putArray("driver_places").add("R2");
          sources.add(tackle);
          ((ArrayNode) sources.get(0).get("places")).add("R2");
          ((ArrayNode) shaky.get("places")).add("R2");
        });
  }

  private static PullSources with(Predicate<String> shakyFails) {
    return () ->
        List.of(
            new TinySite.Steady(),
            new Shaky("shaky", false, shakyFails),
            new Shaky("tackle", true, q -> false));
  }

  private static void isOut(Plan plan) {
    Plan whole = new Planner(with(q -> false)).plan(site());
    List<Setup> without =
        whole.ranked().stream()
            .map(Judged::setup)
            .filter(s -> !s.source().equals("shaky"))
            .filter(s -> s.driver() == null || !s.driver().source().equals("shaky"))
            .toList();
    assertThat(whole.ranked().size()).isGreaterThan(without.size());
    assertThat(without).anyMatch(s -> s.driver() != null);
    assertThat(plan.ranked()).extracting(Judged::setup).containsExactlyElementsOf(without);
    assertThat(plan.judged()).isLessThan(whole.judged());
    assertThat(plan.byVerdict().values().stream().mapToInt(n -> n).sum()).isEqualTo(plan.judged());
    assertThat(plan.notes()).contains(NOTE);
    assertThat(whole.notes()).doesNotContain(NOTE);
  }

  @Test
  void oneThatCannotEvenListItsModes() {
    isOut(new Planner(with(q -> q.equals("modes"))).plan(site()));
  }

  @Test
  void oneThatFailsAtItsFirstOffer() {
    isOut(new Planner(with(q -> q.equals("offer"))).plan(site()));
  }

  @Test
  void oneThatFailsInTheMiddleOfTheSearch() {
    AtomicInteger asked = new AtomicInteger();
    isOut(new Planner(with(q -> q.equals("offer") && asked.incrementAndGet() > 40)).plan(site()));
  }

  @Test
  void oneThatFailsOnlyWhenTheBestIsWrittenOut() {
    AtomicInteger offers = new AtomicInteger();
    new Planner(with(q -> q.equals("offer") && offers.incrementAndGet() < 0)).plan(site());
    int all = offers.get();
    AtomicInteger asked = new AtomicInteger();
    isOut(new Planner(with(q -> q.equals("offer") && asked.incrementAndGet() >= all)).plan(site()));
  }
}
