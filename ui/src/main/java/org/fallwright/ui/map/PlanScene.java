package org.fallwright.ui.map;

import java.util.EnumSet;
import java.util.Set;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.site.Site;
import org.fallwright.ui.text.Amounts;

/**
 * What a plan is to show.
 *
 * @param site what stands on the ground
 * @param chosen the setup drawn over it; null: none yet
 * @param amounts units of the labels
 * @param palette colours
 * @param ground what lies under everything
 * @param layers the parts shown
 */
public record PlanScene(
    Site site,
    Judged chosen,
    Amounts amounts,
    Palette palette,
    GroundPainter ground,
    Set<PlanLayer> layers) {
  public PlanScene {
    layers = Set.copyOf(layers);
  }

  /** All layers in day colours and the site's own units, without a picture. */
  public static PlanScene of(Site site, Judged chosen) {
    return new PlanScene(
        site,
        chosen,
        new Amounts(site.display()),
        Palette.DAY,
        GroundPainter.NONE,
        EnumSet.allOf(PlanLayer.class));
  }

  public PlanScene in(Amounts other) {
    return new PlanScene(site, chosen, other, palette, ground, layers);
  }

  public PlanScene in(Palette other) {
    return new PlanScene(site, chosen, amounts, other, ground, layers);
  }

  public PlanScene over(GroundPainter other) {
    return new PlanScene(site, chosen, amounts, palette, other, layers);
  }

  public PlanScene showing(Set<PlanLayer> others) {
    return new PlanScene(site, chosen, amounts, palette, ground, others);
  }

  boolean shows(PlanLayer layer) {
    return layers.contains(layer);
  }
}
