package weighhouse.formula;

import java.util.ArrayList;
import java.util.List;

/** Structured references, {@code Table[[#This Row],[a]:[b]]}, as text and as tree. */
final class StructuredReference {
  private static final List<String> SPECIFIERS =
      List.of("#All", "#Data", "#Headers", "#Totals", "#This Row");
  private static final String THIS_ROW = "#This Row";

  private StructuredReference() {}

  /**
   * Reads a reference.
   *
   * @param qualifier sheet or workbook before the table's name, kept with the name
   * @param position where the text starts in its formula
   */
  static Expr.TableRef parse(String qualifier, String text, int position)
      throws FormulaSyntaxException {
    int open = text.indexOf('[');
    String table = qualifier + text.substring(0, open);
    String inside = text.substring(open + 1, text.length() - 1).strip();
    List<String> specifiers = new ArrayList<>();
    if (inside.startsWith("@")) {
      specifiers.add(THIS_ROW);
      inside = inside.substring(1).strip();
    }
    if (inside.startsWith("[")) {
      return new Groups(inside, position).read(table, specifiers);
    } else if (inside.startsWith("#")) {
      specifiers.add(canonical(inside));
      inside = "";
    }
    return new Expr.TableRef(table, specifiers, inside.isEmpty() ? null : unescaped(inside), null);
  }

  static String print(Expr.TableRef reference) {
    List<String> specifiers = reference.specifiers();
    String first = reference.firstColumn();
    if (specifiers.isEmpty() && reference.lastColumn() == null && (first == null || plain(first))) {
      return reference.table() + "[" + (first == null ? "" : first) + "]";
    } else if (specifiers.size() == 1 && first == null) {
      return reference.table() + "[" + specifiers.get(0) + "]";
    }
    StringBuilder text = new StringBuilder(reference.table()).append('[');
    specifiers.forEach(specifier -> text.append('[').append(specifier).append("],"));
    if (first == null) {
      text.setLength(text.length() - 1);
    } else {
      text.append('[').append(escaped(first)).append(']');
    }
    if (reference.lastColumn() != null) {
      text.append(":[").append(escaped(reference.lastColumn())).append(']');
    }
    return text.append(']').toString();
  }

  private static String canonical(String specifier) {
    return SPECIFIERS.stream()
        .filter(known -> known.equalsIgnoreCase(specifier))
        .findFirst()
        .orElse(specifier);
  }

  /** Whether a column's name needs no brackets of its own. */
  private static boolean plain(String column) {
    return column.chars().allMatch(c -> Character.isLetterOrDigit(c) || c == '_' || c == '.');
  }

  private static String unescaped(String column) {
    return column.replaceAll("'(.)", "$1");
  }

  private static String escaped(String column) {
    return column.replaceAll("(['#@\\[\\]])", "'$1");
  }

  /** The bracketed parts between the outer brackets. */
  private static final class Groups {
    private final String text;
    private final int position;
    private int at;

    Groups(String text, int position) {
      this.text = text;
      this.position = position;
    }

    Expr.TableRef read(String table, List<String> specifiers) throws FormulaSyntaxException {
      String first = null;
      String last = null;
      boolean range = false;
      while (at < text.length()) {
        String group = group();
        if (group.stripLeading().startsWith("#")) {
          specifiers.add(canonical(group.strip()));
        } else if (first == null) {
          first = unescaped(group);
        } else if (range) {
          last = unescaped(group);
        } else {
          throw wrong();
        }
        range = separator();
      }
      return new Expr.TableRef(table, specifiers, first, last);
    }

    private String group() throws FormulaSyntaxException {
      if (text.charAt(at) != '[') {
        throw wrong();
      }
      int start = ++at;
      while (text.charAt(at) != ']') {
        at += text.charAt(at) == '\'' ? 2 : 1;
      }
      return text.substring(start, at++);
    }

    /** Passes a comma or colon; true for a colon. */
    private boolean separator() throws FormulaSyntaxException {
      String rest = text.substring(at).stripLeading();
      at = text.length() - rest.length();
      if (rest.isEmpty()) {
        return false;
      }
      char mark = rest.charAt(0);
      boolean more = !rest.substring(1).isBlank();
      if ((mark != ',' && mark != ':') || !more) {
        throw wrong();
      }
      at = text.length() - rest.substring(1).stripLeading().length();
      return mark == ':';
    }

    private FormulaSyntaxException wrong() {
      return new FormulaSyntaxException("structured reference with misplaced brackets", position);
    }
  }
}
