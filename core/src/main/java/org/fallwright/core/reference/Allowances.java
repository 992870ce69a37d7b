package org.fallwright.core.reference;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * Every rule constant of the planner in one place. An allowance of ours is a choice on the safe
 * side that may be changed here; a published figure names its source. Angles are in degrees.
 */
public final class Allowances {
  private static final List<Figure> ALL = new ArrayList<>();

  // Verdicts
  public static final Figure WORKABLE_RATIO =
      allowance(
          "workable-ratio",
          1.25,
          "",
          "capacity over demand from which a check is workable; from 1 it is tight");
  public static final Figure WORKABLE_RATIO_FACTORED =
      allowance(
          "workable-ratio-factored",
          1,
          "",
          "the same for a check that holds a design factor already");
  public static final Figure PERCENTILE_SDS =
      practice(
          "percentile-sds",
          1.645,
          "",
          "standard deviations from the mean to the 5th or 95th percentile");

  // Cut and hinge
  public static final Figure KERF =
      allowance(
          "kerf",
          0.010,
          "m",
          "width of the back cut's kerf unless entered: how far the tree sits back");
  public static final Figure HINGE_WIDTH_SHARE =
      published(
          "hinge-width-share",
          0.8,
          "",
          "osha-hinge",
          "hinge width over stem diameter, rule of proportion");
  public static final Figure HINGE_THICKNESS_SHARE =
      published(
          "hinge-thickness-share",
          0.1,
          "",
          "osha-hinge",
          "hinge thickness over stem diameter, rule of proportion");
  public static final Figure OPEN_FACE_LEAST =
      published(
          "open-face-least",
          70,
          "deg",
          "osha-notches",
          "opening from which a face counts as open and shuts just before the tree lands");
  public static final Figure FACE_DEPTH_LEAST =
      remembered(
          "face-depth-least",
          0.2,
          "",
          "fisa-302",
          "least usual depth of the face over the diameter at the cut");
  public static final Figure FACE_DEPTH_MOST =
      published(
          "face-depth-most",
          1.0 / 3,
          "",
          "osha-notches",
          "greatest depth of the face over the diameter at the cut");
  public static final Figure STEERING_WIDTH_SHARE =
      allowance(
          "steering-width-share",
          0.8,
          "",
          "most of the stem diameter that counts as hinge width against a side moment");
  public static final Figure HINGE_K_LEAST =
      allowance("hinge-k-least", 1, "", "hinge factor of elastic bending, b·t²/6");
  public static final Figure HINGE_K_MOST =
      allowance("hinge-k-most", 1.5, "", "hinge factor of fully plastic bending, b·t²/4");
  public static final Figure HINGE_K_MEAN =
      allowance("hinge-k-mean", 1.25, "", "middle of the hinge factor's spread");
  public static final Figure HINGE_K_P05 =
      allowance(
          "hinge-k-p05",
          1.025,
          "",
          "5th percentile of the hinge factor, even spread from 1 to 1.5");
  public static final Figure HINGE_K_P95 =
      allowance(
          "hinge-k-p95",
          1.475,
          "",
          "95th percentile of the hinge factor, even spread from 1 to 1.5");
  public static final Figure STEERING_MOST =
      allowance(
          "steering-most",
          0.45,
          "",
          "most of the hinge's side strength that may be used; the same fibres bend along the fall");
  public static final Figure TURNING_MOST =
      allowance(
          "turning-most",
          0.45,
          "",
          "most of the hinge's shear strength that may be used when the line turns it");
  public static final Figure CRUSHING_MOST =
      allowance(
          "crushing-most",
          0.3333333333333333,
          "",
          "most of the green compression strength that may be used in the hinge");
  public static final Figure HINGE_RAMP =
      allowance(
          "hinge-ramp",
          1.2,
          "deg",
          "rotation over which the hinge moment builds up in the second curve");
  public static final Figure FACE_OVER_COMMIT =
      allowance("face-over-commit", 10, "deg", "opening of the face beyond the commit angle");
  public static final Figure FACE_OVER_MOVEMENT =
      allowance(
          "face-over-movement", 5, "deg", "opening of the face beyond the end of the movement");
  public static final Figure FLARE =
      allowance("flare", 1.1, "", "stump diameter over bark over DBH where only DBH is known");

