package org.fallwright.ui.app;

import com.formdev.flatlaf.FlatDarkLaf;
import com.formdev.flatlaf.FlatLaf;
import com.formdev.flatlaf.FlatLightLaf;
import org.fallwright.ui.map.Palette;

/** The look of the window: day or dark, with our own accent, text sizes and spacing. */
public enum Look {
  DAY(Palette.DAY),
  DARK(Palette.DARK);

  private final Palette palette;

  Look(Palette palette) {
    this.palette = palette;
  }

  /** Colours of marks and of drawings on blank ground. */
  public Palette palette() {
    return palette;
  }

  public Look other() {
    return this == DAY ? DARK : DAY;
  }

  /** Puts the look in force, also in windows that are open; on the event thread. */
  public void use() {
    FlatLaf.registerCustomDefaultsSource(Look.class.getPackageName());
    if (this == DAY) {
      FlatLightLaf.setup();
    } else {
      FlatDarkLaf.setup();
    }
    FlatLaf.updateUI();
  }
}
