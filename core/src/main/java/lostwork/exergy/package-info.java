/**
 * The laws of exergy as plain functions of states, heats and an explicit reference environment.
 *
 * <h2>Theory</h2>
 * <p>Energy is conserved; the ability to do work is not. The most work that matter, heat or radiation can yield while it
 * comes into equilibrium with its environment is its exergy. It follows from both laws together: the first law says how
 * much energy can leave as work or as heat to the environment, the second how little heat that can be, since the entropy
 * has to leave with it at the ambient temperature {@code T0}. So every exergy has the form of an energy difference less
 * {@code T0} times an entropy difference; for a flow {@code h - h0 - T0 (s - s0)}, for a closed mass
 * {@code u - u0 + p0 (v - v0) - T0 (s - s0)}, for a heat {@code Q - T0 Q/T}.
 *
 * <p>Whatever really happens generates entropy {@code S_gen >= 0} and destroys the exergy {@code T0 S_gen} (Gouy 1889,
 * Stodola 1905). This gives two ways to the same loss: by the balance of exergy, and by the balance of entropy. They use
 * the same enthalpies and entropies, so their agreement proves the bookkeeping, not the data.
 *
 * <h2>Heat above and below the ambient temperature</h2>
 * <p>Above {@code T0} heat carries exergy in its own direction. Below {@code T0} the factor {@code 1 - T0/T} is negative and
 * exergy flows against the heat: to take heat out of a cold room is to bring exergy into it. A heat that slides across
 * {@code T0} carries the net of both. At {@code T0} it carries none.
 *
 * <h2>What lives here</h2>
 * <ul>
 *   <li>{@link lostwork.exergy.ReferenceEnvironment}: the environment, and the exergy of flows, closed masses, heat, work,
 *       radiation, motion and height against it; {@link lostwork.exergy.AirComposition} for what it consists of;
 *   <li>{@link lostwork.exergy.WaterVapourPressure}: the humidity of the environment, and dew points;
 *   <li>{@link lostwork.exergy.TemperatureGlide}: heat at sliding temperature and its Lorenz mean;
 *   <li>{@link lostwork.exergy.Carnot}, {@link lostwork.exergy.Lorenz}, {@link lostwork.exergy.CurzonAhlborn}: efficiencies
 *       and coefficients of performance of engines, refrigerators and heat pumps;
 *   <li>{@link lostwork.exergy.FreeEnergy}, {@link lostwork.exergy.EntropyBalance}, {@link lostwork.exergy.GouyStodola};
 *   <li>{@link lostwork.exergy.ThermodynamicState}: what a property model has to say about a state.
 * </ul>
 *
 * <h2>Reference state and range</h2>
 * <p>Exergy is zero at the restricted dead state: the same matter at {@code T0, p0}, unmixed and unreacted. There is no
 * default environment. A temperature of 0 K does not exist as a {@link lostwork.quantity.Temperature}, so that no law is
 * asked about it. The range of a state is that of its property model. The humidity of the environment needs an ambient
 * temperature of 130 K to 647.096 K.
 *
 * <h2>Sources</h2>
 * <ul>
 *   <li>T. J. Kotas, The Exergy Method of Thermal Plant Analysis, Butterworths 1985;
 *   <li>A. Bejan, G. Tsatsaronis, M. Moran, Thermal Design and Optimization, Wiley 1996;
 *   <li>J. Szargut, D. R. Morris, F. R. Steward, Exergy Analysis of Thermal, Chemical and Metallurgical Processes,
 *       Hemisphere 1988;
 *   <li>R. Petela, Exergy of heat radiation, Journal of Heat Transfer 86 (1964) 187-192.
 * </ul>
 *
 * <h2>Nulls and threads</h2>
 * <p>No parameter and no result is null. All types are immutable and thread-safe.
 */
@NullMarked
package lostwork.exergy;

import org.jspecify.annotations.NullMarked;
