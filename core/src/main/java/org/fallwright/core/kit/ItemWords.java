package org.fallwright.core.kit;

import java.util.List;
import org.fallwright.core.line.LineFigures;
import org.fallwright.core.site.Gear;
import org.fallwright.core.units.DisplayUnits;

/** Gear in words, in a person's units. */
public final class ItemWords {
  private final DisplayUnits in;

  public ItemWords(DisplayUnits in) {
    this.in = in;
  }

  /** The line of a thing in a list. */
  LoadOut.Row row(Gear.Item item, int count, String shelf, String condition) {
    return new LoadOut.Row(
        item.id(), what(item), count, length(item), rating(item), ends(item), shelf, condition);
  }

  /** Everything on a truck of a kit, in the order of the kit. */
  public List<LoadOut.Row> rows(Kit kit, String truck) {
    return kit.stowed().stream()
        .filter(s -> s.truck().equals(truck))
        .map(s -> row(kit.item(s.item()).orElseThrow(), s.count(), shelf(s), condition(s)))
        .toList();
  }

  String shelf(Stowed s) {
    return s.shelf() == null ? "" : s.shelf();
  }

  String condition(Stowed s) {
    String seen = s.inspected() == null ? "" : "seen " + s.inspected();
    return s.condition() == null ? seen : s.condition() + (seen.isEmpty() ? "" : ", " + seen);
  }

  /** What it is. */
  public String what(Gear.Item item) {
    if (item instanceof Gear.Line l) {
      return Words.of(l.material())
          + " "
          + in.smallLength(l.diameterM())
          + (l.pullLine() ? ", pull line" : ", for a block system");
    }
    if (item instanceof Gear.Block b) {
      return "redirect block"
          + (b.sheaveDiameterM() == null ? "" : ", sheave " + in.smallLength(b.sheaveDiameterM()));
    }
    if (item instanceof Gear.Sling s) {
      return (s.kind() == Gear.Sling.Kind.OTHER ? "sling" : Words.of(s.kind()) + " for an anchor");
    }
    if (item instanceof Gear.Connector c) {
      return c.kind() == Gear.Connector.Kind.SHACKLE ? "shackle" : "connector";
    }
    if (item instanceof Gear.LoadCell) {
      return "load cell";
    }
    String plugin = item instanceof Gear.Source s ? s.plugin() : ((Kit.Source) item).plugin();
    return plugin.replace('-', ' ');
  }

  /** Its length; empty where it has none. */
  public String length(Gear.Item item) {
    return item instanceof Gear.Line l ? in.length(l.lengthM()) : "";
  }

  /** What it bears, and whether that breaks it or is what it is rated for; empty: no figure. */
  public String rating(Gear.Item item) {
    return item instanceof Gear.Line l
        ? "breaks at " + in.forceAtMost(LineFigures.of(l, null).breakingN())
        : Ratings.of(item).map(r -> "rated " + in.forceAtMost(r.asRiggedN())).orElse("");
  }

  /** How it ends; empty where it has no ends. */
  public String ends(Gear.Item item) {
    if (item instanceof Gear.Line l && !l.material().chain()) {
      String tree = end(l.treeEnd());
      String source = end(l.sourceEnd());
      return tree.equals(source)
          ? "both ends: " + tree
          : "tree end: " + tree + "; source end: " + source;
    }
    return "";
  }

  private static String end(Gear.End end) {
    return end == null ? "not stated" : Words.of(end.kind());
  }
}
