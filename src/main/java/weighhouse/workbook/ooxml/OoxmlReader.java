package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.DefinedName;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Table;
import weighhouse.workbook.Workbook;
import weighhouse.workbook.WorkbookFault;

/** Reads an .xlsx or .xlsm file from memory. */
public final class OoxmlReader {
  private final OoxmlPackage source;
  private final MainPart main;
  private final List<OoxmlPackage.SheetSource> worksheets;
  private final SheetPart.Context context;

  private OoxmlReader(byte[] file) throws IOException {
    source = OoxmlPackage.open(file);
    main = MainPart.read(source.archive(), source.mainPart());
    worksheets = source.worksheets(main.tabs());
    context =
        new SheetPart.Context(
            source.hasPart("sharedStrings")
                ? SharedTexts.read(source.archive(), source.part("sharedStrings"))
                : List.of(),
            source.hasPart("styles")
                ? StylesPart.formats(source.archive(), source.part("styles"))
                : List.of(),
            main.date1904());
  }

  /**
   * The snapshot of the workbook.
   *
   * @param file the whole file
   * @param fileName its name without its folder
   * @param sha256 digest of its bytes
   * @throws IOException a {@link WorkbookFault} when the file is damaged or no workbook
   */
  public static Workbook read(byte[] file, String fileName, String sha256) throws IOException {
    return new OoxmlReader(file).workbook(fileName, sha256);
  }

  private Workbook workbook(String fileName, String sha256) throws IOException {
    List<String> problems = new ArrayList<>();
    List<Sheet> sheets = new ArrayList<>();
    for (SheetResult result : readSheets()) {
      sheets.add(result.sheet());
      problems.addAll(result.problems());
    }
    return new Workbook(
        fileName,
        sha256,
        sheets,
        names(),
        main.date1904(),
        source.macros(),
        source.externalLinks(main.externalIds()),
        problems);
  }

  private record SheetResult(Sheet sheet, List<String> problems) {}

  /** Reads the sheets side by side, the largest first. */
  private List<SheetResult> readSheets() throws IOException {
    List<Integer> order =
        IntStream.range(0, worksheets.size())
            .boxed()
            .sorted(Comparator.comparingLong(i -> -source.archive().size(worksheets.get(i).part())))
            .toList();
    return Parallel.map(order, this::readSheet, worksheets.size());
  }

  private SheetResult readSheet(int index) throws IOException {
    OoxmlPackage.SheetSource from = worksheets.get(index);
    Relationships parts = Relationships.of(source.archive(), from.part());
    SheetPart own;
    try (XmlPart xml = XmlPart.open(source.archive(), from.part())) {
      own = SheetPart.read(xml, context, index, from.tab().name());
    }
    Map<CellAddress, String> comments = CommentParts.read(source.archive(), parts, index);
    List<Table> tables = new ArrayList<>();
    for (Relationships.Relationship table : parts.ofType("table")) {
      TablePart.read(source.archive(), table.target(), index).ifPresent(tables::add);
    }
    Sheet sheet =
        new Sheet(
            from.tab().name(),
            from.tab().visibility(),
            own.cells(),
            own.arrays(),
            own.merged(),
            comments,
            own.hiddenRows(),
            own.hiddenColumns(),
            tables);
    return new SheetResult(sheet, own.problems());
  }

  /** Names with their scope counted in the worksheets; those of other sheets are left out. */
  private List<DefinedName> names() {
    List<DefinedName> names = new ArrayList<>();
    for (DefinedName name : main.names()) {
      int scope = name.scope();
      if (scope != DefinedName.WORKBOOK_SCOPE) {
        scope = worksheetOfTab(scope);
        if (scope < 0) {
          continue;
        }
      }
      names.add(new DefinedName(name.name(), scope, name.formula(), name.hidden(), name.comment()));
    }
    return names;
  }

  private int worksheetOfTab(int tab) {
    if (tab < 0 || tab >= main.tabs().size()) {
      return -1;
    }
    return worksheets.stream()
        .map(OoxmlPackage.SheetSource::tab)
        .toList()
        .indexOf(main.tabs().get(tab));
  }
}
