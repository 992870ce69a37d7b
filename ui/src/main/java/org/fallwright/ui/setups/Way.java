package org.fallwright.ui.setups;

import java.util.StringJoiner;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.Messages;

/** A setup in words. */
public final class Way {
  private Way() {}

  /** What pulls, from where, over what: "hand winch at A3 over A1". */
  public static String title(Setup s) {
    String words = Messages.text("way.at", s.source(), s.place());
    if (!s.redirects().isEmpty()) {
      StringJoiner over = new StringJoiner(", ");
      s.redirects().forEach(over::add);
      words = Messages.text("way.over", words, over.toString());
    }
    return s.driver() == null
        ? words
        : Messages.text("way.driven", words, s.driver().source(), s.driver().place());
  }

  /** Lay, height of the line and how the source is run. */
  public static String detail(Judged j, Amounts amounts) {
    Setup s = j.setup();
    String words =
        Messages.text(
            "way.detail",
            amounts.azimuth(s.layDeg()),
            amounts.length(s.attachHeightM()),
            amounts.small(s.hingeThicknessM()));
    return s.mode() == null || s.mode().isBlank()
        ? words
        : Messages.text("way.mode", words, s.mode());
  }

  /** A check's id as a name: first letter large. */
  public static String name(String checkId) {
    return checkId.isEmpty()
        ? checkId
        : Character.toUpperCase(checkId.charAt(0)) + checkId.substring(1);
  }
}
