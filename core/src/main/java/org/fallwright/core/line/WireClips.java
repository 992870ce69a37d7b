package org.fallwright.core.line;

import org.fallwright.core.reference.Hardware;
import org.fallwright.core.units.Range;
import org.fallwright.core.units.Units;

/**
 * Clips that an eye of a wire rope needs, and their spacing. Published: 29 CFR 1918 Appendix II,
 * Table 1, for ropes of improved plough steel up to 1 1/2 in; a size between two of the table
 * counts as the greater.
 *
 * @param count how many
 * @param spacingM least spacing [m]
 */
public record WireClips(int count, double spacingM) {
  /** Thickest rope of the table [m]. */
  public static final double THICKEST_M = 1.5 * Units.INCH;

  private static final String[] SIZE = {
    "1/2", "5/8", "3/4", "7/8", "1", "1-1/8", "1-1/4", "1-3/8", "1-1/2"
  };
  private static final int EIGHTHS = 4;

  /**
   * What a rope needs.
   *
   * @param ropeM diameter of the rope [m]
   * @param dropForged whether the clips are drop-forged; others need one more
   */
  public static WireClips of(double ropeM, boolean dropForged) {
    Range.check("diameter_m", ropeM, 0.003, THICKEST_M, "m");
    int eighths = (int) Math.ceil(8 * ropeM / Units.INCH - 1e-6);
    String size = SIZE[Math.max(0, eighths - EIGHTHS)];
    int count = (int) Hardware.value("wire.clips." + size);
    return new WireClips(
        dropForged ? count : count + 1, Hardware.value("wire.clip-spacing." + size) * Units.INCH);
  }
}
