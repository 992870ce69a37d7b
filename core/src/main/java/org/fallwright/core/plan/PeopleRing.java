package org.fallwright.core.plan;

import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.site.Site;

/** Radius of the people ring. */
final class PeopleRing {
  private PeopleRing() {}

  /** In tree heights: the rule set's, or the person's own where that is more. */
  static double factor(Site site, RuleSet rules) {
    double rule = rules.peopleRadiusFactor().value();
    Double own = site.zones().peopleRadius();
    return own == null ? rule : Math.max(rule, own);
  }
}
