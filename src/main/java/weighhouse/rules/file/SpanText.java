package weighhouse.rules.file;

import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import weighhouse.quantity.Span;
import weighhouse.quantity.TimeUnit;

/**
 * Lengths of time as rule files write them: {@code month}, {@code 2 years}, {@code 1000
 * person-years}.
 */
final class SpanText {
  private static final Pattern FORM = Pattern.compile("(?:([0-9.]+) )?(person-)?([a-z]+?)s?");

  private SpanText() {}

  static Optional<Span> of(String text) {
    Matcher matcher = FORM.matcher(text.strip());
    if (!matcher.matches()) {
      return Optional.empty();
    }
    double number = matcher.group(1) == null ? 1 : Double.parseDouble(matcher.group(1));
    boolean people = matcher.group(2) != null;
    return unit(matcher.group(3))
        .map(unit -> new Span(people ? 1 : number, unit, people ? number : 1));
  }

  private static Optional<TimeUnit> unit(String name) {
    try {
      return Optional.of(TimeUnit.valueOf(name.toUpperCase(Locale.ROOT)));
    } catch (IllegalArgumentException unknown) {
      return Optional.empty();
    }
  }
}
