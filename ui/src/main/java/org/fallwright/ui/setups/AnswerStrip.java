package org.fallwright.ui.setups;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.Dimension;
import java.util.HashMap;
import java.util.Map;
import javax.swing.BorderFactory;
import javax.swing.Box;
import javax.swing.BoxLayout;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JSeparator;
import javax.swing.JTextArea;
import javax.swing.SwingConstants;
import org.fallwright.core.plan.Verdict;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.text.Messages;

/** The strip along the top: mark and word, one sentence, and the figures beside it. */
public final class AnswerStrip extends JPanel {
  private final JLabel word = new JLabel();
  private final JTextArea sentence = new JTextArea(2, 10);
  private final JPanel cells = new JPanel();
  private final Map<String, JLabel[]> labels = new HashMap<>();

  public AnswerStrip() {
    super(new BorderLayout(16, 0));
    setBorder(BorderFactory.createEmptyBorder(8, 14, 8, 14));
    word.putClientProperty("FlatLaf.styleClass", "h1");
    word.setIconTextGap(10);
    sentence.setEditable(false);
    sentence.setFocusable(false);
    sentence.setOpaque(false);
    sentence.setLineWrap(true);
    sentence.setWrapStyleWord(true);
    sentence.setBorder(null);
    sentence.setMinimumSize(new Dimension(120, 36));
    JPanel said = new JPanel();
    said.setOpaque(false);
    said.setLayout(new BoxLayout(said, BoxLayout.Y_AXIS));
    word.setAlignmentX(Component.LEFT_ALIGNMENT);
    sentence.setAlignmentX(Component.LEFT_ALIGNMENT);
    said.add(word);
    said.add(Box.createVerticalStrut(2));
    said.add(sentence);
    cells.setOpaque(false);
    cells.setLayout(new BoxLayout(cells, BoxLayout.X_AXIS));
    for (String key : new String[] {"needs", "gives", "clears", "weakest", "case", "defaults"}) {
      JSeparator between = new JSeparator(SwingConstants.VERTICAL);
      between.setMaximumSize(new Dimension(1, Integer.MAX_VALUE));
      between.setAlignmentY(Component.TOP_ALIGNMENT);
      cells.add(between);
      cells.add(cell(key));
    }
    add(said, BorderLayout.CENTER);
    add(cells, BorderLayout.LINE_END);
    getAccessibleContext().setAccessibleName(Messages.text("answer.name"));
  }

  /** Shows an answer. */
  public void show(Answer a, Palette palette) {
    Verdict v = a.verdict();
    word.setText(Way.name(a.word()));
    word.setIcon(v == null ? null : new VerdictIcon(v, palette, 24));
    word.setForeground(v == null ? palette.ink() : palette.of(v));
    sentence.setText(a.sentence());
    word.getAccessibleContext().setAccessibleName(a.word() + ". " + a.sentence());
    for (Answer.Cell c : a.cells()) {
      show(c);
    }
  }

  /** Shows one figure. */
  public void show(Answer.Cell c) {
    JLabel[] l = labels.get(c.key());
    l[0].setText(c.value());
    l[1].setText(c.note().isEmpty() ? " " : c.note());
    l[0].getAccessibleContext()
        .setAccessibleName(Messages.text("answer." + c.key()) + " " + c.value() + " " + c.note());
  }

  private JPanel cell(String key) {
    JLabel caption = new JLabel(Messages.text("answer." + key));
    caption.putClientProperty("FlatLaf.styleClass", "caption");
    JLabel value = new JLabel("–");
    value.putClientProperty("FlatLaf.styleClass", "h3");
    JLabel note = new JLabel(" ");
    note.putClientProperty("FlatLaf.styleClass", "caption");
    labels.put(key, new JLabel[] {value, note});
    JPanel p = new JPanel();
    p.setOpaque(false);
    p.setLayout(new BoxLayout(p, BoxLayout.Y_AXIS));
    p.setBorder(BorderFactory.createEmptyBorder(0, 10, 0, 12));
    p.add(caption);
    p.add(value);
    p.add(note);
    p.setAlignmentY(Component.TOP_ALIGNMENT);
    return p;
  }
}
