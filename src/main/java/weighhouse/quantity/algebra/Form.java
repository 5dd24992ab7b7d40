package weighhouse.quantity.algebra;

/** In which form a term holds its quantity while a formula is read. */
public enum Form {
  PLAIN,
  /** Minus the quantity. */
  NEGATIVE,
  /** One minus the quantity: {@code 1-p}. */
  COMPLEMENT,
  /** One plus the quantity: {@code 1+r}. */
  ONE_PLUS,
  /** {@code EXP(-x)} of something unknown: survival or discounting. */
  DECAY
}
