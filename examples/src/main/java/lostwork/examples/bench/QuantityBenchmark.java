package lostwork.examples.bench;

import java.util.concurrent.TimeUnit;
import lostwork.quantity.Conductance;
import lostwork.quantity.HeatCapacityRate;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.SpecificHeatCapacity;
import lostwork.quantity.Temperature;
import lostwork.quantity.TemperatureSpan;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/**
 * Typed quantities against the same arithmetic in raw doubles.
 *
 * <p>One invocation works through a list of {@value #STREAMS} streams, as a survey does, so that the few nanoseconds of a
 * single one can be told from the harness. Each group of methods is a task: the heat of a stream from a list of numbers
 * with units, the same from stored quantities, a chain of temperatures and spans, and the cycle of a gas turbine.
 *
 * <p>Every quantity refuses NaN and infinity, and a refusal costs a comparison. In chains of a few nanoseconds that shows,
 * so these chains have two baselines: raw doubles, and raw doubles with the same refusals. Against the second one is seen
 * what the types cost.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
public class QuantityBenchmark {
    static final int STREAMS = 256;

    private static final double HEAT_CAPACITY_RATIO = 1.4;

    private final double[] flows = new double[STREAMS];
    private final double[] hots = new double[STREAMS];
    private final double[] colds = new double[STREAMS];
    private final double[] ratios = new double[STREAMS];
    private final MassFlow[] typedFlows = new MassFlow[STREAMS];
    private final SpecificEnergy[] typedHots = new SpecificEnergy[STREAMS];
    private final SpecificEnergy[] typedColds = new SpecificEnergy[STREAMS];

    private double efficiency = 0.87;

    /** Makes the streams, and uses several kinds of quantities so that the shared code serves more than one class. */
    @Setup
    public void prepare() {
        for (int k = 0; k < STREAMS; k++) {
            flows[k] = 20 + 0.31 * k;
            hots[k] = 400 + 1.7 * k;
            colds[k] = 120 + 0.3 * k;
            ratios[k] = 6 + 0.05 * k;
            typedFlows[k] = MassFlow.tonnesPerHour(flows[k]);
            typedHots[k] = SpecificEnergy.kilojoulesPerKilogram(hots[k]);
            typedColds[k] = SpecificEnergy.kilojoulesPerKilogram(colds[k]);
        }
        double used = 0;
        for (int k = 1; k < 20_000; k++) {
            used += Power.kilowatts(k)
                    .plus(Power.watts(k))
                    .minus(Power.megawatts(1))
                    .si();
            used += TemperatureSpan.kelvins(k)
                    .plus(TemperatureSpan.kelvins(1))
                    .times(2)
                    .si();
            used += SpecificEnergy.joulesPerKilogram(k)
                    .minus(SpecificEnergy.joulesPerKilogram(1))
                    .dividedBy(3)
                    .si();
            used += SpecificEntropy.joulesPerKilogramKelvin(k)
                    .plus(SpecificEntropy.joulesPerKilogramKelvin(1))
                    .times(Ratio.percent(k))
                    .si();
            used += MassFlow.kilogramsPerHour(k)
                    .plus(MassFlow.tonnesPerHour(1))
                    .negated()
                    .si();
            used += Pressure.bar(k).inBar() + Temperature.celsius(k).inFahrenheit();
        }
        if (!(used < Double.POSITIVE_INFINITY)) {
            throw new IllegalStateException("sum = " + used);
        }
    }

    /** {@return the heat of all streams in MW, from t/h and kJ/kg in doubles} */
    @Benchmark
    @OperationsPerInvocation(STREAMS)
    public double heatOfNumbersRaw() {
        double sum = 0;
        for (int k = 0; k < STREAMS; k++) {
            sum += flows[k] * 1000 / 3600 * (hots[k] * 1000 - colds[k] * 1000) / 1e6;
        }
        return sum;
    }

    /** {@return the heat of all streams in MW, from t/h and kJ/kg in quantities} */
    @Benchmark
    @OperationsPerInvocation(STREAMS)
    @HeldTo(baseline = "heatOfNumbersRaw", atMost = 1.1, withoutAllocation = true)
    public double heatOfNumbersTyped() {
        double sum = 0;
        for (int k = 0; k < STREAMS; k++) {
            final SpecificEnergy drop =
                    SpecificEnergy.kilojoulesPerKilogram(hots[k]).minus(SpecificEnergy.kilojoulesPerKilogram(colds[k]));
            sum += MassFlow.tonnesPerHour(flows[k]).times(drop).inMegawatts();
        }
        return sum;
    }

    /** {@return the heat of all streams in W, from stored SI doubles} */
    @Benchmark
    @OperationsPerInvocation(STREAMS)
    public double heatOfStoredRaw() {
        double sum = 0;
        for (int k = 0; k < STREAMS; k++) {
            sum += flows[k] * (1000 / 3600.0) * ((hots[k] - colds[k]) * 1000);
        }
        return sum;
    }

    /** {@return the heat of all streams in W, from stored quantities: one object more to load for each value} */
    @Benchmark
    @OperationsPerInvocation(STREAMS)
    @HeldTo(baseline = "heatOfStoredRaw", withoutAllocation = true)
    public double heatOfStoredTyped() {
        double sum = 0;
        for (int k = 0; k < STREAMS; k++) {
            sum += typedFlows[k].times(typedHots[k].minus(typedColds[k])).si();
        }
        return sum;
    }

    /** {@return the heat in W that all streams give over a conductance, by logarithmic mean difference, in doubles} */
    @Benchmark
    @OperationsPerInvocation(STREAMS)
    public double exchangerRaw() {
        double sum = 0;
        for (int k = 0; k < STREAMS; k++) {
            final double hot = hots[k] + 273.15;
            final double cold = colds[k] + 273.15;
            final double atInlet = hot - (cold + ratios[k]);
            final double atOutlet = hot - 55.0 - cold;
            final double mean = (atInlet - atOutlet) / Math.log(atInlet / atOutlet);
            sum += flows[k] * 1000 * mean;
        }
        return sum;
    }

    /** {@return the same with each result refused that a quantity would refuse} */
    @Benchmark
    @OperationsPerInvocation(STREAMS)
    @HeldTo(baseline = "exchangerRaw")
    public double exchangerChecked() {
        double sum = 0;
        for (int k = 0; k < STREAMS; k++) {
            final double hot = absolute(hots[k] + 273.15);
            final double cold = absolute(colds[k] + 273.15);
            final double atInlet = finite(hot - absolute(cold + finite(ratios[k])));
            final double atOutlet = finite(absolute(hot - finite(55)) - cold);
            final double mean = finite(finite(atInlet - atOutlet) / Math.log(finite(atInlet / atOutlet)));
            sum += finite(finite(flows[k] * 1000) * mean);
        }
        return sum;
    }

    /** {@return the heat in W that all streams give over a conductance, by logarithmic mean difference, in quantities} */
    @Benchmark
    @OperationsPerInvocation(STREAMS)
    @HeldTo(baseline = "exchangerChecked", atMost = 1.1, withoutAllocation = true)
    public double exchangerTyped() {
        double sum = 0;
        for (int k = 0; k < STREAMS; k++) {
            final Temperature hot = Temperature.celsius(hots[k]);
            final Temperature cold = Temperature.celsius(colds[k]);
            final TemperatureSpan atInlet = hot.minus(cold.plus(TemperatureSpan.kelvins(ratios[k])));
            final TemperatureSpan atOutlet =
                    hot.minus(TemperatureSpan.kelvins(55)).minus(cold);
            final TemperatureSpan mean = atInlet.minus(atOutlet)
                    .dividedBy(Math.log(atInlet.over(atOutlet).si()));
            sum += Conductance.kilowattsPerKelvin(flows[k]).times(mean).si();
        }
        return sum;
    }

    /** {@return the mean efficiency of gas turbines with the pressure ratios of the list, in doubles} */
    @Benchmark
    @OperationsPerInvocation(STREAMS)
    public double gasTurbineRaw() {
        double sum = 0;
        final double exponent = (HEAT_CAPACITY_RATIO - 1) / HEAT_CAPACITY_RATIO;
        final double heatCapacity = 1005;
        for (int k = 0; k < STREAMS; k++) {
            final double inlet = 15 + 273.15;
            final double firing = hots[k] + 600 + 273.15;
            final double ideal = Math.pow(ratios[k], exponent);
            final double rise = inlet * (ideal - 1) / efficiency;
            final double drop = firing * (1 - 1 / ideal) * efficiency;
            final double flow = flows[k] * 1000 / 3600;
            final double net = flow * ((drop - rise) * heatCapacity);
            final double heat = flow * ((firing - (inlet + rise)) * heatCapacity);
            sum += net / heat;
        }
        return sum / STREAMS;
    }

    /** {@return the same with each result refused that a quantity would refuse} */
    @Benchmark
    @OperationsPerInvocation(STREAMS)
    @HeldTo(baseline = "gasTurbineRaw")
    public double gasTurbineChecked() {
        double sum = 0;
        final double exponent = (HEAT_CAPACITY_RATIO - 1) / HEAT_CAPACITY_RATIO;
        final double heatCapacity = finite(1005);
        for (int k = 0; k < STREAMS; k++) {
            final double inlet = absolute(15 + 273.15);
            final double firing = absolute(hots[k] + 600 + 273.15);
            final double ideal = Math.pow(ratios[k], exponent);
            final double rise = finite(finite(finite(inlet) * (ideal - 1)) / efficiency);
            final double drop = finite(finite(finite(firing) * (1 - 1 / ideal)) * efficiency);
            final double rate = finite(finite(flows[k] * 1000 / 3600) * heatCapacity);
            final double net = finite(finite(drop - rise) * rate);
            final double heat = finite(finite(firing - absolute(inlet + rise)) * rate);
            sum += finite(net / heat);
        }
        return sum / STREAMS;
    }

    /** {@return the mean efficiency of gas turbines with the pressure ratios of the list, in quantities} */
    @Benchmark
    @OperationsPerInvocation(STREAMS)
    @HeldTo(baseline = "gasTurbineChecked", atMost = 1.1, withoutAllocation = true)
    public double gasTurbineTyped() {
        double sum = 0;
        final double exponent = (HEAT_CAPACITY_RATIO - 1) / HEAT_CAPACITY_RATIO;
        final SpecificHeatCapacity heatCapacity = SpecificHeatCapacity.joulesPerKilogramKelvin(1005);
        for (int k = 0; k < STREAMS; k++) {
            final Temperature inlet = Temperature.celsius(15);
            final Temperature firing = Temperature.celsius(hots[k] + 600);
            final double ideal = Math.pow(ratios[k], exponent);
            final TemperatureSpan rise =
                    TemperatureSpan.kelvins(inlet.inKelvin()).times(ideal - 1).dividedBy(efficiency);
            final TemperatureSpan drop = TemperatureSpan.kelvins(firing.inKelvin())
                    .times(1 - 1 / ideal)
                    .times(efficiency);
            final HeatCapacityRate rate = MassFlow.tonnesPerHour(flows[k]).times(heatCapacity);
            final Power net = drop.minus(rise).times(rate);
            final Power heat = firing.minus(inlet.plus(rise)).times(rate);
            sum += net.over(heat).si();
        }
        return sum / STREAMS;
    }

    private static double finite(double value) {
        if (!(Math.abs(value) <= Double.MAX_VALUE)) {
            throw new IllegalArgumentException("value = " + value);
        }
        return value;
    }

    private static double absolute(double value) {
        if (!(value >= Double.MIN_VALUE && value <= Double.MAX_VALUE)) {
            throw new IllegalArgumentException("value = " + value);
        }
        return value;
    }
}
