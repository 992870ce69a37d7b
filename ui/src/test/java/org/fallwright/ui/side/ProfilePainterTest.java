package org.fallwright.ui.side;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.Test;

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
