package org.fallwright.ui.demo;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.worksheet.Compared;
import org.fallwright.core.worksheet.Line;
import org.fallwright.core.worksheet.MarkdownSheet;
import org.fallwright.core.worksheet.Worksheet;
import org.fallwright.core.worksheet.Worksheets;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The worksheets of the demo site's setups, worked again from the printed text alone. */
class WorksheetDemoTest {
  private static final Pattern SIGN = Pattern.compile("\\p{L}[\\p{L}\\p{N}_]*");
  private static final List<String> WORDS =
      List.of("sin", "cos", "tan", "asin", "atan", "ln", "exp", "min", "max", "abs", "π");

  /** Setups of the demo site, and the first of them on a site with something changed. */
  static Stream<Arguments> setups() {
    return Stream.of("us", "metric").flatMap(u -> Stream.concat(rows(u), changed(u)));
  }

  private static Stream<Arguments> rows(String units) {
    Map<String, Setup> rows = new LinkedHashMap<>();
    rows.put("hand winch over A1", DemoSite.ROW_6);
    rows.put("pick-up on the driveway", DemoSite.ROW_4);
    rows.put("three parts", DemoSite.tackle(3, "3", "pickup", "rwd", "V1"));
    rows.put("read load cell", DemoSite.tackle(3, "4", "pickup", "rwd", "V1"));
    rows.put("read in the haul part", DemoSite.tackle(3, "4", "pickup", "rwd", "V1"));
    rows.put("wet birch", DemoSite.redirected(342, "hand-winch", "pull", "A3", "A2"));
    rows.put("stump", DemoSite.direct(39, "hand-winch", "pull", "S1"));
    rows.put("crew", DemoSite.direct(0, "crew", "pull", "HC"));
    rows.put("lever lost", DemoSite.direct(188, "hand-winch", "pull", "A1"));
    return rows.entrySet().stream()
        .map(
            e ->
                Arguments.of(
                    units + ", " + e.getKey(), sheet(units, cell(e.getKey()), e.getValue())));
  }

  private static Consumer<ObjectNode> cell(String row) {
    return s ->
        ((ObjectNode) s.at("/gear/load_cell"))
            .put("at", row.equals("read in the haul part") ? "haul-part" : "source-end");
  }

