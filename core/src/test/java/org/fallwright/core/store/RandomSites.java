package org.fallwright.core.store;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.function.IntFunction;
import java.util.function.Supplier;
import java.util.stream.IntStream;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Case;
import org.fallwright.core.site.Conditions;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.DropZone;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.How;
import org.fallwright.core.site.LeftBehind;
import org.fallwright.core.site.Looked;
import org.fallwright.core.site.Offer;
import org.fallwright.core.site.Origin;
import org.fallwright.core.site.PeoplePoint;
import org.fallwright.core.site.Picture;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Revision;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.site.Stated;
import org.fallwright.core.site.StemDiameter;
import org.fallwright.core.site.Steps;
import org.fallwright.core.site.Strip;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.TakenException;
import org.fallwright.core.site.TapeTie;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.WeighedSection;
import org.fallwright.core.site.Wetness;
import org.fallwright.core.site.Wire;
import org.fallwright.core.site.ZoneChoices;

/** Valid sites from a seed: every kind of thing, stated and not stated, over its whole range. */
public final class RandomSites {
  private static final String[] SIGNS = {"a", "Z", "ü", "–", "\"", "\\", "/", "\n", "木", "🌳", " "};
  private static final How[] USUAL = {How.MEASURED, How.ESTIMATED, How.GUESSED};
  private static final How[] OF_ONE_VALUE = {How.MEASURED, How.ESTIMATED, How.GUESSED, How.UNKNOWN};
  private final Random random;

  public RandomSites(long seed) {
    random = new Random(seed);
  }

  public Site site() {
    double height = in(2, 120);
    List<Anchor> anchors = new ArrayList<>(list(0, 5, i -> anchor("anchor " + i)));
    if (anchors.size() > 1) {
      anchors.add(
          new Anchor.TwoLegs(
              "legs",
              place(),
              in(0, 10),
              maybe(this::text),
              maybe(this::text),
              anchors.get(0).id(),
              anchors.get(1).id()));
    }
    List<Spot> spots =
        list(
            1,
            4,
            i ->
                new Spot(
                    "spot " + i,
                    place(),
                    maybe(() -> in(0, 360)),
                    text(),
                    flag(),
                    in(-30, 30),
                    maybe(() -> in(0, 1000)),
                    maybe(this::text)));
    List<String> places = new ArrayList<>();
    anchors.forEach(a -> places.add(a.id()));
    spots.forEach(s -> places.add(s.id()));
    Gear gear = gear(places);
    return new Site(
        Site.VERSION,
        text(),
        new Origin(in(-84, 84), in(-180, 180)),
        any(Site.Display.values()),
        text(),
        maybe(() -> in(-180, 180)),
        maybe(() -> Picture.of(list(1, 4, i -> layer()))),
        tree(height),
        cut(),
        list(0, 4, i -> target("target " + i)),
        list(0, 3, i -> wire("wire " + i)),
        looked(),
        list(0, 2, i -> new DropZone("zone " + i, polygon())),
        anchors,
        spots,
        gear,
        new Conditions(
            quantity(0, 40),
            maybe(() -> in(0, 360)),
            maybe(() -> in(0, 20)),
            maybe(() -> in(0.5, 1.6))),
        new Offer(
            list(1, 3, i -> in(0.5, 100)),
            any(USUAL),
            in(0.25, 90),
            list(0, 3, i -> in(0, 360)),
            random.nextInt(3),
            maybe(() -> steps(0.5, 100)),
            maybe(() -> steps(0.005, 0.5))),
        list(0, 3, i -> day("case " + i)),
        list(0, 2, i -> revision()),
        maybe(this::text),
        gear.items().stream()
            .filter(i -> flag())
            .map(i -> new LeftBehind(i.id(), maybe(this::text)))
            .toList(),
        ties(places),
        list(
            0,
            3,
            i ->
                new PeoplePoint(
                    "door " + i,
                    any(PeoplePoint.Kind.values()),
                    position(),
                    any(Fix.values()),
                    maybe(() -> in(0, 100)),
                    null)),
        list(0, 2, i -> new TakenException(text(), text(), text(), text())),
        new ZoneChoices(
            maybe(() -> in(0, 200)),
            maybe(() -> in(1, 10)),
            maybe(() -> new ZoneChoices.AcceptedEnergy(in(1, 1e6), text(), text()))),
        list(0, 2, i -> strip("strip " + i)));
  }

