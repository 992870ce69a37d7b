package org.fallwright.core.kit;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;

/** Where a site's own copy of the gear and the kit no longer agree. */
public final class Differences {
  private final DisplayUnits in;
  private final List<String> found = new ArrayList<>();

  private Differences(DisplayUnits in) {
    this.in = in;
  }

  /**
   * A sentence for each thing of the site's gear that the kit does not have, or has otherwise; in
   * the site's units. Places and drivers belong to the site and are not compared.
   */
  public static List<String> of(Site site, Kit kit) {
    Differences d = new Differences(site.display().units());
    for (Gear.Item copy : site.gear().items()) {
      Optional<Gear.Item> own = kit.item(copy.id());
      if (own.isEmpty()) {
        d.found.add(copy.id() + " is not in the kit.");
      } else if (copy instanceof Gear.Source s) {
        d.source(s, own.get());
      } else if (own.get().getClass() != copy.getClass()) {
        d.otherKind(copy.id());
      } else {
        d.record(copy.id(), "", (Record) copy, (Record) own.get());
      }
    }
    return List.copyOf(d.found);
  }

  private void otherKind(String id) {
    found.add(id + " is another kind of thing in the kit.");
  }

  private void source(Gear.Source copy, Gear.Item own) {
    if (!(own instanceof Kit.Source source)) {
      otherKind(copy.id());
      return;
    }
    if (!copy.plugin().equals(source.plugin())) {
      say(copy.id(), "plugin", copy.plugin(), source.plugin());
    }
    Set<String> names = new LinkedHashSet<>();
    copy.parameters().fieldNames().forEachRemaining(names::add);
    source.parameters().fieldNames().forEachRemaining(names::add);
    for (String name : names) {
      if (!same(copy.parameters(), source.parameters(), name)) {
        say(
            copy.id(),
            name,
            copy.parameters().path(name).toString(),
            source.parameters().path(name).toString());
      }
    }
  }

  private static boolean same(ObjectNode a, ObjectNode b, String name) {
    JsonNode x = a.path(name);
    JsonNode y = b.path(name);
    return x.isNumber() && y.isNumber()
        ? Double.compare(x.doubleValue(), y.doubleValue()) == 0
        : x.equals(y);
  }

  private void record(String id, String before, Record copy, Record own) {
    for (RecordComponent c : copy.getClass().getRecordComponents()) {
      Object here = value(c, copy);
      Object there = value(c, own);
      String name = before + name(c);
      if (here instanceof Record a && there instanceof Record b) {
        record(id, name + ", ", a, b);
      } else if (!Objects.equals(here, there)) {
        say(id, name, shown(c, here), shown(c, there));
      }
    }
  }

  private void say(String id, String name, String here, String there) {
    found.add(
        id
            + ": "
            + name
            + " is "
            + (here.isEmpty() ? "not stated" : here)
            + " on the site and "
            + (there.isEmpty() ? "not stated" : there)
            + " in the kit.");
  }

  private static Object value(RecordComponent c, Record of) {
    try {
      return c.getAccessor().invoke(of);
    } catch (ReflectiveOperationException e) {
      throw new IllegalStateException(c.getName() + " cannot be read", e);
    }
  }

  /** {@code breakingLoadN} is "breaking load". */
  private static String name(RecordComponent c) {
    return c.getName()
        .replaceAll("(?:M|N|Deg)$", "")
        .replaceAll("([A-Z])", " $1")
        .toLowerCase(Locale.ROOT);
  }

  private String shown(RecordComponent c, Object value) {
    if (value instanceof Double d) {
      return c.getName().endsWith("N")
          ? in.force(d)
          : c.getName().endsWith("iameterM")
              ? in.smallLength(d)
              : c.getName().endsWith("M")
                  ? in.length(d)
                  : c.getName().endsWith("Deg") ? in.angle(Math.toRadians(d)) : d.toString();
    }
    if (value instanceof Boolean b) {
      return b ? "yes" : "no";
    }
    if (value instanceof Record r) {
      return Arrays.stream(r.getClass().getRecordComponents())
          .map(inner -> shown(inner, value(inner, r)))
          .filter(word -> !word.isEmpty())
          .collect(Collectors.joining(", "));
    }
    return value == null ? "" : Words.of(value);
  }
}
