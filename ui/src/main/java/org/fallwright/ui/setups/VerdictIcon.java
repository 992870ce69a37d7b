package org.fallwright.ui.setups;

import java.awt.Color;
import java.awt.Component;
import java.awt.Font;
import java.awt.Graphics;
import java.awt.Graphics2D;
import javax.swing.Icon;
import org.fallwright.core.plan.Verdict;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.map.Pen;
import org.fallwright.ui.map.VerdictMark;

/**
 * The mark of a verdict as an icon.
 *
 * @param size side of the icon [pixels]
 */
record VerdictIcon(Verdict verdict, Palette palette, int size) implements Icon {
  @Override
  public void paintIcon(Component c, Graphics graphics, int x, int y) {
    Graphics2D g = (Graphics2D) graphics.create();
    g.setFont(new Font(Font.DIALOG, Font.PLAIN, 12));
    VerdictMark.paint(
        new Pen(g, new Color(0, 0, 0, 0)),
        verdict,
        x + size / 2.0,
        y + size / 2.0,
        size / 13.0,
        palette.of(verdict));
    g.dispose();
  }

  @Override
  public int getIconWidth() {
    return size;
  }

  @Override
  public int getIconHeight() {
    return size;
  }
}
