package org.fallwright.core.advice;

import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Verdict;

/**
 * Says plainly that pulling is not the method, where everything was judged and nothing will do.
 *
 * <p>It is not said where something cannot be judged yet, nor where there was nothing to judge.
 *
 * @param judged how many setups were judged, every one not workable
 * @param binding by which check how many fail first, most first
 * @param sentence the advice in one sentence
 */
public record NotByPulling(int judged, List<Binding> binding, String sentence) {
  private static final int SAID = 3;

  /**
   * A check that rules setups out.
   *
   * @param check its id
   * @param setups how many setups miss it first
   */
  public record Binding(String check, int setups) {}

  public NotByPulling {
    binding = List.copyOf(binding);
  }

  /** The advice for a plan; empty where pulling may still be the method. */
  public static Optional<NotByPulling> of(Plan plan) {
    int not = plan.byVerdict().getOrDefault(Verdict.NOT_WORKABLE, 0);
    if (plan.judged() == 0 || not < plan.judged()) {
      return Optional.empty();
    }
    List<Binding> binding =
        plan.byBindingCheck().entrySet().stream()
            .sorted(
                Map.Entry.<String, Integer>comparingByValue(Comparator.reverseOrder())
                    .thenComparing(Map.Entry.comparingByKey()))
            .map(e -> new Binding(e.getKey(), e.getValue()))
            .toList();
    String reasons =
        binding.stream()
            .limit(SAID)
            .map(b -> b.check() + " in " + b.setups())
            .collect(Collectors.joining(", "));
    int others = binding.stream().skip(SAID).mapToInt(Binding::setups).sum();
    return Optional.of(
        new NotByPulling(
            plan.judged(),
            binding,
            "Pulling is not the method here with what the site has: all "
                + plan.judged()
                + " setups fail, first by "
                + reasons
                + (others == 0 ? "" : ", other checks in " + others)
                + "; consider dismantling the tree from the top or a crane."));
  }
}
