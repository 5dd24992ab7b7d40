package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import weighhouse.workbook.WorkbookFault;
import weighhouse.workbook.ooxml.MainPart.Tab;
import weighhouse.workbook.ooxml.Relationships.Relationship;

/**
 * The package of a workbook: which parts it has and how the main part refers to them.
 *
 * @param mainPart name of the part that lists the sheets
 * @param parts what the main part refers to
 */
record OoxmlPackage(ZipArchive archive, String mainPart, Relationships parts) {

  /** A worksheet and the part that holds it. */
  record SheetSource(Tab tab, String part) {}

  private static final String WORKSHEET = "worksheet";
  private static final List<String> MACRO_SHEETS = List.of("xlMacrosheet", "xlIntlMacrosheet");

  static OoxmlPackage open(byte[] file) throws IOException {
    ZipArchive archive = new ZipArchive(file);
    String main = PackageKind.mainPart(archive);
    return new OoxmlPackage(archive, main, Relationships.of(archive, main));
  }

  boolean hasPart(String type) {
    return !parts.ofType(type).isEmpty();
  }

  /** Name of the one part of that type. */
  String part(String type) {
    return parts.ofType(type).get(0).target();
  }

  /** The worksheets among the tabs, in their order. */
  List<SheetSource> worksheets(List<Tab> tabs) throws WorkbookFault {
    List<SheetSource> worksheets = new ArrayList<>();
    for (Tab tab : tabs) {
      Optional<Relationship> found = parts.byId(tab.relationship());
      if (found.isEmpty()) {
        throw new WorkbookFault(
            "does not say where its sheet "
                + tab.name()
                + " is: open it in Excel, let Excel repair it and save it");
      }
      if (found.get().type().equals(WORKSHEET)) {
        worksheets.add(new SheetSource(tab, found.get().target()));
      }
    }
    if (worksheets.isEmpty()) {
      throw new WorkbookFault("has no worksheet: give a workbook with at least one");
    }
    return worksheets;
  }

  /** Parts that hold macros. */
  List<String> macros() {
    return parts.all().stream()
        .filter(r -> r.type().equals("vbaProject") || MACRO_SHEETS.contains(r.type()))
        .map(Relationship::target)
        .toList();
  }

  /** Targets of the links to other workbooks, in the order that formulas number them. */
  List<String> externalLinks(List<String> ids) throws IOException {
    List<String> targets = new ArrayList<>();
    for (String id : ids) {
      Optional<Relationship> link = parts.byId(id);
      if (link.isPresent()) {
        Relationships ofLink = Relationships.of(archive, link.get().target());
        targets.add(
            ofLink.all().stream()
                .filter(Relationship::external)
                .map(Relationship::target)
                .findFirst()
                .orElse(link.get().target()));
      }
    }
    return targets;
  }
}
