package org.fallwright.core.statics;

import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** A hundred thousand trials of one setup, with percentiles and without. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(java.util.concurrent.TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 3)
@Measurement(iterations = 5, time = 3)
public class SampledBenchmark {
  private static final int TRIALS = 100_000;

  private final PullCase pull = RandomPulls.next(new Random(3));
  private final List<Trial> trials = trials();

  private List<Trial> trials() {
    Random r = new Random(1);
    return Stream.generate(() -> trial(r)).limit(TRIALS).toList();
  }

  private Trial trial(Random r) {
    return new Trial(
        pull.tree().massKg() * (1 + 0.15 * r.nextGaussian() / 3),
        pull.tree().massCentreM() + 0.1 * r.nextGaussian(),
        pull.tree().leanDeg() + 0.5 * r.nextGaussian(),
        pull.tree().leanAzimuthDeg() + 5 * r.nextGaussian(),
        1 + 0.5 * r.nextDouble(),
        r.nextGaussian(),
        r.nextGaussian(),
        pull.tree().stumpDiameterM() * (1 + 0.02 * r.nextGaussian()),
        Math.max(0, 4 + r.nextGaussian()),
        1,
        r.nextGaussian(),
        r.nextGaussian(),
        pull.tree().crownShift());
  }

  /** The bare loop: every quantity of every trial, nothing kept. */
  @Benchmark
  public double bare() {
    TreeSide side = new Statics(pull).treeSide();
    double working = side.workingN();
    double end = side.endRad();
    double sum = 0;
    for (Trial t : trials) {
      Posture p = new Posture(pull, t.draw(pull), t.crownShift());
      double back = -p.sitBack();
      sum += CommitAngle.unfloored(p) + ForceBalance.need(p, back);
      sum += ForceBalance.hold(p) + ForceBalance.rest(p);
      for (int sign = -1; sign <= 1; sign += 2) {
        for (double tension : new double[] {0, working}) {
          sum += HingeStress.steering(p, back, tension, sign);
          sum += HingeStress.steering(p, end, tension, sign);
        }
        sum += HingeStress.turning(p, back, working, sign, pull.wood().shearPa());
        sum += HingeStress.turning(p, end, working, sign, pull.wood().shearPa());
      }
    }
    return sum;
  }

  /** The same with every percentile. */
  @Benchmark
  public TreeSide sampled() {
    return new Statics(pull, trials).treeSide();
  }
}
