package org.fallwright.core.doubt;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import java.util.stream.IntStream;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;
import org.fallwright.core.statics.BandPoint;
import org.fallwright.core.statics.EachTrial;
import org.fallwright.core.statics.Statics;
import org.fallwright.core.units.DisplayUnits;

/** Works out the doubt of the setups of one site. Safe for use by several threads. */
public final class Doubts {
  /** A margin is shown to two digits. */
  private static final double SHOWN = 0.005;

  private final Site site;
  private final PullSources sources;
  private final DisplayUnits in;
  private final Sampler sampler;
  private final Judge judge;

  /**
   * @throws IllegalArgumentException one sentence, where the site names what is not known
   */
  public Doubts(Site site, PullSources sources) {
    this.site = site;
    this.sources = sources;
    in = site.display().units();
    sampler = new Sampler(site);
    judge = new Judge(site, sources, sampler.trials());
  }

  /** The setup judged over the trials. */
  public Judged judge(Setup setup) {
    return judge.judge(setup);
  }

  /** The doubt of a setup without telling anybody how far it is. */
  public Doubt of(Setup setup) {
    return of(setup, share -> {}, () -> false);
  }

  /**
   * The doubt of a setup.
   *
   * @param progress told the share that is done, 0 to 1
   * @param cancelled asked often; once it says yes the work stops
   * @throws CancellationException where it was cancelled
   * @throws IllegalArgumentException one sentence, where the tree cannot be moved at all
   */
  public Doubt of(Setup setup, DoubleConsumer progress, BooleanSupplier cancelled) {
    return sources.asking(() -> worked(setup, progress, cancelled));
  }

  /**
   * The doubt of a setup without its bars and its measurements, which take longer; empty where the
   * tree cannot be moved.
   */
  public Optional<Doubt> brief(Setup setup) {
    return sources.asking(
        () -> {
          Reckoned r = judge.reckon(setup);
          return r.ratios() == null ? Optional.empty() : Optional.of(new Work(r).brief());
        });
  }

  private Doubt worked(Setup setup, DoubleConsumer progress, BooleanSupplier cancelled) {
    Reckoned r = judge.reckon(setup);
    if (r.ratios() == null) {
      throw new IllegalArgumentException(
          "this setup cannot move the tree as it is entered, so there is no margin to doubt: "
              + r.judged().weakest().why().replaceFirst("\\.$", ""));
    }
    Work work = new Work(r);
    List<Doubt.Bar> bars = new ArrayList<>();
    List<Doubt.Measure> measure = new ArrayList<>();
    int done = 0;
    for (Doubt.Share share : work.shares) {
      if (cancelled.getAsBoolean()) {
        throw new CancellationException();
      }
      Doubt.Bar bar = work.bar(share.input());
      if (work.moves(bar)) {
        bars.add(bar);
        if (share.input().measurable()) {
          measure.add(work.measure(share.input()));
        }
      }
      progress.accept((double) ++done / work.shares.size());
    }
    measure.sort(Comparator.comparingDouble(Doubt.Measure::poorDayIfHalved).reversed());
    return work.doubt(bars, measure, r.statics().needBand());
  }

  /** 5th percentile of the margin with one input otherwise; null: as entered. */
  double poorDayMargin(Setup setup, Otherwise other) {
    return new Work(judge.reckon(setup)).poorDay(other);
  }

  Sampler sampler() {
    return sampler;
  }

  /** One setup in work. */
  private final class Work {
    private final Reckoned r;
    private final Pull pull;
    private final Words words;
    private final Outcomes outcomes;
    private final double margin;
    private final List<Doubt.Share> shares = new ArrayList<>();

    Work(Reckoned r) {
      this.r = r;
      pull = Pull.of(judge, r.judged().setup(), r);
      words = new Words(in, r, site.tree().stumpDiameterM() == null);
      outcomes = new Outcomes(r, pull, sampler.places(Input.GRIP), site.cut().faceOpeningDeg());
      margin = r.judged().figures().pullMargin();
      weigh();
    }

