package weighhouse.rules;

import java.util.List;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * One place where a rule applies, at the root of the mistake.
 *
 * @param rule the rule
 * @param cells root regions, all of one formula or one list of values
 * @param host the cell that the trees are written for, the first of {@code cells}
 * @param offending the node of the host's formula that is wrong, or null for the whole
 * @param suggestion the whole corrected formula, relative to the host, or null where none can be
 *     given
 * @param operands metavariables of the rule to the expressions they stand for, relative to the host
 * @param notes remarks such as assumptions made, one sentence each
 */
public record Match(
    Rule rule,
    List<CellRange> cells,
    CellAddress host,
    Expr offending,
    Expr suggestion,
    Map<String, Expr> operands,
    List<String> notes) {}
