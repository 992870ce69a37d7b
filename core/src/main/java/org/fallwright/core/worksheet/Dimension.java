package org.fallwright.core.worksheet;

import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.units.DisplayUnits.Measure;
import org.fallwright.core.units.DisplayUnits.Unit;
import org.fallwright.core.units.Units;

/**
 * What a line of a worksheet can be measured in, with the unit for each way of showing. Angles are
 * degrees in both, also where the program holds radians; the caller turns them.
 */
enum Dimension {
  NUMBER(new Unit("", 1), new Unit("", 1)),
  ANGLE(new Unit("°", 1), new Unit("°", 1)),
  FORCE(Measure.FORCE),
  LENGTH(Measure.LENGTH),
  SMALL_LENGTH(Measure.SMALL_LENGTH),
  MASS(Measure.MASS),
  SPEED(Measure.SPEED),
  MOMENT(Measure.MOMENT),
  STRESS(Measure.STRESS),
  AREA(Measure.AREA),
  VOLUME(new Unit("ft³", Units.CUBIC_FOOT), new Unit("m³", 1)),
  DENSITY(new Unit("lb/ft³", Units.POUND_PER_CUBIC_FOOT), new Unit("kg/m³", 1)),
  /** Force squared, under a root. */
  FORCE_SQUARED(
      new Unit("lbf²", Units.POUND_FORCE * Units.POUND_FORCE), new Unit("kN²", 1000.0 * 1000)),
  ANGLE_SQUARED(new Unit("°²", 1), new Unit("°²", 1)),
  STIFFNESS(new Unit("lbf/ft", Units.POUND_FORCE / Units.FOOT), new Unit("kN/m", 1000)),
  GIVE(new Unit("ft/lbf", Units.FOOT / Units.POUND_FORCE), new Unit("m/kN", 0.001)),
  MOMENT_PER_MASS(
      new Unit("lbf·ft/lb", Units.POUND_FORCE_FOOT / Units.POUND), new Unit("kN·m/kg", 1000));

  private final Unit us;
  private final Unit metric;

  Dimension(Unit us, Unit metric) {
    this.us = us;
    this.metric = metric;
  }

  Dimension(Measure m) {
    this(DisplayUnits.US.unit(m), DisplayUnits.METRIC.unit(m));
  }

  Unit in(DisplayUnits units) {
    return units == DisplayUnits.US ? us : metric;
  }
}
