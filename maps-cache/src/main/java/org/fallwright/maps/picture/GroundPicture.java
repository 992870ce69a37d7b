package org.fallwright.maps.picture;

import java.awt.geom.AffineTransform;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.fallwright.maps.frame.EpsgFrame;
import org.fallwright.maps.frame.SiteFrame;
import org.geotools.api.data.DataSourceException;
import org.geotools.api.referencing.crs.CoordinateReferenceSystem;
import org.geotools.api.referencing.datum.PixelInCell;
import org.geotools.api.referencing.operation.MathTransform;
import org.geotools.gce.geotiff.GeoTiffReader;

/**
 * A picture and where it lies.
 *
 * @param raster its pixels
 * @param placing where they lie
 * @param how in words, such as the coordinate system
 */
public record GroundPicture(Raster raster, Placing placing, String how) implements AutoCloseable {
  /**
   * Opens a picture that lays itself: a GeoTIFF, or any picture with a world file beside it.
   *
   * @param epsg the coordinate system, such as {@code EPSG:25832}; null: as the file says
   * @throws IOException one sentence naming the file, if it is damaged or does not say where it
   *     lies
   */
  public static GroundPicture open(Path file, String epsg) throws IOException {
    boolean tiff = isTiff(file);
    Raster raster = tiff ? TiffRaster.open(file) : HeldRaster.read(file);
    try {
      if (tiff && ((TiffRaster) raster).layout().georeferenced()) {
        return geoTiff(file, raster, epsg);
      }
      Optional<Path> world = WorldFile.beside(file);
      if (world.isEmpty()) {
        throw new IOException(
            "picture "
                + file
                + " does not say where it lies: it has no coordinates of its own and"
                + " no world file beside it; lay it down by control points");
      }
      if (epsg == null) {
        throw new IOException(
            "picture "
                + file
                + " has a world file, which does not say its coordinate system; give"
                + " its EPSG code");
      }
      EpsgFrame system = EpsgFrame.of(epsg);
      return new GroundPicture(
          raster, Placing.in(system, WorldFile.read(world.get())), system.name());
    } catch (IllegalArgumentException e) {
      raster.close();
      throw new IOException("picture " + file + ": " + e.getMessage(), e);
    } catch (IOException e) {
      raster.close();
      throw e;
    }
  }

  /** A plain picture laid on a site's plane. */
  public static GroundPicture plain(Raster raster, SiteFrame site, PlaneFit fit) {
    return new GroundPicture(raster, Placing.on(site, fit.pixelToPlane()), "site plane");
  }

  /** The pixels of a plain picture file of any kind. */
  public static Raster pixels(Path file) throws IOException {
    return isTiff(file) ? TiffRaster.open(file) : HeldRaster.read(file);
  }

  /** A plain picture made elsewhere, such as a page of a document. */
  public static Raster pixels(BufferedImage image) {
    return HeldRaster.of(image);
  }

  @Override
  public void close() throws IOException {
    raster.close();
  }

  private static GroundPicture geoTiff(Path file, Raster raster, String epsg) throws IOException {
    GeoTiffReader reader = null;
    try {
      // it tells at length of masks and overviews it has looked for in vain
      Logger.getLogger("org.geotools.gce.geotiff").setLevel(Level.SEVERE);
      reader = new GeoTiffReader(file.toFile());
      MathTransform toModel = reader.getOriginalGridToWorld(PixelInCell.CELL_CORNER);
      if (!(toModel instanceof AffineTransform affine)) {
        throw new IOException("picture " + file + " is not laid by a plain map of its pixels");
      }
      EpsgFrame system;
      if (epsg != null) {
        system = EpsgFrame.of(epsg);
      } else {
        CoordinateReferenceSystem crs = reader.getCoordinateReferenceSystem();
        if (crs == null || crs.getName().getCode().toLowerCase(Locale.ROOT).contains("unknown")) {
          throw new IOException(
              "picture " + file + " does not name its coordinate system; give its EPSG code");
        }
        system = EpsgFrame.of(crs.getName().getCode(), crs);
      }
      return new GroundPicture(
          raster, Placing.in(system, new AffineTransform(affine)), system.name());
    } catch (DataSourceException e) {
      throw new IOException("picture " + file + " does not say where it lies", e);
    } finally {
      if (reader != null) {
        reader.dispose();
      }
    }
  }

  private static boolean isTiff(Path file) throws IOException {
    if (!Files.isRegularFile(file)) {
      throw new IOException("picture " + file + " is not there");
    }
    try (var in = Files.newInputStream(file)) {
      byte[] b = in.readNBytes(4);
      return b.length == 4
          && (b[0] == 'I' && b[1] == 'I' && (b[2] == 42 || b[2] == 43) && b[3] == 0
              || b[0] == 'M' && b[1] == 'M' && b[2] == 0 && (b[3] == 42 || b[3] == 43));
    }
  }
}
