package lostwork.exergy;

import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Temperature;
import lostwork.solve.BracketedRoot;

/**
 * Pressure at which pure water vapour is in equilibrium with liquid water or ice, over temperature: what humidity and dew
 * points are counted from.
 *
 * <h2>Formula</h2>
 * <p>Above the triple point [1]: {@code ln(p/pc) = (Tc/T)(a1 τ + a2 τ^1.5 + a3 τ^3 + a4 τ^3.5 + a5 τ^4 + a6 τ^7.5)},
 * {@code τ = 1 - T/Tc}. Below [2]: {@code ln(p/pt) = (a1 θ^b1 + a2 θ^b2 + a3 θ^b3)/θ}, {@code θ = T/Tt}.
 *
 * <h2>Range</h2>
 * <p>130 K to 647.096 K, limits included, of which [2] covers what is below 273.16 K; the two formulas meet there within
 * 0.001 %.
 *
 * <h2>Accuracy</h2>
 * <p>[1] follows the saturation line of the equation of state IAPWS-95 within 0.005 %, and that of the industrial
 * formulation IF97 within 0.02 %; {@code WaterVapourPressureTableTest} holds both.
 *
 * <p>[1] IAPWS SR1-86(1992); W. Wagner, A. Pruss, Journal of Physical and Chemical Reference Data 22 (1993) 783. [2] IAPWS
 * R14-08(2011), sublimation pressure. Coefficients from memory, checked against the printed check values.
 */
public final class WaterVapourPressure {
    private static final double LOWEST_TEMPERATURE_K = 130;
    private static final double TRIPLE_TEMPERATURE_K = 273.16;
    private static final double TRIPLE_PRESSURE_PA = 611.657;
    private static final double CRITICAL_TEMPERATURE_K = 647.096;
    private static final double CRITICAL_PRESSURE_PA = 22.064e6;
    private static final String FORMULATION = "vapour pressure of water, IAPWS SR1-86 and R14-08";
    private static final BracketedRoot ROOTS = BracketedRoot.limitedTo(200);

    private WaterVapourPressure() {}

    /**
     * {@return the equilibrium pressure}
     *
     * @param temperature temperature of vapour and water or ice, 130 K to 647.096 K
     * @throws OutOfRangeException if the temperature is outside this range
     */
    public static Pressure at(Temperature temperature) {
        return Pressure.pascal(pascal(temperature.si()));
    }

    /**
     * {@return the temperature at which the equilibrium pressure has a value: the dew point, or the frost point below
     * 273.16 K, of a gas in which water has this partial pressure}
     *
     * @param partialPressure pressure of the water vapour, up to 22.064 MPa and not below the pressure over ice at 130 K
     * @throws OutOfRangeException if the pressure is outside this range
     */
    public static Temperature dewPoint(Pressure partialPressure) {
        final double pressure = partialPressure.si();
        final double least = pascal(LOWEST_TEMPERATURE_K);
        if (!(pressure >= least && pressure <= CRITICAL_PRESSURE_PA)) {
            throw new OutOfRangeException(
                    "partial pressure of water",
                    pressure,
                    least,
                    CRITICAL_PRESSURE_PA,
                    "Pa",
                    FORMULATION,
                    "a dew point exists between these limits only");
        }
        final double wanted = Math.log(pressure);
        return Temperature.kelvin(ROOTS.solve(
                "dew point of water at " + pressure + " Pa",
                kelvin -> Math.log(pascal(kelvin)) - wanted,
                LOWEST_TEMPERATURE_K,
                CRITICAL_TEMPERATURE_K));
    }

    /** {@return the highest temperature of the formula, the critical one of water: 647.096 K} */
    public static Temperature criticalTemperature() {
        return Temperature.kelvin(CRITICAL_TEMPERATURE_K);
    }

    /** {@return the highest pressure of the formula, the critical one of water: 22.064 MPa} */
    public static Pressure criticalPressure() {
        return Pressure.pascal(CRITICAL_PRESSURE_PA);
    }

    private static double pascal(double kelvin) {
        if (!(kelvin >= LOWEST_TEMPERATURE_K && kelvin <= CRITICAL_TEMPERATURE_K)) {
            throw new OutOfRangeException(
                    "temperature",
                    kelvin,
                    LOWEST_TEMPERATURE_K,
                    CRITICAL_TEMPERATURE_K,
                    "K",
                    FORMULATION,
                    "humidity has a meaning between these limits only: state it as 0, or leave it out");
        }
        return kelvin >= TRIPLE_TEMPERATURE_K ? overLiquid(kelvin) : overIce(kelvin);
    }

    private static double overLiquid(double kelvin) {
        final double tau = 1 - kelvin / CRITICAL_TEMPERATURE_K;
        final double root = Math.sqrt(tau);
        final double tau3 = tau * tau * tau;
        final double sum = tau * (-7.85951783 + 1.84408259 * root)
                + tau3 * (-11.7866497 + 22.6807411 * root - 15.9618719 * tau)
                + 1.80122502 * tau3 * tau3 * tau * root;
        return CRITICAL_PRESSURE_PA * Math.exp(CRITICAL_TEMPERATURE_K / kelvin * sum);
    }

    private static double overIce(double kelvin) {
        final double theta = kelvin / TRIPLE_TEMPERATURE_K;
        final double sum = -0.212144006e2 * Math.pow(theta, 0.333333333e-2)
                + 0.273203819e2 * Math.pow(theta, 0.120666667e1)
                - 0.610598130e1 * Math.pow(theta, 0.170333333e1);
        return TRIPLE_PRESSURE_PA * Math.exp(sum / theta);
    }
}
