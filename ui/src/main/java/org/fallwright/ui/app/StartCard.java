package org.fallwright.ui.app;

import java.awt.Component;
import java.awt.GridBagLayout;
import javax.swing.Box;
import javax.swing.BoxLayout;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import org.fallwright.ui.text.Messages;

/** What stands in place of the plan while no site is open: what to do, and the buttons for it. */
final class StartCard extends JPanel {
  StartCard(Runnable open, Runnable demo) {
    super(new GridBagLayout());
    JPanel column = new JPanel();
    column.setOpaque(false);
    column.setLayout(new BoxLayout(column, BoxLayout.Y_AXIS));
    JLabel title = new JLabel(Messages.text("start.title"));
    title.putClientProperty("FlatLaf.styleClass", "h1");
    column.add(left(title));
    column.add(Box.createVerticalStrut(8));
    column.add(left(new JLabel(Messages.text("start.what"))));
    column.add(Box.createVerticalStrut(18));
    column.add(left(button("start.open", open)));
    if (demo != null) {
      column.add(Box.createVerticalStrut(10));
      column.add(left(button("start.demo", demo)));
    }
    column.add(Box.createVerticalStrut(18));
    column.add(left(new JLabel(Messages.text("start.offline"))));
    add(column);
  }

  private static JButton button(String key, Runnable act) {
    JButton b = new JButton(Messages.text(key));
    b.setMargin(new java.awt.Insets(10, 18, 10, 18));
    b.addActionListener(e -> act.run());
    return b;
  }

  private static Component left(javax.swing.JComponent c) {
    c.setAlignmentX(Component.LEFT_ALIGNMENT);
    return c;
  }
}
