package org.fallwright.ui.task;

import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import org.fallwright.core.doubt.Doubt;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.site.Site;

/** Plans a site; called off the event thread. */
@FunctionalInterface
public interface Planning {
  /**
   * @param progress told the share done, 0 to 1
   * @param cancelled asked now and then; once true, the run may end with any exception
   */
  Plan plan(Site site, DoubleConsumer progress, BooleanSupplier cancelled);

  /**
   * Judges the setups of a plan again without a search: for a site that differs from the planned
   * one only in how it is shown, so that sentences come in its units. Without an answer of its own,
   * the plan as it is.
   */
  default Plan again(Site site, Plan plan) {
    return plan;
  }

  /**
   * How far the figures of one setup can be trusted; called off the event thread.
   *
   * @throws IllegalArgumentException one sentence, where there is nothing to doubt
   */
  default Doubt doubt(Site site, Setup setup, DoubleConsumer progress, BooleanSupplier cancelled) {
    throw new IllegalArgumentException("the doubt cannot be worked out here");
  }
}
