/**
 * Gases: perfect gas, ideal gases with temperature-dependent heat capacity, their mixtures, dry and humid air, fuels and
 * the flue gas that they leave.
 *
 * <h2>What lives here</h2>
 * <ul>
 *   <li>{@link lostwork.fluid.gas.PerfectGas}: constant heat capacity, for textbook cycles.
 *   <li>{@link lostwork.fluid.gas.Species}: one chemical species with its functions of temperature.
 *   <li>{@link lostwork.fluid.gas.GasComposition} and {@link lostwork.fluid.gas.MoleFraction}: what a gas consists of.
 *   <li>{@link lostwork.fluid.gas.IdealGas}: one species or a mixture of fixed composition, with all state pairs; its kinds
 *       {@link lostwork.fluid.gas.DryAir}, {@link lostwork.fluid.gas.HumidAir} and {@link lostwork.fluid.gas.FlueGas}.
 *   <li>{@link lostwork.fluid.gas.IdealMixtureModel}: the same for a composition that is an unknown, with its derivatives.
 *   <li>{@link lostwork.fluid.gas.Fuel} and {@link lostwork.fluid.gas.CombustionAir}: what burns, and with how much air.
 *   <li>{@link lostwork.fluid.gas.AcidDewPoint}: where sulfuric acid condenses.
 * </ul>
 *
 * <h2>Theory</h2>
 * <p>In an ideal gas each species behaves as if it were alone at its partial pressure x p. With H(T), S(T) of the pure
 * species at the standard pressure p° = 1 bar:
 * <pre>
 *   v = R T/(p M)      h = Σ x H(T)/M      s = Σ x (S(T) − R ln(x p/p°))/M
 * </pre>
 * <p>H and S integrate cp/R = a1/T² + a2/T + a3 + a4 T + a5 T² + a6 T³ + a7 T⁴ of NASA/TP-2002-211556, range by range. The
 * form is linear in its coefficients, so a mixture of fixed composition is evaluated as one such polynomial; T(h), T(u) and
 * T(s) are found by Newton's method inside a bracket, and return the value that they were asked for to rounding.
 *
 * <h2>Gas constant</h2>
 * <p>Heat capacities are the printed numbers times 8.31451 J/(mol K), the value that the source was fitted with; the
 * volume, the pressure term of the entropy and the entropy of mixing take the exact 8.31446261815324 J/(mol K). All
 * relations between h, s and v hold to rounding, because they tie v to the pressure term only.
 *
 * <h2>Reference state</h2>
 * <p>Enthalpy: the elements in their reference states at 298.15 K and 1 bar have none, so heats of reaction are differences
 * of enthalpies. Entropy: absolute (third law). {@code PerfectGas} has a datum of its own.
 *
 * <h2>Range</h2>
 * <p>Most species 200 K to 6000 K or 20000 K, some 200 K to 1000 K; a mixture holds where all of its species do. Errors of
 * p v = R T are below 1 % for air up to some 20 bar at room temperature and shrink on heating; water vapour in flue gas and
 * humid air is as good up to about its dew point at 1 bar. Nothing condenses, and nothing dissociates.
 *
 * <h2>Sources</h2>
 * <p>McBride, Zehe, Gordon, NASA/TP-2002-211556, 2002, as digits from memory with the checks that the species index names.
 * Vapour pressure of water: IAPWS SR1-86(1992) and R14-08(2011). Acid dew point: Verhoff and Banchero, 1974.
 *
 * <h2>Caution</h2>
 * <p>Combustion figures and dew points are engineering estimates. Flammable and toxic gases and fired equipment fall under
 * local codes and licensed practice.
 *
 * <p>Nothing here takes or returns null. All classes are immutable and thread-safe, builders excepted.
 */
@NullMarked
package lostwork.fluid.gas;

import org.jspecify.annotations.NullMarked;
