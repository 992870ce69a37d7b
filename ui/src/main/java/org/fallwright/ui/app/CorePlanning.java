package org.fallwright.ui.app;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
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
    return new Planner(sources).plan(site, progress, cancelled);
  }

  @Override
  public Plan again(Site site, Plan plan) {
    Judge judge = new Judge(site, sources);
    Map<String, Judged> rejected = new LinkedHashMap<>();
    plan.bestRejected().forEach((id, j) -> rejected.put(id, judge.judge(j.setup())));
    return new Plan(
        plan.ranked().stream().map(j -> judge.judge(j.setup())).toList(),
        plan.judged(),
        plan.byVerdict(),
        plan.byBindingCheck(),
        rejected,
        plan.notes(),
        plan.sources());
  }
}
