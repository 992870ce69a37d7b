package org.fallwright.ui.map;

import org.fallwright.core.site.Picture;
import org.fallwright.core.site.Site;
import org.fallwright.ui.text.Messages;

/** When the picture under the plan was taken, as it stands on the plan itself. */
public final class PictureDate {
  private PictureDate() {}

  /**
   * @param shown whether the picture's file was found
   */
  public static String words(Site site, boolean shown) {
    Picture p = site.picture();
    if (p == null) {
      return Messages.text("plan.no-picture");
    }
    if (!shown) {
      return Messages.text("plan.picture-missing", p.file());
    }
    return p.taken() == null
        ? Messages.text("plan.picture-date.unknown")
        : Messages.text("plan.picture-date", p.taken());
  }
}
