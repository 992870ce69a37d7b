package org.fallwright.core.worksheet;

import static org.fallwright.core.worksheet.Dimension.ANGLE;
import static org.fallwright.core.worksheet.Dimension.AREA;
import static org.fallwright.core.worksheet.Dimension.DENSITY;
import static org.fallwright.core.worksheet.Dimension.FORCE;
import static org.fallwright.core.worksheet.Dimension.LENGTH;
import static org.fallwright.core.worksheet.Dimension.MASS;
import static org.fallwright.core.worksheet.Dimension.NUMBER;
import static org.fallwright.core.worksheet.Dimension.SMALL_LENGTH;
import static org.fallwright.core.worksheet.Dimension.SPEED;
import static org.fallwright.core.worksheet.Dimension.STRESS;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.fallwright.core.line.Point3;
import org.fallwright.core.line.Share;
import org.fallwright.core.plan.LinePoint;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Species;
import org.fallwright.core.site.Conditions;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.WeighedSection;
import org.fallwright.core.tree.DerivedMass;
import org.fallwright.core.tree.MassEquation;

/** What the setup chooses and what was entered of tree, cut, wood, day and line. */
final class EnteredLines {
  private final Workings w;
  private final Site site;
  private final Reckoned r;

  EnteredLines(Workings w, Site site, Reckoned r) {
    this.w = w;
    this.site = site;
    this.r = r;
  }

  void write() {
    setup();
    tree();
    wood();
    day();
    points();
  }

  private void setup() {
    Setup s = r.judged().setup();
    CutPlan cut = site.cut();
    w.section("The setup and the cut");
    w.note(
        switch (cut.face()) {
          case OPEN -> "Open face: sloping floor and roof, back cut level with its corner.";
          case CONVENTIONAL -> "Conventional face: level floor, sloping roof.";
          case HUMBOLDT -> "Humboldt face: level roof, floor sloping into the stump.";
        });
    w.note("The hinge sits in the face's corner: the face shuts when the stem has turned F_o.");
    w.given("β", "lay: direction of fall, from true north", s.layDeg(), ANGLE, Basis.CHOSEN);
    w.given("h_a", "height of the line on the tree", s.attachHeightM(), LENGTH, Basis.CHOSEN);
    w.given("t", "hinge thickness", s.hingeThicknessM(), SMALL_LENGTH, Basis.CHOSEN);
    w.given("h_c", "height of the hinge above the ground", cut.heightM(), LENGTH, Basis.ENTERED);
    w.given(
        "f_a",
        "face depth over the diameter at the cut",
        cut.faceFraction(),
        NUMBER,
        Basis.ENTERED);
    w.given("F_o", "opening of the face", cut.faceOpeningDeg(), ANGLE, Basis.ENTERED);
    if (cut.hingeWidthM() != null) {
      w.given("b_e", "hinge width", cut.hingeWidthM(), SMALL_LENGTH, Basis.ENTERED);
    }
    if (!cut.wedges()) {
      w.given("s_k", "width of the saw kerf", cut.kerfM(), SMALL_LENGTH, Basis.ENTERED);
    }
  }

