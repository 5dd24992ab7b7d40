package weighhouse.rules.term;

/** What a term does with its parts. */
public enum Operation {
  NUMBER,
  /** A cell, a name, a text. */
  SYMBOL,
  SUM,
  PRODUCT,
  POWER,
  EXP,
  LN,
  ABS,
  MIN,
  MAX,
  /** The first part chooses one of the others, as in IF and CHOOSE. */
  SELECT,
  /** A function that is not looked into; the symbol is its name. */
  OPAQUE
}
