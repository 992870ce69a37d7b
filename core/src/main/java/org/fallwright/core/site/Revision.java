package org.fallwright.core.site;

import java.util.List;
import org.fallwright.core.units.Range;

/**
 * A setup as it was really set on the day, kept beside the plan and never over it. The plan itself
 * is revision A.
 *
 * @param letter its letter, from B on
 * @param at date and time, as the person who recorded it gave them
 * @param word the check word of its sheet
 * @param setup what is set
 * @param ground wet or dry ground as found; null: as entered
 * @param gustMps gust as found [m/s]; null: as entered
 * @param changed what changed against the revision before, a sentence each
 * @param verdict verdict of the setup as set, in the plan's words
 * @param acceptedBy who accepted a worse verdict; null: it was not worse
 */
public record Revision(
    String letter,
    String at,
    String word,
    AsSet setup,
    Wetness ground,
    Quantity gustMps,
    List<String> changed,
    String verdict,
    String acceptedBy) {
  /**
   * The choices of a setup, by the names of the plan file.
   *
   * @param blocks ids of the anchors with a redirect block, from the tree outwards
   * @param sourceAt id of the spot or anchor it is at
   * @param driver the source that drives it, or null
   */
  public record AsSet(
      double layDeg,
      double attachHeightM,
      double hingeThicknessM,
      String line,
      List<String> blocks,
      String source,
      String sourceMode,
      String sourceAt,
      Driver driver) {
    public AsSet {
      Range.check("lay_deg", layDeg, 0, 360, "degrees");
      Range.check("attach_height_m", attachHeightM, 0.5, 100, "m");
      Range.check("hinge_thickness_m", hingeThicknessM, 0.005, 0.5, "m");
      Range.text("line", line);
      blocks = List.copyOf(Range.present("blocks", blocks));
      Range.text("source", source);
      Range.text("source_mode", sourceMode);
      Range.text("source_at", sourceAt);
    }
  }

  /** The source that hauls a block system: its id in the gear, its mode, its place. */
  public record Driver(String source, String sourceMode, String sourceAt) {
    public Driver {
      Range.text("source", source);
      Range.text("source_mode", sourceMode);
      Range.text("source_at", sourceAt);
    }
  }

  public Revision {
    Range.text("letter", letter);
    Range.text("at", at);
    Range.text("word", word);
    Range.present("setup", setup);
    if (gustMps != null) {
      gustMps.within("gust_mps", 0, 40, "m/s");
    }
    changed = List.copyOf(Range.present("changed", changed));
    Range.text("verdict", verdict);
  }
}
