package org.fallwright.core.kit;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;

/**
 * Things of a kit copied into a site's own gear.
 *
 * @param site the site with them
 * @param items names of what was copied, in the order of the kit
 * @param notes what is still to be said, a sentence each
 */
public record Copied(Site site, List<String> items, List<String> notes) {
  public Copied {
    items = List.copyOf(items);
    notes = List.copyOf(notes);
  }

  /**
   * Copies things into a site.
   *
   * @param kitFile name of the kit's file, which the site keeps
   * @param only names of the things; empty: all of them
   * @param places ids of the spots and anchors where the copied sources can be
   * @throws IllegalArgumentException one sentence, where a name is not in the kit or in the site's
   *     gear already, or a place is not on the site
   */
  public static Copied of(
      Site site, Kit kit, String kitFile, List<String> only, List<String> places) {
    List<String> items = new ArrayList<>();
    for (String name : only) {
      if (kit.item(name).isEmpty()) {
        throw new IllegalArgumentException(
            "\"" + name + "\" is not in the kit; it holds " + names(kit.items()));
      }
    }
    Gear old = site.gear();
    for (Gear.Item item : kit.items()) {
      if (only.isEmpty() || only.contains(item.id())) {
        if (old.items().stream().anyMatch(i -> i.id().equals(item.id()))) {
          throw new IllegalArgumentException(
              "\""
                  + item.id()
                  + "\" is in the site's gear already; name what else to take, or give one of the"
                  + " two another name");
        }
        items.add(item.id());
      }
    }
    List<String> notes = new ArrayList<>();
    Gear gear =
        new Gear(
            with(old.lines(), kit.lines(), items),
            with(old.blocks(), kit.blocks(), items),
            with(old.slings(), kit.slings(), items),
            with(old.connectors(), kit.connectors(), items),
            loadCell(old, kit, items),
            with(old.sources(), sources(kit, old, items, places, notes), items));
    String from = Optional.ofNullable(site.kit()).orElse(kitFile);
    if (!from.equals(kitFile)) {
      notes.add(
          "The site stays with the kit " + from + ", which what was copied now is not a part of.");
    }
    return new Copied(site.withGear(gear, from, site.leftBehind()), items, notes);
  }

  private static Gear.LoadCell loadCell(Gear old, Kit kit, List<String> items) {
    List<Gear.LoadCell> cells =
        kit.loadCells().stream().filter(c -> items.contains(c.id())).toList();
    if (cells.size() + (old.loadCell() == null ? 0 : 1) > 1) {
      throw new IllegalArgumentException(
          "a site has one load cell, and this would be "
              + names(cells)
              + (old.loadCell() == null ? "" : " beside " + old.loadCell().id())
              + "; name what to take without the others");
    }
    return cells.isEmpty() ? old.loadCell() : cells.get(0);
  }

  /** Sources at the places given, with those drivers alone that the site then has. */
  private static List<Gear.Source> sources(
      Kit kit, Gear old, List<String> items, List<String> places, List<String> notes) {
    Set<String> there = new HashSet<>(items);
    old.sources().forEach(s -> there.add(s.id()));
    List<Gear.Source> sources = new ArrayList<>();
    for (Kit.Source s : kit.sources()) {
      if (!items.contains(s.id())) {
        continue;
      }
      Predicate<String> comes = there::contains;
      List<String> drivers = s.drivers().stream().filter(comes).toList();
      s.drivers().stream()
          .filter(comes.negate())
          .forEach(
              d ->
                  notes.add(
                      s.id() + " is copied without its driver " + d + ", which is not taken."));
      if (places.isEmpty()) {
        notes.add(
            s.id() + " has no place yet: until a spot or an anchor is named it pulls nothing.");
      }
      sources.add(new Gear.Source(s.id(), s.plugin(), places, drivers, List.of(), s.parameters()));
    }
    return sources;
  }

  private static <T extends Gear.Item> List<T> with(List<T> old, List<T> more, List<String> items) {
    List<T> all = new ArrayList<>(old);
    more.stream().filter(i -> items.contains(i.id())).forEach(all::add);
    return all;
  }

  private static String names(List<? extends Gear.Item> items) {
    return items.isEmpty()
        ? "nothing"
        : String.join(", ", items.stream().map(Gear.Item::id).toList());
  }
}
