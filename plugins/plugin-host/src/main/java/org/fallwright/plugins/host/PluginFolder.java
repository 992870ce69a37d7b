package org.fallwright.plugins.host;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Supplier;
import java.util.jar.JarEntry;
import java.util.jar.JarFile;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceFault;
import org.fallwright.plugins.api.PullSourceExtension;
import org.pf4j.PluginState;
import org.pf4j.PluginWrapper;
import org.pf4j.processor.ExtensionStorage;
import org.pf4j.processor.LegacyExtensionStorage;

/**
 * The pull sources of the plugin archives in one folder, in the order of their ids; which plugins
 * they came from; and what was left out, with the reason. It is read once, when opened.
 *
 * <p>No fault of a plugin stops the program or another plugin. Where two sources have the same id,
 * the one from the archive whose file name comes first stays.
 */
public final class PluginFolder implements PullSources, AutoCloseable {
  private final List<PullSource> sources = new ArrayList<>();
  private final List<LoadedPlugin> loaded = new ArrayList<>();
  private final List<NotLoaded> notLoaded = new ArrayList<>();
  private final Watch watch;
  private final ReasonedManager manager;

  private PluginFolder(Path folder, String hostVersion, Duration limit) {
    watch = new Watch(limit);
    if (!Files.isDirectory(folder)) {
      notLoaded.add(
          new NotLoaded(
              folder.toString(), "The folder of plugins is not there, so none is in use."));
      manager = null;
      return;
    }
    if (!Files.isReadable(folder)) {
      notLoaded.add(
          new NotLoaded(
              folder.toString(), "The folder of plugins may not be read, so none is in use."));
      manager = null;
      return;
    }
    manager = new ReasonedManager(folder, hostVersion, watch);
    manager.loadPlugins();
    manager.startPlugins();
    for (PluginWrapper plugin : manager.inOrder()) {
      if (plugin.getPluginState() == PluginState.STARTED) {
        take(plugin);
      }
    }
    sources.sort(Comparator.comparing(s -> s.describe().id()));
    notLoaded.addAll(manager.refused());
  }

  /**
   * Reads a folder of plugin archives.
   *
   * @param folder where the jars are; it need not exist
   * @param hostVersion version of the program, three numbers, against which each plugin's
   *     requirement is held
   */
  public static PluginFolder open(Path folder, String hostVersion) {
    return new PluginFolder(folder, hostVersion, Watch.USUAL);
  }

  /** The same with another limit of what a call may take. */
  static PluginFolder open(Path folder, String hostVersion, Duration limit) {
    return new PluginFolder(folder, hostVersion, limit);
  }

  @Override
  public List<PullSource> all() {
    return List.copyOf(sources);
  }

  /** Done on a thread that can be given up where a plugin hangs. */
  @Override
  public <T> T asking(Supplier<T> work) {
    try {
      return watch.piece(work::get);
    } catch (RuntimeException | Error thrown) {
      throw thrown;
    } catch (Throwable thrown) { // a supplier throws nothing else
      throw new IllegalStateException(thrown);
    }
  }

  /** The plugins in use, by file name. */
  public List<LoadedPlugin> loaded() {
    return List.copyOf(loaded);
  }

  /** What was left out, and why. */
  public List<NotLoaded> notLoaded() {
    return List.copyOf(notLoaded);
  }

  /** Lets go of the archives; the sources must not be asked afterwards. */
  @Override
  public void close() {
    watch.close();
    if (manager != null) {
      manager.closeArchives();
    }
  }

  private void take(PluginWrapper plugin) {
    List<String> ids = new ArrayList<>();
    Set<String> classNames;
    try {
      classNames = extensionsListed(plugin.getPluginPath());
    } catch (IOException | RuntimeException e) {
      manager.refuse(plugin, "Its list of extensions cannot be read: " + Plainly.said(e) + ".");
      return;
    }
    if (classNames.isEmpty()) {
      manager.refuse(plugin, "It offers no pull source.");
    }
    for (String className : classNames) {
      GuardedSource source;
      try {
        PullSourceExtension made = watch.within(() -> extension(plugin, className));
        source = new GuardedSource(plugin.getPluginId(), made, watch);
      } catch (SourceFault fault) {
        manager.refuse(plugin, fault.getMessage());
        continue;
      } catch (Throwable thrown) { // constructors and linking may throw anything
        manager.refuse(
            plugin,
            "Its extension " + className + " cannot be made: " + Plainly.said(thrown) + ".");
        continue;
      }
      String id = source.describe().id();
      if (byId(id).isPresent()) {
        manager.refuse(plugin, "Its pull source id \"" + id + "\" is taken already.");
      } else {
        sources.add(source);
        ids.add(id);
      }
    }
    if (!ids.isEmpty()) {
      String provider = plugin.getDescriptor().getProvider();
      loaded.add(
          new LoadedPlugin(
              plugin.getPluginId(),
              plugin.getDescriptor().getVersion(),
              provider == null ? "" : provider,
              PullSource.CONTRACT,
              ids));
    }
  }

  /** The list is read from the archive itself: a class loader would fall back on the program's. */
  private static Set<String> extensionsListed(Path archive) throws IOException {
    Set<String> names = new TreeSet<>();
    try (JarFile jar = new JarFile(archive.toFile())) {
      JarEntry list = jar.getJarEntry(LegacyExtensionStorage.EXTENSIONS_RESOURCE);
      if (list != null) {
        try (Reader lines = new InputStreamReader(jar.getInputStream(list), UTF_8)) {
          ExtensionStorage.read(lines, names);
        }
      }
    }
    return names;
  }

  private static PullSourceExtension extension(PluginWrapper plugin, String className)
      throws ReflectiveOperationException {
    Object made = plugin.getPluginClassLoader().loadClass(className).getConstructor().newInstance();
    if (made instanceof PullSourceExtension extension) {
      return extension;
    }
    throw new ClassCastException("it is not built on the program's own extension point");
  }
}
