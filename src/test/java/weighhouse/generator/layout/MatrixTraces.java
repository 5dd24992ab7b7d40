package weighhouse.generator.layout;

import java.util.List;
import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Event;

/**
 * A transition matrix for each arm, stacked on one sheet, and traces that multiply the row before
 * by the matrix in array formulas.
 */
final class MatrixTraces implements Placement {
  @Override
  public void place(ModelDraft draft) {
    SheetDraft matrices = draft.book().sheet("Matrices").at(0, 0);
    for (int arm = 0; arm < 2; arm++) {
      matrix(draft, matrices, arm);
    }
    for (int arm = 0; arm < 2; arm++) {
      trace(draft, arm);
    }
  }

  private static void matrix(ModelDraft draft, SheetDraft sheet, int arm) {
    List<String> states = draft.model().scenario().states();
    sheet.label("Transition matrix, " + draft.words().arm(arm)).down(2);
    sheet.label("from / to");
    states.forEach(sheet::label);
    sheet.down();
    int size = states.size();
    String first = null;
    for (int from = 0; from < size; from++) {
      sheet.label(states.get(from));
      for (int to = 0; to < size; to++) {
        sheet.formula(entry(draft, sheet, from, to, arm));
        first = first == null ? sheet.last().from("") : first;
      }
      sheet.down();
    }
    String end = CellAt.fixed(sheet.last().row(), sheet.last().column());
    draft.book().symbols().text("matrix." + arm, first + ":" + end);
    sheet.down(2);
  }

  private static String entry(ModelDraft draft, SheetDraft sheet, int from, int to, int arm) {
    int dead = draft.model().scenario().dead();
    Event death = draft.model().event("die");
    String die = "{" + death.result(arm) + "}";
    if (from == dead) {
      return to == dead ? "1" : "0";
    }
    if (to == dead) {
      return die;
    }
    if (to == from + 1) {
      return "(1-" + die + ")*{" + draft.model().event("prog" + to).result(arm) + "}";
    }
    return to == from ? rest(sheet, from, dead) : "0";
  }

  /** One minus all other entries of the row. */
  private static String rest(SheetDraft sheet, int from, int dead) {
    int row = sheet.row();
    String right = CellAt.a1(row, from + 2) + ":" + CellAt.a1(row, dead + 1);
    String left = from == 0 ? "" : "-SUM(" + CellAt.a1(row, 1) + ":" + CellAt.a1(row, from) + ")";
    return "1-SUM(" + right + ")" + left;
  }

  private static void trace(ModelDraft draft, int arm) {
    SheetDraft sheet = draft.book().sheet("Trace " + (arm + 1)).at(0, 0);
    sheet.label(draft.words().arm(arm));
    int size = draft.model().scenario().states().size();
    List<Line> lines =
        TraceLines.of(draft, arm).stream()
            .map(line -> line.key().matches("s\\d") ? product(line, size, arm) : line)
            .toList();
    new TraceGrid(draft, sheet, 2, 1, false).write(lines, draft.model().cycles(), arm);
  }

  /** The first state's cell holds the array formula of the whole row. */
  private static Line product(Line line, int size, int arm) {
    String row = "MMULT({<s0}:{<s" + (size - 1) + "},{matrix." + arm + "})";
    String next = line.key().equals("s0") ? "array:" + size + ":" + row : null;
    return Line.of(line.key(), line.label(), line.first(), next);
  }
}
