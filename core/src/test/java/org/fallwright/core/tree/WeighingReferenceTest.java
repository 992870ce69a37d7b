package org.fallwright.core.tree;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.WeighedSection;
import org.junit.jupiter.api.Test;

/** Sums over pieces, stems and outlines, worked by hand. */
class WeighingReferenceTest {
  /** 1,200 kg at 3 m, 800 at 7 and 500 at 12: 2,500 kg, 15,200 kg·m, 6.08 m. */
  @Test
  void sections() {
    SectionSum sum =
        SectionSum.of(
            List.of(
                new WeighedSection(1200, 3),
                new WeighedSection(800, 7),
                new WeighedSection(500, 12)));
    assertThat(sum.massKg()).isEqualTo(2500);
    assertThat(sum.centreM()).isCloseTo(6.08, within(1e-12));
  }

  /**
   * Stem 0.60 m at the base and 25 m high: 3.534 m³ as a paraboloid, 2.356 m³ as a cone. In
   * northern red oak at 1,026 kg/m³ 3,626 and 2,417 kg.
   */
  @Test
  void stemOfAKnownForm() {
    var oak = SpeciesTable.of("northern-red-oak");
    assertThat(StemMass.of(StemForm.PARABOLOID.volumeM3(0.60, 25), oak).massKg())
        .isCloseTo(3626, within(1.0));
    assertThat(StemMass.of(StemForm.CONE.volumeM3(0.60, 25), oak).massKg())
        .isCloseTo(2417, within(1.0));
    // with a fifth of the tree in its crown the whole weighs 3,626/0.8
    assertThat(StemMass.of(StemForm.PARABOLOID.volumeM3(0.60, 25), oak).treeKg(0.2))
        .isCloseTo(4532, within(1.0));
  }

  /**
   * Norway spruce of 0.60 m and 30 m: 3.400 m³ by the volume equation, 2,890 kg at the 850 kg/m³ of
   * British plantations, 1,948 kg at the 573 of the American inventory.
   */
  @Test
  void stemByVolumeEquation() {
    StemMass spruce =
        StemMass.of(StemVolume.SPRUCE.volumeM3(0.60, 30), SpeciesTable.of("norway-spruce"));
    assertThat(spruce.massKg()).isCloseTo(2890, within(1.0));
    assertThat(spruce.highKg()).isCloseTo(2890, within(1.0));
    assertThat(spruce.lowKg()).isCloseTo(1948, within(1.0));
  }

  /** Douglas-fir: all sapwood would weigh 967.5 kg/m³, the least any source gives is 609. */
  @Test
  void aStemMayBeAllSapwood() {
    StemMass fir = StemMass.of(2, SpeciesTable.of("douglas-fir-coast"));
    assertThat(fir.lowKg()).isCloseTo(1218, within(1e-9));
    assertThat(fir.massKg()).isCloseTo(1378, within(1e-9));
    assertThat(fir.highKg()).isCloseTo(1935, within(1e-9));
  }

  /** An L of a 6 by 2 and a 2 by 4 rectangle: 20 m², middle at (12·3 + 8·1)/20, (12·1 + 8·4)/20. */
  @Test
  void outlineOfTwoRectangles() {
    CrownOutline crown =
        CrownOutline.of(polygon(100, 50, 106, 50, 106, 52, 102, 52, 102, 56, 100, 56));
    assertThat(crown.areaM2()).isCloseTo(20, within(1e-9));
    assertThat(crown.middle().eastM()).isCloseTo(102.2, within(1e-9));
    assertThat(crown.middle().northM()).isCloseTo(52.2, within(1e-9));
    assertThat(crown.radiusM()).isCloseTo(2.523, within(0.0005));
  }

  /** A triangle's middle is the mean of its corners. */
  @Test
  void outlineOfATriangle() {
    CrownOutline crown = CrownOutline.of(polygon(0, 0, 9, 0, 0, 6));
    assertThat(crown.middle().eastM()).isCloseTo(3, within(1e-9));
    assertThat(crown.middle().northM()).isCloseTo(2, within(1e-9));
    assertThat(crown.areaM2()).isCloseTo(27, within(1e-9));
  }

  /**
   * A crown of a fifth of the mass that grows by a quarter: the tree by 5 %, the crown's share to
   * 0.25/1.05, the mass centre from 7 m to (7 + 0.05·12)/1.05.
   */
  @Test
  void aHeavierCrown() {
    CrownLoad load = new CrownLoad(0.2, 1.25);
    assertThat(load.massFactor()).isCloseTo(1.05, within(1e-12));
    assertThat(load.shareAfter()).isCloseTo(0.2381, within(5e-5));
    assertThat(load.centreM(7, 12)).isCloseTo(7.238, within(5e-4));
  }

  /** Jenkins et al. 2003 at 60 cm: branches 0.1791 and leaves 0.0186; bare 0.1791/0.9814. */
  @Test
  void crownInLeafAndBare() {
    DryShares oak = DryShares.of(true, 0.60);
    assertThat(oak.crown()).isCloseTo(0.1977, within(1e-4));
    assertThat(oak.bareCrown()).isCloseTo(0.1825, within(1e-4));
  }

  static Shape.Polygon polygon(double... eastNorth) {
    List<Position> points = new ArrayList<>();
    for (int i = 0; i < eastNorth.length; i += 2) {
      points.add(new Position(eastNorth[i], eastNorth[i + 1]));
    }
    return new Shape.Polygon(points);
  }
}
