package org.fallwright.ui.sheet;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.font.FontRenderContext;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/**
 * Sets text on the page. Widths are measured without regard to pixels, so that lines break at the
 * same words on paper and in a picture.
 */
final class TextPen {
  private static final FontRenderContext PAGE = new FontRenderContext(null, true, true);

  /** Distance of baselines over the size of the type. */
  private static final double LEADING = 1.22;

  private final Graphics2D g;

  /**
   * @param g where to draw; null: only measure
   */
  TextPen(Graphics2D g) {
    this.g = g;
  }

  static double width(String text, Font font) {
    return font.getStringBounds(text, PAGE).getWidth();
  }

  static double lineHeight(Font font) {
    return font.getSize2D() * LEADING;
  }

  /** One line with its left end at x and its upper edge at y; returns the lower edge. */
  double line(String text, Font font, double x, double y) {
    if (g != null) {
      g.setColor(Color.BLACK);
      g.setFont(font);
      g.drawString(text, (float) x, (float) (y + font.getSize2D() * 0.95));
    }
    return y + lineHeight(font);
  }

  /** One line with its right end at x. */
  double right(String text, Font font, double x, double y) {
    return line(text, font, x - width(text, font), y);
  }

  /** One line, its end cut where it is too wide. */
  double fitted(String text, Font font, double x, double y, double width) {
    return line(fit(text, font, width), font, x, y);
  }

  /** Lines broken between words, the rest cut where there are too many; returns the lower edge. */
  double wrapped(String text, Font font, double x, double y, double width, int most) {
    List<String> lines = lines(text, font, width);
    double at = y;
    for (String l : lines.subList(0, Math.min(most, lines.size()))) {
      boolean cut =
          most < lines.size() && at + 1.5 * lineHeight(font) > y + most * lineHeight(font);
      at = line(cut ? fit(l + " …", font, width) : l, font, x, at);
    }
    return at;
  }

  /** A list's item with its mark hanging to the left. */
  double item(String mark, String text, Font font, double x, double y, double width, int most) {
    double indent = width(mark + " ", font);
    line(mark, font, x, y);
    return wrapped(text, font, x + indent, y, width - indent, most);
  }

  /** A thin rule. */
  void rule(double x1, double x2, double y) {
    if (g != null) {
      g.setColor(Color.BLACK);
      g.setStroke(new java.awt.BasicStroke(0.6f));
      g.draw(new Line2D.Double(x1, y, x2, y));
    }
  }

  /** An empty square with its upper left corner at (x, y). */
  void box(double x, double y, double side) {
    if (g != null) {
      g.setColor(Color.BLACK);
      g.setStroke(new java.awt.BasicStroke(1f));
      g.draw(new Rectangle2D.Double(x, y, side, side));
    }
  }

  static String fit(String text, Font font, double width) {
    if (width(text, font) <= width) {
      return text;
    }
    int end = text.endsWith(" …") ? text.length() - 2 : text.length();
    while (end > 0 && width(text.substring(0, end).stripTrailing() + "…", font) > width) {
      end = text.offsetByCodePoints(end, -1);
    }
    return text.substring(0, end).stripTrailing() + "…";
  }

  static List<String> lines(String text, Font font, double width) {
    List<String> lines = new ArrayList<>();
    String current = "";
    for (String word : text.strip().split(" +")) {
      String longer = current.isEmpty() ? word : current + " " + word;
      if (width(longer, font) <= width) {
        current = longer;
      } else {
        if (!current.isEmpty()) {
          lines.add(current);
        }
        current = fit(word, font, width);
      }
    }
    lines.add(current);
    return lines;
  }
}
