package org.fallwright.core.kit;

import java.util.Locale;

/** Constants as words. */
final class Words {
  private Words() {}

  /** {@code EYE_SPLICE} is "eye splice"; anything else as it says itself. */
  static String of(Object value) {
    return value instanceof Enum<?> e
        ? e.name().toLowerCase(Locale.ROOT).replace('_', ' ')
        : value.toString();
  }
}
