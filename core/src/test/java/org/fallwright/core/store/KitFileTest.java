package org.fallwright.core.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.DoubleNode;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.fallwright.core.kit.Kit;
import org.fallwright.core.kit.Person;
import org.fallwright.core.kit.Stowed;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** The kit file: reader, writer, schema and specification say the same. */
class KitFileTest {
  private static final Path DEMO = Path.of("../ui/demo/two-trucks.fallkit.json");

  @TempDir Path folder;

  private static String sample() throws IOException {
    return Samples.resource("frozen-1.fallkit.json");
  }

  static Stream<Arguments> faults() throws IOException {
    return SiteFileFaultsTest.faults("kit-faults.txt");
  }

  @Test
  void whatWasReadIsWrittenAgainByteForByte() throws IOException {
    for (String text : List.of(sample(), Files.readString(DEMO))) {
      Kit kit = KitFile.read(Samples.utf8(text), "kit");
      assertThat(new String(KitFile.bytes(kit), StandardCharsets.UTF_8)).isEqualTo(text);
    }
  }

  @Test
  void theFrozenSampleReads() throws IOException {
    Kit kit = KitFile.read(Samples.utf8(sample()), "frozen");
    assertThat(kit.loadCells()).extracting(c -> c.id()).containsExactly("LC1", "LC2");
    assertThat(kit.where("Shackles")).extracting(Stowed::count).containsExactly(1, 3);
    assertThat(kit.trucksOf("Shackles")).contains("Truck 1 and Truck 2");
    assertThat(kit.trucksOf("nothing")).isEmpty();
    assertThat(kit.crew().get(0).roles())
        .containsExactly(Person.Role.FELLER, Person.Role.FIRST_AID);
    assertThat(kit.sources().get(1).parameters().get("big").bigIntegerValue())
        .isEqualTo("12345678901234567890");
  }

  @Test
  void theListOfFaultsIsReadWhole() throws IOException {
    long all = Samples.resource("kit-faults.txt").lines().filter(l -> l.startsWith("= ")).count();
    assertThat(faults()).hasSizeGreaterThan(20).hasSize((int) all);
  }

  @ParameterizedTest(name = "{2}")
  @MethodSource("faults")
  void aFaultIsRefusedInOneSentence(String stands, String instead, String said) throws IOException {
    String bad = sample().replaceFirst(Pattern.quote(stands), Matcher.quoteReplacement(instead));
    assertThat(bad).as("the fault must change the sample").isNotEqualTo(sample());
    assertThatThrownBy(() -> KitFile.read(Samples.utf8(bad), "job.json"))
        .isInstanceOf(SiteFileException.class)
        .hasMessage(said);
  }

  @Test
  void itIsCalledAKitFileWhereItIsNone() {
    assertThatThrownBy(() -> KitFile.read(new byte[0], "job.json"))
        .hasMessage("job.json is empty; a kit file holds one JSON object.");
    assertThatThrownBy(() -> KitFile.read(Samples.utf8("[1]"), "job.json"))
        .hasMessage("job.json holds a list of 1; a kit file holds one JSON object.");
    assertThatThrownBy(() -> KitFile.read(Samples.utf8(Samples.present()), "job.json"))
        .hasMessage("job.json is a site file, not a kit file.");
    assertThatThrownBy(() -> SiteFile.read(DEMO))
        .hasMessage("two-trucks.fallkit.json is a kit file, not a site file.");
    assertThatThrownBy(() -> KitFile.read(folder))
        .hasMessage(folder.getFileName() + " is a folder, not a kit file.");
    assertThatThrownBy(() -> KitFile.read(Samples.utf8(sample() + "{}"), "job.json"))
        .message()
        .endsWith(": there is more after the kit's last brace.");
  }

