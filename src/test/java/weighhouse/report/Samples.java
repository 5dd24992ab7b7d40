package weighhouse.report;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import weighhouse.audit.ActsOn;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Coverage;
import weighhouse.audit.Figure;
import weighhouse.audit.Finding;
import weighhouse.audit.Measure;
import weighhouse.audit.OutcomeFigures;
import weighhouse.audit.Plot;
import weighhouse.audit.QuantityRow;
import weighhouse.audit.Verdict;
import weighhouse.quantity.Kind;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellsBuilder;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Visibility;
import weighhouse.workbook.Workbook;

/** Results of audits that never took place, to write reports of. */
public final class Samples {
  static final String HOSTILE =
      "<script>alert(1)</script>\" onload='x' \u202Etxt\u202C \u001B[31mred ]]> &amp; \u0000end";

  private Samples() {}

  static Workbook workbook(String name) {
    return new Workbook(
        name,
        "9f86d081884c7d659a2feaa0c55ad015a3bf4f1b2b0b822cd15d6c15b0f00a08",
        List.of(sheet("Inputs"), sheet("Model B"), sheet("Results")),
        List.of(),
        false,
        List.of("xl/vbaProject.bin"),
        List.of(),
        List.of());
  }

  private static Sheet sheet(String name) {
    CellsBuilder cells = new CellsBuilder();
    cells.begin(4, 2, 0).number(0.7).end();
    return new Sheet(
        name,
        Visibility.VISIBLE,
        cells.build(),
        List.of(),
        List.of(),
        Map.of(),
        new BitSet(),
        new BitSet(),
        List.of());
  }

  static CellAddress at(int sheet, int row, int column) {
    return new CellAddress(sheet, row, column);
  }

  /** A model that is held, with everything that a report can show. */
  public static AuditResult held() {
    return with(workbook("cohort model.xlsm"), FindingSamples.three(), Verdict.HOLD);
  }

  /** A model in which nothing was found. */
  public static AuditResult passed() {
    return with(workbook("right.xlsx"), List.of(), Verdict.PASS);
  }

  /** The same three findings again and again. */
  public static AuditResult many(int findings) {
    List<Finding> three = FindingSamples.three();
    List<Finding> all =
        IntStream.range(0, findings)
            .mapToObj(i -> FindingSamples.copy(three.get(i % 3), "many" + i))
            .toList();
    return with(workbook("large.xlsx"), all, Verdict.HOLD);
  }

  /** Every text of the workbook tries to break out of the report. */
  public static AuditResult hostile() {
    return with(
        workbook(HOSTILE + ".xlsx"), List.of(FindingSamples.hostile(HOSTILE)), Verdict.HOLD);
  }

  /** An audit of that workbook with one finding at the cells. */
  public static AuditResult with(Workbook workbook, CellRange cells, String suggested) {
    return new AuditResult(
        workbook,
        1,
        Verdict.HOLD,
        List.of(FindingSamples.at(cells, suggested)),
        List.of(),
        List.of(),
        false,
        Double.NaN,
        null,
        new Coverage(
            300, 300, 299, 299, List.of(), Map.of(), List.of(), List.of(), List.of(), List.of()),
        List.of(),
        List.of());
  }

  private static AuditResult with(Workbook workbook, List<Finding> findings, Verdict verdict) {
    boolean fault = !findings.isEmpty();
    return new AuditResult(
        workbook,
        61,
        verdict,
        findings,
        measures(fault),
        outcomes(fault),
        fault,
        20000,
        "1 month",
        coverage(),
        quantities(),
        fault ? plots(findings.get(0).id()) : List.of());
  }

  static List<OutcomeFigures> outcomes(boolean fault) {
    return List.of(
        new OutcomeFigures(
            at(2, 9, 2),
            "Cost per QALY gained",
            Figure.of(18734.21),
            Figure.of(fault ? 21480.93 : 18734.21)),
        new OutcomeFigures(
            at(2, 7, 2), "Incremental cost", Figure.of(6021.7), Figure.of(fault ? 6013.2 : 6021.7)),
        new OutcomeFigures(
            at(2, 8, 2),
            "Incremental QALYs",
            Figure.of(0.32143),
            Figure.of(fault ? 0.27993 : 0.32143)),
        new OutcomeFigures(
            at(2, 10, 2),
            "Net benefit",
            fault ? new Figure(Double.NaN, "#DIV/0!") : Figure.of(407),
            Figure.of(-414.6)));
  }

