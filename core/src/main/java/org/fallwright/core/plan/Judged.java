package org.fallwright.core.plan;

import java.util.List;

/**
 * A setup with everything that was found about it.
 *
 * @param setup what was judged
 * @param verdict its worst check
 * @param weakest the check with the lowest ratio among the worst
 * @param standing ratio of the weakest link over the ratio from which it is workable
 * @param standings standings of all checks that have a limit, lowest first
 * @param failing how many checks are not workable; those that could not be made count as well
 * @param sentence verdict and weakest link in one sentence, in the site's units
 * @param figures its figures
 * @param checks every check, in a fixed order
 * @param loads loads on every part
 * @param line points of the line from the tree outwards
 * @param haul points of a block system's haul part, from its fixed block to the driver; may be
 *     empty
 * @param ground its zones
 * @param notes warnings, a sentence each
 */
public record Judged(
    Setup setup,
    Verdict verdict,
    Check weakest,
    double standing,
    List<Double> standings,
    int failing,
    String sentence,
    Figures figures,
    List<Check> checks,
    List<PartLoad> loads,
    List<LinePoint> line,
    List<LinePoint> haul,
    Ground ground,
    List<String> notes) {
  public Judged {
    checks = List.copyOf(checks);
    loads = List.copyOf(loads);
    line = List.copyOf(line);
    haul = List.copyOf(haul);
    notes = List.copyOf(notes);
  }

  /** The check of an id that it has. */
  public Check check(String id) {
    return checks.stream().filter(c -> c.id().equals(id)).findFirst().orElseThrow();
  }
}
