package org.fallwright.plugins.host;

import java.io.Closeable;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.jar.JarFile;
import org.fallwright.core.pull.PullSource;
import org.pf4j.DefaultPluginManager;
import org.pf4j.JarPluginLoader;
import org.pf4j.JarPluginRepository;
import org.pf4j.ManifestPluginDescriptorFinder;
import org.pf4j.PluginDependency;
import org.pf4j.PluginDescriptor;
import org.pf4j.PluginDescriptorFinder;
import org.pf4j.PluginFactory;
import org.pf4j.PluginLoader;
import org.pf4j.PluginRepository;
import org.pf4j.PluginState;
import org.pf4j.PluginWrapper;

/**
 * PF4J's manager, made to outlive every broken archive and to say why it was left out.
 *
 * <p>As it comes, three faults stop all plugins (a dependency that is not there, a ring of
 * dependencies, a range of versions that cannot be read; also an archive without a manifest), and
 * the cause of others is only in its log. Here each archive is read, checked, sorted and started on
 * its own. Archives are taken in the order of their file names, from one folder, as jars only; the
 * folder is never written to.
 */
final class ReasonedManager extends DefaultPluginManager {
  /** Manifest entry by which an archive says for which {@link PullSource#CONTRACT} it was built. */
  static final String CONTRACT_KEY = "Pull-Contract";

  private final List<NotLoaded> refused = new ArrayList<>();

  ReasonedManager(Path folder, String hostVersion) {
    super(folder);
    setSystemVersion(hostVersion); // before loading, else Plugin-Requires is ignored
  }

  /** What was left out so far, and why. */
  List<NotLoaded> refused() {
    return List.copyOf(refused);
  }

  void refuse(PluginWrapper plugin, String reason) {
    refused.add(new NotLoaded(plugin.getPluginPath().getFileName().toString(), reason));
  }

  /** Reads every archive, each on its own. */
  @Override
  public void loadPlugins() {
    List<Path> archives = new ArrayList<>(pluginRepository.getPluginPaths());
    archives.sort(null);
    for (Path archive : archives) {
      reasonAgainst(archive)
          .ifPresent(r -> refused.add(new NotLoaded(archive.getFileName().toString(), r)));
    }
    resolvePlugins();
  }

  private Optional<String> reasonAgainst(Path archive) {
    PluginDescriptor descriptor;
    try {
      descriptor = pluginDescriptorFinder.find(archive);
    } catch (NullPointerException e) { // what PF4J makes of an archive without a manifest
      return Optional.of("It has no manifest, so it is not a plugin.");
    } catch (RuntimeException | LinkageError e) {
      return Optional.of("It cannot be read as a plugin archive: " + Plainly.said(e) + ".");
    }
    String id = descriptor.getPluginId();
    if (id == null || id.isBlank()) {
      return Optional.of("Its manifest names no Plugin-Id.");
    }
    if (descriptor.getVersion() == null) {
      return Optional.of("Its manifest names no Plugin-Version.");
    }
    if (plugins.containsKey(id)) {
      return Optional.of(
          "Its plugin id \""
              + id
              + "\" is taken by "
              + plugins.get(id).getPluginPath().getFileName()
              + ".");
    }
    Optional<String> other = otherContract(archive);
    if (other.isPresent()) {
      return other;
    }
    try {
      loadPluginFromPath(archive);
    } catch (RuntimeException | LinkageError e) {
      return Optional.of("It cannot be loaded: " + Plainly.said(e) + ".");
    }
    return Optional.empty();
  }

  /** Whether it fits this version of the program; a range that cannot be read does not. */
  @Override
  protected boolean isPluginValid(PluginWrapper plugin) {
    String asked = plugin.getDescriptor().getRequires();
    try {
      if (super.isPluginValid(plugin)) {
        return true;
      }
      refuse(
          plugin,
          "It asks for version " + asked + " of the program, and this is " + systemVersion + ".");
    } catch (RuntimeException e) {
      refuse(plugin, "Its Plugin-Requires \"" + asked + "\" cannot be read as versions.");
    }
    return false;
  }

  /** Why an archive's contract is not this program's; empty: it is. No class of it is loaded. */
  private static Optional<String> otherContract(Path archive) {
    String stated;
    try (JarFile jar = new JarFile(archive.toFile())) {
      stated = jar.getManifest().getMainAttributes().getValue(CONTRACT_KEY);
    } catch (IOException | RuntimeException e) {
      return Optional.of("It cannot be read as a plugin archive: " + Plainly.said(e) + ".");
    }
    if (Integer.toString(PullSource.CONTRACT).equals(stated)) {
      return Optional.empty();
    }
    return Optional.of(
        (stated == null
                ? "Its manifest names no " + CONTRACT_KEY
                : "It was built for pull contract \"" + Plainly.brief(stated) + "\"")
            + "; this program takes contract "
            + PullSource.CONTRACT
            + ".");
  }

