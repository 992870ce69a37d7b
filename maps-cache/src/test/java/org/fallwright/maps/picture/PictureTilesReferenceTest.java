package org.fallwright.maps.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Point2D;
import java.awt.image.BufferedImage;
import java.nio.file.Path;
import java.util.Random;
import javax.imageio.ImageIO;
import org.fallwright.maps.frame.EpsgFrame;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.WebMercator;
import org.fallwright.maps.tiles.MbTiles;
import org.fallwright.maps.tiles.TileImage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Tiles made of pictures in several projections, against what GDAL's gdalwarp makes of them. */
class PictureTilesReferenceTest {
  private static final double WORLD_M = 2 * Math.PI * 6378137.0;

  @TempDir Path folder;

  /** Projection, place of the picture's corner in it, and its pixel in its unit. */
  @ParameterizedTest
  @CsvSource({
    "EPSG:32632, 500300, 5300200, 0.5, -co TILED=YES -co COMPRESS=DEFLATE",
    "EPSG:25832, 691000, 5334000, 0.2, -co COMPRESS=LZW -co PREDICTOR=2",
    "EPSG:3035, 4321000, 3210000, 0.5, -co COMPRESS=JPEG -co PHOTOMETRIC=YCBCR -co TILED=YES",
    "EPSG:2154, 652000, 6862000, 0.2, -co BIGTIFF=YES -co TILED=YES -co BLOCKXSIZE=128 -co"
        + " BLOCKYSIZE=128",
    "EPSG:2193, 1749000, 5428000, 0.3, -co INTERLEAVE=BAND",
    "EPSG:3006, 674000, 6580000, 0.3, -co ENDIANNESS=BIG",
    "EPSG:2272, 2690000, 240000, 1, -co COMPRESS=PACKBITS",
    "EPSG:4326, 11.5, 48.1, 0.000004, -co TILED=YES"
  })
  void liesWhereGdalwarpHasIt(String crs, double x, double y, double pixel, String how)
      throws Exception {
    String[] options = how.trim().split(" ");
    Path tif = geoTiff(crs, x, y, pixel, options);
    Path set = folder.resolve("set.mbtiles");
    int zoom;
    Point2D tile;
    try (GroundPicture picture = GroundPicture.open(tif, null)) {
      PictureTiles tiles = new PictureTiles(picture, "set", "us", "2026", 0);
      assertThat(tiles.write(set, "mark", (n, of) -> true)).isTrue();
      zoom = tiles.about().maxZoom();
      LatLon middle = picture.placing().toEarth(250, 220);
      tile =
          new Point2D.Double(
              Math.floor(WebMercator.pixelX(middle.lonDeg(), zoom) / 256),
              Math.floor(WebMercator.pixelY(middle.latDeg(), zoom) / 256));
    }
    BufferedImage ours;
    try (MbTiles store = MbTiles.open(set)) {
      ours = TileImage.read(store.tile(zoom, (int) tile.getX(), (int) tile.getY()).orElseThrow());
    }
    double side = WORLD_M / WebMercator.tilesAcross(zoom);
    double west = tile.getX() * side - WORLD_M / 2;
    double north = WORLD_M / 2 - tile.getY() * side;
    Outside.run(
        folder,
        "",
        "gdalwarp",
        "-q",
        "-t_srs",
        "EPSG:3857",
        "-r",
        "bilinear",
        "-et",
        "0",
        "-te",
        "" + west,
        "" + (north - side),
        "" + (west + side),
        "" + north,
        "-ts",
        "256",
        "256",
        "-dstalpha",
        "set.tif",
        "theirs.tif");
    Outside.run(folder, "", "gdal_translate", "-q", "-of", "PNG", "theirs.tif", "theirs.png");
    BufferedImage theirs = ImageIO.read(folder.resolve("theirs.png").toFile());
    Point2D off = offset(ours, theirs);
    assertThat(Math.hypot(off.getX(), off.getY())).as("%s, pixels off", crs).isLessThan(0.15);
  }

