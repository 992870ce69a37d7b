package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/**
 * What a search found, before it is written out.
 *
 * @param judge judges the site's setups
 * @param ways what could be used
 * @param out sources that failed
 * @param tally how many setups stand how
 * @param top the best setup of each of the best ways
 */
record Answer(Judge judge, Ways ways, LeftOut out, Tally tally, Top top) {
  /** The plan, each setup that it shows judged in full. */
  Plan plan() {
    List<String> all = notes();
    all.addAll(judge.notes());
    Map<String, Judged> rejected = new ConcurrentHashMap<>();
    tally.nearest(Plan.MOST_REASONS).entrySet().parallelStream()
        .forEach(e -> rejected.put(e.getKey(), judge.judge(e.getValue())));
    return new Plan(
        top.best().parallelStream().map(e -> judge.judge(e.setup())).toList(),
        tally.all(),
        tally.byVerdict(),
        tally.byMissed(),
        rejected,
        all,
        ways.described());
  }

  /** What could not be used, a sentence each. */
  List<String> notes() {
    List<String> notes = new ArrayList<>(ways.notes());
    notes.addAll(out.notes());
    return notes;
  }
}
