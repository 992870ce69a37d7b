package org.fallwright.ui.cli;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Path;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.rendering.ImageType;
import org.apache.pdfbox.rendering.PDFRenderer;

/** A page of a document as a picture, 200 pixels an inch or as fine as the memory lets it. */
final class PdfPage {
  private static final double DPI = 200;

  private PdfPage() {}

  /**
   * @param page 1: the first
   */
  static BufferedImage read(Path file, int page) throws IOException {
    try (PDDocument document = Loader.loadPDF(file.toFile())) {
      int pages = document.getNumberOfPages();
      if (page < 1 || page > pages) {
        throw new IOException(file + " has pages 1 to " + pages + "; there is no page " + page);
      }
      PDRectangle size = document.getPage(page - 1).getCropBox();
      double inches = size.getWidth() / 72.0 * size.getHeight() / 72;
      double most = Math.sqrt(Runtime.getRuntime().maxMemory() / 16.0 / Math.max(inches, 1e-3));
      return new PDFRenderer(document)
          .renderImageWithDPI(page - 1, (float) Math.min(DPI, most), ImageType.RGB);
    } catch (IOException e) {
      throw e.getMessage() != null && e.getMessage().startsWith(file.toString())
          ? e
          : new IOException("document " + file + " is damaged or cannot be read", e);
    }
  }
}
