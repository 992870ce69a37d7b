package org.fallwright.ui.charts;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.Arrays;
import org.fallwright.core.doubt.Doubt;
import org.fallwright.core.doubt.Doubts;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.ui.demo.DemoSite;
import org.junit.jupiter.api.Test;

class ChartsTest {
  private static final Doubt DOUBT =
      new Doubts(DemoSite.asItIs().site(), DemoSite.sources()).of(DemoSite.ROW_4);
  private static final Font FONT = new Font(Font.SANS_SERIF, Font.PLAIN, 12);

  private static BufferedImage painted(Chart chart) {
    BufferedImage image = new BufferedImage(640, 420, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    chart.paint(g, new Rectangle2D.Double(0, 0, 640, 420));
    g.dispose();
    return image;
  }

  private static long count(BufferedImage image, Color colour) {
    return Arrays.stream(image.getRGB(0, 0, 640, 420, null, 0, 640))
        .filter(p -> (p & 0xffffff) == (colour.getRGB() & 0xffffff))
        .count();
  }

  @Test
  void aBarForEachInputTheFirstTheLongest() {
    BufferedImage image = painted(new BarsPainter(DOUBT, FONT));
    assertThat(count(image, Chart.FILL)).isGreaterThan(3_000);
    int[] longest = new int[2];
    for (int y = 0; y < 420; y++) {
      int n = 0;
      for (int x = 0; x < 640; x++) {
        n += (image.getRGB(x, y) & 0xffffff) == (Chart.FILL.getRGB() & 0xffffff) ? 1 : 0;
      }
      longest[y < 140 ? 0 : 1] = Math.max(longest[y < 140 ? 0 : 1], n);
    }
    assertThat(longest[0]).isGreaterThan(longest[1]);
  }

  @Test
  void theStepsOfTheMarginHoldAllTrialsButTheHighestHundredth() {
    double[] shares = new MarginsPainter(DOUBT, FONT).shares();
    assertThat(Arrays.stream(shares).sum()).isCloseTo(0.99, within(1e-6));
    assertThat(count(painted(new MarginsPainter(DOUBT, FONT)), Chart.FILL)).isGreaterThan(10_000);
  }

  @Test
  void theCurveLiesInItsBand() {
    Chart curve = new PullCurvePainter(DOUBT, 8000, DisplayUnits.METRIC, FONT);
    BufferedImage image = painted(curve);
    assertThat(count(image, Chart.BAND)).isGreaterThan(5_000);
    assertThat(count(image, Chart.INK)).isGreaterThan(300);
    assertThat(DOUBT.curve())
        .allSatisfy(p -> assertThat(p.nominalN()).isBetween(p.lowN() * 0.999, p.highN() * 1.001));
  }

  @Test
  void thePanelSaysWhatToMeasure() {
    assertThat(DoubtPanel.text(DOUBT))
        .startsWith("Workable. ")
        .contains("1. Try the grip")
        .contains("Measure the lean again from the side: a degree more takes the margin from");
  }
}
