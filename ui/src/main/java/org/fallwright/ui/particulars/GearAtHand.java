package org.fallwright.ui.particulars;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.fallwright.core.kit.Differences;
import org.fallwright.core.kit.ItemWords;
import org.fallwright.core.kit.Kit;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;
import org.fallwright.ui.text.Messages;

/**
 * The gear as the rail shows it.
 *
 * @param lines a line for each thing that can be named alone
 * @param kit what is said of the kit, a paragraph each
 */
public record GearAtHand(List<Line> lines, List<String> kit) {
  /**
   * One thing.
   *
   * @param item its name
   * @param what what it is, how long and how strong
   * @param atHand whether it comes
   */
  public record Line(String item, String what, boolean atHand) {}

  public GearAtHand {
    lines = List.copyOf(lines);
    kit = List.copyOf(kit);
  }

  /**
   * The gear of a site.
   *
   * @param kit the kit that it names; null: not at hand
   * @param display units
   */
  public static GearAtHand of(Site site, Kit kit, Site.Display display) {
    ItemWords words = new ItemWords(display.units());
    List<Line> lines = new ArrayList<>();
    for (Gear.Item item : site.gear().items()) {
      boolean behind = site.leftBehind().stream().anyMatch(l -> l.item().equals(item.id()));
      String what =
          Stream.of(
                  item.count() > 1 ? item.count() + " ×" : "",
                  words.length(item),
                  words.what(item),
                  words.rating(item))
              .filter(s -> !s.isEmpty())
              .collect(Collectors.joining(" "));
      lines.add(new Line(item.id(), what, !behind));
    }
    List<String> said = new ArrayList<>();
    if (site.kit() != null) {
      said.add(Messages.text(kit == null ? "gear.no-kit" : "gear.kit", site.kit()));
      if (kit != null) {
        said.addAll(Differences.of(site.in(display), kit));
      }
    }
    return new GearAtHand(lines, said);
  }

  /** Whether only ticks differ. */
  boolean sameBut(GearAtHand other) {
    return kit.equals(other.kit) && words(lines).equals(words(other.lines));
  }

  private static List<String> words(List<Line> lines) {
    return lines.stream().flatMap(l -> Stream.of(l.item(), l.what())).toList();
  }
}
