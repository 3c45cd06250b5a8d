package lostwork.fluid.water;

import lostwork.fluid.SaturationModel;

/**
 * The saturation line of IAPWS-IF97, region 4: R7-97(2012), equations 29 to 31.
 *
 * <p>With ϑ = T/K + n<sub>9</sub>/(T/K − n<sub>10</sub>) and β = (p/MPa)<sup>1/4</sup>, a quadratic in each, so that
 * pressure and temperature are exact inverses of each other.
 */
final class If97Saturation implements SaturationModel {
    /** Critical temperature of R7-97(2012), equation 9, in K. */
    static final double CRITICAL_TEMPERATURE_K = 647.096;
    /** Critical pressure of R7-97(2012), equation 10, in Pa. */
    static final double CRITICAL_PRESSURE_PA = 22.064e6;
    /** Lowest temperature of the line in K: 0 °C, a hundredth of a kelvin below the triple point. */
    static final double LOWEST_TEMPERATURE_K = 273.15;

    private static final double PASCAL_PER_MEGAPASCAL = 1e6;

    private final double n1;
    private final double n2;
    private final double n3;
    private final double n4;
    private final double n5;
    private final double n6;
    private final double n7;
    private final double n8;
    private final double n9;
    private final double n10;
    private final double lowestPressure;

    If97Saturation(CoefficientTable table) {
        n1 = table.coefficient(0);
        n2 = table.coefficient(1);
        n3 = table.coefficient(2);
        n4 = table.coefficient(3);
        n5 = table.coefficient(4);
        n6 = table.coefficient(5);
        n7 = table.coefficient(6);
        n8 = table.coefficient(7);
        n9 = table.coefficient(8);
        n10 = table.coefficient(9);
        lowestPressure = pressure(LOWEST_TEMPERATURE_K);
    }

    @Override
    public double lowestTemperature() {
        return LOWEST_TEMPERATURE_K;
    }

    @Override
    public double lowestPressure() {
        return lowestPressure;
    }

    @Override
    public double criticalTemperature() {
        return CRITICAL_TEMPERATURE_K;
    }

    @Override
    public double criticalPressure() {
        return CRITICAL_PRESSURE_PA;
    }

    @Override
    public double pressure(double temperature) {
        final double theta = temperature + n9 / (temperature - n10);
        final double a = theta * theta + n1 * theta + n2;
        final double b = n3 * theta * theta + n4 * theta + n5;
        final double c = n6 * theta * theta + n7 * theta + n8;
        final double beta = 2 * c / (-b + Math.sqrt(b * b - 4 * a * c));
        return beta * beta * beta * beta * PASCAL_PER_MEGAPASCAL;
    }

    @Override
    public double temperature(double pressure) {
        final double square = Math.sqrt(pressure / PASCAL_PER_MEGAPASCAL);
        final double beta = Math.sqrt(square);
        final double e = square + n3 * beta + n6;
        final double f = n1 * square + n4 * beta + n7;
        final double g = n2 * square + n5 * beta + n8;
        final double d = 2 * g / (-f - Math.sqrt(f * f - 4 * e * g));
        final double sum = n10 + d;
        return (sum - Math.sqrt(sum * sum - 4 * (n9 + n10 * d))) / 2;
    }

    /** {@return dp/dT along the line in Pa/K, from the derivatives of equation 29} @param temperature temperature in K */
    @Override
    public double pressureByTemperature(double temperature) {
        final double distance = temperature - n10;
        final double theta = temperature + n9 / distance;
        final double thetaByTemperature = 1 - n9 / (distance * distance);
        final double beta = Math.sqrt(Math.sqrt(pressure(temperature) / PASCAL_PER_MEGAPASCAL));
        final double square = beta * beta;
        final double byTheta =
                2 * square * theta + n1 * square + 2 * n3 * beta * theta + n4 * beta + 2 * n6 * theta + n7;
        final double byBeta = 2 * beta * (theta * theta + n1 * theta + n2) + n3 * theta * theta + n4 * theta + n5;
        return -4 * square * beta * PASCAL_PER_MEGAPASCAL * byTheta * thetaByTemperature / byBeta;
    }
}
