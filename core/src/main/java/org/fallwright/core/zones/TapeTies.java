package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.TapeTie;
import org.fallwright.core.site.Target;

/**
 * What taped distances leave of the position error between the stump and a target.
 *
 * <p>A tape holds the error along itself to e = reading error + |taped − drawn|, and says nothing
 * across. Two tapes whose directions differ by θ hold it to sqrt(e1² + e2² + 2·e1·e2·|cos θ|)/sin
 * θ, the far corner of the parallelogram that both leave; less than 20° apart two count as one. The
 * best pair caps the sum of both position errors. Where a tape and the drawing disagree by more
 * than that sum and the reading error, the greatest disagreement counts instead.
 *
 * <p>Source: plane geometry. Leaves out that a target may be drawn turned.
 */
public final class TapeTies {
  private final Map<String, List<Read>> byTarget = new LinkedHashMap<>();
  private final Place stump;

  /** One tape as seen from the stump: its direction [rad], what it leaves along itself [m]. */
  private record Read(double azimuth, double along, double disagreesM, double readingM) {}

  /**
   * @param ties the site's tape ties; those between the tree and a target count
   * @param treeId id of the tree
   */
  public TapeTies(List<TapeTie> ties, String treeId, Place stump, List<Target> targets) {
    this.stump = stump;
    for (TapeTie t : ties) {
      boolean out = t.from().equals(treeId);
      if (!out && !t.to().equals(treeId)) {
        continue;
      }
      String other = out ? t.to() : t.from();
      targets.stream()
          .filter(g -> g.id().equals(other))
          .findFirst()
          .ifPresent(
              g -> {
                Position end = out ? t.toAt() : t.fromAt();
                Position start = out ? t.fromAt() : t.toAt();
                Position a = start == null ? stump.at() : start;
                Position b = end == null ? ((Shape.Circle) g.shape()).centre() : end;
                double off = Math.abs(t.distanceM() - a.distanceTo(b));
                byTarget
                    .computeIfAbsent(other, k -> new ArrayList<>())
                    .add(
                        new Read(
                            Math.toRadians(a.azimuthTo(b)), t.errorM() + off, off, t.errorM()));
              });
    }
  }

  /** Position error between the stump and a target [m]. */
  public double errorM(Target target) {
    double drawn = target.errorM() + stump.errorM();
    OptionalDouble against = disagreementM(target);
    if (against.isPresent()) {
      return Math.max(drawn, against.getAsDouble());
    }
    return Math.min(drawn, fixedM(target.id()));
  }

  /** How far a tape and the drawing disagree [m]; empty: no more than their errors allow. */
  public OptionalDouble disagreementM(Target target) {
    double drawn = target.errorM() + stump.errorM();
    return reads(target.id()).stream()
        .filter(r -> r.disagreesM > drawn + r.readingM)
        .mapToDouble(Read::disagreesM)
        .max();
  }

  /** Whether there are tapes to a target, but none of two that cross. */
  public boolean oneWayOnly(Target target) {
    return !reads(target.id()).isEmpty() && Double.isInfinite(fixedM(target.id()));
  }

  private List<Read> reads(String id) {
    return byTarget.getOrDefault(id, List.of());
  }

  /** What the best pair of tapes leaves [m]; infinite: no two cross. */
  private double fixedM(String id) {
    List<Read> all = reads(id);
    double best = Double.POSITIVE_INFINITY;
    double least = Math.sin(Math.toRadians(Allowances.TIE_ANGLE.value()));
    for (int i = 0; i < all.size(); i++) {
      for (int j = i + 1; j < all.size(); j++) {
        double apart = all.get(i).azimuth - all.get(j).azimuth;
        double sin = Math.abs(Math.sin(apart));
        if (sin >= least) {
          double p = all.get(i).along;
          double q = all.get(j).along;
          double far = Math.sqrt(p * p + q * q + 2 * p * q * Math.abs(Math.cos(apart))) / sin;
          best = Math.min(best, far);
        }
      }
    }
    return best;
  }
}
