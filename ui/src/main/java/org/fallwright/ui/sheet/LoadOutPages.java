package org.fallwright.ui.sheet;

import java.awt.Font;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.kit.LoadOut;
import org.fallwright.ui.sheet.PageFlow.Column;
import org.fallwright.ui.sheet.PageFlow.Paragraph;

/**
 * A load-out list as pages of PDF, to be ticked with a pen at the truck: nothing on it is smaller
 * than 11 points but the foot, and nothing needs colour.
 */
public final class LoadOutPages {
  private static final double MARGIN = 36;
  private static final double GUTTER = 8;
  private static final double BOX = 11;
  private static final Font TITLE = SheetFonts.bold(16);
  private static final Font TRUCK = SheetFonts.bold(14);
  private static final Font TEXT = SheetFonts.plain(11);
  private static final Font STRONG = SheetFonts.bold(11);
  private static final Font FOOT = SheetFonts.plain(8);

  private final Paper paper;
  private final LoadOut list;
  private final String program;
  private final PageFlow flow;
  private final List<Column> columns;

  /**
   * @param program version of the program
   */
  public LoadOutPages(Paper paper, LoadOut list, String program) {
    this.paper = paper;
    this.list = list;
    this.program = program;
    flow = new PageFlow(MARGIN, MARGIN, paper.width() - 2 * MARGIN, paper.height() - MARGIN - 16);
    columns = columns(0.04, 0.06, 0.33, 0.11, 0.22, 0.24);
    fill();
  }

  /** The document. */
  public byte[] pdf() throws IOException {
    return PdfPages.of(
        paper,
        "Load-out. " + list.heading().get(0),
        flow.pages(),
        (g, i) -> {
          TextPen pen = new TextPen(g);
          flow.paint(i, pen);
          foot(pen, i);
        });
  }

  private void foot(TextPen pen, int page) {
    double y = paper.height() - MARGIN - 6;
    double right = paper.width() - MARGIN;
    String number = "page " + (page + 1) + " of " + flow.pages();
    pen.rule(MARGIN, right, y - 3);
    pen.right(number, FOOT, right, y);
    pen.fitted(
        "Fallwright " + program + ", a planning aid. Look at every piece before it is used.",
        FOOT,
        MARGIN,
        y,
        right - MARGIN - TextPen.width(number, FOOT) - 2 * GUTTER);
  }

  private void fill() {
    flow.text(printable("Load-out: " + list.heading().get(0)), TITLE, "");
    list.heading()
        .subList(1, list.heading().size())
        .forEach(s -> flow.text(printable(s), TEXT, "•"));
    for (LoadOut.Truck truck : list.trucks()) {
      flow.heading(printable(truck.name()), TRUCK);
      rows("Needed", truck.needed());
      rows("Spare, may stay", truck.spare());
    }
    sentences("Left behind", list.leftBehind());
    sentences("Take note", list.notes());
  }

  private void rows(String title, List<LoadOut.Row> rows) {
    if (rows.isEmpty()) {
      return;
    }
    flow.heading(title, STRONG);
    for (LoadOut.Row r : rows) {
      List<Paragraph> what = new ArrayList<>();
      what.add(new Paragraph(printable(r.item()), STRONG));
      what.add(new Paragraph(printable(r.what()), TEXT));
      if (!r.ends().isEmpty()) {
        what.add(new Paragraph(printable(r.ends()), TEXT));
      }
      List<Paragraph> where = new ArrayList<>();
      for (String s : List.of(r.shelf(), r.condition())) {
        if (!s.isEmpty()) {
          where.add(new Paragraph(printable(s), TEXT));
        }
      }
      flow.row(
          columns,
          List.of(
              List.of(),
              List.of(new Paragraph(r.count() + " ×", STRONG)),
              what,
              List.of(new Paragraph(r.length(), TEXT)),
              List.of(new Paragraph(r.rating(), TEXT)),
              where),
          BOX);
    }
  }

  private void sentences(String title, List<String> sentences) {
    if (!sentences.isEmpty()) {
      flow.heading(title, STRONG);
      sentences.forEach(s -> flow.text(printable(s), TEXT, "•"));
    }
  }

  private List<Column> columns(double... shares) {
    double all = paper.width() - 2 * MARGIN;
    List<Column> made = new ArrayList<>();
    double x = MARGIN;
    for (double share : shares) {
      made.add(new Column(x, share * all - GUTTER));
      x += share * all;
    }
    return made;
  }

  private static String printable(String text) {
    return SheetFonts.printable(text);
  }
}