  @Test
  void writingReplacesTheOldFileWholeOrNotAtAll() throws IOException {
    Path file = folder.resolve("firm" + KitFile.EXTENSION);
    Kit demo = KitFile.read(DEMO);
    KitFile.write(KitFile.read(Samples.utf8(sample()), "frozen"), file);
    KitFile.write(demo, file);
    assertThat(KitFile.read(file)).isEqualTo(demo);
    assertThat(folder.toFile().list()).containsExactly("firm.fallkit.json");
    Kit bad = KitFile.read(DEMO);
    bad.sources().get(0).parameters().set("people", DoubleNode.valueOf(Double.NaN));
    assertThatThrownBy(() -> KitFile.write(bad, file))
        .hasMessage(
            "firm.fallkit.json: sources[0].parameters.people is NaN; it must be a finite number.");
    assertThat(KitFile.read(file)).isEqualTo(demo);
  }

  @Test
  void theKitThatASiteNamesIsLookedForBesideIt() throws IOException {
    Path demo = Path.of("../ui/demo/oak-behind-the-house.fallsite.json");
    Site site = SiteFile.read(demo);
    assertThat(KitFile.beside(site, demo)).contains(KitFile.read(DEMO));
    assertThat(KitFile.beside(site, folder.resolve("x.json"))).isEmpty();
    for (String name : new String[] {null, "/", "gone.fallkit.json", "a\0b"}) {
      Site other = site.withGear(site.gear(), name, List.of());
      assertThat(KitFile.beside(other, demo)).as("kit %s", name).isEmpty();
    }
  }

  @Test
  void theSchemaRefusesWhatTheReaderRefuses() throws IOException {
    Schema schema = schema();
    assertThat(schema.validate(SiteJson.MAPPER.readTree(Files.readString(DEMO)))).isEmpty();
    JsonNode root = SiteJson.MAPPER.readTree(sample());
    assertThat(schema.validate(root)).isEmpty();
    List<JsonNode> changed = new ArrayList<>();
    SiteSchemaTest.change(root, root, com.fasterxml.jackson.core.JsonPointer.empty(), changed);
    int tried = 0;
    for (JsonNode kit : changed) {
      String said = "taken";
      try {
        KitFile.read(SiteJson.MAPPER.writeValueAsBytes(kit), "changed");
      } catch (SiteFileException e) {
        said = e.getMessage();
      }
      if (!said.matches(
          ".* names \".*|.* is used twice; .*|.* stowed holds .*|.*: stowed holds .*")) {
        assertThat(schema.validate(kit).isEmpty())
            .as("schema against reader: %s", said)
            .isEqualTo(said.equals("taken"));
        tried++;
      }
    }
    assertThat(tried).isGreaterThan(1000);
  }

  @Test
  void everyFieldIsInTheSchemaAndTheSpecification() throws IOException {
    String specification = Files.readString(Path.of("kit-file.md"));
    JsonNode text = SiteJson.MAPPER.readTree(Samples.resource("fallkit-1.schema.json"));
    Map.of(
            "", Kit.class,
            "/$defs/Kit.Truck", Kit.Truck.class,
            "/$defs/Kit.Source", Kit.Source.class,
            "/$defs/Stowed", Stowed.class,
            "/$defs/Person", Person.class)
        .forEach(
            (at, record) -> {
              List<String> required = new ArrayList<>();
              text.at(at + "/required").forEach(f -> required.add(f.textValue()));
              assertThat(required).containsExactlyElementsOf(Said.fields(record));
              assertThat(text.at(at + "/properties").size()).isEqualTo(required.size());
              required.forEach(f -> assertThat(specification).contains("| `" + f + "` |"));
            });
  }

  private static Schema schema() throws IOException {
    String site = Samples.resource("fallsite-2.schema.json");
    return SchemaRegistry.withDefaultDialect(
            SpecificationVersion.DRAFT_2020_12,
            b -> b.schemas(Map.of("urn:fallwright:fallsite-2", site)))
        .getSchema(SiteJson.MAPPER.readTree(Samples.resource("fallkit-1.schema.json")));
  }
}
