package lostwork.exergy;

import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;
import net.jqwik.api.Assume;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;

/** Laws that hold for any temperatures, pressures and perfect gas, tried on random ones with fixed seeds. */
class ExergyLawTest {
    private static final String SEED = "20261201";

    private static ReferenceEnvironment environment(double kelvin, double bar) {
        return ReferenceEnvironment.of(kelvin(kelvin), Pressure.bar(bar));
    }

    @Property(seed = SEED)
    void aClosedMassHasNoNegativeExergy(
            @ForAll @DoubleRange(min = 50, max = 3000) double t,
            @ForAll @DoubleRange(min = 100, max = 1e8) double p,
            @ForAll @DoubleRange(min = 200, max = 350) double t0,
            @ForAll @DoubleRange(min = 0.5, max = 2) double p0) {
        final var state = PerfectGasState.air(t, p);
        final var site = environment(t0, p0);
        final double size =
                Math.abs(state.enthalpy().si()) + t0 * Math.abs(state.entropy().si()) + 1e5;
        assertTrue(site.closedMassExergy(state).si() >= -1e-14 * size);
        assertTrue(site.flowExergyParts(state).thermal().si() >= -1e-14 * size);
    }

    @Property(seed = SEED)
    void flowAndClosedMassDifferByTheFlowWorkAgainstTheAtmosphere(
            @ForAll @DoubleRange(min = 50, max = 3000) double t,
            @ForAll @DoubleRange(min = 100, max = 1e8) double p,
            @ForAll @DoubleRange(min = 200, max = 350) double t0,
            @ForAll @DoubleRange(min = 0.5, max = 2) double p0) {
        final var state = PerfectGasState.air(t, p);
        final var site = environment(t0, p0);
        final SpecificEnergy difference = site.flowExergy(state).minus(site.closedMassExergy(state));
        final double expected =
                state.pressure().minus(site.pressure()).si() * state.volume().si();
        assertEquals(expected, difference.si(), 1e-12 * (Math.abs(expected) + 1e7));
    }

    @Property(seed = SEED)
    void partsAddUpToTheFlowExergy(
            @ForAll @DoubleRange(min = 50, max = 3000) double t,
            @ForAll @DoubleRange(min = 100, max = 1e8) double p,
            @ForAll @DoubleRange(min = 200, max = 350) double t0) {
        final var state = PerfectGasState.air(t, p);
        final var site = environment(t0, 1);
        assertEquals(
                site.flowExergy(state).si(), site.flowExergyParts(state).total().si(), 1e-12 * 1e7);
    }

    /** The Lorenz mean against the integral it stands for, by Gauss-Legendre quadrature with five points on 64 panels. */
    @Property(seed = SEED)
    void slidingHeatIsTheIntegralOfTheCarnotFactor(
            @ForAll @DoubleRange(min = 80, max = 2500) double from,
            @ForAll @DoubleRange(min = 80, max = 2500) double to,
            @ForAll @DoubleRange(min = 200, max = 350) double t0) {
        final double heat = 1000 * (from - to); // heat capacity rate 1 kW/K, given off while cooling
        final double exergy = environment(t0, 1)
                .heatExergy(Power.watts(heat), TemperatureGlide.between(kelvin(from), kelvin(to)))
                .si();
        final double[] node = {0, 0.5384693101056831, 0.9061798459386640};
        final double[] weight = {0.5688888888888889, 0.4786286704993665, 0.2369268850561891};
        double integral = 0;
        final int panels = 64;
        final double half = (from - to) / panels / 2;
        for (int i = 0; i < panels; i++) {
            final double middle = to + (2 * i + 1) * half;
            for (int k = 0; k < 3; k++) {
                integral += 1000 * half * weight[k] * (1 - t0 / (middle + node[k] * half));
                if (k > 0) {
                    integral += 1000 * half * weight[k] * (1 - t0 / (middle - node[k] * half));
                }
            }
        }
        assertEquals(integral, exergy, 1e-9 * (Math.abs(heat) + 1));
    }

    @Property(seed = SEED)
    void logarithmicMeanLiesBetweenTheGeometricAndTheArithmetic(
            @ForAll @DoubleRange(min = 1, max = 3000) double a,
            @ForAll @DoubleRange(min = -12, max = 3) double decade) {
        final double b = a + Math.pow(10, decade);
        final double mean = TemperatureGlide.logarithmicMean(a, b);
        final double ulp = 4e-16 * b;
        assertTrue(mean >= Math.sqrt(a) * Math.sqrt(b) - 2 * ulp && mean <= (a + b) / 2 + ulp);
        assertEquals(mean, TemperatureGlide.logarithmicMean(b, a), ulp);
        assertEquals(a, TemperatureGlide.logarithmicMean(a, a));
    }

