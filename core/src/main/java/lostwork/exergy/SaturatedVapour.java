package lostwork.exergy;

import lostwork.quantity.OutOfRangeException;

/**
 * Saturation pressure of water vapour over liquid water and over ice.
 *
 * <p>Above the triple point [1]: {@code ln(p/pc) = (Tc/T)(a1 τ + a2 τ^1.5 + a3 τ^3 + a4 τ^3.5 + a5 τ^4 + a6 τ^7.5)},
 * {@code τ = 1 - T/Tc}. Below [2]: {@code ln(p/pt) = (a1 θ^b1 + a2 θ^b2 + a3 θ^b3)/θ}, {@code θ = T/Tt}.
 *
 * <p>[1] IAPWS SR1-86(1992); W. Wagner, A. Pruss, Journal of Physical and Chemical Reference Data 22 (1993) 783. [2] IAPWS
 * R14-08(2011). The coefficients are from memory; the check values stand in the tests.
 */
final class SaturatedVapour {
    private static final double LOWEST = 130;
    private static final double TRIPLE_TEMPERATURE = 273.16;
    private static final double TRIPLE_PRESSURE = 611.657;
    private static final double CRITICAL_TEMPERATURE = 647.096;
    private static final double CRITICAL_PRESSURE = 22.064e6;

    private SaturatedVapour() {}

    /** Pressure in Pa at a temperature in K, 130 K to 647.096 K. */
    static double pressure(double kelvin) {
        if (!(kelvin >= LOWEST && kelvin <= CRITICAL_TEMPERATURE)) {
            throw new OutOfRangeException(
                    "ambient temperature",
                    kelvin,
                    LOWEST,
                    CRITICAL_TEMPERATURE,
                    "K",
                    "vapour pressure of water, IAPWS SR1-86 and R14-08",
                    "humidity has a meaning between these limits only: state it as 0, or leave it out");
        }
        return kelvin >= TRIPLE_TEMPERATURE ? overLiquid(kelvin) : overIce(kelvin);
    }

    private static double overLiquid(double kelvin) {
        final double tau = 1 - kelvin / CRITICAL_TEMPERATURE;
        final double root = Math.sqrt(tau);
        final double tau3 = tau * tau * tau;
        final double sum = tau * (-7.85951783 + 1.84408259 * root)
                + tau3 * (-11.7866497 + 22.6807411 * root - 15.9618719 * tau)
                + 1.80122502 * tau3 * tau3 * tau * root;
        return CRITICAL_PRESSURE * Math.exp(CRITICAL_TEMPERATURE / kelvin * sum);
    }

    private static double overIce(double kelvin) {
        final double theta = kelvin / TRIPLE_TEMPERATURE;
        final double sum = -0.212144006e2 * Math.pow(theta, 0.333333333e-2)
                + 0.273203819e2 * Math.pow(theta, 0.120666667e1)
                - 0.610598130e1 * Math.pow(theta, 0.170333333e1);
        return TRIPLE_PRESSURE * Math.exp(sum / theta);
    }
}
