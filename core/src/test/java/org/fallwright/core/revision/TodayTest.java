package org.fallwright.core.revision;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Random;
import org.fallwright.core.advice.SteadyPull;
import org.fallwright.core.advice.TinySite;
import org.fallwright.core.answers.FigureRow;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Revision;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Wetness;
import org.fallwright.core.store.SiteFile;
import org.junit.jupiter.api.Test;

class TodayTest {
  private final TinySite tiny = new TinySite();
  private final Site site = tiny.site();

  private static Found lineAt(double m) {
    return new Found(m, null, null, null, null, null);
  }

  private static Found gust(double mps) {
    return new Found(null, null, null, null, null, mps);
  }

  private Today today(Found found) {
    return Today.ofPlanned(site, SteadyPull.ONLY, tiny.direct(), found);
  }

  @Test
  void theVerdictIsThatOfTheSetupAsSet() {
    Today t = today(lineAt(6));
    Judged own = new Judge(site, SteadyPull.ONLY).judge(tiny.direct().withAttachHeight(6));
    assertThat(t.after().figures()).isEqualTo(own.figures());
    assertThat(t.after().checks()).isEqualTo(own.checks());
    assertThat(t.before().setup()).isEqualTo(tiny.direct());
    assertThat(t.changed()).containsExactly("line at 6.00 m, was 8.00 m");
    assertThat(t.rows()).contains(new FigureRow("line at", "8.00 m", "6.00 m"));
    assertThat(t.rows()).extracting(FigureRow::name).contains("pull needed", "pull margin");
  }

  @Test
  void aWorseVerdictMustBeAcceptedByName() {
    Today t = today(gust(12));
    assertThat(t.worse()).isTrue();
    for (String nobody : new String[] {null, "", " "}) {
      assertThatThrownBy(() -> t.revision(site, "09:12", nobody))
          .isInstanceOf(IllegalArgumentException.class)
          .hasMessageContaining("accept it by name");
    }
    Revision r = t.revision(site, "09:12", "arborist A");
    assertThat(r.acceptedBy()).isEqualTo("arborist A");
    assertThat(r.verdict()).isEqualTo(t.after().verdict().word());
  }

  @Test
  void oneThatIsNotWorseNeedsNobody() {
    Today t = today(gust(2));
    assertThat(t.worse()).isFalse();
    assertThat(t.revision(site, "09:12", null).acceptedBy()).isNull();
  }

  @Test
  void revisionsFollowOneAnotherAndThePlanStays() {
    Today first = today(lineAt(6));
    Revision b = first.revision(site, "09:12", "A");
    Site one = Today.recorded(site, b);
    assertThat(b.letter()).isEqualTo("B");
    assertThat(Copy.with(one, "revisions", List.of())).isEqualTo(site);
    Today second = Today.ofLast(one, SteadyPull.ONLY, gust(5));
    assertThat(second.before().setup().attachHeightM()).isEqualTo(6);
    assertThat(second.after().setup().attachHeightM()).isEqualTo(6);
    Revision c = second.revision(one, "09:40", "A");
    Site two = Today.recorded(one, c);
    assertThat(c.letter()).isEqualTo("C");
    assertThat(two.revisions()).containsExactly(b, c);
    // what was found stays found
    Today third = Today.ofLast(two, SteadyPull.ONLY, lineAt(7));
    assertThat(third.gustMps().value()).isEqualTo(5);
    assertThat(third.before().figures()).isEqualTo(second.after().figures());
  }

  @Test
  void theFileKeepsThem() throws Exception {
    Revision b = today(lineAt(6)).revision(site, "2026-05-04 09:12", "A");
    Site one = Today.recorded(site, b);
    assertThat(SiteFile.read(SiteFile.bytes(one), "tiny")).isEqualTo(one);
  }

  @Test
  void lettersGoOnPastZ() {
    assertThat(List.of(0, 1, 25, 26, 27, 51, 52).stream().map(Today::letter))
        .containsExactly("A", "B", "Z", "AA", "AB", "AZ", "BA");
  }

  @Test
  void whatCannotBeIsRefusedInASentence() {
    assertThatThrownBy(() -> new Found(null, null, null, null, null, null))
        .hasMessage("nothing is said to be otherwise than planned");
    assertThatThrownBy(() -> today(lineAt(14.5))).hasMessageStartingWith("line-at is 14.5 m;");
    assertThatThrownBy(() -> today(new Found(null, "L9", null, null, null, null)))
        .hasMessage("line is \"L9\"; no pull line of that name is in the gear");
    assertThatThrownBy(() -> today(new Found(null, null, "A9", null, null, null)))
        .hasMessageStartingWith("at is \"A9\"");
    assertThatThrownBy(() -> today(new Found(null, null, null, "A9", null, null)))
        .hasMessageStartingWith("redirect is \"A9\"");
    assertThatThrownBy(() -> Today.ofLast(site, SteadyPull.ONLY, gust(5)))
        .hasMessageStartingWith("the site has no revision yet");
    Site one = Today.recorded(site, today(lineAt(6)).revision(site, "x", "A"));
    Site gone =
        Copy.with(
            one,
            "gear",
            Copy.with(
                one.gear(), "lines", List.of(Copy.with(one.gear().lines().get(0), "id", "other"))));
    assertThatThrownBy(() -> Today.ofLast(gone, SteadyPull.ONLY, gust(5)))
        .hasMessageContaining("\"rope\", which is no longer on the site");
  }

  @Test
  void groundRedirectAndPlaceAreTaken() {
    Today t = today(new Found(null, null, "point", "none", Wetness.WET, null));
    assertThat(t.after().setup().place()).isEqualTo("point");
    assertThat(t.ground()).isEqualTo(Wetness.WET);
    assertThat(t.changed()).containsExactly("steady at point, was spot", "ground wet");
    Today over = today(new Found(null, null, null, "point", null, null));
    assertThat(over.after().setup()).isEqualTo(tiny.redirected());
  }

  @Test
  void theSlipNamesRevisionWordAndWhoAcceptedAndStopsWhatDoesNotWork() {
    Today t = today(gust(12));
    assertThat(t.after().verdict()).isEqualTo(Verdict.NOT_WORKABLE);
    Revision r = t.revision(site, "2026-05-04 09:12", "arborist A");
    String slip = String.join("\n", ChangeSlip.lines(site, t, r));
    assertThat(slip)
        .contains("Revision B of 2026-05-04 09:12", "Word: " + r.word(), "arborist A", "STOP");
    assertThat(String.join("\n", ChangeSlip.lines(site, t, null)))
        .contains("not recorded", "somebody must accept it by name")
        .doesNotContain("Word:");
  }

  @Test
  void wordsAreFourLettersFollowTheContentAndAvoidWhatNobodyWants() {
    Random random = new Random(7);
    java.util.Set<String> seen = new java.util.TreeSet<>();
    for (int i = 0; i < 20_000; i++) {
      String word = CheckWord.of("sheet " + random.nextLong());
      assertThat(word)
          .matches("[BDFGLMNRSTVZ][AEIOU][BDFGLMNRSTVZ][AEIOU]")
          .isNotIn("SIDA", "TETA");
      seen.add(word);
    }
    assertThat(seen).hasSizeGreaterThan(3000);
    assertThat(CheckWord.of("a")).isEqualTo(CheckWord.of("a")).isNotEqualTo(CheckWord.of("b"));
  }
}
