/**
 * Fluids and their states: the typed face ({@link lostwork.fluid.Fluid}, {@link lostwork.fluid.FluidState}) and the
 * small primitive interface behind it ({@link lostwork.fluid.FluidModel}).
 *
 * <h2>Theory</h2>
 * <p>The equilibrium state of a fluid of fixed composition has two degrees of freedom (Gibbs' phase rule), so any two
 * independent properties determine it. A model gives v, h and s of one phase over T and p, with three derivatives: cp,
 * (∂v/∂T)<sub>p</sub> and (∂v/∂p)<sub>T</sub>. The rest follows exactly:
 *
 * <pre>
 * dh = cp dT + (v - T (∂v/∂T)p) dp        ds = cp/T dT - (∂v/∂T)p dp        u = h - p v
 * cv = cp + T (∂v/∂T)p² / (∂v/∂p)T        w² = -v² / (∂v/∂p)s               T ds = dh - v dp
 * </pre>
 *
 * <p>Liquid and vapour coexist where T, p and the Gibbs energy h − T s are equal in both. The slope of this line is
 * dp/dT = (h″ − h′)/(T (v″ − v′)) (Clausius–Clapeyron), and between the two v, h and s are mixed by mass (lever rule).
 * There temperature and pressure are no independent pair and cp is infinite, but the derivatives with pressure and enthalpy
 * exist; the plant solver uses these.
 *
 * <h2>State pairs</h2>
 * <p>Along the lines that the searches follow, the property looked for rises or falls everywhere in a stable fluid, through
 * all phases, so a bracket holds one root: (∂h/∂T)<sub>p</sub> = cp, (∂s/∂T)<sub>p</sub> = cp/T,
 * (∂v/∂p)<sub>T</sub> &lt; 0, (∂h/∂p)<sub>s</sub> = v, (∂u/∂T)<sub>v</sub> = cv, (∂s/∂T)<sub>v</sub> = cv/T. The
 * searches take Newton steps with the exact derivatives inside the bracket and halve it where a step fails; they end after
 * at most 200 evaluations, with a state that has both properties to 1e-9, or with an exception.
 *
 * <table>
 * <caption>Where a pair has two answers</caption>
 * <tr><th>Pair</th><th>Where</th><th>Answer</th></tr>
 * <tr><td>(T,p)</td><td>on the saturation line, within 1e-10 of its pressure</td><td>saturated liquid</td></tr>
 * <tr><td>(p,v)</td><td>a liquid with a least volume, water near 4 °C</td><td>the warmer state</td></tr>
 * <tr><td>(T,s)</td><td>a liquid that contracts on heating</td><td>the state at the lower pressure</td></tr>
 * <tr><td>(u,v), (s,v), (h,s)</td><td>a liquid that contracts on heating, at the edge of two phases</td>
 * <td>the one that the search meets; both properties are returned</td></tr>
 * </table>
 *
 * <p>A jump of up to 1e-3 between two equations of one formulation is bridged by interpolation, so that a search passes.
 *
 * <h2>A fluid of one's own</h2>
 * <p>Implement {@link lostwork.fluid.FluidModel} and, for a liquid and a vapour, {@link lostwork.fluid.SaturationModel};
 * {@code Fluid.of(model)} then answers everything. {@link lostwork.fluid.FluidCheck} finds derivatives and saturation data
 * that contradict each other. A fluid of variable composition implements {@link lostwork.fluid.MixtureModel}.
 *
 * <h2>Range and reference state</h2>
 * <p>Each model states its own range, datum, uncertainty and sources: {@code fluid.provenance()}. Outside the range there is
 * an exception, never an extrapolated value. Energies and entropies of different fluids have different zero points;
 * {@link lostwork.fluid.FluidState#enthalpyFromElements} counts from a common one where the model has formation data.
 *
 * <h2>Sources</h2>
 * <p>The relations of this page stand in any textbook of engineering thermodynamics, for instance H. D. Baehr, S. Kabelac,
 * Thermodynamik (from memory). The speed of sound and cv of two phases are those of complete equilibrium.
 *
 * <h2>Nulls and threads</h2>
 * <p>No parameter and no result is null unless marked so. All public types are immutable and thread-safe, but
 * {@link lostwork.fluid.StatePoint} and {@link lostwork.fluid.MixturePoint}, which carry results out of the primitive
 * interface without allocation and belong to one caller each.
 */
@NullMarked
package lostwork.fluid;

import org.jspecify.annotations.NullMarked;
