package org.fallwright.ui.particulars;

import java.awt.BorderLayout;
import java.awt.Color;
import java.awt.Component;
import java.awt.Dimension;
import javax.swing.BorderFactory;
import javax.swing.Box;
import javax.swing.BoxLayout;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTextArea;
import org.fallwright.ui.column.Column;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.text.Messages;

/** The rail at the left: what was entered, what is still to be said, what the tool filled in. */
public final class EnteredPanel extends Column {
  private final JPanel lines = new JPanel();

  public EnteredPanel() {
    super(new BorderLayout());
    lines.setLayout(new BoxLayout(lines, BoxLayout.Y_AXIS));
    add(lines, BorderLayout.PAGE_START);
    setBorder(BorderFactory.createEmptyBorder(8, 12, 8, 10));
    getAccessibleContext().setAccessibleName(Messages.text("entered.title"));
  }

  /** Shows what was entered; null: nothing. */
  public void show(Entered e, Palette palette) {
    lines.removeAll();
    heading("entered.title", "h3");
    if (e != null) {
      e.numbers().forEach(l -> line(l, palette));
      lines.add(Box.createVerticalStrut(12));
      heading("entered.looked", "h4");
      e.looked().forEach(l -> line(l, palette));
      words(
          Messages.text("entered.not-said", String.valueOf(e.notSaid())),
          e.notSaid() > 0 ? palette.notWorkable() : null);
      lines.add(Box.createVerticalStrut(12));
      heading("entered.filled", "h4");
      words(String.join(", ", e.defaults()), null);
    } else {
      words(Messages.text("entered.none"), null);
    }
    revalidate();
    repaint();
  }

  private void heading(String key, String style) {
    JLabel l = new JLabel(Messages.text(key));
    l.putClientProperty("FlatLaf.styleClass", style);
    l.setAlignmentX(Component.LEFT_ALIGNMENT);
    l.setBorder(BorderFactory.createEmptyBorder(0, 0, 4, 0));
    lines.add(l);
  }

  private void line(Entered.Line l, Palette palette) {
    JLabel name = new JLabel(l.name());
    JLabel note = new JLabel(l.note());
    name.putClientProperty("FlatLaf.styleClass", "caption");
    note.putClientProperty("FlatLaf.styleClass", "caption");
    JLabel value = new JLabel(l.value());
    value.putClientProperty("FlatLaf.styleClass", "h4");
    if (l.open()) {
      value.setForeground(palette.notWorkable());
    }
    JPanel top = new JPanel();
    top.setOpaque(false);
    top.setLayout(new BoxLayout(top, BoxLayout.X_AXIS));
    top.add(name);
    top.add(Box.createHorizontalGlue());
    top.add(note);
    top.setAlignmentX(Component.LEFT_ALIGNMENT);
    value.setAlignmentX(Component.LEFT_ALIGNMENT);
    lines.add(top);
    lines.add(value);
    lines.add(Box.createVerticalStrut(6));
    top.setMaximumSize(new Dimension(Integer.MAX_VALUE, top.getPreferredSize().height));
  }

  private void words(String text, Color c) {
    JTextArea t = new JTextArea(text, 0, 12);
    t.setEditable(false);
    t.setFocusable(false);
    t.setOpaque(false);
    t.setLineWrap(true);
    t.setWrapStyleWord(true);
    t.setBorder(BorderFactory.createEmptyBorder());
    t.setAlignmentX(Component.LEFT_ALIGNMENT);
    if (c != null) {
      t.setForeground(c);
    }
    lines.add(t);
  }
}
