package org.fallwright.core.advice;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Set;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.Wording;

/** A source that gives one pull, whatever the ground; it holds what it pulls and is captured. */
public final class SteadyPull implements PullSource {
  private static final PullOffer.Limit STEADY =
      new PullOffer.Limit(
          new Wording("steady", "constante"), new Wording("It is steady.", "Es constante."));

  public static final PullSources ONLY = () -> List.of(new SteadyPull());

  @Override
  public SourceDescription describe() {
    return new SourceDescription(
        "steady",
        new Wording("Steady pull", "tiro constante"),
        Set.of(PlaceKind.SPOT, PlaceKind.ANCHOR),
        false,
        List.of(
            number("low_N", "N", 0, 1e6),
            number("high_N", "N", 0, 1e6),
            number("stroke_m", "m", 0.001, 1)));
  }

  @Override
  public List<String> modes(ObjectNode parameters) {
    return List.of("pull");
  }

  @Override
  public PullOffer offer(PullRequest request) {
    double low = request.parameters().get("low_N").asDouble();
    return PullOffer.giving(
            low, Math.max(low, request.parameters().get("high_N").asDouble()), STEADY)
        .holds(low, true)
        .travel(2, null)
        .done();
  }

  private static Parameter number(String key, String unit, double least, double most) {
    Wording said = new Wording(key, key);
    return Parameter.number(key, unit, least, most, said, said);
  }
}
