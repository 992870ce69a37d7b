package org.fallwright.core.kit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.JoinedLines;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.LeftBehind;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;

/**
 * What to load for a job, by truck and shelf: first what the setups need, then what is spare.
 *
 * @param heading site and setups
 * @param trucks a list for each truck, and one for what is on none
 * @param leftBehind what does not come, a line each
 * @param notes where the site's copy and the kit differ, and what could not be said
 */
public record LoadOut(
    List<String> heading, List<Truck> trucks, List<String> leftBehind, List<String> notes) {
  /**
   * The list of one truck.
   *
   * @param name the truck
   * @param needed what the setups need, by shelf
   * @param spare what is spare, by shelf
   */
  public record Truck(String name, List<Row> needed, List<Row> spare) {
    public Truck {
      needed = List.copyOf(needed);
      spare = List.copyOf(spare);
    }
  }

  /**
   * One thing to tick.
   *
   * @param item its name
   * @param what what it is
   * @param count how many to take
   * @param length its length, with unit; empty: it has none
   * @param rating what it bears, with unit and kind; empty: not by a figure
   * @param ends how it ends; empty: it has none
   * @param shelf where it lies; empty: not stated
   * @param condition what was last seen and when; empty: not stated
   */
  public record Row(
      String item,
      String what,
      int count,
      String length,
      String rating,
      String ends,
      String shelf,
      String condition) {}

  public LoadOut {
    heading = List.copyOf(heading);
    trucks = List.copyOf(trucks);
    leftBehind = List.copyOf(leftBehind);
    notes = List.copyOf(notes);
  }

  /**
   * The list for some setups of a site, each of which is to be possible.
   *
   * @param kit the kit that the gear is from; null: none at hand, so no truck is known
   */
  public static LoadOut of(Site site, List<Judged> setups, Kit kit) {
    Map<String, Integer> needed = new LinkedHashMap<>();
    setups.forEach(j -> of(site.atHand(), j).forEach((id, n) -> needed.merge(id, n, Math::max)));
    List<Truck> trucks = new ArrayList<>();
    ItemWords words = new ItemWords(site.display().units());
    Loading loading = new Loading(site.atHand().gear(), needed, words);
    List<String> notes = new ArrayList<>();
    if (kit == null) {
      trucks.add(loading.rest("All gear"));
      notes.add("No kit file is at hand, so truck, shelf and condition are not known.");
    } else {
      kit.trucks().forEach(t -> trucks.add(loading.truck(t.id(), kit)));
      Truck rest = loading.rest("On no truck of the kit");
      trucks.add(rest);
      trucks.removeIf(t -> t.needed().isEmpty() && t.spare().isEmpty());
      notes.addAll(Differences.of(site, kit));
    }
    return new LoadOut(
        heading(site, setups),
        trucks,
        site.leftBehind().stream().map(LoadOut::stays).toList(),
        notes);
  }

  private static String stays(LeftBehind l) {
    return l.item() + (l.where() == null ? "" : ", " + l.where());
  }

  private static List<String> heading(Site site, List<Judged> setups) {
    List<String> lines = new ArrayList<>();
    lines.add(site.name());
    DisplayUnits in = site.display().units();
    for (Judged j : setups) {
      Setup s = j.setup();
      lines.add(
          String.format(
              Locale.ROOT,
              "%s (%s) at %s%s%s, lay %05.1f°, line at %s: %s",
              s.source(),
              s.mode(),
              s.place(),
              s.redirects().isEmpty() ? "" : " over " + String.join(", ", s.redirects()),
              s.driver() == null
                  ? ""
                  : ", hauled by " + s.driver().source() + " at " + s.driver().place(),
              s.layDeg(),
              in.length(s.attachHeightM()),
              j.verdict().word()));
    }
    return lines;
  }

  /** How many of each thing a setup needs. */
  private static Map<String, Integer> of(Site site, Judged judged) {
    Setup s = judged.setup();
    Gear gear = site.gear();
    Map<String, Integer> needs = new LinkedHashMap<>();
    JoinedLines.parts(site, s.line()).forEach(l -> needs.put(l.id(), 1));
    if (s.driver() != null) {
      gear.lines().stream().filter(l -> !l.pullLine()).forEach(l -> needs.put(l.id(), 1));
      needs.put(s.driver().source(), 1);
    }
    needs.put(s.source(), 1);
    strongest(gear.blocks(), asked(judged, "blocks"), needs);
    strongest(gear.slings(), asked(judged, "slings"), needs);
    strongest(gear.connectors(), asked(judged, "connectors"), needs);
    if (gear.loadCell() != null) {
      needs.put(gear.loadCell().id(), 1);
    }
    return needs;
  }

  /** So many of a kind, the strongest first, for those were judged. */
  private static void strongest(
      List<? extends Gear.Item> kind, int asked, Map<String, Integer> needs) {
    int open = asked;
    for (Gear.Item item :
        kind.stream()
            .sorted(
                Comparator.comparingDouble(
                    (Gear.Item i) -> -Ratings.of(i).orElseThrow().asRiggedN()))
            .toList()) {
      int take = Math.min(open, item.count());
      if (take > 0) {
        needs.put(item.id(), take);
        open -= take;
      }
    }
  }

  private static int asked(Judged judged, String check) {
    return judged.checks().stream()
        .filter(c -> c.id().equals(check))
        .mapToInt((Check c) -> (int) c.limit())
        .findFirst()
        .orElse(0);
  }
}
