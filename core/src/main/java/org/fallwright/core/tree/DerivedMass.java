package org.fallwright.core.tree;

import static org.fallwright.core.reference.Spreads.What.DBH;
import static org.fallwright.core.reference.Spreads.What.GREEN_DENSITY;
import static org.fallwright.core.reference.Spreads.What.HEIGHT;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Species;
import org.fallwright.core.reference.Spreads;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.How;
import org.fallwright.core.site.SubjectTree;

/**
 * A mass that was neither entered nor weighed: dry mass by {@link MassEquation} times the species'
 * green factor, or the stem by its measured diameters.
 *
 * <p>By the stem: m = V·ρ/(1 − c), V the volume over the bark from the ground to the top by {@link
 * StemTaper} [m³], ρ the green density of the species [kg/m³], c the crown's share of the mass. The
 * stump left standing is not taken off. Straight lines between the diameters read a stem low that
 * swells between them, and lowest where none was measured up the stem: without one from {@link
 * #MEASURED_FROM} of the height on, the equation is taken. A crown with room about it is heavier
 * than its usual share.
 *
 * <p>Both are spread by {@link Allowances#MASS_RESIDUAL}, for neither publishes its own, and by the
 * green density; the equation by its slope times what DBH brings, the stem by twice the DBH's and
 * once the height's. A mass by the stem below the equation's is spread so far that its 95th
 * percentile reaches that one.
 *
 * @param massKg green mass [kg]
 * @param ownSdKg its standard deviation without what DBH brings [kg]
 * @param ofDbhKg what DBH brings [kg]
 * @param remarks how it was got
 */
public record DerivedMass(double massKg, double ownSdKg, double ofDbhKg, List<String> remarks) {
  /** Share of the tree's height from which a diameter must have been measured; allowance. */
  public static final double MEASURED_FROM = Allowances.STEM_MEASURED_FROM.value();

  static DerivedMass of(SubjectTree tree, CutPlan cut, Species species) {
    return byStem(tree) ? stem(tree, cut, species) : equation(tree, species);
  }

  /** Whether the mass of a tree is by the volume of its stem. */
  public static boolean byStem(SubjectTree tree) {
    return tree.massBy() == SubjectTree.MassBy.STEM
        && tree.diameters().stream()
            .anyMatch(d -> d.heightM() >= MEASURED_FROM * tree.heightM().value());
  }

  /** Share of the crown in the mass: as entered, else by DBH. */
  public static double crownShare(SubjectTree tree, Species species) {
    if (tree.crownShare() != null) {
      return tree.crownShare();
    }
    DryShares shares = DryShares.of(species.broadleaf(), tree.dbhM().value());
    return bare(tree, species) ? shares.bareCrown() : shares.crown();
  }

  static boolean bare(SubjectTree tree, Species species) {
    return species.broadleaf() && !tree.inLeaf();
  }

  /** Green mass by the equation [kg]. */
  static double byEquationKg(SubjectTree tree, Species species) {
    double dbh = tree.dbhM().value();
    double leafy = MassEquation.of(species.massGroup()).dryKg(dbh) * species.dryToGreen().value();
    return bare(tree, species) ? leafy * (1 - DryShares.of(true, dbh).foliage()) : leafy;
  }

  private static DerivedMass stem(SubjectTree tree, CutPlan cut, Species species) {
    double share = crownShare(tree, species);
    StemMass stem = StemMass.of(StemTaper.of(tree, cut).volumeM3(), species);
    double mass = stem.treeKg(share);
    double height = Spreads.of(HEIGHT, tree.heightM()) / tree.heightM().value();
    double density = (stem.highKg() - stem.lowKg()) / (2 * stem.massKg());
    double own =
        mass
            * Math.hypot(
                Math.hypot(Allowances.MASS_RESIDUAL.value(), height),
                Math.max(density, GREEN_DENSITY.usual(How.ESTIMATED).value()));
    double below = byEquationKg(tree, species) - mass;
    return new DerivedMass(
        mass,
        Math.max(own, below / Allowances.PERCENTILE_SDS.value()),
        mass * 2 * Spreads.of(DBH, tree.dbhM()) / tree.dbhM().value(),
        List.of(
            said(
                "mass by the stem's measured diameters, green density and a crown of %.0f %% of it;"
                    + " a crown with room about it is heavier",
                100 * share),
            said("by DBH and species it would be %.0f kg", byEquationKg(tree, species))));
  }

  private static DerivedMass equation(SubjectTree tree, Species species) {
    double mass = byEquationKg(tree, species);
    double dbh = tree.dbhM().value();
    MassEquation equation = MassEquation.of(species.massGroup());
    List<String> remarks = new ArrayList<>();
    if (tree.massBy() == SubjectTree.MassBy.STEM) {
      remarks.add(
          said(
              "no diameter was measured %.1f m up the stem or higher, so the mass is not by the"
                  + " stem",
              MEASURED_FROM * tree.heightM().value()));
    }
    remarks.add("mass by equation from DBH and species; a weighed or counted mass is better");
    equation
        .warning(dbh)
        .ifPresent(
            w -> {
              double volume = StemVolume.of(species).volumeM3(dbh, tree.heightM().value());
              double crown = DryShares.of(species.broadleaf(), dbh).crown();
              double other = StemMass.of(volume, species).treeKg(crown);
              remarks.add(said("%s; by stem volume and density it would be %.0f kg", w, other));
            });
    if (bare(tree, species)) {
      remarks.add(
          said("bare: its leaves, %.1f %%, are off", 100 * DryShares.of(true, dbh).foliage()));
    }
    return new DerivedMass(
        mass,
        mass
            * Math.hypot(
                Allowances.MASS_RESIDUAL.value(), GREEN_DENSITY.usual(How.ESTIMATED).value()),
        mass * equation.b1() * Spreads.of(DBH, tree.dbhM()) / dbh,
        remarks);
  }

  private static String said(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }
}
