/**
 * What checks of ratios share: the cells that hold ratios, the limits that belong to an estimate,
 * random draws and widths of intervals as formulas write them, the level that labels tell. Finds
 * things and judges none of them; the checks that do are in {@code uncertainty}, {@code synthesis}
 * and {@code evidence}.
 */
package weighhouse.rules.check.ratio;
