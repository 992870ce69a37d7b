package org.fallwright.core.tree;

import static org.fallwright.core.reference.Spreads.What.MASS;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Species;
import org.fallwright.core.reference.Spreads;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.SubjectTree;

/**
 * Mass of the tree and where it sits. The best that was entered is taken: pieces that were weighed,
 * else a mass entered, else the {@link DerivedMass} that the site asks for.
 *
 * <p>A derived mass is that of the whole tree above the ground: the stump left standing is not
 * taken off, which is the safe side; the leaves of a bare broadleaf are. Its spread: s² = s_own² +
 * s_D², the second what DBH brings. The green crown is taken to have the share of the dry one.
 *
 * <p>Ice, wet snow or rain comes on top of any of them: {@link CrownLoad} with {@link
 * Allowances#ICE_OR_WET_CROWN}.
 *
 * @param massKg green mass above the cut [kg]
 * @param sdKg its standard deviation, everything in it [kg]
 * @param ownSdKg the same without what DBH brings [kg]
 * @param derived whether the mass is derived
 * @param centreM height of the mass centre above the ground [m]
 * @param centreSdM its standard deviation [m]
 * @param crownShiftM crown share × offset of the crown from the stem's axis, [east, north] [m]
 * @param remarks what a person must know of how these figures were got
 */
record TreeMass(
    double massKg,
    double sdKg,
    double ownSdKg,
    boolean derived,
    double centreM,
    double centreSdM,
    Position crownShiftM,
    List<String> remarks) {
  private static final Position NONE = new Position(0, 0);

  static TreeMass of(SubjectTree tree, CutPlan cut, Species species) {
    TreeMass still = weighed(tree, cut, species);
    boolean aside = tree.crownOffsetM() != null || tree.crownOutline() != null;
    if (!aside && !tree.iceOrWet()) {
      return still;
    }
    List<String> remarks = new ArrayList<>(still.remarks);
    double share = DerivedMass.crownShare(tree, species);
    if (tree.crownShare() == null) {
      remarks.add(said("crown taken as %.0f %% of the mass, by DBH", 100 * share));
    }
    CrownLoad load = new CrownLoad(share, 1);
    if (tree.iceOrWet()) {
      load = new CrownLoad(share, Allowances.ICE_OR_WET_CROWN.value());
      remarks.add(
          said(
              "ice, snow or rain on the crown: its mass taken %.2f times, the tree's %.2f times;"
                  + " glaze can be far more",
              load.factor(), load.massFactor()));
    }
    Position offset = NONE;
    if (tree.crownOffsetM() != null) {
      offset = tree.crownOffsetM();
    } else if (tree.crownOutline() != null) {
      offset = CrownOutline.of(tree.crownOutline()).offsetM(tree, cut.heightM());
      remarks.add(
          said(
              "crown %.1f m off the stem's axis by its outline",
              Math.hypot(offset.eastM(), offset.northM())));
    }
    double by = load.massFactor();
    double crownMiddle = (tree.crownBaseM() + tree.heightM().value()) / 2;
    double shift = load.shareAfter();
    return new TreeMass(
        by * still.massKg,
        by * still.sdKg,
        by * still.ownSdKg,
        still.derived,
        load.centreM(still.centreM, crownMiddle),
        still.centreSdM,
        new Position(shift * offset.eastM(), shift * offset.northM()),
        List.copyOf(remarks));
  }

  /** The tree without a load on its crown and upright over its axis. */
  private static TreeMass weighed(SubjectTree tree, CutPlan cut, Species species) {
    List<String> remarks = new ArrayList<>();
    double mass;
    double own;
    double ofDbh = 0;
    Quantity centre = tree.massCentreM();
    if (tree.sections() != null) {
      SectionSum sum = SectionSum.of(tree.sections());
      mass = sum.massKg();
      own = Spreads.of(MASS, mass, How.MEASURED);
      centre = Quantity.measured(sum.centreM());
      remarks.add(said("mass and mass centre from %d weighed sections", tree.sections().size()));
    } else if (tree.massKg() != null) {
      mass = tree.massKg().value();
      own = Spreads.of(MASS, tree.massKg());
    } else {
      DerivedMass derived = DerivedMass.of(tree, cut, species);
      mass = derived.massKg();
      own = derived.ownSdKg();
      ofDbh = derived.ofDbhKg();
      remarks.addAll(derived.remarks());
    }
    boolean derived = tree.massKg() == null && tree.sections() == null;
    double equation = DerivedMass.byEquationKg(tree, species);
    if (!derived && Math.abs(mass - equation) > Allowances.MASS_RESIDUAL.value() * equation) {
      remarks.add(
          said(
              "mass of %.0f kg as entered; by DBH and species it would be %.0f kg",
              mass, equation));
    }
    double height = tree.heightM().value();
    if (centre == null) {
      centre = Quantity.estimated(Allowances.MASS_CENTRE_SHARE.value() * height);
      remarks.add("mass centre taken at 0.40 of the height");
    }
    return new TreeMass(
        mass,
        Math.hypot(own, ofDbh),
        own,
        derived,
        centre.value(),
        Spreads.massCentreM(centre, height),
        NONE,
        List.copyOf(remarks));
  }

  private static String said(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }
}
