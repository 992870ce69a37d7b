package org.fallwright.core.answers;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Collectors;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Spreads;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Entry;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Looked;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.site.Strip;
import org.fallwright.core.site.Wire;
import org.fallwright.core.units.DisplayUnits;

/**
 * What is still open on a site, ranked by what it decides: how many of the leading setups have
 * another verdict at the one end of an answer than at the other.
 *
 * <p>The ends: of a range its ends; of an estimate, a guess or what nobody knows its 5th and 95th
 * percentile; of a voltage the lowest and the highest class; of a place whose owner nobody named,
 * yes and no; of what nobody looked for, nothing found and nothing known. All else stays as
 * entered, and what is not known stands at its stand-in, so that one question is weighed at a time.
 *
 * @param setups how many leading setups were looked at
 * @param questions the questions, what decides most first
 */
public record Questions(int setups, List<Question> questions) {
  /** How many leading setups are looked at. */
  public static final int LEADING = 10;

  private static final double LOW_KV = 0.4;
  private static final double HIGH_KV = 345;

  /**
   * One question.
   *
   * @param about the field or thing that it is about
   * @param text the question
   * @param decides how many of the leading setups change their verdict with the answer
   * @param stops whether nothing can be judged before it is answered
   */
  public record Question(String about, String text, int decides, boolean stops) {}

  public Questions {
    questions = List.copyOf(questions);
  }

  /** The questions of a planned site. */
  public static Questions of(Site site, PullSources sources, Plan plan) {
    List<Setup> setups = plan.ranked().stream().limit(LEADING).map(Judged::setup).toList();
    Asked asked = new Asked(known(site), sources, setups);
    List<Question> all = new ArrayList<>();
    for (Looked.What what : List.of(Looked.What.WIRES, Looked.What.PEOPLE_INDOORS)) {
      if (site.found(what) == Looked.Found.NOT_LOOKED) {
        String text =
            what == Looked.What.WIRES
                ? "Are there wires within two tree lengths? Look, and say none or draw them."
                : "Who is indoors? Ask at every door, and say so.";
        all.add(new Question("looked." + word(what), text, asked.judgeable(), true));
      }
    }
    for (Wire w : site.wires()) {
      if (w.voltageKv() == null) {
        all.add(
            new Question(
                "wires." + w.id(),
                "What voltage does " + w.id() + " carry? Ask its owner.",
                asked.differ(s -> volts(s, w.id(), LOW_KV), s -> volts(s, w.id(), HIGH_KV)),
                true));
      }
    }
    for (Entry e : Entry.of(site)) {
      if (e.quantity().how() != How.MEASURED) {
        all.add(quantity(e, asked));
      }
    }
    places(site, asked, all);
    all.sort(Comparator.comparing(Question::stops).thenComparing(Question::decides).reversed());
    return new Questions(setups.size(), all);
  }

  private static Question quantity(Entry e, Asked asked) {
    double[] ends = ends(e, asked.site.tree().heightM().value());
    return new Question(
        e.field(),
        "What is the "
            + e.name()
            + " really: "
            + shown(asked.site, e, ends[0])
            + " or "
            + shown(asked.site, e, ends[1])
            + "?",
        asked.differ(s -> at(e, s, ends[0]), s -> at(e, s, ends[1])),
        e.quantity().how() == How.UNKNOWN);
  }

  private static String shown(Site site, Entry e, double value) {
    DisplayUnits in = site.display().units();
    return switch (e.unit()) {
      case "deg" -> in.angle(Math.toRadians(value));
      case "kg" -> in.mass(value);
      case "m/s" -> in.speed(value);
      default ->
          e.component().startsWith("dbh") || e.component().startsWith("stump")
              ? in.smallLength(value)
              : in.length(value);
    };
  }

  private static void places(Site site, Asked asked, List<Question> all) {
    for (Anchor a : site.anchors()) {
      if (a.land() == null && a.rejected() == null) {
        all.add(
            new Question(
                "anchors." + a.id(),
                "Whose land is " + a.id() + " on, and may it be used?",
                asked.differ(s -> s, s -> refused(s, a.id())),
                false));
      }
    }
    for (Spot s : site.spots()) {
      if (s.land() == null) {
        all.add(
            new Question(
                "spots." + s.id(),
                "Whose land is " + s.id() + " on, and may it be used?",
                asked.using(Set.of(s.id())),
                false));
      }
    }
    for (Strip s : site.strips()) {
      if (s.land() == null) {
        all.add(
            new Question(
                "strips." + s.id(),
                "Whose land is " + s.id() + " on, and may it be used?",
                asked.using(
                    s.places(site.tree().stump().at()).stream()
                        .map(Spot::id)
                        .collect(Collectors.toSet())),
                false));
      }
    }
  }

