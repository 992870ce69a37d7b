package org.fallwright.core.site;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.units.Range;

/**
 * A site: everything a person has entered. Positions are metres east and north of the origin.
 *
 * @param version version of the site file's form
 * @param name what the job is called
 * @param origin where the plane lies on the earth
 * @param display units on screen and paper
 * @param ruleSet key of the rule set
 * @param declinationDeg magnetic declination, east positive [degrees]; null: not stated
 * @param picture base map; null: blank ground
 * @param strips ground along which a source can stand anywhere
 */
public record Site(
    int version,
    String name,
    Origin origin,
    Display display,
    String ruleSet,
    Double declinationDeg,
    Picture picture,
    SubjectTree tree,
    CutPlan cut,
    List<Target> targets,
    List<Wire> wires,
    List<Looked> looked,
    List<DropZone> dropZones,
    List<Anchor> anchors,
    List<Spot> spots,
    Gear gear,
    Conditions conditions,
    Offer offer,
    List<Strip> strips) {
  /** The version written. */
  public static final int VERSION = 2;

  /** Units on screen and paper. */
  public enum Display {
    US(DisplayUnits.US),
    METRIC(DisplayUnits.METRIC);

    private final DisplayUnits units;

    Display(DisplayUnits units) {
      this.units = units;
    }

    /** How quantities are shown in these units. */
    public DisplayUnits units() {
      return units;
    }
  }

  public Site {
    Range.check("version", version, VERSION, VERSION, "");
    Range.text("name", name);
    Range.present("origin", origin);
    Range.present("display", display);
    Range.text("rule_set", ruleSet);
    Range.checkOrNull("declination_deg", declinationDeg, -180, 180, "degrees");
    Range.present("tree", tree);
    Range.present("cut", cut);
    targets = List.copyOf(Range.present("targets", targets));
    wires = List.copyOf(Range.present("wires", wires));
    looked = List.copyOf(Range.present("looked", looked));
    dropZones = List.copyOf(Range.present("drop_zones", dropZones));
    anchors = List.copyOf(Range.present("anchors", anchors));
    spots = List.copyOf(Range.present("spots", spots));
    Range.present("gear", gear);
    Range.present("conditions", conditions);
    Range.present("offer", offer);
    strips = List.copyOf(Range.present("strips", strips));
    List<Spot> standing = standing(spots, strips, tree);
    oneNameEach(
        Stream.of(
                Stream.of(tree.id()),
                targets.stream().map(Target::id),
                wires.stream().map(Wire::id),
                dropZones.stream().map(DropZone::id),
                anchors.stream().map(Anchor::id),
                standing.stream().map(Spot::id),
                strips.stream().map(Strip::id))
            .flatMap(s -> s));
    oneNameEach(gear.sources().stream().map(Gear.Source::id));
    oneNameEach(gear.lines().stream().map(Gear.Line::id));
    oneNameEach(
        Stream.of(
                gear.blocks().stream().map(Gear.Block::id),
                gear.slings().stream().map(Gear.Sling::id),
                gear.connectors().stream().map(Gear.Connector::id))
            .flatMap(s -> s));
    for (Anchor a : anchors) {
      if (a instanceof Anchor.TwoLegs two) {
        ends(anchors, two, "first", two.first());
        ends(anchors, two, "second", two.second());
      }
    }
    for (Gear.Source s : gear.sources()) {
      for (String place : s.places()) {
        known(anchors, standing, strips, "gear.sources." + s.id() + ".places", place);
      }
      for (String place : s.driverPlaces()) {
        known(anchors, standing, strips, "gear.sources." + s.id() + ".driver_places", place);
      }
      for (String driver : s.drivers()) {
        if (gear.sources().stream().noneMatch(o -> o.id().equals(driver))) {
          throw new IllegalArgumentException(
              "gear.sources."
                  + s.id()
                  + ".drivers names \""
                  + driver
                  + "\"; no source of that name is in the gear");
        }
      }
    }
    if (looked.stream().map(Looked::what).distinct().count() != looked.size()) {
      throw new IllegalArgumentException("looked has two entries of one kind; it may have one");
    }
  }

  /** The same site, shown in other units. */
  public Site in(Display other) {
    return new Site(
        version,
        name,
        origin,
        other,
        ruleSet,
        declinationDeg,
        picture,
        tree,
        cut,
        targets,
        wires,
        looked,
        dropZones,
        anchors,
        spots,
        gear,
        conditions,
        offer,
        strips);
  }

  /** The same site with other wires. */
  public Site withWires(List<Wire> others) {
    return new Site(
        version,
        name,
        origin,
        display,
        ruleSet,
        declinationDeg,
        picture,
        tree,
        cut,
        targets,
        others,
        looked,
        dropZones,
        anchors,
        spots,
        gear,
        conditions,
        offer,
        strips);
  }

  public Optional<Anchor> anchor(String id) {
    for (Anchor a : anchors) {
      if (a.id().equals(id)) {
        return Optional.of(a);
      }
    }
    return Optional.empty();
  }

  /** The spot of that name, or the place of that name on a strip. */
  public Optional<Spot> spot(String id) {
    for (Spot s : spots) {
      if (s.id().equals(id)) {
        return Optional.of(s);
      }
    }
    if (strips.isEmpty()) {
      return Optional.empty();
    }
    return standing().stream().filter(s -> s.id().equals(id)).findFirst();
  }

  /** Every place where a vehicle, a machine or people can stand: the spots, then the strips'. */
  public List<Spot> standing() {
    return standing(spots, strips, tree);
  }

  /**
   * The same site with the places of its strips drawn as spots: what the planner works on. Sources
   * that can be on a strip can be at each of its places.
   */
  public Site laidOut() {
    if (strips.isEmpty()) {
      return this;
    }
    Gear all =
        new Gear(
            gear.lines(),
            gear.blocks(),
            gear.slings(),
            gear.connectors(),
            gear.loadCell(),
            gear.sources().stream()
                .map(
                    s ->
                        new Gear.Source(
                            s.id(),
                            s.plugin(),
                            laidOut(s.places()),
                            s.drivers(),
                            laidOut(s.driverPlaces()),
                            s.parameters()))
                .toList());
    return new Site(
        version,
        name,
        origin,
        display,
        ruleSet,
        declinationDeg,
        picture,
        tree,
        cut,
        targets,
        wires,
        looked,
        dropZones,
        anchors,
        standing(),
        all,
        conditions,
        offer,
        List.of());
  }

  private List<String> laidOut(List<String> places) {
    return places.stream()
        .flatMap(
            name ->
                strips.stream()
                    .filter(s -> s.id().equals(name))
                    .findFirst()
                    .map(s -> s.places(tree.stump().at()).stream().map(Spot::id))
                    .orElseGet(() -> Stream.of(name)))
        .toList();
  }

  private static List<Spot> standing(List<Spot> spots, List<Strip> strips, SubjectTree tree) {
    if (strips.isEmpty()) {
      return spots;
    }
    List<Spot> all = new ArrayList<>(spots);
    strips.forEach(s -> all.addAll(s.places(tree.stump().at())));
    return all;
  }

  /** Every hinge thickness on offer [m]. */
  public List<Double> hingeThicknesses() {
    return Steps.with(cut.hingeThicknessesM(), offer.hingeRange());
  }

  public Optional<Gear.Source> source(String id) {
    for (Gear.Source s : gear.sources()) {
      if (s.id().equals(id)) {
        return Optional.of(s);
      }
    }
    return Optional.empty();
  }

  /** What was looked for; not looked where the list is silent. */
  public Looked.Found found(Looked.What what) {
    return looked.stream()
        .filter(l -> l.what() == what)
        .map(Looked::found)
        .findFirst()
        .orElse(Looked.Found.NOT_LOOKED);
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

  private static void ends(List<Anchor> anchors, Anchor.TwoLegs two, String leg, String id) {
    if (anchors.stream().noneMatch(a -> a.id().equals(id) && !(a instanceof Anchor.TwoLegs))) {
      throw new IllegalArgumentException(
          "anchors."
              + two.id()
              + "."
              + leg
              + " names \""
              + id
              + "\"; no anchor of that name that could hold a leg is on the site");
    }
  }

  private static void known(
      List<Anchor> anchors, List<Spot> standing, List<Strip> strips, String field, String id) {
    if (anchors.stream().noneMatch(a -> a.id().equals(id))
        && standing.stream().noneMatch(s -> s.id().equals(id))
        && strips.stream().noneMatch(s -> s.id().equals(id))) {
      throw new IllegalArgumentException(
          field + " names \"" + id + "\"; no anchor, spot or strip of that name is on the site");
    }
  }
}
