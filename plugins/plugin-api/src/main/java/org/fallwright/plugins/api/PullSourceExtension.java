package org.fallwright.plugins.api;

import org.fallwright.core.pull.PullSource;
import org.pf4j.ExtensionPoint;

/** A pull source that comes from a plugin. */
public interface PullSourceExtension extends PullSource, ExtensionPoint {}
