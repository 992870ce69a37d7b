package org.fallwright.core.line;

import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.units.Range;

/**
 * What a sling may carry as it is laid, over its vertical rating. Basket: 2·sin of the angle of its
 * legs to the horizontal (statics). Choker: a share by its material, and a share of that by the
 * angle at which it is choked: a sling hauled tight round a thin stem bends sharply.
 */
public enum SlingHitch {
  VERTICAL("sling.vertical"),
  CHOKER_NATURAL_FIBRE("sling.choker-natural"),
  CHOKER_WIRE("sling.choker-wire"),
  CHOKER_SYNTHETIC("sling.choker-synthetic");

  /** Flattest legs of a basket [degrees to the horizontal]. */
  public static final double FLATTEST_DEG = 30;

  private static final int[] CHOKE_FROM_DEG = {120, 90, 60, 30, 0};

  private final Figure figure;

  SlingHitch(String key) {
    figure = Hardware.of(key);
  }

  /** Factor on the vertical rating. */
  public double factor() {
    return figure.value();
  }

  /** The same with what stands behind it. */
  Figure figure() {
    return figure;
  }

  /** Factor of a basket whose legs stand at an angle to the horizontal [degrees]. */
  public static double basket(double legToHorizontalDeg) {
    Range.check("leg_to_horizontal_deg", legToHorizontalDeg, FLATTEST_DEG, 90, "degrees");
    return 2 * Math.sin(Math.toRadians(legToHorizontalDeg));
  }

  /**
   * Share of a choker's rating that is left at an angle of choke [degrees], the angle between the
   * standing part and the part that runs through the eye.
   */
  public static double choke(double chokeDeg) {
    return Hardware.value(chokeRow(chokeDeg));
  }

  static String chokeRow(double chokeDeg) {
    Range.check("choke_deg", chokeDeg, 0, 180, "degrees");
    int step = 0;
    // the edges of the bands are whole degrees; at 120 itself the lower band counts
    while (chokeDeg < CHOKE_FROM_DEG[step] || step == 0 && chokeDeg == CHOKE_FROM_DEG[0]) {
      step++;
    }
    return "sling.choke-from-" + CHOKE_FROM_DEG[step];
  }
}
