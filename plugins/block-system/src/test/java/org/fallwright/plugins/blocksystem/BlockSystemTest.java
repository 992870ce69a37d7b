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
import org.fallwright.core.line.Sheave;
import org.fallwright.core.pull.HaulLine;
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
    assertThat(four.notes().get(0))
        .startsWith("The haul end moves 11.2 m (36 ft 9 in), 4 times the take-up");
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
  void eachBlockHasItsOwnSheaves() {
    ObjectNode mixed = parameters("fixed");
    mixed.remove("efficiency");
    mixed.put("moving_sheave", "fibre-on-a-bush").put("fixed_efficiency", 0.95);
    double gain = 0.95 * (1 + 0.8 + 0.8 * 0.95);
    assertThat(blocks.offer(request("3", mixed, DRIVER)).lowN())
        .isCloseTo(3720 * gain, within(1e-9));
    ObjectNode overridden = parameters("fixed").put("moving_sheave", "connector");
    assertThat(blocks.offer(request("2", overridden, DRIVER)).lowN())
        .isCloseTo(3720 * 0.92 * (1 + Sheave.CONNECTOR.low()), within(1e-9));
    mixed.remove("fixed_efficiency");
    refuses(mixed, "efficiency is missing; it must be a number from 0.3 to 1");
    refuses(
        overridden.deepCopy().put("moving_efficiency", 0.9),
        "moving_efficiency is 0.9 and moving_sheave is \"connector\"; only one of the two may be"
            + " stated");
  }

  @Test
  void everyKindOfSheaveIsKnown() {
    for (String key : blocks.describe().parameter("fixed_sheave").orElseThrow().choiceKeys()) {
      ObjectNode kind = parameters("fixed").put("fixed_sheave", key);
      assertThat(offer("2", kind).lowN()).as(key).isPositive();
    }
    assertThat(blocks.describe().parameter("fixed_sheave").orElseThrow().choices())
        .hasSameSizeAs(Sheave.values());
  }

  @Test
  void aCompoundIsTheProductOfItsTackles() {
    PullOffer six = offer("3x2", compound("moving"));
    double first = 1 + 0.92 + 0.92 * 0.92;
    double gain = first * (1 + 0.92);
    assertThat(six.lowN()).isCloseTo(3720 * gain, within(1e-9));
    assertThat(six.highN()).isCloseTo(9270 * 6, within(1e-9));
    assertThat(six.holdN()).isCloseTo(8000 * 6, within(1e-9));
    assertThat(six.travel().ratio()).isEqualTo(6);
    assertThat(six.overrunM()).isCloseTo(0.5 / 6, within(1e-12));
    assertThat(six.anchorHauling()).isCloseTo(1 - 1 / gain, within(1e-12));
    assertThat(six.anchorHolding()).isCloseTo(5.0 / 6, within(1e-12));
    assertThat(six.limit().what().english()).isEqualTo("grip of the rear axle, through 6:1");
    assertThat(six.parts())
        .extracting(Part::name)
        .containsExactly(
            "tackle block at the pull line",
            "tackle block at the anchor",
            "tackle line",
            "second tackle's moving block",
            "second tackle's block at the anchor",
            "second tackle's line",
            "tow point");
    loaded(six.parts().get(1), 150_000, 5, 1 - 1 / first, 2.0 / 3);
    loaded(six.parts().get(2), 49_500, 5, 1 / first, 1.0 / 3);
    loaded(six.parts().get(3), 150_000, 5, 1 / first, 1.0 / 3);
    loaded(six.parts().get(4), 150_000, 5, 1 / first * (1 - 1 / 1.92), 1.0 / 6);
    loaded(six.parts().get(5), 49_500, 5, 1 / gain, 1.0 / 6);
    loaded(six.parts().get(6), 90_000, 3, 1 / gain, 1.0 / 6);
    assertThat(offer("3x2", compound("fixed")).anchorHauling())
        .isCloseTo(1 + 1 / (first * 0.92 * 1.92), within(1e-12));
  }

  @Test
  void aCompoundHasTwoLines() {
    ObjectNode node = compound("fixed");
    assertThat(blocks.haulLine(node, "3x2")).isEqualTo(new HaulLine(6, 400_000 / 3.0, 45));
    assertThat(blocks.haulLine(node, "3")).isEqualTo(new HaulLine(3, 400_000, 60));
    Finding first = offer("3x2", node).checks().get(1);
    assertThat(first.id()).isEqualTo("first-tackle-line");
    assertThat(first.value()).isEqualTo(60);
    assertThat(first.limit()).isCloseTo(3 * 3 + 2, within(1e-12));
    ObjectNode one = node.deepCopy();
    one.remove("second_line_length_m");
    refuses(one, "second_line_length_m is missing; it must be a number from 1 to 1000 m");
    refuses(
        parameters("fixed").put("second_line_length_m", 40),
        "second_line_length_m is 40; it must be left out where parts is [2,3,4]");
    refuses(
        node.deepCopy().put("line_stiffness_N", 2000),
        "line_stiffness_N is 2000 N; it must be at least 3000 N for a compound of 6 parts");
  }

  @Test
  void aRopeGrabHoldsWithoutTheDriver() {
    ObjectNode onHaul =
        parameters("fixed")
            .put("capture_N", 5000)
            .put("capture_factor", 3)
            .put("capture_at", "haul-part");
    PullOffer people = driver(false, 400);
    assertThat(offer("4", parameters("fixed"), people).captured()).isFalse();
    PullOffer held = offer("4", onHaul, people);
    assertThat(held.captured()).isTrue();
    assertThat(held.holdN()).isEqualTo(20_000);
    loaded(held.parts().get(3), 15_000, 3, 0, 0.25);
    assertThat(offer("4", onHaul.deepCopy().put("capture_at", "pull-line"), people).holdN())
        .isEqualTo(5000);
    assertThat(offer("4", onHaul, driver(true, 8000)).holdN())
        .as("a driver whose end stays holds as well")
        .isEqualTo(32_000);
    refuses(
        parameters("fixed").put("capture_at", "haul-part"),
        "capture_at is stated; it must be left out where capture_N is not stated");
    ObjectNode nowhere = onHaul.deepCopy();
    nowhere.remove("capture_at");
    refuses(nowhere, "capture_at is missing; it must be one of \"pull-line\", \"haul-part\"");
  }

  /** 2.8 m to take in, 1.5 m between the blocks: throws of 1.0 m, so two resets. */
  @Test
  void aShortRoomAsksForResetsAndForSomethingThatHolds() {
    ObjectNode close = parameters("fixed").put("room_m", 1.5);
    PullOffer not = offer("3", close);
    assertThat(not.travel().mostM()).isEqualTo(1.0);
    assertThat(not.notes().get(0))
        .isEqualTo(
            "The haul end moves 8.40 m (27 ft 7 in), 3 times the take-up; with 1.50 m (4 ft 11 in) between its blocks it must"
                + " be reset 2 times, and nothing holds the line meanwhile.");
    PullOffer held =
        offer("3", close.deepCopy().put("capture_N", 9000).put("capture_at", "pull-line"));
    assertThat(held.travel().mostM()).isNull();
    assertThat(held.notes().get(0)).endsWith("the rope grab holds the line meanwhile.");
    assertThat(held.people()).hasSize(2);
    assertThat(held.people().get(1).where()).isEqualTo(PullOffer.Where.AT_CAPTURE);
    PullOffer far = offer("3", close.deepCopy().put("room_m", 5));
    assertThat(far.notes().get(0))
        .endsWith("its blocks are far enough apart at 5.00 m (16 ft 5 in).");
  }

  @Test
  void saysWhichOfItsPartsIsLoadedMost() {
    assertThat(offer("2", "fixed").notes())
        .contains(
            "Of its own parts the tackle line is loaded most: it comes to its limit at 17.4 kN (3,930"
                + " lbf) on the pull line.");
    assertThat(offer("4", "fixed").notes())
        .contains(
            "Of its own parts the tackle block at the anchor is loaded most: it comes to its limit"
                + " at 22.9 kN (5,160 lbf) on the pull line.");
  }

  @Test
  void wireRopeHasItsOwnFactor() {
    assertThat(offer("2", parameters("fixed").put("line_wire_rope", true)).parts().get(2))
        .extracting(Part::designFactor)
        .isEqualTo(3.0);
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

  private PullOffer offer(String parts, ObjectNode parameters) {
    return offer(parts, parameters, DRIVER);
  }

  private PullOffer offer(String parts, ObjectNode parameters, PullOffer driver) {
    return blocks.offer(request(parts, parameters, driver));
  }

  private static PullOffer driver(boolean captured, double hold) {
    return PullOffer.giving(400, 900, DRIVER.limit()).holds(hold, captured).done();
  }

  private void refuses(ObjectNode parameters, String sentence) {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> blocks.modes(parameters))
        .withMessage(sentence);
  }

  private static ObjectNode compound(String form) {
    ObjectNode node = parameters(form).put("second_line_length_m", 45);
    node.set("parts", JsonNodeFactory.instance.arrayNode().add(3).add("3x2"));
    return node;
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
