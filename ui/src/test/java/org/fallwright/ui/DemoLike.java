package org.fallwright.ui;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Figures;
import org.fallwright.core.plan.Ground;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.LinePoint;
import org.fallwright.core.plan.PartLoad;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Conditions;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.DropZone;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Looked;
import org.fallwright.core.site.Offer;
import org.fallwright.core.site.Origin;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.util.GeometricShapeFactory;

/**
 * A site like the demonstration and hand-made results on it. The figures only look like results; no
 * test may take one of them for true.
 */
public final class DemoLike {
  public static final Position STUMP = new Position(16, 24);
  private static final GeometryFactory F = new GeometryFactory();

  private DemoLike() {}

  public static Site site(Site.Display display) {
    SubjectTree tree =
        new SubjectTree(
            "T1",
            "northern-red-oak",
            place(16, 24, 0),
            Quantity.measured(0.52),
            Quantity.measured(0.58),
            List.of(),
            Quantity.measured(17.5),
            6,
            4.5,
            Quantity.measured(5),
            Quantity.measured(188),
            Quantity.estimated(3700),
            null,
            null,
            null,
            null,
            null,
            null,
            null,
            false,
            true,
            false);
    return new Site(
        1,
        "Oak behind the house",
        new Origin(45, -40),
        display,
        "US-OSHA",
        -14.5,
        null,
        tree,
        new CutPlan(
            0.3, CutPlan.Face.OPEN, 0.25, 70, List.of(0.045), How.MEASURED, null, 0.01, false),
        targets(),
        List.of(
            new Wire(
                "W1",
                12.47,
                "line owner",
                Wire.State.ENERGIZED,
                List.of(
                    new Wire.Pole(new Position(42.5, -5), 0, 9.5),
                    new Wire.Pole(new Position(42.5, 45), 0, 9.5),
                    new Wire.Pole(new Position(42.5, 95), 0, 9.5)),
                0.8,
                Fix.TAPES,
                null)),
        List.of(
            new Looked(Looked.What.WIRES, Looked.Found.DRAWN, "crew lead"),
            new Looked(Looked.What.PEOPLE_INDOORS, Looked.Found.NONE, "crew lead")),
        List.of(new DropZone("D1", polygon(3.2, 22, 25, 22, 25, 46, 3.2, 46))),
        anchors(),
        List.of(
            new Spot("V1", place(21.5, 66, 1.5), 4.0, "gravel", false, 0, null, null),
            new Spot("V2", place(12, 64, 1.2), 354.0, "grass", true, 0, null, null),
            new Spot("HC", place(16, 62.5, 1.2), null, "grass", true, 0, null, null)),
        gear(),
        new Conditions(Quantity.estimated(4), null, null, null),
        new Offer(List.of(10.5), How.MEASURED, 2, List.of(), 1));
  }

  private static List<Target> targets() {
    return List.of(
        new Target(
            "House",
            Target.Kind.STRUCTURE,
            polygon(6, 2, 27, 2, 27, 13, 20, 13, 20, 15.5, 6, 15.5),
            Fix.TAPES,
            null,
            0,
            5,
            1.5,
            true,
            false,
            false),
        new Target(
            "Shed",
            Target.Kind.STRUCTURE,
            polygon(26.5, 34, 30.5, 34, 30.5, 37.5, 26.5, 37.5),
            Fix.TAPES,
            null,
            0,
            2.6,
            1.5,
            false,
            false,
            false),
        target("F1 paddock fence", Target.Kind.FENCE, line(3, 10, 3, 44, -14, 44), 1.2, false),
        target("F2", Target.Kind.FENCE, line(19, 60, 19, 72), 1.2, false),
        target("Plum", Target.Kind.PLANTING, new Shape.Circle(new Position(9, 40), 1.5), 4, true),
        target("Septic", Target.Kind.BURIED, new Shape.Circle(new Position(4, 60), 3), 0, false),
        target("Driveway", Target.Kind.ROAD, line(23, 90, 23, 52, 34, 14), 0, true),
        target(
            "C1",
            Target.Kind.CAR,
            polygon(21.7, 55.2, 23.5, 55.2, 23.5, 59.8, 21.7, 59.8),
            1.5,
            false));
  }