  /** Leaves out what cannot be sorted, then sorts the rest. */
  @Override
  protected void resolvePlugins() {
    for (PluginWrapper plugin : getPlugins(PluginState.DISABLED)) {
      drop(plugin);
    }
    boolean dropped = true;
    while (dropped) {
      dropped = false;
      for (PluginWrapper plugin : inOrder()) {
        Optional<String> unmet = unmetDependency(plugin);
        if (unmet.isPresent()) {
          refuse(plugin, unmet.get());
          drop(plugin);
          dropped = true;
        }
      }
    }
    for (PluginWrapper plugin : ringed()) {
      refuse(plugin, "It and plugins that it needs depend on each other in a ring.");
      drop(plugin);
    }
    super.resolvePlugins();
  }

  private Optional<String> unmetDependency(PluginWrapper plugin) {
    for (PluginDependency needed : plugin.getDescriptor().getDependencies()) {
      if (needed.isOptional()) {
        continue;
      }
      PluginWrapper there = plugins.get(needed.getPluginId());
      if (there == null) {
        return Optional.of(
            "It needs the plugin \"" + needed.getPluginId() + "\", which is not in use.");
      }
      String asked = needed.getPluginVersionSupport();
      String is = there.getDescriptor().getVersion();
      boolean fits;
      try {
        fits = versionManager.checkVersionConstraint(is, asked);
      } catch (RuntimeException e) { // a version or a range that cannot be read
        fits = false;
      }
      if (!fits) {
        return Optional.of(
            "It needs the plugin \""
                + needed.getPluginId()
                + "\" in version "
                + asked
                + ", which "
                + is
                + " does not meet.");
      }
    }
    return Optional.empty();
  }

  /** Those that wait for each other, or for one that does. */
  private List<PluginWrapper> ringed() {
    List<PluginWrapper> waiting = inOrder();
    Set<String> ready = new HashSet<>();
    boolean moved = true;
    while (moved) {
      moved =
          waiting.removeIf(
              p ->
                  p.getDescriptor().getDependencies().stream()
                          .filter(d -> !d.isOptional())
                          .allMatch(d -> ready.contains(d.getPluginId()))
                      && ready.add(p.getPluginId()));
    }
    return waiting;
  }

  /** Starts every plugin that is sorted, each on its own; one that fails is left out. */
  @Override
  public void startPlugins() {
    for (PluginWrapper plugin : List.copyOf(resolvedPlugins)) {
      try {
        startPlugin(plugin.getPluginId());
      } catch (Throwable thrown) { // a plugin may throw anything
        plugin.setPluginState(PluginState.FAILED);
        refuse(plugin, "It failed to start: " + Plainly.said(thrown) + ".");
      }
    }
  }

  /** All plugins read so far, by file name. */
  List<PluginWrapper> inOrder() {
    List<PluginWrapper> all = new ArrayList<>(getPlugins());
    all.sort((a, b) -> a.getPluginPath().compareTo(b.getPluginPath()));
    return all;
  }

  private void drop(PluginWrapper plugin) {
    plugins.remove(plugin.getPluginId());
    unresolvedPlugins.remove(plugin);
    close(pluginClassLoaders.remove(plugin.getPluginId()));
  }

  /** Lets go of the archives; nothing more can be loaded from them. */
  void closeArchives() {
    pluginClassLoaders.values().forEach(ReasonedManager::close);
    pluginClassLoaders.clear();
  }

  private static void close(ClassLoader loader) {
    if (loader instanceof Closeable archive) {
      try {
        archive.close();
      } catch (IOException e) {
        throw new UncheckedIOException(e);
      }
    }
  }

  @Override
  protected PluginRepository createPluginRepository() {
    return new JarPluginRepository(getPluginsRoots());
  }

  @Override
  protected PluginLoader createPluginLoader() {
    return new JarPluginLoader(this);
  }

  @Override
  protected PluginDescriptorFinder createPluginDescriptorFinder() {
    return new ManifestPluginDescriptorFinder();
  }

  @Override
  protected PluginFactory createPluginFactory() {
    return new TellingPluginFactory();
  }

  /** No list of enabled or disabled plugins counts. */
  @Override
  protected boolean isPluginDisabled(String pluginId) {
    return false;
  }
}
