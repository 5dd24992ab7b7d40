package weighhouse.audit.brief;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.quantity.Span;
import weighhouse.quantity.TimeUnit;

/**
 * Quantities as a brief writes them: {@code hazard ratio}, {@code probability over 6 months},
 * {@code rate per 1000 person-years}, {@code hazard ratio, lower limit}.
 */
public final class QuantityText {
  private static final Pattern FORM =
      Pattern.compile(
          "(?<kind>[a-z ]+?)(?: (?:per|over) (?<span>[0-9a-z. -]+))?(?:, ?(?<role>[a-z ]+))?");
  private static final Pattern SPAN =
      Pattern.compile("(?<amount>[0-9]+(?:\\.[0-9]+)?)? ?(?<people>person-)?(?<unit>[a-z]+?)s?");

  private QuantityText() {}

  /**
   * Reads a quantity.
   *
   * @throws IllegalArgumentException with a message for the reviewer
   */
  public static Quantity parse(String text) {
    Matcher matcher = FORM.matcher(text.strip().toLowerCase(Locale.ROOT));
    if (!matcher.matches()) {
      throw new IllegalArgumentException("write it like 'probability over 6 months'");
    }
    Kind kind = named(Kind.class, matcher.group("kind"), "kind of quantity");
    String role = matcher.group("role");
    String span = matcher.group("span");
    return new Quantity(
        kind,
        role == null ? Role.ESTIMATE : named(Role.class, role, "figure of an estimate"),
        span == null ? null : span(span));
  }

  /** A length of time such as {@code 1 month} or {@code 1000 person-years}. */
  public static Span span(String text) {
    Matcher matcher = SPAN.matcher(text.strip().toLowerCase(Locale.ROOT));
    if (!matcher.matches()) {
      throw new IllegalArgumentException("'" + text + "' is no time: write it like '6 months'");
    }
    TimeUnit unit = named(TimeUnit.class, matcher.group("unit"), "unit of time");
    String amount = matcher.group("amount");
    double number = amount == null ? 1 : Double.parseDouble(amount);
    if (!(number > 0)) {
      throw new IllegalArgumentException("a time must be longer than nothing");
    }
    return matcher.group("people") == null ? Span.of(number, unit) : new Span(1, unit, number);
  }

  /** The text that {@link #parse} reads back. */
  public static String print(Quantity quantity) {
    String text = quantity.kind().text();
    if (quantity.span() != null) {
      text += (quantity.kind() == Kind.RATE ? " per " : " over ") + print(quantity.span());
    }
    return quantity.role() == Role.ESTIMATE ? text : text + ", " + name(quantity.role());
  }

  private static String print(Span span) {
    String unit = name(span.unit());
    if (span.people() != 1) {
      return number(span.people()) + " person-" + unit + "s";
    }
    return number(span.amount()) + " " + unit + (span.amount() == 1 ? "" : "s");
  }

  private static String number(double number) {
    return number == Math.rint(number) ? Long.toString((long) number) : Double.toString(number);
  }

  private static String name(Enum<?> constant) {
    return constant.name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }

  private static <E extends Enum<E>> E named(Class<E> type, String text, String what) {
    for (E constant : type.getEnumConstants()) {
      if (name(constant).equals(text.strip())) {
        return constant;
      }
    }
    throw new IllegalArgumentException("'" + text.strip() + "' is no " + what);
  }
}
