package org.fallwright.core.doubt;

import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.IntStream;
import org.fallwright.core.line.Point3;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Species;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.reference.Spreads;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.StemDiameter;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.WeighedSection;
import org.fallwright.core.statics.Trial;
import org.fallwright.core.statics.WindMoment;
import org.fallwright.core.tree.DerivedMass;
import org.fallwright.core.tree.TreeFigures;

/**
 * The ways that a site may really be, by what was entered and how it was got.
 *
 * <p>Only what was entered is drawn, each thing once; everything derived is worked out again in
 * every trial by {@link TreeFigures}, so that mass, mass centre, crown and stump hang together. A
 * derived mass is that of the trial's tree times a factor for its equation and one for the green
 * density. A normal spread is cut at 2.5 standard deviations, a stated range is even from end to
 * end, the hinge factor from 1 to 1.5, the grip from its least to its most.
 *
 * <p>What cannot be nought is kept above a tenth of what was entered; a tree is never lower than
 * what is known to sit on it.
 */
public final class Sampler {
  /** Trials of a site: a power of two, as the points ask. */
  public static final int TRIALS = 4096;

  private static final double[][] POINTS = Points.of(TRIALS);
  private static final double LOWEST = 0.001;

  /** What the tree's derived figures hang on. */
  private static final Set<Input> DIMENSIONS =
      EnumSet.of(Input.DBH, Input.STUMP, Input.HEIGHT, Input.LEAN, Input.LEAN_AZIMUTH);

  private final Site site;
  private final SubjectTree tree;
  private final Species species;
  private final TreeFigures nominal;
  private final Map<Input, May> may = new EnumMap<>(Input.class);
  private final double[][] places;
  private final double leastHeightM;
  private final TreeFigures[] trees;

  public Sampler(Site site) {
    this(site, POINTS);
  }

  /**
   * @param trials how many
   */
  public Sampler(Site site, int trials) {
    this(site, Points.of(trials));
  }

  /**
   * @param points coordinates by input and trial, each above 0 and below 1
   */
  Sampler(Site site, double[][] points) {
    this.site = site;
    tree = site.tree();
    species = SpeciesTable.of(tree.species());
    nominal = TreeFigures.of(tree, site.cut(), species);
    leastHeightM = leastHeightM();
    ofTree();
    ofDayAndCut();
    places = new double[points.length][];
    for (Input in : Input.values()) {
      double[] shares = points[in.ordinal()];
      double[] at = new double[shares.length];
      May m = may.get(in);
      for (int i = 0; i < at.length; i++) {
        at[i] = m.place(shares[i]);
      }
      places[in.ordinal()] = at;
    }
    trees =
        IntStream.range(0, points[0].length)
            .parallel()
            .mapToObj(i -> tree(i, null))
            .toArray(TreeFigures[]::new);
  }

  private void ofTree() {
    may.put(Input.DBH, May.of(tree.dbhM(), Spreads.of(Spreads.What.DBH, tree.dbhM())));
    may.put(Input.HEIGHT, May.of(tree.heightM(), Spreads.of(Spreads.What.HEIGHT, tree.heightM())));
    may.put(Input.LEAN, May.of(tree.leanDeg(), Spreads.of(Spreads.What.LEAN, tree.leanDeg())));
    may.put(
        Input.LEAN_AZIMUTH,
        May.of(
            tree.leanAzimuthDeg(), Spreads.of(Spreads.What.LEAN_AZIMUTH, tree.leanAzimuthDeg())));
    may.put(Input.STUMP, stump());
    may.put(Input.MASS_CENTRE, about(tree.massCentreM(), nominal.massCentreSdM()));
    double density =
        nominal.massDerived() ? Spreads.What.GREEN_DENSITY.usual(How.ESTIMATED).value() : 0;
    may.put(Input.DENSITY, May.normal(1, density));
    may.put(Input.MASS, mass(density));
  }

  private void ofDayAndCut() {
    Quantity gust = site.conditions().gustMps();
    double mean = Math.max(WindMoment.LEAST_GUST, gust.value());
    double least = Spreads.GUST_LEAST_SD.value();
    double half =
        gust.how() == How.RANGE
            ? Math.max(gust.plusMinus(), Allowances.PERCENTILE_SDS.value() * least)
            : 0;
    may.put(
        Input.GUST,
        half > 0
            ? May.between(mean - half, mean + half)
            : May.normal(mean, Math.max(least, Spreads.of(Spreads.What.GUST, gust))));
    may.put(Input.DRAG, May.normal(1, Allowances.DRAG_SD.value()));
    may.put(
        Input.HINGE_FACTOR,
        May.between(Allowances.HINGE_K_LEAST.value(), Allowances.HINGE_K_MOST.value()));
    may.put(Input.RUPTURE, May.normal(0, 1));
    may.put(Input.THICKNESS, May.normal(0, 1));
    may.put(Input.ATTACH, May.normal(0, 1));
    may.put(Input.BEARING, May.normal(0, 1));
    may.put(Input.GRIP, May.between(0, 1));
  }

