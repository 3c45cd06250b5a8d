package lostwork.fluid.gas;

import static lostwork.fluid.gas.MoleFraction.nitrogen;
import static lostwork.fluid.gas.MoleFraction.oxygen;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import lostwork.fluid.FluidModel;
import lostwork.fluid.MixturePoint;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.StatePoint;
import org.junit.jupiter.api.Test;

/** Laws of ideal mixtures, over random compositions, temperatures and pressures with a fixed seed. */
class IdealMixtureLawTest {
    private static final long SEED = 20_261_201L;
    private static final int CASES = 500;
    private static final IdealMixtureModel GASES = IdealMixtureModel.of(
            "combustion gases", Species.N2, Species.O2, Species.CO2, Species.H2O, Species.of("CO"), Species.of("H2"));
    private static final double R = 8.31446261815324;

    private interface Case {
        void check(double t, double p, double[] x, MixturePoint point);
    }

    private static void forAll(Case check) {
        final SplittableRandom random = new SplittableRandom(SEED);
        final int n = GASES.components().size();
        final MixturePoint point = new MixturePoint(n);
        for (int i = 0; i < CASES; i++) {
            final double[] x = new double[n];
            double sum = 0;
            for (int k = 0; k < n; k++) {
                x[k] = random.nextInt(4) == 0 ? 0 : random.nextDouble();
                sum += x[k];
            }
            x[0] += sum == 0 ? 1 : 0;
            sum = sum == 0 ? 1 : sum;
            for (int k = 0; k < n; k++) {
                x[k] /= sum;
            }
            final double t = random.nextDouble(200, 6000);
            final double p = Math.exp(random.nextDouble(Math.log(1e2), Math.log(1e7)));
            GASES.evaluate(t, p, x, PhaseSide.VAPOUR, point);
            check.check(t, p, x, point);
        }
    }

    @Test
    void agreesWithItsModelAtAFixedComposition() {
        final StatePoint fixed = new StatePoint();
        final StatePoint free = new StatePoint();
        forAll((t, p, x, point) -> {
            final FluidModel model = GASES.withComposition(x);
            model.atTemperaturePressure(t, p, fixed);
            point.toMass(lostwork.fluid.Phase.GAS, free);
            // Terms of 1e8 J/kg cancel in the polynomials at both ends of the range.
            assertEquals(fixed.enthalpy, free.enthalpy, 1e-12 * (Math.abs(fixed.enthalpy) + 1e7));
            assertEquals(fixed.entropy, free.entropy, 1e-12 * 1e4);
            assertEquals(fixed.heatCapacity, free.heatCapacity, 1e-11 * fixed.heatCapacity);
            assertEquals(fixed.volume, free.volume, 1e-14 * fixed.volume);
            assertEquals(fixed.volumeByPressure, free.volumeByPressure, 1e-13 * Math.abs(fixed.volumeByPressure));
        });
    }

    @Test
    void entropyOfMixingIsNotNegative() {
        forAll((t, p, x, point) -> {
            double unmixed = 0;
            double mixing = 0;
            for (int i = 0; i < x.length; i++) {
                if (x[i] > 0) {
                    unmixed += x[i]
                            * (GASES.species().get(i).molarEntropy(kelvin(t)).si() - R * Math.log(p / 1e5));
                    mixing -= R * x[i] * Math.log(x[i]);
                }
            }
            assertTrue(mixing >= 0);
            assertEquals(mixing, point.entropy - unmixed, 1e-11 * 300);
        });
    }

    /** Euler: extensive properties are the sums of amounts times partial molar properties. */
    @Test
    void partialMolarPropertiesSumToTheWhole() {
        forAll((t, p, x, point) -> {
            double h = 0;
            double s = 0;
            double v = 0;
            double g = 0;
            for (int i = 0; i < x.length; i++) {
                if (x[i] > 0) {
                    h += x[i] * point.partialEnthalpy(i);
                    s += x[i] * point.partialEntropy(i);
                    v += x[i] * point.partialVolume(i);
                    g += x[i] * point.chemicalPotential(i);
                } else {
                    assertEquals(Double.POSITIVE_INFINITY, point.partialEntropy(i));
                }
            }
            assertEquals(point.enthalpy, h, 1e-12 * (Math.abs(h) + 1e5));
            assertEquals(point.entropy, s, 1e-12 * s);
            assertEquals(point.volume, v, 1e-14 * v);
            assertEquals(point.enthalpy - t * point.entropy, g, 1e-11 * Math.abs(g));
        });
    }

    /** The partial molar entropy against a central difference of the total entropy over the amount of one species. */
    @Test
    void partialMolarEntropyIsADerivative() {
        final MixturePoint more = new MixturePoint(GASES.components().size());
        final double dn = 1e-5;
        forAll((t, p, x, point) -> {
            for (int i = 0; i < x.length; i++) {
                if (x[i] < 0.01) {
                    continue;
                }
                final double up = totalEntropy(t, p, x, i, dn, more);
                final double down = totalEntropy(t, p, x, i, -dn, more);
                // Error of the difference: dn² s'''/6, s''' about R/x².
                assertEquals(point.partialEntropy(i), (up - down) / (2 * dn), 1e-5);
            }
        });
    }

    private static double totalEntropy(double t, double p, double[] x, int i, double dn, MixturePoint work) {
        final double[] y = x.clone();
        y[i] += dn;
        for (int k = 0; k < y.length; k++) {
            y[k] /= 1 + dn;
        }
        GASES.evaluate(t, p, y, PhaseSide.VAPOUR, work);
        return work.entropy * (1 + dn);
    }

