package org.fallwright.core.site;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;

class CopyTest {
  private static final Place PLACE = new Place(new Position(1, 2), 3, Fix.TAPES, 0.4);

  @Test
  void onlyTheOneComponentChanges() {
    assertThat(Copy.with(PLACE, "groundM", 5.0))
        .isEqualTo(new Place(new Position(1, 2), 5, Fix.TAPES, 0.4));
    assertThat(Copy.with(PLACE, "statedErrorM", null).statedErrorM()).isNull();
    assertThat(PLACE.groundM()).isEqualTo(3);
  }

  @Test
  void whatTheRecordRefusesIsRefusedInItsWords() {
    assertThatThrownBy(() -> Copy.with(PLACE, "groundM", 99_000.0))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("ground_m is 99000 m; it must be from -500 to 9000 m");
  }

  @Test
  void aComponentThatIsNotThereIsRefused() {
    assertThatThrownBy(() -> Copy.with(PLACE, "colour", 1))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("Place has no component colour");
  }
}
