package weighhouse.recalculate;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import weighhouse.workbook.A1;

/** The parts of an .xlsx file with constants, formulas, names and tables, and nothing else. */
final class BookFile {
  private static final String MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
  private static final String OFFICE =
      "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
  private static final String PACKAGE = "http://schemas.openxmlformats.org/package/2006/";
  private static final String HEAD = "<?xml version=\"1.0\" encoding=\"UTF-8\"?>";

  private final Map<String, Map<Integer, Map<Integer, String>>> sheets = new LinkedHashMap<>();
  private final List<String[]> names = new ArrayList<>();
  private final Map<String, List<String>> tables = new LinkedHashMap<>();
  private int tableCount;
  private boolean date1904;

  void sheet(String name) {
    sheets.putIfAbsent(name, new TreeMap<>());
  }

  void date1904() {
    date1904 = true;
  }

  void name(String name, String refersTo) {
    names.add(new String[] {name, refersTo});
  }

  void table(String sheet, String name, String range, String... columns) {
    int id = ++tableCount;
    StringBuilder xml = new StringBuilder(HEAD);
    xml.append(
        String.format(
            "<table xmlns=\"%s\" id=\"%d\" name=\"%s\" displayName=\"%s\" ref=\"%s\">"
                + "<autoFilter ref=\"%s\"/><tableColumns count=\"%d\">",
            MAIN, id, name, name, range, range, columns.length));
    for (int i = 0; i < columns.length; i++) {
      xml.append(String.format("<tableColumn id=\"%d\" name=\"%s\"/>", i + 1, escaped(columns[i])));
    }
    xml.append("</tableColumns></table>");
    tables.computeIfAbsent(sheet, s -> new ArrayList<>()).add(xml.toString());
  }

  void set(String sheet, String cells, Object value, Object stored) {
    String first = cells.replaceAll(":.*", "");
    String letters = first.replaceAll("[0-9]", "");
    int row = Integer.parseInt(first.substring(letters.length()));
    String xml;
    if (value instanceof String text && text.startsWith("{=")) {
      String formula = text.substring(2, text.length() - 1);
      xml = formula(first, "<f t=\"array\" ref=\"" + cells + "\">" + escaped(formula), stored);
    } else if (value instanceof String text && text.startsWith("=")) {
      xml = formula(first, "<f>" + escaped(text.substring(1)), stored);
    } else {
      xml = "<c r=\"" + first + "\"" + constant(value) + "</c>";
    }
    sheets.get(sheet).computeIfAbsent(row, r -> new TreeMap<>()).put(A1.column(letters), xml);
  }

  private static String formula(String cell, String formula, Object stored) {
    String start = "<c r=\"" + cell + "\"";
    if (stored == null) {
      return start + ">" + formula + "</f></c>";
    }
    String value = constant(stored);
    if (stored instanceof String text && !text.startsWith("#")) {
      value = " t=\"str\"><v>" + escaped(text) + "</v>";
    }
    return start + value.replace("><v>", ">" + formula + "</f><v>") + "</c>";
  }

  private static String constant(Object value) {
    if (value instanceof Number number) {
      return "><v>" + number + "</v>";
    } else if (value instanceof Boolean truth) {
      return " t=\"b\"><v>" + (truth ? 1 : 0) + "</v>";
    }
    String text = (String) value;
    return text.startsWith("#")
        ? " t=\"e\"><v>" + text + "</v>"
        : " t=\"inlineStr\"><is><t xml:space=\"preserve\">" + escaped(text) + "</t></is>";
  }

  private static String escaped(String text) {
    return text.replace("&", "&amp;").replace("<", "&lt;").replace("\"", "&quot;");
  }

