package org.fallwright.core.change;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;

/** What can be changed in the gear: mode, line, people, load cell, slings, connectors. */
final class GearEdits {
  private static final double LENGTH_STEP_M = 1;
  private static final int LENGTH_STEPS = 60;
  private static final int PEOPLE_MOST = 12;
  private static final int FITTINGS_MOST = 6;

  /** The cell that is proposed where the kit has none; common practice, no source. */
  private static final Gear.LoadCell CELL =
      new Gear.LoadCell("load cell", 50_000, 5, Gear.LoadCell.At.SOURCE_END);

  /** Name that a source's parameter must have to count people. */
  private static final String PEOPLE = "people";

  private final Edits e;

  private GearEdits(Edits e) {
    this.e = e;
  }

  static List<Dial> dials(Edits e) {
    GearEdits g = new GearEdits(e);
    List<Dial> all = new ArrayList<>(g.modes());
    Gear gear = e.site.gear();
    for (Gear.Line l : gear.lines()) {
      if (l.pullLine() && !l.id().equals(e.setup.line())) {
        all.add(Dial.once(n -> g.otherLine(l)));
      }
    }
    all.add(new Dial(LENGTH_STEPS, 4, g::longer));
    for (String id : g.sourceIds()) {
      JsonNode people = e.site.source(id).orElseThrow().parameters().path(PEOPLE);
      if (people.isIntegralNumber()) {
        all.add(new Dial(Math.max(0, PEOPLE_MOST - people.intValue()), 1, n -> g.people(id, n)));
      }
    }
    if (gear.loadCell() == null) {
      all.add(Dial.once(n -> g.loadCell()));
    }
    if (!gear.slings().isEmpty()) {
      all.add(new Dial(FITTINGS_MOST, 1, g::slings));
    }
    if (!gear.connectors().isEmpty()) {
      all.add(new Dial(FITTINGS_MOST, 1, g::connectors));
    }
    return all;
  }

  private List<String> sourceIds() {
    return e.setup.driver() == null
        ? List.of(e.setup.source())
        : List.of(e.setup.source(), e.setup.driver().source());
  }

  /** Every other mode of the source and of its driver. */
  private List<Dial> modes() {
    List<Dial> all = new ArrayList<>();
    Setup s = e.setup;
    modes(all, s.source(), s.mode(), s::withMode);
    if (s.driver() != null) {
      Setup.Driver d = s.driver();
      modes(
          all, d.source(), d.mode(), m -> s.withDriver(new Setup.Driver(d.source(), m, d.place())));
    }
    return all;
  }

  private void modes(
      List<Dial> all, String id, String now, java.util.function.Function<String, Setup> run) {
    Gear.Source source = e.site.source(id).orElseThrow();
    List<String> modes =
        e.sources.byId(source.plugin()).map(k -> k.modes(source.parameters())).orElse(List.of());
    for (String m : modes) {
      if (!m.equals(now)) {
        double apart = Math.abs(modes.indexOf(m) - modes.indexOf(now));
        all.add(
            Dial.once(
                n ->
                    e.planned(
                        Kind.MODE,
                        apart,
                        "",
                        "run " + id + " as \"" + m + "\" in place of \"" + now + "\"",
                        run.apply(m))));
      }
    }
  }

  private Edit otherLine(Gear.Line l) {
    return e.planned(
        Kind.OTHER_LINE,
        1,
        "",
        "take line " + l.id() + " (" + e.in.length(l.lengthM()) + ") in place of " + e.setup.line(),
        e.setup.withLine(l.id()));
  }

  private Edit longer(int n) {
    double by = n * LENGTH_STEP_M;
    List<Gear.Line> lines =
        e.site.gear().lines().stream()
            .map(l -> l.id().equals(e.setup.line()) ? Copy.with(l, "lengthM", l.lengthM() + by) : l)
            .toList();
    double length =
        lines.stream()
            .filter(l -> l.id().equals(e.setup.line()))
            .mapToDouble(Gear.Line::lengthM)
            .findFirst()
            .orElseThrow();
    return e.changed(
        Kind.LONGER_LINE,
        by,
        "m",
        "bring a line like "
            + e.setup.line()
            + " of "
            + e.in.length(length)
            + ", "
            + e.in.length(by)
            + " longer",
        gear("lines", lines));
  }

  private Edit people(String id, int n) {
    List<Gear.Source> sources =
        e.site.gear().sources().stream()
            .map(s -> s.id().equals(id) ? Copy.with(s, "parameters", more(s.parameters(), n)) : s)
            .toList();
    return e.changed(
        Kind.PEOPLE,
        n,
        "",
        n
            + " more at the line of "
            + id
            + ", "
            + more(of(id), n).path(PEOPLE).intValue()
            + " in all",
        gear("sources", sources));
  }

  private ObjectNode of(String id) {
    return e.site.source(id).orElseThrow().parameters();
  }

  private static ObjectNode more(ObjectNode parameters, int n) {
    ObjectNode copy = parameters.deepCopy();
    copy.put(PEOPLE, copy.get(PEOPLE).intValue() + n);
    return copy;
  }

  private Edit loadCell() {
    return e.changed(
        Kind.LOAD_CELL,
        1,
        "",
        "put a load cell for "
            + e.in.force(CELL.ratedLoadN())
            + " in the line, with somebody who"
            + " reads it and stops the pull",
        gear("loadCell", CELL));
  }

  private Edit slings(int n) {
    List<Gear.Sling> more =
        best(
            e.site.gear().slings(),
            Gear.Sling::ratedLoadN,
            s -> Copy.with(s, "count", s.count() + n));
    return e.changed(
        Kind.MORE_GEAR,
        n,
        "",
        "bring " + n + " more of the strongest slings",
        gear("slings", more));
  }

  private Edit connectors(int n) {
    List<Gear.Connector> more =
        best(
            e.site.gear().connectors(),
            Gear.Connector::ratedLoadN,
            c -> Copy.with(c, "count", c.count() + n));
    return e.changed(
        Kind.MORE_GEAR,
        n,
        "",
        "bring " + n + " more of the strongest connectors",
        gear("connectors", more));
  }

  /** The list with its strongest entry changed. */
  private static <T> List<T> best(
      List<T> all, java.util.function.ToDoubleFunction<T> strength, UnaryOperator<T> change) {
    T strongest = all.stream().max(java.util.Comparator.comparingDouble(strength)).orElseThrow();
    return all.stream().map(t -> t == strongest ? change.apply(t) : t).toList();
  }

  private Site gear(String component, Object value) {
    return Copy.with(e.site, "gear", Copy.with(e.site.gear(), component, value));
  }
}
