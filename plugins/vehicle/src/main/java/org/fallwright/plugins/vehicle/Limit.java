package org.fallwright.plugins.vehicle;

import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.units.DisplayUnits;

/** What a vehicle's pull ends at. */
enum Limit {
  REAR_GRIP(
      "grip of the rear axle",
      "agarre del eje trasero",
      "The rear tyres let go at %s; more engine changes nothing. All wheels driven, weight on that"
          + " axle or firmer ground would.",
      "Las llantas traseras patinan a los %s; más motor no cambia nada. La tracción total, más peso"
          + " en ese eje o un suelo más firme, sí."),
  FRONT_GRIP(
      "grip of the front axle",
      "agarre del eje delantero",
      "The front tyres let go at %s; more engine changes nothing. All wheels driven, weight on that"
          + " axle or firmer ground would.",
      "Las llantas delanteras patinan a los %s; más motor no cambia nada. La tracción total, más peso"
          + " en ese eje o un suelo más firme, sí."),
  ALL_GRIP(
      "grip of all wheels",
      "agarre de todas las llantas",
      "The tyres let go at %s; more engine changes nothing. More weight, firmer ground or a flatter"
          + " line would.",
      "Las llantas patinan a los %s; más motor no cambia nada. Más peso, un suelo más firme o una"
          + " cuerda más plana, sí."),
  CENTRE_OPEN(
      "grip of one axle, centre differential open",
      "agarre de un eje, diferencial central abierto",
      "One axle's tyres spin at %s and the open centre differential gives the other no more; locking"
          + " it would help, more engine would not.",
      "Un eje patina a los %s y el diferencial central abierto no da más al otro; bloquearlo ayuda,"
          + " más motor no."),
  LIFT(
      "axle lift",
      "se levanta un eje",
      "At %s the pull lifts an axle off the ground before the tyres let go; a lower tow point helps,"
          + " more grip does not.",
      "A los %s el tiro levanta un eje antes de que patinen las llantas; un enganche más bajo ayuda,"
          + " más agarre no."),
  TIPS(
      "stands too steep for its height",
      "está en pendiente muy fuerte para su altura",
      "On such a slope the vehicle stands on one axle before anything pulls: find it flatter ground.",
      "En esa pendiente el vehículo se apoya en un solo eje antes de jalar: busque un lugar más"
          + " plano."),
  OWN_WEIGHT(
      "twice its own weight",
      "dos veces su propio peso",
      "The line presses the wheels down, so grip does not end the pull; no more than twice its weight,"
          + " %s, is counted, and the engine may end sooner.",
      "La cuerda aprieta las llantas al suelo y el agarre no se acaba; no se cuenta más de dos veces su"
          + " peso, %s, y el motor puede acabarse antes."),
  STEEP_LINE(
      "line too steep for a parked vehicle",
      "cuerda muy empinada para un vehículo parado",
      "A line more than 30 degrees off the ground is nothing for a parked vehicle to hold.",
      "Una cuerda a más de 30 grados del suelo no es para que la sostenga un vehículo parado.");

  private final Wording what;
  private final Wording why;

  Limit(String what, String spanishWhat, String why, String spanishWhy) {
    this.what = new Wording(what, spanishWhat);
    this.why = new Wording(why, spanishWhy);
  }

  /** The same in words, for a pull [N]. */
  PullOffer.Limit at(double newtons) {
    String force = DisplayUnits.METRIC.both(u -> u.forceAtMost(newtons));
    return new PullOffer.Limit(
        what, new Wording(why.english().replace("%s", force), why.spanish().replace("%s", force)));
  }
}
