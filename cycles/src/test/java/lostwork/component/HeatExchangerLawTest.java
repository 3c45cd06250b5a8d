package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.TemperatureSpan.kelvins;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidModel;
import lostwork.fluid.StatePoint;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.gas.PerfectGas;
import lostwork.fluid.water.Water;
import lostwork.plant.PlantSolveException;
import lostwork.plant.Solution;
import lostwork.plant.Specification;
import lostwork.plant.SpecificationException;
import lostwork.plant.Variable;
import lostwork.quantity.Conductance;
import lostwork.quantity.MolarMass;
import lostwork.quantity.ScalarQuantity;
import lostwork.quantity.SpecificHeatCapacity;
import lostwork.solve.DifferentiableFunction;
import org.junit.jupiter.api.Test;

/** Identities of heat exchangers at seeded random points. */
class HeatExchangerLawTest {
    private static final Fluid AIR = DryAir.standard();
    private static final Fluid WATER = Water.industrial();
    private static final List<FluidModel> AIR_TO_WATER = List.of(AIR.model(), WATER.model());
    private static final List<FluidModel> AIR_TO_AIR = List.of(AIR.model(), AIR.model());

    private static double enthalpy(Fluid fluid, double pascal, double kelvin) {
        final StatePoint point = new StatePoint();
        fluid.model().atTemperaturePressure(kelvin, pascal, point);
        return point.enthalpy;
    }

    private static double temperature(FluidModel model, double pascal, double enthalpy) {
        final StatePoint point = new StatePoint();
        model.atPressureEnthalpy(pascal, enthalpy, point);
        return point.temperature;
    }

    /** A waste-heat boiler with pressure losses on both sides, in the order of the arguments of the functions. */
    private static double[] boiler(SplittableRandom random) {
        final double pressure = 1e5 * Math.exp(random.nextDouble(0.7, 4.6));
        final double boiling = WATER.model().saturation().temperature(pressure);
        final double steam = boiling + random.nextDouble(5, 150);
        final double feed = random.nextDouble(300, boiling - 10);
        final double in = steam + random.nextDouble(20, 300);
        final double out = feed + random.nextDouble(20, 150);
        return new double[] {
            1.02e5,
            enthalpy(AIR, 1.02e5, in),
            1e5,
            enthalpy(AIR, 1e5, Math.min(out, in - 50)),
            pressure,
            enthalpy(WATER, pressure, steam),
            1.03 * pressure,
            enthalpy(WATER, 1.03 * pressure, feed)
        };
    }

    private static double[] recuperator(SplittableRandom random) {
        final double in = random.nextDouble(700, 1400);
        final double cold = random.nextDouble(300, 600);
        return new double[] {
            1.04e5,
            enthalpy(AIR, 1e5, in),
            1e5,
            enthalpy(AIR, 1e5, cold + random.nextDouble(5, 100)),
            9e5,
            enthalpy(AIR, 1e5, in - random.nextDouble(5, 100)),
            9.1e5,
            enthalpy(AIR, 1e5, cold)
        };
    }

    @Test
    void pinchIsTheMinimumOfAFineScan() {
        final SplittableRandom random = new SplittableRandom(11);
        for (int i = 0; i < 60; i++) {
            final boolean wet = i % 2 == 0;
            final double[] x = wet ? boiler(random) : recuperator(random);
            final List<FluidModel> fluids = wet ? AIR_TO_WATER : AIR_TO_AIR;
            final double found = new SmallestDifference(fluids).value(x, new double[8]);
            double scanned = Double.POSITIVE_INFINITY;
            final int steps = 2000;
            for (int k = 0; k <= steps; k++) {
                scanned = Math.min(scanned, difference(fluids, x, (double) k / steps));
            }
            // The scan meets a kink within half a step: at most 1000 K along the whole exchanger.
            assertTrue(found <= scanned + 1e-9, () -> "a smaller difference was missed");
            assertEquals(scanned, found, 0.5 * 1000.0 / steps);
        }
    }

