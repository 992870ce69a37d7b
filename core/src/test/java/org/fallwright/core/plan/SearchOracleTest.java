package org.fallwright.core.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.IntStream;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

/** The quick search against the exhaustive one: on small sites of many kinds not one difference. */
class SearchOracleTest {
  private static final int SITES = 2_000;

  /** Every so many sites the whole plans are compared, written out in full. */
  private static final int WHOLE = 25;

  /** Most ways shown: so few that most are not, and more than there are. */
  private static final int[] MOST = {1, 3, Plan.MOST_WAYS};

  /** All that a search found, in words. */
  private static String found(Answer a) {
    StringBuilder s = new StringBuilder();
    s.append(a.tally().all()).append(a.tally().byVerdict()).append('\n');
    a.tally().byMissed().forEach((id, n) -> s.append(id).append(' ').append(n).append('\n'));
    a.tally()
        .nearest(Plan.MOST_REASONS)
        .forEach((id, n) -> s.append(id).append(' ').append(n).append('\n'));
    for (Top.Entry e : a.top().best()) {
      Look l = e.look();
      s.append(e.setup())
          .append(l.verdict())
          .append(' ')
          .append(l.failing())
          .append(' ')
          .append(l.standing())
          .append(' ')
          .append(Arrays.toString(l.standings()))
          .append('\n');
    }
    return s.append(a.notes()).toString();
  }

  private static Answer quick(Site site, int most) {
    return new Search(site, FakeSources.ALL, new LeftOut(site), most, share -> {}, () -> false)
        .answer();
  }

  private static Answer slow(Site site, int most) {
    return new Exhaustive(FakeSources.ALL)
        .answer(site, new LeftOut(site), most, share -> {}, () -> false);
  }

  @Test
  void theQuickSearchFindsWhatTheExhaustiveOneFinds() {
    Map<Verdict, Integer> best = new ConcurrentHashMap<>();
    IntStream.rangeClosed(1, SITES)
        .parallel()
        .forEach(seed -> compare(seed).ifPresent(v -> best.merge(v, 1, Integer::sum)));
    // sites of every kind, or nothing would be proven
    assertThat(best).containsOnlyKeys(Verdict.values());
    assertThat(best.values()).allMatch(n -> n > SITES / 40);
  }

  /** Compares the searches of one site; the verdict of its best setup. */
  private static Optional<Verdict> compare(int seed) {
    Site site = PlanSites.site(seed);
    int most = MOST[seed % MOST.length];
    Answer slow = slow(site, most);
    assertThat(found(quick(site, most))).as("seed %d", seed).isEqualTo(found(slow));
    if (seed % WHOLE == 0) {
      assertThat(written(site, new Planner(FakeSources.ALL).plan(site)))
          .as("seed %d", seed)
          .isEqualTo(written(site, new Exhaustive(FakeSources.ALL).plan(site)));
    }
    return slow.top().best().stream().findFirst().map(e -> e.look().verdict());
  }

  @Test
  void aSourceThatBreaksItsContractIsAskedForEverySetup() {
    // its low falls with the line to take in, which it may not
    PullSource odd =
        new TinySite.Steady() {
          @Override
          public PullOffer offer(PullRequest r) {
            double low = 3000 / (1 + r.pull().takeUpM());
            return PullOffer.giving(low, 4000, super.offer(r).limit()).holds(low, true).done();
          }
        };
    Site site = TinySite.site(1000);
    assertThat(written(site, new Planner(() -> List.of(odd)).plan(site)))
        .isEqualTo(written(site, new Exhaustive(() -> List.of(odd)).plan(site)));
  }

  /** A whole plan with every figure, check and sentence. */
  private static String written(Site site, Plan plan) {
    PlanJson.Header header = new PlanJson.Header("test", List.of(), List.of());
    return new String(PlanJson.write(site, plan, header), StandardCharsets.UTF_8);
  }
}
