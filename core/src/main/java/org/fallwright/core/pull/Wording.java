package org.fallwright.core.pull;

import java.util.Locale;
import org.fallwright.core.units.Range;

/**
 * One thing said in two languages.
 *
 * @param english in English; one line of 1 to 400 characters
 * @param spanish the same in Spanish, in short known words, for it may be read aloud
 */
public record Wording(String english, String spanish) {
  /** Most characters of a text. */
  static final int MOST = 400;

  /**
   * Checks that each is one line, not blank and not too long.
   *
   * @throws IllegalArgumentException naming the field and what is asked of it
   */
  public Wording {
    sentence("english", english);
    sentence("spanish", spanish);
  }

  /**
   * What is said, in one language.
   *
   * @param language language of the reader; its country does not count
   * @return the Spanish where that is Spanish, else the English
   */
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
