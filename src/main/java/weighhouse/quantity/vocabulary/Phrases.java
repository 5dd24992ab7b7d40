package weighhouse.quantity.vocabulary;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Phrases with their meanings; finds the longest that starts at a word. */
final class Phrases<T> {
  /** Abbreviations are written in capitals of up to so many letters. */
  private static final int LONGEST_ABBREVIATION = 5;

  private final Step<T> root = new Step<>();

  /** A phrase found: its meaning and how many words it takes. */
  record Found<T>(T meaning, int words) {}

  private static final class Step<T> {
    private final Map<String, Step<T>> next = new HashMap<>();
    private final List<Ending<T>> endings = new ArrayList<>(1);
  }

  /** The words of the phrase that must stand in capitals, as bits, and what it means. */
  private record Ending<T>(int capitals, T meaning) {}

  void add(String phrase, T meaning) {
    Step<T> step = root;
    int capitals = 0;
    List<Token> words = Words.of(phrase);
    for (int i = 0; i < words.size(); i++) {
      Token word = words.get(i);
      if (word.capitals() && word.word().length() <= LONGEST_ABBREVIATION && word.isWord()) {
        capitals |= 1 << i;
      }
      step = step.next.computeIfAbsent(word.word(), w -> new Step<>());
    }
    step.endings.add(new Ending<>(capitals, meaning));
  }

  /**
   * The longest phrase that starts with the word at that place, or null.
   *
   * @param anyCase whether abbreviations count in small letters too, as in names
   */
  Found<T> longest(List<Token> words, int at, boolean anyCase) {
    Found<T> found = null;
    Step<T> step = root;
    int capitals = 0;
    for (int i = at; i < words.size(); i++) {
      step = step.next.get(words.get(i).word());
      if (step == null) {
        break;
      }
      capitals |= words.get(i).capitals() ? 1 << (i - at) : 0;
      for (Ending<T> ending : step.endings) {
        if (anyCase || (ending.capitals & ~capitals) == 0) {
          found = new Found<>(ending.meaning, i - at + 1);
        }
      }
    }
    return found;
  }
}
