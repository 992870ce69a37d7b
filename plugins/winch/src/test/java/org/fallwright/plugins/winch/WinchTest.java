package org.fallwright.plugins.winch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
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
        .contains("About 48 strokes of 60 mm take in 2.86 m.");
    assertThat(winch.offer(request(throughRope(), 2.86, 3)).notes())
        .contains("About 143 strokes of 60 mm take in 8.58 m.");
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
    assertThat(offer.overrunM()).isEqualTo(0.2);
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
        new PullRequest.Pull(20_000, travel, takeUp, null),
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
}
