package org.fallwright.ui.map;

import java.awt.Graphics2D;
import org.fallwright.core.plan.Ground;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.locationtech.jts.geom.Envelope;

/**
 * Draws the plan of a site and of one setup on it into any graphics. Strokes, symbols and labels
 * take their size from the graphics' font; nothing outside the view's frame is painted.
 */
public final class PlanPainter {
  /** Room about everything, enough for a vehicle at an outer spot [m]. */
  private static final double ROOM_M = 6;

  private final PlanScene scene;

  public PlanPainter(PlanScene scene) {
    this.scene = scene;
  }

  /** Paints the plan; the graphics is left as it was. */
  public void paint(Graphics2D graphics, Viewport view) {
    Graphics2D g = (Graphics2D) graphics.create();
    try {
      g.clip(view.frame());
      if (scene.shows(PlanLayer.GROUND)) {
        Graphics2D under = (Graphics2D) g.create();
        scene.ground().paint(under, view);
        under.dispose();
      }
      Pen pen = new Pen(g, scene.palette().halo());
      Canvas canvas = new Canvas(scene, view, pen, new Labels(view.frame()));
      surroundings(canvas);
      Judged chosen = scene.chosen();
      if (chosen != null && chosen.ground() != null) {
        zones(canvas, chosen);
      }
      objects(canvas);
      if (scene.shows(PlanLayer.LABELS)) {
        canvas.labels().paint(pen);
      }
    } finally {
      g.dispose();
    }
  }

  private void surroundings(Canvas canvas) {
    if (scene.shows(PlanLayer.DROP_ZONES)) {
      TargetsPainter.dropZones(canvas);
    }
    if (scene.shows(PlanLayer.TARGETS)) {
      TargetsPainter.targets(canvas);
    }
  }

  private void zones(Canvas canvas, Judged chosen) {
    if (scene.shows(PlanLayer.SIT_BACK)) {
      ZonesPainter.sitBack(canvas, chosen);
    }
    if (scene.shows(PlanLayer.FOOTPRINT)) {
      ZonesPainter.footprint(canvas, chosen);
    }
    if (scene.shows(PlanLayer.PEOPLE_RING)) {
      ZonesPainter.peopleRing(canvas, chosen);
    }
    if (scene.shows(PlanLayer.BIGHTS)) {
      ZonesPainter.bights(canvas, chosen);
    }
    if (scene.shows(PlanLayer.HANG_UPS)) {
      CrewPainter.hangUps(canvas, chosen.ground());
    }
  }

  private void objects(Canvas canvas) {
    Judged chosen = scene.chosen();
    if (scene.shows(PlanLayer.WIRES)) {
      WiresPainter.wires(canvas);
    }
    if (scene.shows(PlanLayer.TREE)) {
      TreePainter.tree(canvas);
    }
    if (scene.shows(PlanLayer.SPOTS)) {
      SupportsPainter.spots(canvas);
    }
    if (scene.shows(PlanLayer.ANCHORS)) {
      SupportsPainter.anchors(canvas);
    }
    if (chosen != null && scene.shows(PlanLayer.WAYS_OUT)) {
      ZonesPainter.waysOut(canvas, chosen);
    }
    if (chosen != null && scene.shows(PlanLayer.LINE)) {
      LinePainter.setup(canvas, chosen);
    }
    Ground ground = chosen == null ? null : chosen.ground();
    if (ground != null && scene.shows(PlanLayer.CLEAR_FIRST)) {
      CrewPainter.clearFirst(canvas, ground);
    }
    if (scene.shows(PlanLayer.ANCHORS)) {
      SupportsPainter.marks(canvas);
    }
    if (ground != null && scene.shows(PlanLayer.STANDING_PLACES)) {
      CrewPainter.places(canvas, ground);
    }
  }

  /**
   * The area that shows a setup with its zones; without one, all anchors and spots of the site [m].
   */
  public static Envelope extent(Site site, Judged chosen) {
    Envelope e = new Envelope();
    double h = site.tree().heightM().value();
    var stump = site.tree().stump().at();
    e.expandToInclude(stump.eastM() - h, stump.northM() - h);
    e.expandToInclude(stump.eastM() + h, stump.northM() + h);
    Ground ground = chosen == null ? null : chosen.ground();
    if (ground == null) {
      site.anchors().forEach(a -> include(e, a.place().at()));
      site.spots().forEach(s -> include(e, s.place().at()));
    } else {
      e.expandToInclude(ground.footprint().getEnvelopeInternal());
      e.expandToInclude(ground.sitBack().getEnvelopeInternal());
      ground.bights().forEach(b -> e.expandToInclude(b.getEnvelopeInternal()));
      ground.bridles().forEach(b -> e.expandToInclude(b.getEnvelopeInternal()));
      chosen.line().forEach(p -> include(e, p.at()));
      chosen.haul().forEach(p -> include(e, p.at()));
    }
    e.expandBy(ROOM_M);
    return e;
  }

  private static void include(Envelope e, Position p) {
    e.expandToInclude(p.eastM(), p.northM());
  }
}
