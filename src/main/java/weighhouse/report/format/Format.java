package weighhouse.report.format;

import java.util.Locale;
import java.util.function.Supplier;
import weighhouse.report.ReportWriter;
import weighhouse.report.exchange.CsvReport;
import weighhouse.report.exchange.JUnitReport;
import weighhouse.report.exchange.SarifReport;
import weighhouse.report.html.HtmlReport;
import weighhouse.report.json.JsonReport;

/** The formats of a report. A format's writer is loaded only when it is asked for. */
public enum Format {
  /** For people. */
  HTML("html", HtmlReport::new),
  /** Everything, for programs. */
  JSON("json", JsonReport::new),
  /** Findings for code-scanning services. */
  SARIF("sarif", SarifReport::new),
  /** Findings as test results for build servers. */
  JUNIT("junit.xml", JUnitReport::new),
  /** Findings as a table. */
  CSV("csv", CsvReport::new);

  private final String ending;

  @SuppressWarnings("ImmutableEnumChecker") // constructor references hold nothing
  private final Supplier<ReportWriter> writer;

  Format(String ending, Supplier<ReportWriter> writer) {
    this.ending = ending;
    this.writer = writer;
  }

  /** The name that users give: {@code html}. */
  public String text() {
    return name().toLowerCase(Locale.ROOT);
  }

  /** Name of the report's file: {@code model.xlsx.audit.html}. */
  public String fileName(String workbook) {
    return workbook + ".audit." + ending;
  }

  public ReportWriter writer() {
    return writer.get();
  }
}
