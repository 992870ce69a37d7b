package org.fallwright.core.store;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.core.JsonPointer;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.lang.reflect.ParameterizedType;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

/** The schema, the specification, the records and the reader say the same. */
class SiteSchemaTest {
  private static final JsonNodeFactory NODES = JsonNodeFactory.instance;
  private static final List<JsonNode> BAD =
      List.of(
          NODES.nullNode(),
          NODES.numberNode(1e12),
          NODES.numberNode(-1e12),
          NODES.booleanNode(true),
          NODES.textNode(""),
          NODES.arrayNode());

  private final JsonNode text =
      SiteJson.MAPPER.readTree(Samples.resource("fallsite-2.schema.json"));
  private final Schema schema =
      SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12).getSchema(text);

  SiteSchemaTest() throws IOException {}

  @Test
  void itTakesTheDemoTheFrozenSampleAndRandomSites() throws IOException {
    assertThat(schema.validate(SiteJson.MAPPER.readTree(Samples.demo()))).isEmpty();
    assertThat(schema.validate(SiteJson.MAPPER.readTree(Samples.present()))).isEmpty();
    for (long seed = 1; seed <= 50; seed++) {
      JsonNode site = SiteJson.MAPPER.readTree(SiteFile.bytes(new RandomSites(seed).site()));
      assertThat(schema.validate(site)).as("seed %d", seed).isEmpty();
    }
  }

  @Test
  void itsPropertiesAreTheComponentsOfTheRecords() {
    Map<String, Class<?>> records = records();
    assertThat(records).hasSizeGreaterThan(25);
    records.forEach(
        (name, record) -> {
          JsonNode def = record == Site.class ? text : text.at("/$defs/" + name);
          List<String> properties = new ArrayList<>();
          def.path("properties").fieldNames().forEachRemaining(properties::add);
          List<String> required = new ArrayList<>();
          def.path("required").forEach(f -> required.add(f.textValue()));
          List<String> expected = new ArrayList<>(Said.fields(record));
          if (def.at("/properties/type").has("const")) {
            expected.add(0, "type");
          }
          assertThat(properties).as(name).containsExactlyElementsOf(expected);
          assertThat(required).as(name).containsExactlyElementsOf(expected);
          assertThat(def.path("additionalProperties").asBoolean(true)).as(name).isFalse();
        });
  }

  @Test
  void everyFieldHasALineInTheSpecification() throws IOException {
    String specification = Files.readString(Path.of("site-file.md"));
    records()
        .forEach(
            (name, record) ->
                Said.fields(record)
                    .forEach(f -> assertThat(specification).as(name).contains("| `" + f + "` |")));
  }

  /**
   * Null, a missing field, one too many, and wrong kinds anywhere: both refuse or both take it, but
   * for names, which only the reader follows.
   */
  @Test
  void itRefusesWhatTheReaderRefuses() throws IOException {
    int tried = 0;
    JsonNode root = SiteJson.MAPPER.readTree(Samples.present());
    List<JsonNode> changed = new ArrayList<>();
    change(root, root, JsonPointer.empty(), changed);
    for (JsonNode site : changed) {
      String verdict = verdict(site);
      if (!verdict.matches(".* names \".*|.* is used twice; .*")) {
        assertThat(schema.validate(site).isEmpty())
            .as("schema against reader: %s", verdict)
            .isEqualTo(verdict.equals("taken"));
        tried++;
      }
    }
    assertThat(tried).isGreaterThan(2000);
  }

  /** What is said twice is refused by both, whatever else the tree says. */
  @Test
  void itRefusesATreeThatIsWeighedTwiceOrDrawnTwice() throws IOException {
    JsonNode mass =
        SiteJson.MAPPER.readTree("{\"value\":3e3,\"how\":\"measured\",\"plus_minus\":null}");
    JsonNode outline =
        SiteJson.MAPPER.readTree("{\"type\":\"polygon\",\"points\":[[-15,5],[-9,5],[-12,10]]}");
    for (int i = 0; i < 4; i++) {
      JsonNode root = SiteJson.MAPPER.readTree(Samples.present());
      ObjectNode tree = (ObjectNode) root.get("tree");
      tree.set(i == 0 ? "mass_kg" : "sections", i == 0 ? mass : NODES.nullNode());
      tree.set("mass_centre_m", i == 1 ? mass.deepCopy() : NODES.nullNode());
      tree.set("crown_outline", i == 2 ? outline : NODES.nullNode());
      if (i == 1) {
        ((ObjectNode) tree.get("mass_centre_m")).put("value", 7);
      }
      boolean once = i == 1 || i == 3;
      assertThat(verdict(root).equals("taken")).as("%d: %s", i, verdict(root)).isEqualTo(once);
      assertThat(schema.validate(root).isEmpty()).as("schema, %d", i).isEqualTo(once);
    }
  }

  private static String verdict(JsonNode root) throws IOException {
    try {
      SiteFile.read(SiteJson.MAPPER.writeValueAsBytes(root), "changed");
      return "taken";
    } catch (SiteFileException e) {
      return e.getMessage();
    }
  }

  /** Copies of the site with one change each, at every place outside a plugin's parameters. */
  static void change(JsonNode root, JsonNode node, JsonPointer at, List<JsonNode> changed) {
    if (node.isObject()) {
      copy(root, at, changed, o -> ((ObjectNode) o).put("surplus", 1));
    }
    for (Map.Entry<String, JsonNode> field : node.properties()) {
      String name = field.getKey();
      copy(root, at, changed, o -> ((ObjectNode) o).remove(name));
      for (JsonNode bad : BAD) {
        copy(root, at, changed, o -> ((ObjectNode) o).set(name, bad));
      }
      if (!name.equals("parameters")) {
        change(root, field.getValue(), at.appendProperty(name), changed);
      }
    }
    for (int i = 0; node.isArray() && i < node.size(); i++) {
      int index = i;
      for (JsonNode bad : BAD) {
        copy(root, at, changed, a -> ((ArrayNode) a).set(index, bad));
      }
      change(root, node.get(i), at.appendIndex(i), changed);
    }
  }

  private static void copy(
      JsonNode root, JsonPointer at, List<JsonNode> changed, Consumer<JsonNode> change) {
    JsonNode copy = root.deepCopy();
    change.accept(copy.at(at));
    changed.add(copy);
  }

  /** Every record of the site file by its name in the schema, found from the site itself. */
  private static Map<String, Class<?>> records() {
    Map<String, Class<?>> found = new TreeMap<>();
    collect(Site.class, found);
    return found;
  }

  private static void collect(Class<?> type, Map<String, Class<?>> found) {
    if (type.isSealed()) {
      Arrays.stream(type.getPermittedSubclasses()).forEach(s -> collect(s, found));
    }
    if (!type.isRecord() || type == Position.class) {
      return;
    }
    String name = type.getName().substring(type.getPackageName().length() + 1).replace('$', '.');
    if (found.put(name, type) == null) {
      Arrays.stream(type.getRecordComponents())
          .flatMap(
              c ->
                  c.getGenericType() instanceof ParameterizedType list
                      ? Stream.of((Class<?>) list.getActualTypeArguments()[0])
                      : Stream.of(c.getType()))
          .filter(c -> c.getPackage() == Site.class.getPackage())
          .forEach(c -> collect(c, found));
    }
  }
}
