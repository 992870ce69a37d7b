package org.fallwright.core.site;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
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
 * @param cases named cases of other days
 * @param revisions the setup as set on the day, oldest first
 * @param gear all the gear thought of, also what is left behind
 * @param kit name of the kit file that the gear was taken from; null: none
 * @param leftBehind gear that does not come to the site
 * @param tapeTies distances taped between two things
 * @param peoplePoints doors and places of persons
 * @param exceptions checks that somebody takes an exception to
 * @param zones what is stated of the zones
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
    List<Case> cases,
    List<Revision> revisions,
    String kit,
    List<LeftBehind> leftBehind,
    List<TapeTie> tapeTies,
    List<PeoplePoint> peoplePoints,
    List<TakenException> exceptions,
    ZoneChoices zones,
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
    cases = List.copyOf(Range.present("cases", cases));
    revisions = List.copyOf(Range.present("revisions", revisions));
    oneNameEach(cases.stream().map(Case::id));
    if (kit != null) {
      Range.text("kit", kit);
    }
    leftBehind = List.copyOf(Range.present("left_behind", leftBehind));
    leftBehind(gear, leftBehind);
    tapeTies = List.copyOf(Range.present("tape_ties", tapeTies));
    peoplePoints = List.copyOf(Range.present("people_points", peoplePoints));
    exceptions = List.copyOf(Range.present("exceptions", exceptions));
    Range.present("zones", zones);
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
                peoplePoints.stream().map(PeoplePoint::id),
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
    for (PeoplePoint p : peoplePoints) {
      if (p.of() != null && targets.stream().noneMatch(t -> t.id().equals(p.of()))) {
        throw new IllegalArgumentException(
            "people_points."
                + p.id()
                + ".of names \""
                + p.of()
                + "\"; no target of that name is on the site");
      }
    }
    for (TapeTie t : tapeTies) {
      tied(tree, targets, anchors, spots, "from", t.from(), t.fromAt());
      tied(tree, targets, anchors, spots, "to", t.to(), t.toAt());
    }
  }

  /** The same site, shown in other units. */
  public Site in(Display other) {
    return Copy.with(this, "display", other);
  }

  /** The same site with other wires. */
  public Site withWires(List<Wire> others) {
    return Copy.with(this, "wires", others);
  }

  /** The same site on other pictures; null: blank ground. */
  public Site withPicture(Picture other) {
    return Copy.with(this, "picture", other);
  }

  /**
   * The same site with other gear.
   *
   * @param from name of the kit file that it was taken from; null: none
   * @param stays what of it does not come to the site
   */
  public Site withGear(Gear other, String from, List<LeftBehind> stays) {
    return Copy.with(
        Copy.with(Copy.with(Copy.with(this, "leftBehind", List.of()), "gear", other), "kit", from),
        "leftBehind",
        stays);
  }

  /** The same site with one more thing left behind; one that is so already stays so. */
  public Site leaving(LeftBehind thing) {
    return leftBehind.stream().anyMatch(l -> l.item().equals(thing.item()))
        ? this
        : withGear(gear, kit, Stream.concat(leftBehind.stream(), Stream.of(thing)).toList());
  }

  /** The same site with a thing that was left behind at hand again. */
  public Site taking(String item) {
    return withGear(gear, kit, leftBehind.stream().filter(l -> !l.item().equals(item)).toList());
  }

  /** The site as it is judged: with the gear at hand alone. */
  public Site atHand() {
    return leftBehind.isEmpty()
        ? this
        : withGear(
            gear.without(leftBehind.stream().map(LeftBehind::item).collect(Collectors.toSet())),
            kit,
            List.of());
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
    Site bare = Copy.with(this, "gear", placed(names -> List.of()));
    bare = Copy.with(Copy.with(bare, "strips", List.of()), "spots", standing());
    return Copy.with(bare, "gear", placed(this::laidOut));
  }

  private Gear placed(UnaryOperator<List<String>> places) {
    return Copy.with(
        gear,
        "sources",
        gear.sources().stream()
            .map(s -> Copy.with(s, "places", places.apply(s.places())))
            .map(s -> Copy.with(s, "driverPlaces", places.apply(s.driverPlaces())))
            .toList());
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

  private static void tied(
      SubjectTree tree,
      List<Target> targets,
      List<Anchor> anchors,
      List<Spot> spots,
      String end,
      String id,
      Position at) {
    Optional<Target> target = targets.stream().filter(t -> t.id().equals(id)).findFirst();
    if (target.isPresent()) {
      if (at == null && !(target.get().shape() instanceof Shape.Circle)) {
        throw new IllegalArgumentException(
            "tape_ties."
                + end
                + "_at is null; it must be stated for \""
                + id
                + "\", which has no point of its own");
      }
    } else if (!tree.id().equals(id)) {
      known(anchors, spots, List.of(), "tape_ties." + end, id);
    }
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

  private static void leftBehind(Gear gear, List<LeftBehind> stays) {
    for (LeftBehind left : stays) {
      long named = gear.items().stream().filter(i -> i.id().equals(left.item())).count();
      if (named != 1) {
        throw new IllegalArgumentException(
            "left_behind names \""
                + left.item()
                + "\"; "
                + (named == 0 ? "nothing" : "more than one thing")
                + " of that name is in the gear");
      }
      if (stays.stream().filter(l -> l.item().equals(left.item())).count() > 1) {
        throw new IllegalArgumentException(
            "left_behind names \"" + left.item() + "\" more than once; once is enough");
      }
    }
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
          field
              + " names \""
              + id
              + "\"; no anchor"
              + (field.startsWith("tape_ties.") ? " or spot" : ", spot or strip")
              + " of that name is on the site");
    }
  }
}
