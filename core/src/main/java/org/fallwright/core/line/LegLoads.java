package org.fallwright.core.line;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.units.Range;

/**
 * Tensions in the legs of a line and loads on its blocks, per newton in the leg at the tree.
 *
 * <p>A block carries |T1·e1 + T2·e2|, e1 and e2 the unit vectors from it along its two legs; for
 * equal tensions 2·T·cos(θ/2), θ the interior angle. Hauling: each leg nearer the source carries
 * the tension before it divided by the block's efficiency k. Holding: the tension is the same in
 * all legs, friction never credited. Straight legs without weight; a sagging line pulls at other
 * angles. Statics.
 *
 * @param legs legs from the tree outwards
 * @param blocks blocks from the tree outwards
 * @param sourceEndPerTree tension at the source per newton at the tree, hauling
 * @param lineRiseDeg rise of the first leg towards the tree [degrees]
 * @param lengthM length of all legs [m]
 */
public record LegLoads(
    List<Leg> legs,
    List<Block> blocks,
    double sourceEndPerTree,
    double lineRiseDeg,
    double lengthM) {
  /** Shortest leg [m]; two points nearer than this are one. */
  static final double SHORTEST_M = 0.1;

  /**
   * A leg.
   *
   * @param from its end nearer the tree
   * @param to its end nearer the source
   * @param lengthM its length [m]
   * @param haulingPerTree its tension per newton at the tree, hauling
   */
  public record Leg(Point3 from, Point3 to, double lengthM, double haulingPerTree) {
    /** Unit vector from the source's end towards the tree's end. */
    public Point3 towardsTree() {
      return from.minus(to).times(1 / lengthM);
    }
  }

  /**
   * Load on a block and so on its sling and anchor.
   *
   * @param at where it is
   * @param interiorDeg angle between its legs; 180: the line runs straight through [degrees]
   * @param haulingForce force of the line on it per newton at the tree, hauling
   * @param holdingForce the same, holding
   */
  public record Block(Point3 at, double interiorDeg, Point3 haulingForce, Point3 holdingForce) {
    /** Load per newton at the tree, hauling. */
    public double hauling() {
      return haulingForce.length();
    }

    /** Load per newton at the tree, holding. */
    public double holding() {
      return holdingForce.length();
    }
  }

  public LegLoads {
    legs = List.copyOf(legs);
    blocks = List.copyOf(blocks);
  }

  /**
   * Loads of a path.
   *
   * @param points attachment, blocks from the tree outwards, source: at least two
   * @param efficiencies efficiency of each block, 0 to 1
   */
  public static LegLoads of(List<Point3> points, List<Double> efficiencies) {
    Range.check("points", points.size(), 2, 20, "");
    if (efficiencies.size() != points.size() - 2) {
      throw new IllegalArgumentException(
          "efficiencies has "
              + efficiencies.size()
              + " entries; there are "
              + (points.size() - 2)
              + " blocks");
    }
    List<Leg> legs = new ArrayList<>();
    double tension = 1;
    double length = 0;
    for (int i = 0; i + 1 < points.size(); i++) {
      if (i > 0) {
        tension /= Range.check("efficiency", efficiencies.get(i - 1), 0.05, 1, "");
      }
      double l = points.get(i).minus(points.get(i + 1)).length();
      Range.check("leg " + (i + 1), l, SHORTEST_M, 1e4, "m");
      legs.add(new Leg(points.get(i), points.get(i + 1), l, tension));
      length += l;
    }
    List<Block> blocks = new ArrayList<>();
    for (int i = 0; i + 1 < legs.size(); i++) {
      Leg in = legs.get(i);
      Leg out = legs.get(i + 1);
      Point3 toTree = in.towardsTree();
      Point3 toSource = out.towardsTree().times(-1);
      blocks.add(
          new Block(
              in.to(),
              toTree.angleDeg(toSource),
              toTree.times(in.haulingPerTree()).plus(toSource.times(out.haulingPerTree())),
              toTree.plus(toSource)));
    }
    return new LegLoads(legs, blocks, tension, legs.get(0).towardsTree().riseDeg(), length);
  }

  /** Force of the line on the source per newton at the tree, hauling. */
  public Point3 sourceHaulingForce() {
    return legs.get(legs.size() - 1).towardsTree().times(sourceEndPerTree);
  }

  /** Load on a block whose legs carry two tensions [N] at an interior angle [degrees], in N. */
  public static double blockLoadN(double firstN, double secondN, double interiorDeg) {
    double c = Math.cos(Math.toRadians(interiorDeg));
    return Math.sqrt(firstN * firstN + secondN * secondN + 2 * firstN * secondN * c);
  }
}
