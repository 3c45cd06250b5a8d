package lostwork.fluid.gas;

import lostwork.fluid.Fluid;
import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidRange;
import lostwork.fluid.Phase;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.Provenance;
import lostwork.fluid.StatePoint;
import lostwork.quantity.MolarMass;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificHeatCapacity;

/**
 * A perfect gas: p v = R T with a constant heat capacity.
 *
 * <h2>Formula</h2>
 * <p>With R the molar gas constant over the molar mass, T<sub>0</sub> = 298.15 K and p<sub>0</sub> = 1 bar:
 *
 * <pre>
 * v = R T/p    h = cp (T - T0)    s = cp ln(T/T0) - R ln(p/p0)    cv = cp - R    w² = (cp/cv) R T
 * </pre>
 *
 * <p>Every pair of properties is inverted in closed form.
 *
 * <h2>Range</h2>
 * <p>1 K to 10 000 K and 1 mPa to 100 000 bar: the equations hold anywhere, and the range only keeps numbers finite. How
 * well a real gas follows them is for the user to judge; the usual use is textbook air with cp/cv = 1.4.
 *
 * <h2>Datum</h2>
 * <p>h = 0 and s = 0 at 298.15 K and 1 bar. There are no formation data.
 *
 * <h2>Example</h2>
 * <pre>{@code
 * var air = PerfectGas.of("air", MolarMass.gramsPerMole(28.96), Ratio.fraction(1.4));
 * air.state(bar(1), celsius(20)).speedOfSound();      // 343.2 m/s
 * }</pre>
 *
 * <p>This class is immutable and thread-safe.
 */
public final class PerfectGas extends Fluid {
    private PerfectGas(Model model) {
        super(model);
    }

    /**
     * {@return a perfect gas}
     *
     * @param name the name
     * @param molarMass the molar mass, above 0
     * @param heatCapacity the isobaric heat capacity, above R/M
     * @throws OutOfRangeException if the heat capacity is not above R/M, so that cv would not be above 0
     * @throws IllegalArgumentException if the molar mass is not above 0
     */
    public static PerfectGas of(String name, MolarMass molarMass, SpecificHeatCapacity heatCapacity) {
        final double gasConstant = gasConstant(molarMass);
        if (!(heatCapacity.si() > gasConstant)) {
            throw new OutOfRangeException(
                    "isobaric heat capacity of " + name,
                    heatCapacity.si(),
                    gasConstant,
                    Double.MAX_VALUE,
                    "J/(kg K)",
                    "cp must be above R/M, so that cv is above 0",
                    "check whether it is a molar or an isochoric value");
        }
        return new PerfectGas(new Model(name, molarMass.si(), gasConstant, heatCapacity.si()));
    }

    /**
     * {@return a perfect gas}
     *
     * @param name the name
     * @param molarMass the molar mass, above 0
     * @param heatCapacityRatio cp/cv, above 1: 5/3 for monatomic gases, 1.4 for diatomic ones
     * @throws OutOfRangeException if the ratio is not above 1
     * @throws IllegalArgumentException if the molar mass is not above 0
     */
    public static PerfectGas of(String name, MolarMass molarMass, Ratio heatCapacityRatio) {
        final double kappa = heatCapacityRatio.si();
        if (!(kappa > 1)) {
            throw new OutOfRangeException(
                    "heat capacity ratio of " + name, kappa, 1, Double.MAX_VALUE, "1", "cp/cv must be above 1", "");
        }
        final double gasConstant = gasConstant(molarMass);
        return new PerfectGas(new Model(name, molarMass.si(), gasConstant, kappa / (kappa - 1) * gasConstant));
    }

    private static double gasConstant(MolarMass molarMass) {
        if (!(molarMass.si() > 0)) {
            throw new IllegalArgumentException("molar mass = " + molarMass + "; it must be above 0");
        }
        return Model.MOLAR_GAS_CONSTANT / molarMass.si();
    }

    private static final class Model implements FluidModel {
        /** Molar gas constant, exact: 8.31446261815324 J/(mol K) (SI Brochure, 9th edition). */
        private static final double MOLAR_GAS_CONSTANT = 8.31446261815324;

        private static final double DATUM_TEMPERATURE_K = 298.15;
        private static final double DATUM_PRESSURE_PA = 1e5;

        /** Relative width within which a computed value over a limit is taken as the limit. */
        private static final double ROUNDING = 1e-12;

        private final String name;
        private final double molarMass;
        private final double gasConstant;
        private final double heatCapacity;
        private final FluidRange range;

        Model(String name, double molarMass, double gasConstant, double heatCapacity) {
            this.name = name;
            this.molarMass = molarMass;
            this.heatCapacity = heatCapacity;
            this.gasConstant = gasConstant;
            range = new FluidRange(1, 1e4, 1e-3, 1e10, "perfect gas " + name);
        }

        @Override
        public String name() {
            return name;
        }

        @Override
        public double molarMass() {
            return molarMass;
        }

