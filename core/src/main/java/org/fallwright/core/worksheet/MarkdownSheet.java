package org.fallwright.core.worksheet;

import java.util.List;
import java.util.Locale;

/** Writes a worksheet as Markdown with tables. */
public final class MarkdownSheet {
  private final StringBuilder out = new StringBuilder();

  private MarkdownSheet() {}

  /** The whole worksheet. */
  public static String write(Worksheet w) {
    MarkdownSheet m = new MarkdownSheet();
    m.line("# Worksheet");
    m.line("");
    m.line("**" + cell(w.title()) + "**");
    m.bullets("Cautions", w.cautions());
    m.bullets("The setup", w.remarks());
    m.bullets("How to read it", w.lead());
    for (Section s : w.sections()) {
      m.section(s);
    }
    m.results(w.results());
    m.compared(w.compared());
    m.sources(w);
    return m.out.toString();
  }

  private void section(Section s) {
    heading(s.title());
    for (String n : s.notes()) {
      line("");
      line(cell(n));
    }
    if (s.lines().isEmpty()) {
      return;
    }
    line("");
    line("| sign | what | sum | with numbers | result | unit | stands on |");
    line("|---|---|---|---|---|---|---|");
    for (Line l : s.lines()) {
      row(
          code(l.symbol()),
          l.name(),
          l.worked() ? code(l.formula()) : "",
          l.worked() ? code(l.numbers()) : "",
          code(l.result()),
          l.unit(),
          l.grounds());
    }
  }

  private void results(List<Worksheet.Result> results) {
    if (results.isEmpty()) {
      return;
    }
    heading("Checks");
    line("");
    line(
        "Clearances, zones and distances are results of geometry on the plan and are not worked by"
            + " hand here; measure with a tape what a decision hangs on.");
    line("");
    line("| check | there is | asked | ratio | verdict | why |");
    line("|---|---|---|---|---|---|");
    for (Worksheet.Result r : results) {
      row(r.check(), r.value(), r.limit(), r.ratio(), r.verdict(), r.why());
    }
  }

  private void compared(List<Compared> compared) {
    if (compared.isEmpty()) {
      return;
    }
    heading("Against the program's own figures");
    line("");
    line("What rounding after each line brings, against the same figure with nothing rounded.");
    line("");
    line("| sign | figure | worked here | program | unit | difference |");
    line("|---|---|---|---|---|---|");
    for (Compared c : compared) {
      row(
          c.symbol(),
          c.name(),
          number(c.worked()),
          number(c.exact()),
          c.unit(),
          String.format(Locale.ROOT, "%.4f %%", 100 * c.difference()));
    }
  }

  private void sources(Worksheet w) {
    if (w.sources().isEmpty()) {
      return;
    }
    heading("Sources");
    line("");
    w.sources().forEach((key, text) -> line("- " + key + ": " + cell(text)));
  }

  private void bullets(String title, List<String> sentences) {
    if (sentences.isEmpty()) {
      return;
    }
    heading(title);
    line("");
    sentences.forEach(s -> line("- " + cell(s)));
  }

  private void heading(String title) {
    line("");
    line("## " + cell(title));
  }

  private void row(String... cells) {
    StringBuilder b = new StringBuilder("|");
    for (String c : cells) {
      b.append(' ').append(cell(c)).append(" |");
    }
    line(b.toString());
  }

  private void line(String text) {
    out.append(text).append('\n');
  }

  private static String code(String text) {
    return "`" + text + "`";
  }

  static String number(double x) {
    return String.format(Locale.ROOT, "%.7g", x);
  }

  /** Keeps a name that a person typed from breaking the table. */
  private static String cell(String text) {
    return text.replace("|", "\\|").replaceAll("\\s+", " ");
  }
}
