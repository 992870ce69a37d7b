package org.fallwright.ui.cli;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import org.fallwright.maps.store.MapShelf;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

@Command(name = "verify", description = "Read every tile of a base map and name what is damaged.")
final class BasemapVerify extends Subcommand {
  @Parameters(paramLabel = "NAME", description = "Name of a base map, or a path to one.")
  private String name;

  BasemapVerify(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    try {
      Path place = home.maps().find(name, Path.of("here")).orElse(Path.of(name));
      MapShelf.Verified v = MapShelf.verify(place);
      v.named().forEach(out()::println);
      if (v.damaged() > v.named().size()) {
        out().println("and " + (v.damaged() - v.named().size()) + " more");
      }
      out()
          .println(
              place
                  + ": "
                  + v.tiles()
                  + " tiles, "
                  + (v.damaged() == 0 ? "all whole." : v.damaged() + " damaged."));
      return v.damaged() == 0 ? Exit.DONE : Exit.BAD_INPUT;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
