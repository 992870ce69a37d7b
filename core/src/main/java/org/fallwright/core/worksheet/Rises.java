package org.fallwright.core.worksheet;

import static org.fallwright.core.worksheet.Dimension.ANGLE;
import static org.fallwright.core.worksheet.Dimension.LENGTH;
import static org.fallwright.core.worksheet.Dimension.MASS;
import static org.fallwright.core.worksheet.Dimension.NUMBER;
import static org.fallwright.core.worksheet.Dimension.SMALL_LENGTH;
import static org.fallwright.core.worksheet.Dimension.SPEED;
import static org.fallwright.core.worksheet.Dimension.STRESS;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.fallwright.core.statics.Varied;
import org.fallwright.core.statics.Worked;

/**
 * The 95th or 5th percentile of a result, one input at a time: a line for each input that moves it,
 * the sum of their squares, and the root on the result at the means.
 */
final class Rises {
  /** Dimensions of the inputs in the order of the draw. */
  private static final List<Dimension> OF =
      List.of(
          MASS,
          LENGTH,
          ANGLE,
          ANGLE,
          NUMBER,
          STRESS,
          SMALL_LENGTH,
          SMALL_LENGTH,
          SPEED,
          NUMBER,
          LENGTH,
          LENGTH);

  /** Share of the result at the means below which a rise counts as none. */
  private static final double NONE = 1e-9;

  private final Workings w;
  private final List<Worked.Input> inputs;

  Rises(Workings w, List<Worked.Input> inputs) {
    this.w = w;
    this.inputs = inputs;
  }

  /**
   * The lines.
   *
   * @param symbol sign of the percentile; its rows take the same index
   * @param name what it is the percentile of
   * @param mean sign of the result at the means
   * @param v the result at the means and at every end, in SI, angles in degrees
   * @param d its dimension
   * @param squared that of its square
   * @param up whether the 95th percentile is asked, else the 5th
   */
  void write(
      String symbol,
      String name,
      String mean,
      Varied v,
      Dimension d,
      Dimension squared,
      boolean up) {
    String index = symbol.replace("_", "");
    List<String> rows = new ArrayList<>();
    List<String> still = new ArrayList<>();
    for (int i = 0; i < inputs.size(); i++) {
      Worked.Input in = inputs.get(i);
      double by = up ? v.rise(i) : v.fall(i);
      if (by <= NONE * Math.abs(v.atMean())) {
        still.add(in.name());
        continue;
      }
      boolean high = up == (v.atHigh().get(i) > v.atLow().get(i));
      double at = high ? v.atHigh().get(i) : v.atLow().get(i);
      String end = index + "_" + (i + 1);
      String row = "d_" + end;
      w.work(
          row,
          name
              + (up ? ", rise" : ", fall")
              + " by "
              + in.name()
              + " alone: at "
              + w.amount(high ? in.high() : in.low(), OF.get(i))
              + " (mean "
              + w.amount(in.mean(), OF.get(i))
              + ") it is "
              + w.amount(at, d),
          up ? end + " − " + mean : mean + " − " + end,
          d,
          Basis.SPREAD,
          "",
          Map.of(end, w.number(at, d)));
      rows.add(row);
    }
    w.note(
        "The result at each input's bad end is worked like the line "
            + mean
            + " and the lines it rests on, with that one input changed and all that follows from it."
            + (still.isEmpty() ? "" : " None comes from: " + String.join(", ", still) + "."));
    if (rows.isEmpty()) {
      w.work(symbol, name + percentile(up), mean, d, Basis.SPREAD);
      return;
    }
    w.work(
        "S_" + index,
        name + ", sum of the squares",
        String.join(" + ", rows.stream().map(x -> x + "^2").toList()),
        squared,
        Basis.SPREAD);
    w.work(
        symbol,
        name + percentile(up),
        mean + (up ? " + " : " − ") + "√(S_" + index + ")",
        d,
        Basis.SPREAD);
  }

  private static String percentile(boolean up) {
    return up ? ", 95th percentile" : ", 5th percentile";
  }
}
