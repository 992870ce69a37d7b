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

  /** What a line is made of. */
  public enum Material {
    NYLON,
    POLYESTER,
    HMPE,
    POLYPROPYLENE,
    MANILA,
    WIRE_FIBRE_CORE,
    WIRE_STEEL_CORE,
    CHAIN_30,
    CHAIN_43,
    CHAIN_70,
    CHAIN_80,
    CHAIN_100;

    /** Whether it is wire rope. */
    public boolean wire() {
      return this == WIRE_FIBRE_CORE || this == WIRE_STEEL_CORE;
    }

    /** Whether it is chain. */
    public boolean chain() {
      return ordinal() >= CHAIN_30.ordinal();
    }

    /** Whether it is fibre rope. */
    public boolean fibre() {
      return !wire() && !chain();
    }
  }

  /**
   * How a line ends, or what knot is in it.
   *
   * @param kind the kind of end
   * @param stated what it leaves of the line's strength; null: the catalogue's figure of its kind
   */
  public record End(Kind kind, Stated stated) {
    /** Kinds of end. */
    public enum Kind {
      WIRE_RESIN_SOCKET,
      WIRE_SWAGED_SOCKET,
      WIRE_SLEEVE_STEEL_CORE,
      WIRE_SLEEVE_FIBRE_CORE,
      WIRE_HAND_SPLICE,
      WIRE_CLIPS,
      WIRE_WEDGE_SOCKET,
      EYE_SPLICE,
      SHORT_SPLICE,
      TWO_HALF_HITCHES,
      CLOVE_HITCH,
      ANCHOR_BEND,
      TIMBER_HITCH,
      BOWLINE,
      FIGURE_EIGHT_STOPPER,
      OVERHAND,
      /** None of these; what it leaves must be stated. */
      OTHER;

      private boolean on(Material m) {
        return this == OTHER || m.wire() && name().startsWith("WIRE_") || m.fibre() && !wire();
      }

      private boolean wire() {
        return name().startsWith("WIRE_");
      }
    }

    public End {
      Range.present("kind", kind);
      if (stated != null) {
        stated.within("stated", 0.1, 1);
      } else if (kind == Kind.OTHER) {
        throw new IllegalArgumentException("stated is null; of another end it must be stated");
      }
    }
  }

  /**
   * A pull line.
   *
   * @param lengthM its length [m]
   * @param breakingLoadN breaking load on its label [N]; null: by the rule of its material
   * @param treeEnd its end or knot at the tree; null: not stated, the weakest of its kind counts
   * @param sourceEnd the same towards the source
   * @param bend what the tightest bend on its way leaves; null: by the sheave it runs over
   * @param wet whether it is or may get wet
   * @param weathered whether it has lain two years or more in the weather
   * @param age what age and wear leave; null: as new
   * @param stiffnessN axial stiffness EA, the softest of its range [N]; null: the softest known of
   *     its material
   * @param pullLine whether it serves as the pull line (else only in a tackle)
   */
  public record Line(
      String id,
      Material material,
      double diameterM,
      double lengthM,
      Double breakingLoadN,
      End treeEnd,
      End sourceEnd,
      Stated bend,
      boolean wet,
      boolean weathered,
      Stated age,
      Double stiffnessN,
      boolean pullLine)
      implements Item {
    /** Thickest fibre rope whose breaking load a rule gives [m]. */
    public static final double THICKEST_BY_RULE_M = 0.026;

    public Line {
      Range.text("id", id);
      Range.present("material", material);
      Range.check("diameter_m", diameterM, 0.003, 0.1, "m");
      Range.check("length_m", lengthM, 1, 1000, "m");
      Range.checkOrNull("breaking_load_N", breakingLoadN, 500, 5e6, "N");
      on(material, "tree_end", treeEnd);
      on(material, "source_end", sourceEnd);
      if (bend != null) {
        bend.within("bend", 0.1, 1);
      }
      if (age != null) {
        age.within("age", 0.1, 1);
      }
      Range.checkOrNull("stiffness_N", stiffnessN, 1e3, 1e9, "N");
      if (breakingLoadN == null && material == Material.HMPE) {
        throw new IllegalArgumentException(
            "breaking_load_N is null; no rule gives that of HMPE, so it must be stated");
      }
      if (breakingLoadN == null && !material.wire()) {
        Range.check(
            "diameter_m, without a breaking load,",
            diameterM,
            material.chain() ? 0.004 : 0.003,
            material.chain() ? 0.05 : THICKEST_BY_RULE_M,
            "m");
      }
    }

    private static void on(Material material, String field, End end) {
      if (end != null && !end.kind().on(material)) {
        throw new IllegalArgumentException(field + ".kind is not an end of this material");
      }
    }
  }

  /**
   * A redirect block.
   *
   * @param ratedLoadN load it is rated for [N]
   * @param standardFactor breaking load over rated load that its standard asks; null: the usual one
   * @param sheave kind of sheave
   * @param sheaveDiameterM diameter of the sheave where the line lies [m]; null: not stated
   * @param efficiency tension passed on while hauling; null: the low end of its sheave's kind
   */
  public record Block(
      String id,
      double ratedLoadN,
      Double standardFactor,
      SheaveKind sheave,
      Double sheaveDiameterM,
      Stated efficiency)
      implements Item {
    /** Kinds of sheave. */
    public enum SheaveKind {
      WIRE_ON_ROLLERS,
      WIRE_ON_PLAIN_BEARINGS,
      TACKLE,
      FIBRE_ON_BALL_BEARINGS,
      FIBRE_ON_A_BUSH,
      RESCUE_PULLEY,
      CONNECTOR,
      /** None of these; its efficiency must be stated. */
      OTHER
    }

    public Block {
      Range.text("id", id);
      rated(ratedLoadN, standardFactor);
      Range.present("sheave", sheave);
      Range.checkOrNull("sheave_diameter_m", sheaveDiameterM, 0.005, 2, "m");
      if (efficiency != null) {
        efficiency.within("efficiency", 0.3, 1);
      } else if (sheave == SheaveKind.OTHER) {
        throw new IllegalArgumentException(
            "efficiency is null; of another sheave it must be stated");
      }
    }
  }

  /**
   * Slings of one kind.
   *
   * @param ratedLoadN rated load [N]: of a straight sling, or as rigged where {@code hitch} says
   *     so; null: of chain by its grade and diameter
   * @param diameterM diameter of the link's wire of a chain [m]; null: not stated
   * @param standardFactor breaking load over rated load that its standard asks; null: the usual one
   *     of its kind
   * @param hitch how it is laid
   * @param angleDeg of a choker the angle of choke, of a basket that of its legs to the horizontal
   *     [degrees]; null: not stated, the least favourable counts
   */
  public record Sling(
      String id,
      Kind kind,
      Double ratedLoadN,
      Double diameterM,
      Double standardFactor,
      Hitch hitch,
      Double angleDeg,
      int count)
      implements Item {
    /** Kinds of sling. */
    public enum Kind {
      ROUND_SLING,
      WEBBING,
      NATURAL_FIBRE,
      WIRE_ROPE,
      /** Also chain without a readable mark. */
      CHAIN_30,
      CHAIN_43,
      CHAIN_80,
      CHAIN_100,
      /** None of these; its rating as rigged and its factor must be stated. */
      OTHER;

      /** Whether it is chain. */
      public boolean chain() {
        return name().startsWith("CHAIN_");
      }
    }

    /** How a sling is laid. */
    public enum Hitch {
      /** The rating is of the sling as it is rigged. */
      AS_RIGGED,
      VERTICAL,
      CHOKER,
      BASKET
    }

    public Sling {
      Range.text("id", id);
      Range.present("kind", kind);
      rated(ratedLoadN, standardFactor);
      Range.checkOrNull("diameter_m", diameterM, 0.004, 0.05, "m");
      Range.present("hitch", hitch);
      Range.checkOrNull("angle_deg", angleDeg, 0, 180, "degrees");
      Range.check("count", count, 0, 100, "");
      if (ratedLoadN == null && (!kind.chain() || diameterM == null)) {
        throw new IllegalArgumentException(
            "rated_load_N is null; it must be stated, but of a chain whose diameter is");
      }
      if (kind == Kind.OTHER && (standardFactor == null || hitch != Hitch.AS_RIGGED)) {
        throw new IllegalArgumentException(
            "kind is \"other\"; its rating must be as rigged and its standard factor stated");
      }
      if (hitch == Hitch.BASKET) {
        Range.checkOrNull("angle_deg", angleDeg, 30, 90, "degrees");
      } else if (hitch != Hitch.CHOKER && angleDeg != null) {
        throw new IllegalArgumentException("angle_deg is stated; it is for a choker or a basket");
      }
    }
  }

  /**
   * Connectors of one kind.
   *
   * @param ratedLoadN rated load [N]; null: a shackle without a readable mark, by its body
   * @param standardFactor breaking load over rated load that its standard asks; null: that of a
   *     shackle
   * @param bodyDiameterM diameter of a shackle's body [m]; null: not stated
   * @param asideDeg angle by which a shackle is loaded aside [degrees]; 0: in line
   */
  public record Connector(
      String id,
      Kind kind,
      Double ratedLoadN,
      Double standardFactor,
      Double bodyDiameterM,
      double asideDeg,
      int count)
      implements Item {
    /** Kinds of connector. */
    public enum Kind {
      SHACKLE,
      /** Anything else, rated as it is loaded. */
      RATED
    }

    public Connector {
      Range.text("id", id);
      Range.present("kind", kind);
      rated(ratedLoadN, standardFactor);
      Range.checkOrNull("body_diameter_m", bodyDiameterM, 0.004, 0.1, "m");
      Range.check("aside_deg", asideDeg, 0, kind == Kind.SHACKLE ? 90 : 0, "degrees");
      Range.check("count", count, 0, 100, "");
      if (ratedLoadN == null && (kind == Kind.RATED || bodyDiameterM == null)) {
        throw new IllegalArgumentException(
            "rated_load_N is null; it must be stated, but of a shackle whose body diameter is");
      }
      if (kind == Kind.RATED && standardFactor == null) {
        throw new IllegalArgumentException(
            "standard_factor is null; it must be stated, but of a shackle");
      }
    }
  }

  /**
   * A load cell with a person who reads it.
   *
   * @param at where it sits
   */
  public record LoadCell(String id, double ratedLoadN, double standardFactor, At at)
      implements Item {
    /** Where a load cell can sit. */
    public enum At {
      /** In the pull line at the tree. */
      TREE_END,
      /** In the pull line where the source takes it. */
      SOURCE_END,
      /** In the haul part of a block system. */
      HAUL_PART,
      /** Between the source, or the block system, and its anchor. */
      ANCHOR
    }

    public LoadCell {
      Range.text("id", id);
      rated(ratedLoadN, standardFactor);
      Range.present("at", at);
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

  private static void rated(Double ratedLoadN, Double standardFactor) {
    Range.checkOrNull("rated_load_N", ratedLoadN, 100, 1e7, "N");
    Range.checkOrNull("standard_factor", standardFactor, 1, 12, "");
  }
}
