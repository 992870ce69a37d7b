package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.LeftBehind;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;

/** The gear that is left behind: what of it would make up for what is short. */
final class Spares {
  private final Site entered;
  private final DisplayUnits in;

  /**
   * @param entered the site with all its gear
   */
  Spares(Site entered, DisplayUnits in) {
    this.entered = entered;
    this.in = in;
  }

  /** One sentence that names what is left behind. */
  Optional<String> note() {
    return entered.leftBehind().isEmpty()
        ? Optional.empty()
        : Optional.of(
            "Left behind and not counted on: "
                + entered.leftBehind().stream()
                    .map(l -> l.item() + (l.where() == null ? "" : " (" + l.where() + ")"))
                    .collect(Collectors.joining(", "))
                + ".");
  }

  /** "take L1 (80.0 m, on Truck 2)": the shortest pull line that would do. */
  Optional<String> line(Predicate<Gear.Line> does) {
    return entered.leftBehind().stream()
        .flatMap(
            l ->
                entered.gear().lines().stream()
                    .filter(g -> g.id().equals(l.item()) && g.pullLine() && does.test(g))
                    .map(g -> new Spare(l, g)))
        .min(Comparator.comparingDouble(s -> s.line().lengthM()))
        .map(s -> take(s.left(), in.length(s.line().lengthM())));
  }

  private record Spare(LeftBehind left, Gear.Line line) {}

  /** Things of a kind that make up for so many, fewest names first come. */
  Optional<String> things(List<? extends Gear.Item> kind, int missing) {
    List<String> taken = new ArrayList<>();
    int open = missing;
    for (LeftBehind l : entered.leftBehind()) {
      for (Gear.Item i : kind) {
        if (open > 0 && i.id().equals(l.item()) && i.count() > 0) {
          open -= i.count();
          taken.add(take(l, i.count() > 1 ? i.count() + " of them" : ""));
        }
      }
    }
    return open > 0 || taken.isEmpty()
        ? Optional.empty()
        : Optional.of(String.join(" and ", taken));
  }

  /** All gear of the site, also what is left behind. */
  Gear all() {
    return entered.gear();
  }

  private static String take(LeftBehind left, String what) {
    String where = left.where() == null ? "left behind" : "on " + left.where();
    return "take " + left.item() + " (" + (what.isEmpty() ? "" : what + ", ") + where + ")";
  }
}
