package org.fallwright.plugins.vehicle;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.Parameter.Choice;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Finding;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.pull.PullOffer.Standing;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Surface;
import org.fallwright.plugins.api.ParameterReader;
import org.fallwright.plugins.api.PullSourceExtension;
import org.pf4j.Extension;

/**
 * A vehicle that creeps away from the tree with the line on its rear tow point.
 *
 * <p>Low: the grip of the driven axles on the low figure of the ground. High, for the parts: the
 * high figure without rolling resistance, and on top what the moving mass brings when the line
 * stops it, v sqrt(m K), v {@link #CREEP_MPS}, K twice the path stiffness over the square of the
 * travel ratio [N/m]. Holding: all wheels locked on the low figure.
 */
@Extension
public final class Vehicle implements PullSourceExtension {
  /** Creep speed at which the line may stop it [m/s]. Planning allowance. */
  private static final double CREEP_MPS = Allowances.SURGE_SPEED.value();

  /** A stiff line brings more than the mean stiffness says: this many times. Planning allowance. */
  private static final double STIFFER = Allowances.SURGE_STIFFNESS.value();

  /** Line that still comes in after "stop" [m]. Planning allowance. */
  private static final double OVERRUN_M = Allowances.OVERRUN_VEHICLE.value();

  /** Clear way beyond the travel [m]. Planning allowance. */
  private static final double RUN_OUT_SPARE_M = Allowances.RUN_OUT_SPARE.value();

  /** Most that the line may be off the heading [deg]. Planning allowance. */
  private static final double OFF_HEADING_DEG = Allowances.LINE_OFF_HEADING_MOST.value();

  /** Least share of its level load that the front axle needs to steer. From memory. */
  private static final double FRONT_SHARE_TO_STEER = Allowances.FRONT_AXLE_LEAST.value();

  /** Least factor on the tow point at the most the vehicle can do. Planning allowance. */
  private static final double LAST_FACTOR = Allowances.LAST_FACTOR.value();

  /** Ratio of a check that asks nothing. */
  private static final double MOST_RATIO = 1e6;

  private static final SourceDescription DESCRIPTION =
      new SourceDescription(
          "vehicle",
          new Wording("vehicle", "vehículo"),
          Set.of(PlaceKind.SPOT),
          false,
          List.of(
              Parameter.number(
                  "mass_kg",
                  "kg",
                  300,
                  60_000,
                  new Wording("Mass", "Peso (kg)"),
                  new Wording(
                      "As it stands there, with load and driver.",
                      "Como está ahí, con carga y conductor.")),
              Parameter.number(
                  "front_share",
                  "",
                  0.1,
                  0.9,
                  new Wording("Share on the front axle", "Parte en el eje delantero"),
                  new Wording(
                      "Front axle's share of the weight on level ground: 0.55 is 55 %.",
                      "Parte del peso en el eje delantero, en plano: 0.55 es 55 %.")),
              Parameter.number(
                  "wheelbase_m",
                  "m",
                  1,
                  8,
                  new Wording("Wheelbase", "Distancia entre ejes"),
                  new Wording("From axle to axle.", "De un eje al otro.")),
              Parameter.number(
                  "cg_height_m",
                  "m",
                  0.2,
                  2.5,
                  new Wording("Height of the mass centre", "Altura del centro de peso"),
                  new Wording(
                      "Above the ground; when not known take it high.",
                      "Sobre el suelo; si no se sabe, tómela alta.")),
              Parameter.number(
                  "hitch_height_m",
                  "m",
                  0.1,
                  2,
                  new Wording("Height of the tow point", "Altura del punto de enganche"),
                  new Wording("Above the ground.", "Sobre el suelo.")),
              Parameter.number(
                  "overhang_m",
                  "m",
                  0,
                  4,
                  new Wording("Tow point behind the rear axle", "Enganche detrás del eje trasero"),
                  new Wording("Along the vehicle.", "A lo largo del vehículo.")),
              Parameter.choices(
                  "drives",
                  new Wording("Drives", "Tracción"),
                  new Wording(
                      "Every drive that can be engaged; each is tried.",
                      "Todas las tracciones que se pueden poner; se prueba cada una."),
                  Choice.of("rwd", "rear axle", "eje trasero"),
                  Choice.of("fwd", "front axle", "eje delantero"),
                  Choice.of("awd", "all wheels", "todas las llantas")),
              Parameter.number(
                  "tow_point_N",
                  "N",
                  500,
                  1e6,
                  new Wording("Rated load of the tow point", "Carga límite del punto de enganche"),
                  new Wording(
                      "As marked; an unmarked tow point is not to be used.",
                      "La marcada; un enganche sin marca no se usa.")),
              Parameter.number(
                  "tow_point_factor",
                  "",
                  1,
                  12,
                  new Wording("Design factor of the tow point", "Factor de diseño del enganche"),
                  new Wording(
                      "Breaking load over rated load; 1 where it is not known.",
                      "Carga de ruptura entre carga límite; 1 si no se sabe."))));

