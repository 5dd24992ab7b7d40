package weighhouse.rules.file;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.snakeyaml.engine.v2.nodes.Node;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.quantity.Span;

/**
 * Cells of examples: {@code probability per month 0.02}, {@code hazard ratio upper limit 0.9},
 * {@code probability =B2/12}, {@code =1-B3}, {@code 12}, {@code 'text}. Several numbers fill a
 * range.
 */
final class ExampleCells {
  private static final Pattern FORM =
      Pattern.compile(
          "(?<kind>cycles per year|[a-z][a-z ]*?)?(?: per (?<span>(?:[0-9.]+ )?[a-z-]+))?"
              + "(?: (?<role>lower limit|upper limit|draw))?"
              + " ?(?<content>=.*|'.*|-?[0-9][-+0-9.eE ]*)?");

  private final Faults faults;

  ExampleCells(Faults faults) {
    this.faults = faults;
  }

  Example.Cell read(String text, Node at) {
    Matcher matcher = FORM.matcher(text.strip());
    if (!matcher.matches()) {
      faults.add(at, "'" + text + "' is no cell: write a kind, a span, and a number or formula");
      return new Example.Cell(null, List.of());
    }
    String content = matcher.group("content");
    return new Example.Cell(quantity(matcher, at), content == null ? List.of() : split(content));
  }

  private static List<String> split(String content) {
    boolean numbers = !content.startsWith("=") && !content.startsWith("'");
    return numbers ? List.of(content.strip().split(" +")) : List.of(content);
  }

  private Quantity quantity(Matcher matcher, Node at) {
    String kind = matcher.group("kind");
    if (kind == null) {
      return null;
    }
    Optional<Kind> known = Kinds.of(kind);
    if (known.isEmpty()) {
      faults.add(at, "unknown kind of quantity '" + kind + "'");
      return null;
    }
    return new Quantity(known.get(), role(matcher.group("role")), span(matcher, at));
  }

  private static Role role(String text) {
    return text == null
        ? Role.ESTIMATE
        : Role.valueOf(text.toUpperCase(Locale.ROOT).replace(' ', '_'));
  }

  private Span span(Matcher matcher, Node at) {
    String text = matcher.group("span");
    if (text == null) {
      return null;
    }
    Optional<Span> span = SpanText.of(text);
    if (span.isEmpty()) {
      faults.add(at, "'" + text + "' is no length of time");
    }
    return span.orElse(null);
  }
}
