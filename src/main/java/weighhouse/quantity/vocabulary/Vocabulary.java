package weighhouse.quantity.vocabulary;

import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Span;
import weighhouse.quantity.TimeUnit;

/**
 * The words that models label their numbers with. Reads each text once; safe for several threads
 * once it is loaded.
 */
public final class Vocabulary {
  /** Texts kept; more than the distinct labels of any but the largest workbooks. */
  private static final int MEMORY = 50_000;

  /** Kinds of which a unit of time in the label is the unit. */
  private static final Set<Kind> LENGTHS =
      EnumSet.of(Kind.CYCLE_LENGTH, Kind.TIME, Kind.SURVIVAL_TIME);

  final SenseWords senses = new SenseWords();
  final FigureWords figures = new FigureWords();
  final SpanWords spans = new SpanWords();
  final Phrases<String> comparisons = new Phrases<>();
  final FieldWords field = new FieldWords();
  private final Map<String, Reading> read = new ConcurrentHashMap<>();

  Vocabulary() {}

  /** What a label, a heading or a name says of the numbers that it labels. */
  public Reading read(String text) {
    Reading known = read.get(text);
    if (known == null) {
      known = readAnew(text.strip());
      if (read.size() < MEMORY) {
        read.put(text, known);
      }
    }
    return known;
  }

  private Reading readAnew(String text) {
    boolean name = Words.isNameLike(text);
    List<Token> words = Words.of(text);
    if (words.isEmpty()) {
      return Reading.NOTHING;
    }
    SpanWords.Timing timing = spans.read(words);
    List<Sense> kinds = List.copyOf(senses.read(words, name, timing));
    boolean measuresTime = !kinds.isEmpty() && LENGTHS.contains(kinds.get(0).kind());
    Span bare = measuresTime && timing == null ? spans.bareUnit(words) : null;
    Span span = timing == null ? bare : timing.span();
    Reading reading = new Reading(kinds, span, figures.read(words, name));
    return reading.tells() ? reading : Reading.NOTHING;
  }

  /** Whether a text names a unit of time at all. */
  public boolean speaksOf(TimeUnit unit, String text) {
    return spans.names(unit, Words.of(text));
  }

  /** Whether a text says that it compares two arms. */
  public boolean isIncremental(String text) {
    List<Token> words = Words.of(text);
    for (int i = 0; i < words.size(); i++) {
      if (comparisons.longest(words, i, true) != null) {
        return true;
      }
    }
    return false;
  }

  /** Signs of the field that a workbook is from. */
  public FieldWords field() {
    return field;
  }
}
