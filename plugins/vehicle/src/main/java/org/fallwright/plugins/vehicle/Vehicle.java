package org.fallwright.plugins.vehicle;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Comparator;
import java.util.List;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.pull.PullOffer.Standing;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Surface;
import org.fallwright.plugins.api.ParameterReader;
import org.fallwright.plugins.api.PullSourceExtension;
import org.pf4j.Extension;

/**
 * A vehicle that creeps away from the tree with the line on its rear tow point.
 *
 * <p>Low: the grip of the driven axles on the low figure of the ground, or the traction equation
 * for field tyres on soil; of a class's stand-ins the light end and whichever axle share is worse.
 * High, for the parts: the high figure without rolling resistance, differentials locked, at the
 * heavy end, and on top what the moving mass brings when the line stops it, v sqrt(m K), v {@link
 * #CREEP_MPS}, K twice the path stiffness over the square of the travel ratio [N/m]. Holding: what
 * {@link Parked} says on the low figure.
 */
@Extension
public final class Vehicle implements PullSourceExtension {
  /** Creep speed at which the line may stop it [m/s]. Planning allowance. */
  private static final double CREEP_MPS = Allowances.SURGE_SPEED.value();

  /** A stiff line brings more than the mean stiffness says: this many times. Planning allowance. */
  private static final double STIFFER = Allowances.SURGE_STIFFNESS.value();

  /** Line that still comes in after "stop" [m]. Planning allowance. */
  private static final double OVERRUN_M = Allowances.OVERRUN_VEHICLE.value();

  /** Least factor on the tow point at the most the vehicle can do. Planning allowance. */
  private static final double LAST_FACTOR = Allowances.LAST_FACTOR.value();

  private static final SourceDescription DESCRIPTION = VehicleParameters.description();

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
    return VehicleFigures.hitchHeightM(new ParameterReader(DESCRIPTION, parameters));
  }

  @Override
  public PullOffer offer(PullRequest request) {
    ParameterReader reader = new ParameterReader(DESCRIPTION, request.parameters());
    Drive drive = Drive.of(request.modeAmong(reader.choices("drives")));
    PullRequest.Stand stand = request.stand();
    Surface ground = stand.ground();
    if (ground == null) {
      throw new IllegalArgumentException(
          "ground is not stated; it must be, for a vehicle pulls by what it stands on");
    }
    VehicleFigures figures = VehicleFigures.of(reader);
    Footing footing = Footing.of(reader, ground, drive);
    Parked parked =
        reader.isStated("parked_by") ? Parked.of(reader.choice("parked_by")) : Parked.ALL_WHEELS;
    double rise = stand.lineRiseRad();
    double slope = stand.uphillRad();

    Pull low =
        figures.pulling().stream()
            .map(c -> new Pull(c, footing.pulls(c, drive, rise, slope)))
            .min(Comparator.comparingDouble(p -> p.traction().tensionN()))
            .orElseThrow();
    double highN =
        figures.loading().stream()
            .mapToDouble(c -> footing.most(c, drive, rise, slope).tensionN())
            .max()
            .orElseThrow();
    Traction hold =
        figures.pulling().stream()
            .map(c -> parked.hold(c, footing.braked(), rise, slope))
            .min(Comparator.comparingDouble(Traction::tensionN))
            .orElseThrow();
    double heaviestKg = figures.loading().get(0).massKg();
    PullRequest.Pull pull = request.pull();
    Part towPoint = towPoint(reader.number("tow_point_N"), reader.number("tow_point_factor"));
    VehicleAdvice advice = new VehicleAdvice(request, figures, footing, parked, low, towPoint);
    return PullOffer.giving(
            low.traction().tensionN(),
            highN + surgeN(CREEP_MPS, heaviestKg, pull.pathStiffness(), pull.travelRatio()),
            low.traction().limit().at(low.traction().tensionN()))
        .holds(hold.tensionN(), true)
        .powered(true)
        .overrun(OVERRUN_M)
        .people(Standing.one("drives", "maneja el vehículo"))
        .parts(List.of(towPoint))
        .checks(advice.checks())
        .notes(advice.notes())
        .done();
  }

  /** A chassis and what it pulls. */
  record Pull(Chassis chassis, Traction traction) {}

  /**
   * Tension that the moving mass adds when the line stops it: v sqrt(m K), K = 2 K_p / i².
   *
   * @param speedMps v [m/s]
   * @param massKg m [kg]
   * @param pathStiffness K_p, line and stem, seen at the tree [N/m]
   * @param travelRatio i, travel of the vehicle for line taken in at the tree
   */
  static double surgeN(double speedMps, double massKg, double pathStiffness, double travelRatio) {
    double stiffness = STIFFER * pathStiffness / (travelRatio * travelRatio);
    return speedMps * Math.sqrt(massKg * stiffness);
  }

  private static Part towPoint(double ratedN, double factor) {
    return new Part("tow point", ratedN * factor, factor, LAST_FACTOR, 1, 1);
  }
}
