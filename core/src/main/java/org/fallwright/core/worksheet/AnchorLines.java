package org.fallwright.core.worksheet;

import static org.fallwright.core.worksheet.Dimension.ANGLE;
import static org.fallwright.core.worksheet.Dimension.DENSITY;
import static org.fallwright.core.worksheet.Dimension.FORCE;
import static org.fallwright.core.worksheet.Dimension.LENGTH;
import static org.fallwright.core.worksheet.Dimension.MASS;
import static org.fallwright.core.worksheet.Dimension.MOMENT;
import static org.fallwright.core.worksheet.Dimension.MOMENT_PER_MASS;
import static org.fallwright.core.worksheet.Dimension.NUMBER;
import static org.fallwright.core.worksheet.Dimension.SMALL_LENGTH;
import static org.fallwright.core.worksheet.Dimension.STRESS;
import static org.fallwright.core.worksheet.Dimension.VOLUME;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Map;
import org.fallwright.core.anchor.Deadman;
import org.fallwright.core.anchor.Pickets;
import org.fallwright.core.plan.HeldAnchor;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.reference.Species;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.tree.StemVolume;
import org.fallwright.core.units.Units;

/** What each anchor holds. */
final class AnchorLines {
  private static final String VOLUME_SOURCE = "fonweban-2012";

  private final Workings w;
  private final Reckoned r;
  private final Deque<String> strengths = new ArrayDeque<>();

  AnchorLines(Workings w, Reckoned r) {
    this.w = w;
    this.r = r;
  }

  /** Signs of the strengths of the anchors that may be used, in the order of the parts. */
  Deque<String> strengths() {
    return strengths;
  }

  void write() {
    int i = 0;
    for (HeldAnchor h : r.anchors()) {
      i++;
      w.section("Anchor " + h.anchor().id());
      if (h.capacity().refused()) {
        w.note("Refused: " + h.capacity().why() + ".");
        continue;
      }
      if (h.anchor() instanceof Anchor.TwoLegs two) {
        w.note(
            "Its legs share its load by the angles between them; "
                + two.first()
                + " and "
                + two.second()
                + " bear their own.");
        continue;
      }
      String b = "B_a" + i;
      if (h.anchor() instanceof Anchor.StandingTree t) {
        tree(i, b, h, t);
      } else if (h.anchor() instanceof Anchor.Stump s) {
        stump(i, b, h, s);
      } else if (h.anchor() instanceof Anchor.ParkedVehicle v) {
        vehicle(i, b, h, v);
      } else if (h.anchor() instanceof Anchor.BuriedLog l) {
        log(i, b, h, l);
      } else if (h.anchor() instanceof Anchor.Pickets p) {
        Figure row = Pickets.row(p);
        w.given(
            b,
            "strength: " + h.capacity().why(),
            h.capacity().strengthN(),
            FORCE,
            Basis.of(row.kind()),
            row.source());
      } else {
        w.given(
            b, "strength: " + h.capacity().why(), h.capacity().strengthN(), FORCE, Basis.ENTERED);
      }
      w.compare(b, h.capacity().strengthN(), FORCE);
      strengths.add(b);
    }
  }

