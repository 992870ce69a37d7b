package org.fallwright.ui.sheet;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.util.List;
import org.fallwright.ui.map.Pen;
import org.fallwright.ui.map.VerdictMark;

/**
 * The tables of the sheet: loads at the left, checks that are not clear at the right, warnings
 * under the shorter of the two. Each shows as many rows as there is room for and says how many it
 * leaves out.
 */
final class SheetTables {
  private static final Font SMALL = SheetPainter.SMALL;
  private static final Font BODY = SheetPainter.BODY;
  private static final Font BODY_BOLD = SheetPainter.BODY_BOLD;
  private static final Font HEAD = SheetPainter.HEAD;
  private static final double GAP = SheetPainter.GAP;

  /** Share of the width that the loads take. */
  private static final double LOADS_SHARE = 0.56;

  /** Rows of each table that are kept however little room there is. */
  private static final int FEWEST = 2;

  private final SheetContent content;
  private final double left;
  private final double middle;
  private final double right;

  // rows shown of each table: as many as the page has room for
  private int mostLoads = 16;
  private int mostUnsettled = 10;
  private int mostNotes = 8;
  private int mostCrewLines = 6;

  SheetTables(SheetContent content, double left, double right) {
    this.content = content;
    this.left = left;
    this.right = right;
    middle = left + (right - left) * LOADS_SHARE;
  }

  /**
   * Where the tables begin so that they end at a height; rows are left out where they would begin
   * above another.
   */
  double top(double bottom, double highest) {
    TextPen measure = new TextPen(null);
    double room = bottom - highest;
    while (paint(null, measure, 0) > room && fewerRows(measure)) {
      // one row less of the taller column
    }
    return bottom - paint(null, measure, 0);
  }

  /** Takes a row from the taller column of the tables; false where none has any to spare. */
  private boolean fewerRows(TextPen measure) {
    double loads = loads(measure, left, 0, middle - left);
    double unsettled = unsettled(null, measure, middle + GAP, 0, right - middle - GAP);
    boolean notesDecide = paint(null, measure, 0) > Math.max(loads, unsettled);
    boolean leftDecides = notesDecide ? loads <= unsettled : loads > unsettled;
    if (notesDecide && mostNotes > FEWEST) {
      mostNotes--;
    } else if (mostLoads > FEWEST && (leftDecides || mostUnsettled == FEWEST)) {
      mostLoads--;
    } else if (mostUnsettled > FEWEST) {
      mostUnsettled--;
    } else if (mostCrewLines > FEWEST) {
      mostCrewLines--;
    } else {
      return false;
    }
    return true;
  }

  /** Paints them, without a graphics only measures; returns the lower edge. */
  double paint(Graphics2D g, TextPen pen, double top) {
    double a = loads(pen, left, top, middle - left);
    double b = unsettled(g, pen, middle + GAP, top, right - middle - GAP);
    return a <= b
        ? Math.max(b, notes(pen, left, a + 3, middle - left))
        : Math.max(a, notes(pen, middle + GAP, b + 3, right - middle - GAP));
  }

  private double notes(TextPen pen, double x, double top, double width) {
    List<String> all = content.notes();
    if (all.isEmpty()) {
      return top;
    }
    double y = pen.line("Take note", HEAD, x, top);
    int shown = Math.min(all.size(), mostNotes);
    for (String note : all.subList(0, shown)) {
      y = pen.item("–", note, SMALL, x, y, width, 3);
    }
    return shown < all.size()
        ? pen.line((all.size() - shown) + " more in the plan document.", SMALL, x, y)
        : y;
  }

  private double loads(TextPen pen, double x, double top, double width) {
    double[] ends = {width * 0.52, width * 0.67, width * 0.84, width};
    double y = pen.line("Loads on the parts", HEAD, x, top);
    String[] heads = {"at plan", "allowed", "at most", "allowed"};
    for (int i = 0; i < 4; i++) {
      pen.right(heads[i], SMALL, x + ends[i], top + 1);
    }
    pen.rule(x, x + width, y);
    y += 1.5;
    List<SheetContent.Load> rows = content.loads();
    int shown = Math.min(rows.size(), mostLoads);
    for (SheetContent.Load r : rows.subList(0, shown)) {
      pen.fitted(r.part(), BODY, x, y, ends[0] - 50);
      pen.right(r.atPlan() + (r.overAtPlan() ? " ×" : ""), font(r.overAtPlan()), x + ends[0], y);
      pen.right(r.allowedAtPlan(), BODY, x + ends[1], y);
      pen.right(r.atMost() + (r.overAtMost() ? " ×" : ""), font(r.overAtMost()), x + ends[2], y);
      y = pen.right(r.allowedAtMost(), BODY, x + ends[3], y);
    }
    if (rows.isEmpty()) {
      y = pen.line("None worked out: see the sentence above.", BODY, x, y);
    }
    if (shown < rows.size()) {
      y = pen.line((rows.size() - shown) + " more parts in the plan document.", SMALL, x, y);
    }
    y =
        pen.wrapped(
            "At most: the source stalls, slips or jerks. × over what is allowed.",
            SMALL,
            x,
            y + 1,
            width,
            2);
    for (SheetContent.Line l : content.crew()) {
      y = pen.line(l.name(), HEAD, x, y + 2);
      y = pen.wrapped(l.value(), BODY, x, y, width, mostCrewLines);
    }
    return y;
  }

  private static Font font(boolean over) {
    return over ? BODY_BOLD : BODY;
  }

  private double unsettled(Graphics2D g, TextPen pen, double x, double top, double width) {
    double y = pen.line("Not clear: tight or worse", HEAD, x, top);
    pen.rule(x, x + width, y);
    y += 1.5;
    List<SheetContent.Unsettled> all = content.unsettled();
    if (all.isEmpty()) {
      y = pen.line("Every check is workable.", BODY, x, y);
    }
    int shown = Math.min(all.size(), mostUnsettled);
    for (SheetContent.Unsettled u : all.subList(0, shown)) {
      if (g != null) {
        Graphics2D mark = (Graphics2D) g.create();
        mark.setFont(SheetFonts.bold(7));
        VerdictMark.paint(new Pen(mark, Color.WHITE), u.verdict(), x + 4, y + 5, 1, Color.BLACK);
        mark.dispose();
      }
      y = pen.wrapped(u.text(), BODY, x + 12, y, width - 12, 3) + 1;
    }
    if (shown < all.size()) {
      y = pen.line((all.size() - shown) + " more checks in the plan document.", SMALL, x, y);
    }
    return y;
  }
}
