package weighhouse.quantity.vocabulary;

/**
 * A word, number or sign of a text.
 *
 * @param word lower case, without accents and plural ending
 * @param capitals whether it was written in capitals where not everything is
 */
record Token(String word, boolean capitals) {
  boolean isNumber() {
    return Character.isDigit(word.charAt(0));
  }

  double number() {
    return Double.parseDouble(word);
  }

  boolean isWord() {
    return Character.isLetter(word.charAt(0));
  }
}
