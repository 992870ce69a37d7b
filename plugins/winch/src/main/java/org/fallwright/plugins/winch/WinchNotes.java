package org.fallwright.plugins.winch;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.plugins.api.Amount;

/** Remarks and warnings of a winch. */
final class WinchNotes {
  /**
   * What one person keeps up standing, whole body [N]. Published: upper limits for horizontal
   * pushing and pulling, industrial ergonomics handbook, Van Nostrand Reinhold 1986.
   */
  static final double KEPT_UP_N = 225;

  private WinchNotes() {}

  static List<String> of(Plate winch, int layer, PullRequest request) {
    List<String> notes = new ArrayList<>();
    double lineIn = request.pull().lineInM();
    if (winch.kind().powered()) {
      notes.add(
          say(
              "It takes in %s in about %.0f s.",
              Amount.length(lineIn), Math.ceil(lineIn / winch.speedMps())));
    } else {
      notes.add(
          say(
              "About %.0f %s of %s take in %s.",
              Math.ceil(lineIn / winch.strokeM()),
              winch.kind().crank() ? "turns" : "strokes",
              Amount.smallLength(winch.strokeM()),
              Amount.length(lineIn)));
      hand(winch, layer, request.pull().workingN()).ifPresent(notes::add);
    }
    if (winch.reel() != null) {
      notes.add("Keep at least " + Reel.WRAPS_LEFT + " wraps of wire on the drum.");
      if (winch.reel().startOutM() > 0) {
        notes.add(
            say(
                "Reckoned with %s of wire pulled out at the start; with less out it pulls less.",
                Amount.length(winch.reel().startOutM())));
      }
    }
    notes.add(
        winch.overloadN() == null
            ? "No overload device is stated: the winch is taken to stall at "
                + Winch.STALL
                + " times its rated pull on the bare drum."
            : "If the overload device gives way, stop: never replace it by a stronger one.");
    if (winch.tail() != null && winch.tail().grabN() == null) {
      notes.add(
          "Only the hand on the tail holds the line: a rope grab on it would hold by itself.");
    }
    if (request.stand().ground() != null) {
      notes.add(
          "Lock every wheel of the winch's machine and chock it; only its weight is counted on, and"
              + " tipping is not checked.");
    }
    return notes;
  }

  private static Optional<String> hand(Plate winch, int layer, Double workingN) {
    if (winch.drive() == null || workingN == null) {
      return Optional.empty();
    }
    double pull = Math.min(workingN, winch.ratedOnLayerN(layer));
    double force = winch.drive().handN(pull * winch.further(layer));
    return Optional.of(
        say("At the pull that is planned the hand presses with about %s", Amount.force(force))
            + (force > KEPT_UP_N
                ? say("; more than %s nobody keeps up: take turns.", Amount.forceAtMost(KEPT_UP_N))
                : "."));
  }

  private static String say(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }
}
