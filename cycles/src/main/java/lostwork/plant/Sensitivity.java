package lostwork.plant;

import lostwork.quantity.Unit;

/**
 * The derivative of one value of a solution with respect to a given one.
 *
 * @param of the value that changes
 * @param to the given value that is changed
 * @param si the derivative, both in coherent SI units
 */
public record Sensitivity(Variable<?> of, Variable<?> to, double si) {
    /**
     * {@return the derivative in other units: how many of the first for one of the second}
     *
     * @param unit a unit of the value that changes
     * @param per a unit of the given value
     */
    public double in(Unit<?> unit, Unit<?> per) {
        return si * per.factor() / unit.factor();
    }

    /** {@return the derivative in the display units of both} */
    @Override
    public String toString() {
        final Unit<?> unit = of.kind().displayUnit();
        final Unit<?> per = to.kind().displayUnit();
        return "d(" + of + ")/d(" + to + ") = " + (float) in(unit, per) + " " + unit.symbol() + " per " + per.symbol();
    }
}