    private static double difference(List<FluidModel> fluids, double[] x, double z) {
        return temperature(fluids.get(0), x[0] + z * (x[2] - x[0]), x[1] + z * (x[3] - x[1]))
                - temperature(fluids.get(1), x[4] + z * (x[6] - x[4]), x[5] + z * (x[7] - x[5]));
    }

    /** The mean against the midpoint rule with many points, whose error is of the order of their spacing squared. */
    @Test
    void meanDifferenceIsTheIntegral() {
        final SplittableRandom random = new SplittableRandom(12);
        int compared = 0;
        for (int i = 0; i < 40; i++) {
            final boolean wet = i % 2 == 0;
            final double[] x = wet ? boiler(random) : recuperator(random);
            final List<FluidModel> fluids = wet ? AIR_TO_WATER : AIR_TO_AIR;
            if (new SmallestDifference(fluids).value(x, new double[8]) < 3) {
                continue;
            }
            compared++;
            final double found = new MeanDifference(fluids).value(x, new double[8]);
            final int steps = 4000;
            double integral = 0;
            for (int k = 0; k < steps; k++) {
                integral += 1 / difference(fluids, x, (k + 0.5) / steps) / steps;
            }
            assertEquals(1 / integral, found, 1e-5 * found);
        }
        assertTrue(compared > 15, "compared " + compared);
    }

    /**
     * Gradients against central differences. Where a step moves the minimum to another place there is no derivative to
     * compare with; both one-sided differences then tell.
     */
    @Test
    void gradientsAreThoseOfTheFunctions() {
        final SplittableRandom random = new SplittableRandom(13);
        int compared = 0;
        for (int i = 0; i < 100; i++) {
            final boolean wet = i % 2 == 0;
            final double[] x = wet ? boiler(random) : recuperator(random);
            final List<FluidModel> fluids = wet ? AIR_TO_WATER : AIR_TO_AIR;
            compared += compareGradient(new SmallestDifference(fluids), x, wet);
            compared += compareGradient(new MeanDifference(fluids), x, wet);
        }
        assertTrue(compared > 1400, "compared " + compared);
    }

    private static int compareGradient(DifferentiableFunction f, double[] x, boolean wet) {
        final double[] gradient = new double[8];
        final double[] scratch = new double[8];
        final double value = f.value(x, gradient);
        int compared = 0;
        for (int k = 0; k < 8; k++) {
            final double step = k % 2 == 0 ? 3e-5 * x[k] : 30;
            final double[] y = x.clone();
            y[k] = x[k] + step;
            final double up = f.value(y, scratch);
            y[k] = x[k] - step;
            final double down = f.value(y, scratch);
            final double bend = Math.abs(up - 2 * value + down);
            if (bend > 2e-3 * Math.max(Math.abs(up - down), 1e-4)) {
                continue; // the place of the minimum changes, or the function is too curved for this step
            }
            compared++;
            // Along the saturation line dT/dp is that of Clausius and Clapeyron; the saturation equation of IAPWS-IF97
            // agrees
            // with its regions 1 and 2 to some 1e-5 only, and the differences of pressure count with the enthalpies.
            final double room = k % 2 == 0 && wet ? 2e-3 : 2e-5;
            assertEquals(
                    (up - down) / (2 * step),
                    gradient[k],
                    room * Math.abs(gradient[k]) + 1e-9 * Math.max(1, Math.abs(value)) / step,
                    f.getClass().getSimpleName() + " argument " + k);
        }
        return compared;
    }

