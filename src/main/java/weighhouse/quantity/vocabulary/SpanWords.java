package weighhouse.quantity.vocabulary;

import java.util.List;
import weighhouse.quantity.Span;
import weighhouse.quantity.TimeUnit;

/** Reads lengths of time: "annual", "5-year", "per 1000 person-years", "over 28 days". */
final class SpanWords {
  /** Larger numbers before a unit count people or calendar years, not units of time. */
  private static final double MOST_UNITS = 399;

  private final Phrases<TimeUnit> units = new Phrases<>();
  private final Phrases<TimeUnit> adjectives = new Phrases<>();
  private final Phrases<String> per = new Phrases<>();
  private final Phrases<String> over = new Phrases<>();
  private final Phrases<String> people = new Phrases<>();

  /**
   * A length of time that a text names.
   *
   * @param span the length
   * @param rated whether it says that something happens at a pace: "annual", "per month"
   * @param personTime whether people are counted too, as only rates do
   */
  record Timing(Span span, boolean rated, boolean personTime) {}

  void unit(String word, TimeUnit unit) {
    units.add(word, unit);
  }

  void adjective(String word, TimeUnit unit) {
    adjectives.add(word, unit);
  }

  void glue(String group, String word) {
    switch (group) {
      case "per" -> per.add(word, word);
      case "over" -> over.add(word, word);
      default -> people.add(word, word);
    }
  }

  /** The unit that the words name without saying more: "cycle length (months)"; null if none. */
  Span bareUnit(List<Token> words) {
    for (int i = 0; i < words.size(); i++) {
      Phrases.Found<TimeUnit> found = units.longest(words, i, true);
      if (found != null && found.meaning() != TimeUnit.CYCLE) {
        return Span.of(1, found.meaning());
      }
    }
    return null;
  }

  boolean names(TimeUnit unit, List<Token> words) {
    for (int i = 0; i < words.size(); i++) {
      Phrases.Found<TimeUnit> found = units.longest(words, i, true);
      if (found != null && found.meaning() == unit) {
        return true;
      }
    }
    return false;
  }

  /**
   * The length of time that the words name, or null; the model's own cycle only as a last resort.
   */
  Timing read(List<Token> words) {
    Timing cycle = null;
    double people = denominator(words);
    for (int i = 0; i < words.size(); i++) {
      Timing timing = at(words, i, people);
      if (timing != null && timing.span().unit() != TimeUnit.CYCLE) {
        return timing;
      }
      cycle = cycle == null ? timing : cycle;
    }
    return cycle;
  }

  private Timing at(List<Token> words, int i, double denominator) {
    boolean personTime = denominator > 0;
    double people = personTime ? denominator : 1;
    Phrases.Found<TimeUnit> every = adjectives.longest(words, i, true);
    if (every != null) {
      return new Timing(new Span(1, every.meaning(), people), true, personTime);
    }
    Phrases.Found<TimeUnit> unit = units.longest(words, i, true);
    if (unit == null) {
      return null;
    }
    double amount = i > 0 && words.get(i - 1).isNumber() ? words.get(i - 1).number() : Double.NaN;
    boolean counted = amount > 0 && amount <= MOST_UNITS;
    int before = i - (counted ? 2 : 1);
    boolean rated = has(per, words, before) || personTime;
    if (counted || rated || has(over, words, before)) {
      double units = counted && !(personTime && amount >= 100) ? amount : 1;
      return new Timing(new Span(units, unit.meaning(), people), rated, personTime);
    }
    return null;
  }

  /**
   * How many people a rate is counted for: 1000 in "per 1000 person-years", 1 in "per patient", 0
   * where no people are counted.
   */
  private double denominator(List<Token> words) {
    for (int i = 0; i + 1 < words.size(); i++) {
      if (has(per, words, i)) {
        Token next = words.get(i + 1);
        if (next.isNumber() && isRound(next.number())) {
          return next.number();
        } else if (has(people, words, i + 1)) {
          return 1;
        }
      }
    }
    return 0;
  }

  private static boolean isRound(double number) {
    return number == 100 || (number >= 1000 && number % 1000 == 0);
  }

  private static boolean has(Phrases<String> phrases, List<Token> words, int at) {
    return at >= 0 && at < words.size() && phrases.longest(words, at, true) != null;
  }
}
