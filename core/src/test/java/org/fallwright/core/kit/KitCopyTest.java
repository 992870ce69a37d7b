package org.fallwright.core.kit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.LeftBehind;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.KitFile;
import org.fallwright.core.store.SiteFile;
import org.junit.jupiter.api.Test;

/** A kit's things in a site: copied, left behind, and compared. */
class KitCopyTest {
  private static final Gear EMPTY =
      new Gear(List.of(), List.of(), List.of(), List.of(), null, List.of());

  private final Site site = SiteFile.read(Path.of("../ui/demo/oak-behind-the-house.fallsite.json"));
  private final Kit kit = KitFile.read(Path.of("../ui/demo/two-trucks.fallkit.json"));
  private final Site bare = site.withGear(EMPTY, null, List.of());

  KitCopyTest() throws IOException {}

  @Test
  void theDemoSiteHasTheGearOfTheDemoKit() {
    assertThat(Differences.of(site, kit)).isEmpty();
    assertThat(site.gear().items())
        .extracting(Gear.Item::id)
        .containsExactlyElementsOf(kit.items().stream().map(Gear.Item::id).toList());
    assertThat(site.kit()).isEqualTo("two-trucks.fallkit.json");
  }

  @Test
  void everythingIsCopiedAndAgrees() {
    Copied copied = Copied.of(bare, kit, "two-trucks.fallkit.json", List.of(), List.of("A1"));
    assertThat(copied.items()).hasSize(kit.items().size());
    assertThat(copied.notes()).isEmpty();
    assertThat(Differences.of(copied.site(), kit)).isEmpty();
    assertThat(copied.site().kit()).isEqualTo("two-trucks.fallkit.json");
    assertThat(copied.site().source("tackle").orElseThrow().drivers())
        .containsExactly("pickup", "crew");
    assertThat(copied.site().gear().lines()).isEqualTo(site.gear().lines());
  }

  @Test
  void aSourceAloneComesWithoutItsDriversAndSaysSo() {
    Copied copied = Copied.of(bare, kit, "k", List.of("tackle", "crew"), List.of());
    assertThat(copied.items()).containsExactly("crew", "tackle");
    assertThat(copied.site().source("tackle").orElseThrow().drivers()).containsExactly("crew");
    assertThat(copied.notes())
        .containsExactly(
            "crew has no place yet: until a spot or an anchor is named it pulls nothing.",
            "tackle is copied without its driver pickup, which is not taken.",
            "tackle has no place yet: until a spot or an anchor is named it pulls nothing.");
  }

  @Test
  void clashesAndUnknownNamesAreRefusedInOneSentence() {
    assertThatThrownBy(() -> Copied.of(site, kit, "k", List.of("L1"), List.of()))
        .hasMessage(
            "\"L1\" is in the site's gear already; name what else to take, or give one of the two"
                + " another name");
    assertThatThrownBy(() -> Copied.of(bare, kit, "k", List.of("L9"), List.of()))
        .hasMessageStartingWith("\"L9\" is not in the kit; it holds L1, L2, L3, Block");
    assertThatThrownBy(() -> Copied.of(bare, kit, "k", List.of("crew"), List.of("Z")))
        .hasMessage(
            "gear.sources.crew.places names \"Z\"; no anchor, spot or strip of that name is on the site");
    Gear cell =
        new Gear(
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            new Gear.LoadCell("old", 1000, 5, Gear.LoadCell.At.TREE_END),
            List.of());
    Site celled = site.withGear(cell, null, List.of());
    assertThatThrownBy(() -> Copied.of(celled, kit, "k", List.of("LC1"), List.of()))
        .hasMessage(
            "a site has one load cell, and this would be LC1 beside old; name what to take without"
                + " the others");
  }

  @Test
  void aDifferenceIsSaidInTheSitesUnits() {
    Gear.Line l = kit.lines().get(0);
    Gear.Line other =
        new Gear.Line(
            "L1",
            l.material(),
            0.014,
            75,
            110e3,
            null,
            l.sourceEnd(),
            l.bend(),
            l.wet(),
            true,
            l.age(),
            l.stiffnessN(),
            l.pullLine());
    Gear.Sling slings = kit.slings().get(0);
    Gear changed =
        new Gear(
            List.of(other),
            List.of(),
            List.of(
                new Gear.Sling(
                    "Slings",
                    slings.kind(),
                    slings.ratedLoadN(),
                    null,
                    null,
                    slings.hitch(),
                    null,
                    3)),
            List.of(),
            new Gear.LoadCell("Block", 1000, 5, Gear.LoadCell.At.TREE_END),
            List.of(site.source("crew").orElseThrow()));
    Site copy = site.withGear(changed, null, List.of()).in(Site.Display.METRIC);
    assertThat(Differences.of(copy, kit))
        .containsExactly(
            "L1: diameter is 14 mm on the site and 12 mm in the kit.",
            "L1: length is 75.0 m on the site and 80.0 m in the kit.",
            "L1: breaking load is 110 kN on the site and 120 kN in the kit.",
            "L1: tree end is not stated on the site and eye splice, 0.9, a choice of this scenario"
                + " in the kit.",
            "L1: weathered is yes on the site and no in the kit.",
            "Slings: count is 3 on the site and 2 in the kit.",
            "Block is another kind of thing in the kit.");
    assertThat(Differences.of(copy.in(Site.Display.US), kit))
        .contains("L1: length is 246 ft on the site and 262 ft in the kit.");
  }

  @Test
  void whatIsLeftBehindIsNotAtHandAndDrivesNothing() {
    Site left =
        site.leaving(new LeftBehind("pickup", null)).leaving(new LeftBehind("L1", "Truck 2"));
    assertThat(left.atHand().gear().items())
        .extracting(Gear.Item::id)
        .doesNotContain("pickup", "L1")
        .hasSize(site.gear().items().size() - 2);
    assertThat(left.atHand().source("tackle").orElseThrow().drivers()).containsExactly("crew");
    assertThat(left.gear()).isEqualTo(site.gear());
    assertThat(left.leaving(new LeftBehind("L1", null))).isEqualTo(left);
    assertThat(left.taking("L1").taking("pickup")).isEqualTo(site);
    assertThatThrownBy(() -> site.leaving(new LeftBehind("L9", null)))
        .hasMessage("left_behind names \"L9\"; nothing of that name is in the gear");
  }
}
