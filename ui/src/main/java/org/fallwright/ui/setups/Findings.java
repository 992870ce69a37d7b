package org.fallwright.ui.setups;

import java.util.Comparator;
import java.util.List;
import javax.swing.table.AbstractTableModel;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.PartLoad;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.Messages;

/**
 * What was found of a setup as a table.
 *
 * @param <T> what stands in a row
 */
abstract sealed class Findings<T> extends AbstractTableModel {
  private final List<T> rows;
  private final String[] columns;

  private Findings(List<T> rows, String... columns) {
    this.rows = rows;
    this.columns = columns;
  }

  /** What a cell says. */
  abstract String text(T row, int column);

  T row(int row) {
    return rows.get(row);
  }

  @Override
  public int getRowCount() {
    return rows.size();
  }

  @Override
  public int getColumnCount() {
    return columns.length;
  }

  @Override
  public String getColumnName(int column) {
    return Messages.text("findings.column." + columns[column]);
  }

  @Override
  public String getValueAt(int row, int column) {
    return text(rows.get(row), column);
  }

  /** Every check, the worst verdict first: what there is, what is asked, their ratio. */
  static final class Checks extends Findings<Check> {
    private final Amounts amounts;

    Checks(List<Check> checks, Amounts amounts) {
      super(
          checks.stream().sorted(Comparator.comparing(Check::verdict).reversed()).toList(),
          "check",
          "value",
          "limit",
          "ratio");
      this.amounts = amounts;
    }

    @Override
    String text(Check c, int column) {
      return switch (column) {
        case 0 -> Way.name(c.id());
        case 1 -> amounts.amount(c.value(), c.unit());
        case 2 -> amounts.amount(c.limit(), c.unit());
        default -> amounts.ratio(c.ratio());
      };
    }
  }

  /**
   * Every part: its loads at plan, at the most the source can do and at the ceiling; its strength.
   */
  static final class Loads extends Findings<PartLoad> {
    private final Amounts amounts;

    Loads(List<PartLoad> loads, Amounts amounts) {
      super(loads, "part", "at-plan", "at-high", "at-ceiling", "strength");
      this.amounts = amounts;
    }

    @Override
    String text(PartLoad p, int column) {
      return switch (column) {
        case 0 -> Way.name(p.part());
        case 1 -> amounts.forceNeeded(p.atPlanN());
        case 2 -> amounts.forceNeeded(p.atHighN());
        case 3 -> amounts.forceNeeded(p.atCeilingN());
        default -> amounts.forceGiven(p.strengthN());
      };
    }
  }
}
