package org.fallwright.core.store;

import java.io.IOException;

/**
 * A site or kit file that cannot be read or written. The message is one plain sentence for the
 * person at the screen: it begins with the file's name and says where, what, and what was expected.
 */
public final class SiteFileException extends IOException {
  private static final long serialVersionUID = 1;

  SiteFileException(String sentence) {
    this(sentence, null);
  }

  SiteFileException(String sentence, Throwable cause) {
    super(sentence.replaceAll("[\\p{Cntrl}\\u2028\\u2029]+", " "), cause);
  }
}
