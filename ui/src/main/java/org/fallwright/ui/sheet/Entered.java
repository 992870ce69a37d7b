package org.fallwright.ui.sheet;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Looked;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;

/** How well the entries of a site are known: what was looked for, measured, guessed or left out. */
final class Entered {
  private Entered() {}

  /** One line for each kind of doubt there is, none where there is none. */
  static List<String> doubts(Site site) {
    List<String> lines = new ArrayList<>();
    add(lines, "Not looked for: ", notLooked(site));
    add(lines, "Estimated: ", entries(site, How.ESTIMATED));
    add(lines, "Guessed: ", entries(site, How.GUESSED));
    add(lines, "Known as a range: ", entries(site, How.RANGE));
    add(lines, "Not known: ", entries(site, How.UNKNOWN));
    add(lines, "Placed from the picture: ", placed(site, Fix.PICTURE));
    add(lines, "Placed by phone: ", placed(site, Fix.PHONE));
    add(lines, "Defaults: ", defaults(site));
    return lines;
  }

  private static List<String> notLooked(Site site) {
    List<String> what = new ArrayList<>();
    for (Looked.What w : Looked.What.values()) {
      if (site.found(w) == Looked.Found.NOT_LOOKED) {
        what.add(w.name().toLowerCase(Locale.ROOT).replace('_', ' '));
      }
    }
    return what;
  }

  private static List<String> entries(Site site, How how) {
    SubjectTree t = site.tree();
    Map<String, Quantity> all = new LinkedHashMap<>();
    all.put("stem diameter", t.dbhM());
    all.put("stump diameter", t.stumpDiameterM());
    all.put("height", t.heightM());
    all.put("lean", t.leanDeg());
    all.put("way it leans", t.leanAzimuthDeg());
    all.put("mass", t.massKg());
    all.put("mass centre", t.massCentreM());
    all.put("gust", site.conditions().gustMps());
    List<String> names = new ArrayList<>();
    all.forEach(
        (name, q) -> {
          if (q != null && q.how() == how) {
            names.add(name);
          }
        });
    if (site.cut().hingeHow() == how) {
      names.add("hinge thickness");
    }
    if (site.offer().attachHow() == how) {
      names.add("line height");
    }
    return names;
  }

  private static List<String> placed(Site site, Fix fix) {
    List<String> ids = new ArrayList<>();
    if (site.tree().stump().fix() == fix) {
      ids.add(site.tree().id());
    }
    for (Target t : site.targets()) {
      if (t.fix() == fix) {
        ids.add(t.id());
      }
    }
    for (Wire w : site.wires()) {
      if (w.fix() == fix) {
        ids.add(w.id());
      }
    }
    for (Anchor a : site.anchors()) {
      if (a.place().fix() == fix) {
        ids.add(a.id());
      }
    }
    for (Spot s : site.spots()) {
      if (s.place().fix() == fix) {
        ids.add(s.id());
      }
    }
    return ids;
  }

  private static List<String> defaults(Site site) {
    SubjectTree t = site.tree();
    Map<String, Object> all = new LinkedHashMap<>();
    all.put("stump diameter", t.stumpDiameterM());
    if (t.sections() == null) {
      all.put("mass", t.massKg());
      all.put("mass centre", t.massCentreM());
    }
    all.put("crown's wind area", t.crownAreaM2());
    all.put("sound stem", t.shellM());
    all.put("hinge width", site.cut().hingeWidthM());
    all.put("wind against the lay", site.conditions().windTowardDeg());
    all.put("slack of the line", site.conditions().slackM());
    return all.entrySet().stream()
        .filter(e -> e.getValue() == null)
        .map(Map.Entry::getKey)
        .collect(Collectors.toList());
  }

  private static void add(List<String> lines, String head, List<String> items) {
    if (!items.isEmpty()) {
      lines.add(head + String.join(", ", items) + ".");
    }
  }
}
