package lostwork.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/**
 * What every fluid keeps. A test class of a fluid extends this one and names the fluid; it inherits all checks.
 *
 * <p>The laws come from thermodynamics, not from the code under test: Maxwell relations, stability, the equality of Gibbs
 * energies on the saturation line, and that a search returns what it was asked for.
 */
public abstract class FluidContract {
    private static final long SEED = 20_240_611L;
    private static final double ASKED = 1e-9;

    /** Creates the checks. */
    protected FluidContract() {}

    /** {@return the fluid to check} */
    protected abstract Fluid fluid();

    /** {@return how many random states the round trips go through} */
    protected int states() {
        return 2_000;
    }

    /**
     * Draws a single-phase state within the range.
     *
     * @param random the source of randomness
     * @param out the point to fill
     */
    protected void draw(SplittableRandom random, StatePoint out) {
        final FluidModel model = fluid().model();
        final FluidRange range = model.range();
        final double t = random.nextDouble(range.lowestTemperature(), range.highestTemperature());
        final double low = Math.log(model.lowestPressureAt(t));
        final double high = Math.log(model.highestPressureAt(t));
        model.atTemperaturePressure(t, Math.exp(low + (high - low) * random.nextDouble(0.001, 0.999)), out);
    }

    /**
     * {@return whether one state only has any of the pairs of properties of this one; false where a liquid contracts on
     * heating}
     *
     * @param point the state
     */
    protected boolean isUnique(StatePoint point) {
        return true;
    }

    private List<StatePoint> points() {
        final SplittableRandom random = new SplittableRandom(SEED);
        final FluidModel model = fluid().model();
        final SaturationModel saturation = model.saturation();
        final List<StatePoint> points = new ArrayList<>();
        for (int i = 0; i < states(); i++) {
            final StatePoint point = new StatePoint();
            if (saturation != null && i % 4 == 0) {
                final double low = saturation.lowestTemperature();
                final double high = Math.min(
                        saturation.temperature(
                                Math.min(model.range().highestPressure(), 0.999 * saturation.criticalPressure())),
                        0.999 * saturation.criticalTemperature());
                model.atTemperatureVapourFraction(random.nextDouble(low, high), random.nextDouble(), point);
            } else {
                draw(random, point);
            }
            points.add(point);
        }
        return points;
    }

    private interface PairFlash {
        void find(FluidModel model, StatePoint asked, StatePoint out);
    }

    private void roundTrip(String pair, FlashProperty first, FlashProperty second, PairFlash flash) {
        final FluidModel model = fluid().model();
        final StatePoint found = new StatePoint();
        for (final StatePoint asked : points()) {
            try {
                flash.find(model, asked, found);
            } catch (RuntimeException e) {
                throw new AssertionError(where(pair, asked), e);
            }
            if (first != null) {
                same(pair, first, asked, found);
            }
            same(pair, second, asked, found);
            if (isUnique(asked)) {
                assertEquals(asked.temperature, found.temperature, 1e-6 * asked.temperature, () -> where(pair, asked));
                assertEquals(
                        asked.enthalpy,
                        found.enthalpy,
                        1e-6 * FlashProperty.ENTHALPY.scale(asked.enthalpy, asked),
                        () -> where(pair, asked));
            }
        }
    }

    private void same(String pair, FlashProperty property, StatePoint asked, StatePoint found) {
        final double value = property.of(asked);
        assertEquals(
                value,
                property.of(found),
                ASKED * property.scale(value, asked),
                () -> property + " of " + where(pair, asked));
    }

    private String where(String pair, StatePoint asked) {
        return pair + " of " + fluid() + " at T = " + asked.temperature + " K, p = " + asked.pressure + " Pa, x = "
                + asked.vapourFraction + ", " + asked.phase + " (seed " + SEED + ")";
    }

    @Test
    void pressureAndEnthalpyReturn() {
        roundTrip(
                "(p,h)",
                null,
                FlashProperty.ENTHALPY,
                (m, a, out) -> m.atPressureEnthalpy(a.pressure, a.enthalpy, out));
    }

    @Test
    void pressureAndEntropyReturn() {
        roundTrip("(p,s)", null, FlashProperty.ENTROPY, (m, a, out) -> m.atPressureEntropy(a.pressure, a.entropy, out));
    }

    @Test
    void pressureAndVolumeReturn() {
        roundTrip("(p,v)", null, FlashProperty.VOLUME, (m, a, out) -> m.atPressureVolume(a.pressure, a.volume, out));
    }

    @Test
    void temperatureAndEntropyReturn() {
        roundTrip(
                "(T,s)",
                null,
                FlashProperty.ENTROPY,
                (m, a, out) -> m.atTemperatureEntropy(a.temperature, a.entropy, out));
    }

    @Test
    void temperatureAndVolumeReturn() {
        roundTrip(
                "(T,v)",
                null,
                FlashProperty.VOLUME,
                (m, a, out) -> m.atTemperatureVolume(a.temperature, a.volume, out));
    }

    @Test
    void enthalpyAndEntropyReturn() {
        roundTrip(
                "(h,s)",
                FlashProperty.ENTHALPY,
                FlashProperty.ENTROPY,
                (m, a, out) -> m.atEnthalpyEntropy(a.enthalpy, a.entropy, out));
    }

    @Test
    void internalEnergyAndVolumeReturn() {
        roundTrip(
                "(u,v)",
                FlashProperty.INTERNAL_ENERGY,
                FlashProperty.VOLUME,
                (m, a, out) -> m.atInternalEnergyVolume(a.internalEnergy(), a.volume, out));
    }

    @Test
    void entropyAndVolumeReturn() {
        roundTrip(
                "(s,v)",
                FlashProperty.ENTROPY,
                FlashProperty.VOLUME,
                (m, a, out) -> m.atEntropyVolume(a.entropy, a.volume, out));
    }

    @Test
    void isStable() {
        for (final StatePoint point : points()) {
            assertTrue(point.isochoricHeatCapacity() > 0, () -> where("cv > 0", point));
            assertTrue(
                    point.heatCapacity >= point.isochoricHeatCapacity() * (1 - 1e-12), () -> where("cp >= cv", point));
            assertTrue(point.speedOfSound() > 0, () -> where("w", point));
        }
    }
}
