package lostwork.exergy;

import lostwork.quantity.OutOfRangeException;

/**
 * Saturation pressure of water vapour over liquid water and over ice.
 *
 * <p>R. W. Hyland, A. Wexler, Formulations for the thermodynamic properties of the saturated phases of H2O from 173.15 K to
 * 473.15 K, ASHRAE Transactions 89 (2A) (1983) 500-519: {@code ln(p/Pa) = c₋₁/T + c₀ + c₁T + c₂T² + c₃T³ + c₄T⁴ + d ln T}.
 * The coefficients are from memory; the check values stand in the tests.
 */
final class SaturatedVapour {
    private static final double LOWEST = 173.15;
    private static final double TRIPLE_POINT = 273.16;
    private static final double HIGHEST = 473.15;

    private SaturatedVapour() {}

    /** Pressure in Pa at a temperature in K, 173.15 K to 473.15 K. */
    static double pressure(double kelvin) {
        final double t = kelvin;
        if (!(t >= LOWEST && t <= HIGHEST)) {
            throw new OutOfRangeException(
                    "ambient temperature",
                    t,
                    LOWEST,
                    HIGHEST,
                    "K",
                    "saturation pressure of water, Hyland and Wexler 1983",
                    "leave the humidity out, or give the whole atmosphere with withAtmosphere");
        }
        final double lnP = t < TRIPLE_POINT
                ? -5674.5359 / t
                        + 6.3925247
                        + t * (-9.677843e-3 + t * (6.2215701e-7 + t * (2.0747825e-9 - t * 9.484024e-13)))
                        + 4.1635019 * Math.log(t)
                : -5800.2206 / t
                        + 1.3914993
                        + t * (-4.8640239e-2 + t * (4.1764768e-5 - t * 1.4452093e-8))
                        + 6.5459673 * Math.log(t);
        return Math.exp(lnP);
    }
}
