package org.fallwright.core.site;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import org.fallwright.core.store.SiteFile;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class SiteTest {
  private Site site;

  @BeforeEach
  void demo() throws Exception {
    site = SiteFile.read(Path.of("..", "ui", "demo", "oak-behind-the-house.fallsite.json"));
  }

  @Test
  void otherUnitsChangeNothingElse() {
    Site metric = site.in(Site.Display.METRIC);
    assertThat(metric.display()).isEqualTo(Site.Display.METRIC);
    assertThat(metric.in(Site.Display.US)).isEqualTo(site);
  }

  @Test
  void otherWiresChangeNothingElse() {
    Site bare = site.withWires(List.of());
    assertThat(bare.wires()).isEmpty();
    assertThat(bare.withWires(site.wires())).isEqualTo(site);
  }

  @Test
  void anUnstatedWireHasNeitherVoltageNorWitness() {
    Wire wire = site.wires().get(0);
    Wire blank = wire.unstated();
    assertThat(blank.voltageKv()).isNull();
    assertThat(blank.voltageSaidBy()).isNull();
    assertThat(blank.poles()).isEqualTo(wire.poles());
    assertThat(blank.id()).isEqualTo(wire.id());
    assertThat(blank.errorM()).isEqualTo(wire.errorM());
  }
}
