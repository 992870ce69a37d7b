package org.fallwright.core.line;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.fallwright.core.outside.CheckValue;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Loads on blocks against the common rigging table and hand-worked figures. */
class LineReferenceTest {
  private static final String TABLE = "Common rigging table of redirects, 2 cos(angle/2)";

  /** Redirect multiplier to three decimals. */
  @ParameterizedTest
  @CsvSource({
    "0, 2.000",
    "15, 1.983",
    "30, 1.932",
    "45, 1.848",
    "60, 1.732",
    "75, 1.587",
    "90, 1.414",
    "105, 1.218",
    "120, 1.000",
    "135, 0.765",
    "150, 0.518",
    "165, 0.261",
    "180, 0.000"
  })
  void redirectMultiplier(double interior, double factor) {
    CheckValue.of(TABLE, "load over tension at " + interior + " deg", factor, "")
        .worked()
        .isMet(LegLoads.blockLoadN(1, 1, interior), 0.0005);
    double a = Math.toRadians(interior);
    if (interior > 0) {
      LegLoads path =
          LegLoads.of(
              List.of(
                  new Point3(10, 0, 0),
                  new Point3(0, 0, 0),
                  new Point3(20 * Math.cos(a), 0, 20 * Math.sin(a))),
              List.of(0.9));
      assertThat(path.blocks().get(0).holding()).isCloseTo(factor, within(0.0005));
      assertThat(path.blocks().get(0).interiorDeg()).isCloseTo(interior, within(1e-9));
    }
  }

  /** 10 kN at 60 degrees; with 9 kN in the other leg; 20 kN at 90, 120 and 60 degrees. */
  @ParameterizedTest
  @CsvSource({
    "10, 10, 60, 17.32",
    "10, 9, 60, 16.46",
    "20, 20, 90, 28.28",
    "20, 20, 120, 20.00",
    "20, 20, 60, 34.64"
  })
  void redirects(double first, double second, double interior, double load) {
    CheckValue.of(TABLE, first + " and " + second + " kN at " + interior + " deg", load, "kN")
        .worked()
        .isMet(LegLoads.blockLoadN(first, second, interior), 0.005);
  }
}
