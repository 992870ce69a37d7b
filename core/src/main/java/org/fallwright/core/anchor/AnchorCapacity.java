package org.fallwright.core.anchor;

import java.util.Locale;
import java.util.Optional;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Anchor.Condition;

/**
 * The strength of any anchor of the site under a load of a given direction: the least of the ways
 * in which it can give way, or a refusal with its reason.
 */
public final class AnchorCapacity {
  /**
   * Steepest rise of the load that a tree, stump or vehicle is trusted with [degrees]; allowance.
   */
  public static final double STEEPEST_UPLIFT_DEG = Allowances.UPLIFT_MOST.value();

  /** Least stem diameter of a tree without a tie-back [m]; planning allowance. */
  public static final double LEAST_DIAMETER_M = Allowances.ANCHOR_DBH_LEAST.value();

  /**
   * What a stump keeps of the root plate of the tree that stood on it; planning allowance, for no
   * published figure could be read.
   */
  public static final double STUMP = Allowances.STUMP_PLATE.value();

  private AnchorCapacity() {}

  /** Strength of the anchor under that load. */
  public static Capacity of(Anchor anchor, AnchorLoad load, AnchorFigures figures) {
    Optional<Capacity> rejected = rejected(anchor);
    if (rejected.isPresent()) {
      return rejected.get();
    }
    if (anchor instanceof Anchor.StandingTree tree) {
      return tree(tree, load, figures.wood(tree.species(), tree.soil(), tree.deepRooting()));
    }
    if (anchor instanceof Anchor.Stump stump) {
      return stump(stump, load, figures.wood(stump.species(), stump.soil(), stump.deepRooting()));
    }
    if (anchor instanceof Anchor.ParkedVehicle vehicle) {
      return vehicle(vehicle, load, figures.tyreGrip(vehicle.surface(), vehicle.wet()));
    }
    if (anchor instanceof Anchor.Pickets pickets) {
      return Pickets.capacity(pickets, load);
    }
    if (anchor instanceof Anchor.BuriedLog log) {
      return Deadman.capacity(log, load);
    }
    if (anchor instanceof Anchor.RatedPoint point) {
      return Capacity.holds(
          point.breakingLoadN(),
          "rated point",
          "breaking load vouched for by " + shortened(point.vouchedBy()));
    }
    throw new IllegalArgumentException(
        anchor.id() + " has two legs; each leg's anchor must be asked by itself");
  }

  /** The refusal of an anchor that was rejected on the site. */
  public static Optional<Capacity> rejected(Anchor anchor) {
    return Optional.ofNullable(anchor.rejected())
        .map(why -> Capacity.refuse("rejected on the site: " + shortened(why)));
  }

  /**
   * The rated point of a parked vehicle, a part of its own beside the sliding wheels. Its breaking
   * load is not known, so it is never loaded past its rating.
   */
  public static Optional<Capacity> ratedPoint(Anchor anchor) {
    return anchor instanceof Anchor.ParkedVehicle vehicle
        ? Optional.of(
            new Capacity(
                vehicle.ratedPointN(),
                1,
                1,
                "rated point of the vehicle",
                false,
                "its breaking load is not known, so its rating is the most in every case"))
        : Optional.empty();
  }

  private static Capacity tree(Anchor.StandingTree tree, AnchorLoad load, WoodFigures wood) {
    Optional<String> no = unfit(tree.condition(), tree.dbhM(), tree.tieBack(), load);
    if (no.isPresent()) {
      return Capacity.refuse(no.get());
    }
    double mass = wood.greenDensity() * wood.stemForm().volumeM3(tree.dbhM(), tree.heightM());
    WoodAnchor holds =
        WoodAnchor.of(
            mass, wood, tree.dbhM(), tree.slingHeightM(), tree.saturated(), load.downhill());
    String tied = tree.tieBack() ? "; a tie-back that is not tensioned counts nothing" : "";
    return holds.rootPlateN() <= holds.stemN()
        ? Capacity.holds(
            holds.rootPlateN(), "root plate", rootPlateWhy(tree.saturated(), load) + tied)
        : Capacity.holds(
            holds.stemN(), "stem bending", "the stem breaks before the roots let go" + tied);
  }

  private static Capacity stump(Anchor.Stump stump, AnchorLoad load, WoodFigures wood) {
    Optional<String> no = unfit(stump.condition(), stump.diameterM(), false, load);
    if (no.isPresent()) {
      return Capacity.refuse(no.get());
    }
    double mass =
        stump.onceMassKg() != null
            ? stump.onceMassKg()
            : wood.greenDensity()
                * wood.stemForm().volumeM3(stump.diameterM(), stump.onceHeightM());
    WoodAnchor asTree =
        WoodAnchor.of(
            mass,
            wood,
            stump.diameterM(),
            stump.slingHeightM(),
            stump.saturated(),
            load.downhill());
    return Capacity.holds(
        STUMP * asTree.rootPlateN(),
        "root plate",
        "half the root plate of the tree it was; " + rootPlateWhy(stump.saturated(), load));
  }

  private static Capacity vehicle(Anchor.ParkedVehicle vehicle, AnchorLoad load, double grip) {
    double rise = load.upliftDeg() + vehicle.uphillDeg();
    if (Math.abs(rise) > STEEPEST_UPLIFT_DEG) {
      return Capacity.refuse(
          String.format(
              Locale.ROOT,
              "the load stands at %.0f degrees to the ground under the wheels; %.0f is the most",
              rise,
              STEEPEST_UPLIFT_DEG));
    }
    double slides = LockedWheels.slidesAtN(vehicle.massKg(), grip, vehicle.uphillDeg(), rise);
    return slides > 0
        ? Capacity.holds(slides, "wheels slide", "grip of its locked wheels on that ground")
        : Capacity.refuse("on that slope and ground its locked wheels hold nothing");
  }

  private static Optional<String> unfit(
      Condition condition, double diameterM, boolean tieBack, AnchorLoad load) {
    return switch (condition) {
      case DEAD -> Optional.of("it is dead");
      case DECAYED -> Optional.of("it is decayed");
      case LOOSENED -> Optional.of("it is loosened");
      case CUT_ROOTS -> Optional.of("its roots are cut");
      case SOUND ->
          diameterM < LEAST_DIAMETER_M && !tieBack
              ? Optional.of(
                  String.format(
                      Locale.ROOT,
                      "diameter %.2f m is under %.2f m and it is not tied back",
                      diameterM,
                      LEAST_DIAMETER_M))
              : load.upliftDeg() > STEEPEST_UPLIFT_DEG
                  ? Optional.of(
                      String.format(
                          Locale.ROOT,
                          "the load rises %.1f degrees; %.0f is the most",
                          load.upliftDeg(),
                          STEEPEST_UPLIFT_DEG))
                  : Optional.empty();
    };
  }

  private static String rootPlateWhy(boolean saturated, AnchorLoad load) {
    return "the roots let go first"
        + (saturated ? ", saturated ground counted at half" : "")
        + (load.downhill() ? ", steep downhill pull counted at three quarters" : "");
  }

  private static String shortened(String text) {
    return text.length() <= 150 ? text : text.substring(0, 150);
  }
}
