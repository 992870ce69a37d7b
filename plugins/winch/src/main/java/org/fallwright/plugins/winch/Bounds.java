package org.fallwright.plugins.winch;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.fallwright.core.pull.PullOffer.Limit;
import org.fallwright.core.pull.PullRequest.Stand;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.reference.Allowances;

/**
 * What bounds the pull of a winch and what it holds.
 *
 * <p>The pull: its rating on that layer of its drum; the low end of its overload device there; what
 * a person gives at lever or crank; the grip of a capstan; the locked wheels under a machine. The
 * hold: brake, pawl or grip, of a capstan the tail or a rope grab, each no more than the low end of
 * the overload device and the locked wheels.
 *
 * @param lowN the least of the pulls [N]
 * @param limit which it is
 * @param holdN what it holds [N]
 * @param captured whether its end of the line stays where it is while holding
 */
record Bounds(double lowN, Limit limit, double holdN, boolean captured) {
  /** Most of a hand at a crank [N]: the test force of EN 13157, from memory. */
  static final double CRANK_N = 250;

  /** Most of a person at a lever [N]: the test force of EN 13157, from memory. */
  static final double LEVER_N = 550;

  /** Least at which an overload device may act, over its setting. Planning allowance. */
  private static final double DEVICE_LOW = Allowances.DEVICE_LOW.value();

  private record One(double newtons, Limit limit) {}

  static Bounds of(Plate winch, int layer, Stand stand) {
    List<One> bounds = new ArrayList<>();
    bounds.add(rated(winch, layer));
    double deviceN = Double.POSITIVE_INFINITY;
    if (winch.overloadN() != null) {
      deviceN = winch.onLayerN(DEVICE_LOW * winch.overloadN(), layer);
      bounds.add(
          one(
              deviceN,
              "overload device of the winch",
              "Its overload device may let go a tenth below its setting.",
              "seguro de sobrecarga del malacate",
              "Su seguro de sobrecarga puede ceder una décima parte antes de su ajuste."));
    }
    if (winch.drive() != null) {
      bounds.add(hand(winch, layer));
    }
    if (winch.tail() != null) {
      bounds.add(
          one(
              winch.tail().capstan().slipsAtN(winch.tail().tailN()),
              "grip of the line on the capstan",
              "With this pull on the tail and these turns the line slips on the drum; more turns"
                  + " grip more.",
              "agarre de la cuerda en el tambor",
              "Con este tiro en la punta y estas vueltas la cuerda resbala; más vueltas agarran"
                  + " más."));
    }
    double wheelsN = Double.POSITIVE_INFINITY;
    if (stand.ground() != null) {
      wheelsN = wheels(winch, stand);
      bounds.add(
          one(
              wheelsN,
              "machine slides on its locked wheels",
              "The machine under the winch slides towards the tree before the winch pulls harder.",
              "la máquina resbala con las ruedas bloqueadas",
              "La máquina del malacate resbala hacia el árbol antes de que el malacate jale"
                  + " más."));
    }
    One least = bounds.stream().min(Comparator.comparingDouble(One::newtons)).orElseThrow();
    double hold = Math.min(holdN(winch, layer), Math.min(deviceN, wheelsN));
    boolean captured = winch.tail() == null || winch.tail().grabN() != null;
    return new Bounds(least.newtons(), least.limit(), hold, captured);
  }

  private static double holdN(Plate winch, int layer) {
    double brake =
        winch.brakeN() == null ? winch.ratedOnLayerN(layer) : winch.onLayerN(winch.brakeN(), layer);
    if (winch.tail() == null) {
      return brake;
    }
    return winch.tail().grabN() != null
        ? winch.tail().grabN()
        : Math.min(brake, winch.tail().capstan().slipsAtN(winch.tail().tailN()));
  }

  private static One rated(Plate winch, int layer) {
    boolean higher = winch.reel() != null && layer > 1;
    String on = higher ? " on layer " + layer + " of its drum" : "";
    String en = higher ? " en la capa " + layer + " de su tambor" : "";
    return one(
        winch.ratedOnLayerN(layer),
        "rated pull of the winch" + on,
        higher
            ? "Each layer of wire on the drum takes from the pull; this is what is left on layer "
                + layer
                + "."
            : "This is the pull that its plate states; more would overload it.",
        "tiro marcado del malacate" + en,
        higher
            ? "Cada capa de cable de acero en el tambor quita tiro; esto queda en la capa "
                + layer
                + "."
            : "Es el tiro que lleva marcado; no está hecho para más.");
  }

  private static One hand(Plate winch, int layer) {
    boolean crank = winch.kind().crank();
    return one(
        winch.onLayerN(winch.drive().pullN(crank ? CRANK_N : LEVER_N), layer),
        crank ? "what a person gives at the crank" : "what a person gives at the lever",
        "A person cannot press the handle harder; a longer handle is forbidden.",
        crank ? "lo que da una persona con la manivela" : "lo que da una persona con la palanca",
        "Una persona no puede hacer más fuerza; prohibido alargar la palanca.");
  }

  private static double wheels(Plate winch, Stand stand) {
    if (winch.machine() == null) {
      throw new IllegalArgumentException(
          "machine_kg is missing; it must be a number from 200 to 60000 kg where the winch stands"
              + " on a spot");
    }
    return winch
        .machine()
        .slidesAtN(stand.ground().tyreLow(), stand.uphillRad(), stand.lineRiseRad());
  }

  private static One one(
      double newtons, String what, String why, String whatSpanish, String whySpanish) {
    return new One(
        newtons, new Limit(new Wording(what, whatSpanish), new Wording(why, whySpanish)));
  }
}
