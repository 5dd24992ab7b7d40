package weighhouse.report.copy.ooxml;

import java.util.List;
import weighhouse.report.copy.edit.Edits;
import weighhouse.workbook.A1;

/** The sheet that lists the findings, as the text of a part. */
final class ReviewSheet {
  private static final String START =
      "<?xml version=\"1.0\" encoding=\"UTF-8\" standalone=\"yes\"?>\n"
          + "<worksheet xmlns=\"http://schemas.openxmlformats.org/spreadsheetml/2006/main\"><cols>"
          + "<col min=\"1\" max=\"1\" width=\"12\" customWidth=\"1\"/>"
          + "<col min=\"2\" max=\"2\" width=\"24\" customWidth=\"1\"/>"
          + "<col min=\"3\" max=\"5\" width=\"48\" customWidth=\"1\"/>"
          + "<col min=\"6\" max=\"9\" width=\"18\" customWidth=\"1\"/>"
          + "<col min=\"10\" max=\"10\" width=\"48\" customWidth=\"1\"/></cols><sheetData>";

  private ReviewSheet() {}

  static String text(List<Edits.ReviewRow> rows) {
    StringBuilder out = new StringBuilder(START);
    StringBuilder links = new StringBuilder();
    for (int i = 0; i < rows.size(); i++) {
      Edits.ReviewRow row = rows.get(i);
      out.append("<row r=\"").append(i + 1).append("\">");
      for (int column = 0; column < row.cells().size(); column++) {
        cell(out, A1.cell(i, column), row.cells().get(column));
      }
      out.append("</row>");
      if (row.link() != null) {
        links.append(
            "<hyperlink ref=\"%s\" location=\"%s\"/>"
                .formatted(A1.cell(i, 1), XmlText.escape(row.link())));
      }
    }
    out.append("</sheetData>");
    if (links.length() > 0) {
      out.append("<hyperlinks>").append(links).append("</hyperlinks>");
    }
    return out.append("</worksheet>").toString();
  }

  private static void cell(StringBuilder out, String address, Object content) {
    if (content instanceof Double number && Double.isFinite(number)) {
      out.append("<c r=\"").append(address).append("\"><v>").append(number).append("</v></c>");
    } else if (!content.toString().isEmpty()) {
      out.append("<c r=\"")
          .append(address)
          .append("\" t=\"inlineStr\"><is><t xml:space=\"preserve\">")
          .append(XmlText.escape(content.toString()))
          .append("</t></is></c>");
    }
  }
}
