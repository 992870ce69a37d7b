package org.fallwright.ui.cli;

import java.util.List;
import java.util.Locale;
import org.fallwright.core.tree.field.Girth;
import org.fallwright.core.tree.field.Lean;
import org.fallwright.core.tree.field.Reading;
import org.fallwright.core.tree.field.SideView;
import org.fallwright.core.tree.field.TapedHeight;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.units.LengthEntry;
import org.fallwright.core.units.Units;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.ScopeType;
import picocli.CommandLine.Spec;

/** From what is read off tape, clinometer and plumb line to the figures that a site file asks. */
@Command(
    name = "measure",
    description = {
      "Work out diameter, height or lean from what was read at the tree.",
      "Lengths are in metres, or carry their unit: 25, 82ft, 64.3in, \"12ft 6in\"."
    })
final class MeasureCommand {
  private static final String SCALE =
      "Scale that the clinometer was read on: degrees or percent. It is never guessed: 6 %% is 3.4"
          + " degrees.";

  /** How the tree leans as the viewer of a height sees it. */
  private enum Side {
    TOWARDS,
    AWAY,
    SQUARE
  }

  @Spec private CommandSpec spec;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      scope = ScopeType.INHERIT,
      description = "Show this help.")
  private boolean help;

  @Command(name = "girth", description = "Stem diameter from a tape round the stem.")
  int girth(
      @Parameters(paramLabel = "GIRTH", description = "Length of the tape round the stem.")
          String girth) {
    return answered(
        () -> {
          double round = LengthEntry.metres("girth", girth);
          row("diameter", small(Girth.diameterM(round)));
          row("formula", "diameter = girth / π, girth " + small(round));
          row("leaves out", "a stem that is not round is given a little too thick");
        });
  }

  @Command(name = "height", description = "Height of a tree from a tape and a clinometer.")
  int height(
      @Option(
              names = "--distance",
              required = true,
              paramLabel = "LENGTH",
              description = "Level distance from the eye to the middle of the stump.")
          String distance,
      @Option(
              names = "--top",
              required = true,
              paramLabel = "READING",
              description = "Reading at the tip, from the level, up positive.")
          double top,
      @Option(
              names = "--base",
              required = true,
              paramLabel = "READING",
              description = "Reading at the base, negative where the eye is above it.")
          double base,
      @Option(names = "--scale", required = true, paramLabel = "SCALE", description = SCALE)
          Reading.Scale scale,
      @Option(
              names = "--lean",
              paramLabel = "DEGREES",
              description = "Lean from the vertical, in degrees whatever the scale.")
          Double lean,
      @Option(names = "--towards-viewer", description = "It leans towards the viewer.")
          boolean towards,
      @Option(names = "--away", description = "It leans away from the viewer.") boolean away,
      @Option(names = "--square", description = "It leans square to the view.") boolean square) {
    return answered(
        () -> {
          TapedHeight h =
              new TapedHeight(
                  LengthEntry.metres("distance", distance),
                  new Reading(top, scale),
                  new Reading(base, scale));
          List<Side> sides = sides(lean, towards, away, square);
          row("height read", length(h.heightM()));
          row(
              "formula",
              said(
                  "H = d * (tan top - tan base), d %s, tan top %.3f, tan base %.3f",
                  length(h.distanceM()), h.top().tangent(), h.base().tangent()));
          row("eye", length(h.eyeM()) + " above the base: e = -d * tan base");
          if (lean == null) {
            row(
                "takes",
                "the tip to stand over the stump; one that leans towards the viewer is read too"
                    + " high, one that leans away too low (--lean)");
          }
          sides.forEach(s -> leaner(h, lean, s));
        });
  }

  private static List<Side> sides(Double lean, boolean towards, boolean away, boolean square) {
    int said = (towards ? 1 : 0) + (away ? 1 : 0) + (square ? 1 : 0);
    if (said > 1) {
      throw new Refused("One of --towards-viewer, --away and --square can be given, not several.");
    }
    if (said == 1 && lean == null) {
      throw new Refused("--lean is missing: how far it leans, in degrees from the vertical.");
    }
    if (lean == null) {
      return List.of();
    }
    new Lean(lean, 0);
    return said == 0
        ? List.of(Side.values())
        : List.of(towards ? Side.TOWARDS : away ? Side.AWAY : Side.SQUARE);
  }

  private void leaner(TapedHeight h, double lean, Side side) {
    double high =
        switch (side) {
          case TOWARDS -> h.heightOfLeanerM(lean);
          case AWAY -> h.heightOfLeanerM(-lean);
          case SQUARE -> h.heightSquareToLeanM(lean);
        };
    double off = h.heightM() - high;
    row(
        switch (side) {
          case TOWARDS -> "towards";
          case AWAY -> "away";
          case SQUARE -> "square";
        },
        said(
            "leaning %s %s it is %s high, so it was read too %s by %s",
            angle(lean),
            switch (side) {
              case TOWARDS -> "towards the viewer";
              case AWAY -> "away from the viewer";
              case SQUARE -> "square to the view";
            },
            length(high),
            off >= 0 ? "high" : "low",
            length(Math.abs(off))));
    row(
        "formula",
        switch (side) {
          case TOWARDS -> "H = d * H_read / (d + (H_read - e) * tan lean)";
          case AWAY -> "H = d * H_read / (d - (H_read - e) * tan lean)";
          case SQUARE -> "H - e = tan top * root of (d² + (H * tan lean)²), solved for H";
        });
  }

  @Command(
      name = "lean",
      description = "Lean of a stem from a plumb line, a clinometer laid along it, or two views.")
  int lean(
      @Option(
              names = "--offset",
              paramLabel = "LENGTH",
              description = "Plumb line: level distance from it to the same side of the foot.")
          String offset,
      @Option(
              names = "--at",
              paramLabel = "LENGTH",
              description = "Plumb line: height that it hangs from above the foot.")
          String at,
      @Option(
              names = "--stem",
              paramLabel = "READING",
              description = "Clinometer laid along the stem: reading from the vertical.")
          Double stem,
      @Option(
              names = "--from-level",
              description = "With --stem: the reading is from the level, 90 degrees if upright.")
          boolean fromLevel,
      @Option(
              names = "--view",
              paramLabel = "AZIMUTH:READING",
              description = {
                "Twice: azimuth looked along, and how far the stem goes off the plumb line,",
                "to the right positive; the views square to each other or nearly so."
              })
          List<String> views,
      @Option(names = "--scale", paramLabel = "SCALE", description = SCALE) Reading.Scale scale) {
    return answered(
        () -> {
          boolean plumb = offset != null || at != null;
          if ((plumb ? 1 : 0) + (stem != null ? 1 : 0) + (views != null ? 1 : 0) != 1) {
            throw new Refused(
                "One way of measuring must be given: --offset with --at, --stem, or --view twice.");
          }
          if (plumb) {
            byPlumb(offset, at);
          } else if (scale == null) {
            throw new Refused(
                "--scale is missing: whether the clinometer was read in degrees or in percent.");
          } else if (stem != null) {
            byStem(new Reading(stem, scale), fromLevel);
          } else {
            byViews(views, scale);
          }
        });
  }

  private void byPlumb(String offset, String at) {
    if (offset == null || at == null) {
      throw new Refused("--offset and --at go together: how far off, and from how high.");
    }
    double off = LengthEntry.metres("offset", offset);
    double high = LengthEntry.metres("at", at);
    row("lean", angle(Lean.byPlumb(off, high, 0).deg()));
    row("formula", said("tan lean = offset / height, %s / %s", small(off), length(high)));
  }

  private void byStem(Reading reading, boolean fromLevel) {
    double deg = fromLevel ? 90 - reading.deg() : reading.deg();
    if (deg < 0 || deg > 45) {
      throw new Refused(
          said(
              "--stem read %s is a lean of %.1f degrees; it must be from 0 to 45 (%s).",
              fromLevel ? "from the level" : "from the vertical",
              deg,
              fromLevel
                  ? "a reading from the vertical goes without --from-level"
                  : "a reading from the level goes with --from-level"));
    }
    row("lean", angle((fromLevel ? Lean.byStem(reading, 0) : new Lean(deg, 0)).deg()));
    row(
        "formula",
        fromLevel
            ? said("lean = 90° less the reading from the level, %.1f°", reading.deg())
            : said("lean = the reading from the vertical, tan lean %.4f", reading.tangent()));
    row("leaves out", "a swept or flared stem leans otherwise higher up");
  }

  private void byViews(List<String> views, Reading.Scale scale) {
    if (views.size() != 2) {
      throw new Refused("--view is given " + views.size() + " times; it must be given twice.");
    }
    Lean l = Lean.byTwoViews(view(views.get(0), scale), view(views.get(1), scale));
    row("lean", said("%s towards %05.1f°", angle(l.deg()), l.azimuthDeg()));
    row(
        "formula",
        "tan lean along the right of each view = tan of its reading; the two put together");
    row("takes", "views from far off; azimuths from the same north as those given");
  }

  private static SideView view(String text, Reading.Scale scale) {
    String[] parts = text.split(":", -1);
    try {
      if (parts.length == 2) {
        return new SideView(
            Double.parseDouble(parts[0]), new Reading(Double.parseDouble(parts[1]), scale));
      }
    } catch (NumberFormatException e) {
      // falls through to the refusal, which says what must stand there
    }
    throw new Refused(
        "--view is \"" + text + "\"; it must be azimuth and reading, such as 188:4.2.");
  }

  /** Runs it; what the core refuses becomes the one sentence. */
  private int answered(Runnable work) {
    try {
      work.run();
      spec.commandLine().getOut().flush();
      return Exit.DONE;
    } catch (IllegalArgumentException e) {
      throw new Refused(e.getMessage() + ".");
    }
  }

  private void row(String name, String what) {
    spec.commandLine().getOut().println(said("%-12s %s", name, what));
  }

  private static String length(double m) {
    return DisplayUnits.METRIC.both(u -> u.length(m));
  }

  private static String small(double m) {
    return DisplayUnits.METRIC.both(u -> u.smallLength(m));
  }

  private static String angle(double deg) {
    return said("%.1f° (%.1f %%)", deg, Units.percentOfDegrees(deg));
  }

  private static String said(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }
}
