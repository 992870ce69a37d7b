package org.fallwright.plugins.handline;

import java.util.Arrays;
import java.util.Locale;
import org.fallwright.core.line.Wraps;

/**
 * What keeps the line when the crew does not.
 *
 * <p>A device or a tied-off wrap keeps its end where it is and holds up to its rated load; where
 * that is not stated, no more is counted than the crew pulls. Turns round something fixed with the
 * tail in a hand hold e^(μθ) times the tail and slip beyond: a constant force, which people can
 * pull a tree over with and never hold one.
 */
enum Capture {
  /** Nothing: free-hand. */
  NONE(""),
  /** A device on an anchor that lets the line in and not out. */
  DEVICE("device"),
  /** Turns round something fixed, tail in a hand. */
  TURNS_IN_HAND("turns-in-hand"),
  /** Turns round something fixed, tied off after every haul. */
  TURNS_TIED("turns-tied");

  /** What one hand keeps on a tail, the least of what is usual, 50 to 200 N [N]. From memory. */
  static final double TAIL_N = 50;

  /** How it is written among the parameters. */
  final String key;

  Capture(String key) {
    this.key = key;
  }

  /** Whether its end stays where it is while holding. */
  boolean staysPut() {
    return this == DEVICE || this == TURNS_TIED;
  }

  /** Whether somebody of the crew minds the tail instead of pulling. */
  boolean needsSomebody() {
    return this == TURNS_IN_HAND || this == TURNS_TIED;
  }

  /** The way of that key. */
  static Capture of(String key) {
    return Arrays.stream(values()).filter(c -> c.key.equals(key)).findFirst().orElseThrow();
  }

  /** The wraps of a key, for example "hmpe-on-metal". */
  static Wraps wraps(String key) {
    return Wraps.valueOf(key.toUpperCase(Locale.ROOT).replace('-', '_'));
  }

  /**
   * What the turns hold with the tail in a hand [N].
   *
   * @param tailN tension of the tail [N]
   * @param turns whole and part turns
   * @param ratedN rated load of what they go round [N]; infinite: not stated
   */
  static double turnsHoldN(Wraps wraps, double turns, double tailN, double ratedN) {
    return Math.min(ratedN, wraps.holdsN(tailN, turns));
  }
}
