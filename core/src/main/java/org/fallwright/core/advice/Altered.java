package org.fallwright.core.advice;

import org.fallwright.core.plan.Setup;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.site.Conditions;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.tree.TreeFigures;

/** Copies of a site or a setup with one thing changed. */
final class Altered {
  private Altered() {}

  /** The setup with another hinge thickness [m]. */
  static Setup hinge(Setup s, double thicknessM) {
    return new Setup(
        s.layDeg(),
        s.attachHeightM(),
        thicknessM,
        s.line(),
        s.redirects(),
        s.source(),
        s.mode(),
        s.place(),
        s.driver());
  }

  /** The setup with the line at another height above the ground at the stump [m]. */
  static Setup attach(Setup s, double heightM) {
    return new Setup(
        s.layDeg(),
        heightM,
        s.hingeThicknessM(),
        s.line(),
        s.redirects(),
        s.source(),
        s.mode(),
        s.place(),
        s.driver());
  }

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
    Quantity mass = t.massKg();
    if (mass == null) {
      TreeFigures f = TreeFigures.of(t, s.cut(), SpeciesTable.of(t.species()));
      mass = new Quantity(f.massKg(), org.fallwright.core.site.How.ESTIMATED, f.massSdKg());
    }
    Double own = mass.plusMinus() == null ? null : Double.valueOf(mass.plusMinus() * factor);
    return with(
        s,
        tree(t, t.leanDeg(), new Quantity(mass.value() * factor, mass.how(), own)),
        s.conditions());
  }

  /** The site with a tree that leans more by so many degrees. */
  static Site leaningMore(Site s, double moreDeg) {
    SubjectTree t = s.tree();
    Quantity lean = t.leanDeg().withValue(t.leanDeg().value() + moreDeg);
    return with(s, tree(t, lean, t.massKg()), s.conditions());
  }

  private static SubjectTree tree(SubjectTree t, Quantity lean, Quantity mass) {
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
        t.crownShare(),
        t.crownOffsetM(),
        t.crownAreaM2(),
        t.shellM(),
        t.deadOrDecayed(),
        t.inLeaf());
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
        s.offer());
  }
}
