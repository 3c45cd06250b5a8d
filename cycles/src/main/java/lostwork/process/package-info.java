/**
 * Processes of a closed mass: isothermal, isentropic, isochoric, isobaric and polytropic changes of any fluid, alone, in a
 * chain, or closed to a cycle.
 *
 * <h2>Theory</h2>
 * <p>A closed mass exchanges heat and work with its surroundings, but no matter. The first law for it reads
 * {@code Q = ΔU + W}, with the heat {@code Q} positive into the mass and the work {@code W} positive out of it. All steps
 * here are internally reversible: they run through equilibrium states, so that {@code W = ∫ p dV} and
 * {@code Q = ∫ T dS}, and neither friction nor unresisted expansion takes part. Irreversibility comes in where heat meets
 * reservoirs of another temperature; the entropy generated there is {@code ΔS − Q/T} per reservoir, and the work lost by it
 * {@code T0 S_gen} (Gouy and Stodola).
 *
 * <p>Work is counted by the path: {@code p Δv} at constant pressure, 0 at constant volume, the closed form of
 * {@code p vⁿ = const}, a quadrature along an isotherm. The isentrope has {@code W = −ΔU}. Heat follows from the energy
 * balance. A second, independent count is the area in the diagrams: {@code ∫ p dV} and {@code ∫ T dS} by adaptive
 * Gauss–Kronrod quadrature, cut where the path crosses the saturation line. In the two-phase region an isotherm is an isobar.
 *
 * <pre>{@code
 * var steam = ClosedMass.of(Water.industrial(), kilograms(0.2));
 * var stroke = steam.startingAt(celsius(300), bar(10)).isentropicTo(bar(1.2));
 * var cycle = stroke.isobaricTo(Ratio.fraction(0.3)).closedBy(ProcessKind.POLYTROPIC);
 * stroke.netWork();                                  // 68.5 kJ
 * cycle.netWork();                                   // 32.5 kJ
 * var site = ReferenceEnvironment.of(celsius(15), bar(1));
 * stroke.usefulWork(site);                           // 45.9 kJ ...
 * stroke.exergyChange(site);                         // ... paid for with 45.9 kJ of exergy
 * }</pre>
 *
 * <p>A chain need not come back. A single expansion is as legitimate as a cycle, and does more work: nothing has been spent
 * on the way back. What it has used up instead is the exergy of the closed mass, and {@link ProcessChain#exergyChange} shows
 * it. Of the work, {@code p0 ΔV} goes into pushing back the surroundings; the rest is useful. In a cycle the two terms of
 * the surroundings cancel.
 *
 * <p>In a cycle the net work equals the net heat and the area enclosed in both diagrams. The thermal efficiency is net work
 * per heat taken in, counted over the steps that take heat in as the textbooks do; no cycle exceeds {@code 1 − Tmin/Tmax} of
 * its extreme temperatures (Carnot).
 *
 * <h2>Accuracy and range</h2>
 * <p>Energy balances close to rounding. Areas agree with work and heat to 1e-8 for every property model that is itself
 * consistent. A formulation with separate equations for its regions and its saturation line, as IAPWS-IF97, obeys
 * {@code T ds = du + p dv} across a border only to its own fitting error (some 1e-5); the area under T tells that error
 * and does not hide it. The range is that of the fluid. All paths are equilibrium paths: metastable states, knock and
 * gas exchange are not described.
 *
 * <h2>Sources</h2>
 * <p>R. Clausius, Die mechanische Wärmetheorie, 2nd ed., Vieweg 1876; S. Carnot, Réflexions sur la puissance motrice du feu,
 * Paris 1824; the cycles of Otto, Diesel, Stirling and Ericsson as in M. J. Moran, H. N. Shapiro, Fundamentals of Engineering
 * Thermodynamics, chapter 9.
 *
 * <p>Results are engineering estimates. Pressure equipment, steam and flammable fluids fall under local codes and licensed
 * practice.
 *
 * <p>All types are immutable and thread-safe. Parameters are never null.
 */
@NullMarked
package lostwork.process;

import org.jspecify.annotations.NullMarked;
