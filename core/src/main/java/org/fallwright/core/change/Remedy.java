package org.fallwright.core.change;

import java.util.List;
import java.util.stream.Collectors;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;

/**
 * One change, or two together, that make a setup work: made on the site and judged again.
 *
 * @param edits the changes, the second made on top of the first
 * @param verdict verdict after them
 * @param weakest id of the check that decides then
 * @param pullMargin pull margin then; infinite: no pull is needed
 * @param sentence the proposal in one sentence
 */
public record Remedy(
    List<Edit> edits, Verdict verdict, String weakest, double pullMargin, String sentence) {
  public Remedy {
    edits = List.copyOf(edits);
  }

  static Remedy of(List<Edit> edits, Judged after) {
    String what = edits.stream().map(Edit::what).collect(Collectors.joining(", and "));
    return new Remedy(
        edits,
        after.verdict(),
        after.weakest().id(),
        after.figures().pullMargin(),
        Character.toUpperCase(what.charAt(0))
            + what.substring(1)
            + ": then "
            + after.verdict().word()
            + ".");
  }

  /** The site with the changes made. */
  public Site site() {
    return edits.get(edits.size() - 1).site();
  }

  /** The setup with the changes made. */
  public Setup setup() {
    return edits.get(edits.size() - 1).setup();
  }
}
