package weighhouse.report.exchange;

import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import java.util.stream.Collectors;
import javax.xml.stream.XMLOutputFactory;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamWriter;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Finding;
import weighhouse.audit.Severity;
import weighhouse.report.ReportWriter;
import weighhouse.report.text.Visible;

/**
 * Findings as JUnit test results: a suite a workbook, a failed test a finding, a skipped one for
 * each that is accepted or only asks. A workbook without findings is one passed test.
 */
public final class JUnitReport implements ReportWriter {
  @Override
  public void write(AuditResult result, OutputStream out) throws IOException {
    try {
      XMLStreamWriter xml =
          XMLOutputFactory.newDefaultFactory().createXMLStreamWriter(out, "UTF-8");
      xml.writeStartDocument("UTF-8", "1.0");
      suite(result, xml);
      xml.writeEndDocument();
      xml.flush();
    } catch (XMLStreamException e) {
      throw new IOException(e);
    }
  }

  private static void suite(AuditResult result, XMLStreamWriter xml) throws XMLStreamException {
    List<Finding> findings = result.findings();
    long skipped = findings.stream().filter(JUnitReport::skipped).count();
    xml.writeStartElement("testsuites");
    xml.writeStartElement("testsuite");
    attribute(xml, "name", result.workbook().fileName());
    attribute(xml, "tests", Integer.toString(Math.max(1, findings.size())));
    attribute(xml, "failures", Long.toString(findings.size() - skipped));
    attribute(xml, "errors", "0");
    attribute(xml, "skipped", Long.toString(skipped));
    attribute(xml, "time", "0");
    if (findings.isEmpty()) {
      test(xml, "weighhouse", "effect measures");
      xml.writeEndElement();
    }
    for (Finding finding : findings) {
      finding(finding, result, xml);
    }
    xml.writeEndElement();
    xml.writeEndElement();
  }

  private static void finding(Finding finding, AuditResult result, XMLStreamWriter xml)
      throws XMLStreamException {
    String where = result.workbook().show(finding.cells().get(0));
    test(
        xml,
        finding.rule().family() + "." + finding.rule().id(),
        where + " [" + finding.id() + "]");
    if (skipped(finding)) {
      xml.writeEmptyElement("skipped");
      attribute(xml, "message", reason(finding));
    } else {
      xml.writeStartElement("failure");
      attribute(xml, "message", finding.message());
      attribute(xml, "type", finding.severity().text());
      xml.writeCharacters(body(finding, result));
      xml.writeEndElement();
    }
    xml.writeEndElement();
  }

  private static boolean skipped(Finding finding) {
    return finding.acceptance() != null || finding.severity() == Severity.QUERY;
  }

  private static String reason(Finding finding) {
    return finding.acceptance() == null
        ? finding.message()
        : "accepted by " + finding.acceptance().by() + ": " + finding.acceptance().reason();
  }

  private static String body(Finding finding, AuditResult result) {
    String cells =
        finding.cells().stream().map(result.workbook()::show).collect(Collectors.joining(" "));
    String suggested = finding.suggestedFormula() == null ? "none" : finding.suggestedFormula();
    return List.of("cells: " + cells, "formula: " + finding.formula(), "suggested: " + suggested)
        .stream()
        .map(Visible::text)
        .collect(Collectors.joining("\n"));
  }

  private static void test(XMLStreamWriter xml, String group, String name)
      throws XMLStreamException {
    xml.writeStartElement("testcase");
    attribute(xml, "classname", group);
    attribute(xml, "name", name);
    attribute(xml, "time", "0");
  }

  private static void attribute(XMLStreamWriter xml, String name, String text)
      throws XMLStreamException {
    xml.writeAttribute(name, Visible.text(text));
  }
}
