package org.fallwright.ui.cli;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import javax.imageio.ImageIO;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.MarginMap;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.raster.ContourLines;
import org.fallwright.core.raster.Raster;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.plugins.host.PluginFolder;
import org.fallwright.ui.home.Home;
import org.fallwright.ui.map.MarginPainter;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.map.Pen;
import org.fallwright.ui.map.PlanLayer;
import org.fallwright.ui.map.PlanPainter;
import org.fallwright.ui.map.PlanScene;
import org.fallwright.ui.map.ScaleBar;
import org.fallwright.ui.map.Viewport;
import org.fallwright.ui.sheet.SitePicture;
import org.fallwright.ui.text.Amounts;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.LineString;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(
    name = "stand",
    description = {
      "Say where else the source of a direct setup could stand, and with what pull margin,",
      "the ground taken as at its own spot."
    })
final class StandCommand extends Subcommand {
  /** Half the side of the square looked at [m]. */
  private static final double HALF_M = 100;

  private static final double[] LEVELS = {0.5, 1, 1.25, 1.5, 2};
  private static final int PICTURE = 1400;

  @Parameters(paramLabel = "SITE", description = "The site file.")
  private Path file;

  @Option(
      names = "--setup",
      paramLabel = "RANK",
      required = true,
      description = "Rank of the setup; its source must stand on a spot and pull direct.")
  private int rank;

  @Option(
      names = "--lay",
      paramLabel = "DEG",
      description = "Another lay than the setup's [degrees from true north].")
  private Double lay;

  @Option(
      names = "--cell",
      paramLabel = "M",
      defaultValue = "1",
      description = "Size of a cell, 0.25 to 10 m (${DEFAULT-VALUE}).")
  private double cell;

  @Option(
      names = "--out",
      paramLabel = "FILE",
      description = {
        "A picture (.png), the cells as an ASCII grid in metres of the site plane (.asc),",
        "or the lines of equal margin on the earth (.geojson)."
      })
  private Path out;

  StandCommand(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    if (!(cell >= 0.25 && cell <= 10)) {
      throw new Refused("--cell is " + cell + "; it must be from 0.25 to 10 m.");
    }
    if (lay != null && !(lay >= 0 && lay <= 360)) {
      throw new Refused("--lay is " + lay + "; it must be from 0 to 360 degrees.");
    }
    String end = out == null ? "" : ending(out);
    if (out != null && !List.of(".png", ".asc", ".geojson").contains(end)) {
      throw new Refused("--out is " + out + "; its name must end in .png, .asc or .geojson.");
    }
    Planned planned = Planned.of(home, file);
    Site site = planned.site();
    int most = planned.plan().ranked().size();
    if (rank < 1 || rank > most) {
      throw new Refused("--setup is " + rank + "; this plan has setups 1 to " + most + ".");
    }
    Setup setup = planned.plan().ranked().get(rank - 1).setup();
    Setup direct = lay == null ? setup : setup.withLay(lay);
    try (PluginFolder sources = PluginFolder.open(home.plugins(), home.version())) {
      Judge judge = new Judge(site, sources);
      MarginMap map = MarginMap.of(judge, direct, HALF_M, cell);
      said(site, direct, map);
      if (out != null) {
        WholeFile.write(
            out,
            switch (end) {
              case ".png" -> picture(site, judge.judge(direct), map);
              case ".asc" -> grid(map);
              default -> lines(site, map);
            });
        out().println(out + " is written.");
      }
      return map.atLeast(1).isEmpty() ? Exit.NOTHING_WORKABLE : Exit.DONE;
    } catch (IllegalArgumentException e) {
      throw new Refused(file.getFileName() + ": " + e.getMessage() + ".");
    }
  }

  private static String ending(Path out) {
    String name = out.getFileName().toString().toLowerCase(Locale.ROOT);
    return name.contains(".") ? name.substring(name.lastIndexOf('.')) : "";
  }

  private void said(Site site, Setup direct, MarginMap map) {
    DisplayUnits in = site.display().units();
    double each = cell * cell;
    int open = map.atLeast(0).size();
    out()
        .printf(
            Locale.ROOT,
            "%s on lay %.1f, standing anywhere within %s of the stump, ground as at %s:%n",
            direct.source(),
            direct.layDeg(),
            in.length(HALF_M),
            direct.place());
    out()
        .printf(Locale.ROOT, "  pull margin 1.25 or more: %s%n", area(in, map.atLeast(1.25), each));
    out()
        .printf(
            Locale.ROOT,
            "  from 1 to 1.25 (tight): %s%n",
            area(in, map.atLeast(1).size() - map.atLeast(1.25).size(), each));
    out()
        .printf(
            Locale.ROOT,
            "  less than is needed: %s%n",
            area(in, open - map.atLeast(1).size(), each));
    map.counts()
        .forEach(
            (cut, cells) -> {
              if (cut != MarginMap.Cut.OPEN) {
                out().println("  " + words(cut) + ": " + area(in, cells, each));
              }
            });
    map.best()
        .ifPresent(
            p ->
                out()
                    .printf(
                        Locale.ROOT,
                        "  greatest margin %s at %s east, %s north of the origin, %s from the"
                            + " stump.%n",
                        DisplayUnits.ratio(map.margin().at(p)),
                        in.length(p.eastM()),
                        in.length(p.northM()),
                        in.length(p.distanceTo(site.tree().stump().at()))));
    out()
        .println(
            "Only the pull margin is in this figure. Hold, parts, heading, run-out and slope at the"
                + " place are checked when the place is planned as a spot.");
  }

