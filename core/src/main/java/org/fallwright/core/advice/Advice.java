package org.fallwright.core.advice;

import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.Range;

/**
 * All the advice around one setup of a plan.
 *
 * @param rank rank of the setup in the plan, from 1
 * @param judged the setup as planned
 * @param hinge how thick its hinge may be
 * @param wind how much wind it bears
 * @param lineHeight how high its line may sit
 * @param readings what a load cell shows
 * @param observables what can be seen when it goes
 * @param firstToGive what gives first
 * @param card how it stands with another line height and another tree
 * @param proofPull the proof pull; null: none is to be made
 * @param notByPulling that pulling is not the method; null where it may be
 */
public record Advice(
    int rank,
    Judged judged,
    HingeRange hinge,
    WindLimit wind,
    LineHeightRange lineHeight,
    Readings readings,
    Observables observables,
    FirstToGive firstToGive,
    LimitsCard card,
    ProofPull proofPull,
    NotByPulling notByPulling) {

  /**
   * The advice for a ranked setup; a few hundred setups are judged for it.
   *
   * @param rank from 1
   * @throws IllegalArgumentException one sentence, where the plan has no such rank
   */
  public static Advice of(Site site, PullSources sources, Plan plan, int rank) {
    if (plan.ranked().isEmpty()) {
      throw new IllegalArgumentException("the plan has no setup; nothing on the site can pull");
    }
    Range.check("rank", rank, 1, plan.ranked().size(), "");
    Judge judge = new Judge(site, sources);
    // as the plan has it: the leading setups are judged over many trials
    Judged judged = plan.ranked().get(rank - 1);
    Setup setup = judged.setup();
    return new Advice(
        rank,
        judged,
        HingeRange.of(site, judge, setup),
        WindLimit.of(site, sources, setup),
        LineHeightRange.of(site, judge, setup),
        Readings.of(site, judge, judged),
        Observables.of(site, sources, judged),
        FirstToGive.of(site, judge, judged),
        LimitsCard.of(site, sources, setup),
        ProofPull.of(site, judged).orElse(null),
        NotByPulling.of(plan).orElse(null));
  }
}
