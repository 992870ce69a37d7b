package org.fallwright.core.change;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Case;
import org.fallwright.core.site.Conditions;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.site.Strip;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.Wetness;

/** A site as it is on another day: wet or dry, bare or in leaf, calm or windy. */
public final class DayOf {
  private DayOf() {}

  /** The site on the day of a named case; what the case leaves open stays. */
  public static Site the(Case day, Site site) {
    Site s = withGround(site, day.ground());
    s = withAnchorSoil(s, day.anchorSoil());
    s = withGust(s, day.gustMps());
    SubjectTree t = s.tree();
    if (day.inLeaf() != null) {
      t = Copy.with(t, "inLeaf", day.inLeaf());
    }
    if (day.iceOrWet() != null) {
      t = Copy.with(t, "iceOrWet", day.iceOrWet());
    }
    s = Copy.with(s, "tree", t);
    return day.windTowardDeg() == null
        ? s
        : Copy.with(
            s, "conditions", Copy.with(s.conditions(), "windTowardDeg", day.windTowardDeg()));
  }

  /** With wet or dry ground at every spot and strip, parked vehicle and picket; null: as it is. */
  public static Site withGround(Site site, Wetness ground) {
    if (ground == null) {
      return site;
    }
    boolean wet = ground == Wetness.WET;
    List<Spot> spots = site.spots().stream().map(s -> Copy.with(s, "wet", wet)).toList();
    List<Anchor> anchors = new ArrayList<>();
    for (Anchor a : site.anchors()) {
      anchors.add(
          a instanceof Anchor.ParkedVehicle v
              ? Copy.with(v, "wet", wet)
              : a instanceof Anchor.Pickets p ? Copy.with(p, "wet", wet) : a);
    }
    List<Strip> strips = site.strips().stream().map(s -> Copy.with(s, "wet", wet)).toList();
    Site other = Copy.with(Copy.with(site, "spots", spots), "strips", strips);
    return Copy.with(other, "anchors", anchors);
  }

  /** With saturated or drained soil at every anchor tree and stump; null: as it is. */
  public static Site withAnchorSoil(Site site, Wetness soil) {
    if (soil == null) {
      return site;
    }
    boolean wet = soil == Wetness.WET;
    List<Anchor> anchors = new ArrayList<>();
    for (Anchor a : site.anchors()) {
      anchors.add(
          a instanceof Anchor.StandingTree t
              ? Copy.with(t, "saturated", wet)
              : a instanceof Anchor.Stump s ? Copy.with(s, "saturated", wet) : a);
    }
    return Copy.with(site, "anchors", anchors);
  }

  /** With another gust; null: as it is. */
  public static Site withGust(Site site, Quantity gust) {
    Conditions c = site.conditions();
    return gust == null ? site : Copy.with(site, "conditions", Copy.with(c, "gustMps", gust));
  }
}
