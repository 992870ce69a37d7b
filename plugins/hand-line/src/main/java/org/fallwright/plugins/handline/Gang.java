package org.fallwright.plugins.handline;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.line.Wraps;
import org.fallwright.core.reference.Surface;
import org.fallwright.plugins.api.ParameterReader;

/**
 * The people of one site, their posture, their haul and what holds the line for them.
 *
 * @param people how many work the line
 * @param pulling those who pull and count, as light as they may be, one by one
 * @param loading all who could pull, as heavy as they may be
 * @param standIn whether a mass or stature was not stated
 * @param lineDiameterM diameter of the line in their hands [m]; null: not stated
 * @param turnsHoldN what turns with the tail in a hand hold [N]; 0 where there are none
 * @param ratedN rated load of what holds [N]; null: not stated
 * @param factor its breaking load over its rated load
 */
record Gang(
    int people,
    List<Person> pulling,
    List<Person> loading,
    boolean standIn,
    double leanRad,
    double handHeightM,
    double handAheadM,
    Capture capture,
    Haul haul,
    Double lineDiameterM,
    double turnsHoldN,
    Double ratedN,
    double factor) {
  /**
   * Reads it.
   *
   * @throws IllegalArgumentException one sentence with key, value and limit
   */
  static Gang of(ParameterReader reader) {
    int people = reader.wholeNumber("people");
    Capture capture = capture(reader);
    List<Person> light = new ArrayList<>();
    List<Person> heavy = new ArrayList<>();
    Double mass = reader.numberOrNull("person_mass_kg");
    Double stature = reader.numberOrNull("stature_m");
    boolean standIn = mass == null || stature == null;
    for (int i = 1; i <= Math.max(people, CrewParameters.TOLD); i++) {
      Double ownMass = own(reader, "mass_" + i + "_kg", i, people);
      Double ownStature = own(reader, "stature_" + i + "_m", i, people);
      if (i <= people) {
        Double kg = ownMass == null ? mass : ownMass;
        Double m = ownStature == null ? stature : ownStature;
        double tall = m == null ? Person.SHORT_M : m;
        light.add(new Person(kg == null ? Person.LIGHT_KG : kg, tall));
        heavy.add(new Person(kg == null ? Person.HEAVY_KG : kg, tall));
      }
    }
    if (capture.needsSomebody()) {
      // who minds the turns may be any of them: the pull counts on the one left out being the best
      light.remove(heaviest(light));
    }
    Double rated = reader.numberOrNull("capture_rated_N");
    Double factor = reader.numberOrNull("capture_factor");
    return new Gang(
        people,
        light,
        heavy,
        standIn,
        Math.toRadians(reader.number("lean_back_deg")),
        reader.number("hand_height_m"),
        reader.number("hand_ahead_m"),
        capture,
        reader.isStated("haul") ? Haul.of(reader.choice("haul")) : Haul.NOT_STATED,
        reader.numberOrNull("line_diameter_m"),
        capture == Capture.TURNS_IN_HAND ? turnsHoldN(reader, rated) : 0,
        rated,
        factor == null ? 1 : factor);
  }

  private static Capture capture(ParameterReader reader) {
    boolean captured = reader.flag("captured");
    if (!reader.isStated("capture_by")) {
      return captured ? Capture.DEVICE : Capture.NONE;
    }
    String by = reader.choice("capture_by");
    if (!captured) {
      throw new IllegalArgumentException(
          "capture_by is \"" + by + "\"; it must be left out where captured is false");
    }
    return Capture.of(by);
  }

  private static Double own(ParameterReader reader, String key, int number, int people) {
    if (number == 1 || number > CrewParameters.TOLD || !reader.isStated(key)) {
      return null;
    }
    if (number > people) {
      throw new IllegalArgumentException(
          key + " is " + reader.number(key) + "; it must be left out where people is " + people);
    }
    return reader.number(key);
  }

  private static Person heaviest(List<Person> of) {
    return of.stream().max((a, b) -> Double.compare(a.massKg(), b.massKg())).orElseThrow();
  }

  private static double turnsHoldN(ParameterReader reader, Double rated) {
    Double tail = reader.numberOrNull("tail_N");
    Wraps wraps = Capture.wraps(reader.choice("turns_on"));
    return Capture.turnsHoldN(
        wraps,
        reader.number("turns"),
        tail == null ? Capture.TAIL_N : tail,
        rated == null ? Double.POSITIVE_INFINITY : rated);
  }

  /** What those who pull can each do, taking line in that way. */
  List<PersonPull> low(
      Haul way, Surface ground, double riseRad, double slopeRad, Double diameterM) {
    double handsN =
        diameterM == null ? Double.POSITIVE_INFINITY : Hands.slipN(way.hands, diameterM);
    return pulling.stream()
        .map(
            p ->
                new PersonPull(
                    Math.min(tipN(p, 0, riseRad), tipN(p, -handAheadM, riseRad)),
                    PersonPull.slipN(p.massKg(), ground.bootLow(), riseRad, slopeRad),
                    way.strengthN(ground),
                    handsN))
        .toList();
  }

  private double tipN(Person p, double handXM, double riseRad) {
    return PersonPull.tipN(p.massKg(), p.statureM(), leanRad, handHeightM, handXM, riseRad);
  }

  /** The most that all of them pull for a moment, each for himself, without jerks [N]. */
  double highN(Surface ground, double riseRad, double slopeRad) {
    return loading.stream()
        .mapToDouble(
            p ->
                Math.min(
                    PersonPull.slipN(p.massKg(), ground.bootHigh(), riseRad, slopeRad),
                    ground.personHighN()))
        .sum();
  }
}
