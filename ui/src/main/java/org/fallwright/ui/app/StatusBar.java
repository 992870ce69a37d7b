package org.fallwright.ui.app;

import java.awt.BorderLayout;
import javax.swing.BorderFactory;
import javax.swing.Box;
import javax.swing.BoxLayout;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JProgressBar;
import org.fallwright.ui.text.Messages;

/** The lower edge: cautions, the next thing to do, place under the pointer, scale, picture. */
final class StatusBar extends JPanel {
  private final JLabel next = new JLabel();
  private final JLabel place = new JLabel(" ");
  private final JLabel scale = new JLabel(" ");
  private final JLabel picture = new JLabel(" ");
  private final JProgressBar progress = new JProgressBar(0, 100);
  private final JButton stop = new JButton(Messages.text("status.stop"));

  StatusBar(Runnable stopping, Runnable cautions) {
    super(new BorderLayout());
    next.putClientProperty("FlatLaf.styleClass", "next");
    for (JLabel l : new JLabel[] {place, scale, picture}) {
      l.putClientProperty("FlatLaf.styleClass", "caption");
    }
    next.getAccessibleContext().setAccessibleName(Messages.text("status.next"));
    place.getAccessibleContext().setAccessibleName(Messages.text("status.place"));
    progress.setStringPainted(true);
    progress.setMaximumSize(progress.getPreferredSize());
    progress.getAccessibleContext().setAccessibleName(Messages.text("status.progress"));
    stop.addActionListener(e -> stopping.run());

    JPanel line = new JPanel();
    line.setLayout(new BoxLayout(line, BoxLayout.X_AXIS));
    line.setBorder(BorderFactory.createEmptyBorder(5, 14, 6, 14));
    line.add(next);
    line.add(Box.createHorizontalStrut(12));
    line.add(progress);
    line.add(Box.createHorizontalStrut(6));
    line.add(stop);
    line.add(Box.createHorizontalGlue());
    for (JLabel l : new JLabel[] {place, scale, picture}) {
      line.add(Box.createHorizontalStrut(18));
      line.add(l);
    }
    add(caution(cautions), BorderLayout.PAGE_START);
    add(line, BorderLayout.CENTER);
    progress(Double.NaN);
  }

  private static JPanel caution(Runnable all) {
    JPanel p = new JPanel(new BorderLayout(12, 0));
    p.putClientProperty("FlatLaf.styleClass", "caution");
    p.setBorder(BorderFactory.createEmptyBorder(2, 14, 2, 14));
    JLabel words = new JLabel(Messages.text("caution.line"));
    words.putClientProperty("FlatLaf.styleClass", "caution");
    JButton more = new JButton(Messages.text("caution.all"));
    more.putClientProperty("JButton.buttonType", "borderless");
    more.addActionListener(e -> all.run());
    p.add(words, BorderLayout.CENTER);
    p.add(more, BorderLayout.LINE_END);
    return p;
  }

  void next(String words) {
    next.setText(words);
  }

  void place(String words) {
    place.setText(words);
  }

  void scale(String words) {
    scale.setText(words);
  }

  void picture(String words) {
    picture.setText(words);
  }

  /** Share done, 0 to 1; NaN while nothing runs. */
  void progress(double share) {
    boolean runs = !Double.isNaN(share);
    progress.setVisible(runs);
    stop.setVisible(runs);
    if (runs) {
      progress.setValue((int) Math.round(100 * share));
    }
  }
}
