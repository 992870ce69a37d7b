package org.fallwright.core.plan;

import java.util.Optional;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;

/**
 * What the load cell bears where it sits, per newton at the tree; the reading is that times the
 * tension at the tree.
 *
 * @param place where it sits, in words
 * @param hauling while the line comes in, with the friction that is reckoned with
 * @param holding while it stands, without any
 */
public record CellLoad(String place, double hauling, double holding) {
  /**
   * The site's load cell in a setup; empty: there is none, or the setup has no such place.
   *
   * @param endPerTree tension at the source's line end per newton at the tree, hauling
   */
  public static Optional<CellLoad> of(Site site, Setup setup, double endPerTree, PullOffer offer) {
    Gear.LoadCell cell = site.gear().loadCell();
    if (cell == null) {
      return Optional.empty();
    }
    return Optional.ofNullable(
        switch (cell.at()) {
          case TREE_END -> new CellLoad("tree end of the pull line", 1, 1);
          case SOURCE_END -> new CellLoad("source end of the pull line", endPerTree, 1);
          case HAUL_PART -> haulPart(setup, endPerTree, offer).orElse(null);
          case ANCHOR ->
              site.anchor(setup.place()).isEmpty() || offer.anchorHolding() == 0
                  ? null
                  : new CellLoad(
                      "sling at " + setup.place(),
                      endPerTree * offer.anchorHauling(),
                      offer.anchorHolding());
        });
  }

  /** The haul part of a block system; empty: there is none. */
  public static Optional<CellLoad> haulPart(Setup setup, double endPerTree, PullOffer offer) {
    return setup.driver() == null
        ? Optional.empty()
        : Optional.of(
            new CellLoad(
                "haul part of the blocks",
                endPerTree * Math.abs(offer.anchorHauling() - 1),
                Math.abs(offer.anchorHolding() - 1)));
  }

  /** The least that it shows per newton at the tree: a ceiling read by it is never passed. */
  public double least() {
    return Math.min(hauling, holding);
  }
}
