package org.fallwright.core.reference;

import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.units.Range;

/**
 * What is known of a kind of tree, each figure with its source. Where nothing is published the
 * figure is an allowance of ours and says so: see {@link #assumed()}.
 *
 * @param key stable name
 * @param name English name
 * @param spanish Spanish name
 * @param latin botanical name
 * @param broadleaf whether it bears leaves that it sheds (else a conifer)
 * @param massGroup number of its group of mass equations, 1 to 10
 * @param greenDensity green density of the stem with bark [kg/m³], nominal
 * @param otherDensities green densities that other sources give [kg/m³]
 * @param moisture moisture of its green wood; null: not known
 * @param dryToGreen green mass over dry mass, wood and bark of the stem
 * @param morPa mean green modulus of rupture [Pa], nominal
 * @param otherMors the same as other sources give it [Pa]
 * @param morCv its coefficient of variation
 * @param moePa mean green modulus of elasticity in bending [Pa]
 * @param shearPa mean green shear strength along the grain [Pa]
 * @param crushPa mean green compression strength along the grain [Pa]
 * @param knotFactor what knots leave of the rupture strength of a stem, 0 to 1
 * @param dragC C of the drag coefficient C·V^(−N), in leaf
 * @param dragN N of the drag coefficient C·V^(−N)
 * @param shallowPlate root-plate constant by soil, roots not below 80 cm [N·m/kg]; empty: not
 *     tested
 * @param deepPlate the same, deeper roots [N·m/kg]
 */
public record Species(
    String key,
    String name,
    String spanish,
    String latin,
    boolean broadleaf,
    int massGroup,
    Figure greenDensity,
    List<Figure> otherDensities,
    Moisture moisture,
    Figure dryToGreen,
    Figure morPa,
    List<Figure> otherMors,
    Figure morCv,
    Figure moePa,
    Figure shearPa,
    Figure crushPa,
    Figure knotFactor,
    Figure dragC,
    Figure dragN,
    Map<Anchor.Soil, Figure> shallowPlate,
    Map<Anchor.Soil, Figure> deepPlate) {
  public Species {
    Range.text("key", key);
    Range.text("name", name);
    Range.text("spanish", spanish);
    Range.text("latin", latin);
    Range.check("mass_group", massGroup, 1, 10, "");
    within(greenDensity, 300, 1400);
    otherDensities = List.copyOf(otherDensities);
    otherDensities.forEach(d -> within(d, 300, 1400));
    within(dryToGreen, 1.2, 2.6);
    within(morPa, 15e6, 150e6);
    otherMors = List.copyOf(otherMors);
    otherMors.forEach(m -> within(m, 15e6, 150e6));
    within(morCv, 0.05, 0.4);
    within(moePa, 2e9, 20e9);
    within(shearPa, 2e6, 20e6);
    within(crushPa, 8e6, 60e6);
    within(knotFactor, 0.3, 1);
    within(dragC, 0.1, 6);
    within(dragN, 0, 1);
    shallowPlate = Collections.unmodifiableMap(new TreeMap<>(shallowPlate));
    deepPlate = Collections.unmodifiableMap(new TreeMap<>(deepPlate));
    Stream.of(shallowPlate, deepPlate)
        .flatMap(m -> m.values().stream())
        .forEach(c -> within(c, 20, 400));
  }

  /** The least green density that any source gives [kg/m³]: where mass helps. */
  public double densityLow() {
    return densities().mapToDouble(Figure::value).min().orElseThrow();
  }

  /** The greatest green density that any source gives [kg/m³]: where mass resists. */
  public double densityHigh() {
    return densities().mapToDouble(Figure::value).max().orElseThrow();
  }

  /** The least rupture strength that any source gives [Pa]: where it holds. */
  public double morHolds() {
    return mors().mapToDouble(Figure::value).min().orElseThrow();
  }

  /**
   * The greatest rupture strength that any source gives [Pa]: where it resists, as a hinge does.
   */
  public double morResists() {
    return mors().mapToDouble(Figure::value).max().orElseThrow();
  }

  /**
   * Root-plate constant [N·m per kg of green stem mass]: the moment that pulled such trees over.
   * For a species without tests it is the least that was read for any, and says so.
   */
  public Figure rootPlate(Anchor.Soil soil, boolean deep) {
    return (deep ? deepPlate : shallowPlate).getOrDefault(soil, Allowances.ROOT_PLATE_LEAST);
  }

  /**
   * Drag coefficient of the crown, C·V^(−N): crowns fold in a stronger wind. Below the tested
   * speeds V counts as the lowest, above them as the highest, so the coefficient is never taken
   * past the tests. A bare broadleaf has {@link Allowances#LEAFLESS_DRAG} of it.
   *
   * @param gustMps gust at crown height [m/s]
   * @param inLeaf whether the crown is in leaf
   */
  public double drag(double gustMps, boolean inLeaf) {
    double v =
        Math.min(
            Math.max(gustMps, Allowances.WIND_CLAMP.value()), Allowances.WIND_CLAMP_TOP.value());
    double leaf = broadleaf && !inLeaf ? Allowances.LEAFLESS_DRAG.value() : 1;
    return leaf * dragC.value() * Math.pow(v, -dragN.value());
  }

  /** Every figure of this species. */
  public List<Figure> figures() {
    return Stream.of(
            densities(),
            moisture == null ? Stream.<Figure>of() : moisture.figures(),
            mors(),
            Stream.of(dryToGreen, morCv, moePa, shearPa, crushPa, knotFactor, dragC, dragN),
            shallowPlate.values().stream(),
            deepPlate.values().stream())
        .flatMap(f -> f)
        .toList();
  }

  /** The figures that no source gives for this species, so that ours stand in for them. */
  public List<Figure> assumed() {
    return figures().stream().filter(f -> f.kind() == Kind.PLANNING_ALLOWANCE).toList();
  }

  private Stream<Figure> mors() {
    return Stream.concat(Stream.of(morPa), otherMors.stream());
  }

  private Stream<Figure> densities() {
    return Stream.concat(Stream.of(greenDensity), otherDensities.stream());
  }

  private static void within(Figure f, double least, double most) {
    Range.check(Range.present("figure", f).key(), f.value(), least, most, f.unit());
  }
}
