package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.line.FibreRope;
import org.fallwright.core.line.LineFigures;
import org.fallwright.core.line.RatedFigures;
import org.fallwright.core.line.RopeEnd;
import org.fallwright.core.line.Share;
import org.fallwright.core.line.WireClips;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;

/** What a person must know of how the strength of a setup's gear was got, a sentence each. */
final class GearNotes {
  private final DisplayUnits in;
  private final List<String> notes = new ArrayList<>();

  private GearNotes(DisplayUnits in) {
    this.in = in;
  }

  static List<String> of(Site site, DisplayUnits in, Setup setup, GearParts parts, boolean read) {
    GearNotes g = new GearNotes(in);
    g.line(
        GearParts.lineFigures(site, setup), setup.redirects().isEmpty() ? null : Route.block(site));
    parts.rated().values().stream().distinct().forEach(g::rated);
    for (Gear.Sling s : site.gear().slings()) {
      boolean used = parts.rated().values().stream().anyMatch(r -> r.id().equals(s.id()));
      if (used
          && s.angleDeg() == null
          && s.hitch().ordinal() >= Gear.Sling.Hitch.CHOKER.ordinal()) {
        g.notes.add(
            "How "
                + s.id()
                + " is laid is not stated in degrees: its least favourable angle counts.");
      }
    }
    if (!read && site.gear().loadCell() != null) {
      g.notes.add(
          "This setup has no "
              + (site.gear().loadCell().at() == Gear.LoadCell.At.HAUL_PART
                  ? "haul part of blocks"
                  : "anchor that the source pulls on")
              + ", where load cell "
              + site.gear().loadCell().id()
              + " is to sit, so nothing is read.");
    }
    return g.notes;
  }

  private void line(LineFigures f, Gear.Block over) {
    Gear.Line l = f.line();
    String name = "Line " + l.id();
    if (f.byRule()) {
      notes.add(
          name
              + " has no label: "
              + in.both(u -> u.forceAtMost(f.breakingN()))
              + " is the rule for its material and thickness.");
    }
    if (f.softest()) {
      notes.add(
          name + " counts as the softest known of its material; its stiffness is not stated.");
    }
    end(name, l, "at the tree", l.treeEnd(), f.treeEnd());
    end(name, l, "towards the source", l.sourceEnd(), f.sourceEnd());
    if (l.weathered() && !l.material().fibre()) {
      notes.add(
          name + " is not of fibre: look it over and state what years of weather leave of it.");
    }
    if (over == null || l.bend() != null) {
      return;
    }
    if (l.material().wire() && Double.isNaN(f.bendRatio())) {
      notes.add(
          "How thick the sheave of block "
              + over.id()
              + " is, is not stated: l"
              + name.substring(1)
              + " counts as bent round its own thickness. Measure the sheave.");
    }
    double least = Hardware.value("fibre.bend-least");
    if (l.material().fibre() && f.bendRatio() < least) {
      notes.add(
          String.format(
              Locale.ROOT,
              "%s runs over a sheave of %.1f times its thickness; %.0f times is the least usual, and"
                  + " what so sharp a bend leaves of it is not known.",
              name,
              f.bendRatio(),
              least));
    }
  }

  private void end(String name, Gear.Line line, String where, Gear.End end, Share share) {
    if (end == null) {
      if (!line.material().chain()) {
        notes.add(
            String.format(
                Locale.ROOT,
                "How %s ends %s is not stated: the weakest known counts, %.2f of its strength.",
                "l" + name.substring(1),
                where,
                share.value()));
      }
      return;
    }
    if (end.kind() == Gear.End.Kind.OTHER) {
      return;
    }
    double known = known(line, RopeEnd.valueOf(end.kind().name()));
    if (share.value() > known) {
      notes.add(
          String.format(
              Locale.ROOT,
              "%s: %.2f is stated for its end %s (%s); the catalogue has %.2f.",
              name,
              share.value(),
              where,
              end.stated().why(),
              known));
    }
    if (line.material() == Gear.Material.HMPE && RopeEnd.valueOf(end.kind().name()).knot()) {
      notes.add(name + " is knotted " + where + ": HMPE slips in knots. Splice it.");
    }
    if (end.kind() == Gear.End.Kind.WIRE_CLIPS) {
      clips(name, line, where);
    }
  }

  private static double known(Gear.Line line, RopeEnd end) {
    return line.material() == Gear.Material.HMPE ? end.factorIn(FibreRope.HMPE) : end.factor();
  }

  private void clips(String name, Gear.Line line, String where) {
    if (line.diameterM() > WireClips.THICKEST_M) {
      notes.add(name + ": clips on so thick a rope are in no table that is known here.");
      return;
    }
    WireClips forged = WireClips.of(line.diameterM(), true);
    notes.add(
        String.format(
            Locale.ROOT,
            "%s: its end %s needs %d drop-forged clips (%d of others), at least %s apart.",
            name,
            where,
            forged.count(),
            WireClips.of(line.diameterM(), false).count(),
            in.smallLength(forged.spacingM())));
  }

  private void rated(RatedFigures r) {
    if (r.rule() == RatedFigures.Rule.UNMARKED_SHACKLE) {
      notes.add(
          r.id()
              + " has no readable mark: "
              + in.both(u -> u.forceAtMost(r.ratedN()))
              + " by the thickness of its body.");
    }
    if (r.rule() == RatedFigures.Rule.CHAIN_BY_GRADE) {
      notes.add(
          r.id()
              + " has no tag: "
              + in.both(u -> u.forceAtMost(r.ratedN()))
              + " by its grade and thickness.");
    }
    if (r.asRiggedN() < r.ratedN() * (1 - 1e-9)) {
      notes.add(
          String.format(
              Locale.ROOT,
              "%s counts with %.0f %% of its rating as it is rigged.",
              r.id(),
              100 * r.asRiggedN() / r.ratedN()));
    }
  }
}
