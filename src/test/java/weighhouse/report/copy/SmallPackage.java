package weighhouse.report.copy;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;

/**
 * A macro workbook in the fewest parts: a shared formula in B2:B6 whose text stands in B2, an array
 * formula in D2:D4, a comment at B3, a calculation chain, and parts that no one here understands.
 */
final class SmallPackage {
  private static final String HEAD = "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\r\n";
  private static final String MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
  private static final String REL =
      "http://schemas.openxmlformats.org/officeDocument/2006/relationships";

  private SmallPackage() {}

  static byte[] xlsm() throws IOException {
    return zip(parts());
  }

  static Map<String, String> parts() {
    Map<String, String> parts = new LinkedHashMap<>();
    parts.put(
        "[Content_Types].xml",
        HEAD
            + "<Types xmlns=\"http://schemas.openxmlformats.org/package/2006/content-types\"><Default"
            + " Extension=\"rels\" ContentType=\"application/vnd.openxmlformats-package.relationships+xml\"/><Default"
            + " Extension=\"xml\" ContentType=\"application/xml\"/><Default Extension=\"bin\""
            + " ContentType=\"application/vnd.ms-office.vbaProject\"/>"
            + type("workbook", "application/vnd.ms-excel.sheet.macroEnabled.main+xml")
            + type("worksheets/sheet1", spreadsheet("worksheet"))
            + type("comments1", spreadsheet("comments"))
            + type("calcChain", spreadsheet("calcChain"))
            + "</Types>");
    parts.put("_rels/.rels", relations(relation("rId1", "officeDocument", "xl/workbook.xml")));
    parts.put(
        "xl/workbook.xml",
        HEAD
            + "<workbook xmlns=\""
            + MAIN
            + "\" xmlns:r=\""
            + REL
            + "\"><sheets><sheet name=\"Model &amp; co\" sheetId=\"7\" r:id=\"rId1\"/></sheets>"
            + "<definedNames><definedName name=\"hr\">'Model &amp; co'!$A$1</definedName>"
            + "</definedNames><calcPr calcId=\"1\"/></workbook>");
    parts.put(
        "xl/_rels/workbook.xml.rels",
        relations(
            relation("rId1", "worksheet", "worksheets/sheet1.xml")
                + relation("rId2", "calcChain", "calcChain.xml")));
    parts.put(
        "xl/worksheets/sheet1.xml",
        HEAD
            + "<worksheet xmlns=\""
            + MAIN
            + "\" ><sheetData>\n<row r=\"1\" spans=\"1:4\"><c r=\"A1\"><v>0.7</v></c></row>"
            + "<row r=\"2\"><c r=\"A2\"><v>0.1</v></c><c r=\"B2\" s=\"0\"><f t=\"shared\" ref=\"B2:B6\""
            + " si=\"0\">A2*$A$1</f><v>0.07</v></c><c r=\"D2\"><f t=\"array\" ref=\"D2:D4\">"
            + "A2:A4*A1</f><v>0.07</v></c></row>"
            + member(3, 0.2, true)
            + member(4, 0.3, true)
            + member(5, 0.4, false)
            + member(6, 0.5, false)
            + "</sheetData><!-- kept --><pageMargins left=\"0.7\" right=\"0.7\" top=\"1\""
            + " bottom=\"1\" header=\"0\" footer=\"0\"/></worksheet>");
    parts.put(
        "xl/worksheets/_rels/sheet1.xml.rels",
        relations(relation("rId1", "comments", "../comments1.xml")));
    parts.put(
        "xl/comments1.xml",
        HEAD
            + "<comments xmlns=\""
            + MAIN
            + "\"><authors><author>Someone</author></authors><commentList><comment ref=\"B3\""
            + " authorId=\"0\"><text><t>checked</t></text></comment></commentList></comments>");
    parts.put(
        "xl/calcChain.xml",
        HEAD + "<calcChain xmlns=\"" + MAIN + "\"><c r=\"B2\" i=\"1\"/></calcChain>");
    parts.put("xl/vbaProject.bin", "\u0001macros\u0002");
    parts.put("customXml/item1.xml", "<anything/>");
    return parts;
  }

  private static String member(int row, double value, boolean array) {
    String fourth = array ? "<c r=\"D" + row + "\"><v>" + value * 0.7 + "</v></c>" : "";
    return "<row r=\"%1$d\"><c r=\"A%1$d\"><v>%2$s</v></c><c r=\"B%1$d\"><f t=\"shared\" si=\"0\"/><v>%3$s</v></c>%4$s</row>"
        .formatted(row, value, value * 0.7, fourth);
  }

  private static String type(String part, String type) {
    return "<Override PartName=\"/xl/" + part + ".xml\" ContentType=\"" + type + "\"/>";
  }

  private static String spreadsheet(String kind) {
    return "application/vnd.openxmlformats-officedocument.spreadsheetml." + kind + "+xml";
  }

  private static String relations(String all) {
    return HEAD
        + "<Relationships xmlns=\"http://schemas.openxmlformats.org/package/2006/relationships\">"
        + all
        + "</Relationships>";
  }

  private static String relation(String id, String type, String target) {
    return "<Relationship Id=\"%s\" Type=\"%s/%s\" Target=\"%s\"/>"
        .formatted(id, REL, type, target);
  }

  static byte[] zip(Map<String, String> parts) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (ZipOutputStream zip = new ZipOutputStream(out)) {
      for (Map.Entry<String, String> part : parts.entrySet()) {
        zip.putNextEntry(new ZipEntry(part.getKey()));
        zip.write(part.getValue().getBytes(StandardCharsets.UTF_8));
      }
    }
    return out.toByteArray();
  }

  static Map<String, String> unzip(byte[] file) throws IOException {
    Map<String, String> parts = new LinkedHashMap<>();
    try (ZipInputStream zip = new ZipInputStream(new ByteArrayInputStream(file))) {
      for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
        parts.put(entry.getName(), new String(zip.readAllBytes(), StandardCharsets.UTF_8));
      }
    }
    return parts;
  }
}
