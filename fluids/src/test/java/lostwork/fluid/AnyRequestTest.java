package lostwork.fluid;

import static lostwork.fluid.gas.CombustionAir.excessAir;
import static lostwork.fluid.gas.MoleFraction.methane;
import static lostwork.quantity.Ratio.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.gas.FlueGas;
import lostwork.fluid.gas.Fuel;
import lostwork.fluid.gas.HumidAir;
import lostwork.fluid.gas.PerfectGas;
import lostwork.fluid.water.Water;
import lostwork.quantity.MolarMass;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Ratio;
import lostwork.testing.Campaign;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Any request, sense or nonsense, ends in a state that has the two properties asked for, or in a typed refusal that names
 * the fluid and the value.
 */
@Timeout(value = 300, unit = TimeUnit.SECONDS)
class AnyRequestTest {
    private static final int REQUESTS = Campaign.cases(1_000);

    private static final double[] ODD = {
        Double.NaN,
        Double.POSITIVE_INFINITY,
        Double.NEGATIVE_INFINITY,
        0,
        -0.0,
        1,
        -1,
        Double.MIN_VALUE,
        -Double.MIN_VALUE,
        Double.MAX_VALUE,
        -Double.MAX_VALUE,
        1e-300,
        1e300,
        -1e300,
        273.15,
        1e5
    };

    static Stream<FluidModel> models() {
        return Stream.of(
                        Water.industrial(),
                        PerfectGas.of("air", MolarMass.gramsPerMole(28.96), Ratio.fraction(1.4)),
                        DryAir.standard(),
                        HumidAir.ofHumidityRatio(percent(1.2)),
                        FlueGas.of(Fuel.naturalGas(methane(1)), excessAir(percent(18))),
                        Fluid.of(new VanDerWaalsFluid()),
                        Fluid.of(new TwoPhaseExample()))
                .map(Fluid::model);
    }

    @ParameterizedTest
    @MethodSource("models")
    void aStateThatWasAskedForOrATypedRefusal(FluidModel model) {
        final List<String> wrong = new ArrayList<>();
        for (final StatePair pair : StatePair.values()) {
            final SplittableRandom random = new SplittableRandom(20_261 + pair.ordinal());
            final StatePoint found = new StatePoint();
            for (int i = 0; i < REQUESTS; i++) {
                final StatePoint asked = request(model, random);
                final String answer = answer(model, pair, asked, found);
                if (answer.startsWith("WRONG")) {
                    wrong.add(pair + " " + answer + " asked " + text(asked));
                }
            }
        }
        assertTrue(
                wrong.isEmpty(),
                () -> wrong.size() + " wrong answers of " + model.name() + ":\n"
                        + String.join("\n", wrong.subList(0, Math.min(12, wrong.size()))));
    }

    /** Four threads that ask one model at the same time hear the same answers as one that asks alone. */
    @ParameterizedTest
    @MethodSource("models")
    void threadsDoNotDisturbEachOther(FluidModel model) throws Exception {
        final ExecutorService threads = Executors.newFixedThreadPool(4);
        try {
            final Callable<List<String>> questions = () -> answers(model);
            final List<String> alone = questions.call();
            for (final Future<List<String>> together :
                    threads.invokeAll(List.of(questions, questions, questions, questions))) {
                assertEquals(alone, together.get());
            }
        } finally {
            threads.shutdownNow();
        }
    }

    private static List<String> answers(FluidModel model) {
        final SplittableRandom random = new SplittableRandom(7);
        final StatePoint found = new StatePoint();
        final List<String> answers = new ArrayList<>();
        for (int i = 0; i < 25; i++) {
            for (final StatePair pair : StatePair.values()) {
                answers.add(answer(model, pair, request(model, random), found));
            }
        }
        return answers;
    }

    /** {@return the state found, the refusal, or what is wrong} */
    private static String answer(FluidModel model, StatePair pair, StatePoint asked, StatePoint found) {
        try {
            pair.find(model, asked, found);
        } catch (OutOfRangeException | FlashException | UndefinedPropertyException e) {
            final String message = String.valueOf(e.getMessage());
            return message.length() < 20 || message.contains("null") ? "WRONG message: " + message : message;
        } catch (RuntimeException | StackOverflowError e) {
            return "WRONG exception " + e;
        }
        final double off = pair.deviation(pairOf(pair, asked, found), found);
        if (!(off <= 1e-9)) {
            return "WRONG state, off by " + off + ": " + text(found);
        }
        final FluidRange range = model.range();
        final boolean inside = found.temperature >= range.lowestTemperature()
                && found.temperature <= range.highestTemperature()
                && found.pressure >= range.lowestPressure()
                && found.pressure <= range.highestPressure();
        return inside ? text(found) : "WRONG state out of range: " + text(found);
    }

