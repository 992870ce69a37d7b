package org.fallwright.ui.sheet;

import java.awt.Font;
import java.io.IOException;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.worksheet.Compared;
import org.fallwright.core.worksheet.Line;
import org.fallwright.core.worksheet.Section;
import org.fallwright.core.worksheet.Worksheet;
import org.fallwright.ui.sheet.PageFlow.Column;
import org.fallwright.ui.sheet.PageFlow.Paragraph;

/** A worksheet as pages of PDF with its typeface embedded; the same input gives the same bytes. */
public final class WorksheetPages {
  private static final double MARGIN = 36;
  private static final double GUTTER = 6;
  private static final Font TITLE = SheetFonts.bold(14);
  private static final Font HEADING = SheetFonts.bold(10);
  private static final Font TEXT = SheetFonts.plain(8.5);
  private static final Font CELL = SheetFonts.plain(7.5);
  private static final Font STRONG = SheetFonts.bold(7.5);
  private static final Font SMALL = SheetFonts.plain(6.5);

  private final Paper paper;
  private final Worksheet sheet;
  private final String program;
  private final PageFlow flow;

  /**
   * @param paper size of the pages
   * @param sheet what is on them
   * @param program version of the program
   */
  public WorksheetPages(Paper paper, Worksheet sheet, String program) {
    this.paper = paper;
    this.sheet = sheet;
    this.program = program;
    flow = new PageFlow(MARGIN, MARGIN, paper.width() - 2 * MARGIN, paper.height() - MARGIN - 14);
    fill();
  }

  /** Number of pages. */
  public int pages() {
    return flow.pages();
  }

  /** The document. */
  public byte[] pdf() throws IOException {
    return PdfPages.of(
        paper,
        "Worksheet. " + sheet.title(),
        flow.pages(),
        (g, i) -> {
          TextPen pen = new TextPen(g);
          flow.paint(i, pen);
          foot(pen, i);
        });
  }

  private void foot(TextPen pen, int page) {
    double y = paper.height() - MARGIN - 4;
    double right = paper.width() - MARGIN;
    String number = "page " + (page + 1) + " of " + flow.pages();
    pen.rule(MARGIN, right, y - 3);
    pen.right(number, SMALL, right, y);
    pen.fitted(
        "Fallwright "
            + program
            + ", a planning aid that approves nothing. "
            + printable(sheet.title()),
        SMALL,
        MARGIN,
        y,
        right - MARGIN - TextPen.width(number, SMALL) - 2 * GUTTER);
  }

  private void fill() {
    flow.text("Worksheet", TITLE, "");
    flow.text(printable(sheet.title()), HEADING, "");
    list("Cautions", sheet.cautions());
    list("The setup", sheet.remarks());
    list("How to read it", sheet.lead());
    sheet.sections().forEach(this::section);
    results();
    compared();
    if (!sheet.sources().isEmpty()) {
      flow.heading("Sources", HEADING);
      sheet.sources().forEach((key, text) -> flow.text(key + ": " + printable(text), CELL, "•"));
    }
  }

  private void list(String title, List<String> sentences) {
    if (!sentences.isEmpty()) {
      flow.heading(title, HEADING);
      sentences.forEach(s -> flow.text(printable(s), TEXT, "•"));
    }
  }

  private void section(Section s) {
    flow.heading(printable(s.title()), HEADING);
    s.notes().forEach(n -> flow.text(printable(n), TEXT, ""));
    List<Column> columns = columns(0.085, 0.29, 0.455, 0.17);
    List<Column> given = columns(0.085, 0.745, 0.17);
    for (Line l : s.lines()) {
      List<Paragraph> sign = List.of(new Paragraph(l.symbol(), STRONG));
      Paragraph result =
          new Paragraph(((l.worked() ? "= " : "") + l.result() + " " + l.unit()).strip(), STRONG);
      if (l.worked()) {
        flow.row(
            columns,
            List.of(
                sign,
                List.of(
                    new Paragraph(printable(l.name()), CELL), new Paragraph(l.grounds(), SMALL)),
                List.of(new Paragraph(l.formula(), CELL), new Paragraph("= " + l.numbers(), CELL)),
                List.of(result)));
      } else {
        String what = printable(l.name()) + " (" + l.grounds() + ")";
        flow.row(given, List.of(sign, List.of(new Paragraph(what, CELL)), List.of(result)));
      }
    }
  }

  private void results() {
    if (sheet.results().isEmpty()) {
      return;
    }
    flow.heading("Checks", HEADING);
    flow.text(
        "Clearances, zones and distances are results of geometry on the plan and are not worked by"
            + " hand here; measure with a tape what a decision hangs on.",
        TEXT,
        "");
    List<Column> columns = columns(0.2, 0.12, 0.12, 0.07, 0.11, 0.38);
    strong(columns, "check", "there is", "asked", "ratio", "verdict", "why");
    for (Worksheet.Result r : sheet.results()) {
      plain(columns, r.check(), r.value(), r.limit(), r.ratio(), r.verdict(), r.why());
    }
  }

  private void compared() {
    if (sheet.compared().isEmpty()) {
      return;
    }
    flow.heading("Against the program's own figures", HEADING);
    flow.text(
        "What rounding after each line brings, against the same figure with nothing rounded.",
        TEXT,
        "");
    List<Column> columns = columns(0.085, 0.435, 0.14, 0.14, 0.1, 0.1);
    strong(columns, "sign", "figure", "worked here", "program", "unit", "difference");
    for (Compared c : sheet.compared()) {
      plain(
          columns,
          c.symbol(),
          c.name(),
          String.format(Locale.ROOT, "%.7g", c.worked()),
          String.format(Locale.ROOT, "%.7g", c.exact()),
          c.unit(),
          String.format(Locale.ROOT, "%.4f %%", 100 * c.difference()));
    }
  }

  private void strong(List<Column> columns, String... cells) {
    row(columns, STRONG, cells);
  }

  private void plain(List<Column> columns, String... cells) {
    row(columns, CELL, cells);
  }

  private void row(List<Column> columns, Font font, String... cells) {
    flow.row(
        columns,
        java.util.Arrays.stream(cells)
            .map(c -> List.of(new Paragraph(printable(c), font)))
            .toList());
  }

  private List<Column> columns(double... shares) {
    double all = paper.width() - 2 * MARGIN;
    List<Column> columns = new java.util.ArrayList<>();
    double x = MARGIN;
    for (double share : shares) {
      columns.add(new Column(x, share * all - GUTTER));
      x += share * all;
    }
    return columns;
  }

  private static String printable(String text) {
    return SheetFonts.printable(text);
  }
}
