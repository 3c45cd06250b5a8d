/**
 * The machines and apparatus that plants are built from. Each states its variables and its equations and nothing about
 * how they are solved.
 *
 * <p>All components are in steady state. Streams carry pressure, enthalpy and mass flow; kinetic and potential energy are
 * left out, so states are static or total ones as the user reads them. Every component closes its own mass and energy
 * balance over its ports: what a machine loses leaves through a heat port, never out of the books.
 *
 * <table>
 * <caption>Components</caption>
 * <tr><th>of a stream</th><td>{@link lostwork.component.Supply}, {@link lostwork.component.Discharge}</td></tr>
 * <tr><th>with work</th><td>{@link lostwork.component.Compressor}, {@link lostwork.component.Pump},
 * {@link lostwork.component.Turbine}</td></tr>
 * <tr><th>with heat</th><td>{@link lostwork.component.Heater}, {@link lostwork.component.Cooler}</td></tr>
 * <tr><th>adiabatic</th><td>{@link lostwork.component.Valve}, {@link lostwork.component.Mixer},
 * {@link lostwork.component.Splitter}, {@link lostwork.component.Separator},
 * {@link lostwork.component.SteamDrum}</td></tr>
 * <tr><th>of power</th><td>{@link lostwork.component.Shaft}, {@link lostwork.component.Generator},
 * {@link lostwork.component.Motor}</td></tr>
 * </table>
 *
 * <h2>Signs</h2>
 *
 * <p>Power and heat count positive in the direction of their port: into a compressor, out of a turbine, into a heater,
 * out of a cooler. A pressure loss is the pressure at the inlet less that at the outlet.
 *
 * <h2>Assumptions</h2>
 *
 * <p>Where a component assumes something (no pressure loss, no mechanical losses, one pressure in a mixer) the assumption
 * is an equation of its own. It gives way to a value given at the same component, and it is printed with the results.
 *
 * <h2>Range</h2>
 *
 * <p>That of the fluids. An efficiency above 100 %, whether given or computed, and a component that would destroy entropy
 * end a solve with an error that names the component; in a test they can be reported as findings instead.
 *
 * <h2>Sources</h2>
 *
 * <p>Each class names the source of its equations. Most are the first law of an open system and definitions that every
 * textbook of engineering thermodynamics shares.
 */
@NullMarked
package lostwork.component;

import org.jspecify.annotations.NullMarked;
