package lostwork.fluid.water;

/**
 * An explicit equation for a start value or a boundary: y = y* [Σ n x<sub>1</sub><sup>I</sup> x<sub>2</sub><sup>J</sup>]<sup>m</sup>,
 * or y* exp(Σ ...).
 *
 * <p>The arguments follow from the properties as the table says. Quantities in SI.
 */
final class BackwardEquation {
    private final PowerSum sum;
    private final boolean quarterPowers;
    private final boolean inverse;
    private final double firstScale;
    private final double firstOffset;
    private final double secondScale;
    private final double secondOffset;
    private final double reference;
    private final double power;

    private BackwardEquation(CoefficientTable table) {
        quarterPowers = table.firstParts() == 4;
        sum = PowerSum.of(table, table.firstParts());
        inverse = table.argument(0).quantity().startsWith("1/");
        firstScale = table.argument(0).scale();
        firstOffset = table.argument(0).offset();
        secondScale = table.argument(1).scale();
        secondOffset = table.argument(1).offset();
        reference = table.result().reference();
        power = table.result().power();
    }

    /** {@return an equation} @param name its file in the folder of the formulation, without the ending */
    static BackwardEquation read(String name) {
        return new BackwardEquation(CoefficientTable.read("if97/" + name + ".txt"));
    }

    private double sum(double first, double second, Workspace w) {
        double x = inverse ? firstScale / first + firstOffset : firstScale * first + firstOffset;
        if (quarterPowers) {
            x = Math.sqrt(Math.sqrt(x));
        }
        return sum.value(x, secondScale * second + secondOffset, w);
    }

    /** {@return the result in SI} @param first in SI @param second in SI @param w the room of this thread */
    double value(double first, double second, Workspace w) {
        final double y = sum(first, second, w);
        if (power == 1) {
            return reference * y;
        }
        if (power == 4) {
            final double square = y * y;
            return reference * (square * square);
        }
        return reference * (power == 0 ? Math.exp(y) : Math.pow(y, power));
    }
}
