package org.fallwright.core.advice;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Set;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.Parameter;
import org.fallwright.core.pull.SourceDescription.PlaceKind;

/** A source that gives one pull, whatever the ground; it holds what it pulls and is captured. */
public final class SteadyPull implements PullSource {
  public static final PullSources ONLY = () -> List.of(new SteadyPull());

  @Override
  public SourceDescription describe() {
    return new SourceDescription(
        "steady",
        "Steady pull",
        Set.of(PlaceKind.SPOT, PlaceKind.ANCHOR),
        false,
        List.of(
            Parameter.number("low_N", "Pull", "N", 0, 1e6),
            Parameter.number("high_N", "Most", "N", 0, 1e6),
            Parameter.number("stroke_m", "Stroke", "m", 0.001, 1)));
  }

  @Override
  public List<String> modes(ObjectNode parameters) {
    return List.of("pull");
  }

  @Override
  public PullOffer offer(PullRequest request) {
    double low = request.parameters().get("low_N").asDouble();
    return new PullOffer(
        low,
        Math.max(low, request.parameters().get("high_N").asDouble()),
        low,
        true,
        "steady",
        2,
        false,
        0,
        0,
        1,
        1,
        0,
        List.of(),
        List.of(),
        List.of());
  }
}
