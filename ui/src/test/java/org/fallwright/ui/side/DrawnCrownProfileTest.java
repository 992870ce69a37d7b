package org.fallwright.ui.side;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.File;
import java.io.IOException;
import javax.imageio.ImageIO;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.demo.WeighedTree;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.Test;

class DrawnCrownProfileTest {
  @Test
  void aDrawnCrownHangsWhereItWasDrawnAndIsAsLarge() throws IOException {
    Site site = WeighedTree.SITE;
    ProfileTree tree = tree(site);
    // its middle is 4 m east and 3 m north of the stump; the lay is straight against the lean, 8°
    assertThat(tree.crownAlong(site.tree()))
        .isCloseTo(4 * Math.sin(Math.toRadians(8)) + 3 * Math.cos(Math.toRadians(8)), within(1e-9));
    // a circle as large as a square of 8 m
    assertThat(ProfileTree.crownRadius(site.tree()))
        .isCloseTo(8 / Math.sqrt(Math.PI), within(1e-9));
    BufferedImage image = new BufferedImage(920, 260, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(Color.WHITE);
    g.fillRect(0, 0, 920, 260);
    g.setFont(new Font(Font.DIALOG, Font.PLAIN, 12));
    new ProfilePainter(site, null, new Amounts(Site.Display.METRIC), Palette.DAY)
        .paint(g, new Rectangle2D.Double(10, 10, 900, 240));
    ImageIO.write(image, "png", new File("target/profile-crown-outline.png"));
  }

  @Test
  void aCrownThatWasNotDrawnHangsOnTheAxis() {
    Site site = DemoSite.asItIs().site();
    ProfileTree tree = tree(site);
    assertThat(tree.crownAlong(site.tree()))
        .isCloseTo(-(6 + 17.5) / 2 * Math.tan(Math.toRadians(5)), within(1e-9));
    assertThat(ProfileTree.crownRadius(site.tree())).isEqualTo(4.5);
  }

  private static ProfileTree tree(Site site) {
    return new ProfileTree(
        site, new LayPlane(site, 8), new Amounts(Site.Display.METRIC), Palette.DAY);
  }
}
