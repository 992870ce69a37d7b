package org.fallwright.core.kit;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** A load-out list as Markdown, which reads as plain text as well. */
public final class LoadOutText {
  private LoadOutText() {}

  /** The whole list. */
  public static String of(LoadOut list) {
    StringBuilder b = new StringBuilder("# Load-out: " + list.heading().get(0) + "\n\n");
    list.heading().subList(1, list.heading().size()).forEach(s -> b.append("- " + s + "\n"));
    for (LoadOut.Truck t : list.trucks()) {
      b.append("\n## " + t.name() + "\n");
      rows(b, "Needed", t.needed());
      rows(b, "Spare, may stay", t.spare());
    }
    sentences(b, "Left behind", list.leftBehind());
    sentences(b, "Take note", list.notes());
    return b.toString();
  }

  private static void rows(StringBuilder b, String title, List<LoadOut.Row> rows) {
    if (!rows.isEmpty()) {
      b.append("\n### " + title + "\n\n");
      rows.forEach(r -> b.append("- [ ] " + row(r) + "\n"));
    }
  }

  /** One thing in a line. */
  public static String row(LoadOut.Row r) {
    return r.count()
        + " × "
        + Stream.of(
                r.item(),
                r.what(),
                r.length(),
                r.rating(),
                r.ends(),
                r.shelf().isEmpty() ? "" : "shelf " + r.shelf(),
                r.condition())
            .filter(s -> !s.isEmpty())
            .collect(Collectors.joining(", "));
  }

  private static void sentences(StringBuilder b, String title, List<String> sentences) {
    if (!sentences.isEmpty()) {
      b.append("\n## " + title + "\n\n");
      sentences.forEach(s -> b.append("- " + s + "\n"));
    }
  }
}
