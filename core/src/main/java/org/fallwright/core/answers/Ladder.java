package org.fallwright.core.answers;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;

/**
 * Why, or why not: seven rungs, always the same and in the same order, the first miss marked and
 * those after it still shown.
 *
 * <p>What is explained is a setup. Of an anchor or a spot it is the best setup that uses it, at the
 * end of the line, at a redirect or under the driver; of a lay the best way of the plan turned to
 * that lay.
 *
 * @param pointed what was pointed at
 * @param setup what is explained
 * @param verdict its verdict
 * @param steps the rungs in their order
 * @param sentence the answer in one sentence
 */
public record Ladder(
    String pointed, Setup setup, Verdict verdict, List<Step> steps, String sentence) {
  /**
   * One rung.
   *
   * @param rung which
   * @param verdict worst of its checks; workable where nothing is asked
   * @param check id of the check that decides; null: nothing is asked
   * @param value what there is, in {@code unit}
   * @param limit what is asked, in {@code unit}
   * @param unit SI unit
   * @param ratio capacity over demand
   * @param place where on the plan
   * @param sentence what decides, in one sentence
   * @param firstMiss whether it is the first that is missed
   */
  public record Step(
      Rung rung,
      Verdict verdict,
      String check,
      double value,
      double limit,
      String unit,
      double ratio,
      Position place,
      String sentence,
      boolean firstMiss) {
    /** Whether the setup gets past it. */
    public boolean kept() {
      return verdict.compareTo(Verdict.TIGHT) <= 0;
    }
  }

  public Ladder {
    steps = List.copyOf(steps);
  }

  /** As setups are ranked: verdict, fewer failing checks, stronger weakest link. */
  private static final Comparator<Judged> BEST_FIRST =
      Comparator.comparing(Judged::verdict)
          .thenComparingInt(Judged::failing)
          .thenComparing(Comparator.comparingDouble(Judged::standing).reversed());

  /** The first rung that is missed; null: none. */
  public Step firstMiss() {
    return steps.stream().filter(Step::firstMiss).findFirst().orElse(null);
  }

  /** The ladder of a ranked setup; a setup on its own is pointed at by its rank. */
  public static Ladder ofSetup(Site site, Judged judged, String pointed) {
    List<Step> steps = new ArrayList<>();
    boolean missed = false;
    for (Rung r : Rung.values()) {
      Step s = step(site, judged, r, pointed, missed);
      missed |= !s.kept();
      steps.add(s);
    }
    return new Ladder(
        pointed, judged.setup(), judged.verdict(), steps, sentence(pointed, judged, steps, site));
  }

  /**
   * The ladder of what somebody points at: an anchor, a spot, or a lay in degrees.
   *
   * @throws IllegalArgumentException one sentence, where there is no such thing or no setup uses it
   */
  public static Ladder of(Site site, PullSources sources, Plan plan, String pointed) {
    Judge judge = new Judge(site, sources);
    boolean place = site.anchor(pointed).isPresent() || site.spot(pointed).isPresent();
    Judged best = place ? using(plan, pointed, judge) : onLay(plan, lay(site, pointed), judge);
    return ofSetup(site, best, pointed);
  }

  private static Judged using(Plan plan, String id, Judge judge) {
    return plan.ranked().stream()
        .filter(j -> Uses.of(j.setup()).contains(id))
        .findFirst()
        .map(j -> judge.judge(j.setup()))
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    plan.ranked().size() < Plan.MOST_WAYS
                        ? id
                            + " is in no setup: no source of the gear lists it among its places, and"
                            + " no redirect block can be there"
                        : id + " is in none of the best " + Plan.MOST_WAYS + " setups"));
  }

  private static Judged onLay(Plan plan, double lay, Judge judge) {
    return plan.ranked().stream()
        .map(j -> judge.quick(j.setup().withLay(lay)))
        .min(BEST_FIRST)
        .map(j -> judge.judge(j.setup()))
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "the plan has no setup; nothing on the site can pull"));
  }

  private static double lay(Site site, String pointed) {
    try {
      double lay = Double.parseDouble(pointed);
      if (lay >= 0 && lay <= 360) {
        return lay % 360;
      }
    } catch (NumberFormatException e) {
      // neither a place nor a number: said below
    }
    List<String> known =
        Stream.concat(
                site.anchors().stream().map(a -> a.id()), site.spots().stream().map(s -> s.id()))
            .toList();
    throw new IllegalArgumentException(
        "\""
            + pointed
            + "\" is no anchor or spot of the site ("
            + String.join(", ", known)
            + ") and no lay from 0 to 360 degrees");
  }

  private static Step step(Site site, Judged judged, Rung rung, String pointed, boolean missed) {
    Check worst =
        judged.checks().stream()
            .filter(c -> Rung.of(c.id()) == rung)
            .min(
                Comparator.comparing(Check::verdict)
                    .reversed()
                    .thenComparingDouble(c -> Double.isNaN(c.ratio()) ? -1 : c.ratio())
                    .thenComparing(c -> !c.id().endsWith(" " + pointed)))
            .orElse(null);
    Position at =
        worst == null || worst.place() == null ? place(site, judged, rung) : worst.place();
    boolean refused = rung == Rung.ANCHOR && refused(judged);
    if (worst == null || refused) {
      return new Step(
          rung,
          refused ? Verdict.NOT_WORKABLE : Verdict.WORKABLE,
          null,
          refused ? 0 : Double.NaN,
          Double.NaN,
          "",
          refused ? 0 : Double.POSITIVE_INFINITY,
          at,
          nothing(site, judged, rung, refused, pointed),
          refused && !missed);
    }
    boolean kept = worst.verdict().compareTo(Verdict.TIGHT) <= 0;
    return new Step(
        rung,
        worst.verdict(),
        worst.id(),
        worst.value(),
        worst.limit(),
        worst.unit(),
        worst.ratio(),
        at,
        worst.why() + (rung == Rung.USABLE ? land(site, pointed) : ""),
        !kept && !missed);
  }

  private static boolean refused(Judged judged) {
    return judged.checks().stream()
        .anyMatch(c -> c.id().startsWith("usable ") && c.verdict() == Verdict.NOT_WORKABLE);
  }

  private static String nothing(
      Site site, Judged judged, Rung rung, boolean refused, String pointed) {
    return switch (rung) {
      case USABLE -> "No anchor bears anything here." + land(site, pointed);
      case LAY -> "No target, drop zone or overhead line bears on this lay.";
      case LINE -> "Nothing stands near enough to the line to be listed.";
      case ANCHOR ->
          refused ? "A refused anchor holds nothing." : "No anchor is used, so none must hold.";
      default -> "Nothing is asked here.";
    };
  }

  /** Whose land a place is on, as a further sentence; nothing for what is no place. */
  private static String land(Site site, String id) {
    String land =
        site.anchor(id)
            .map(a -> String.valueOf(a.land()))
            .or(() -> site.spot(id).map(s -> String.valueOf(s.land())))
            .orElse("");
    return switch (land) {
      case "" -> "";
      case "null" -> " Nobody has said whose land it is on: ask.";
      default -> " Land: " + land + ".";
    };
  }

  private static Position place(Site site, Judged judged, Rung rung) {
    if (rung == Rung.LAY || rung == Rung.PEOPLE) {
      return site.tree().stump().at();
    }
    String id = judged.setup().place();
    return site.anchor(id)
        .map(a -> a.place())
        .or(() -> site.spot(id).map(s -> s.place()))
        .map(Place::at)
        .orElse(null);
  }

  private static String sentence(String pointed, Judged judged, List<Step> steps, Site site) {
    String what =
        Uses.words(judged.setup())
            + String.format(Locale.ROOT, ", lay %05.1f°", judged.setup().layDeg());
    boolean place = site.anchor(pointed).isPresent() || site.spot(pointed).isPresent();
    String of = place ? "the best setup that uses " + pointed + " is " + what : what;
    return Character.toUpperCase(of.charAt(0))
        + of.substring(1)
        + ": "
        + judged.verdict().word()
        + steps.stream()
            .filter(Step::firstMiss)
            .findFirst()
            .map(s -> ", first stopped by \"" + s.rung().word() + "\"")
            .orElse("")
        + ".";
  }
}
