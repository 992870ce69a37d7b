package org.fallwright.plugins.vehicle;

import static java.lang.Math.toRadians;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Finding;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.reference.Surface;
import org.fallwright.core.reference.SurfaceTable;
import org.junit.jupiter.api.Test;

class VehicleTest {
  private static final Surface GRAVEL =
      new Surface("gravel", false, "compact gravel", 0.35, 0.6, 0.02, 0.5, 0.6, 200, 310);

  private final Vehicle vehicle = new Vehicle();

  /** Hand-worked: 24,517 N × 0.35 / (cos 11.28° + 0.35 sin 11.28°) on level ground. */
  @Test
  void aPickUpWithFourWheelDriveOnGravel() {
    PullOffer offer = vehicle.offer(request("awd").riseDeg(11.28).build());
    assertThat(offer.lowN()).isCloseTo(8179, within(2.0));
    assertThat(offer.limit().what().english()).isEqualTo("grip of all wheels");
    assertThat(offer.powered()).isTrue();
    assertThat(offer.captured()).isTrue();
    assertThat(offer.holdN()).isCloseTo(offer.lowN(), within(1e-6));
  }

  @Test
  void twoWheelDriveGivesUnderHalfAndHoldsLikeFour() {
    PullOffer rear = vehicle.offer(request("rwd").riseDeg(11.28).build());
    PullOffer all = vehicle.offer(request("awd").riseDeg(11.28).build());
    assertThat(rear.lowN()).isBetween(0.4 * all.lowN(), 0.45 * all.lowN());
    assertThat(rear.limit().what().english()).isEqualTo("grip of the rear axle");
    assertThat(rear.holdN()).isCloseTo(all.lowN(), within(1e-6));
  }

  @Test
  void theHighHasTheHighGripNoRollingAndTheSurge() {
    PullOffer offer = vehicle.offer(request("rwd").riseDeg(11.28).stiffness(28_000).build());
    Chassis pickUp = new Chassis(2500, 0.56, 3.5, 0.7, 0.55, 1.2);
    double grip = Traction.of(pickUp, Drive.RWD, 0.6, 0, toRadians(11.28), 0).tensionN();
    assertThat(offer.highN()).isCloseTo(grip + 0.5 * Math.sqrt(2500 * 56_000.0), within(1e-6));
  }

  @Test
  void aTackleSoftensTheSurgeByItsTravel() {
    assertThat(Vehicle.surgeN(0.5, 2500, 28_000, 1)).isCloseTo(5916, within(1.0));
    assertThat(Vehicle.surgeN(0.5, 2500, 28_000, 4))
        .isCloseTo(Vehicle.surgeN(0.5, 2500, 28_000, 1) / 4, within(1e-9));
    assertThat(Vehicle.surgeN(0.5, 2500, 0, 1)).isZero();
  }

  @Test
  void onTooSteepAGroundItPullsNothing() {
    PullOffer offer = vehicle.offer(request("awd").uphillDeg(25).build());
    assertThat(offer.lowN()).isZero();
    assertThat(offer.holdN()).isZero();
  }

  @Test
  void aHighTowPointLiftsTheFront() {
    ObjectNode tall = parameters().put("hitch_height_m", 2).put("front_share", 0.25);
    PullOffer offer = vehicle.offer(request("awd").with(tall).grip(0.9).build());
    assertThat(offer.limit().what().english()).isEqualTo("axle lift");
    assertThat(offer.notes()).anyMatch(n -> n.contains("too light to steer"));
    assertThat(vehicle.offer(request("awd").build()).notes())
        .noneMatch(n -> n.contains("too light to steer"));
  }

  @Test
  void asksForItsTravelAndTwoMetres() {
    PullOffer offer = vehicle.offer(request("awd").takeUp(2.8).travel(3).runOut(12.0).build());
    Finding runOut = finding(offer, "run-out");
    assertThat(runOut.limit()).isCloseTo(10.4, within(1e-9));
    assertThat(runOut.ratio()).isCloseTo(12 / 10.4, within(1e-9));
    assertThat(vehicle.offer(request("awd").takeUp(2.8).travel(3).build()).notes())
        .anyMatch(n -> n.endsWith("not stated; this pull asks for 10.4 m (34 ft 1 in)."));
  }

