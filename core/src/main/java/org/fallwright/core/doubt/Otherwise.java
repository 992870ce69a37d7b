package org.fallwright.core.doubt;

/**
 * One input taken otherwise than it was entered, all else as it is.
 *
 * @param what the input
 * @param at where its middle is put, a place of {@link May}
 * @param width factor on its spread; 0: it is known to lie there
 */
record Otherwise(Input what, double at, double width) {
  /** As if it were known. */
  static Otherwise known(Input what, double at) {
    return new Otherwise(what, at, 0);
  }

  /** As if another value had been entered, as doubtful as before. */
  static Otherwise entered(Input what, double at) {
    return new Otherwise(what, at, 1);
  }

  /** As if it were known twice as well. */
  static Otherwise halved(Input what, double middle) {
    return new Otherwise(what, middle, 0.5);
  }

  double of(double place, double middle) {
    return at + width * (place - middle);
  }
}