  private void tree() {
    SubjectTree t = site.tree();
    w.section("The tree");
    w.note(
        "Heights are above the ground at the stump, unless they are said to be above the hinge.");
    w.given("H", "height of the tree", t.heightM(), LENGTH);
    w.given("D", "stem diameter over bark at breast height", t.dbhM(), SMALL_LENGTH);
    w.given("λ", "lean of the stem from the vertical", t.leanDeg(), ANGLE);
    w.given("γ", "direction of the lean, from true north", t.leanAzimuthDeg(), ANGLE);
    w.allow("q_B", Allowances.BARK_RATIO, NUMBER);
    if (t.stumpDiameterM() != null) {
      w.given("D_s", "stem diameter inside the bark at the cut", t.stumpDiameterM(), SMALL_LENGTH);
    } else {
      w.allow("q_F", Allowances.FLARE, NUMBER);
      w.work(
          "D_s",
          "stem diameter inside the bark at the cut",
          "D × q_F × q_B",
          SMALL_LENGTH,
          Basis.PLANNING_ALLOWANCE);
    }
    if (t.shellM() != null) {
      w.given("s_w", "sound shell of the hollow stem", t.shellM(), SMALL_LENGTH, Basis.ENTERED);
    }
    if (loaded(t)) {
      w.given(
          "m",
          "green mass of the tree, reckoned with its crown's share bare, wet or iced",
          r.tree().massKg(),
          MASS,
          Basis.PLANNING_ALLOWANCE);
      w.given(
          "h_g",
          "height of the mass centre, reckoned likewise",
          r.tree().massCentreM(),
          LENGTH,
          Basis.PLANNING_ALLOWANCE);
    } else if (t.sections() != null) {
      sections(t);
    } else {
      mass(t);
      centre(t);
    }
    if (plainCrown()) {
      w.given("q_c", "share of the mass that is crown", t.crownShare(), NUMBER, Basis.ENTERED);
      w.given(
          "c_E",
          "crown off the stem's axis, to the east",
          t.crownOffsetM().eastM(),
          LENGTH,
          Basis.ENTERED);
      w.given(
          "c_N",
          "crown off the stem's axis, to the north",
          t.crownOffsetM().northM(),
          LENGTH,
          Basis.ENTERED);
    } else if (aside()) {
      Point3 shift = r.pull().tree().crownShift();
      String name = "mass centre moved by the crown, its share times its offset, to the ";
      w.given("c_E", name + "east", shift.e(), LENGTH, Basis.PLANNING_ALLOWANCE);
      w.given("c_N", name + "north", shift.n(), LENGTH, Basis.PLANNING_ALLOWANCE);
    }
  }

  /** What a sum puts before the crown's offset; empty where the crown moves nothing. */
  String crownTerm() {
    return plainCrown() ? " + q_c × " : aside() ? " + " : "";
  }

  private boolean plainCrown() {
    SubjectTree t = site.tree();
    return t.crownOffsetM() != null && t.crownShare() != null && !t.iceOrWet();
  }

  private boolean aside() {
    Point3 shift = r.pull().tree().crownShift();
    return shift.e() != 0 || shift.n() != 0;
  }

  /** Whether the mass holds more or less than what was entered or the equation gives. */
  private boolean loaded(SubjectTree t) {
    boolean bare = r.species().broadleaf() && !t.inLeaf();
    return t.iceOrWet() || bare && t.massKg() == null && t.sections() == null;
  }

  private void sections(SubjectTree t) {
    List<String> masses = new ArrayList<>();
    List<String> moments = new ArrayList<>();
    for (int i = 0; i < t.sections().size(); i++) {
      WeighedSection piece = t.sections().get(i);
      String n = Integer.toString(i + 1);
      w.given("m_p" + n, "piece " + n + ", weighed", piece.massKg(), MASS, Basis.MEASURED);
      w.given("h_p" + n, "height of its middle", piece.midHeightM(), LENGTH, Basis.MEASURED);
      masses.add("m_p" + n);
      moments.add("m_p" + n + " × h_p" + n);
    }
    w.work("m", "green mass of the tree", String.join(" + ", masses), MASS, Basis.STATICS);
    w.work(
        "h_g",
        "height of the mass centre",
        "(" + String.join(" + ", moments) + ") ÷ m",
        LENGTH,
        Basis.STATICS);
  }

  private void centre(SubjectTree t) {
    if (t.massCentreM() != null) {
      w.given("h_g", "height of the mass centre", t.massCentreM(), LENGTH);
    } else {
      w.allow("q_g", Allowances.MASS_CENTRE_SHARE, NUMBER);
      w.work("h_g", "height of the mass centre", "q_g × H", LENGTH, Basis.PLANNING_ALLOWANCE);
    }
  }

