package weighhouse.report.copy.ooxml;

import java.util.Collection;
import weighhouse.workbook.CellAddress;

/** The boxes in which a sheet's comments show: the old drawing format that Excel still reads. */
final class BoxesPart {
  private static final String START =
      "<xml xmlns:v=\"urn:schemas-microsoft-com:vml\""
          + " xmlns:o=\"urn:schemas-microsoft-com:office:office\""
          + " xmlns:x=\"urn:schemas-microsoft-com:office:excel\">"
          + "<o:shapelayout v:ext=\"edit\"><o:idmap v:ext=\"edit\" data=\"900\"/></o:shapelayout>";

  private static final String BOX =
      "<v:shape xmlns:v=\"urn:schemas-microsoft-com:vml\""
          + " xmlns:o=\"urn:schemas-microsoft-com:office:office\""
          + " xmlns:x=\"urn:schemas-microsoft-com:office:excel\" id=\"wh_%1$d_%2$d\""
          + " path=\"m,l,21600r21600,l21600,xe\" o:spt=\"202\""
          + " style=\"position:absolute;visibility:hidden;width:320pt;height:110pt\""
          + " fillcolor=\"#fbf8f1\" o:insetmode=\"auto\"><v:fill color2=\"#fbf8f1\"/>"
          + "<v:textbox style=\"mso-direction-alt:auto\"/>"
          + "<x:ClientData ObjectType=\"Note\"><x:MoveWithCells/><x:SizeWithCells/>"
          + "<x:Anchor>%3$d, 15, %1$d, 2, %4$d, 15, %5$d, 4</x:Anchor><x:AutoFill>False</x:AutoFill>"
          + "<x:Row>%1$d</x:Row><x:Column>%2$d</x:Column></x:ClientData></v:shape>";

  private BoxesPart() {}

  static String empty() {
    return START + "</xml>";
  }

  /** The text of the part with a hidden box for each cell. */
  static String with(String part, Collection<CellAddress> cells) {
    StringBuilder boxes = new StringBuilder();
    for (CellAddress cell : cells) {
      int row = cell.row();
      int column = cell.column();
      boxes.append(BOX.formatted(row, column, column + 1, column + 6, row + 7));
    }
    return Insert.last(part, XmlText.next(part, 0), boxes.toString());
  }
}
