package org.fallwright.ui.document;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Stream;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.site.Site;

/**
 * What the window shows: site, plan, the setup chosen and the units. Whoever draws listens, and is
 * told what changed.
 */
public final class OpenSite {
  /** What changed. */
  public enum Change {
    SITE,
    PLAN,
    PROGRESS,
    CHOICE,
    CHECK,
    UNITS
  }

  /** Told after each change. */
  @FunctionalInterface
  public interface Listener {
    void changed(Change change);
  }

  private final List<Listener> listeners = new ArrayList<>();
  private Path file;
  private Site site;
  private Plan plan;
  private Judged chosen;
  private Check check;
  private Site.Display display = Site.Display.US;
  private double progress = Double.NaN;
  private String failure;
  private Site.Display displayOnFile = Site.Display.US;
  private boolean changed;
  private Setup wanted;

  public void listen(Listener listener) {
    listeners.add(listener);
  }

  /** Opens a site: no plan yet, units as the site has them. */
  public void open(Path from, Site opened) {
    file = from;
    site = opened;
    display = opened.display();
    displayOnFile = display;
    changed = false;
    wanted = null;
    plan = null;
    chosen = null;
    check = null;
    failure = null;
    progress = Double.NaN;
    tell(Change.SITE);
  }

  /** The site with an edit that is not on file yet; its plan is no longer true. */
  public void edited(Site after) {
    wanted = chosen == null ? wanted : chosen.setup();
    site = after;
    changed = true;
    plan = null;
    chosen = null;
    check = null;
    tell(Change.SITE);
  }

  /** The site is on file as it is now. */
  public void saved(Path to) {
    file = to;
    changed = false;
    tell(Change.SITE);
  }

  /** Whether there are edits that are not on file. */
  public boolean changed() {
    return changed;
  }

  /** The site as it is to be written: other units on the screen are no edit. */
  public Optional<Site> toSave() {
    return site().map(s -> s.in(displayOnFile));
  }

  /** Planning has got so far, 0 to 1. */
  public void planning(double share) {
    progress = share;
    failure = null;
    tell(Change.PROGRESS);
  }

  /** Planning was stopped or could not be done; the reason, or null where it was stopped. */
  public void notPlanned(String reason) {
    progress = Double.NaN;
    failure = reason;
    tell(Change.PROGRESS);
  }

  /** A plan is there; its best setup is chosen, or after an edit the one looked at before. */
  public void planned(Plan made) {
    plan = made;
    progress = Double.NaN;
    failure = null;
    chosen =
        made.ranked().stream()
            .filter(j -> wanted != null && sameWay(j.setup(), wanted))
            .findFirst()
            .or(() -> made.ranked().stream().findFirst())
            .orElse(null);
    wanted = null;
    check = null;
    tell(Change.PLAN);
  }

  /** The same way to pull, be it with another line or lay. */
  private static boolean sameWay(Setup a, Setup b) {
    return a.source().equals(b.source())
        && a.mode().equals(b.mode())
        && a.place().equals(b.place())
        && a.redirects().equals(b.redirects())
        && Objects.equals(a.driver(), b.driver())
        && a.attachHeightM() == b.attachHeightM()
        && a.hingeThicknessM() == b.hingeThicknessM();
  }

  /** The same plan in other words: what was chosen stays chosen. */
  public void reworded(Site shown, Plan again) {
    Setup before = chosen == null ? null : chosen.setup();
    site = shown;
    plan = again;
    chosen =
        Stream.concat(again.ranked().stream(), again.bestRejected().values().stream())
            .filter(j -> j.setup().equals(before))
            .findFirst()
            .orElse(null);
    check = null;
    tell(Change.UNITS);
  }

  public void choose(Judged setup) {
    if (setup != chosen) {
      chosen = setup;
      check = null;
      tell(Change.CHOICE);
    }
  }

  /** Points out a check of the chosen setup; null: none. */
  public void point(Check at) {
    if (at != check) {
      check = at;
      tell(Change.CHECK);
    }
  }

  public void show(Site.Display units) {
    display = units;
    tell(Change.UNITS);
  }

  public Optional<Path> file() {
    return Optional.ofNullable(file);
  }

  public Optional<Site> site() {
    return Optional.ofNullable(site);
  }

  public Optional<Plan> plan() {
    return Optional.ofNullable(plan);
  }

  public Optional<Judged> chosen() {
    return Optional.ofNullable(chosen);
  }

  public Optional<Check> check() {
    return Optional.ofNullable(check);
  }

  public Site.Display display() {
    return display;
  }

  /** Share of the planning done, 0 to 1; NaN while none runs. */
  public double progress() {
    return progress;
  }

  /** Why there is no plan. */
  public Optional<String> failure() {
    return Optional.ofNullable(failure);
  }

  private void tell(Change change) {
    List.copyOf(listeners).forEach(l -> l.changed(change));
  }
}
