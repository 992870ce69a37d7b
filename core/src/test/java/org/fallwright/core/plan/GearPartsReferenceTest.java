package org.fallwright.core.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.fallwright.core.outside.CheckValue;
import org.fallwright.core.site.Site;
import org.fallwright.core.statics.Part;
import org.junit.jupiter.api.Test;

/** Strength of the parts of a setup against sums worked by hand from the catalogue's figures. */
class GearPartsReferenceTest {
  private static final String WHOLE =
      """
      {"id": "L", "material": "hmpe", "diameter_m": 0.012, "length_m": 80,
       "breaking_load_N": 120000, "tree_end": {"kind": "eye-splice", "stated": null},
       "source_end": {"kind": "eye-splice", "stated": null}, "bend": null, "wet": true,
       "weathered": false, "age": null, "stiffness_N": null, "pull_line": true}""";
  private static final String SLING =
      """
      {"id": "S", "kind": "round-sling", "rated_load_N": 20000, "diameter_m": null,
       "standard_factor": null, "hitch": "vertical", "angle_deg": null, "count": 4}""";
  private static final String SHACKLE =
      """
      {"id": "C", "kind": "shackle", "rated_load_N": 31900, "standard_factor": null,
       "body_diameter_m": null, "aside_deg": 0, "count": 4}""";
  private static final String BLOCK =
      """
      {"id": "B", "rated_load_N": 30000, "standard_factor": null,
       "sheave": "rescue-pulley", "sheave_diameter_m": 0.06, "efficiency": null}""";

  private static ObjectNode json(String text) {
    try {
      return (ObjectNode) new ObjectMapper().readTree(text);
    } catch (JsonProcessingException e) {
      throw new IllegalArgumentException(e);
    }
  }

  /** The tiny site with this gear; a second rated point lets the line turn over a block. */
  private static Site site(
      ObjectNode line, ObjectNode block, ObjectNode connector, ObjectNode... slings) {
    return TinySite.site(
        5000,
        s -> {
          ObjectNode gear = (ObjectNode) s.get("gear");
          gear.putArray("lines").add(line);
          gear.putArray("blocks").add(block);
          gear.putArray("connectors").add(connector);
          gear.putArray("slings").addAll(List.of(slings));
          TinySite.add(
              s,
              "anchors",
              """
              {"type": "rated", "id": "R2",
               "place": {"at": [3, 25], "ground_m": 0, "fix": "tapes", "stated_error_m": null},
               "sling_height_m": 1, "rejected": null, "land": null,
               "breaking_load_N": 200000, "vouched_by": "A"}""");
        });
  }

  private static Setup over(List<String> redirects) {
    return new Setup(0, 6, 0.03, "L", redirects, "steady", "pull", "R1", null);
  }

  private static Part part(Site site, Setup setup, String name) {
    return new Judge(site, TinySite.SOURCES)
        .parts(setup).stream().filter(p -> p.name().equals(name)).findFirst().orElseThrow();
  }

  /** 120 kN × 0.30 (a knot in HMPE) × 1 (wet) × 0.70 (two years of weather) = 25.2 kN. */
  @Test
  void aKnottedLineOfHmpe() {
    ObjectNode line = json(WHOLE).put("weathered", true);
    line.set("tree_end", json("{\"kind\": \"bowline\", \"stated\": null}"));
    Site site = site(line, json(BLOCK), json(SHACKLE), json(SLING));
    Part p = part(site, over(List.of()), "line L");
    CheckValue.of(
            "knots in HMPE, from memory; US Navy NAVEDTRA 14160", "120 kN, bowline", 25_200, "N")
        .fromMemory()
        .isMet(p.strengthN(), 1e-6);
    assertThat(p.designFactor()).isEqualTo(5);
    assertThat(new Judge(site, TinySite.SOURCES).judge(over(List.of())).notes())
        .contains("Line L is knotted at the tree: HMPE slips in knots. Splice it.");
  }

