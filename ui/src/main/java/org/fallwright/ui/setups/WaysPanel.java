package org.fallwright.ui.setups;

import java.awt.BorderLayout;
import java.awt.GridBagConstraints;
import java.awt.GridBagLayout;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.DefaultListModel;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.ListSelectionModel;
import org.fallwright.core.plan.Judged;
import org.fallwright.ui.column.Column;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.text.Messages;

/**
 * The ranked ways and, under them, what rules the others out. Choosing a line shows it everywhere.
 */
public final class WaysPanel extends JPanel {
  private final JLabel summary = new JLabel(" ");
  private final JList<Ways.Row> ranked = list("ways.title");
  private final JList<Ways.Row> ruledOut = list("ways.ruled-out");
  private final JLabel outTitle = new JLabel(Messages.text("ways.ruled-out"));
  private Consumer<Judged> chosen = j -> {};
  private boolean setting;

  public WaysPanel() {
    super(new BorderLayout());
    JLabel title = new JLabel(Messages.text("ways.title"));
    title.putClientProperty("FlatLaf.styleClass", "h3");
    summary.putClientProperty("FlatLaf.styleClass", "caption");
    JPanel head = new JPanel(new BorderLayout());
    head.setBorder(BorderFactory.createEmptyBorder(8, 10, 6, 10));
    head.add(title, BorderLayout.PAGE_START);
    head.add(summary, BorderLayout.CENTER);
    outTitle.putClientProperty("FlatLaf.styleClass", "h4");
    outTitle.setBorder(BorderFactory.createEmptyBorder(10, 10, 4, 10));
    JPanel both = new Column(new GridBagLayout());
    GridBagConstraints row = new GridBagConstraints();
    row.gridx = 0;
    row.weightx = 1;
    row.fill = GridBagConstraints.HORIZONTAL;
    row.anchor = GridBagConstraints.PAGE_START;
    both.add(ranked, row);
    both.add(outTitle, row);
    row.weighty = 1;
    both.add(ruledOut, row);
    both.setBackground(ranked.getBackground());
    JScrollPane scroll = new JScrollPane(both);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.getVerticalScrollBar().setUnitIncrement(24);
    scroll.setHorizontalScrollBarPolicy(JScrollPane.HORIZONTAL_SCROLLBAR_NEVER);
    add(head, BorderLayout.PAGE_START);
    add(scroll, BorderLayout.CENTER);
    choosing(ranked, ruledOut);
    choosing(ruledOut, ranked);
    getAccessibleContext().setAccessibleName(Messages.text("ways.title"));
  }

  /** Who is told of a choice. */
  public void onChosen(Consumer<Judged> listener) {
    chosen = listener;
  }

  /** Shows the ways; null: none yet. */
  public void show(Ways ways, Judged current, Palette palette) {
    setting = true;
    fill(ranked, ways == null ? List.of() : ways.ranked(), palette);
    fill(ruledOut, ways == null ? List.of() : ways.ruledOut(), palette);
    summary.setText(ways == null ? " " : ways.summary());
    outTitle.setVisible(ways != null && !ways.ruledOut().isEmpty());
    mark(ranked, current);
    mark(ruledOut, current);
    setting = false;
    revalidate();
    repaint();
  }

  /** Chooses the next (1) or the former (-1) ranked way. */
  public void step(int by) {
    int n = ranked.getModel().getSize();
    if (n > 0) {
      int at = Math.max(0, Math.min(n - 1, ranked.getSelectedIndex() + by));
      ranked.setSelectedIndex(at);
      ranked.ensureIndexIsVisible(at);
    }
  }

  private static void fill(JList<Ways.Row> list, List<Ways.Row> rows, Palette palette) {
    DefaultListModel<Ways.Row> model = new DefaultListModel<>();
    rows.forEach(model::addElement);
    list.setCellRenderer(new WayRow(palette));
    list.setModel(model);
  }

  private static void mark(JList<Ways.Row> list, Judged current) {
    for (int i = 0; i < list.getModel().getSize(); i++) {
      if (current != null && list.getModel().getElementAt(i).setup() == current) {
        list.setSelectedIndex(i);
        return;
      }
    }
    list.clearSelection();
  }

  private void choosing(JList<Ways.Row> list, JList<Ways.Row> other) {
    list.addListSelectionListener(
        e -> {
          Ways.Row row = list.getSelectedValue();
          if (setting || e.getValueIsAdjusting() || row == null || row.setup() == null) {
            return;
          }
          setting = true;
          other.clearSelection();
          setting = false;
          chosen.accept(row.setup());
        });
  }

  private static JList<Ways.Row> list(String name) {
    JList<Ways.Row> l = new JList<>();
    l.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
    l.getAccessibleContext().setAccessibleName(Messages.text(name));
    return l;
  }
}
