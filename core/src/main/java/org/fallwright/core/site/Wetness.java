package org.fallwright.core.site;

/** Whether ground is wet or dry. */
public enum Wetness {
  WET,
  DRY
}
