package org.fallwright.ui.side;

import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import javax.swing.JPanel;
import org.fallwright.ui.map.Offscreen;
import org.fallwright.ui.text.Messages;

/** The profile on screen. */
public final class ProfilePanel extends JPanel {
  private final Offscreen offscreen = new Offscreen();
  private ProfilePainter painter;

  public ProfilePanel() {
    setPreferredSize(new Dimension(600, 240));
    setMinimumSize(new Dimension(200, 120));
    getAccessibleContext().setAccessibleName(Messages.text("profile.name"));
  }

  /** Draws this profile from now on; null: nothing. */
  public void draw(ProfilePainter shown) {
    painter = shown;
    repaint();
  }

  @Override
  protected void paintComponent(Graphics g) {
    super.paintComponent(g);
    if (painter != null) {
      g.setFont(getFont());
      offscreen.paint(
          (Graphics2D) g,
          getWidth(),
          getHeight(),
          List.of(painter, getFont()),
          on -> painter.paint(on, new Rectangle2D.Double(0, 0, getWidth(), getHeight())));
    }
  }
}
