package org.fallwright.ui.charts;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.fallwright.core.doubt.Doubt;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.ui.text.Messages;
import org.jfree.chart.axis.CategoryAxis;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.plot.CategoryPlot;
import org.jfree.chart.plot.PlotOrientation;
import org.jfree.chart.renderer.category.IntervalBarRenderer;
import org.jfree.chart.renderer.category.StandardBarPainter;
import org.jfree.data.category.DefaultIntervalCategoryDataset;

/**
 * One bar an input: the margin were it known to be at its low and at its high, the input that
 * decides most on top. A line stands at the margin of the verdict, one at the limit 1.
 *
 * @param doubt the doubt; with bars
 * @param font typeface and size of every word
 */
public record BarsPainter(Doubt doubt, Font font) implements Chart {
  /** More than these nobody reads. */
  private static final int MOST = 10;

  @Override
  public void paint(Graphics2D g, Rectangle2D in) {
    List<Doubt.Bar> bars =
        doubt.bars().stream()
            .filter(b -> Double.isFinite(b.marginAtLow()) && Double.isFinite(b.marginAtHigh()))
            .limit(MOST)
            .toList();
    Double[][] from = new Double[1][bars.size()];
    Double[][] to = new Double[1][bars.size()];
    String[] names = new String[bars.size()];
    for (int i = 0; i < bars.size(); i++) {
      Doubt.Bar b = bars.get(i);
      from[0][i] = Math.min(b.marginAtLow(), b.marginAtHigh());
      to[0][i] = Math.max(b.marginAtLow(), b.marginAtHigh());
      names[i] = Messages.text("charts.bars.row", b.input().word(), b.low(), b.high());
    }
    IntervalBarRenderer renderer = new IntervalBarRenderer();
    renderer.setBarPainter(new StandardBarPainter());
    renderer.setShadowVisible(false);
    renderer.setSeriesPaint(0, FILL);
    renderer.setDrawBarOutline(true);
    renderer.setSeriesOutlinePaint(0, INK);
    renderer.setMaximumBarWidth(0.06);
    CategoryAxis inputs = new CategoryAxis();
    inputs.setTickLabelFont(font);
    inputs.setTickLabelPaint(INK);
    inputs.setMaximumCategoryLabelWidthRatio(0.55f);
    inputs.setMaximumCategoryLabelLines(2);
    NumberAxis margin = Chart.axis(Messages.text("charts.margin"), font);
    CategoryPlot plot =
        new CategoryPlot(
            new DefaultIntervalCategoryDataset(new String[] {"margin"}, names, from, to),
            inputs,
            margin,
            renderer);
    plot.setOrientation(PlotOrientation.HORIZONTAL);
    plot.setRangeGridlinePaint(Color.LIGHT_GRAY);
    plot.addRangeMarker(Chart.line(1, "1", font, false));
    if (Double.isFinite(doubt.margin())) {
      plot.addRangeMarker(
          Chart.line(doubt.margin(), DisplayUnits.ratio(doubt.margin()), font, true));
      double low = Math.min(1, min(from[0], doubt.margin()));
      double high = max(to[0], doubt.margin());
      margin.setRange(low - 0.05 * (high - low) - 0.01, high + 0.08 * (high - low) + 0.01);
    }
    Chart.clean(plot, Messages.text("charts.bars.title"), font).draw(g, in);
  }

  private static double min(Double[] of, double least) {
    double m = least;
    for (double x : of) {
      m = Math.min(m, x);
    }
    return m;
  }

  private static double max(Double[] of, double most) {
    double m = Math.max(1, most);
    for (double x : of) {
      m = Math.max(m, x);
    }
    return m;
  }
}
