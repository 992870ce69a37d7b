package org.fallwright.core.plan;

import java.util.List;
import java.util.Optional;
import org.fallwright.core.line.LineFigures;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;

/**
 * Two pull lines joined end to end by a connector, named "L2 + L4" from the tree outwards.
 *
 * <p>It is as strong as the weaker of the two as rigged, and both stretch: 1/EA over the whole is
 * the sum of each one's share of length over its own EA. Geometry and springs in series.
 */
public final class JoinedLines {
  private static final String AND = " + ";

  private JoinedLines() {}

  /** Name of two lines joined. */
  static String name(Gear.Line first, Gear.Line second) {
    return first.id() + AND + second.id();
  }

  /** The lines of a setup from the tree outwards: one, or two that are joined. */
  public static List<Gear.Line> parts(Site site, String name) {
    Optional<Gear.Line> one = line(site, name);
    int at = name.indexOf(AND);
    while (one.isEmpty() && at > 0) {
      Optional<Gear.Line> first = line(site, name.substring(0, at));
      Optional<Gear.Line> second = line(site, name.substring(at + AND.length()));
      if (first.isPresent() && second.isPresent()) {
        return List.of(first.get(), second.get());
      }
      at = name.indexOf(AND, at + 1);
    }
    return List.of(one.orElseThrow());
  }

  /**
   * The line of a name, two joined as one.
   *
   * @param over the block that it runs over; null: none
   */
  static Gear.Line whole(Site site, String name, Gear.Block over) {
    List<Gear.Line> parts = parts(site, name);
    return parts.size() == 1 ? parts.get(0) : joined(name, parts.get(0), parts.get(1), over);
  }

  private static Gear.Line joined(String name, Gear.Line first, Gear.Line second, Gear.Block over) {
    LineFigures one = LineFigures.of(first, over);
    LineFigures two = LineFigures.of(second, over);
    Gear.Line weaker = one.strengthN() <= two.strengthN() ? first : second;
    double length = first.lengthM() + second.lengthM();
    double stiffness =
        length / (first.lengthM() / one.stiffnessN() + second.lengthM() / two.stiffnessN());
    return new Gear.Line(
        name,
        weaker.material(),
        weaker.diameterM(),
        length,
        weaker.breakingLoadN(),
        weaker.treeEnd(),
        weaker.sourceEnd(),
        weaker.bend(),
        weaker.wet(),
        weaker.weathered(),
        weaker.age(),
        stiffness,
        true);
  }

  private static Optional<Gear.Line> line(Site site, String id) {
    return site.gear().lines().stream().filter(l -> l.id().equals(id)).findFirst();
  }
}
