package weighhouse.recalculate.functions;

import java.util.ArrayList;
import java.util.List;
import weighhouse.recalculate.Value;

/** Sums, counts, means and extremes over the places where conditions hold. */
final class ConditionalSums {
  private ConditionalSums() {}

  static void enter(Entries entries) {
    entries.general("COUNTIF", "RV", a -> Coerce.of(places(a, 0).size()));
    entries.general("COUNTIFS", "RV++", a -> Coerce.of(places(a, 0).size()));
    entries.general("SUMIF", "RVr", a -> Coerce.of(sum(single(a))));
    entries.general("AVERAGEIF", "RVr", a -> SumFunctions.mean(single(a)));
    entries.general("SUMIFS", "RRV++", a -> Coerce.of(sum(several(a))));
    entries.general("AVERAGEIFS", "RRV++", a -> SumFunctions.mean(several(a)));
    entries.general("MAXIFS", "RRV++", a -> extreme(several(a), true));
    entries.general("MINIFS", "RRV++", a -> extreme(several(a), false));
  }

  private record Place(int row, int column) {}

  /** Places where all pairs of range and condition from an argument on hold. */
  private static List<Place> places(Arguments a, int first) {
    Grid shape = a.grid(first);
    int pairs = (a.count() - first) / 2;
    Grid[] grids = new Grid[pairs];
    Criterion[] criteria = new Criterion[pairs];
    int rows = 0;
    int columns = 0;
    boolean blanks = true;
    for (int i = 0; i < pairs; i++) {
      grids[i] = a.grid(first + 2 * i);
      criteria[i] = Criterion.of(a.value(first + 2 * i + 1));
      if (grids[i].rows() != shape.rows() || grids[i].columns() != shape.columns()) {
        throw Fault.VALUE.exception();
      }
      rows = Math.max(rows, grids[i].usedRows());
      columns = Math.max(columns, grids[i].usedColumns());
      blanks &= criteria[i].test(new Value.Blank());
    }
    return matching(
        grids, criteria, blanks ? shape.rows() : rows, blanks ? shape.columns() : columns);
  }

  private static List<Place> matching(Grid[] grids, Criterion[] criteria, int rows, int columns) {
    List<Place> places = new ArrayList<>();
    for (int r = 0; r < rows; r++) {
      for (int c = 0; c < columns; c++) {
        if (holds(grids, criteria, r, c)) {
          places.add(new Place(r, c));
        }
      }
    }
    return places;
  }

  private static boolean holds(Grid[] grids, Criterion[] criteria, int row, int column) {
    for (int i = 0; i < grids.length; i++) {
      if (!criteria[i].test(grids[i].at(row, column))) {
        return false;
      }
    }
    return true;
  }

  /** Of SUMIF: the summed range starts where it starts and has the size of the tested one. */
  private static double[] single(Arguments a) {
    Grid grid = a.missing(2) ? a.grid(0) : resized(a);
    List<Place> places = new ArrayList<>();
    Criterion criterion = Criterion.of(a.value(1));
    Grid tested = a.grid(0);
    for (int r = 0; r < tested.usedRows(); r++) {
      for (int c = 0; c < tested.usedColumns(); c++) {
        if (criterion.test(tested.at(r, c))) {
          places.add(new Place(r, c));
        }
      }
    }
    return numbers(grid, places);
  }

  private static Grid resized(Arguments a) {
    Reference reference = a.reference(2);
    Grid tested = a.grid(0);
    if (reference == null) {
      throw Fault.VALUE.exception();
    }
    return a.surroundings()
        .cells(
            Reference.of(
                Ranges.of(
                    reference.area().sheet(),
                    reference.area().firstRow(),
                    reference.area().firstColumn(),
                    tested.rows(),
                    tested.columns())));
  }

  private static double[] several(Arguments a) {
    Grid grid = a.grid(0);
    Grid tested = a.grid(1);
    if (grid.rows() != tested.rows() || grid.columns() != tested.columns()) {
      throw Fault.VALUE.exception();
    }
    return numbers(grid, places(a, 1));
  }

  private static double[] numbers(Grid grid, List<Place> places) {
    return places.stream()
        .filter(p -> p.row() < grid.rows() && p.column() < grid.columns())
        .mapToDouble(p -> number(grid, p))
        .filter(n -> !Double.isNaN(n))
        .toArray();
  }

  private static double number(Grid grid, Place place) {
    double number = grid.number(place.row(), place.column());
    if (Double.isNaN(number)) {
      Coerce.sound(grid.at(place.row(), place.column()));
    }
    return number;
  }

  private static double sum(double[] numbers) {
    double sum = 0;
    for (double number : numbers) {
      sum += number;
    }
    return sum;
  }

  private static Value extreme(double[] numbers, boolean largest) {
    double extreme = numbers.length == 0 ? 0 : numbers[0];
    for (double number : numbers) {
      extreme = largest ? Math.max(extreme, number) : Math.min(extreme, number);
    }
    return Coerce.of(extreme);
  }
}
