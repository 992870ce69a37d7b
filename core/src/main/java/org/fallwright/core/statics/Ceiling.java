package org.fallwright.core.statics;

import java.util.List;

/**
 * The least tension at the tree at which any part reaches its strength over its design factor; the
 * source is no part of it.
 *
 * @param tensionN [N]
 * @param part the part that sets it
 */
public record Ceiling(double tensionN, String part) {
  public static Ceiling of(List<Part> parts) {
    double least = Double.POSITIVE_INFINITY;
    String which = "";
    for (Part p : parts) {
      double t = p.strengthN() / p.designFactor() / p.atPlan();
      if (t < least) {
        least = t;
        which = p.name();
      }
    }
    return new Ceiling(least, which);
  }
}
