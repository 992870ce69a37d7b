package org.fallwright.plugins.blocksystem;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.plugins.api.Amount;

/** Remarks and warnings of a block system. */
final class BlockNotes {
  private BlockNotes() {}

  static List<String> of(Kit kit, Rig rig, List<Part> own, PullRequest request) {
    List<String> notes = new ArrayList<>();
    double takeUp = request.pull().lineInM();
    int n = rig.parts();
    notes.add(
        say("The haul end moves %s, %d times the take-up; ", Amount.length(n * takeUp), n)
            + (kit.roomM() == null ? room(rig, takeUp) : resets(kit, rig, takeUp)));
    Part weakest =
        own.stream().min(Comparator.comparingDouble(BlockParts::reachedAtN)).orElseThrow();
    notes.add(
        say(
            "Of its own parts the %s is loaded most: it comes to its limit at %s on the pull"
                + " line.",
            weakest.name(), Amount.forceAtMost(BlockParts.reachedAtN(weakest))));
    notes.add(
        "Left out: the weight of its blocks and line. Keep the blocks off the ground and its parts"
            + " from twisting.");
    notes.addAll(request.driver().notes());
    return notes;
  }

  private static String room(Rig rig, double takeUp) {
    String or = " apart or the system be reset.";
    return rig.compound()
        ? say(
                "the blocks of the second tackle must start at least %s",
                Amount.length(rig.first().parts() * takeUp))
            + or
        : say("the blocks must start at least %s", Amount.length(takeUp)) + or;
  }

  private static String resets(Kit kit, Rig rig, double takeUp) {
    int resets = Throw.of(rig, kit.roomM()).resets(takeUp);
    if (resets == 0) {
      return say("its blocks are far enough apart at %s.", Amount.length(kit.roomM()));
    }
    return say(
            "with %s between its blocks it must be reset %d %s",
            Amount.length(kit.roomM()), resets, resets == 1 ? "time" : "times")
        + (kit.capture() == null
            ? ", and nothing holds the line meanwhile."
            : "; the rope grab holds the line meanwhile.");
  }

  private static String say(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }
}