  private Case day(String id) {
    return new Case(
        id,
        maybe(() -> any(Wetness.values())),
        maybe(() -> any(Wetness.values())),
        maybe(this::flag),
        maybe(this::flag),
        maybe(() -> quantity(0, 40)),
        maybe(() -> in(0, 360)),
        maybe(() -> "1" + random.nextInt(10) + ":05"));
  }

  private Revision revision() {
    Revision.AsSet set =
        new Revision.AsSet(
            in(0, 360),
            in(0.5, 100),
            in(0.005, 0.5),
            text(),
            list(0, 2, i -> text()),
            text(),
            text(),
            text(),
            maybe(() -> new Revision.Driver(text(), text(), text())));
    return new Revision(
        text(),
        text(),
        text(),
        set,
        maybe(() -> any(Wetness.values())),
        maybe(() -> quantity(0, 40)),
        list(0, 3, i -> text()),
        text(),
        maybe(this::text));
  }

  private List<TapeTie> ties(List<String> places) {
    return list(
        0,
        3,
        i ->
            new TapeTie(
                "tree",
                maybe(this::position),
                one(places),
                maybe(this::position),
                in(0.1, 500),
                maybe(() -> in(0, 10))));
  }

  private Steps steps(double least, double most) {
    double from = in(least, most);
    double to = Math.max(from, in(least, most));
    return new Steps(from, to, Math.max(0.001, (to - from) / (1 + random.nextInt(20)) * 1.001));
  }

  private Strip strip(String id) {
    Position from = new Position(in(-4000, 4000), in(-4000, 4000));
    double from0 = in(-500, 8900);
    return new Strip(
        id,
        List.of(from, from.along(in(0, 360), in(50, 900)), from.along(in(0, 360), in(20, 40))),
        any(Fix.values()),
        maybe(() -> in(0, 100)),
        from0,
        from0 + in(0, 20),
        in(0.5, 30),
        in(20, 200),
        flag(),
        text(),
        flag(),
        maybe(this::text));
  }

  private SubjectTree tree(double height) {
    boolean weighed = flag();
    Place stump = place();
    boolean drawn = flag() && inner(stump.at());
    return new SubjectTree(
        "tree",
        text(),
        stump,
        quantity(0.05, 4),
        maybe(() -> quantity(0.05, 6)),
        list(0, 3, i -> new StemDiameter(in(0, height), in(0.01, 6))),
        new Quantity(height, How.MEASURED, null),
        in(0, height),
        in(0.1, 40),
        quantity(0, 45),
        quantity(0, 360),
        weighed ? null : maybe(() -> quantity(10, 500_000)),
        weighed ? null : maybe(() -> quantity(0.5, height)),
        weighed ? list(1, 4, i -> new WeighedSection(in(10, 100_000), in(0, height))) : null,
        maybe(() -> in(0, 1)),
        drawn ? null : maybe(this::position),
        drawn ? polygon(stump.at(), 90) : null,
        maybe(() -> in(0, 5000)),
        maybe(() -> in(0.001, 3)),
        flag(),
        flag(),
        flag(),
        any(SubjectTree.MassBy.values()));
  }

  private CutPlan cut() {
    return new CutPlan(
        in(0, 5),
        any(CutPlan.Face.values()),
        in(0.05, 0.6),
        in(10, 120),
        list(1, 3, i -> in(0.005, 0.5)),
        any(USUAL),
        maybe(() -> in(0.02, 6)),
        in(0, 0.05),
        flag());
  }

  private Picture.Layer layer() {
    return new Picture.Layer(
        text(), maybe(this::text), text(), in(-200, 200), in(-200, 200), in(0, 1));
  }

  private Target target(String id) {
    return new Target(
        id,
        any(Target.Kind.values()),
        shape(),
        any(Fix.values()),
        maybe(() -> in(0, 100)),
        in(-500, 9000),
        in(0, 300),
        in(0, 100),
        flag(),
        flag(),
        flag());
  }

  private Shape shape() {
    return switch (random.nextInt(3)) {
      case 0 -> polygon();
      case 1 -> new Shape.Line(list(2, 5, i -> position()));
      default -> new Shape.Circle(position(), in(0.01, 1000));
    };
  }

  /** Corners in the order of their bearings from a middle: never crossing. */
  private Shape.Polygon polygon() {
    return polygon(new Position(in(-4000, 4000), in(-4000, 4000)), 900);
  }

  private static boolean inner(Position p) {
    return Math.max(Math.abs(p.eastM()), Math.abs(p.northM())) < 4900;
  }

