package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.fallwright.core.line.Point3;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Species;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.reference.Spreads;
import org.fallwright.core.site.Conditions;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.statics.CutMade;
import org.fallwright.core.statics.LineSet;
import org.fallwright.core.statics.PullCase;
import org.fallwright.core.statics.Spread;
import org.fallwright.core.statics.TreeBody;
import org.fallwright.core.statics.Wind;
import org.fallwright.core.statics.Wood;
import org.fallwright.core.tree.TreeFigures;

/** The site's tree, wood and wind as the force balance needs them. */
final class Subject {
  private final Site site;
  private final Species species;
  private final TreeFigures figures;
  private final Wood wood;
  private final Wind wind;
  private final TreeBody body;

  Subject(Site site) {
    this.site = site;
    SubjectTree tree = site.tree();
    CutPlan cut = site.cut();
    species = SpeciesTable.of(tree.species());
    figures = TreeFigures.of(tree, cut, species);
    wood =
        new Wood(
            species.morResists(),
            species.morCv().value(),
            species.moePa().value(),
            species.shearPa().value(),
            species.crushPa().value(),
            species.knotFactor().value(),
            species.morHolds());
    Conditions day = site.conditions();
    double leaf = species.broadleaf() && !tree.inLeaf() ? Allowances.LEAFLESS_DRAG.value() : 1;
    wind =
        new Wind(
            day.gustMps().value(),
            day.windTowardDeg(),
            leaf * species.dragC().value(),
            species.dragN().value(),
            figures.crownAreaM2(),
            figures.crownMiddleM() - cut.heightM(),
            day.airDensity() == null ? Allowances.AIR_DENSITY.value() : day.airDensity());
    Position shift = figures.crownShiftM();
    body =
        new TreeBody(
            tree.heightM().value(),
            tree.dbhM().value(),
            cut.heightM(),
            tree.diameters(),
            figures.stumpDiameterM(),
            tree.shellM(),
            tree.deadOrDecayed(),
            figures.massKg(),
            figures.massCentreM() - cut.heightM(),
            tree.leanDeg().value(),
            tree.leanAzimuthDeg().value(),
            new Point3(shift.eastM(), shift.northM(), 0));
  }

  TreeFigures figures() {
    return figures;
  }

  Species species() {
    return species;
  }

  /** Notes on figures that were not entered, a sentence each. */
  List<String> notes() {
    List<String> notes =
        new ArrayList<>(figures.remarks().stream().map(Subject::sentence).toList());
    List<String> assumed =
        species.assumed().stream()
            .map(Figure::key)
            .map(k -> k.substring(k.indexOf('.') + 1).replace('-', ' '))
            .toList();
    if (!assumed.isEmpty()) {
      notes.add(
          "For "
              + species.name()
              + " no source was read for "
              + String.join(", ", assumed)
              + "; planning allowances stand in.");
    }
    return notes;
  }

  /**
   * The case of a setup whose line runs along a route.
   *
   * @param sourceNPerM stiffness of the source itself [N/m]; null: rigid
   */
  PullCase pull(Setup setup, Route route, Double sourceNPerM) {
    return pull(setup, line(setup, route, sourceNPerM), route.bearingErrorM());
  }

  /**
   * The case of a setup over a line.
   *
   * @param setup its lay, attachment and hinge; the rest is no part of it
   * @param bearingErrorM position error of the line's first bearing point [m]
   */
  PullCase pull(Setup setup, LineSet line, double bearingErrorM) {
    CutPlan cut = site.cut();
    return new PullCase(
        setup.layDeg(),
        body,
        wood,
        new CutMade(
            cut.faceFraction(),
            setup.hingeThicknessM(),
            cut.hingeWidthM(),
            cut.kerfM(),
            cut.wedges(),
            Allowances.HINGE_K_LEAST.value()),
        wind,
        line,
        spread(setup, bearingErrorM));
  }

  /**
   * The line of a way as it is set.
   *
   * @param sourceNPerM stiffness of the source itself [N/m]; null: rigid
   */
  LineSet line(Setup setup, Route route, Double sourceNPerM) {
    double stiffness = GearParts.lineFigures(site, setup).stiffnessN();
    List<Point3> points = route.points().subList(1, route.points().size());
    return line(setup.attachHeightM(), points, stiffness, haul(route), sourceNPerM);
  }

  /** A line straight to a bearing point. */
  LineSet line(double attachHeightM, Point3 bearing, double stiffnessN) {
    return line(attachHeightM, List.of(bearing), stiffnessN, null, null);
  }

  private LineSet line(
      double attachHeightM,
      List<Point3> points,
      double stiffnessN,
      LineSet.BaseLeg haul,
      Double sourceNPerM) {
    Double slack = site.conditions().slackM();
    return new LineSet(
        attachHeightM - site.cut().heightM(),
        points,
        Collections.nCopies(points.size(), stiffnessN),
        haul,
        slack == null ? Allowances.SLACK.value() : slack,
        sourceNPerM);
  }

  /**
   * The line of a block system as one more loaded leg: its haul leg and its parts, each with one
   * over their number of the tension at the tree.
   */
  private static LineSet.BaseLeg haul(Route route) {
    HaulLine haul = route.haulLine();
    return haul == null
        ? null
        : new LineSet.BaseLeg(
            route.haulLegM() + haul.parts() * Allowances.BLOCKS_APART.value(),
            haul.stiffnessN(),
            1 / haul.parts());
  }

  private Spread spread(Setup setup, double bearingErrorM) {
    SubjectTree tree = site.tree();
    double thickness =
        Spreads.of(Spreads.What.HINGE_THICKNESS, setup.hingeThicknessM(), site.cut().hingeHow());
    double gust = Math.max(Allowances.GUST_LEAST.value(), site.conditions().gustMps().value());
    return new Spread(
        figures.massSdKg() / figures.massKg(),
        figures.massCentreSdM(),
        Spreads.of(Spreads.What.LEAN, tree.leanDeg()),
        Spreads.of(Spreads.What.LEAN_AZIMUTH, tree.leanAzimuthDeg()),
        figures.stumpDiameterSdM() / figures.stumpDiameterM(),
        species.morCv().value(),
        thickness / setup.hingeThicknessM(),
        Spreads.of(Spreads.What.GUST, site.conditions().gustMps()) / gust,
        Spreads.of(Spreads.What.ATTACH_HEIGHT, setup.attachHeightM(), site.offer().attachHow()),
        Allowances.BEARING_ASIDE.value() * bearingErrorM);
  }

  private static String sentence(String remark) {
    return Character.toUpperCase(remark.charAt(0)) + remark.substring(1) + ".";
  }
}
