package org.fallwright.plugins.handline;

import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.Wording;

/** What a crew's pull ends at. */
enum Limit {
  BOOTS(
      "boots slip",
      "las botas se resbalan",
      "The boots let go first: firmer or drier ground gives more, stronger people don't.",
      "Primero se resbalan las botas: un suelo más firme o más seco da más; gente más fuerte, no."),
  TIPPING(
      "body tips forward",
      "el cuerpo se va hacia adelante",
      "The line draws them upright first: leaning back more or holding it lower gives more, stronger"
          + " people don't.",
      "La cuerda los endereza primero: inclinarse más o bajar las manos da más; gente más fuerte,"
          + " no."),
  STRENGTH(
      "strength of a person",
      "fuerza de una persona",
      "Their strength ends first: better footing, a few more people, a block system or a winch give"
          + " more.",
      "Primero se acaba la fuerza: mejor apoyo, unas personas más, un aparejo o un malacate dan"
          + " más."),
  HANDS(
      "hands slip on the line",
      "la cuerda se escurre de las manos",
      "The line runs through their hands first: a thicker line or a handle on it gives more, better"
          + " ground doesn't.",
      "La cuerda se escurre primero: una cuerda más gruesa o un agarre da más; mejor suelo, no."),
  NOBODY(
      "nobody pulls",
      "nadie jala",
      "Whoever minds the turns cannot pull as well: it takes a second person.",
      "Quien cuida las vueltas no puede jalar también: hace falta otra persona.");

  /** The same in words. */
  final PullOffer.Limit said;

  Limit(String what, String spanishWhat, String why, String spanishWhy) {
    said = new PullOffer.Limit(new Wording(what, spanishWhat), new Wording(why, spanishWhy));
  }
}
