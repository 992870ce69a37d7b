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
   * What it holds [N]; unless said, nothing.
   *
   * @param fast whether its end of the line stays where it is; false: it gives the same force,
   *     whatever the line does
   */
  public OfferDraft holds(double newtons, boolean fast) {
    holdN = newtons;
    captured = fast;
    return this;
  }

  /** How far things move; unless said, one for one and as far as is asked. */
  public OfferDraft travel(double ratio, Double mostM) {
    travel = new Travel(ratio, mostM);
    return this;
  }

  /** An engine or motor pulls. */
  public OfferDraft powered(boolean isPowered) {
    powered = isPowered;
    return this;
  }

  /** Line that still comes in after "stop" [m]; unless said, none. */
  public OfferDraft overrun(double metres) {
    overrunM = metres;
    return this;
  }

  /** Line of its own that it pays out towards the tree [m]; unless said, none. */
  public OfferDraft wire(double metres) {
    wireM = metres;
    return this;
  }

  /** Stiffness of its own [N/m]; null or unless said, none worth counting. */
  public OfferDraft stiffness(Double newtonsPerMetre) {
    stiffnessNPerM = newtonsPerMetre;
    return this;
  }

  /** Load on its anchor per newton at its line end; unless said, 1 and 1. */
  public OfferDraft anchor(double hauling, double holding) {
    anchorHauling = hauling;
    anchorHolding = holding;
    return this;
  }

  /** People who work it; unless said, nobody. */
  public OfferDraft people(Standing... more) {
    people.addAll(List.of(more));
    return this;
  }

  /** The same from a list. */
  public OfferDraft people(List<Standing> more) {
    people.addAll(more);
    return this;
  }

  /** Rated parts of its own. */
  public OfferDraft parts(List<Part> more) {
    parts.addAll(more);
    return this;
  }

  /** Checks of its own. */
  public OfferDraft checks(List<Finding> more) {
    checks.addAll(more);
    return this;
  }

  /** Warnings and remarks, a sentence each. */
  public OfferDraft notes(List<String> more) {
    notes.addAll(more);
    return this;
  }

  /**
   * The offer.
   *
   * @throws IllegalArgumentException naming what is out of range
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
