package org.fallwright.plugins.api;

import org.fallwright.core.pull.PullSource;
import org.pf4j.ExtensionPoint;

/**
 * A pull source that comes from a plugin: what {@link PullSource} asks, under a name by which the
 * plugin host finds it. It adds nothing to be written.
 */
public interface PullSourceExtension extends PullSource, ExtensionPoint {}
