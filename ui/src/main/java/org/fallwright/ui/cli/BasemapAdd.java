package org.fallwright.ui.cli;

import java.awt.geom.Point2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.UUID;
import org.fallwright.core.site.Position;
import org.fallwright.core.units.Range;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.picture.ControlPoint;
import org.fallwright.maps.picture.GroundPicture;
import org.fallwright.maps.picture.PictureTiles;
import org.fallwright.maps.picture.PlaneFit;
import org.fallwright.maps.picture.Raster;
import org.fallwright.maps.picture.TiffRaster;
import org.fallwright.maps.store.MapShelf;
import org.fallwright.maps.tiles.About;
import org.fallwright.maps.tiles.TileSets;
import org.fallwright.maps.tiles.TileStore;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(
    name = "add",
    description =
        "Take a picture of the ground in: a tile set (read in place), a GeoTIFF, a picture with a"
            + " world file, or a plain picture or page laid down by control points or by a known"
            + " length and a north. Given again after a break it goes on where it was.")
final class BasemapAdd extends Subcommand {
  @Parameters(paramLabel = "FILE", description = "The picture, tile set or folder of tiles.")
  private Path file;

  @Option(names = "--as", paramLabel = "NAME", description = "Its name; without it the file's.")
  private String name;

  @Option(
      names = "--to",
      paramLabel = "FOLDER",
      description = "Where to keep it; without it among your own base maps.")
  private Path folder;

  @Option(
      names = "--source",
      paramLabel = "TEXT",
      description = "Whom the picture is owed to; needed but for tile sets.")
  private String source;

  @Option(names = "--taken", paramLabel = "DATE", description = "When it was taken, if known.")
  private String taken = "";

  @Option(
      names = "--epsg",
      paramLabel = "CODE",
      description = "Number of its coordinate system, where the file does not say.")
  private Integer epsg;

  @Option(
      names = "--finest",
      paramLabel = "ZOOM",
      defaultValue = "0",
      description = "Finest zoom to make; without it as fine as the picture.")
  private int finest;

  @Option(names = "--page", defaultValue = "1", description = "Page of a document.")
  private int page;

  @Option(
      names = "--site",
      paramLabel = "SITE",
      description = "The site that a plain picture is laid on.")
  private Path site;

  @Option(
      names = "--point",
      paramLabel = "X,Y,E,N",
      description =
          "A control point of a plain picture: pixels from its left and upper edge, then metres"
              + " east and north on the site. Two to six.")
  private List<String> points = List.of();

  @Option(
      names = "--stretch",
      description = "The picture may be stretched and askew; needs three points or more.")
  private boolean stretched;

  @Option(
      names = "--length",
      paramLabel = "X,Y,X,Y,M",
      description =
          "A known length: pixels of its ends, then metres. Goes with --north and one --point.")
  private String length;

  @Option(
      names = "--north",
      paramLabel = "DEG",
      description = "Where true north points in the picture: degrees clockwise from its top.")
  private Double north;

