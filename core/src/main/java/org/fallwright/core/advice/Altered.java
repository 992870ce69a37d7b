package org.fallwright.core.advice;

import java.util.List;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.reference.Spreads;
import org.fallwright.core.site.Conditions;
import org.fallwright.core.site.Copy;
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
    return Copy.with(s, "conditions", Copy.with(c, "gustMps", spread(c.gustMps()).withValue(mps)));
  }

  /** A range as a value with a spread, so that it can be moved past the ends of the range. */
  private static Quantity spread(Quantity q) {
    return q.how() == How.RANGE ? new Quantity(q.value(), How.ESTIMATED, Spreads.ofRange(q)) : q;
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
      return Copy.with(s, "tree", Copy.with(t, "sections", sections));
    }
    Quantity mass = t.massKg();
    if (mass == null) {
      // ice or rain on the crown comes on top of what is put in
      SubjectTree dry = Copy.with(t, "iceOrWet", false);
      TreeFigures f = TreeFigures.of(dry, s.cut(), SpeciesTable.of(t.species()));
      mass = new Quantity(f.massKg(), How.ESTIMATED, f.massSdKg());
    }
    Double own = mass.plusMinus() == null ? null : Double.valueOf(mass.plusMinus() * factor);
    Quantity heavy = new Quantity(mass.value() * factor, mass.how(), own);
    return Copy.with(s, "tree", Copy.with(t, "massKg", heavy));
  }

  /** The site with a tree that leans more by so many degrees. */
  static Site leaningMore(Site s, double moreDeg) {
    SubjectTree t = s.tree();
    Quantity lean = spread(t.leanDeg()).withValue(t.leanDeg().value() + moreDeg);
    return Copy.with(s, "tree", Copy.with(t, "leanDeg", lean));
  }
}
