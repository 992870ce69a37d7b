package org.fallwright.core.change;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Entry;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Looked;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Wire;

/**
 * What an answer to every open question would do: nothing found where nobody looked, voltages at
 * most so much, what is not known as it stands in.
 */
final class OpenAnswers {
  /** Voltages tried, highest first [kV, phase to phase]: usual classes from transmission down. */
  private static final double[] VOLTAGES_KV = {345, 230, 138, 69, 34.5, 12.47, 4.16, 0.4};

  private OpenAnswers() {}

  static List<Dial> dials(Edits e) {
    boolean voltage = e.site.wires().stream().anyMatch(w -> w.voltageKv() == null);
    boolean other = !questions(e, 0, false).isEmpty();
    return !voltage && !other
        ? List.of()
        : List.of(new Dial(voltage ? VOLTAGES_KV.length : 1, 1, n -> answered(e, n, voltage)));
  }

  private static Edit answered(Edits e, int n, boolean voltage) {
    double kv = VOLTAGES_KV[n - 1];
    Site s = e.site;
    if (voltage) {
      List<Wire> wires =
          s.wires().stream()
              .map(w -> w.voltageKv() == null ? Copy.with(w, "voltageKv", kv) : w)
              .toList();
      s = s.withWires(wires);
    }
    for (Looked.What what : asked(s)) {
      List<Looked> looked =
          new ArrayList<>(s.looked().stream().filter(l -> l.what() != what).toList());
      looked.add(new Looked(what, Looked.Found.NONE, "to be asked"));
      s = Copy.with(s, "looked", looked);
    }
    for (Entry entry : Entry.of(s)) {
      if (entry.quantity().how() == How.UNKNOWN) {
        s = entry.put(s, Quantity.measured(entry.quantity().value()));
      }
    }
    return e.changed(Kind.ANSWER, n, "", String.join("; ", questions(e, kv, voltage)), s);
  }

  /** What stops the judging where nobody looked. */
  private static List<Looked.What> asked(Site s) {
    return List.of(Looked.What.WIRES, Looked.What.PEOPLE_INDOORS).stream()
        .filter(w -> s.found(w) == Looked.Found.NOT_LOOKED)
        .toList();
  }

  private static List<String> questions(Edits e, double kv, boolean voltage) {
    List<String> all = new ArrayList<>();
    if (voltage) {
      e.site.wires().stream()
          .filter(w -> w.voltageKv() == null)
          .forEach(
              w ->
                  all.add(
                      String.format(
                          Locale.ROOT,
                          "have the owner of %s state its voltage, which must be at most %s kV",
                          w.id(),
                          kv)));
    }
    for (Looked.What w : asked(e.site)) {
      all.add(
          w == Looked.What.WIRES
              ? "look for wires, and find none"
              : "ask who is indoors, and find nobody");
    }
    for (Entry entry : Entry.of(e.site)) {
      if (entry.quantity().how() == How.UNKNOWN) {
        all.add(
            String.format(
                Locale.ROOT,
                "find out the %s, which must come out as %s %s",
                entry.name(),
                entry.quantity().value(),
                entry.unit()));
      }
    }
    return all;
  }
}