  // Wood
  public static final Figure CRUSH_OVER_RUPTURE =
      allowance(
          "crush-over-rupture",
          0.42,
          "",
          "green compression strength over rupture strength: about the least ratio read");
  public static final Figure SHEAR_OVER_RUPTURE =
      allowance(
          "shear-over-rupture",
          0.105,
          "",
          "green shear strength over rupture strength: just under the least ratio read, 0.107");
  public static final Figure KNOT_FACTOR =
      allowance("knot-factor", 0.85, "", "what knots leave of a stem's rupture strength");
  public static final Figure BARK_RATIO =
      allowance("bark-ratio", 0.94, "", "stem diameter inside the bark over the diameter over it");
  public static final Figure RUPTURE_CV =
      published(
          "rupture-cv",
          0.16,
          "",
          "astm-d2555",
          "coefficient of variation of the green rupture strength, most species near it");

  // Movement and line
  public static final Figure LEVER_LEAST =
      allowance(
          "lever-least", 0.1, "", "least lever of the line over the height of its attachment");
  public static final Figure ATTACH_LEAST =
      allowance("attach-least", 0.5, "m", "least height of the attachment above the hinge");
  public static final Figure MOVEMENT_CAP =
      allowance("movement-cap", 60, "deg", "greatest angle that the movement is followed to");
  public static final Figure MOVEMENT_SAMPLES =
      allowance(
          "movement-samples",
          65,
          "",
          "equally spaced angles looked at over the movement, both ends included");
  public static final Figure SLACK =
      allowance(
          "slack", 0.3, "m", "slack and sag to take in before the line pulls, unless entered");
  public static final Figure LINE_SPARE =
      allowance("line-spare", 2.0, "m", "line used up by wraps, tails and knots");
  public static final Figure BLOCKS_APART =
      allowance(
          "blocks-apart", 3.0, "m", "distance of the two blocks of a block system when it is taut");
  public static final Figure LINE_OFF_HEADING_MOST =
      allowance(
          "line-off-heading-most", 15, "deg", "greatest angle of a line off a vehicle's heading");
  public static final Figure STEM_SLICE =
      allowance(
          "stem-slice",
          0.5,
          "m",
          "greatest slice of the stem in its bending and in the search for its weakest section");

  // Holding
  public static final Figure REST_LEAST =
      allowance(
          "rest-least",
          0.7,
          "",
          "share below which a tree that has sat back still rests on its stump");
  public static final Figure REST_LEAST_WEDGED =
      allowance("rest-least-wedged", 0.85, "", "the same where wedges are stated");
  public static final Figure HOLD_STABILITY_ASKED =
      allowance("hold-stability-asked", 1.2, "", "least hold stability: tight from here");
  public static final Figure HOLD_STABILITY_WORKABLE =
      allowance(
          "hold-stability-workable", 1.5, "", "hold stability from which holding is workable");
  public static final Figure CREEP_LEAST =
      allowance("creep-least", 1, "deg", "least angle within which a pretensioned tree must stop");
  public static final Figure CREEP_MOST =
      allowance(
          "creep-most", 2, "deg", "greatest angle within which a pretensioned tree must stop");
  public static final Figure CREEP_OVER_COMMIT =
      allowance("creep-over-commit", 0.2, "", "that angle over the commit angle, between the two");

  // Wind
  public static final Figure AIR_DENSITY =
      remembered("air-density", 1.225, "kg/m³", "isa", "density of the air unless entered");
  public static final Figure GUST_OVER_MEAN =
      allowance("gust-over-mean", 1.6, "", "gust over mean wind at crown height");
  public static final Figure GUST_LEAST =
      allowance("gust-least", 2, "m/s", "a gust below this counts as this");
  public static final Figure WIND_CLAMP =
      published(
          "wind-clamp",
          10,
          "m/s",
          "mayhead-1973",
          "wind below which the drag coefficient is that at this wind");
  public static final Figure WIND_CLAMP_TOP =
      published(
          "wind-clamp-top",
          25,
          "m/s",
          "mayhead-1973",
          "wind above which the drag coefficient is that at this wind");
  public static final Figure DRAG_SD =
      allowance("drag-sd", 0.3, "", "standard deviation of a factor of mean 1 on the wind's force");
  public static final Figure LEAFLESS_DRAG =
      published(
          "leafless-drag", 0.7, "", "leafless-2011", "drag of a bare broadleaf over that in leaf");

