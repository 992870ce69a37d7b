package org.fallwright.core.advice;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Conditions;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Looked;
import org.fallwright.core.site.Offer;
import org.fallwright.core.site.Origin;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.site.Stated;
import org.fallwright.core.site.SubjectTree;

/**
 * A level site with one back-leaner at its origin that leans south, a source on a spot 40 m north,
 * and a rated anchor. Nothing is in the way.
 */
public final class TinySite {
  private static final Gear.End SPLICE =
      new Gear.End(Gear.End.Kind.EYE_SPLICE, new Stated(0.9, "the test"));

  public double lowN = 12_000;
  public double highN = 15_000;
  public double leanDeg = 4;
  public Double massKg = 2000.0;
  public double gustMps = 3;
  public Double windTowardDeg;
  public double hingeM = 0.04;
  public double attachM = 8;
  public Position anchor = new Position(0, 40);

  /** Sites from a seed, from easy to hopeless. */
  public static TinySite random(Random r) {
    TinySite t = new TinySite();
    t.lowN = 3000 + r.nextDouble() * 15_000;
    t.highN = t.lowN + 5000;
    t.leanDeg = r.nextDouble() * 8;
    t.massKg = r.nextInt(5) == 0 ? null : Double.valueOf(800 + r.nextDouble() * 3000);
    t.gustMps = r.nextDouble() * 8;
    t.windTowardDeg = r.nextBoolean() ? null : Double.valueOf(r.nextDouble() * 360);
    t.hingeM = 0.02 + r.nextDouble() * 0.05;
    t.attachM = 4 + r.nextDouble() * 6;
    return t;
  }

  public Setup direct() {
    return new Setup(0, attachM, hingeM, "rope", List.of(), "steady", "pull", "spot", null);
  }

  /** Over a block on the anchor. */
  Setup redirected() {
    return new Setup(0, attachM, hingeM, "rope", List.of("point"), "steady", "pull", "spot", null);
  }

  /** From the anchor. */
  Setup anchored() {
    return new Setup(0, attachM, hingeM, "rope", List.of(), "steady", "pull", "point", null);
  }

  public Site site() {
    List<Looked> looked = new ArrayList<>();
    for (Looked.What what : Looked.What.values()) {
      looked.add(new Looked(what, Looked.Found.NONE, "the climber"));
    }
    ObjectNode pull = JsonNodeFactory.instance.objectNode();
    pull.put("low_N", lowN).put("high_N", highN).put("stroke_m", 0.1);
    return new Site(
        Site.VERSION,
        "tiny",
        new Origin(45, -40),
        Site.Display.METRIC,
        "US-OSHA",
        null,
        null,
        new SubjectTree(
            "tree",
            "northern-red-oak",
            place(new Position(0, 0)),
            Quantity.measured(0.45),
            Quantity.measured(0.5),
            List.of(),
            Quantity.measured(15),
            5,
            3,
            Quantity.measured(leanDeg),
            Quantity.measured(180),
            massKg == null ? null : Quantity.measured(massKg),
            Quantity.measured(6),
            null,
            null,
            null,
            null,
            null,
            null,
            false,
            true,
            false,
            SubjectTree.MassBy.EQUATION),
        new CutPlan(
            0.3, CutPlan.Face.OPEN, 0.25, 70, List.of(hingeM), How.MEASURED, null, 0.01, false),
        List.of(),
        List.of(),
        looked,
        List.of(),
        List.of(new Anchor.RatedPoint("point", place(anchor), 1, null, null, 400_000, "the owner")),
        List.of(
            new Spot(
                "spot",
                place(new Position(0.01, 60)),
                null,
                "compact-gravel",
                false,
                0,
                null,
                null)),
        new Gear(
            List.of(
                new Gear.Line(
                    "rope",
                    Gear.Material.HMPE,
                    0.012,
                    120,
                    150_000.0,
                    SPLICE,
                    SPLICE,
                    null,
                    false,
                    false,
                    null,
                    2.4e6,
                    true)),
            List.of(
                new Gear.Block(
                    "block",
                    40_000,
                    4.0,
                    Gear.Block.SheaveKind.OTHER,
                    null,
                    new Stated(0.9, "the test"))),
            List.of(
                new Gear.Sling(
                    "sling",
                    Gear.Sling.Kind.OTHER,
                    40_000.0,
                    null,
                    5.0,
                    Gear.Sling.Hitch.AS_RIGGED,
                    null,
                    4)),
            List.of(
                new Gear.Connector("link", Gear.Connector.Kind.RATED, 40_000.0, 5.0, null, 0, 4)),
            new Gear.LoadCell("cell", 50_000, 5, Gear.LoadCell.At.SOURCE_END),
            List.of(
                new Gear.Source(
                    "steady", "steady", List.of("spot", "point"), List.of(), List.of(), pull))),
        new Conditions(Quantity.measured(gustMps), windTowardDeg, null, null),
        new Offer(List.of(attachM), How.MEASURED, 90, List.of(), 1),
        List.of(),
        List.of(),
        null,
        List.of());
  }

  private static Place place(Position at) {
    return new Place(at, 0, Fix.TAPES, null);
  }
}
