package lostwork.exergy;

import lostwork.quantity.Power;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;

/**
 * The bounds that two reservoirs of constant temperature set for any machine between them.
 *
 * <ul>
 *   <li>engine, work over heat taken from the hot side: {@code η = 1 - Tc/Th};
 *   <li>refrigerator, heat taken from the cold side over work: {@code COP = Tc / (Th - Tc)};
 *   <li>heat pump, heat given to the hot side over work: {@code COP = Th / (Th - Tc)}, one more than the refrigerator's.
 * </ul>
 * <p>An engine between equal temperatures has the efficiency 0, exactly; a coefficient of performance has no finite value
 * there, and a {@link ReservoirException} says so.
 *
 * <p>Source: S. Carnot, Réflexions sur la puissance motrice du feu, Paris 1824; R. Clausius 1854. Any textbook.
 */
public final class Carnot {
    private Carnot() {}

    /**
     * {@return the highest efficiency of an engine}
     *
     * @param hot the temperature of the hot reservoir
     * @param cold the temperature of the cold reservoir and not above the hot one
     * @throws ReservoirException if the temperatures are in the wrong order
     */
    public static Ratio engineEfficiency(Temperature hot, Temperature cold) {
        final double span = span(hot.si(), cold.si());
        return Ratio.fraction(span / hot.si());
    }

    /**
     * {@return the most power that an engine yields}
     *
     * @param heat the heat flow taken from the hot reservoir
     * @param hot the temperature of the hot reservoir
     * @param cold the temperature of the cold reservoir and not above the hot one
     * @throws ReservoirException if the temperatures are in the wrong order
     */
    public static Power enginePower(Power heat, Temperature hot, Temperature cold) {
        return heat.times(engineEfficiency(hot, cold));
    }

    /**
     * {@return the highest coefficient of performance of a refrigerator}
     *
     * @param hot the temperature of the hot reservoir, to which the heat is rejected
     * @param cold the temperature of the cold reservoir and below the hot one
     * @throws ReservoirException if the temperatures are equal or in the wrong order
     */
    public static Ratio refrigeratorCop(Temperature hot, Temperature cold) {
        return Ratio.fraction(refrigerator(hot.si(), cold.si()));
    }

    /**
     * {@return the highest coefficient of performance of a heat pump}
     *
     * @param hot the temperature of the hot reservoir, which is heated
     * @param cold the temperature of the cold reservoir and below the hot one
     * @throws ReservoirException if the temperatures are equal or in the wrong order
     */
    public static Ratio heatPumpCop(Temperature hot, Temperature cold) {
        return Ratio.fraction(heatPump(hot.si(), cold.si()));
    }

    static double refrigerator(double hot, double cold) {
        return cold / spanAboveZero(hot, cold);
    }

    static double heatPump(double hot, double cold) {
        return hot / spanAboveZero(hot, cold);
    }

    /** The difference of two absolute temperatures in the right order, in K. */
    static double span(double hot, double cold) {
        if (!(hot >= cold)) {
            throw ReservoirException.reversed(hot, cold);
        }
        return hot - cold;
    }

    private static double spanAboveZero(double hot, double cold) {
        final double span = span(hot, cold);
        if (!(span > 0)) {
            throw ReservoirException.equal(hot, cold);
        }
        return span;
    }
}
