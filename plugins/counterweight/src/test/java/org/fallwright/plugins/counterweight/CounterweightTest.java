package org.fallwright.plugins.counterweight;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Random;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.junit.jupiter.api.Test;

class CounterweightTest {
  private static final long SEED = 20261201;

  private final Counterweight weight = new Counterweight();

  /** 300 kg within 5 %, block 0.9: 285 kg × 9.80665 × 0.9, and so on, by hand. */
  @Test
  void lowHoldAndHighOfAWeightWorkedByHand() {
    PullOffer offer = offer(parameters(300, 0.05, 0.9), 0);
    assertThat(offer.lowN()).isCloseTo(2515.4, within(0.1));
    assertThat(offer.holdN()).isCloseTo(2794.9, within(0.1));
    assertThat(offer.highN()).isCloseTo(6864.7, within(0.1));
    assertThat(offer.captured()).isFalse();
    assertThat(offer.operators()).isZero();
  }

  /** A level line and the weight at a right angle; a steep line from above takes load off. */
  @Test
  void theBlockBearsLineAndWeight() {
    assertThat(Counterweight.onBlock(0, 1)).isCloseTo(Math.sqrt(2), within(1e-12));
    assertThat(Counterweight.onBlock(Math.PI / 2, 1)).isCloseTo(0, within(1e-12));
    assertThat(Counterweight.onBlock(-Math.PI / 2, 1)).isCloseTo(2, within(1e-12));
    PullOffer offer = offer(parameters(300, 0.05, 0.9), 0);
    assertThat(offer.anchorHauling()).isCloseTo(1.4948, within(1e-4));
    assertThat(offer.parts().get(0).holding()).isEqualTo(offer.anchorHolding());
  }

  @Test
  void takesInNoMoreThanItsDropOrTheBlocksHeight() {
    assertThat(offer(parameters(300, 0.05, 0.9), 0).travel().mostM()).isEqualTo(3);
    assertThat(offer(parameters(300, 0.05, 0.9).put("drop_m", 20), 0).travel().mostM())
        .isEqualTo(5);
  }

  @Test
  void moreFrictionAndMoreDoubtNeverGiveMoreAndTheLowStaysBelowTheHigh() {
    Random random = new Random(SEED);
    for (int i = 0; i < 500; i++) {
      double mass = 5 + random.nextDouble() * 2000;
      double off = random.nextDouble() * 0.5;
      double passed = 0.5 + random.nextDouble() * 0.5;
      double rise = random.nextDouble() * 2 - 1;
      PullOffer offer = offer(parameters(mass, off, passed), rise);
      String seed = "seed " + SEED + ", case " + i;
      assertThat(offer.lowN()).as(seed).isLessThanOrEqualTo(offer.holdN());
      assertThat(offer.holdN()).as(seed).isLessThan(offer.highN());
      PullOffer rougher = offer(parameters(mass, off, passed * 0.99 + 0.005), rise);
      assertThat(rougher.lowN()).as(seed).isLessThanOrEqualTo(offer.lowN());
      PullOffer vaguer = offer(parameters(mass, off / 2, passed), rise);
      assertThat(vaguer.lowN()).as(seed).isGreaterThanOrEqualTo(offer.lowN());
      assertThat(vaguer.highN()).as(seed).isLessThanOrEqualTo(offer.highN());
    }
  }

  @Test
  void knowsOneMode() {
    assertThat(weight.modes(parameters(1, 0, 1))).containsExactly("hang");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> weight.offer(request(parameters(300, 0, 1), "swing", 0)))
        .withMessage("mode is \"swing\"; it must be one of [hang]");
  }

  @Test
  void isListedAsAnExtension() throws IOException {
    assertThat(Files.readString(Path.of("target/classes/META-INF/extensions.idx")))
        .contains(Counterweight.class.getName());
  }

  private PullOffer offer(ObjectNode parameters, double riseRad) {
    return weight.offer(request(parameters, "hang", riseRad));
  }

  private static PullRequest request(ObjectNode parameters, String mode, double riseRad) {
    return new PullRequest(
        parameters,
        mode,
        new PullRequest.Stand(null, riseRad, 0, null, 5, 25, null),
        new PullRequest.Pull(20_000, 1, 2, null),
        null,
        null);
  }

  private static ObjectNode parameters(double mass, double off, double passed) {
    return JsonNodeFactory.instance
        .objectNode()
        .put("mass_kg", mass)
        .put("mass_error_share", off)
        .put("efficiency", passed)
        .put("drop_m", 3)
        .put("block_rated_N", 20_000)
        .put("block_factor", 4);
  }
}
