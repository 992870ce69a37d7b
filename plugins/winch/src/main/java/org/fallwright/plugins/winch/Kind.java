package org.fallwright.plugins.winch;

import java.util.Arrays;
import java.util.function.Predicate;
import org.fallwright.core.pull.Parameter.Choice;

/** Kinds of winch. */
enum Kind {
  /** A wire runs through two grips that a lever moves. */
  THROUGH_ROPE(
      "hand-through-rope",
      false,
      false,
      "by hand, the wire runs through",
      "manual de palanca, el cable de acero pasa por él"),
  /** A crank turns a drum. */
  HAND_DRUM(
      "hand-drum", false, true, "by hand, a crank turns a drum", "manual, de tambor con manivela"),
  /** A ratchet lever winds in a chain, band or wire of a short lift. */
  LEVER_HOIST(
      "lever-hoist",
      false,
      false,
      "by hand, a ratchet lever of short lift",
      "polipasto de palanca, corto"),
  /** A motor or engine turns a drum. */
  POWERED_DRUM("powered-drum", true, true, "powered, on a drum", "de motor, de tambor"),
  /** A motor turns a drum that the line itself runs round. */
  CAPSTAN(
      "capstan",
      true,
      false,
      "powered capstan, the line runs round it",
      "malacate de cuerda: la cuerda le da vueltas");

  private final String key;
  private final boolean powered;
  private final boolean drum;
  private final String english;
  private final String spanish;

  Kind(String key, boolean powered, boolean drum, String english, String spanish) {
    this.key = key;
    this.powered = powered;
    this.drum = drum;
    this.english = english;
    this.spanish = spanish;
  }

  static Kind of(String key) {
    return Arrays.stream(values()).filter(k -> k.key.equals(key)).findFirst().orElseThrow();
  }

  String key() {
    return key;
  }

  /** Whether a motor or engine pulls, else a hand. */
  boolean powered() {
    return powered;
  }

  /** Whether its wire piles up on a drum. */
  boolean drum() {
    return drum;
  }

  /** Whether it is a crank that is turned, else a lever that is swung. */
  boolean crank() {
    return this == HAND_DRUM;
  }

  static Choice[] choices() {
    return Arrays.stream(values())
        .map(k -> Choice.of(k.key, k.english, k.spanish))
        .toArray(Choice[]::new);
  }

  private static String[] keys(Predicate<Kind> which) {
    return Arrays.stream(values()).filter(which).map(Kind::key).toArray(String[]::new);
  }

  static String[] byHand() {
    return keys(k -> !k.powered);
  }

  static String[] byLever() {
    return keys(k -> !k.powered && !k.drum);
  }

  static String[] byPower() {
    return keys(Kind::powered);
  }

  static String[] onDrum() {
    return keys(Kind::drum);
  }

  static String[] withWire() {
    return keys(k -> k != CAPSTAN);
  }
}
