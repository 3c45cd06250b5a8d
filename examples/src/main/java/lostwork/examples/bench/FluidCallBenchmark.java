package lostwork.examples.bench;

import static lostwork.fluid.gas.MoleFraction.carbonDioxide;
import static lostwork.fluid.gas.MoleFraction.nitrogen;
import static lostwork.fluid.gas.MoleFraction.oxygen;
import static lostwork.fluid.gas.MoleFraction.waterVapour;

import java.util.List;
import java.util.concurrent.TimeUnit;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidState;
import lostwork.fluid.StatePoint;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.gas.GasComposition;
import lostwork.fluid.gas.IdealGas;
import lostwork.fluid.gas.PerfectGas;
import lostwork.fluid.water.Water;
import lostwork.quantity.MolarMass;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.Temperature;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/**
 * The typed face of a fluid against calls of its primitive model with a point that is kept.
 *
 * <p>In most programs several fluids are in use and no call site knows which model it meets; the case {@code several}
 * prepares that. In the case {@code one} the compiler can look through all calls.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
public class FluidCallBenchmark {
    private static final int PREPARING_CALLS = 20_000;

    /** The fluid. */
    public enum Substance {
        /** Perfect gas. */
        PERFECT_GAS(PerfectGas.of("perfect air", MolarMass.gramsPerMole(28.96), Ratio.fraction(1.4))),
        /** Dry air of variable heat capacity. */
        DRY_AIR(DryAir.standard()),
        /** Steam by IAPWS-IF97. */
        STEAM(Water.industrial());

        private final Fluid fluid;

        Substance(Fluid fluid) {
            this.fluid = fluid;
        }
    }

    /** How many kinds of fluids the process has used. */
    public enum Loaded {
        /** Only the one that is measured. */
        ONE,
        /** All, and a flue gas. */
        SEVERAL
    }

    /** The fluid that is measured. */
    @Param
    public Substance substance = Substance.DRY_AIR;

    /** What else was in use before. */
    @Param
    public Loaded loaded = Loaded.SEVERAL;

    private final StatePoint point = new StatePoint();
    private Fluid fluid = Substance.DRY_AIR.fluid;
    private FluidModel model = fluid.model();
    private double temperature = 640;
    private double pressure = 6e5;
    private double outletPressure = 1e5;
    private double efficiency = 0.85;

    /** Uses the other fluids, if several are asked for. */
    @Setup
    public void prepare() {
        fluid = substance.fluid;
        model = fluid.model();
        if (loaded == Loaded.SEVERAL) {
            final Fluid flueGas =
                    IdealGas.of(GasComposition.of(nitrogen(0.72), carbonDioxide(0.1), waterVapour(0.15), oxygen(0.03)));
            double sum = 0;
            for (Fluid other : List.of(
                    flueGas, Substance.PERFECT_GAS.fluid, Substance.STEAM.fluid, Substance.DRY_AIR.fluid, flueGas)) {
                fluid = other;
                model = other.model();
                for (int k = 0; k < PREPARING_CALLS; k++) {
                    sum += enthalpyRaw() + enthalpyTyped() + expansionRaw() + expansionTyped();
                }
            }
            fluid = substance.fluid;
            model = fluid.model();
            if (!(sum < Double.POSITIVE_INFINITY)) {
                throw new IllegalStateException("sum = " + sum);
            }
        }
    }

    /** {@return the enthalpy in J/kg at a temperature and a pressure, from the model} */
    @Benchmark
    public double enthalpyRaw() {
        model.atTemperaturePressure(temperature, pressure, point);
        return point.enthalpy;
    }

    /** {@return the enthalpy in J/kg at a temperature and a pressure, from the fluid} */
    @Benchmark
    @HeldTo(baseline = "enthalpyRaw", atMost = 1.1)
    public double enthalpyTyped() {
        return fluid.state(Temperature.kelvin(temperature), Pressure.pascal(pressure))
                .enthalpy()
                .si();
    }

    /** {@return the temperature in K behind a turbine, from the model} */
    @Benchmark
    public double expansionRaw() {
        model.atTemperaturePressure(temperature, pressure, point);
        final double inlet = point.enthalpy;
        model.atPressureEntropy(outletPressure, point.entropy, point);
        model.atPressureEnthalpy(outletPressure, inlet - efficiency * (inlet - point.enthalpy), point);
        return point.temperature;
    }

    /** {@return the temperature in K behind a turbine, from the fluid} */
    @Benchmark
    @HeldTo(baseline = "expansionRaw", atMost = 1.1)
    public double expansionTyped() {
        final FluidState inlet = fluid.state(Temperature.kelvin(temperature), Pressure.pascal(pressure));
        final Pressure outlet = Pressure.pascal(outletPressure);
        final SpecificEntropy entropy = inlet.entropy();
        final SpecificEnergy drop =
                inlet.enthalpy().minus(fluid.state(outlet, entropy).enthalpy());
        return fluid.state(outlet, inlet.enthalpy().minus(drop.times(efficiency)))
                .temperature()
                .si();
    }
}
