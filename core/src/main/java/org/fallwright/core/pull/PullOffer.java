package org.fallwright.core.pull;

import java.util.List;
import org.fallwright.core.units.Range;

/**
 * What a pull source gives at its own line end. Made by {@link #giving}.
 *
 * @param lowN the pull that can be counted on [N]
 * @param highN the most it can put on the parts, allowances for jerk and surge included [N]
 * @param limit what limits the low, and why
 * @param holdN what it holds at its low, standing still [N]
 * @param captured whether its end of the line stays where it is while holding; false: it gives a
 *     constant force, whatever the line does
 * @param travel how far hand, wheel or haul end moves, and how much line can be taken in
 * @param powered whether an engine or motor pulls
 * @param overrunM line that still comes in at its line end after "stop" [m]
 * @param wireM line of its own that it pays out towards the tree [m]
 * @param stiffnessNPerM tension at its line end for a metre that it gives way there, of all that is
 *     elastic in it beyond the pull line [N/m]; null: nothing worth counting
 * @param anchorHauling load on the anchor it sits on per newton at its line end, hauling [N/N]
 * @param anchorHolding the same, holding [N/N]
 * @param people who works it and where they stand; this and each list after it at most 60 long
 * @param parts rated parts of its own
 * @param checks checks that only it can make
 * @param notes warnings and remarks, a sentence each
 */
