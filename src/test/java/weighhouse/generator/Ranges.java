package weighhouse.generator;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import org.apache.poi.ss.SpreadsheetVersion;
import org.apache.poi.ss.util.AreaReference;
import weighhouse.generator.book.CellAt;

/** Cells as ranges in Excel's notation and back. */
public final class Ranges {
  private Ranges() {}

  /** Runs down a column, and runs along a row of what is left single. */
  public static List<String> of(Collection<CellAt> cells) {
    List<List<CellAt>> runs = runs(new ArrayList<>(new TreeSet<>(cells)), 1, 0);
    Map<Boolean, List<List<CellAt>>> bySize = new LinkedHashMap<>();
    runs.forEach(run -> bySize.computeIfAbsent(run.size() > 1, it -> new ArrayList<>()).add(run));
    List<CellAt> single =
        bySize.getOrDefault(false, List.of()).stream()
            .map(run -> run.get(0))
            .sorted(
                java.util.Comparator.comparing(CellAt::sheet)
                    .thenComparingInt(CellAt::row)
                    .thenComparingInt(CellAt::column))
            .toList();
    List<List<CellAt>> all = new ArrayList<>(bySize.getOrDefault(true, List.of()));
    all.addAll(runs(single, 0, 1));
    return all.stream().map(Ranges::text).toList();
  }

  private static List<List<CellAt>> runs(List<CellAt> sorted, int down, int right) {
    List<List<CellAt>> runs = new ArrayList<>();
    CellAt next = null;
    for (CellAt cell : sorted) {
      if (!cell.equals(next)) {
        runs.add(new ArrayList<>());
      }
      runs.get(runs.size() - 1).add(cell);
      next = new CellAt(cell.sheet(), cell.row() + down, cell.column() + right);
    }
    return runs;
  }

  private static String text(List<CellAt> run) {
    CellAt first = run.get(0);
    CellAt last = run.get(run.size() - 1);
    return run.size() == 1
        ? first.text()
        : first.text() + ":" + CellAt.a1(last.row(), last.column());
  }

  /** Whether two ranges share a cell; sheet names are compared without quotes and case. */
  public static boolean overlap(String one, String other) {
    AreaReference a = new AreaReference(one, SpreadsheetVersion.EXCEL2007);
    AreaReference b = new AreaReference(other, SpreadsheetVersion.EXCEL2007);
    return String.valueOf(a.getFirstCell().getSheetName())
            .equalsIgnoreCase(String.valueOf(b.getFirstCell().getSheetName()))
        && a.getFirstCell().getRow() <= b.getLastCell().getRow()
        && b.getFirstCell().getRow() <= a.getLastCell().getRow()
        && a.getFirstCell().getCol() <= b.getLastCell().getCol()
        && b.getFirstCell().getCol() <= a.getLastCell().getCol();
  }
}
