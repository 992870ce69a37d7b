package org.fallwright.core.worksheet;

import static org.fallwright.core.worksheet.Dimension.AREA;
import static org.fallwright.core.worksheet.Dimension.FORCE;
import static org.fallwright.core.worksheet.Dimension.GIVE;
import static org.fallwright.core.worksheet.Dimension.LENGTH;
import static org.fallwright.core.worksheet.Dimension.NUMBER;
import static org.fallwright.core.worksheet.Dimension.SMALL_LENGTH;
import static org.fallwright.core.worksheet.Dimension.STIFFNESS;
import static org.fallwright.core.worksheet.Dimension.STRESS;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.SortedMap;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.statics.LineSet;
import org.fallwright.core.statics.TreeSide;

/** What line and stem give way, and the stem's strength below the line. */
final class StretchLines {
  private final Workings w;
  private final Reckoned r;
  private final TreeSide side;
  private final List<Double> heights = new ArrayList<>();

  StretchLines(Workings w, Reckoned r) {
    this.w = w;
    this.r = r;
    side = r.statics().treeSide();
  }

  void write() {
    line();
    taper();
    slices();
    strength();
  }

  private void line() {
    w.section("Stiffness of the line");
    int last = r.points().size() - 1;
    List<String> give = new ArrayList<>(List.of("L_0 ÷ EA"));
    List<String> length = new ArrayList<>(List.of("L_0"));
    for (int i = 1; i < last; i++) {
      w.work(
          "L_leg" + (i + 1),
          "length of leg " + (i + 1),
          String.format(
              Locale.ROOT,
              "√((e_%2$d − e_%1$d)^2 + (n_%2$d − n_%1$d)^2 + (z_%2$d − z_%1$d)^2)",
              i,
              i + 1),
          LENGTH,
          Basis.GEOMETRY);
      give.add("L_leg" + (i + 1) + " ÷ EA");
      length.add("L_leg" + (i + 1));
    }
    LineSet.BaseLeg haul = r.pull().line().base();
    if (haul != null) {
      w.given(
          "L_h",
          "line of the block system that stretches, its haul leg and its parts",
          haul.lengthM(),
          LENGTH,
          Basis.GEOMETRY);
      w.given("EA_h", "its softest axial stiffness", haul.stiffnessN(), FORCE, Basis.ENTERED);
      w.given("j_h", "its tension over that at the tree", haul.ratio(), NUMBER, Basis.STATICS);
      give.add("L_h × j_h^2 ÷ EA_h");
    }
    Double own = r.pull().line().sourceNPerM();
    if (own != null) {
      w.given("k_S", "stiffness of the source itself", own, STIFFNESS, Basis.SOURCE);
      give.add("1 ÷ k_S");
    }
    w.work("L_all", "length of all legs", String.join(" + ", length), LENGTH, Basis.GEOMETRY);
    w.work(
        "c_L",
        "give of the line, tension the same in all legs",
        String.join(" + ", give),
        GIVE,
        Basis.STATICS);
    w.work("K", "stiffness of the line, its far end held", "1 ÷ c_L", STIFFNESS, Basis.STATICS);
    w.compare("L_all", side.lengthM(), LENGTH);
    w.compare("K", side.lineNPerM(), STIFFNESS);
  }

  private void taper() {
    w.section("Taper of the stem");
    w.note("Diameters over bark; straight lines between them.");
    int i = 0;
    SortedMap<Double, Double> known = r.tree().taper().known();
    double cut = r.pull().tree().cutHeightM();
    for (Map.Entry<Double, Double> k : known.entrySet()) {
      heights.add(k.getKey());
      w.given(
          "h_" + i,
          "height of diameter " + i + " above the ground",
          k.getKey(),
          LENGTH,
          Basis.ENTERED);
      if (k.getKey() == cut) {
        w.work("D_" + i, "stem at the cut", "D_s ÷ q_B", SMALL_LENGTH, Basis.PLANNING_ALLOWANCE);
      } else {
        w.given(
            "D_" + i,
            "diameter " + i + (k.getValue() == 0 ? ", the top" : ""),
            k.getValue(),
            SMALL_LENGTH,
            Basis.ENTERED);
      }
      i++;
    }
  }

  /** Diameter inside the bark at a height above the hinge, given as a formula and in metres. */
  private String diameter(String above, double heightM) {
    double h = heightM + r.pull().tree().cutHeightM();
    if (h <= heights.get(0)) {
      return "q_B × D_0";
    }
    int i = 1;
    while (h > heights.get(i)) {
      i++;
    }
    return String.format(
        Locale.ROOT,
        "q_B × (D_%1$d + (%3$s + h_c − h_%1$d) ÷ (h_%2$d − h_%1$d) × (D_%2$d − D_%1$d))",
        i - 1,
        i,
        above);
  }