  private void tree(int i, String b, HeldAnchor h, Anchor.StandingTree t) {
    Species s = SpeciesTable.of(t.species());
    w.given("D_a" + i, "its diameter at breast height", t.dbhM(), SMALL_LENGTH, Basis.ENTERED);
    w.given("H_a" + i, "its height", t.heightM(), LENGTH, Basis.ENTERED);
    volume(i, s, form(t.species(), t.soil(), t.deepRooting()));
    plate(i, s.rootPlate(t.soil(), t.deepRooting()), t.saturated(), h, t.slingHeightM());
    w.work(
        "G_a" + i,
        "tension that overturns its root plate",
        "M_a" + i + " ÷ z_a" + i,
        FORCE,
        Basis.STATICS);
    w.given(
        "σ_a" + i,
        "mean rupture strength of its wood, the lowest of its sources",
        s.morHolds(),
        STRESS,
        Basis.of(s.morPa().kind()),
        s.morPa().source());
    w.given("v_a" + i, "its coefficient of variation", s.morCv(), NUMBER);
    w.allow("z_95", Allowances.PERCENTILE_SDS, NUMBER);
    double small = w.unit(SMALL_LENGTH);
    String units =
        Workings.fit(w.unit(STRESS) * small * small * small / w.unit(LENGTH) / w.unit(FORCE));
    w.work(
        "Q_a" + i,
        "tension that breaks its stem in bending",
        "σ_a"
            + i
            + " × (1 − z_95 × v_a"
            + i
            + ") × π × (q_B × D_a"
            + i
            + ")^3 ÷ 32 ÷ z_a"
            + i
            + units,
        FORCE,
        Basis.BEAM_THEORY);
    w.work(b, "what the anchor holds", "min(G_a" + i + ", Q_a" + i + ")", FORCE, Basis.STATICS);
  }

  private void stump(int i, String b, HeldAnchor h, Anchor.Stump t) {
    Species s = SpeciesTable.of(t.species());
    if (t.onceMassKg() != null) {
      w.given(
          "m_a" + i,
          "green mass of the stem that stood there",
          t.onceMassKg(),
          MASS,
          Basis.ENTERED);
    } else {
      w.given("D_a" + i, "its diameter", t.diameterM(), SMALL_LENGTH, Basis.ENTERED);
      w.given(
          "H_a" + i, "height of the tree that stood there", t.onceHeightM(), LENGTH, Basis.ENTERED);
      volume(i, s, form(t.species(), t.soil(), t.deepRooting()));
    }
    plate(i, s.rootPlate(t.soil(), t.deepRooting()), t.saturated(), h, t.slingHeightM());
    w.allow("q_p", Allowances.STUMP_PLATE, NUMBER);
    w.work(
        b,
        "what the anchor holds",
        "q_p × M_a" + i + " ÷ z_a" + i,
        FORCE,
        Basis.PLANNING_ALLOWANCE);
  }

  private void log(int i, String b, HeldAnchor h, Anchor.BuriedLog l) {
    String source = Hardware.of("deadman.3ft.1").source();
    w.given(
        "P_a" + i,
        "holding power of its face in loam by depth and rise of the line, lbf/ft²",
        Deadman.power(l, h.load()),
        NUMBER,
        Basis.PUBLISHED,
        source);
    w.given("f_a" + i, "height of its face", l.faceHeightM(), LENGTH, Basis.ENTERED);
    w.given("l_a" + i, "its length", l.lengthM(), LENGTH, Basis.ENTERED);
    String soft = "";
    if (l.soil() == Anchor.DeadmanSoil.SOFT) {
      w.given("q_g" + i, "what soft ground leaves", Hardware.of("deadman.soft"), NUMBER);
      soft = " × q_g" + i;
    }
    String feet = Workings.fit(w.unit(LENGTH) / Units.FOOT);
    w.work(
        b,
        "what the ground before it holds; 1 ft of it goes to the line's trench",
        "P_a"
            + i
            + " × f_a"
            + i
            + feet
            + " × (l_a"
            + i
            + feet
            + " − 1)"
            + soft
            + Workings.fit(Units.POUND_FORCE / w.unit(FORCE)),
        FORCE,
        Basis.PUBLISHED,
        source,
        Map.of());
  }

  private StemVolume form(String species, Anchor.Soil soil, boolean deep) {
    return r.anchorFigures().wood(species, soil, deep).stemForm();
  }

