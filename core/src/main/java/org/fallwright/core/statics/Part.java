package org.fallwright.core.statics;

/**
 * A part that must hold, by the one rule for all parts.
 *
 * @param name what it is called
 * @param strengthN ultimate strength B [N]
 * @param designFactor F, asked at the working tension
 * @param lastFactor Q, asked at the most the source can do
 * @param hauling load per newton at the tree, hauling
 * @param holding load per newton at the tree, holding
 */
public record Part(
    String name,
    double strengthN,
    double designFactor,
    double lastFactor,
    double hauling,
    double holding) {
  /** Load per newton at plan: the greater of hauling and holding. */
  public double atPlan() {
    return Math.max(hauling, holding);
  }
}