  private static List<Anchor> anchors() {
    return List.of(
        new Anchor.StandingTree(
            "A1",
            place(17.5, 53, 0.9),
            0.6,
            null,
            null,
            "white-oak",
            0.62,
            19,
            6,
            5,
            Anchor.Soil.FREE_DRAINING_MINERAL,
            true,
            false,
            Anchor.Condition.SOUND,
            false),
        new Anchor.StandingTree(
            "A2",
            place(7.5, 51, 0.5),
            1,
            "moved when kicked",
            null,
            "paper-birch",
            0.27,
            13,
            3,
            2,
            Anchor.Soil.GLEYED_MINERAL,
            false,
            true,
            Anchor.Condition.SOUND,
            false),
        new Anchor.StandingTree(
            "A3",
            place(-9, 54.5, 0.8),
            0.6,
            null,
            null,
            "norway-spruce",
            0.44,
            23,
            4,
            3,
            Anchor.Soil.FREE_DRAINING_MINERAL,
            true,
            false,
            Anchor.Condition.SOUND,
            false),
        new Anchor.Stump(
            "S1",
            place(37, 50, 0.3),
            0.2,
            null,
            null,
            "pine",
            0.4,
            15,
            null,
            Anchor.Soil.FREE_DRAINING_MINERAL,
            false,
            false,
            Anchor.Condition.SOUND));
  }

  private static Gear gear() {
    ObjectNode none = JsonNodeFactory.instance.objectNode();
    return new Gear(
        List.of(new Gear.Line("L1", "HMPE", false, 0.012, 80, 120_000, 0.9, 1, 1, 2.4e6, true)),
        List.of(new Gear.Block("B1", 30_000, 4, 0.95)),
        List.of(new Gear.Sling("SL", 30_000, 5, 2)),
        List.of(),
        null,
        List.of(
            new Gear.Source(
                "hand winch", "winch", List.of("A3", "A1", "S1"), List.of(), List.of(), none),
            new Gear.Source("pick-up", "vehicle", List.of("V1", "V2"), List.of(), List.of(), none),
            new Gear.Source("crew", "hand-line", List.of("HC"), List.of(), List.of(), none)));
  }

  /** A plan with a setup of every verdict, each at another kind of place. */
  public static Plan plan(Site site) {
    List<Judged> ranked =
        List.of(
            judged(site, 3, "hand winch", "A3", List.of("A1"), Verdict.WORKABLE, 1.46),
            judged(site, 7, "pick-up", "V1", List.of(), Verdict.WORKABLE, 1.33),
            judged(site, 3, "hand winch", "A1", List.of(), Verdict.TIGHT, 1.12),
            judged(site, 0, "crew", "HC", List.of(), Verdict.NOT_WORKABLE, 0.06));
    Map<String, Integer> binding = new LinkedHashMap<>();
    binding.put("clearance", 212);
    binding.put("anchor A2 at plan", 31);
    binding.put("pull margin", 9);
    Map<String, Judged> best = new LinkedHashMap<>();
    best.put("clearance", judged(site, 39, "hand winch", "S1", List.of(), Verdict.NOT_WORKABLE, 0));
    best.put(
        "anchor A2 at plan",
        judged(site, 342, "hand winch", "A3", List.of("A2"), Verdict.NOT_WORKABLE, 0.5));
    best.put(
        "pull margin", judged(site, 354, "pick-up", "V2", List.of(), Verdict.NOT_WORKABLE, 0.2));
    return new Plan(
        ranked,
        279,
        Map.of(Verdict.WORKABLE, 21, Verdict.TIGHT, 6, Verdict.NOT_WORKABLE, 252),
        binding,
        best,
        List.of("No plugin answers for the source \"old capstan\"."));
  }