  @Test
  void asksForALineNearItsHeading() {
    assertThat(heading(3).ratio()).isCloseTo(5, within(1e-9));
    assertThat(heading(30).ratio()).isCloseTo(0.5, within(1e-9));
    assertThat(heading(0).ratio()).isEqualTo(1e6);
    assertThat(heading(1e-9).ratio()).isEqualTo(1e6);
    assertThat(vehicle.offer(request("awd").build()).checks()).isEmpty();
  }

  @Test
  void itsTowPointIsAPart() {
    assertThat(vehicle.offer(request("awd").build()).parts())
        .containsExactly(new PullOffer.Part("tow point", 90_000, 3, 1.5, 1, 1));
  }

  @Test
  void modesAreTheDrivesInAFixedOrder() {
    assertThat(vehicle.modes(parameters())).containsExactly("rwd", "awd");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> vehicle.offer(request("fwd").build()))
        .withMessage("mode is \"fwd\"; it must be one of [rwd, awd]");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> vehicle.modes(parameters().put("mass_kg", 2)))
        .withMessage("mass_kg is 2 kg; it must be from 300 to 60000 kg");
  }

  /** Hand-worked: 24,517 N x (0.35 x 0.44 - 0.02 x 0.56) / (1 - 0.37 x 0.55/3.5) = 3,717 N. */
  @Test
  void theLimitIsSaidToWhoeverPays() {
    PullOffer rear = vehicle.offer(request("rwd").build());
    assertThat(rear.limit().why().english())
        .startsWith("The rear tyres let go at 3.71 kN (835 lbf); more engine changes nothing.");
    assertThat(rear.limit().why().spanish())
        .startsWith("Las llantas traseras patinan a los 3.71 kN (835 lbf);");
  }

  /** 1,400 and 1,100 kg weighed: the same as 2,500 kg with 56 % in front. */
  @Test
  void twoSlipsOfAWeighbridgeStandForMassAndShare() {
    ObjectNode weighed = parameters().put("front_axle_kg", 1400).put("rear_axle_kg", 1100);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> vehicle.offer(request("rwd").with(weighed).build()))
        .withMessage("mass_kg is 2500.0; it must be left out where axle loads are stated");
    weighed.remove(List.of("mass_kg", "front_share"));
    double asWeighed = vehicle.offer(request("rwd").with(weighed).riseDeg(11).build()).lowN();
    double asStated = vehicle.offer(request("rwd").riseDeg(11).build()).lowN();
    assertThat(asWeighed).isCloseTo(asStated, within(1e-6));
    weighed.remove("rear_axle_kg");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> vehicle.offer(request("rwd").with(weighed).build()))
        .withMessageStartingWith(
            "rear_axle_kg is missing; it must be a number from 50 to 40000 kg");
  }

  @Test
  void aClassFillsGapsOnTheSafeSideAndOwnFiguresComeFirst() {
    ObjectNode bare = parameters().put("class", "pick-up");
    bare.remove(
        List.of(
            "mass_kg",
            "front_share",
            "wheelbase_m",
            "cg_height_m",
            "hitch_height_m",
            "overhang_m"));
    PullOffer standIn = vehicle.offer(request("awd").with(bare).build());
    assertThat(standIn.lowN()).isCloseTo(0.35 * 1800 * 9.80665, within(1e-6));
    assertThat(standIn.highN()).isCloseTo(0.6 * 3200 * 9.80665, within(1e-6));
    assertThat(standIn.notes()).anyMatch(n -> n.contains("class pick-up stand in"));
    assertThat(vehicle.lineHeightM(bare)).isEqualTo(0.55);
    PullOffer own = vehicle.offer(request("awd").with(bare.put("mass_kg", 2500)).build());
    assertThat(own.lowN()).isCloseTo(0.35 * 2500 * 9.80665, within(1e-6));
    ObjectNode whole = parameters().put("class", "skidder");
    assertThat(vehicle.offer(request("awd").with(whole).build()).notes())
        .noneMatch(n -> n.contains("stand in"));
    ObjectNode nothing = parameters();
    nothing.remove("wheelbase_m");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> vehicle.offer(request("awd").with(nothing).build()))
        .withMessageStartingWith("wheelbase_m is missing; it must be a number from 1 to 8 m");
  }

  @Test
  void openDifferentialsLetTheWorstWheelSetThePull() {
    double all = vehicle.offer(request("awd").build()).lowN();
    ObjectNode open = parameters();
    open.putArray("locked").add("none");
    PullOffer shared = vehicle.offer(request("awd").with(open).build());
    assertThat(shared.lowN()).isLessThan(0.8 * all);
    assertThat(shared.limit().what().english()).contains("centre differential open");
    ObjectNode locked = parameters();
    locked.putArray("locked").add("front").add("centre").add("rear");
    assertThat(vehicle.offer(request("awd").with(locked).build()).lowN()).isEqualTo(all);
    ObjectNode shoulder = parameters().put("worse_side_grip", 0.2);
    assertThat(vehicle.offer(request("awd").with(shoulder).build()).lowN())
        .isCloseTo(all * 0.2 / 0.35, within(1e-6));
    ObjectNode both = parameters();
    both.putArray("locked").add("none").add("rear");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> vehicle.offer(request("awd").with(both).build()))
        .withMessageStartingWith("locked is [none, rear]; it must be \"none\" alone");
  }

  @Test
  void chainsLoadThePartsAndGiveNoPull() {
    PullOffer bare = vehicle.offer(request("awd").build());
    PullOffer chained =
        vehicle.offer(request("awd").with(parameters().put("tyres", "chains")).build());
    assertThat(chained.lowN()).isEqualTo(bare.lowN());
    assertThat(chained.highN()).isCloseTo(1.5 * bare.highN(), within(1e-6));
    PullOffer worn = vehicle.offer(request("awd").with(parameters().put("tyres", "worn")).build());
    assertThat(worn.lowN()).isCloseTo(0.8 * bare.lowN(), within(1e-6));
  }

  @Test
  void onItsParkingBrakeItHoldsByTheRearWheelsAlone() {
    ObjectNode brake = parameters().put("parked_by", "rear-brake");
    PullOffer offer = vehicle.offer(request("awd").with(brake).build());
    assertThat(offer.holdN()).isLessThan(0.5 * offer.lowN());
    assertThat(offer.notes()).anyMatch(n -> n.contains("rear wheels alone"));
    ObjectNode chocked = parameters().put("parked_by", "chocks");
    assertThat(vehicle.offer(request("awd").with(chocked).build()).holdN())
        .isCloseTo(0.35 * 2500 * 9.80665, within(1e-6));
  }

  /** On bare earth that was measured firm, field tyres pull more than the grip row says. */
  @Test
  void aTractorOnMeasuredSoilGoesByTheTractionEquation() {
    Surface earth = SurfaceTable.of("earth", false);
    ObjectNode tractor =
        parameters()
            .put("class", "tractor-two-wheel-drive")
            .put("traction_by", "cone-index")
            .put("tyre_width_m", 0.4)
            .put("tyre_diameter_m", 1.4);
    PullOffer usual = vehicle.offer(request("rwd").with(tractor).on(earth).build());
    PullOffer byGrip = vehicle.offer(request("rwd").on(earth).build());
    assertThat(usual.lowN()).isCloseTo(byGrip.lowN(), within(1e-3));
    assertThat(usual.notes()).anyMatch(n -> n.startsWith("The soil was not measured"));
    PullOffer firm =
        vehicle.offer(
            request("rwd").with(tractor.deepCopy().put("cone_index_kPa", 1500)).on(earth).build());
    assertThat(firm.lowN()).isGreaterThan(1.3 * byGrip.lowN());
    assertThat(firm.highN()).isGreaterThan(byGrip.highN());
    assertThatIllegalArgumentException()
        .isThrownBy(() -> vehicle.offer(request("awd").with(tractor).on(earth).build()))
        .withMessageStartingWith("front_tyre_width_m is missing; it must be a number");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> vehicle.modes(parameters().put("cone_index_kPa", 900)))
        .withMessage("cone_index_kPa is 900; it must be left out where traction_by is not stated");
  }

  @Test
  void saysWhatARunUpWouldDoAndWhenTheTowPointIsTheWeakest() {
    PullOffer offer = vehicle.offer(request("awd").stiffness(28_000).build());
    // 1.4 m/s x sqrt(2500 kg x 56,000 N/m) = 16.6 kN
    assertThat(offer.notes()).anyMatch(n -> n.contains("would put 16.6 kN (3,720 lbf) on it"));
    assertThat(offer.notes()).noneMatch(n -> n.contains("rated for"));
    ObjectNode weak = parameters().put("tow_point_N", 5000);
    assertThat(vehicle.offer(request("awd").with(weak).build()).notes())
        .anyMatch(n -> n.contains("more than the tow point is rated for"));
  }

  @Test
  void needsGround() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> vehicle.offer(request("awd").on(null).build()))
        .withMessageContaining("ground is not stated");
  }

  @Test
  void isListedAsAnExtension() throws IOException {
    assertThat(Files.readString(Path.of("target/classes/META-INF/extensions.idx")))
        .contains(Vehicle.class.getName());
  }

  private Finding heading(double offDeg) {
    return finding(vehicle.offer(request("awd").off(offDeg).build()), "heading");
  }

  private static Finding finding(PullOffer offer, String id) {
    return offer.checks().stream().filter(c -> c.id().equals(id)).findFirst().orElseThrow();
  }

  private static Asked request(String mode) {
    return new Asked(mode);
  }

  private static ObjectNode parameters() {
    ArrayNode drives = JsonNodeFactory.instance.arrayNode().add("awd").add("rwd");
    ObjectNode node =
        JsonNodeFactory.instance
            .objectNode()
            .put("mass_kg", 2500)
            .put("front_share", 0.56)
            .put("wheelbase_m", 3.5)
            .put("cg_height_m", 0.7)
            .put("hitch_height_m", 0.55)
            .put("overhang_m", 1.2)
            .put("tow_point_N", 30_000)
            .put("tow_point_factor", 3);
    node.set("drives", drives);
    return node;
  }

  private static final class Asked {
    private final String mode;
    private ObjectNode parameters = parameters();
    private Surface ground = GRAVEL;
    private double rise;
    private double uphill;
    private Double off;
    private double stiffness;
    private double travel = 1;
    private double takeUp = 1;
    private Double runOut;

    Asked(String mode) {
      this.mode = mode;
    }

    Asked with(ObjectNode node) {
      parameters = node;
      return this;
    }

    Asked on(Surface surface) {
      ground = surface;
      return this;
    }

    Asked grip(double grip) {
      return on(new Surface("x", false, "x", grip, grip, 0.02, 0.5, 0.6, 200, 310));
    }

    Asked riseDeg(double deg) {
      rise = toRadians(deg);
      return this;
    }

    Asked uphillDeg(double deg) {
      uphill = toRadians(deg);
      return this;
    }

    Asked off(double deg) {
      off = toRadians(deg);
      return this;
    }

    Asked stiffness(double newtonsAMetre) {
      stiffness = newtonsAMetre;
      return this;
    }

    Asked travel(double ratio) {
      travel = ratio;
      return this;
    }

    Asked takeUp(double metres) {
      takeUp = metres;
      return this;
    }

    Asked runOut(double metres) {
      runOut = metres;
      return this;
    }

    PullRequest build() {
      return new PullRequest(
          parameters,
          mode,
          new PullRequest.Stand(ground, rise, uphill, off, 0.5, 30, runOut),
          new PullRequest.Pull(stiffness, travel, takeUp, null),
          null,
          null);
    }
  }
}
