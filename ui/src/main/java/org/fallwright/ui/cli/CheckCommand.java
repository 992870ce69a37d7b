package org.fallwright.ui.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.DropZone;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.LeftBehind;
import org.fallwright.core.site.Looked;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.ui.home.Home;
import org.fallwright.ui.home.SiteMaps;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

@Command(
    name = "check",
    description =
        "Read a site file and say what it holds, or in one sentence what is wrong with it.")
final class CheckCommand extends Subcommand {
  @Parameters(paramLabel = "SITE", description = "The site file.")
  private Path file;

  CheckCommand(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    Site site = Planned.read(file);
    DisplayUnits in = site.display().units();
    SubjectTree t = site.tree();
    row("site", site.name() + ", rules " + site.ruleSet());
    row(
        "tree",
        String.format(
            Locale.ROOT,
            "%s, %s, %s high, stem %s, leans %.1f° towards %.0f°",
            t.id(),
            t.species(),
            in.length(t.heightM().value()),
            in.smallLength(t.dbhM().value()),
            t.leanDeg().value(),
            t.leanAzimuthDeg().value()));
    row("targets", site.targets().stream().map(Target::id).toList());
    row(
        "wires",
        site.wires().stream()
            .map(
                (Wire w) ->
                    w.id()
                        + (w.voltageKv() == null
                            ? " (voltage not stated)"
                            : String.format(Locale.ROOT, " (%s kV)", w.voltageKv())))
            .toList());
    row("drop zones", site.dropZones().stream().map(DropZone::id).toList());
    row(
        "anchors",
        site.anchors().stream()
            .map((Anchor a) -> a.id() + (a.rejected() == null ? "" : " (rejected)"))
            .toList());
    row("spots", site.spots().stream().map(Spot::id).toList());
    row("lines", site.gear().lines().stream().map(Gear.Line::id).toList());
    row("sources", site.gear().sources().stream().map(Gear.Source::id).toList());
    if (!site.leftBehind().isEmpty()) {
      row("left behind", site.leftBehind().stream().map(LeftBehind::item).toList());
    }
    List<Looked.What> open =
        List.of(Looked.What.values()).stream()
            .filter(w -> site.found(w) == Looked.Found.NOT_LOOKED)
            .toList();
    if (!open.isEmpty()) {
      row(
          "not looked for",
          open.stream()
              .map(w -> w.name().toLowerCase(Locale.ROOT).replace('_', ' '))
              .collect(Collectors.joining(", ")));
    }
    pictures(site);
    return Exit.DONE;
  }

  private void row(String name, List<String> items) {
    row(name, items.isEmpty() ? "none" : items.size() + ": " + String.join(", ", items));
  }

  private void row(String name, String what) {
    out().println(String.format(Locale.ROOT, "%-15s %s", name, what));
  }

  private void pictures(Site site) {
    SiteMaps.Opened opened = home.maps().open(site, file);
    if (opened.fault() != null) {
      err().println(opened.fault());
    }
    try {
      if (opened.ground() != null) {
        opened.ground().close();
      }
    } catch (IOException e) {
      throw new Refused(e.getMessage() + ".");
    }
  }
}
