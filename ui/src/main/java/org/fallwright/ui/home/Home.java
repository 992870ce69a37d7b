package org.fallwright.ui.home;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.Properties;
import java.util.stream.Stream;
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

  /** The base map that a site names: beside its file, else among the base maps. */
  public Optional<Path> picture(Site site, Path siteFile) {
    if (site.picture() == null) {
      return Optional.empty();
    }
    try {
      Path name = Path.of(site.picture().file());
      if (!name.equals(name.getFileName())) {
        return Optional.empty();
      }
      return Stream.of(siteFile.toAbsolutePath().resolveSibling(name), baseMaps.resolve(name))
          .filter(Files::isRegularFile)
          .findFirst();
    } catch (InvalidPathException e) {
      return Optional.empty();
    }
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
