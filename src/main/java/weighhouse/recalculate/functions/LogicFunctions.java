package weighhouse.recalculate.functions;

import java.util.function.BooleanSupplier;
import weighhouse.recalculate.Value;

/** Truth values and choices. The choosing functions evaluate only what they choose. */
final class LogicFunctions {
  private LogicFunctions() {}

  static void enter(Entries entries) {
    entries.general("TRUE", "", a -> new Value.Logical(true));
    entries.general("FALSE", "", a -> new Value.Logical(false));
    entries.general("NOT", "V", a -> new Value.Logical(!a.logical(0)));
    entries.general("AND", "R+", a -> new Value.Logical(count(a).allTrue()));
    entries.general("OR", "R+", a -> new Value.Logical(count(a).trues > 0));
    entries.general("XOR", "R+", a -> new Value.Logical(count(a).trues % 2 == 1));
    entries.selecting("IF", "VRr", LogicFunctions::choose);
    entries.selecting("IFERROR", "RR", a -> fails(() -> isFault(a)) ? 1 : 0);
    entries.selecting("IFNA", "RR", a -> a.value(0).equals(Fault.NA.value()) ? 1 : 0);
    entries.selecting("IFS", "VR++", LogicFunctions::firstTrue);
    entries.selecting("SWITCH", "VVR++", LogicFunctions::matching);
    entries.selecting("CHOOSE", "VR+", LogicFunctions::numbered);
  }

  private static boolean isFault(Arguments a) {
    return a.value(0) instanceof Value.Fault;
  }

  private static boolean fails(BooleanSupplier check) {
    try {
      return check.getAsBoolean();
    } catch (FaultException e) {
      return true;
    }
  }

  private static int choose(Arguments a) {
    if (a.logical(0)) {
      return 1;
    }
    return a.count() > 2 ? 2 : Function.Selector.FALSE;
  }

  private static int firstTrue(Arguments a) {
    for (int i = 0; i + 1 < a.count(); i += 2) {
      if (a.logical(i)) {
        return i + 1;
      }
    }
    return Function.Selector.NONE;
  }

  private static int matching(Arguments a) {
    Value sought = Coerce.sound(a.value(0));
    int i = 1;
    for (; i + 1 < a.count(); i += 2) {
      if (Order.equal(sought, Coerce.sound(a.value(i)))) {
        return i + 1;
      }
    }
    return i < a.count() ? i : Function.Selector.NONE;
  }

  private static int numbered(Arguments a) {
    int index = a.integer(0);
    if (index < 1 || index >= a.count()) {
      throw Fault.VALUE.exception();
    }
    return index;
  }

  private static final class Count {
    int trues;
    int all;

    void add(boolean value) {
      all++;
      trues += value ? 1 : 0;
    }

    boolean allTrue() {
      return trues == all;
    }
  }

  private static Count count(Arguments a) {
    Count count = new Count();
    for (int i = 0; i < a.count(); i++) {
      if (a.isRange(i)) {
        countRange(a.grid(i), count);
      } else if (!a.missing(i)) {
        count.add(a.logical(i));
      }
    }
    if (count.all == 0) {
      throw Fault.VALUE.exception();
    }
    return count;
  }

  private static void countRange(Grid grid, Count count) {
    for (int r = 0; r < grid.usedRows(); r++) {
      for (int c = 0; c < grid.usedColumns(); c++) {
        Value value = Coerce.sound(grid.at(r, c));
        if (value instanceof Value.Num || value instanceof Value.Logical) {
          count.add(Coerce.logical(value));
        }
      }
    }
  }
}
