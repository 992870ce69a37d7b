package org.fallwright.core.rules;

import com.fasterxml.jackson.annotation.JsonProperty;

/** How a figure must stand to the rule's value. */
public enum Comparison {
  @JsonProperty(">=")
  AT_LEAST,
  @JsonProperty(">")
  MORE_THAN,
  @JsonProperty("<=")
  AT_MOST,
  @JsonProperty("<")
  LESS_THAN
}
