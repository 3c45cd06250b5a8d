package lostwork.ledger;

import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidState;
import lostwork.quantity.Temperature;

/**
 * The state that the exergy of one fluid counts from: its dead state, or where its model does not reach that, the nearest
 * temperature of the model at the ambient pressure, such as liquid water at 0 °C in frost.
 *
 * <p>With e = h − h_z − T₀ (s − s_z) another zero state shifts the exergy of every stream of the fluid by one constant.
 * Mass is conserved, so no destruction, no difference of streams and no closure depends on it; only the exergy of a stream
 * that crosses the boundary of the plant does.
 *
 * @param fluid the name of the fluid
 * @param temperature the temperature of the zero state
 * @param ambient T₀ in K
 * @param enthalpy h_z in J/kg
 * @param entropy s_z in J/(kg K)
 */
record ZeroState(String fluid, Temperature temperature, double ambient, double enthalpy, double entropy) {
    static ZeroState of(Fluid fluid, ReferenceEnvironment environment) {
        final double t0 = environment.temperature().si();
        final double p0 = environment.pressure().si();
        final double low = fluid.model().lowestTemperatureAt(p0);
        final double high = fluid.model().highestTemperatureAt(p0);
        final Temperature nearest = Temperature.kelvin(Math.max(low, Math.min(high, t0)));
        final FluidState state = fluid.state(nearest, environment.pressure());
        return new ZeroState(
                fluid.model().name(),
                nearest,
                t0,
                state.enthalpy().si(),
                state.entropy().si());
    }

    boolean isShifted() {
        return temperature.si() != ambient;
    }

    /** {@return the specific flow exergy in J/kg} */
    double flowExergy(double h, double s) {
        return h - enthalpy - ambient * (s - entropy);
    }
}
