package weighhouse.report.copy.ooxml;

import java.util.ArrayList;
import java.util.List;

/** The part that lists the sheets. */
final class WorkbookPart {
  private static final List<String> AFTER_CALCULATION =
      List.of(
          "oleSize",
          "customWorkbookViews",
          "pivotCaches",
          "smartTagPr",
          "smartTagTypes",
          "webPublishing",
          "fileRecoveryPr",
          "webPublishObjects",
          "extLst");

  private final Parts parts;
  private final String name;
  private final Relations relations;

  WorkbookPart(Parts parts) {
    this.parts = parts;
    this.name = new Relations(parts, "").target("/officeDocument");
    this.relations = new Relations(parts, name);
  }

  Relations relations() {
    return relations;
  }

  /** The part of the sheet of that name. */
  String sheet(String wanted) {
    String text = parts.text(name);
    for (XmlText.Tag tag = XmlText.opening(text, "sheet", 0);
        tag != null;
        tag = XmlText.opening(text, "sheet", tag.end())) {
      if (XmlText.unescape(tag.attribute("name")).equals(wanted)) {
        return relations.byId(tag.relationship());
      }
    }
    throw new IllegalStateException("the audited workbook has a sheet " + wanted);
  }

  /** Adds a sheet behind all others, under that name or one like it. */
  void addSheet(String wanted, String part) {
    String id = relations.add(relations.typeBase() + "/worksheet", part);
    String text = parts.text(name);
    int highest = 0;
    List<String> names = new ArrayList<>();
    XmlText.Tag prototype = null;
    for (XmlText.Tag tag = XmlText.opening(text, "sheet", 0);
        tag != null;
        tag = XmlText.opening(text, "sheet", tag.end())) {
      highest = Math.max(highest, Integer.parseInt(tag.attribute("sheetId")));
      names.add(tag.attribute("name"));
      prototype = tag;
    }
    String sheet =
        "<%s name=\"%s\" sheetId=\"%d\" xmlns:whr=\"%s\" whr:id=\"%s\"/>"
            .formatted(
                prototype.name(), free(wanted, names), highest + 1, relations.typeBase(), id);
    XmlText.Tag sheets = XmlText.opening(text, "sheets", 0);
    parts.put(name, Insert.last(text, sheets, sheet));
  }

  private static String free(String wanted, List<String> taken) {
    String free = wanted;
    for (int i = 2; taken.contains(free); i++) {
      free = wanted + " " + i;
    }
    return free;
  }

  /** Has the spreadsheet recalculate everything when it opens the file. */
  void recalculateOnLoad() {
    String text = parts.text(name);
    XmlText.Tag tag = XmlText.opening(text, "calcPr", 0);
    if (tag == null) {
      String prefix = XmlText.next(text, 0).prefix();
      String element = "<" + prefix + "calcPr fullCalcOnLoad=\"1\"/>";
      parts.put(name, Insert.before(text, AFTER_CALCULATION, element));
    } else {
      parts.put(
          name,
          text.substring(0, tag.start())
              + tag.with("fullCalcOnLoad", "1")
              + text.substring(tag.end()));
    }
  }

  /** Takes away the order of calculation, which the spreadsheet makes anew. */
  void forgetOrder() {
    String chain = relations.target("/calcChain");
    if (chain != null) {
      relations.remove("/calcChain");
      new Types(parts).remove(chain);
      parts.remove(chain);
    }
  }
}
