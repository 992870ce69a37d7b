package org.fallwright.plugins.blocksystem;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.reference.Allowances;

/** The rated parts of a block system, loads per newton at the load. */
final class BlockParts {
  /** Least factor on every part at the most the source can do. Planning allowance. */
  private static final double LAST_FACTOR = Allowances.LAST_FACTOR.value();

  private BlockParts() {}

  /** Blocks, lines and rope grab. */
  static List<Part> of(Kit kit, Rig rig) {
    List<Part> parts = new ArrayList<>();
    Tackle first = rig.first();
    parts.add(block(kit, "tackle block at the pull line", 1, 1));
    parts.add(
        block(kit, "tackle block at the anchor", first.anchorHauling(), first.anchorHolding()));
    parts.add(line(kit, "tackle line", first.haulHauling(), first.haulHolding()));
    if (rig.compound()) {
      double hauling = first.haulHauling();
      double holding = first.haulHolding();
      Tackle second = rig.second();
      parts.add(block(kit, "second tackle's moving block", hauling, holding));
      parts.add(
          block(
              kit,
              "second tackle's block at the anchor",
              hauling * second.anchorHauling(),
              holding * second.anchorHolding()));
      parts.add(line(kit, "second tackle's line", rig.haulHauling(), rig.haulHolding()));
    }
    if (kit.capture() != null) {
      parts.add(
          new Part(
              "rope grab",
              kit.capture().ratedN() * kit.capture().factor(),
              kit.capture().factor(),
              LAST_FACTOR,
              0,
              kit.capture().share(rig)));
    }
    return parts;
  }

  /** The same and the driver's, as loaded through the system. */
  static List<Part> with(List<Part> own, Rig rig, PullOffer driver) {
    List<Part> parts = new ArrayList<>(own);
    for (Part part : driver.parts()) {
      parts.add(
          new Part(
              part.name(),
              part.strengthN(),
              part.designFactor(),
              part.lastFactor(),
              part.hauling() * rig.haulHauling(),
              part.holding() * rig.haulHolding()));
    }
    return parts;
  }

  /** Pull at which a part comes to its design factor [N]. */
  static double reachedAtN(Part part) {
    return part.strengthN() / part.designFactor() / Math.max(part.hauling(), part.holding());
  }

  private static Part block(Kit kit, String name, double hauling, double holding) {
    return new Part(name, kit.blockN(), kit.blockFactor(), LAST_FACTOR, hauling, holding);
  }

  private static Part line(Kit kit, String name, double hauling, double holding) {
    return new Part(name, kit.lineN(), kit.lineFactor(), LAST_FACTOR, hauling, holding);
  }
}
