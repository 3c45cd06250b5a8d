package lostwork.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/**
 * What every fluid keeps. A test class of a fluid extends this one and names the fluid; it inherits all checks.
 *
 * <p>The laws come from thermodynamics, not from the code under test: Maxwell relations, stability, the equality of Gibbs
 * energies on the saturation line, and that a search returns what it was asked for.
 */
public abstract class FluidContract {
    private static final long SEED = 20_240_611L;

    /** Creates the checks. */
    protected FluidContract() {}

    /** {@return the fluid to check} */
    protected abstract Fluid fluid();

    /** {@return how many random states the checks go through} */
    protected int states() {
        return 2_000;
    }

    /** {@return how exactly the model keeps the laws; a published formulation states its own} */
    protected FluidTolerance tolerance() {
        return FluidTolerance.exact();
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
     * {@return whether a pair of properties belongs to this state only; false where a liquid contracts on heating}
     *
     * @param pair the pair
     * @param point the state
     */
    boolean isUnique(StatePair pair, StatePoint point) {
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
                model.atTemperatureVapourFraction(
                        random.nextDouble(low, highestSaturation(saturation)), random.nextDouble(), point);
            } else {
                draw(random, point);
            }
            points.add(point);
        }
        return points;
    }

    private double highestSaturation(SaturationModel saturation) {
        final double pressure =
                Math.min((1 - 1e-9) * fluid().range().highestPressure(), 0.9999 * saturation.criticalPressure());
        return saturation.temperature(pressure);
    }

    private String where(Object what, StatePoint asked) {
        return what + " of " + fluid() + " at T = " + asked.temperature + " K, p = " + asked.pressure + " Pa, x = "
                + asked.vapourFraction + ", " + asked.phase + " (seed " + SEED + ")";
    }

    @ParameterizedTest
    @EnumSource(StatePair.class)
    void pairsReturnWhatTheyWereAskedFor(StatePair pair) {
        final FluidModel model = fluid().model();
        final StatePoint found = new StatePoint();
        for (final StatePoint asked : points()) {
            if (!pair.isTestedAt(asked)) {
                continue;
            }
            try {
                pair.find(model, asked, found);
            } catch (RuntimeException e) {
                throw new AssertionError(where(pair, asked), e);
            }
            assertTrue(
                    pair.deviation(asked, found) <= tolerance().flashes(),
                    () -> where(pair, asked) + " returned T = " + found.temperature + " K, p = " + found.pressure
                            + " Pa, off by " + pair.deviation(asked, found));
            if (isUnique(pair, asked)) {
                assertEquals(asked.temperature, found.temperature, 1e-6 * asked.temperature, () -> where(pair, asked));
                assertEquals(
                        asked.enthalpy,
                        found.enthalpy,
                        1e-6 * FlashProperty.ENTHALPY.scale(asked.enthalpy, asked),
                        () -> where(pair, asked));
            }
        }
    }

    /** Rounding at a limit is no reason to refuse. */
    @ParameterizedTest
    @EnumSource(StatePair.class)
    void pairsReturnTheCornersOfTheRange(StatePair pair) {
        final FluidModel model = fluid().model();
        final FluidRange range = model.range();
        final StatePoint asked = new StatePoint();
        final StatePoint found = new StatePoint();
        for (int corner = 0; corner < 4; corner++) {
            final double pressure = corner % 2 == 0 ? range.lowestPressure() : range.highestPressure();
            final double temperature =
                    corner < 2 ? model.lowestTemperatureAt(pressure) : model.highestTemperatureAt(pressure);
            model.atTemperaturePressure(temperature, pressure, asked);
            if (pair.isTestedAt(asked)) {
                try {
                    pair.find(model, asked, found);
                } catch (RuntimeException e) {
                    throw new AssertionError(where(pair, asked), e);
                }
                assertTrue(
                        pair.deviation(asked, found) <= tolerance().flashes(),
                        () -> where(pair, asked) + " returned T = " + found.temperature + " K, p = " + found.pressure
                                + " Pa, off by " + pair.deviation(asked, found));
            }
        }
    }

    /** The saturation line itself, its ends included, from both sides. */
    @ParameterizedTest
    @EnumSource(StatePair.class)
    void pairsReturnTheSaturationLine(StatePair pair) {
        final FluidModel model = fluid().model();
        final SaturationModel saturation = model.saturation();
        if (saturation == null) {
            return;
        }
        final StatePoint asked = new StatePoint();
        final StatePoint found = new StatePoint();
        final double low = saturation.lowestTemperature();
        final double high = highestSaturation(saturation);
        for (int i = 0; i <= 200; i++) {
            // half of the places within the last thousandth below the end
            final double t = i <= 100 ? low + (high - low) * i / 100 : high * (1 - 1e-3 * (i - 100) / 100);
            for (final PhaseSide side : PhaseSide.values()) {
                for (final double fraction : new double[] {Double.NaN, 0, 1e-12, 1 - 1e-12, 1}) {
                    if (Double.isNaN(fraction)) {
                        model.saturatedAtTemperature(t, side, asked);
                    } else {
                        model.atTemperatureVapourFraction(t, fraction, asked);
                    }
                    // A temperature and a pressure do not tell liquid from vapour here.
                    if (!pair.isTestedAt(asked) || pair == StatePair.TEMPERATURE_PRESSURE) {
                        continue;
                    }
                    try {
                        pair.find(model, asked, found);
                    } catch (RuntimeException e) {
                        throw new AssertionError(where(pair, asked), e);
                    }
                    assertTrue(
                            pair.deviation(asked, found) <= tolerance().flashes(),
                            () -> where(pair, asked) + " returned T = " + found.temperature + " K, p = "
                                    + found.pressure + " Pa, off by " + pair.deviation(asked, found));
                }
            }
        }
    }

    /** Derivatives, Maxwell relations, stability, saturation line. */
    @Test
    void isConsistent() {
        final FluidCheck check = FluidCheck.of(fluid().model(), tolerance());
        assertTrue(check.places() >= 100, check::toString);
        assertTrue(check.isConsistent(), check::toString);
    }

    @Test
    void isStable() {
        for (final StatePoint point : points()) {
            assertTrue(point.isochoricHeatCapacity() > 0, () -> where("cv > 0", point));
            assertTrue(
                    point.heatCapacity >= point.isochoricHeatCapacity() * (1 - 1e-12), () -> where("cp >= cv", point));
            assertTrue(point.speedOfSound() > 0, () -> where("w > 0", point));
        }
    }

    @Test
    void phasesAreNamedAlike() {
        final SaturationModel saturation = fluid().model().saturation();
        for (final StatePoint point : points()) {
            if (saturation == null) {
                assertEquals(Phase.GAS, point.phase, () -> where("phase", point));
            } else if (point.phase != Phase.TWO_PHASE) {
                final boolean liquid = point.temperature < saturation.criticalTemperature()
                        && point.temperature >= saturation.lowestTemperature()
                        && point.pressure >= saturation.pressure(point.temperature);
                assertEquals(
                        saturation.phase(
                                point.temperature, point.pressure, liquid ? PhaseSide.LIQUID : PhaseSide.VAPOUR),
                        point.phase,
                        () -> where("phase", point));
            }
        }
    }

    /** At constant pressure ds = dh/T, through all phases: entropy rises, and its slope falls (T rises with h). */
    @Test
    void heatRaisesEntropyAndTemperature() {
        final SplittableRandom random = new SplittableRandom(SEED);
        final FluidModel model = fluid().model();
        final FluidRange range = model.range();
        final StatePoint point = new StatePoint();
        final StatePoint before = new StatePoint();
        for (int line = 0; line < 40; line++) {
            final double pressure = Math.exp(random.nextDouble(
                    Math.log(1.01 * range.lowestPressure()), Math.log(0.99 * range.highestPressure())));
            model.atTemperaturePressure(model.lowestTemperatureAt(pressure), pressure, before);
            model.atTemperaturePressure(model.highestTemperatureAt(pressure), pressure, point);
            final double from = before.enthalpy;
            final double to = point.enthalpy;
            for (int i = 1; i < 100; i++) {
                model.atPressureEnthalpy(pressure, from + (to - from) * i / 100, point);
                final double dh = point.enthalpy - before.enthalpy;
                final double ds = point.entropy - before.entropy;
                // The seams between two equations, the saturation line among them, are as good as the formulation.
                final double rounding = tolerance().saturation();
                assertTrue(
                        ds * point.temperature >= dh * (1 - rounding) - rounding * Math.abs(point.enthalpy),
                        () -> where("T2 ds >= dh", point));
                assertTrue(
                        ds * before.temperature <= dh * (1 + rounding) + rounding * Math.abs(point.enthalpy),
                        () -> where("T1 ds <= dh", point));
                before.set(point);
            }
        }
    }

    /** The derivatives that plants use, against differences of the (p,h) search, in one phase and in two. */
    @Test
    void derivativesWithPressureAndEnthalpyAreExact() {
        final FluidModel model = fluid().model();
        final StatePoint[] beside = {new StatePoint(), new StatePoint(), new StatePoint(), new StatePoint()};
        int compared = 0;
        for (final StatePoint point : points()) {
            final double caloric = point.phase == Phase.TWO_PHASE
                    ? point.pressure * point.volume
                    : point.heatCapacity * point.temperature;
            final double dh = 1e-4 * caloric;
            final double dp = 1e-4 * point.pressure;
            if (surround(model, point, dh, 0, beside)) {
                final double step = dh;
                compared++;
                slope(
                        "(dT/dh)p",
                        point,
                        point.temperatureByEnthalpy,
                        point.temperature / caloric,
                        slopeOf(beside, step, point, Value.TEMPERATURE));
                slope(
                        "(dv/dh)p",
                        point,
                        point.volumeByEnthalpy,
                        point.volume / caloric,
                        slopeOf(beside, step, point, Value.VOLUME));
                entropyByEnthalpy(point, slopeOf(beside, step, point, Value.ENTROPY));
            }
            if (surround(model, point, 0, dp, beside)) {
                compared++;
                final double byPressure =
                        Math.max(point.temperature / point.pressure, point.volume / caloric * point.temperature);
                slope(
                        "(dT/dp)h",
                        point,
                        point.temperatureByPressureAtEnthalpy,
                        byPressure,
                        slopeOf(beside, dp, point, Value.TEMPERATURE));
                slope(
                        "(dv/dp)h",
                        point,
                        point.volumeByPressureAtEnthalpy,
                        point.volume / point.pressure,
                        slopeOf(beside, dp, point, Value.VOLUME));
                entropyByPressure(point, slopeOf(beside, dp, point, Value.ENTROPY));
                if (point.phase == Phase.TWO_PHASE) {
                    slope(
                            "(dx/dp)h",
                            point,
                            point.vapourFractionByPressureAtEnthalpy,
                            Math.max(1 / point.pressure, Math.abs(point.vapourFractionByPressureAtEnthalpy)),
                            slopeOf(beside, dp, point, Value.VAPOUR_FRACTION));
                }
            }
        }
        assertTrue(compared > states(), "compared " + compared);
    }

    private enum Value {
        TEMPERATURE,
        VOLUME,
        ENTROPY,
        VAPOUR_FRACTION;

        double of(StatePoint point) {
            return switch (this) {
                case TEMPERATURE -> point.temperature;
                case VOLUME -> point.volume;
                case ENTROPY -> point.entropy;
                case VAPOUR_FRACTION -> point.vapourFraction;
            };
        }
    }

    private static boolean surround(FluidModel model, StatePoint point, double dh, double dp, StatePoint[] beside) {
        for (int i = 0; i < 4; i++) {
            final double share = i < 2 ? -1 + 0.5 * i : 0.5 * (i - 1);
            try {
                model.atPressureEnthalpy(point.pressure + share * dp, point.enthalpy + share * dh, beside[i]);
            } catch (OutOfRangeException e) {
                return false;
            }
            if (beside[i].phase != point.phase) {
                return false;
            }
        }
        return true;
    }

    /** {@return Richardson's extrapolation of two central differences; NaN where they disagree, as over a seam} */
    private static double slopeOf(StatePoint[] beside, double step, StatePoint point, Value value) {
        final double wide = (value.of(beside[3]) - value.of(beside[0])) / (2 * step);
        final double narrow = (value.of(beside[2]) - value.of(beside[1])) / step;
        final double rounding = 1e-12 * Math.abs(value.of(point)) / step;
        return Math.abs(wide - narrow) <= 1e-3 * Math.abs(narrow) + rounding ? (4 * narrow - wide) / 3 : Double.NaN;
    }

    private void slope(String what, StatePoint point, double stated, double scale, double difference) {
        slope(what, point, stated, scale, difference, 0);
    }

    /**
     * In two phases T ds = dh - v dp holds as exactly as the saturation line agrees with its two sides; what is left is the
     * same share of the vapour's volume at any vapour fraction.
     */
    private void entropyByPressure(StatePoint point, double difference) {
        final double stated = -point.volume / point.temperature;
        final double allowance = point.phase == Phase.TWO_PHASE
                ? tolerance().saturation() * point.vapourSide().volume / point.volume
                : 0;
        slope("(ds/dp)h", point, stated, point.volume / point.temperature, difference, allowance);
    }

    private void entropyByEnthalpy(StatePoint point, double difference) {
        final double stated = 1 / point.temperature;
        final double allowance = point.phase == Phase.TWO_PHASE ? tolerance().saturation() : 0;
        slope("(ds/dh)p", point, stated, stated, difference, allowance);
    }

    private void slope(
            String what, StatePoint point, double stated, double scale, double difference, double allowance) {
        if (!Double.isNaN(difference)) {
            // 1e-13 is where a search ends, 1e-4 the step
            final double tolerance = 10 * tolerance().derivatives() + 1e-8 + allowance;
            assertEquals(difference, stated, tolerance * scale, () -> where(what, point));
        }
    }

    @Test
    void resultsDoNotDependOnThreads() throws InterruptedException, ExecutionException {
        final List<StatePoint> points = points();
        final List<Double> alone = digest(points);
        final ExecutorService threads = Executors.newFixedThreadPool(4);
        try {
            final List<Future<List<Double>>> results = new ArrayList<>();
            for (int i = 0; i < 4; i++) {
                final Callable<List<Double>> task = () -> digest(points);
                results.add(threads.submit(task));
            }
            for (final Future<List<Double>> result : results) {
                assertEquals(alone, result.get(), "bit-identical results from every thread");
            }
        } finally {
            threads.shutdownNow();
        }
    }

    private List<Double> digest(List<StatePoint> points) {
        final FluidModel model = fluid().model();
        final StatePoint out = new StatePoint();
        final List<Double> digest = new ArrayList<>();
        for (int i = 0; i < points.size(); i += 5) {
            for (final StatePair pair : StatePair.values()) {
                if (pair.isTestedAt(points.get(i))) {
                    pair.find(model, points.get(i), out);
                    digest.add(out.temperature);
                    digest.add(out.entropy);
                }
            }
        }
        return digest;
    }

    @Test
    void refusesOutsideTheRange() {
        final FluidModel model = fluid().model();
        final FluidRange range = model.range();
        final StatePoint out = new StatePoint();
        final double t = 0.5 * (range.lowestTemperature() + range.highestTemperature());
        final double p = Math.sqrt(range.lowestPressure() * range.highestPressure());
        for (final double outside :
                new double[] {0.99 * range.lowestTemperature(), 1.01 * range.highestTemperature(), Double.NaN, 0, -1}) {
            assertThrows(OutOfRangeException.class, () -> model.atTemperaturePressure(outside, p, out));
            assertThrows(OutOfRangeException.class, () -> model.atTemperatureEntropy(outside, 0, out));
            assertThrows(OutOfRangeException.class, () -> model.atTemperatureVolume(outside, 1, out));
        }
        for (final double outside : new double[] {
            0.99 * range.lowestPressure(), 1.01 * range.highestPressure(), Double.NaN, 0, -1, Double.POSITIVE_INFINITY
        }) {
            assertThrows(OutOfRangeException.class, () -> model.atTemperaturePressure(t, outside, out));
            assertThrows(OutOfRangeException.class, () -> model.atPressureEnthalpy(outside, 0, out));
            assertThrows(OutOfRangeException.class, () -> model.atPressureEntropy(outside, 0, out));
            assertThrows(OutOfRangeException.class, () -> model.atPressureVolume(outside, 1, out));
        }
        for (final double nonsense : new double[] {Double.NaN, Double.POSITIVE_INFINITY, 1e30, -1e30}) {
            assertThrows(OutOfRangeException.class, () -> model.atPressureEnthalpy(p, nonsense, out));
            assertThrows(OutOfRangeException.class, () -> model.atPressureEntropy(p, nonsense, out));
            assertThrows(OutOfRangeException.class, () -> model.atPressureVolume(p, nonsense, out));
            assertThrows(OutOfRangeException.class, () -> model.atTemperatureEntropy(t, nonsense, out));
            assertThrows(OutOfRangeException.class, () -> model.atTemperatureVolume(t, nonsense, out));
            assertRefused(() -> model.atEnthalpyEntropy(nonsense, 0, out));
            assertRefused(() -> model.atEnthalpyEntropy(0, nonsense, out));
            assertRefused(() -> model.atInternalEnergyVolume(nonsense, 1, out));
            assertRefused(() -> model.atInternalEnergyVolume(0, nonsense, out));
            assertRefused(() -> model.atEntropyVolume(nonsense, 1, out));
        }
    }

    private static void assertRefused(Runnable flash) {
        final RuntimeException refusal = assertThrows(RuntimeException.class, flash::run);
        assertTrue(
                refusal instanceof OutOfRangeException || refusal instanceof FlashException,
                () -> "refused with " + refusal);
    }

    @Test
    void typedFaceAgreesWithThePrimitiveOne() {
        final Fluid fluid = fluid();
        final StatePoint out = new StatePoint();
        final SplittableRandom random = new SplittableRandom(SEED);
        for (int i = 0; i < 50; i++) {
            draw(random, out);
            final Temperature t = Temperature.kelvin(out.temperature);
            final Pressure p = Pressure.pascal(out.pressure);
            final FluidState state = fluid.state(t, p);
            assertEquals(state, fluid.state(p, t));
            assertEquals(state.hashCode(), fluid.state(p, t).hashCode());
            assertEquals(fluid.state(p, state.enthalpy()), fluid.state(state.enthalpy(), p));
            assertEquals(fluid.state(p, state.entropy()), fluid.state(state.entropy(), p));
            assertEquals(fluid.state(p, state.volume()), fluid.state(state.volume(), p));
            assertEquals(fluid.state(t, state.entropy()), fluid.state(state.entropy(), t));
            assertEquals(fluid.state(t, state.volume()), fluid.state(state.volume(), t));
            assertEquals(
                    fluid.state(state.enthalpy(), state.entropy()), fluid.state(state.entropy(), state.enthalpy()));
            assertEquals(
                    fluid.state(state.internalEnergy(), state.volume()),
                    fluid.state(state.volume(), state.internalEnergy()));
            assertEquals(fluid.state(state.entropy(), state.volume()), fluid.state(state.volume(), state.entropy()));
            assertEquals(out.volume, state.volume().inCubicMetresPerKilogram());
            assertEquals(1 / out.volume, state.density().inKilogramsPerCubicMetre(), 1e-12 / out.volume);
            assertEquals(
                    out.enthalpy - out.pressure * out.volume,
                    state.internalEnergy().inJoulesPerKilogram());
            assertEquals(out.phase, state.phase());
        }
    }

    @Test
    void saturationIsOneStateInTwoPhases() {
        final Fluid fluid = fluid();
        final SaturationModel model = fluid.model().saturation();
        if (model == null) {
            assertTrue(!fluid.hasSaturation());
            assertThrows(UndefinedPropertyException.class, () -> fluid.saturation(Temperature.kelvin(300)));
            assertThrows(UndefinedPropertyException.class, () -> fluid.state(Pressure.bar(1), Ratio.fraction(0.5)));
            return;
        }
        final SplittableRandom random = new SplittableRandom(SEED);
        for (int i = 0; i < 50; i++) {
            final Temperature t =
                    Temperature.kelvin(random.nextDouble(model.lowestTemperature(), highestSaturation(model)));
            final Saturation saturation = fluid.saturation(t);
            final FluidState half = fluid.state(t, Ratio.fraction(0.5));
            assertEquals(saturation.liquid(), fluid.state(t, Ratio.fraction(0)));
            assertEquals(saturation.vapour(), fluid.state(t, Ratio.fraction(1)));
            assertEquals(Phase.TWO_PHASE, half.phase());
            assertEquals(0.5, half.vapourFraction().orElseThrow().inFraction());
            final double latent = saturation.enthalpyOfEvaporation().si();
            assertEquals(
                    saturation.liquid().enthalpy().si() + 0.5 * latent,
                    half.enthalpy().si(),
                    1e-9 * latent);
            assertEquals(saturation.pressure(), half.pressure());
            final FluidState onTheLine = fluid.state(t, saturation.pressure());
            assertEquals(saturation.liquid().enthalpy(), onTheLine.enthalpy(), "liquid on the line");
            final Saturation back = fluid.saturation(saturation.pressure());
            assertEquals(t.si(), back.temperature().si(), 1e-9 * t.si());
        }
        assertThrows(
                OutOfRangeException.class,
                () -> fluid.saturation(Temperature.kelvin(1.001 * model.criticalTemperature())));
        assertThrows(OutOfRangeException.class, () -> fluid.state(Pressure.bar(1), Ratio.fraction(1.5)));
    }
}
