package org.fallwright.core.site;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.units.Range;

/**
 * The pictures under the plan: one, and others laid over it.
 *
 * @param file name of the base map's file or folder, looked for beside the site file and among the
 *     base maps
 * @param taken date of the picture as stated by its source; null: not known
 * @param source where it comes from
 * @param shiftEastM how far it is moved east for this site, because it lies off [m]
 * @param shiftNorthM how far it is moved north [m]
 * @param opacity from 0, not seen, to 1, covering what lies under it
 * @param over others laid over it, from below upwards
 */
public record Picture(
    String file,
    String taken,
    String source,
    double shiftEastM,
    double shiftNorthM,
    double opacity,
    List<Layer> over) {
  /** Farthest that a picture may be moved along either axis [m]; planning allowance. */
  public static final double FARTHEST_SHIFT = 200;

  /** One picture; its fields as those of the picture under it. */
  public record Layer(
      String file,
      String taken,
      String source,
      double shiftEastM,
      double shiftNorthM,
      double opacity) {
    public Layer {
      Range.text("file", file);
      Range.text("source", source);
      Range.check("shift_east_m", shiftEastM, -FARTHEST_SHIFT, FARTHEST_SHIFT, "m");
      Range.check("shift_north_m", shiftNorthM, -FARTHEST_SHIFT, FARTHEST_SHIFT, "m");
      Range.check("opacity", opacity, 0, 1, "");
    }

    /** The same picture moved to another shift. */
    public Layer shifted(double eastM, double northM) {
      return new Layer(file, taken, source, eastM, northM, opacity);
    }
  }

  public Picture {
    over = List.copyOf(Range.present("over", over));
    new Layer(file, taken, source, shiftEastM, shiftNorthM, opacity);
  }

  /** The pictures of a list, from below upwards; null of an empty one. */
  public static Picture of(List<Layer> layers) {
    if (layers.isEmpty()) {
      return null;
    }
    Layer l = layers.get(0);
    return new Picture(
        l.file,
        l.taken,
        l.source,
        l.shiftEastM,
        l.shiftNorthM,
        l.opacity,
        layers.subList(1, layers.size()));
  }

  /** All of them, from below upwards. */
  public List<Layer> layers() {
    List<Layer> all = new ArrayList<>();
    all.add(new Layer(file, taken, source, shiftEastM, shiftNorthM, opacity));
    all.addAll(over);
    return List.copyOf(all);
  }
}
