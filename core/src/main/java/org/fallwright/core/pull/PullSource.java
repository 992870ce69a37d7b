package org.fallwright.core.pull;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;

/**
 * The extension point: something that pulls the line. Stateless; values in, values out; asked by
 * several threads at once. The core knows no source by name. What an implementation answers is
 * checked like user input.
 */
public interface PullSource {
  /**
   * The version of this contract: of this interface and all records that it takes and gives. A
   * plugin's archive states the one it was built for, and another one is refused before a class of
   * it is looked at.
   */
  int CONTRACT = 2;

  /**
   * What it is: stable id, display name, where it can be, its parameters.
   *
   * @return the same every time
   */
  SourceDescription describe();

  /**
   * The ways it can be run with these parameters, at least one, in a fixed order: for example two-
   * or four-wheel drive, or the number of parts of a block system.
   *
   * @param parameters the source's own parameters, by key
   * @return the modes' names, at most 60, no two alike, each of 1 to 100 characters; {@link
   *     PullRequest#mode} gives one of them back
   * @throws IllegalArgumentException itself, no subclass: one sentence naming the parameter, its
   *     value and its limit
   */
  List<String> modes(ObjectNode parameters);

  /**
   * Height at which the line meets the source above the ground of its spot; not asked on an anchor,
   * where the sling's height counts. Half a metre unless the source knows better (planning
   * allowance).
   *
   * @param parameters the source's own parameters, by key
   * @return the height, from 0 to 5 [m]
   * @throws IllegalArgumentException itself, no subclass: one sentence naming the parameter, its
   *     value and its limit
   */
  default double lineHeightM(ObjectNode parameters) {
    return 0.5;
  }

  /**
   * The line it is rigged with, run in that mode; only a source that another one drives has one,
   * and must.
   *
   * @param parameters the source's own parameters, by key
   * @param mode one of its modes
   * @return the line; null where no other source drives it
   * @throws IllegalArgumentException itself, no subclass: one sentence naming the parameter, its
   *     value and its limit
   */
  default HaulLine haulLine(ObjectNode parameters, String mode) {
    return null;
  }

  /**
   * What it gives at its place, at the least and at the most. Only what it does at the most, its
   * checks and what it says may hang on the stiffness of the path and the line to take in; all else
   * may not, so that it can be asked once for all lays.
   *
   * @param request its parameters and mode, where it stands and what it is to do
   * @return the offer, made by {@link PullOffer#giving}
   * @throws IllegalArgumentException itself, no subclass: one sentence naming the parameter, its
   *     value and its limit
   */
  PullOffer offer(PullRequest request);
}
