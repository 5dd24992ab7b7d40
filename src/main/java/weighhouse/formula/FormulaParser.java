package weighhouse.formula;

import java.util.List;
import java.util.Locale;
import org.antlr.v4.runtime.BailErrorStrategy;
import org.antlr.v4.runtime.CommonTokenStream;
import org.antlr.v4.runtime.ListTokenSource;
import org.antlr.v4.runtime.RecognitionException;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.atn.PredictionMode;
import org.antlr.v4.runtime.misc.ParseCancellationException;

/** From a formula's text to its tree. Safe to call from several threads. */
public final class FormulaParser {
  /** What stands before a formula in files of Excel and of programs that keep another's prefix. */
  private static final List<String> STARTS = List.of("of:=", "oooc:=", "msoxl:=", "=");

  private FormulaParser() {}

  /**
   * Parses a formula as it stands in a cell.
   *
   * @param text with or without the equals sign
   * @param hostRow zero-based row of the cell that the text is written for
   * @param hostColumn zero-based column of that cell
   * @return the tree with references relative to the host, and the place of every node
   * @throws FormulaSyntaxException where the text is no formula, or nests deeper than 256 levels
   */
  public static ParsedFormula parse(String text, int hostRow, int hostColumn)
      throws FormulaSyntaxException {
    String formula = withoutStart(text);
    List<Token> tokens = TokenReader.read(formula);
    ExcelFormulaParser.FormulaContext context;
    try {
      context = parse(tokens, formula, PredictionMode.SLL);
    } catch (ParseCancellationException quickTryFailed) {
      context = parseFully(tokens, formula);
    }
    TreeBuilder builder = new TreeBuilder(hostRow, hostColumn);
    Expr tree = builder.formula(context);
    return new ParsedFormula(formula, tree, builder.spans());
  }

  private static String withoutStart(String text) {
    for (String start : STARTS) {
      if (text.regionMatches(true, 0, start, 0, start.length())) {
        return text.substring(start.length());
      }
    }
    return text;
  }

  private static ExcelFormulaParser.FormulaContext parseFully(List<Token> tokens, String formula)
      throws FormulaSyntaxException {
    try {
      return parse(tokens, formula, PredictionMode.LL);
    } catch (ParseCancellationException e) {
      Token offending =
          e.getCause() instanceof RecognitionException cause ? cause.getOffendingToken() : null;
      throw syntaxError(offending, formula);
    }
  }

  private static ExcelFormulaParser.FormulaContext parse(
      List<Token> tokens, String formula, PredictionMode mode) {
    ExcelFormulaParser parser =
        new ExcelFormulaParser(new CommonTokenStream(new ListTokenSource(tokens, formula)));
    parser.removeErrorListeners();
    parser.setErrorHandler(new BailErrorStrategy());
    parser.getInterpreter().setPredictionMode(mode);
    return parser.formula();
  }

  private static FormulaSyntaxException syntaxError(Token token, String formula) {
    if (token == null || token.getType() == Token.EOF) {
      String message = formula.isBlank() ? "empty formula" : "the formula ends too early";
      return new FormulaSyntaxException(message, formula.length());
    }
    String text = token.getText();
    String message =
        switch (text) {
          case "\"" -> "text without its closing quote";
          case "'" -> "sheet name without its closing quote";
          case "[" -> "bracket that is not closed";
          default -> String.format(Locale.ROOT, "unexpected %s", shown(text));
        };
    return new FormulaSyntaxException(message, token.getStartIndex());
  }

  private static String shown(String text) {
    return text.isBlank() ? "white space" : "'" + text + "'";
  }
}
