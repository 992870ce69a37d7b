package org.fallwright.core.plan;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What is said of the face, on the tree that PlannerTest works by hand (it goes at 10.40°). */
class FaceNotesTest {
  private static Judged judged(String face, double opening, double depth) {
    return new Judge(
            TinySite.site(
                4_000,
                s ->
                    ((ObjectNode) s.get("cut"))
                        .put("face", face)
                        .put("face_opening_deg", opening)
                        .put("face_fraction", depth)),
            TinySite.SOURCES)
        .judge(new Setup(0, 6, 0.03, "L2", List.of(), "steady", "pull", "R1", null));
  }

  private static List<String> ofTheFace(Judged j) {
    return j.notes().stream().filter(n -> n.contains("face")).toList();
  }

  @ParameterizedTest
  @CsvSource({"70, 0.25", "90, 0.33", "75, 0.2"})
  void anOpenFaceOfTheUsualShapeNeedsNoWord(double opening, double depth) {
    assertThat(ofTheFace(judged("open", opening, depth))).isEmpty();
  }

  @Test
  void anOpenFaceThatIsNarrowShutsEarlier() {
    Judged j = judged("open", 65, 0.25);
    assertThat(ofTheFace(j))
        .containsExactly("An open face opens 70° or more; this one 65°: it shuts earlier.");
    assertThat(j.verdict()).isEqualTo(judged("open", 70, 0.25).verdict());
  }

  @Test
  void aConventionalFaceShutsInMidFall() {
    Judged j = judged("conventional", 45, 0.25);
    assertThat(j.figures().movementEndDeg()).isBetween(10.4, 20.0);
    assertThat(ofTheFace(j))
        .containsExactly(
            "The conventional face shuts when the stem has turned 45°, in mid-fall: from there the"
                + " hinge breaks and guides no more. The tree goes by itself from 10.4°; the"
                + " pull's movement ends at "
                + Math.round(10 * j.figures().movementEndDeg()) / 10.0
                + "°.",
            "Back cut above the face's corner, except where the tree is pulled (29 CFR"
                + " 1910.266(h)(2)(vii)); other places have rules of their own.");
  }

  @Test
  void aHumboldtFaceOpenedWideDoesNotShutInMidFall() {
    assertThat(ofTheFace(judged("humboldt", 75, 0.25)).get(0))
        .startsWith("The Humboldt face shuts when the stem has turned 75°. The tree goes");
  }

  @Test
  void aFaceThatShutsBeforeTheTreeGoesIsStillAFailedCheck() {
    for (String face : List.of("open", "conventional", "humboldt")) {
      Judged j = judged(face, 12, 0.25);
      Check c =
          j.checks().stream().filter(x -> x.id().equals("face opening")).findFirst().orElseThrow();
      assertThat(c.verdict()).as(face).isEqualTo(Verdict.NOT_WORKABLE);
    }
  }

  @ParameterizedTest
  @CsvSource({"0.15, true", "0.19, true", "0.2, false", "0.33, false", "0.36, true"})
  void anUnusualDepthIsSaidWithWhatIsPublished(double depth, boolean said) {
    List<String> notes = ofTheFace(judged("open", 70, depth));
    assertThat(notes).hasSize(said ? 1 : 0);
    assertThat(notes)
        .allMatch(
            n ->
                n.startsWith(
                        "The face is "
                            + String.format(Locale.ROOT, "%.2f", depth)
                            + " of the diameter")
                    && n.contains("0.25 to 0.33 (OSHA Logging eTool)")
                    && n.contains("WAC 296-54-53910")
                    && n.contains("R 408.15336"));
  }
}