    /** A stream that gives heat off at constant pressure loses just the exergy of that heat. */
    @Property(seed = SEED)
    void exergyOfAStreamIsTheExergyOfItsHeat(
            @ForAll @DoubleRange(min = 100, max = 2000) double from,
            @ForAll @DoubleRange(min = 100, max = 2000) double to,
            @ForAll @DoubleRange(min = 1e4, max = 1e7) double p,
            @ForAll @DoubleRange(min = 200, max = 350) double t0) {
        Assume.that(Math.abs(from - to) > 1e-3);
        final var site = environment(t0, 1);
        final var before = PerfectGasState.air(from, p);
        final var after = PerfectGasState.air(to, p);
        final SpecificEnergy heat = before.enthalpy().minus(after.enthalpy());
        assertEquals(
                site.flowExergy(before).minus(site.flowExergy(after)).si(),
                site.heatExergy(heat, TemperatureGlide.ofStream(before, after)).si(),
                1e-12 * 1e7);
    }

    @Property(seed = SEED)
    void heatLossAboveAmbientAlwaysCostsExergyAndBelowGainsIt(
            @ForAll @DoubleRange(min = 100, max = 2000) double t,
            @ForAll @DoubleRange(min = 0.01, max = 50) double drop,
            @ForAll @DoubleRange(min = 200, max = 350) double t0) {
        final var site = environment(t0, 1);
        final double change =
                site.flowExergy(PerfectGasState.air(t - drop, 3e5)).si()
                        - site.flowExergy(PerfectGasState.air(t, 3e5)).si();
        if (t - drop > t0) {
            assertTrue(change < 1e-8, () -> "change " + change);
        } else if (t < t0) {
            assertTrue(change > -1e-8, () -> "change " + change);
        }
    }

    /** Two streams mixed at constant pressure and throttled: the exergy balance and T0 times the entropy generated agree. */
    @Property(seed = SEED)
    void bothBooksGiveTheSameLoss(
            @ForAll @DoubleRange(min = 150, max = 1500) double t1,
            @ForAll @DoubleRange(min = 150, max = 1500) double t2,
            @ForAll @DoubleRange(min = 0.01, max = 50) double m1,
            @ForAll @DoubleRange(min = 0.01, max = 50) double m2,
            @ForAll @DoubleRange(min = 2e5, max = 5e6) double p1,
            @ForAll @DoubleRange(min = 200, max = 350) double t0) {
        final var site = environment(t0, 1);
        final var one = PerfectGasState.air(t1, p1);
        final var two = PerfectGasState.air(t2, 2 * p1);
        final var mixed = PerfectGasState.air((m1 * t1 + m2 * t2) / (m1 + m2), 0.9 * p1);
        final MassFlow flow1 = MassFlow.kilogramsPerSecond(m1);
        final MassFlow flow2 = MassFlow.kilogramsPerSecond(m2);
        final MassFlow sum = flow1.plus(flow2);
        final Power byExergy = site.flowExergy(one)
                .times(flow1)
                .plus(site.flowExergy(two).times(flow2))
                .minus(site.flowExergy(mixed).times(sum));
        final var balance =
                EntropyBalance.empty().inflow(flow1, one).inflow(flow2, two).outflow(sum, mixed);
        final Power byEntropy = GouyStodola.lostPower(balance.generation(), site);
        assertEquals(byEntropy.si(), byExergy.si(), 1e-12 * 1e6 * sum.si());
        assertTrue(byEntropy.si() > 0);
    }

    @Property(seed = SEED)
    void noMachineBeatsCarnot(
            @ForAll @DoubleRange(min = 50, max = 400) double coldStart,
            @ForAll @DoubleRange(min = 0, max = 100) double coldRise,
            @ForAll @DoubleRange(min = 1, max = 500) double gap,
            @ForAll @DoubleRange(min = 0, max = 1500) double hotFall) {
        final double coldEnd = coldStart + coldRise;
        final double hotEnd = coldEnd + gap;
        final double hotStart = hotEnd + hotFall;
        final var hot = TemperatureGlide.between(kelvin(hotStart), kelvin(hotEnd));
        final var cold = TemperatureGlide.between(kelvin(coldStart), kelvin(coldEnd));
        final Temperature top = kelvin(hotStart);
        final Temperature bottom = kelvin(coldStart);
        final double rounding = 1e-14;
        final double bound = Carnot.engineEfficiency(top, bottom).si();
        assertTrue(bound < 1);
        assertTrue(Lorenz.engineEfficiency(hot, cold).si() <= bound + rounding);
        // A machine that takes and gives heat only at the near ends is the worst that is still reversible.
        assertTrue(Lorenz.engineEfficiency(hot, cold).si()
                >= Carnot.engineEfficiency(kelvin(hotEnd), kelvin(coldEnd)).si() - rounding);
        final double endoreversible =
                CurzonAhlborn.engineEfficiency(top, bottom).si();
        assertTrue(endoreversible <= bound && endoreversible >= bound / 2 - rounding);
        assertTrue(CurzonAhlborn.refrigeratorCop(top, bottom).si()
                <= Carnot.refrigeratorCop(top, bottom).si());
        assertTrue(CurzonAhlborn.heatPumpCop(top, bottom).si()
                <= Carnot.heatPumpCop(top, bottom).si());
        final double near =
                Carnot.refrigeratorCop(kelvin(hotEnd), kelvin(coldEnd)).si();
        assertTrue(Lorenz.refrigeratorCop(hot, cold).si() <= near * (1 + 1e-12));
        // Heat pump and refrigerator are one machine; the heat pump is the engine run backwards.
        assertEquals(
                Lorenz.refrigeratorCop(hot, cold).si() + 1,
                Lorenz.heatPumpCop(hot, cold).si(),
                1e-11 * Lorenz.heatPumpCop(hot, cold).si());
        assertEquals(
                1,
                Lorenz.heatPumpCop(hot, cold).si()
                        * Lorenz.engineEfficiency(hot, cold).si(),
                1e-12);
        assertEquals(
                CurzonAhlborn.refrigeratorCop(top, bottom).si() + 1,
                CurzonAhlborn.heatPumpCop(top, bottom).si(),
                1e-12 * CurzonAhlborn.heatPumpCop(top, bottom).si());
    }

