package lostwork.plant.kernel;

/**
 * How the values of a slot are judged: a typical size, and the limits within which a solver looks.
 *
 * @param natural a typical value or step in the coherent SI unit, above 0
 * @param proportional whether the size of a change counts against the value itself, as for pressures, flows and powers,
 *     and not against the natural scale, as for temperatures and enthalpies, whose zero is arbitrary
 * @param lowest the lowest value to try
 * @param highest the highest value to try
 */
public record SlotScale(double natural, boolean proportional, double lowest, double highest) {
    /** The part of the natural scale below which a proportional value counts as small. */
    private static final double SMALL = 1e-3;

    /**
     * {@return the size against which a change of the value is judged}
     *
     * @param value the value
     */
    public double at(double value) {
        return proportional ? Math.max(Math.abs(value), SMALL * natural) : natural;
    }

    /**
     * {@return the value, moved between the limits when it lies outside}
     *
     * @param value the value
     */
    public double clamp(double value) {
        return Math.max(lowest, Math.min(highest, value));
    }
}
