package org.fallwright.core.store;

import com.fasterxml.jackson.annotation.JsonSubTypes;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonMappingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.exc.InvalidTypeIdException;
import com.fasterxml.jackson.databind.exc.MismatchedInputException;
import com.fasterxml.jackson.databind.exc.UnrecognizedPropertyException;
import com.fasterxml.jackson.databind.exc.ValueInstantiationException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.fallwright.core.site.Site;

/** From a tree of JSON to the site's records; every refusal becomes one sentence. */
final class Binding {
  private static final Pattern QUOTED = Pattern.compile("\"([^\"]*)\"");
  private static final Pattern DANGLING =
      Pattern.compile("(?:gear\\.sources|anchors)\\..*( names \".*)");

  private Binding() {}

  static Site site(JsonNode root, String file) throws SiteFileException {
    Site site;
    try {
      site = SiteJson.MAPPER.treeToValue(root, Site.class);
    } catch (JsonMappingException e) {
      throw new SiteFileException(file + ": " + sentence(root, e) + ".", e);
    } catch (JsonProcessingException | IllegalArgumentException e) {
      throw new SiteFileException(file + " does not hold a site of this form.", e);
    }
    echo(root, SiteJson.MAPPER.valueToTree(site), "", file);
    return site;
  }

  private static String sentence(JsonNode root, JsonMappingException e) {
    String path = path(e.getPath());
    if (e instanceof UnrecognizedPropertyException unknown) {
      return unknown(path, Said.fields(unknown.getReferringClass()));
    }
    if (e instanceof ValueInstantiationException refused
        && refused.getCause() instanceof IllegalArgumentException cause) {
      return refused(
          root, at(root, e.getPath()), path, refused.getType().getRawClass(), cause.getMessage());
    }
    JsonNode found = at(root, e.getPath());
    if (found.isMissingNode()) {
      Optional<String> misspelled = misspelled(root, e.getPath());
      if (misspelled.isPresent()) {
        return misspelled.get();
      }
    }
    if (e instanceof InvalidTypeIdException type) {
      String kinds = "it must be one of " + kinds(type.getBaseType().getRawClass());
      JsonNode given = found.path("type");
      return Tree.child(path, "type") + " is " + Said.value(given) + "; " + kinds;
    }
    String is = " is " + Said.value(found);
    if (e instanceof MismatchedInputException mismatch && mismatch.getTargetType() != null) {
      return path + is + "; it must be " + Said.expected(mismatch.getTargetType());
    }
    return path + is + "; it must be a whole number, and a smaller one";
  }

  private static String unknown(String path, List<String> fields) {
    return Said.path(path) + " is not a known field; known there are " + String.join(", ", fields);
  }

  /** An unknown field beside a missing one: most likely the missing one, misspelled. */
  private static Optional<String> misspelled(
      JsonNode root, List<JsonMappingException.Reference> missing) {
    List<JsonMappingException.Reference> parent = missing.subList(0, missing.size() - 1);
    if (!(missing.get(parent.size()).getFrom() instanceof Class<?> record) || !record.isRecord()) {
      return Optional.empty();
    }
    List<String> fields = Said.fields(record);
    boolean typed = !kinds(record).isEmpty();
    return at(root, parent).properties().stream()
        .map(Map.Entry::getKey)
        .filter(f -> !fields.contains(f) && !(typed && f.equals("type")))
        .findFirst()
        .map(f -> unknown(Tree.child(path(parent), f), fields));
  }

  /** What a record's constructor said, with the path to the field that it named. */
  private static String refused(
      JsonNode root, JsonNode given, String path, Class<?> record, String said) {
    List<String> fields = Said.fields(record);
    String first = said.split("[ .]", 2)[0];
    String places = record == Site.class ? String.join(" and ", named(root, said)) : "";
    if (!places.isEmpty()) {
      Matcher dangling = DANGLING.matcher(said);
      return dangling.matches() ? places + dangling.group(1) : places + ": " + said;
    }
    if (fields.contains(first)) {
      Class<?> type = record.getRecordComponents()[fields.indexOf(first)].getType();
      if (given.path(first).isTextual() && !type.isAssignableFrom(String.class) && !type.isEnum()) {
        return Tree.child(path, first)
            + " is "
            + Said.value(given.path(first))
            + "; it must be "
            + Said.expected(type);
      }
      return Tree.child(path, said);
    }
    return (fields.size() == 1 ? Tree.child(path, fields.get(0)) : path) + ": " + said;
  }

  /** Where the name that a sentence about the whole site quotes stands in the file. */
  private static List<String> named(JsonNode root, String said) {
    Matcher name = QUOTED.matcher(said);
    List<String> places = new ArrayList<>();
    if (name.find()) {
      boolean twice = said.contains("twice");
      find(root, "", name.group(1), places);
      places.removeIf(p -> p.contains(".parameters") || twice != p.endsWith("id"));
    }
    return places;
  }

  private static void find(JsonNode node, String path, String name, List<String> places) {
    if (node.isTextual() && node.textValue().equals(name)) {
      places.add(path);
    }
    for (int i = 0; node.isArray() && i < node.size(); i++) {
      find(node.get(i), path + "[" + i + "]", name, places);
    }
    for (Map.Entry<String, JsonNode> field : node.properties()) {
      find(field.getValue(), Tree.child(path, field.getKey()), name, places);
    }
  }

  /**
   * Compares what the file holds with what was understood, so that nothing is made to fit unseen.
   */
  private static void echo(JsonNode given, JsonNode understood, String path, String file)
      throws SiteFileException {
    if (given.isNumber() && understood.isNumber()) {
      if (given.doubleValue() == understood.doubleValue()) {
        return;
      }
    } else if (given.isArray() && understood.isArray() && given.size() == understood.size()) {
      for (int i = 0; i < given.size(); i++) {
        echo(given.get(i), understood.get(i), path + "[" + i + "]", file);
      }
      return;
    } else if (given.isObject() && understood.isObject() && given.size() == understood.size()) {
      for (Map.Entry<String, JsonNode> field : given.properties()) {
        echo(
            field.getValue(),
            understood.path(field.getKey()),
            Tree.child(path, field.getKey()),
            file);
      }
      return;
    } else if (given.equals(understood)) {
      return;
    }
    throw new SiteFileException(
        file
            + ": "
            + path
            + " is "
            + Said.value(given)
            + "; written exactly it would be "
            + Said.value(understood)
            + ".");
  }

  private static String kinds(Class<?> base) {
    return Stream.concat(Stream.of(base), Arrays.stream(base.getInterfaces()))
        .filter(c -> c.isAnnotationPresent(JsonSubTypes.class))
        .flatMap(c -> Arrays.stream(c.getAnnotation(JsonSubTypes.class).value()))
        .filter(t -> base.isAssignableFrom(t.value()))
        .map(t -> "\"" + t.name() + "\"")
        .collect(Collectors.joining(", "));
  }

  private static String path(List<JsonMappingException.Reference> references) {
    String path = "";
    for (JsonMappingException.Reference r : references) {
      path =
          r.getFieldName() == null
              ? path + "[" + r.getIndex() + "]"
              : Tree.child(path, r.getFieldName());
    }
    return path;
  }

  private static JsonNode at(JsonNode root, List<JsonMappingException.Reference> references) {
    JsonNode node = root;
    for (JsonMappingException.Reference r : references) {
      node = r.getFieldName() == null ? node.path(r.getIndex()) : node.path(r.getFieldName());
    }
    return node;
  }
}
