/**
 * Small numerical tools over plain doubles: roots between two bounds, dense linear systems, numerical rank. No physics.
 *
 * <h2>What lives here</h2>
 * <ul>
 *   <li>{@link lostwork.solve.BracketedRoot}: a root of a function of one variable between two bounds, with or without
 *       its slope, from a hint if there is one;
 *   <li>{@link lostwork.solve.DenseLu}: a square system of 1 to a few hundred equations, its transpose, and an estimate
 *       of how near to singular it is;
 *   <li>{@link lostwork.solve.DifferentiableFunction}: a function of several numbers with its gradient;
 *   <li>{@link lostwork.solve.SmallSvd}: singular values, rank at a stated tolerance, and the null vectors of both sides.
 * </ul>
 *
 * <h2>Contracts</h2>
 * <p>Accuracy is an inequality that the result keeps, stated by the caller. Every iteration has a limit. A method
 * returns a value that keeps its contract or throws a {@link lostwork.solve.SolveException}; it never returns its last
 * guess. The same input gives the same bits: nothing here is random and nothing depends on threads or time.
 *
 * <h2>Memory, nulls and threads</h2>
 * <p>{@code BracketedRoot} and {@code SmallSvd} are immutable and thread-safe. {@code DenseLu} owns its storage, which is reused
 * by the next factorisation: one instance belongs to one thread. Methods documented as allocation-free create no
 * objects. Matrices are row-major arrays. No parameter and no result is null.
 *
 * <h2>Sources</h2>
 * <ul>
 *   <li>T. R. Chandrupatla, A new hybrid quadratic/bisection algorithm for finding the zero of a nonlinear function
 *       without using derivatives, Advances in Engineering Software 28 (1997) 145-149;
 *   <li>G. E. Alefeld, F. A. Potra, Y. Shi, Algorithm 748: enclosing zeros of continuous functions, ACM Transactions on
 *       Mathematical Software 21 (1995) 327-344;
 *   <li>N. J. Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., SIAM 2002, chapters 9 and 15;
 *   <li>G. H. Golub, C. F. Van Loan, Matrix Computations, 4th ed., Johns Hopkins 2013, sections 3.4 and 8.6.
 * </ul>
 */
@NullMarked
package lostwork.solve;

import org.jspecify.annotations.NullMarked;
