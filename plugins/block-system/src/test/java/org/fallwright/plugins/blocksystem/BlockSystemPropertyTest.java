package org.fallwright.plugins.blocksystem;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Random;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.Wording;
import org.junit.jupiter.api.Test;

class BlockSystemPropertyTest {
  private static final long SEED = 19_770_525;
  private static final int TIMES = 3000;

  private final BlockSystem blocks = new BlockSystem();

  @Test
  void moreFrictionNeverPullsMoreAndNoFrictionGivesTheParts() {
    Random random = new Random(SEED);
    for (int i = 0; i < TIMES; i++) {
      Rig rig = rig(random, random.nextBoolean());
      String what = "seed " + SEED + ", case " + i + ", " + rig;
      assertThat(rig.gain()).as(what).isPositive().isLessThanOrEqualTo(rig.parts());
      assertThat(worse(rig, 0.9).gain()).as(what).isLessThan(rig.gain());
      assertThat(worse(rig, 0.9).haulHauling()).as(what).isGreaterThan(rig.haulHauling());
    }
  }

  @Test
  void aCompoundIsTheProductOfItsTackles() {
    Random random = new Random(SEED);
    for (int i = 0; i < TIMES; i++) {
      Rig rig = compound(random, random.nextBoolean());
      String what = "seed " + SEED + ", case " + i + ", " + rig;
      double product = rig.first().gain() * rig.second().gain();
      assertThat(rig.gain()).as(what).isCloseTo(product, within(1e-12 * product));
      assertThat(rig.parts()).as(what).isEqualTo(rig.first().parts() * rig.second().parts());
    }
  }

  @Test
  void theAnchorNeverCarriesMoreWhereTheHaulLeavesTheMovingBlock() {
    Random random = new Random(SEED);
    for (int i = 0; i < TIMES; i++) {
      long seed = random.nextLong();
      Rig moving = rig(new Random(seed), false);
      Rig fixed = rig(new Random(seed), true);
      String what = "seed " + SEED + ", case " + i + ", " + moving;
      assertThat(moving.anchorHauling()).as(what).isBetween(0.0, 1.0);
      assertThat(moving.anchorHauling()).as(what).isLessThanOrEqualTo(fixed.anchorHauling());
      assertThat(moving.anchorHolding()).as(what).isLessThanOrEqualTo(fixed.anchorHolding());
      assertThat(moving.gain()).as(what).isGreaterThanOrEqualTo(fixed.gain());
    }
  }

  /** Forces on the whole: load, anchor and haul balance; so does the tackle of each stage. */
  @Test
  void forcesBalance() {
    Random random = new Random(SEED);
    for (int i = 0; i < TIMES; i++) {
      boolean fixed = random.nextBoolean();
      Rig rig = rig(random, fixed);
      double sign = fixed ? -1 : 1;
      String what = "seed " + SEED + ", case " + i + ", " + rig;
      assertThat(rig.anchorHauling() + sign * rig.haulHauling())
          .as(what)
          .isCloseTo(1, within(1e-9));
      if (rig.compound()) {
        double both =
            rig.first().anchorHauling() + rig.first().haulHauling() * rig.second().anchorHauling();
        assertThat(rig.anchorHauling()).as(what).isCloseTo(both, within(1e-9));
      }
    }
  }

  @Test
  void lessRoomNeverAsksForFewerResets() {
    Random random = new Random(SEED);
    for (int i = 0; i < TIMES; i++) {
      Rig rig = rig(random, true);
      double room = 1 + 10 * random.nextDouble();
      double takeUp = 10 * random.nextDouble();
      int resets = Throw.of(rig, room).resets(takeUp);
      String what = "seed " + SEED + ", case " + i + ", " + rig + ", " + room + ", " + takeUp;
      assertThat(Throw.of(rig, room + 1).resets(takeUp)).as(what).isLessThanOrEqualTo(resets);
      assertThat((resets + 1) * Throw.of(rig, room).metres())
          .as(what)
          .isGreaterThanOrEqualTo(takeUp * (1 - 1e-9));
    }
  }

