package lostwork.examples.audit;

import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidState;
import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.Temperature;

/**
 * What one kilogram of a stream yields when it is cooled at constant pressure to a lowest temperature, while the
 * surroundings stay at T0.
 *
 * <p>Heat: {@code h(T) - h(T2)}. Reversible work: {@code h(T) - h(T2) - T0 (s(T) - s(T2))}, which is the difference of
 * the flow exergies. Endoreversible work: {@code integral of (1 - sqrt(T0/T)) dh} from T2 to T, the efficiency at most
 * power of Curzon and Ahlborn (American Journal of Physics 43, 1975, 22-24) applied to each slice of heat at its own
 * temperature.
 */
final class CoolingPath {
    /** Even count of Simpson intervals; the integrand is smooth, and 256 leave an error below 1e-9 of the heat. */
    private static final int INTERVALS = 256;

    private final Fluid fluid;
    private final Pressure pressure;
    private final double lowestKelvin;
    private final ReferenceEnvironment ambient;
    private final double ambientKelvin;
    private final FluidState cold;

    /**
     * Describes a path.
     *
     * @param fluid what is cooled
     * @param pressure its absolute pressure
     * @param lowest the temperature T2 that it is cooled to
     * @param ambient the surroundings at T0
     */
    CoolingPath(Fluid fluid, Pressure pressure, Temperature lowest, ReferenceEnvironment ambient) {
        this.fluid = fluid;
        this.pressure = pressure;
        this.lowestKelvin = lowest.inKelvin();
        this.ambient = ambient;
        this.ambientKelvin = ambient.temperature().inKelvin();
        this.cold = fluid.state(lowest, pressure);
    }

    SpecificEnergy heatFrom(Temperature supply) {
        return fluid.state(supply, pressure).enthalpy().minus(cold.enthalpy());
    }

    SpecificEnergy reversibleWorkFrom(Temperature supply) {
        final FluidState hot = fluid.state(supply, pressure);
        return ambient.flowExergy(hot).minus(ambient.flowExergy(cold));
    }

    /** {@return the endoreversible work; by parts, so that only enthalpies are needed and no heat capacity} */
    SpecificEnergy endoreversibleWorkFrom(Temperature supply) {
        final double hotKelvin = supply.inKelvin();
        final double step = (hotKelvin - lowestKelvin) / INTERVALS;
        double sum = 0;
        for (int i = 0; i <= INTERVALS; i++) {
            final double kelvin = i == INTERVALS ? hotKelvin : lowestKelvin + i * step;
            final double weight = i == 0 || i == INTERVALS ? 1 : i % 2 == 1 ? 4 : 2;
            sum += weight * heat(kelvin) * slopeOfEfficiency(kelvin);
        }
        final double hotEnd = heat(hotKelvin) * (1 - Math.sqrt(ambientKelvin / hotKelvin));
        return SpecificEnergy.joulesPerKilogram(hotEnd - sum * step / 3);
    }

    private double heat(double kelvin) {
        return fluid.state(Temperature.kelvin(kelvin), pressure).enthalpy().si()
                - cold.enthalpy().si();
    }

    /** {@return d(1 - sqrt(T0/T))/dT} */
    private double slopeOfEfficiency(double kelvin) {
        return Math.sqrt(ambientKelvin / kelvin) / (2 * kelvin);
    }
}
