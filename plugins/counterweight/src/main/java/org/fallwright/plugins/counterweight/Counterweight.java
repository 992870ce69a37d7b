package org.fallwright.plugins.counterweight;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Set;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Limit;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.pull.PullOffer.Standing;
import org.fallwright.core.pull.PullOffer.Where;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.units.Units;
import org.fallwright.plugins.api.ParameterReader;
import org.fallwright.plugins.api.PullSourceExtension;
import org.pf4j.Extension;

/**
 * A weight that hangs on the pull line, over a block high on an anchor.
 *
 * <p>With m the mass, q the share by which it may be off, g gravity and e the tension that the
 * block passes on: low = m (1 − q) g e, the weight sinking; holding = m (1 − q) g, the block's
 * friction not credited; high = {@link #LET_GO} m (1 + q) g / e, the weight let go at once and the
 * tree drawing it up. It gives the same force wherever it hangs, so that it does not keep the
 * line's end where it is. What it can take in ends with its drop. Left out: swinging, a weight that
 * falls on a slack line, and the weight's own sling. Statics of a weight on a line.
 */
@Extension
public final class Counterweight implements PullSourceExtension {
  /**
   * A weight that is let go on a tight line, not lowered, brings at first twice what it weighs.
   * Published in any text on mechanics: load put at once on a linear spring.
   */
  static final double LET_GO = 2;

  private static final String MODE = "hang";

  private static final Limit LIMIT =
      new Limit(
          new Wording("the weight", "el contrapeso"),
          new Wording(
              "It pulls with what it weighs, less what the block's friction takes.",
              "Jala con lo que pesa, menos lo que quita la fricción de la polea."));

  private static final SourceDescription DESCRIPTION =
      new SourceDescription(
          "counterweight",
          new Wording("counterweight", "contrapeso"),
          Set.of(PlaceKind.ANCHOR),
          false,
          List.of(
              Parameter.number(
                  "mass_kg",
                  "kg",
                  5,
                  5000,
                  new Wording("Mass of the weight", "Peso del contrapeso (kg)"),
                  new Wording(
                      "Weighed, with the sling it hangs on.",
                      "Pesado, con la eslinga de la que cuelga.")),
              Parameter.number(
                      "mass_error_share",
                      "",
                      0,
                      0.5,
                      new Wording("It may be off by", "Puede fallar por"),
                      new Wording(
                          "As a share: 0.05 where it was weighed, 0.3 where it was guessed.",
                          "Como parte: 0.05 si se pesó, 0.3 si se calculó a ojo."))
                  .preset(0.05),
              Parameter.number(
                      "efficiency",
                      "",
                      0.5,
                      1,
                      new Wording("Tension passed on by the block", "Tensión que pasa la polea"),
                      new Wording(
                          "What is left of the tension after the block; 0.9 where it is not known.",
                          "Lo que queda de la tensión después de la polea; 0.9 si no se sabe."))
                  .preset(0.9),
              Parameter.number(
                  "drop_m",
                  "m",
                  0.1,
                  60,
                  new Wording("Drop", "Caída libre"),
                  new Wording(
                      "Free height under the weight when the line is tight.",
                      "Altura libre debajo del contrapeso con la cuerda tensa.")),
              Parameter.number(
                  "block_rated_N",
                  "N",
                  100,
                  1e7,
                  new Wording("Rated load of the block", "Carga límite de trabajo de la polea"),
                  new Wording("As stamped on it.", "La marcada en ella (WLL).")),
              Parameter.number(
                  "block_factor",
                  "",
                  1,
                  12,
                  new Wording("Its standard's factor", "Factor de diseño de la polea"),
                  new Wording(
                      "Breaking load over rated load that the block's standard asks.",
                      "Carga de ruptura entre carga límite de trabajo, según su norma."))));

  @Override
  public SourceDescription describe() {
    return DESCRIPTION;
  }

  @Override
  public List<String> modes(ObjectNode parameters) {
    return List.of(MODE);
  }

  @Override
  public PullOffer offer(PullRequest request) {
    request.modeAmong(List.of(MODE));
    ParameterReader reader = new ParameterReader(DESCRIPTION, request.parameters());
    double mass = reader.number("mass_kg");
    double off = reader.number("mass_error_share");
    double passed = reader.number("efficiency");
    double leastN = mass * (1 - off) * Units.GRAVITY;
    double mostN = mass * (1 + off) * Units.GRAVITY;
    double onBlock = onBlock(request.stand().lineRiseRad(), passed);
    double factor = reader.number("block_factor");
    return PullOffer.giving(leastN * passed, LET_GO * mostN / passed, LIMIT)
        .holds(leastN, false)
        .travel(1, Math.min(reader.number("drop_m"), request.stand().heightM()))
        .anchor(onBlock, onBlock)
        .people(
            new Standing(
                new Wording("watches the weight", "vigila el contrapeso"), Where.AWAY, 1, 0))
        .parts(
            List.of(
                new Part(
                    "counterweight block",
                    reader.number("block_rated_N") * factor,
                    factor,
                    Allowances.LAST_FACTOR.value(),
                    onBlock,
                    onBlock)))
        .notes(
            List.of(
                "Nobody under the weight or within its height of it; lower it on the line, never"
                    + " drop it.",
                "The sling that the weight hangs on is not checked."))
        .done();
  }

  /**
   * Load on the block and its anchor for a newton in the line: the line at its rise and the weight
   * straight down, 1/e of it. √(cos² a + (1/e − sin a)²)
   *
   * @param riseRad a, rise of the line from the block to the tree [rad]
   * @param passed e
   */
  static double onBlock(double riseRad, double passed) {
    return Math.hypot(Math.cos(riseRad), 1 / passed - Math.sin(riseRad));
  }
}
