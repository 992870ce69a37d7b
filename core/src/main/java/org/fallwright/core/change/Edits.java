package org.fallwright.core.change;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Offer;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;

/** Every change that can be tried on a setup, as dials in the order of their effort. */
final class Edits {
  final Site site;
  final Setup setup;
  final PullSources sources;
  final DisplayUnits in;

  Edits(Site site, Setup setup, PullSources sources) {
    this.site = site;
    this.setup = setup;
    this.sources = sources;
    in = site.display().units();
  }

  List<Dial> dials() {
    List<Dial> all = new ArrayList<>();
    all.addAll(OpenAnswers.dials(this));
    all.addAll(TreeEdits.dials(this));
    all.addAll(GearEdits.dials(this));
    all.addAll(PlaceEdits.dials(this));
    return all;
  }

  /** An edit of the setup alone. */
  Edit planned(Kind kind, double amount, String unit, String what, Setup other) {
    return made(kind, amount, unit, what, site, other);
  }

  /** An edit of the site alone. */
  Edit changed(Kind kind, double amount, String unit, String what, Site other) {
    return made(kind, amount, unit, what, other, setup);
  }

  private static Edit made(
      Kind kind, double amount, String unit, String what, Site site, Setup setup) {
    return new Edit(kind, amount, unit, what, offering(site, setup), setup);
  }

  /** The site with the setup's lay, line height and hinge among those on offer. */
  private static Site offering(Site site, Setup s) {
    Offer o = site.offer();
    Offer more = Copy.with(o, "attachHeightsM", with(o.attachHeightsM(), s.attachHeightM()));
    more = Copy.with(more, "laysDeg", with(o.laysDeg(), s.layDeg()));
    List<Double> hinges = with(site.cut().hingeThicknessesM(), s.hingeThicknessM());
    return Copy.with(
        Copy.with(site, "offer", more), "cut", Copy.with(site.cut(), "hingeThicknessesM", hinges));
  }

  private static List<Double> with(List<Double> list, double one) {
    Set<Double> all = new LinkedHashSet<>(list);
    all.add(one);
    return List.copyOf(all);
  }

  /** The ids of the spots and anchors that the setup uses. */
  List<String> places() {
    Set<String> ids = new LinkedHashSet<>(setup.redirects());
    ids.add(setup.place());
    if (setup.driver() != null) {
      ids.add(setup.driver().place());
    }
    return List.copyOf(ids);
  }
}
