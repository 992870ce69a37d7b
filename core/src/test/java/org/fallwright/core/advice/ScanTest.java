package org.fallwright.core.advice;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Verdict;
import org.junit.jupiter.api.Test;

class ScanTest {
  private static Judged of(Verdict v, double standing, String check) {
    Check c = new Check(check, 0, 0, "", standing, v, null, "");
    return new Judged(
        null, v, c, standing, List.of(), 0, "", null, List.of(), List.of(), List.of(), List.of(),
        null, List.of());
  }

  /** Good between two settings; the nearer the middle, the better. */
  private static DoubleFunction<Judged> between(double low, double high) {
    return x ->
        x < low
            ? of(Verdict.NOT_WORKABLE, x - low, "too low")
            : x > high
                ? of(Verdict.NOT_WORKABLE, high - x, "too high")
                : of(Verdict.WORKABLE, 1 + Math.min(x - low, high - x), "fine");
  }

  private static Scan scan(int stride, DoubleFunction<Judged> judge) {
    return new Scan(0.5, "m", 0, 100, stride, judge);
  }

  @Test
  void anEndIsTheLastStepThatPassesAndNamesWhatStopsTheNext() {
    Span s = scan(10, between(7.3, 31.9)).run(20, Verdict.TIGHT).orElseThrow();
    assertThat(s.lowest()).isEqualTo(7.5);
    assertThat(s.highest()).isEqualTo(31.5);
    assertThat(s.below().id()).isEqualTo("too low");
    assertThat(s.above().id()).isEqualTo("too high");
  }

  @Test
  void anEndThatIsWhereTheLookingEndsNamesNothing() {
    Span s = scan(10, between(-1, 60)).run(20, Verdict.TIGHT).orElseThrow();
    assertThat(s).isEqualTo(new Span(0, 50, "m", null, null));
  }

  @Test
  void whereThePlannedSettingFailsTheBestRunIsTaken() {
    Span s = scan(10, between(12, 22)).run(48, Verdict.WORKABLE).orElseThrow();
    assertThat(s.lowest()).isEqualTo(12);
    assertThat(s.highest()).isEqualTo(22);
    assertThat(s.holds(48)).isFalse();
  }

  @Test
  void nothingGoodIsNoRun() {
    assertThat(scan(10, between(60, 70)).run(20, Verdict.TIGHT)).isEqualTo(Optional.empty());
  }

  @Test
  void tightIsNotWorkable() {
    DoubleFunction<Judged> tight = x -> of(Verdict.TIGHT, 0.9, "pull");
    assertThat(scan(10, tight).run(20, Verdict.WORKABLE)).isEmpty();
    assertThat(scan(10, tight).run(20, Verdict.TIGHT)).isPresent();
  }

  @Test
  void ofEqualsTheOneNearestToThePlannedIsTheBest() {
    Scan flat = scan(1, x -> of(Verdict.WORKABLE, 1, "same"));
    assertThat(flat.setting(flat.best(17.2))).isEqualTo(17);
  }
}
