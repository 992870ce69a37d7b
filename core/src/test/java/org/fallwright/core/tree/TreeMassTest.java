package org.fallwright.core.tree;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.fallwright.core.reference.Species;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.WeighedSection;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TreeMassTest {
  private static final Species OAK = SpeciesTable.of("northern-red-oak");
  private static final List<WeighedSection> PIECES =
      List.of(new WeighedSection(1200, 3), new WeighedSection(800, 7), new WeighedSection(500, 12));

  private static TreeFigures figures(SubjectTree tree) {
    return TreeFigures.of(tree, SampleTree.CUT, OAK);
  }

  private static TreeFigures of(
      List<WeighedSection> pieces, Double share, Position offset, Shape.Polygon outline) {
    return figures(SampleTree.crowned(pieces, share, offset, outline, true, false));
  }

  /**
   * Cone stumps between 0.617 m (0.58 / 0.94) at the cut, 0.52 at 1.3 m, 0.42 at 6 m, 0.30 at 10.5
   * m and the top: 1.7899 m³ with the 0.3 m below the cut; × 1,026 kg/m³ ÷ (1 − 0.2075), branches
   * and leaves of a hardwood of 52 cm: 2,317 kg. The equation gives 3,711 kg, which its 95th
   * percentile must reach.
   */
  @Test
  void aMassByTheStemsMeasuredDiameters() {
    TreeFigures f = figures(SampleTree.byStem(SampleTree.oak()));
    assertThat(f.massKg()).isCloseTo(1.78988 * 1026 / (1 - 0.207533), within(0.5));
    assertThat(f.massDerived()).isTrue();
    assertThat(f.massKg() + 1.645 * f.massOwnSdKg()).isGreaterThanOrEqualTo(3711 - 1);
    assertThat(f.remarks())
        .contains(
            "mass by the stem's measured diameters, green density and a crown of 21 % of it; a"
                + " crown with room about it is heavier",
            "by DBH and species it would be 3711 kg");
  }

  @Test
  void aStemWithNothingMeasuredAboveBreastHeightIsNotWeighedByIt() {
    SubjectTree t = SampleTree.oak();
    SubjectTree bare =
        SampleTree.byStem(SampleTree.oak(t.dbhM(), t.stumpDiameterM(), List.of(), null, null));
    assertThat(figures(bare).massKg()).isEqualTo(figures(t).massKg());
    assertThat(figures(bare).remarks())
        .contains(
            "no diameter was measured 4.4 m up the stem or higher, so the mass is not by the stem");
    SubjectTree entered =
        SampleTree.byStem(
            SampleTree.oak(
                t.dbhM(), t.stumpDiameterM(), t.diameters(), Quantity.measured(3000), null));
    assertThat(figures(entered).massKg()).isEqualTo(3000);
  }

  /** A measured mass is spread by 5 %, its centre by 2 % of the height. */
  @Test
  void weighedSectionsGiveMassAndMassCentre() {
    TreeFigures f = of(PIECES, null, null, null);
    assertThat(f.massKg()).isEqualTo(2500);
    assertThat(f.massCentreM()).isCloseTo(6.08, within(1e-12));
    assertThat(f.massDerived()).isFalse();
    assertThat(f.massSdKg()).isCloseTo(125, within(1e-9)).isEqualTo(f.massOwnSdKg());
    assertThat(f.massCentreSdM()).isCloseTo(0.35, within(1e-12));
    assertThat(f.remarks())
        .containsExactly(
            "mass and mass centre from 3 weighed sections",
            "mass of 2500 kg as entered; by DBH and species it would be 3711 kg");
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void theOrderOfTheSectionsIsNothing(long seed) {
    List<WeighedSection> turned = new ArrayList<>(PIECES);
    Collections.shuffle(turned, new Random(seed));
    SectionSum sum = SectionSum.of(turned);
    assertThat(sum.massKg()).as("seed %d", seed).isCloseTo(2500, within(1e-9));
    assertThat(sum.centreM()).as("seed %d", seed).isCloseTo(6.08, within(1e-12));
  }

  @Test
  void anEnteredMassFarFromTheEquationSaysSo() {
    SubjectTree t = SampleTree.oak();
    SubjectTree heavy =
        SampleTree.oak(
            t.dbhM(), t.stumpDiameterM(), List.of(), Quantity.measured(6000), Quantity.measured(7));
    assertThat(figures(heavy).massKg()).isEqualTo(6000);
    assertThat(figures(heavy).remarks())
        .containsExactly("mass of 6000 kg as entered; by DBH and species it would be 3711 kg");
  }

  /** Jenkins et al. 2003: 20 % of a hardwood of 52 cm are branches and leaves. */
  @Test
  void aOneSidedCrownShiftsTheMassByItsShare() {
    TreeFigures stated = of(null, 0.25, new Position(-0.4, 0.2), null);
    assertThat(stated.crownShiftM().eastM()).isCloseTo(-0.1, within(1e-12));
    assertThat(stated.crownShiftM().northM()).isCloseTo(0.05, within(1e-12));
    TreeFigures usual = of(null, null, new Position(-0.4, 0.2), null);
    double share = DryShares.of(true, 0.52).crown();
    assertThat(share).isBetween(0.20, 0.23);
    assertThat(usual.crownShiftM().eastM()).isCloseTo(-0.4 * share, within(1e-12));
    assertThat(usual.remarks()).contains("crown taken as 21 % of the mass, by DBH");
    assertThat(of(null, 0.25, null, null).crownShiftM()).isEqualTo(new Position(0, 0));
  }

  /**
   * Crown from 6 to 17.5 m, its middle 11.45 m above a cut at 0.3; at 5 degrees towards 188 the
   * axis is 1.002 m off the stump there. A crown drawn about that point has no offset; one drawn a
   * metre further east has a metre.
   */
  @Test
  void anOutlineCountsFromTheStemsAxisAndNotFromTheStump() {
    double off = 11.45 * Math.tan(Math.toRadians(5));
    assertThat(off).isCloseTo(1.002, within(5e-4));
    Position axis = new Position(16, 24).along(188, off);
    TreeFigures f = of(null, 0.25, null, round(axis, 4, 0));
    assertThat(f.crownShiftM().eastM()).isCloseTo(0, within(1e-9));
    assertThat(f.crownShiftM().northM()).isCloseTo(0, within(1e-9));
    TreeFigures aside = of(null, 0.25, null, round(axis.along(90, 1), 4, 0));
    assertThat(aside.crownShiftM().eastM()).isCloseTo(0.25, within(1e-9));
    assertThat(aside.remarks()).contains("crown 1.0 m off the stem's axis by its outline");
    assertThat(aside.massKg()).isEqualTo(f.massKg());
  }

  /** Turning an outline about a point turns its middle about it and leaves its area. */
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void aTurnedOutlineHasATurnedMiddle(long seed) {
    Random r = new Random(seed);
    Position about = new Position(16, 24);
    List<Position> points = new ArrayList<>();
    List<Position> turned = new ArrayList<>();
    double by = 360 * r.nextDouble();
    for (int i = 0; i < 9; i++) {
      double a = (i + 0.8 * r.nextDouble()) * 40;
      double far = 1 + 8 * r.nextDouble();
      points.add(about.along(a, far));
      turned.add(about.along(a + by, far));
    }
    CrownOutline one = CrownOutline.of(new Shape.Polygon(points));
    CrownOutline other = CrownOutline.of(new Shape.Polygon(turned));
    assertThat(other.areaM2()).as("seed %d", seed).isCloseTo(one.areaM2(), within(1e-9));
    Position expected =
        about.along(about.azimuthTo(one.middle()) + by, about.distanceTo(one.middle()));
    assertThat(other.middle().distanceTo(expected)).as("seed %d", seed).isLessThan(1e-9);
  }

  /** Jenkins et al. 2003: at 52 cm the leaves of a hardwood are 1.89 % of its dry mass. */
  @Test
  void aBareBroadleafIsLessItsLeaves() {
    TreeFigures leafy = figures(SampleTree.crowned(null, null, null, null, true, false));
    TreeFigures bare = figures(SampleTree.crowned(null, null, null, null, false, false));
    assertThat(bare.massKg() / leafy.massKg()).isCloseTo(1 - 0.0189, within(5e-5));
    assertThat(bare.remarks()).contains("bare: its leaves, 1.9 %, are off");
    TreeFigures weighed = figures(SampleTree.crowned(PIECES, null, null, null, false, false));
    assertThat(weighed.massKg()).isEqualTo(2500);
  }

  /** 0.25 of crown and a factor of 1.25: 1.0625 of 2,500 kg; the crown's middle is at 11.75 m. */
  @Test
  void iceOrWetMakesTheCrownHeavier() {
    TreeFigures f = figures(SampleTree.crowned(PIECES, 0.25, new Position(1, 0), null, true, true));
    assertThat(f.massKg()).isCloseTo(2656.25, within(1e-9));
    assertThat(f.massCentreM()).isCloseTo((6.08 + 0.0625 * 11.75) / 1.0625, within(1e-12));
    assertThat(f.crownShiftM().eastM()).isCloseTo(0.3125 / 1.0625, within(1e-12));
    assertThat(f.massSdKg() / f.massKg()).isCloseTo(0.05, within(1e-12));
    assertThat(f.remarks())
        .contains(
            "ice, snow or rain on the crown: its mass taken 1.25 times, the tree's 1.06 times;"
                + " glaze can be far more");
  }

  @Test
  void whatSaysOneThingTwiceIsRefused() {
    assertThatThrownBy(
            () -> of(PIECES, null, new Position(1, 0), round(new Position(16, 24), 4, 0)))
        .hasMessage("crown_outline is stated and so is crown_offset_m; one of them must be null");
    assertThatThrownBy(() -> of(List.of(), null, null, null))
        .hasMessage("sections is empty; it must have at least one, or null");
    assertThatThrownBy(() -> of(List.of(new WeighedSection(100, 17.6)), null, null, null))
        .hasMessageStartingWith("sections.mid_height_m is 17.6 m; it must be from 0 to 17.5 m");
    assertThatThrownBy(() -> of(List.of(new WeighedSection(5, 3)), null, null, null))
        .hasMessageStartingWith("sections.mass_kg, added up, is 5 kg; it must be from 10");
    assertThatThrownBy(() -> of(null, null, null, round(new Position(16, 200), 4, 0)))
        .hasMessageStartingWith("crown_outline.points farthest off the stump is 180 m");
  }

  private static Shape.Polygon round(Position middle, double radius, double turn) {
    List<Position> points = new ArrayList<>();
    for (int i = 0; i < 8; i++) {
      points.add(middle.along(turn + 45 * i, radius));
    }
    return new Shape.Polygon(points);
  }
}
