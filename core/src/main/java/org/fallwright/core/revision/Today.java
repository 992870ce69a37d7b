package org.fallwright.core.revision;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.fallwright.core.advice.LineHeightRange;
import org.fallwright.core.answers.FigureRow;
import org.fallwright.core.change.DayOf;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Revision;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Wetness;
import org.fallwright.core.units.DisplayUnits;

/**
 * A setup as it is set today: judged at once, old beside new.
 *
 * @param letter letter that its revision will have
 * @param before as planned, or as last set
 * @param after as set now
 * @param rows every figure that reads otherwise
 * @param changed what changed, a sentence each
 * @param worse whether the verdict is worse and must be accepted by name
 * @param ground ground as found, from now or from a revision before; null: as entered
 * @param gustMps gust as found, likewise
 */
public record Today(
    String letter,
    Judged before,
    Judged after,
    List<FigureRow> rows,
    List<String> changed,
    boolean worse,
    Wetness ground,
    Quantity gustMps) {
  public Today {
    rows = List.copyOf(rows);
    changed = List.copyOf(changed);
  }

  /** From a setup of the plan. */
  public static Today ofPlanned(Site site, PullSources sources, Setup setup, Found found) {
    return of(site, sources, setup, null, null, found);
  }

  /**
   * From the last revision.
   *
   * @throws IllegalArgumentException one sentence, where there is none
   */
  public static Today ofLast(Site site, PullSources sources, Found found) {
    if (site.revisions().isEmpty()) {
      throw new IllegalArgumentException("the site has no revision yet; name a setup of the plan");
    }
    Revision last = site.revisions().get(site.revisions().size() - 1);
    return of(site, sources, setup(last.setup()), last.ground(), last.gustMps(), found);
  }

  private static Today of(
      Site site, PullSources sources, Setup was, Wetness ground, Quantity gust, Found found) {
    known(site, was);
    Site then = DayOf.withGust(DayOf.withGround(site, ground), gust);
    Setup set = set(site, sources, was, found);
    Wetness groundNow = found.ground() == null ? ground : found.ground();
    Quantity gustNow = found.gustMps() == null ? gust : Quantity.estimated(found.gustMps());
    Site now = DayOf.withGust(DayOf.withGround(site, groundNow), gustNow);
    Judge old = new Judge(then, sources);
    Judge fresh = new Judge(now, sources);
    Judged before = old.judge(was);
    Judged after = fresh.judge(set);
    DisplayUnits in = site.display().units();
    return new Today(
        letter(site.revisions().size() + 1),
        before,
        after,
        FigureRow.differing(in, old, before, fresh, after),
        changed(in, then, was, set, found),
        after.verdict().compareTo(before.verdict()) > 0,
        groundNow,
        gustNow);
  }

  /** The gear and places of a revision may be gone since. */
  private static void known(Site site, Setup s) {
    List<String> sources = new ArrayList<>(List.of(s.source()));
    List<String> places = new ArrayList<>(s.redirects());
    places.add(s.place());
    if (s.driver() != null) {
      sources.add(s.driver().source());
      places.add(s.driver().place());
    }
    String gone =
        sources.stream()
            .filter(id -> site.source(id).isEmpty())
            .findFirst()
            .or(
                () ->
                    places.stream()
                        .filter(id -> site.anchor(id).isEmpty() && site.spot(id).isEmpty())
                        .findFirst())
            .or(
                () ->
                    site.gear().lines().stream().noneMatch(l -> l.id().equals(s.line()))
                        ? Optional.of(s.line())
                        : Optional.empty())
            .orElse(null);
    if (gone != null) {
      throw new IllegalArgumentException(
          "the setup uses \""
              + gone
              + "\", which is no longer on the site; name a setup of the plan");
    }
  }

  private static Setup set(Site site, PullSources sources, Setup was, Found found) {
    Setup s = was;
    if (found.lineAtM() != null) {
      LineHeightRange.Stem stem = LineHeightRange.Stem.of(site);
      if (!stem.takes(found.lineAtM())) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "line-at is %s m; on this stem it must be more than %.2f m and at most %.2f m: %s",
                found.lineAtM(),
                stem.lowestM(),
                stem.highestM(),
                stem.reason()));
      }
      s = s.withAttachHeight(found.lineAtM());
    }
    if (found.line() != null) {
      s = s.withLine(line(site, found.line()));
    }
    if (found.at() != null) {
      s = s.withPlace(place(site, sources, s.source(), found.at()));
    }
    if (found.redirect() != null) {
      s = s.withRedirects(redirect(site, found.redirect()));
    }
    return s;
  }

  private static String line(Site site, String id) {
    return site.gear().lines().stream()
        .filter(l -> l.id().equals(id) && l.pullLine())
        .map(Gear.Line::id)
        .findFirst()
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "line is \"" + id + "\"; no pull line of that name is in the gear"));
  }

  private static String place(Site site, PullSources sources, String source, String id) {
    boolean spot = site.spot(id).isPresent();
    if (!spot && site.anchor(id).isEmpty()) {
      throw new IllegalArgumentException(
          "at is \"" + id + "\"; no anchor or spot of that name is on the site");
    }
    PullSource kind = sources.byId(site.source(source).orElseThrow().plugin()).orElseThrow();
    if (!kind.describe().places().contains(spot ? PlaceKind.SPOT : PlaceKind.ANCHOR)) {
      throw new IllegalArgumentException(
          source + " cannot be at \"" + id + "\"; it needs " + (spot ? "an anchor" : "a spot"));
    }
    return id;
  }

  private static List<String> redirect(Site site, String id) {
    if (id.equals(Found.NONE)) {
      return List.of();
    }
    if (site.anchor(id).isEmpty()) {
      throw new IllegalArgumentException(
          "redirect is \"" + id + "\"; no anchor of that name is on the site");
    }
    if (site.gear().blocks().isEmpty()) {
      throw new IllegalArgumentException(
          "redirect is \"" + id + "\", but there is no block in the gear");
    }
    return List.of(id);
  }

  private static List<String> changed(
      DisplayUnits in, Site then, Setup was, Setup set, Found found) {
    List<String> all = new ArrayList<>();
    say(all, "line at", in.length(was.attachHeightM()), in.length(set.attachHeightM()));
    say(all, "line", was.line(), set.line());
    say(all, was.source() + " at", was.place(), set.place());
    say(all, "redirect at", words(was.redirects()), words(set.redirects()));
    if (found.ground() != null) {
      all.add("ground " + found.ground().name().toLowerCase(Locale.ROOT));
    }
    if (found.gustMps() != null) {
      say(all, "gust", in.speed(then.conditions().gustMps().value()), in.speed(found.gustMps()));
    }
    return all;
  }

  private static void say(List<String> all, String what, String was, String now) {
    if (!was.equals(now)) {
      all.add(what + " " + now + ", was " + was);
    }
  }

  private static String words(List<String> redirects) {
    return redirects.isEmpty() ? Found.NONE : String.join(" and ", redirects);
  }

  /**
   * The revision to be recorded.
   *
   * @param at date and time as the person gives them
   * @param acceptedBy who accepts a worse verdict; null where it is not worse
   * @throws IllegalArgumentException one sentence, where a worse verdict is accepted by nobody
   */
  public Revision revision(Site site, String at, String acceptedBy) {
    boolean nobody = acceptedBy == null || acceptedBy.isBlank();
    if (worse && nobody) {
      throw new IllegalArgumentException(
          "the verdict is worse, "
              + after.verdict().word()
              + " and was "
              + before.verdict().word()
              + "; somebody must accept it by name before it is recorded");
    }
    Revision.AsSet set = asSet(after.setup());
    String word =
        CheckWord.of(
            String.join(
                "\n",
                site.name(),
                letter,
                set.toString(),
                String.valueOf(ground),
                String.valueOf(gustMps),
                after.sentence(),
                after.figures().toString(),
                at,
                String.valueOf(acceptedBy)));
    return new Revision(
        letter,
        at,
        word,
        set,
        ground,
        gustMps,
        changed,
        after.verdict().word(),
        nobody ? null : acceptedBy);
  }

  /** The site with a revision behind those that it has; nothing else of it changes. */
  public static Site recorded(Site site, Revision revision) {
    List<Revision> all = new ArrayList<>(site.revisions());
    all.add(revision);
    return Copy.with(site, "revisions", all);
  }

  /** Whether the setup may still be pulled: workable or tight. */
  public boolean works() {
    return after.verdict().compareTo(Verdict.TIGHT) <= 0;
  }

  /** The letter of the revision after so many: A is the plan, B the first, AA follows Z. */
  static String letter(int revisions) {
    StringBuilder letters = new StringBuilder();
    for (int n = revisions; n >= 0; n = n / 26 - 1) {
      letters.insert(0, (char) ('A' + n % 26));
    }
    return letters.toString();
  }

  private static Revision.AsSet asSet(Setup s) {
    Setup.Driver d = s.driver();
    return new Revision.AsSet(
        s.layDeg(),
        s.attachHeightM(),
        s.hingeThicknessM(),
        s.line(),
        s.redirects(),
        s.source(),
        s.mode(),
        s.place(),
        d == null ? null : new Revision.Driver(d.source(), d.mode(), d.place()));
  }

  private static Setup setup(Revision.AsSet s) {
    Revision.Driver d = s.driver();
    return new Setup(
        s.layDeg(),
        s.attachHeightM(),
        s.hingeThicknessM(),
        s.line(),
        s.blocks(),
        s.source(),
        s.sourceMode(),
        s.sourceAt(),
        d == null ? null : new Setup.Driver(d.source(), d.sourceMode(), d.sourceAt()));
  }
}
