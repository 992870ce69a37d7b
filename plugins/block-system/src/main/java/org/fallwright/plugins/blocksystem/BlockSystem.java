package org.fallwright.plugins.blocksystem;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.Parameter.Choice;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Limit;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.reference.Allowances;
import org.fallwright.plugins.api.ParameterReader;
import org.fallwright.plugins.api.PullSourceExtension;
import org.pf4j.Extension;

/**
 * A block system that any other source hauls; its modes are the numbers of parts it can be rigged
 * with.
 *
 * <p>Low: the driver's low times the gain with friction. High, for the parts: the driver's high
 * times the number of parts, no friction at all. Holding: what the driver holds times the number of
 * parts, friction not credited. The driver must have been asked with the travel that this system
 * brings, so that what it adds for jerks and surge counts once.
 */
@Extension
public final class BlockSystem implements PullSourceExtension {
  /** Least factor on a fibre line at the planned load. Common practice. */
  private static final double LINE_FACTOR = Allowances.FIBRE_FACTOR.value();

  /** Least factor on every part at the most the source can do. Planning allowance. */
  private static final double LAST_FACTOR = Allowances.LAST_FACTOR.value();

  private static final String FIXED = "fixed";

  private static final String MOVING = "moving";

  private static final SourceDescription DESCRIPTION =
      new SourceDescription(
          "block-system",
          new Wording("block system", "aparejo de poleas"),
          Set.of(PlaceKind.ANCHOR),
          true,
          List.of(
              Parameter.choices(
                  "parts",
                  new Wording("Parts of line", "Ramales de cuerda"),
                  new Wording(
                      "How many parts of line pull at the moving block; every number that it can be"
                          + " rigged with.",
                      "Cuántos ramales jalan la polea que se mueve; todos los números con que se"
                          + " puede armar."),
                  rig("2"),
                  rig("3"),
                  rig("4"),
                  rig("5"),
                  rig("6")),
              Parameter.choice(
                      "form",
                      new Wording(
                          "Block that the haul part leaves",
                          "Polea de donde sale el ramal de tiro"),
                      new Wording(
                          "The fixed block costs one more sheave but lets people stand off to the"
                              + " side.",
                          "La polea fija gasta una rueda más, pero deja trabajar de lado."),
                      Choice.of(FIXED, "the fixed block", "la polea fija"),
                      Choice.of(MOVING, "the moving block", "la polea que se mueve"))
                  .preset(FIXED),
              Parameter.number(
                  "efficiency",
                  "",
                  0.3,
                  1,
                  new Wording("Tension passed on by a sheave", "Tensión que pasa cada polea"),
                  new Wording(
                      "What is left of the tension after one sheave: 0.9 to 0.98 on bearings, much"
                          + " less on a bare pin or a connector.",
                      "Lo que queda de la tensión después de una polea: 0.9 a 0.98 con balero, mucho"
                          + " menos sobre un perno o un gancho.")),
              Parameter.number(
                  "block_rated_N",
                  "N",
                  100,
                  1e7,
                  new Wording("Rated load of a block", "Carga límite de trabajo de una polea"),
                  new Wording(
                      "The working load limit stamped on the weakest block.",
                      "La carga límite de trabajo (WLL) marcada en la polea más débil.")),
              Parameter.number(
                  "block_factor",
                  "",
                  1,
                  12,
                  new Wording("Its standard's factor", "Factor de diseño de la polea"),
                  new Wording(
                      "Breaking load over rated load that the block's standard asks.",
                      "Carga de ruptura entre carga límite de trabajo, según su norma.")),
              Parameter.number(
                  "line_breaking_N",
                  "N",
                  500,
                  5e6,
                  new Wording("Breaking load of the line", "Carga de ruptura de la cuerda"),
                  new Wording(
                      "As on the label of the line in the blocks.",
                      "La de la etiqueta de la cuerda que va en las poleas.")),
              Parameter.number(
                  "line_termination",
                  "",
                  0.1,
                  1,
                  new Wording("What its ends leave of that", "Lo que dejan sus puntas"),
                  new Wording(
                      "Share of the breaking load that knot, splice or eye leaves.",
                      "Parte de la carga de ruptura que dejan el nudo, el empalme o el ojo.")),
              Parameter.number(
                  "line_stiffness_N",
                  "N",
                  1e3,
                  1e9,
                  new Wording("Stiffness EA of the line", "Rigidez EA de la cuerda"),
                  new Wording(
                      "Tension over stretch as a share of length; the softest of its range.",
                      "Tensión entre alargamiento por metro; la más blanda de su rango.")),
              Parameter.number(
                  "line_length_m",
                  "m",
                  1,
                  1000,
                  new Wording("Length of the line", "Largo de la cuerda"),
                  new Wording(
                      "All of the line in the blocks, from end to end.",
                      "Toda la cuerda de las poleas, de punta a punta."))));

