package org.fallwright.core.reference;

import com.fasterxml.jackson.core.type.TypeReference;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.units.Range;

/**
 * The kinds of trees that the planner knows.
 *
 * <p>Where sources differ each figure stays, the nominal one first. Where none was read for a kind
 * of tree, allowances stand in: for density and rupture the middle, the least and the greatest of
 * its relatives in this table, of the same genus where there are any and else of like wood; with
 * one relative only, that one's rupture ∓ 15 %; for green over dry mass the greatest of them.
 */
public final class SpeciesTable {
  private static final Map<String, Species> ALL = load();

  private SpeciesTable() {}

  /**
   * Returns the species of that key.
   *
   * @throws IllegalArgumentException naming the key and the nearest keys there are
   */
  public static Species of(String key) {
    return Table.row(ALL, "species", key);
  }

  /** Every species, in the order of the table. */
  public static List<Species> all() {
    return List.copyOf(ALL.values());
  }

  /** A figure as the file holds it: [value, source] with its kind. */
  private record Cell(double value, String source, Kind kind) {}

  /** Root-plate constants in the order of {@link Anchor.Soil}. */
  private record Plate(List<Double> shallow, List<Double> deep, String source, Kind kind) {}

  /** Specific gravity and moisture of heart and sap [%]; null where not known. */
  private record Wet(Cell gravity, Cell heart, Cell sap) {}

  private record Row(
      String name,
      String spanish,
      String latin,
      boolean broadleaf,
      int massGroup,
      List<Cell> greenDensity,
      Wet moisture,
      Cell dryToGreen,
      List<Cell> morMPa,
      Cell morCv,
      Cell moeGPa,
      Cell shearMPa,
      Cell crushMPa,
      Cell knotFactor,
      Cell dragC,
      Cell dragN,
      Plate rootPlate) {}

  private static Map<String, Species> load() {
    Map<String, Species> all = new LinkedHashMap<>();
    Table.read("species.json", new TypeReference<Map<String, Row>>() {})
        .forEach((key, row) -> all.put(key, species(key, row)));
    return all;
  }

  private static Species species(String key, Row r) {
    List<Figure> mors = r.morMPa().stream().map(c -> figure(key, "rupture", c, 1e6, "Pa")).toList();
    double least = mors.stream().mapToDouble(Figure::value).min().orElseThrow();
    List<Figure> densities =
        r.greenDensity().stream().map(c -> figure(key, "green-density", c, 1, "kg/m³")).toList();
    return new Species(
        key,
        r.name(),
        r.spanish(),
        r.latin(),
        r.broadleaf(),
        r.massGroup(),
        densities.get(0),
        densities.subList(1, densities.size()),
        moisture(key, r.moisture()),
        figure(key, "dry-to-green", r.dryToGreen(), 1, ""),
        mors.get(0),
        mors.subList(1, mors.size()),
        or(key, "rupture-cv", r.morCv(), 1, "", Allowances.RUPTURE_CV, 1),
        figure(key, "elasticity", r.moeGPa(), 1e9, "Pa"),
        or(key, "shear", r.shearMPa(), 1e6, "Pa", Allowances.SHEAR_OVER_RUPTURE, least),
        or(key, "crushing", r.crushMPa(), 1e6, "Pa", Allowances.CRUSH_OVER_RUPTURE, least),
        or(key, "knot-factor", r.knotFactor(), 1, "", Allowances.KNOT_FACTOR, 1),
        figure(key, "drag-c", r.dragC(), 1, ""),
        figure(key, "drag-n", r.dragN(), 1, ""),
        plate(key, r.rootPlate(), false),
        plate(key, r.rootPlate(), true));
  }

  private static Moisture moisture(String key, Wet w) {
    return w == null
        ? null
        : new Moisture(
            figure(key, "gravity", w.gravity(), 1, ""),
            figure(key, "heart-moisture", w.heart(), 1, "%"),
            figure(key, "sap-moisture", w.sap(), 1, "%"));
  }

  private static Figure figure(String species, String what, Cell c, double scale, String unit) {
    Range.present(species + "." + what, c);
    String note = c.kind() == Kind.PLANNING_ALLOWANCE ? "stands in for " + what : what;
    return new Figure(
        species + "." + what,
        c.value() * scale,
        unit,
        c.kind(),
        c.source(),
        note + " of " + species);
  }

  private static Figure or(
      String species, String what, Cell c, double scale, String unit, Figure usual, double times) {
    return c != null
        ? figure(species, what, c, scale, unit)
        : new Figure(
            species + "." + what,
            usual.value() * times,
            unit,
            Kind.PLANNING_ALLOWANCE,
            "",
            "none known for this species: " + usual.note());
  }

  private static Map<Anchor.Soil, Figure> plate(String species, Plate p, boolean deep) {
    Map<Anchor.Soil, Figure> bySoil = new EnumMap<>(Anchor.Soil.class);
    if (p != null) {
      for (Anchor.Soil soil : Anchor.Soil.values()) {
        String what = "root-plate." + soil + (deep ? ".deep" : ".shallow");
        double c = (deep ? p.deep() : p.shallow()).get(soil.ordinal());
        Cell cell = new Cell(c, p.source(), p.kind());
        bySoil.put(soil, figure(species, what, cell, 1, "N·m/kg"));
      }
    }
    return bySoil;
  }
}
