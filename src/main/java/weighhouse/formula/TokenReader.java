package weighhouse.formula;

import static weighhouse.formula.ExcelFormulaParser.*;

import java.util.ArrayList;
import java.util.List;
import org.antlr.v4.runtime.CharStreams;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.WritableToken;

/** Cuts a formula into tokens, decides which white space means intersection, bounds the nesting. */
final class TokenReader {
  /** Excel allows 64 levels of calls; other programs write a few more parentheses. */
  static final int MAX_NESTING = 256;

  /** Excel holds 8,192 characters; a tree of that many terms is as deep as the stack bears. */
  static final int MAX_LENGTH = 16_384;

  private TokenReader() {}

  static List<Token> read(String text) throws FormulaSyntaxException {
    if (text.length() > MAX_LENGTH) {
      throw new FormulaSyntaxException(
          "formula of " + text.length() + " characters; the limit is " + MAX_LENGTH, MAX_LENGTH);
    }
    ExcelFormulaLexer lexer = new ExcelFormulaLexer(CharStreams.fromString(text));
    lexer.removeErrorListeners();
    List<Token> all = new ArrayList<>(lexer.getAllTokens());
    checkNesting(all);
    return withoutBlanks(all);
  }

  private static void checkNesting(List<Token> tokens) throws FormulaSyntaxException {
    int depth = 0;
    for (Token token : tokens) {
      String text = token.getText();
      if (token.getType() == FUNCTION || text.equals("(")) {
        depth++;
      } else if (text.equals(")")) {
        depth--;
      }
      if (depth > MAX_NESTING) {
        throw new FormulaSyntaxException(
            "nested more than " + MAX_NESTING + " levels deep", token.getStartIndex());
      }
    }
  }

  private static List<Token> withoutBlanks(List<Token> tokens) {
    List<Token> kept = new ArrayList<>(tokens.size());
    for (int i = 0; i < tokens.size(); i++) {
      Token token = tokens.get(i);
      if (token.getType() != SPACE) {
        kept.add(token);
      } else if (endsReference(tokens, i - 1) && startsReference(tokens, i + 1)) {
        boolean spacedCall = isCalled(tokens, i - 1) && tokens.get(i + 1).getText().equals("(");
        if (!spacedCall) {
          ((WritableToken) token).setType(INTERSECT);
          kept.add(token);
        }
      }
    }
    return kept;
  }

  /** A name before a parenthesis is a function, unless it is a column as in {@code $A:A (B1)}. */
  private static boolean isCalled(List<Token> tokens, int i) {
    boolean endOfRange = i > 0 && tokens.get(i - 1).getText().equals(":");
    return tokens.get(i).getType() == NAME && !endOfRange;
  }

  private static boolean endsReference(List<Token> tokens, int i) {
    if (i < 0) {
      return false;
    }
    Token token = tokens.get(i);
    return switch (token.getType()) {
      case CELL, NAME, TABLE, COLUMN, ROW, ERROR -> true;
      case NUMBER -> i > 0 && tokens.get(i - 1).getText().equals(":");
      default -> token.getText().equals(")") || token.getText().equals("#");
    };
  }

  private static boolean startsReference(List<Token> tokens, int i) {
    if (i >= tokens.size()) {
      return false;
    }
    Token token = tokens.get(i);
    return switch (token.getType()) {
      case CELL, NAME, TABLE, COLUMN, ROW, ERROR, SHEET, FUNCTION -> true;
      case NUMBER -> i + 1 < tokens.size() && tokens.get(i + 1).getText().equals(":");
      default -> token.getText().equals("(");
    };
  }
}
