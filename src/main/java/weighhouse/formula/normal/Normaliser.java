package weighhouse.formula.normal;

import java.util.Locale;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.formula.ReferenceResolver;
import weighhouse.workbook.CellAddress;

/** From trees to normal forms at one level. Immutable; may be shared between threads. */
public final class Normaliser {
  private final ReferenceResolver references;
  private final Level level;
  private final Transparency transparency;
  private final Helpers helpers;

  /**
   * @param references what references mean; null takes every name for a variable, as in patterns
   * @param level how far to take formulas apart
   * @param transparency which calls to see past
   * @param helpers which cells to look through
   */
  public Normaliser(
      ReferenceResolver references, Level level, Transparency transparency, Helpers helpers) {
    this.references = references;
    this.level = level;
    this.transparency = transparency;
    this.helpers = helpers;
  }

  /** For formulas whose names are variables; they become {@link Atom.Name} in upper case. */
  public static Normaliser ofPatterns(Level level) {
    return new Normaliser(null, level, Transparency.NONE, Helpers.NONE);
  }

  public Level level() {
    return level;
  }

  /** The normal form of a formula that takes one value of each range it names. */
  public NormalForm normalise(Expr tree, CellAddress host) {
    return normalise(tree, host, false);
  }

  /**
   * The normal form of a formula or a part of one.
   *
   * @param tree relative to {@code host}
   * @param array whether it works on whole arrays instead of intersecting
   */
  public NormalForm normalise(Expr tree, CellAddress host, boolean array) {
    Origins origins = new Origins();
    Conversion conversion = new Conversion(this, origins);
    Arithmetic by = new Arithmetic(level);
    Poly poly = by.finish(conversion.convert(tree, new Scope(host, Map.of(), array, 0)));
    return new NormalForm(poly, level, host, origins);
  }

  ReferenceResolver references() {
    return references;
  }

  Transparency transparency() {
    return transparency;
  }

  Helpers helpers() {
    return helpers;
  }

  /**
   * Where a part of a formula stands.
   *
   * @param host the cell it is relative to
   * @param variables what LET has named so far
   * @param array whether operators work on whole arrays
   * @param depth levels above it
   */
  record Scope(CellAddress host, Map<String, Poly> variables, boolean array, int depth) {
    Scope deeper() {
      return new Scope(host, variables, array, depth + 1);
    }

    Scope on(CellAddress other) {
      return new Scope(other, Map.of(), array, depth + 1);
    }

    Scope onArrays() {
      return new Scope(host, variables, true, depth);
    }

    Scope with(Map<String, Poly> more) {
      return new Scope(host, more, array, depth);
    }

    Poly variable(String name) {
      return variables.get(name.toUpperCase(Locale.ROOT));
    }
  }
}
