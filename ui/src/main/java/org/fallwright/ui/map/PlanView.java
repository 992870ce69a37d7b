package org.fallwright.ui.map;

import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.event.ComponentAdapter;
import java.awt.event.ComponentEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.Arrays;
import java.util.function.Consumer;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.tiles.LayeredGround;
import org.fallwright.ui.map.tile.OfflineTileFactory;
import org.fallwright.ui.text.Messages;
import org.jxmapviewer.JXMapViewer;
import org.jxmapviewer.input.PanMouseInputListener;
import org.jxmapviewer.input.ZoomMouseWheelListenerCursor;
import org.jxmapviewer.viewer.GeoPosition;
import org.locationtech.jts.geom.Envelope;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * The plan on screen: the map widget with tiles, or blank ground with a grid, under the plan
 * painter. Dragging pans, the wheel zooms about the pointer.
 */
public final class PlanView extends JXMapViewer {
  private static final Logger LOG = LoggerFactory.getLogger(PlanView.class);

  /** Distance over which the widget's own projection is taken as even [m]. */
  private static final double SPAN_M = 100;

  private final Offscreen offscreen = new Offscreen();
  private SiteFrame earth;
  private PlanScene scene;
  private Position flagged;
  private Palette palette = Palette.DAY;
  private Envelope wanted;
  private OfflineTileFactory picture;
  private String notOpened;
  private Runnable faulty = () -> {};
  private Consumer<Position> pointed = p -> {};

  public PlanView() {
    setTileFactory(new StretchedTiles(null, StretchedTiles.TILE));
    setRestrictOutsidePanning(true);
    setHorizontalWrapped(false);
    PanMouseInputListener pan = new PanMouseInputListener(this);
    addMouseListener(pan);
    addMouseMotionListener(pan);
    addMouseWheelListener(new ZoomMouseWheelListenerCursor(this));
    addMouseWheelListener(e -> wanted = null);
    addMouseMotionListener(
        new MouseAdapter() {
          @Override
          public void mouseMoved(MouseEvent e) {
            pointed.accept(place(e));
          }

          @Override
          public void mouseDragged(MouseEvent e) {
            wanted = null;
          }
        });
    addComponentListener(
        new ComponentAdapter() {
          @Override
          public void componentResized(ComponentEvent e) {
            if (wanted != null) {
              fit(wanted);
            }
          }
        });
    setOverlayPainter((g, map, w, h) -> overlay(g));
    getAccessibleContext().setAccessibleName(Messages.text("plan.name"));
  }

  /**
   * Shows a site on its pictures.
   *
   * @param tiles the pictures; null: blank ground. They are closed in the end
   * @param fault what of them could not be opened, in sentences; null: nothing
   */
  public void show(Site site, LayeredGround tiles, String fault) {
    close();
    notOpened = fault;
    earth = new SiteFrame(site.origin());
    if (tiles != null) {
      picture = new OfflineTileFactory(tiles);
      picture.addTileListener(t -> repaint());
      picture.onFault(
          () -> {
            faulty.run();
            repaint();
          });
    }
    setTileFactory(new StretchedTiles(picture, StretchedTiles.TILE));
    fit(PlanPainter.extent(site, null));
  }

  /** What of the pictures is not drawn and why, in sentences; null: nothing. */
  public String pictureFault() {
    return notOpened != null || picture == null
        ? notOpened
        : picture.fault().map(f -> Messages.text("plan.picture-damaged", f)).orElse(null);
  }

  /** Who is told when a part of the pictures cannot be read. */
  public void onFault(Runnable listener) {
    faulty = listener;
  }

  /** Lets the picture's file go. */
  public void close() {
    OfflineTileFactory old = picture;
    picture = null;
    if (old != null) {
      old.dispose();
      try {
        old.ground().orElseThrow().close();
      } catch (Exception e) {
        LOG.warn("Picture not closed", e);
      }
    }
  }

  /** Draws this scene from now on; null: nothing. */
  public void draw(PlanScene shown) {
    scene = shown;
    repaint();
  }

  /** Rings a place of the site; null: none. */
  public void flag(Position place) {
    flagged = place;
    repaint();
  }

  /** Colours of blank ground. */
  public void use(Palette ground) {
    palette = ground;
    setBackground(ground.paper());
    repaint();
  }

  /** Who is told the place under the pointer; null where there is none. */
  public void onPointed(Consumer<Position> listener) {
    pointed = listener;
  }

