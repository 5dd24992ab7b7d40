package weighhouse.recalculate.functions;

import java.util.Locale;
import java.util.function.UnaryOperator;
import weighhouse.recalculate.Value;

/** Text taken apart and put together. */
final class TextFunctions {
  /** Characters that a cell can hold. */
  private static final int MOST = 32767;

  private TextFunctions() {}

  static void enter(Entries entries) {
    text(entries, "UPPER", s -> s.toUpperCase(Locale.ROOT));
    text(entries, "LOWER", s -> s.toLowerCase(Locale.ROOT));
    text(entries, "TRIM", s -> s.replaceAll(" +", " ").replaceAll("^ | $", ""));
    text(entries, "CLEAN", s -> s.replaceAll("[\\x00-\\x1f]", ""));
    text(entries, "PROPER", TextFunctions::proper);
    entries.general("LEN", "V", a -> Coerce.of(a.text(0).length()));
    entries.general("EXACT", "VV", a -> new Value.Logical(a.text(0).equals(a.text(1))));
    entries.general("REPT", "VV", a -> repeat(a.text(0), a.integer(1)));
    entries.general("VALUE", "V", a -> Coerce.of(a.number(0)));
    entries.general("NUMBERVALUE", "Vvv", TextFunctions::numberValue);
    entries.general("CHAR", "V", a -> character(a.integer(0), 255));
    entries.general("UNICHAR", "V", a -> character(a.integer(0), Character.MAX_CODE_POINT));
    entries.general("CODE", "V", a -> code(a.text(0)));
    entries.alias("CODE", "UNICODE");
    entries.general("TEXT", "VV", a -> NumberFormat.text(a.value(0), a.text(1)));
    entries.general("FIXED", "Vvv", TextFunctions::fixed);
    parts(entries);
    joins(entries);
  }

  private static void text(Entries entries, String name, UnaryOperator<String> operator) {
    entries.general(name, "V", a -> new Value.Text(operator.apply(a.text(0))));
  }

  private static void parts(Entries entries) {
    entries.general("LEFT", "Vv", a -> part(a.text(0), 0, a.integer(1, 1)));
    entries.general(
        "RIGHT", "Vv", a -> part(a.text(0), a.text(0).length() - a.integer(1, 1), a.integer(1, 1)));
    entries.general("MID", "VVV", a -> middle(a.text(0), a.integer(1), a.integer(2)));
    entries.general("FIND", "VVv", a -> find(a.text(0), a.text(1), a.integer(2, 1)));
    entries.general("SEARCH", "VVv", a -> search(a.text(0), a.text(1), a.integer(2, 1)));
    entries.general("SUBSTITUTE", "VVVv", TextFunctions::substitute);
    entries.general("REPLACE", "VVVV", TextFunctions::replace);
  }

  private static void joins(Entries entries) {
    entries.general("CONCATENATE", "V+", a -> limited(join(a, 0, "", false)));
    entries.general("CONCAT", "A+", a -> limited(join(a, 0, "", false)));
    entries.general("TEXTJOIN", "VVA+", a -> limited(join(a, 2, a.text(0), a.logical(1, true))));
  }

  private static Value limited(String text) {
    return text.length() > MOST ? Fault.VALUE.value() : new Value.Text(text);
  }

  private static String proper(String text) {
    StringBuilder proper = new StringBuilder(text.toLowerCase(Locale.ROOT));
    for (int i = 0; i < proper.length(); i++) {
      if (i == 0 || !Character.isLetter(proper.charAt(i - 1))) {
        proper.setCharAt(i, Character.toUpperCase(proper.charAt(i)));
      }
    }
    return proper.toString();
  }

  private static Value repeat(String text, int times) {
    if (times < 0 || (long) times * text.length() > MOST) {
      throw Fault.VALUE.exception();
    }
    return new Value.Text(text.repeat(times));
  }

  private static Value numberValue(Arguments a) {
    String decimal = a.missing(1) ? "." : a.text(1).substring(0, 1);
    String group = a.missing(2) ? "," : a.text(2).substring(0, 1);
    String plain = a.text(0).replace(" ", "").replace(group, "").replace(decimal, ".");
    return Coerce.of(plain.isEmpty() ? 0 : Coerce.number(new Value.Text(plain)));
  }

  private static Value character(int code, int last) {
    if (code < 1 || code > last) {
      throw Fault.VALUE.exception();
    }
    return new Value.Text(Character.toString(code));
  }

  private static Value code(String text) {
    return text.isEmpty() ? Fault.VALUE.value() : Coerce.of(text.codePointAt(0));
  }

  private static Value fixed(Arguments a) {
    int digits = a.integer(1, 2);
    String decimals = digits > 0 ? "." + "0".repeat(digits) : "";
    String format = (a.logical(2, false) ? "0" : "#,##0") + decimals;
    double rounded = RoundingFunctions.round(a.number(0), digits, java.math.RoundingMode.HALF_UP);
    return NumberFormat.text(new Value.Num(rounded), format);
  }

  private static Value part(String text, int from, int length) {
    if (length < 0) {
      throw Fault.VALUE.exception();
    }
    int start = Math.min(text.length(), Math.max(0, from));
    int end = (int) Math.min(text.length(), (long) Math.max(0, from) + length);
    return new Value.Text(text.substring(start, end));
  }

  private static Value middle(String text, int start, int length) {
    if (start < 1) {
      throw Fault.VALUE.exception();
    }
    return part(text, start - 1, length);
  }

  private static Value find(String sought, String text, int start) {
    int at = start < 1 || start > text.length() + 1 ? -1 : text.indexOf(sought, start - 1);
    return at < 0 ? Fault.VALUE.value() : Coerce.of(at + 1.0);
  }

  private static Value search(String sought, String text, int start) {
    java.util.regex.Matcher matcher = Wildcard.pattern(sought).matcher(text);
    boolean found = start >= 1 && start <= text.length() + 1 && matcher.find(start - 1);
    return found ? Coerce.of(matcher.start() + 1.0) : Fault.VALUE.value();
  }

  private static Value substitute(Arguments a) {
    String text = a.text(0);
    String old = a.text(1);
    String with = a.text(2);
    if (old.isEmpty() || a.missing(3)) {
      return limited(old.isEmpty() ? text : text.replace(old, with));
    }
    int at = -1;
    for (int occurrence = a.integer(3); occurrence > 0; occurrence--) {
      at = text.indexOf(old, at + 1);
      if (at < 0) {
        return new Value.Text(text);
      }
    }
    return limited(text.substring(0, at) + with + text.substring(at + old.length()));
  }

  private static Value replace(Arguments a) {
    String text = a.text(0);
    int start = a.integer(1) - 1;
    int length = a.integer(2);
    if (start < 0 || length < 0) {
      throw Fault.VALUE.exception();
    }
    int from = Math.min(start, text.length());
    int to = (int) Math.min(text.length(), (long) from + length);
    return limited(text.substring(0, from) + a.text(3) + text.substring(to));
  }

  private static String join(Arguments a, int from, String separator, boolean skipEmpty) {
    java.util.StringJoiner joiner = new java.util.StringJoiner(separator);
    for (int i = from; i < a.count(); i++) {
      Grid grid = a.grid(i);
      for (int k = 0; k < grid.size(); k++) {
        String text = Coerce.text(grid.at(k));
        if (!skipEmpty || !text.isEmpty()) {
          joiner.add(text);
        }
      }
    }
    return joiner.toString();
  }
}
