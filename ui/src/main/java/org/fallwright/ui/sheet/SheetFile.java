package org.fallwright.ui.sheet;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageTypeSpecifier;
import javax.imageio.ImageWriter;
import javax.imageio.metadata.IIOMetadata;
import javax.imageio.metadata.IIOMetadataNode;
import javax.imageio.stream.ImageOutputStream;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.site.Site;
import org.fallwright.ui.map.GroundPainter;

/**
 * The sheet of one setup as the bytes of a file. PDF and PNG are drawn by the same painter; the
 * same input gives the same bytes.
 */
public final class SheetFile {
  /** Pixels in an inch of the PNG. */
  public static final int DPI = 200;

  private final Paper paper;
  private final SheetPainter painter;
  private final String title;

  /**
   * @param paper size of the page
   * @param site the site planned
   * @param plan what was found
   * @param rank which setup; 1 is the best
   * @param ground the aerial picture; {@link GroundPainter#NONE}: none
   * @param pictureFault why the site's picture is not drawn, a sentence; null: it is, or there is
   *     none
   * @param program version of the program
   */
  public SheetFile(
      Paper paper,
      Site site,
      Plan plan,
      int rank,
      GroundPainter ground,
      String pictureFault,
      String program) {
    this.paper = paper;
    title = SheetFonts.printable(site.name());
    SheetContent content =
        SheetContent.of(site, plan, rank, program, pictureFault).map(SheetFonts::printable);
    painter = new SheetPainter(paper, site, plan.ranked().get(rank - 1), content, ground);
  }

  /** One page of PDF with its typeface embedded. */
  public byte[] pdf() throws IOException {
    return PdfPages.of(paper, title, 1, (g, i) -> painter.paint(g));
  }

  /** The page as a picture. */
  public BufferedImage picture() {
    double scale = DPI / 72.0;
    BufferedImage image =
        new BufferedImage(
            (int) Math.round(paper.width() * scale),
            (int) Math.round(paper.height() * scale),
            BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(Color.WHITE);
    g.fillRect(0, 0, image.getWidth(), image.getHeight());
    g.scale(scale, scale);
    painter.paint(g);
    g.dispose();
    return image;
  }

  /** The page as PNG that knows its size on paper. */
  public byte[] png() throws IOException {
    BufferedImage image = picture();
    ImageWriter writer = ImageIO.getImageWritersByFormatName("png").next();
    try {
      IIOMetadata about =
          writer.getDefaultImageMetadata(
              ImageTypeSpecifier.createFromRenderedImage(image), writer.getDefaultWriteParam());
      IIOMetadataNode root = new IIOMetadataNode("javax_imageio_png_1.0");
      IIOMetadataNode size = new IIOMetadataNode("pHYs");
      String perMetre = String.valueOf(Math.round(DPI / 0.0254));
      size.setAttribute("pixelsPerUnitXAxis", perMetre);
      size.setAttribute("pixelsPerUnitYAxis", perMetre);
      size.setAttribute("unitSpecifier", "meter");
      root.appendChild(size);
      about.mergeTree("javax_imageio_png_1.0", root);
      ByteArrayOutputStream out = new ByteArrayOutputStream();
      try (ImageOutputStream to = ImageIO.createImageOutputStream(out)) {
        writer.setOutput(to);
        writer.write(new IIOImage(image, null, about));
      }
      return out.toByteArray();
    } finally {
      writer.dispose();
    }
  }
}