  /** Shows all of an area as large as the frame lets it, and again whenever the size changes. */
  public void fit(Envelope metres) {
    wanted = metres;
    if (earth == null || getWidth() == 0 || getHeight() == 0) {
      return;
    }
    LatLon middle = earth.toEarth(metres.centre().x, metres.centre().y);
    GeoPosition centre = new GeoPosition(middle.latDeg(), middle.lonDeg());
    setTileFactory(new StretchedTiles(picture, StretchedTiles.TILE));
    setZoom(0);
    setCenterPosition(centre);
    double wantedScale = Math.min(getWidth() / metres.getWidth(), getHeight() / metres.getHeight());
    double coarser = Math.log(viewport().pixelsPerMetre() / wantedScale) / Math.log(2);
    int zoom = Math.max(0, (int) Math.ceil(coarser));
    zoom = Math.min(zoom, getTileFactory().getInfo().getMaximumZoomLevel());
    double stretch = Math.max(1, Math.min(1.99, Math.pow(2, zoom - coarser)));
    setTileFactory(new StretchedTiles(picture, (int) (StretchedTiles.TILE * stretch)));
    setZoom(zoom);
    setCenterPosition(centre);
    repaint();
  }

  /** Shows all of an area if some of it is out of sight. */
  public void reveal(Envelope metres) {
    if (earth == null) {
      return;
    }
    Viewport view = viewport();
    Rectangle2D seen = view.frame();
    boolean all =
        seen.contains(view.toPixel(metres.getMinX(), metres.getMinY()))
            && seen.contains(view.toPixel(metres.getMaxX(), metres.getMaxY()));
    if (!all) {
      fit(metres);
    }
  }

  /** One zoom step nearer (1) or farther (-1), about the middle. */
  public void step(int nearer) {
    wanted = null;
    GeoPosition centre = getCenterPosition();
    setZoom(getZoom() - nearer);
    setCenterPosition(centre);
  }

  /** The view as it is now. */
  public Viewport viewport() {
    Rectangle seen = getViewportBounds();
    return Viewport.through(
        pixel(0, 0, seen),
        pixel(SPAN_M, 0, seen),
        pixel(0, SPAN_M, seen),
        SPAN_M,
        new Rectangle2D.Double(0, 0, getWidth(), getHeight()));
  }

  /** Whether a site is shown. */
  public boolean hasSite() {
    return earth != null;
  }

  @Override
  protected void drawMapTiles(Graphics g, int zoom, Rectangle seen) {
    g.setColor(palette.paper());
    g.fillRect(0, 0, getWidth(), getHeight());
    if (picture != null) {
      ((StretchedTiles) getTileFactory()).paint((Graphics2D) g, zoom, seen);
    } else if (earth != null) {
      grid((Graphics2D) g.create());
    }
  }

  private Point2D pixel(double east, double north, Rectangle seen) {
    LatLon p = earth.toEarth(east, north);
    Point2D world = getTileFactory().geoToPixel(new GeoPosition(p.latDeg(), p.lonDeg()), getZoom());
    return new Point2D.Double(world.getX() - seen.getX(), world.getY() - seen.getY());
  }

  private void grid(Graphics2D g) {
    Viewport view = viewport();
    double step = 10;
    while (view.pixels(step) < 40) {
      step *= 10;
    }
    Point2D low = view.toMetres(new Point2D.Double(0, getHeight()));
    Point2D high = view.toMetres(new Point2D.Double(getWidth(), 0));
    g.setColor(palette.faint());
    for (double e = Math.floor(low.getX() / step) * step; e <= high.getX(); e += step) {
      g.draw(new Line2D.Double(view.toPixel(e, low.getY()), view.toPixel(e, high.getY())));
    }
    for (double n = Math.floor(low.getY() / step) * step; n <= high.getY(); n += step) {
      g.draw(new Line2D.Double(view.toPixel(low.getX(), n), view.toPixel(high.getX(), n)));
    }
    g.dispose();
  }

  private void overlay(Graphics2D graphics) {
    if (scene == null || earth == null) {
      return;
    }
    Viewport view = viewport();
    graphics.setFont(getFont());
    offscreen.paint(
        graphics,
        getWidth(),
        getHeight(),
        Arrays.asList(scene, view.transform(), flagged, getFont(), pictureFault()),
        g -> drawing(g, view));
  }

  private void drawing(Graphics2D g, Viewport view) {
    new PlanPainter(scene).paint(g, view);
    Pen pen = new Pen(g, scene.palette().halo());
    double u = pen.unit();
    if (flagged != null) {
      pen.stroke(pen.disc(view.toPixel(flagged), 16), scene.palette().notWorkable(), 3);
    }
    Point2D corner = new Point2D.Double(getWidth() - 40 * u, 50 * u);
    NorthArrow.paint(pen, view, scene.site().declinationDeg(), scene.palette(), corner, 38);
    double base = getHeight() - 12 * u;
    ScaleBar.paint(pen, view, scene.amounts(), scene.palette(), 14 * u, base, 200 * u);
    String date = PictureDate.words(scene.site(), pictureFault());
    double left = getWidth() - pen.extent(date).getWidth() - 12 * u;
    pen.text(date, left, base, scene.palette().ink());
  }

  private Position place(MouseEvent e) {
    if (earth == null) {
      return null;
    }
    Point2D m = viewport().toMetres(e.getPoint());
    boolean far = Math.max(Math.abs(m.getX()), Math.abs(m.getY())) > Position.FARTHEST;
    return far ? null : new Position(m.getX(), m.getY());
  }
}