  private Shape.Polygon polygon(Position middle, double most) {
    int corners = 3 + random.nextInt(5);
    return new Shape.Polygon(
        IntStream.range(0, corners)
            .mapToObj(
                i -> middle.along((i + random.nextDouble() * 0.9) * 360 / corners, in(1, most)))
            .toList());
  }

  private Wire wire(String id) {
    return new Wire(
        id,
        maybe(() -> in(0.01, 1500)),
        maybe(this::text),
        any(Wire.State.values()),
        list(2, 4, i -> new Wire.Pole(position(), in(-500, 9000), in(1, 200))),
        in(0, 50),
        any(Fix.values()),
        maybe(() -> in(0, 100)));
  }

  private List<Looked> looked() {
    List<Looked> all = new ArrayList<>();
    for (Looked.What what : Looked.What.values()) {
      Looked.Found found = any(Looked.Found.values());
      if (flag()) {
        all.add(
            new Looked(what, found, found == Looked.Found.NOT_LOOKED ? maybe(this::text) : text()));
      }
    }
    return all;
  }

  private Anchor anchor(String id) {
    double height = in(1, 120);
    return switch (random.nextInt(6)) {
      case 0 ->
          new Anchor.StandingTree(
              id,
              place(),
              in(0, 10),
              maybe(this::text),
              maybe(this::text),
              text(),
              in(0.02, 4),
              height,
              in(0, height),
              in(0.1, 40),
              any(Anchor.Soil.values()),
              flag(),
              flag(),
              any(Anchor.Condition.values()),
              flag());
      case 1 ->
          new Anchor.Stump(
              id,
              place(),
              in(0, 3),
              maybe(this::text),
              maybe(this::text),
              text(),
              in(0.02, 4),
              height,
              maybe(() -> in(1, 200_000)),
              any(Anchor.Soil.values()),
              flag(),
              flag(),
              any(Anchor.Condition.values()));
      case 2 ->
          new Anchor.ParkedVehicle(
              id,
              place(),
              in(0, 3),
              maybe(this::text),
              maybe(this::text),
              in(200, 60_000),
              text(),
              flag(),
              in(-30, 30),
              in(100, 1e6));
      case 3 -> {
        Anchor.Holdfast holdfast = any(Anchor.Holdfast.values());
        yield new Anchor.Pickets(
            id,
            place(),
            in(0, 0.3),
            maybe(this::text),
            maybe(this::text),
            holdfast,
            holdfast.wooden() ? 1 : 1 + random.nextInt(10),
            any(Anchor.PicketSoil.values()),
            flag());
      }
      case 4 ->
          new Anchor.BuriedLog(
              id,
              place(),
              in(0, 0.3),
              maybe(this::text),
              maybe(this::text),
              in(0.91, 3),
              in(0.1, 1),
              in(0.5, 6),
              1 + random.nextInt(4),
              any(Anchor.DeadmanSoil.values()));
      default ->
          new Anchor.RatedPoint(
              id, place(), in(0, 10), maybe(this::text), maybe(this::text), in(100, 1e7), text());
    };
  }

  private Gear gear(List<String> places) {
    return new Gear(
        list(0, 3, i -> line("line " + i)),
        list(0, 2, i -> block("block " + i)),
        list(0, 2, i -> sling("sling " + i)),
        list(0, 2, i -> connector("link " + i)),
        maybe(
            () ->
                new Gear.LoadCell(text(), in(100, 1e7), in(1, 12), any(Gear.LoadCell.At.values()))),
        list(
            0,
            4,
            i ->
                new Gear.Source(
                    "source " + i,
                    text(),
                    list(0, 3, j -> one(places)),
                    i == 0 ? List.of() : List.of("source 0"),
                    list(0, 2, j -> one(places)),
                    parameters(3))));
  }

  private Gear.Line line(String id) {
    Gear.Material m = any(Gear.Material.values());
    boolean label = m == Gear.Material.HMPE || flag();
    return new Gear.Line(
        id,
        m,
        label ? in(0.003, 0.1) : in(0.004, 0.026),
        in(1, 1000),
        label ? in(500, 5e6) : null,
        maybe(() -> end(m)),
        maybe(() -> end(m)),
        maybe(() -> stated(0.1)),
        flag(),
        flag(),
        maybe(() -> stated(0.1)),
        maybe(() -> in(1e3, 1e9)),
        flag());
  }

  private Gear.End end(Gear.Material m) {
    return m.chain() || flag()
        ? new Gear.End(Gear.End.Kind.OTHER, stated(0.1))
        : new Gear.End(
            m.wire() ? Gear.End.Kind.WIRE_CLIPS : Gear.End.Kind.BOWLINE, maybe(() -> stated(0.1)));
  }

