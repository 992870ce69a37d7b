package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * The day's conditions.
 *
 * @param gustMps gust at crown height [m/s]
 * @param windTowardDeg direction the wind blows towards [degrees]; null: not known
 * @param slackM slack and sag of the line to be taken in first [m]; null: the usual allowance
 * @param airDensity density of the air [kg/m³]; null: standard air
 */
public record Conditions(Quantity gustMps, Double windTowardDeg, Double slackM, Double airDensity) {
  public Conditions {
    Range.present("gust_mps", gustMps).within("gust_mps", 0, 40, "m/s");
    Range.checkOrNull("wind_toward_deg", windTowardDeg, 0, 360, "degrees");
    Range.checkOrNull("slack_m", slackM, 0, 20, "m");
    Range.checkOrNull("air_density", airDensity, 0.5, 1.6, "kg/m³");
  }
}
