package org.fallwright.plugins.host;

import org.pf4j.Plugin;
import org.pf4j.PluginFactory;
import org.pf4j.PluginRuntimeException;
import org.pf4j.PluginWrapper;

/** Makes a plugin's own object and throws where it cannot; PF4J's would only log the cause. */
final class TellingPluginFactory implements PluginFactory {
  @Override
  public Plugin create(PluginWrapper wrapper) {
    String name = wrapper.getDescriptor().getPluginClass();
    try {
      Class<? extends Plugin> type =
          wrapper.getPluginClassLoader().loadClass(name).asSubclass(Plugin.class);
      try {
        return type.getConstructor(PluginWrapper.class).newInstance(wrapper);
      } catch (NoSuchMethodException e) {
        return type.getConstructor().newInstance();
      }
    } catch (ReflectiveOperationException | ClassCastException e) {
      throw new PluginRuntimeException(e, "the plugin class {} cannot be made", name);
    }
  }
}
