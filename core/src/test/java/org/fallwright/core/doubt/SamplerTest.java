package org.fallwright.core.doubt;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.fallwright.core.advice.TinySite;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.statics.Trial;
import org.fallwright.core.tree.TreeFigures;
import org.junit.jupiter.api.Test;

class SamplerTest {
  private static final double[][] MIDDLE = middle();

  private static double[][] middle() {
    double[][] points = new double[Input.values().length][1];
    for (double[] p : points) {
      Arrays.fill(p, 0.5);
    }
    return points;
  }

  private static Site derived() {
    TinySite t = new TinySite();
    t.massKg = null;
    return t.site();
  }

  private static Site with(Site site, String component, Object value) {
    return Copy.with(site, "tree", Copy.with(site.tree(), component, value));
  }

  private static double at(List<Trial> trials, double share, ToDoubleFunction<Trial> f) {
    double[] all = trials.stream().mapToDouble(f).sorted().toArray();
    return Ranks.percentile(all, share);
  }

  @Test
  void inTheMiddleOfEverythingStandsTheTreeAsEntered() {
    for (Site site : List.of(new TinySite().site(), derived())) {
      Trial t = new Sampler(site, MIDDLE).trials().get(0);
      TreeFigures f =
          TreeFigures.of(site.tree(), site.cut(), SpeciesTable.of(site.tree().species()));
      assertThat(t.massKg()).isCloseTo(f.massKg(), within(1e-6));
      assertThat(t.massCentreM()).isCloseTo(f.massCentreM() - site.cut().heightM(), within(1e-9));
      assertThat(t.stumpDiameterM()).isCloseTo(f.stumpDiameterM(), within(1e-9));
      assertThat(t.leanDeg()).isCloseTo(site.tree().leanDeg().value(), within(1e-9));
      assertThat(t.windFactor()).isCloseTo(1, within(1e-9));
      assertThat(t.hingeFactor()).isCloseTo(1.25, within(1e-9));
      assertThat(t.attachSds()).isCloseTo(0, within(1e-9));
    }
  }

  /** The 95th percentile of a normal quantity stands 1.645 standard deviations above its mean. */
  @Test
  void anEnteredMassIsSpreadAsItWasGot() {
    Site site = with(new TinySite().site(), "massKg", Quantity.estimated(2000));
    List<Trial> trials = new Sampler(site).trials();
    assertThat(at(trials, 0.95, Trial::massKg)).isCloseTo(2000 * (1 + 1.645 * 0.15), within(3.0));
    assertThat(at(trials, 0.05, Trial::massKg)).isCloseTo(2000 * (1 - 1.645 * 0.15), within(3.0));
    assertThat(at(trials, 1, Trial::massKg)).isCloseTo(2000 * (1 + 2.5 * 0.15), within(1e-6));
  }

  @Test
  void aRangeIsEvenFromEndToEnd() {
    Site site = with(new TinySite().site(), "leanDeg", Quantity.range(3, 7));
    List<Trial> trials = new Sampler(site).trials();
    assertThat(at(trials, 0, Trial::leanDeg)).isBetween(3.0, 3.01);
    assertThat(at(trials, 0.25, Trial::leanDeg)).isCloseTo(4, within(0.01));
    assertThat(at(trials, 1, Trial::leanDeg)).isBetween(6.99, 7.0);
  }

  /** A derived mass goes with the diameter: Jenkins' slope for its group is near 2.4. */
  @Test
  void aDerivedMassGoesWithTheDiameterItIsFrom() {
    Site site = derived();
    Sampler sampler = new Sampler(site);
    double dbh = site.tree().dbhM().value();
    double more = 0.1 * dbh / sampler.may(Input.DBH).spread();
    double as = sampler.trials(Otherwise.known(Input.DBH, 0)).get(7).massKg();
    double thicker = sampler.trials(Otherwise.known(Input.DBH, more)).get(7).massKg();
    assertThat(Math.log(thicker / as) / Math.log(1.1)).isBetween(2.2, 2.7);
  }

  @Test
  void nothingThatCannotBeIsDrawn() {
    Site site =
        with(
            with(
                new TinySite().site(),
                "massKg",
                new Quantity(2000, Quantity.measured(1).how(), 5000.0)),
            "heightM",
            new Quantity(
                new TinySite().site().tree().heightM().value(), Quantity.measured(1).how(), 30.0));
    for (Trial t : new Sampler(site).trials()) {
      assertThat(t.massKg()).isGreaterThanOrEqualTo(200);
      assertThat(t.windFactor()).isPositive();
    }
  }
}
