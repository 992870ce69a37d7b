package org.fallwright.ui.map;

import java.awt.Color;
import org.fallwright.core.plan.Verdict;

/**
 * The colours of plan, profile and marks. Every meaning has a shape or hatch of its own besides, so
 * a colour only adds.
 *
 * @param paper blank ground and background of the profile
 * @param ink text and neutral outlines
 * @param halo what lies around dark strokes and text so that they stand out on any picture
 * @param faint grids and help lines
 */
public record Palette(
    Color paper,
    Color ink,
    Color halo,
    Color faint,
    Color lay,
    Color footprint,
    Color sitBack,
    Color bight,
    Color line,
    Color wire,
    Color target,
    Color tree,
    Color wayOut,
    Color earth,
    Color workable,
    Color tight,
    Color notWorkable,
    Color cannotJudge) {

  /** Day colours; also those over an aerial picture, whatever the look of the window. */
  public static final Palette DAY =
      new Palette(
          new Color(0xF2F0E8),
          new Color(0x15202B),
          new Color(255, 255, 255, 225),
          new Color(0xCFCBBD),
          new Color(0x123C8C),
          new Color(0x123C8C),
          new Color(0x8E1B3F),
          new Color(0x7A3C00),
          new Color(0xBF3B00),
          new Color(0x5A2391),
          new Color(0x2B3440),
          new Color(0x1D5A2C),
          new Color(0x00614B),
          new Color(0x7A6A4F),
          new Color(0x12703F),
          new Color(0xA65300),
          new Color(0xB3182B),
          new Color(0x4A5563));

  /** Colours on dark panels. */
  public static final Palette DARK =
      new Palette(
          new Color(0x1E252B),
          new Color(0xE6EAEE),
          new Color(0x1E, 0x25, 0x2B, 225),
          new Color(0x3A444D),
          new Color(0x8FB4FF),
          new Color(0x8FB4FF),
          new Color(0xFF8FB0),
          new Color(0xE0A060),
          new Color(0xFF8A50),
          new Color(0xC9A2FF),
          new Color(0xC3CCD6),
          new Color(0x7FC894),
          new Color(0x5FD0B0),
          new Color(0xB5A27E),
          new Color(0x5CC98B),
          new Color(0xF0A550),
          new Color(0xFF7A85),
          new Color(0xA9B4C0));

  /** Black and greys for paper. */
  public static final Palette GREY =
      new Palette(
          Color.WHITE,
          Color.BLACK,
          new Color(255, 255, 255, 235),
          new Color(0xC8C8C8),
          Color.BLACK,
          Color.BLACK,
          new Color(0x333333),
          new Color(0x222222),
          Color.BLACK,
          new Color(0x222222),
          new Color(0x333333),
          new Color(0x444444),
          new Color(0x222222),
          new Color(0x777777),
          Color.BLACK,
          Color.BLACK,
          Color.BLACK,
          Color.BLACK);

  public Color of(Verdict verdict) {
    return switch (verdict) {
      case WORKABLE -> workable;
      case TIGHT -> tight;
      case NOT_WORKABLE -> notWorkable;
      case CANNOT_JUDGE -> cannotJudge;
    };
  }

  /** A colour let through to some share of 255. */
  public static Color clear(Color c, int alpha) {
    return new Color(c.getRed(), c.getGreen(), c.getBlue(), alpha);
  }
}
