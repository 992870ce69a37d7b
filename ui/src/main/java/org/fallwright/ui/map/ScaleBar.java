package org.fallwright.ui.map;

import java.awt.geom.Rectangle2D;
import org.fallwright.ui.text.Amounts;

/** A bar of a round length in the reader's units, in four fields. */
public final class ScaleBar {
  private ScaleBar() {}

  /**
   * The longest of 1, 2, 5, 10, 20 ... of the reader's units that fits into a length on the ground
   * [m].
   */
  public static double roundLength(Amounts amounts, double longestM) {
    double longest = longestM / amounts.rulerUnitM();
    double power = Math.pow(10, Math.floor(Math.log10(longest)));
    double lead = longest / power;
    double round = lead >= 5 ? 5 : lead >= 2 ? 2 : 1;
    return round * power * amounts.rulerUnitM();
  }

  /**
   * @param x left end [pixels]
   * @param y lower edge [pixels]
   * @param widest most width [pixels]
   * @return the box painted
   */
  public static Rectangle2D paint(
      Pen pen, Viewport view, Amounts amounts, Palette palette, double x, double y, double widest) {
    double metres = roundLength(amounts, widest / view.pixelsPerMetre());
    double width = view.pixels(metres);
    double height = 5 * pen.unit();
    Rectangle2D bar = new Rectangle2D.Double(x, y - height, width, height);
    pen.solid(bar, palette.halo(), palette.ink(), 1);
    for (int i = 0; i < 4; i += 2) {
      pen.fill(
          new Rectangle2D.Double(x + width * i / 4, y - height, width / 4, height), palette.ink());
    }
    double base = y - height - 5 * pen.unit();
    pen.text("0", x, base, palette.ink());
    String end = amounts.roundLength(metres);
    pen.text(end, x + width - pen.extent(end).getWidth() / 2, base, palette.ink());
    return new Rectangle2D.Double(x, base - 12 * pen.unit(), width, y - base + 12 * pen.unit());
  }
}