  private static List<Measure> measures(boolean fault) {
    List<Double> series = IntStream.range(0, 480).mapToObj(i -> 0.74 + 0.07 * i / 480).toList();
    return List.of(
        new Measure(
            at(0, 4, 2),
            "Hazard ratio of progression, treatment against usual care",
            Kind.HAZARD_RATIO,
            0.7,
            0.55,
            0.89,
            fault ? new Measure.Effective(0.74, 0.78, 0.81) : new Measure.Effective(0.7, 0.7, 0.7),
            fault ? ActsOn.RISK : ActsOn.HAZARD,
            List.of(new CellRange(1, 4, 3, 483, 3), new CellRange(1, 4, 9, 483, 9)),
            series),
        new Measure(
            at(0, 5, 2),
            "RR",
            Kind.RISK_RATIO,
            1.35,
            Double.NaN,
            Double.NaN,
            null,
            ActsOn.NOTHING,
            List.of(),
            List.of()),
        new Measure(
            at(0, 6, 2),
            "Log odds ratio of relapse",
            Kind.LOG_ODDS_RATIO,
            -0.41,
            -0.8,
            -0.02,
            new Measure.Effective(-0.41, -0.41, -0.41),
            ActsOn.ODDS,
            List.of(new CellRange(1, 4, 5, 4, 5)),
            List.of()));
  }

  private static Coverage coverage() {
    Map<String, Integer> unsupported = new LinkedHashMap<>();
    unsupported.put("CUBEVALUE", 3);
    unsupported.put("circular reference", 2);
    return new Coverage(
        2011,
        2010,
        2006,
        2004,
        List.of(
            new Coverage.Difference(at(1, 20, 4), Figure.of(0.051), Figure.of(0.0512)),
            new Coverage.Difference(at(1, 21, 4), Figure.of(0.2), new Figure(Double.NaN, "#NUM!"))),
        unsupported,
        List.of("xl/vbaProject.bin"),
        List.of("file:///c:/models/prices.xlsx"),
        List.of("Sheet “Old” is very hidden."),
        List.of("1 formula could not be read: Results!C40."));
  }

  private static List<QuantityRow> quantities() {
    List<QuantityRow> rows = new ArrayList<>();
    rows.add(
        new QuantityRow(
            CellRange.of(at(0, 4, 2)),
            "HR (95% CI)",
            "hazard ratio",
            null,
            List.of("label “HR (95% CI)” in Inputs!C3"),
            "label"));
    rows.add(
        new QuantityRow(
            new CellRange(1, 4, 3, 483, 3),
            "Progression",
            "probability",
            "1 month",
            List.of("label “tp” in 'Model B'!D3", "rows sum to 1"),
            "algebra"));
    return rows;
  }

  private static List<Plot> plots(String finding) {
    List<Double> xs = IntStream.range(1, 481).mapToObj(i -> (double) i).toList();
    List<Double> now = xs.stream().map(x -> 0.021 + 0.00012 * x).toList();
    List<Double> correct = xs.stream().map(x -> 0.024 + 0.00013 * x).toList();
    return List.of(
        new Plot(
            finding,
            "Probability of progression along the cycles",
            "cycle",
            "probability",
            List.of(new Plot.Series("now", xs, now), new Plot.Series("correct", xs, correct))),
        new Plot(
            "Inputs!C5",
            "Log cumulative hazard by arm",
            "ln(months)",
            "ln(−ln S)",
            List.of(
                new Plot.Series(
                    "usual care", List.of(0.0, 1.0, 2.0, 3.0), List.of(-3.0, -1.9, -1.0, -0.2)),
                new Plot.Series(
                    "treatment", List.of(0.2, 1.1, 2.2, 3.0), List.of(-3.3, -2.4, -1.1, 0.1)))),
        new Plot(
            Plot.DRAWS,
            "Share of 1,000 draws that are cost-effective",
            "threshold",
            "share",
            List.of(
                new Plot.Series(
                    "as it is",
                    List.of(0.0, 1e4, 2e4, 3e4, 4e4),
                    List.of(0.0, 0.1, 0.55, 0.8, 0.9)),
                new Plot.Series(
                    "corrected",
                    List.of(0.0, 1e4, 2e4, 3e4, 4e4),
                    List.of(0.0, 0.05, 0.41, 0.72, 0.86)))));
  }
}
