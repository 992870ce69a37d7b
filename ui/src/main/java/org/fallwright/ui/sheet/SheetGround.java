package org.fallwright.ui.sheet;

import java.awt.AlphaComposite;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import org.fallwright.ui.map.GroundPainter;
import org.fallwright.ui.map.Viewport;

/**
 * The aerial picture as it goes under the plan on paper: drawn once into pixels of a fixed size,
 * the same for every output, and faded so that lines and words stand out in black and white.
 */
final class SheetGround {
  /** Pixels of the picture in an inch of paper. */
  private static final double DPI = 200;

  /** Share of white laid over the picture. */
  private static final float FADE = 0.6f;

  private SheetGround() {}

  static GroundPainter faded(GroundPainter ground) {
    return ground == GroundPainter.NONE ? ground : (g, view) -> paint(ground, g, view);
  }

  private static void paint(GroundPainter ground, Graphics2D g, Viewport view) {
    Rectangle2D frame = view.frame();
    double scale = DPI / 72;
    int width = (int) Math.ceil(frame.getWidth() * scale);
    int height = (int) Math.ceil(frame.getHeight() * scale);
    BufferedImage image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
    Graphics2D to = image.createGraphics();
    to.setColor(Color.WHITE);
    to.fillRect(0, 0, width, height);
    to.setRenderingHint(
        RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_BILINEAR);
    to.scale(scale, scale);
    to.translate(-frame.getX(), -frame.getY());
    ground.paint(to, view);
    to.setComposite(AlphaComposite.getInstance(AlphaComposite.SRC_OVER, FADE));
    to.setColor(Color.WHITE);
    to.fill(frame);
    to.dispose();
    AffineTransform place = AffineTransform.getTranslateInstance(frame.getX(), frame.getY());
    place.scale(1 / scale, 1 / scale);
    g.drawImage(image, place, null);
  }
}
