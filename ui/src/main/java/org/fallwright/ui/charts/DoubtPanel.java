package org.fallwright.ui.charts;

import java.awt.BorderLayout;
import java.awt.Font;
import java.util.Locale;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTabbedPane;
import javax.swing.JTextArea;
import org.fallwright.core.doubt.Doubt;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.ui.text.Messages;

/** The doubt of one setup: what to measure next, and three pictures. */
public final class DoubtPanel extends JPanel {
  private static final long serialVersionUID = 1;

  /**
   * @param sourceLowN what the source gives at its least, at the tree [N]
   * @param in units shown
   */
  public DoubtPanel(Doubt doubt, double sourceLowN, DisplayUnits in) {
    super(new BorderLayout());
    JTextArea text = new JTextArea(text(doubt), 16, 60);
    text.setEditable(false);
    text.setLineWrap(true);
    text.setWrapStyleWord(true);
    text.setName("measure");
    Font font = text.getFont().deriveFont(12f);
    JTabbedPane tabs = new JTabbedPane();
    tabs.addTab(Messages.text("doubt.measure"), new JScrollPane(text));
    add(tabs, "doubt.bars", new BarsPainter(doubt, font));
    add(tabs, "doubt.margins", new MarginsPainter(doubt, font));
    add(tabs, "doubt.curve", new PullCurvePainter(doubt, sourceLowN, in, font));
    add(tabs);
  }

  private static void add(JTabbedPane tabs, String key, Chart chart) {
    String name = Messages.text(key);
    tabs.addTab(name, new ChartPanel(chart, name));
  }

  /** What is said in words. */
  static String text(Doubt d) {
    StringBuilder s = new StringBuilder(d.sentence()).append('\n');
    s.append(
        Messages.text(
            "doubt.poor", ratio(d.margin()), ratio(d.poorDayMargin()), ratio(d.marginAsEntered())));
    s.append('\n').append('\n');
    int n = 0;
    for (Doubt.Measure m : d.measure()) {
      s.append(String.format(Locale.ROOT, "%d. %s%n", ++n, m.sentence()));
    }
    return s.toString().replace(System.lineSeparator(), "\n");
  }

  private static String ratio(double margin) {
    return Double.isFinite(margin) ? DisplayUnits.ratio(margin) : "–";
  }
}
