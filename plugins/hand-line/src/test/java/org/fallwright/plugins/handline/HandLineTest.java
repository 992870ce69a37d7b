package org.fallwright.plugins.handline;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.tuple;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Where;
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
    assertThat(offer.limit().why().english())
        .startsWith("Their strength ends at 0.347 kN (78.1 lbf) together: better footing");
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
    PullOffer offer = handLine.offer(request(DRY, upright, 0, 0));
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
  void aRatedDeviceHoldsItsRatedLoadAndIsAPart() {
    ObjectNode rated =
        parameters(4, 0.1, true)
            .put("capture_by", "device")
            .put("capture_rated_N", 8000)
            .put("capture_factor", 3);
    PullOffer offer = handLine.offer(request(WET, rated, 0));
    assertThat(offer.holdN()).isEqualTo(8000);
    assertThat(offer.captured()).isTrue();
    assertThat(offer.parts())
        .containsExactly(new PullOffer.Part("what captures the line", 24_000, 3, 1.5, 0, 1));
    assertThat(offer.operators()).isEqualTo(4);
  }

  /** Two turns on bark: at least e^(0.2 x 4 pi) = 12.35 times 50 N, by one who does not pull. */
  @Test
  void turnsInAHandHoldASteadyForceAndTakeOnePersonOffTheLine() {
    ObjectNode turns =
        parameters(4, 0.1, true)
            .put("capture_by", "turns-in-hand")
            .put("turns_on", "rope-on-bark")
            .put("turns", 2);
    PullOffer offer = handLine.offer(request(WET, turns, 0));
    assertThat(offer.holdN()).isCloseTo(617.3, within(0.1));
    assertThat(offer.captured()).isFalse();
    assertThat(offer.lowN()).isCloseTo(3 * 0.86 * 110, within(1e-9));
    assertThat(offer.people())
        .extracting(PullOffer.Standing::where, PullOffer.Standing::count)
        .containsExactly(tuple(Where.BESIDE_LINE, 3), tuple(Where.AT_CAPTURE, 1));
    PullOffer alone = handLine.offer(request(WET, turns.deepCopy().put("people", 1), 0));
    assertThat(alone.lowN()).isZero();
    assertThat(alone.limit().what().english()).isEqualTo("nobody pulls");
    assertThat(alone.operators()).isEqualTo(1);
  }

  @Test
  void turnsTiedOffHoldWhatTheyGoRound() {
    ObjectNode tied =
        parameters(3, 0.1, true).put("capture_by", "turns-tied").put("capture_rated_N", 5000);
    PullOffer offer = handLine.offer(request(WET, tied, 0));
    assertThat(offer.captured()).isTrue();
    assertThat(offer.holdN()).isEqualTo(5000);
  }

  @Test
  void thinLinesRunThroughTheHands() {
    ObjectNode four = parameters(4, 0.1, false);
    PullOffer thick = handLine.offer(on(DRY, four, 0.016));
    PullOffer thin = handLine.offer(on(DRY, four, 0.008));
    assertThat(thick.limit().what().english()).isEqualTo("strength of a person");
    assertThat(thin.limit().what().english()).isEqualTo("hands slip on the line");
    assertThat(thin.limit().why().english()).contains("thicker line");
    assertThat(thin.lowN()).isCloseTo(4 * 0.79 * 435 * 8 / 22, within(1e-6));
    assertThat(thin.highN()).isEqualTo(thick.highN());
    PullOffer hauls =
        handLine.offer(request(DRY, four.deepCopy().put("line_diameter_m", 0.008), 0));
    assertThat(hauls.lowN()).isEqualTo(thin.lowN());
  }

  @Test
  void eachOfTheCrewCountsByHisOwnMass() {
    Surface ice = new Surface("ice", false, "ice", 0.1, 0.15, 0.01, 0.05, 0.1, 110, 110);
    ObjectNode mixed = parameters(2, 0.1, false).put("mass_2_kg", 60);
    PullOffer offer = handLine.offer(request(ice, mixed, 0));
    assertThat(offer.lowN()).isCloseTo(0.93 * 0.05 * 9.80665 * (82 + 60), within(1e-6));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> handLine.modes(parameters(2, 0.1, false).put("mass_3_kg", 60)))
        .withMessage("mass_3_kg is 60.0; it must be left out where people is 2");
  }

  @Test
  void whatIsNotStatedOfPeopleIsTakenOnTheSafeSideAndSaid() {
    Surface ice = new Surface("ice", false, "ice", 0.1, 0.15, 0.01, 0.05, 0.1, 110, 310);
    ObjectNode unknown = parameters(1, 0.1, false);
    unknown.remove(List.of("person_mass_kg", "stature_m"));
    PullOffer offer = handLine.offer(request(ice, unknown, 0));
    assertThat(offer.lowN()).isCloseTo(0.05 * 55 * 9.80665, within(1e-9));
    assertThat(offer.highN()).isCloseTo(1.5 * 0.1 * 130 * 9.80665, within(1e-9));
    assertThat(offer.notes()).anyMatch(n -> n.contains("not stated: a light, short adult"));
  }

  @Test
  void walkingCostsPullAndNeedsRoomUnlessTheLineIsHeldBetweenBites() {
    ObjectNode walks = parameters(4, 0.1, false).put("haul", "walking");
    PullOffer free = handLine.offer(request(DRY, walks, 2.5));
    assertThat(free.lowN()).isCloseTo(4 * 0.79 * 200 * 0.755, within(1e-9));
    assertThat(free.holdN()).isCloseTo(4 * 0.79 * 200, within(1e-9));
    assertThat(free.travel().mostM()).isCloseTo(1.5, within(1e-9));
    PullOffer held = handLine.offer(request(DRY, walks.deepCopy().put("captured", true), 2.5));
    assertThat(held.travel().mostM()).isNull();
    assertThat(held.notes())
        .contains(
            "The haul is 3.00 m (9 ft 10 in) and there are 2.50 m (8 ft 2 in) behind the crew: it walks back in several bites,"
                + " the line held between them.");
    PullOffer hands =
        handLine.offer(request(DRY, walks.deepCopy().put("haul", "hand-over-hand"), 2.5));
    assertThat(hands.lowN()).isCloseTo(4 * 0.79 * 147, within(1e-9));
    assertThat(hands.travel().mostM()).isNull();
    assertThat(handLine.offer(request(DRY, parameters(4, 0.1, false), 0)).notes())
        .contains(
            "Walking back, the crew needs 4.00 m (13 ft 1 in) clear behind it, which is not stated.");
  }

  @Test
  void refusesACaptureThatContradictsItself() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> handLine.modes(parameters(2, 0, false).put("capture_by", "device")))
        .withMessage("capture_by is \"device\"; it must be left out where captured is false");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> handLine.modes(parameters(2, 0, true).put("capture_by", "turns-in-hand")))
        .withMessageStartingWith("turns_on is missing; it must be one of");
  }

  @Test
  void groundThatFallsToTheTreeCostsPull() {
    ObjectNode one = parameters(1, 0, false);
    double uphill = handLine.offer(request(WET, one, 0, Math.toRadians(8))).lowN();
    double level = handLine.offer(request(WET, one, 0, 0)).lowN();
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

  /** On level ground, with room behind or, at 0, none stated; the line is not the crew's own. */
  private static PullRequest request(Surface ground, ObjectNode parameters, double roomM) {
    return request(ground, parameters, 0, 0, roomM == 0 ? null : Double.valueOf(roomM), null);
  }

  private static PullRequest request(
      Surface ground, ObjectNode parameters, double riseRad, double uphillRad) {
    return request(ground, parameters, riseRad, uphillRad, null, null);
  }

  private static PullRequest on(Surface ground, ObjectNode parameters, double diameterM) {
    return request(
        ground, parameters, 0, 0, null, new PullRequest.Line(false, diameterM, 5e4, 60, 40));
  }

  private static PullRequest request(
      Surface ground,
      ObjectNode parameters,
      double riseRad,
      double uphillRad,
      Double roomM,
      PullRequest.Line line) {
    return new PullRequest(
        parameters,
        "pull",
        new PullRequest.Stand(ground, riseRad, uphillRad, null, 1, 30, roomM),
        new PullRequest.Pull(20_000, 1, 3, null),
        line,
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