    @Test
    void theFunctionsAreContinuousWhereAKinkLeavesTheExchanger() {
        final double pressure = 20e5;
        final double boiling = WATER.model().saturation().temperature(pressure);
        final StatePoint dry = new StatePoint();
        WATER.model().atPressureVapourFraction(pressure, 1, dry);
        final double[] x = {
            1e5,
            enthalpy(AIR, 1e5, 800),
            1e5,
            enthalpy(AIR, 1e5, 520),
            pressure,
            dry.enthalpy,
            pressure,
            enthalpy(WATER, pressure, boiling - 80)
        };
        for (DifferentiableFunction f :
                List.of(new SmallestDifference(AIR_TO_WATER), new MeanDifference(AIR_TO_WATER))) {
            final double[] gradient = new double[8];
            x[5] = dry.enthalpy - 1;
            final double inside = f.value(x, gradient);
            x[5] = dry.enthalpy;
            final double on = f.value(x, gradient);
            x[5] = dry.enthalpy + 1;
            final double outside = f.value(x, gradient);
            assertEquals(on, inside, 1e-3);
            assertEquals(on, outside, 1e-3);
        }
    }

    @Test
    void crossedStreamsHaveTheNegativePinchAsMean() {
        final SplittableRandom random = new SplittableRandom(14);
        int crossed = 0;
        for (int i = 0; i < 60; i++) {
            final double[] x = boiler(random);
            x[3] = enthalpy(AIR, 1e5, 290);
            final double pinch = new SmallestDifference(AIR_TO_WATER).value(x, new double[8]);
            if (pinch <= 0) {
                crossed++;
                assertEquals(pinch, new MeanDifference(AIR_TO_WATER).value(x, new double[8]));
            }
        }
        assertTrue(crossed > 40, "crossed " + crossed);
    }

    /** Trial points far outside the range of the fluids still give finite numbers. */
    @Test
    void trialPointsOutsideTheRangeStayFinite() {
        final SplittableRandom random = new SplittableRandom(15);
        for (int i = 0; i < 200; i++) {
            final double[] x = boiler(random);
            x[1 + 2 * random.nextInt(4)] += random.nextDouble(-8e6, 8e6);
            x[2 * random.nextInt(4)] *= Math.exp(random.nextDouble(-9, 9));
            for (DifferentiableFunction f :
                    List.of(new SmallestDifference(AIR_TO_WATER), new MeanDifference(AIR_TO_WATER))) {
                final double[] gradient = new double[8];
                assertTrue(Double.isFinite(f.value(x, gradient)));
                for (double g : gradient) {
                    assertTrue(Double.isFinite(g));
                }
            }
        }
    }

    /** With constant heat capacities: ε = (1 − exp(−NTU (1 − C)))/(1 − C exp(−NTU (1 − C))), Kays and London. */
    @Test
    void effectivenessOfConstantHeatCapacities() {
        final Fluid gas =
                PerfectGas.of("gas", MolarMass.gramsPerMole(30), SpecificHeatCapacity.joulesPerKilogramKelvin(1000));
        final var p = new TwoStreams(gas, gas, FlowArrangement.COUNTERFLOW);
        final SplittableRandom random = new SplittableRandom(16);
        for (int i = 0; i < 50; i++) {
            final double hot = random.nextDouble(0.5, 5);
            final double cold = random.nextDouble(0.5, 5);
            final double units = random.nextDouble(0.1, 8);
            final double least = Math.min(hot, cold);
            final double ratio = least / Math.max(hot, cold);
            final Solution s = p.plant
                    .specify()
                    .given(p.hot.flow(), kilogramsPerSecond(hot))
                    .given(p.cold.flow(), kilogramsPerSecond(cold))
                    .given(p.hot.temperature(), celsius(400))
                    .given(p.cold.temperature(), celsius(20))
                    .given(p.hot.pressure(), bar(1))
                    .given(p.cold.pressure(), bar(1))
                    .given(p.exchanger.conductance(), Conductance.kilowattsPerKelvin(units * least))
                    .solve();
            final double decay = Math.exp(-units * (1 - ratio));
            assertEquals(
                    (1 - decay) / (1 - ratio * decay),
                    s.value(p.exchanger.effectiveness()).si(),
                    1e-9);
        }
    }

