package weighhouse.formula;

import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Table;
import weighhouse.workbook.Workbook;

/** The cells that structured references mean. */
final class TableResolver {
  private final Map<String, Table> tables = new HashMap<>();

  TableResolver(Workbook workbook) {
    for (Sheet sheet : workbook.sheets()) {
      for (Table table : sheet.tables()) {
        tables.put(table.name().toUpperCase(Locale.ROOT), table);
      }
    }
  }

  Optional<CellRange> range(Expr.TableRef reference, CellAddress host) {
    Table table =
        reference.table().isEmpty()
            ? tableAround(host)
            : tables.get(reference.table().toUpperCase(Locale.ROOT));
    if (table == null) {
      return Optional.empty();
    }
    int width = table.range().columns();
    int first = reference.firstColumn() == null ? 0 : column(table, reference.firstColumn());
    int last =
        reference.firstColumn() == null
            ? width - 1
            : reference.lastColumn() == null ? first : column(table, reference.lastColumn());
    int[] rows = rows(table, reference.specifiers(), host);
    if (first < 0 || last < first || rows[1] < rows[0]) {
      return Optional.empty();
    }
    int left = table.range().firstColumn();
    return Optional.of(
        new CellRange(table.range().sheet(), rows[0], left + first, rows[1], left + last));
  }

  private Table tableAround(CellAddress host) {
    return tables.values().stream()
        .filter(table -> table.range().contains(host))
        .findFirst()
        .orElse(null);
  }

  private static int column(Table table, String name) {
    for (int i = 0; i < table.columns().size(); i++) {
      if (table.columns().get(i).equalsIgnoreCase(name)) {
        return i;
      }
    }
    return -1;
  }

  /** First and last row; the last before the first where there are none. */
  private static int[] rows(Table table, List<String> specifiers, CellAddress host) {
    int top = table.range().firstRow();
    int bottom = table.range().lastRow();
    int firstData = top + table.headerRows();
    int lastData = bottom - table.totalsRows();
    if (specifiers.contains("#This Row")) {
      boolean inside = host.row() >= firstData && host.row() <= lastData;
      return inside ? new int[] {host.row(), host.row()} : new int[] {0, -1};
    } else if (specifiers.contains("#All")) {
      return new int[] {top, bottom};
    }
    boolean headers = specifiers.contains("#Headers");
    boolean totals = specifiers.contains("#Totals");
    boolean data = specifiers.contains("#Data") || !(headers || totals);
    return new int[] {
      headers ? top : data ? firstData : lastData + 1,
      totals ? bottom : data ? lastData : firstData - 1
    };
  }
}
