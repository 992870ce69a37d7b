package org.fallwright.ui.app;

import java.awt.Component;
import java.awt.Dimension;
import javax.swing.BorderFactory;
import javax.swing.JOptionPane;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import org.fallwright.ui.text.Messages;

/** A dialog with a longer text. */
final class Words {
  private Words() {}

  static void show(Component over, String titleKey, String textKey) {
    JTextArea text = new JTextArea(Messages.text(textKey));
    text.setEditable(false);
    text.setLineWrap(true);
    text.setWrapStyleWord(true);
    text.setBorder(BorderFactory.createEmptyBorder(8, 10, 8, 10));
    text.setCaretPosition(0);
    JScrollPane scroll = new JScrollPane(text);
    scroll.setPreferredSize(new Dimension(620, 400));
    JOptionPane.showMessageDialog(over, scroll, Messages.text(titleKey), JOptionPane.PLAIN_MESSAGE);
  }
}