  @Override
  public SourceDescription describe() {
    return DESCRIPTION;
  }

  @Override
  public List<String> modes(ObjectNode parameters) {
    return new ParameterReader(DESCRIPTION, parameters).choices("drives");
  }

  @Override
  public double lineHeightM(ObjectNode parameters) {
    return new ParameterReader(DESCRIPTION, parameters).number("hitch_height_m");
  }

  @Override
  public PullOffer offer(PullRequest request) {
    ParameterReader reader = new ParameterReader(DESCRIPTION, request.parameters());
    List<String> drives = reader.choices("drives");
    if (!drives.contains(request.mode())) {
      throw new IllegalArgumentException(
          "mode is \"" + request.mode() + "\"; the vehicle's drives are " + drives);
    }
    PullRequest.Stand stand = request.stand();
    Surface ground = stand.ground();
    if (ground == null) {
      throw new IllegalArgumentException(
          "ground is not stated; a vehicle needs the ground that it stands on");
    }
    Chassis chassis =
        new Chassis(
            reader.number("mass_kg"),
            reader.number("front_share"),
            reader.number("wheelbase_m"),
            reader.number("cg_height_m"),
            reader.number("hitch_height_m"),
            reader.number("overhang_m"));
    Drive drive = Drive.of(request.mode());
    double rise = stand.lineRiseRad();
    double slope = stand.uphillRad();
    Traction low = Traction.of(chassis, drive, ground.tyreLow(), ground.rolling(), rise, slope);
    Traction high = Traction.of(chassis, drive, ground.tyreHigh(), 0, rise, slope);
    Traction hold = Traction.of(chassis, Drive.LOCKED, ground.tyreLow(), 0, rise, slope);
    return PullOffer.giving(
            low.tensionN(),
            high.tensionN()
                + surgeN(
                    chassis.massKg(), request.pull().pathStiffness(), request.pull().travelRatio()),
            low.limit())
        .holds(hold.tensionN(), true)
        .powered(true)
        .overrun(OVERRUN_M)
        .people(Standing.one("drives", "maneja el vehículo"))
        .parts(List.of(towPoint(reader.number("tow_point_N"), reader.number("tow_point_factor"))))
        .checks(checks(request))
        .notes(notes(request, chassis, low))
        .done();
  }

  /**
   * Tension that the moving mass adds when the line stops it: v sqrt(m K), K = 2 K_p / i².
   *
   * @param massKg m [kg]
   * @param pathStiffness K_p, line and stem, seen at the tree [N/m]
   * @param travelRatio i, travel of the vehicle for line taken in at the tree
   */
  static double surgeN(double massKg, double pathStiffness, double travelRatio) {
    double stiffness = STIFFER * pathStiffness / (travelRatio * travelRatio);
    return CREEP_MPS * Math.sqrt(massKg * stiffness);
  }

  private static Part towPoint(double ratedN, double factor) {
    return new Part("tow point", ratedN * factor, factor, LAST_FACTOR, 1, 1);
  }

  private static double runOutAskedM(PullRequest request) {
    return request.pull().lineInM() + RUN_OUT_SPARE_M;
  }

  private static List<Finding> checks(PullRequest request) {
    List<Finding> checks = new ArrayList<>();
    if (request.stand().runOutM() != null) {
      double asked = runOutAskedM(request);
      double there = request.stand().runOutM();
      checks.add(
          new Finding(
              "run-out",
              there,
              asked,
              "m",
              Math.min(MOST_RATIO, there / asked),
              String.format(
                  Locale.ROOT,
                  "%.1f m clear ahead of the vehicle, %.1f m asked: its travel and %.0f m.",
                  there,
                  asked,
                  RUN_OUT_SPARE_M)));
    }
    if (request.stand().offHeadingRad() != null) {
      double off = Math.toDegrees(request.stand().offHeadingRad());
      checks.add(
          new Finding(
              "heading",
              off,
              OFF_HEADING_DEG,
              "deg",
              off > OFF_HEADING_DEG / MOST_RATIO ? OFF_HEADING_DEG / off : MOST_RATIO,
              String.format(
                  Locale.ROOT,
                  "The line is %.0f degrees off the vehicle's heading; at most %.0f.",
                  off,
                  OFF_HEADING_DEG)));
    }
    return checks;
  }

  private static List<String> notes(PullRequest request, Chassis chassis, Traction low) {
    List<String> notes = new ArrayList<>();
    notes.add(
        "Creep steadily with the line tight already; a run-up is outside this reckoning and"
            + " forbidden.");
    notes.add("Engine and gearing are not checked; the wheels' grip alone is.");
    if (low.frontN() < FRONT_SHARE_TO_STEER * chassis.frontLevelN()) {
      notes.add("The pull leaves the front axle too light to steer.");
    }
    if (request.stand().runOutM() == null) {
      notes.add(
          String.format(
              Locale.ROOT,
              "The clear way ahead is not stated; this pull asks for %.1f m.",
              runOutAskedM(request)));
    }
    return notes;
  }
}
