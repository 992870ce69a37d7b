package org.fallwright.ui.charts;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import org.fallwright.core.doubt.Doubt;
import org.fallwright.core.statics.BandPoint;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.ui.text.Messages;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.DeviationRenderer;
import org.jfree.chart.ui.RectangleAnchor;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.xy.YIntervalSeries;
import org.jfree.data.xy.YIntervalSeriesCollection;

/**
 * The pull that moves the tree as line is taken in, with everything as entered, and the band in
 * which it lies eighteen times in twenty; what the source gives at its least as a line.
 *
 * @param doubt the doubt; with its curve
 * @param sourceLowN what the source gives at its least, at the tree [N]
 * @param in units shown
 * @param font typeface and size of every word
 */
public record PullCurvePainter(Doubt doubt, double sourceLowN, DisplayUnits in, Font font)
    implements Chart {
  @Override
  public void paint(Graphics2D g, Rectangle2D where) {
    DisplayUnits.Unit force = in.unit(DisplayUnits.Measure.FORCE);
    DisplayUnits.Unit length = in.unit(DisplayUnits.Measure.LENGTH);
    YIntervalSeries series = new YIntervalSeries("pull");
    for (BandPoint p : doubt.curve()) {
      if (Double.isFinite(p.highN())) {
        series.add(
            length.fromSi(p.lineInM()),
            force.fromSi(p.nominalN()),
            force.fromSi(p.lowN()),
            force.fromSi(p.highN()));
      }
    }
    YIntervalSeriesCollection data = new YIntervalSeriesCollection();
    data.addSeries(series);
    DeviationRenderer renderer = new DeviationRenderer(true, false);
    renderer.setSeriesPaint(0, INK);
    renderer.setSeriesStroke(0, new BasicStroke(2));
    renderer.setSeriesFillPaint(0, BAND);
    renderer.setAlpha(1);
    NumberAxis taken = Chart.axis(Messages.text("charts.pull.taken", length.symbol()), font);
    NumberAxis pull = Chart.axis(Messages.text("charts.pull.axis", force.symbol()), font);
    pull.setAutoRangeIncludesZero(true);
    double most = force.fromSi(sourceLowN);
    for (BandPoint p : doubt.curve()) {
      most = Math.max(most, Double.isFinite(p.highN()) ? force.fromSi(p.highN()) : 0);
    }
    pull.setRange(0, Math.max(1e-3, 1.1 * most));
    XYPlot plot = new XYPlot(data, taken, pull, renderer);
    plot.setRangeGridlinePaint(Color.LIGHT_GRAY);
    plot.setDomainGridlinePaint(Color.LIGHT_GRAY);
    ValueMarker source =
        Chart.line(force.fromSi(sourceLowN), Messages.text("charts.pull.source"), font, true);
    source.setLabelAnchor(RectangleAnchor.TOP_LEFT);
    source.setLabelTextAnchor(TextAnchor.BOTTOM_LEFT);
    plot.addRangeMarker(source);
    Chart.clean(plot, Messages.text("charts.pull.title"), font).draw(g, where);
  }
}
