package weighhouse.rules.term;

import java.util.List;
import weighhouse.formula.Expr;
import weighhouse.workbook.CellAddress;

/** What references and names of an expression stand for. */
public interface Scope {
  /**
   * The term of a reference or name.
   *
   * @param reference a leaf of the tree other than a literal
   * @param host the cell whose formula holds it
   * @param translator to translate what a reference leads to
   */
  Term term(Expr reference, CellAddress host, Translator translator);

  /** The single cells of an area as references for the host; empty where they are too many. */
  List<Expr> cells(Expr area, CellAddress host);
}