  byte[] bytes() {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (ZipOutputStream zip = new ZipOutputStream(bytes)) {
      put(zip, "[Content_Types].xml", contentTypes());
      put(zip, "_rels/.rels", relationships(List.of("officeDocument xl/workbook.xml")));
      put(zip, "xl/workbook.xml", workbook());
      List<String> targets = new ArrayList<>();
      int number = 0;
      int table = 0;
      for (Map.Entry<String, Map<Integer, Map<Integer, String>>> sheet : sheets.entrySet()) {
        String part = "worksheets/sheet" + ++number + ".xml";
        targets.add("worksheet " + part);
        List<String> own = tables.getOrDefault(sheet.getKey(), List.of());
        put(zip, "xl/" + part, sheet(sheet.getValue(), own.size()));
        List<String> links = new ArrayList<>();
        for (String xml : own) {
          put(zip, "xl/tables/table" + ++table + ".xml", xml);
          links.add("table ../tables/table" + table + ".xml");
        }
        put(zip, "xl/worksheets/_rels/sheet" + number + ".xml.rels", relationships(links));
      }
      put(zip, "xl/_rels/workbook.xml.rels", relationships(targets));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return bytes.toByteArray();
  }

  private static void put(ZipOutputStream zip, String name, String text) throws IOException {
    zip.putNextEntry(new ZipEntry(name));
    zip.write(text.getBytes(StandardCharsets.UTF_8));
  }

  private String contentTypes() {
    String spreadsheet = "application/vnd.openxmlformats-officedocument.spreadsheetml.";
    StringBuilder xml = new StringBuilder(HEAD + "<Types xmlns=\"" + PACKAGE + "content-types\">");
    xml.append("<Default Extension=\"rels\" ContentType=\"");
    xml.append("application/vnd.openxmlformats-package.relationships+xml\"/>");
    xml.append(override("/xl/workbook.xml", spreadsheet + "sheet.main+xml"));
    for (int i = 1; i <= sheets.size(); i++) {
      xml.append(override("/xl/worksheets/sheet" + i + ".xml", spreadsheet + "worksheet+xml"));
    }
    for (int i = 1; i <= tableCount; i++) {
      xml.append(override("/xl/tables/table" + i + ".xml", spreadsheet + "table+xml"));
    }
    return xml.append("</Types>").toString();
  }

  private static String override(String part, String type) {
    return "<Override PartName=\"" + part + "\" ContentType=\"" + type + "\"/>";
  }

  private static String relationships(List<String> targets) {
    StringBuilder xml =
        new StringBuilder(HEAD + "<Relationships xmlns=\"" + PACKAGE + "relationships\">");
    for (int i = 0; i < targets.size(); i++) {
      String type = targets.get(i).replaceAll(" .*", "");
      String target = targets.get(i).substring(type.length() + 1);
      xml.append(
          String.format(
              "<Relationship Id=\"rId%d\" Type=\"%s/%s\" Target=\"%s\"/>",
              i + 1, OFFICE, type, target));
    }
    return xml.append("</Relationships>").toString();
  }

  private String workbook() {
    StringBuilder xml = new StringBuilder(HEAD);
    xml.append("<workbook xmlns=\"" + MAIN + "\" xmlns:r=\"" + OFFICE + "\">");
    xml.append("<workbookPr" + (date1904 ? " date1904=\"1\"" : "") + "/><sheets>");
    int number = 0;
    for (String name : sheets.keySet()) {
      number++;
      xml.append(
          String.format(
              "<sheet name=\"%s\" sheetId=\"%d\" r:id=\"rId%d\"/>", escaped(name), number, number));
    }
    xml.append("</sheets><definedNames>");
    List<String> order = new ArrayList<>(sheets.keySet());
    for (String[] name : names) {
      int bang = name[0].indexOf('!');
      String scope =
          bang < 0 ? "" : " localSheetId=\"" + order.indexOf(name[0].substring(0, bang)) + "\"";
      xml.append("<definedName name=\"" + name[0].substring(bang + 1) + "\"" + scope + ">");
      xml.append(escaped(name[1]) + "</definedName>");
    }
    return xml.append("</definedNames></workbook>").toString();
  }

  private static String sheet(Map<Integer, Map<Integer, String>> rows, int tables) {
    StringBuilder xml = new StringBuilder(HEAD);
    xml.append("<worksheet xmlns=\"" + MAIN + "\" xmlns:r=\"" + OFFICE + "\"><sheetData>");
    rows.forEach(
        (row, cells) -> {
          xml.append("<row r=\"" + row + "\">");
          cells.values().forEach(xml::append);
          xml.append("</row>");
        });
    xml.append("</sheetData>");
    if (tables > 0) {
      xml.append("<tableParts count=\"" + tables + "\">");
      for (int i = 1; i <= tables; i++) {
        xml.append("<tablePart r:id=\"rId" + i + "\"/>");
      }
      xml.append("</tableParts>");
    }
    return xml.append("</worksheet>").toString();
  }
}
