package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import weighhouse.workbook.DefinedName;
import weighhouse.workbook.Visibility;
import weighhouse.workbook.WorkbookFault;

/**
 * The part that lists a workbook's sheets and names.
 *
 * @param date1904 whether day 0 is in 1904
 * @param tabs all sheets in tab order, chart and macro sheets too
 * @param names defined names, their scopes counted in {@code tabs}
 * @param externalIds relationships to other workbooks, in the order that formulas number them
 */
record MainPart(
    boolean date1904, List<Tab> tabs, List<DefinedName> names, List<String> externalIds) {

  /** A sheet as the main part names it. */
  record Tab(String name, Visibility visibility, String relationship) {}

  /** Excel's own names, such as print areas, are no model content. */
  private static final String BUILT_IN = "_xlnm.";

  static MainPart read(ZipArchive archive, String part) throws IOException {
    boolean date1904 = false;
    List<Tab> tabs = new ArrayList<>();
    List<DefinedName> names = new ArrayList<>();
    List<String> external = new ArrayList<>();
    try (XmlPart xml = XmlPart.open(archive, part)) {
      if (!xml.element().equals("workbook")) {
        throw new WorkbookFault(
            "is no workbook (its main part is a " + xml.element() + "): give an .xlsx file");
      }
      while (xml.nextElement()) {
        switch (xml.element()) {
          case "workbookPr" -> date1904 |= xml.flag("date1904");
          case "sheet" -> tabs.add(tab(xml));
          case "definedName" -> names.add(name(xml));
          case "externalReference" -> external.add(xml.attribute("id", ""));
          default -> {
            // windows, protection, calculation settings: nothing to audit
          }
        }
      }
    }
    names.removeIf(name -> name.name().startsWith(BUILT_IN));
    return new MainPart(date1904, tabs, names, external);
  }

  private static Tab tab(XmlPart xml) {
    Visibility visibility =
        switch (xml.attribute("state", "visible")) {
          case "hidden" -> Visibility.HIDDEN;
          case "veryHidden" -> Visibility.VERY_HIDDEN;
          default -> Visibility.VISIBLE;
        };
    return new Tab(xml.attribute("name", ""), visibility, xml.attribute("id", ""));
  }

  private static DefinedName name(XmlPart xml) throws IOException {
    String name = xml.attribute("name", "");
    int scope = xml.number("localSheetId", DefinedName.WORKBOOK_SCOPE);
    boolean hidden = xml.flag("hidden");
    String comment = xml.attribute("comment", "");
    return new DefinedName(name, scope, xml.text().strip(), hidden, comment);
  }
}
