package weighhouse.quantity.vocabulary;

import weighhouse.quantity.Kind;

/**
 * A kind that a text speaks for.
 *
 * @param kind what the number would be
 * @param strength how far the words decide
 * @param words how many words say so
 */
public record Sense(Kind kind, Strength strength, int words) {
  Sense as(Strength other) {
    return new Sense(kind, other, words);
  }
}
