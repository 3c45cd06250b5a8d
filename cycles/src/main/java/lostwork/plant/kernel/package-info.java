/**
 * The numerical kernel under {@link lostwork.plant}, not exported: equations as tapes with exact derivatives, the
 * structure of a system of equations (matching, Dulmage–Mendelsohn parts, blocks), and the solution of its blocks.
 *
 * <p>Everything here works on indices and doubles in coherent SI units and knows neither components nor quantities.
 * Structures and tapes are immutable and shared between threads; each solve owns one {@link
 * lostwork.plant.kernel.Workspace}.
 */
@NullMarked
package lostwork.plant.kernel;

import org.jspecify.annotations.NullMarked;
