package org.fallwright.plugins.handline;

import org.fallwright.core.units.Range;

/**
 * What hands hold on a line before it runs through them.
 *
 * <p>T = n · 435 N · 0.5 · min(1, d/22 mm), n hands, d the line's diameter. Published: one hand
 * round a fixed cylinder that lies along the pull, as a line does, lets go at 435 N in the mean of
 * young adults (Young, Woolley, Armstrong, Ashton-Miller 2009, Human Factors 51:705, abstract; a
 * later test of the same group, 2012, has cylinders of 22 to 51 mm, the thin ones holding best).
 * Planning allowances: half of it, for weaker hands, wet gloves and a slick line; and in proportion
 * below 22 mm, where nothing was measured. Leaves out a stopper knot or a handle, which hold more.
 * Never a turn round the hand.
 */
final class Hands {
  /** One hand on a cylinder along the pull, mean [N]. Published, see above. */
  static final double ONE_HAND_N = 435;

  /** Thinnest cylinder of the tests [m]. Published, see above. */
  static final double TESTED_M = 0.022;

  /** What is left of that in the field. Planning allowance. */
  static final double IN_THE_FIELD = 0.5;

  private Hands() {}

  /**
   * Pull at which the line runs through the hands [N].
   *
   * @param hands hands on the line at one time
   * @param diameterM the line's diameter [m]
   */
  static double slipN(int hands, double diameterM) {
    Range.check("line_diameter_m", diameterM, 0.001, 0.1, "m");
    return hands * ONE_HAND_N * IN_THE_FIELD * Math.min(1, diameterM / TESTED_M);
  }
}
