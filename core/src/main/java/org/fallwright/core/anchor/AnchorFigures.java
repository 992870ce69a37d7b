package org.fallwright.core.anchor;

import org.fallwright.core.site.Anchor;

/** The tables an anchor's strength is reckoned from. */
public interface AnchorFigures {
  /**
   * Figures of a species on a soil.
   *
   * @param species key of the species table
   * @param soil soil class
   * @param deepRooting whether roots go deeper than 80 cm
   */
  WoodFigures wood(String species, Anchor.Soil soil, boolean deepRooting);

  /**
   * Grip of tyres, taken low.
   *
   * @param surface key of the surface table
   * @param wet whether the ground is wet
   */
  double tyreGrip(String surface, boolean wet);
}
