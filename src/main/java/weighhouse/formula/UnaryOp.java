package weighhouse.formula;

/** Operators on one operand. */
public enum UnaryOp {
  PLUS("+", true),
  MINUS("-", true),
  /** Implicit intersection. */
  AT("@", true),
  PERCENT("%", false);

  private final String symbol;
  private final boolean prefix;

  UnaryOp(String symbol, boolean prefix) {
    this.symbol = symbol;
    this.prefix = prefix;
  }

  public String symbol() {
    return symbol;
  }

  public boolean prefix() {
    return prefix;
  }

  static UnaryOp of(String symbol) {
    for (UnaryOp op : values()) {
      if (op.symbol.equals(symbol)) {
        return op;
      }
    }
    throw new IllegalArgumentException(symbol);
  }
}
