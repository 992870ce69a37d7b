package org.fallwright.ui.bench;

import java.util.concurrent.TimeUnit;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.MarginMap;
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

/** The margin map of the demo's row 4: 200 m square, cells of one metre. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
public class MarginMapBenchmark {
  private final Site site = DemoSite.asItIs().site();

  @Benchmark
  public MarginMap map() {
    return MarginMap.of(new Judge(site, DemoSite.sources()), DemoSite.ROW_4, 100, 1);
  }
}
