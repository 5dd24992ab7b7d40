package weighhouse.recalculate.functions;

import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import java.util.regex.Pattern;
import weighhouse.recalculate.Value;

/**
 * The number formats that TEXT knows: General, digits, groups, percent, exponents, dates, times.
 */
final class NumberFormat {
  private static final DecimalFormatSymbols SYMBOLS = DecimalFormatSymbols.getInstance(Locale.ROOT);
  private static final double SECONDS = 86400;

  private NumberFormat() {}

  static Value text(Value value, String format) {
    if (value instanceof Value.Text || value instanceof Value.Logical) {
      return new Value.Text(Coerce.text(value));
    }
    return new Value.Text(shown(Coerce.number(value), format));
  }

  private static String shown(double number, String format) {
    if (format.isEmpty()) {
      return "";
    }
    List<String> sections = List.of(format.split(";", -1));
    if (number < 0 && sections.size() > 1) {
      return section(-number, sections.get(1));
    }
    return section(number, number == 0 && sections.size() > 2 ? sections.get(2) : sections.get(0));
  }

  private static String section(double number, String format) {
    String bare = format.replaceAll("\\[[^\\]]*\\]|_.|\\*.", "").replaceAll("\"[^\"]*\"|\\\\.", "");
    if (bare.equalsIgnoreCase("general")) {
      return NumberText.general(number);
    }
    if (bare.matches("(?i).*[ymdhs].*")) {
      return date(number, format);
    }
    return digits(number, format);
  }

  private static String digits(double number, String format) {
    String pattern =
        format
            .replaceAll("\\[[^\\]]*\\]|_.|\\*.", "")
            .replaceAll("\"([^\"]*)\"", "'$1'")
            .replaceAll("\\\\(.)", "'$1'")
            .replace('?', '#')
            .replaceAll("(?i)E\\+?", "E");
    boolean signedExponent = format.matches("(?i).*E\\+.*");
    try {
      DecimalFormat formatter = new DecimalFormat(pattern, SYMBOLS);
      formatter.setRoundingMode(java.math.RoundingMode.HALF_UP);
      String text = formatter.format(new java.math.BigDecimal(NumberText.general(number)));
      return signedExponent ? text.replaceFirst("E(?=\\d)", "E+") : text;
    } catch (IllegalArgumentException e) {
      throw Fault.VALUE.exception();
    }
  }

  /** Between one kind of letters and the next. */
  private static final Pattern TOKENS =
      Pattern.compile("(?i)(?<=([ymdhs]))(?!\\1)|(?<![ymdhs])(?=[ymdhs])");

  private static String date(double number, String format) {
    long seconds = Math.round((number - Math.floor(number)) * SECONDS);
    LocalDateTime time = Dates.date(number, false).atStartOfDay().plusSeconds(seconds);
    boolean half = format.matches("(?i).*(am/pm|a/p).*");
    StringBuilder pattern = new StringBuilder();
    boolean afterHours = false;
    for (String token : TOKENS.splitAsStream(format).toList()) {
      boolean minutes = token.matches("(?i)m{1,2}") && afterHours;
      pattern.append(minutes ? token.toLowerCase(Locale.ROOT) : pattern(token, half));
      afterHours = token.matches("(?i)h+.*") || (afterHours && !token.matches("(?i)[ymds]+"));
    }
    return DateTimeFormatter.ofPattern(pattern.toString(), Locale.ENGLISH).format(time);
  }

  private static String pattern(String token, boolean half) {
    String lower = token.toLowerCase(Locale.ROOT);
    return switch (lower.isEmpty() ? ' ' : lower.charAt(0)) {
      case 'y' -> lower.length() > 2 ? "yyyy" : "yy";
      case 'm' -> lower.length() == 5 ? "MMMMM" : lower.toUpperCase(Locale.ROOT);
      case 'd' -> lower.length() == 3 ? "EEE" : lower.length() > 3 ? "EEEE" : lower;
      case 'h' -> half ? lower : lower.toUpperCase(Locale.ROOT);
      case 's' -> lower;
      default ->
          lower.contains("am/pm") ? "a" : "'" + token.replace("\"", "").replace("'", "''") + "'";
    };
  }
}
