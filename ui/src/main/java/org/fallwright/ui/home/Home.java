package org.fallwright.ui.home;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.Properties;
import org.fallwright.core.site.Site;

/**
 * The folders beside the program's jar.
 *
 * @param plugins plugin archives; the system property {@code fallwright.plugins} names another
 *     folder
 * @param baseMaps base maps; the system property {@code fallwright.basemaps} names another folder
 * @param demo the demo site
 * @param version version of the program
 */
public record Home(Path plugins, Path baseMaps, Path demo, String version) {
  private static final String DEMO_SITE = "oak-behind-the-house.fallsite.json";

  /** The home of the program that is running. */
  public static Home found() {
    Path beside = besideProgram();
    return new Home(
        folder("fallwright.plugins", beside.resolve("plugins")),
        folder("fallwright.basemaps", beside.resolve("basemaps")),
        beside.resolve("demo"),
        readVersion());
  }

  /** The demo site's file. */
  public Path demoSite() {
    return demo.resolve(DEMO_SITE);
  }

  /** Where the pictures of sites are looked for. */
  public SiteMaps maps() {
    return SiteMaps.in(ownMaps(), baseMaps);
  }

  /** The picture under all others that a site names. */
  public Optional<Path> picture(Site site, Path siteFile) {
    try {
      return site.picture() == null
          ? Optional.empty()
          : maps().find(site.picture().file(), siteFile);
    } catch (IOException e) {
      return Optional.empty();
    }
  }

  /**
   * The person's own base maps: a folder that can be written to even where the program's cannot.
   * The system property {@code fallwright.ownmaps} names another one.
   */
  public static Path ownMaps() {
    String user = System.getProperty("user.home", ".");
    String local = System.getenv("LOCALAPPDATA");
    String data = System.getenv("XDG_DATA_HOME");
    Path usual =
        local != null
            ? Path.of(local, "Fallwright", "basemaps")
            : System.getProperty("os.name", "").startsWith("Mac")
                ? Path.of(user, "Library", "Application Support", "Fallwright", "basemaps")
                : data != null
                    ? Path.of(data, "fallwright", "basemaps")
                    : Path.of(user, ".local", "share", "fallwright", "basemaps");
    return folder("fallwright.ownmaps", usual);
  }

  private static Path folder(String property, Path usual) {
    String named = System.getProperty(property);
    return named == null ? usual : Path.of(named);
  }

  /** The folder that holds the jar, or the folder of classes in a build. */
  private static Path besideProgram() {
    try {
      return Path.of(Home.class.getProtectionDomain().getCodeSource().getLocation().toURI())
          .toAbsolutePath()
          .getParent();
    } catch (URISyntaxException e) {
      throw new IllegalStateException("the program cannot tell where it is", e);
    }
  }

  private static String readVersion() {
    Properties p = new Properties();
    try (InputStream in = Home.class.getResourceAsStream("version.properties")) {
      p.load(in);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return p.getProperty("version");
  }
}
