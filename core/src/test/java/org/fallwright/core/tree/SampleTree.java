package org.fallwright.core.tree;

import java.util.List;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.StemDiameter;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.WeighedSection;

/** An invented northern red oak, DBH 0.52 m and 17.5 m high, and variations of it. */
final class SampleTree {
  static final CutPlan CUT =
      new CutPlan(
          0.30, CutPlan.Face.OPEN, 0.25, 70, List.of(0.045), How.MEASURED, null, 0.010, false);

  private SampleTree() {}

  static SubjectTree oak() {
    return oak(
        Quantity.measured(0.52),
        Quantity.measured(0.58),
        List.of(new StemDiameter(6.0, 0.42), new StemDiameter(10.5, 0.30)),
        null,
        null);
  }

  static SubjectTree oak(
      Quantity dbhM,
      Quantity stumpM,
      List<StemDiameter> diameters,
      Quantity massKg,
      Quantity massCentreM) {
    return new SubjectTree(
        "T1",
        "northern-red-oak",
        new Place(new Position(16, 24), 0, Fix.TAPES, null),
        dbhM,
        stumpM,
        diameters,
        Quantity.measured(17.5),
        6.0,
        4.5,
        Quantity.measured(5),
        Quantity.measured(188),
        massKg,
        massCentreM,
        null,
        null,
        null,
        null,
        null,
        null,
        false,
        true,
        false,
        SubjectTree.MassBy.EQUATION);
  }

  /** The sample oak with what is known of its pieces and its crown. */
  static SubjectTree crowned(
      List<WeighedSection> sections,
      Double crownShare,
      Position crownOffset,
      Shape.Polygon outline,
      boolean inLeaf,
      boolean iceOrWet) {
    SubjectTree t = oak();
    return new SubjectTree(
        t.id(),
        t.species(),
        t.stump(),
        t.dbhM(),
        t.stumpDiameterM(),
        t.diameters(),
        t.heightM(),
        t.crownBaseM(),
        t.crownRadiusM(),
        t.leanDeg(),
        t.leanAzimuthDeg(),
        null,
        null,
        sections,
        crownShare,
        crownOffset,
        outline,
        null,
        null,
        false,
        inLeaf,
        iceOrWet,
        SubjectTree.MassBy.EQUATION);
  }

  /** The same tree, its mass asked for by its stem. */
  static SubjectTree byStem(SubjectTree t) {
    return new SubjectTree(
        t.id(),
        t.species(),
        t.stump(),
        t.dbhM(),
        t.stumpDiameterM(),
        t.diameters(),
        t.heightM(),
        t.crownBaseM(),
        t.crownRadiusM(),
        t.leanDeg(),
        t.leanAzimuthDeg(),
        t.massKg(),
        t.massCentreM(),
        t.sections(),
        t.crownShare(),
        t.crownOffsetM(),
        t.crownOutline(),
        t.crownAreaM2(),
        t.shellM(),
        t.deadOrDecayed(),
        t.inLeaf(),
        t.iceOrWet(),
        SubjectTree.MassBy.STEM);
  }
}
