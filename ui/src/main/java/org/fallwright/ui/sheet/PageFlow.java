package org.fallwright.ui.sheet;

import java.awt.Font;
import java.util.ArrayList;
import java.util.List;

/**
 * Text and table rows set one below the other over as many pages as they need. Nothing is cut: a
 * text that is too wide is broken, and a row stays whole on one page.
 */
final class PageFlow {
  private static final double GAP = 8;
  private static final double PADDING = 1.6;

  /** One thing on a page: how high it is and how it is set with its upper edge at y. */
  private record Block(double height, Painter painter) {}

  /** Sets a block. */
  private interface Painter {
    void at(TextPen pen, double y);
  }

  /** A block with its upper edge. */
  private record Placed(Block block, double y) {}

  /**
   * A column of a table.
   *
   * @param x left end
   * @param width width
   */
  record Column(double x, double width) {}

  /**
   * A cell's paragraph.
   *
   * @param text what it says
   * @param font its typeface
   */
  record Paragraph(String text, Font font) {}

  private final double left;
  private final double width;
  private final double top;
  private final double bottom;
  private final List<List<Placed>> pages = new ArrayList<>();
  private double y;

  /** A flow in the rectangle from (left, top), {@code width} wide, down to {@code bottom}. */
  PageFlow(double left, double top, double width, double bottom) {
    this.left = left;
    this.top = top;
    this.width = width;
    this.bottom = bottom;
    turn();
  }

  int pages() {
    return pages.size();
  }

  /** Sets a page, 0 for the first. */
  void paint(int page, TextPen pen) {
    for (Placed p : pages.get(page)) {
      p.block().painter().at(pen, p.y());
    }
  }

  /** A heading, which is never left alone at the foot of a page. */
  void heading(String text, Font font) {
    y += pages.get(pages.size() - 1).isEmpty() ? 0 : GAP;
    if (y + 6 * TextPen.lineHeight(font) > bottom) {
      turn();
    }
    text(text, font, "");
    y += 2;
  }

  /** A paragraph, with a mark hanging to its left where it is an item of a list. */
  void text(String text, Font font, String mark) {
    double indent = mark.isEmpty() ? 0 : TextPen.width(mark + " ", font);
    List<String> lines = broken(text, font, width - indent);
    put(
        new Block(
            lines.size() * TextPen.lineHeight(font),
            (pen, at) -> {
              pen.line(mark, font, left, at);
              set(pen, lines, font, left + indent, at);
            }));
  }

  /** A row of a table: for each column its paragraphs. */
  void row(List<Column> columns, List<List<Paragraph>> cells) {
    row(columns, cells, 0);
  }

  /**
   * A row with an empty box to be ticked with a pen at its left end.
   *
   * @param box side of the box [points]; 0: none
   */
  void row(List<Column> columns, List<List<Paragraph>> cells, double box) {
    double height = box;
    for (int i = 0; i < columns.size(); i++) {
      double h = 0;
      for (Paragraph p : cells.get(i)) {
        h +=
            broken(p.text(), p.font(), columns.get(i).width()).size()
                * TextPen.lineHeight(p.font());
      }
      height = Math.max(height, h);
    }
    put(
        new Block(
            height + 2 * PADDING,
            (pen, at) -> {
              for (int i = 0; i < columns.size(); i++) {
                double y1 = at + PADDING;
                for (Paragraph p : cells.get(i)) {
                  List<String> lines = broken(p.text(), p.font(), columns.get(i).width());
                  y1 = set(pen, lines, p.font(), columns.get(i).x(), y1);
                }
              }
              if (box > 0) {
                pen.box(columns.get(0).x(), at + PADDING, box);
              }
              pen.rule(left, left + width, at);
            }));
  }

  private void put(Block block) {
    if (y + block.height() > bottom) {
      turn();
    }
    pages.get(pages.size() - 1).add(new Placed(block, y));
    y += block.height();
  }

  private void turn() {
    pages.add(new ArrayList<>());
    y = top;
  }

  private static double set(TextPen pen, List<String> lines, Font font, double x, double y) {
    double at = y;
    for (String l : lines) {
      at = pen.line(l, font, x, at);
    }
    return at;
  }

  /** Lines broken between words; a word that is wider than a line is broken within. */
  private static List<String> broken(String text, Font font, double width) {
    StringBuilder b = new StringBuilder();
    for (String word : text.split(" ")) {
      String rest = word;
      while (TextPen.width(rest, font) > width && rest.length() > 1) {
        int end = rest.length() - 1;
        while (end > 1 && TextPen.width(rest.substring(0, end), font) > width) {
          end--;
        }
        b.append(rest, 0, end).append(' ');
        rest = rest.substring(end);
      }
      b.append(rest).append(' ');
    }
    return TextPen.lines(b.toString(), font, width);
  }
}
