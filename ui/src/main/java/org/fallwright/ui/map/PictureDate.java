package org.fallwright.ui.map;

import java.util.Locale;
import java.util.stream.Collectors;
import org.fallwright.core.site.Picture;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.ui.text.Messages;

/**
 * When the pictures under the plan were taken and where they come from, as it stands on the plan
 * itself.
 */
public final class PictureDate {
  private PictureDate() {}

  /**
   * @param fault what of the pictures is not drawn and why; null: nothing
   */
  public static String words(Site site, String fault) {
    return site.picture() == null
        ? Messages.text("plan.no-picture")
        : fault == null ? words(site) : fault;
  }

  private static String words(Site site) {
    return site.picture().layers().stream()
        .map(l -> one(l, site.display().units()))
        .collect(Collectors.joining(Messages.text("plan.picture-over")));
  }

  private static String one(Picture.Layer l, DisplayUnits units) {
    String words =
        l.taken() == null
            ? Messages.text("plan.picture-date.unknown", l.source())
            : Messages.text("plan.picture-date", l.taken(), l.source());
    return l.shiftEastM() == 0 && l.shiftNorthM() == 0
        ? words
        : Messages.text("plan.picture-moved", words, moved(l, units));
  }

  /** How far and which way a picture is moved. */
  public static String moved(Picture.Layer l, DisplayUnits units) {
    String distance = units.length(Math.hypot(l.shiftEastM(), l.shiftNorthM()));
    double towards = Math.toDegrees(Math.atan2(l.shiftEastM(), l.shiftNorthM()));
    return String.format(Locale.ROOT, "%s to %03.0f°", distance, (towards + 360) % 360);
  }
}
