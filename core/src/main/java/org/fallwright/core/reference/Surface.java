package org.fallwright.core.reference;

import org.fallwright.core.units.Range;

/**
 * What tyres and boots do on one kind of ground in one state.
 *
 * @param key stable name of the ground
 * @param wet whether these are the figures for the wet state
 * @param name what it is called
 * @param tyreLow tyre grip taken where grip helps, pure number
 * @param tyreHigh tyre grip taken where more grip loads the parts, pure number (the dry row)
 * @param rolling rolling resistance of an undriven axle, share of its load
 * @param bootLow boot grip where it helps
 * @param bootHigh boot grip where more grip loads the parts (the dry row)
 * @param personLowN sustained pull of one person on this footing [N]
 * @param personHighN the strongest published pull for this footing [N] (the dry row)
 */
public record Surface(
    String key,
    boolean wet,
    String name,
    double tyreLow,
    double tyreHigh,
    double rolling,
    double bootLow,
    double bootHigh,
    double personLowN,
    double personHighN) {
  public Surface {
    Range.text("key", key);
    Range.text("name", name);
    Range.check("tyre_low", tyreLow, 0, 1.5, "");
    Range.check("tyre_high", tyreHigh, tyreLow, 1.5, "");
    Range.check("rolling", rolling, 0, 0.5, "");
    Range.check("boot_low", bootLow, 0, 1.5, "");
    Range.check("boot_high", bootHigh, bootLow, 1.5, "");
    Range.check("person_low_N", personLowN, 0, 1500, "N");
    Range.check("person_high_N", personHighN, personLowN, 1500, "N");
  }
}
