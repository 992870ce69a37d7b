package org.fallwright.ui.sheet;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.site.Site;
import org.fallwright.ui.map.GroundPainter;
import org.fallwright.ui.map.NorthArrow;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.map.Pen;
import org.fallwright.ui.map.PlanPainter;
import org.fallwright.ui.map.PlanScene;
import org.fallwright.ui.map.ScaleBar;
import org.fallwright.ui.map.VerdictMark;
import org.fallwright.ui.map.Viewport;
import org.fallwright.ui.text.Amounts;

/**
 * Lays the sheet out and draws it into any graphics whose user space is the page in points: the
 * head, the plan true to scale with the figures beside it, the tables, and what must be said. The
 * plan takes the height that the rest leaves.
 */
final class SheetPainter {
  private static final double MARGIN = 26;
  static final double GAP = 9;

  /** Share of the page's width that the plan takes. */
  private static final double PLAN_SHARE = 0.62;

  /** Height of the strip under the plan: scale bar, north, check bar. */
  private static final double STRIP = 50;

  /** Least height of the plan. */
  private static final double LEAST_PLAN = 230;

  /** How far the list of what is not known may stand out under the cautions. */
  private static final double MORE_NOT_KNOWN = 12;

  /** Size of the labels on the plan, a size of their own. */
  static final double LABELS = 7.2;

  static final Font SMALL = SheetFonts.plain(7);
  static final Font BODY = SheetFonts.plain(7.8);
  static final Font BODY_BOLD = SheetFonts.bold(7.8);
  static final Font HEAD = SheetFonts.bold(8);

  private final Paper paper;
  private final Site site;
  private final Judged judged;
  private final SheetContent content;
  private final GroundPainter ground;
  private final double left = MARGIN;
  private final double right;

  SheetPainter(Paper paper, Site site, Judged judged, SheetContent content, GroundPainter ground) {
    this.paper = paper;
    this.site = site;
    this.judged = judged;
    this.content = content;
    this.ground = ground;
    right = paper.width() - MARGIN;
  }

