package org.fallwright.core.plan;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.Wording;

/**
 * Simple pull sources of every kind there is: each gives what its parameter {@code pull_N} says.
 */
final class FakeSources {
  private FakeSources() {}

  static final PullSources ALL =
      () ->
          List.of(
              new TinySite.Steady(),
              new Surging(),
              new Wired(),
              new Swaying(),
              new Elastic(),
              new Doubled());

  private static PullOffer.Limit limit(String words) {
    return new PullOffer.Limit(
        new Wording(words, words), new Wording("That limits it.", "Eso lo limita."));
  }

  /** One of those below. */
  private abstract static class Fake implements PullSource {
    private final SourceDescription description;

    Fake(String id, PlaceKind place, boolean needsDriver) {
      description =
          new SourceDescription(
              id,
              new Wording(id, id),
              Set.of(place),
              needsDriver,
              List.of(
                  Parameter.number(
                      "pull_N",
                      "N",
                      0,
                      1e6,
                      new Wording("Pull", "Tiro"),
                      new Wording("What it gives.", "Lo que da."))));
    }

    @Override
    public SourceDescription describe() {
      return description;
    }

    @Override
    public List<String> modes(ObjectNode parameters) {
      return List.of("pull");
    }

    static double pull(PullRequest request) {
      return request.parameters().get("pull_N").asDouble();
    }
  }

  /** Stands on a spot; a stiff line jerks it, it needs room ahead, and it must face its pull. */
  static final class Surging extends Fake {
    Surging() {
      super("surging", PlaceKind.SPOT, false);
    }

    @Override
    public List<String> modes(ObjectNode parameters) {
      return List.of("two", "four");
    }

    @Override
    public PullOffer offer(PullRequest r) {
      double low = pull(r) * (r.mode().equals("two") ? 0.5 : 1) * Math.cos(r.stand().lineRiseRad());
      double surge = 0.5 * Math.sqrt(2000 * r.pull().pathStiffness()) / r.pull().travelRatio();
      double room = r.pull().lineInM() + 16;
      List<PullOffer.Finding> checks =
          new ArrayList<>(
              List.of(
                  new PullOffer.Finding("room", 20, room, "m", 20 / room, "There is room ahead.")));
      if (r.stand().offHeadingRad() != null) {
        double off = Math.toDegrees(r.stand().offHeadingRad());
        checks.add(
            new PullOffer.Finding(
                "heading", off, 15, "deg", 15 / Math.max(off, 1e-4), "It faces its pull."));
      }
      return PullOffer.giving(low, 1.5 * low + surge, limit("grip"))
          .holds(1.2 * low, true)
          .powered(true)
          .overrun(0.5)
          .anchor(0, 0)
          .people(PullOffer.Standing.one("driver", "conductor"))
          .parts(List.of(new PullOffer.Part("tow point", 60_000, 4, 1.5, 1, 1)))
          .checks(checks)
          .done();
    }
  }

  /** Hangs on an anchor and pays out wire of its own; worked beside it. */
  static final class Wired extends Fake {
    Wired() {
      super("wired", PlaceKind.ANCHOR, false);
    }

    @Override
    public PullOffer offer(PullRequest r) {
      double pull = pull(r);
      return PullOffer.giving(pull, 1.8 * pull, limit("rating"))
          .holds(pull, true)
          .travel(30, null)
          .overrun(0.06)
          .wire(15)
          .people(PullOffer.Standing.one("winder", "quien gira"))
          .done();
    }
  }

  /** Hangs on an anchor, gives way itself, and comes to an end of what it can take in. */
  static final class Elastic extends Fake {
    Elastic() {
      super("elastic", PlaceKind.ANCHOR, false);
    }

    @Override
    public PullOffer offer(PullRequest r) {
      double pull = pull(r);
      double surge = 0.2 * Math.sqrt(500 * r.pull().pathStiffness());
      return PullOffer.giving(pull, 1.3 * pull + surge, limit("its springs"))
          .holds(pull, true)
          .travel(2, 1.2)
          .powered(true)
          .stiffness(8 * pull)
          .people(
              new PullOffer.Standing(
                  new Wording("hand", "ayudante"), PullOffer.Where.AT_CAPTURE, 1, 0))
          .done();
    }
  }

  /** People in a row along the line: they cannot hold what they pull. */
  static final class Swaying extends Fake {
    Swaying() {
      super("swaying", PlaceKind.SPOT, false);
    }

    @Override
    public PullOffer offer(PullRequest r) {
      double pull = pull(r);
      return PullOffer.giving(pull, 2 * pull, limit("boots"))
          .holds(pull, false)
          .overrun(0.3)
          .anchor(0, 0)
          .people(
              new PullOffer.Standing(
                  new Wording("people", "gente"), PullOffer.Where.BESIDE_LINE, 4, 3))
          .done();
    }
  }

  /** Gives twice what hauls it. */
  static final class Doubled extends Fake {
    Doubled() {
      super("doubled", PlaceKind.ANCHOR, true);
    }

    @Override
    public HaulLine haulLine(ObjectNode parameters, String mode) {
      return new HaulLine(2, 220_000, 60);
    }

    @Override
    public PullOffer offer(PullRequest r) {
      PullOffer d = r.driver();
      return PullOffer.giving(1.8 * d.lowN(), 2 * d.highN(), d.limit())
          .holds(2 * d.holdN(), d.captured())
          .travel(2 * d.travel().ratio(), null)
          .powered(d.powered())
          .overrun(d.overrunM() / 2)
          .anchor(1.5, 1.5)
          .people(d.people())
          .parts(List.of(new PullOffer.Part("tackle", 80_000, 4, 1.5, 1, 1)))
          .checks(d.checks())
          .notes(d.notes())
          .done();
    }
  }
}
