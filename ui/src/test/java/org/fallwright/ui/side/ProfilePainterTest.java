package org.fallwright.ui.side;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.List;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.map.Labels;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.map.Pen;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class ProfilePainterTest {
  private static final Rectangle2D FRAME = new Rectangle2D.Double(10, 10, 900, 240);
  private static final DemoSite DEMO = DemoSite.asItIs();
  private final Site site = DEMO.site();

  @Test
  void tipLineAndWireShowInTheirColours() {
    Judged east = DEMO.judge(DemoSite.ROW_8.withLay(88));
    BufferedImage image = paint(east, Site.Display.METRIC);
    assertThat(count(image, Palette.DAY.line())).isGreaterThan(400);
    assertThat(count(image, Palette.DAY.wire())).isGreaterThan(60);
    assertThat(count(image, Palette.DAY.lay())).isGreaterThan(200);
  }

  @Test
  void aLayThatCrossesNoWireShowsNone() {
    Judged north = DEMO.judge(DemoSite.ROW_6);
    assertThat(count(paint(north, Site.Display.METRIC), Palette.DAY.wire())).isZero();
  }

  @Test
  void withoutASetupTheTreeIsStillShown() {
    BufferedImage image = paint(null, Site.Display.US);
    assertThat(count(image, Palette.DAY.line())).isZero();
    assertThat(count(image, Palette.DAY.tree())).isGreaterThan(100);
  }

  @Test
  void nothingIsPaintedOutsideTheFrame() {
    BufferedImage image = paint(DEMO.judge(DemoSite.ROW_6), Site.Display.US);
    for (int x = 0; x < image.getWidth(); x++) {
      assertThat(image.getRGB(x, 5)).isEqualTo(Color.WHITE.getRGB());
      assertThat(image.getRGB(x, 255)).isEqualTo(Color.WHITE.getRGB());
    }
  }

  @ParameterizedTest
  @EnumSource(Site.Display.class)
  void whereTheDiameterIsMeasuredIsMarkedSquareToTheStem(Site.Display units) {
    BufferedImage image = new BufferedImage(700, 700, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(Color.WHITE);
    g.fillRect(0, 0, 700, 700);
    g.setFont(new Font(Font.DIALOG, Font.PLAIN, 12));
    Pen pen = new Pen(g, Palette.DAY.halo());
    Labels labels = new Labels(new Rectangle2D.Double(0, 0, 700, 700));
    // 100 pixels a metre, the ground at the stump at (350, 650)
    ProfileView view = new ProfileView(-3.5, 3.5, 350, 650, 100);
    Site leaning = DemoSite.asItIs().site().in(units);
    new ProfileTree(leaning, new LayPlane(leaning, 8), new Amounts(units), Palette.DAY)
        .paint(pen, view, labels);
    // it leans 5 degrees straight to the left: 1.3 m along the stem is 1.295 m up, 0.113 m left
    double lean = Math.toRadians(5);
    for (int side : new int[] {-1, 1}) {
      double off = side * (0.29 + 0.02);
      Point2D at =
          view.at(
              -1.3 * Math.sin(lean) + off * Math.cos(lean),
              1.3 * Math.cos(lean) + off * Math.sin(lean));
      assertThat(image.getRGB((int) at.getX(), (int) at.getY()))
          .as("side %d", side)
          .isEqualTo(Palette.DAY.ink().getRGB());
    }
    List<Labels.Placed> placed = labels.place(pen);
    assertThat(placed)
        .extracting(p -> p.label().text())
        .contains("DBH here, " + (units == Site.Display.US ? "4 ft 3 in" : "1.30 m"));
    for (Labels.Placed a : placed) {
      assertThat(placed).filteredOn(b -> b != a && b.box().intersects(a.box())).isEmpty();
    }
  }

  private BufferedImage paint(Judged j, Site.Display units) {
    BufferedImage image = new BufferedImage(920, 260, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(Color.WHITE);
    g.fillRect(0, 0, 920, 260);
    g.setFont(new Font(Font.DIALOG, Font.PLAIN, 12));
    new ProfilePainter(site, j, new Amounts(units), Palette.DAY).paint(g, FRAME);
    return image;
  }

  private static int count(BufferedImage image, Color c) {
    int n = 0;
    for (int y = 0; y < image.getHeight(); y++) {
      for (int x = 0; x < image.getWidth(); x++) {
        n += image.getRGB(x, y) == c.getRGB() ? 1 : 0;
      }
    }
    return n;
  }
}
