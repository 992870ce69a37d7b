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
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Finding;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.reference.Surface;
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
    assertThat(offer.holdN()).isEqualTo(offer.lowN());
  }

  @Test
  void twoWheelDriveGivesUnderHalfAndHoldsLikeFour() {
    PullOffer rear = vehicle.offer(request("rwd").riseDeg(11.28).build());
    PullOffer all = vehicle.offer(request("awd").riseDeg(11.28).build());
    assertThat(rear.lowN()).isBetween(0.4 * all.lowN(), 0.45 * all.lowN());
    assertThat(rear.limit().what().english()).isEqualTo("grip of the rear axle");
    assertThat(rear.holdN()).isEqualTo(all.lowN());
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
    assertThat(Vehicle.surgeN(2500, 28_000, 1)).isCloseTo(5916, within(1.0));
    assertThat(Vehicle.surgeN(2500, 28_000, 4))
        .isCloseTo(Vehicle.surgeN(2500, 28_000, 1) / 4, within(1e-9));
    assertThat(Vehicle.surgeN(2500, 0, 1)).isZero();
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
        .anyMatch(n -> n.equals("The clear way ahead is not stated; this pull asks for 10.4 m."));
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
        .withMessage("mode is \"fwd\"; the vehicle's drives are [rwd, awd]");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> vehicle.modes(parameters().put("mass_kg", 2)))
        .withMessage("mass_kg is 2 kg; it must be from 300 to 60000 kg");
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
