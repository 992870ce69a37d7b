package org.fallwright.maps.frame;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class WebMercatorTest {
  @Test
  void theWholeWorldIsOneTileAtZoomNought() {
    assertThat(WebMercator.pixelX(-180, 0)).isZero();
    assertThat(WebMercator.pixelX(180, 0)).isEqualTo(256);
    assertThat(WebMercator.pixelX(0, 0)).isEqualTo(128);
    assertThat(WebMercator.pixelY(0, 0)).isCloseTo(128, within(1e-9));
    assertThat(WebMercator.pixelY(WebMercator.EDGE_LAT_DEG, 0)).isCloseTo(0, within(1e-9));
    // 85.051129 degrees: bound of EPSG:3857
    assertThat(WebMercator.EDGE_LAT_DEG).isCloseTo(85.051129, within(5e-7));
  }

  /**
   * EPSG Guidance Note 7-2, Popular Visualisation Pseudo Mercator, worked example: 24° 22' 54.433"
   * N, 100° 20' 00" W is E -11 169 055.58 m, N 2 800 000.00 m.
   */
  @Test
  void thePublishedExampleComesOut() {
    double lat = 24 + 22 / 60.0 + 54.433 / 3600;
    double lon = -(100 + 20 / 60.0);
    double metres = 2 * Math.PI * 6378137 / 256;
    assertThat((WebMercator.pixelX(lon, 0) - 128) * metres).isCloseTo(-11169055.58, within(0.01));
    assertThat((128 - WebMercator.pixelY(lat, 0)) * metres).isCloseTo(2800000.00, within(0.02));
  }

  @Test
  void aPixelIsWhereItsPlaceIs() {
    for (int zoom = 0; zoom <= WebMercator.DEEPEST; zoom++) {
      for (double lat = -85; lat <= 85; lat += 17) {
        LatLon back =
            WebMercator.place(WebMercator.pixelX(-40, zoom), WebMercator.pixelY(lat, zoom), zoom);
        assertThat(back.latDeg()).isCloseTo(lat, within(1e-9));
        assertThat(back.lonDeg()).isCloseTo(-40, within(1e-9));
      }
    }
  }

  @Test
  void aPixelIsAsLongAsTheZoomSays() {
    // 156 543.03 m a pixel at zoom 0 on the equator (OGC WebMercatorQuad, tile matrix 0)
    assertThat(WebMercator.metresPerPixel(0, 0)).isCloseTo(156543.033928, within(1e-5));
    assertThat(WebMercator.metresPerPixel(60, 20)).isCloseTo(0.0746455, within(1e-6));
  }

  @Test
  void whatHasNoPixelIsRefused() {
    assertThatThrownBy(() -> WebMercator.pixelY(89, 3)).hasMessageContaining("lat_deg is 89");
    assertThatThrownBy(() -> WebMercator.pixelX(0, 23)).hasMessageContaining("zoom is 23");
    assertThatThrownBy(() -> WebMercator.place(257, 0, 0)).hasMessageContaining("pixel x is 257");
  }
}
