package org.fallwright.core.pull;

import java.util.List;
import org.fallwright.core.units.Range;

/**
 * What a pull source gives at its own line end.
 *
 * @param lowN the pull that can be counted on [N]
 * @param highN the most it can put on the parts, allowances for jerk and surge included [N]
 * @param holdN what it holds at its low, standing still [N]
 * @param captured whether its end of the line stays where it is while holding; false: it gives a
 *     constant force, whatever the line does
 * @param limit what limits the low, in a few words
 * @param velocityRatio metres moved at the hand, drum or haul end for a metre at its line end
 * @param powered whether an engine or motor pulls
 * @param overrunM line that still comes in at its line end after "stop" [m]
 * @param wireM line of its own that it pays out towards the tree [m]
 * @param anchorHauling load on the anchor it sits on per newton at its line end, hauling
 * @param anchorHolding the same, holding
 * @param operators people who work it
 * @param parts rated parts of its own
 * @param checks checks of its own
 * @param notes warnings and remarks, a sentence each
 */
public record PullOffer(
    double lowN,
    double highN,
    double holdN,
    boolean captured,
    String limit,
    double velocityRatio,
    boolean powered,
    double overrunM,
    double wireM,
    double anchorHauling,
    double anchorHolding,
    int operators,
    List<Part> parts,
    List<Finding> checks,
    List<String> notes) {
  /**
   * A rated part of the source.
   *
   * @param name what it is called
   * @param strengthN ultimate strength [N]
   * @param designFactor least factor at the planned load
   * @param lastFactor least factor at the most the source can do
   * @param hauling load on it per newton at the source's line end, hauling
   * @param holding the same, holding
   */
  public record Part(
      String name,
      double strengthN,
      double designFactor,
      double lastFactor,
      double hauling,
      double holding) {
    public Part {
      Range.text("name", name);
      Range.check("strength_N", strengthN, 1, 1e9, "N");
      Range.check("design_factor", designFactor, 1, 20, "");
      Range.check("last_factor", lastFactor, 1, 20, "");
      Range.check("hauling", hauling, 0, 100, "");
      Range.check("holding", holding, 0, 100, "");
    }
  }

  /**
   * A check that only the source can make.
   *
   * @param id stable id, lower case with hyphens
   * @param value what there is, in {@code unit}
   * @param limit what is asked, in {@code unit}
   * @param unit SI unit
   * @param ratio capacity over demand
   * @param why one line
   */
  public record Finding(
      String id, double value, double limit, String unit, double ratio, String why) {
    public Finding {
      Range.text("id", id);
      Range.check("value", value, -1e9, 1e9, unit);
      Range.check("limit", limit, -1e9, 1e9, unit);
      Range.check("ratio", ratio, -1e6, 1e6, "");
      Range.text("why", why);
    }
  }

  public PullOffer {
    Range.check("low_N", lowN, 0, 1e7, "N");
    Range.check("high_N", highN, lowN, 1e8, "N");
    Range.check("hold_N", holdN, 0, 1e8, "N");
    Range.text("limit", limit);
    Range.check("velocity_ratio", velocityRatio, 1e-3, 1e4, "");
    Range.check("overrun_m", overrunM, 0, 100, "m");
    Range.check("wire_m", wireM, 0, 1000, "m");
    Range.check("anchor_hauling", anchorHauling, 0, 10, "");
    Range.check("anchor_holding", anchorHolding, 0, 10, "");
    Range.check("operators", operators, 0, 20, "");
    parts = List.copyOf(Range.present("parts", parts));
    checks = List.copyOf(Range.present("checks", checks));
    notes = List.copyOf(Range.present("notes", notes));
  }
}
