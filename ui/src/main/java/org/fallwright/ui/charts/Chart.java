package org.fallwright.ui.charts;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.Plot;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.ui.RectangleAnchor;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.chart.ui.TextAnchor;

/** A picture of figures that draws itself into any graphics. */
public interface Chart {
  /** Draws it into a rectangle, on white. */
  void paint(Graphics2D g, Rectangle2D in);

  /** Ink of axes and words. */
  Color INK = new Color(0x222222);

  /** Fill of what is shown; dark enough on grey paper. */
  Color FILL = new Color(0x5b7f95);

  /** Fill of a band behind a curve. */
  Color BAND = new Color(0xc9d4da);

  /** A plot on white without frame or shade, in one typeface. */
  static JFreeChart clean(Plot plot, String title, Font font) {
    plot.setBackgroundPaint(Color.WHITE);
    plot.setOutlineVisible(false);
    plot.setInsets(new RectangleInsets(4, 4, 4, 12));
    JFreeChart chart = new JFreeChart(title, font.deriveFont(Font.BOLD), plot, false);
    chart.setBackgroundPaint(Color.WHITE);
    chart.getTitle().setPaint(INK);
    chart.setAntiAlias(true);
    return chart;
  }

  /** An axis of numbers that need not begin at nought. */
  static NumberAxis axis(String label, Font font) {
    NumberAxis axis = new NumberAxis(label);
    axis.setAutoRangeIncludesZero(false);
    plain(axis, font);
    return axis;
  }

  private static void plain(ValueAxis axis, Font font) {
    axis.setLabelFont(font);
    axis.setTickLabelFont(font);
    axis.setLabelPaint(INK);
    axis.setTickLabelPaint(INK);
    axis.setAxisLinePaint(INK);
  }

  /** A named line across a picture. */
  static ValueMarker line(double at, String name, Font font, boolean dashed) {
    float[] dashes = dashed ? new float[] {5, 4} : null;
    ValueMarker m =
        new ValueMarker(
            at,
            INK,
            new BasicStroke(1.4f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER, 10, dashes, 0));
    m.setLabel(name);
    m.setLabelFont(font);
    m.setLabelPaint(INK);
    m.setLabelAnchor(RectangleAnchor.TOP_RIGHT);
    m.setLabelTextAnchor(TextAnchor.TOP_LEFT);
    m.setLabelBackgroundColor(Color.WHITE);
    return m;
  }
}
