package org.fallwright.ui.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import org.fallwright.core.kit.Copied;
import org.fallwright.core.kit.Differences;
import org.fallwright.core.kit.ItemWords;
import org.fallwright.core.kit.Kit;
import org.fallwright.core.kit.LoadOutText;
import org.fallwright.core.kit.Person;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.SiteFile;
import org.fallwright.core.store.SiteFileException;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(
    name = "kit",
    description =
        "Show a firm's kit by truck and shelf, copy things of it into a site, or say where a site's"
            + " own copy differs.")
final class KitCommand extends Subcommand {
  @Parameters(paramLabel = "KIT", description = "The kit file.")
  private Path file;

  @ArgGroup private Target target;

  /** The site that is meant, and for what. */
  private static final class Target {
    @Option(
        names = "--into",
        paramLabel = "SITE",
        description = "Copy things into this site's gear; the file is written again.")
    private Path into;

    @Option(
        names = "--against",
        paramLabel = "SITE",
        description = "Say where this site's gear differs from the kit.")
    private Path against;
  }

  @Option(
      names = "--only",
      paramLabel = "ITEM",
      split = ",",
      description = "With --into: these things alone; without it everything.")
  private List<String> only = List.of();

  @Option(
      names = "--at",
      paramLabel = "PLACE",
      split = ",",
      description = "With --into: the spots and anchors where the sources can be.")
  private List<String> places = List.of();

  @Option(
      names = "--units",
      defaultValue = "metric",
      description = "us or metric (${DEFAULT-VALUE}), for the list.")
  private Site.Display units;

  KitCommand(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    Kit kit = Kits.read(file);
    if ((target == null || target.into == null) && !(only.isEmpty() && places.isEmpty())) {
      throw new Refused("--only and --at go with --into.");
    }
    if (target == null) {
      list(kit);
    } else if (target.into != null) {
      copy(kit);
    } else {
      compare(kit);
    }
    return Exit.DONE;
  }

  private void list(Kit kit) {
    ItemWords words = new ItemWords(units.units());
    out().println(kit.name());
    for (Kit.Truck truck : kit.trucks()) {
      out().println();
      out().println(truck.id() + (truck.note() == null ? "" : ", " + truck.note()));
      words.rows(kit, truck.id()).forEach(r -> out().println("  " + LoadOutText.row(r)));
    }
    if (!kit.crew().isEmpty()) {
      out().println();
      out().println("Crew");
      kit.crew().forEach(p -> out().println("  " + person(p)));
    }
  }

  private String person(Person p) {
    String roles =
        p.roles().stream()
            .map(r -> r.name().toLowerCase(Locale.ROOT).replace('_', ' '))
            .collect(Collectors.joining(", "));
    return p.id()
        + (roles.isEmpty() ? "" : ": " + roles)
        + (p.massKg() == null ? "" : ", " + units.units().mass(p.massKg()))
        + (p.statureM() == null ? "" : ", " + units.units().length(p.statureM()));
  }

  private void copy(Kit kit) {
    Site site = Planned.read(target.into);
    Copied copied;
    try {
      copied = Copied.of(site, kit, file.getFileName().toString(), only, places);
    } catch (IllegalArgumentException e) {
      throw new Refused(e.getMessage() + ".");
    }
    try {
      SiteFile.write(copied.site(), target.into);
    } catch (SiteFileException e) {
      throw new Refused(e.getMessage());
    }
    out()
        .println(
            target.into
                + ": "
                + copied.items().size()
                + " things copied from the kit, "
                + String.join(", ", copied.items())
                + ".");
    copied.notes().forEach(out()::println);
  }

  private void compare(Kit kit) {
    List<String> differences = Differences.of(Planned.read(target.against), kit);
    differences.forEach(out()::println);
    if (differences.isEmpty()) {
      out().println("The site's gear is as the kit has it.");
    }
  }
}
