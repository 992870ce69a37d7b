package org.fallwright.core.plan;

import java.util.List;

/**
 * A candidate: everything the planner can choose.
 *
 * @param layDeg intended fall direction [degrees from true north]
 * @param attachHeightM height of the line on the tree above the ground at the stump [m]
 * @param hingeThicknessM hinge thickness [m]
 * @param line id of the pull line
 * @param redirects ids of the anchors with a redirect block, from the tree outwards; may be empty
 * @param source id of the pull source in the gear
 * @param mode how it is run
 * @param place id of the spot or anchor it is at
 * @param driver the source that drives it, or null
 */
public record Setup(
    double layDeg,
    double attachHeightM,
    double hingeThicknessM,
    String line,
    List<String> redirects,
    String source,
    String mode,
    String place,
    Driver driver) {
  /** The source that hauls a block system: its id in the gear, its mode, its place. */
  public record Driver(String source, String mode, String place) {}

  public Setup {
    redirects = List.copyOf(redirects);
  }

  /** The same with another lay. */
  public Setup withLay(double lay) {
    return new Setup(
        lay, attachHeightM, hingeThicknessM, line, redirects, source, mode, place, driver);
  }

  /** The same with the line at another height above the ground at the stump [m]. */
  public Setup withAttachHeight(double heightM) {
    return new Setup(
        layDeg, heightM, hingeThicknessM, line, redirects, source, mode, place, driver);
  }

  /** The same with a hinge of another thickness [m]. */
  public Setup withHinge(double thicknessM) {
    return new Setup(
        layDeg, attachHeightM, thicknessM, line, redirects, source, mode, place, driver);
  }

  /** The same run in another mode. */
  public Setup withMode(String other) {
    return new Setup(
        layDeg, attachHeightM, hingeThicknessM, line, redirects, source, other, place, driver);
  }

  /** The same with the source at another place. */
  public Setup withPlace(String other) {
    return new Setup(
        layDeg, attachHeightM, hingeThicknessM, line, redirects, source, mode, other, driver);
  }

  /** The same over other redirects, from the tree outwards. */
  public Setup withRedirects(List<String> others) {
    return new Setup(
        layDeg, attachHeightM, hingeThicknessM, line, others, source, mode, place, driver);
  }

  /** The same driven otherwise. */
  public Setup withDriver(Driver other) {
    return new Setup(
        layDeg, attachHeightM, hingeThicknessM, line, redirects, source, mode, place, other);
  }

  /** The same with another line. */
  public Setup withLine(String other) {
    return new Setup(
        layDeg, attachHeightM, hingeThicknessM, other, redirects, source, mode, place, driver);
  }
}