  /**
   * 10 mm, steel core, no label: 0.356 × (0.01 m)² × 1770 MPa = 63.012 kN. Clips 0.80, the socket
   * at the other end 0.95: the weaker counts. Sheave of 60 mm: six diameters, 0.79. Some broken
   * wires 0.9. 63.012 × 0.80 × 0.79 × 0.9 = 35.8412 kN, of which a third may be used.
   */
  @Test
  void aWireRopeWithClipsRoundASmallSheave() {
    ObjectNode line =
        json(WHOLE)
            .put("material", "wire-steel-core")
            .put("diameter_m", 0.01)
            .putNull("breaking_load_N");
    line.set("tree_end", json("{\"kind\": \"wire-clips\", \"stated\": null}"));
    line.set("source_end", json("{\"kind\": \"wire-swaged-socket\", \"stated\": null}"));
    line.set("age", json("{\"value\": 0.9, \"why\": \"some broken wires\"}"));
    Site site = site(line, json(BLOCK), json(SHACKLE), json(SLING));
    Setup setup = over(List.of("R2"));
    Part p = part(site, setup, "line L");
    CheckValue.of("EN 12385-4 and WRTB, from memory; US Army TM 5-3810", "10 mm", 35_841.2, "N")
        .fromMemory()
        .isMet(p.strengthN(), 0.1);
    assertThat(p.designFactor()).isEqualTo(3);
    // low end of a rescue pulley
    assertThat(p.hauling()).isCloseTo(1 / 0.75, within(1e-12));
    assertThat(part(site, over(List.of()), "line L").strengthN())
        .isCloseTo(63_012 * 0.8 * 0.9, within(1e-6));
    List<String> notes = new Judge(site, TinySite.SOURCES).judge(setup).notes();
    assertThat(notes)
        .contains(
            "Line L: its end at the tree needs 3 drop-forged clips (4 of others), at least 3.0 in"
                + " apart.")
        .anyMatch(n -> n.startsWith("Line L has no label: "));
    // a sheave of unknown size: bent round its own thickness, half
    Site unknown = site(line, json(BLOCK).putNull("sheave_diameter_m"), json(SHACKLE), json(SLING));
    assertThat(part(unknown, setup, "line L").strengthN())
        .isCloseTo(63_012 * 0.8 * 0.5 * 0.9, within(1e-6));
  }

  /** 20 kN × 0.80 (choker) × 0.87 (choked at 90 to 120 degrees) = 13.92 kN, × 5 to break. */
  @Test
  void aSlingChokedAtAHundredDegrees() {
    ObjectNode sling = json(SLING).put("hitch", "choker").put("angle_deg", 100);
    Site site = site(json(WHOLE), json(BLOCK), json(SHACKLE), sling);
    Part p = part(site, over(List.of()), "sling at R1");
    CheckValue.of("ASME B30.9", "20 kN round sling", 5 * 13_920, "N")
        .fromMemory()
        .isMet(p.strengthN(), 1e-6);
    assertThat(p.designFactor()).isEqualTo(5);
    // not stated: the sharpest, 0.49
    Site unknown = site(json(WHOLE), json(BLOCK), json(SHACKLE), sling.putNull("angle_deg"));
    assertThat(part(unknown, over(List.of()), "sling at R1").strengthN())
        .isCloseTo(5 * 20_000 * 0.8 * 0.49, within(1e-6));
  }

  /** 3 × (5/8)² = 1.171875 short tons = 10,425.5 N; 30 degrees aside 0.70: 7,297.9 N; × 5. */
  @Test
  void anUnmarkedShackleLoadedAside() {
    ObjectNode shackle =
        json(SHACKLE).putNull("rated_load_N").put("body_diameter_m", 0.015875).put("aside_deg", 30);
    Site site = site(json(WHOLE), json(BLOCK), shackle, json(SLING));
    CheckValue.of("US Navy NAVEDTRA 14251; slides on ASME B30.26", "5/8 in", 5 * 7297.86, "N")
        .worked()
        .isMet(part(site, over(List.of()), "connector at R1").strengthN(), 0.5);
    assertThat(new Judge(site, TinySite.SOURCES).judge(over(List.of())).notes())
        .anyMatch(n -> n.startsWith("C has no readable mark: "))
        .contains("C counts with 70 % of its rating as it is rigged.");
  }