public record PullOffer(
    double lowN,
    double highN,
    Limit limit,
    double holdN,
    boolean captured,
    Travel travel,
    boolean powered,
    double overrunM,
    double wireM,
    Double stiffnessNPerM,
    double anchorHauling,
    double anchorHolding,
    List<Standing> people,
    List<Part> parts,
    List<Finding> checks,
    List<String> notes) {
  /** Most entries of each list. */
  static final int MOST_ENTRIES = 60;

  /**
   * What limits the low.
   *
   * @param what in a few words: "boots slip"
   * @param why one sentence for somebody who does not know the trade
   */
  public record Limit(Wording what, Wording why) {
    /**
     * Checks that both are there.
     *
     * @throws IllegalArgumentException naming the field and what is asked of it
     */
    public Limit {
      Range.present("what", what);
      Range.present("why", why);
    }
  }

  /**
   * How far things move.
   *
   * @param ratio metres moved at the hand, wheel or haul end for a metre at its line end [m/m]
   * @param mostM most line it can take in at its line end [m], beyond which it must not be counted
   *     on; null: as much as is asked, or it can be reset with the line held
   */
  public record Travel(double ratio, Double mostM) {
    /**
     * Checks both.
     *
     * @throws IllegalArgumentException naming the field, its value, its limits and its unit
     */
    public Travel {
      Range.check("travel_ratio", ratio, 1e-3, 1e4, "");
      Range.checkOrNull("travel_most_m", mostM, 0, 1000, "m");
    }

    /**
     * Way of the hand, wheel or haul end for so much line.
     *
     * @param lineM line taken in at its line end [m]
     * @return way at the hand, wheel or haul end [m]
     */
    public double handM(double lineM) {
      return ratio * lineM;
    }
  }

  /** Where somebody stands. */
  public enum Where {
    /** At the end of the line's path, where the pull is made. */
    AT_SOURCE,
    /** Beside the last leg, in a row that reaches from the source towards the tree. */
    BESIDE_LINE,
    /** At what holds the line: of a block system its fixed block, else the source. */
    AT_CAPTURE,
    /** Anywhere out of reach of tree and line. */
    AWAY
  }

  /**
   * People of one role.
   *
   * @param role what they do, in a few words
   * @param where where they stand
   * @param count how many, from 1 to 50
   * @param nearerM how much nearer to the tree than the source, along the last leg, the foremost of
   *     a row stands [m]; 0 elsewhere
   */
  public record Standing(Wording role, Where where, int count, double nearerM) {
    /**
     * Checks all four.
     *
     * @throws IllegalArgumentException naming the field, its value, its limits and its unit
     */
    public Standing {
      Range.present("role", role);
      Range.present("where", where);
      Range.check("count", count, 1, 50, "");
      Range.check("nearer_m", nearerM, 0, where == Where.BESIDE_LINE ? 100 : 0, "m");
    }

    /**
     * One person at the source.
     *
     * @param english what they do, in English
     * @param spanish the same in Spanish
     * @return them
     * @throws IllegalArgumentException naming the field and what is asked of it
     */
    public static Standing one(String english, String spanish) {
      return new Standing(new Wording(english, spanish), Where.AT_SOURCE, 1, 0);
    }
  }

  /**
   * A rated part of the source.
   *
   * @param name what it is called
   * @param strengthN ultimate strength [N]
   * @param designFactor least strength over load at the planned load, from 1 to 20
   * @param lastFactor the same at the most the source can do, from 1 to 20
   * @param hauling load on it per newton at the source's line end, hauling [N/N]
   * @param holding the same, holding [N/N]
   */
  public record Part(
      String name,
      double strengthN,
      double designFactor,
      double lastFactor,
      double hauling,
      double holding) {
    /**
     * Checks all six.
     *
     * @throws IllegalArgumentException naming the field, its value, its limits and its unit
     */
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
   * @param unit SI unit; empty where there is none
   * @param ratio capacity over demand
   * @param why what is asked and why, one line
   */
  public record Finding(
      String id, double value, double limit, String unit, double ratio, String why) {
    /**
     * Checks all six.
     *
     * @throws IllegalArgumentException naming the field, its value, its limits and its unit
     */
    public Finding {
      Range.text("id", id);
      Range.check("value", value, -1e9, 1e9, Range.present("unit", unit));
      Range.check("limit", limit, -1e9, 1e9, unit);
      Range.check("ratio", ratio, -1e6, 1e6, "");
      Wording.sentence("why", why);
    }
  }

  /**
   * Checks every figure and list; a high below the low is refused.
   *
   * @throws IllegalArgumentException naming the field, its value, its limits and its unit
   */
  public PullOffer {
    Range.check("low_N", lowN, 0, 1e7, "N");
    Range.check("high_N", highN, lowN, 1e8, "N");
    Range.present("limit", limit);
    Range.check("hold_N", holdN, 0, 1e8, "N");
    Range.present("travel", travel);
    Range.check("overrun_m", overrunM, 0, 100, "m");
    Range.check("wire_m", wireM, 0, 1000, "m");
    Range.checkOrNull("stiffness_N_per_m", stiffnessNPerM, 1, 1e9, "N/m");
    Range.check("anchor_hauling", anchorHauling, 0, 10, "");
    Range.check("anchor_holding", anchorHolding, 0, 10, "");
    people = few("people", people);
    parts = few("parts", parts);
    checks = few("checks", checks);
    notes = few("notes", notes);
    notes.forEach(n -> Wording.sentence("note", n));
  }

  private static <T> List<T> few(String field, List<T> list) {
    Range.check(field + ", how many", Range.present(field, list).size(), 0, MOST_ENTRIES, "");
    return List.copyOf(list);
  }

  /**
   * Begins an offer; it holds nothing and loads its anchor one to one unless more is said.
   *
   * @param lowN the pull that can be counted on [N]
   * @param highN the most it can put on the parts, allowances for jerk and surge included [N]
   * @param limit what limits the low, and why
   * @return a draft to which the rest is said; {@link OfferDraft#done} checks all of it
   */
  public static OfferDraft giving(double lowN, double highN, Limit limit) {
    return new OfferDraft(lowN, highN, limit);
  }

  /**
   * How many work it within reach of the loaded line.
   *
   * @return all people but those who stand away
   */
  public int operators() {
    return people.stream().filter(s -> s.where() != Where.AWAY).mapToInt(Standing::count).sum();
  }
}
