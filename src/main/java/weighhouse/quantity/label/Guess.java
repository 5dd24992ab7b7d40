package weighhouse.quantity.label;

import java.util.List;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.quantity.vocabulary.Strength;

/**
 * What the texts near a number make of it.
 *
 * @param quantity kind, role and span; kind UNKNOWN where no text tells
 * @param strength how far the deciding words decide
 * @param parameter whether the number is the parameter of a distribution, so no estimate at all
 * @param labels the texts that decided, the most telling first
 */
public record Guess(Quantity quantity, Strength strength, boolean parameter, List<Label> labels) {
  public static final Guess NONE = new Guess(Quantity.UNKNOWN, Strength.WEAK, false, List.of());

  public Kind kind() {
    return quantity.kind();
  }

  public Role role() {
    return quantity.role();
  }

  public boolean known() {
    return quantity.kind() != Kind.UNKNOWN;
  }

  /** Whether it is known by words of at least that strength. */
  public boolean known(Strength least) {
    return known() && strength.atLeast(least);
  }

  /** Whether only texts about a whole section, or a unit, tell. */
  public boolean remote() {
    return !labels.isEmpty() && labels.get(0).place().remoteness() > Place.COMMENT.remoteness();
  }

  public List<String> evidence() {
    return labels.stream().map(Label::sentence).toList();
  }
}