  /** Grade 80 of 8 mm: 800 MPa × π × 64 mm² ÷ 2 ÷ 4 = 20,106 N; legs at 60°: × 1.7321; × 4. */
  @Test
  void aChainSlingWithoutATagInABasket() {
    ObjectNode chain =
        json(SLING)
            .put("kind", "chain-80")
            .putNull("rated_load_N")
            .put("diameter_m", 0.008)
            .put("hitch", "basket")
            .put("angle_deg", 60);
    Site site = site(json(WHOLE), json(BLOCK), json(SHACKLE), chain);
    Part p = part(site, over(List.of()), "sling at R1");
    CheckValue.of("chain grades, from memory", "8 mm grade 80", 139_300, "N")
        .fromMemory()
        .isMet(p.strengthN(), 5);
    assertThat(p.designFactor()).isEqualTo(4);
  }

  @Test
  void ofTwoSlingsInUseTheWeakerCountsWhereverItIsPut() {
    ObjectNode weak = json(SLING).put("id", "W").put("rated_load_N", 8000).put("count", 1);
    ObjectNode strong = json(SLING).put("count", 1);
    Site site = site(json(WHOLE), json(BLOCK), json(SHACKLE), strong, weak);
    assertThat(part(site, over(List.of()), "sling at R1").strengthN()).isEqualTo(100e3);
    for (String at : List.of("R1", "R2")) {
      assertThat(part(site, over(List.of("R2")), "sling at " + at).strengthN()).isEqualTo(40e3);
    }
  }

  @Test
  void whatIsNotStatedIsTheWorstKnown() {
    ObjectNode line = json(WHOLE).putNull("tree_end").put("material", "polyester");
    Site site = site(line, json(BLOCK), json(SHACKLE), json(SLING));
    // an overhand knot, 0.45
    assertThat(part(site, over(List.of()), "line L").strengthN()).isCloseTo(54e3, within(1e-6));
    assertThat(new Judge(site, TinySite.SOURCES).judge(over(List.of())).notes())
        .contains(
            "How line L ends at the tree is not stated: the weakest known counts, 0.45 of its"
                + " strength.");
  }

  @Test
  void aChainDoesNotRunOverABlock() {
    ObjectNode line =
        json(WHOLE).put("material", "chain-80").put("diameter_m", 0.008).putNull("breaking_load_N");
    line.putNull("tree_end").putNull("source_end");
    Site site = site(line, json(BLOCK), json(SHACKLE), json(SLING));
    Judged over = new Judge(site, TinySite.SOURCES).judge(over(List.of("R2")));
    assertThat(over.checks())
        .filteredOn(c -> c.id().equals("sheave"))
        .singleElement()
        .satisfies(c -> assertThat(c.verdict()).isEqualTo(Verdict.NOT_WORKABLE));
    Part p = part(site, over(List.of()), "line L");
    assertThat(p.strengthN()).isCloseTo(800e6 * Math.PI * 32e-6, within(1e-6));
    assertThat(p.designFactor()).isEqualTo(4);
  }

  @Test
  void aCellAtTheTreeIsReadBeforeTheBlock() {
    Site site =
        TinySite.site(
            5000, s -> ((ObjectNode) s.get("gear").get("load_cell")).put("at", "tree-end"));
    Setup setup = new Setup(0, 6, 0.03, "L2", List.of(), "steady", "pull", "R1", null);
    Figures f = new Judge(site, TinySite.SOURCES).judge(setup).figures();
    assertThat(f.stopReadingAt()).isEqualTo("tree end of the pull line");
    assertThat(f.stopReadingN()).isEqualTo(f.ceilingN());
    Site haul =
        TinySite.site(
            5000, s -> ((ObjectNode) s.get("gear").get("load_cell")).put("at", "haul-part"));
    Judged none = new Judge(haul, TinySite.SOURCES).judge(setup);
    assertThat(none.figures().stopReadingN()).isNaN();
    assertThat(none.notes())
        .contains(
            "This setup has no haul part of blocks, where load cell LC1 is to sit, so nothing is"
                + " read.");
  }
}
