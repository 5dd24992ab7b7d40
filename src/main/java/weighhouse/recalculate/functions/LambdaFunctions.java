package weighhouse.recalculate.functions;

import java.util.ArrayList;
import java.util.List;
import weighhouse.recalculate.Value;

/** Functions that call another: MAP and its kin. */
final class LambdaFunctions {
  private LambdaFunctions() {}

  static void enter(Entries entries) {
    entries.general("MAP", "AA+", LambdaFunctions::map);
    entries.general("BYROW", "AA", a -> lines(a, true));
    entries.general("BYCOL", "AA", a -> lines(a, false));
    entries.general("REDUCE", "VAA", LambdaFunctions::reduce);
    entries.general("SCAN", "VAA", LambdaFunctions::scan);
    entries.general("MAKEARRAY", "VVA", LambdaFunctions::make);
  }

  private static Value map(Arguments a) {
    int last = a.count() - 1;
    Lambda lambda = a.lambda(last);
    Grid first = a.grid(0);
    Value[][] values = new Value[first.rows()][first.columns()];
    for (int r = 0; r < values.length; r++) {
      for (int c = 0; c < values[r].length; c++) {
        List<Value> arguments = new ArrayList<>();
        for (int i = 0; i < last; i++) {
          arguments.add(a.grid(i).at(r, c));
        }
        values[r][c] = Coerce.single(lambda.call(arguments));
      }
    }
    return new Value.Array(values);
  }

  private static Value lines(Arguments a, boolean rows) {
    Grid grid = a.grid(0);
    Lambda lambda = a.lambda(1);
    int count = rows ? grid.rows() : grid.columns();
    Value[][] values = rows ? new Value[count][1] : new Value[1][count];
    for (int i = 0; i < count; i++) {
      Value[][] line = rows ? new Value[1][grid.columns()] : new Value[grid.rows()][1];
      for (int k = 0; k < (rows ? grid.columns() : grid.rows()); k++) {
        line[rows ? 0 : k][rows ? k : 0] = rows ? grid.at(i, k) : grid.at(k, i);
      }
      Value result = Coerce.single(lambda.call(List.of(new Value.Array(line))));
      values[rows ? i : 0][rows ? 0 : i] = result;
    }
    return new Value.Array(values);
  }

  private static Value reduce(Arguments a) {
    Value folded = a.value(0);
    Lambda lambda = a.lambda(2);
    Grid grid = a.grid(1);
    for (int i = 0; i < grid.size(); i++) {
      folded = lambda.call(List.of(folded, grid.at(i)));
    }
    return folded;
  }

  private static Value scan(Arguments a) {
    Value folded = a.value(0);
    Lambda lambda = a.lambda(2);
    Grid grid = a.grid(1);
    Value[][] values = new Value[grid.rows()][grid.columns()];
    for (int i = 0; i < grid.size(); i++) {
      folded = Coerce.single(lambda.call(List.of(folded, grid.at(i))));
      values[i / grid.columns()][i % grid.columns()] = folded;
    }
    return new Value.Array(values);
  }

  private static Value make(Arguments a) {
    Lambda lambda = a.lambda(2);
    Value[][] values = new Value[a.integer(0)][a.integer(1)];
    for (int r = 0; r < values.length; r++) {
      for (int c = 0; c < values[r].length; c++) {
        List<Value> place = List.of(new Value.Num(r + 1.0), new Value.Num(c + 1.0));
        values[r][c] = Coerce.single(lambda.call(place));
      }
    }
    return new Value.Array(values);
  }
}
