package weighhouse.rules.check;

import java.util.Locale;
import weighhouse.workbook.CellAddress;

/** What the workbook writes beside a number. */
public final class Captions {
  /** How far from its number a label stands. */
  private static final int REACH = 7;

  private final Survey survey;

  public Captions(Survey survey) {
    this.survey = survey;
  }

  /** The label of a cell; the nearest text of its row where it has no other; may be empty. */
  public String of(CellAddress cell) {
    String label = survey.subject().quantities().label(cell);
    return label.isBlank() ? besides(cell) : label;
  }

  private String besides(CellAddress cell) {
    for (int direction : new int[] {-1, 1}) {
      for (int step = 1; step <= REACH; step++) {
        String text = text(cell.offset(0, direction * step));
        if (!text.isEmpty()) {
          return text;
        }
      }
    }
    return "";
  }

  /** The label of a column or row of numbers, with the texts just before its first cell. */
  public String ofLine(CellAddress first, boolean vertical) {
    StringBuilder caption = new StringBuilder(survey.subject().quantities().label(first));
    for (int step = 1; step <= 3; step++) {
      String text = text(vertical ? first.offset(-step, 0) : first.offset(0, -step));
      caption.append(' ').append(text);
    }
    return caption.toString().strip().toLowerCase(Locale.ROOT);
  }

  private String text(CellAddress cell) {
    String text = cell.row() < 0 || cell.column() < 0 ? null : survey.text(cell);
    return text == null ? "" : text.strip();
  }
}
