package org.fallwright.ui.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import org.fallwright.core.advice.NotByPulling;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Figures;
import org.fallwright.core.plan.Ground;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.PartLoad;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.StandingPlace;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Picture;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.ui.map.PictureDate;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.SourceText;

/**
 * Every word and figure on the sheet, apart from the plan's own labels.
 *
 * @param title name of the job
 * @param subtitle which setup, by which rules and program
 * @param verdict verdict of the setup
 * @param sentence its one sentence
 * @param readings the four tensions that the crew works by
 * @param pull the rest of what concerns the pull
 * @param setup what is set up where
 * @param keepOut who and what must stay clear
 * @param loads loads on the parts with what is allowed, the nearest to it first
 * @param crew what is to be cleared before the work, and who stands where
 * @param unsettled checks that are tight or worse
 * @param notes warnings of this setup
 * @param cautions what goes with every plan
 * @param notKnown what was not looked at, left out or not measured
 * @param picture what lies under the plan
 */
record SheetContent(
    String title,
    String subtitle,
    Verdict verdict,
    String sentence,
    List<Reading> readings,
    List<Line> pull,
    List<Line> setup,
    List<Line> keepOut,
    List<Load> loads,
    List<Line> crew,
    List<Unsettled> unsettled,
    List<String> notes,
    List<String> cautions,
    List<String> notKnown,
    String picture) {

  /** A tension: what it is, in the person's units, in the other ones. */
  record Reading(String name, String shown, String other) {}

  /** A name and what it is. */
  record Line(String name, String value) {}

  /** A row of the table of loads. */
  record Load(
      String part,
      String atPlan,
      String allowedAtPlan,
      boolean overAtPlan,
      String atMost,
      String allowedAtMost,
      boolean overAtMost) {}

  /** A check that is not clear. */
  record Unsettled(Verdict verdict, String text) {}

  /** The same content with every text put through a function. */
  SheetContent map(UnaryOperator<String> f) {
    return new SheetContent(
        f.apply(title),
        f.apply(subtitle),
        verdict,
        f.apply(sentence),
        readings.stream()
            .map(r -> new Reading(f.apply(r.name), f.apply(r.shown), f.apply(r.other)))
            .toList(),
        lines(pull, f),
        lines(setup, f),
        lines(keepOut, f),
        loads.stream()
            .map(
                l ->
                    new Load(
                        f.apply(l.part),
                        f.apply(l.atPlan),
                        f.apply(l.allowedAtPlan),
                        l.overAtPlan,
                        f.apply(l.atMost),
                        f.apply(l.allowedAtMost),
                        l.overAtMost))
            .toList(),
        lines(crew, f),
        unsettled.stream().map(u -> new Unsettled(u.verdict, f.apply(u.text))).toList(),
        notes.stream().map(f).toList(),
        cautions.stream().map(f).toList(),
        notKnown.stream().map(f).toList(),
        f.apply(picture));
  }

  private static List<Line> lines(List<Line> lines, UnaryOperator<String> f) {
    return lines.stream().map(l -> new Line(f.apply(l.name), f.apply(l.value))).toList();
  }

  /** What is on the sheet of one of a plan's setups; rank 1 is the best. */
  static SheetContent of(Site site, Plan plan, int rank, String program, String pictureFault) {
    Judged j = plan.ranked().get(rank - 1);
    DisplayUnits in = site.display().units();
    String subtitle =
        String.format(
            Locale.ROOT,
            "Setup %d of %d · lay %s · rules %s · Fallwright %s",
            rank,
            plan.ranked().size(),
            lay(site, j.setup().layDeg()),
            site.ruleSet(),
            program);
    List<String> notKnown = new ArrayList<>(Entered.doubts(site));
    notKnown.add("Left out: " + String.join("; ", Cautions.LEFT_OUT) + ".");
    notKnown.addAll(plan.notes());
    return new SheetContent(
        site.name(),
        subtitle,
        j.verdict(),
        sentence(plan, j),
        readings(in, j.figures()),
        pull(in, j.figures()),
        setup(site, in, j, plan),
        keepOut(site, in, j),
        loads(in, j),
        crew(site, in, j.ground()),
        unsettled(j),
        j.notes(),
        Cautions.ALWAYS,
        notKnown,
        pictureFault == null ? picture(site) : pictureFault);
  }

  /** The setup's own sentence, behind the advice on the method where no setup will do. */
  private static String sentence(Plan plan, Judged j) {
    return NotByPulling.of(plan)
        .map(n -> n.sentence() + " This setup: " + j.sentence())
        .orElse(j.sentence());
  }

  private static List<Reading> readings(DisplayUnits in, Figures f) {
    return List.of(
        reading("HOLD in the back cut", in, u -> u.forceAtLeast(f.holdN())),
        reading("NEEDED to move it", in, u -> u.forceAtLeast(f.pullNeededN())),
        reading("PLAN FOR", in, u -> u.forceAtLeast(f.pullPlanN())),
        reading(
            "NEVER OVER" + (blank(f.ceilingPart()) ? "" : " (" + f.ceilingPart() + ")"),
            in,
            u -> u.forceAtMost(f.ceilingN())));
  }

  private static Reading reading(
      String name, DisplayUnits in, Function<DisplayUnits, String> shown) {
    DisplayUnits other = in == DisplayUnits.US ? DisplayUnits.METRIC : DisplayUnits.US;
    return new Reading(name, shown.apply(in), shown.apply(other));
  }

  private static List<Line> pull(DisplayUnits in, Figures f) {
    List<Line> lines = new ArrayList<>();
    if (Double.isNaN(f.pullPlanN())) {
      lines.add(new Line("Not worked out", "the tree cannot be moved this way"));
      return lines;
    }
    lines.add(
        new Line(
            "Source gives",
            in.forceAtMost(f.sourceLowN())
                + " at least, "
                + in.forceAtLeast(f.sourceHighN())
                + " at most"));
    lines.add(new Line("Pull margin", ratio(f.pullMargin()) + " = least it gives / plan for"));
    if (f.workingN() > f.pullPlanN()) {
      lines.add(
          new Line("Work at", in.forceAtLeast(f.workingN()) + ", the hold being the greater"));
    }
    if (Math.abs(f.sourceEndPerTree() - 1) > 0.005) {
      double k = f.sourceEndPerTree();
      lines.add(
          new Line(
              "At source end",
              "hauling: needed "
                  + in.forceAtLeast(k * f.pullNeededN())
                  + ", plan for "
                  + in.forceAtLeast(k * f.pullPlanN())));
    }
    if (Double.isFinite(f.stopReadingN())) {
      lines.add(
          new Line(
              f.leansOnStopReading() ? "STOP at reading" : "Stop reading",
              in.both(u -> u.forceAtMost(f.stopReadingN()))
                  + ", "
                  + f.stopReadingAt()
                  + (f.leansOnStopReading() ? ". The setup stands or falls with its reader" : "")));
    }
    lines.add(
        new Line(
            "Going when",
            in.length(f.lineInAtCommitM())
                + " of line is in from slack; back cut gapes "
                + in.smallLength(f.gapeM())
                + (f.runsOnStretch() ? "; on this soft line the line taken in tells little" : "")));
    lines.add(
        new Line(
            "Take in",
            in.length(f.takeUpM())
                + " at the tree, "
                + in.length(f.sourceTravelM())
                + " at the source"));
    String starts = starts(f.startsItself());
    if (!starts.isEmpty()) {
      lines.add(new Line("Held, no pull", starts));
    }
    return lines;
  }

  private static String starts(String word) {
    return switch (word) {
      case "no" -> "it does not start by itself";
      case "stops" -> "it moves a little by itself and stops";
      case "runs" -> "IT GOES BY ITSELF as soon as the hinge is ready: feller away first";
      default -> "";
    };
  }

  private static List<Line> setup(Site site, DisplayUnits in, Judged j, Plan plan) {
    Setup s = j.setup();
    CutPlan cut = site.cut();
    List<Line> lines = new ArrayList<>();
    lines.add(new Line("Lay", lay(site, s.layDeg())));
    lines.add(
        new Line(
            "Line",
            s.line()
                + ", on the tree at "
                + in.length(s.attachHeightM())
                + "; path "
                + in.length(j.figures().lineLengthM())));
    lines.add(
        new Line(
            "Cut",
            String.format(
                Locale.ROOT,
                "hinge %s, %s face %.0f°, %.2f of the diameter%s",
                in.smallLength(s.hingeThicknessM()),
                cut.face().said(),
                cut.faceOpeningDeg(),
                cut.faceFraction(),
                cut.wedges() ? ", wedges set" : "")));
    if (!s.redirects().isEmpty()) {
      lines.add(new Line("Block at", String.join(", then ", s.redirects())));
    }
    lines.add(new Line("Source", placed(s.source(), s.mode(), s.place())));
    gear(site, plan, s.source()).ifPresent(lines::add);
    if (s.driver() != null) {
      Setup.Driver d = s.driver();
      lines.add(new Line("Hauled by", placed(d.source(), d.mode(), d.place())));
      gear(site, plan, d.source()).ifPresent(lines::add);
    }
    lines.add(
        new Line(
            "Gusts",
            "planned to " + in.speed(site.conditions().gustMps().value()) + " at the crown"));
    return lines;
  }

  /** The first of what was entered of a source, in the source's own words. */
  private static Optional<Line> gear(Site site, Plan plan, String id) {
    Gear.Source source = site.source(id).orElseThrow();
    return Optional.ofNullable(plan.sources().get(source.plugin()))
        .map(
            d ->
                new Line(
                    id,
                    SourceText.firstNumber(
                        d, source.parameters(), Locale.ENGLISH, new Amounts(site.display()))));
  }

  private static String placed(String source, String mode, String place) {
    return source + (blank(mode) ? "" : ", " + mode) + ", at " + place;
  }

  private static List<Line> keepOut(Site site, DisplayUnits in, Judged j) {
    List<Line> lines = new ArrayList<>();
    Figures f = j.figures();
    if (!blank(f.clearanceTarget()) && Double.isFinite(f.clearanceM())) {
      lines.add(
          new Line(
              "Clears",
              f.clearanceTarget()
                  + (f.clearanceM() >= 0
                      ? " by " + in.length(f.clearanceM())
                      : " NOT: " + in.length(-f.clearanceM()) + " of it inside")));
    }
    if (j.ground() != null) {
      lines.add(
          new Line("People ring", in.length(j.ground().peopleRadiusM()) + " about the stump"));
      List<String> behind =
          site.targets().stream()
              .filter(t -> t.shape().geometry().intersects(j.ground().sitBack()))
              .map(t -> t.id() + (t.occupied() ? " (people)" : ""))
              .toList();
      lines.add(
          new Line(
              "If line or hinge is lost",
              behind.isEmpty()
                  ? "it falls into the sit-back zone; nothing drawn stands there"
                  : "it falls towards " + String.join(", ", behind) + ". No line stops it"));
    }
    return lines;
  }

  private static List<Line> crew(Site site, DisplayUnits in, Ground g) {
    List<Line> lines = new ArrayList<>();
    if (g == null) {
      return lines;
    }
    lines.add(
        new Line(
            "Clear before work",
            g.clearFirst().isEmpty()
                ? "nothing drawn in the people ring; look again, and ask at every door"
                : String.join(
                    "; ",
                    g.clearFirst().stream().map(c -> "[ ] " + c.id() + ": " + c.act()).toList())));
    lines.add(new Line("Who stands where", places(site, in, g)));
    return lines;
  }

  /** Number, role, distance and bearing of each standing place. */
  private static String places(Site site, DisplayUnits in, Ground g) {
    Position stump = site.tree().stump().at();
    return String.join(
        "; ",
        g.places().stream()
            .map(
                p ->
                    p.number()
                        + " "
                        + p.role().word()
                        + (p.role() == StandingPlace.Role.FELLER
                            ? ""
                            : " "
                                + in.length(stump.distanceTo(p.at()))
                                + " at "
                                + azimuth(stump.azimuthTo(p.at()))))
            .toList());
  }

  private static List<Load> loads(DisplayUnits in, Judged j) {
    List<Load> rows = new ArrayList<>();
    List<PartLoad> nearestFirst = new ArrayList<>(j.loads());
    nearestFirst.sort(Comparator.comparingDouble(SheetContent::reserve));
    for (PartLoad p : nearestFirst) {
      double allowed = p.strengthN() / p.designFactor();
      double last = p.strengthN() / p.lastFactor();
      rows.add(
          new Load(
              p.part(),
              in.forceAtLeast(p.atPlanN()),
              in.forceAtMost(allowed),
              p.atPlanN() > allowed,
              in.forceAtLeast(p.atHighN()),
              in.forceAtMost(last),
              p.atHighN() > last));
    }
    return rows;
  }

  private static double reserve(PartLoad p) {
    return p.strengthN() / Math.max(p.designFactor() * p.atPlanN(), p.lastFactor() * p.atHighN());
  }

  private static List<Unsettled> unsettled(Judged j) {
    return j.checks().stream()
        .filter(c -> c.verdict() != Verdict.WORKABLE)
        .sorted((a, b) -> b.verdict().compareTo(a.verdict()))
        .map(c -> new Unsettled(c.verdict(), text(c)))
        .toList();
  }

  private static String text(Check c) {
    String head = Double.isFinite(c.ratio()) ? c.id() + " " + ratio(c.ratio()) : c.id();
    return head + ": " + c.why();
  }

  private static String lay(Site site, double deg) {
    String out = azimuth(deg) + " true";
    Double declination = site.declinationDeg();
    return declination == null ? out : out + " (" + azimuth(deg - declination) + " magnetic)";
  }

  private static String azimuth(double deg) {
    long tenths = Math.floorMod(Math.round(deg * 10), 3600L);
    return tenths % 10 == 0
        ? String.format(Locale.ROOT, "%03d°", tenths / 10)
        : String.format(Locale.ROOT, "%05.1f°", tenths / 10.0);
  }

  private static String ratio(double r) {
    return Double.isNaN(r)
        ? "not known"
        : Double.isInfinite(r)
            ? "no pull asked"
            // never shown as more than it is
            : DisplayUnits.ratio(r);
  }

  private static String picture(Site site) {
    return site.picture() == null
        ? "Blank ground: no picture."
        : site.picture().layers().stream()
                .map(l -> picture(l, site.display().units()))
                .collect(Collectors.joining("; over it: ", "Picture: ", ""))
            + ". No survey.";
  }

  private static String picture(Picture.Layer l, DisplayUnits units) {
    return l.source()
        + ", taken "
        + Objects.requireNonNullElse(l.taken(), "on a date not known")
        + (l.shiftEastM() == 0 && l.shiftNorthM() == 0
            ? ""
            : ", moved " + PictureDate.moved(l, units));
  }

  private static boolean blank(String s) {
    return s == null || s.isBlank();
  }
}