    /**
     * Boilers solved from a given pinch and superheat, then from every other pair of what the exchanger knows, with the
     * value it had: the original point comes back. A pair may be refused in words; it may have a second solution, which
     * then meets what is given; it is never met by a wrong point.
     */
    @Test
    void whatIsGivenCanBeExchanged() {
        final var p = new TwoStreams(AIR, WATER, FlowArrangement.COUNTERFLOW);
        final SplittableRandom random = new SplittableRandom(17);
        final List<Variable<?>> choice = List.of(
                p.exchanger.pinch(),
                p.exchanger.conductance(),
                p.exchanger.effectiveness(),
                p.exchanger.warmEndDifference(),
                p.exchanger.coldEndDifference(),
                p.exchanger.meanDifference(),
                p.exchanger.duty(),
                p.cold.flow(),
                p.coldEnd.temperature(),
                p.hotEnd.temperature(),
                p.exchanger.coldOutlet().superheat());
        int returned = 0;
        int another = 0;
        int undetermined = 0;
        final List<String> failed = new ArrayList<>();
        for (int i = 0; i < 400; i++) {
            final double pressure = random.nextDouble(2, 100);
            final double boiling = WATER.saturation(bar(pressure)).temperature().inCelsius();
            final double pinch = random.nextDouble(3, 40);
            final double superheat = random.nextDouble(5, 150);
            final Specification base = p.plant
                    .specify()
                    .given(p.hot.flow(), kilogramsPerSecond(random.nextDouble(5, 60)))
                    .given(p.hot.temperature(), celsius(boiling + pinch + superheat + random.nextDouble(10, 250)))
                    .given(p.hot.pressure(), bar(1.02))
                    .given(p.cold.temperature(), celsius(random.nextDouble(20, Math.min(110, boiling - 5))))
                    .given(p.cold.pressure(), bar(pressure));
            final Solution first = base.given(p.exchanger.coldOutlet().superheat(), kelvins(superheat))
                    .given(p.exchanger.pinch(), kelvins(pinch))
                    .solve();
            assertEquals(pinch, first.value(p.exchanger.pinch()).inKelvins(), 1e-7);
            final Variable<?> a = choice.get(random.nextInt(choice.size()));
            final Variable<?> b = choice.get(random.nextInt(choice.size()));
            if (a.equals(b)) {
                continue;
            }
            try {
                final Solution second = give(give(base, first, a), first, b).solve();
                assertEquals(si(first, a), si(second, a), 1e-6 * Math.max(1, Math.abs(si(first, a))), a.toString());
                assertEquals(si(first, b), si(second, b), 1e-6 * Math.max(1, Math.abs(si(first, b))), b.toString());
                if (Math.abs(si(second, p.cold.flow()) / si(first, p.cold.flow()) - 1) < 1e-6) {
                    returned++;
                } else {
                    another++;
                }
            } catch (SpecificationException e) {
                undetermined++;
            } catch (PlantSolveException e) {
                if (e.reason() == PlantSolveException.Reason.UNDETERMINED) {
                    undetermined++;
                } else {
                    failed.add(a + ", " + b + ": " + e.getMessage());
                }
            }
        }
        final String counts = returned + " returned, " + another + " found another solution, " + undetermined
                + " undetermined, " + failed.size() + " failed: " + failed;
        assertTrue(returned + another + undetermined + failed.size() >= 300, counts);
        assertTrue(failed.size() <= 0.02 * (returned + another + failed.size()), counts);
        assertTrue(returned >= 0.9 * (returned + another), counts);
    }

    private static <Q extends ScalarQuantity<Q, ?>> Specification give(
            Specification specification, Solution from, Variable<Q> variable) {
        return specification.given(variable, from.value(variable));
    }

    private static <Q extends ScalarQuantity<Q, ?>> double si(Solution solution, Variable<Q> variable) {
        return solution.value(variable).si();
    }
}
