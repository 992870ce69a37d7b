package org.fallwright.core.tree.field;

import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;

class FieldTest {
  @Test
  void anAngleThatCannotBeIsRefusedWithItsScale() {
    assertThatThrownBy(() -> Reading.degrees(95))
        .hasMessage("reading is 95 degrees; it must be from -89.9 to 89.9 degrees");
    assertThatThrownBy(() -> new Reading(6, null)).hasMessageStartingWith("scale is null");
    assertThatThrownBy(() -> Reading.percent(Double.NaN)).hasMessageContaining("not a number");
  }

  @Test
  void aBaseAboveTheTopIsRefused() {
    assertThatThrownBy(
            () -> new TapedHeight(25, Reading.degrees(-3.7), Reading.degrees(32.5)).heightM())
        .hasMessage("top is -3.7 degrees; it must be above base, 32.5 degrees");
    assertThatThrownBy(() -> new TapedHeight(0, Reading.degrees(30), Reading.degrees(0)))
        .hasMessageStartingWith("distance_m is 0 m");
  }

  @Test
  void aTipOverTheViewerCannotBeRead() {
    assertThatThrownBy(() -> TapedHeight.readM(30, 45, 25, 1.6))
        .hasMessageStartingWith("distance_m from the eye to below the tip");
    // a tree that leans away by 45 degrees is seen at no more than 45
    TapedHeight low = new TapedHeight(10, Reading.degrees(60), Reading.degrees(0));
    assertThatThrownBy(() -> low.heightOfLeanerM(-45)).hasMessageContaining("no tree of that lean");
  }

  @Test
  void viewsFromOneSideTellNothingOfTheOther() {
    SideView north = new SideView(0, Reading.degrees(3));
    for (double other : new double[] {0, 59, 121, 180, 239, 301, 360}) {
      assertThatThrownBy(() -> Lean.byTwoViews(north, new SideView(other, Reading.degrees(1))))
          .hasMessageContaining("from 60 to 120 degrees apart");
    }
    Lean.byTwoViews(north, new SideView(60, Reading.degrees(1)));
    Lean.byTwoViews(north, new SideView(240, Reading.degrees(1)));
  }

  @Test
  void aStemThatLeansMoreThanATreeIsRefused() {
    assertThatThrownBy(() -> Lean.byPlumb(6.1, 6, 0)).hasMessageStartingWith("lean_deg is");
    assertThatThrownBy(() -> Lean.byStem(Reading.degrees(40), 0))
        .hasMessageStartingWith("lean_deg is 50 degrees");
    assertThatThrownBy(() -> Girth.diameterM(0.01)).hasMessageStartingWith("girth_m is 0.01 m");
  }
}