  private Stated stated(double least) {
    return new Stated(in(least, 1), text());
  }

  private Gear.Block block(String id) {
    boolean other = flag();
    return new Gear.Block(
        id,
        in(100, 1e7),
        maybe(() -> in(1, 12)),
        other ? Gear.Block.SheaveKind.OTHER : Gear.Block.SheaveKind.RESCUE_PULLEY,
        maybe(() -> in(0.005, 2)),
        other ? stated(0.3) : maybe(() -> stated(0.3)));
  }

  private Gear.Sling sling(String id) {
    int count = random.nextInt(101);
    return switch (random.nextInt(4)) {
      case 0 ->
          new Gear.Sling(
              id,
              Gear.Sling.Kind.OTHER,
              in(100, 1e7),
              maybe(() -> in(0.004, 0.05)),
              in(1, 12),
              Gear.Sling.Hitch.AS_RIGGED,
              null,
              count);
      case 1 ->
          new Gear.Sling(
              id,
              Gear.Sling.Kind.CHAIN_80,
              null,
              in(0.004, 0.05),
              maybe(() -> in(1, 12)),
              Gear.Sling.Hitch.VERTICAL,
              null,
              count);
      case 2 ->
          new Gear.Sling(
              id,
              Gear.Sling.Kind.WEBBING,
              in(100, 1e7),
              null,
              null,
              Gear.Sling.Hitch.BASKET,
              maybe(() -> in(30, 90)),
              count);
      default ->
          new Gear.Sling(
              id,
              Gear.Sling.Kind.NATURAL_FIBRE,
              in(100, 1e7),
              null,
              null,
              Gear.Sling.Hitch.CHOKER,
              maybe(() -> in(0, 180)),
              count);
    };
  }

  private Gear.Connector connector(String id) {
    int count = random.nextInt(101);
    return flag()
        ? new Gear.Connector(id, Gear.Connector.Kind.RATED, in(100, 1e7), in(1, 12), null, 0, count)
        : new Gear.Connector(
            id,
            Gear.Connector.Kind.SHACKLE,
            maybe(() -> in(100, 1e7)),
            maybe(() -> in(1, 12)),
            in(0.004, 0.1),
            in(0, 90),
            count);
  }

  private ObjectNode parameters(int depth) {
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    for (int i = random.nextInt(6); i > 0; i--) {
      String key = text();
      switch (random.nextInt(depth > 0 ? 7 : 5)) {
        case 0 -> node.put(key, random.nextInt());
        case 1 -> node.put(key, in(-1e300, 1e300));
        case 2 -> node.put(key, text());
        case 3 -> node.put(key, flag());
        case 4 -> node.putNull(key);
        case 5 -> node.set(key, parameters(depth - 1));
        default -> node.putArray(key).add(random.nextInt()).addNull().add(parameters(depth - 1));
      }
    }
    return node;
  }

  private Place place() {
    return new Place(position(), in(-500, 9000), any(Fix.values()), maybe(() -> in(0, 100)));
  }

  private Position position() {
    return new Position(in(-5000, 5000), in(-5000, 5000));
  }

  private Quantity quantity(double least, double most) {
    return flag() && flag()
        ? Quantity.range(in(least, (least + most) / 2), in((least + most) / 2, most))
        : new Quantity(in(least, most), any(OF_ONE_VALUE), maybe(() -> in(0, 1e9)));
  }

  /** From a range, its ends and short figures included. */
  private double in(double least, double most) {
    double value = least + random.nextDouble() * (most - least);
    double rounded = Math.rint(value * 100) / 100;
    return switch (random.nextInt(10)) {
      case 0 -> least;
      case 1 -> most;
      case 2, 3, 4 -> rounded >= least && rounded <= most ? rounded : value;
      default -> value;
    };
  }

  private String text() {
    StringBuilder text = new StringBuilder("x");
    for (int i = random.nextInt(12); i > 0; i--) {
      text.append(one(List.of(SIGNS)));
    }
    return text.toString();
  }

  private boolean flag() {
    return random.nextBoolean();
  }

  private <T> T maybe(Supplier<T> stated) {
    return flag() ? stated.get() : null;
  }

  private <T> T any(T[] all) {
    return all[random.nextInt(all.length)];
  }

  private <T> T one(List<T> all) {
    return all.get(random.nextInt(all.size()));
  }

  private <T> List<T> list(int least, int most, IntFunction<T> one) {
    return IntStream.range(0, least + random.nextInt(most - least + 1)).mapToObj(one).toList();
  }
}
