package org.fallwright.ui.sheet;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/**
 * The one typeface of the sheet, DejaVu Sans Condensed: the same files are used for drawing and
 * embedded in the PDF, so that a page never depends on what the machine has installed.
 */
final class SheetFonts {
  private static final String FOLDER = "/net/sf/jasperreports/fonts/dejavu/";
  static final String PLAIN_FILE = FOLDER + "DejaVuSansCondensed.ttf";
  static final String BOLD_FILE = FOLDER + "DejaVuSansCondensed-Bold.ttf";
  static final Font PLAIN = load(PLAIN_FILE);
  static final Font BOLD = load(BOLD_FILE);

  private SheetFonts() {}

  static Font plain(double size) {
    return PLAIN.deriveFont((float) size);
  }

  static Font bold(double size) {
    return BOLD.deriveFont((float) size);
  }

  /** The file of a font. */
  static InputStream open(String file) {
    return SheetFonts.class.getResourceAsStream(file);
  }

  /**
   * The text with a question mark for each sign that the typeface does not have, and a space for
   * each control character: a name that a person typed must not break a page.
   */
  static String printable(String text) {
    StringBuilder b = new StringBuilder();
    text.codePoints()
        .forEach(
            c -> {
              if (Character.isWhitespace(c) || Character.isISOControl(c)) {
                b.append(' ');
              } else if (Character.getType(c) != Character.FORMAT) {
                b.appendCodePoint(PLAIN.canDisplay(c) ? c : '?');
              }
            });
    return b.toString();
  }

  private static Font load(String file) {
    try (InputStream in = open(file)) {
      return Font.createFont(Font.TRUETYPE_FONT, in);
    } catch (IOException e) {
      throw new UncheckedIOException("the sheet's typeface cannot be read", e);
    } catch (FontFormatException e) {
      throw new IllegalStateException("the sheet's typeface is damaged", e);
    }
  }
}
