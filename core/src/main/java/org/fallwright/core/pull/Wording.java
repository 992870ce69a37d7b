package org.fallwright.core.pull;

import java.util.Locale;
import org.fallwright.core.units.Range;

/**
 * One thing said in two languages.
 *
 * @param english in English
 * @param spanish in Spanish, in short known words, for it may be read aloud
 */
public record Wording(String english, String spanish) {
  /** Most characters of a text. */
  static final int MOST = 400;

  public Wording {
    sentence("english", english);
    sentence("spanish", spanish);
  }

  /** The Spanish where the language asked for is Spanish, else the English. */
  public String in(Locale language) {
    return language.getLanguage().equals("es") ? spanish : english;
  }

  /** The text if it is not blank, of one line, and not too long. */
  static String sentence(String field, String text) {
    Range.present(field, text);
    if (text.length() > MOST || text.isBlank() || text.indexOf('\n') >= 0) {
      throw new IllegalArgumentException(
          field + " must be one line of 1 to " + MOST + " characters");
    }
    return text;
  }
}
