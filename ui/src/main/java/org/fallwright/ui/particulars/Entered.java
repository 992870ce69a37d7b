package org.fallwright.ui.particulars;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.fallwright.core.site.Looked;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.Messages;

/**
 * What was entered: the field numbers with how each was got, what was looked for, and which of the
 * tool's own figures stand in for what nobody has stated.
 *
 * @param numbers the five numbers taken at the tree
 * @param looked each thing that must be looked for, with what the look brought
 * @param defaults names of the figures that the tool fills in
 */
public record Entered(List<Line> numbers, List<Line> looked, List<String> defaults) {
  /**
   * A line of the rail.
   *
   * @param note how it was got, or by whom
   * @param open whether something is still to be said
   */
  public record Line(String name, String value, String note, boolean open) {}

  public static Entered of(Site site, Amounts a) {
    SubjectTree t = site.tree();
    double girth = Math.PI * t.dbhM().value();
    List<Line> numbers = new ArrayList<>();
    numbers.add(
        line(
            "girth",
            Messages.text("entered.girth.value", a.small(girth), a.small(t.dbhM().value())),
            t.dbhM()));
    numbers.add(line("height", a.length(t.heightM().value()), t.heightM()));
    numbers.add(line("lean", a.angle(t.leanDeg().value()), t.leanDeg()));
    numbers.add(line("towards", a.azimuth(t.leanAzimuthDeg().value()), t.leanAzimuthDeg()));
    numbers.add(
        new Line(
            Messages.text("entered.line-at"),
            site.offer().attachHeightsM().stream().map(a::length).collect(Collectors.joining(", ")),
            Messages.of("how", site.offer().attachHow()),
            false));
    return new Entered(numbers, looked(site), defaults(site));
  }

  /** How many things are still to be said. */
  public long notSaid() {
    return looked.stream().filter(Line::open).count();
  }

  private static Line line(String key, String value, Quantity q) {
    return new Line(Messages.text("entered." + key), value, Messages.of("how", q.how()), false);
  }

  private static List<Line> looked(Site site) {
    List<Line> lines = new ArrayList<>();
    for (Looked.What what : Looked.What.values()) {
      Looked said = site.looked().stream().filter(l -> l.what() == what).findFirst().orElse(null);
      boolean open = said == null || said.found() == Looked.Found.NOT_LOOKED;
      lines.add(
          new Line(
              Messages.of("looked", what),
              Messages.of("found", open ? Looked.Found.NOT_LOOKED : said.found()),
              open || said.by() == null ? "" : said.by(),
              open));
    }
    return lines;
  }

  private static List<String> defaults(Site site) {
    SubjectTree t = site.tree();
    List<String> names = new ArrayList<>();
    missing(names, "stump-diameter", t.stumpDiameterM());
    if (t.sections() == null) {
      missing(names, "mass", t.massKg());
      missing(names, "mass-centre", t.massCentreM());
    }
    boolean inLine = t.crownOffsetM() == null && t.crownOutline() == null;
    missing(names, inLine ? "crown-share" : "crown-share-by-dbh", t.crownShare());
    missing(names, "crown-offset", t.crownOutline() == null ? t.crownOffsetM() : t.crownOutline());
    missing(names, "crown-area", t.crownAreaM2());
    missing(names, "shell", t.shellM());
    missing(names, "hinge-width", site.cut().hingeWidthM());
    missing(names, "wind-direction", site.conditions().windTowardDeg());
    missing(names, "slack", site.conditions().slackM());
    missing(names, "air", site.conditions().airDensity());
    return names;
  }

  private static void missing(List<String> names, String key, Object stated) {
    if (stated == null) {
      names.add(Messages.text("default." + key));
    }
  }
}
