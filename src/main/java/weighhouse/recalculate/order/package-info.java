/**
 * The order of calculation. A {@link weighhouse.recalculate.order.Unit} is a rectangle of cells of
 * one program; a {@link weighhouse.recalculate.order.Plan} puts units in the order of what they
 * read and tells which read a given rectangle. Units that read each other are woven cell by cell.
 * Nothing is evaluated here; that is {@code engine}'s.
 */
package weighhouse.recalculate.order;
