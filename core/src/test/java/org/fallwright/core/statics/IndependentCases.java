package org.fallwright.core.statics;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.line.Point3;
import org.fallwright.core.site.StemDiameter;

/** The cases that an independent model computed, read into our own records. */
final class IndependentCases {
  private IndependentCases() {}

  record Case(
      String name,
      PullCase pull,
      boolean wedges,
      SourceAtTree source,
      List<Part> parts,
      JsonNode expected) {
    @Override
    public String toString() {
      return name;
    }
  }

  static List<Case> read() {
    try (InputStream in =
        IndependentCases.class.getResourceAsStream("/org/fallwright/core/cases/statics.json")) {
      List<Case> cases = new ArrayList<>();
      new ObjectMapper().readTree(in).forEach(c -> cases.add(one(c)));
      return cases;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static Case one(JsonNode c) {
    JsonNode i = c.get("inputs");
    List<StemDiameter> diameters = new ArrayList<>();
    i.get("diameters")
        .forEach(d -> diameters.add(new StemDiameter(d.get(0).asDouble(), d.get(1).asDouble())));
    TreeBody tree =
        new TreeBody(
            d(i, "height_m"),
            d(i, "dbh_m"),
            d(i, "cut_height_m"),
            diameters,
            d(i, "stump_diameter_m"),
            orNull(i, "shell_m"),
            false,
            d(i, "mass_kg"),
            d(i, "mass_centre_m"),
            d(i, "lean_deg"),
            d(i, "lean_azimuth_deg"),
            new Point3(d(i, "crown_e_m"), d(i, "crown_n_m"), 0));
    Double crush = orNull(i, "crush_Pa");
    Wood wood =
        new Wood(
            d(i, "mor_Pa"),
            d(i.get("spread"), "mor_cv"),
            d(i, "moe_Pa"),
            d(i, "shear_Pa"),
            crush == null ? 0.42 * d(i, "mor_Pa") : crush,
            d(i, "knot_factor"));
    boolean wedges = i.get("wedges").asBoolean();
    CutMade cut =
        new CutMade(
            d(i, "face_fraction"),
            d(i, "hinge_thickness_m"),
            orNull(i, "hinge_width_m"),
            d(i, "kerf_m"),
            wedges,
            d(i, "hinge_factor"));
    Wind wind =
        new Wind(
            d(i, "gust_mps"),
            orNull(i, "wind_toward_deg"),
            d(i, "drag_c"),
            d(i, "drag_n"),
            d(i, "crown_area_m2"),
            d(i, "crown_height_m"),
            d(i, "air_density"));
    List<Point3> points = new ArrayList<>();
    i.get("points")
        .forEach(
            p ->
                points.add(
                    new Point3(p.get(0).asDouble(), p.get(1).asDouble(), p.get(2).asDouble())));
    List<Double> ea = new ArrayList<>();
    i.get("leg_EA_N").forEach(e -> ea.add(e.asDouble()));
    JsonNode b = i.get("base_leg");
    LineSet line =
        new LineSet(
            d(i, "attach_height_m"),
            points,
            ea,
            b.isNull() ? null : new LineSet.BaseLeg(d(b, "length_m"), d(b, "EA_N"), d(b, "ratio")),
            d(i, "slack_m"));
    JsonNode s = i.get("spread");
    Spread spread =
        new Spread(
            d(s, "mass_rel"),
            d(s, "mass_centre_m"),
            d(s, "lean_deg"),
            d(s, "azimuth_deg"),
            d(s, "diameter_rel"),
            d(s, "mor_cv"),
            d(s, "thickness_rel"),
            d(s, "wind_rel"),
            d(s, "attach_m"),
            d(s, "bearing_m"));
    JsonNode q = i.get("source");
    JsonNode stop = q.get("stop");
    SourceAtTree.Stop kind =
        stop.isNull()
            ? SourceAtTree.Stop.NONE
            : stop.get("kind").asText().equals("reader")
                ? SourceAtTree.Stop.READER
                : SourceAtTree.Stop.DEVICE;
    SourceAtTree source =
        new SourceAtTree(
            d(q, "low_N"),
            d(q, "hold_N"),
            d(q, "high_N"),
            q.get("captured").asBoolean(),
            kind,
            kind == SourceAtTree.Stop.READER ? d(stop, "overrun_m") : 0);
    List<Part> parts = new ArrayList<>();
    i.get("parts")
        .forEach(
            p ->
                parts.add(
                    new Part(
                        p.get("name").asText(),
                        d(p, "B_N"),
                        d(p, "F"),
                        d(p, "Q"),
                        d(p, "hauling"),
                        d(p, "holding"))));
    return new Case(
        c.get("name").asText(),
        new PullCase(d(i, "lay_deg"), tree, wood, cut, wind, line, spread),
        wedges,
        source,
        parts,
        c.get("expected"));
  }

  private static double d(JsonNode n, String field) {
    JsonNode v = n.get(field);
    if (v == null || !v.isNumber()) {
      throw new IllegalStateException(field + " is missing in the cases");
    }
    return v.asDouble();
  }

  private static Double orNull(JsonNode n, String field) {
    JsonNode v = n.get(field);
    return v == null || v.isNull() ? null : Double.valueOf(v.asDouble());
  }
}
