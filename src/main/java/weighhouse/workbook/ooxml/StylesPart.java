package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.apache.poi.ss.usermodel.BuiltinFormats;

/** Reads the number format of each cell style. */
final class StylesPart {
  private static final String GENERAL = "General";

  private StylesPart() {}

  /** Number formats in the order of the styles that cells name. */
  static List<String> formats(ZipArchive archive, String part) throws IOException {
    Map<Integer, String> codes = new HashMap<>();
    List<String> formats = new ArrayList<>();
    boolean ofCells = false;
    try (XmlPart xml = XmlPart.open(archive, part)) {
      while (xml.nextElement()) {
        switch (xml.element()) {
          case "numFmt" ->
              codes.put(xml.number("numFmtId", 0), xml.attribute("formatCode", GENERAL));
          case "cellXfs" -> ofCells = true;
          case "xf" -> {
            if (ofCells) {
              formats.add(format(xml.number("numFmtId", 0), codes));
            }
          }
          case "cellStyles", "dxfs", "cellStyleXfs" -> ofCells = false;
          default -> {
            // fonts, fills, borders: nothing to audit
          }
        }
      }
    }
    return formats;
  }

  private static String format(int id, Map<Integer, String> codes) {
    String code = codes.get(id);
    if (code == null) {
      code = BuiltinFormats.getBuiltinFormat(id);
    }
    return code == null ? GENERAL : code;
  }
}
