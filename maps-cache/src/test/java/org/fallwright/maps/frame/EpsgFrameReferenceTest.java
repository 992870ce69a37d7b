package org.fallwright.maps.frame;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.awt.geom.Point2D;
import net.sf.geographiclib.Geodesic;
import org.fallwright.core.outside.CheckValue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Coordinate systems by code, against values that do not come from the database itself. */
class EpsgFrameReferenceTest {
  /** Value on which two projection libraries agree to the digits given. */
  @Test
  void utm17North() {
    Point2D p = EpsgFrame.of("EPSG:32617").fromEarth(new LatLon(37.2, -80.5));
    String source = "Two projection libraries that agree, UTM zone 17";
    CheckValue.of(source, "37.2 N 80.5 W, easting", 544371.3944, "m").isMet(p.getX(), 1e-4);
    CheckValue.of(source, "37.2 N 80.5 W, northing", 4117176.4518, "m").isMet(p.getY(), 1e-4);
  }

  /**
   * Definition of the UTM grid (DMA TM 8358.2): on the central meridian easting is 500 000 m and
   * the northing 0.9996 of the meridian arc, plus 10 000 000 m in the south.
   */
  @ParameterizedTest
  @CsvSource({
    "EPSG:32610, 45, -123, 0",
    "EPSG:32617, 37.2, -81, 0",
    "EPSG:32632, 60, 9, 0",
    "EPSG:32756, -33.9, 153, 10000000",
    "EPSG:32601, 0, -177, 0"
  })
  void onTheCentralMeridian(String code, double lat, double lon, double falseNorthing) {
    double arc = Math.signum(lat) * Geodesic.WGS84.Inverse(0, lon, lat, lon).s12;
    EpsgFrame frame = EpsgFrame.of(code);
    Point2D p = frame.fromEarth(new LatLon(lat, lon));
    CheckValue.of("DMA TM 8358.2, UTM grid", code + ", easting on its meridian", 500_000, "m")
        .isMet(p.getX(), 1e-6);
    assertThat(p.getY()).isCloseTo(falseNorthing + 0.9996 * arc, within(1e-4));
    LatLon back = frame.toEarth(p.getX(), p.getY());
    assertThat(back.latDeg()).isCloseTo(lat, within(1e-9));
    assertThat(back.lonDeg()).isCloseTo(lon, within(1e-9));
  }

  /** EPSG:4326 is defined latitude first; here x is the longitude all the same. */
  @Test
  void eastComesFirstWhateverTheCodeSays() {
    Point2D p = EpsgFrame.of("EPSG:4326").fromEarth(new LatLon(37.2, -80.5));
    assertThat(p.getX()).isCloseTo(-80.5, within(1e-12));
    assertThat(p.getY()).isCloseTo(37.2, within(1e-12));
  }

  @Test
  void theWebMercatorOfTheTilesIsThatOfTheDatabase() {
    Point2D p = EpsgFrame.of("EPSG:3857").fromEarth(new LatLon(45.0, -40.0));
    double metres = 2 * Math.PI * 6378137 / 256;
    assertThat(p.getX()).isCloseTo((WebMercator.pixelX(-40, 0) - 128) * metres, within(1e-6));
    assertThat(p.getY()).isCloseTo((128 - WebMercator.pixelY(45, 0)) * metres, within(1e-6));
  }

  @Test
  void anUnknownOrUnfitCodeIsRefusedByName() {
    assertThatThrownBy(() -> EpsgFrame.of("EPSG:999999"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("EPSG:999999");
    assertThatThrownBy(() -> EpsgFrame.of("elm street")).hasMessageContaining("elm street");
    assertThatThrownBy(() -> EpsgFrame.of("EPSG:4979"))
        .hasMessageContaining("not one of east and north alone");
  }
}
