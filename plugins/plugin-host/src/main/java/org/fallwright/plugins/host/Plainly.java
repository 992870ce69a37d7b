package org.fallwright.plugins.host;

/** Says what was thrown, in half a line. */
final class Plainly {
  private static final int MOST_CHARACTERS = 160;

  private Plainly() {}

  /** Kind of the innermost cause and the first line of its message. */
  static String said(Throwable thrown) {
    Throwable cause = thrown;
    for (int depth = 0; cause.getCause() != null && depth < 20; depth++) {
      cause = cause.getCause();
    }
    String kind = cause.getClass().getSimpleName();
    String message = messageOf(cause);
    return message.isEmpty() ? kind : kind + " (" + message + ")";
  }

  /** First line of a message, never long; a message that cannot be had is empty. */
  private static String messageOf(Throwable cause) {
    String message;
    try {
      message = cause.getMessage();
    } catch (RuntimeException | Error e) {
      return ""; // the exception itself comes from the plugin and may be broken too
    }
    String first = message == null ? "" : message.strip().lines().findFirst().orElse("");
    return brief(first);
  }

  /** The text, cut where it is long. */
  static String brief(String text) {
    return text.length() <= MOST_CHARACTERS ? text : text.substring(0, MOST_CHARACTERS) + "...";
  }
}
