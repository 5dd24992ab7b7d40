package weighhouse.quantity;

/**
 * What a cell or expression means.
 *
 * @param kind what it is
 * @param role which figure of the estimate
 * @param span the time it speaks of, or null where unknown or without meaning
 */
public record Quantity(Kind kind, Role role, Span span) {
  public static final Quantity UNKNOWN = new Quantity(Kind.UNKNOWN, Role.ESTIMATE, null);

  public static Quantity of(Kind kind) {
    return new Quantity(kind, Role.ESTIMATE, null);
  }
}
