package org.fallwright.core.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.DoubleNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.fasterxml.jackson.databind.node.POJONode;
import com.fasterxml.jackson.databind.node.TextNode;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.fallwright.core.line.LineFigures;
import org.fallwright.core.line.PartStrength;
import org.fallwright.core.line.RatedFigures;
import org.fallwright.core.line.Sheave;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Looked;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SiteFileTest {
  @TempDir Path folder;

  @Test
  void theFrozenSampleOfFormOneReadsAsThePresentForm() throws IOException {
    Site one = SiteFile.read(Samples.utf8(Samples.formOne()), "one");
    ObjectNode present = (ObjectNode) SiteJson.MAPPER.readTree(Samples.present());
    ObjectNode lifted = (ObjectNode) SiteJson.MAPPER.readTree(SiteFile.bytes(one));
    // the present sample's gear and offer have more than form 1 could say
    for (String gear : List.of("lines", "blocks", "slings", "connectors", "load_cell")) {
      ((ObjectNode) present.get("gear")).set(gear, lifted.get("gear").get(gear));
    }
    present.set("offer", lifted.get("offer"));
    assertThat(one)
        .isEqualTo(
            withoutWhatFormOneLacks(
                SiteFile.read(SiteJson.MAPPER.writeValueAsBytes(present), "present")));
    assertThat(one.strips()).isEmpty();
    assertThat(one.offer().attachHeights()).containsExactly(8.0, 10.5);
    assertThat(one.hingeThicknesses()).containsExactly(0.045, 0.06);
  }

  private static Site withoutWhatFormOneLacks(Site site) {
    Site bare = Copy.with(site, "cases", List.of());
    return Copy.with(Copy.with(bare, "revisions", List.of()), "strips", List.of());
  }

  @Test
  void theGearOfFormOneHoldsWhatItHeld() throws IOException {
    Gear gear = SiteFile.read(Samples.utf8(Samples.formOne()), "one").gear();
    assertThat(gear.lines())
        .extracting(Gear.Line::material)
        .containsExactly(Gear.Material.HMPE, Gear.Material.POLYESTER);
    // breaking load × ends × bend × age of that file: 120 kN × 0.9 and 55 kN × 0.9
    assertThat(gear.lines())
        .extracting(l -> LineFigures.of(l, gear.blocks().get(0)).strengthN())
        .containsExactly(108e3, 49.5e3);
    assertThat(gear.lines())
        .extracting(l -> LineFigures.of(l, null).stiffnessN())
        .containsExactly(2.4e6, 0.22e6);
    assertThat(Sheave.of(gear.blocks().get(0)).value()).isEqualTo(0.95);
    assertThat(gear.slings()).extracting(s -> RatedFigures.of(s).asRiggedN()).containsExactly(30e3);
    assertThat(gear.connectors())
        .extracting(c -> PartStrength.of(RatedFigures.of(c)).strengthN())
        .containsExactly(31900 * 5.0);
  }

  @Test
  void aMaterialThatHasNoWordInFormTwoKeepsItsFigures() throws IOException {
    String other =
        Samples.formOne()
            .replace(
                "\"material\": \"HMPE\",\n      \"wire_rope\": false",
                "\"material\": \"6x19\",\n      \"wire_rope\": true")
            .replace("\"polyester\"", "\"aramid, old\"");
    List<Gear.Line> lines = SiteFile.read(Samples.utf8(other), "one").gear().lines();
    assertThat(lines.get(0).material()).isEqualTo(Gear.Material.WIRE_FIBRE_CORE);
    assertThat(PartStrength.line(LineFigures.of(lines.get(0), null), 1).designFactor())
        .isEqualTo(3);
    assertThat(lines.get(1).material()).isEqualTo(Gear.Material.POLYPROPYLENE);
    assertThat(lines.get(1).age().why()).contains("aramid, old");
    assertThat(LineFigures.of(lines.get(1), null).strengthN()).isEqualTo(49.5e3);
  }

  @Test
  void theSampleReads() throws IOException {
    Site site = SiteFile.read(Samples.utf8(Samples.present()), "frozen");
    assertThat(site.version()).isEqualTo(2);
    assertThat(site.tree().dbhM().how()).isEqualTo(How.GUESSED);
    assertThat(site.tree().massKg()).isNull();
    assertThat(site.tree().sections()).extracting(s -> s.midHeightM()).containsExactly(4.5, 11.0);
    assertThat(site.tree().crownOutline()).isNull();
    assertThat(site.tree().iceOrWet()).isTrue();
    assertThat(site.tree().crownOffsetM().northM()).isEqualTo(0.2);
    assertThat(site.anchors().get(3)).isInstanceOf(Anchor.RatedPoint.class);
    assertThat(site.found(Looked.What.BURIED_SERVICES)).isEqualTo(Looked.Found.NOT_LOOKED);
    assertThat(site.wires().get(1).voltageKv()).isNull();
  }

  @Test
  void theDemoSiteIsTheDrawnOne() throws IOException {
    Site site = SiteFile.read(Path.of("../ui/demo/oak-behind-the-house.fallsite.json"));
    assertThat(site.tree().stump().at().eastM()).isEqualTo(16.0);
    assertThat(site.tree().stump().at().northM()).isEqualTo(24.0);
    assertThat(site.anchors()).extracting(Anchor::id).containsExactly("A1", "A2", "A3", "S1");
    assertThat(site.source("tackle").orElseThrow().drivers()).containsExactly("pickup", "crew");
    assertThat(site.tree().stump().at().distanceTo(site.anchor("A1").orElseThrow().place().at()))
        .isBetween(29.0, 29.1);
  }

  @Test
  void whatWasReadIsWrittenAgainByteForByte() throws IOException {
    for (String text : List.of(Samples.present(), Samples.demo())) {
      Site site = SiteFile.read(Samples.utf8(text), "sample");
      assertThat(new String(SiteFile.bytes(site), StandardCharsets.UTF_8)).isEqualTo(text);
    }
  }

  @Test
  void parametersOfAnUnknownPluginAreKeptWholeAndInOrder() throws IOException {
    ObjectNode kept =
        SiteFile.read(Samples.utf8(Samples.present()), "frozen")
            .source("kite")
            .orElseThrow()
            .parameters();
    assertThat(kept.toString())
        .isEqualTo(
            "{\"zeta\":1,\"alpha\":[1,2.5,null,{\"b\":true,\"a\":\"ü\"}],\"Mid\":{},"
                + "\"none\":null,\"big\":12345678901234567890}");
  }

  @Test
  void aByteOrderMarkIsAccepted() throws IOException {
    assertThat(SiteFile.read(Samples.utf8("\uFEFF" + Samples.demo()), "demo"))
        .isEqualTo(SiteFile.read(Samples.utf8(Samples.demo()), "demo"));
  }

  @Test
  void orderOfFieldsAndSpacesDoNotMatter() throws IOException {
    String demo = Samples.demo();
    String turned =
        demo.replaceFirst("\"version\": 2,", "")
            .replaceFirst("\\}\\s*$", ",\n\n\"version\" : 1 }\r\n")
            .replace(
                "\"how\": \"measured\",\n      \"plus_minus\": null",
                "\"plus_minus\":null,\"how\":\"measured\"");
    assertThat(turned).isNotEqualTo(demo);
    assertThat(SiteFile.read(Samples.utf8(turned), "demo"))
        .isEqualTo(SiteFile.read(Samples.utf8(demo), "demo"));
  }

  @Test
  void otherEncodingsAreRefused() throws IOException {
    refused(
        Samples.present().getBytes(StandardCharsets.ISO_8859_1),
        " is not UTF-8 text; a site file must be.");
    refused(
        Samples.demo().getBytes(StandardCharsets.UTF_16),
        " is not UTF-8 text; a site file must be.");
    assertThatThrownBy(
            () -> SiteFile.read(Samples.demo().getBytes(StandardCharsets.UTF_16LE), "job.json"))
        .isInstanceOf(SiteFileException.class);
  }

  @Test
  void whatIsNoSiteIsRefused() {
    refused(new byte[0], " is empty; a site file holds one JSON object.");
    refused(Samples.utf8(" \n"), " is empty; a site file holds one JSON object.");
    refused(Samples.utf8("[1]"), " holds a list of 1; a site file holds one JSON object.");
    refused(Samples.utf8("null"), " holds null; a site file holds one JSON object.");
    refused(Samples.utf8("{}"), ": version is missing; it must be a whole number, at least 1.");
    refused(Samples.utf8("{\"version\": 2}"), ": name is missing; it must be a text in quotes.");
    assertThatThrownBy(() -> SiteFile.read(Samples.utf8("[".repeat(2000)), "job.json"))
        .isInstanceOf(SiteFileException.class)
        .message()
        .startsWith("job.json, line 1, column 1002, in [0][0]")
        .endsWith("…: a number, a text or the nesting is far too long for a site file.")
        .hasSizeLessThan(400);
  }

  @Test
  void aNewerFormIsRefusedBeforeItsFieldsAreLookedAt() {
    refused(
        Samples.utf8("{\"moon\": NaN, \"version\": 7}"),
        " was written by a newer Fallwright (form 7); this one reads up to form 2.");
  }

  @Test
  void aFileBeyondTheLimitIsRefused() {
    byte[] large = new byte[SiteFile.LARGEST + 1];
    Arrays.fill(large, (byte) ' ');
    String said = " is too large for a site file; at most 20 MB are read.";
    refused(large, said);
    assertThatThrownBy(() -> SiteFile.read(new ByteArrayInputStream(large), "job.json"))
        .hasMessage("job.json" + said);
  }

  @Test
  void whatIsNotAFileIsRefused() {
    assertThatThrownBy(() -> SiteFile.read(folder.resolve("none.fallsite.json")))
        .isInstanceOf(SiteFileException.class)
        .hasMessage("none.fallsite.json cannot be read: there is no such file or folder.");
    assertThatThrownBy(() -> SiteFile.read(folder))
        .isInstanceOf(SiteFileException.class)
        .hasMessage(folder.getFileName() + " is a folder, not a site file.");
  }

  @Test
  void writingReplacesTheOldFileAndLeavesNothingBeside() throws IOException {
    Path file = folder.resolve("job" + SiteFile.EXTENSION);
    Site demo = SiteFile.read(Samples.utf8(Samples.demo()), "demo");
    SiteFile.write(SiteFile.read(Samples.utf8(Samples.present()), "frozen"), file);
    SiteFile.write(demo, file);
    assertThat(SiteFile.read(file)).isEqualTo(demo);
    assertThat(Files.readAllBytes(file)).isEqualTo(SiteFile.bytes(demo));
    assertThat(folder.toFile().list()).containsExactly("job.fallsite.json");
  }

  @Test
  void writingThroughALinkKeepsTheLink() throws IOException {
    Path file = folder.resolve("job.fallsite.json");
    Files.writeString(file, "old");
    Path link = Files.createSymbolicLink(folder.resolve("link.fallsite.json"), file);
    Site demo = SiteFile.read(Samples.utf8(Samples.demo()), "demo");
    SiteFile.write(demo, link);
    assertThat(link).isSymbolicLink();
    assertThat(SiteFile.read(file)).isEqualTo(demo);
  }

  @Test
  void aSiteThatCannotBeReadBackIsNotWritten() throws IOException {
    Path file = folder.resolve("job.fallsite.json");
    Files.writeString(file, "old");
    Map<JsonNode, String> bad =
        Map.of(
            DoubleNode.valueOf(Double.NaN),
            ": gear.sources[0].parameters.people is NaN; it must be a finite number.",
            TextNode.valueOf("\uD83C"),
            ": gear.sources[0].parameters.people has half a character in it; a text must be whole.",
            new POJONode(new Object()),
            " cannot be written: a plugin's parameters hold what is not JSON.");
    for (Map.Entry<JsonNode, String> entry : bad.entrySet()) {
      Site demo = SiteFile.read(Samples.utf8(Samples.demo()), "demo");
      demo.source("crew").orElseThrow().parameters().set("people", entry.getKey());
      assertThatThrownBy(() -> SiteFile.write(demo, file))
          .isInstanceOf(SiteFileException.class)
          .hasMessage("job.fallsite.json" + entry.getValue());
      assertThat(file).hasContent("old");
    }
  }

  @Test
  void aFolderThatIsNotThereIsNamedAsTheReason() throws IOException {
    Site demo = SiteFile.read(Samples.utf8(Samples.demo()), "demo");
    assertThatThrownBy(() -> SiteFile.write(demo, folder.resolve("gone/job.fallsite.json")))
        .isInstanceOf(SiteFileException.class)
        .hasMessage("job.fallsite.json cannot be written: there is no such file or folder.");
  }

  @Test
  void namesInTheFileEndInTheirUnit() {
    List<String> names = new ArrayList<>();
    for (String component :
        List.of(
            "breakingLoadN",
            "dbhM",
            "leanDeg",
            "massKg",
            "voltageKv",
            "crownAreaM2",
            "ratedPointN",
            "gustMps",
            "stressPa",
            "ruleSet",
            "id",
            "plan",
            "latDeg")) {
      names.add(SiteJson.fieldName(component));
    }
    assertThat(names)
        .containsExactly(
            "breaking_load_N",
            "dbh_m",
            "lean_deg",
            "mass_kg",
            "voltage_kv",
            "crown_area_m2",
            "rated_point_N",
            "gust_mps",
            "stress_Pa",
            "rule_set",
            "id",
            "plan",
            "lat_deg");
  }

  private static void refused(byte[] bytes, String said) {
    assertThatThrownBy(() -> SiteFile.read(bytes, "job.json"))
        .isInstanceOf(SiteFileException.class)
        .hasMessage("job.json" + said);
  }
}
