/**
 * Workbooks of other fields, full of rates, ratios, survival-like curves and misleading
 * abbreviations, that hold no fault at all. Their table is in the test resources.
 */
package weighhouse.generator.lookalike;
