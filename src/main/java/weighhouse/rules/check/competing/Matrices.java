package weighhouse.rules.check.competing;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Trees;
import weighhouse.recalculate.Values;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Sheet;

/**
 * Transition matrices: squares of probabilities whose states are named down and across, or by which
 * a row of occupancies is multiplied.
 */
final class Matrices {
  private static final int MOST_STATES = 60;
  private static final double CLOSE = 1e-6;

  private final Survey survey;
  private final Set<CellRange> squares = new LinkedHashSet<>();

  private Matrices(Survey survey) {
    this.survey = survey;
  }

  /** The matrices of a workbook with the states left down the rows. */
  static List<CellRange> of(Survey survey) {
    Matrices matrices = new Matrices(survey);
    matrices.named();
    matrices.multiplied();
    return matrices.squares.stream().filter(matrices::isOfProbabilities).toList();
  }

  private void named() {
    List<Sheet> sheets = survey.subject().workbook().sheets();
    for (int sheet = 0; sheet < sheets.size(); sheet++) {
      CellStore cells = sheets.get(sheet).cells();
      for (int i = 0; i < cells.size(); i++) {
        if (cells.kind(i) == CellKind.TEXT && cells.column(i) > 0) {
          namedFrom(new CellAddress(sheet, cells.row(i), cells.column(i)));
        }
      }
    }
  }

  /** A square whose first state across stands in the cell. */
  private void namedFrom(CellAddress first) {
    CellAddress corner = first.offset(0, -1);
    String state = survey.text(first);
    if (!state.equals(survey.text(corner.offset(1, 0))) || state.isBlank()) {
      return;
    }
    int states = 1;
    while (states < MOST_STATES) {
      String across = survey.text(corner.offset(0, states + 1));
      if (across == null || !across.equals(survey.text(corner.offset(states + 1, 0)))) {
        break;
      }
      states++;
    }
    if (states > 1) {
      add(corner.offset(1, 1), states);
    }
  }

  private void add(CellAddress first, int states) {
    squares.add(
        new CellRange(
            first.sheet(),
            first.row(),
            first.column(),
            first.row() + states - 1,
            first.column() + states - 1));
  }

  private void multiplied() {
    for (Region region : survey.regions()) {
      for (Expr node : Trees.walk(survey.tree(region))) {
        if (node instanceof Expr.Call call
            && call.function().equals("MMULT")
            && call.arguments().size() == 2) {
          CellAddress host = region.range().first();
          Optional<CellRange> row = survey.references().range(call.arguments().get(0), host);
          Optional<CellRange> square = survey.references().range(call.arguments().get(1), host);
          boolean fits =
              row.isPresent()
                  && square.isPresent()
                  && row.get().rows() == 1
                  && square.get().rows() == square.get().columns()
                  && square.get().rows() == row.get().columns();
          if (fits && square.get().rows() <= MOST_STATES) {
            squares.add(square.get());
          }
        }
      }
    }
  }

  /** Numbers from 0 to 1, at least one of whose rows sums to 1: no rates, counts or costs. */
  private boolean isOfProbabilities(CellRange square) {
    int whole = 0;
    for (int row = square.firstRow(); row <= square.lastRow(); row++) {
      for (CellAddress cell : Survey.cells(row(square, row))) {
        double value = survey.base().number(cell);
        if (!(value >= -0.5 && value <= 1.5)) {
          return false;
        }
      }
      whole += Math.abs(sum(row(square, row), survey.base()) - 1) < CLOSE ? 1 : 0;
    }
    return whole > 0;
  }

  static CellRange row(CellRange square, int row) {
    return new CellRange(square.sheet(), row, square.firstColumn(), row, square.lastColumn());
  }

  static double sum(CellRange range, Values values) {
    return Survey.cells(range).stream().mapToDouble(values::number).sum();
  }

  /** The rows of all matrices. */
  static List<CellRange> rows(Survey survey) {
    List<CellRange> rows = new ArrayList<>();
    for (CellRange square : of(survey)) {
      for (int row = square.firstRow(); row <= square.lastRow(); row++) {
        rows.add(row(square, row));
      }
    }
    return rows;
  }
}
