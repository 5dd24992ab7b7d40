package weighhouse.quantity.vocabulary;

import java.text.Normalizer;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Takes texts and names apart into words. */
final class Words {
  /** Longer texts are prose; what they say at the end labels no number. */
  private static final int LONGEST = 300;

  private static final int LONGEST_NAME = 40;
  private static final Pattern ACCENTS = Pattern.compile("\\p{M}+");
  private static final Pattern THOUSANDS = Pattern.compile("(?<=\\d),(?=\\d{3}(?!\\d))");
  private static final Pattern TOKEN =
      Pattern.compile("\\d+(?:[.,]\\d+)?|\\p{L}+|[%/()\\[\\]=<>:,;+\\u2192]");
  private static final Pattern JOINTS =
      Pattern.compile("(?<=[a-z])(?=[A-Z])|(?<=[A-Z])(?=[A-Z][a-z]{2})");

  /** Abbreviations are shorter. */
  private static final Pattern LONG_WORD = Pattern.compile("\\p{L}{6}");

  private static final Pattern INITIALS = Pattern.compile("\\b(\\p{L})\\.(\\p{L})\\.(?!\\p{L})");

  private Words() {}

  /** Whether a text is written like a defined name: one word without spaces. */
  static boolean isNameLike(String text) {
    return text.length() <= LONGEST_NAME && text.indexOf(' ') < 0 && !text.isEmpty();
  }

  static List<Token> of(String text) {
    String shown = text.length() > LONGEST ? text.substring(0, LONGEST) : text;
    String plain = Normalizer.normalize(shown, Normalizer.Form.NFD);
    plain = ACCENTS.matcher(plain.replace('\u2032', '\'')).replaceAll("");
    plain = THOUSANDS.matcher(plain).replaceAll("");
    plain = INITIALS.matcher(plain).replaceAll("$1$2");
    plain = JOINTS.matcher(plain).replaceAll(" ");
    return tokens(plain);
  }

  private static List<Token> tokens(String plain) {
    boolean shouted = isShouted(plain);
    List<Token> tokens = new ArrayList<>();
    Matcher matcher = TOKEN.matcher(plain);
    while (matcher.find()) {
      String word = matcher.group();
      int last = tokens.size() - 1;
      if (word.equals("k") && last >= 0 && tokens.get(last).isNumber()) {
        tokens.set(last, new Token(tokens.get(last).word() + "000", false));
      } else {
        tokens.add(
            new Token(
                stem(word.replace(',', word.length() > 1 ? '.' : ',')),
                !shouted && isCapitals(word)));
      }
    }
    return tokens;
  }

  /** In a heading all in capitals, capitals tell nothing. */
  private static boolean isShouted(String text) {
    return text.equals(text.toUpperCase(Locale.ROOT)) && LONG_WORD.matcher(text).find();
  }

  private static boolean isCapitals(String word) {
    return word.equals(word.toUpperCase(Locale.ROOT)) && Character.isLetter(word.charAt(0));
  }

  /** Lower case without the s of most plurals. */
  static String stem(String word) {
    String lower = word.toLowerCase(Locale.ROOT);
    if (lower.length() <= 3
        || lower.endsWith("ss")
        || lower.endsWith("us")
        || lower.endsWith("is")) {
      return lower;
    } else if (lower.endsWith("ies")) {
      return lower.substring(0, lower.length() - 3) + "y";
    }
    return lower.endsWith("s") ? lower.substring(0, lower.length() - 1) : lower;
  }
}
