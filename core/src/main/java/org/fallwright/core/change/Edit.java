package org.fallwright.core.change;

import com.fasterxml.jackson.annotation.JsonIgnoreProperties;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.site.Site;

/**
 * A change made: the site and the setup as they then are. The site offers the setup, so that a plan
 * of it finds it.
 *
 * @param kind kind of change
 * @param amount how much, in {@code unit}; 1 where it is made or not
 * @param unit SI unit; empty for a number of things
 * @param what the change as an order, such as "line 1.5 m higher, at 12.0 m"
 * @param site the changed site
 * @param setup the changed setup
 */
@JsonIgnoreProperties("site")
public record Edit(Kind kind, double amount, String unit, String what, Site site, Setup setup) {}
