package org.fallwright.plugins.blocksystem;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Part;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.Parameter;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.SourceDescription.ValueKind;
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

  private static final SourceDescription DESCRIPTION =
      new SourceDescription(
          "block-system",
          "block system",
          Set.of(PlaceKind.ANCHOR),
          true,
          List.of(
              new Parameter(
                  "parts",
                  "Parts of line",
                  ValueKind.CHOICES,
                  "",
                  0,
                  0,
                  List.of("2", "3", "4", "5", "6")),
              new Parameter(
                  "form",
                  "Block that the haul part leaves",
                  ValueKind.CHOICE,
                  "",
                  0,
                  0,
                  List.of(FIXED, "moving")),
              Parameter.number("efficiency", "Tension passed on by a sheave", "", 0.3, 1),
              Parameter.number("block_rated_N", "Rated load of a block", "N", 100, 1e7),
              Parameter.number("block_factor", "Its standard's factor", "", 1, 12),
              Parameter.number("line_breaking_N", "Breaking load of the line", "N", 500, 5e6),
              Parameter.number("line_termination", "What its ends leave of that", "", 0.1, 1),
              Parameter.number("line_stiffness_N", "Stiffness EA of the line", "N", 1e3, 1e9),
              Parameter.number("line_length_m", "Length of the line", "m", 1, 1000)));

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
    return new PullOffer(
        driver.lowN() * tackle.gain(),
        driver.highN() * n,
        driver.holdN() * n,
        driver.captured(),
        driver.limit() + ", through " + n + ":1",
        driver.velocityRatio() * n,
        driver.powered(),
        driver.overrunM() / n,
        0,
        tackle.anchorHauling(),
        tackle.anchorHolding(),
        driver.operators(),
        parts(reader, tackle, driver),
        driver.checks(),
        notes(request, n, driver));
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
    ParameterReader reader = new ParameterReader(DESCRIPTION, parameters);
    reader.choices("parts");
    reader.choice("form");
    DESCRIPTION.parameters().stream()
        .filter(p -> p.kind() == ValueKind.NUMBER)
        .forEach(p -> reader.number(p.key()));
    return reader;
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
            n * request.takeUpM() * request.travelRatio(),
            n,
            request.takeUpM() * request.travelRatio()));
    notes.addAll(driver.notes());
    return notes;
  }
}
