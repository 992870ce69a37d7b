package org.fallwright.core.tree;

import static org.fallwright.core.reference.Spreads.What.DBH;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.reference.Species;
import org.fallwright.core.reference.Spreads;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.SubjectTree;

/**
 * What the balance of forces needs to know of the tree, with one standard deviation each.
 *
 * <p>Mass, mass centre and the crown's shift are from {@link TreeMass}.
 *
 * @param massKg green mass above the cut [kg]
 * @param massSdKg its standard deviation, everything in it [kg]
 * @param massOwnSdKg the same without what DBH brings, for where DBH is varied on its own [kg]
 * @param massDerived whether the mass was neither entered nor weighed
 * @param massCentreM height of the mass centre above the ground [m]
 * @param massCentreSdM its standard deviation [m]
 * @param crownShiftM how far a one-sided crown moves the mass centre off the stem's axis, [east,
 *     north] [m]
 * @param stumpDiameterM stem diameter at the cut, inside the bark [m]
 * @param stumpDiameterSdM its standard deviation [m]
 * @param crownAreaM2 frontal area of the crown [m²]
 * @param crownMiddleM height of the crown's middle above the ground, where the wind acts [m]
 * @param taper the stem's diameters
 * @param remarks what a person must know of how these figures were got
 */
public record TreeFigures(
    double massKg,
    double massSdKg,
    double massOwnSdKg,
    boolean massDerived,
    double massCentreM,
    double massCentreSdM,
    Position crownShiftM,
    double stumpDiameterM,
    double stumpDiameterSdM,
    double crownAreaM2,
    double crownMiddleM,
    StemTaper taper,
    List<String> remarks) {
  public TreeFigures {
    remarks = List.copyOf(remarks);
  }

  /** The figures of that tree, cut as planned. */
  public static TreeFigures of(SubjectTree tree, CutPlan cut, Species species) {
    TreeMass mass = TreeMass.of(tree, cut, species);
    List<String> remarks = new ArrayList<>(mass.remarks());
    double height = tree.heightM().value();
    if (tree.stumpDiameterM() == null) {
      remarks.add("diameter at the cut taken from DBH and a flare of 1.1");
    }
    return new TreeFigures(
        mass.massKg(),
        mass.sdKg(),
        mass.ownSdKg(),
        mass.derived(),
        mass.centreM(),
        mass.centreSdM(),
        mass.crownShiftM(),
        StemTaper.stumpInsideBarkM(tree),
        stumpSdM(tree),
        crownAreaM2(tree),
        (tree.crownBaseM() + height) / 2,
        StemTaper.of(tree, cut),
        remarks);
  }

  private static double stumpSdM(SubjectTree tree) {
    if (tree.stumpDiameterM() != null) {
      return Spreads.of(Spreads.What.STUMP_DIAMETER, tree.stumpDiameterM());
    }
    Quantity stump = Quantity.estimated(StemTaper.stumpInsideBarkM(tree));
    double ofDbh = Spreads.of(DBH, tree.dbhM()) / tree.dbhM().value() * stump.value();
    return Math.max(Spreads.of(Spreads.What.STUMP_DIAMETER, stump), ofDbh);
  }

  /** Frontal area of the crown [m²]: as entered, else the ellipse of its width and its depth. */
  private static double crownAreaM2(SubjectTree tree) {
    return tree.crownAreaM2() != null
        ? tree.crownAreaM2()
        : Math.PI / 4 * (2 * tree.crownRadiusM()) * (tree.heightM().value() - tree.crownBaseM());
  }
}
