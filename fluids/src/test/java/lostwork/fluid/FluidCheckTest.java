package lostwork.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumSet;
import java.util.Set;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;

/** Each way of being inconsistent is found, and named as what it is. */
class FluidCheckTest {
    private static Set<FluidLaw> broken(FluidModel model) {
        final FluidCheck check = FluidCheck.of(model);
        final Set<FluidLaw> laws = EnumSet.noneOf(FluidLaw.class);
        for (final FluidFinding finding : check.findings()) {
            laws.add(finding.law());
            assertTrue(finding.deviation() > finding.allowed(), finding::toString);
            assertTrue(finding.places() > 0, finding::toString);
            assertTrue(check.toString().contains(finding.toString()), check::toString);
        }
        assertEquals(laws.isEmpty(), check.isConsistent());
        return laws;
    }

    private static Set<FluidLaw> damaged(Consumer<StatePoint> damage) {
        return broken(new BrokenFluid(damage));
    }

    private static void set(StatePoint p, double v, double h, double s, double cp, double byT, double byP) {
        p.setSinglePhase(p.temperature, p.pressure, v, h, s, cp, byT, byP, p.phase);
    }

    @Test
    void passesConsistentModels() {
        assertEquals(Set.of(), broken(new TwoPhaseExample()));
        assertEquals(Set.of(), broken(new VanDerWaalsFluid()));
        assertEquals(Set.of(), damaged(point -> {}));
    }

    @Test
    void findsAWrongHeatCapacity() {
        final Set<FluidLaw> laws = damaged(p -> set(
                p,
                p.volume,
                p.enthalpy,
                p.entropy,
                p.heatCapacity * 1.00001,
                p.volumeByTemperature,
                p.volumeByPressure));
        assertEquals(Set.of(FluidLaw.HEAT_CAPACITY, FluidLaw.ENTROPY_BY_TEMPERATURE), laws);
    }

    @Test
    void findsAWrongThermalExpansion() {
        final Set<FluidLaw> laws = damaged(p -> set(
                p, p.volume, p.enthalpy, p.entropy, p.heatCapacity, p.volumeByTemperature * 1.001, p.volumeByPressure));
        assertEquals(
                Set.of(FluidLaw.VOLUME_BY_TEMPERATURE, FluidLaw.ENTHALPY_BY_PRESSURE, FluidLaw.ENTROPY_BY_PRESSURE),
                laws);
    }

    @Test
    void findsAWrongCompressibility() {
        final Set<FluidLaw> laws = damaged(p -> set(
                p, p.volume, p.enthalpy, p.entropy, p.heatCapacity, p.volumeByTemperature, p.volumeByPressure * 1.001));
        assertEquals(Set.of(FluidLaw.VOLUME_BY_PRESSURE), laws);
    }

    /** The usual mistake: an internal energy handed over as the enthalpy. */
    @Test
    void findsAnEnthalpyThatIsNotUPlusPv() {
        final Set<FluidLaw> laws = damaged(p -> set(
                p,
                p.volume,
                p.enthalpy - p.pressure * p.volume,
                p.entropy,
                p.heatCapacity,
                p.volumeByTemperature,
                p.volumeByPressure));
        assertTrue(
                laws.containsAll(
                        EnumSet.of(FluidLaw.HEAT_CAPACITY, FluidLaw.ENTHALPY_BY_PRESSURE, FluidLaw.EQUAL_GIBBS_ENERGY)),
                laws::toString);
    }

    /** An entropy without its pressure term. */
    @Test
    void findsAnEntropyThatIgnoresPressure() {
        final Set<FluidLaw> laws = damaged(p -> set(
                p,
                p.volume,
                p.enthalpy,
                p.entropy + (p.phase == Phase.VAPOUR ? 115 * Math.log(p.pressure / 6e4) : 0),
                p.heatCapacity,
                p.volumeByTemperature,
                p.volumeByPressure));
        assertTrue(
                laws.containsAll(EnumSet.of(FluidLaw.ENTROPY_BY_PRESSURE, FluidLaw.EQUAL_GIBBS_ENERGY)),
                laws::toString);
    }

    /** A latent heat that does not belong to the saturation line. */
    @Test
    void findsAVapourWithAnotherLatentHeat() {
        final Set<FluidLaw> laws = damaged(p -> set(
                p,
                p.volume,
                p.enthalpy + (p.phase == Phase.VAPOUR ? 1_000 : 0),
                p.entropy,
                p.heatCapacity,
                p.volumeByTemperature,
                p.volumeByPressure));
        assertEquals(Set.of(FluidLaw.EQUAL_GIBBS_ENERGY, FluidLaw.CLAUSIUS_CLAPEYRON), laws);
    }

