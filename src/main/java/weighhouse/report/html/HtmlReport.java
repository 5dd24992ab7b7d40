package weighhouse.report.html;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import org.jsoup.nodes.Document;
import org.jsoup.nodes.Element;
import weighhouse.audit.AuditResult;
import weighhouse.report.ReportWriter;

/** Writes an audit as one self-contained page, most consequential first. */
public final class HtmlReport implements ReportWriter {
  @Override
  public void write(AuditResult result, OutputStream out) throws IOException {
    out.write(page(result).outerHtml().getBytes(StandardCharsets.UTF_8));
  }

  /** The page's tree. */
  static Document page(AuditResult result) {
    Page page = new Page(result.workbook().fileName() + ": audit of its effect measures");
    Element body = page.body();
    Opening.write(result, body);
    Contents.write(result, body);
    Element main = body.appendElement("main").attr("id", "report");
    Ledger.write(result, main);
    Findings.write(result, main);
    Evidence.write(result, main);
    CoverageSection.write(result, main);
    QuantitiesSection.write(result, main);
    Cautions.write(main);
    Cautions.imprint(result, body);
    return page.document();
  }
}
