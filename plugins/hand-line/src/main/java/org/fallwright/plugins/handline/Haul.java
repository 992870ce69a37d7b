package org.fallwright.plugins.handline;

import org.fallwright.core.reference.Surface;

/** How the crew takes line in. */
enum Haul {
  /** Not said: what they keep up standing, with both hands. */
  NOT_STATED("", 2, 1, Double.POSITIVE_INFINITY),

  /**
   * They walk away from the tree. Published: moving, trained teams pull 75.5 % of what they hold
   * standing (Cayero et al. 2022, review of tug of war, IJERPH 19(1):3, abstract).
   */
  WALKING("walking", 2, 0.755, Double.POSITIVE_INFINITY),

  /**
   * They stand and take the line in hand over hand, so that one hand pulls. Published: about 147 N
   * is what men pull with one hand, now and then, on average (Mital, Nicholson, Ayoub, Guide to
   * Manual Materials Handling, abstract).
   */
  HAND_OVER_HAND("hand-over-hand", 1, 1, 147);

  /** How it is written among the parameters. */
  final String key;

  /** Hands on the line at one time. */
  final int hands;

  private final double moving;
  private final double mostN;

  Haul(String key, int hands, double moving, double mostN) {
    this.key = key;
    this.hands = hands;
    this.moving = moving;
    this.mostN = mostN;
  }

  /** What a person on that ground keeps up while taking line in [N]. */
  double strengthN(Surface ground) {
    return Math.min(mostN, ground.personLowN() * moving);
  }

  /** The way of that key. */
  static Haul of(String key) {
    for (Haul haul : values()) {
      if (haul.key.equals(key)) {
        return haul;
      }
    }
    throw new IllegalArgumentException("haul is \"" + key + "\"; it is none of the ways there are");
  }
}
