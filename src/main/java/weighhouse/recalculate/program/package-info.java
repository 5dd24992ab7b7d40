/**
 * Formulas compiled for calculation: a tree becomes a tree of small evaluating objects ({@link
 * weighhouse.recalculate.program.Node}) that work on the cells' arrays through a {@link
 * weighhouse.recalculate.program.Frame}, and a list of what it reads ({@link
 * weighhouse.recalculate.program.Footprint}). One program serves every cell of its shape.
 * Operators, references, names and the ways of calling a function live here; what a single function
 * does is in {@code functions}, and when a cell is calculated is decided in {@code order}.
 */
package weighhouse.recalculate.program;