  private void volume(int i, Species s, StemVolume form) {
    w.given(
        "a_v" + i,
        "factor of the stem volume equation",
        form.factor(),
        NUMBER,
        Basis.PUBLISHED,
        VOLUME_SOURCE);
    w.given(
        "b_v" + i,
        "its power of the diameter in centimetres",
        form.diameterPower(),
        NUMBER,
        Basis.PUBLISHED,
        VOLUME_SOURCE);
    w.given(
        "c_v" + i,
        "its power of the height in metres",
        form.heightPower(),
        NUMBER,
        Basis.PUBLISHED,
        VOLUME_SOURCE);
    w.work(
        "V_a" + i,
        "volume of its stem",
        "a_v"
            + i
            + " × (D_a"
            + i
            + Workings.fit(100 * w.unit(SMALL_LENGTH))
            + ")^b_v"
            + i
            + " × (H_a"
            + i
            + Workings.fit(w.unit(LENGTH))
            + ")^c_v"
            + i
            + Workings.fit(1 / w.unit(VOLUME)),
        VOLUME,
        Basis.PUBLISHED);
    Figure density =
        java.util.stream.Stream.concat(
                java.util.stream.Stream.of(s.greenDensity()), s.otherDensities().stream())
            .min(java.util.Comparator.comparingDouble(Figure::value))
            .orElseThrow();
    w.given("ρ_a" + i, "least green density read for it", density, DENSITY);
    w.work("m_a" + i, "green mass of its stem", "V_a" + i + " × ρ_a" + i, MASS, Basis.STATICS);
  }

  private void plate(int i, Figure constant, boolean saturated, HeldAnchor h, double slingM) {
    w.given(
        "C_a" + i,
        "moment that overturns the root plate, for each unit of stem mass",
        constant,
        MOMENT_PER_MASS);
    String less = "";
    if (saturated) {
      w.allow("q_1", Allowances.SATURATED, NUMBER);
      less += " × q_1";
    }
    if (h.load().downhill()) {
      w.allow("q_2", Allowances.DOWNHILL, NUMBER);
      less += " × q_2";
    }
    w.work(
        "M_a" + i,
        "moment that overturns it",
        "C_a" + i + " × m_a" + i + less,
        MOMENT,
        Basis.PUBLISHED);
    w.given("z_l" + i, "height of the sling", slingM, LENGTH, Basis.ENTERED);
    w.allow("z_r", Allowances.SLING_ARM_RISE, LENGTH);
    w.allow("z_k", Allowances.SLING_ARM_LEAST, LENGTH);
    w.work(
        "z_a" + i,
        "arm of the sling",
        "max(z_l" + i + " + z_r, z_k)",
        LENGTH,
        Basis.PLANNING_ALLOWANCE);
  }

  private void vehicle(int i, String b, HeldAnchor h, Anchor.ParkedVehicle v) {
    w.given("m_a" + i, "its mass", v.massKg(), MASS, Basis.ENTERED);
    w.given(
        "μ_a" + i,
        "least grip of its tyres on " + v.surface() + (v.wet() ? ", wet" : ""),
        r.anchorFigures().tyreGrip(v.surface(), v.wet()),
        NUMBER,
        Basis.PUBLISHED);
    w.given(
        "s_a" + i,
        "slope there, + where it rises away from the tree",
        v.uphillDeg(),
        ANGLE,
        Basis.ENTERED);
    w.given(
        "α_a" + i,
        "rise of its load from the horizontal",
        h.load().upliftDeg(),
        ANGLE,
        Basis.GEOMETRY);
    String g = Workings.fit(w.unit(MASS) * Units.GRAVITY / w.unit(FORCE));
    w.work(
        b,
        "tension at which its locked wheels slide",
        String.format(
            java.util.Locale.ROOT,
            "max(0, m_a%1$d%2$s × (μ_a%1$d × cos(s_a%1$d) − sin(s_a%1$d)) ÷ (cos(α_a%1$d + s_a%1$d) + μ_a%1$d × sin(α_a%1$d + s_a%1$d)))",
            i,
            g),
        FORCE,
        Basis.STATICS);
  }
}
