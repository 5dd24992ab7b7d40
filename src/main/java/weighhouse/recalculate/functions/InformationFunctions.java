package weighhouse.recalculate.functions;

import java.util.function.Predicate;
import weighhouse.recalculate.Value;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Sheet;

/** What kind of value something is. */
final class InformationFunctions {
  private InformationFunctions() {}

  static void enter(Entries entries) {
    is(entries, "ISNUMBER", v -> v instanceof Value.Num);
    is(entries, "ISTEXT", v -> v instanceof Value.Text);
    is(entries, "ISNONTEXT", v -> !(v instanceof Value.Text));
    is(entries, "ISLOGICAL", v -> v instanceof Value.Logical);
    is(entries, "ISBLANK", v -> v instanceof Value.Blank);
    is(entries, "ISERROR", v -> v instanceof Value.Fault);
    is(entries, "ISNA", v -> v.equals(Fault.NA.value()));
    is(entries, "ISERR", v -> v instanceof Value.Fault && !v.equals(Fault.NA.value()));
    entries.general("ISEVEN", "V", a -> new Value.Logical(Math.abs(a.integer(0)) % 2 == 0));
    entries.general("ISODD", "V", a -> new Value.Logical(Math.abs(a.integer(0)) % 2 == 1));
    entries.general("ISREF", "N", a -> new Value.Logical(a.reference(0) != null));
    entries.general("ISFORMULA", "N", a -> new Value.Logical(hasFormula(a)));
    entries.general("NA", "", a -> Fault.NA.value());
    entries.general("N", "V", a -> n(a.value(0)));
    entries.general("T", "V", a -> t(a.value(0)));
    entries.general("TYPE", "R", a -> Coerce.of(type(a)));
    entries.general("ERROR.TYPE", "V", a -> errorType(a.value(0)));
    entries.general("CELL", "Vr", InformationFunctions::cell);
    entries.general("SHEET", "n", a -> Coerce.of(1 + sheet(a)));
    entries.general("SHEETS", "", a -> Coerce.of(a.surroundings().workbook().sheets().size()));
  }

  private static void is(Entries entries, String name, Predicate<Value> test) {
    entries.general(name, "V", a -> new Value.Logical(test.test(a.value(0))));
  }

  private static Value n(Value value) {
    if (value instanceof Value.Fault) {
      return value;
    }
    return value instanceof Value.Text ? new Value.Num(0) : Coerce.of(value.number());
  }

  private static Value t(Value value) {
    return value instanceof Value.Text || value instanceof Value.Fault ? value : new Value.Text("");
  }

  private static int type(Arguments a) {
    Value value = a.grid(0).size() > 1 ? a.grid(0).toArray() : a.grid(0).at(0);
    if (value instanceof Value.Text) {
      return 2;
    } else if (value instanceof Value.Logical) {
      return 4;
    } else if (value instanceof Value.Fault) {
      return 16;
    }
    return value instanceof Value.Array ? 64 : 1;
  }

  private static Value errorType(Value value) {
    for (Fault fault : Fault.values()) {
      if (fault.value().equals(value)) {
        return Coerce.of(fault.number());
      }
    }
    return Fault.NA.value();
  }

  private static boolean hasFormula(Arguments a) {
    Reference reference = a.reference(0);
    if (reference == null) {
      throw Fault.VALUE.exception();
    }
    CellRange area = reference.area();
    Sheet sheet = a.surroundings().workbook().sheet(area.sheet());
    int index = sheet.cells().find(area.firstRow(), area.firstColumn());
    return index >= 0 && sheet.cells().hasFormula(index);
  }

  private static int sheet(Arguments a) {
    Reference reference = a.missing(0) ? null : a.reference(0);
    return reference == null ? a.surroundings().host().sheet() : reference.area().sheet();
  }

  private static Value cell(Arguments a) {
    Reference reference = a.missing(1) ? null : a.reference(1);
    CellRange area = reference == null ? CellRange.of(a.surroundings().host()) : reference.area();
    return switch (a.text(0).toLowerCase(java.util.Locale.ROOT)) {
      case "row" -> Coerce.of(area.firstRow() + 1.0);
      case "col" -> Coerce.of(area.firstColumn() + 1.0);
      case "address" ->
          new Value.Text(ReferenceFunctions.address(area.firstRow(), area.firstColumn()));
      case "contents" -> a.grid(1).at(0);
      case "type" -> {
        Value value = a.grid(1).at(0);
        yield new Value.Text(
            value instanceof Value.Blank ? "b" : value instanceof Value.Text ? "l" : "v");
      }
      default -> throw Fault.VALUE.exception();
    };
  }
}
