package weighhouse.quantity.vocabulary;

import weighhouse.quantity.Role;

/**
 * Which figure a text names.
 *
 * @param role the figure of an estimate; null for the parameters of a distribution, which are
 *     figures of no estimate
 */
public record Figure(Role role) {
  static final Figure PARAMETER = new Figure(null);

  public boolean isParameter() {
    return role == null;
  }
}
