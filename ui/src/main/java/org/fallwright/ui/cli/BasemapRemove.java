package org.fallwright.ui.cli;

import java.io.IOException;
import java.io.UncheckedIOException;
import org.fallwright.maps.store.MapShelf;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

@Command(
    name = "remove",
    description =
        "Remove one of your own base maps, finished or not; one that is read in place is only"
            + " forgotten.")
final class BasemapRemove extends Subcommand {
  @Parameters(paramLabel = "NAME", description = "Its name, as list has it.")
  private String name;

  BasemapRemove(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    try {
      long freed = new MapShelf(Home.ownMaps()).remove(name);
      out().println(name + " is removed; " + BasemapList.size(freed) + " set free.");
      return Exit.DONE;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
