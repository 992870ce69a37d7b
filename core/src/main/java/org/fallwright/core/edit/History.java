package org.fallwright.core.edit;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.Range;

/**
 * A site with the changes made to it, that can be taken back and made again. Taking back gives the
 * very site that was there before; a new change forgets what had been taken back. Not safe for use
 * by several threads.
 */
public final class History {
  /** Changes remembered; the oldest are forgotten first. */
  public static final int REMEMBERED = 500;

  private final Deque<Step> made = new ArrayDeque<>();
  private final Deque<Step> takenBack = new ArrayDeque<>();
  private Site present;
  private Site saved;

  private record Step(Edit edit, Site before, Site after) {}

  /** A history that begins with a site as it is on disk. */
  public History(Site start) {
    present = Range.present("start", start);
    saved = start;
  }

  /** The site as it is now. */
  public Site present() {
    return present;
  }

  /**
   * Makes a change; one that changes nothing leaves no trace.
   *
   * @return whether the site is another now
   * @throws IllegalArgumentException one sentence; then nothing has changed
   */
  public boolean make(Edit edit) {
    Site after = edit.on(present);
    if (after.equals(present)) {
      return false;
    }
    made.push(new Step(edit, present, after));
    if (made.size() > REMEMBERED) {
      made.removeLast();
    }
    takenBack.clear();
    present = after;
    return true;
  }

  /** The change that would be taken back. */
  public Optional<Edit> last() {
    return Optional.ofNullable(made.peek()).map(Step::edit);
  }

  /** The change that would be made again. */
  public Optional<Edit> next() {
    return Optional.ofNullable(takenBack.peek()).map(Step::edit);
  }

  /** Takes the last change back; nothing happens where there is none. */
  public void takeBack() {
    if (!made.isEmpty()) {
      Step step = made.pop();
      takenBack.push(step);
      present = step.before;
    }
  }

  /** Makes the change again that was taken back last; nothing happens where there is none. */
  public void makeAgain() {
    if (!takenBack.isEmpty()) {
      Step step = takenBack.pop();
      made.push(step);
      present = step.after;
    }
  }

  /** The site as it is now is on disk. */
  public void saved() {
    saved = present;
  }

  /** Whether the site differs from what is on disk. */
  public boolean unsaved() {
    return !present.equals(saved);
  }
}
