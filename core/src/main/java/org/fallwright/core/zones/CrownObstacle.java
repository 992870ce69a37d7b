package org.fallwright.core.zones;

import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Position;

/**
 * The crown of a standing anchor tree: a cylinder from the crown's base to the tree's top. A leg
 * that is fastened to the tree and stays below its crown is left out.
 */
final class CrownObstacle implements LegCheck.Obstacle {
  private static final int HALVINGS = 60;

  private final Anchor.StandingTree tree;
  private final double bottomM;
  private final double topM;

  CrownObstacle(Anchor.StandingTree tree) {
    this.tree = tree;
    this.bottomM = tree.place().groundM() + tree.crownBaseM();
    this.topM = tree.place().groundM() + tree.heightM();
  }

  @Override
  public String id() {
    return tree.id();
  }

  @Override
  public double errorM() {
    return tree.place().errorM();
  }

  /** The signed distance to a cylinder is convex along a line, so its least value is cornered. */
  @Override
  public LegCheck.Near near(Leg leg) {
    Segment3 s = leg.segment();
    double low = 0;
    double high = 1;
    for (int i = 0; i < HALVINGS; i++) {
      double third = (high - low) / 3;
      if (signed(s.at(low + third)) <= signed(s.at(high - third))) {
        high -= third;
      } else {
        low += third;
      }
    }
    double t = (low + high) / 2;
    double least = signed(s.at(t));
    for (double end : new double[] {0, 1}) {
      if (signed(s.at(end)) < least) {
        t = end;
        least = signed(s.at(end));
      }
    }
    if (leg.fastenedTo().contains(tree.id()) && least >= 0) {
      return null;
    }
    return new LegCheck.Near(least, s.planAt(t));
  }

  private double signed(double[] p) {
    Position at = tree.place().at();
    double aside = Math.hypot(p[0] - at.eastM(), p[1] - at.northM()) - tree.crownRadiusM();
    double upright = Math.max(bottomM - p[2], p[2] - topM);
    if (aside <= 0 && upright <= 0) {
      return Math.max(aside, upright);
    }
    return Math.hypot(Math.max(0, aside), Math.max(0, upright));
  }
}
