package org.fallwright.ui.setups;

import java.util.Comparator;
import java.util.List;
import javax.swing.table.AbstractTableModel;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.PartLoad;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.Messages;

/** The checks and loads of a setup as tables. */
final class Findings {
  private Findings() {}

  /** Every check, the worst verdict first: what there is, what is asked, their ratio. */
  static final class Checks extends AbstractTableModel {
    private static final String[] COLUMNS = {"check", "value", "limit", "ratio"};
    private final List<Check> checks;
    private final Amounts amounts;

    Checks(List<Check> checks, Amounts amounts) {
      this.checks =
          checks.stream().sorted(Comparator.comparing(Check::verdict).reversed()).toList();
      this.amounts = amounts;
    }

    Check check(int row) {
      return checks.get(row);
    }

    @Override
    public int getRowCount() {
      return checks.size();
    }

    @Override
    public int getColumnCount() {
      return COLUMNS.length;
    }

    @Override
    public String getColumnName(int column) {
      return Messages.text("findings.column." + COLUMNS[column]);
    }

    @Override
    public String getValueAt(int row, int column) {
      Check c = checks.get(row);
      return switch (column) {
        case 0 -> Way.name(c.id());
        case 1 -> amounts.amount(c.value(), c.unit());
        case 2 -> amounts.amount(c.limit(), c.unit());
        default -> amounts.ratio(c.ratio());
      };
    }
  }

  /** Every part: its loads at plan and at the most the source can do, and its strength. */
  static final class Loads extends AbstractTableModel {
    private static final String[] COLUMNS = {"part", "at-plan", "at-high", "strength"};
    private final List<PartLoad> loads;
    private final Amounts amounts;

    Loads(List<PartLoad> loads, Amounts amounts) {
      this.loads = loads;
      this.amounts = amounts;
    }

    @Override
    public int getRowCount() {
      return loads.size();
    }

    @Override
    public int getColumnCount() {
      return COLUMNS.length;
    }

    @Override
    public String getColumnName(int column) {
      return Messages.text("findings.column." + COLUMNS[column]);
    }

    @Override
    public String getValueAt(int row, int column) {
      PartLoad p = loads.get(row);
      return switch (column) {
        case 0 -> Way.name(p.part());
        case 1 -> amounts.forceNeeded(p.atPlanN());
        case 2 -> amounts.forceNeeded(p.atHighN());
        default -> amounts.forceGiven(p.strengthN());
      };
    }
  }
}
