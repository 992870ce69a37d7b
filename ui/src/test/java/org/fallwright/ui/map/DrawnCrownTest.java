package org.fallwright.ui.map;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.File;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import javax.imageio.ImageIO;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.demo.WeighedTree;
import org.junit.jupiter.api.Test;

/** What the plan draws by the entry and not by rule: a crown's outline, anchors set by hand. */
class DrawnCrownTest {
  private static final Rectangle2D FRAME = new Rectangle2D.Double(0, 0, 700, 700);

  @Test
  void theCrownIsDrawnByItsOutline() throws IOException {
    Site site = WeighedTree.SITE;
    Viewport view = Viewport.fitting(PlanPainter.extent(site, null), 0, FRAME);
    BufferedImage drawn = paint(site, view, Set.of(PlanLayer.TREE));
    ImageIO.write(drawn, "png", new File("target/plan-crown-outline.png"));
    BufferedImage plain = paint(DemoSite.asItIs().site(), view, Set.of(PlanLayer.TREE));
    Point2D corner = view.toPixel(23.7, 30.7);
    assertThat(white(drawn, corner)).isFalse();
    assertThat(white(plain, corner)).isTrue();
    Point2D outside = view.toPixel(13, 20);
    assertThat(white(drawn, outside)).isTrue();
    assertThat(white(plain, outside)).isFalse();
  }

  @Test
  void everyAnchorInTheGroundHasASymbolOfItsOwn() throws IOException {
    Site demo = DemoSite.asItIs().site();
    Viewport view = Viewport.fitting(PlanPainter.extent(demo, null), 0, FRAME);
    Point2D at = view.toPixel(14, 32);
    int x = (int) at.getX() - 12;
    int y = (int) at.getY() - 12;
    Map<String, String> kinds =
        Map.of(
            "rated",
            "\"breaking_load_N\": 50000, \"vouched_by\": \"owner\"",
            "pickets",
            "\"holdfast\": \"three-two-one\", \"count\": 1, \"soil\": \"undisturbed-loam\","
                + " \"wet\": false",
            "deadman",
            "\"depth_m\": 1.6, \"face_height_m\": 0.45, \"length_m\": 1.8, \"line_run\": 4,"
                + " \"soil\": \"loam\"",
            "two-legs",
            "\"first\": \"A1\", \"second\": \"A2\"");
    List<BufferedImage> symbols = new ArrayList<>();
    for (Map.Entry<String, String> kind : kinds.entrySet()) {
      BufferedImage i =
          paint(with(kind.getKey(), kind.getValue()), view, Set.of(PlanLayer.ANCHORS));
      ImageIO.write(i, "png", new File("target/anchor-" + kind.getKey() + ".png"));
      BufferedImage symbol = i.getSubimage(x, y, 24, 24);
      for (BufferedImage other : symbols) {
        assertThat(differing(symbol, other)).as(kind.getKey()).isGreaterThan(40);
      }
      symbols.add(symbol);
    }
  }

  private static Site with(String type, String particulars) {
    String anchor =
        "{\"type\": \"%s\", \"id\": \"X\", \"place\": {\"at\": [14, 32], \"ground_m\": 0.3, \"fix\":"
                .formatted(type)
            + " \"tapes\", \"stated_error_m\": null}, \"sling_height_m\": 0.1, \"rejected\": null,"
            + " \"land\": null, "
            + particulars
            + "}";
    return DemoSite.asItIs()
        .with(
            tree -> {
              try {
                ((ArrayNode) tree.get("anchors")).add(new ObjectMapper().readTree(anchor));
              } catch (JsonProcessingException e) {
                throw new IllegalArgumentException(e);
              }
            })
        .site();
  }

  private static BufferedImage paint(Site site, Viewport view, Set<PlanLayer> layers) {
    BufferedImage image = new BufferedImage(700, 700, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(Color.WHITE);
    g.fillRect(0, 0, 700, 700);
    g.setFont(new Font(Font.DIALOG, Font.PLAIN, 12));
    new PlanPainter(PlanScene.of(site, null).showing(layers)).paint(g, view);
    return image;
  }

  private static boolean white(BufferedImage image, Point2D at) {
    return image.getRGB((int) at.getX(), (int) at.getY()) == Color.WHITE.getRGB();
  }

  private static int differing(BufferedImage a, BufferedImage b) {
    int n = 0;
    for (int y = 0; y < a.getHeight(); y++) {
      for (int x = 0; x < a.getWidth(); x++) {
        n += a.getRGB(x, y) != b.getRGB(x, y) ? 1 : 0;
      }
    }
    return n;
  }
}
