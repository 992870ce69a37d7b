package org.fallwright.core.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceFault;
import org.fallwright.core.site.Site;
import org.fallwright.core.worksheet.Worksheets;
import org.junit.jupiter.api.Test;

/** A source that gives way itself makes the line softer; one that comes to an end is checked. */
class SoftSourceTest {
  private static final Site SITE = TinySite.site(2000);

  private record Soft(ToDoubleFunction<PullRequest> stiffness, Double mostM) implements PullSource {
    @Override
    public SourceDescription describe() {
      return new TinySite.Steady().describe();
    }

    @Override
    public List<String> modes(ObjectNode parameters) {
      return List.of("pull");
    }

    @Override
    public PullOffer offer(PullRequest request) {
      return PullOffer.giving(2000, 2000, new TinySite.Steady().offer(request).limit())
          .holds(2000, true)
          .stiffness(stiffness.applyAsDouble(request))
          .travel(1, mostM)
          .done();
    }
  }

  private static final Setup SETUP =
      new Setup(
          0, 6, 0.03, SITE.gear().lines().get(0).id(), List.of(), "steady", "pull", "R1", null);

  private static Reckoned reckon(PullSource source) {
    return new Judge(SITE, () -> List.of(source)).reckon(SETUP);
  }

  @Test
  void itsGiveAddsToTheLines() {
    double rigid = reckon(new TinySite.Steady()).statics().treeSide().lineNPerM();
    Reckoned soft = reckon(new Soft(r -> 5000, null));
    double k = soft.statics().treeSide().lineNPerM();
    assertThat(k).isCloseTo(1 / (1 / rigid + 1 / 5000.0), within(1e-6));
    assertThat(soft.judged().figures().takeUpM())
        .isGreaterThan(reckon(new TinySite.Steady()).judged().figures().takeUpM());
  }

  @Test
  void theSourceIsAskedWithItsOwnGiveIn() {
    double[] last = new double[1];
    Reckoned soft =
        reckon(
            new Soft(
                r -> {
                  last[0] = r.pull().pathStiffness();
                  return 5000;
                },
                null));
    assertThat(last[0]).isEqualTo(soft.statics().treeSide().pathNPerM());
  }

  @Test
  void theWorksheetWorksItToo() {
    assertThat(Worksheets.of(SITE, SETUP, () -> List.of(new Soft(r -> 5000, null))).toString())
        .contains("stiffness of the source itself");
  }

  @Test
  void aStiffnessThatHangsOnTheLinesIsAFault() {
    assertThatExceptionOfType(SourceFault.class)
        .isThrownBy(() -> reckon(new Soft(r -> r.pull().pathStiffness(), null)))
        .withMessageContaining("changes its own stiffness");
  }

  @Test
  void whatItCanTakeInIsChecked() {
    Judged enough = reckon(new Soft(r -> 5000, 50.0)).judged();
    Judged tooLittle = reckon(new Soft(r -> 5000, 0.01)).judged();
    assertThat(enough.checks())
        .filteredOn(c -> c.id().equals("take-up of the source"))
        .singleElement()
        .matches(c -> c.verdict() == Verdict.WORKABLE);
    assertThat(tooLittle.checks())
        .filteredOn(c -> c.id().equals("take-up of the source"))
        .singleElement()
        .matches(c -> c.verdict() == Verdict.NOT_WORKABLE);
  }
}
