/**
 * Transition matrices and generators: exponentials, logarithms, roots, and what to say where no
 * valid root exists. Start at {@link weighhouse.effect.matrix.MatrixRoot} for another cycle length,
 * at {@link weighhouse.effect.matrix.Generator} for rates.
 *
 * <p>Matrices are {@code double[rows][columns]}, from-states down, to-states across, never changed
 * and never kept. Matrices that are not square, or hold NaN or infinity, throw {@link
 * IllegalArgumentException}.
 */
package weighhouse.effect.matrix;