    /** {@return the found state with the pair that was asked for put in, so that nothing else of the request is judged} */
    private static StatePoint pairOf(StatePair pair, StatePoint asked, StatePoint found) {
        final StatePoint judged = new StatePoint();
        judged.set(found);
        switch (pair) {
            case TEMPERATURE_PRESSURE, TEMPERATURE_VAPOUR_FRACTION, TEMPERATURE_ENTROPY, TEMPERATURE_VOLUME ->
                judged.temperature = asked.temperature;
            case PRESSURE_ENTHALPY, PRESSURE_ENTROPY, PRESSURE_VOLUME, PRESSURE_VAPOUR_FRACTION ->
                judged.pressure = asked.pressure;
            case INTERNAL_ENERGY_VOLUME -> judged.enthalpy = asked.internalEnergy() + found.pressure * asked.volume;
            default -> {}
        }
        switch (pair) {
            case TEMPERATURE_PRESSURE -> judged.pressure = asked.pressure;
            case PRESSURE_ENTHALPY -> judged.enthalpy = asked.enthalpy;
            case PRESSURE_ENTROPY, TEMPERATURE_ENTROPY -> judged.entropy = asked.entropy;
            case PRESSURE_VAPOUR_FRACTION, TEMPERATURE_VAPOUR_FRACTION -> judged.vapourFraction = asked.vapourFraction;
            case PRESSURE_VOLUME, TEMPERATURE_VOLUME, INTERNAL_ENERGY_VOLUME -> judged.volume = asked.volume;
            case ENTROPY_VOLUME -> {
                judged.entropy = asked.entropy;
                judged.volume = asked.volume;
            }
            case ENTHALPY_ENTROPY -> {
                judged.enthalpy = asked.enthalpy;
                judged.entropy = asked.entropy;
            }
            default -> throw new IllegalStateException("a new pair: " + pair);
        }
        return judged;
    }

    /** Draws properties of real states, each of another one, some a rounding off, and now and then nonsense. */
    private static StatePoint request(FluidModel model, SplittableRandom random) {
        final StatePoint one = real(model, random);
        final StatePoint other = random.nextInt(3) == 0 ? one : real(model, random);
        final double temperature = mangled(one.temperature, random);
        final double pressure = mangled(random.nextBoolean() ? one.pressure : other.pressure, random);
        final double volume = mangled(one.volume, random);
        final double enthalpy = mangled(other.enthalpy, random);
        final double entropy = mangled(random.nextBoolean() ? one.entropy : other.entropy, random);
        final StatePoint asked = new StatePoint();
        asked.temperature = temperature;
        asked.pressure = pressure;
        asked.volume = volume;
        asked.enthalpy = enthalpy;
        asked.entropy = entropy;
        asked.vapourFraction = mangled(random.nextDouble(), random);
        return asked;
    }

    private static StatePoint real(FluidModel model, SplittableRandom random) {
        final FluidRange range = model.range();
        final StatePoint point = new StatePoint();
        final double temperature = range.lowestTemperature()
                + (range.highestTemperature() - range.lowestTemperature()) * Math.pow(random.nextDouble(), 2);
        final double pressure = range.lowestPressure()
                * Math.pow(range.highestPressure() / range.lowestPressure(), random.nextDouble());
        try {
            model.atTemperaturePressure(temperature, pressure, point);
        } catch (OutOfRangeException e) {
            return real(model, random);
        }
        return point;
    }

    private static double mangled(double value, SplittableRandom random) {
        switch (random.nextInt(12)) {
            case 0:
                return ODD[random.nextInt(ODD.length)];
            case 1:
                return (random.nextInt(4) == 0 ? -1 : 1) * Math.pow(10, random.nextDouble(-15, 15));
            case 2:
                return value * (1 + random.nextDouble(-1e-9, 1e-9));
            case 3:
                return value * random.nextDouble(-0.5, 2);
            default:
                return value;
        }
    }

    private static String text(StatePoint point) {
        return "T " + point.temperature + " p " + point.pressure + " v " + point.volume + " h " + point.enthalpy + " s "
                + point.entropy + " x " + point.vapourFraction;
    }
}
