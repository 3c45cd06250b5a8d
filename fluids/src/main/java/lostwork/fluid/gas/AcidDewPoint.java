package lostwork.fluid.gas;

import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Temperature;

/**
 * The temperature at which sulfuric acid condenses from flue gas.
 *
 * <h2>Formula</h2>
 * <p>1000/T = 2.276 − 0.0294 ln p(H2O) − 0.0858 ln p(SO3) + 0.0062 ln p(H2O) ln p(SO3), pressures in mmHg, T in K [1].
 *
 * <h2>Accuracy</h2>
 * <p>A correlation of measurements that scatter by several kelvins; the trioxide content is seldom known to better than a
 * factor of two, which is worth about 7 K.
 *
 * <p>[1] Verhoff, F.H., Banchero, J.T.: Predicting dew points of flue gases, Chem. Eng. Progress 70 (8) (1974) 71-72. A
 * reprint of the formula with 0.0082 as the last coefficient is a misprint: the worked example beside it uses 0.0062.
 */
public final class AcidDewPoint {
    /** Conventional millimetre of mercury in Pa. */
    private static final double MILLIMETRE_OF_MERCURY_PA = 133.322;

    private AcidDewPoint() {}

    /**
     * {@return the dew point of sulfuric acid}
     *
     * @param waterPressure partial pressure of water vapour, above 0
     * @param trioxidePressure partial pressure of sulfur trioxide, above 0
     * @throws OutOfRangeException if a partial pressure is 0
     */
    public static Temperature ofSulfuricAcid(Pressure waterPressure, Pressure trioxidePressure) {
        final double water = logarithm("partial pressure of water vapour", waterPressure);
        final double trioxide = logarithm("partial pressure of sulfur trioxide", trioxidePressure);
        return Temperature.kelvin(1000 / (2.276 - 0.0294 * water - 0.0858 * trioxide + 0.0062 * water * trioxide));
    }

    private static double logarithm(String name, Pressure pressure) {
        if (!(pressure.si() > 0)) {
            throw new OutOfRangeException(
                    name, pressure.si(), Double.MIN_VALUE, Double.MAX_VALUE, "Pa", "Verhoff and Banchero, 1974", "");
        }
        return Math.log(pressure.si() / MILLIMETRE_OF_MERCURY_PA);
    }
}