  /** The site with every open question answered for the time being, so that it can be judged. */
  private static Site known(Site site) {
    Site s = site;
    for (Wire w : site.wires()) {
      if (w.voltageKv() == null) {
        s = volts(s, w.id(), HIGH_KV);
      }
    }
    List<Looked> looked = new ArrayList<>();
    for (Looked.What what : Looked.What.values()) {
      looked.add(new Looked(what, Looked.Found.NONE, "to be asked"));
    }
    s = Copy.with(s, "looked", looked);
    for (Entry e : Entry.of(site)) {
      if (e.quantity().how() == How.UNKNOWN) {
        s = e.put(s, new Quantity(e.quantity().value(), How.GUESSED, e.quantity().plusMinus()));
      }
    }
    return s;
  }

  private static Site volts(Site s, String wire, double kv) {
    return s.withWires(
        s.wires().stream()
            .map(w -> w.id().equals(wire) ? Copy.with(w, "voltageKv", kv) : w)
            .toList());
  }

  private static Site refused(Site s, String anchor) {
    List<Anchor> anchors = new ArrayList<>();
    for (Anchor a : s.anchors()) {
      anchors.add(
          a.id().equals(anchor)
              ? (Anchor) Copy.with((Record) a, "rejected", "its owner has not agreed")
              : a);
    }
    return Copy.with(s, "anchors", anchors);
  }

  private static Site at(Entry e, Site s, double end) {
    try {
      return e.put(s, Quantity.measured(end));
    } catch (IllegalArgumentException beyond) {
      // the tail of a spread may lie where no site can: the value itself is the end then
      return e.put(s, Quantity.measured(e.quantity().value()));
    }
  }

  /** Both ends of what a quantity may be. */
  private static double[] ends(Entry e, double heightM) {
    Quantity q = e.quantity();
    if (q.how() == How.RANGE) {
      return new double[] {q.low(), q.high()};
    }
    double sd =
        switch (e.component()) {
          case "dbhM" -> Spreads.of(Spreads.What.DBH, q);
          case "stumpDiameterM" -> Spreads.of(Spreads.What.STUMP_DIAMETER, q);
          case "heightM" -> Spreads.of(Spreads.What.HEIGHT, q);
          case "leanDeg" -> Spreads.of(Spreads.What.LEAN, q);
          case "leanAzimuthDeg" -> Spreads.of(Spreads.What.LEAN_AZIMUTH, q);
          case "massKg" -> Spreads.of(Spreads.What.MASS, q);
          case "massCentreM" -> Spreads.massCentreM(q, heightM);
          default -> Spreads.of(Spreads.What.GUST, q);
        };
    double far = Allowances.PERCENTILE_SDS.value() * sd;
    boolean azimuth = e.component().equals("leanAzimuthDeg");
    double low = azimuth ? (q.value() - far + 360) % 360 : Math.max(0, q.value() - far);
    return new double[] {low, azimuth ? (q.value() + far) % 360 : q.value() + far};
  }

  private static String word(Looked.What what) {
    return what.name().toLowerCase(Locale.ROOT).replace('_', '-');
  }

  /** The leading setups on the site as it may turn out. */
  private record Asked(Site site, PullSources sources, List<Setup> setups) {
    int differ(
        java.util.function.UnaryOperator<Site> one, java.util.function.UnaryOperator<Site> other) {
      Judge a = new Judge(one.apply(site), sources);
      Judge b = new Judge(other.apply(site), sources);
      return (int)
          setups.stream().filter(s -> a.quick(s).verdict() != b.quick(s).verdict()).count();
    }

    /** Setups that anything could still come of once it is known. */
    int judgeable() {
      Judge judge = new Judge(site, sources);
      return (int)
          setups.stream()
              .filter(s -> judge.quick(s).verdict().compareTo(Verdict.TIGHT) <= 0)
              .count();
    }

    /** Setups that use a place and would do. */
    int using(Set<String> ids) {
      Judge judge = new Judge(site, sources);
      return (int)
          setups.stream()
              .filter(s -> Uses.of(s).stream().anyMatch(ids::contains))
              .filter(s -> judge.quick(s).verdict().compareTo(Verdict.TIGHT) <= 0)
              .count();
    }
  }
}
