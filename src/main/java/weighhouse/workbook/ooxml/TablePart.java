package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Table;

/** Reads the part of a structured table. */
final class TablePart {
  private TablePart() {}

  /** The table, or nothing where the part does not say over which range it stands. */
  static Optional<Table> read(ZipArchive archive, String part, int sheet) throws IOException {
    try (XmlPart xml = XmlPart.open(archive, part)) {
      String name = xml.attribute("displayName", xml.attribute("name", ""));
      Optional<CellRange> range = Ranges.parse(xml.attribute("ref"), sheet);
      int headerRows = xml.number("headerRowCount", 1);
      int totalsRows = xml.number("totalsRowCount", 0);
      List<String> columns = new ArrayList<>();
      while (xml.nextElement()) {
        if (xml.element().equals("tableColumn")) {
          columns.add(Escapes.decode(xml.attribute("name", "")));
        }
      }
      return range.map(area -> new Table(name, area, headerRows, totalsRows, columns));
    }
  }
}
