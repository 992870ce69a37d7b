package org.fallwright.ui.text;

import java.text.MessageFormat;
import java.util.Locale;
import java.util.ResourceBundle;

/** The texts of the desktop, by key. A key that is not in the bundle is a fault of the program. */
public final class Messages {
  private static final ResourceBundle BUNDLE =
      ResourceBundle.getBundle("org.fallwright.ui.text.desktop", Locale.ENGLISH);

  private Messages() {}

  /**
   * The text of a key with its places {0}, {1} ... filled in; numbers must come as text already.
   */
  public static String text(String key, Object... arguments) {
    String pattern = BUNDLE.getString(key);
    return arguments.length == 0 && pattern.indexOf('\'') < 0
        ? pattern
        : new MessageFormat(pattern, Locale.ENGLISH).format(arguments);
  }

  /** Whether the bundle has a key. */
  public static boolean has(String key) {
    return BUNDLE.containsKey(key);
  }

  /** The text of a constant: its key is the group and the constant's name in lower case. */
  public static String of(String group, Enum<?> constant) {
    return text(group + "." + constant.name().toLowerCase(Locale.ROOT));
  }
}
