package weighhouse.workbook;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import weighhouse.workbook.file.WorkbookReader;

/** An .xlsx file put together part by part, for content that no library writes. */
final class RawBook {
  static final String MAIN_TYPE =
      "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.main+xml";
  private static final String TYPES =
      "http://schemas.openxmlformats.org/package/2006/content-types";
  private static final String RELATIONS =
      "http://schemas.openxmlformats.org/package/2006/relationships";
  private static final String OFFICE =
      "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
  private static final String MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";

  private final Map<String, byte[]> parts = new LinkedHashMap<>();
  private final StringBuilder relations = new StringBuilder();

  /** One sheet called S that holds this between {@code <sheetData>} and its end. */
  static RawBook ofCells(String rows) {
    return ofSheet("<sheetData>" + rows + "</sheetData>");
  }

  /** One sheet called S with this content. */
  static RawBook ofSheet(String content) {
    RawBook book = new RawBook();
    book.contentType(MAIN_TYPE);
    book.part(
        "_rels/.rels",
        "<Relationships xmlns='%s'><Relationship Id='r1' Type='%s/officeDocument'"
                .formatted(RELATIONS, OFFICE)
            + " Target='xl/workbook.xml'/></Relationships>");
    book.main("<sheets><sheet name='S' sheetId='1' r:id='r1'/></sheets>");
    book.relation("r1", "worksheet", "worksheets/sheet1.xml");
    return book.part(
        "xl/worksheets/sheet1.xml",
        "<worksheet xmlns='%s' xmlns:r='%s'>".formatted(MAIN, OFFICE) + content + "</worksheet>");
  }

  RawBook contentType(String ofMain) {
    return part(
        "[Content_Types].xml",
        "<Types xmlns='%s'><Default Extension='xml' ContentType='application/xml'/>"
                .formatted(TYPES)
            + "<Default Extension='rels' ContentType='"
            + "application/vnd.openxmlformats-package.relationships+xml'/>"
            + "<Override PartName='/xl/workbook.xml' ContentType='"
            + ofMain
            + "'/></Types>");
  }

  /** The content of the main part. */
  RawBook main(String content) {
    return part(
        "xl/workbook.xml",
        "<workbook xmlns='%s' xmlns:r='%s'>".formatted(MAIN, OFFICE) + content + "</workbook>");
  }

  /** A relationship of the main part. */
  RawBook relation(String id, String type, String target) {
    relations.append(
        "<Relationship Id='%s' Type='%s/%s' Target='%s'/>".formatted(id, OFFICE, type, target));
    return part(
        "xl/_rels/workbook.xml.rels",
        "<Relationships xmlns='%s'>".formatted(RELATIONS) + relations + "</Relationships>");
  }

  RawBook part(String name, String content) {
    return part(name, content.getBytes(StandardCharsets.UTF_8));
  }

  RawBook part(String name, byte[] content) {
    parts.put(name, content);
    return this;
  }

  RawBook without(String name) {
    parts.remove(name);
    return this;
  }

  byte[] bytes() {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (ZipOutputStream zip = new ZipOutputStream(out)) {
      for (Map.Entry<String, byte[]> part : parts.entrySet()) {
        zip.putNextEntry(new ZipEntry(part.getKey()));
        zip.write(part.getValue());
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return out.toByteArray();
  }

  Workbook read() throws UnreadableWorkbookException {
    return WorkbookReader.read(bytes(), "raw.xlsx");
  }
}
