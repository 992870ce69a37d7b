package org.fallwright.ui.cli;

/** What was asked cannot be done; the message is one sentence for the person who asked. */
final class Refused extends RuntimeException {
  private static final long serialVersionUID = 1;

  Refused(String sentence) {
    super(sentence);
  }
}