    /** The reversible engine between a heat and the environment yields the exergy of the heat; any other yields less. */
    @Property(seed = SEED)
    void exergyOfHeatIsTheWorkOfTheReversibleEngine(
            @ForAll @DoubleRange(min = 200, max = 350) double t0,
            @ForAll @DoubleRange(min = 0, max = 2000) double above) {
        final Temperature hot = kelvin(t0 + above);
        final Power heat = Power.megawatts(3);
        assertEquals(
                Carnot.enginePower(heat, hot, kelvin(t0)).si(),
                environment(t0, 1).heatExergy(heat, hot).si(),
                1e-8);
        assertTrue(environment(t0, 1).radiationFactor(hot).si()
                <= environment(t0, 1).carnotFactor(hot).si());
    }

    /** Curzon and Ahlborn by brute force: the best of 400 inner temperatures with equal conductances on both sides. */
    @Property(seed = SEED, tries = 50)
    void endoreversibleEfficiencyIsThatOfMostPower(
            @ForAll @DoubleRange(min = 250, max = 400) double cold,
            @ForAll @DoubleRange(min = 1.1, max = 5) double ratio) {
        final double hot = cold * ratio;
        double most = -1;
        double best = 0;
        final int steps = 20_000;
        for (int i = 1; i < steps; i++) {
            // Conductances of 1 W/K: heat in hot - x; reversible inside: (hot - x)/x = (y - cold)/y with y = x (1 -
            // eta).
            final double eta = (1 - cold / hot) * i / steps;
            final double x = 0.5 * (hot + cold / (1 - eta));
            final double power = (hot - x) * eta;
            if (power > most) {
                most = power;
                best = eta;
            }
        }
        assertEquals(CurzonAhlborn.engineEfficiency(kelvin(hot), kelvin(cold)).si(), best, 1.01 / steps);
    }

    /** At T0 exergy and free energies agree, as the page of FreeEnergy states. */
    @Property(seed = SEED)
    void freeEnergiesAreExergiesAtAmbientTemperature(
            @ForAll @DoubleRange(min = 200, max = 350) double t0,
            @ForAll @DoubleRange(min = 1e3, max = 1e7) double p,
            @ForAll @DoubleRange(min = 0.5, max = 2) double p0) {
        final var site = environment(t0, p0);
        final var state = PerfectGasState.air(t0, p);
        final ThermodynamicState dead = site.deadState(state);
        final double helmholtz =
                FreeEnergy.helmholtz(state).minus(FreeEnergy.helmholtz(dead)).si();
        final double expansion = p0 * 1e5 * (state.volume().si() - dead.volume().si());
        assertEquals(helmholtz + expansion, site.closedMassExergy(state).si(), 1e-12 * (1e6 + Math.abs(expansion)));
        assertEquals(
                FreeEnergy.gibbs(state).minus(FreeEnergy.gibbs(dead)).si(),
                site.flowExergy(state).si(),
                1e-6);
        // The work of the isothermal expansion, less the part that pushes the atmosphere back.
        assertEquals(
                site.closedMassExergy(state).si(),
                site.workExergy(
                                FreeEnergy.isothermalWork(state, dead),
                                SpecificVolume.cubicMetresPerKilogram(
                                        dead.volume().si() - state.volume().si()))
                        .si(),
                1e-12 * (1e6 + Math.abs(expansion)));
    }

    /** In a rigid vessel that comes to T0 by heat exchange with the environment, the most work is the drop of u - T0 s. */
    @Property(seed = SEED)
    void aRigidVesselYieldsTheDropOfItsClosedMassExergy(
            @ForAll @DoubleRange(min = 100, max = 2000) double t,
            @ForAll @DoubleRange(min = 200, max = 350) double t0,
            @ForAll @DoubleRange(min = 1e4, max = 1e7) double p) {
        final var site = environment(t0, 1);
        final var before = PerfectGasState.air(t, p);
        final var after = PerfectGasState.air(t0, p * t0 / t); // same volume
        final double drop = site.closedMassExergy(before)
                .minus(site.closedMassExergy(after))
                .si();
        final double cv = 1005 - 287;
        assertEquals(cv * (t - t0 - t0 * Math.log(t / t0)), drop, 1e-12 * 1e7);
        assertTrue(drop >= -1e-7);
    }
}
