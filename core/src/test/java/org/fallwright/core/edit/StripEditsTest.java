package org.fallwright.core.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Strip;
import org.fallwright.core.store.SiteFile;
import org.junit.jupiter.api.Test;

/** A strip on the plan is changed like any other thing; its places go by its name. */
class StripEditsTest {
  private final Site site = site();

  private static Site site() {
    try (InputStream in = SiteFile.class.getResourceAsStream("sample-2.fallsite.json")) {
      Site site = SiteFile.read(in.readAllBytes(), "sample");
      Gear gear = site.gear();
      List<Gear.Source> sources =
          gear.sources().stream()
              .map(
                  s ->
                      s.id().equals("kite")
                          ? Copy.with(s, "places", List.of("V1", "Lane", "Lane 5 m"))
                          : s)
              .toList();
      return Copy.with(site, "gear", Copy.with(gear, "sources", sources));
    } catch (IOException e) {
      throw new IllegalStateException(e);
    }
  }

  private static List<String> places(Site site) {
    return site.source("kite").orElseThrow().places();
  }

  @Test
  void anotherNameIsFollowedByItsPlaces() {
    Site other = Edits.rename("Lane", "Drive").on(site);
    assertThat(other.strips()).extracting(Strip::id).containsExactly("Drive");
    assertThat(places(other)).containsExactly("V1", "Drive", "Drive 5 m");
    assertThat(Edits.rename("Drive", "Lane").on(other)).isEqualTo(site);
  }

  @Test
  void takenOffThePlanItsPlacesGoToo() {
    Site other = Edits.remove("Lane").on(site);
    assertThat(other.strips()).isEmpty();
    assertThat(places(other)).containsExactly("V1");
  }

  @Test
  void itsMiddleLineIsChangedLikeAnOutline() {
    Strip lane = site.strips().get(0);
    Site moved = Edits.move("Lane", 2, 1).on(site);
    assertThat(moved.strips().get(0).points().get(0))
        .isEqualTo(
            new Position(lane.points().get(0).eastM() + 2, lane.points().get(0).northM() + 1));
    Site more = Edits.addPoint("Lane", 1, new Position(20, 50)).on(site);
    assertThat(more.strips().get(0).points()).hasSize(lane.points().size() + 1);
    assertThat(Edits.removePoint("Lane", 1).on(more)).isEqualTo(site);
  }

  @Test
  void aPlaceInUseIsNotCutOffUnsaid() {
    Position first = site.strips().get(0).points().get(0);
    Strip level = Copy.with(site.strips().get(0), "groundToM", site.strips().get(0).groundFromM());
    Site shorter = Edits.removePoint("Lane", 2).on(Edits.enter(level).on(site));
    assertThatThrownBy(
            () ->
                Edits.point("Lane", 1, new Position(first.eastM(), first.northM() + 2)).on(shorter))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("names \"Lane 5 m\"; no anchor, spot or strip");
  }
}
