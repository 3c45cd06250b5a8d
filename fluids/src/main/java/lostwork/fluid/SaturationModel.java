package lostwork.fluid;

/**
 * The vapour–liquid saturation of a pure fluid in coherent SI units: the part of a {@link FluidModel} that a fluid
 * without a liquid phase leaves out.
 */
public interface SaturationModel {
    /** {@return the lowest temperature of the saturation line in K, usually the triple point} */
    double lowestTemperature();

    /** {@return the saturation pressure at the lowest temperature in Pa; a model that knows the number overrides this} */
    default double lowestPressure() {
        return pressure(lowestTemperature());
    }

    /** {@return the critical temperature in K} */
    double criticalTemperature();

    /** {@return the critical pressure in Pa} */
    double criticalPressure();

    /**
     * {@return the saturation pressure in Pa}
     *
     * @param temperature temperature in K, from the lowest to the critical one
     */
    double pressure(double temperature);

    /**
     * {@return the saturation temperature in K}
     *
     * @param pressure absolute pressure in Pa, from the saturation pressure at the lowest temperature to the critical one
     */
    double temperature(double pressure);

    /**
     * {@return the slope dp/dT of the saturation line in Pa/K, or NaN where it follows from the two phases}
     *
     * <p>Where the Gibbs energies of the two phases are exactly equal, the slope is (h″ − h′)/(T (v″ − v′))
     * (Clausius–Clapeyron), and this default of NaN says so. A formulation whose saturation line is an equation of its own
     * misses that by its fitting error (about 1e-3 for steam) and returns the slope of its equation, so that the
     * derivatives of two-phase states are exact.
     *
     * @param temperature temperature in K, from the lowest to the critical one
     */
    default double pressureByTemperature(double temperature) {
        return Double.NaN;
    }

    /**
     * {@return the phase region of a single-phase state, as this library names it}
     *
     * @param temperature temperature in K
     * @param pressure absolute pressure in Pa
     * @param side the side of the saturation line, where there is one
     */
    default Phase phase(double temperature, double pressure, PhaseSide side) {
        if (temperature >= criticalTemperature()) {
            return pressure >= criticalPressure() ? Phase.SUPERCRITICAL : Phase.VAPOUR;
        }
        return side == PhaseSide.LIQUID ? Phase.LIQUID : Phase.VAPOUR;
    }
}
