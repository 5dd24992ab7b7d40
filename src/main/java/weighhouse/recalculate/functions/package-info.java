/**
 * The worksheet functions, by topic, all entered in the one table {@link
 * weighhouse.recalculate.functions.Functions}; a new function is one line there, in the file of its
 * topic. A function sees its arguments ({@link weighhouse.recalculate.functions.Arguments}) as
 * values, rectangles ({@link weighhouse.recalculate.functions.Grid}) or references, and knows
 * nothing of compilation or order. Evaluation of operators and references is in {@code program}.
 */
package weighhouse.recalculate.functions;
