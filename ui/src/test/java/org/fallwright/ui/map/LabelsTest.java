package org.fallwright.ui.map;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LabelsTest {
  private static final Rectangle2D FRAME = new Rectangle2D.Double(0, 0, 400, 300);

  private final Labels labels = new Labels(FRAME);

  @ParameterizedTest
  @ValueSource(longs = {11, 12, 13, 14, 15})
  void noTwoLabelsThatMayBeLeftOutCoverEachOtherOrLeaveTheFrame(long seed) {
    Random r = new Random(seed);
    for (int i = 0; i < 60; i++) {
      want("label " + i, 400 * r.nextDouble(), 300 * r.nextDouble(), i, false);
    }
    List<Labels.Placed> placed = labels.place(pen());
    assertThat(placed).as("seed " + seed).hasSizeGreaterThan(10);
    for (Labels.Placed a : placed) {
      assertThat(FRAME.contains(a.box())).as("seed " + seed + " " + a).isTrue();
      for (Labels.Placed b : placed) {
        if (a != b) {
          assertThat(a.box().intersects(b.box())).as("seed " + seed + " " + a + b).isFalse();
        }
      }
    }
  }

  @Test
  void theMoreImportantLabelGetsTheBetterPlace() {
    want("second", 200, 150, 2, false);
    want("first", 200, 150, 1, false);
    List<Labels.Placed> placed = labels.place(pen());
    assertThat(placed.get(0).label().text()).isEqualTo("first");
    assertThat(placed.get(0).box().getMinX()).isGreaterThanOrEqualTo(200);
  }

  @Test
  void whatMustBeShownIsShownEvenWhereAllIsTaken() {
    labels.keepFree(FRAME);
    want("may go", 200, 150, 0, false);
    want("must stay", 200, 150, 5, true);
    assertThat(labels.place(pen())).extracting(p -> p.label().text()).containsExactly("must stay");
  }

  @Test
  void placesKeptFreeStayFree() {
    Rectangle2D kept = new Rectangle2D.Double(200, 100, 200, 100);
    labels.keepFree(kept);
    want("beside", 199, 150, 0, false);
    List<Labels.Placed> placed = labels.place(pen());
    assertThat(placed).hasSize(1);
    assertThat(placed.get(0).box().intersects(kept)).isFalse();
  }

  @Test
  void aPointOutsideTheFrameHasNoLabel() {
    want("gone", 500, 150, 0, true);
    assertThat(labels.place(pen())).isEmpty();
  }

  private void want(String text, double x, double y, int rank, boolean must) {
    labels.want(new Labels.Wanted(text, new Point2D.Double(x, y), 4, rank, must, Color.BLACK));
  }

  private static Pen pen() {
    Graphics2D g = new BufferedImage(10, 10, BufferedImage.TYPE_INT_ARGB).createGraphics();
    g.setFont(new Font(Font.DIALOG, Font.PLAIN, 12));
    return new Pen(g, Color.WHITE);
  }
}
