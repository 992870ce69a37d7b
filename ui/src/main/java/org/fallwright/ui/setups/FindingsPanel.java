package org.fallwright.ui.setups;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.Dimension;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTabbedPane;
import javax.swing.JTable;
import javax.swing.JTextArea;
import javax.swing.ListSelectionModel;
import javax.swing.SwingConstants;
import javax.swing.table.DefaultTableCellRenderer;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Verdict;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.Messages;

/** All that was found about one setup: every check, every load, every warning. */
public final class FindingsPanel extends JPanel {
  private final JTable checks = new JTable();
  private final JTable loads = new JTable();
  private final JTextArea why = text(3);
  private final JTextArea notes = text(6);
  private Judged shown;
  private Consumer<Check> pointed = c -> {};
  private boolean setting;

  public FindingsPanel() {
    super(new BorderLayout());
    JTabbedPane tabs = new JTabbedPane();
    JPanel first = new JPanel(new BorderLayout());
    first.add(scroll(checks), BorderLayout.CENTER);
    first.add(why, BorderLayout.PAGE_END);
    tabs.addTab(Messages.text("findings.checks"), first);
    tabs.addTab(Messages.text("findings.loads"), scroll(loads));
    tabs.addTab(Messages.text("findings.notes"), scroll(notes));
    tabs.putClientProperty("JTabbedPane.tabWidthMode", "equal");
    tabs.putClientProperty("JTabbedPane.tabAreaAlignment", "fill");
    add(tabs, BorderLayout.CENTER);
    setUp(checks, "findings.checks");
    setUp(loads, "findings.loads");
    checks.getSelectionModel().addListSelectionListener(e -> point());
    notes.getAccessibleContext().setAccessibleName(Messages.text("findings.notes"));
    why.getAccessibleContext().setAccessibleName(Messages.text("findings.why"));
    getAccessibleContext().setAccessibleName(Messages.text("findings.name"));
    setPreferredSize(new Dimension(420, 320));
  }

  /** Who is told which check is looked at; null: none. */
  public void onPointed(Consumer<Check> listener) {
    pointed = listener;
  }

  /** Shows what was found; null: nothing. */
  public void show(Judged j, Amounts amounts, Palette palette) {
    int row = j != null && j == shown ? checks.getSelectedRow() : -1;
    setting = true;
    shown = j;
    checks.setModel(new Findings.Checks(j == null ? List.of() : j.checks(), amounts));
    loads.setModel(new Findings.Loads(j == null ? List.of() : j.loads(), amounts));
    checks.getColumnModel().getColumn(0).setCellRenderer(new MarkCell(palette));
    widths(checks, 120, 74, 74, 56);
    widths(loads, 116, 72, 76, 76, 80);
    notes.setText(j == null ? "" : String.join("\n", j.notes()));
    if (row >= 0) {
      checks.setRowSelectionInterval(row, row);
    } else {
      why.setText(Messages.text(j == null ? "findings.none" : "findings.choose"));
    }
    setting = false;
  }

  private void point() {
    int row = checks.getSelectedRow();
    if (setting || shown == null || row < 0 || row >= checks.getRowCount()) {
      return;
    }
    Check c = ((Findings.Checks) checks.getModel()).row(row);
    why.setText(c.why());
    pointed.accept(c);
  }

  private static void widths(JTable t, int... widths) {
    for (int i = 0; i < widths.length; i++) {
      t.getColumnModel().getColumn(i).setPreferredWidth(widths[i]);
      if (i > 0) {
        DefaultTableCellRenderer right = new DefaultTableCellRenderer();
        right.setHorizontalAlignment(SwingConstants.RIGHT);
        t.getColumnModel().getColumn(i).setCellRenderer(right);
      }
    }
  }

  private static void setUp(JTable t, String name) {
    t.setRowHeight(26);
    t.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
    t.setFillsViewportHeight(true);
    t.getTableHeader().setReorderingAllowed(false);
    t.getAccessibleContext().setAccessibleName(Messages.text(name));
  }

  private static JScrollPane scroll(Component c) {
    JScrollPane s = new JScrollPane(c);
    s.setBorder(BorderFactory.createEmptyBorder());
    return s;
  }

  private static JTextArea text(int rows) {
    JTextArea t = new JTextArea(rows, 20);
    t.setEditable(false);
    t.setLineWrap(true);
    t.setWrapStyleWord(true);
    t.setBorder(BorderFactory.createEmptyBorder(6, 10, 6, 10));
    return t;
  }

  /** A check's name behind the mark of its verdict. */
  private static final class MarkCell extends DefaultTableCellRenderer {
    private final Palette palette;

    MarkCell(Palette palette) {
      this.palette = palette;
      setIconTextGap(8);
    }

    @Override
    public Component getTableCellRendererComponent(
        JTable t, Object value, boolean selected, boolean focused, int row, int column) {
      JLabel l =
          (JLabel) super.getTableCellRendererComponent(t, value, selected, focused, row, column);
      Verdict v = ((Findings.Checks) t.getModel()).row(row).verdict();
      l.setIcon(new VerdictIcon(v, palette, 13));
      l.setToolTipText(((Findings.Checks) t.getModel()).row(row).why());
      return l;
    }
  }
}