  private static Stream<Arguments> changed(String units) {
    Map<String, Consumer<ObjectNode>> sites = new LinkedHashMap<>();
    sites.put("hollow", s -> tree(s).put("shell_m", 0.12));
    sites.put("wind known", s -> ((ObjectNode) s.get("conditions")).put("wind_toward_deg", 200.0));
    sites.put("wedges", s -> ((ObjectNode) s.get("cut")).put("wedges", true));
    sites.put(
        "little entered",
        s ->
            tree(s)
                .putNull("mass_kg")
                .putNull("mass_centre_m")
                .putNull("stump_diameter_m")
                .putNull("crown_area_m2")
                .put("in_leaf", false));
    sites.put("chord", s -> ((ObjectNode) s.get("cut")).putNull("hinge_width_m"));
    sites.put(
        "crown aside",
        s -> tree(s).put("crown_share", 0.4).putArray("crown_offset_m").add(0.8).add(-1.1));
    sites.put(
        "vehicle as anchor",
        s ->
            anchor(s, "A1", "vehicle")
                .put("mass_kg", 9000.0)
                .put("surface", "compact-gravel")
                .put("wet", false)
                .put("uphill_deg", 2.0)
                .put("rated_point_N", 40000.0));
    sites.put(
        "rated anchor",
        s ->
            anchor(s, "A1", "rated")
                .put("breaking_load_N", 150000.0)
                .put("vouched_by", "the owner"));
    sites.put(
        "pickets",
        s ->
            anchor(s, "A1", "pickets")
                .put("sling_height_m", 0.1)
                .put("holdfast", "two-one")
                .put("count", 1)
                .put("soil", "undisturbed-loam")
                .put("wet", true));
    sites.put(
        "buried log",
        s ->
            anchor(s, "A1", "deadman")
                .put("sling_height_m", 0.1)
                .put("depth_m", 1.6)
                .put("face_height_m", 0.45)
                .put("length_m", 1.8)
                .put("line_run", 3)
                .put("soil", "soft"));
    sites.put(
        "two legs",
        s -> {
          ObjectNode legs = anchor(s, "A1", "two-legs").put("first", "R1").put("second", "R2");
          for (int i = 1; i < 3; i++) {
            ObjectNode r =
                legs.deepCopy().retain("id", "place", "sling_height_m", "rejected", "land");
            r.put("type", "rated").put("id", "R" + i);
            ((ObjectNode) r.get("place")).putArray("at").add(i == 1 ? 12 : 34).add(60);
            r.put("breaking_load_N", 1e5).put("vouched_by", "the owner");
            ((ArrayNode) s.get("anchors")).add(r);
          }
        });
    sites.put("sources disagree", s -> tree(s).put("species", "sitka-spruce"));
    sites.put("iced", s -> tree(s).put("ice_or_wet", true));
    sites.put(
        "weighed pieces",
        s -> {
          ArrayNode pieces =
              tree(s).putNull("mass_kg").putNull("mass_centre_m").putArray("sections");
          pieces.addObject().put("mass_kg", 2100.0).put("mid_height_m", 4.0);
          pieces.addObject().put("mass_kg", 1500.0).put("mid_height_m", 11.0);
        });
    sites.put(
        "crown by its outline",
        s -> {
          ArrayNode points =
              tree(s).putObject("crown_outline").put("type", "polygon").putArray("points");
          for (double[] p : new double[][] {{12, 18}, {21, 18}, {21, 27}, {12, 27}}) {
            points.addArray().add(p[0]).add(p[1]);
          }
        });
    sites.put("mass by equation, in leaf", s -> tree(s).putNull("mass_kg"));
    sites.put("mass by the stem", s -> tree(s).putNull("mass_kg").put("mass_by", "stem"));
    sites.put(
        "wire rope without a label",
        s -> {
          line(s, "wire-steel-core", 0.01)
              .put("weathered", true)
              .putNull("source_end")
              .putObject("tree_end")
              .put("kind", "wire-clips")
              .putNull("stated");
          DemoSite.entry(s.at("/gear/slings"), "Slings")
              .put("hitch", "choker")
              .put("angle_deg", 95);
          DemoSite.entry(s.at("/gear/connectors"), "Shackles")
              .putNull("rated_load_N")
              .put("body_diameter_m", 0.022)
              .put("aside_deg", 40);
          DemoSite.entry(s.at("/gear/blocks"), "Block").putNull("efficiency");
        });
    sites.put("nylon without a label", s -> line(s, "nylon", 0.024).putNull("tree_end"));
    sites.put(
        "chain slings",
        s ->
            DemoSite.entry(s.at("/gear/slings"), "Slings")
                .put("kind", "chain-80")
                .putNull("rated_load_N")
                .put("diameter_m", 0.01)
                .put("hitch", "basket"));
    sites.put("another rule set", s -> s.put("rule_set", "DE-DGUV"));
    sites.put("hinge too strong", s -> cutThick(s, 0.3));
    sites.put("dead hinge", s -> tree(s).put("dead_or_decayed", true));
    return sites.entrySet().stream()
        .map(
            e ->
                Arguments.of(
                    units + ", " + e.getKey(),
                    sheet(
                        units,
                        e.getValue(),
                        e.getKey().equals("hinge too strong")
                            ? DemoSite.ROW_6.withHinge(0.3)
                            : DemoSite.ROW_6)));
  }

  @ParameterizedTest
  @CsvSource({
    "open, Open face: sloping floor and roof",
    "conventional, Conventional face: level floor",
    "humboldt, Humboldt face: level roof"
  })
  void theSetupSaysWhichFaceItIs(String face, String said) {
    Worksheet w = sheet("us", s -> ((ObjectNode) s.get("cut")).put("face", face), DemoSite.ROW_6);
    assertThat(MarkdownSheet.write(w))
        .contains(said)
        .contains("the face shuts when the stem has turned F_o");
  }