  // Parts
  public static final Figure FIBRE_FACTOR =
      practice("fibre-factor", 5, "", "design factor of a fibre line");
  public static final Figure WIRE_FACTOR =
      practice("wire-factor", 3, "", "design factor of a wire rope as pulling line");
  public static final Figure STEM_FACTOR =
      allowance("stem-factor", 3, "", "design factor of the pulled stem");
  public static final Figure ANCHOR_FACTOR =
      allowance("anchor-factor", 3, "", "design factor of an anchor");
  public static final Figure LAST_FACTOR =
      allowance("last-factor", 1.5, "", "last factor of every part but an anchor, at source high");
  public static final Figure ANCHOR_LAST_FACTOR =
      allowance("anchor-last-factor", 2, "", "last factor of an anchor, at source high");
  public static final Figure DEMAND_NONE =
      allowance("demand-none", 1e-9, "", "share of a capacity below which a demand counts as none");

  // Stop reading
  public static final Figure OVERRUN_POWERED_WINCH =
      allowance(
          "overrun-powered-winch", 1.5, "s", "time a powered winch runs on after a call to stop");
  public static final Figure OVERRUN_VEHICLE =
      allowance("overrun-vehicle", 0.5, "m", "way a creeping vehicle goes on after a call to stop");
  public static final Figure OVERRUN_STROKES =
      allowance("overrun-strokes", 1, "", "strokes of a hand device after a call to stop");
  public static final Figure OVERSHOOT =
      allowance(
          "overshoot",
          2,
          "",
          "factor on the tension that an overrun brings, since a stiff line overshoots");
  public static final Figure DEVICE_HIGH =
      allowance(
          "device-high",
          1.1,
          "",
          "most an overload device or weak link lets through, over its setting");
  public static final Figure DEVICE_LOW =
      allowance(
          "device-low",
          0.9,
          "",
          "least at which an overload device or weak link lets go, over its setting");

  // Sources
  public static final Figure HAND_HIGH =
      allowance(
          "hand-high",
          1.5,
          "",
          "most a person or a hand tackle gives, over the strongest published pull");
  public static final Figure WINCH_HIGH =
      allowance("winch-high", 1.2, "", "most a winch gives, over its overload device's setting");
  public static final Figure WINCH_NO_DEVICE =
      allowance(
          "winch-no-device",
          1.25,
          "",
          "stall pull of a winch whose overload device is not stated, over its bare-drum rating");
  public static final Figure SURGE_SPEED =
      allowance("surge-speed", 0.5, "m/s", "creep speed of a vehicle when the line comes tight");
  public static final Figure SURGE_STIFFNESS =
      allowance("surge-stiffness", 2, "", "stiffness of the path in a surge, over its softest");
  public static final Figure FRONT_AXLE_LEAST =
      allowance(
          "front-axle-least",
          0.2,
          "",
          "load on the front axle over its level share: a warning below");
  public static final Figure RUN_OUT_SPARE =
      allowance("run-out-spare", 2, "m", "clear way of a vehicle beyond the source's travel");
  public static final Figure GROUP_LOSS =
      published(
          "group-loss",
          0.07,
          "",
          "ringelmann",
          "share of a person's pull lost for each further person on the line");
  public static final Figure GROUP_MOST =
      published(
          "group-most", 7, "", "ringelmann", "people on one line beyond whom none adds anything");

  // Anchors
  public static final Figure SLING_ARM_RISE =
      allowance(
          "sling-arm-rise",
          0.5,
          "m",
          "depth below the ground of the point that a root plate turns about");
  public static final Figure SLING_ARM_LEAST =
      allowance("sling-arm-least", 1.0, "m", "least arm of a sling on a tree or stump");
  public static final Figure SATURATED =
      allowance("saturated", 0.5, "", "what saturated ground leaves of a root plate");
  public static final Figure DOWNHILL =
      allowance("downhill", 0.75, "", "what a pull downhill leaves of a root plate");
  public static final Figure DOWNHILL_SLOPE =
      allowance("downhill-slope", 20, "deg", "slope of a downhill pull from which that counts");
  public static final Figure UPLIFT_MOST =
      allowance("uplift-most", 30, "deg", "greatest rise of an anchor's load");
  public static final Figure ANCHOR_DBH_LEAST =
      allowance("anchor-dbh-least", 0.25, "m", "least DBH of an anchor tree without a tie-back");
  public static final Figure STUMP_PLATE =
      allowance("stump-plate", 0.5, "", "what a stump's root plate has of its tree's");
  public static final Figure ROOT_PLATE_LEAST =
      allowance(
          "root-plate-least",
          77.4,
          "N·m/kg",
          "root-plate constant of species without pulling tests: the least read (western hemlock, Byrne 2005)");

