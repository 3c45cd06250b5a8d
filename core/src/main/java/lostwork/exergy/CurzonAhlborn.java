package lostwork.exergy;

import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;

/**
 * What a reversible machine reaches when it is driven for output and meets its reservoirs through finite heat
 * conductances (the endoreversible machine).
 *
 * <ul>
 *   <li>engine at maximum power: {@code η = 1 - √(Tc/Th)} (F. L. Curzon, B. Ahlborn, American Journal of Physics 43 (1975)
 *       22-24; earlier I. I. Novikov 1957 and P. Chambadal 1957);
 *   <li>refrigerator at the maximum of cooling rate times coefficient of performance:
 *       {@code COP = 1/√(1 - Tc/Th) - 1} (Z. Yan, J. Chen, Journal of Physics D 23 (1990) 136-139);
 *   <li>heat pump: the same machine seen from its hot side, {@code COP = 1/√(1 - Tc/Th)}, one more than the refrigerator's.
 * </ul>
 *
 * <p>These are estimates of what large machines do, not bounds: a machine with large exchangers, or driven slowly, lies
 * above them, and the only bound is {@link Carnot}. For refrigerators a maximum of power has no counterpart, so the result
 * depends on the criterion that is named above.
 */
public final class CurzonAhlborn {
    private CurzonAhlborn() {}

    /**
     * {@return the efficiency of an engine at maximum power; at least half of Carnot's}
     *
     * @param hot the temperature of the hot reservoir
     * @param cold the temperature of the cold reservoir and not above the hot one
     * @throws ReservoirException if the temperatures are in the wrong order
     */
    public static Ratio engineEfficiency(Temperature hot, Temperature cold) {
        final double carnot = Carnot.span(hot.si(), cold.si()) / hot.si();
        // 1 - √(1 - c) without cancellation for small c.
        return Ratio.fraction(carnot / (1 + Math.sqrt(1 - carnot)));
    }

    /**
     * {@return the coefficient of performance of a refrigerator at the maximum of cooling rate times coefficient}
     *
     * @param hot the temperature of the hot reservoir, to which the heat is rejected
     * @param cold the temperature of the cold reservoir and below the hot one
     * @throws ReservoirException if the temperatures are equal or in the wrong order
     */
    public static Ratio refrigeratorCop(Temperature hot, Temperature cold) {
        final double carnot = Carnot.refrigerator(hot.si(), cold.si());
        // √(1 + c) - 1 without cancellation for small c.
        return Ratio.fraction(carnot / (1 + Math.sqrt(1 + carnot)));
    }

    /**
     * {@return the coefficient of performance of the same machine as a heat pump}
     *
     * @param hot the temperature of the hot reservoir, which is heated
     * @param cold the temperature of the cold reservoir and below the hot one
     * @throws ReservoirException if the temperatures are equal or in the wrong order
     */
    public static Ratio heatPumpCop(Temperature hot, Temperature cold) {
        return Ratio.fraction(Math.sqrt(Carnot.heatPump(hot.si(), cold.si())));
    }
}