  private static Choice rig(String parts) {
    return Choice.of(parts, parts + ":1", parts + " a 1");
  }

  @Override
  public SourceDescription describe() {
    return DESCRIPTION;
  }

  @Override
  public List<String> modes(ObjectNode parameters) {
    return read(parameters).choices("parts");
  }

  @Override
  public HaulLine haulLine(ObjectNode parameters, String mode) {
    ParameterReader reader = read(parameters);
    return new HaulLine(
        parts(mode, reader), reader.number("line_stiffness_N"), reader.number("line_length_m"));
  }

  @Override
  public PullOffer offer(PullRequest request) {
    ParameterReader reader = read(request.parameters());
    int n = parts(request.mode(), reader);
    PullOffer driver = request.driver();
    if (driver == null) {
      throw new IllegalArgumentException(
          "driver is not stated; a block system needs another source that hauls it");
    }
    Tackle tackle = new Tackle(n, reader.number("efficiency"), reader.choice("form").equals(FIXED));
    Wording limit = driver.limit().what();
    return PullOffer.giving(
            driver.lowN() * tackle.gain(),
            driver.highN() * n,
            new Limit(
                new Wording(
                    limit.english() + ", through " + n + ":1",
                    limit.spanish() + ", por " + n + " a 1"),
                driver.limit().why()))
        .holds(driver.holdN() * n, driver.captured())
        .travel(
            driver.travel().ratio() * n,
            driver.travel().mostM() == null ? null : driver.travel().mostM() / n)
        .powered(driver.powered())
        .overrun(driver.overrunM() / n)
        .stiffness(driver.stiffnessNPerM() == null ? null : driver.stiffnessNPerM() * n * n)
        .anchor(tackle.anchorHauling(), tackle.anchorHolding())
        .people(driver.people())
        .parts(parts(reader, tackle, driver))
        .checks(driver.checks())
        .notes(notes(request, n, driver))
        .done();
  }

  private static int parts(String mode, ParameterReader reader) {
    List<String> rigs = reader.choices("parts");
    if (!rigs.contains(mode)) {
      throw new IllegalArgumentException(
          "mode is \"" + mode + "\"; this block system is rigged with " + rigs);
    }
    return Integer.parseInt(mode);
  }

  private static ParameterReader read(ObjectNode parameters) {
    return new ParameterReader(DESCRIPTION, parameters);
  }

  private static List<Part> parts(ParameterReader reader, Tackle tackle, PullOffer driver) {
    double factor = reader.number("block_factor");
    double blockN = reader.number("block_rated_N") * factor;
    double lineN = reader.number("line_breaking_N") * reader.number("line_termination");
    List<Part> parts = new ArrayList<>();
    parts.add(new Part("tackle block at the pull line", blockN, factor, LAST_FACTOR, 1, 1));
    parts.add(
        new Part(
            "tackle block at the anchor",
            blockN,
            factor,
            LAST_FACTOR,
            tackle.anchorHauling(),
            tackle.anchorHolding()));
    parts.add(
        new Part(
            "tackle line",
            lineN,
            LINE_FACTOR,
            LAST_FACTOR,
            tackle.haulHauling(),
            tackle.haulHolding()));
    for (Part part : driver.parts()) {
      parts.add(
          new Part(
              part.name(),
              part.strengthN(),
              part.designFactor(),
              part.lastFactor(),
              part.hauling() * tackle.haulHauling(),
              part.holding() * tackle.haulHolding()));
    }
    return parts;
  }

  private static List<String> notes(PullRequest request, int n, PullOffer driver) {
    List<String> notes = new ArrayList<>();
    notes.add(
        String.format(
            Locale.ROOT,
            "The haul end moves %.1f m, %d times the take-up; the blocks must start at least %.1f m"
                + " apart or the system be reset.",
            n * request.pull().lineInM(),
            n,
            request.pull().lineInM()));
    notes.addAll(driver.notes());
    return notes;
  }
}