  private void mass(SubjectTree t) {
    if (t.massKg() != null) {
      w.given("m", "green mass of the tree", t.massKg(), MASS);
      return;
    }
    if (DerivedMass.byStem(t)) {
      stem(t);
      return;
    }
    MassEquation e = MassEquation.of(r.species().massGroup());
    w.given(
        "b_0",
        "constant of the mass equation, " + e.name(),
        e.b0(),
        NUMBER,
        Basis.PUBLISHED,
        e.source());
    w.given("b_1", "slope of the mass equation", e.b1(), NUMBER, Basis.PUBLISHED, e.source());
    w.given("q_w", "green mass over dry mass", r.species().dryToGreen(), NUMBER);
    String cm = Workings.fit(100 * w.unit(SMALL_LENGTH));
    w.work(
        "m",
        "green mass of the tree; the equation takes centimetres and gives kilograms",
        "exp(b_0 + b_1 × ln(D" + cm + ")) × q_w" + Workings.fit(1 / w.unit(MASS)),
        MASS,
        Basis.PUBLISHED);
  }

  /**
   * The mass by the stem's volume, cone stumps between the known diameters, and the crown's share.
   */
  private void stem(SubjectTree t) {
    List<String> pieces = new ArrayList<>();
    int i = 0;
    for (Map.Entry<Double, Double> k : r.tree().taper().known().entrySet()) {
      String h = "z_m" + i;
      String d = "d_m" + i;
      w.given(h, "height of stem diameter " + i, k.getKey(), LENGTH, Basis.ENTERED);
      if (k.getKey() == site.cut().heightM()) {
        w.work(d, "stem over bark at the cut", "D_s ÷ q_B", SMALL_LENGTH, Basis.PLANNING_ALLOWANCE);
      } else {
        w.given(d, "its diameter over bark", k.getValue(), SMALL_LENGTH, Basis.ENTERED);
      }
      String below = i == 0 ? d : "d_m" + (i - 1);
      pieces.add(
          (i == 0 ? h : "(" + h + " − z_m" + (i - 1) + ")")
              + (i == 0
                  ? " × 3 × " + d + "^2"
                  : " × (" + below + "^2 + " + below + " × " + d + " + " + d + "^2)"));
      i++;
    }
    double small = w.unit(SMALL_LENGTH);
    w.given("ρ_g", "green density", r.species().greenDensity(), DENSITY);
    boolean entered = t.crownShare() != null;
    w.given(
        "q_y",
        "share of the mass that is crown" + (entered ? "" : ", by DBH"),
        DerivedMass.crownShare(t, r.species()),
        NUMBER,
        entered ? Basis.ENTERED : Basis.PUBLISHED,
        entered ? "" : "jenkins-2003");
    w.work(
        "m",
        "green mass of the tree: its stem and the crown's share",
        "π ÷ 12 × ("
            + String.join(" + ", pieces)
            + ") × ρ_g ÷ (1 − q_y)"
            + Workings.fit(w.unit(LENGTH) * small * small * w.unit(DENSITY) / w.unit(MASS)),
        MASS,
        Basis.GEOMETRY);
  }

  private void wood() {
    Species s = r.species();
    w.section("Green wood of the pulled tree, " + s.name());
    w.given(
        "σ_r",
        "mean rupture strength, the highest of its sources, where it resists",
        s.morResists(),
        STRESS,
        Basis.of(s.morPa().kind()),
        s.morPa().source());
    w.given(
        "σ_w",
        "mean rupture strength, the lowest of its sources, where it must hold",
        s.morHolds(),
        STRESS,
        Basis.of(s.morPa().kind()),
        s.morPa().source());
    w.given("v_r", "coefficient of variation of the rupture strength", s.morCv(), NUMBER);
    w.given("E_w", "mean modulus of elasticity", s.moePa(), STRESS);
    w.given("τ_w", "mean shear strength along the grain", s.shearPa(), STRESS);
    w.given("σ_c", "compression strength along the grain", s.crushPa(), STRESS);
    w.given("f_k", "what knots leave of a stem's rupture strength", s.knotFactor(), NUMBER);
  }

