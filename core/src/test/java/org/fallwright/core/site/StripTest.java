package org.fallwright.core.site;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Places along a strip, by hand. */
class StripTest {
  private static final Position TREE = new Position(0, 0);

  private static Strip strip(double width, double step, boolean oneWay, Position... points) {
    return new Strip(
        "Lane",
        List.of(points),
        Fix.TAPES,
        null,
        1,
        3,
        width,
        step,
        oneWay,
        "grass",
        true,
        "owner");
  }

  @Test
  void itHasAPlaceAtEachStepNamedByItsDistance() {
    // 30 m north, then 10 m east: 40 m that rise 2 m
    List<Spot> places =
        strip(3, 12.5, true, new Position(5, 20), new Position(5, 50), new Position(15, 50))
            .places(TREE);
    assertThat(places)
        .extracting(Spot::id)
        .containsExactly("Lane 0 m", "Lane 12.5 m", "Lane 25 m", "Lane 37.5 m");
    Spot second = places.get(1);
    assertThat(second.place().at().northM()).isCloseTo(32.5, within(1e-9));
    assertThat(second.place().groundM()).isCloseTo(1 + 2 * 12.5 / 40, within(1e-12));
    assertThat(second.headingDeg()).isCloseTo(0, within(1e-9));
    assertThat(second.runOutM()).isCloseTo(27.5, within(1e-9));
    assertThat(second.gradeDeg()).isCloseTo(Math.toDegrees(Math.atan(2.0 / 40)), within(1e-12));
    Spot last = places.get(3);
    assertThat(last.place().at().eastM()).isCloseTo(12.5, within(1e-9));
    assertThat(last.place().at().northM()).isCloseTo(50, within(1e-9));
    assertThat(last.headingDeg()).isCloseTo(90, within(1e-9));
    assertThat(last.wet()).isTrue();
  }

  @Test
  void aWideOneHasRowsBesideItsMiddle() {
    List<Spot> places = strip(10, 5, false, new Position(0, 20), new Position(0, 29)).places(TREE);
    assertThat(places)
        .extracting(Spot::id)
        .containsExactly(
            "Lane 0 m, 5 m left",
            "Lane 0 m",
            "Lane 0 m, 5 m right",
            "Lane 5 m, 5 m left",
            "Lane 5 m",
            "Lane 5 m, 5 m right");
    assertThat(places.get(0).place().at().eastM()).isCloseTo(-5, within(1e-9));
    assertThat(places.get(2).place().at().eastM()).isCloseTo(5, within(1e-9));
    assertThat(places).allMatch(p -> p.headingDeg() == null && p.runOutM() == null);
  }

  @Test
  void aSlopeCountsAsRisingWhereItRisesAwayFromTheTree() {
    Position near = new Position(0, 20);
    Position far = new Position(0, 60);
    assertThat(strip(3, 10, false, near, far).places(TREE).get(1).gradeDeg()).isPositive();
    // drawn the other way round it rises towards the tree
    assertThat(strip(3, 10, false, far, near).places(TREE).get(1).gradeDeg()).isNegative();
    // one that is one-way is driven uphill whatever way it leads
    assertThat(strip(3, 10, true, far, near).places(TREE).get(1).gradeDeg()).isPositive();
  }

  @Test
  void tooManyPlacesAreRefused() {
    assertThatThrownBy(() -> strip(40, 0.5, false, new Position(0, 0), new Position(0, 100)))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("places is 16281; it must be from 1 to 500");
  }

  @Test
  void stepsTryBothEndsAndAListIsNotTriedTwice() {
    assertThat(new Steps(1, 2, 0.4).all()).containsExactly(1.0, 1.4, 1.8, 2.0);
    assertThat(new Steps(1, 1, 0.4).all()).containsExactly(1.0);
    assertThat(Steps.with(List.of(1.4, 7.0), new Steps(1, 2, 0.4)))
        .containsExactly(1.4, 7.0, 1.0, 1.8, 2.0);
  }
}
