package org.fallwright.ui.map;

import org.fallwright.core.site.Picture;
import org.fallwright.core.site.Site;
import org.fallwright.ui.text.Messages;

/** When the picture under the plan was taken, as it stands on the plan itself. */
public final class PictureDate {
  private PictureDate() {}

  public static String words(Site site) {
    Picture p = site.picture();
    if (p == null) {
      return Messages.text("plan.no-picture");
    }
    return p.taken() == null
        ? Messages.text("plan.picture-date.unknown")
        : Messages.text("plan.picture-date", p.taken());
  }
}
