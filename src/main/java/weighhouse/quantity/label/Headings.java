package weighhouse.quantity.label;

import java.util.ArrayList;
import java.util.List;
import weighhouse.quantity.vocabulary.Vocabulary;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/** Finds the texts that may label a number: by name, beside it, above it, over its section. */
public final class Headings {
  private final Workbook workbook;
  private final Vocabulary vocabulary;
  private final NamedCells names;
  private final List<SheetTexts> sheets;

  public Headings(Workbook workbook, Vocabulary vocabulary) {
    this.workbook = workbook;
    this.vocabulary = vocabulary;
    this.names = new NamedCells(workbook);
    this.sheets = workbook.sheets().parallelStream().map(SheetTexts::new).toList();
  }

  /** The texts, nearest first. */
  public List<Label> near(CellAddress cell) {
    List<Label> found = new ArrayList<>();
    SheetTexts texts = sheets.get(cell.sheet());
    new RowLabels(texts, cell.row(), cell.column())
        .find((place, column) -> add(texts, place, cell.row(), column, cell.sheet(), found));
    // after the row's own label, which is written with more care than a name
    for (String name : names.of(cell)) {
      found.add(new Label(name, Place.NAME, null, vocabulary.read(name)));
    }
    int[] title = texts.titles().above(cell.row(), cell.column());
    int section = title == null ? -1 : title[0];
    new ColumnHeadings(texts, cell.column())
        .find(
            cell.row(),
            row -> {
              Place place = row < section ? Place.FAR_HEADING : Place.ABOVE;
              add(texts, place, row, cell.column(), cell.sheet(), found);
            });
    remote(texts, cell, title, found);
    return found;
  }

  private void remote(SheetTexts texts, CellAddress cell, int[] title, List<Label> found) {
    String comment = workbook.sheet(cell.sheet()).comments().get(cell);
    if (comment != null) {
      found.add(new Label(comment, Place.COMMENT, cell, vocabulary.read(comment)));
    }
    if (title != null) {
      add(texts, Place.SECTION, title[0], title[1], cell.sheet(), found);
    }
    String sheet = workbook.sheet(cell.sheet()).name();
    found.add(new Label(sheet, Place.SHEET, null, vocabulary.read(sheet)));
  }

  private void add(
      SheetTexts texts, Place place, int row, int column, int sheet, List<Label> found) {
    String text = texts.at(row, column);
    boolean twice =
        place == Place.SECTION
            && found.stream()
                .anyMatch(
                    l -> l.where() != null && l.where().row() == row && l.place() == Place.ABOVE);
    if (text != null && !twice) {
      CellAddress where = new CellAddress(sheet, row, column);
      found.add(new Label(text, place, where, vocabulary.read(text)));
    }
  }

  /** Whether the row has a text of its own that may set its numbers apart from the rows around. */
  public boolean isLabelled(CellAddress cell) {
    if (names.isNamed(cell)) {
      return true;
    }
    SheetTexts texts = sheets.get(cell.sheet());
    boolean[] tells = new boolean[1];
    new RowLabels(texts, cell.row(), cell.column())
        .find((place, column) -> tells[0] |= vocabulary.read(texts.at(cell.row(), column)).tells());
    return tells[0];
  }

  /** Whether any text stands beside a number, so that the number is one of its own. */
  public boolean hasText(CellAddress cell) {
    boolean[] any = {names.isNamed(cell)};
    new RowLabels(sheets.get(cell.sheet()), cell.row(), cell.column())
        .find((place, column) -> any[0] = true);
    return any[0];
  }

  /** Whether a heading or name that tells something stands over that very column. */
  public boolean isHeaded(CellAddress cell) {
    if (names.isNamed(cell)) {
      return true;
    }
    SheetTexts texts = sheets.get(cell.sheet());
    boolean[] tells = new boolean[1];
    new ColumnHeadings(texts, cell.column())
        .find(cell.row(), row -> tells[0] |= vocabulary.read(texts.at(row, cell.column())).tells());
    return tells[0];
  }
}
