package org.fallwright.core.kit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.fallwright.core.site.Gear;

/** Shares the gear out over the trucks: what is needed first, as the places come in the kit. */
final class Loading {
  private final Gear gear;
  private final ItemWords words;
  private final Map<String, Integer> needed;
  private final Map<String, Integer> left = new HashMap<>();

  /**
   * @param gear the gear at hand
   * @param needed how many of each thing are needed
   */
  Loading(Gear gear, Map<String, Integer> needed, ItemWords words) {
    this.gear = gear;
    this.words = words;
    this.needed = new HashMap<>(needed);
    gear.items().forEach(i -> left.put(i.id(), i.count()));
  }

  /** The list of a truck. */
  LoadOut.Truck truck(String truck, Kit kit) {
    List<LoadOut.Row> take = new ArrayList<>();
    List<LoadOut.Row> spare = new ArrayList<>();
    for (Gear.Item item : gear.items()) {
      for (Stowed s : kit.where(item.id())) {
        if (s.truck().equals(truck)) {
          put(item, s.count(), words.shelf(s), words.condition(s), take, spare);
        }
      }
    }
    return sorted(truck, take, spare);
  }

  /** What no truck has had. */
  LoadOut.Truck rest(String name) {
    List<LoadOut.Row> take = new ArrayList<>();
    List<LoadOut.Row> spare = new ArrayList<>();
    gear.items().forEach(i -> put(i, left.get(i.id()), "", "", take, spare));
    return sorted(name, take, spare);
  }

  private void put(
      Gear.Item item,
      int there,
      String shelf,
      String condition,
      List<LoadOut.Row> take,
      List<LoadOut.Row> spare) {
    int count = Math.min(there, left.get(item.id()));
    int first = Math.min(count, needed.getOrDefault(item.id(), 0));
    needed.merge(item.id(), -first, Integer::sum);
    left.merge(item.id(), -count, Integer::sum);
    if (first > 0) {
      take.add(words.row(item, first, shelf, condition));
    }
    if (count > first) {
      spare.add(words.row(item, count - first, shelf, condition));
    }
  }

  private static LoadOut.Truck sorted(
      String name, List<LoadOut.Row> take, List<LoadOut.Row> spare) {
    Comparator<LoadOut.Row> byShelf = Comparator.comparing(LoadOut.Row::shelf);
    take.sort(byShelf);
    spare.sort(byShelf);
    return new LoadOut.Truck(name, take, spare);
  }
}
