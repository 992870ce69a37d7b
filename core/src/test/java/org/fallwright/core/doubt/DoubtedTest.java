package org.fallwright.core.doubt;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.concurrent.atomic.AtomicBoolean;
import org.fallwright.core.advice.SteadyPull;
import org.fallwright.core.advice.TinySite;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceFault;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

class DoubtedTest {
  private final AtomicBoolean broken = new AtomicBoolean();
  private final PullSources sources = () -> List.of(new Breaking());

  /** A steady pull that fails from some moment on. */
  private final class Breaking implements PullSource {
    private final SteadyPull steady = new SteadyPull();

    @Override
    public SourceDescription describe() {
      return steady.describe();
    }

    @Override
    public List<String> modes(ObjectNode parameters) {
      return steady.modes(parameters);
    }

    @Override
    public PullOffer offer(PullRequest request) {
      if (broken.get()) {
        throw new SourceFault("steady", "The plugin \"steady\" failed to work out its pull.", null);
      }
      return steady.offer(request);
    }
  }

  @Test
  void aSourceThatFailsAfterTheSearchIsLeftOutWithItsReason() {
    Site site = new TinySite().site();
    Plan searched = new Planner(sources).plan(site);
    assertThat(searched.ranked()).isNotEmpty();
    broken.set(true);
    Plan decided = Doubted.decided(site, sources, searched, () -> false);
    assertThat(decided.ranked()).isEmpty();
    assertThat(decided.notes())
        .contains("The plugin \"steady\" failed to work out its pull. Its setups are left out.");
  }

  @Test
  void aSourceThatDoesNotFailKeepsItsSetups() {
    Site site = new TinySite().site();
    Plan searched = new Planner(sources).plan(site);
    Plan decided = Doubted.decided(site, sources, searched, () -> false);
    assertThat(decided.ranked()).hasSameSizeAs(searched.ranked());
    assertThat(decided.ranked().get(0).figures().sampled()).isTrue();
  }
}
