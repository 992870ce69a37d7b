package org.fallwright.ui.sheet;

import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.rendering.PDFRenderer;
import org.apache.pdfbox.text.PDFTextStripper;
import org.apache.pdfbox.text.TextPosition;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.map.GroundPainter;

/** A sheet's page read back from its file: its texts, where they stand, and what was drawn. */
record PrintedPage(byte[] pdf) {
  private static final int DPI = 300;

  static PrintedPage of(Paper paper, DemoSite demo) throws IOException {
    return of(paper, demo.site(), demo.plan(), 1);
  }

  static PrintedPage of(Paper paper, Site site, Plan plan, int rank) throws IOException {
    return new PrintedPage(sheet(paper, site, plan, rank).pdf());
  }

  static SheetFile sheet(Paper paper, Site site, Plan plan, int rank) {
    return new SheetFile(paper, site, plan, rank, GroundPainter.NONE, null, "9.9.9");
  }

  /** A run of text with its box and size, in points. */
  record Words(String text, Rectangle2D box, float size) {}

  PDDocument open() throws IOException {
    return Loader.loadPDF(pdf);
  }

  /** All texts, blanks made even. */
  String text() throws IOException {
    try (PDDocument doc = open()) {
      return new PDFTextStripper().getText(doc).replaceAll("\\s+", " ");
    }
  }

  /** Millimetres on the paper of pixels of the page as {@link #drawn}. */
  static double millimetres(double pixels) {
    return pixels * 25.4 / DPI;
  }

  /** The row of pixels at a height in points. */
  static double row(double points) {
    return points * DPI / 72;
  }

  BufferedImage drawn() throws IOException {
    return drawn(DPI);
  }

  BufferedImage drawn(int dpi) throws IOException {
    try (PDDocument doc = open()) {
      return new PDFRenderer(doc).renderImageWithDPI(0, dpi);
    }
  }

  /** Runs of text with their boxes. */
  List<Words> words() throws IOException {
    List<Words> all = new ArrayList<>();
    try (PDDocument doc = open()) {
      PDFTextStripper stripper =
          new PDFTextStripper() {
            @Override
            protected void writeString(String text, List<TextPosition> places) {
              // the stripper joins neighbours on one line: part them by size and by gaps
              Words last = null;
              for (TextPosition p : places) {
                if (p.getUnicode().isBlank()) {
                  continue;
                }
                Rectangle2D box =
                    new Rectangle2D.Double(
                        p.getXDirAdj(),
                        p.getYDirAdj() - p.getHeightDir(),
                        p.getWidthDirAdj(),
                        p.getHeightDir());
                if (last != null
                    && Math.abs(last.size - p.getYScale()) < 0.01
                    && Math.abs(last.box.getMaxY() - box.getMaxY()) < 0.1
                    && Math.abs(box.getMinX() - last.box.getMaxX()) < 4) {
                  all.remove(all.size() - 1);
                  last = new Words(text, last.box.createUnion(box), last.size);
                } else {
                  last = new Words(text, box, p.getYScale());
                }
                all.add(last);
              }
            }
          };
      stripper.getText(doc);
    }
    return all;
  }

  /** Whether a pixel is about a colour. */
  static boolean near(int rgb, Color c) {
    Color p = new Color(rgb);
    return Math.abs(p.getRed() - c.getRed())
            + Math.abs(p.getGreen() - c.getGreen())
            + Math.abs(p.getBlue() - c.getBlue())
        < 60;
  }
}
