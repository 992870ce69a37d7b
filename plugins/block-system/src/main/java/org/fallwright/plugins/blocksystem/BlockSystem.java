package org.fallwright.plugins.blocksystem;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Finding;
import org.fallwright.core.pull.PullOffer.Limit;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.pull.PullOffer.Standing;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.units.Range;
import org.fallwright.plugins.api.Amount;
import org.fallwright.plugins.api.PullSourceExtension;
import org.pf4j.Extension;

/**
 * A block system that any other source hauls; its modes are the numbers of parts it can be rigged
 * with, a compound as the parts of its two tackles.
 *
 * <p>Low: the driver's low times the gain with friction. High, for the parts: the driver's high
 * times the number of parts, no friction at all. Holding: what the driver holds times the number of
 * parts, friction not credited; or what a rope grab is rated for, which holds without the driver.
 * The driver must have been asked with the travel that this system brings, so that what it adds for
 * jerks and surge counts once.
 */
@Extension
public final class BlockSystem implements PullSourceExtension {
  private static final SourceDescription DESCRIPTION = BlockDescription.of();

  /** Ratio of a check that asks nothing. */
  private static final double MOST_RATIO = 1e6;

  @Override
  public SourceDescription describe() {
    return DESCRIPTION;
  }

  @Override
  public List<String> modes(ObjectNode parameters) {
    Kit kit = Kit.read(DESCRIPTION, parameters);
    kit.rigs().forEach(mode -> kit.haulLine(kit.rig(mode)));
    return kit.rigs();
  }

  @Override
  public HaulLine haulLine(ObjectNode parameters, String mode) {
    Kit kit = Kit.read(DESCRIPTION, parameters);
    return kit.haulLine(kit.rig(mode));
  }

  @Override
  public PullOffer offer(PullRequest request) {
    Kit kit = Kit.read(DESCRIPTION, request.parameters());
    Rig rig = kit.rig(request.mode());
    PullOffer driver = request.driver();
    if (driver == null) {
      throw new IllegalArgumentException(
          "driver is not stated; a block system needs another source that hauls it");
    }
    int n = rig.parts();
    Range.check(
        "most of the source that hauls, through the parts", driver.highN() * n, 0, 1e8, "N");
    List<Part> own = BlockParts.of(kit, rig);
    return PullOffer.giving(driver.lowN() * rig.gain(), driver.highN() * n, limit(driver, n))
        .holds(holdN(kit, rig, driver), driver.captured() || kit.capture() != null)
        .travel(driver.travel().ratio() * n, mostM(kit, rig, driver))
        .powered(driver.powered())
        .overrun(driver.overrunM() / n)
        .stiffness(driver.stiffnessNPerM() == null ? null : driver.stiffnessNPerM() * n * n)
        .anchor(rig.anchorHauling(), rig.anchorHolding())
        .people(people(kit, rig, request))
        .parts(BlockParts.with(own, rig, driver))
        .checks(checks(kit, rig, request))
        .notes(BlockNotes.of(kit, rig, own, request))
        .done();
  }

  private static Limit limit(PullOffer driver, int n) {
    Wording what = driver.limit().what();
    return new Limit(
        new Wording(
            what.english() + ", through " + n + ":1", what.spanish() + ", por " + n + " a 1"),
        driver.limit().why());
  }

  /** A rope grab holds by its rating; so does a driver whose end stays, and either will do. */
  private static double holdN(Kit kit, Rig rig, PullOffer driver) {
    double byDriver = driver.holdN() * rig.parts();
    if (kit.capture() == null) {
      return byDriver;
    }
    double byGrab = kit.capture().ratedN() / kit.capture().share(rig);
    return driver.captured() ? Math.max(byGrab, byDriver) : byGrab;
  }

  /** With a rope grab it can be reset with the line held, and so can the driver. */
  private static Double mostM(Kit kit, Rig rig, PullOffer driver) {
    if (kit.capture() != null) {
      return null;
    }
    Double drivers = driver.travel().mostM();
    double most =
        Math.min(
            drivers == null ? Double.POSITIVE_INFINITY : drivers / rig.parts(),
            kit.roomM() == null ? Double.POSITIVE_INFINITY : Throw.of(rig, kit.roomM()).metres());
    return Double.isInfinite(most) ? null : Double.valueOf(most);
  }

  private static List<Standing> people(Kit kit, Rig rig, PullRequest request) {
    List<Standing> people = new ArrayList<>(request.driver().people());
    if (kit.capture() != null
        && kit.roomM() != null
        && Throw.of(rig, kit.roomM()).resets(request.pull().lineInM()) > 0) {
      people.add(
          new Standing(
              new Wording("resets the blocks", "vuelve a armar las poleas"),
              PullOffer.Where.AT_CAPTURE,
              1,
              0));
    }
    return people;
  }

  /** The line of a compound's first tackle; that of the last haul part is not its own to check. */
  private static List<Finding> checks(Kit kit, Rig rig, PullRequest request) {
    List<Finding> checks = new ArrayList<>(request.driver().checks());
    if (rig.compound()) {
      double apart = Math.max(request.pull().lineInM(), Allowances.BLOCKS_APART.value());
      double needed = rig.first().parts() * apart + Allowances.LINE_SPARE.value();
      checks.add(
          new Finding(
              "first-tackle-line",
              kit.lineM(),
              needed,
              "m",
              Math.min(MOST_RATIO, kit.lineM() / needed),
              String.format(
                  Locale.ROOT,
                  "The line of the tackle at the pull line is %s; its parts and tails need"
                      + " %s.",
                  Amount.length(kit.lineM()),
                  Amount.length(needed))));
    }
    return checks;
  }
}
