package org.fallwright.plugins.winch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.fallwright.core.line.WireBend;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.reference.Surface;
import org.fallwright.core.reference.SurfaceTable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class WinchTest {
  private final Winch winch = new Winch();

  @Test
  void aHandWinchGivesItsRatedPullAndItsPinTheHigh() {
    PullOffer offer = winch.offer(request(throughRope(), 2.86, 1));
    assertThat(offer.lowN()).isEqualTo(9800);
    assertThat(offer.holdN()).isEqualTo(9800);
    assertThat(offer.highN()).isCloseTo(14_700 * 1.2, within(1e-9));
    assertThat(offer.captured()).isTrue();
    assertThat(offer.powered()).isFalse();
    assertThat(offer.wireM()).isEqualTo(20);
    assertThat(offer.overrunM()).isEqualTo(0.06);
    assertThat(offer.anchorHauling()).isEqualTo(1);
    assertThat(offer.anchorHolding()).isEqualTo(1);
    assertThat(offer.parts()).isEmpty();
  }

  @Test
  void tellsTheStrokesForTheTakeUpAtItsOwnLineEnd() {
    assertThat(winch.offer(request(throughRope(), 2.86, 1)).notes())
        .contains("About 48 strokes of 60 mm (2.4 in) take in 2.86 m (9 ft 5 in).");
    assertThat(winch.offer(request(throughRope(), 2.86, 3)).notes())
        .contains("About 143 strokes of 60 mm (2.4 in) take in 8.58 m (28 ft 2 in).");
  }

  @ParameterizedTest
  @ValueSource(booleans = {true, false})
  void withoutAnOverloadDeviceItStallsAtABareDrumAndAQuarter(boolean asNull) {
    ObjectNode unstated = throughRope();
    if (asNull) {
      unstated.putNull("overload_N");
    } else {
      unstated.remove("overload_N");
    }
    PullOffer offer = winch.offer(request(unstated, 1, 1));
    assertThat(offer.highN()).isCloseTo(9800 * 1.25 * 1.2, within(1e-9));
    assertThat(offer.notes()).anyMatch(n -> n.startsWith("No overload device is stated"));
  }

  @Test
  void aFullDrumPullsAndHoldsLessAndRunsOnFurther() {
    PullOffer offer = winch.offer(request(poweredDrum(), 1, 1));
    assertThat(offer.lowN()).isCloseTo(24_347.8, within(0.1));
    assertThat(offer.holdN()).isEqualTo(offer.lowN());
    assertThat(offer.highN()).isCloseTo(40_000 * 1.25 * 1.2, within(1e-6));
    assertThat(offer.powered()).isTrue();
    assertThat(offer.overrunM()).isCloseTo(1.5 * 0.05 * 92 / 56, within(1e-9));
    assertThat(offer.limit().what().english())
        .isEqualTo("rated pull of the winch on layer 4 of its drum");
    assertThat(offer.notes()).contains("Keep at least 5 wraps of wire on the drum.");
  }

  @Test
  void aHandDrumHasStrokesAndLayers() {
    ObjectNode drum = poweredDrum().put("kind", "hand-drum").put("stroke_m", 0.2);
    drum.remove("line_speed_mps");
    PullOffer offer = winch.offer(request(drum, 1, 1));
    assertThat(offer.powered()).isFalse();
    assertThat(offer.overrunM()).isCloseTo(0.2 * 92 / 56, within(1e-12));
    assertThat(offer.lowN()).isCloseTo(24_347.8, within(0.1));
  }

  @Test
  void eachKindRefusesWhatItDoesNotHave() {
    refuses(
        throughRope().put("layer", 3),
        "layer is 3; it must be left out where kind is \"hand-through-rope\"");
    refuses(
        throughRope().put("line_speed_mps", 0.1),
        "line_speed_mps is 0.1; it must be left out where kind is \"hand-through-rope\"");
    refuses(
        poweredDrum().put("stroke_m", 0.1),
        "stroke_m is 0.1; it must be left out where kind is \"powered-drum\"");
  }

  @Test
  void eachKindNeedsWhatItHas() {
    ObjectNode noStroke = throughRope();
    noStroke.remove("stroke_m");
    refuses(noStroke, "stroke_m is missing; it must be a number from 0.001 to 1 m");
    ObjectNode noDrum = poweredDrum();
    noDrum.remove("drum_m");
    refuses(noDrum, "drum_m is missing; it must be a number from 0.02 to 1 m");
  }

  @Test
  void anOverloadDeviceBelowTheRatedPullIsRefused() {
    refuses(
        throughRope().put("overload_N", 9000),
        "overload_N is 9000.0 N; it must be at least rated_N, 9800.0 N");
  }

  @Test
  void knowsOneMode() {
    assertThat(winch.modes(throughRope())).containsExactly("pull");
    PullRequest other =
        new PullRequest(
            throughRope(),
            "push",
            new PullRequest.Stand(null, 0, 0, null, 1, 30, null),
            new PullRequest.Pull(0, 1, 1, null),
            null,
            null);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> winch.offer(other))
        .withMessage("mode is \"push\"; it must be \"pull\" for a winch");
  }

  @Test
  void ratedOnAFullDrumItGivesThatThereAndMoreOnTheBareDrum() {
    PullOffer offer = winch.offer(request(poweredDrum().put("rated_on", "full-drum"), 1, 1));
    assertThat(offer.lowN()).isCloseTo(40_000, within(1e-6));
    assertThat(offer.highN()).isCloseTo(40_000 * 92 / 56.0 * 1.25 * 1.2, within(1e-6));
  }

  /** Width for 10 turns: 3.52, 4.27, 5.03 and 5.78 m on the first four layers. */
  @ParameterizedTest
  @CsvSource({"0, 4, 24347.8", "8, 3, 28000", "12, 2, 32941.2"})
  void layersFollowFromTheWireOnTheDrum(double out, int layer, double low) {
    ObjectNode drum = poweredDrum().put("wire_m", 18).put("barrel_width_m", 0.12);
    drum.remove("layer");
    drum.put("wire_out_m", out);
    PullOffer offer = winch.offer(request(drum, 1, 1));
    assertThat(offer.lowN()).isCloseTo(low, within(0.1));
    assertThat(offer.limit().what().english()).endsWith("on layer " + layer + " of its drum");
  }

  @Test
  void noMoreWireCanBeOutThanTheWayToTheTree() {
    ObjectNode drum =
        poweredDrum().put("wire_m", 18).put("barrel_width_m", 0.12).put("wire_out_m", 12);
    drum.remove("layer");
    PullRequest near =
        new PullRequest(
            drum,
            "pull",
            new PullRequest.Stand(null, 0.2, 0, null, 1, 9, null),
            new PullRequest.Pull(20_000, 1, 1, null),
            null,
            null);
    assertThat(winch.offer(near).lowN()).as("8 of 18 m out").isCloseTo(28_000, within(0.1));
  }

  /** The same at whatever layer, though a barer drum would pull more. */
  @Test
  void ratedOnAnyLayerItNeverCountsOnMore() {
    ObjectNode drum =
        poweredDrum()
            .put("wire_m", 18)
            .put("barrel_width_m", 0.12)
            .put("rated_on", "any-layer")
            .put("wire_out_m", 12);
    drum.remove("layer");
    assertThat(winch.offer(request(drum, 1, 1)).lowN()).isEqualTo(40_000);
    assertThat(winch.offer(request(drum.put("rated_on", "full-drum"), 1, 1)).lowN())
        .isCloseTo(40_000.0 * 92 / 68, within(1e-6));
  }

  @Test
  void wrapsThatStayAreNoWireToPayOut() {
    PullOffer offer = winch.offer(request(poweredDrum(), 1, 1));
    assertThat(offer.wireM()).isCloseTo(60 - 5 * Math.PI * 0.112, within(1e-9));
    assertThat(offer.travel().mostM()).isEqualTo(offer.wireM());
    refuses(
        poweredDrum().put("wire_m", 1.5),
        "wire_m is 1.5 m; it must be more than the 5 wraps that stay on, 1.76 m");
  }

  @Test
  void aDrumSaysItsLayersOneWay() {
    ObjectNode none = poweredDrum();
    none.remove("layer");
    refuses(
        none,
        "layer is missing; it must be a whole number from 1 to 20, or barrel_width_m be stated");
    refuses(
        poweredDrum().put("barrel_width_m", 0.2),
        "layer is 4; it must be left out where barrel_width_m is stated");
    refuses(
        poweredDrum().put("wire_out_m", 5),
        "wire_out_m is 5.0 m; it must be left out where barrel_width_m is not stated");
    refuses(
        poweredDrum().put("rope_m", 0.06).put("drum_m", 0.05),
        "rope_m is 0.06 m; it must be at most drum_m, 0.05 m");
    none.put("barrel_width_m", 0.02).put("wire_m", 400);
    refuses(none, "wire_m is 400.0 m, which makes 99 layers on this drum; it must make at most 20");
  }

  /** Lever 0.7 m through 60 degrees, 60 mm a stroke, 0.7: 8.55 times the hand. */
  @Test
  void aHandThatIsTooWeakIsTheLimit() {
    ObjectNode lever = throughRope().put("lever_m", 0.7).put("swing_deg", 60);
    PullOffer offer = winch.offer(request(lever, 1, 1));
    assertThat(offer.lowN()).isCloseTo(550 * 0.7 * Math.PI / 3 / 0.06 * 0.7, within(1e-6));
    assertThat(offer.limit().what().english()).isEqualTo("what a person gives at the lever");
    assertThat(offer.holdN()).as("its grip holds all the same").isEqualTo(9800);
    assertThat(offer.highN()).as("and its pin gives way no sooner").isEqualTo(14_700 * 1.2);
  }

  @Test
  void aPlateMayStateTheHandForce() {
    PullOffer easy = winch.offer(request(throughRope().put("hand_N", 400), 1, 1));
    assertThat(easy.lowN()).isEqualTo(9800);
    assertThat(easy.notes())
        .contains(
            "At the pull that is planned the hand presses with about 0.245 kN (55.1 lbf); more than 0.225 kN (50.5 lbf) nobody"
                + " keeps up: take turns.");
    PullOffer hard = winch.offer(request(throughRope().put("hand_N", 700), 1, 1));
    assertThat(hard.lowN()).isCloseTo(9800 * 550 / 700.0, within(1e-9));
    refuses(
        throughRope().put("hand_N", 400).put("lever_m", 0.7),
        "hand_N is 400.0 N and lever_m is 0.7 m; only one of the two may be stated");
  }

  @Test
  void anOverloadDeviceNearTheRatingMayLetGoEarlier() {
    PullOffer offer = winch.offer(request(throughRope().put("overload_N", 10_000), 1, 1));
    assertThat(offer.lowN()).isEqualTo(9000);
    assertThat(offer.holdN()).isEqualTo(9000);
    assertThat(offer.limit().what().english()).isEqualTo("overload device of the winch");
  }

  @Test
  void aBrakeMayHoldLessOrMoreThanTheRating() {
    assertThat(winch.offer(request(throughRope().put("brake_N", 7000), 1, 1)).holdN())
        .isEqualTo(7000);
    PullOffer drum = winch.offer(request(poweredDrum().put("brake_N", 60_000), 1, 1));
    assertThat(drum.holdN()).isCloseTo(60_000 * 56 / 92.0, within(1e-6));
  }

  @Test
  void itsOwnWireIsAPart() {
    ObjectNode wired = poweredDrum().put("wire_breaking_N", 100_000).put("wire_termination", 0.8);
    PullOffer.Part wire = winch.offer(request(wired, 1, 1)).parts().get(0);
    double bend = WireBend.keeps(0.1 / 0.012);
    assertThat(wire.name()).isEqualTo("winch wire");
    assertThat(wire.strengthN()).isCloseTo(80_000 * bend, within(1e-6));
    assertThat(wire.designFactor()).isEqualTo(3);
    ObjectNode noEnd = wired.deepCopy();
    noEnd.remove("wire_termination");
    refuses(noEnd, "wire_termination is missing; it must be a number from 0.1 to 1");
  }

  /** HMPE on metal 0.05, 3 turns: e^(0.05 · 6 pi) = 2.566 times the tail. */
  @Test
  void aCapstanSlipsAndHoldsByAConstantForce() {
    PullOffer offer = winch.offer(request(capstan(), 1, 1));
    assertThat(offer.lowN()).isCloseTo(100 * Math.exp(0.3 * Math.PI), within(1e-9));
    assertThat(offer.holdN()).isEqualTo(offer.lowN());
    assertThat(offer.captured()).isFalse();
    assertThat(offer.wireM()).isZero();
    assertThat(offer.travel().mostM()).isNull();
    assertThat(offer.limit().what().english()).isEqualTo("grip of the line on the capstan");
    assertThat(offer.highN()).as("turns may ride and jam").isEqualTo(10_000 * 1.25 * 1.2);
    PullOffer many = winch.offer(request(capstan().put("turns", 10).put("tail_N", 200), 1, 1));
    assertThat(many.lowN()).isCloseTo(200 * Math.exp(Math.PI), within(1e-6));
    PullOffer dry =
        winch.offer(request(capstan().put("contact", "wire-dry").put("turns", 8), 1, 1));
    assertThat(dry.lowN()).as("its motor limits it").isEqualTo(10_000);
  }

  @Test
  void aRopeGrabHoldsForACapstan() {
    PullOffer offer =
        winch.offer(request(capstan().put("grab_N", 4000).put("grab_factor", 4), 1, 1));
    assertThat(offer.captured()).isTrue();
    assertThat(offer.holdN()).isEqualTo(4000);
    assertThat(offer.parts()).singleElement().extracting("strengthN").isEqualTo(16_000.0);
  }

  /** 2,000 kg on wet grass, 0.20: 3.92 kN on the level with a level line. */
  @Test
  void onASpotItsMachineMaySlide() {
    Surface grass = SurfaceTable.of("grass", true);
    PullRequest spot =
        new PullRequest(
            poweredDrum().put("machine_kg", 2000),
            "pull",
            new PullRequest.Stand(grass, 0, 0, Math.toRadians(170), 0.5, 30, null),
            new PullRequest.Pull(20_000, 1, 1, null),
            null,
            null);
    PullOffer offer = winch.offer(spot);
    assertThat(offer.lowN()).isCloseTo(2000 * 9.80665 * grass.tyreLow(), within(1e-6));
    assertThat(offer.holdN()).isEqualTo(offer.lowN());
    assertThat(offer.captured()).isTrue();
    assertThat(offer.anchorHauling()).isZero();
    assertThat(offer.limit().what().english()).isEqualTo("machine slides on its locked wheels");
    assertThat(offer.highN()).as("a bank or chock may hold it").isCloseTo(60_000, within(1e-6));
    assertThat(offer.checks()).singleElement().extracting("id").isEqualTo("heading");
    assertThat(offer.checks().get(0).value()).isCloseTo(10, within(1e-9));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> winch.offer(spot.with(poweredDrum())))
        .withMessage(
            "machine_kg is missing; it must be a number from 200 to 60000 kg where the winch stands"
                + " on a spot");
  }

  @Test
  void aRemoteControlTakesThePersonAway() {
    assertThat(winch.offer(request(poweredDrum(), 1, 1)).operators()).isEqualTo(1);
    assertThat(winch.offer(request(poweredDrum().put("remote", true), 1, 1)).operators()).isZero();
  }

  @Test
  void tellsHowLongAHaulTakes() {
    assertThat(winch.offer(request(poweredDrum(), 2.86, 1)).notes())
        .contains("It takes in 2.86 m (9 ft 5 in) in about 58 s.");
  }

  @Test
  void isListedAsAnExtension() throws IOException {
    assertThat(Files.readString(Path.of("target/classes/META-INF/extensions.idx")))
        .contains(Winch.class.getName());
  }

  private void refuses(ObjectNode parameters, String sentence) {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> winch.modes(parameters))
        .withMessage(sentence);
  }

  private static PullRequest request(ObjectNode parameters, double takeUp, double travel) {
    return new PullRequest(
        parameters,
        "pull",
        new PullRequest.Stand(null, 0.2, 0, null, 1, 30, null),
        new PullRequest.Pull(20_000, travel, takeUp, 6000.0),
        null,
        null);
  }

  private static ObjectNode throughRope() {
    return JsonNodeFactory.instance
        .objectNode()
        .put("kind", "hand-through-rope")
        .put("rated_N", 9800)
        .put("overload_N", 14_700)
        .put("wire_m", 20)
        .put("stroke_m", 0.06);
  }

  private static ObjectNode poweredDrum() {
    return JsonNodeFactory.instance
        .objectNode()
        .put("kind", "powered-drum")
        .put("rated_N", 40_000)
        .put("wire_m", 60)
        .put("drum_m", 0.1)
        .put("rope_m", 0.012)
        .put("layer", 4)
        .put("line_speed_mps", 0.05);
  }

  private static ObjectNode capstan() {
    return JsonNodeFactory.instance
        .objectNode()
        .put("kind", "capstan")
        .put("rated_N", 10_000)
        .put("line_speed_mps", 0.2)
        .put("contact", "hmpe-metal")
        .put("turns", 3)
        .put("tail_N", 100);
  }
}
