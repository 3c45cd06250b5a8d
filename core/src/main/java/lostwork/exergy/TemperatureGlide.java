package lostwork.exergy;

import java.io.Serializable;
import lostwork.quantity.Temperature;

/**
 * The temperatures over which a heat is given off or taken up: from one to another, or all at one.
 *
 * <h2>Lorenz mean temperature</h2>
 * <p>The temperature at which the same heat would carry the same entropy: {@code Tm = Q / ∫ δQ/T}. It lies between both
 * ends, whichever comes first.
 * <ul>
 *   <li>Constant heat capacity rate ({@link #between}): {@code Tm = (T1 - T2) / ln(T1/T2)}, the logarithmic mean of the
 *       absolute temperatures; for equal ends their common value, exactly.
 *   <li>A stream between two states ({@link #ofStream}): {@code Tm = (h2 - h1) / (s2 - s1)}, whatever its heat capacity and
 *       changes of phase. Without friction this is the mean over the heat; a pressure loss on the way shifts it.
 * </ul>
 *
 * <p>Source: H. Lorenz, Zeitschrift für die gesamte Kälte-Industrie 1 (1894) and 2 (1895), on the cycle between sliding
 * temperatures; A. Bejan, Advanced Engineering Thermodynamics, 4th ed., Wiley 2016, on entropic averages.
 *
 * <p>Immutable, thread-safe and serializable.
 */
public final class TemperatureGlide implements Serializable {
    private static final long serialVersionUID = 1L;

    /** Where the heat exchange begins. */
    private final Temperature start;
    /** Where it ends. */
    private final Temperature end;
    /** The temperature that carries the same entropy with the same heat, in K. */
    private final double mean;

    private TemperatureGlide(Temperature start, Temperature end, double mean) {
        this.start = start;
        this.end = end;
        this.mean = mean;
    }

    /**
     * {@return a heat exchanged at one temperature}
     *
     * @param temperature the temperature
     */
    public static TemperatureGlide constant(Temperature temperature) {
        return new TemperatureGlide(temperature, temperature, temperature.si());
    }

    /**
     * {@return a heat exchanged by a body or stream of constant heat capacity}
     *
     * @param start the temperature at which the exchange begins
     * @param end the temperature at which it ends; may lie above or below the start
     */
    public static TemperatureGlide between(Temperature start, Temperature end) {
        return new TemperatureGlide(start, end, logarithmicMean(start.si(), end.si()));
    }

    /**
     * {@return a heat exchanged by a stream on its way between two states of the same matter}
     *
     * @param start the state at which the exchange begins
     * @param end the state at which it ends
     * @throws IllegalArgumentException if enthalpy and entropy do not change in the same direction, so that no temperature
     *     stands for the exchange: the change is not one by heat alone
     */
    public static TemperatureGlide ofStream(ThermodynamicState start, ThermodynamicState end) {
        final double heat = end.enthalpy().si() - start.enthalpy().si();
        final double entropy = end.entropy().si() - start.entropy().si();
        if (heat == 0 && entropy == 0 && start.temperature().equals(end.temperature())) {
            return constant(start.temperature());
        }
        final double mean = heat / entropy;
        if (!(mean > 0 && mean < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("enthalpy changes by " + heat + " J/kg and entropy by " + entropy
                    + " J/(kg K) between " + start.temperature() + " and " + end.temperature()
                    + ": no mean temperature stands for this change, since it is not one by heat alone;"
                    + " take the states on both sides of a heat exchange at little pressure loss");
        }
        return new TemperatureGlide(start.temperature(), end.temperature(), mean);
    }

    /** {@code (a - b) / ln(a/b)} for positive a and b, to a few units in the last place however close they are. */
    static double logarithmicMean(double a, double b) {
        final double low = Math.min(a, b);
        final double difference = Math.max(a, b) - low;
        return difference == 0 ? low : difference / Math.log1p(difference / low);
    }

    /** {@return the temperature at which the exchange begins} */
    public Temperature start() {
        return start;
    }

    /** {@return the temperature at which the exchange ends} */
    public Temperature end() {
        return end;
    }

    /** {@return the Lorenz mean temperature: the same heat at this one temperature carries the same entropy} */
    public Temperature mean() {
        return Temperature.kelvin(mean);
    }

    double meanKelvin() {
        return mean;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof TemperatureGlide that
                && start.equals(that.start)
                && end.equals(that.end)
                && Double.compare(mean, that.mean) == 0;
    }

    @Override
    public int hashCode() {
        return (start.hashCode() * 31 + end.hashCode()) * 31 + Double.hashCode(mean);
    }

    @Override
    public String toString() {
        return start.equals(end) ? start.toString() : start + " to " + end + " (mean " + mean() + ")";
    }

    /** {@return what is written to a stream} */
    private Object writeReplace() {
        return new Form(start, end, mean);
    }

    /**
     * The serial form; read back through the checks.
     *
     * @param start where the exchange begins
     * @param end where it ends
     * @param mean the mean temperature in K
     */
    private record Form(Temperature start, Temperature end, double mean) implements Serializable {
        private static final long serialVersionUID = 1L;

        /** {@return the glide, checked} */
        private Object readResolve() {
            Temperature.kelvin(mean); // refuses what is not positive and finite
            return new TemperatureGlide(start, end, mean);
        }
    }
}
