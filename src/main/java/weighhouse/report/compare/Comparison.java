package weighhouse.report.compare;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Figure;
import weighhouse.audit.Finding;
import weighhouse.audit.Measure;
import weighhouse.audit.OutcomeFigures;
import weighhouse.audit.QuantityRow;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Workbook;

/**
 * What changed from one audit to another.
 *
 * @param before the earlier audit
 * @param after the later one
 * @param resolved findings of the earlier that are gone
 * @param added findings of the later that are new
 * @param remaining findings of the later that were there before
 * @param measures effect measures whose value or scale of action differs
 * @param inputs other inputs whose value differs
 * @param outcomes outcomes of both, as the workbooks are
 */
public record Comparison(
    AuditResult before,
    AuditResult after,
    List<Finding> resolved,
    List<Finding> added,
    List<Finding> remaining,
    List<Moved> measures,
    List<Moved> inputs,
    List<Moved> outcomes) {

  /**
   * A figure of both workbooks.
   *
   * @param label what it is called in the later one
   * @param cell where it stands in the later one, or in the earlier one if it is gone
   * @param before null where it is new
   * @param after null where it is gone
   * @param remark what else changed, or null
   */
  public record Moved(String label, String cell, Figure before, Figure after, String remark) {}

  /** Compares two audits. */
  public static Comparison of(AuditResult before, AuditResult after) {
    Set<String> then = ids(before);
    Set<String> now = ids(after);
    return new Comparison(
        before,
        after,
        before.findings().stream().filter(f -> !now.contains(f.id())).toList(),
        after.findings().stream().filter(f -> !then.contains(f.id())).toList(),
        after.findings().stream().filter(f -> then.contains(f.id())).toList(),
        Moves.of(measures(before), measures(after)),
        Moves.of(inputs(before), inputs(after)),
        Moves.all(outcomes(before), outcomes(after)));
  }

  private static Set<String> ids(AuditResult result) {
    return result.findings().stream().map(Finding::id).collect(Collectors.toSet());
  }

  private static Map<String, Moves.Item> measures(AuditResult result) {
    return keyed(
        result.measures(),
        measure -> measure.kind().text() + "|" + measure.label(),
        measure ->
            new Moves.Item(
                measure.label(),
                result.workbook().show(measure.cell()),
                Figure.of(measure.value()),
                "acts on " + measure.actsOn().text()));
  }

  private static Map<String, Moves.Item> outcomes(AuditResult result) {
    return keyed(
        result.outcomes(),
        OutcomeFigures::label,
        outcome ->
            new Moves.Item(
                outcome.label(), result.workbook().show(outcome.cell()), outcome.now(), ""));
  }

  /** Typed numbers with a known meaning that are no effect measures. */
  private static Map<String, Moves.Item> inputs(AuditResult result) {
    Set<CellAddress> measures =
        result.measures().stream().map(Measure::cell).collect(Collectors.toSet());
    List<QuantityRow> rows =
        result.quantities().stream()
            .filter(row -> row.range().size() == 1 && !measures.contains(row.range().first()))
            .filter(row -> !Double.isNaN(typed(result.workbook(), row.range().first())))
            .toList();
    return keyed(
        rows,
        row ->
            result.workbook().sheet(row.range().sheet()).name()
                + "|"
                + row.label()
                + "|"
                + row.kind(),
        row ->
            new Moves.Item(
                row.label(),
                result.workbook().show(row.range()),
                Figure.of(typed(result.workbook(), row.range().first())),
                ""));
  }

  private static double typed(Workbook workbook, CellAddress cell) {
    CellStore cells = workbook.sheet(cell.sheet()).cells();
    int index = cells.find(cell.row(), cell.column());
    return index < 0 || cells.hasFormula(index) ? Double.NaN : cells.number(index);
  }

  /** Items by key; those of one key are told apart by their order. */
  private static <T> Map<String, Moves.Item> keyed(
      List<T> all, Function<T, String> key, Function<T, Moves.Item> item) {
    Map<String, Moves.Item> keyed = new LinkedHashMap<>();
    for (T one : all) {
      String base = key.apply(one);
      String free = base;
      for (int i = 2; keyed.containsKey(free); i++) {
        free = base + "|" + i;
      }
      keyed.put(free, item.apply(one));
    }
    return keyed;
  }
}
