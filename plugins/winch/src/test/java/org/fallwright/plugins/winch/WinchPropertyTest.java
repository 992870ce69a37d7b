package org.fallwright.plugins.winch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Random;
import org.fallwright.core.line.Wraps;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.reference.Surface;
import org.fallwright.core.reference.SurfaceTable;
import org.junit.jupiter.api.Test;

class WinchPropertyTest {
  private static final long SEED = 20_261_201;
  private static final int TIMES = 2000;

  private final Winch winch = new Winch();

  @Test
  void aHigherLayerNeverPullsMoreAndNeverRunsSlower() {
    Random random = new Random(SEED);
    for (int i = 0; i < TIMES; i++) {
      Drum drum = drum(random);
      int layer = 1 + random.nextInt(19);
      String what = "seed " + SEED + ", case " + i + ", " + drum + ", layer " + layer;
      assertThat(drum.pullN(1e4, layer + 1)).as(what).isLessThan(drum.pullN(1e4, layer));
      assertThat(drum.speedMps(1, layer + 1)).as(what).isGreaterThan(drum.speedMps(1, layer));
      assertThat(drum.pullN(1e4, layer) * drum.speedMps(1, layer))
          .as("%s: the power is the same on every layer", what)
          .isCloseTo(1e4, org.assertj.core.api.Assertions.within(1e-6));
    }
  }

  @Test
  void moreWireNeverMakesFewerLayersAndAWiderDrumNeverMore() {
    Random random = new Random(SEED);
    for (int i = 0; i < TIMES; i++) {
      Drum drum = drum(random);
      double width = drum.ropeM() * (1 + 20 * random.nextDouble());
      double wire = 100 * random.nextDouble();
      String what = "seed " + SEED + ", case " + i + ", " + drum + ", " + width + ", " + wire;
      int layers = drum.layers(wire, width);
      assertThat(drum.layers(wire * 1.3, width)).as(what).isGreaterThanOrEqualTo(layers);
      assertThat(drum.layers(wire, width * 1.3)).as(what).isLessThanOrEqualTo(layers);
    }
  }

  @Test
  void moreTurnsNeverHoldLess() {
    Random random = new Random(SEED);
    for (int i = 0; i < TIMES; i++) {
      Wraps contact = Wraps.values()[random.nextInt(Wraps.values().length)];
      double turns = 9 * random.nextDouble();
      double more = turns + random.nextDouble();
      assertThat(new Capstan(contact, more).slipsAtN(100))
          .as("seed %s, case %s, %s, %s turns", SEED, i, contact, turns)
          .isGreaterThanOrEqualTo(new Capstan(contact, turns).slipsAtN(100));
    }
  }

  /** Whatever the description allows is answered, or refused in one sentence about a parameter. */
  @Test
  void everythingThatMayBeStatedIsAnsweredOrRefusedInASentence() {
    Random random = new Random(SEED);
    int answered = 0;
    for (int i = 0; i < 20 * TIMES; i++) {
      ObjectNode node = stated(random);
      PullRequest request = request(node, random);
      String what = "seed " + SEED + ", case " + i + ", " + node;
      PullOffer offer;
      try {
        offer = winch.offer(request);
      } catch (IllegalArgumentException refused) {
        assertThat(refused.getMessage())
            .as(what)
            .containsPattern("^[a-z]+_?[A-Za-z_]* is ")
            .containsAnyOf("it must", "only one of the two");
        assertThat(refused.getStackTrace()[0].getClassName()).as(what).doesNotContain("PullOffer");
        continue;
      }
      answered++;
      assertThat(offer.highN()).as(what).isGreaterThanOrEqualTo(offer.lowN());
      assertThat(offer.lowN()).as(what).isFinite().isLessThanOrEqualTo(1e7);
      assertThat(offer.holdN()).as(what).isFinite();
      assertThat(offer.limit().why().english()).as(what).endsWith(".");
      assertThat(offer.limit().why().spanish()).as(what).endsWith(".");
    }
    assertThat(answered).as("seed %s", SEED).isGreaterThan(TIMES);
  }

