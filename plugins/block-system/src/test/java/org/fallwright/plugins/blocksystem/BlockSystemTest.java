package org.fallwright.plugins.blocksystem;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Finding;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.Wording;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class BlockSystemTest {
  private static final Finding DRIVERS_CHECK = new Finding("run-out", 10, 8, "m", 1.25, "why");
  private static final Part DRIVERS_PART = new Part("tow point", 90_000, 3, 1.5, 1, 1);
  private static final PullOffer DRIVER =
      PullOffer.giving(
              3720,
              9270,
              new PullOffer.Limit(
                  new Wording("grip of the rear axle", "agarre del eje trasero"),
                  new Wording("It slips.", "Patina.")))
          .holds(8000, true)
          .powered(true)
          .overrun(0.5)
          .anchor(0, 0)
          .people(PullOffer.Standing.one("drives", "maneja"))
          .parts(List.of(DRIVERS_PART))
          .checks(List.of(DRIVERS_CHECK))
          .notes(List.of("Creep."))
          .done();

  private final BlockSystem blocks = new BlockSystem();

  /** A driver's low of 3.72 kN through double blocks of 0.92, haul from the fixed block. */
  @ParameterizedTest
  @CsvSource({"2, 6.57", "3, 9.46", "4, 12.1"})
  void theLowHasTheGainWithFriction(String parts, double kilonewtons) {
    assertThat(offer(parts, "fixed").lowN()).isCloseTo(kilonewtons * 1e3, within(50.0));
  }

  @Test
  void theHighAndTheHoldKnowNoFriction() {
    PullOffer three = offer("3", "fixed");
    assertThat(three.highN()).isCloseTo(27_810, within(1e-6));
    assertThat(three.holdN()).isCloseTo(24_000, within(1e-6));
  }

  @Test
  void whatTheDriverDoesGoesThroughTheSystem() {
    PullOffer four = offer("4", "fixed");
    assertThat(four.travel().ratio()).isEqualTo(4);
    assertThat(four.overrunM()).isEqualTo(0.125);
    assertThat(four.captured()).isTrue();
    assertThat(four.powered()).isTrue();
    assertThat(four.operators()).isEqualTo(1);
    assertThat(four.checks()).containsExactly(DRIVERS_CHECK);
    assertThat(four.notes()).contains("Creep.");
    assertThat(four.limit().what().english()).isEqualTo("grip of the rear axle, through 4:1");
    assertThat(four.notes().get(0)).startsWith("The haul end moves 11.2 m, 4 times the take-up");
  }

  @Test
  void partsAreLoadedPerNewtonAtTheLoad() {
    double gain = 0.92 + 0.92 * 0.92;
    List<Part> parts = offer("2", "fixed").parts();
    assertThat(parts)
        .extracting(Part::name)
        .containsExactly(
            "tackle block at the pull line",
            "tackle block at the anchor",
            "tackle line",
            "tow point");
    loaded(parts.get(0), 150_000, 5, 1, 1);
    loaded(parts.get(1), 150_000, 5, 1 + 1 / gain, 1.5);
    loaded(parts.get(2), 49_500, 5, 1 / gain, 0.5);
    loaded(parts.get(3), 90_000, 3, 1 / gain, 0.5);
  }

  /** Whatever the friction, the driver's high on its own part is what the driver says. */
  @Test
  void theDriversPartSeesTheDriversHigh() {
    PullOffer three = offer("3", "fixed");
    assertThat(three.highN() * three.parts().get(3).holding()).isCloseTo(9270, within(1e-6));
    assertThat(three.lowN() * three.parts().get(3).hauling()).isCloseTo(3720, within(1e-6));
  }

  @Test
  void theAnchorCarriesTheHaulTooUnlessItLeavesTheMovingBlock() {
    double gain = 1 + 0.92 + 0.92 * 0.92;
    PullOffer moving = offer("3", "moving");
    assertThat(moving.anchorHauling()).isCloseTo(1 - 1 / gain, within(1e-12));
    assertThat(moving.anchorHolding()).isCloseTo(2.0 / 3, within(1e-12));
    PullOffer fixed = offer("3", "fixed");
    assertThat(fixed.anchorHauling()).isCloseTo(1 + 1 / (0.92 * gain), within(1e-12));
    assertThat(fixed.anchorHolding()).isCloseTo(4.0 / 3, within(1e-12));
  }

  @Test
  void moreFrictionNeverDeliversMorePull() {
    double last = 0;
    for (double k = 0.3; k <= 1; k += 0.05) {
      PullOffer offer =
          blocks.offer(request("4", parameters("fixed").put("efficiency", k), DRIVER));
      assertThat(offer.lowN()).as("efficiency %s", k).isGreaterThan(last);
      last = offer.lowN();
    }
  }

  @Test
  void modesAreThePartsInAFixedOrder() {
    ObjectNode mixed = parameters("fixed");
    mixed.set("parts", JsonNodeFactory.instance.arrayNode().add(4).add("2"));
    assertThat(blocks.modes(mixed)).containsExactly("2", "4");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> blocks.offer(request("3", mixed, DRIVER)))
        .withMessage("mode is \"3\"; this block system is rigged with [2, 4]");
  }

  @Test
  void needsADriverAndAllItsParameters() {
    assertThat(blocks.describe().needsDriver()).isTrue();
    assertThatIllegalArgumentException()
        .isThrownBy(() -> blocks.offer(request("3", parameters("fixed"), null)))
        .withMessageContaining("driver is not stated");
    ObjectNode lacking = parameters("fixed");
    lacking.remove("line_length_m");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> blocks.modes(lacking))
        .withMessage("line_length_m is missing; it must be a number from 1 to 1000 m");
  }

  @Test
  void isListedAsAnExtension() throws IOException {
    assertThat(Files.readString(Path.of("target/classes/META-INF/extensions.idx")))
        .contains(BlockSystem.class.getName());
  }

  private PullOffer offer(String parts, String form) {
    return blocks.offer(request(parts, parameters(form), DRIVER));
  }

  private static void loaded(
      Part part, double strength, double factor, double hauling, double holding) {
    assertThat(part.strengthN()).as(part.name()).isCloseTo(strength, within(1e-6));
    assertThat(part.designFactor()).as(part.name()).isEqualTo(factor);
    assertThat(part.lastFactor()).as(part.name()).isEqualTo(1.5);
    assertThat(part.hauling()).as(part.name()).isCloseTo(hauling, within(1e-12));
    assertThat(part.holding()).as(part.name()).isCloseTo(holding, within(1e-12));
  }

  private static PullRequest request(String mode, ObjectNode parameters, PullOffer driver) {
    return new PullRequest(
        parameters,
        mode,
        new PullRequest.Stand(null, 0.3, 0, null, 1, 30, null),
        new PullRequest.Pull(20_000, 1, 2.8, null),
        null,
        driver);
  }

  private static ObjectNode parameters(String form) {
    ObjectNode node =
        JsonNodeFactory.instance
            .objectNode()
            .put("form", form)
            .put("efficiency", 0.92)
            .put("block_rated_N", 30_000)
            .put("block_factor", 5)
            .put("line_breaking_N", 55_000)
            .put("line_termination", 0.9)
            .put("line_stiffness_N", 400_000)
            .put("line_length_m", 60);
    node.set("parts", JsonNodeFactory.instance.arrayNode().add(2).add(3).add(4));
    return node;
  }
}
