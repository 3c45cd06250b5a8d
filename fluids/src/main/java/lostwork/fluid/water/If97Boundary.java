package lostwork.fluid.water;

/** The boundary between regions 2 and 3: R7-97(2012), equations 5 and 6; exact inverses of each other. */
final class If97Boundary {
    private static final double PASCAL_PER_MEGAPASCAL = 1e6;

    private final double n1;
    private final double n2;
    private final double n3;
    private final double n4;
    private final double n5;

    If97Boundary(CoefficientTable table) {
        n1 = table.coefficient(0);
        n2 = table.coefficient(1);
        n3 = table.coefficient(2);
        n4 = table.coefficient(3);
        n5 = table.coefficient(4);
    }

    /** {@return the pressure in Pa} @param temperature in K */
    double pressure(double temperature) {
        return (n1 + temperature * (n2 + temperature * n3)) * PASCAL_PER_MEGAPASCAL;
    }

    /** {@return the temperature in K} @param pressure in Pa */
    double temperature(double pressure) {
        return n4 + Math.sqrt((pressure / PASCAL_PER_MEGAPASCAL - n5) / n3);
    }
}
