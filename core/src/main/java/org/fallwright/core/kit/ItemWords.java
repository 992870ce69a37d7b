package org.fallwright.core.kit;

import java.util.List;
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
    String seen = s.inspected() == null ? "" : "looked at " + s.inspected();
    return s.condition() == null ? seen : s.condition() + (seen.isEmpty() ? "" : ", " + seen);
  }

  /** What it is. */
  public String what(Gear.Item item) {
    if (item instanceof Gear.Line l) {
      return l.material()
          + " "
          + in.smallLength(l.diameterM())
          + (l.pullLine() ? " pull line" : " line for a tackle");
    }
    if (item instanceof Gear.Block) {
      return "redirect block";
    }
    if (item instanceof Gear.Sling) {
      return "anchor sling";
    }
    if (item instanceof Gear.Connector) {
      return "connector";
    }
    if (item instanceof Gear.LoadCell) {
      return "load cell";
    }
    String plugin = item instanceof Gear.Source s ? s.plugin() : ((Kit.Source) item).plugin();
    return "pull source, " + plugin.replace('-', ' ');
  }

  /** Its length; empty where it has none. */
  public String length(Gear.Item item) {
    return item instanceof Gear.Line l ? in.length(l.lengthM()) : "";
  }

  /** What it bears, and whether that breaks it or is what it is rated for; empty: no figure. */
  public String rating(Gear.Item item) {
    if (item instanceof Gear.Line l) {
      return "breaks at " + in.forceAtMost(l.breakingLoadN());
    }
    if (item instanceof Gear.Block b) {
      return rated(b.ratedLoadN());
    }
    if (item instanceof Gear.Sling s) {
      return rated(s.ratedLoadN());
    }
    if (item instanceof Gear.Connector c) {
      return rated(c.ratedLoadN());
    }
    return item instanceof Gear.LoadCell c ? rated(c.ratedLoadN()) : "";
  }

  /** How it ends; empty where it has no ends. */
  public String ends(Gear.Item item) {
    return item instanceof Gear.Line l
        ? String.format(java.util.Locale.ROOT, "ends keep %.2f", l.terminationFactor())
        : "";
  }

  private String rated(double n) {
    return "rated " + in.forceAtMost(n);
  }
}
