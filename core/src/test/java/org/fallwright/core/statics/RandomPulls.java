package org.fallwright.core.statics;

import java.util.List;
import java.util.Random;
import org.fallwright.core.line.Point3;

/** Random, plausible pulls for tests of laws; the same for the same seed. */
final class RandomPulls {
  private RandomPulls() {}

  static PullCase next(Random r) {
    double height = between(r, 8, 35);
    double dbh = height / between(r, 25, 70);
    double stump = dbh * between(r, 0.98, 1.25);
    double lay = between(r, 0, 360);
    double lean = between(r, 0.5, 12);
    double away = lay + 180 + between(r, -40, 40);
    double attach = height * between(r, 0.35, 0.7);
    double face = between(r, 0.2, 0.33);
    double far = between(r, 0.8, 3) * height;
    double bearing = Math.toRadians(lay + between(r, -8, 8));
    return new PullCase(
        lay,
        new TreeBody(
            height,
            dbh,
            between(r, 0.15, 0.6),
            List.of(),
            stump,
            null,
            false,
            250 * dbh * dbh * height * between(r, 0.7, 2),
            height * between(r, 0.33, 0.48),
            lean,
            (away + 360) % 360,
            new Point3(between(r, -0.3, 0.3), between(r, -0.3, 0.3), 0)),
        new Wood(between(r, 32e6, 70e6), 0.16, between(r, 5e9, 11e9), 7e6, 22e6, 0.85),
        new CutMade(face, stump * between(r, 0.07, 0.13), null, 0.01, r.nextInt(4) == 0, 1),
        new Wind(
            between(r, 0, 8),
            r.nextBoolean() ? null : between(r, 0, 360),
            0.4,
            0,
            0.05 * height * height,
            height * 0.6,
            1.225),
        new LineSet(
            attach,
            List.of(
                new Point3(far * Math.sin(bearing), far * Math.cos(bearing), between(r, -2, 3))),
            List.of(between(r, 5e5, 8e6)),
            null,
            0.3),
        new Spread(0.15, 0.04 * height, 0.5, 5, 0.02, 0.16, 0.1, 0.4, 0.1, 0.1));
  }

  static double between(Random r, double least, double most) {
    return least + r.nextDouble() * (most - least);
  }
}
