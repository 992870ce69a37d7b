package org.fallwright.core.cut;

import org.fallwright.core.reference.Allowances;

/**
 * Shape of the hinge at the cut.
 *
 * <p>R = Ds/2, face depth a = fraction·Ds, the hinge's middle lies u_h = R − a − t/2 ahead of the
 * stump's centre. Its width against the pull is the chord 2·√(R² − u_h²), or the width entered,
 * never more than the chord; its steering width is the lesser of 0.8·Ds and that. A cavity of
 * radius R − shell takes its own chord at u_h off both. Dead or decayed wood steers nothing, but
 * still resists the pull in full: what resists is taken high, what helps is taken low.
 *
 * @param faceDepthM a [m]
 * @param thicknessM t [m]
 * @param offsetM u_h, ahead of the stump's centre along the lay [m]
 * @param widthM b, against the pull [m]
 * @param steerWidthM b_s, steering [m]
 * @param sitBackRad δ, how far the tree sits back on the kerf [rad]
 * @param backCutM Ds − a − t, depth of the back cut [m]
 */
public record HingeShape(
    double faceDepthM,
    double thicknessM,
    double offsetM,
    double widthM,
    double steerWidthM,
    double sitBackRad,
    double backCutM) {

  /** Share of the stem diameter that a hinge is wide by the rule of proportion (published). */
  public static final double WIDTH_SHARE = Allowances.STEERING_WIDTH_SHARE.value();

  /**
   * The hinge of a cut.
   *
   * @param stumpDiameterM Ds, stem diameter inside the bark at the cut [m]
   * @param faceFraction face depth over Ds
   * @param thicknessM hinge thickness [m]
   * @param enteredWidthM whole width entered, holes included [m]; null: the chord
   * @param shellM sound shell [m]; null: sound through
   * @param deadOrDecayed whether the wood is dead or decayed
   * @param kerfM saw kerf [m]
   * @param wedges whether wedges keep the tree from sitting back
   * @throws IllegalArgumentException where face and hinge together are deeper than the stem
   */
  public static HingeShape of(
      double stumpDiameterM,
      double faceFraction,
      double thicknessM,
      Double enteredWidthM,
      Double shellM,
      boolean deadOrDecayed,
      double kerfM,
      boolean wedges) {
    double radius = stumpDiameterM / 2;
    double face = faceFraction * stumpDiameterM;
    double backCut = stumpDiameterM - face - thicknessM;
    if (backCut <= 0) {
      throw new IllegalArgumentException(
          "face depth and hinge thickness together are "
              + (face + thicknessM)
              + " m; they must stay below the stem diameter at the cut, "
              + stumpDiameterM
              + " m");
    }
    double offset = radius - face - thicknessM / 2;
    double chord = chord(radius, offset);
    double width = enteredWidthM == null ? chord : Math.min(enteredWidthM, chord);
    double steer = Math.min(WIDTH_SHARE * stumpDiameterM, width);
    if (shellM != null && radius > shellM) {
      double hole = chord(radius - shellM, offset);
      width = Math.max(0, width - hole);
      steer = Math.max(0, steer - hole);
    }
    if (deadOrDecayed) {
      steer = 0;
    }
    double sitBack = wedges ? 0 : Math.atan(kerfM / backCut);
    return new HingeShape(face, thicknessM, offset, width, steer, sitBack, backCut);
  }

  private static double chord(double radius, double offset) {
    double square = radius * radius - offset * offset;
    return square > 0 ? 2 * Math.sqrt(square) : 0;
  }
}
