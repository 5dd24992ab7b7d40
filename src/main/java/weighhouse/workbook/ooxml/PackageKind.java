package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import weighhouse.workbook.WorkbookFault;
import weighhouse.workbook.ooxml.Relationships.Relationship;

/** Tells workbooks from other things that are zip archives. */
final class PackageKind {
  /** Content types of main parts that are workbooks: plain, macro-enabled, templates, add-ins. */
  private static final List<String> WORKBOOKS =
      List.of(
          "spreadsheetml.sheet.main+xml",
          "spreadsheetml.template.main+xml",
          "ms-excel.sheet.macroEnabled.main+xml",
          "ms-excel.template.macroEnabled.main+xml",
          "ms-excel.addin.macroEnabled.main+xml");

  private PackageKind() {}

  /** Name of the workbook's main part. */
  static String mainPart(ZipArchive archive) throws IOException {
    if (archive.has("mimetype") && !archive.has("[Content_Types].xml")) {
      throw new WorkbookFault(openDocument(archive));
    }
    if (!archive.has("[Content_Types].xml") || !archive.has("_rels/.rels")) {
      throw new WorkbookFault(
          "is a zip archive but no workbook: give an .xlsx, .xlsm or .xls file");
    }
    List<Relationship> main = Relationships.of(archive, "").ofType("officeDocument");
    if (main.isEmpty()) {
      throw new WorkbookFault(
          "is a package without a workbook in it: give an .xlsx, .xlsm or .xls file");
    }
    String part = main.get(0).target();
    check(ContentTypes.of(archive).of(part));
    return part;
  }

  private static void check(String type) throws WorkbookFault {
    if (WORKBOOKS.stream().anyMatch(type::endsWith)) {
      return;
    }
    if (type.contains("ms-excel.sheet.binary")) {
      throw new WorkbookFault(
          "is a binary workbook (.xlsb): open it in Excel and save it as .xlsx or .xlsm");
    }
    if (type.contains("wordprocessingml") || type.contains("presentationml")) {
      throw new WorkbookFault(
          "is a document or presentation, not a workbook: give an .xlsx, .xlsm or .xls file");
    }
    throw new WorkbookFault(
        "does not declare its main part to be a workbook (content type "
            + (type.isEmpty() ? "missing" : type)
            + "): open it in Excel, let Excel repair it and save it");
  }

  private static String openDocument(ZipArchive archive) throws IOException {
    try (InputStream in = archive.open("mimetype")) {
      String type = new String(in.readNBytes(200), StandardCharsets.US_ASCII);
      return type.contains("spreadsheet")
          ? "is an OpenDocument spreadsheet (.ods): save it as .xlsx"
          : "is an OpenDocument file but no spreadsheet: give an .xlsx, .xlsm or .xls file";
    }
  }
}
