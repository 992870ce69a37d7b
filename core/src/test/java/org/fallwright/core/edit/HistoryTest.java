package org.fallwright.core.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Path;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.site.Wire;
import org.fallwright.core.store.SiteFile;
import org.junit.jupiter.api.Test;

class HistoryTest {
  private final Site demo;
  private final History history;

  HistoryTest() throws IOException {
    demo = SiteFile.read(Path.of("../ui/demo/oak-behind-the-house.fallsite.json"));
    history = new History(demo);
  }

  @Test
  void aChangeIsMadeTakenBackAndMadeAgain() {
    assertThat(history.make(Edits.move("A1", 1, -2))).isTrue();
    assertThat(history.present().anchor("A1").orElseThrow().place().at())
        .isEqualTo(new Position(18.5, 51));
    assertThat(history.last().orElseThrow().kind()).isEqualTo(Edit.Kind.MOVE);
    assertThat(history.last().orElseThrow().what()).isEqualTo("A1");
    history.takeBack();
    assertThat(history.present()).isSameAs(demo);
    assertThat(history.next().orElseThrow().what()).isEqualTo("A1");
    history.makeAgain();
    history.make(Edits.turn("V1", 10));
    history.takeBack();
    history.make(Edits.turn("V2", 10));
    assertThat(history.next()).isEmpty();
  }

  @Test
  void aChangeThatChangesNothingLeavesNoTrace() {
    assertThat(history.make(Edits.move("House", 0, 0))).isFalse();
    assertThat(history.last()).isEmpty();
  }

  @Test
  void whatIsRefusedLeavesTheSiteAsItWas() {
    assertThatThrownBy(() -> history.make(Edits.move("A1", 1e5, 0)))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("east is");
    assertThatThrownBy(() -> history.make(Edits.remove("T1")))
        .hasMessage("T1 is the tree that the site is about; it cannot be removed");
    assertThatThrownBy(() -> history.make(Edits.remove("A99")))
        .hasMessage("nothing on the site has the name \"A99\"");
    assertThatThrownBy(() -> history.make(Edits.rename("A1", "Shed")))
        .hasMessageContaining("twice");
    assertThatThrownBy(() -> history.make(Edits.addPoint("A1", 0, new Position(0, 0))))
        .hasMessageContaining("no outline");
    assertThatThrownBy(() -> history.make(Edits.removePoint("House", 6)))
        .hasMessage("House has 6 points; there is no point number 7");
    assertThat(history.present()).isSameAs(demo);
    assertThat(history.last()).isEmpty();
  }

  @Test
  void aRemovedPlaceIsNamedNoMore() {
    history.make(Edits.remove("V1"));
    assertThat(history.present().spot("V1")).isEmpty();
    assertThat(history.present().source("pickup").orElseThrow().places()).containsExactly("V2");
    history.make(Edits.rename("A3", "spruce"));
    assertThat(history.present().source("hand-winch").orElseThrow().places())
        .contains("spruce")
        .doesNotContain("A3");
  }

  @Test
  void theCrownGoesWithItsTreeAndAWireGetsAPoleLikeItsNeighbour() {
    history.make(Edits.point("T1", 0, new Position(10, 20)));
    assertThat(history.present().tree().stump().at()).isEqualTo(new Position(10, 20));
    history.make(Edits.addPoint("W1", 1, new Position(43, 20)));
    Wire wire = history.present().wires().get(0);
    assertThat(wire.poles()).hasSize(4);
    assertThat(wire.poles().get(1).heightM()).isEqualTo(9.5);
  }

  @Test
  void whatDiffersFromTheDiskIsKnown() {
    assertThat(history.unsaved()).isFalse();
    Spot there = demo.spot("V2").orElseThrow();
    history.make(Edits.enter(Copy.with(there, "wet", false)));
    assertThat(history.unsaved()).isTrue();
    history.saved();
    assertThat(history.unsaved()).isFalse();
    history.takeBack();
    assertThat(history.unsaved()).isTrue();
    history.makeAgain();
    assertThat(history.unsaved()).isFalse();
  }

  @Test
  void somethingThatIsNoThingOnThePlanIsEnteredToo() {
    history.make(Edits.enter("rule set", "ruleSet", "DE-DGUV"));
    assertThat(history.present().ruleSet()).isEqualTo("DE-DGUV");
    assertThat(history.last().orElseThrow().kind()).isEqualTo(Edit.Kind.ENTER);
  }
}
