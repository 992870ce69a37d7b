package org.fallwright.core.anchor;

import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;

/** Anchors and tables for the tests. */
final class Anchors {
  static final Place PLACE = new Place(new Position(10, 20), 0, Fix.TAPES, null);

  private Anchors() {}

  static AnchorFigures figures(WoodFigures wood, double grip) {
    return new AnchorFigures() {
      @Override
      public WoodFigures wood(String species, Anchor.Soil soil, boolean deepRooting) {
        return wood;
      }

      @Override
      public double tyreGrip(String surface, boolean wet) {
        return grip;
      }
    };
  }

  static Anchor.StandingTree tree(
      double dbhM,
      double heightM,
      double slingM,
      boolean saturated,
      Anchor.Condition condition,
      boolean tieBack,
      String rejected) {
    return new Anchor.StandingTree(
        "tree",
        PLACE,
        slingM,
        rejected,
        null,
        "species",
        dbhM,
        heightM,
        heightM / 3,
        3,
        Anchor.Soil.FREE_DRAINING_MINERAL,
        false,
        saturated,
        condition,
        tieBack);
  }

  static Anchor.StandingTree sound(double dbhM, double heightM, double slingM, boolean saturated) {
    return tree(dbhM, heightM, slingM, saturated, Anchor.Condition.SOUND, false, null);
  }

  static Anchor.Stump stump(
      double diameterM, double onceHeightM, Double onceMassKg, Anchor.Condition condition) {
    return new Anchor.Stump(
        "stump",
        PLACE,
        0.2,
        null,
        null,
        "species",
        diameterM,
        onceHeightM,
        onceMassKg,
        Anchor.Soil.FREE_DRAINING_MINERAL,
        false,
        false,
        condition);
  }

  static Anchor.ParkedVehicle vehicle(double massKg, double uphillDeg) {
    return new Anchor.ParkedVehicle(
        "truck", PLACE, 0.5, null, null, massKg, "surface", false, uphillDeg, 30_000);
  }
}
