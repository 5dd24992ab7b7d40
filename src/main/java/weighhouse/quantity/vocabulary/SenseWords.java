package weighhouse.quantity.vocabulary;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import weighhouse.quantity.Kind;

/** Reads the kinds that a text speaks for. */
final class SenseWords {
  private static final Set<Kind> GENERAL =
      EnumSet.of(
          Kind.RELATIVE_EFFECT,
          Kind.RELATIVE_REDUCTION,
          Kind.HAZARD_REDUCTION,
          Kind.RISK_REDUCTION);

  private static final Set<Kind> SPECIFIC = EnumSet.range(Kind.HAZARD_RATIO, Kind.TIME_RATIO);

  private final Phrases<Sense> kinds = new Phrases<>();
  private final Phrases<Sense> parts = new Phrases<>();
  private final Phrases<String> complements = new Phrases<>();

  void kind(String phrase, Sense sense) {
    kinds.add(phrase, sense);
  }

  void part(String phrase, Sense sense) {
    parts.add(phrase, sense);
  }

  void complement(String word) {
    complements.add(word, word);
  }

  /** The senses, the most telling first; among equals the first of the text. */
  List<Sense> read(List<Token> words, boolean name, SpanWords.Timing timing) {
    List<Sense> senses = inOrder(words, name, timing);
    if (senses.isEmpty() && timing != null && timing.personTime()) {
      senses.add(new Sense(Kind.RATE, Strength.FAIR, 1));
    }
    senses.sort(Comparator.comparing(Sense::strength).reversed());
    specificFirst(senses);
    return senses;
  }

  /** "Relative effect (HR)", "reduction in rate, as hazard ratio": the ratio says what is meant. */
  private static void specificFirst(List<Sense> senses) {
    if (senses.size() > 1 && GENERAL.contains(senses.get(0).kind())) {
      senses.stream()
          .filter(sense -> SPECIFIC.contains(sense.kind()))
          .filter(sense -> sense.strength().atLeast(Strength.FAIR))
          .findFirst()
          .ifPresent(
              ratio -> {
                senses.remove(ratio);
                senses.add(0, ratio.as(senses.get(0).strength()));
              });
    }
  }

  private List<Sense> inOrder(List<Token> words, boolean name, SpanWords.Timing timing) {
    List<Sense> senses = new ArrayList<>();
    boolean complement = false;
    for (int i = 0; i < words.size(); ) {
      Phrases.Found<Sense> found = at(words, i, name);
      if (found == null) {
        complement |= complements.longest(words, i, true) != null;
        i++;
      } else {
        i += found.words();
        if (found.meaning().kind() != Kind.UNKNOWN) {
          Sense sense = timed(found.meaning(), timing);
          senses.add(complement && !senses.isEmpty() ? sense.as(sense.strength().less()) : sense);
        }
      }
    }
    return senses;
  }

  private Phrases.Found<Sense> at(List<Token> words, int i, boolean name) {
    Phrases.Found<Sense> found = kinds.longest(words, i, name);
    Phrases.Found<Sense> part = name && i == 0 ? parts.longest(words, 0, true) : null;
    boolean alone = words.size() == 1 && words.get(0).word().length() == 1;
    if (part == null || alone || (found != null && found.words() >= part.words())) {
      return found;
    }
    return part;
  }

  /** A length of time beside the word says whether a rate or a risk is meant. */
  private static Sense timed(Sense sense, SpanWords.Timing timing) {
    if (timing == null) {
      return sense;
    }
    boolean sure = sense.strength().atLeast(Strength.CLEAR);
    if (sense.kind() == Kind.RATE && timing.rated()) {
      return sense.as(
          timing.personTime() ? Strength.EXPLICIT : sure ? sense.strength() : Strength.CLEAR);
    } else if (sense.kind() == Kind.PROBABILITY && timing.personTime() && !sure) {
      return new Sense(Kind.RATE, Strength.CLEAR, sense.words());
    } else if (sense.kind() == Kind.PROBABILITY && sense.strength() == Strength.FAIR) {
      return sense.as(Strength.CLEAR);
    } else if (sense.kind() == Kind.PROBABILITY && !sure && !timing.rated()) {
      return sense.as(Strength.CLEAR);
    }
    return sense;
  }
}