  /** Diameter at the cut where entered; else a factor on what DBH and flare give. */
  private May stump() {
    if (tree.stumpDiameterM() != null) {
      Quantity q = tree.stumpDiameterM();
      return May.of(q, Spreads.of(Spreads.What.STUMP_DIAMETER, q));
    }
    double whole = nominal.stumpDiameterSdM() / nominal.stumpDiameterM();
    double ofDbh = Spreads.of(Spreads.What.DBH, tree.dbhM()) / tree.dbhM().value();
    return May.normal(1, rest(whole, ofDbh));
  }

  /** A factor on the mass; of a derived one without what DBH, height and density bring. */
  private May mass(double density) {
    double own = nominal.massOwnSdKg() / nominal.massKg();
    if (!nominal.massDerived()) {
      Quantity q = tree.massKg();
      return q != null && q.how() == How.RANGE
          ? May.between(q.low() / q.value(), q.high() / q.value())
          : May.normal(1, own);
    }
    double height =
        DerivedMass.byStem(tree)
            ? Spreads.of(Spreads.What.HEIGHT, tree.heightM()) / tree.heightM().value()
            : 0;
    return May.normal(1, rest(own, Math.hypot(density, height)));
  }

  private static double rest(double whole, double part) {
    return Math.sqrt(Math.max(0, whole * whole - part * part));
  }

  /** How far off a quantity may be; null counts as estimated. */
  private static May about(Quantity q, double sd) {
    return q != null && q.how() == How.RANGE
        ? May.between(-q.plusMinus(), q.plusMinus())
        : May.normal(0, sd);
  }

  private double leastHeightM() {
    double least = tree.crownBaseM();
    for (StemDiameter d : tree.diameters()) {
      least = Math.max(least, d.heightM());
    }
    if (tree.massCentreM() != null) {
      least = Math.max(least, tree.massCentreM().value());
    }
    if (tree.sections() != null) {
      for (WeighedSection s : tree.sections()) {
        least = Math.max(least, s.midHeightM());
      }
    }
    return Math.max(2, least + LOWEST);
  }

  /** What an input may be. */
  May may(Input in) {
    return may.get(in);
  }

  /** Where an input lies in each trial; not to be written to. */
  double[] places(Input in) {
    return places[in.ordinal()];
  }

  /** The ways that the site may be. */
  public List<Trial> trials() {
    return trials(null);
  }

  /**
   * The same with one input taken otherwise.
   *
   * @param other null: none
   */
  List<Trial> trials(Otherwise other) {
    boolean same = other == null || !DIMENSIONS.contains(other.what());
    return IntStream.range(0, places[0].length)
        .parallel()
        .mapToObj(i -> trial(same ? trees[i] : tree(i, other), i, other))
        .toList();
  }

  /** The tree's dimensions as a trial has them, and all that is derived of them. */
  private TreeFigures tree(int i, Otherwise o) {
    double lean = at(Input.LEAN, i, o);
    double towards = at(Input.LEAN_AZIMUTH, i, o);
    return TreeFigures.of(
        tree.measuring(
            within(positive(Input.DBH, i, o), 0.05, 4),
            stumpEntered() ? within(positive(Input.STUMP, i, o), 0.05, 6) : Double.NaN,
            within(at(Input.HEIGHT, i, o), leastHeightM, 120),
            within(Math.abs(lean), 0, 45),
            turned(lean < 0 ? towards + 180 : towards)),
        site.cut(),
        species);
  }

  private boolean stumpEntered() {
    return tree.stumpDiameterM() != null;
  }

  private Trial trial(TreeFigures f, int i, Otherwise o) {
    double stump = positive(Input.STUMP, i, o);
    double cut = site.cut().heightM();
    double centre = nominal.massCentreM() - cut;
    double crown =
        f.crownAreaM2()
            * (f.crownMiddleM() - cut)
            / (nominal.crownAreaM2() * (nominal.crownMiddleM() - cut));
    return new Trial(
        f.massKg() * positive(Input.MASS, i, o) * positive(Input.DENSITY, i, o),
        Math.max(Trial.LEAST_SHARE * centre, f.massCentreM() - cut + at(Input.MASS_CENTRE, i, o)),
        at(Input.LEAN, i, o),
        at(Input.LEAN_AZIMUTH, i, o),
        at(Input.HINGE_FACTOR, i, o),
        at(Input.RUPTURE, i, o),
        at(Input.THICKNESS, i, o),
        stumpEntered() ? stump : f.stumpDiameterM() * stump,
        at(Input.GUST, i, o),
        positive(Input.DRAG, i, o) * crown,
        at(Input.ATTACH, i, o),
        at(Input.BEARING, i, o),
        new Point3(f.crownShiftM().eastM(), f.crownShiftM().northM(), 0));
  }

  double at(Input in, int i, Otherwise o) {
    May m = may.get(in);
    double place = places[in.ordinal()][i];
    return m.at(o != null && o.what() == in ? o.of(place, m.middle()) : place);
  }

  private double positive(Input in, int i, Otherwise o) {
    return Math.max(Trial.LEAST_SHARE * may.get(in).mean(), at(in, i, o));
  }

  private static double within(double x, double least, double most) {
    return Math.max(least, Math.min(most, x));
  }

  private static double turned(double deg) {
    double d = deg % 360;
    return d < 0 ? d + 360 : d;
  }
}
