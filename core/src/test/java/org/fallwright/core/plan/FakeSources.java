package org.fallwright.core.plan;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;

/**
 * Simple pull sources of every kind there is: each gives what its parameter {@code pull_N} says.
 */
final class FakeSources {
  private FakeSources() {}

  static final PullSources ALL =
      () ->
          List.of(new TinySite.Steady(), new Surging(), new Wired(), new Swaying(), new Doubled());

  /** One of those below. */
  private abstract static class Fake implements PullSource {
    private final SourceDescription description;

    Fake(String id, PlaceKind place, boolean needsDriver) {
      description =
          new SourceDescription(
              id,
              id,
              Set.of(place),
              needsDriver,
              List.of(SourceDescription.Parameter.number("pull_N", "Pull", "N", 0, 1e6)));
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
      double low = pull(r) * (r.mode().equals("two") ? 0.5 : 1) * Math.cos(r.lineRiseRad());
      double surge = 0.5 * Math.sqrt(2000 * r.pathStiffness()) / r.travelRatio();
      List<PullOffer.Finding> checks =
          new ArrayList<>(
              List.of(
                  new PullOffer.Finding(
                      "room",
                      20,
                      r.takeUpM() * r.travelRatio() + 16,
                      "m",
                      20 / (r.takeUpM() * r.travelRatio() + 16),
                      "Room ahead.")));
      if (r.offHeadingRad() != null) {
        double off = Math.toDegrees(r.offHeadingRad());
        checks.add(
            new PullOffer.Finding(
                "heading", off, 15, "deg", 15 / Math.max(off, 1e-4), "How it faces."));
      }
      return new PullOffer(
          low,
          1.5 * low + surge,
          1.2 * low,
          true,
          "grip",
          1,
          true,
          0.5,
          0,
          0,
          0,
          1,
          List.of(new PullOffer.Part("tow point", 60_000, 4, 1.5, 1, 1)),
          checks,
          List.of());
    }
  }

  /** Hangs on an anchor and pays out wire of its own. */
  static final class Wired extends Fake {
    Wired() {
      super("wired", PlaceKind.ANCHOR, false);
    }

    @Override
    public PullOffer offer(PullRequest r) {
      double pull = pull(r);
      return new PullOffer(
          pull,
          1.8 * pull,
          pull,
          true,
          "rating",
          30,
          false,
          0.06,
          15,
          1,
          1,
          1,
          List.of(),
          List.of(),
          List.of());
    }
  }

  /** People: they cannot hold what they pull. */
  static final class Swaying extends Fake {
    Swaying() {
      super("swaying", PlaceKind.SPOT, false);
    }

    @Override
    public PullOffer offer(PullRequest r) {
      double pull = pull(r);
      return new PullOffer(
          pull, 2 * pull, pull, false, "boots", 1, false, 0.3, 0, 0, 0, 4, List.of(), List.of(),
          List.of());
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
      return new PullOffer(
          1.8 * d.lowN(),
          2 * d.highN(),
          2 * d.holdN(),
          d.captured(),
          d.limit(),
          2 * d.velocityRatio(),
          d.powered(),
          d.overrunM() / 2,
          0,
          1.5,
          1.5,
          d.operators(),
          List.of(new PullOffer.Part("tackle", 80_000, 4, 1.5, 1, 1)),
          d.checks(),
          d.notes());
    }
  }
}
