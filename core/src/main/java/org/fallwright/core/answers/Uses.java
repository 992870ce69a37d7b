package org.fallwright.core.answers;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.plan.Setup;

/** The spots and anchors that a setup uses, and how it is called. */
final class Uses {
  private Uses() {}

  /** Redirects, the source's place and the driver's, in the order of the line. */
  static List<String> of(Setup s) {
    List<String> ids = new ArrayList<>(s.redirects());
    ids.add(s.place());
    if (s.driver() != null) {
      ids.add(s.driver().place());
    }
    return ids;
  }

  /** The setup in a few words: source, mode, place, redirects. */
  static String words(Setup s) {
    String over = s.redirects().isEmpty() ? "" : " over " + String.join(" and ", s.redirects());
    String hauled =
        s.driver() == null
            ? ""
            : " hauled by "
                + s.driver().source()
                + " ("
                + s.driver().mode()
                + ") at "
                + s.driver().place();
    return s.source() + " (" + s.mode() + ") at " + s.place() + over + hauled;
  }
}
