package org.fallwright.ui.app;

import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import org.fallwright.core.doubt.Doubt;
import org.fallwright.core.doubt.Doubted;
import org.fallwright.core.doubt.Doubts;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;
import org.fallwright.ui.task.Planning;

/**
 * The planner of the core with the pull sources at hand.
 *
 * @param sources the pull sources
 */
public record CorePlanning(PullSources sources) implements Planning {
  @Override
  public Plan plan(Site site, DoubleConsumer progress, BooleanSupplier cancelled) {
    return Doubted.plan(site, sources, progress, cancelled);
  }

  @Override
  public Plan again(Site site, Plan plan) {
    return Doubted.again(site, sources, plan);
  }

  @Override
  public Doubt doubt(Site site, Setup setup, DoubleConsumer progress, BooleanSupplier cancelled) {
    return new Doubts(site, sources).of(setup, progress, cancelled);
  }
}
