package org.fallwright.core.statics;

/**
 * Everything the force balance needs for one lay, hinge and line.
 *
 * @param layDeg intended fall direction [degrees]
 */
public record PullCase(
    double layDeg, TreeBody tree, Wood wood, CutMade cut, Wind wind, LineSet line, Spread spread) {}
