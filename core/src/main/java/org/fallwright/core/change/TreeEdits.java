package org.fallwright.core.change;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.advice.LineHeightRange;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.tree.StemTaper;

/** What can be changed at the tree and in the plan: lay, hinge, face, wedges, line height, wind. */
final class TreeEdits {
  /** Steps and ends of what is looked at; planning allowances. */
  private static final double LAY_STEP_DEG = 0.5;

  private static final int LAY_STEPS = 120;
  private static final double HINGE_STEP_M = 0.001;
  private static final double HINGE_LEAST_M = 0.005;
  private static final double HINGE_MOST_SHARE = 0.25;
  private static final double FACE_STEP_DEG = 5;
  private static final double HEIGHT_STEP_M = 0.25;
  private static final double GUST_STEP_MPS = 0.5;

  private final Edits e;

  private TreeEdits(Edits e) {
    this.e = e;
  }

  static List<Dial> dials(Edits e) {
    TreeEdits t = new TreeEdits(e);
    List<Dial> all = new ArrayList<>();
    for (int way : new int[] {-1, 1}) {
      all.add(new Dial(LAY_STEPS, 4, n -> t.lay(way * n * LAY_STEP_DEG)));
      all.add(new Dial(500, 4, n -> t.hinge(way * n * HINGE_STEP_M)));
      all.add(new Dial(400, 4, n -> t.height(way * n * HEIGHT_STEP_M)));
    }
    all.add(new Dial(22, 1, t::face));
    if (!e.site.cut().wedges()) {
      all.add(Dial.once(n -> t.wedges()));
    }
    all.add(new Dial(80, 2, t::wind));
    return all;
  }

  private Edit lay(double turn) {
    double lay = ((e.setup.layDeg() + turn) % 360 + 360) % 360;
    return e.planned(
        Kind.LAY,
        Math.abs(turn),
        "deg",
        String.format(
            Locale.ROOT,
            "turn the lay %.1f° to the %s, to %05.1f°",
            Math.abs(turn),
            turn < 0 ? "left" : "right",
            lay),
        e.setup.withLay(lay));
  }

  private Edit hinge(double by) {
    double t = e.setup.hingeThicknessM() + by;
    double most = HINGE_MOST_SHARE * StemTaper.stumpInsideBarkM(e.site.tree());
    if (t < HINGE_LEAST_M || t > most) {
      return null;
    }
    return e.planned(
        Kind.HINGE,
        Math.abs(by),
        "m",
        "leave the hinge "
            + e.in.smallLength(Math.abs(by))
            + (by < 0 ? " thinner, " : " thicker, ")
            + e.in.smallLength(t),
        e.setup.withHinge(t));
  }

  private Edit height(double by) {
    double h = e.setup.attachHeightM() + by;
    if (!LineHeightRange.Stem.of(e.site).takes(h)) {
      return null;
    }
    return e.planned(
        Kind.LINE_HEIGHT,
        Math.abs(by),
        "m",
        "set the line "
            + e.in.length(Math.abs(by))
            + (by < 0 ? " lower, at " : " higher, at ")
            + e.in.length(h),
        e.setup.withAttachHeight(h));
  }

  private Edit face(int n) {
    double open = e.site.cut().faceOpeningDeg() + n * FACE_STEP_DEG;
    return e.changed(
        Kind.FACE,
        n * FACE_STEP_DEG,
        "deg",
        String.format(Locale.ROOT, "open the face to %.0f°", open),
        Copy.with(e.site, "cut", Copy.with(e.site.cut(), "faceOpeningDeg", open)));
  }

  private Edit wedges() {
    return e.changed(
        Kind.WEDGES,
        1,
        "",
        "set wedges behind the tree so that it cannot sit back",
        Copy.with(e.site, "cut", Copy.with(e.site.cut(), "wedges", true)));
  }

  private Edit wind(int n) {
    Quantity gust = e.site.conditions().gustMps();
    double less = gust.high() - n * GUST_STEP_MPS;
    if (less < 0) {
      return null;
    }
    Site calmer =
        DayOf.withGust(
            e.site, gust.how() == How.RANGE ? Quantity.estimated(less) : gust.withValue(less));
    return e.changed(
        Kind.WIND,
        n * GUST_STEP_MPS,
        "m/s",
        "wait until gusts are no more than " + e.in.speed(less),
        calmer);
  }
}
