package org.fallwright.plugins.vehicle;

import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Collectors;
import org.fallwright.core.reference.Surface;
import org.fallwright.plugins.api.ParameterReader;
import org.fallwright.plugins.vehicle.Grip.Lock;
import org.fallwright.plugins.vehicle.Soil.Tyre;

/**
 * What the wheels stand on and how they pass their grip on.
 *
 * @param ground the ground
 * @param low grip taken where it helps, tyres counted in
 * @param high grip taken where more of it loads the parts
 * @param worse low grip under the wheels of one side; null: not stated
 * @param locks locked differentials; null: not stated
 * @param soil the soil, where the pull goes by the traction equation; null: by grip
 * @param front driven tyre of the front axle; null: not asked
 * @param rear driven tyre of the rear axle; null: not asked
 */
record Footing(
    Surface ground,
    double low,
    double high,
    Double worse,
    Set<Lock> locks,
    Soil soil,
    Tyre front,
    Tyre rear) {
  private static final Set<String> PAVED = Set.of("asphalt", "concrete");

  /** Reads it for one drive. */
  static Footing of(ParameterReader reader, Surface ground, Drive drive) {
    Tyres tyres = reader.isStated("tyres") ? Tyres.of(reader.choice("tyres")) : Tyres.NOT_STATED;
    double low = tyres.lowOf(ground.tyreLow(), PAVED.contains(ground.key()));
    double high = tyres.highOf(ground.tyreHigh());
    Double worse = reader.numberOrNull("worse_side_grip");
    boolean bySoil =
        reader.isStated("traction_by") && reader.choice("traction_by").equals("cone-index");
    if (!bySoil) {
      return new Footing(ground, low, high, worse, locks(reader), null, null, null);
    }
    return new Footing(
        ground,
        low,
        Math.max(high, Soil.GROSS_MOST),
        worse,
        locks(reader),
        Soil.of(ground.key(), ground.wet(), reader.numberOrNull("cone_index_kPa")),
        drive.front ? tyre(reader, "front_tyre_width_m", "front_tyre_diameter_m") : null,
        drive.rear ? tyre(reader, "tyre_width_m", "tyre_diameter_m") : null);
  }

  private static Tyre tyre(ParameterReader reader, String width, String diameter) {
    return new Tyre(reader.number(width), reader.number(diameter));
  }

  private static Set<Lock> locks(ParameterReader reader) {
    if (!reader.isStated("locked")) {
      return null;
    }
    List<String> chosen = reader.choices("locked");
    if (chosen.contains("none") && chosen.size() > 1) {
      throw new IllegalArgumentException(
          "locked is " + chosen + "; it must be \"none\" alone or the ones that are locked");
    }
    return chosen.stream()
        .filter(c -> !c.equals("none"))
        .map(c -> Lock.valueOf(c.toUpperCase(Locale.ROOT)))
        .collect(Collectors.toCollection(() -> EnumSet.noneOf(Lock.class)));
  }

  /** Whether grip or soil may be worse than counted because of what was left out. */
  boolean saysNothingOfDifferentials() {
    return worse == null && locks == null;
  }

  /** The pull that can be counted on. */
  Traction pulls(Chassis chassis, Drive drive, double riseRad, double slopeRad) {
    Grip grip = Grip.of(low, worse, locks);
    return soil == null
        ? Traction.of(chassis, drive, grip, ground.rolling(), riseRad, slopeRad)
        : new FieldTraction(soil, front, rear, grip, low)
            .of(chassis, drive, ground.rolling(), riseRad, slopeRad);
  }

  /** The most that its wheels can put on the parts, without a surge. */
  Traction most(Chassis chassis, Drive drive, double riseRad, double slopeRad) {
    return Traction.of(chassis, drive, high, 0, riseRad, slopeRad);
  }

  /** Grip of a braked wheel, in the mean of both sides. */
  double braked() {
    return Grip.braked(low, worse).front();
  }
}
