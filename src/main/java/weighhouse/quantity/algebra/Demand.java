package weighhouse.quantity.algebra;

import weighhouse.quantity.Kind;
import weighhouse.quantity.Span;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * What a formula needs its operands to be.
 *
 * @param cells the operands
 * @param kind what they must be
 * @param span the time they must speak of, or null
 * @param firm whether the formula makes no sense otherwise; else it is only the likeliest
 * @param usage the part of the formula that tells, with x for the operand: {@code 1-EXP(-x*t)}
 * @param host where the formula stands
 */
public record Demand(
    CellRange cells, Kind kind, Span span, boolean firm, String usage, CellAddress host) {}