  private static String area(DisplayUnits in, List<Integer> cells, double each) {
    return area(in, cells.size(), each);
  }

  private static String area(DisplayUnits in, int cells, double each) {
    return in.area(cells * each);
  }

  private static String words(MarginMap.Cut cut) {
    return switch (cut) {
      case OPEN -> "open";
      case TREE_CAN_LAND -> "the tree can come to lie there";
      case TOO_NEAR -> "nearer to the stump than the rules let the operator stand";
      case THING_THERE -> "a thing or an anchor stands there";
      case WIRE_NEAR -> "a wire is overhead or too near";
      case NO_LEVER -> "the line has no lever on the tree from there";
      case OUT_OF_REACH -> "the line does not reach";
      case LINE_FOULED -> "the line would run over or too near a thing";
    };
  }

  private byte[] picture(Site site, Judged judged, MarginMap map) {
    BufferedImage image = new BufferedImage(PICTURE, PICTURE, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(Color.WHITE);
    g.fillRect(0, 0, PICTURE, PICTURE);
    g.setFont(new Font(Font.DIALOG, Font.PLAIN, 15));
    Position stump = site.tree().stump().at();
    Envelope seen = new Envelope(new Coordinate(stump.eastM(), stump.northM()));
    seen.expandBy(HALF_M * 0.75);
    Viewport view = Viewport.fitting(seen, 0, new Rectangle2D.Double(0, 0, PICTURE, PICTURE));
    try (SitePicture picture = SitePicture.open(home, site, file)) {
      PlanScene ground =
          PlanScene.of(site, null).over(picture.painter()).showing(EnumSet.of(PlanLayer.GROUND));
      new PlanPainter(ground).paint(g, view);
      MarginPainter.paint(g, view, map, Palette.DAY);
      EnumSet<PlanLayer> above = EnumSet.allOf(PlanLayer.class);
      above.removeAll(
          EnumSet.of(PlanLayer.GROUND, PlanLayer.SIT_BACK, PlanLayer.BIGHTS, PlanLayer.WAYS_OUT));
      new PlanPainter(PlanScene.of(site, judged).showing(above)).paint(g, view);
      MarginPainter.key(
          g,
          Palette.DAY,
          List.of(
              "pull margin 1.25 or more",
              "1 to 1.25: tight",
              "less than is needed",
              "nobody can stand there, or the line cannot run"));
      ScaleBar.paint(
          new Pen(g, Palette.DAY.halo()),
          view,
          new Amounts(site.display()),
          Palette.DAY,
          30,
          PICTURE - 30,
          300);
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      ImageIO.write(image, "png", bytes);
      return bytes.toByteArray();
    } catch (IOException e) {
      throw new Refused("The picture cannot be drawn: " + e.getMessage() + ".");
    } finally {
      g.dispose();
    }
  }

  /** The cells in the form of an ESRI ASCII grid, north first. */
  private static byte[] grid(MarginMap map) {
    Raster r = map.margin();
    Position first = r.middle(0);
    StringBuilder text = new StringBuilder();
    text.append(
        String.format(
            Locale.ROOT,
            "ncols %d%nnrows %d%nxllcenter %s%nyllcenter %s%ncellsize %s%nNODATA_value -9999%n",
            r.columns(),
            r.rows(),
            first.eastM(),
            first.northM(),
            r.stepM()));
    for (int row = r.rows() - 1; row >= 0; row--) {
      for (int c = 0; c < r.columns(); c++) {
        double m = r.at(c, row);
        text.append(c == 0 ? "" : " ")
            .append(
                Double.isNaN(m) ? "-9999" : String.format(Locale.ROOT, "%.4f", Math.min(m, 9999)));
      }
      text.append(System.lineSeparator());
    }
    return text.toString().getBytes(StandardCharsets.US_ASCII);
  }

  /** The lines of equal margin as GeoJSON, RFC 7946. */
  private static byte[] lines(Site site, MarginMap map) {
    SiteFrame frame = new SiteFrame(site.origin());
    ObjectNode root = JsonNodeFactory.instance.objectNode().put("type", "FeatureCollection");
    ArrayNode features = root.putArray("features");
    for (double level : LEVELS) {
      for (LineString line : ContourLines.of(map.margin(), level)) {
        ObjectNode feature = features.addObject().put("type", "Feature");
        feature.putObject("properties").put("pull_margin", level);
        ArrayNode coordinates =
            feature.putObject("geometry").put("type", "LineString").putArray("coordinates");
        for (Coordinate c : line.getCoordinates()) {
          LatLon p = frame.toEarth(c.x, c.y);
          coordinates.addArray().add(p.lonDeg()).add(p.latDeg());
        }
      }
    }
    try {
      return new ObjectMapper().writerWithDefaultPrettyPrinter().writeValueAsBytes(root);
    } catch (IOException e) {
      throw new IllegalStateException(e);
    }
  }
}
