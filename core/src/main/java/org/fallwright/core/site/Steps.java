package org.fallwright.core.site;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.units.Range;

/**
 * Lengths from one to another in equal steps, both ends tried.
 *
 * @param fromM the first [m]
 * @param toM the last [m]
 * @param stepM the step [m]; the last step may be shorter
 */
public record Steps(double fromM, double toM, double stepM) {
  private static final int MOST = 100;

  public Steps {
    Range.check("from_m", fromM, 0.001, 100, "m");
    Range.check("to_m", toM, fromM, 100, "m");
    Range.check("step_m", stepM, 0.001, 100, "m");
    Range.check("steps", Math.ceil((toM - fromM) / stepM), 0, MOST, "");
  }

  /** All of them, ascending. */
  public List<Double> all() {
    List<Double> all = new ArrayList<>();
    // a last step of less than a thousandth is no step
    for (int i = 0; fromM + i * stepM < toM - stepM / 1000; i++) {
      all.add(fromM + i * stepM);
    }
    all.add(toM);
    return all;
  }

  /** The values of a list and of steps, each once: the list's first. */
  static List<Double> with(List<Double> list, Steps steps) {
    if (steps == null) {
      return list;
    }
    List<Double> all = new ArrayList<>(list);
    steps.all().stream().filter(s -> !list.contains(s)).forEach(all::add);
    return List.copyOf(all);
  }
}
