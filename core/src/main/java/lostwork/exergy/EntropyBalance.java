package lostwork.exergy;

import lostwork.quantity.EntropyRate;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import lostwork.quantity.Temperature;

/**
 * The entropy balance of a steady process, collected from its flows and heats:
 * {@code S_gen = Σ m s (out) - Σ m s (in) + Σ Q/T (out) - Σ Q/T (in)}.
 *
 * <p>Work carries no entropy and does not appear. The second law demands {@code S_gen >= 0}; a negative value is returned as
 * it is, since measured data may show one.
 *
 * <p>The entropy of each flow counts from the datum of its property model. The datum drops out when the masses balance, so
 * {@link #generation()} refuses a balance whose masses do not, and flows of one kind of matter must come from one model.
 *
 * <h2>Example</h2>
 * <pre>{@code
 * var wall = EntropyBalance.empty().heatIn(watts(1035), kelvin(293)).heatOut(watts(1035), kelvin(278));
 * GouyStodola.lostPower(wall.generation(), site);
 * }</pre>
 *
 * <p>Immutable and thread-safe: each call gives a new balance.
 */
public final class EntropyBalance {
    /** Share of the throughput by which the masses may miss each other. */
    private static final double MASS_TOLERANCE = 1e-9;

    private static final EntropyBalance EMPTY = new EntropyBalance(0, 0, 0);

    private final double generation;
    private final double massIn;
    private final double massOut;

    private EntropyBalance(double generation, double massIn, double massOut) {
        this.generation = generation;
        this.massIn = massIn;
        this.massOut = massOut;
    }

    /** {@return a balance without any flow or heat} */
    public static EntropyBalance empty() {
        return EMPTY;
    }

    /**
     * {@return this balance with a flow that enters}
     *
     * @param flow the mass flow
     * @param state its state
     */
    public EntropyBalance inflow(MassFlow flow, ThermodynamicState state) {
        return new EntropyBalance(generation - flow.si() * state.entropy().si(), massIn + flow.si(), massOut);
    }

    /**
     * {@return this balance with a flow that leaves}
     *
     * @param flow the mass flow
     * @param state its state
     */
    public EntropyBalance outflow(MassFlow flow, ThermodynamicState state) {
        return new EntropyBalance(generation + flow.si() * state.entropy().si(), massIn, massOut + flow.si());
    }

    /**
     * {@return this balance with a heat flow that enters}
     *
     * @param heat the heat flow
     * @param at the temperature at which it crosses the boundary
     */
    public EntropyBalance heatIn(Power heat, Temperature at) {
        return withHeat(-heat.si(), at.si());
    }

    /**
     * {@return this balance with a heat flow that leaves}
     *
     * @param heat the heat flow
     * @param at the temperature at which it crosses the boundary
     */
    public EntropyBalance heatOut(Power heat, Temperature at) {
        return withHeat(heat.si(), at.si());
    }

    /**
     * {@return this balance with a heat flow that enters at sliding temperature}
     *
     * @param heat the heat flow
     * @param over the temperatures over which it crosses the boundary
     */
    public EntropyBalance heatIn(Power heat, TemperatureGlide over) {
        return withHeat(-heat.si(), over.meanKelvin());
    }

    /**
     * {@return this balance with a heat flow that leaves at sliding temperature}
     *
     * @param heat the heat flow
     * @param over the temperatures over which it crosses the boundary
     */
    public EntropyBalance heatOut(Power heat, TemperatureGlide over) {
        return withHeat(heat.si(), over.meanKelvin());
    }

    private EntropyBalance withHeat(double outwards, double kelvin) {
        return new EntropyBalance(generation + outwards / kelvin, massIn, massOut);
    }

    /** {@return the mass flow that enters less the mass flow that leaves} */
    public MassFlow massImbalance() {
        return MassFlow.kilogramsPerSecond(massIn - massOut);
    }

    /**
     * {@return the entropy generated per time; negative if the data contradict the second law}
     *
     * @throws IllegalStateException if the mass flows miss each other by more than 1e-9 of the throughput
     */
    public EntropyRate generation() {
        final double imbalance = Math.abs(massIn - massOut);
        if (!(imbalance <= MASS_TOLERANCE * Math.max(Math.abs(massIn), Math.abs(massOut)))) {
            throw new IllegalStateException("mass flows do not balance: " + massIn + " kg/s enter and " + massOut
                    + " kg/s leave, so that the datum of the entropy would enter the result; add the missing flow, or"
                    + " reconcile the flows first");
        }
        return EntropyRate.wattsPerKelvin(generation);
    }

    @Override
    public String toString() {
        return "entropy balance: " + massIn + " kg/s in, " + massOut + " kg/s out, sum of entropies " + generation
                + " W/K";
    }
}
