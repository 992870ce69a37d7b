package org.fallwright.ui.sheet;

/** Sizes of paper, upright, in points. */
public enum Paper {
  LETTER(612, 792),
  A4(210 / Paper.MM, 297 / Paper.MM);

  /** Millimetres in a point. */
  private static final double MM = 25.4 / 72;

  private final double width;
  private final double height;

  Paper(double width, double height) {
    this.width = width;
    this.height = height;
  }

  /** Width [points]. */
  public double width() {
    return width;
  }

  /** Height [points]. */
  public double height() {
    return height;
  }

  /** A length on paper in points. */
  public static double points(double millimetres) {
    return millimetres / MM;
  }
}
