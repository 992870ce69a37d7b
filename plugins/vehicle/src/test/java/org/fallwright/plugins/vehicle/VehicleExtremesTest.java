package org.fallwright.plugins.vehicle;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Random;
import java.util.stream.LongStream;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.reference.Surface;
import org.fallwright.core.reference.SurfaceTable;
import org.junit.jupiter.api.Test;

/**
 * Whatever a form lets in, over the whole of the described ranges and their ends, makes an offer
 * that holds together, or is refused in one sentence.
 */
class VehicleExtremesTest {
  private final Vehicle vehicle = new Vehicle();

  private static LongStream seeds() {
    return LongStream.range(0, 3000);
  }

  @Test
  void anyParametersGiveAnOfferOrOneSentence() {
    seeds().forEach(this::isOfferOrOneSentence);
  }

  private void isOfferOrOneSentence(long seed) {
    PullRequest request = request(new Random(seed), vehicle.describe().parameters());
    try {
      PullOffer offer = vehicle.offer(request);
      assertThat(offer.lowN()).as("seed %d", seed).isFinite().isNotNegative();
      assertThat(offer.highN()).as("seed %d", seed).isFinite().isGreaterThanOrEqualTo(offer.lowN());
      assertThat(offer.holdN()).as("seed %d", seed).isFinite().isNotNegative();
    } catch (IllegalArgumentException e) {
      assertThat(e.getMessage())
          .as("seed %d", seed)
          .matches("[a-z_A-Z ]+ is .+; (it must be|on [a-z-]+ it must be) .+");
      for (StackTraceElement step : e.getStackTrace()) {
        assertThat(step.getClassName())
            .as("seed %d: the plugin's own slip: %s", seed, e.getMessage())
            .doesNotContain("PullOffer")
            .doesNotContain("LockedWheels");
      }
    }
  }

  /** Most of the draws must be offers, or the test above would say little. */
  @Test
  void mostDrawsAreOffers() {
    long offers = seeds().filter(this::isOffer).count();
    assertThat(offers).isGreaterThan(1500);
  }

  private boolean isOffer(long seed) {
    try {
      vehicle.offer(request(new Random(seed), vehicle.describe().parameters()));
      return true;
    } catch (IllegalArgumentException e) {
      return false;
    }
  }

  private static PullRequest request(Random r, List<Parameter> described) {
    ObjectNode values = JsonNodeFactory.instance.objectNode();
    boolean weighed = r.nextInt(3) == 0;
    for (Parameter p : described) {
      boolean mass = p.key().equals("mass_kg") || p.key().equals("front_share");
      boolean axle = p.key().endsWith("axle_kg");
      boolean tyre = p.key().contains("tyre_");
      boolean left =
          mass && weighed
              || axle && !weighed
              || p.optional() && !axle && !tyre && !body(p) && r.nextBoolean();
      if (p.appliesTo(values) && !left) {
        put(values, p, r);
      }
    }
    List<String> grounds = SurfaceTable.keys();
    Surface ground = SurfaceTable.of(grounds.get(r.nextInt(grounds.size())), r.nextBoolean());
    return new PullRequest(
        values,
        values.get("drives").get(0).asText(),
        new PullRequest.Stand(
            ground,
            Math.toRadians(within(r, -90, 90)),
            Math.toRadians(within(r, -30, 30)),
            r.nextBoolean() ? null : Double.valueOf(r.nextDouble(0, Math.PI)),
            1,
            r.nextDouble(0, 100),
            r.nextBoolean() ? null : Double.valueOf(r.nextDouble(0, 1e4))),
        new PullRequest.Pull(within(r, 0, 1e9), within(r, 1, 100), within(r, 0, 50), null),
        null,
        null);
  }

  private static boolean body(Parameter p) {
    return p.key().matches("mass_kg|front_share|wheelbase_m|cg_height_m|hitch_height_m|overhang_m");
  }

  private static void put(ObjectNode values, Parameter p, Random r) {
    List<String> keys = p.choiceKeys();
    switch (p.kind()) {
      case NUMBER -> values.put(p.key(), within(r, p.least(), p.most()));
      case WHOLE_NUMBER -> values.put(p.key(), (int) p.least());
      case FLAG -> values.put(p.key(), r.nextBoolean());
      case CHOICE -> values.put(p.key(), keys.get(r.nextInt(keys.size())));
      case CHOICES -> {
        ArrayNode chosen = values.putArray(p.key()).add(keys.get(r.nextInt(keys.size())));
        String more = keys.get(r.nextInt(keys.size()));
        if (!chosen.get(0).asText().equals(more) && r.nextBoolean()) {
          chosen.add(more);
        }
      }
    }
  }

  /** Somewhere in the range, and now and then at an end of it. */
  private static double within(Random r, double least, double most) {
    return switch (r.nextInt(5)) {
      case 0 -> least;
      case 1 -> most;
      default -> r.nextDouble(least, most);
    };
  }
}
