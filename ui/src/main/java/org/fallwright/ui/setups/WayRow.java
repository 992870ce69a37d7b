package org.fallwright.ui.setups;

import java.awt.BorderLayout;
import java.awt.Color;
import java.awt.Component;
import java.awt.GridLayout;
import javax.swing.BorderFactory;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.ListCellRenderer;
import javax.swing.SwingConstants;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.text.Messages;

/** A line of the list of ways: rank, mark, what and how, ratio of its weakest check. */
final class WayRow extends JPanel implements ListCellRenderer<Ways.Row> {
  private final Palette palette;
  private final JLabel lead = new JLabel("", SwingConstants.RIGHT);
  private final JLabel mark = new JLabel();
  private final JLabel title = new JLabel();
  private final JLabel detail = new JLabel();
  private final JLabel margin = new JLabel();

  WayRow(Palette palette) {
    super(new BorderLayout(10, 0));
    this.palette = palette;
    setBorder(BorderFactory.createEmptyBorder(6, 10, 6, 12));
    title.putClientProperty("FlatLaf.styleClass", "h4");
    detail.putClientProperty("FlatLaf.styleClass", "caption");
    margin.putClientProperty("FlatLaf.styleClass", "h4");
    JPanel left = new JPanel(new BorderLayout(8, 0));
    left.setOpaque(false);
    left.add(lead, BorderLayout.LINE_START);
    left.add(mark, BorderLayout.CENTER);
    JPanel text = new JPanel(new GridLayout(2, 1));
    text.setOpaque(false);
    text.add(title);
    text.add(detail);
    add(left, BorderLayout.LINE_START);
    add(text, BorderLayout.CENTER);
    add(margin, BorderLayout.LINE_END);
  }

  @Override
  public Component getListCellRendererComponent(
      JList<? extends Ways.Row> list, Ways.Row row, int index, boolean selected, boolean focused) {
    Color ink = selected ? list.getSelectionForeground() : list.getForeground();
    setBackground(selected ? list.getSelectionBackground() : list.getBackground());
    lead.setText(row.lead());
    mark.setIcon(new VerdictIcon(row.verdict(), palette, 16));
    title.setText(row.title());
    detail.setText(row.detail().isEmpty() ? " " : row.detail());
    margin.setText(row.margin());
    for (JLabel l : new JLabel[] {lead, title, detail, margin}) {
      l.setForeground(ink);
    }
    getAccessibleContext()
        .setAccessibleName(
            row.lead() + " " + row.verdict().word() + " " + row.title() + " " + row.margin());
    setToolTipText(Messages.text("ways.tip", row.verdict().word(), row.title(), row.detail()));
    return this;
  }
}
