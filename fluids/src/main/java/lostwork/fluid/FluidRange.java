package lostwork.fluid;

import lostwork.quantity.OutOfRangeException;

/**
 * The temperatures and pressures in which a property model holds, in K and Pa, limits included.
 *
 * @param lowestTemperature lowest temperature in K
 * @param highestTemperature highest temperature in K
 * @param lowestPressure lowest absolute pressure in Pa, above 0
 * @param highestPressure highest absolute pressure in Pa
 * @param limitedBy what sets the limits, for messages, such as {@code "IAPWS-IF97"}
 */
public record FluidRange(
        double lowestTemperature,
        double highestTemperature,
        double lowestPressure,
        double highestPressure,
        String limitedBy) {
    /** What the message of a refusal offers. */
    static final String WAY_OUT =
            "no extrapolation is offered; take a state inside the range or a fluid whose model holds there";

    /**
     * Checks the limits.
     *
     * @param lowestTemperature lowest temperature in K
     * @param highestTemperature highest temperature in K
     * @param lowestPressure lowest absolute pressure in Pa, above 0
     * @param highestPressure highest absolute pressure in Pa
     * @param limitedBy what sets the limits
     * @throws IllegalArgumentException if a limit is not above 0 and finite, or a lower limit is not below its upper one
     */
    public FluidRange {
        if (!(lowestTemperature > 0
                && lowestTemperature < highestTemperature
                && highestTemperature <= Double.MAX_VALUE
                && lowestPressure > 0
                && lowestPressure < highestPressure
                && highestPressure <= Double.MAX_VALUE)) {
            throw new IllegalArgumentException("range of " + limitedBy + ": T = " + lowestTemperature + " .. "
                    + highestTemperature + " K, p = " + lowestPressure + " .. " + highestPressure
                    + " Pa; limits must be above 0 and finite, the lower below the upper");
        }
    }

    /**
     * {@return whether a temperature and a pressure lie within the range}
     *
     * @param temperature temperature in K
     * @param pressure absolute pressure in Pa
     */
    public boolean contains(double temperature, double pressure) {
        return temperature >= lowestTemperature
                && temperature <= highestTemperature
                && pressure >= lowestPressure
                && pressure <= highestPressure;
    }

    /**
     * Refuses a temperature outside the range.
     *
     * @param temperature temperature in K
     * @throws OutOfRangeException if the temperature is NaN or outside the range
     */
    public void requireTemperature(double temperature) {
        if (!(temperature >= lowestTemperature && temperature <= highestTemperature)) {
            throw new OutOfRangeException(
                    "temperature", temperature, lowestTemperature, highestTemperature, "K", limitedBy, WAY_OUT);
        }
    }

    /**
     * Refuses a pressure outside the range.
     *
     * @param pressure absolute pressure in Pa
     * @throws OutOfRangeException if the pressure is NaN or outside the range
     */
    public void requirePressure(double pressure) {
        if (!(pressure >= lowestPressure && pressure <= highestPressure)) {
            throw new OutOfRangeException(
                    "pressure", pressure, lowestPressure, highestPressure, "Pa", limitedBy, WAY_OUT);
        }
    }

    /** {@return the limits with their units, and what sets them} */
    @Override
    public String toString() {
        return lowestTemperature + " K to " + highestTemperature + " K, " + lowestPressure + " Pa to " + highestPressure
                + " Pa (" + limitedBy + ")";
    }
}
