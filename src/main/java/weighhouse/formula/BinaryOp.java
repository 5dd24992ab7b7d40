package weighhouse.formula;

/** Operators on two operands with Excel's binding strength: a larger number binds tighter. */
public enum BinaryOp {
  EQUAL("=", 1),
  NOT_EQUAL("<>", 1),
  LESS("<", 1),
  LESS_OR_EQUAL("<=", 1),
  GREATER(">", 1),
  GREATER_OR_EQUAL(">=", 1),
  CONCATENATE("&", 2),
  ADD("+", 3),
  SUBTRACT("-", 3),
  MULTIPLY("*", 4),
  DIVIDE("/", 4),
  POWER("^", 5),
  /** The reference operators: union, intersection, and a range between computed ends. */
  UNION(",", 8),
  INTERSECTION(" ", 9),
  RANGE(":", 10);

  private final String symbol;
  private final int binding;

  BinaryOp(String symbol, int binding) {
    this.symbol = symbol;
    this.binding = binding;
  }

  public String symbol() {
    return symbol;
  }

  public int binding() {
    return binding;
  }

  static BinaryOp of(String symbol) {
    for (BinaryOp op : values()) {
      if (op.symbol.equals(symbol)) {
        return op;
      }
    }
    throw new IllegalArgumentException(symbol);
  }
}