    @Test
    void aMixtureOfOneIsThePureGas() {
        final IdealGas pure = IdealGas.of(Species.N2);
        final IdealGas mixture = IdealGas.of(GasComposition.of(nitrogen(1), oxygen(0)));
        for (double t : new double[] {200, 298.15, 1000, 4321, 20_000}) {
            assertEquals(
                    pure.state(kelvin(t), bar(3)).enthalpy(),
                    mixture.state(kelvin(t), bar(3)).enthalpy());
            assertEquals(
                    pure.state(kelvin(t), bar(3)).entropy(),
                    mixture.state(kelvin(t), bar(3)).entropy());
            assertEquals(
                    Species.N2.molarEnthalpy(kelvin(t)).si(),
                    pure.state(kelvin(t), bar(1)).enthalpy().si()
                            * Species.N2.molarMass().si(),
                    1e-9 * t);
        }
    }

    /** Across the joint at 1000 K, and at the very ends of the range, each inverse returns the temperature. */
    @Test
    void inversesHoldAtJointsAndEnds() {
        final IdealGas air = DryAir.standard();
        for (double t : new double[] {
            200, Math.nextUp(200.0), 999.999999, Math.nextDown(1000.0), 1000, Math.nextUp(1000.0), 1000.000001, 6000
        }) {
            final var state = air.state(kelvin(t), bar(7));
            assertEquals(t, air.temperatureAt(state.enthalpy()).si(), 1e-12 * t);
            assertEquals(
                    t, air.temperatureAtInternalEnergy(state.internalEnergy()).si(), 1e-12 * t);
            assertEquals(t, air.temperatureAt(bar(7), state.entropy()).si(), 1e-12 * t);
        }
    }

    /** A state on a corner of the range is found again from each pair, in spite of rounding. */
    @Test
    void cornersOfTheRangeReturn() {
        final FluidModel model = DryAir.standard().model();
        final StatePoint corner = new StatePoint();
        final StatePoint found = new StatePoint();
        final SplittableRandom random = new SplittableRandom(SEED);
        for (int i = 0; i < CASES; i++) {
            final double t = i % 2 == 0
                    ? model.range().lowestTemperature()
                    : model.range().highestTemperature();
            final double p = i % 8 == 0 ? 1e-3 : i % 8 == 1 ? 1e8 : Math.exp(random.nextDouble(-6, 18));
            model.atTemperaturePressure(t, p, corner);
            model.atPressureEnthalpy(p, corner.enthalpy, found);
            assertEquals(t, found.temperature, 1e-12 * t);
            model.atPressureEntropy(p, corner.entropy, found);
            assertEquals(t, found.temperature, 1e-12 * t);
            model.atPressureVolume(p, corner.volume, found);
            assertEquals(t, found.temperature, 1e-12 * t);
            model.atTemperatureVolume(t, corner.volume, found);
            assertEquals(p, found.pressure, 1e-12 * p);
            model.atTemperatureEntropy(t, corner.entropy, found);
            assertEquals(p, found.pressure, 1e-11 * p);
            model.atEnthalpyEntropy(corner.enthalpy, corner.entropy, found);
            assertEquals(p, found.pressure, 1e-11 * p);
            model.atInternalEnergyVolume(corner.internalEnergy(), corner.volume, found);
            assertEquals(t, found.temperature, 1e-12 * t);
            model.atEntropyVolume(corner.entropy, corner.volume, found);
            assertEquals(t, found.temperature, 1e-12 * t);
        }
    }

    /** (∂s/∂p) at constant T is -(∂v/∂T) at constant p, to rounding: one gas constant stands in both. */
    @Test
    void entropyFallsWithPressureAsTheVolumeSays() {
        final IdealGas gas = IdealGas.of(GasComposition.of(nitrogen(0.4), oxygen(0.6)));
        final double t = 650;
        final double specific = R / gas.composition().molarMass().si();
        final double fall = gas.state(kelvin(t), bar(1)).entropy().si()
                - gas.state(kelvin(t), bar(10)).entropy().si();
        assertEquals(specific * Math.log(10), fall, 1e-13 * 8000);
        assertEquals(specific * t / 1e5, gas.state(kelvin(t), bar(1)).volume().si(), 1e-15);
    }

    @Test
    void typedPartialPropertiesAgree() {
        final IdealGas gas = GASES.with(nitrogen(0.4), oxygen(0.6));
        final MixturePoint point = new MixturePoint(6);
        GASES.evaluate(800, 2e5, new double[] {0.4, 0.6, 0, 0, 0, 0}, PhaseSide.VAPOUR, point);
        assertEquals(
                point.chemicalPotential(1),
                gas.chemicalPotential(Species.O2, kelvin(800), bar(2)).si(),
                1e-6);
        assertThrows(IllegalArgumentException.class, () -> gas.partialMolarEntropy(Species.CO2, kelvin(800), bar(2)));
        assertThrows(IllegalArgumentException.class, () -> GASES.with(MoleFraction.argon(1)));
        assertThrows(IllegalArgumentException.class, () -> GASES.withComposition(0.5, 0.5));
        assertThrows(IllegalArgumentException.class, () -> GASES.withComposition(0.5, 0.4, 0, 0, 0, 0));
        assertThrows(IllegalArgumentException.class, () -> IdealMixtureModel.of("none"));
    }
}
