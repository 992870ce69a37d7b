package org.fallwright.plugins.vehicle;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.fallwright.core.units.Range;
import org.fallwright.plugins.api.ParameterReader;

/**
 * The chassis that the parameters tell of: one where all is stated, else one for each end of what a
 * class leaves open.
 *
 * @param pulling light, for what it pulls and holds
 * @param loading heavy, for what loads the parts
 * @param standIn the class whose figures fill gaps; null: none was needed
 */
record VehicleFigures(List<Chassis> pulling, List<Chassis> loading, VehicleClass standIn) {
  /**
   * Reads them.
   *
   * @throws IllegalArgumentException if something is missing that no class fills, or the mass is
   *     told in two ways
   */
  static VehicleFigures of(ParameterReader reader) {
    VehicleClass kind = reader.isStated("class") ? VehicleClass.of(reader.choice("class")) : null;
    Gaps gaps = new Gaps(reader, kind);
    double light;
    double heavy;
    double[] shares;
    if (reader.isStated("front_axle_kg") || reader.isStated("rear_axle_kg")) {
      toldOnce(reader, "mass_kg");
      toldOnce(reader, "front_share");
      double front = reader.number("front_axle_kg");
      light = front + reader.number("rear_axle_kg");
      Range.check("front_axle_kg and rear_axle_kg together", light, 300, 60_000, "kg");
      heavy = light;
      shares = new double[] {front / light};
    } else {
      light = gaps.number("mass_kg", k -> k.lightKg);
      heavy = gaps.number("mass_kg", k -> k.heavyKg);
      double least = gaps.number("front_share", k -> k.shareLeast);
      double most = gaps.number("front_share", k -> k.shareMost);
      shares = least == most ? new double[] {least} : new double[] {least, most};
    }
    List<Chassis> pulling = new ArrayList<>();
    List<Chassis> loading = new ArrayList<>();
    for (double share : shares) {
      pulling.add(gaps.chassis(light, share));
      loading.add(gaps.chassis(heavy, share));
    }
    return new VehicleFigures(pulling, loading, gaps.used ? kind : null);
  }

  private static void toldOnce(ParameterReader reader, String key) {
    if (reader.isStated(key)) {
      throw new IllegalArgumentException(
          key + " is " + reader.number(key) + "; it must be left out where axle loads are stated");
    }
  }

  /** Height of the tow point above the ground [m]. */
  static double hitchHeightM(ParameterReader reader) {
    VehicleClass kind = reader.isStated("class") ? VehicleClass.of(reader.choice("class")) : null;
    return new Gaps(reader, kind).number("hitch_height_m", k -> k.hitchHeightM);
  }

  /** Reads a figure, or takes it from the class. */
  private static final class Gaps {
    private final ParameterReader reader;
    private final VehicleClass kind;
    private boolean used;

    Gaps(ParameterReader reader, VehicleClass kind) {
      this.reader = reader;
      this.kind = kind;
    }

    double number(String key, ToDoubleFunction<VehicleClass> standIn) {
      if (kind == null || reader.isStated(key)) {
        return reader.number(key);
      }
      used = true;
      return standIn.applyAsDouble(kind);
    }

    Chassis chassis(double massKg, double frontShare) {
      return new Chassis(
          massKg,
          frontShare,
          number("wheelbase_m", k -> k.wheelbaseM),
          number("cg_height_m", k -> k.cgHeightM),
          number("hitch_height_m", k -> k.hitchHeightM),
          number("overhang_m", k -> k.overhangM));
    }
  }
}