    @Test
    void findsInstability() {
        final Set<FluidLaw> negative = damaged(p ->
                set(p, p.volume, -p.enthalpy, -p.entropy, -p.heatCapacity, p.volumeByTemperature, p.volumeByPressure));
        assertTrue(negative.contains(FluidLaw.THERMAL_STABILITY), negative::toString);
        final Set<FluidLaw> stretched = damaged(p ->
                set(p, p.volume, p.enthalpy, p.entropy, p.heatCapacity, p.volumeByTemperature, -p.volumeByPressure));
        assertTrue(stretched.contains(FluidLaw.MECHANICAL_STABILITY), stretched::toString);
    }

    @Test
    void findsNumbersThatAreNone() {
        final Set<FluidLaw> laws = damaged(p -> {
            if (p.temperature > 400) {
                p.entropy = Double.NaN;
            }
        });
        assertTrue(laws.contains(FluidLaw.EVALUATION), laws::toString);
    }

    @Test
    void findsAnEvaluationOfAnotherState() {
        assertTrue(damaged(p -> p.pressure *= 1.01).contains(FluidLaw.EVALUATION));
    }

    @Test
    void findsJumps() {
        final Set<FluidLaw> laws = damaged(p -> p.enthalpy += Math.floor(p.temperature / 0.05));
        assertTrue(laws.contains(FluidLaw.CONTINUITY), laws::toString);
    }

    @Test
    void findsASaturationTemperatureOfAnotherLine() {
        final TwoPhaseExample whole = new TwoPhaseExample();
        final Set<FluidLaw> laws = broken(new DelegatingFluid(whole) {
            @Override
            public SaturationModel saturation() {
                return new ShiftedSaturation(whole);
            }
        });
        assertTrue(laws.contains(FluidLaw.SATURATION_INVERSE), laws::toString);
    }

    @Test
    void findsAFlashThatReturnsAnotherState() {
        final Set<FluidLaw> laws = broken(new DelegatingFluid(new TwoPhaseExample()) {
            @Override
            public void atPressureEnthalpy(double pressure, double enthalpy, StatePoint out) {
                super.atPressureEnthalpy(pressure, enthalpy + 1, out);
            }
        });
        assertEquals(Set.of(FluidLaw.FLASH), laws);
    }

    @Test
    void findsAFlashThatRefuses() {
        final FluidCheck check = FluidCheck.of(new DelegatingFluid(new TwoPhaseExample()) {
            @Override
            public void atTemperatureVolume(double temperature, double volume, StatePoint out) {
                throw new UnsupportedOperationException("not written yet");
            }
        });
        assertFalse(check.isConsistent());
        assertTrue(check.toString().contains("(T,v) refused: not written yet"), check::toString);
    }

    @Test
    void toleranceIsPositive() {
        assertThrows(
                IllegalArgumentException.class, () -> FluidTolerance.exact().withFlashes(0));
        assertThrows(
                IllegalArgumentException.class, () -> FluidTolerance.exact().withSaturation(Double.NaN));
        assertEquals(1e-3, FluidTolerance.exact().withDerivatives(1e-3).derivatives());
    }

    /** A consistent fluid whose parts can be replaced. */
    private static class DelegatingFluid implements FluidModel {
        private final FluidModel whole;

        DelegatingFluid(FluidModel whole) {
            this.whole = whole;
        }

        @Override
        public String name() {
            return whole.name();
        }

        @Override
        public double molarMass() {
            return whole.molarMass();
        }

        @Override
        public FluidRange range() {
            return whole.range();
        }

        @Override
        public Provenance provenance() {
            return whole.provenance();
        }

        @Override
        public SaturationModel saturation() {
            return whole.saturation();
        }

        @Override
        public void evaluate(double temperature, double pressure, PhaseSide side, StatePoint out) {
            whole.evaluate(temperature, pressure, side, out);
        }
    }

    private record ShiftedSaturation(SaturationModel whole) implements SaturationModel {
        @Override
        public double lowestTemperature() {
            return whole.lowestTemperature();
        }

        @Override
        public double criticalTemperature() {
            return whole.criticalTemperature();
        }

        @Override
        public double criticalPressure() {
            return whole.criticalPressure();
        }

        @Override
        public double pressure(double temperature) {
            return whole.pressure(temperature);
        }

        @Override
        public double temperature(double pressure) {
            return whole.temperature(pressure) + 0.01;
        }
    }
}
