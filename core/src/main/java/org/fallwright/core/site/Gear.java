package org.fallwright.core.site;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.fallwright.core.units.Range;

/**
 * What there is to pull with.
 *
 * @param lines pull lines
 * @param blocks redirect blocks
 * @param slings anchor slings
 * @param connectors shackles and the like
 * @param loadCell the load cell, or null
 * @param sources pull sources, each with its plugin's own parameters
 */
public record Gear(
    List<Line> lines,
    List<Block> blocks,
    List<Sling> slings,
    List<Connector> connectors,
    LoadCell loadCell,
    List<Source> sources) {
  public Gear {
    lines = List.copyOf(Range.present("lines", lines));
    blocks = List.copyOf(Range.present("blocks", blocks));
    slings = List.copyOf(Range.present("slings", slings));
    connectors = List.copyOf(Range.present("connectors", connectors));
    sources = List.copyOf(Range.present("sources", sources));
  }

  /** Anything in the gear, by its name. */
  public interface Item {
    String id();

    /** How many of it there are. */
    default int count() {
      return 1;
    }
  }

  /** Everything in the gear, in the order of the file. */
  public List<Item> items() {
    return Stream.of(
            lines.stream(),
            blocks.stream(),
            slings.stream(),
            connectors.stream(),
            Stream.ofNullable(loadCell),
            sources.stream())
        .<Item>flatMap(s -> s)
        .toList();
  }

  /** The same gear but for the things of these names, which drive nothing either. */
  public Gear without(Set<String> ids) {
    return new Gear(
        kept(lines, ids),
        kept(blocks, ids),
        kept(slings, ids),
        kept(connectors, ids),
        loadCell == null || ids.contains(loadCell.id()) ? null : loadCell,
        kept(sources, ids).stream()
            .map(
                s ->
                    new Source(
                        s.id(),
                        s.plugin(),
                        s.places(),
                        s.drivers().stream().filter(d -> !ids.contains(d)).toList(),
                        s.driverPlaces(),
                        s.parameters()))
            .toList());
  }

  private static <T extends Item> List<T> kept(List<T> items, Set<String> ids) {
    return items.stream().filter(i -> !ids.contains(i.id())).toList();
  }

  /**
   * A pull line.
   *
   * @param wireRope whether it is wire rope (else fibre)
   * @param lengthM its length [m]
   * @param breakingLoadN breaking load on its label [N]
   * @param terminationFactor what its ends or knots leave of that [0 to 1]
   * @param bendFactor what its tightest bend leaves [0 to 1]
   * @param ageFactor what wet and age leave [0 to 1]
   * @param stiffnessN axial stiffness EA, the softest of its range [N]
   * @param pullLine whether it serves as the pull line (else only in a tackle)
   */
  public record Line(
      String id,
      String material,
      boolean wireRope,
      double diameterM,
      double lengthM,
      double breakingLoadN,
      double terminationFactor,
      double bendFactor,
      double ageFactor,
      double stiffnessN,
      boolean pullLine)
      implements Item {
    public Line {
      Range.text("id", id);
      Range.text("material", material);
      Range.check("diameter_m", diameterM, 0.003, 0.1, "m");
      Range.check("length_m", lengthM, 1, 1000, "m");
      Range.check("breaking_load_N", breakingLoadN, 500, 5e6, "N");
      Range.check("termination_factor", terminationFactor, 0.1, 1, "");
      Range.check("bend_factor", bendFactor, 0.1, 1, "");
      Range.check("age_factor", ageFactor, 0.1, 1, "");
      Range.check("stiffness_N", stiffnessN, 1e3, 1e9, "N");
    }
  }

  /**
   * A redirect block.
   *
   * @param ratedLoadN load it is rated for [N]
   * @param standardFactor breaking load over rated load that its standard asks
   * @param efficiency tension passed on while hauling, 0 to 1
   */
  public record Block(String id, double ratedLoadN, double standardFactor, double efficiency)
      implements Item {
    public Block {
      Range.text("id", id);
      rated(ratedLoadN, standardFactor);
      Range.check("efficiency", efficiency, 0.3, 1, "");
    }
  }

  /** Slings of one kind; rated as rigged. */
  public record Sling(String id, double ratedLoadN, double standardFactor, int count)
      implements Item {
    public Sling {
      Range.text("id", id);
      rated(ratedLoadN, standardFactor);
      Range.check("count", count, 0, 100, "");
    }
  }

  /** Connectors of one kind. */
  public record Connector(String id, double ratedLoadN, double standardFactor, int count)
      implements Item {
    public Connector {
      Range.text("id", id);
      rated(ratedLoadN, standardFactor);
      Range.check("count", count, 0, 100, "");
    }
  }

  /** A load cell with a person who reads it. */
  public record LoadCell(String id, double ratedLoadN, double standardFactor) implements Item {
    public LoadCell {
      Range.text("id", id);
      rated(ratedLoadN, standardFactor);
    }
  }

  /**
   * A pull source.
   *
   * @param id its name in the gear
   * @param plugin stable id of the plugin's pull source
   * @param places ids of the spots and anchors where it can be
   * @param drivers ids of the sources that can drive it, where it needs one
   * @param driverPlaces ids of the spots and anchors where the driver can be; empty: as the
   *     driver's own places
   * @param parameters the plugin's own parameters, kept whole
   */
  public record Source(
      String id,
      String plugin,
      List<String> places,
      List<String> drivers,
      List<String> driverPlaces,
      ObjectNode parameters)
      implements Item {
    public Source {
      Range.text("id", id);
      Range.text("plugin", plugin);
      places = List.copyOf(Range.present("places", places));
      drivers = List.copyOf(Range.present("drivers", drivers));
      driverPlaces = List.copyOf(Range.present("driver_places", driverPlaces));
      Range.present("parameters", parameters);
    }
  }

  private static void rated(double ratedLoadN, double standardFactor) {
    Range.check("rated_load_N", ratedLoadN, 100, 1e7, "N");
    Range.check("standard_factor", standardFactor, 1, 12, "");
  }
}
