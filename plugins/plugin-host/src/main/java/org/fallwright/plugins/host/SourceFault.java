package org.fallwright.plugins.host;

/**
 * A plugin failed or answered nonsense while it was asked. Its message is one sentence that names
 * the plugin; what it gave, if anything, must not be used.
 */
public final class SourceFault extends RuntimeException {
  private static final long serialVersionUID = 1L;

  SourceFault(String sentence, Throwable cause) {
    super(sentence, cause);
  }
}
