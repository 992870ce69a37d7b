package org.fallwright.plugins.host;

import java.util.List;

/**
 * A plugin that is in use.
 *
 * @param id its stable id
 * @param version its version, as it states it
 * @param provider who provides it; empty where it does not say
 * @param contract version of the pull contract that it was built for
 * @param sourceIds ids of the pull sources it gives, at least one
 */
public record LoadedPlugin(
    String id, String version, String provider, int contract, List<String> sourceIds) {
  public LoadedPlugin {
    sourceIds = List.copyOf(sourceIds);
  }
}
