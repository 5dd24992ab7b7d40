package weighhouse.rules.check.ratio;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Puts a match of a check together. */
public final class Found {
  private final Rule rule;
  private final CellRange cells;
  private final Map<String, Expr> operands = new LinkedHashMap<>();
  private final List<String> notes = new ArrayList<>();
  private Expr offending;
  private Expr suggestion;

  private Found(Rule rule, CellRange cells) {
    this.rule = rule;
    this.cells = cells;
  }

  public static Found at(Rule rule, Place place) {
    return new Found(rule, place.range());
  }

  public static Found at(Rule rule, CellAddress cell) {
    return new Found(rule, CellRange.of(cell));
  }

  /** The same rule at another severity: major, minor, query. */
  public static Rule as(String level, Rule rule) {
    return new Rule(
        rule.id(), rule.family(), rule.title(), level, rule.explain(), rule.ask(), rule.sources());
  }

  /** One node of the formula is wrong, and what should stand for it. */
  public Found replacing(Expr tree, Expr node, Expr replacement) {
    offending = node;
    suggestion = Trees.replace(tree, node, replacement);
    return this;
  }

  /** The node that is wrong where nothing can be suggested. */
  public Found marking(Expr node) {
    offending = node;
    return this;
  }

  public Found with(String name, Expr operand) {
    operands.put(name, operand);
    return this;
  }

  public Found saying(String note) {
    notes.add(note);
    return this;
  }

  public Match match() {
    return new Match(rule, List.of(cells), cells.first(), offending, suggestion, operands, notes);
  }
}
