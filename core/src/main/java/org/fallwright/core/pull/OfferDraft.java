package org.fallwright.core.pull;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.pull.PullOffer.Finding;
import org.fallwright.core.pull.PullOffer.Limit;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.pull.PullOffer.Standing;
import org.fallwright.core.pull.PullOffer.Travel;

/** An offer while a source puts it together; {@link #done} checks it. Used by one thread. */
public final class OfferDraft {
  private final double lowN;
  private final double highN;
  private final Limit limit;
  private double holdN;
  private boolean captured;
  private Travel travel = new Travel(1, null);
  private boolean powered;
  private double overrunM;
  private double wireM;
  private Double stiffnessNPerM;
  private double anchorHauling = 1;
  private double anchorHolding = 1;
  private final List<Standing> people = new ArrayList<>();
  private final List<Part> parts = new ArrayList<>();
  private final List<Finding> checks = new ArrayList<>();
  private final List<String> notes = new ArrayList<>();

  OfferDraft(double lowN, double highN, Limit limit) {
    this.lowN = lowN;
    this.highN = highN;
    this.limit = limit;
  }

  /**
   * What it holds, standing still; unless said, nothing.
   *
   * @param newtons force at its line end that it holds at its low [N]
   * @param fast whether its end of the line stays where it is; false: it gives the same force,
   *     whatever the line does
   * @return this draft
   */
  public OfferDraft holds(double newtons, boolean fast) {
    holdN = newtons;
    captured = fast;
    return this;
  }

  /**
   * How far things move; unless said, one for one and as far as is asked.
   *
   * @param ratio metres moved at the hand, wheel or haul end for a metre at its line end [m/m]
   * @param mostM most line it can take in at its line end [m]; null: as much as is asked
   * @return this draft
   * @throws IllegalArgumentException if either is out of its range, see {@link Travel}
   */
  public OfferDraft travel(double ratio, Double mostM) {
    travel = new Travel(ratio, mostM);
    return this;
  }

  /**
   * Whether an engine or motor pulls; unless said, none does.
   *
   * @param isPowered true: one does
   * @return this draft
   */
  public OfferDraft powered(boolean isPowered) {
    powered = isPowered;
    return this;
  }

  /**
   * Line that still comes in after "stop"; unless said, none.
   *
   * @param metres so much line, at its line end [m]
   * @return this draft
   */
  public OfferDraft overrun(double metres) {
    overrunM = metres;
    return this;
  }

  /**
   * Line of its own that it pays out towards the tree; unless said, none.
   *
   * @param metres so much line [m]
   * @return this draft
   */
  public OfferDraft wire(double metres) {
    wireM = metres;
    return this;
  }

  /**
   * How far it gives way itself; unless said, not at all.
   *
   * @param newtonsPerMetre tension at its line end for a metre that it gives way there, of all that
   *     is elastic in it beyond the pull line [N/m]; null: nothing worth counting
   * @return this draft
   */
  public OfferDraft stiffness(Double newtonsPerMetre) {
    stiffnessNPerM = newtonsPerMetre;
    return this;
  }

  /**
   * Load on the anchor it sits on; unless said, as much as at its line end.
   *
   * @param hauling load on the anchor per newton at its line end, hauling [N/N]
   * @param holding the same, holding [N/N]
   * @return this draft
   */
  public OfferDraft anchor(double hauling, double holding) {
    anchorHauling = hauling;
    anchorHolding = holding;
    return this;
  }

  /**
   * Adds people who work it; unless said, nobody does.
   *
   * @param more people of one role each
   * @return this draft
   */
  public OfferDraft people(Standing... more) {
    people.addAll(List.of(more));
    return this;
  }

  /**
   * Adds people who work it, from a list.
   *
   * @param more people of one role each
   * @return this draft
   */
  public OfferDraft people(List<Standing> more) {
    people.addAll(more);
    return this;
  }

  /**
   * Adds rated parts of its own; unless said, it has none.
   *
   * @param more parts to be held against what loads them
   * @return this draft
   */
  public OfferDraft parts(List<Part> more) {
    parts.addAll(more);
    return this;
  }

  /**
   * Adds checks of its own; unless said, it makes none.
   *
   * @param more checks that only the source can make
   * @return this draft
   */
  public OfferDraft checks(List<Finding> more) {
    checks.addAll(more);
    return this;
  }

  /**
   * Adds warnings and remarks; unless said, there are none.
   *
   * @param more a sentence each, one line
   * @return this draft
   */
  public OfferDraft notes(List<String> more) {
    notes.addAll(more);
    return this;
  }

  /**
   * Checks the draft as a whole and makes the offer of it.
   *
   * @return the offer, which later changes of the draft do not touch
   * @throws IllegalArgumentException naming what is out of range, with value, limits and unit
   */
  public PullOffer done() {
    return new PullOffer(
        lowN,
        highN,
        limit,
        holdN,
        captured,
        travel,
        powered,
        overrunM,
        wireM,
        stiffnessNPerM,
        anchorHauling,
        anchorHolding,
        people,
        parts,
        checks,
        notes);
  }
}
