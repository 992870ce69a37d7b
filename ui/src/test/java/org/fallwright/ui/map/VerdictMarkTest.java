package org.fallwright.ui.map;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Shape;
import org.fallwright.core.plan.Verdict;
import org.junit.jupiter.api.Test;

/** The marks differ by shape: looked at in the middle, half way up, and half way to a corner. */
class VerdictMarkTest {
  @Test
  void workableIsAFilledSquare() {
    assertMark(Verdict.WORKABLE, true, true, true);
  }

  @Test
  void tightIsAPlus() {
    assertMark(Verdict.TIGHT, true, true, false);
  }

  @Test
  void notWorkableIsACross() {
    assertMark(Verdict.NOT_WORKABLE, true, false, true);
  }

  @Test
  void cannotJudgeIsAnOpenRing() {
    Shape ring = VerdictMark.shape(Verdict.CANNOT_JUDGE);
    assertThat(ring.contains(5.6, 0)).isTrue();
    assertThat(ring.contains(3.6, 0)).isFalse();
    assertThat(ring.contains(0, 3.4)).as("the dot of the question mark").isTrue();
  }

  private static void assertMark(Verdict v, boolean middle, boolean up, boolean corner) {
    Shape s = VerdictMark.shape(v);
    assertThat(s.contains(0, 0)).as(v + " middle").isEqualTo(middle);
    assertThat(s.contains(0, -4.5)).as(v + " up").isEqualTo(up);
    assertThat(s.contains(3.5, 3.5)).as(v + " corner").isEqualTo(corner);
  }
}
