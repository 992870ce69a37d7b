package org.fallwright.core.plan;

import org.fallwright.core.site.Position;

/**
 * One check of a setup.
 *
 * @param id stable id: lower case words, "line at plan"
 * @param value what there is, in {@code unit}
 * @param limit what is asked, in {@code unit}
 * @param unit SI unit; empty for a pure number
 * @param ratio capacity over demand; infinite where nothing is demanded; NaN where nobody can say
 * @param verdict its verdict
 * @param place where on the site, or null
 * @param why one line
 */
public record Check(
    String id,
    double value,
    double limit,
    String unit,
    double ratio,
    Verdict verdict,
    Position place,
    String why) {}
