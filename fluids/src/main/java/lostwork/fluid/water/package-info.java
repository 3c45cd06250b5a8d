/**
 * Ordinary water (H<sub>2</sub>O), liquid and steam.
 *
 * <h2>What lives here</h2>
 * <p>{@link lostwork.fluid.water.Water} is the way in; everything else is package-private. {@code Water.industrial()} is the
 * IAPWS Industrial Formulation 1997 (IAPWS-IF97), made for power plants and for speed.
 *
 * <h2>Theory</h2>
 * <p>The formulation divides the range into regions, each with a fundamental equation of its own from which every
 * property follows by derivatives, so that the laws hold exactly within a region:
 * <ul>
 *   <li>regions 1 (liquid), 2 (steam) and 5 (hot steam): the Gibbs energy g(p,T);
 *   <li>region 3 (dense fluid about the critical point): the Helmholtz energy f(ρ,T);
 *   <li>region 4: the saturation pressure p(T), an equation of its own.
 * </ul>
 * <p>States from other pairs than temperature and pressure start from the backward equations of the releases, which are
 * good to 25 mK, or in region 5, which has none, from a polynomial made from its own equation, good to 50 mK. They are
 * finished by Newton's method on the fundamental equation: the value that was asked for is returned to about 1e-13. In
 * region 3 density and temperature are searched together, which stays regular at the critical point.
 *
 * <h2>Range</h2>
 * <table>
 * <caption>Where IAPWS-IF97 holds</caption>
 * <tr><th>Temperature</th><th>Absolute pressure</th><th>Outside</th></tr>
 * <tr><td>273.15 K to 1073.15 K</td><td>up to 100 MPa</td>
 *     <td>{@link lostwork.quantity.OutOfRangeException}</td></tr>
 * <tr><td>1073.15 K to 2273.15 K</td><td>up to 50 MPa</td>
 *     <td>{@link lostwork.quantity.OutOfRangeException}</td></tr>
 * </table>
 * <p>The release says "above 0" for the lowest pressure; this library stops at 1 Pa. Ice is not part of the formulation,
 * nor is metastable steam here: below the saturation temperature the stable state is returned.
 *
 * <h2>Steps and double answers</h2>
 * <ul>
 *   <li>Regions meet with small steps: up to 0.018 % in v, 0.13 kJ/kg in h and 0.18 J/(kg K) in s between regions 2 and 3,
 *       0.03 kJ/kg at 623.15 K and 0.1 kJ/kg at 1073.15 K (measured; the release asks for 0.05 %, 0.2 kJ/kg and
 *       0.2 J/(kg K), from memory). A value inside a step belongs to no state; a search by pressure and enthalpy or entropy
 *       then follows one of the two equations a little beyond its border, so that it returns what was asked for.
 *   <li>The saturation equation does not meet the equality of Gibbs energies exactly: its slope and the one of Clausius and
 *       Clapeyron differ by up to 2e-4. Two-phase states carry the slope of the equation.
 *   <li>Cold water contracts on heating below 4 °C. Of the two temperatures that share a pressure and a volume, the warmer
 *       one is returned; of the two pressures that share a temperature and an entropy, the lower one.
 *   <li>Above 647.0959 K, a ten-thousandth of a kelvin below the critical temperature, the equation of region 3 no longer
 *       tells two phases apart at the pressure of region 4; the saturated densities are interpolated to the critical one.
 * </ul>
 *
 * <h2>Reference state</h2>
 * <p>u = 0 and s = 0 in the saturated liquid at the triple point (273.16 K), so that h′ = 0.000612 kJ/kg there. Do not mix
 * with another formulation: in a difference of exergies both states come from the same one. Counted from the elements,
 * liquid water at 298.15 K and 1 bar has −285.830 kJ/mol and 69.95 J/(mol K) (CODATA 1989).
 *
 * <h2>Sources</h2>
 * <ul>
 *   <li>IAPWS R7-97(2012), Revised Release on the IAPWS Industrial Formulation 1997 for the Thermodynamic Properties of Water
 *       and Steam.
 *   <li>IAPWS SR2-01(2014), SR3-03(2014) and SR4-04(2014), supplementary releases on backward equations and region
 *       boundaries.
 * </ul>
 * <p>Every table of coefficients is a resource file of this package with its citation. The digits were written down from
 * memory of the releases; the check values of the releases, which the tests reproduce to the last printed digit, confirm
 * them.
 *
 * <h2>Nulls and threads</h2>
 * <p>No parameter and no result is null. All public types are immutable and thread-safe; evaluations allocate nothing, with
 * a small work area for each thread.
 */
@NullMarked
package lostwork.fluid.water;

import org.jspecify.annotations.NullMarked;
