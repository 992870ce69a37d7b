package org.fallwright.core.plan;

import org.fallwright.core.anchor.AnchorFigures;
import org.fallwright.core.anchor.WoodFigures;
import org.fallwright.core.reference.Species;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.reference.SurfaceTable;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.tree.StemVolume;

/** The species and surface tables as anchors need them: everything taken low, for it helps. */
final class SiteTables implements AnchorFigures {
  @Override
  public WoodFigures wood(String species, Anchor.Soil soil, boolean deepRooting) {
    Species s = SpeciesTable.of(species);
    return new WoodFigures(
        s.morHolds(),
        s.morCv().value(),
        s.densityLow(),
        s.rootPlate(soil, deepRooting).value(),
        StemVolume.of(s));
  }

  @Override
  public double tyreGrip(String surface, boolean wet) {
    return SurfaceTable.of(surface, wet).tyreLow();
  }
}
