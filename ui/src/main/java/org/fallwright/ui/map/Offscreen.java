package org.fallwright.ui.map;

import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.image.BufferedImage;
import java.util.List;
import java.util.function.Consumer;

/**
 * A drawing kept as an image of the display's own pixels and painted again only when its key
 * changes. Many fine strokes straight to the screen are slow on displays without hardware drawing.
 */
public final class Offscreen {
  private BufferedImage image;
  private List<?> drawn;

  /**
   * Shows the drawing.
   *
   * @param width its width in user pixels
   * @param key what it depends on, besides its size and the display's scale
   */
  public void paint(
      Graphics2D g, int width, int height, List<?> key, Consumer<Graphics2D> painting) {
    if (width <= 0 || height <= 0) {
      return;
    }
    double sx = g.getTransform().getScaleX();
    double sy = g.getTransform().getScaleY();
    List<?> all = List.of(width, height, sx, sy, key);
    if (image == null || !all.equals(drawn)) {
      image =
          new BufferedImage(
              (int) Math.ceil(width * sx),
              (int) Math.ceil(height * sy),
              BufferedImage.TYPE_INT_ARGB_PRE);
      Graphics2D on = image.createGraphics();
      on.scale(sx, sy);
      on.setFont(g.getFont());
      painting.accept(on);
      on.dispose();
      drawn = all;
    }
    g.drawImage(image, AffineTransform.getScaleInstance(1 / sx, 1 / sy), null);
  }
}
