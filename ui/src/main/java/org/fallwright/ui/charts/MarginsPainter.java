package org.fallwright.ui.charts;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.fallwright.core.doubt.Doubt;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.ui.text.Messages;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.StandardXYBarPainter;
import org.jfree.chart.renderer.xy.XYBarRenderer;
import org.jfree.data.xy.XYIntervalSeries;
import org.jfree.data.xy.XYIntervalSeriesCollection;

/**
 * How often each margin comes about, over all the ways the site may be: a bar for each step of the
 * margin, the limit 1 as a line, the margin of a poor day dashed. Margins above the 99th percentile
 * are left off the picture.
 *
 * @param doubt the doubt
 * @param font typeface and size of every word
 */
public record MarginsPainter(Doubt doubt, Font font) implements Chart {
  private static final int STEPS = 24;
  private static final int TOP = 99;

  @Override
  public void paint(Graphics2D g, Rectangle2D in) {
    double[] shares = shares();
    XYIntervalSeries series = new XYIntervalSeries("margin");
    double from = doubt.margins().get(0);
    double width = (top() - from) / STEPS;
    for (int i = 0; i < shares.length; i++) {
      double left = from + i * width;
      double right = left + width;
      series.add((left + right) / 2, left, right, 100 * shares[i], 0, 100 * shares[i]);
    }
    XYIntervalSeriesCollection data = new XYIntervalSeriesCollection();
    data.addSeries(series);
    XYBarRenderer renderer = new XYBarRenderer();
    renderer.setBarPainter(new StandardXYBarPainter());
    renderer.setShadowVisible(false);
    renderer.setDrawBarOutline(true);
    renderer.setSeriesPaint(0, FILL);
    renderer.setSeriesOutlinePaint(0, INK);
    NumberAxis margin = Chart.axis(Messages.text("charts.margin"), font);
    margin.setRange(Math.min(0.95, from), Math.max(1.05, top()));
    NumberAxis often = Chart.axis(Messages.text("charts.margins.often"), font);
    often.setAutoRangeIncludesZero(true);
    XYPlot plot = new XYPlot(data, margin, often, renderer);
    plot.setRangeGridlinePaint(Color.LIGHT_GRAY);
    plot.setDomainGridlinesVisible(false);
    plot.addDomainMarker(Chart.line(1, Messages.text("charts.margins.limit"), font, false));
    if (Double.isFinite(doubt.poorDayMargin()) && doubt.poorDayMargin() < top()) {
      plot.addDomainMarker(
          Chart.line(
              doubt.poorDayMargin(),
              Messages.text("charts.margins.poor", DisplayUnits.ratio(doubt.poorDayMargin())),
              font,
              true));
    }
    Chart.clean(plot, Messages.text("charts.margins.title"), font).draw(g, in);
  }

  /** The greatest margin shown. */
  private double top() {
    List<Double> all = doubt.margins();
    int last = TOP;
    while (last > 1 && !Double.isFinite(all.get(last))) {
      last--;
    }
    double top = all.get(last);
    return Double.isFinite(top) ? Math.max(top, all.get(0) + 0.01) : 2;
  }

  /** Share of the trials in each step, read off the percentiles. */
  double[] shares() {
    double from = doubt.margins().get(0);
    double width = (top() - from) / STEPS;
    double[] shares = new double[STEPS];
    for (int i = 0; i < STEPS; i++) {
      shares[i] = below(from + (i + 1) * width) - below(from + i * width);
    }
    return shares;
  }

  /** Share of the trials below a margin. */
  private double below(double margin) {
    List<Double> p = doubt.margins();
    for (int i = 1; i < p.size(); i++) {
      if (margin <= p.get(i)) {
        double step = p.get(i) - p.get(i - 1);
        double part = Double.isFinite(step) && step > 0 ? (margin - p.get(i - 1)) / step : 0;
        return (i - 1 + Math.max(0, part)) / (p.size() - 1);
      }
    }
    return 1;
  }
}
