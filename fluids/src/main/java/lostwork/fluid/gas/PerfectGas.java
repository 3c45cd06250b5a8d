package lostwork.fluid.gas;

import lostwork.fluid.Fluid;
import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidRange;
import lostwork.fluid.Phase;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.Provenance;
import lostwork.fluid.StatePoint;
import lostwork.quantity.MolarMass;
import lostwork.quantity.SpecificHeatCapacity;

/**
 * A perfect gas: p v = R T with a constant heat capacity.
 *
 * <p>Datum: h = 0 and s = 0 at 298.15 K and 1 bar.
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
     */
    public static PerfectGas of(String name, MolarMass molarMass, SpecificHeatCapacity heatCapacity) {
        return new PerfectGas(new Model(name, molarMass.si(), heatCapacity.si()));
    }

    private static final class Model implements FluidModel {
        /** Molar gas constant, exact: 8.31446261815324 J/(mol K) (SI Brochure, 9th edition). */
        private static final double MOLAR_GAS_CONSTANT = 8.31446261815324;

        private static final double DATUM_TEMPERATURE_K = 298.15;
        private static final double DATUM_PRESSURE_PA = 1e5;

        private final String name;
        private final double molarMass;
        private final double gasConstant;
        private final double heatCapacity;
        private final FluidRange range;

        Model(String name, double molarMass, double heatCapacity) {
            this.name = name;
            this.molarMass = molarMass;
            this.heatCapacity = heatCapacity;
            gasConstant = MOLAR_GAS_CONSTANT / molarMass;
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
            return Provenance.of("perfect gas: p v = R T, constant cp")
                    .withDatum("h = 0 and s = 0 at 298.15 K and 1 bar");
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
        public void atPressureEnthalpy(double pressure, double enthalpy, StatePoint out) {
            evaluate(enthalpy / heatCapacity + DATUM_TEMPERATURE_K, pressure, PhaseSide.VAPOUR, out);
        }

        @Override
        public void atPressureEntropy(double pressure, double entropy, StatePoint out) {
            final double temperature = DATUM_TEMPERATURE_K
                    * Math.exp((entropy + gasConstant * Math.log(pressure / DATUM_PRESSURE_PA)) / heatCapacity);
            evaluate(temperature, pressure, PhaseSide.VAPOUR, out);
        }
    }
}
