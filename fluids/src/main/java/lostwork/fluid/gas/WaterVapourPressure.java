package lostwork.fluid.gas;

import lostwork.quantity.OutOfRangeException;
import lostwork.solve.BracketedRoot;

/**
 * Pressure at which pure water vapour is in equilibrium with liquid water or ice, over temperature.
 *
 * <h2>Formula</h2>
 * <p>Above the triple point [1]: ln(p/pc) = (Tc/T)(a1 τ + a2 τ^1.5 + a3 τ^3 + a4 τ^3.5 + a5 τ^4 + a6 τ^7.5),
 * τ = 1 − T/Tc. Below [2]: ln(p/pt) = (a1 θ^b1 + a2 θ^b2 + a3 θ^b3)/θ, θ = T/Tt.
 *
 * <h2>Range</h2>
 * <p>130 K to 647.096 K, limits included; the two formulas meet at the triple point within 0.001 %.
 *
 * <p>[1] IAPWS SR1-86(1992), Wagner and Pruss, J. Phys. Chem. Ref. Data 22 (1993) 783. [2] IAPWS R14-08(2011),
 * sublimation pressure. Coefficients from memory, checked against the printed check values in
 * {@code WaterVapourPressureTableTest}.
 */
final class WaterVapourPressure {
    /** Lower limit of the second range of [2] that is used here, in K. */
    static final double LOWEST_TEMPERATURE_K = 130;
    /** Critical temperature of [1], in K. */
    static final double CRITICAL_TEMPERATURE_K = 647.096;

    private static final double CRITICAL_PRESSURE_PA = 22.064e6;
    private static final double TRIPLE_TEMPERATURE_K = 273.16;
    private static final double TRIPLE_PRESSURE_PA = 611.657;
    private static final BracketedRoot ROOTS = BracketedRoot.limitedTo(200);

    private WaterVapourPressure() {}

    /** {@return the equilibrium pressure in Pa at a temperature in K} */
    static double pascal(double temperature) {
        if (!(temperature >= LOWEST_TEMPERATURE_K && temperature <= CRITICAL_TEMPERATURE_K)) {
            throw new OutOfRangeException(
                    "temperature",
                    temperature,
                    LOWEST_TEMPERATURE_K,
                    CRITICAL_TEMPERATURE_K,
                    "K",
                    "vapour pressure of water, IAPWS SR1-86 and R14-08",
                    "");
        }
        return temperature >= TRIPLE_TEMPERATURE_K ? overLiquid(temperature) : overIce(temperature);
    }

    private static double overLiquid(double temperature) {
        final double tau = 1 - temperature / CRITICAL_TEMPERATURE_K;
        final double root = Math.sqrt(tau);
        final double tau3 = tau * tau * tau;
        final double sum = tau * (-7.85951783 + 1.84408259 * root)
                + tau3 * (-11.7866497 + 22.6807411 * root - 15.9618719 * tau)
                + 1.80122502 * tau3 * tau3 * tau * root;
        return CRITICAL_PRESSURE_PA * Math.exp(CRITICAL_TEMPERATURE_K / temperature * sum);
    }

    private static double overIce(double temperature) {
        final double theta = temperature / TRIPLE_TEMPERATURE_K;
        final double sum = -0.212144006e2 * Math.pow(theta, 0.333333333e-2)
                + 0.273203819e2 * Math.pow(theta, 0.120666667e1)
                - 0.610598130e1 * Math.pow(theta, 0.170333333e1);
        return TRIPLE_PRESSURE_PA * Math.exp(sum / theta);
    }

    /** {@return the temperature in K at which the equilibrium pressure has a value in Pa} */
    static double temperature(double pressure) {
        final double least = pascal(LOWEST_TEMPERATURE_K);
        if (!(pressure >= least && pressure <= CRITICAL_PRESSURE_PA)) {
            throw new OutOfRangeException(
                    "partial pressure of water",
                    pressure,
                    least,
                    CRITICAL_PRESSURE_PA,
                    "Pa",
                    "vapour pressure of water, IAPWS SR1-86 and R14-08",
                    "a dew point exists between these limits only");
        }
        final double wanted = Math.log(pressure);
        return ROOTS.solve(
                "dew point of water at " + pressure + " Pa",
                temperature -> Math.log(pascal(temperature)) - wanted,
                LOWEST_TEMPERATURE_K,
                CRITICAL_TEMPERATURE_K);
    }
}
