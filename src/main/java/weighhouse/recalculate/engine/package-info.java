/**
 * Calculation put together: {@link weighhouse.recalculate.engine.Recalculations} compiles a
 * workbook, the engine runs it as it is, compares with the stored values, and answers what-ifs by
 * running what depends on a change in a borrowed copy of the cells. Start at {@code
 * Recalculations}; functions, formulas and order have packages of their own.
 */
package weighhouse.recalculate.engine;
