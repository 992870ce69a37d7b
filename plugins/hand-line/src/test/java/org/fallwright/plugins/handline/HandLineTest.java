package org.fallwright.plugins.handline;

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
import org.fallwright.core.reference.Surface;
import org.junit.jupiter.api.Test;

class HandLineTest {
  private static final Surface WET =
      new Surface("grass", true, "wet grass", 0.2, 0.35, 0.07, 0.25, 0.55, 110, 310);
  private static final Surface DRY =
      new Surface("grass", false, "dry grass", 0.35, 0.45, 0.07, 0.5, 0.6, 200, 310);

  private final HandLine handLine = new HandLine();

  @Test
  void fourOnWetGrassGiveAThirdOfAKilonewton() {
    PullOffer offer = handLine.offer(request(WET, 4, 0.1, 10, false));
    assertThat(offer.lowN()).isCloseTo(4 * 0.79 * 110, within(1e-9));
    assertThat(offer.limit().what().english()).isEqualTo("strength of a person");
    assertThat(offer.operators()).isEqualTo(4);
    assertThat(offer.powered()).isFalse();
  }

  @Test
  void theHighIsTheStrongestPullOfEachWithAnAllowanceForJerks() {
    PullOffer offer = handLine.offer(request(WET, 4, 0.1, 10, false));
    assertThat(offer.highN()).isCloseTo(1.5 * 4 * 310, within(1e-9));
  }

  @Test
  void theHighDoesNotDependOnTheLeanEntered() {
    ObjectNode upright = parameters(4, 0.1, false).put("lean_back_deg", 2);
    PullOffer offer = handLine.offer(request(DRY, upright, 0));
    assertThat(offer.limit().what().english()).isEqualTo("body tips forward");
    assertThat(offer.highN()).isCloseTo(1.5 * 4 * 310, within(1e-9));
  }

  @Test
  void onIceBootsDecideAndTheCrewStillDoesNotPullMoreThanTheySlip() {
    Surface ice = new Surface("ice", false, "ice", 0.1, 0.15, 0.01, 0.05, 0.1, 110, 110);
    PullOffer offer = handLine.offer(request(ice, 1, 0.1, 20, false));
    assertThat(offer.limit().what().english()).isEqualTo("boots slip");
    assertThat(offer.lowN()).isLessThan(50);
    assertThat(offer.highN()).isCloseTo(1.5 * 82 / 80 * 80.6, within(0.1));
  }

  @Test
  void handsAheadOfTheFeetBringNoCreditAndHandsBehindCount() {
    double at = tipping(0, 20);
    assertThat(tipping(0.3, 20)).isEqualTo(at);
    assertThat(tipping(-0.3, 20)).isLessThan(at);
  }

  @Test
  void withoutADeviceItIsFreeHandAndGivesConstantForce() {
    PullOffer free = handLine.offer(request(WET, 4, 0.1, 10, false));
    assertThat(free.captured()).isFalse();
    assertThat(free.holdN()).isEqualTo(free.lowN());
    assertThat(free.notes()).anyMatch(n -> n.contains("free-hand"));
    PullOffer held = handLine.offer(request(WET, 4, 0.1, 10, true));
    assertThat(held.captured()).isTrue();
    assertThat(held.holdN()).isEqualTo(held.lowN());
    assertThat(held.notes()).noneMatch(n -> n.contains("free-hand"));
  }

  @Test
  void groundThatFallsToTheTreeCostsPull() {
    ObjectNode one = parameters(1, 0, false);
    double uphill = handLine.offer(request(WET, one, Math.toRadians(8))).lowN();
    double level = handLine.offer(request(WET, one, 0)).lowN();
    assertThat(uphill).isLessThan(level);
  }

  @Test
  void needsGroundAndKnowsOneMode() {
    assertThat(handLine.modes(parameters(1, 0, true))).containsExactly("pull");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> handLine.offer(request(null, 4, 0.1, 10, false)))
        .withMessageContaining("ground is not stated");
  }

  @Test
  void refusesParametersOutOfRange() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> handLine.modes(parameters(21, 0, true)))
        .withMessage("people is 21; it must be from 1 to 20");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> handLine.modes(parameters(2, 0, true).put("shoes", 1)))
        .withMessageStartingWith("shoes is not a parameter of the hand line");
  }

  @Test
  void isListedAsAnExtension() throws IOException {
    assertThat(Files.readString(Path.of("target/classes/META-INF/extensions.idx")))
        .contains(HandLine.class.getName());
  }

  private double tipping(double handAhead, double riseDeg) {
    ObjectNode lazy = parameters(1, handAhead, false).put("lean_back_deg", 3);
    PullOffer offer = handLine.offer(request(DRY, lazy, Math.toRadians(riseDeg), 0));
    assertThat(offer.limit().what().english()).isEqualTo("body tips forward");
    return offer.lowN();
  }

  private static PullRequest request(
      Surface ground, int people, double handAhead, double riseDeg, boolean captured) {
    return request(ground, parameters(people, handAhead, captured), Math.toRadians(riseDeg), 0);
  }

  private static PullRequest request(Surface ground, ObjectNode parameters, double uphillRad) {
    return request(ground, parameters, 0, uphillRad);
  }

  private static PullRequest request(
      Surface ground, ObjectNode parameters, double riseRad, double uphillRad) {
    return new PullRequest(
        parameters,
        "pull",
        new PullRequest.Stand(ground, riseRad, uphillRad, null, 1, 30, null),
        new PullRequest.Pull(20_000, 1, 3, null),
        null,
        null);
  }

  private static ObjectNode parameters(int people, double handAhead, boolean captured) {
    return JsonNodeFactory.instance
        .objectNode()
        .put("people", people)
        .put("person_mass_kg", 82)
        .put("stature_m", 1.75)
        .put("lean_back_deg", 20)
        .put("hand_height_m", 1.0)
        .put("hand_ahead_m", handAhead)
        .put("captured", captured);
  }
}
