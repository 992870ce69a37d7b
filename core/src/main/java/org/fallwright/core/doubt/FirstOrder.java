package org.fallwright.core.doubt;

import java.util.List;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.statics.Statics;
import org.fallwright.core.statics.TreeSide;

/** The figures of one input at a time beside those of the trials. */
final class FirstOrder {
  private FirstOrder() {}

  static List<Doubt.Compared> compare(Reckoned r) {
    TreeSide one = new Statics(r.pull()).treeSide();
    TreeSide all = r.statics().treeSide();
    return List.of(
        new Doubt.Compared("pull to plan for", "N", one.planN(), all.planN()),
        new Doubt.Compared("hold tension", "N", one.holdN(), all.holdN()),
        new Doubt.Compared("rest on the stump", "", one.restShare(), all.restShare()),
        new Doubt.Compared(
            "end of the movement",
            "deg",
            Math.toDegrees(one.endRad()),
            Math.toDegrees(all.endRad())),
        new Doubt.Compared("steering share", "", one.steerShare(), all.steerShare()),
        new Doubt.Compared("turning share", "", one.turnShare(), all.turnShare()));
  }
}
