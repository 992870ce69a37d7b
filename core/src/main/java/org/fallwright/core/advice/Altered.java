package org.fallwright.core.advice;

import java.util.List;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.site.Conditions;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.WeighedSection;
import org.fallwright.core.tree.TreeFigures;

/** Copies of a site with one thing changed. */
final class Altered {
  private Altered() {}

  /** The site with another gust [m/s]; how it was got stays. */
  static Site gust(Site s, double mps) {
    Conditions c = s.conditions();
    return with(
        s,
        s.tree(),
        new Conditions(c.gustMps().withValue(mps), c.windTowardDeg(), c.slackM(), c.airDensity()));
  }

  /**
   * The site with a tree that weighs so many times as much; its spread grows alike. A mass that was
   * not entered is put in as it was reckoned, with the spread that it had.
   */
  static Site heavier(Site s, double factor) {
    SubjectTree t = s.tree();
    if (t.sections() != null) {
      List<WeighedSection> sections =
          t.sections().stream()
              .map(w -> new WeighedSection(w.massKg() * factor, w.midHeightM()))
              .toList();
      return with(s, tree(t, t.leanDeg(), t.massKg(), sections, t.iceOrWet()), s.conditions());
    }
    Quantity mass = t.massKg();
    if (mass == null) {
      // ice or rain on the crown comes on top of what is put in
      SubjectTree dry = tree(t, t.leanDeg(), null, null, false);
      TreeFigures f = TreeFigures.of(dry, s.cut(), SpeciesTable.of(t.species()));
      mass = new Quantity(f.massKg(), How.ESTIMATED, f.massSdKg());
    }
    Double own = mass.plusMinus() == null ? null : Double.valueOf(mass.plusMinus() * factor);
    Quantity heavy = new Quantity(mass.value() * factor, mass.how(), own);
    return with(s, tree(t, t.leanDeg(), heavy, null, t.iceOrWet()), s.conditions());
  }

  /** The site with a tree that leans more by so many degrees. */
  static Site leaningMore(Site s, double moreDeg) {
    SubjectTree t = s.tree();
    Quantity lean = t.leanDeg().withValue(t.leanDeg().value() + moreDeg);
    return with(s, tree(t, lean, t.massKg(), t.sections(), t.iceOrWet()), s.conditions());
  }

  private static SubjectTree tree(
      SubjectTree t,
      Quantity lean,
      Quantity mass,
      List<WeighedSection> sections,
      boolean iceOrWet) {
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
        lean,
        t.leanAzimuthDeg(),
        mass,
        t.massCentreM(),
        sections,
        t.crownShare(),
        t.crownOffsetM(),
        t.crownOutline(),
        t.crownAreaM2(),
        t.shellM(),
        t.deadOrDecayed(),
        t.inLeaf(),
        iceOrWet);
  }

  private static Site with(Site s, SubjectTree tree, Conditions day) {
    return new Site(
        s.version(),
        s.name(),
        s.origin(),
        s.display(),
        s.ruleSet(),
        s.declinationDeg(),
        s.picture(),
        tree,
        s.cut(),
        s.targets(),
        s.wires(),
        s.looked(),
        s.dropZones(),
        s.anchors(),
        s.spots(),
        s.gear(),
        day,
        s.offer(),
        s.strips());
  }
}
