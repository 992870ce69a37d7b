package org.fallwright.core.rules;

import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.type.TypeReference;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.PropertyNamingStrategies;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** All rule sets, read from {@code rule-sets.json}. */
public final class RuleSets {
  /** The table that every set's approach distance is at least held to. */
  static final String FLOOR = "US-EM385";

  private static final RuleSets SHIPPED = read();

  private final String dateRead;
  private final Map<String, Item> items;
  private final Map<String, Map<String, Cell>> cells = new LinkedHashMap<>();
  private final Map<String, ApproachTable> tables = new LinkedHashMap<>();
  private final Map<String, RuleSet> sets = new LinkedHashMap<>();

  private record Resource(
      String dateRead, Map<String, Item> items, List<SetRow> sets, List<ApproachTable> tables) {}

  private record SetRow(String key, String name, List<String> tables, Map<String, Cell> cells) {}

  private record Item(String unit, String strictest, String basis) {}

  private record Cell(double value, Comparison metWhen, String citation, Status status) {}

  private RuleSets(Resource resource) {
    dateRead = resource.dateRead();
    items = resource.items();
    for (ApproachTable t : resource.tables()) {
      tables.put(t.key(), t);
    }
    for (SetRow row : resource.sets()) {
      for (String item : row.cells().keySet()) {
        if (!items.containsKey(item)) {
          throw new IllegalArgumentException(row.key() + " has an unknown rule " + item);
        }
      }
      cells.put(row.key(), row.cells());
      List<ApproachTable> own = new ArrayList<>();
      for (String t : row.tables()) {
        own.add(table(t));
      }
      sets.put(row.key(), new RuleSet(this, row.key(), row.name(), own));
    }
  }

  /** The sets that ship with the program. */
  public static RuleSets shipped() {
    return SHIPPED;
  }

  /** Year and month in which the texts were last read. */
  public String dateRead() {
    return dateRead;
  }

  /** Keys of all sets, in a fixed order. */
  public List<String> keys() {
    return List.copyOf(sets.keySet());
  }

  /**
   * The set of a key.
   *
   * @throws IllegalArgumentException one sentence with the keys there are
   */
  public RuleSet byKey(String key) {
    RuleSet set = sets.get(key);
    if (set == null) {
      throw new IllegalArgumentException("rules is " + key + "; it must be one of " + keys());
    }
    return set;
  }

  /**
   * The approach table of a key.
   *
   * @throws IllegalArgumentException one sentence with the keys there are
   */
  public ApproachTable table(String key) {
    ApproachTable table = tables.get(key);
    if (table == null) {
      throw new IllegalArgumentException(
          "table is " + key + "; it must be one of " + tables.keySet());
    }
    return table;
  }

  Optional<Rule> own(String key, String item) {
    Cell cell = cells.get(key).get(item);
    if (cell == null) {
      return Optional.empty();
    }
    Item i = items.get(item);
    return Optional.of(
        new Rule(
            cell.value(),
            i.unit(),
            cell.metWhen(),
            i.basis(),
            cell.citation(),
            cell.status(),
            false,
            null));
  }

  Rule rule(String key, String item) {
    return own(key, item).orElseGet(() -> strictest(item));
  }

  /** Whether a gap is filled from the other sets. */
  private boolean filled(String item) {
    return !items.get(item).strictest().equals("none");
  }

  List<RuleSet.Entry> entries(String key) {
    return items.entrySet().stream()
        .map(
            e -> {
              Optional<Rule> own = own(key, e.getKey());
              return new RuleSet.Entry(
                  e.getKey(),
                  e.getValue().basis(),
                  own,
                  filled(e.getKey()) ? Optional.of(rule(key, e.getKey())) : own);
            })
        .toList();
  }

  /** Every approach table there is, those that no set uses among them. */
  public List<ApproachTable> allTables() {
    return List.copyOf(tables.values());
  }

  private Rule strictest(String item) {
    if (!filled(item)) {
      throw new IllegalStateException("a gap in " + item + " is not filled from other sets");
    }
    // a strict "more than" is stricter than "at least"; between equals the better read text is
    // named
    Comparator<Rule> byValue = Comparator.comparingDouble(Rule::value);
    Comparator<Rule> stricter =
        (items.get(item).strictest().equals("least") ? byValue.reversed() : byValue)
            .thenComparing(Rule::comparison)
            .thenComparing(Comparator.comparing(Rule::status).reversed());
    return cells.keySet().stream()
        .flatMap(k -> own(k, item).map(r -> r.from(k)).stream())
        .max(stricter)
        .orElseThrow(() -> new IllegalStateException("no set has a rule " + item));
  }

  Optional<Rule> approach(String key, List<ApproachTable> own, Double kv) {
    if (kv == null) {
      return Optional.empty();
    }
    Optional<Rule> mine = greatest(own, kv);
    Optional<Rule> floor = table(FLOOR).distance(kv).map(r -> r.from(FLOOR));
    if (mine.isPresent()) {
      return mine.get().value() >= floor.map(Rule::value).orElse(0.0) ? mine : floor;
    }
    return sets.keySet().stream()
        .filter(k -> !k.equals(key))
        .flatMap(k -> greatest(setTables(k), kv).map(r -> r.from(k)).stream())
        .max(Comparator.comparingDouble(Rule::value));
  }

  private List<ApproachTable> setTables(String key) {
    return sets.get(key).approachTables();
  }

  private static Optional<Rule> greatest(List<ApproachTable> from, double kv) {
    return from.stream()
        .flatMap(t -> t.distance(kv).stream())
        .max(Comparator.comparingDouble(Rule::value));
  }

  private static RuleSets read() {
    JsonMapper mapper =
        JsonMapper.builder()
            .propertyNamingStrategy(PropertyNamingStrategies.SNAKE_CASE)
            .enable(JsonParser.Feature.STRICT_DUPLICATE_DETECTION)
            .enable(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES)
            .enable(DeserializationFeature.FAIL_ON_NULL_FOR_PRIMITIVES)
            .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
            .build();
    try (InputStream in = RuleSets.class.getResourceAsStream("rule-sets.json")) {
      return new RuleSets(mapper.readValue(in, new TypeReference<Resource>() {}));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
