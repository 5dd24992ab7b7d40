package weighhouse.quantity.vocabulary;

import java.util.List;
import java.util.Set;

/** Reads which figure of an estimate a text names: lower limit, standard error, draw. */
final class FigureWords {
  private static final Set<String> ENDS = Set.of(")", "]", "%", "ci", "limit", "bound", "cl", "95");

  private final Phrases<Figure> sure = new Phrases<>();
  private final Phrases<Figure> bare = new Phrases<>();

  void sure(String phrase, Figure figure) {
    sure.add(phrase, figure);
  }

  void bare(String phrase, Figure figure) {
    bare.add(phrase, figure);
  }

  /** The figure that the words name, or null. A bare word counts only alone or at the end. */
  Figure read(List<Token> words, boolean name) {
    Figure found = null;
    for (int i = 0; i < words.size(); i++) {
      Phrases.Found<Figure> here = sure.longest(words, i, name);
      if (here != null && (found == null || !Figure.PARAMETER.equals(here.meaning()))) {
        found = here.meaning();
      }
    }
    return found != null ? found : readBare(words);
  }

  private Figure readBare(List<Token> words) {
    int end = words.size();
    while (end > 0 && ENDS.contains(words.get(end - 1).word())) {
      end--;
    }
    for (int i = Math.max(0, end - 3); i < end; i++) {
      Phrases.Found<Figure> here = bare.longest(words, i, true);
      if (here != null && i + here.words() == end && allowed(words, i, here)) {
        return here.meaning();
      }
    }
    return null;
  }

  /** One letter is a parameter's name only when it stands alone. */
  private static boolean allowed(List<Token> words, int at, Phrases.Found<Figure> found) {
    boolean letter = found.words() == 1 && words.get(at).word().length() == 1;
    return !letter || words.size() == 1;
  }
}
