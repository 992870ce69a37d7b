package org.fallwright.ui.task;

import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.site.Site;

/** Plans a site; called off the event thread. */
@FunctionalInterface
public interface Planning {
  /**
   * @param progress told the share done, 0 to 1
   * @param cancelled asked now and then; once true, the run may end with any exception
   */
  Plan plan(Site site, DoubleConsumer progress, BooleanSupplier cancelled);
}
