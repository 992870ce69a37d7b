package org.fallwright.plugins.handline;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.pull.PullOffer.Standing;
import org.fallwright.core.pull.PullOffer.Where;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Surface;
import org.fallwright.plugins.api.Amount;
import org.fallwright.plugins.api.ParameterReader;
import org.fallwright.plugins.api.PullSourceExtension;
import org.pf4j.Extension;

/**
 * People on a hand line.
 *
 * <p>Low: each person the least of tipping, slipping, strength and hands on the low figures of the
 * ground, together with the crew's group factor. Hands held towards the tree shorten a rising
 * line's lever about the feet and so help; the low gives that no credit, while hands behind the
 * feet count against it. High, for the parts: every person slips on the high grip or reaches the
 * strongest published pull, without group loss, and however far they may lean back, since a lean is
 * easily greater than the one entered; then times {@link #HIGH_FACTOR}.
 *
 * <p>Holding: what captures the line holds up to its rated load; where that is not stated, no more
 * is counted than the crew pulls standing. People alone, and turns with the tail in a hand, give a
 * constant force.
 */
@Extension
public final class HandLine implements PullSourceExtension {
  /** Over the strongest steady pull, for jerks. Planning allowance. */
  private static final double HIGH_FACTOR = Allowances.HAND_HIGH.value();

  /** Least factor on what captures the line at the most the crew can do. Planning allowance. */
  private static final double LAST_FACTOR = Allowances.LAST_FACTOR.value();

  /** Line that still comes in after "stop": a hand-over-hand haul [m]. Planning allowance. */
  private static final double OVERRUN_M = 0.3;

  /** Lean beyond which a line that goes slack throws a person on the back. Planning allowance. */
  private static final double LEAN_TO_WARN_DEG = 20;

  /** Room that each takes along the line [m]. Planning allowance. */
  private static final double APART_M = 1.0;

  /** Room behind the hindmost that is never walked [m]. Planning allowance. */
  static final double SPARE_M = 1.0;

  private static final SourceDescription DESCRIPTION = CrewParameters.description();

  @Override
  public SourceDescription describe() {
    return DESCRIPTION;
  }

  @Override
  public List<String> modes(ObjectNode parameters) {
    Gang.of(new ParameterReader(DESCRIPTION, parameters));
    return List.of("pull");
  }

  @Override
  public double lineHeightM(ObjectNode parameters) {
    return new ParameterReader(DESCRIPTION, parameters).number("hand_height_m");
  }

  @Override
  public PullOffer offer(PullRequest request) {
    Gang gang = Gang.of(new ParameterReader(DESCRIPTION, request.parameters()));
    request.modeAmong(List.of("pull"));
    PullRequest.Stand stand = request.stand();
    Surface ground = stand.ground();
    if (ground == null) {
      throw new IllegalArgumentException(
          "ground is not stated; a hand line needs the ground that its people stand on");
    }
    double rise = stand.lineRiseRad();
    double slope = stand.uphillRad();
    Double diameter =
        request.line() == null ? gang.lineDiameterM() : Double.valueOf(request.line().diameterM());
    List<PersonPull> each = gang.low(gang.haul(), ground, rise, slope, diameter);
    double standing = Crew.pullN(gang.low(Haul.NOT_STATED, ground, rise, slope, diameter));
    Limit limit = each.isEmpty() ? Limit.NOBODY : Crew.limit(each);
    double low = Crew.pullN(each);
    return PullOffer.giving(low, gang.highN(ground, rise, slope) * HIGH_FACTOR, limit.at(low))
        .holds(holdN(gang, standing), gang.capture().staysPut())
        .travel(1, mostM(gang, stand.runOutM()))
        .overrun(OVERRUN_M)
        .people(people(gang))
        .parts(parts(gang))
        .notes(notes(gang, request, diameter))
        .done();
  }

  private static double holdN(Gang gang, double standingN) {
    return switch (gang.capture()) {
      case NONE -> standingN;
      case TURNS_IN_HAND -> gang.turnsHoldN();
      case DEVICE, TURNS_TIED -> gang.ratedN() == null ? standingN : gang.ratedN();
    };
  }

  /** Line that a crew takes in that walks back with nothing to hold it in between [m]. */
  private static Double mostM(Gang gang, Double runOutM) {
    return gang.haul() == Haul.WALKING && gang.capture() == Capture.NONE && runOutM != null
        ? Double.valueOf(Math.max(0, Math.min(1000, runOutM - SPARE_M)))
        : null;
  }

  private static List<Standing> people(Gang gang) {
    List<Standing> all = new ArrayList<>();
    int pulling = gang.people() - (gang.capture().needsSomebody() ? 1 : 0);
    if (pulling > 0) {
      all.add(
          new Standing(
              new Wording("pulls on the line", "jala la cuerda"),
              Where.BESIDE_LINE,
              pulling,
              (pulling - 1) * APART_M));
    }
    if (gang.capture().needsSomebody()) {
      all.add(
          new Standing(
              new Wording("minds the turns", "cuida las vueltas"), Where.AT_CAPTURE, 1, 0));
    }
    return all;
  }

  private static List<Part> parts(Gang gang) {
    return gang.ratedN() == null
        ? List.of()
        : List.of(
            new Part(
                "what captures the line",
                gang.ratedN() * gang.factor(),
                gang.factor(),
                LAST_FACTOR,
                0,
                1));
  }

  private static List<String> notes(Gang gang, PullRequest request, Double diameterM) {
    List<String> notes = new ArrayList<>();
    notes.add("Never put the line round a body or a hand.");
    switch (gang.capture()) {
      case NONE ->
          notes.add(
              "This is free-hand pulling: nothing but the people keeps the line, and people can sway"
                  + " or lose the tree during the cut; they cannot hold one.");
      case TURNS_IN_HAND ->
          notes.add(
              "Turns with the tail in a hand slip at a steady force: they ease a haul, they do not"
                  + " hold a tree. Tie them off for that.");
      case DEVICE, TURNS_TIED ->
          notes.add(
              gang.ratedN() == null
                  ? "The anchor and the rating of what captures the line are not checked here; no more"
                      + " is counted as held than the crew pulls."
                  : "The anchor of what captures the line is not checked here beyond the rated load"
                      + " stated: test it before the cut.");
    }
    if (gang.leanRad() > Math.toRadians(LEAN_TO_WARN_DEG)) {
      notes.add("Leaning back so far, the people fall on their backs if the line goes slack.");
    }
    if (gang.standIn()) {
      notes.add(
          "A mass or stature is not stated: a light, short adult counts for the pull and a heavy one"
              + " for the parts.");
    }
    if (diameterM == null) {
      notes.add("The line's diameter is not stated: whether hands can grip it is not checked.");
    }
    walking(gang, request, notes);
    return notes;
  }

  private static void walking(Gang gang, PullRequest request, List<String> notes) {
    double haul = request.pull().lineInM();
    Double room = request.stand().runOutM();
    if (gang.haul() == Haul.HAND_OVER_HAND || haul == 0) {
      return;
    }
    if (room == null) {
      notes.add(
          String.format(
              Locale.ROOT,
              "Walking back, the crew needs %s clear behind it, which is not stated.",
              Amount.length(haul + SPARE_M)));
    } else if (haul > room - SPARE_M && gang.capture() != Capture.NONE) {
      notes.add(
          String.format(
              Locale.ROOT,
              "The haul is %s and there are %s behind the crew: it walks back in several"
                  + " bites, the line held between them.",
              Amount.length(haul),
              Amount.length(room)));
    }
  }
}
