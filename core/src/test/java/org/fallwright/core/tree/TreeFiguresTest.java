package org.fallwright.core.tree;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.fallwright.core.reference.Species;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.SubjectTree;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TreeFiguresTest {
  private static final Species OAK = SpeciesTable.of("northern-red-oak");

  private static TreeFigures figures(SubjectTree tree) {
    return TreeFigures.of(tree, SampleTree.CUT, OAK);
  }

  @Test
  void aMassByEquationIsSpreadByEquationDensityAndDbh() {
    TreeFigures f = figures(SampleTree.oak());
    assertThat(f.massDerived()).isTrue();
    assertThat(f.massKg()).isCloseTo(3711, within(1.0));
    // 25 % of the equation, 10 % of the density, 2.4342 times 2 % of DBH, added in squares
    assertThat(f.massOwnSdKg() / f.massKg()).isCloseTo(0.26926, within(1e-5));
    assertThat(f.massSdKg() / f.massKg()).isCloseTo(0.27362, within(1e-5));
    assertThat(f.remarks()).anyMatch(r -> r.startsWith("mass by equation"));
  }

  @Test
  void anEnteredMassKeepsItsOwnSpread() {
    TreeFigures f =
        figures(
            SampleTree.oak(
                Quantity.measured(0.52),
                Quantity.measured(0.58),
                List.of(),
                Quantity.estimated(3700),
                Quantity.estimated(7)));
    assertThat(f.massDerived()).isFalse();
    assertThat(f.massKg()).isEqualTo(3700);
    assertThat(f.massSdKg()).isCloseTo(555, within(1e-9)).isEqualTo(f.massOwnSdKg());
    assertThat(f.massCentreM()).isEqualTo(7);
    assertThat(f.massCentreSdM()).isCloseTo(0.7, within(1e-12));
    assertThat(f.remarks()).isEmpty();
  }

  @Test
  void whatIsNotEnteredIsTakenAsUsualAndSaidSo() {
    TreeFigures f = figures(SampleTree.oak(Quantity.measured(0.90), null, List.of(), null, null));
    assertThat(f.massCentreM()).isCloseTo(0.40 * 17.5, within(1e-12));
    assertThat(f.massCentreSdM()).isCloseTo(0.04 * 17.5, within(1e-12));
    assertThat(f.stumpDiameterM()).isCloseTo(0.90 * 1.1 * 0.94, within(1e-12));
    assertThat(f.stumpDiameterSdM()).isCloseTo(0.05 * f.stumpDiameterM(), within(1e-12));
    assertThat(f.remarks()).hasSize(4).anyMatch(r -> r.contains("0.73"));
  }

  /** Ellipse 10 m wide and 12 m deep: 94.25 m²; the wind acts in its middle. */
  @Test
  void crown() {
    SubjectTree t = SampleTree.oak();
    SubjectTree wide =
        new SubjectTree(
            t.id(),
            t.species(),
            t.stump(),
            t.dbhM(),
            t.stumpDiameterM(),
            t.diameters(),
            Quantity.measured(20),
            8.0,
            5.0,
            t.leanDeg(),
            t.leanAzimuthDeg(),
            null,
            null,
            null,
            null,
            null,
            null,
            null,
            null,
            false,
            true,
            false,
            SubjectTree.MassBy.EQUATION);
    assertThat(figures(wide).crownAreaM2()).isCloseTo(94.25, within(0.005));
    assertThat(figures(wide).crownMiddleM()).isEqualTo(14);
    assertThat(figures(t).crownAreaM2()).isCloseTo(81.3, within(0.05));
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void aThickerTreeWeighsMoreAndALessCertainOneIsSpreadWider(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < 50; i++) {
      double dbh = 0.1 + random.nextDouble();
      double stump = 0.1 + random.nextDouble();
      TreeFigures thin = of(dbh, stump, How.MEASURED);
      assertThat(of(dbh * 1.01, stump, How.MEASURED).massKg())
          .as("seed %d, DBH %s", seed, dbh)
          .isGreaterThan(thin.massKg());
      TreeFigures guessed = of(dbh, stump, How.GUESSED);
      assertThat(guessed.massKg()).isEqualTo(thin.massKg());
      assertThat(guessed.massOwnSdKg()).isEqualTo(thin.massOwnSdKg());
      assertThat(guessed.massSdKg())
          .as("seed %d, DBH %s", seed, dbh)
          .isGreaterThan(thin.massSdKg());
      assertThat(guessed.stumpDiameterSdM()).isGreaterThan(thin.stumpDiameterSdM());
    }
  }

  private static TreeFigures of(double dbh, double stump, How how) {
    return figures(
        SampleTree.oak(
            new Quantity(dbh, how, null), new Quantity(stump, how, null), List.of(), null, null));
  }
}