        @Override
        public FluidRange range() {
            return range;
        }

        @Override
        public Provenance provenance() {
            return Provenance.of("perfect gas: p v = R T, constant cp = " + heatCapacity + " J/(kg K), R = "
                            + gasConstant + " J/(kg K)")
                    .withSource(
                            "SI Brochure, 9th edition (2019): molar gas constant 8.31446261815324 J/(mol K)", "exact")
                    .withSource("molar mass and heat capacity", "given by the user of the library")
                    .withRange("1 K to 10 000 K, 1e-3 Pa to 1e10 Pa, as far as numbers go")
                    .withUncertainty("none published: it depends on how far the real gas follows the equations")
                    .withDatum("h = 0 and s = 0 at 298.15 K and 1 bar; no formation data")
                    .withReservation("real heat capacities change with temperature: by 5 % for air from 20 °C to 400 °C"
                            + " (from memory)");
        }

        @Override
        public boolean enthalpyDependsOnPressure() {
            return false;
        }

        @Override
        public void evaluate(double temperature, double pressure, PhaseSide side, StatePoint out) {
            out.setSinglePhase(
                    temperature,
                    pressure,
                    gasConstant * temperature / pressure,
                    heatCapacity * (temperature - DATUM_TEMPERATURE_K),
                    heatCapacity * Math.log(temperature / DATUM_TEMPERATURE_K)
                            - gasConstant * Math.log(pressure / DATUM_PRESSURE_PA),
                    heatCapacity,
                    gasConstant / pressure,
                    -gasConstant * temperature / (pressure * pressure),
                    Phase.GAS);
        }

        @Override
        public void atTemperaturePressure(double temperature, double pressure, StatePoint out) {
            range.requireTemperature(temperature);
            range.requirePressure(pressure);
            evaluate(temperature, pressure, PhaseSide.VAPOUR, out);
        }

        @Override
        public void atPressureEnthalpy(double pressure, double enthalpy, StatePoint out) {
            atRounded(temperatureOfEnthalpy(enthalpy), pressure, out);
        }

        @Override
        public void atPressureEntropy(double pressure, double entropy, StatePoint out) {
            final double temperature = DATUM_TEMPERATURE_K
                    * Math.exp((entropy + gasConstant * Math.log(pressure / DATUM_PRESSURE_PA)) / heatCapacity);
            atRounded(temperature, pressure, out);
        }

        @Override
        public void atPressureVolume(double pressure, double volume, StatePoint out) {
            atRounded(pressure * volume / gasConstant, pressure, out);
        }

        @Override
        public void atTemperatureEntropy(double temperature, double entropy, StatePoint out) {
            atRounded(temperature, pressureOfEntropy(temperature, entropy), out);
        }

        @Override
        public void atTemperatureVolume(double temperature, double volume, StatePoint out) {
            atRounded(temperature, gasConstant * temperature / volume, out);
        }

        @Override
        public void atEnthalpyEntropy(double enthalpy, double entropy, StatePoint out) {
            final double temperature = temperatureOfEnthalpy(enthalpy);
            atRounded(temperature, pressureOfEntropy(temperature, entropy), out);
        }

        @Override
        public void atInternalEnergyVolume(double internalEnergy, double volume, StatePoint out) {
            // u = h - p v = cp (T - T0) - R T
            final double temperature =
                    (internalEnergy + heatCapacity * DATUM_TEMPERATURE_K) / (heatCapacity - gasConstant);
            atTemperatureVolume(temperature, volume, out);
        }

        @Override
        public void atEntropyVolume(double entropy, double volume, StatePoint out) {
            // s = cv ln(T/T0) + R ln(v/v0)
            final double expansion = Math.log(volume * DATUM_PRESSURE_PA / (gasConstant * DATUM_TEMPERATURE_K));
            final double temperature =
                    DATUM_TEMPERATURE_K * Math.exp((entropy - gasConstant * expansion) / (heatCapacity - gasConstant));
            atTemperatureVolume(temperature, volume, out);
        }

        /** Takes a computed temperature or pressure that rounding has carried over a limit as that limit. */
        private void atRounded(double temperature, double pressure, StatePoint out) {
            atTemperaturePressure(
                    rounded(temperature, range.lowestTemperature(), range.highestTemperature()),
                    rounded(pressure, range.lowestPressure(), range.highestPressure()),
                    out);
        }

        private static double rounded(double value, double low, double high) {
            if (value < low && value >= low * (1 - ROUNDING)) {
                return low;
            }
            return value > high && value <= high * (1 + ROUNDING) ? high : value;
        }

        private double temperatureOfEnthalpy(double enthalpy) {
            return enthalpy / heatCapacity + DATUM_TEMPERATURE_K;
        }

        private double pressureOfEntropy(double temperature, double entropy) {
            return DATUM_PRESSURE_PA
                    * Math.exp((heatCapacity * Math.log(temperature / DATUM_TEMPERATURE_K) - entropy) / gasConstant);
        }
    }
}
