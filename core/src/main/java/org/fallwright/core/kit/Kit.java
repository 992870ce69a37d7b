package org.fallwright.core.kit;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.fallwright.core.site.Gear;
import org.fallwright.core.units.Range;

/**
 * What a firm owns to pull with, where it is stowed, and its crew.
 *
 * @param version version of the kit file's form
 * @param name what the kit is called
 * @param trucks its trucks
 * @param loadCells load cells; a site uses one
 * @param sources pull sources, without the places of any site
 * @param stowed where everything is; together as many of each as there are
 * @param crew people
 */
public record Kit(
    int version,
    String name,
    List<Truck> trucks,
    List<Gear.Line> lines,
    List<Gear.Block> blocks,
    List<Gear.Sling> slings,
    List<Gear.Connector> connectors,
    List<Gear.LoadCell> loadCells,
    List<Source> sources,
    List<Stowed> stowed,
    List<Person> crew) {
  /** The version written. */
  public static final int VERSION = 1;

  /**
   * A truck.
   *
   * @param id its name
   * @param note anything else; null: nothing
   */
  public record Truck(String id, String note) {
    public Truck {
      Range.text("id", id);
      if (note != null) {
        Range.text("note", note);
      }
    }
  }

  /**
   * A pull source, without the places of any site.
   *
   * @param plugin stable id of the plugin's pull source
   * @param drivers ids of the kit's sources that can drive it, where it needs one
   * @param parameters the plugin's own parameters, kept whole
   */
  public record Source(String id, String plugin, List<String> drivers, ObjectNode parameters)
      implements Gear.Item {
    public Source {
      Range.text("id", id);
      Range.text("plugin", plugin);
      drivers = List.copyOf(Range.present("drivers", drivers));
      Range.present("parameters", parameters);
    }
  }

  public Kit {
    Range.check("version", version, VERSION, VERSION, "");
    Range.text("name", name);
    trucks = List.copyOf(Range.present("trucks", trucks));
    lines = List.copyOf(Range.present("lines", lines));
    blocks = List.copyOf(Range.present("blocks", blocks));
    slings = List.copyOf(Range.present("slings", slings));
    connectors = List.copyOf(Range.present("connectors", connectors));
    loadCells = List.copyOf(Range.present("load_cells", loadCells));
    sources = List.copyOf(Range.present("sources", sources));
    stowed = List.copyOf(Range.present("stowed", stowed));
    crew = List.copyOf(Range.present("crew", crew));
    List<Gear.Item> items = items(lines, blocks, slings, connectors, loadCells, sources).toList();
    oneNameEach(trucks.stream().map(Truck::id));
    oneNameEach(items.stream().map(Gear.Item::id));
    oneNameEach(crew.stream().map(Person::id));
    for (Stowed s : stowed) {
      known("stowed.item", s.item(), items.stream().map(Gear.Item::id), "nothing");
      known("stowed.truck", s.truck(), trucks.stream().map(Truck::id), "no truck");
    }
    for (Gear.Item item : items) {
      int there =
          stowed.stream().filter(s -> s.item().equals(item.id())).mapToInt(Stowed::count).sum();
      if (there != item.count()) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "stowed holds %d of \"%s\"; it must hold %d, as many as there are",
                there,
                item.id(),
                item.count()));
      }
    }
    for (Source s : sources) {
      for (String driver : s.drivers()) {
        known(
            "sources." + s.id() + ".drivers",
            driver,
            sources.stream().map(Source::id),
            "no source");
      }
    }
  }

  /** Everything in the kit, in the order of the file. */
  public List<Gear.Item> items() {
    return items(lines, blocks, slings, connectors, loadCells, sources).toList();
  }

  /** The thing of that name. */
  public Optional<Gear.Item> item(String id) {
    return items().stream().filter(i -> i.id().equals(id)).findFirst();
  }

  /** Where a thing is; a thing of several pieces may be in several places. */
  public List<Stowed> where(String item) {
    return stowed.stream().filter(s -> s.item().equals(item)).toList();
  }

  /** The trucks that a thing is on, as words; empty where it is not in the kit. */
  public Optional<String> trucksOf(String item) {
    List<String> on = where(item).stream().map(Stowed::truck).distinct().toList();
    return on.isEmpty() ? Optional.empty() : Optional.of(String.join(" and ", on));
  }

  private static Stream<Gear.Item> items(
      List<Gear.Line> lines,
      List<Gear.Block> blocks,
      List<Gear.Sling> slings,
      List<Gear.Connector> connectors,
      List<Gear.LoadCell> loadCells,
      List<Source> sources) {
    return Stream.of(lines, blocks, slings, connectors, loadCells, sources)
        .<Gear.Item>flatMap(List::stream);
  }

  private static void oneNameEach(Stream<String> ids) {
    Set<String> seen = new HashSet<>();
    ids.forEach(
        id -> {
          if (!seen.add(id)) {
            throw new IllegalArgumentException(
                "the name \"" + id + "\" is used twice; each thing must have its own");
          }
        });
  }

  private static void known(String field, String name, Stream<String> ids, String nothing) {
    if (ids.noneMatch(name::equals)) {
      throw new IllegalArgumentException(
          field + " names \"" + name + "\"; " + nothing + " of that name is in the kit");
    }
  }
}