  private void day() {
    Conditions day = site.conditions();
    w.section("Wind on the crown");
    w.given("V", "gust at crown height", day.gustMps(), SPEED);
    if (day.windTowardDeg() != null) {
      w.given("θ_w", "direction the wind blows towards", day.windTowardDeg(), ANGLE, Basis.ENTERED);
    }
    w.given("C_0", "drag coefficient C, of C·V^(−N)", r.species().dragC(), NUMBER);
    w.given("N_d", "its power N, V in metres a second", r.species().dragN(), NUMBER);
    if (r.species().broadleaf() && !site.tree().inLeaf()) {
      w.allow("q_l", Allowances.LEAFLESS_DRAG, NUMBER);
    }
    if (day.airDensity() != null) {
      w.given("ρ", "density of the air", day.airDensity(), DENSITY, Basis.ENTERED);
    } else {
      w.given("ρ", "density of the air", Allowances.AIR_DENSITY, DENSITY);
    }
    if (site.tree().crownAreaM2() != null) {
      w.given("A_c", "frontal area of the crown", site.tree().crownAreaM2(), AREA, Basis.ENTERED);
    } else {
      w.given("r_c", "radius of the crown", site.tree().crownRadiusM(), LENGTH, Basis.ENTERED);
    }
    w.given("h_b", "height of the crown's base", site.tree().crownBaseM(), LENGTH, Basis.ENTERED);
    if (site.tree().crownAreaM2() == null) {
      w.work(
          "A_c",
          "frontal area of the crown, an ellipse",
          "π ÷ 4 × 2 × r_c × (H − h_b)",
          AREA,
          Basis.GEOMETRY);
    }
  }

  private void points() {
    w.section("Where the line runs");
    w.note(
        "East and north of the site's origin; heights Z of ground and of the line at each support in"
            + " the site's own levels.");
    Place stump = site.tree().stump();
    w.given("X_0", "middle of the stump, east", stump.at().eastM(), LENGTH, Basis.ENTERED);
    w.given("Y_0", "middle of the stump, north", stump.at().northM(), LENGTH, Basis.ENTERED);
    w.given("Z_0", "ground at the stump", stump.groundM(), LENGTH, Basis.ENTERED);
    List<LinePoint> line = r.judged().line();
    for (int i = 1; i < line.size(); i++) {
      LinePoint p = line.get(i);
      w.given("X_" + i, p.id() + ", east", p.at().eastM(), LENGTH, Basis.ENTERED);
      w.given("Y_" + i, p.id() + ", north", p.at().northM(), LENGTH, Basis.ENTERED);
      w.given(
          "Z_" + i, p.id() + ", the line's height there", p.elevationM(), LENGTH, Basis.ENTERED);
    }
    new GearLines(w).breaking(r.line());
    String name = "softest axial stiffness of line " + r.judged().setup().line();
    if (r.line().softest()) {
      Share s = r.line().softness();
      w.given("s_E", s.what(), s.value(), NUMBER, Basis.of(s), s.source());
      w.work("EA", name, "b_l ÷ s_E", FORCE, Basis.of(s));
    } else {
      w.given("EA", name, r.line().stiffnessN(), FORCE, Basis.ENTERED);
    }
    if (site.conditions().slackM() != null) {
      w.given(
          "s_0", "slack and sag of the line", site.conditions().slackM(), LENGTH, Basis.ENTERED);
    } else {
      w.given("s_0", "slack and sag of the line", Allowances.SLACK, LENGTH);
    }
  }
}
