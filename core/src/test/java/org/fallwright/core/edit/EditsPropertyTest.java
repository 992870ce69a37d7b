package org.fallwright.core.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.store.RandomSites;
import org.junit.jupiter.api.Test;

/** Laws of changes on random sites. The seed stands in each message. */
class EditsPropertyTest {
  private static final long SEED = 88;

  @Test
  void takingEverythingBackGivesTheSiteThatWas() {
    Random r = new Random(SEED);
    int made = 0;
    for (int i = 0; i < 150; i++) {
      Site start = new RandomSites(r.nextLong()).site();
      History history = new History(start);
      List<Site> states = new ArrayList<>(List.of(start));
      for (int k = 0; k < 25; k++) {
        try {
          if (history.make(random(history.present(), r, k))) {
            states.add(history.present());
          }
        } catch (IllegalArgumentException refused) {
          assertThat(refused.getMessage()).as("seed " + SEED).isNotBlank().doesNotContain("\n");
          assertThat(history.present()).isEqualTo(states.get(states.size() - 1));
        }
      }
      made += states.size() - 1;
      for (int k = states.size() - 1; k > 0; k--) {
        assertThat(history.present()).as("seed %d, site %d", SEED, i).isEqualTo(states.get(k));
        history.takeBack();
      }
      assertThat(history.present()).isEqualTo(start);
      assertThat(history.last()).isEmpty();
      for (int k = 1; k < states.size(); k++) {
        history.makeAgain();
        assertThat(history.present()).as("seed %d, site %d", SEED, i).isEqualTo(states.get(k));
      }
      assertThat(history.next()).isEmpty();
    }
    assertThat(made).as("seed " + SEED).isGreaterThan(1500);
  }

  @Test
  void movingThereAndBackAndTurningRoundLeaveEveryPointWhereItWas() {
    Random r = new Random(SEED + 1);
    for (int i = 0; i < 100; i++) {
      Site site = new RandomSites(r.nextLong()).site();
      Record thing = any(site, r);
      String id = Things.id(thing);
      Site moved = site;
      try {
        moved = Edits.move(id, -3.25, 7.5).on(moved);
        moved = Edits.turn(id, 130).on(moved);
        moved = Edits.turn(id, 230).on(moved);
        moved = Edits.move(id, 3.25, -7.5).on(moved);
      } catch (IllegalArgumentException farOut) {
        continue;
      }
      List<Position> before = Things.points(thing);
      List<Position> after = Things.points(Things.named(moved, id).orElseThrow());
      for (int k = 0; k < before.size(); k++) {
        assertThat(after.get(k).distanceTo(before.get(k)))
            .as("seed %d, site %d, %s", SEED + 1, i, id)
            .isCloseTo(0, within(1e-8));
      }
    }
  }

  @Test
  void aNewNameIsKnownEverywhereAndTheOldNowhere() {
    Random r = new Random(SEED + 2);
    for (int i = 0; i < 200; i++) {
      Site site = new RandomSites(r.nextLong()).site();
      String id = Things.id(any(site, r));
      Site named = Edits.rename(id, "quite new").on(site);
      assertThat(Things.named(named, id)).as("seed %d, site %d", SEED + 2, i).isEmpty();
      assertThat(Edits.rename("quite new", id).on(named)).isEqualTo(site);
    }
  }

  private static Record any(Site site, Random r) {
    List<Record> things = Things.of(site);
    return things.get(r.nextInt(things.size()));
  }

  private static Edit random(Site site, Random r, int k) {
    Record thing = any(site, r);
    String id = Things.id(thing);
    int index = r.nextInt(Things.points(thing).size() + 1);
    Position near = new Position(r.nextDouble() * 60 - 30, r.nextDouble() * 60 - 30);
    return switch (r.nextInt(8)) {
      case 0 -> Edits.move(id, r.nextGaussian(), r.nextGaussian());
      case 1 -> Edits.turn(id, r.nextDouble() * 360 - 180);
      case 2 -> Edits.point(id, index, near);
      case 3 -> Edits.addPoint(id, index, near);
      case 4 -> Edits.removePoint(id, index);
      case 5 -> thing instanceof SubjectTree ? Edits.move(id, 1, 1) : Edits.remove(id);
      case 6 -> Edits.copy(id, "copy " + k, 2, 2);
      default -> Edits.rename(id, "name " + k);
    };
  }
}
