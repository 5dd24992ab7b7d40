package weighhouse.report.copy.ooxml;

import java.util.List;
import java.util.Map;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellAddress;

/** Adds comments to a sheet: the part that holds them, their boxes, and what ties both to it. */
final class SheetComments {
  private static final List<String> AFTER_BOXES =
      List.of(
          "legacyDrawingHF",
          "drawingHF",
          "picture",
          "oleObjects",
          "controls",
          "webPublishItems",
          "tableParts",
          "extLst");

  private final Parts parts;
  private final String sheet;
  private final Relations relations;
  private final Types types;

  SheetComments(Parts parts, String sheet) {
    this.parts = parts;
    this.sheet = sheet;
    this.relations = new Relations(parts, sheet);
    this.types = new Types(parts);
  }

  /** Adds them; relationship types of this file start with the base. */
  void add(Map<CellAddress, String> comments, String typeBase) {
    String part = relations.target("/comments");
    if (part == null) {
      part = parts.free("xl/commentsWeighhouse", ".xml");
      parts.put(part, CommentsPart.empty());
      types.declare(part, "comments");
      relations.add(typeBase + "/comments", part);
    }
    String text = parts.text(part);
    List<CellAddress> without =
        comments.keySet().stream()
            .filter(cell -> !CommentsPart.has(text, A1.cell(cell.row(), cell.column())))
            .toList();
    parts.put(part, CommentsPart.with(text, comments));
    boxes(without, typeBase);
  }

  private void boxes(List<CellAddress> cells, String typeBase) {
    String text = parts.text(sheet);
    XmlText.Tag drawing = XmlText.opening(text, "legacyDrawing", 0);
    String part = drawing == null ? null : relations.byId(drawing.relationship());
    if (part == null) {
      part = parts.free("xl/drawings/vmlDrawingWeighhouse", ".vml");
      parts.put(part, BoxesPart.empty());
      types.declareBoxes();
      String id = relations.add(typeBase + "/vmlDrawing", part);
      String prefix = XmlText.next(text, 0).prefix();
      String element =
          "<%slegacyDrawing xmlns:r=\"%s\" r:id=\"%s\"/>".formatted(prefix, typeBase, id);
      parts.put(sheet, Insert.before(text, AFTER_BOXES, element));
    }
    parts.put(part, BoxesPart.with(parts.text(part), cells));
  }
}
