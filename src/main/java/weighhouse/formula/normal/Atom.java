package weighhouse.formula.normal;

import java.util.List;
import java.util.stream.Collectors;
import weighhouse.formula.Expr;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * What the algebra does not look into: the base of a factor. Ordered and compared by {@link #key}.
 */
public sealed interface Atom extends Comparable<Atom> {

  /** A text that is the same for equal atoms only. */
  String key();

  @Override
  default int compareTo(Atom other) {
    return key().compareTo(other.key());
  }

  /** The base of natural logarithms: {@code EXP(x)} is this to the power x. */
  record Euler() implements Atom {
    @Override
    public String key() {
      return "~e";
    }
  }

  /** A number as base of a symbolic power, {@code 2^x}. */
  record Constant(Coefficient value) implements Atom {
    @Override
    public String key() {
      return "#" + value;
    }
  }

  record Cell(CellAddress address) implements Atom {
    @Override
    public String key() {
      return "c" + address.sheet() + "." + address.row() + "." + address.column();
    }
  }

  record Area(CellRange range) implements Atom {
    @Override
    public String key() {
      return "a" + range.first() + range.last();
    }
  }

  /** A name that stands for no cell and no formula: a pattern's variable, or unknown. */
  record Name(String name) implements Atom {
    @Override
    public String key() {
      return "n" + name;
    }
  }

  /** A sum that stays together as one factor. */
  record Sum(Poly sum) implements Atom {
    @Override
    public String key() {
      return "(" + sum.key() + ")";
    }
  }

  /** A function or comparison that is no arithmetic, with its arguments in normal form. */
  record Function(String name, List<Poly> arguments) implements Atom {
    public Function {
      arguments = List.copyOf(arguments);
    }

    @Override
    public String key() {
      return arguments.stream().map(Poly::key).collect(Collectors.joining(",", name + "(", ")"));
    }
  }

  /**
   * Text, errors, omitted arguments, arrays, and references that resolve to no cell.
   *
   * @param node the part of the formula
   * @param host the cell it is relative to; null for literals
   */
  record Other(Expr node, CellAddress host) implements Atom {
    @Override
    public String key() {
      return "o" + node + (host == null ? "" : "@" + host);
    }
  }
}
