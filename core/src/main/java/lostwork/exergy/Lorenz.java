package lostwork.exergy;

import lostwork.quantity.Power;
import lostwork.quantity.Ratio;

/**
 * The bounds that two reservoirs of sliding temperature set for any machine between them: those of Carnot between the mean
 * temperatures at which heat is exchanged.
 *
 * <p>A stream of flue gas that cools from 400 °C to 150 °C and cooling water that warms from 15 °C to 25 °C bound an engine
 * as two reservoirs at their Lorenz means do (see {@link TemperatureGlide}).
 *
 * <pre>{@code
 * Lorenz.engineEfficiency(
 *     TemperatureGlide.between(celsius(400), celsius(150)), TemperatureGlide.between(celsius(15), celsius(25)));
 * }</pre>
 *
 * <p>Source: H. Lorenz, Zeitschrift für die gesamte Kälte-Industrie 1 (1894) and 2 (1895).
 */
public final class Lorenz {
    private Lorenz() {}

    /**
     * {@return the highest efficiency of an engine: {@code 1 - Tmc/Tmh}}
     *
     * @param hot the temperatures at which heat is taken from the hot side
     * @param cold the temperatures at which heat is given to the cold side
     * @throws ReservoirException if the hot mean is below the cold mean
     */
    public static Ratio engineEfficiency(TemperatureGlide hot, TemperatureGlide cold) {
        return Ratio.fraction(Carnot.span(hot.meanKelvin(), cold.meanKelvin()) / hot.meanKelvin());
    }

    /**
     * {@return the most power that an engine yields}
     *
     * @param heat the heat flow taken from the hot side
     * @param hot the temperatures at which heat is taken from the hot side
     * @param cold the temperatures at which heat is given to the cold side
     * @throws ReservoirException if the hot mean is below the cold mean
     */
    public static Power enginePower(Power heat, TemperatureGlide hot, TemperatureGlide cold) {
        return heat.times(engineEfficiency(hot, cold));
    }

    /**
     * {@return the highest coefficient of performance of a refrigerator: {@code Tmc / (Tmh - Tmc)}}
     *
     * @param hot the temperatures at which heat is given to the hot side
     * @param cold the temperatures at which heat is taken from the cold side
     * @throws ReservoirException if the hot mean is not above the cold mean
     */
    public static Ratio refrigeratorCop(TemperatureGlide hot, TemperatureGlide cold) {
        return Ratio.fraction(Carnot.refrigerator(hot.meanKelvin(), cold.meanKelvin()));
    }

    /**
     * {@return the highest coefficient of performance of a heat pump: {@code Tmh / (Tmh - Tmc)}}
     *
     * @param hot the temperatures at which heat is given to the hot side
     * @param cold the temperatures at which heat is taken from the cold side
     * @throws ReservoirException if the hot mean is not above the cold mean
     */
    public static Ratio heatPumpCop(TemperatureGlide hot, TemperatureGlide cold) {
        return Ratio.fraction(Carnot.heatPump(hot.meanKelvin(), cold.meanKelvin()));
    }
}
