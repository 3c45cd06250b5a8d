package lostwork.examples.bench;

import java.util.concurrent.TimeUnit;
import lostwork.fluid.FluidModel;
import lostwork.fluid.MixturePoint;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.StatePoint;
import lostwork.fluid.gas.IdealMixtureModel;
import lostwork.fluid.gas.Species;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;

/**
 * Heat capacity, enthalpy and entropy of a flue gas of six species, against a loop over the coefficients as published:
 * each species by itself, then mixed.
 *
 * <p>Mole fractions and temperatures change from call to call where the composition is variable; a model of fixed
 * composition has its mixture formed before.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
public class MixtureBenchmark {
    /** In J/(mol K): SI Brochure, 9th edition. */
    private static final double GAS_CONSTANT = 8.31446261815324;
    /** In J/(mol K): the value that the coefficients were made with, NASA/TP-2002-211556. */
    private static final double GAS_CONSTANT_OF_COEFFICIENTS = 8.31451;

    private static final Species[] SPECIES = {Species.N2, Species.O2, Species.AR, Species.CO2, Species.H2O, Species.SO2
    };
    private static final int COUNT = SPECIES.length;
    private static final int MASK = 63;

    private final double[][] coldCoefficients = new double[COUNT][];
    private final double[][] hotCoefficients = new double[COUNT][];
    private final double[] molarMasses = new double[COUNT];
    private final double[] fractions = {0.715, 0.04, 0.009, 0.085, 0.15, 0.001};
    private final double[] temperatures = new double[MASK + 1];

    private final IdealMixtureModel mixture = IdealMixtureModel.of("flue gas", SPECIES);
    private final FluidModel fixed = mixture.withComposition(fractions);
    private final StatePoint point = new StatePoint();
    private final MixturePoint mixturePoint = new MixturePoint(COUNT);
    private double pressure = 1.013e5;
    private double mixingTerm;
    private int next;

    /** Reads the coefficients and spreads the temperatures over both ranges of the polynomials. */
    public MixtureBenchmark() {
        for (int i = 0; i < COUNT; i++) {
            final double[][] ranges = CoefficientFile.nineCoefficients(SPECIES[i].name());
            coldCoefficients[i] = ranges[0];
            hotCoefficients[i] = ranges[1];
            molarMasses[i] = SPECIES[i].molarMass().si();
            mixingTerm -= fractions[i] * Math.log(fractions[i]);
        }
        for (int k = 0; k <= MASK; k++) {
            temperatures[k] = 350 + 611 * k % 1250;
        }
    }

    private double nextTemperature() {
        return temperatures[next++ & MASK];
    }

    /** {@return cp + h/T + s in J/(kg K) of the fixed composition, by hand} */
    @Benchmark
    public double fixedByHand() {
        final double t = nextTemperature();
        final double ln = Math.log(t);
        final double lnP = Math.log(pressure / 1e5);
        double molarMass = 0;
        double cp = 0;
        double h = 0;
        double s = 0;
        for (int i = 0; i < COUNT; i++) {
            final double[] a = t <= 1000 ? coldCoefficients[i] : hotCoefficients[i];
            final double x = fractions[i];
            molarMass += x * molarMasses[i];
            cp += x * heatCapacity(a, t);
            h += x * enthalpy(a, t, ln);
            s += x * entropy(a, t, ln);
        }
        return ((cp + h / t + s) * GAS_CONSTANT_OF_COEFFICIENTS + (mixingTerm - lnP) * GAS_CONSTANT) / molarMass;
    }

    /** {@return cp + h/T + s in J/(kg K) of the fixed composition, from its model} */
    @Benchmark
    @HeldTo(baseline = "fixedByHand", atMost = 1.1, withoutAllocation = true)
    public double fixedModel() {
        final double t = nextTemperature();
        fixed.evaluate(t, pressure, PhaseSide.VAPOUR, point);
        return point.heatCapacity + point.enthalpy / t + point.entropy;
    }

    /** {@return cp + h/T + s in J/(kg K) of a composition that may change with every call, by hand} */
    @Benchmark
    public double variableByHand() {
        final double t = nextTemperature();
        final double ln = Math.log(t);
        final double lnP = Math.log(pressure / 1e5);
        double molarMass = 0;
        double cp = 0;
        double h = 0;
        double s = 0;
        double mixing = 0;
        for (int i = 0; i < COUNT; i++) {
            final double[] a = t <= 1000 ? coldCoefficients[i] : hotCoefficients[i];
            final double x = fractions[i];
            molarMass += x * molarMasses[i];
            cp += x * heatCapacity(a, t);
            h += x * enthalpy(a, t, ln);
            s += x * entropy(a, t, ln);
            mixing += x * (Math.log(x) + lnP);
        }
        return ((cp + h / t + s) * GAS_CONSTANT_OF_COEFFICIENTS - mixing * GAS_CONSTANT) / molarMass;
    }

    /** {@return cp + h/T + s in J/(kg K) of a composition that may change; the partial properties are made as well} */
    @Benchmark
    @HeldTo(baseline = "variableByHand", atMost = 1.1, withoutAllocation = true)
    public double variableModel() {
        final double t = nextTemperature();
        mixture.evaluate(t, pressure, fractions, PhaseSide.VAPOUR, mixturePoint);
        return (mixturePoint.heatCapacity + mixturePoint.enthalpy / t + mixturePoint.entropy) / mixturePoint.molarMass;
    }

    private static double heatCapacity(double[] a, double t) {
        return a[0] / (t * t) + a[1] / t + a[2] + t * (a[3] + t * (a[4] + t * (a[5] + t * a[6])));
    }

    private static double enthalpy(double[] a, double t, double ln) {
        return -a[0] / t
                + a[1] * ln
                + a[7]
                + t * (a[2] + t * (a[3] / 2 + t * (a[4] / 3 + t * (a[5] / 4 + t * a[6] / 5))));
    }

    private static double entropy(double[] a, double t, double ln) {
        return -a[0] / (2 * t * t)
                - a[1] / t
                + a[2] * ln
                + a[8]
                + t * (a[3] + t * (a[4] / 2 + t * (a[5] / 3 + t * a[6] / 4)));
    }
}
