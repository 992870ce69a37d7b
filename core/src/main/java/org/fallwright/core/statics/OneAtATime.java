package org.fallwright.core.statics;

import java.util.Arrays;
import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Spreads;

/**
 * 95th and 5th percentile of a signed quantity, one input at a time.
 *
 * <p>95th percentile = the value with every input at its mean + √Σd², where d is the greater rise,
 * if any, when that one input alone is put at its 5th or at its 95th percentile (mean ∓ 1.645
 * standard deviations). 5th percentile = the value − √Σd² of the greater falls. The hinge factor is
 * uniform from 1 to 1.5: mean 1.25, 1.025 and 1.475. A first-order figure; sampling decides for the
 * leading setups where it is done.
 */
final class OneAtATime implements Percentiles {
  /** Standard deviations from the mean to the 95th percentile of a normal quantity. */
  static final double Z = Allowances.PERCENTILE_SDS.value();

  private static final double DRAG_SD = Allowances.DRAG_SD.value();
  private static final double LEAST_GUST_SD = Spreads.GUST_LEAST_SD.value();
  private static final double K_MEAN = Allowances.HINGE_K_MEAN.value();
  private static final double K_5 = Allowances.HINGE_K_P05.value();
  private static final double K_95 = Allowances.HINGE_K_P95.value();

  final Posture mean;
  private final Posture[] low = new Posture[Draw.COUNT];
  private final Posture[] high = new Posture[Draw.COUNT];

  OneAtATime(PullCase c) {
    Spread s = c.spread();
    Draw n = Draw.nominal(c);
    double gust = Math.max(WindMoment.LEAST_GUST, n.gustMps());
    Draw m = n.with(4, K_MEAN).with(8, gust);
    mean = new Posture(c, m);
    double[] sd = {
      s.massRel() * n.massKg(),
      s.massCentreM(),
      s.leanDeg(),
      s.azimuthDeg(),
      0,
      s.morCv() * n.morPa(),
      s.thicknessRel() * n.thicknessM(),
      s.diameterRel() * n.stumpDiameterM(),
      Math.max(LEAST_GUST_SD, s.windRel() * gust),
      DRAG_SD,
      s.attachM(),
      s.bearingM()
    };
    for (int i = 0; i < Draw.COUNT; i++) {
      double lo = i == 4 ? K_5 : m.get(i) - Z * sd[i];
      double hi = i == 4 ? K_95 : m.get(i) + Z * sd[i];
      low[i] = lo == m.get(i) ? mean : new Posture(c, m.with(i, lo), mean);
      high[i] = hi == m.get(i) ? mean : new Posture(c, m.with(i, hi), mean);
    }
  }

  /** The tree with each input that has a spread at its low and its high end. */
  List<Posture[]> ends() {
    return IntStream.range(0, Draw.COUNT)
        .filter(i -> low[i] != mean || high[i] != mean)
        .mapToObj(i -> new Posture[] {low[i], high[i]})
        .toList();
  }

  @Override
  public double p95(ToDoubleFunction<Posture> f) {
    return edge(f, 1);
  }

  @Override
  public double p5(ToDoubleFunction<Posture> f) {
    return edge(f, -1);
  }

  /** The entered quantities at their means and ends. */
  List<Worked.Input> inputs() {
    return IntStream.range(0, Draw.COUNT)
        .mapToObj(
            i ->
                new Worked.Input(
                    Draw.NAMES[i], mean.draw.get(i), low[i].draw.get(i), high[i].draw.get(i)))
        .toList();
  }

  /** A quantity at the means and at every end. */
  Varied varied(ToDoubleFunction<Posture> f) {
    return new Varied(
        f.applyAsDouble(mean),
        Arrays.stream(low).map(f::applyAsDouble).toList(),
        Arrays.stream(high).map(f::applyAsDouble).toList());
  }

  /** Rise of the quantity that each input alone brings, in the order of the draw. */
  double[] rises(ToDoubleFunction<Posture> f) {
    double at = f.applyAsDouble(mean);
    double[] d = new double[Draw.COUNT];
    for (int i = 0; i < Draw.COUNT; i++) {
      d[i] = Math.max(0, Math.max(f.applyAsDouble(low[i]) - at, f.applyAsDouble(high[i]) - at));
    }
    return d;
  }

  private double edge(ToDoubleFunction<Posture> f, int sign) {
    double at = f.applyAsDouble(mean);
    double sum = 0;
    for (int i = 0; i < Draw.COUNT; i++) {
      double d =
          Math.max(
              low[i] == mean ? 0 : sign * (f.applyAsDouble(low[i]) - at),
              high[i] == mean ? 0 : sign * (f.applyAsDouble(high[i]) - at));
      if (d > 0) {
        sum += d * d;
      }
    }
    return at + sign * Math.sqrt(sum);
  }
}
