/**
 * Where a model stands on its sheets: one file for each way of placing inputs, parameters and
 * traces, one catalogue of the layouts composed of them. Formulas come from the model's forms; a
 * layout only decides where they stand and how they refer to each other.
 */
package weighhouse.generator.layout;
