package org.fallwright.core.revision;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.answers.FigureRow;
import org.fallwright.core.site.Revision;
import org.fallwright.core.site.Site;

/** The slip that goes with a revision: half a page to be kept with the sheet it replaces. */
public final class ChangeSlip {
  private static final int NAME = 24;
  private static final int WIDTH = 30;

  private ChangeSlip() {}

  /** The lines of the slip; a revision that was not recorded yet says so. */
  public static List<String> lines(Site site, Today today, Revision recorded) {
    List<String> all = new ArrayList<>();
    all.add("CHANGE SLIP · " + site.name());
    all.add(
        recorded == null
            ? "Revision " + today.letter() + ", not recorded: write its word only once it is."
            : "Revision "
                + recorded.letter()
                + " of "
                + recorded.at()
                + " replaces what was set before. Word: "
                + recorded.word()
                + ".");
    today.changed().forEach(c -> all.add("Changed: " + c + "."));
    all.add("");
    all.add(today.after().sentence());
    all.add("Was: " + today.before().sentence());
    if (today.worse()) {
      all.add(
          recorded == null
              ? "The verdict is worse: somebody must accept it by name."
              : "The verdict is worse; accepted by " + recorded.acceptedBy() + ".");
    }
    if (!today.works()) {
      all.add("STOP: do not pull as set.");
    }
    all.add("");
    all.add(row("", "was", "now"));
    for (FigureRow r : today.rows()) {
      all.add(row(r.name(), r.first(), r.second()));
    }
    return all;
  }

  private static String row(String name, String was, String now) {
    return String.format(Locale.ROOT, "%-" + NAME + "s %-" + WIDTH + "s %s", name, was, now)
        .stripTrailing();
  }
}
