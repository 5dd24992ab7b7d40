package weighhouse.workbook;

/** What a cell holds: a typed-in constant, or the stored result of its formula. */
public enum CellKind {
  /** Nothing stored (also a formula cell that was saved without a result). */
  BLANK,
  NUMBER,
  TEXT,
  BOOLEAN,
  ERROR
}
