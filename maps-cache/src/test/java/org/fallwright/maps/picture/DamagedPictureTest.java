package org.fallwright.maps.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageWriteParam;
import javax.imageio.ImageWriter;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A picture that is cut short or damaged is refused by name; nothing of it comes out black. */
class DamagedPictureTest {
  private static final BufferedImage IMAGE = PictureTilesReferenceTest.speckled(700, 600);

  @TempDir Path folder;

  @ParameterizedTest
  @ValueSource(ints = {0, 4, 7, 100, 2000, 50_000})
  void aTiffFileCutShortIsNamed(int bytes) throws IOException {
    Path file = tiff("Deflate", 256);
    byte[] all = Files.readAllBytes(file);
    assertThat(all.length).isGreaterThan(bytes);
    Files.write(file, Arrays.copyOf(all, bytes));
    assertThatThrownBy(() -> TiffRaster.open(file))
        .isInstanceOf(IOException.class)
        .hasMessageStartingWith("picture " + file + " ");
  }

  @Test
  void aTiffFileShortOfItsLastByteSaysHowMuchIsMissing() throws IOException {
    Path file = tiff(null, 0);
    long needed = 0;
    TiffLayout layout = TiffLayout.of(file);
    for (int i = 0; i < layout.offsets().length; i++) {
      needed = Math.max(needed, layout.offsets()[i] + layout.lengths()[i]);
    }
    long end = needed;
    byte[] all = Files.readAllBytes(file);
    // the head lies in front of the pixels here, so that only pixels are lost
    assertThat(end).isEqualTo(all.length);
    Files.write(file, Arrays.copyOf(all, all.length - 1));
    assertThatThrownBy(() -> TiffRaster.open(file))
        .hasMessageContaining("is cut short: it has " + (end - 1) + " bytes and needs " + end);
  }

  @Test
  void aPieceOverwrittenIsNamedByItsPlace() throws IOException {
    Path file = tiff("Deflate", 256);
    TiffLayout layout = TiffLayout.of(file);
    byte[] all = Files.readAllBytes(file);
    int from = (int) layout.offsets()[4];
    Arrays.fill(all, from, from + (int) layout.lengths()[4], (byte) 0);
    Files.write(file, all);
    try (TiffRaster raster = TiffRaster.open(file)) {
      assertThat(raster.argb(10, 10)).isEqualTo(IMAGE.getRGB(10, 10));
      assertThatThrownBy(() -> raster.argb(300, 300))
          .isInstanceOf(IOException.class)
          .hasMessage(
              "picture %s is damaged: its part at column 256, row 256 cannot be read"
                  .formatted(file));
    }
  }

  @Test
  void aPieceThatIsBlackAllOverShowsNothing() throws IOException {
    BufferedImage image = new BufferedImage(512, 256, BufferedImage.TYPE_INT_RGB);
    image.getGraphics().drawImage(IMAGE, 0, 0, 256, 256, null);
    Path file = folder.resolve("half.tif");
    write(image, file, "Deflate", 256);
    try (TiffRaster raster = TiffRaster.open(file)) {
      assertThat(raster.argb(300, 10)).isZero();
      assertThat(raster.argb(30, 10) >>> 24).isEqualTo(255);
      assertThat(raster.blackPieces()).isEqualTo(1);
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"png", "jpg"})
  void aPlainPictureCutShortIsNamed(String kind) throws IOException {
    Path file = folder.resolve("plan." + kind);
    ImageIO.write(IMAGE, kind, file.toFile());
    byte[] all = Files.readAllBytes(file);
    for (int part = 1; part < 10; part++) {
      Files.write(file, Arrays.copyOf(all, all.length * part / 10));
      assertThatThrownBy(() -> HeldRaster.read(file))
          .as(part + " tenths")
          .isInstanceOf(IOException.class)
          .hasMessageContaining(file.toString());
    }
  }

  @Test
  void aPictureTooLargeForTheMemoryIsReadCoarser() throws IOException {
    Path file = folder.resolve("plan.png");
    ImageIO.write(IMAGE, "png", file.toFile());
    HeldRaster raster = HeldRaster.read(file, 110_000);
    assertThat(raster.step()).isEqualTo(2);
    assertThat(raster.width()).isEqualTo(700);
    assertThat(raster.argb(400, 300)).isEqualTo(IMAGE.getRGB(400, 300));
    assertThat(raster.argb(699, 599)).isEqualTo(IMAGE.getRGB(698, 598));
  }

  @Test
  void aPictureThatDoesNotSayWhereItLiesIsSentToControlPoints() throws IOException {
    Path file = folder.resolve("plan.png");
    ImageIO.write(IMAGE, "png", file.toFile());
    assertThatThrownBy(() -> GroundPicture.open(file, null)).hasMessageContaining("control points");
    Files.writeString(folder.resolve("plan.pgw"), "0.5\n0\n0\n-0.5\n500000.25\n5300000.75\n");
    assertThatThrownBy(() -> GroundPicture.open(file, null)).hasMessageContaining("EPSG code");
    try (GroundPicture picture = GroundPicture.open(file, "EPSG:32632")) {
      // the corner lies half a pixel from the middle of the first pixel: at 500000, 5300001
      assertThat(picture.placing().toPixel(picture.placing().toEarth(0, 0)).distance(0, 0))
          .isLessThan(1e-6);
      var corner = org.fallwright.maps.frame.EpsgFrame.of("EPSG:32632");
      assertThat(corner.fromEarth(picture.placing().toEarth(0, 0)).distance(500000, 5300001))
          .isLessThan(1e-4);
    }
    Files.writeString(folder.resolve("plan.pgw"), "0.5\n0\nnorth\n-0.5\n5\n5\n");
    assertThatThrownBy(() -> GroundPicture.open(file, "EPSG:32632"))
        .hasMessageContaining("line 3: \"north\" is not a number");
  }

  private Path tiff(String compression, int tile) throws IOException {
    Path file = folder.resolve("p.tif");
    write(IMAGE, file, compression, tile);
    return file;
  }

  private static void write(BufferedImage image, Path file, String compression, int tile)
      throws IOException {
    ImageWriter writer =
        new it.geosolutions.imageioimpl.plugins.tiff.TIFFImageWriterSpi().createWriterInstance();
    Files.deleteIfExists(file);
    try (var out = ImageIO.createImageOutputStream(file.toFile())) {
      ImageWriteParam how = writer.getDefaultWriteParam();
      if (compression != null) {
        how.setCompressionMode(ImageWriteParam.MODE_EXPLICIT);
        how.setCompressionType(compression);
      }
      if (tile > 0) {
        how.setTilingMode(ImageWriteParam.MODE_EXPLICIT);
        how.setTiling(tile, tile, 0, 0);
      }
      writer.setOutput(out);
      writer.write(null, new IIOImage(image, null, null), how);
    } finally {
      writer.dispose();
    }
  }
}