  /** Whatever the description allows is answered, or refused in one sentence about a parameter. */
  @Test
  void everythingThatMayBeStatedIsAnsweredOrRefusedInASentence() {
    Random random = new Random(SEED);
    int answered = 0;
    for (int i = 0; i < 4 * TIMES; i++) {
      ObjectNode node = stated(random);
      String what = "seed " + SEED + ", case " + i + ", " + node;
      List<String> modes;
      try {
        modes = blocks.modes(node);
      } catch (IllegalArgumentException refused) {
        assertThat(refused.getMessage())
            .as(what)
            .containsPattern("^[a-z]+_?[A-Za-z_]* is ")
            .containsAnyOf("it must", "only one of the two");
        continue;
      }
      PullOffer driver = driver(random);
      for (String mode : modes) {
        answered++;
        PullOffer offer = blocks.offer(request(node, mode, random, driver));
        assertThat(offer.highN()).as(what).isGreaterThanOrEqualTo(offer.lowN());
        assertThat(offer.holdN()).as(what).isFinite();
        assertThat(offer.parts()).as(what).isNotEmpty();
        assertThat(blocks.haulLine(node, mode).parts())
            .as(what)
            .isEqualTo(offer.travel().ratio() / driver.travel().ratio());
      }
    }
    assertThat(answered).as("seed %s", SEED).isGreaterThan(TIMES);
  }

  private static double k(Random random) {
    return 0.3 + 0.7 * random.nextDouble();
  }

  private static Rig rig(Random random, boolean fromFixed) {
    return random.nextBoolean()
        ? compound(random, fromFixed)
        : Rig.simple(new Tackle(2 + random.nextInt(5), k(random), k(random), fromFixed));
  }

  private static Rig compound(Random random, boolean fromFixed) {
    return new Rig(
        new Tackle(2 + random.nextInt(3), k(random), k(random), false),
        new Tackle(2 + random.nextInt(3), k(random), k(random), fromFixed));
  }

  private static Rig worse(Rig rig, double share) {
    return new Rig(worse(rig.first(), share), rig.compound() ? worse(rig.second(), share) : null);
  }

  private static Tackle worse(Tackle t, double share) {
    return new Tackle(t.parts(), t.moving() * share, t.fixed() * share, t.fromFixed());
  }

  private static PullOffer driver(Random random) {
    double low = 1e5 * random.nextDouble();
    return PullOffer.giving(
            low,
            low * (1 + random.nextDouble()),
            new PullOffer.Limit(new Wording("hand", "mano"), new Wording("It tires.", "Cansa.")))
        .holds(low, random.nextBoolean())
        .done();
  }

  private static PullRequest request(
      ObjectNode node, String mode, Random random, PullOffer driver) {
    return new PullRequest(
        node,
        mode,
        new PullRequest.Stand(null, 0.1, 0, null, 1, 30, null),
        new PullRequest.Pull(20_000, 1, 10 * random.nextDouble(), null),
        null,
        driver);
  }

  private ObjectNode stated(Random random) {
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    for (Parameter p : blocks.describe().parameters()) {
      boolean needed = p.key().equals("efficiency");
      if (!p.appliesTo(node) || (p.optional() && !needed && random.nextInt(4) > 0)) {
        continue;
      }
      switch (p.kind()) {
        case NUMBER ->
            node.put(p.key(), p.least() * Math.pow(p.most() / p.least(), random.nextDouble()));
        case FLAG -> node.put(p.key(), random.nextBoolean());
        case CHOICES -> {
          ArrayNode made = node.putArray(p.key());
          made.add(p.choiceKeys().get(random.nextInt(5)));
          if (random.nextBoolean()) {
            made.add(p.choiceKeys().get(5 + random.nextInt(6)));
          }
        }
        default -> node.put(p.key(), p.choiceKeys().get(random.nextInt(p.choices().size())));
      }
    }
    return node;
  }
}