  // Zones
  public static final Figure AIM_LEAST =
      allowance("aim-least", 5, "deg", "aim half-angle at no steering share");
  public static final Figure AIM_PER_STEERING =
      allowance("aim-per-steering", 20, "deg", "aim half-angle that a steering share of 1 adds");
  public static final Figure AIM_MOST = allowance("aim-most", 30, "deg", "greatest aim half-angle");
  public static final Figure BUTT_SHARE =
      allowance("butt-share", 0.1, "", "margin behind the stump over the tree's height");
  public static final Figure BUTT_LEAST =
      allowance("butt-least", 2, "m", "least margin behind the stump");
  public static final Figure TIP_SHARE =
      allowance("tip-share", 0.1, "", "margin beyond the tip over the tree's height");
  public static final Figure TIP_LEAST =
      allowance("tip-least", 3, "m", "least margin beyond the tip");
  public static final Figure SLIDE_SLOPE =
      allowance("slide-slope", 10, "deg", "fall of the lay from which a slide zone is drawn");
  public static final Figure SLIDE_SHARE =
      allowance(
          "slide-share",
          0.5,
          "",
          "length of the slide zone over the tree's height, unless entered");
  public static final Figure SIT_BACK_ANGLE =
      allowance(
          "sit-back-angle",
          60,
          "deg",
          "half-angle of the sit-back zone about the way the mass centre lies");
  public static final Figure BIGHT_MARGIN =
      allowance("bight-margin", 5, "m", "margin about the triangle of a bight");
  public static final Figure RECOIL_ANGLE =
      allowance("recoil-angle", 20, "deg", "half-angle of the recoil zone past a leg's end");
  public static final Figure ESCAPE_AZIMUTH =
      practice("escape-azimuth", 135, "deg", "usual escape direction off the lay, to both sides");
  public static final Figure ESCAPE_LEAST =
      allowance("escape-least", 90, "deg", "least escape direction off the lay that is weighed");
  public static final Figure ESCAPE_MOST =
      allowance("escape-most", 150, "deg", "greatest escape direction off the lay that is weighed");

  // Doubt
  public static final Figure SAMPLES =
      allowance("samples", 4096, "", "samples of the entered quantities");
  public static final Figure NORMAL_CUT =
      allowance("normal-cut", 2.5, "", "standard deviations at which a sampled normal is cut");
  public static final Figure MASS_RESIDUAL =
      allowance(
          "mass-residual", 0.25, "", "standard deviation of a mass equation that publishes none");
  public static final Figure BEARING_ASIDE =
      allowance(
          "bearing-aside",
          0.5,
          "",
          "standard deviation of a bearing point aside, over its position error");
  public static final Figure ICE_OR_WET_CROWN =
      allowance(
          "ice-or-wet-crown",
          1.25,
          "",
          "crown's mass under rain, wet snow or rime over its mass without; glaze can be far more");
  public static final Figure STEM_MEASURED_FROM =
      allowance(
          "stem-measured-from",
          0.25,
          "",
          "share of the tree's height from which a diameter must be known for a mass by the stem");
  public static final Figure MASS_CENTRE_SHARE =
      allowance(
          "mass-centre-share",
          0.40,
          "",
          "height of the mass centre over the tree's height, unless entered");

  private Allowances() {}

  /** Every rule constant, and the usual spreads, in the order of this list. */
  public static List<Figure> all() {
    List<Figure> all = new ArrayList<>(ALL);
    all.addAll(Spreads.figures());
    return Collections.unmodifiableList(all);
  }

  private static Figure allowance(String key, double value, String unit, String note) {
    return add(new Figure(key, value, unit, Kind.PLANNING_ALLOWANCE, "", note));
  }

  private static Figure practice(String key, double value, String unit, String note) {
    return add(new Figure(key, value, unit, Kind.COMMON_PRACTICE, "", note));
  }

  private static Figure published(
      String key, double value, String unit, String source, String note) {
    return add(new Figure(key, value, unit, Kind.PUBLISHED, source, note));
  }

  private static Figure remembered(
      String key, double value, String unit, String source, String note) {
    return add(new Figure(key, value, unit, Kind.FROM_MEMORY, source, note));
  }

  private static Figure add(Figure figure) {
    ALL.add(figure);
    return figure;
  }
}
