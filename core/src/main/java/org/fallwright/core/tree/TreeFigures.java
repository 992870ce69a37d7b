package org.fallwright.core.tree;

import static org.fallwright.core.reference.Spreads.What.DBH;
import static org.fallwright.core.reference.Spreads.What.GREEN_DENSITY;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Species;
import org.fallwright.core.reference.Spreads;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.SubjectTree;

/**
 * What the balance of forces needs to know of the tree, with one standard deviation each.
 *
 * <p>A mass not entered is dry mass by {@link MassEquation} times the species' green factor. It is
 * that of the whole tree above the ground: the stump left standing is not taken off, which is the
 * safe side. Its spread is that of the equation ({@link Allowances#MASS_RESIDUAL}) and of the green
 * density, and what DBH brings on top: s² = s_own² + (b1·s_D/D)²·m².
 *
 * @param massKg green mass above the cut [kg]
 * @param massSdKg its standard deviation, everything in it [kg]
 * @param massOwnSdKg the same without what DBH brings, for where DBH is varied on its own [kg]
 * @param massDerived whether the mass is by equation
 * @param massCentreM height of the mass centre above the ground [m]
 * @param massCentreSdM its standard deviation [m]
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
    List<String> remarks = new ArrayList<>();
    Quantity dbh = tree.dbhM();
    double mass;
    double ownSd;
    double dbhSd;
    boolean derived = tree.massKg() == null;
    if (derived) {
      MassEquation equation = MassEquation.of(species.massGroup());
      mass = equation.dryKg(dbh.value()) * species.dryToGreen().value();
      double density = GREEN_DENSITY.usual(How.ESTIMATED).value();
      ownSd = mass * Math.hypot(Allowances.MASS_RESIDUAL.value(), density);
      dbhSd = mass * equation.b1() * Spreads.of(DBH, dbh) / dbh.value();
      remarks.add("mass by equation from DBH and species; a weighed or counted mass is better");
      equation.warning(dbh.value()).ifPresent(remarks::add);
    } else {
      mass = tree.massKg().value();
      ownSd = Spreads.of(Spreads.What.MASS, tree.massKg());
      dbhSd = 0;
    }
    double height = tree.heightM().value();
    Quantity centre = tree.massCentreM();
    if (centre == null) {
      centre = Quantity.estimated(Allowances.MASS_CENTRE_SHARE.value() * height);
      remarks.add("mass centre taken at 0.40 of the height");
    }
    if (tree.stumpDiameterM() == null) {
      remarks.add("diameter at the cut taken from DBH and a flare of 1.1");
    }
    return new TreeFigures(
        mass,
        Math.hypot(ownSd, dbhSd),
        ownSd,
        derived,
        centre.value(),
        Spreads.massCentreM(centre, height),
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
