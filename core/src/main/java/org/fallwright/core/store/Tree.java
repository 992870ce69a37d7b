package org.fallwright.core.store;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonPointer;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.io.JsonEOFException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.exc.MismatchedInputException;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.Map;

/**
 * From text to a tree of JSON that is whole, has one meaning, holds finite numbers only, and is of
 * a version that can be bound.
 */
final class Tree {
  private final String file;
  private final Document<?> document;

  private Tree(String file, Document<?> document) {
    this.file = file;
    this.document = document;
  }

  static JsonNode parse(String text, String file, Document<?> document) throws SiteFileException {
    Tree tree = new Tree(file, document);
    JsonNode root = tree.parse(text);
    tree.kind(root);
    tree.version(root);
    tree.sound(root, "", false);
    return root;
  }

  /** The path of a pointer as a person writes it: {@code targets[2].shape.points[0]}. */
  static String path(JsonPointer pointer) {
    StringBuilder path = new StringBuilder();
    for (JsonPointer p = pointer; !p.matches(); p = p.tail()) {
      path.append(step(path.toString(), p));
    }
    return path.toString();
  }

  static String child(String path, String field) {
    return path.isEmpty() ? field : path + "." + field;
  }

  private static String step(String before, JsonPointer p) {
    if (p.mayMatchElement()) {
      return "[" + p.getMatchingIndex() + "]";
    }
    return (before.isEmpty() ? "" : ".") + p.getMatchingProperty();
  }

  private JsonNode parse(String text) throws SiteFileException {
    if (text.isBlank()) {
      throw new SiteFileException(
          file + " is empty; a " + document.file() + " holds one JSON object.");
    }
    try (JsonParser parser = SiteJson.MAPPER.createParser(text)) {
      try {
        JsonNode root = SiteJson.MAPPER.readTree(parser);
        if (parser.nextToken() != null) {
          throw at(
              parser.currentTokenLocation(),
              "",
              "there is more after the " + document.noun() + "'s last brace");
        }
        if (root == null || !root.isObject()) {
          throw new SiteFileException(
              file
                  + " holds "
                  + Said.value(root)
                  + "; a "
                  + document.file()
                  + " holds one JSON object.");
        }
        return root;
      } catch (MismatchedInputException e) {
        String path = path(parser.getParsingContext().pathAsPointer());
        throw new SiteFileException(
            file + ": " + path + " is there twice; each field may be there once.", e);
      } catch (StreamConstraintsException e) {
        throw at(
            parser.currentLocation(),
            path(parser.getParsingContext().pathAsPointer()),
            "a number, a text or the nesting is far too long for a " + document.file());
      } catch (JsonEOFException e) {
        throw at(
            e.getLocation(),
            path(parser.getParsingContext().pathAsPointer()),
            "the file breaks off; it was not saved or copied whole");
      } catch (JsonProcessingException e) {
        throw at(
            e.getLocation(),
            path(parser.getParsingContext().pathAsPointer()),
            "this is not JSON (a comma, colon, quote or bracket is missing, or one is too many)");
      }
    } catch (SiteFileException e) {
      throw e;
    } catch (IOException e) {
      throw new SiteFileException(file + " cannot be read as JSON.", e);
    }
  }

  private SiteFileException at(JsonLocation where, String path, String what) {
    return new SiteFileException(
        file
            + ", line "
            + where.getLineNr()
            + ", column "
            + where.getColumnNr()
            + (path.isEmpty() ? "" : ", in " + Said.path(path))
            + ": "
            + what
            + ".");
  }

  /** A file of another kind is called by its name. */
  private void kind(JsonNode root) throws SiteFileException {
    for (Map.Entry<String, String> other : Document.MARKS.entrySet()) {
      if (root.has(other.getValue()) && !root.has(Document.MARKS.get(document.noun()))) {
        throw new SiteFileException(
            file + " is a " + other.getKey() + " file, not a " + document.file() + ".");
      }
    }
  }

  private void version(JsonNode root) throws SiteFileException {
    JsonNode version = root.get("version");
    if (version == null || !version.isIntegralNumber() || version.bigIntegerValue().signum() <= 0) {
      throw new SiteFileException(
          file
              + ": version is "
              + Said.value(version)
              + "; it must be a whole number, at least 1.");
    }
    if (!version.canConvertToInt() || version.intValue() > document.present()) {
      throw new SiteFileException(
          file
              + " was written by a newer Fallwright (form "
              + Said.value(version)
              + "); this one reads up to form "
              + document.present()
              + ".");
    }
  }

  /**
   * Refuses numbers that are not finite and texts that no file can hold, everywhere, and null
   * entries in lists outside a plugin's own parameters.
   */
  private void sound(JsonNode node, String path, boolean own) throws SiteFileException {
    if (node.isNumber() && !Double.isFinite(node.doubleValue())) {
      throw new SiteFileException(
          file
              + ": "
              + path
              + " is "
              + (Double.isNaN(node.doubleValue()) ? "NaN" : "beyond any number a computer holds")
              + "; it must be a finite number.");
    }
    if (node.isTextual()) {
      whole(node.textValue(), path);
    }
    for (int i = 0; node.isArray() && i < node.size(); i++) {
      if (node.get(i).isNull() && !own) {
        throw new SiteFileException(
            file + ": " + path + "[" + i + "] is null; an entry of a list must be stated.");
      }
      sound(node.get(i), path + "[" + i + "]", own);
    }
    for (Map.Entry<String, JsonNode> field : node.properties()) {
      whole(field.getKey(), path);
      sound(
          field.getValue(),
          child(path, field.getKey()),
          own || field.getKey().equals("parameters"));
    }
  }

  private void whole(String text, String path) throws SiteFileException {
    if (!StandardCharsets.UTF_8.newEncoder().canEncode(text)) {
      throw new SiteFileException(
          file + ": " + path + " has half a character in it; a text must be whole.");
    }
  }
}
