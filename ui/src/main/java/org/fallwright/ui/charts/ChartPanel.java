package org.fallwright.ui.charts;

import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import javax.swing.JPanel;

/** A chart on screen. */
final class ChartPanel extends JPanel {
  private static final long serialVersionUID = 1;

  private final transient Chart chart;

  ChartPanel(Chart chart, String name) {
    this.chart = chart;
    setPreferredSize(new Dimension(640, 420));
    getAccessibleContext().setAccessibleName(name);
  }

  @Override
  protected void paintComponent(Graphics g) {
    super.paintComponent(g);
    chart.paint((Graphics2D) g, new Rectangle2D.Double(0, 0, getWidth(), getHeight()));
  }
}
