package weighhouse.quantity.vocabulary;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Signs that a workbook is, or is not, a health-economic model. */
public final class FieldWords {
  /**
   * A group of words that count once, because a workbook that holds one of them holds the others.
   *
   * @param sign for people
   * @param points weight; below 0 where it speaks against a model
   */
  public record Group(String sign, int points) {}

  private final Phrases<Group> phrases = new Phrases<>();

  void add(Group group, String phrase) {
    phrases.add(phrase, group);
  }

  /** Counts the different words of each group that occur in a text. */
  public void count(String text, Map<Group, List<String>> seen) {
    List<Token> words = Words.of(text);
    for (int i = 0; i < words.size(); ) {
      Phrases.Found<Group> found = phrases.longest(words, i, false);
      if (found != null) {
        String phrase = phrase(words.subList(i, i + found.words()));
        List<String> phrases = seen.computeIfAbsent(found.meaning(), g -> new ArrayList<>());
        if (!phrases.contains(phrase)) {
          phrases.add(phrase);
        }
      }
      i += found == null ? 1 : found.words();
    }
  }

  private static String phrase(List<Token> words) {
    return String.join(" ", words.stream().map(Token::word).toList());
  }
}