  /** What is left of a section by a hollow stem, as a factor at the end of a formula. */
  private String left(String d, double heightM) {
    Double shell = r.pull().tree().shellM();
    double inside = r.tree().taper().insideBarkM(heightM + r.pull().tree().cutHeightM());
    return shell == null || inside <= 2 * shell
        ? ""
        : " × (1 − ((" + d + " − 2 × s_w) ÷ " + d + ")^4)";
  }

  private void slices() {
    double wa = r.pull().line().attachHeightM();
    int n = (int) Math.ceil(wa / Allowances.STEM_SLICE.value());
    double dz = wa / n;
    w.section("Give of the stem while it is whole");
    w.note(
        "The stem between hinge and line in "
            + n
            + " equal slices; each diameter at the slice's middle, inside the bark.");
    w.work("Δz", "height of a slice", "w_a ÷ " + n, LENGTH, Basis.GEOMETRY);
    double length = w.unit(LENGTH);
    double units =
        length
            * length
            * length
            / (w.unit(STRESS) * Math.pow(w.unit(SMALL_LENGTH), 4))
            / w.unit(GIVE);
    List<String> sum = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      String middle = i + ".5 × Δz";
      String d = "d_" + (i + 1);
      w.work(
          d,
          "diameter of slice " + (i + 1),
          diameter(middle, (i + 0.5) * dz),
          SMALL_LENGTH,
          Basis.GEOMETRY);
      w.work(
          "g_" + (i + 1),
          "give of slice " + (i + 1),
          "(w_a − "
              + middle
              + ")^2 × Δz ÷ (E_w × π × "
              + d
              + "^4 ÷ 64"
              + left(d, (i + 0.5) * dz)
              + ")"
              + Workings.fit(units),
          GIVE,
          Basis.BEAM_THEORY);
      sum.add("g_" + (i + 1));
    }
    w.work(
        "c_S",
        "give of the stem across its axis",
        String.join(" + ", sum),
        GIVE,
        Basis.BEAM_THEORY);
    w.work(
        "K_p",
        "stiffness of line and stem, the line's far end held",
        "1 ÷ (c_L + cos(α)^2 × c_S)",
        STIFFNESS,
        Basis.BEAM_THEORY);
    w.compare("K_p", side.pathNPerM(), STIFFNESS);
  }

  private void strength() {
    if (!Double.isFinite(side.stemBreakN())) {
      return;
    }
    w.section("Strength of the stem below the line");
    w.note("Sections each 0.5 m above the hinge were tried; this is the weakest.");
    w.allow("z_95", Allowances.PERCENTILE_SDS, NUMBER);
    w.work(
        "σ_5", "rupture strength, 5th percentile", "σ_w × (1 − z_95 × v_r)", STRESS, Basis.SPREAD);
    w.given("h_w", "weakest section above the hinge", side.stemWeakestM(), LENGTH, Basis.STATICS);
    w.work(
        "d_w",
        "its diameter inside the bark",
        diameter("h_w", side.stemWeakestM()),
        SMALL_LENGTH,
        Basis.GEOMETRY);
    w.work(
        "a_E",
        "line on the tree east of the stump's middle",
        "w_a × tan(λ) × sin(γ)",
        LENGTH,
        Basis.GEOMETRY);
    w.work("a_N", "line on the tree north of it", "w_a × tan(λ) × cos(γ)", LENGTH, Basis.GEOMETRY);
    w.work(
        "k_E",
        "cross product of stem and leg, east",
        "a_N × z_1 − w_a × n_1",
        AREA,
        Basis.GEOMETRY);
    w.work("k_N", "the same, north", "w_a × e_1 − a_E × z_1", AREA, Basis.GEOMETRY);
    w.work("k_U", "the same, up", "a_E × n_1 − a_N × e_1", AREA, Basis.GEOMETRY);
    w.work(
        "j_w",
        "moment at the section for each unit of tension",
        "(1 − h_w ÷ w_a) × √(k_E^2 + k_N^2 + k_U^2) ÷ L_0",
        LENGTH,
        Basis.STATICS);
    double small = w.unit(SMALL_LENGTH);
    double units = w.unit(STRESS) * small * small * small / w.unit(LENGTH) / w.unit(FORCE);
    w.work(
        "B_stem",
        "tension at the tree that breaks the stem",
        "f_k × σ_5 × π × d_w^3"
            + left("d_w", side.stemWeakestM())
            + " ÷ (32 × j_w)"
            + Workings.fit(units),
        FORCE,
        Basis.BEAM_THEORY);
    w.compare("B_stem", side.stemBreakN(), FORCE);
  }
}
