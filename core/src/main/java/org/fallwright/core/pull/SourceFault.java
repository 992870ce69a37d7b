package org.fallwright.core.pull;

/**
 * A pull source failed, hung or answered nonsense while it was asked. Its message is one sentence
 * that names the plugin; what the source gave, if anything, must not be used. Thrown by whatever
 * stands guard over the sources, never by a source itself.
 */
public final class SourceFault extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** Stable id of the source that failed. */
  private final String sourceId;

  /**
   * A fault of one source.
   *
   * @param sourceId stable id of the source
   * @param sentence what went wrong, naming the plugin
   * @param cause what was thrown; may be null
   */
  public SourceFault(String sourceId, String sentence, Throwable cause) {
    super(sentence, cause);
    this.sourceId = sourceId;
  }

  /**
   * Which source failed.
   *
   * @return its stable id
   */
  public String sourceId() {
    return sourceId;
  }
}
