package weighhouse.recalculate.functions;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import weighhouse.recalculate.Value;

/** Functions that answer with arrays, rows and columns rearranged. */
final class ArrayFunctions {
  private static final int MOST = 10_000_000;

  private ArrayFunctions() {}

  static void enter(Entries entries) {
    entries.general("SEQUENCE", "Vvvv", ArrayFunctions::sequence);
    entries.general("FILTER", "AAa", ArrayFunctions::filter);
    entries.general("UNIQUE", "Avv", ArrayFunctions::unique);
    entries.general("SORT", "Avvv", ArrayFunctions::sort);
    entries.general("SORTBY", "AAv++", ArrayFunctions::sortBy);
    entries.general("VSTACK", "A+", a -> stack(a, true));
    entries.general("HSTACK", "A+", a -> stack(a, false));
    entries.general("TAKE", "Avv", a -> part(a, true));
    entries.general("DROP", "Avv", a -> part(a, false));
    entries.general("CHOOSECOLS", "AV+", a -> chosen(a, false));
    entries.general("CHOOSEROWS", "AV+", a -> chosen(a, true));
    entries.general("TOCOL", "A", a -> line(a.grid(0), true));
    entries.general("TOROW", "A", a -> line(a.grid(0), false));
  }

  private static Value sequence(Arguments a) {
    int rows = a.integer(0, 1);
    int columns = a.integer(1, 1);
    if (rows < 1 || columns < 1 || (long) rows * columns > MOST) {
      throw Fault.VALUE.exception();
    }
    double[][] numbers = new double[rows][columns];
    for (int i = 0; i < rows * columns; i++) {
      numbers[i / columns][i % columns] = a.number(2, 1) + i * a.number(3, 1);
    }
    return Matrices.array(numbers);
  }

  /** The lines of a grid, rows or columns, as lists. */
  private static List<List<Value>> lines(Grid grid, boolean rows) {
    List<List<Value>> lines = new ArrayList<>();
    for (int i = 0; i < (rows ? grid.rows() : grid.columns()); i++) {
      List<Value> line = new ArrayList<>();
      for (int k = 0; k < (rows ? grid.columns() : grid.rows()); k++) {
        line.add(rows ? grid.at(i, k) : grid.at(k, i));
      }
      lines.add(line);
    }
    return lines;
  }

  private static Value array(List<List<Value>> lines, boolean rows) {
    if (lines.isEmpty() || lines.get(0).isEmpty()) {
      return Fault.CALC.value();
    }
    int length = lines.stream().mapToInt(List::size).max().orElse(0);
    Value[][] values = rows ? new Value[lines.size()][length] : new Value[length][lines.size()];
    for (int i = 0; i < lines.size(); i++) {
      for (int k = 0; k < length; k++) {
        Value value = k < lines.get(i).size() ? lines.get(i).get(k) : Fault.NA.value();
        values[rows ? i : k][rows ? k : i] = value;
      }
    }
    return new Value.Array(values);
  }

  private static Value filter(Arguments a) {
    Grid grid = a.grid(0);
    Grid tests = a.grid(1);
    boolean rows = tests.columns() == 1 && tests.rows() == grid.rows();
    if (!rows && !(tests.rows() == 1 && tests.columns() == grid.columns())) {
      throw Fault.VALUE.exception();
    }
    List<List<Value>> lines = lines(grid, rows);
    List<List<Value>> kept = new ArrayList<>();
    for (int i = 0; i < lines.size(); i++) {
      if (Coerce.logical(tests.at(i))) {
        kept.add(lines.get(i));
      }
    }
    return kept.isEmpty() && !a.missing(2) ? a.value(2) : array(kept, rows);
  }

  private static Value unique(Arguments a) {
    boolean rows = !a.logical(1, false);
    boolean once = a.logical(2, false);
    List<List<Value>> lines = lines(a.grid(0), rows);
    List<List<Value>> kept = new ArrayList<>();
    for (List<Value> line : lines) {
      long equal = lines.stream().filter(other -> equal(line, other)).count();
      boolean seen = kept.stream().anyMatch(other -> equal(line, other));
      if (!seen && (!once || equal == 1)) {
        kept.add(line);
      }
    }
    return array(kept, rows);
  }

