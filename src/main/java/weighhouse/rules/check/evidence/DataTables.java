package weighhouse.rules.check.evidence;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Workbook;

/** Tables of typed-in figures: columns side by side, as long as each other, under headings. */
final class DataTables {
  private static final int LEAST_ROWS = 8;
  private static final int WORDS_BESIDE = 2;

  private final Workbook workbook;

  DataTables(Workbook workbook) {
    this.workbook = workbook;
  }

  /** Every table, as its columns from left to right. */
  List<List<DataColumn>> all() {
    List<List<DataColumn>> tables = new ArrayList<>();
    for (int sheet = 0; sheet < workbook.sheets().size(); sheet++) {
      for (Map.Entry<Rows, SortedSet<Integer>> entry : runs(workbook.sheet(sheet)).entrySet()) {
        List<DataColumn> table = table(sheet, entry.getKey(), entry.getValue());
        if (table.size() > 1) {
          tables.add(table);
        }
      }
    }
    return tables;
  }

  /** First and last row of a run of figures. */
  private record Rows(int first, int last) implements Comparable<Rows> {
    @Override
    public int compareTo(Rows other) {
      int byFirst = Integer.compare(first, other.first);
      return byFirst != 0 ? byFirst : Integer.compare(last, other.last);
    }
  }

  /** Columns in which typed-in numbers stand in unbroken runs, by the rows of the runs. */
  private static SortedMap<Rows, SortedSet<Integer>> runs(Sheet sheet) {
    CellStore cells = sheet.cells();
    Map<Integer, Rows> open = new HashMap<>();
    SortedMap<Rows, SortedSet<Integer>> closed = new TreeMap<>();
    for (int i = 0; i < cells.size(); i++) {
      if (cells.kind(i) == CellKind.NUMBER && !cells.hasFormula(i)) {
        int row = cells.row(i);
        int column = cells.column(i);
        Rows run = open.get(column);
        boolean goesOn = run != null && run.last() == row - 1;
        if (run != null && !goesOn) {
          close(run, column, closed);
        }
        open.put(column, new Rows(goesOn ? run.first() : row, row));
      }
    }
    open.forEach((column, run) -> close(run, column, closed));
    return closed;
  }

  private static void close(Rows run, int column, Map<Rows, SortedSet<Integer>> closed) {
    if (run.last() - run.first() + 1 >= LEAST_ROWS) {
      closed.computeIfAbsent(run, rows -> new TreeSet<>()).add(column);
    }
  }

  private List<DataColumn> table(int sheet, Rows rows, SortedSet<Integer> numeric) {
    List<DataColumn> columns = new ArrayList<>();
    int from = Math.max(0, numeric.first() - WORDS_BESIDE);
    for (int column = from; column <= numeric.last() + WORDS_BESIDE; column++) {
      CellRange range = new CellRange(sheet, rows.first(), column, rows.last(), column);
      String heading = heading(range);
      DataColumn found = numeric.contains(column) ? figures(range, heading) : words(range, heading);
      if (found != null) {
        columns.add(found);
      }
    }
    return columns;
  }

  private String heading(CellRange range) {
    StringBuilder heading = new StringBuilder();
    for (int row = range.firstRow() - 1; row >= Math.max(0, range.firstRow() - 2); row--) {
      String text = text(range.sheet(), row, range.firstColumn());
      heading.append(text == null ? "" : text).append(' ');
    }
    return heading.toString().strip().toLowerCase(Locale.ROOT);
  }

  private DataColumn figures(CellRange range, String heading) {
    CellStore cells = workbook.sheet(range.sheet()).cells();
    double[] numbers = new double[range.rows()];
    for (int i = 0; i < numbers.length; i++) {
      numbers[i] = cells.number(cells.find(range.firstRow() + i, range.firstColumn()));
    }
    return new DataColumn(range, heading, DataColumn.NumberList.of(numbers), "");
  }

  /** A column of two words; null of anything else. */
  private DataColumn words(CellRange range, String heading) {
    List<String> words = new ArrayList<>();
    for (int row = range.firstRow(); row <= range.lastRow(); row++) {
      String word = text(range.sheet(), row, range.firstColumn());
      if (word == null) {
        return null;
      }
      words.add(word.strip().toLowerCase(Locale.ROOT));
    }
    List<String> distinct = words.stream().distinct().sorted().toList();
    double[] numbers = words.stream().mapToDouble(distinct::indexOf).toArray();
    return distinct.size() == 2
        ? new DataColumn(range, heading, DataColumn.NumberList.of(numbers), distinct.get(0))
        : null;
  }

  private String text(int sheet, int row, int column) {
    CellStore cells = workbook.sheet(sheet).cells();
    int index = cells.find(row, column);
    return index >= 0 && cells.kind(index) == CellKind.TEXT && !cells.hasFormula(index)
        ? cells.text(index)
        : null;
  }
}
