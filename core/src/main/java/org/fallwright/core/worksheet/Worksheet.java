package org.fallwright.core.worksheet;

import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Stream;

/**
 * The worksheet of one setup.
 *
 * @param title what it is of
 * @param cautions what goes with every plan, a sentence each; may be empty
 * @param lead how to read it, a sentence each
 * @param remarks what is to be said of the setup, a sentence each
 * @param sections its lines in the order in which they are worked
 * @param results what is a result of geometry or a check, and is not worked by hand
 * @param compared figures worked here against the program's own
 * @param sources citation of every source named, by its key
 */
public record Worksheet(
    String title,
    List<String> cautions,
    List<String> lead,
    List<String> remarks,
    List<Section> sections,
    List<Result> results,
    List<Compared> compared,
    Map<String, String> sources) {
  /**
   * A check of the setup as the planner gave it.
   *
   * @param check its id
   * @param value what there is
   * @param limit what is asked
   * @param ratio capacity over demand
   * @param verdict its verdict
   * @param why one line
   */
  public record Result(
      String check, String value, String limit, String ratio, String verdict, String why) {}

  public Worksheet {
    cautions = List.copyOf(cautions);
    lead = List.copyOf(lead);
    remarks = List.copyOf(remarks);
    sections = List.copyOf(sections);
    results = List.copyOf(results);
    compared = List.copyOf(compared);
  }

  /** The same with these cautions at its head. */
  public Worksheet withCautions(List<String> others) {
    return new Worksheet(title, others, lead, remarks, sections, results, compared, sources);
  }

  /** Every line in order. */
  public Stream<Line> lines() {
    return sections.stream().flatMap(s -> s.lines().stream());
  }

  /** The line of that sign, or whose name begins so, whatever the case of its letters. */
  public Optional<Line> line(String name) {
    String asked = name.strip().toLowerCase(Locale.ROOT);
    return Stream.of(
            lines().filter(l -> l.symbol().equals(name.strip())),
            lines().filter(l -> l.symbol().toLowerCase(Locale.ROOT).equals(asked)),
            lines().filter(l -> l.name().toLowerCase(Locale.ROOT).equals(asked)),
            lines().filter(l -> l.name().toLowerCase(Locale.ROOT).startsWith(asked)))
        .flatMap(s -> s)
        .findFirst();
  }

  /** The sources that lines name. */
  private Map<String, String> named(List<Section> few) {
    Map<String, String> named = new TreeMap<>(sources);
    named
        .keySet()
        .retainAll(
            few.stream().flatMap(s -> s.lines().stream()).map(Line::source).distinct().toList());
    return named;
  }

  /** Only that line and all that it rests on, in order; what goes with the whole is left off. */
  public Worksheet sum(Line of) {
    Set<String> kept = new HashSet<>(Set.of(of.symbol()));
    List<Line> all = lines().toList();
    for (int i = all.size() - 1; i >= 0; i--) {
      if (kept.contains(all.get(i).symbol())) {
        kept.addAll(all.get(i).dependsOn());
      }
    }
    List<Section> few =
        sections.stream()
            .map(
                s ->
                    new Section(
                        s.title(),
                        s.notes(),
                        s.lines().stream().filter(l -> kept.contains(l.symbol())).toList()))
            .filter(s -> !s.lines().isEmpty())
            .toList();
    return new Worksheet(
        of.symbol() + ", " + of.name() + ": " + title,
        cautions,
        lead,
        List.of(),
        few,
        List.of(),
        compared.stream().filter(c -> kept.contains(c.symbol())).toList(),
        named(few));
  }
}
