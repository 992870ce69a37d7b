package org.fallwright.core.plan;

/**
 * Load on one part against its strength.
 *
 * @param part what it is called
 * @param atPlanN load at the working tension [N]
 * @param atHighN load at the most the source can do [N]
 * @param atCeilingN load at the ceiling, where the first part reaches its strength over its design
 *     factor [N]
 * @param strengthN ultimate strength [N]
 * @param designFactor factor asked at the working tension
 * @param lastFactor factor asked at the most the source can do
 */
public record PartLoad(
    String part,
    double atPlanN,
    double atHighN,
    double atCeilingN,
    double strengthN,
    double designFactor,
    double lastFactor) {}