  public static Judged judged(
      Site site,
      double lay,
      String source,
      String place,
      List<String> redirects,
      Verdict verdict,
      double margin) {
    Setup setup = new Setup(lay, 10.5, 0.045, "L1", redirects, source, "usual", place, null);
    List<LinePoint> line = new ArrayList<>();
    line.add(
        new LinePoint(
            STUMP.along(188, 10.5 * Math.tan(Math.toRadians(5))),
            10.5,
            LinePoint.Role.ATTACHMENT,
            "T1"));
    redirects.forEach(
        r -> line.add(new LinePoint(at(site, r).at(), 1.5, LinePoint.Role.REDIRECT, r)));
    line.add(new LinePoint(at(site, place).at(), 1.6, LinePoint.Role.SOURCE, place));
    double plan = 6360;
    Check pull =
        new Check(
            "pull margin",
            margin * plan,
            plan,
            "N",
            margin,
            verdict,
            null,
            "The source gives less than the pull to plan for.");
    List<Check> checks =
        List.of(
            pull,
            new Check(
                "clearance",
                3.9,
                1.9,
                "m",
                2.05,
                Verdict.WORKABLE,
                new Position(28, 36),
                "Shed clears."),
            new Check(
                "anchor at plan",
                76_000,
                9_200,
                "N",
                2.75,
                Verdict.WORKABLE,
                at(site, "A1").at(),
                "Root plate of A1."),
            new Check(
                "anchor at plan",
                3_200,
                4_800,
                "N",
                0.67,
                Verdict.NOT_WORKABLE,
                at(site, "A2").at(),
                "Root plate of A2 in wet ground."),
            new Check("steering", 0.45, 0.143, "", 3.1, Verdict.WORKABLE, STUMP, "Hinge steers."),
            new Check("hold stability", 12.5, 1.2, "", 10.4, Verdict.WORKABLE, null, "Line holds."),
            new Check(
                "wire voltage",
                Double.NaN,
                Double.NaN,
                "",
                Double.NaN,
                Verdict.CANNOT_JUDGE,
                null,
                "Voltage not given."));
    Figures f =
        new Figures(
            4730,
            plan,
            5050,
            plan,
            2.97,
            12.5,
            "stops",
            9590,
            margin * plan,
            17_600,
            15_700,
            "stem",
            margin,
            3.9,
            "Shed",
            8.96,
            12.1,
            2.86,
            1.9,
            2.86,
            16.7,
            9.9,
            0.143,
            0.08,
            0.071,
            55.8,
            false,
            Double.NaN,
            "",
            1.05,
            false);
    return new Judged(
        setup,
        verdict,
        pull,
        margin / 1.25,
        List.of(),
        0,
        "Workable. Plan for 6.36 kN (1,430 lbf) on the line at the tree; "
            + source
            + " gives 9.31 kN. Weakest link: pull margin, 1.46 times what is asked.",
        f,
        checks,
        List.of(
            new PartLoad("line L1", 6360, 17_600, 108_000, 5, 1.5),
            new PartLoad("stem", 6360, 17_600, 47_100, 3, 1.5),
            new PartLoad("block B1", 9_200, 24_900, 120_000, 4, 1.5)),
        line,
        List.of(),
        ground(site, lay, redirects, place),
        List.of("The tree moves a little by itself and stops."));
  }

  private static Ground ground(Site site, double lay, List<String> redirects, String place) {
    double h = 17.5;
    List<Geometry> bights = new ArrayList<>();
    if (!redirects.isEmpty()) {
      Position r = at(site, redirects.get(0)).at();
      Position p = at(site, place).at();
      bights.add(F.createPolygon(new Coordinate[] {c(STUMP), c(r), c(p), c(STUMP)}).buffer(5));
    }
    Geometry sit = sector(STUMP, 188, 60, h + 3);
    Geometry foot = sector(STUMP, lay, 8, h + 3).buffer(0.3);
    Position mid = STUMP.along(lay, 12.5);
    foot = foot.union(F.createPoint(c(mid)).buffer(6));
    return new Ground(
        foot,
        STUMP.along(lay, h),
        sit,
        2 * h,
        bights,
        F.createPolygon(),
        List.of(STUMP.along(lay + 112, 8), STUMP.along(lay - 112, 8)),
        7.9,
        h + 3.05);
  }

  private static Geometry sector(Position from, double azimuth, double half, double radius) {
    GeometricShapeFactory g = new GeometricShapeFactory(F);
    g.setCentre(c(from));
    g.setSize(2 * radius);
    g.setNumPoints(96);
    return g.createArcPolygon(Math.toRadians(90 - azimuth - half), Math.toRadians(2 * half));
  }

  private static Place at(Site site, String id) {
    return site.anchor(id).map(Anchor::place).orElseGet(() -> site.spot(id).orElseThrow().place());
  }

  private static Place place(double e, double n, double ground) {
    return new Place(new Position(e, n), ground, Fix.TAPES, null);
  }

  private static Coordinate c(Position p) {
    return new Coordinate(p.eastM(), p.northM());
  }

  private static Target target(String id, Target.Kind k, Shape s, double height, boolean hit) {
    return new Target(id, k, s, Fix.TAPES, null, 0, height, hit ? 0 : 0.5, false, hit, false);
  }

  private static Shape.Polygon polygon(double... en) {
    return new Shape.Polygon(points(en));
  }

  private static Shape.Line line(double... en) {
    return new Shape.Line(points(en));
  }

  private static List<Position> points(double... en) {
    List<Position> p = new ArrayList<>();
    for (int i = 0; i < en.length; i += 2) {
      p.add(new Position(en[i], en[i + 1]));
    }
    return p;
  }
}