  @Test
  void aHeavierMachineOrABetterGripNeverHoldsLess() {
    Random random = new Random(SEED);
    for (int i = 0; i < TIMES; i++) {
      double mass = 200 + 5000 * random.nextDouble();
      double grip = random.nextDouble();
      double uphill = Math.toRadians(60 * random.nextDouble() - 30);
      double rise = Math.toRadians(60 * random.nextDouble() - 30);
      double held = new Parked(mass).slidesAtN(grip, uphill, rise);
      String what = "seed " + SEED + ", case " + i;
      assertThat(held).as(what).isFinite().isNotNegative();
      assertThat(new Parked(mass * 2).slidesAtN(grip, uphill, rise))
          .as(what)
          .isGreaterThanOrEqualTo(held);
      assertThat(new Parked(mass).slidesAtN(Math.min(1.5, grip * 1.2), uphill, rise))
          .as(what)
          .isGreaterThanOrEqualTo(held);
    }
  }

  @Test
  void aLineTooSteepForAMachineIsCountedAsNothing() {
    assertThat(new Parked(2000).slidesAtN(0.6, 0, Math.toRadians(30.1))).isZero();
    assertThat(new Parked(2000).slidesAtN(0.6, 0, Math.toRadians(-80)))
        .isEqualTo(new Parked(2000).slidesAtN(0.6, 0, Math.toRadians(-30)));
  }

  /** Just outside each number's range the sentence names key, value and limits. */
  @Test
  void aNumberOutOfItsRangeIsNamed() {
    for (Parameter p : winch.describe().parameters()) {
      if (p.kind() == Parameter.Kind.NUMBER) {
        ObjectNode node = JsonNodeFactory.instance.objectNode();
        if (p.where() == null) {
          node.put("kind", "hand-through-rope");
        } else {
          node.put("kind", p.where().choices().get(0));
        }
        node.put(p.key(), p.most() * 2 + 1);
        assertThatIllegalArgumentException()
            .isThrownBy(() -> complete(node))
            .withMessageStartingWith(p.key() + " is ")
            .withMessageContaining("it must be from");
      }
    }
  }

  /** Held against the description in its own order, so that what comes after is not missed. */
  private void complete(ObjectNode node) {
    for (Parameter p : winch.describe().parameters()) {
      if (node.has(p.key())) {
        p.check(node.get(p.key()));
      }
    }
  }

  private static Drum drum(Random random) {
    double rope = 0.004 + 0.02 * random.nextDouble();
    return new Drum(rope * (1 + 20 * random.nextDouble()), rope);
  }

  /** A value for every parameter that applies, from the whole of its range. */
  private ObjectNode stated(Random random) {
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    for (Parameter p : winch.describe().parameters()) {
      if (!p.appliesTo(node) || (p.optional() && random.nextInt(3) > 0)) {
        continue;
      }
      switch (p.kind()) {
        case NUMBER -> node.put(p.key(), between(p, random));
        case WHOLE_NUMBER -> node.put(p.key(), (int) Math.round(between(p, random)));
        case FLAG -> node.put(p.key(), random.nextBoolean());
        default -> node.put(p.key(), p.choiceKeys().get(random.nextInt(p.choices().size())));
      }
    }
    return node;
  }

  /** Evenly in the logarithm, and now and then an end of the range. */
  private static double between(Parameter p, Random random) {
    int at = random.nextInt(12);
    if (at < 2) {
      return at == 0 ? p.least() : p.most();
    }
    double least = Math.max(p.least(), p.most() * 1e-4);
    return Math.min(p.most(), least * Math.pow(p.most() / least, random.nextDouble()));
  }

  private static PullRequest request(ObjectNode node, Random random) {
    Surface ground = random.nextInt(3) == 0 ? SurfaceTable.of("grass", true) : null;
    return new PullRequest(
        node,
        "pull",
        new PullRequest.Stand(
            ground,
            Math.PI * (random.nextDouble() - 0.5),
            ground == null ? 0 : random.nextDouble() - 0.5,
            random.nextBoolean() ? null : Math.PI * random.nextDouble(),
            1,
            30,
            null),
        new PullRequest.Pull(
            1e5 * random.nextDouble(),
            1 + random.nextInt(9),
            10 * random.nextDouble(),
            random.nextBoolean() ? null : 1e5 * random.nextDouble()),
        null,
        null);
  }
}
