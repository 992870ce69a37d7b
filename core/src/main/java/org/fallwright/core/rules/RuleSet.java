package org.fallwright.core.rules;

import java.util.List;
import java.util.Optional;
import org.fallwright.core.units.Range;

/**
 * The rules of one place. Where the place has none, the answer is the strictest of all sets, marked
 * as a fallback.
 */
public final class RuleSet {
  /** What a rule set says of people who pull a line that nothing captures. */
  public enum FreeHand {
    FLAGGED,
    REFUSED
  }

  /** Unit of the rule on free-hand pulling. */
  public static final String FREE_HAND_UNIT = "1 flagged, 2 refused";

  private final RuleSets all;
  private final String key;
  private final String name;
  private final List<ApproachTable> tables;

  RuleSet(RuleSets all, String key, String name, List<ApproachTable> tables) {
    this.all = all;
    this.key = key;
    this.name = name;
    this.tables = List.copyOf(tables);
  }

  /** Stable key, as in the site file. */
  public String key() {
    return key;
  }

  /** What it is called. */
  public String name() {
    return name;
  }

  /** Radius for people without a job in the felling [tree lengths]. */
  public Rule peopleRadiusFactor() {
    return all.rule(key, "people_radius");
  }

  /** A stricter radius that may be chosen instead [tree lengths]. */
  public Rule stricterPeopleRadiusFactor() {
    return all.rule(key, "stricter_people_radius");
  }

  /** Distance of the person at the pull source [tree lengths]. */
  public Rule operatorRadiusFactor() {
    return all.rule(key, "operator_radius");
  }

  /** How far beside a powered winch its operator stands [m]. */
  public Rule operatorBesideWinchM() {
    return all.rule(key, "operator_beside_winch");
  }

  /** Whether the people radius must be more where trees or logs may roll or slide. */
  public Rule moreOnSlopes() {
    return all.rule(key, "more_on_slopes");
  }

  /** Length of the felling path to provide [tree lengths]; only where this set has one. */
  public Optional<Rule> pathLengthFactor() {
    return all.own(key, "path_length");
  }

  /** Wind beyond which felling is not begun [km/h]; only where this set has one. */
  public Optional<Rule> windStopKmh() {
    return all.own(key, "wind_stop");
  }

  /** DBH beyond which wedges are to be at hand [m]; only where this set has one. */
  public Optional<Rule> wedgesOverDbhM() {
    return all.own(key, "wedges_over_dbh");
  }

  /** Length of a piece felled beside a structure over its distance; only where this set has one. */
  public Optional<Rule> pieceOverDistance() {
    return all.own(key, "piece_over_distance");
  }

  /** Least and most of the face's depth over the diameter, and of an open face's opening. */
  public Optional<Rule> face(FaceLimit limit) {
    return all.own(key, limit.item);
  }

  /** Limits that rules or teaching put on the face. */
  public enum FaceLimit {
    DEPTH_LEAST("face_depth_least"),
    DEPTH_MOST("face_depth_most"),
    OPEN_LEAST_DEG("open_face_least"),
    OPEN_MOST_DEG("open_face_most");

    private final String item;

    FaceLimit(String item) {
      this.item = item;
    }
  }

  /** Every rule there is, in a fixed order, with what this set has to say on it. */
  public List<Entry> entries() {
    return all.entries(key);
  }

  /**
   * A rule's place in a set.
   *
   * @param item key of the rule
   * @param basis what it is measured on
   * @param own what this set says; empty: nothing
   * @param used what counts: its own, else the strictest of all sets; empty: nothing is asked
   */
  public record Entry(String item, String basis, Optional<Rule> own, Optional<Rule> used) {}

  /** The set's own approach tables. */
  public List<ApproachTable> approachTables() {
    return tables;
  }

  /** Whether people whom the felling needs may be named and work nearer. */
  public Rule teamException() {
    return all.rule(key, "team_exception");
  }

  /** No-work radius round a dangerous tree that is left standing [tree lengths]. */
  public Rule leftStandingFactor() {
    return all.rule(key, "left_standing");
  }

  /** Length of an escape route [m]. */
  public Rule escapeLengthM() {
    return all.rule(key, "escape_length");
  }

  /** Angle of an escape route to the fall direction [degrees]. */
  public Rule escapeBearingDeg() {
    return all.rule(key, "escape_bearing");
  }

  /** Whether an escape route must end outside the crown's reach. */
  public Rule escapeOutsideCrown() {
    return all.rule(key, "escape_outside_crown");
  }

  /** The two escape azimuths for a fall azimuth, the lower one first [degrees]. */
  public List<Double> escapeAzimuthsDeg(double layDeg) {
    Range.check("lay_deg", layDeg, 0, 360, "degrees");
    double b = escapeBearingDeg().value();
    double right = (layDeg + b) % 360;
    double left = (layDeg - b + 360) % 360;
    return List.of(Math.min(left, right), Math.max(left, right));
  }

  /** Design factor of a fibre line. */
  public Rule fibreFactor() {
    return all.rule(key, "fibre_factor");
  }

  /**
   * Breaking load of every part from drum to stem over the source's greatest pull; 0: not asked.
   */
  public Rule lineTwiceSource() {
    return all.rule(key, "line_over_source");
  }

  /** Load a redirect's anchor is sized for over the source's greatest pull; 0: not asked. */
  public Rule redirectAnchorTwiceT() {
    return all.rule(key, "redirect_anchor_over_source");
  }

  /**
   * Rated load of shackle and sling at a redirect over the source's greatest pull; 0: not asked.
   */
  public Rule redirectGearOverSource() {
    return all.rule(key, "redirect_gear_over_source");
  }

  /** Breaking load of a rope strop at a redirect over the source's greatest pull; 0: not asked. */
  public Rule redirectStropOverSource() {
    return all.rule(key, "redirect_strop_over_source");
  }

  /** Rated load of the sling on the pulled tree over the source's greatest pull; 0: not asked. */
  public Rule chokerOverSource() {
    return all.rule(key, "choker_over_source");
  }

  /** The rule on free-hand pulling: its value is 1 for flagged, 2 for refused. */
  public Rule freeHandRule() {
    return all.rule(key, "free_hand");
  }

  /** Whether free-hand pulling is refused or flagged. */
  public FreeHand freeHand() {
    return freeHandRule().value() >= 2 ? FreeHand.REFUSED : FreeHand.FLAGGED;
  }

  /** Whether a wire within two tree lengths and the approach distance is amber (else advice). */
  public Rule extraAdviceTwoH() {
    return all.rule(key, "two_lengths_amber");
  }

  /**
   * Ground distance to a wire below which its owner is asked first [m]; only where this set itself
   * has one.
   */
  public Optional<Rule> consultDistanceM(boolean towers) {
    return all.own(key, towers ? "consult_towers" : "consult_poles");
  }

  /**
   * Distance to keep from a live wire [m]: the greatest of this set's tables and the table that
   * every set is held to (EM 385-1-1, voltage between phases). A set without a table takes the
   * greatest of all sets' tables. Empty where the voltage is not known or no table reaches it: then
   * nobody can judge.
   *
   * @param kvPhaseToPhase voltage between phases [kV]; null: not known
   */
  public Optional<Rule> approachDistanceM(Double kvPhaseToPhase) {
    return all.approach(key, tables, kvPhaseToPhase);
  }
}
