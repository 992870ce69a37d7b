package org.fallwright.ui.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.site.Picture;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.maps.picture.Ties;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(
    name = "shift",
    description =
        "Move a site's picture that lies metres off: by hand, or by points seen in it whose true"
            + " place was taped. The site file is written again.")
final class BasemapShift extends Subcommand {
  /** What is left at a tie from which the picture is said to be more than moved [m]; allowance. */
  private static final double TOO_MUCH_M = 0.5;

  @Parameters(paramLabel = "SITE", description = "The site file.")
  private Path file;

  @Option(
      names = "--picture",
      paramLabel = "NAME",
      description = "Which of the site's pictures; without it the one under the others.")
  private String name;

  @Option(names = "--east", paramLabel = "M", description = "Metres east (west: below 0).")
  private Double east;

  @Option(names = "--north", paramLabel = "M", description = "Metres north (south: below 0).")
  private Double north;

  @Option(
      names = "--tie",
      paramLabel = "E,N,E,N",
      description =
          "A point: metres east and north where the unmoved picture shows it, then where it was"
              + " taped to be. May be given several times.")
  private List<String> ties = List.of();

  BasemapShift(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    boolean byHand = east != null || north != null;
    if (byHand == !ties.isEmpty()) {
      throw new Refused("Give either --east and --north, or one --tie or more.");
    }
    Site site = Planned.read(file);
    if (site.picture() == null) {
      throw new Refused("The site has no picture.");
    }
    List<Picture.Layer> layers = new ArrayList<>(site.picture().layers());
    int at = 0;
    while (name != null && at < layers.size() && !layers.get(at).file().equals(name)) {
      at++;
    }
    if (at == layers.size()) {
      throw new Refused("The site has no picture " + name + ".");
    }
    try {
      double e = byHand ? or(east) : 0;
      double n = byHand ? or(north) : 0;
      if (!byHand) {
        Ties found = Ties.of(ties.stream().map(BasemapShift::tie).toList());
        e = found.eastM();
        n = found.northM();
        told(found);
      }
      layers.set(at, layers.get(at).shifted(e, n));
      BasemapLay.write(site.withPicture(Picture.of(layers)), file);
      out()
          .println(
              String.format(
                  Locale.ROOT,
                  "%s: picture %s is moved %.2f m east and %.2f m north.",
                  file,
                  layers.get(at).file(),
                  e,
                  n));
      return Exit.DONE;
    } catch (IllegalArgumentException e) {
      throw new Refused(e.getMessage() + ".");
    }
  }

  private void told(Ties found) {
    for (int i = 0; i < found.missesM().size() && found.missesM().size() > 1; i++) {
      out()
          .println(
              String.format(
                  Locale.ROOT, "tie %d: %.2f m off after moving", i + 1, found.missesM().get(i)));
    }
    if (found.missesM().size() == 1) {
      out().println("One tie cannot be checked; a second one would tell a mistake.");
    } else if (found.worstM() > TOO_MUCH_M) {
      out()
          .println(
              "The ties do not agree: the picture is turned or stretched too, or one is wrong.");
    }
  }

  private static double or(Double v) {
    return v == null ? 0 : v;
  }

  private static Ties.Tie tie(String text) {
    double[] v = BasemapAdd.numbers("--tie", text, 4);
    return new Ties.Tie(new Position(v[0], v[1]), new Position(v[2], v[3]));
  }
}
