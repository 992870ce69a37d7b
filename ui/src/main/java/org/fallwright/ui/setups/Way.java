package org.fallwright.ui.setups;

import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.Messages;

/** A setup in words. */
public final class Way {
  /** The mode of sources that know only one. */
  private static final String PLAIN = "pull";

  private Way() {}

  /** What pulls, from where, over what: "hand-winch at A3 over A1". */
  public static String title(Setup s) {
    String words = at(s.source(), s.mode(), s.place());
    if (!s.redirects().isEmpty()) {
      words = Messages.text("way.over", words, String.join(", ", s.redirects()));
    }
    return s.driver() == null
        ? words
        : Messages.text(
            "way.driven", words, at(s.driver().source(), s.driver().mode(), s.driver().place()));
  }

  private static String at(String source, String mode, String place) {
    return mode == null || mode.isBlank() || mode.equals(PLAIN)
        ? Messages.text("way.at", source, place)
        : Messages.text("way.at.mode", source, mode, place);
  }

  /** Lay, height of the line, hinge, and the line itself. */
  public static String detail(Judged j, Amounts amounts) {
    Setup s = j.setup();
    return Messages.text(
        "way.detail",
        amounts.azimuth(s.layDeg()),
        s.line(),
        amounts.length(s.attachHeightM()),
        amounts.small(s.hingeThicknessM()));
  }

  /** A check's id as a name: first letter large. */
  public static String name(String checkId) {
    return checkId.isEmpty()
        ? checkId
        : Character.toUpperCase(checkId.charAt(0)) + checkId.substring(1);
  }
}