  /** Datum shifts are taken by other ways in the two libraries; both are good to some metres. */
  @ParameterizedTest
  @CsvSource({
    "EPSG:25832, 691000, 5334000, 0.01",
    "EPSG:2154, 652000, 6862000, 0.01",
    "EPSG:3035, 4321000, 3210000, 0.01",
    "EPSG:3979, 3882400, 1343400, 0.01",
    "EPSG:2272, 2690000, 240000, 0.01",
    "EPSG:28355, 321000, 5811000, 0.01",
    "EPSG:27700, 530000, 180000, 6",
    "EPSG:31467, 3500000, 5400000, 6"
  })
  void aPointLiesWhereProjHasIt(String crs, double x, double y, double within) throws Exception {
    String[] v =
        Outside.run(
                folder, x + " " + y + "\n", "gdaltransform", "-s_srs", crs, "-t_srs", "EPSG:4326")
            .trim()
            .split("\\s+");
    LatLon ours = EpsgFrame.of(crs).toEarth(x, y);
    double north = (ours.latDeg() - Double.parseDouble(v[1])) * 111_200;
    double east =
        (ours.lonDeg() - Double.parseDouble(v[0]))
            * 111_200
            * Math.cos(Math.toRadians(ours.latDeg()));
    assertThat(Math.hypot(east, north)).as(crs).isLessThan(within);
  }

  /** A fit that may stretch is an affine least squares fit, which GDAL does too. */
  @Test
  void anAffineFitIsGdalsOfTheFirstOrder() throws Exception {
    double[][] p = {{100, 80, 1, 70}, {900, 120, 82, 64}, {850, 700, 75, 5}, {60, 640, -6, 13}};
    var points = new java.util.ArrayList<ControlPoint>();
    var command = new java.util.ArrayList<String>(java.util.List.of("gdaltransform"));
    for (double[] q : p) {
      points.add(new ControlPoint(q[0], q[1], new org.fallwright.core.site.Position(q[2], q[3])));
      command.add("-gcp");
      for (double n : q) {
        command.add("" + n);
      }
    }
    command.addAll(java.util.List.of("-order", "1"));
    String[] v =
        Outside.run(folder, "400 300\n", command.toArray(String[]::new)).trim().split("\\s+");
    Point2D ours =
        PlaneFit.of(points, true).pixelToPlane().transform(new Point2D.Double(400, 300), null);
    assertThat(ours.distance(Double.parseDouble(v[0]), Double.parseDouble(v[1]))).isLessThan(1e-6);
  }

  private Path geoTiff(String crs, double x, double y, double pixel, String... how)
      throws Exception {
    ImageIO.write(speckled(500, 440), "png", folder.resolve("p.png").toFile());
    String[] fixed = {
      "gdal_translate",
      "-q",
      "-a_srs",
      crs,
      "-a_ullr",
      "" + x,
      "" + y,
      "" + (x + 500 * pixel),
      "" + (y - 440 * pixel),
      "p.png",
      "set.tif"
    };
    String[] all = java.util.Arrays.copyOf(fixed, fixed.length + how.length);
    System.arraycopy(how, 0, all, fixed.length, how.length);
    Outside.run(folder, "", all);
    return folder.resolve("set.tif");
  }

  /** A picture without likeness to itself moved. */
  static BufferedImage speckled(int width, int height) {
    BufferedImage image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(new Color(90, 120, 60));
    g.fillRect(0, 0, width, height);
    Random random = new Random(4);
    for (int i = 0; i < width * height / 150; i++) {
      g.setColor(new Color(random.nextInt(200) + 30, random.nextInt(200) + 30, 80));
      g.fillOval(random.nextInt(width), random.nextInt(height), 6 + i % 12, 6 + i % 9);
    }
    g.dispose();
    return image;
  }

  /**
   * How far one picture lies off the other [pixels]: the shift that least squares of their
   * difference over the brightness slopes ask for.
   */
  private static Point2D offset(BufferedImage a, BufferedImage b) {
    double xx = 0;
    double xy = 0;
    double yy = 0;
    double xt = 0;
    double yt = 0;
    double left = 0;
    double all = 0;
    int n = 0;
    for (int y = 4; y < 252; y++) {
      for (int x = 4; x < 252; x++) {
        if ((a.getRGB(x, y) & b.getRGB(x, y)) >>> 24 == 255) {
          double gx = (green(b, x + 1, y) - green(b, x - 1, y)) / 2.0;
          double gy = (green(b, x, y + 1) - green(b, x, y - 1)) / 2.0;
          double t = green(a, x, y) - green(b, x, y);
          xx += gx * gx;
          xy += gx * gy;
          yy += gy * gy;
          xt += gx * t;
          yt += gy * t;
          left += Math.abs(t);
          all += Math.abs(green(b, x + 2, y) - green(b, x, y));
          n++;
        }
      }
    }
    assertThat(n).as("pixels compared").isGreaterThan(10_000);
    assertThat(left).as("difference, against that of two pixels aside").isLessThan(0.6 * all);
    double d = xx * yy - xy * xy;
    return new Point2D.Double((xt * yy - yt * xy) / d, (yt * xx - xt * xy) / d);
  }

  private static int green(BufferedImage image, int x, int y) {
    return image.getRGB(x, y) >> 8 & 255;
  }
}
