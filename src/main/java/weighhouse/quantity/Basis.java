package weighhouse.quantity;

/** What a quantity rests on, strongest first. */
public enum Basis {
  DECLARED,
  ALGEBRA,
  LABEL,
  RANGE,
  NONE
}
