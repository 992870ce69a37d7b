package org.fallwright.plugins.handline;

import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.units.DisplayUnits;

/** What a crew's pull ends at. */
enum Limit {
  BOOTS(
      "boots slip",
      "las botas se resbalan",
      "The boots let go at %s together: firmer or drier ground gives more, stronger people don't.",
      "Las botas se resbalan a los %s entre todos: un suelo más firme o más seco da más; gente más"
          + " fuerte, no."),
  TIPPING(
      "body tips forward",
      "el cuerpo se va hacia adelante",
      "At %s together the line draws them upright: leaning back more or holding it lower gives more,"
          + " stronger people don't.",
      "A los %s entre todos la cuerda los endereza: inclinarse más o bajar las manos da más; gente más"
          + " fuerte, no."),
  STRENGTH(
      "strength of a person",
      "fuerza de una persona",
      "Their strength ends at %s together: better footing, more people up to seven, a block system or a"
          + " winch give more.",
      "Su fuerza se acaba a los %s entre todos: mejor apoyo, más gente hasta siete, un aparejo o un"
          + " malacate dan más."),
  HANDS(
      "hands slip on the line",
      "la cuerda se escurre de las manos",
      "The line runs through their hands at %s together: a thicker line or a handle on it gives more,"
          + " better ground doesn't.",
      "La cuerda se escurre de las manos a los %s entre todos: una cuerda más gruesa o un agarre da más;"
          + " mejor suelo, no."),
  NOBODY(
      "nobody pulls",
      "nadie jala",
      "Whoever minds the turns cannot pull as well: it takes a second person.",
      "Quien cuida las vueltas no puede jalar también: hace falta otra persona.");

  private final Wording what;
  private final Wording why;

  Limit(String what, String spanishWhat, String why, String spanishWhy) {
    this.what = new Wording(what, spanishWhat);
    this.why = new Wording(why, spanishWhy);
  }

  /** The same in words, for what the crew pulls together [N]. */
  PullOffer.Limit at(double newtons) {
    String force = DisplayUnits.METRIC.both(u -> u.forceAtMost(newtons));
    return new PullOffer.Limit(
        what, new Wording(why.english().replace("%s", force), why.spanish().replace("%s", force)));
  }
}
