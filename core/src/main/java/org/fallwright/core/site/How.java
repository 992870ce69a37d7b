package org.fallwright.core.site;

/** How a quantity was got; decides its spread. */
public enum How {
  MEASURED,
  ESTIMATED,
  GUESSED
}