  void paint(Graphics2D g) {
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g.setRenderingHint(
        RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
    g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    TextPen pen = new TextPen(g);
    double bodyTop = head(g, pen);
    double foot = paper.height() - MARGIN - TextPen.lineHeight(SMALL);
    TextPen measure = new TextPen(null);
    double wordsTop = foot - GAP / 2 - words(measure, 0);
    double middle = left + (right - left) * PLAN_SHARE;
    double least = Math.max(LEAST_PLAN + STRIP, figures(null, measure, middle + GAP, 0));
    SheetTables tables = new SheetTables(content, left, right);
    double tablesTop = tables.top(wordsTop - GAP, bodyTop + least + GAP);
    plan(
        g, new Rectangle2D.Double(left, bodyTop, middle - left, tablesTop - GAP - STRIP - bodyTop));
    figures(g, pen, middle + GAP, bodyTop);
    tables.paint(g, pen, tablesTop);
    words(pen, wordsTop);
    pen.rule(left, right, foot - 2);
    String fault = ground.fault();
    pen.fitted(fault == null ? content.picture() : fault, SMALL, left, foot, right - left);
  }

  /** Title, lines to fill in, verdict with its mark, the sentence; returns the lower edge. */
  private double head(Graphics2D g, TextPen pen) {
    double boxWidth = 158;
    double boxHeight = 46;
    Rectangle2D box = new Rectangle2D.Double(right - boxWidth, MARGIN, boxWidth, boxHeight);
    g.setColor(Color.BLACK);
    g.setStroke(new BasicStroke(1.6f));
    g.draw(box);
    Graphics2D mark = (Graphics2D) g.create();
    mark.setFont(SheetFonts.bold(12));
    VerdictMark.paint(
        new Pen(mark, Color.WHITE),
        content.verdict(),
        box.getX() + 21,
        box.getCenterY(),
        2.2,
        Color.BLACK);
    mark.dispose();
    Font word = SheetFonts.bold(13.5);
    pen.line(content.verdict().word(), word, box.getX() + 41, box.getCenterY() - 8.5);

    double width = box.getX() - GAP - left;
    double y = pen.fitted(content.title(), SheetFonts.bold(15), left, MARGIN - 2, width);
    y = pen.fitted(content.subtitle(), BODY, left, y + 1, width) + 5;
    double x = left;
    for (String blank : List.of("Date", "In charge", "Sheet checked by")) {
      pen.line(blank, BODY, x, y);
      double from = x + TextPen.width(blank + " ", BODY);
      double to = blank.equals("Date") ? from + 62 : from + 92;
      pen.rule(from, Math.min(to, left + width), y + 9);
      x = to + 6;
    }
    y = MARGIN + boxHeight + 4;
    return pen.wrapped(content.sentence(), SheetFonts.bold(9.5), left, y, right - left, 3) + 4;
  }

  private void plan(Graphics2D g, Rectangle2D frame) {
    Viewport view = MapScale.view(site, judged, frame);
    Amounts amounts = new Amounts(site.display());
    Graphics2D map = (Graphics2D) g.create();
    map.setFont(SheetFonts.plain(LABELS));
    new PlanPainter(PlanScene.of(site, judged).in(amounts).over(SheetGround.faded(ground)))
        .paint(map, view);
    map.dispose();
    g.setColor(Color.BLACK);
    g.setStroke(new BasicStroke(0.8f));
    g.draw(frame);

    Graphics2D strip = (Graphics2D) g.create();
    strip.setFont(SheetFonts.plain(8));
    Pen pen = new Pen(strip, Color.WHITE);
    Palette ink = Palette.GREY;
    ScaleBar.paint(pen, view, amounts, ink, left + 4, frame.getMaxY() + 25, 105);
    NorthArrow.paint(
        pen,
        view,
        site.declinationDeg(),
        ink,
        new Point2D.Double(frame.getMaxX() - 30, frame.getMaxY() + 31),
        44);
    strip.dispose();
    new TextPen(g)
        .line(
            "Scale 1:" + Math.round(view.paperScale()),
            SheetFonts.bold(9.5),
            left + 130,
            frame.getMaxY() + 11);
    checkBar(g, left + 1, frame.getMaxY() + 35);
  }

  /** A bar that is 100 mm long where the printer has kept the size. */
  private void checkBar(Graphics2D g, double x, double y) {
    double end = x + Paper.points(100);
    g.setColor(Color.BLACK);
    float pen = 0.8f;
    g.setStroke(new BasicStroke(pen, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER));
    g.draw(new Line2D.Double(x, y, end, y));
    for (int mm = 0; mm <= 100; mm += 10) {
      double tick = mm % 50 == 0 ? 4 : 2.2;
      // the outer edges of the end ticks are what is 100 mm apart
      double inward = mm == 0 ? pen / 2 : mm == 100 ? -pen / 2 : 0;
      double at = x + Paper.points(mm) + inward;
      g.draw(new Line2D.Double(at, y - tick, at, y + tick));
    }
    new TextPen(g)
        .line(
            "Check bar: 100 mm. If it is not, trust the scale bar, not the ratio.",
            SMALL,
            x,
            y + 4.5);
  }

  private double figures(Graphics2D g, TextPen pen, double x, double top) {
    double width = right - x;
    double y = pen.line("Line tension at the tree", HEAD, x, top - 1) + 1;
    double w = (width - 4) / 2;
    double h = 36;
    for (int i = 0; i < content.readings().size(); i++) {
      SheetContent.Reading r = content.readings().get(i);
      double bx = x + (i % 2) * (w + 4);
      double by = y + (i / 2) * (h + 4);
      if (g != null) {
        g.setColor(Color.BLACK);
        g.setStroke(new BasicStroke(1f));
        g.draw(new Rectangle2D.Double(bx, by, w, h));
      }
      pen.fitted(r.name(), SMALL, bx + 3, by + 2, w - 6);
      pen.line(r.shown(), SheetFonts.bold(13), bx + 3, by + 10);
      pen.line(r.other(), BODY, bx + 3, by + 25);
    }
    y += 2 * (h + 4) + 3;
    y = table(pen, content.pull(), x, y, width) + 5;
    y = pen.line("Set up", HEAD, x, y) + 1;
    y = table(pen, content.setup(), x, y, width) + 5;
    y = pen.line("Clear of the tree", HEAD, x, y) + 1;
    return table(pen, content.keepOut(), x, y, width);
  }

  private static double table(
      TextPen pen, List<SheetContent.Line> lines, double x, double y, double width) {
    double names = 62;
    double at = y;
    for (SheetContent.Line l : lines) {
      double a = pen.wrapped(l.name(), BODY_BOLD, x, at, names - 4, 2);
      double b = pen.wrapped(l.value(), BODY, x + names, at, width - names, 3);
      at = Math.max(a, b) + 1.2;
    }
    return at;
  }

  private double words(TextPen pen, double top) {
    double column = (right - left - 2 * GAP) / 3;
    pen.rule(left, right, top);
    double y = top + 3;
    double bottom = pen.line("Before every pull", HEAD, left, y);
    List<String> cautions = content.cautions();
    int half = half(cautions, column);
    double a = items(pen, cautions.subList(0, half), left, bottom, column);
    double b =
        items(pen, cautions.subList(half, cautions.size()), left + column + GAP, bottom, column);
    double x = left + 2 * (column + GAP);
    pen.line("Not known, not checked", HEAD, x, y);
    double room = Math.max(a, b) - bottom + MORE_NOT_KNOWN;
    double c = items(pen, shortened(content.notKnown(), column, room), x, bottom, column);
    return Math.max(a, Math.max(b, c));
  }

  /** The items of a list that a column of some height holds, and how many it does not. */
  private static List<String> shortened(List<String> items, double width, double height) {
    TextPen measure = new TextPen(null);
    List<String> shown = items;
    for (int n = items.size() - 1; n >= 0 && items(measure, shown, 0, 0, width) > height; n--) {
      shown = new ArrayList<>(items.subList(0, n));
      shown.add((items.size() - n) + " more in the plan document.");
    }
    return shown;
  }

  private static double items(TextPen pen, List<String> items, double x, double top, double width) {
    double y = top;
    for (String item : items) {
      y = pen.item("–", item, SMALL, x, y, width, 7) + 0.6;
    }
    return y;
  }

  /** How many items of a list go into the first of two columns of even height. */
  private static int half(List<String> items, double width) {
    TextPen measure = new TextPen(null);
    double all = items(measure, items, 0, 0, width);
    int n = 0;
    while (n < items.size() && items(measure, items.subList(0, n), 0, 0, width) < all / 2) {
      n++;
    }
    return n;
  }
}
