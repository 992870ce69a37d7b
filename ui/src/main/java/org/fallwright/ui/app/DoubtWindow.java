package org.fallwright.ui.app;

import java.awt.BorderLayout;
import java.awt.Frame;
import java.awt.event.WindowAdapter;
import java.awt.event.WindowEvent;
import javax.swing.JButton;
import javax.swing.JDialog;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JProgressBar;
import javax.swing.SwingConstants;
import org.fallwright.core.doubt.Doubt;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.site.Site;
import org.fallwright.ui.charts.DoubtPanel;
import org.fallwright.ui.task.NewestWins;
import org.fallwright.ui.task.Planning;
import org.fallwright.ui.text.Messages;

/** A window that works out the doubt of one setup in the background and then shows it. */
final class DoubtWindow extends JDialog {
  private static final long serialVersionUID = 1;
  private static final int WHOLE = 1000;

  private final JProgressBar bar = new JProgressBar(0, WHOLE);

  DoubtWindow(Frame owner, Planning planning, NewestWins doubting, Site site, Judged judged) {
    super(owner, Messages.text("doubt.title"), false);
    JPanel working = new JPanel(new BorderLayout(8, 8));
    working.add(
        new JLabel(Messages.text("doubt.working"), SwingConstants.CENTER), BorderLayout.CENTER);
    working.add(bar, BorderLayout.PAGE_END);
    JButton stop = new JButton(Messages.text("doubt.stop"));
    stop.addActionListener(e -> dispose());
    working.add(stop, BorderLayout.LINE_END);
    setContentPane(working);
    setDefaultCloseOperation(DISPOSE_ON_CLOSE);
    addWindowListener(
        new WindowAdapter() {
          @Override
          public void windowClosed(WindowEvent e) {
            doubting.cancel();
          }
        });
    setSize(760, 560);
    setLocationRelativeTo(owner);
    doubting.start(
        (progress, cancelled) -> planning.doubt(site, judged.setup(), progress, cancelled),
        new NewestWins.Outcome<Doubt>() {
          @Override
          public void progress(double share) {
            bar.setValue((int) (WHOLE * share));
          }

          @Override
          public void done(Doubt doubt) {
            show(new DoubtPanel(doubt, judged.figures().sourceLowN(), site.display().units()));
          }

          @Override
          public void failed(Exception cause) {
            JPanel said = new JPanel(new BorderLayout());
            said.add(new JLabel(MainWindow.sentence(cause), SwingConstants.CENTER));
            show(said);
          }
        });
  }

  private void show(JPanel panel) {
    setContentPane(panel);
    revalidate();
    repaint();
  }
}
