package org.fallwright.plugins.handline;

import static org.assertj.core.api.Assertions.assertThat;

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
class HandLineExtremesTest {
  private final HandLine handLine = new HandLine();

  private static LongStream seeds() {
    return LongStream.range(0, 2000);
  }

  @Test
  void anyParametersGiveAnOfferOrOneSentence() {
    seeds().forEach(this::isOfferOrOneSentence);
  }

  private void isOfferOrOneSentence(long seed) {
    Random r = new Random(seed);
    PullRequest request = request(r, handLine.describe().parameters());
    try {
      PullOffer offer = handLine.offer(request);
      assertThat(offer.lowN()).as("seed %d", seed).isFinite().isNotNegative();
      assertThat(offer.highN()).as("seed %d", seed).isFinite().isGreaterThanOrEqualTo(offer.lowN());
      assertThat(offer.holdN()).as("seed %d", seed).isFinite().isNotNegative();
      assertThat(offer.operators())
          .as("seed %d", seed)
          .isEqualTo(request.parameters().get("people").intValue());
    } catch (IllegalArgumentException e) {
      assertThat(e.getMessage()).as("seed %d", seed).matches("[a-z_0-9A-Z]+ is .+; it must be .+");
      assertThat(e.getStackTrace()[0].getClassName())
          .as("seed %d: the plugin's own slip", seed)
          .doesNotContain("PullOffer");
    }
  }

  /** Most of the draws must be offers, or the test above would say little. */
  @Test
  void mostDrawsAreOffers() {
    long offers =
        seeds()
            .filter(
                seed -> {
                  try {
                    handLine.offer(request(new Random(seed), handLine.describe().parameters()));
                    return true;
                  } catch (IllegalArgumentException e) {
                    return false;
                  }
                })
            .count();
    assertThat(offers).isGreaterThan(1000);
  }

  @Test
  void onePersonMoreNeverGivesLess() {
    seeds().forEach(this::oneMoreNeverGivesLess);
  }

  private void oneMoreNeverGivesLess(long seed) {
    Random r = new Random(seed);
    PullRequest request = request(r, handLine.describe().parameters());
    ObjectNode fewer = request.parameters();
    int people = fewer.get("people").intValue();
    try {
      double before = handLine.offer(request).lowN();
      if (people < 20) {
        double after =
            handLine.offer(request.with(fewer.deepCopy().put("people", people + 1))).lowN();
        assertThat(after).as("seed %d, %d people", seed, people).isGreaterThanOrEqualTo(before);
      }
    } catch (IllegalArgumentException e) {
      assertThat(e.getMessage()).as("seed %d", seed).isNotBlank();
    }
  }

  private static PullRequest request(Random r, List<Parameter> described) {
    ObjectNode values = JsonNodeFactory.instance.objectNode();
    for (Parameter p : described) {
      boolean told = p.key().matches("(mass|stature)_\\d_(kg|m)");
      boolean crew = told && p.key().charAt(p.key().indexOf('_') + 1) - '0' > people(values);
      if (p.appliesTo(values) && !crew && (!p.optional() || r.nextBoolean())) {
        put(values, p, r);
      }
    }
    if (!values.get("captured").booleanValue() && r.nextInt(10) > 0) {
      described.stream()
          .filter(p -> p.key().matches("(capture_|turns|tail).*"))
          .forEach(p -> values.remove(p.key()));
    }
    List<String> grounds = SurfaceTable.keys();
    Surface ground = SurfaceTable.of(grounds.get(r.nextInt(grounds.size())), r.nextBoolean());
    return new PullRequest(
        values,
        "pull",
        new PullRequest.Stand(
            ground,
            Math.toRadians(r.nextDouble(-90, 90)),
            Math.toRadians(r.nextDouble(-30, 30)),
            null,
            1,
            r.nextDouble(0, 100),
            r.nextBoolean() ? null : Double.valueOf(r.nextDouble(0, 1e4))),
        new PullRequest.Pull(r.nextDouble(0, 1e7), r.nextDouble(1, 10), r.nextDouble(0, 20), null),
        r.nextBoolean()
            ? null
            : new PullRequest.Line(r.nextBoolean(), r.nextDouble(0.001, 0.2), 1e5, 60, 40),
        null);
  }

  private static int people(ObjectNode values) {
    return values.get("people").intValue();
  }

  private static void put(ObjectNode values, Parameter p, Random r) {
    switch (p.kind()) {
      case NUMBER -> values.put(p.key(), within(r, p.least(), p.most()));
      case WHOLE_NUMBER ->
          values.put(p.key(), (int) p.least() + r.nextInt((int) (p.most() - p.least()) + 1));
      case FLAG -> values.put(p.key(), r.nextBoolean());
      case CHOICE -> values.put(p.key(), p.choiceKeys().get(r.nextInt(p.choiceKeys().size())));
      case CHOICES -> values.putArray(p.key()).add(p.choiceKeys().get(0));
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
