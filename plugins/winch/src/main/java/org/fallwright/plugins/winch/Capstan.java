package org.fallwright.plugins.winch;

import org.fallwright.core.line.Wraps;

/**
 * A turning drum that the line itself runs round while a person keeps its tail tight.
 *
 * <p>T = T_tail e^(μ 2π turns), μ the low figure of the contact. Leaves out turns that ride on each
 * other and so grip more, and a wet or glazed line that grips less than the figure.
 *
 * @param contact line on drum
 * @param turns turns round it
 */
record Capstan(Wraps contact, double turns) {
  /** Pull of the line at which it slips on the drum, for a tension of the tail [N]. */
  double slipsAtN(double tailN) {
    return contact.holdsN(tailN, turns);
  }
}
