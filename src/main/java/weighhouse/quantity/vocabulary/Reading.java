package weighhouse.quantity.vocabulary;

import java.util.List;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Span;

/**
 * What a text says of the numbers that it labels.
 *
 * @param senses kinds it speaks for, the most telling first
 * @param span length of time it names, or null
 * @param figure figure of an estimate it names, or null
 */
public record Reading(List<Sense> senses, Span span, Figure figure) {
  public static final Reading NOTHING = new Reading(List.of(), null, null);

  public Kind kind() {
    return senses.isEmpty() ? Kind.UNKNOWN : senses.get(0).kind();
  }

  /** Whether it says anything at all. */
  public boolean tells() {
    return !senses.isEmpty() || span != null || figure != null;
  }
}
