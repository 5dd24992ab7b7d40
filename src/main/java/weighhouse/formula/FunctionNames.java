package weighhouse.formula;

import java.util.List;
import java.util.Locale;

/** Function names without what files put before them. */
final class FunctionNames {
  /** Marks of newer functions, add-ins and other programs' functions, and of LAMBDA parameters. */
  private static final List<String> PREFIXES =
      List.of(
          "_xlfn.",
          "_xlws.",
          "_xlpm.",
          "_xleta.",
          "_xludf.",
          "__xludf.",
          "_xll.",
          "_xlbgnm.",
          "com.microsoft.",
          "org.libreoffice.",
          "org.openoffice.");

  private FunctionNames() {}

  static String withoutPrefix(String name) {
    for (String prefix : PREFIXES) {
      if (name.length() > prefix.length()
          && name.regionMatches(true, 0, prefix, 0, prefix.length())) {
        return withoutPrefix(name.substring(prefix.length()));
      }
    }
    return name;
  }

  /** The call; files write {@code @x} as a call of SINGLE and {@code A1#} as ANCHORARRAY. */
  static Expr call(String name, List<Expr> arguments) {
    String function = withoutPrefix(name).toUpperCase(Locale.ROOT);
    boolean prefixed = function.length() < name.length();
    if (prefixed && arguments.size() == 1) {
      Expr only = arguments.get(0);
      if (function.equals("SINGLE")) {
        return new Expr.Unary(UnaryOp.AT, Binding.grouped(only, Binding.PREFIX));
      } else if (function.equals("ANCHORARRAY")) {
        return new Expr.SpillRef(Binding.grouped(only, Binding.PRIMARY));
      }
    }
    return new Expr.Call(function, arguments);
  }
}
