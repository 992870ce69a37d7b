package org.fallwright.core.reference;

/** What stands behind a figure. */
public enum Kind {
  /** Read in the published source named beside it. */
  PUBLISHED,
  /** A fact of the trade; no source is claimed. */
  COMMON_PRACTICE,
  /** Ours, and changeable: a choice on the safe side. */
  PLANNING_ALLOWANCE,
  /** A published figure carried from memory and not checked against its source. */
  FROM_MEMORY
}
