package lostwork.examples.recovery;

import lostwork.quantity.PressureDifference;
import lostwork.quantity.Ratio;
import lostwork.quantity.ScalarQuantity;
import lostwork.quantity.Units;

/**
 * A value that an engineer chose.
 *
 * @param name what it is
 * @param value the value
 * @param basis where it comes from
 * @param <Q> its quantity
 */
public record Assumption<Q extends ScalarQuantity<Q, ?>>(String name, Q value, String basis) {
    /** {@return the value with the unit that engineers use for it} */
    public String text() {
        if (value instanceof Ratio ratio) {
            return ratio.format(Units.PERCENT, 3);
        }
        if (value instanceof PressureDifference difference) {
            return difference.format(Units.KILOPASCAL_DIFFERENCE, 3);
        }
        return value.toString();
    }
}
