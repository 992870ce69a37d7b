package org.fallwright.core.rules;

import org.fallwright.core.units.Range;

/**
 * One rule's figure.
 *
 * @param value the figure
 * @param unit its unit; "H" for tree lengths, "yes/no" for 1 and 0
 * @param comparison how what there is must stand to it
 * @param basis what it is measured on
 * @param citation the text it is from
 * @param status how well that text was read
 * @param fallback whether the chosen set has no such rule and this is the strictest of all sets
 * @param fallbackFrom the set it is from, or null
 */
public record Rule(
    double value,
    String unit,
    Comparison comparison,
    String basis,
    String citation,
    Status status,
    boolean fallback,
    String fallbackFrom) {
  public Rule {
    Range.check("value", value, 0, 1000, unit);
    Range.present("comparison", comparison);
    Range.text("basis", basis);
    Range.text("citation", citation);
    Range.present("status", status);
    if (fallback != (fallbackFrom != null)) {
      throw new IllegalArgumentException("fallback and fallback_from must be stated together");
    }
  }

  /** Whether a yes/no rule says yes. */
  public boolean yes() {
    return value >= 1;
  }

  /**
   * Whether a measured figure meets the rule.
   *
   * @param measured what there is
   * @param unitSize what one of the rule's unit is in the measure's unit, such as the tree's height
   */
  public boolean metBy(double measured, double unitSize) {
    double limit = value * unitSize;
    return switch (comparison) {
      case AT_LEAST -> measured >= limit;
      case MORE_THAN -> measured > limit;
      case AT_MOST -> measured <= limit;
      case LESS_THAN -> measured < limit;
    };
  }

  Rule from(String setKey) {
    return new Rule(value, unit, comparison, basis, citation, status, true, setKey);
  }
}
