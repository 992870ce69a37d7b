package org.fallwright.ui.sheet;

import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2D;
import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2DFontTextDrawer;
import java.awt.Font;
import java.awt.Graphics2D;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.Calendar;
import java.util.GregorianCalendar;
import java.util.Locale;
import java.util.TimeZone;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.font.PDType0Font;

/** Pages of PDF with their typeface embedded; the same drawing gives the same bytes. */
final class PdfPages {
  private PdfPages() {}

  /** Draws one page. */
  @FunctionalInterface
  interface Painter {
    /**
     * @param page 0 for the first
     */
    void paint(Graphics2D g, int page);
  }

  /** The document. */
  static byte[] of(Paper paper, String title, int pages, Painter painter) throws IOException {
    try (PDDocument doc = new PDDocument()) {
      Calendar fixed = new GregorianCalendar(TimeZone.getTimeZone("UTC"), Locale.ROOT);
      fixed.setTimeInMillis(0);
      doc.setDocumentId(0L);
      doc.getDocumentInformation().setTitle(SheetFonts.printable(title));
      doc.getDocumentInformation().setProducer("Fallwright");
      doc.getDocumentInformation().setCreationDate(fixed);
      PdfBoxGraphics2DFontTextDrawer fonts = new PdfBoxGraphics2DFontTextDrawer();
      register(doc, fonts, SheetFonts.PLAIN, SheetFonts.PLAIN_FILE);
      register(doc, fonts, SheetFonts.BOLD, SheetFonts.BOLD_FILE);
      for (int i = 0; i < pages; i++) {
        PDPage page = new PDPage(new PDRectangle((float) paper.width(), (float) paper.height()));
        doc.addPage(page);
        PdfBoxGraphics2D g =
            new PdfBoxGraphics2D(doc, (float) paper.width(), (float) paper.height());
        g.setFontTextDrawer(fonts);
        painter.paint(g, i);
        g.dispose();
        try (PDPageContentStream stream = new PDPageContentStream(doc, page)) {
          stream.drawForm(g.getXFormObject());
        }
      }
      ByteArrayOutputStream out = new ByteArrayOutputStream();
      doc.save(out);
      return out.toByteArray();
    }
  }

  private static void register(
      PDDocument doc, PdfBoxGraphics2DFontTextDrawer fonts, Font font, String file)
      throws IOException {
    try (InputStream in = SheetFonts.open(file)) {
      fonts.registerFont(font.getFontName(), PDType0Font.load(doc, in, true));
    }
  }
}