    private void weigh() {
      double[] ranks = Ranks.of(outcomes.needPerPull());
      double[] squares = new double[Input.values().length];
      double sum = 0;
      for (Input input : Input.values()) {
        if (matters(input)) {
          double c = Ranks.correlation(Ranks.of(sampler.places(input)), ranks);
          squares[input.ordinal()] = c * c < Ranks.NOISE ? 0 : c * c;
          sum += squares[input.ordinal()];
        }
      }
      for (Input input : Input.values()) {
        if (matters(input)) {
          shares.add(new Doubt.Share(input, sum == 0 ? 0 : squares[input.ordinal()] / sum));
        }
      }
      shares.sort(Comparator.comparingDouble(Doubt.Share::share).reversed());
    }

    /** Whether an input is in doubt and has a part in this setup. */
    private boolean matters(Input input) {
      return words.width(input, sampler.may(input)) > 0
          && (input != Input.GRIP || pull.atN(1) > pull.leastN());
    }

    Doubt.Bar bar(Input input) {
      May may = sampler.may(input);
      return new Doubt.Bar(
          input,
          words.value(input, may.at(may.low())),
          words.value(input, may.at(may.high())),
          margin(Otherwise.known(input, may.low())),
          margin(Otherwise.known(input, may.high())));
    }

    /** Whether an input moves the margin by anything that is shown. */
    boolean moves(Doubt.Bar b) {
      return Math.abs(b.marginAtHigh() - b.marginAtLow()) > SHOWN * Math.min(1, margin)
          || Math.max(b.marginAtHigh(), b.marginAtLow()) - margin > SHOWN;
    }

    Doubt.Measure measure(Input input) {
      May may = sampler.may(input);
      double halved = poorDay(Otherwise.halved(input, may.middle()));
      if (input == Input.GRIP) {
        return words.grip(margin, margin(Otherwise.known(input, 1)), halved);
      }
      Words.Step step = words.step(input);
      double off = step.amount() / words.width(input, may);
      double up = margin(Otherwise.entered(input, may.middle() + off));
      double down = margin(Otherwise.entered(input, may.middle() - off));
      return words.measure(
          input,
          margin,
          up <= down ? new Words.Off(step.more(), up) : new Words.Off(step.less(), down),
          halved);
    }

    /** 5th percentile of the margin over all grips. */
    double poorDay(Otherwise other) {
      EachTrial each = new Statics(r.pull(), sampler.trials(other)).eachTrial().orElseThrow();
      double[] margins = new double[each.count()];
      for (int i = 0; i < margins.length; i++) {
        double need = Math.max(0, each.needN(i));
        double gives = pull.atN(sampler.at(Input.GRIP, i, other));
        margins[i] = need == 0 ? Double.POSITIVE_INFINITY : gives / need;
      }
      Arrays.sort(margins);
      return Ranks.percentile(margins, 0.05);
    }

    /** Margin of the verdict were an input otherwise; 0 where the tree could not be moved. */
    private double margin(Otherwise other) {
      if (other.what() == Input.GRIP) {
        // the verdict takes the least grip: only a grip that is known moves it
        return pull.atN(other.at()) / r.judged().figures().pullPlanN();
      }
      double plan = new Statics(r.pull(), sampler.trials(other)).treeSide().planN();
      return plan == 0 ? Double.POSITIVE_INFINITY : Double.isNaN(plan) ? 0 : pull.leastN() / plan;
    }

    Doubt brief() {
      return doubt(List.of(), List.of(), List.of());
    }

    Doubt doubt(List<Doubt.Bar> bars, List<Doubt.Measure> measure, List<BandPoint> curve) {
      double[] sorted = outcomes.margins().clone();
      Arrays.sort(sorted);
      double entered = pull.leastN() / r.judged().figures().pullNeededN();
      return new Doubt(
          r.judged().setup(),
          r.judged().verdict(),
          words.sentence(r.judged().verdict(), outcomes, margin, entered),
          sorted.length,
          outcomes.enough(),
          outcomes.enoughAtLeast(),
          outcomes.neverLetsGo(),
          margin,
          entered,
          Ranks.percentile(sorted, 0.05),
          FirstOrder.compare(r),
          outcomes.fails(),
          outcomes.failsFirst(),
          shares,
          bars,
          measure,
          IntStream.rangeClosed(0, 100).mapToObj(p -> Ranks.percentile(sorted, p / 100.0)).toList(),
          curve);
    }
  }
}
