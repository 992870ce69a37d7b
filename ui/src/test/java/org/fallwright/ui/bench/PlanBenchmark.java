package org.fallwright.ui.bench;

import java.util.concurrent.TimeUnit;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** One fully checked setup, and the whole search of the demo site. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
public class PlanBenchmark {
  private final Site site = DemoSite.asItIs().site();
  private final Judge warm = new Judge(site, DemoSite.sources());
  private double lay;

  /** A lay that the judge has not seen: statics, footprint, clearances and every check. */
  @Benchmark
  @Warmup(iterations = 3, time = 2)
  @Measurement(iterations = 5, time = 2)
  public Judged oneSetup() {
    lay = (lay + 0.001) % 360;
    return warm.judge(DemoSite.ROW_6.withLay(lay));
  }

  @Benchmark
  @Warmup(iterations = 2, time = 1)
  @Measurement(iterations = 3, time = 1)
  public Plan demoSearch() {
    return new Planner(DemoSite.sources()).plan(site);
  }
}
