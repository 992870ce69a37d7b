package org.fallwright.core.site;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.fallwright.core.reference.Spreads;
import org.junit.jupiter.api.Test;

class QuantityTest {
  @Test
  void aRangeIsItsMiddleAndHalfItsWidth() {
    Quantity q = Quantity.range(4, 9);
    assertThat(q).isEqualTo(new Quantity(6.5, How.RANGE, 2.5));
    assertThat(q.low()).isEqualTo(4);
    assertThat(q.high()).isEqualTo(9);
    assertThat(Quantity.measured(6.5).low()).isEqualTo(6.5);
    assertThat(new Quantity(6.5, How.GUESSED, 2.5).high()).isEqualTo(6.5);
  }

  @Test
  void theEndsOfARangeStandWhereThe5thAnd95thPercentilesStand() {
    double sd = Spreads.of(Spreads.What.LEAN, Quantity.range(4, 9));
    assertThat(6.5 - 1.645 * sd).isCloseTo(4, within(1e-12));
    assertThat(6.5 + 1.645 * sd).isCloseTo(9, within(1e-12));
    assertThat(Spreads.massCentreM(Quantity.range(6, 8), 17.5)).isCloseTo(1 / 1.645, within(1e-12));
    // the least spread of a gust is for those that know one value only
    assertThat(Spreads.of(Spreads.What.GUST, Quantity.range(4, 4))).isZero();
  }

  @Test
  void aRangeWithoutItsWidthAndOneBeyondItsFieldAreRefused() {
    assertThatThrownBy(() -> new Quantity(5, How.RANGE, null))
        .hasMessage("plus_minus is null; it must be stated");
    assertThatThrownBy(() -> Quantity.range(-1, 9).within("lean_deg", 0, 45, "degrees"))
        .hasMessage("lean_deg is -1 degrees; it must be from 0 to 45 degrees");
    assertThatThrownBy(() -> Quantity.range(40, 46).within("lean_deg", 0, 45, "degrees"))
        .hasMessage("lean_deg is 46 degrees; it must be from 0 to 45 degrees");
    assertThat(Quantity.range(0, 45).within("lean_deg", 0, 45, "degrees").high()).isEqualTo(45);
  }
}