  BasemapAdd(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    try {
      MapShelf shelf = new MapShelf(folder == null ? Home.ownMaps() : folder);
      if (Files.isDirectory(file) || named(".mbtiles")) {
        return inPlace(shelf);
      }
      if (source == null || source.isBlank()) {
        throw new Refused("Give --source: whom the picture is owed to.");
      }
      try (GroundPicture picture = picture()) {
        return make(picture, shelf);
      }
    } catch (IllegalArgumentException e) {
      throw new Refused(file + ": " + e.getMessage() + ".");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private int inPlace(MapShelf shelf) throws IOException {
    About about;
    try (TileStore store = TileSets.open(file)) {
      about = store.about();
    }
    String as = name == null ? file.toAbsolutePath().normalize().getFileName().toString() : name;
    shelf.point(as, file);
    out()
        .println(
            String.format(
                Locale.ROOT,
                "%s is read in place at %s: zoom %d to %d, %.2f m a pixel.",
                as,
                file.toAbsolutePath().normalize(),
                about.minZoom(),
                about.maxZoom(),
                about.metresPerPixel()));
    return Exit.DONE;
  }

  private int make(GroundPicture picture, MapShelf shelf) throws IOException {
    PictureTiles tiles = new PictureTiles(picture, title(), source, taken, finest);
    Path to = shelf.file(title());
    long room = Files.getFileStore(shelf.folder()).getUsableSpace();
    out()
        .println(
            String.format(
                Locale.ROOT,
                "Laid by: %s. %d tiles to zoom %d, %.2f m a pixel, about %s; %s are free.",
                picture.how(),
                tiles.tiles(),
                tiles.about().maxZoom(),
                tiles.about().metresPerPixel(),
                BasemapList.size(tiles.bytes()),
                BasemapList.size(room)));
    if (tiles.bytes() > room) {
      throw new Refused("There is not room enough in " + shelf.folder() + ".");
    }
    int[] told = {-1};
    boolean done =
        tiles.write(
            to,
            mark(),
            (n, of) -> {
              int tenth = (int) (10 * n / Math.max(1, of));
              if (tenth > told[0]) {
                told[0] = tenth;
                err().println(10 * tenth + " %");
                err().flush();
              }
              return !Thread.currentThread().isInterrupted();
            });
    if (!done) {
      throw new Refused("Stopped; given again it goes on where it was.");
    }
    if (picture.raster() instanceof TiffRaster tiff && tiff.blackPieces() > 0) {
      out()
          .println(
              tiff.blackPieces()
                  + " of its pieces are black all over and were left blank. If that ground should"
                  + " be shown, the file is damaged.");
    }
    out().println(to + ": " + BasemapList.size(Files.size(to)) + ".");
    return Exit.DONE;
  }

  private GroundPicture picture() throws IOException {
    if (points.isEmpty() && length == null) {
      if (named(".pdf")) {
        throw new Refused("A page needs control points, or a length and a north.");
      }
      return GroundPicture.open(file, epsg == null ? null : "EPSG:" + epsg);
    }
    if (site == null) {
      throw new Refused("Give --site: the site that the points lie on.");
    }
    PlaneFit fit = fit();
    SiteFrame frame = new SiteFrame(Planned.read(site).origin());
    return GroundPicture.plain(pixels(), frame, fit);
  }

  private Raster pixels() throws IOException {
    if (!named(".pdf")) {
      return GroundPicture.pixels(file);
    }
    BufferedImage image = PdfPage.read(file, page);
    out()
        .println(
            "Page " + page + " is " + image.getWidth() + " x " + image.getHeight() + " pixels.");
    return GroundPicture.pixels(image);
  }

  private PlaneFit fit() {
    List<ControlPoint> known = new ArrayList<>();
    for (String p : points) {
      double[] v = numbers("--point", p, 4);
      known.add(new ControlPoint(v[0], v[1], new Position(v[2], v[3])));
    }
    if (length != null) {
      if (north == null || known.size() != 1) {
        throw new Refused("--length goes with --north and one --point.");
      }
      double[] v = numbers("--length", length, 5);
      return PlaneFit.ofLength(
          new Point2D.Double(v[0], v[1]),
          new Point2D.Double(v[2], v[3]),
          v[4],
          north,
          known.get(0));
    }
    PlaneFit fit = PlaneFit.of(known, stretched);
    for (int i = 0; i < known.size(); i++) {
      out().println(String.format(Locale.ROOT, "point %d: %.2f m off", i + 1, fit.misses().get(i)));
    }
    fit.suspect()
        .ifPresent(
            i ->
                out()
                    .println(
                        "Without point "
                            + (i + 1)
                            + " the others fit far better: look at it again."));
    out()
        .println(
            String.format(
                Locale.ROOT,
                "%.3f m a pixel, north %.1f° clockwise from the top. %s",
                fit.metresPerPixel(),
                fit.northDeg(),
                Double.isNaN(fit.errorM())
                    ? "So few points always fit; one more would tell a mistake."
                    : String.format(Locale.ROOT, "Give or take %.2f m.", fit.errorM())));
    return fit;
  }

  /** What makes this run the same as one begun before. */
  private String mark() throws IOException {
    String all =
        String.join(
            "|",
            file.toAbsolutePath().normalize().toString(),
            "" + Files.size(file),
            Files.getLastModifiedTime(file).toString(),
            title(),
            source,
            taken,
            "" + epsg,
            "" + finest,
            "" + page,
            site == null ? "" : Planned.read(site).origin().toString(),
            points.toString(),
            "" + stretched,
            "" + length,
            "" + north);
    return UUID.nameUUIDFromBytes(all.getBytes(StandardCharsets.UTF_8)).toString();
  }

  private String title() {
    if (name != null) {
      return Range.text("--as", name);
    }
    String of = file.getFileName().toString();
    int dot = of.lastIndexOf('.');
    return dot > 0 ? of.substring(0, dot) : of;
  }

  private boolean named(String end) {
    return file.toString().toLowerCase(Locale.ROOT).endsWith(end);
  }

  /** Numbers divided by commas. */
  static double[] numbers(String option, String text, int count) {
    String[] parts = text.split(",", -1);
    double[] v = new double[parts.length];
    try {
      for (int i = 0; i < parts.length; i++) {
        v[i] = Double.parseDouble(parts[i].trim());
      }
    } catch (NumberFormatException e) {
      v = new double[0];
    }
    if (v.length != count) {
      throw new Refused(
          option + " is " + text + "; it must be " + count + " numbers divided by commas.");
    }
    return v;
  }
}
