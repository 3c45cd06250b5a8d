/**
 * Plants as sets of equations in named, typed variables: built, specified, diagnosed, solved.
 *
 * <h2>Four immutable things</h2>
 *
 * <ul>
 * <li>A {@link lostwork.plant.Plant} holds components, connections, variables and equations, and no values.
 * <li>A {@link lostwork.plant.Specification} says which variables are given, with which values. The same plant serves
 * design, test and target.
 * <li>A {@link lostwork.plant.SolvePlan} is the diagnosed, ordered and compiled form of both. It depends on what is
 * given, not on the values.
 * <li>A {@link lostwork.plant.Solution} holds the values and the proof: residuals, closure of every balance, exact
 * derivatives.
 * </ul>
 *
 * <h2>Variables and equations</h2>
 * <p>An outlet and the inlet that it is connected to share one state; along an unbranched line the mass flow is one
 * variable. Pressure and enthalpy are the core pair of a state. Temperature, entropy, specific volume, vapour fraction,
 * superheat and subcooling come into being when they are given or used, and the equation that ties them to the core pair
 * depends on what is given: in the two-phase region temperature and pressure are no pair. A component states its equations
 * once, as expressions; incidence, values, exact derivatives (reverse mode) and printed text follow from them.
 *
 * <p>An equation is a law, a model or an assumption. An assumption, such as "no pressure loss", gives way to given values
 * that contradict it at its own component, and is printed with every result. Where the contradiction runs through other
 * machines, it is an error that names all of them: which one is wrong is for the user to say.
 *
 * <h2>Diagnosis</h2>
 * <p>A maximum matching of equations with unknowns and its Dulmage–Mendelsohn parts say before any solving, by name,
 * which values are missing and which are too many. What only numbers show, such as two equations that say the same at the
 * solution, is found by the rank of each converged block; its null vectors name what is tied together.
 *
 * <h2>Solving</h2>
 * <p>Strongly connected components order the equations into blocks. A single equation is solved by a bracketed Newton
 * iteration; a loop by a damped Newton iteration within bounds, started from what is known nearby and restarted a few times
 * from seeded random values. Nothing depends on the order of building or on threads: results are reproducible bit by bit.
 * Nonlinear plants may have several solutions. One that generates negative entropy somewhere is not accepted while another
 * can be found; otherwise the first one found is returned.
 *
 * <h2>Sources</h2>
 *
 * <ul>
 * <li>A. L. Dulmage, N. S. Mendelsohn, Coverings of bipartite graphs, Canadian Journal of Mathematics 10 (1958) 517–534.
 * <li>R. Tarjan, Depth-first search and linear graph algorithms, SIAM Journal on Computing 1 (1972) 146–160.
 * <li>A. Griewank, A. Walther, Evaluating Derivatives, 2nd ed., SIAM 2008, for the reverse mode.
 * </ul>
 *
 * <h2>Nulls and threads</h2>
 * <p>No parameter and no result is null. All types but {@link lostwork.plant.Plant.Builder} are immutable and thread-safe.
 */
@NullMarked
package lostwork.plant;

import org.jspecify.annotations.NullMarked;