  private static boolean equal(List<Value> a, List<Value> b) {
    for (int i = 0; i < a.size(); i++) {
      boolean fault = a.get(i) instanceof Value.Fault || b.get(i) instanceof Value.Fault;
      boolean same = fault ? a.get(i).equals(b.get(i)) : Order.equal(a.get(i), b.get(i));
      if (!same) {
        return false;
      }
    }
    return true;
  }

  private static Value sort(Arguments a) {
    boolean rows = !a.logical(3, false);
    int by = a.integer(1, 1) - 1;
    int sign = a.integer(2, 1);
    List<List<Value>> lines = lines(a.grid(0), rows);
    if (by < 0 || lines.isEmpty() || by >= lines.get(0).size()) {
      throw Fault.VALUE.exception();
    }
    lines.sort(Comparator.comparing(line -> line.get(by), ordered(sign)));
    return array(lines, rows);
  }

  /** Blanks last, whichever the direction. */
  private static Comparator<Value> ordered(int sign) {
    return (x, y) -> {
      boolean blank = x instanceof Value.Blank;
      if (blank != (y instanceof Value.Blank)) {
        return blank ? 1 : -1;
      }
      return blank ? 0 : sign * Order.compare(x, y);
    };
  }

  private static Value sortBy(Arguments a) {
    Grid grid = a.grid(0);
    boolean rows = a.grid(1).columns() == 1 && a.grid(1).rows() == grid.rows();
    List<List<Value>> lines = lines(grid, rows);
    List<Integer> order = new ArrayList<>();
    for (int i = 0; i < lines.size(); i++) {
      order.add(i);
    }
    Comparator<Integer> comparator = null;
    for (int k = 1; k < a.count(); k += 2) {
      Grid keys = a.grid(k);
      int sign = a.missing(k + 1) ? 1 : a.integer(k + 1);
      if (keys.size() != lines.size()) {
        throw Fault.VALUE.exception();
      }
      Comparator<Integer> next = Comparator.comparing(keys::at, ordered(sign));
      comparator = comparator == null ? next : comparator.thenComparing(next);
    }
    order.sort(comparator);
    return array(new ArrayList<>(order.stream().map(lines::get).toList()), rows);
  }

  private static Value stack(Arguments a, boolean rows) {
    List<List<Value>> lines = new ArrayList<>();
    for (int i = 0; i < a.count(); i++) {
      lines.addAll(lines(a.grid(i), rows));
    }
    return array(lines, rows);
  }

  private static Value part(Arguments a, boolean take) {
    List<List<Value>> rows = lines(a.grid(0), true);
    List<List<Value>> kept = a.missing(1) ? rows : part(rows, a.integer(1), take);
    if (a.missing(2)) {
      return array(kept, true);
    }
    return array(kept.stream().map(row -> part(row, a.integer(2), take)).toList(), true);
  }

  private static <T> List<T> part(List<T> list, int count, boolean take) {
    int size = list.size();
    int length = Math.min(size, Math.abs(count));
    boolean fromStart = (count >= 0) == take;
    int kept = take ? length : size - length;
    return fromStart ? list.subList(0, kept) : list.subList(size - kept, size);
  }

  private static Value chosen(Arguments a, boolean rows) {
    List<List<Value>> lines = lines(a.grid(0), rows);
    List<List<Value>> kept = new ArrayList<>();
    for (int i = 1; i < a.count(); i++) {
      int index = a.integer(i);
      int at = index < 0 ? lines.size() + index : index - 1;
      if (index == 0 || at < 0 || at >= lines.size()) {
        throw Fault.VALUE.exception();
      }
      kept.add(lines.get(at));
    }
    return array(kept, rows);
  }

  private static Value line(Grid grid, boolean column) {
    List<Value> values = lines(grid, true).stream().flatMap(List::stream).toList();
    return array(List.of(values), !column);
  }
}
