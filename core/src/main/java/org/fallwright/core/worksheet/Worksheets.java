package org.fallwright.core.worksheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;

/** Works out the worksheet of any setup, in the units that its site is shown in. */
public final class Worksheets {
  private Worksheets() {}

  /**
   * The worksheet of a setup.
   *
   * @throws IllegalArgumentException one sentence, where the site names what is not known
   */
  public static Worksheet of(Site site, Setup setup, PullSources sources) {
    Reckoned r = new Judge(site, sources).reckon(setup);
    DisplayUnits in = site.display().units();
    Workings w = new Workings(in);
    EnteredLines entered = new EnteredLines(w, site, r);
    entered.write();
    new TreeLines(w, site, r, entered.crownTerm()).write();
    PathLines path = new PathLines(w, r);
    path.write();
    Rises rises = new Rises(w, r.statics().worked().inputs());
    new ForceLines(w, r, rises, path).write();
    if (r.ratios() != null) {
      new StretchLines(w, r).write();
      new HoldLines(w, r, massStated(site.tree().massKg()), rises, path).write();
      new HingeLines(w, r, rises).write();
      new BlockLines(w, r).write();
      AnchorLines anchors = new AnchorLines(w, r);
      anchors.write();
      new PartLines(w, r, anchors.strengths()).write();
    }
    return w.finish(site.name() + ": " + title(setup, in), lead(), remarks(r), results(r, in));
  }

  /** Whether the person gave the mass a plus-or-minus of their own. */
  private static boolean massStated(Quantity mass) {
    return mass != null && mass.plusMinus() != null;
  }

  private static String title(Setup s, DisplayUnits in) {
    String over = s.redirects().isEmpty() ? "" : " over " + String.join(" and ", s.redirects());
    String hauled =
        s.driver() == null
            ? ""
            : ", hauled by "
                + s.driver().source()
                + " ("
                + s.driver().mode()
                + ") at "
                + s.driver().place();
    return String.format(
        Locale.ROOT,
        "lay %s°, line %s at %s, hinge %s, %s (%s) at %s%s%s",
        plain(s.layDeg()),
        s.line(),
        in.length(s.attachHeightM()),
        in.smallLength(s.hingeThicknessM()),
        s.source(),
        s.mode(),
        s.place(),
        over,
        hauled);
  }

  private static List<String> lead() {
    return List.of(
        "Each line can be repeated with a calculator set to degrees: the printed numbers give the"
            + " printed result to its last digit, and that rounded result goes on. So many digits only"
            + " serve to follow the sums; no tree is known that well.",
        "The spread is worked here one input at a time. A plan tries its leading setups over thousands"
            + " of ways the site may be, all inputs at once: its figures are a little greater then, and"
            + " they are the ones that count.",
        "Forces are at the tree, in the leg of the line that leaves it, unless another place is"
            + " named. ^ raises to a power, ln is the natural logarithm; all angles are in degrees.");
  }

  private static List<String> remarks(Reckoned r) {
    List<String> remarks = new ArrayList<>();
    remarks.add(r.judged().sentence());
    remarks.addAll(r.judged().notes());
    remarks.add(
        "Left out: shear and bending together in the hinge, the stem's own weight in its bending, what"
            + " slings, anchors and sag give, the tree's own roots before the cut.");
    return remarks;
  }

  private static List<Worksheet.Result> results(Reckoned r, DisplayUnits in) {
    return r.judged().checks().stream().map(c -> result(c, in)).toList();
  }

  private static Worksheet.Result result(Check c, DisplayUnits in) {
    return new Worksheet.Result(
        c.id(),
        c.unit().equals("N") ? in.forceAtMost(c.value()) : amount(c.value(), c.unit(), in),
        c.unit().equals("N") ? in.forceAtLeast(c.limit()) : amount(c.limit(), c.unit(), in),
        Double.isFinite(c.ratio()) ? String.format(Locale.ROOT, "%.2f", c.ratio()) : "–",
        c.verdict().word(),
        c.why());
  }

  private static String amount(double si, String unit, DisplayUnits in) {
    if (!Double.isFinite(si)) {
      return "–";
    }
    return switch (unit) {
      case "m" -> in.length(si);
      case "N·m" -> in.moment(si);
      case "deg" -> in.angle(Math.toRadians(si));
      default -> (plain(si) + " " + unit).strip();
    };
  }

  private static String plain(double x) {
    String s = String.format(Locale.ROOT, "%.3f", x);
    return s.replaceFirst("\\.?0+$", "");
  }
}
