package org.fallwright.ui.sheet;

import java.awt.geom.Rectangle2D;
import org.fallwright.core.plan.Ground;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.LinePoint;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.ui.map.Viewport;
import org.locationtech.jts.geom.Envelope;

/** Chooses the part of the site that the sheet shows and its scale. */
final class MapScale {
  private static final int[] ROUND = {
    50, 100, 200, 250, 300, 400, 500, 600, 750, 1000, 1250, 1500, 2000, 2500, 5000, 10_000, 20_000
  };

  /** Room about what must be seen [m]. */
  private static final double ROOM_M = 2.5;

  private MapScale() {}

  /** A view with north up at the largest round scale that shows all that the setup concerns. */
  static Viewport view(Site site, Judged judged, Rectangle2D frame) {
    Envelope e = extent(site, judged);
    for (int scale : ROUND) {
      double metresPerPoint = scale / Paper.points(1000);
      if (e.getWidth() <= frame.getWidth() * metresPerPoint
          && e.getHeight() <= frame.getHeight() * metresPerPoint) {
        return Viewport.onPaper(new Position(e.centre().x, e.centre().y), scale, 0, frame);
      }
    }
    throw new IllegalArgumentException(
        "the setup reaches over more ground than a sheet can show at 1:" + ROUND[ROUND.length - 1]);
  }

  private static Envelope extent(Site site, Judged judged) {
    Envelope e = new Envelope();
    include(e, site.tree().stump().at());
    for (LinePoint p : judged.line()) {
      include(e, p.at());
    }
    for (LinePoint p : judged.haul()) {
      include(e, p.at());
    }
    Ground ground = judged.ground();
    if (ground != null) {
      e.expandToInclude(ground.footprint().getEnvelopeInternal());
      e.expandToInclude(ground.sitBack().getEnvelopeInternal());
      ground.escapes().forEach(p -> include(e, p));
    }
    e.expandBy(ROOM_M);
    return e;
  }

  private static void include(Envelope e, Position p) {
    e.expandToInclude(p.eastM(), p.northM());
  }
}
