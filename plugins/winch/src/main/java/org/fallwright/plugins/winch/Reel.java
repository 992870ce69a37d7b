package org.fallwright.plugins.winch;

import java.util.Locale;
import org.fallwright.plugins.api.ParameterReader;

/**
 * A drum with its wire.
 *
 * @param drum the drum
 * @param wireM all its wire [m]
 * @param fullLayers layers with all of it on
 * @param widthM width of the barrel [m]; null: not stated, then every haul counts on the full drum
 * @param startOutM wire pulled out at the start [m]; 0: none that is counted on
 */
record Reel(Drum drum, double wireM, int fullLayers, Double widthM, double startOutM) {
  /**
   * Wraps of wire that must stay on a drum. Published: five in an army winch manual (TM
   * 9-2320-279-10-2) and in Alberta's OHS Code guide, s. 299; three elsewhere.
   */
  static final int WRAPS_LEFT = 5;

  static Reel read(ParameterReader in, double wireM) {
    Drum drum = new Drum(in.number("drum_m"), in.number("rope_m"));
    if (drum.ropeM() > drum.barrelM()) {
      throw new IllegalArgumentException(
          "rope_m is " + drum.ropeM() + " m; it must be at most drum_m, " + drum.barrelM() + " m");
    }
    double stays = drum.bareTurnsM(WRAPS_LEFT);
    if (wireM <= stays) {
      throw new IllegalArgumentException(
          say(
              "wire_m is %s m; it must be more than the %d wraps that stay on, %.2f m",
              wireM, WRAPS_LEFT, stays));
    }
    Double width = in.numberOrNull("barrel_width_m");
    if (in.isStated("layer") == (width != null)) {
      throw new IllegalArgumentException(
          width == null
              ? "layer is missing; it must be a whole number from 1 to "
                  + Plate.MOST_LAYERS
                  + ", or barrel_width_m be stated"
              : "layer is "
                  + in.wholeNumber("layer")
                  + "; it must be left out where barrel_width_m is stated");
    }
    Double out = in.numberOrNull("wire_out_m");
    if (out != null && width == null) {
      throw new IllegalArgumentException(
          "wire_out_m is " + out + " m; it must be left out where barrel_width_m is not stated");
    }
    if (out != null && out > wireM - stays) {
      throw new IllegalArgumentException(
          say(
              "wire_out_m is %s m; it must be at most %.2f m, for %d wraps stay on",
              out, wireM - stays, WRAPS_LEFT));
    }
    return new Reel(
        drum,
        wireM,
        width == null ? in.wholeNumber("layer") : reckoned(drum, wireM, width),
        width,
        out == null ? 0 : out);
  }

  private static int reckoned(Drum drum, double wireM, double widthM) {
    if (widthM < drum.ropeM()) {
      throw new IllegalArgumentException(
          "barrel_width_m is " + widthM + " m; it must be at least rope_m, " + drum.ropeM() + " m");
    }
    int layers = drum.layers(wireM, widthM);
    if (layers > Plate.MOST_LAYERS) {
      throw new IllegalArgumentException(
          say(
              "wire_m is %s m, which makes %d layers on this drum; it must make at most %d",
              wireM, layers, Plate.MOST_LAYERS));
    }
    return layers;
  }

  /**
   * Topmost layer at the end of a haul, the fullest of it.
   *
   * @param lineInM line taken in [m]
   * @param pathM way from the winch along the line, beyond which no wire can be out [m]
   */
  int topLayer(double lineInM, double pathM) {
    double stillOut = Math.max(0, Math.min(startOutM, pathM) - lineInM);
    return widthM == null ? fullLayers : drum.layers(wireM - stillOut, widthM);
  }

  /** Wire that can be out with {@link #WRAPS_LEFT} wraps on [m]. */
  double outM() {
    return wireM - drum.bareTurnsM(WRAPS_LEFT);
  }

  private static String say(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }
}
