package lostwork.exergy;

import lostwork.quantity.SpecificEnergy;

/**
 * The free energies of Helmholtz and Gibbs, and the work they bound.
 *
 * <h2>Functions of state</h2>
 * <p>{@code f = u - T s} (Helmholtz) and {@code g = h - T s} (Gibbs). Their values hang on the datum of the entropy: adding a
 * constant {@code c} to {@code s} shifts them by {@code c T}. Only differences at one temperature have a meaning, and only
 * those are work.
 *
 * <h2>Work between two states of one temperature</h2>
 * <p>A closed mass that exchanges heat only at its own temperature {@code T} yields at most {@code f1 - f2}, the work on the
 * atmosphere included. A flow under the same condition yields at most {@code g1 - g2} at its shaft; at one pressure that is
 * also the most work of a closed mass after the atmosphere has been pushed back.
 *
 * <h2>Exergy</h2>
 * <p>Exergy is what becomes of the free energies when the heat is exchanged with the environment at {@code T0}, whatever the
 * temperature of the state:
 * <ul>
 *   <li>state at {@code T0}: closed mass {@code f - f0 + p0 (v - v0)}, flow {@code g - g0};
 *   <li>state at {@code T0} in a rigid vessel: the change of closed-mass exergy is that of {@code f};
 *   <li>state at {@code T0} and {@code p0} (a reaction, a mixing): both are {@code g - g0}.
 * </ul>
 *
 * <p>Sources: H. von Helmholtz, Die Thermodynamik chemischer Vorgänge, 1882; J. W. Gibbs, On the Equilibrium of
 * Heterogeneous Substances, 1875-1878; T. J. Kotas, The Exergy Method of Thermal Plant Analysis, 1985, on the relation to
 * exergy.
 */
public final class FreeEnergy {
    /** How far two temperatures may lie apart and still count as one, in K; covers the rounding of a property model. */
    private static final double SAME_TEMPERATURE = 1e-6;

    private FreeEnergy() {}

    /**
     * {@return the free energy of Helmholtz: {@code u - T s}}
     *
     * @param state the state
     */
    public static SpecificEnergy helmholtz(ThermodynamicState state) {
        return SpecificEnergy.joulesPerKilogram(state.internalEnergy().si()
                - state.temperature().si() * state.entropy().si());
    }

    /**
     * {@return the free energy of Gibbs: {@code h - T s}}
     *
     * @param state the state
     */
    public static SpecificEnergy gibbs(ThermodynamicState state) {
        return SpecificEnergy.joulesPerKilogram(state.enthalpy().si()
                - state.temperature().si() * state.entropy().si());
    }

    /**
     * {@return the most work of a closed mass at constant temperature, the work on its surroundings included:
     * {@code f1 - f2}}
     *
     * @param from the state before
     * @param to the state after, at the same temperature
     * @throws IllegalArgumentException if the temperatures differ by more than 1e-6 K
     */
    public static SpecificEnergy isothermalWork(ThermodynamicState from, ThermodynamicState to) {
        requireOneTemperature(from, to);
        return helmholtz(from).minus(helmholtz(to));
    }

    /**
     * {@return the most shaft work of a flow at constant temperature: {@code g1 - g2}}
     *
     * @param from the state at the inlet
     * @param to the state at the outlet, at the same temperature
     * @throws IllegalArgumentException if the temperatures differ by more than 1e-6 K
     */
    public static SpecificEnergy isothermalShaftWork(ThermodynamicState from, ThermodynamicState to) {
        requireOneTemperature(from, to);
        return gibbs(from).minus(gibbs(to));
    }

    private static void requireOneTemperature(ThermodynamicState from, ThermodynamicState to) {
        if (!(Math.abs(from.temperature().si() - to.temperature().si()) <= SAME_TEMPERATURE)) {
            throw new IllegalArgumentException("free energies at " + from.temperature() + " and " + to.temperature()
                    + ": their difference is a work only at one temperature; between temperatures take the exergy of a"
                    + " ReferenceEnvironment");
        }
    }
}
