package lostwork.examples.audit;

import lostwork.exergy.CurzonAhlborn;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.exergy.TemperatureGlide;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidState;
import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificHeatCapacity;
import lostwork.quantity.Temperature;

/**
 * What one kilogram of a stream yields when it is cooled at constant pressure from T1 to T2, while the surroundings stay
 * at T0, T1 > T2 >= T0.
 *
 * <p>Heat: {@code h1 - h2}. Reversible work: {@code h1 - h2 - T0 (s1 - s2)}, which is the difference of the flow
 * exergies. Endoreversible work: {@code integral of (1 - sqrt(T0/T)) cp dT} from T2 to T1, the efficiency at most power of
 * {@link CurzonAhlborn} applied to each slice of heat at its own temperature.
 */
final class CoolingPath {
    /** Even count of Simpson intervals; the integrand is smooth, and 256 leave an error below 1e-9 of the heat. */
    private static final int INTERVALS = 256;

    private final Fluid fluid;
    private final Pressure pressure;
    private final FluidState hot;
    private final FluidState cold;
    private final ReferenceEnvironment ambient;

    /**
     * A figure per kilogram.
     *
     * @param value the figure
     * @param perKelvin its derivative with respect to the supply temperature T1
     */
    record Yield(SpecificEnergy value, SpecificHeatCapacity perKelvin) {}

    /**
     * Describes a path.
     *
     * @param fluid what is cooled
     * @param pressure its absolute pressure
     * @param supply the temperature T1 that it comes with
     * @param lowest the temperature T2 that it is cooled to
     * @param ambient the surroundings at T0
     */
    CoolingPath(Fluid fluid, Pressure pressure, Temperature supply, Temperature lowest, ReferenceEnvironment ambient) {
        this.fluid = fluid;
        this.pressure = pressure;
        this.hot = fluid.state(supply, pressure);
        this.cold = fluid.state(lowest, pressure);
        this.ambient = ambient;
    }

    Yield heat() {
        return new Yield(hot.enthalpy().minus(cold.enthalpy()), hot.isobaricHeatCapacity());
    }

    Yield reversibleWork() {
        final SpecificEnergy work = ambient.heatExergy(heat().value(), TemperatureGlide.ofStream(hot, cold));
        return new Yield(work, hot.isobaricHeatCapacity().times(ambient.carnotFactor(hot.temperature())));
    }

    Yield endoreversibleWork() {
        final double low = cold.temperature().inKelvin();
        final double high = hot.temperature().inKelvin();
        final double step = (high - low) / INTERVALS;
        double sum = endoreversibleSlope(cold).si() + endoreversibleSlope(hot).si();
        for (int i = 1; i < INTERVALS; i++) {
            final FluidState between = fluid.state(Temperature.kelvin(low + i * step), pressure);
            sum += (i % 2 == 1 ? 4 : 2) * endoreversibleSlope(between).si();
        }
        return new Yield(SpecificEnergy.joulesPerKilogram(sum * step / 3), endoreversibleSlope(hot));
    }

    private SpecificHeatCapacity endoreversibleSlope(FluidState state) {
        return state.isobaricHeatCapacity()
                .times(CurzonAhlborn.engineEfficiency(state.temperature(), ambient.temperature()));
    }
}
