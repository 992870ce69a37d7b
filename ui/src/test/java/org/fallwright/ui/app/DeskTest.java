package org.fallwright.ui.app;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Component;
import java.awt.Container;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.File;
import java.util.HashSet;
import java.util.Set;
import java.util.function.Consumer;
import javax.imageio.ImageIO;
import javax.swing.JComponent;
import javax.swing.SwingUtilities;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.document.OpenSite;
import org.fallwright.ui.home.SiteMaps;
import org.fallwright.ui.map.PlanPainter;
import org.fallwright.ui.map.Viewport;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Envelope;

/** The regions of the window painted into an image: needs no display. */
class DeskTest {
  private final Site site = DemoSite.coarse(Site.Display.METRIC).site();
  private final Plan plan = DemoSite.coarse(Site.Display.METRIC).plan();
  private final OpenSite open = new OpenSite();

  @Test
  void everyRegionShowsSomethingInBothLooks() throws Exception {
    SwingUtilities.invokeAndWait(
        () -> {
          for (Look look : Look.values()) {
            Desk desk = desk(look);
            BufferedImage image = paint(desk, "desk-" + look);
            for (JComponent region : desk.regions()) {
              var at =
                  SwingUtilities.convertRectangle(region.getParent(), region.getBounds(), desk);
              assertThat(colours(image, at)).as(look + " " + region.getClass()).isGreaterThan(8);
              assertThat(region.getAccessibleContext().getAccessibleName()).isNotBlank();
            }
          }
        });
  }

  @Test
  void thePlanShowsAllOfTheSetup() throws Exception {
    SwingUtilities.invokeAndWait(
        () -> {
          Desk desk = desk(Look.DAY);
          paint(desk, "desk-fit");
          desk.fit();
          Viewport v = desk.plan().viewport();
          Envelope all = PlanPainter.extent(site, plan.ranked().get(0));
          var frame = v.frame();
          frame.setRect(-2, -2, frame.getWidth() + 4, frame.getHeight() + 4);
          assertThat(frame.contains(v.toPixel(all.getMinX(), all.getMinY()))).isTrue();
          assertThat(frame.contains(v.toPixel(all.getMaxX(), all.getMaxY()))).isTrue();
          double filled =
              Math.max(
                  v.pixels(all.getWidth()) / v.frame().getWidth(),
                  v.pixels(all.getHeight()) / v.frame().getHeight());
          assertThat(filled).as("as large as the frame lets it").isGreaterThan(0.95);
        });
  }

  @Test
  void anotherWayChangesPlanProfileAndAnswer() throws Exception {
    SwingUtilities.invokeAndWait(
        () -> {
          Desk desk = desk(Look.DAY);
          BufferedImage first = paint(desk, "desk-first");
          // the third falls another way; the second only pulls otherwise from the same anchor
          desk.ways().step(2);
          assertThat(open.chosen()).contains(plan.ranked().get(2));
          BufferedImage second = paint(desk, "desk-second");
          for (int i : new int[] {0, 2, 3}) {
            JComponent region = desk.regions().get(i);
            var at = SwingUtilities.convertRectangle(region.getParent(), region.getBounds(), desk);
            assertThat(differs(first, second, at)).as(region.getClass().toString()).isTrue();
          }
        });
  }

  private Desk desk(Look look) {
    look.use();
    Desk desk =
        new Desk(open, look, new StatusBar(() -> {}, () -> {}), new StartCard(() -> {}, () -> {}));
    open.open(null, site);
    desk.setSize(1500, 900);
    layOut(desk);
    desk.open(site, SiteMaps.Opened.NOTHING, null);
    open.planned(plan);
    layOut(desk);
    desk.fit();
    return desk;
  }

  private static BufferedImage paint(Desk desk, String name) {
    layOut(desk);
    BufferedImage image = new BufferedImage(1500, 900, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    desk.printAll(g);
    g.dispose();
    try {
      ImageIO.write(image, "png", new File("target/" + name + ".png"));
    } catch (java.io.IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
    return image;
  }

  /**
   * Without a display nothing validates by itself; twice, as wrapped text needs its width first.
   */
  private static void layOut(Component desk) {
    for (int i = 0; i < 2; i++) {
      each(desk, Component::invalidate);
      each(desk, Component::doLayout);
    }
  }

  private static void each(Component c, Consumer<Component> act) {
    act.accept(c);
    if (c instanceof Container box) {
      for (Component inner : box.getComponents()) {
        each(inner, act);
      }
    }
  }

  private static int colours(BufferedImage image, java.awt.Rectangle at) {
    Set<Integer> seen = new HashSet<>();
    var inside = at.intersection(new java.awt.Rectangle(0, 0, 1500, 900));
    for (int x = inside.x; x < inside.getMaxX(); x++) {
      for (int y = inside.y; y < inside.getMaxY(); y++) {
        seen.add(image.getRGB(x, y));
      }
    }
    return seen.size();
  }

  private static boolean differs(BufferedImage a, BufferedImage b, java.awt.Rectangle at) {
    for (int x = at.x; x < at.getMaxX(); x++) {
      for (int y = at.y; y < at.getMaxY(); y++) {
        if (a.getRGB(x, y) != b.getRGB(x, y)) {
          return true;
        }
      }
    }
    return false;
  }
}