  private static ObjectNode tree(ObjectNode site) {
    return (ObjectNode) site.get("tree");
  }

  /** The demo's long line made of something else, its breaking load and stiffness not known. */
  private static ObjectNode line(ObjectNode site, String material, double diameter) {
    ObjectNode line = DemoSite.entry(site.at("/gear/lines"), "L1");
    return line.put("material", material)
        .put("diameter_m", diameter)
        .putNull("breaking_load_N")
        .putNull("stiffness_N");
  }

  private static ObjectNode anchor(ObjectNode site, String id, String type) {
    ObjectNode a = DemoSite.entry(site.get("anchors"), id);
    return a.retain("id", "place", "sling_height_m", "rejected", "land").put("type", type);
  }

  private static void cutThick(ObjectNode site, double thickness) {
    ((ObjectNode) site.get("cut")).putArray("hinge_thicknesses_m").add(thickness);
  }

  private static Worksheet sheet(String units, Consumer<ObjectNode> change, Setup setup) {
    return Worksheets.of(
        DemoSite.asItIs().with(change).with(s -> s.put("display", units)).site(),
        setup,
        DemoSite.sources());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("setups")
  void thePrintedNumbersGiveThePrintedResults(String name, Worksheet w) {
    List<PrintedWorksheet.Row> rows = PrintedWorksheet.rows(MarkdownSheet.write(w));
    assertThat(rows.stream().filter(PrintedWorksheet.Row::worked)).hasSizeGreaterThan(30);
    assertThat(rows)
        .filteredOn(PrintedWorksheet.Row::worked)
        .allSatisfy(
            r ->
                assertThat(r.offInLastDigit())
                    .as("%s = %s = %s gives %s", r.symbol(), r.numbers(), r.result(), r.again())
                    .isLessThanOrEqualTo(0.5 + 1e-6));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("setups")
  void everySignOfASumIsALineAboveWithThatNumber(String name, Worksheet w) {
    Map<String, String> above = new HashMap<>();
    for (PrintedWorksheet.Row r : PrintedWorksheet.rows(MarkdownSheet.write(w))) {
      if (r.worked()) {
        String numbers =
            SIGN.matcher(r.formula())
                .replaceAll(
                    m -> {
                      String sign = m.group();
                      String n =
                          WORDS.contains(sign)
                              ? sign
                              : above.containsKey(sign) ? above.get(sign) : end(sign, r);
                      return n.startsWith("−") ? "(" + n + ")" : n;
                    });
        assertThat(numbers).as(r.symbol()).isEqualTo(r.numbers());
      }
      assertThat(above.put(r.symbol(), r.result())).as("%s twice", r.symbol()).isNull();
    }
  }

  /** The result at an input's bad end stands in the name of its line, before the unit. */
  private static String end(String sign, PrintedWorksheet.Row r) {
    assertThat(r.symbol()).isEqualTo("d_" + sign);
    return r.name().replaceFirst(".* it is (−?[0-9.]+).*", "$1");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("setups")
  void roundingBringsLessThanAThousandth(String name, Worksheet w) {
    assertThat(w.compared()).hasSizeGreaterThan(8);
    assertThat(w.compared())
        .allSatisfy(c -> assertThat(c.difference()).as(c.toString()).isLessThan(1e-3));
    if (name.endsWith("lever lost") || name.endsWith("too strong")) {
      return;
    }
    assertThat(w.compared().stream().map(Compared::symbol))
        .contains("T_need", "T_plan", "T_hold", "s_h", "T_up", "T_in", "C", "margin");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("setups")
  void aSumStandsOnItsOwn(String name, Worksheet w) {
    for (Line l : w.lines().filter(Line::worked).toList()) {
      List<Line> few = w.sum(l).lines().toList();
      assertThat(few.get(few.size() - 1)).isEqualTo(l);
      List<String> there = few.stream().map(Line::symbol).toList();
      assertThat(few).allSatisfy(x -> assertThat(there).containsAll(x.dependsOn()));
    }
  }
}
