package org.fallwright.core.change;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import org.junit.jupiter.api.Test;

class DialTest {
  private static Edit edit(int n) {
    return new Edit(Kind.LAY, n, "", "turn by " + n, null, null);
  }

  private static Optional<Double> smallest(int most, int stride, int last, int enough) {
    return new Dial(most, stride, n -> n > last ? null : edit(n))
        .smallest(e -> e.amount() >= enough)
        .map(Edit::amount);
  }

  @Test
  void itFindsTheFirstStepThatWillDoWhateverTheStride() {
    for (int stride = 1; stride <= 7; stride++) {
      for (int enough = 1; enough <= 20; enough++) {
        assertThat(smallest(20, stride, 20, enough))
            .as("stride %d, enough %d", stride, enough)
            .contains((double) enough);
      }
      assertThat(smallest(20, stride, 20, 21)).isEmpty();
    }
  }

  @Test
  void itEndsWhereTheSiteCanTakeNoMore() {
    assertThat(smallest(20, 4, 0, 1)).isEmpty();
    assertThat(smallest(20, 1, 6, 6)).contains(6.0);
    assertThat(smallest(20, 1, 6, 7)).isEmpty();
  }

  @Test
  void whatARecordRefusesEndsItToo() {
    Dial d =
        new Dial(
            5,
            1,
            n -> {
              if (n > 2) {
                throw new IllegalArgumentException("too much");
              }
              return edit(n);
            });
    assertThat(d.smallest(e -> e.amount() >= 3)).isEmpty();
    assertThat(d.smallest(e -> e.amount() >= 2)).isPresent();
  }
}
