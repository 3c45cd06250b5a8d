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
}
