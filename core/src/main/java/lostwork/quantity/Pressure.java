package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An absolute pressure: a point on a scale that starts at vacuum. Gauge pressures enter and leave with the atmosphere that they are counted from.
 *
 * <p>SI unit Pa. Never below 0 Pa. Immutable and thread-safe.
 */
public final class Pressure extends ScalarQuantity<Pressure, PressureDifference> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Pressure, PressureDifference> KIND = QuantityKind.point(
            "pressure",
            Pressure.class,
            Pressure::new,
            0,
            1e5,
            PressureDifference.KIND,
            List.of(
                    Units.BAR,
                    Units.PASCAL,
                    Units.KILOPASCAL,
                    Units.MEGAPASCAL,
                    Units.MILLIBAR,
                    Units.ATMOSPHERE,
                    Units.PSI));

    private Pressure(double si) {
        super(si, KIND);
    }

    /**
     * {@return a pressure}
     *
     * @param value pressure in bar
     * @throws IllegalArgumentException if the value is NaN, infinite or below zero
     */
    public static Pressure bar(double value) {
        return new Pressure(Units.BAR.toSi(value));
    }

    /**
     * {@return a pressure}
     *
     * @param value pressure in pascal
     * @throws IllegalArgumentException if the value is NaN, infinite or below zero
     */
    public static Pressure pascal(double value) {
        return new Pressure(value);
    }

    /**
     * {@return a pressure}
     *
     * @param value pressure in kilopascal
     * @throws IllegalArgumentException if the value is NaN, infinite or below zero
     */
    public static Pressure kilopascal(double value) {
        return new Pressure(Units.KILOPASCAL.toSi(value));
    }

    /**
     * {@return a pressure}
     *
     * @param value pressure in megapascal
     * @throws IllegalArgumentException if the value is NaN, infinite or below zero
     */
    public static Pressure megapascal(double value) {
        return new Pressure(Units.MEGAPASCAL.toSi(value));
    }

    /**
     * {@return a pressure}
     *
     * @param value pressure in millibar
     * @throws IllegalArgumentException if the value is NaN, infinite or below zero
     */
    public static Pressure mbar(double value) {
        return new Pressure(Units.MILLIBAR.toSi(value));
    }

    /**
     * {@return a pressure}
     *
     * @param value pressure in standard atmospheres
     * @throws IllegalArgumentException if the value is NaN, infinite or below zero
     */
    public static Pressure atm(double value) {
        return new Pressure(Units.ATMOSPHERE.toSi(value));
    }

    /**
     * {@return a pressure}
     *
     * @param value pressure in pounds-force per square inch
     * @throws IllegalArgumentException if the value is NaN, infinite or below zero
     */
    public static Pressure psi(double value) {
        return new Pressure(Units.PSI.toSi(value));
    }

    /**
     * {@return a pressure from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static Pressure of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the pressure that a text states, such as {@code "3.5 bar"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static Pressure parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in bar} */
    public double inBar() {
        return Units.BAR.fromSi(si());
    }

    /** {@return the value in pascal} */
    public double inPascal() {
        return si();
    }

    /** {@return the value in kilopascal} */
    public double inKilopascal() {
        return Units.KILOPASCAL.fromSi(si());
    }

    /** {@return the value in megapascal} */
    public double inMegapascal() {
        return Units.MEGAPASCAL.fromSi(si());
    }

    /** {@return the value in millibar} */
    public double inMbar() {
        return Units.MILLIBAR.fromSi(si());
    }

    /** {@return the value in standard atmospheres} */
    public double inAtm() {
        return Units.ATMOSPHERE.fromSi(si());
    }

    /** {@return the value in pounds-force per square inch} */
    public double inPsi() {
        return Units.PSI.fromSi(si());
    }

    /**
     * {@return the difference of this value and another}
     *
     * @param other the value that the difference is counted from
     */
    public PressureDifference minus(Pressure other) {
        return PressureDifference.pascals(si() - other.si());
    }

    /**
     * {@return a value that lies above this one}
     *
     * @param difference how far
     * @throws IllegalArgumentException if the result does not exist
     */
    public Pressure plus(PressureDifference difference) {
        return new Pressure(si() + difference.si());
    }

    /**
     * {@return a value that lies below this one}
     *
     * @param difference how far
     * @throws IllegalArgumentException if the result does not exist
     */
    public Pressure minus(PressureDifference difference) {
        return new Pressure(si() - difference.si());
    }

    /**
     * {@return an absolute pressure from a gauge pressure}
     *
     * @param value gauge pressure in bar, counted from the atmosphere
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     * @throws IllegalArgumentException if the sum is not an absolute pressure
     */
    public static Pressure barGauge(double value, Pressure atmosphere) {
        return new Pressure(value * 1e5 + atmosphere.si());
    }

    /**
     * {@return an absolute pressure from a gauge pressure}
     *
     * @param value gauge pressure in kilopascal, counted from the atmosphere
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     * @throws IllegalArgumentException if the sum is not an absolute pressure
     */
    public static Pressure kilopascalGauge(double value, Pressure atmosphere) {
        return new Pressure(value * 1e3 + atmosphere.si());
    }

    /**
     * {@return an absolute pressure from a gauge pressure}
     *
     * @param value gauge pressure in pounds-force per square inch, counted from the atmosphere
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     * @throws IllegalArgumentException if the sum is not an absolute pressure
     */
    public static Pressure psiGauge(double value, Pressure atmosphere) {
        return new Pressure(Units.PSI.toSi(value) + atmosphere.si());
    }

    /**
     * {@return how far this pressure lies above the atmosphere, in bar}
     *
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     */
    public double inBarGauge(Pressure atmosphere) {
        return (si() - atmosphere.si()) / 1e5;
    }

    /**
     * {@return the flow work p v of a mass at this pressure}
     *
     * @param volume the specific volume
     */
    public SpecificEnergy times(SpecificVolume volume) {
        return SpecificEnergy.joulesPerKilogram(si() * volume.si());
    }

    /**
     * {@return the work of displacing a volume at this pressure}
     *
     * @param volume the volume
     */
    public Energy times(Volume volume) {
        return Energy.joules(si() * volume.si());
    }

    /**
     * {@return how many times another absolute pressure goes into this one, the pressure ratio of a machine}
     *
     * @param other the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public Ratio over(Pressure other) {
        return Ratio.fraction(si() / other.si());
    }

    /**
     * {@return this pressure times a ratio}
     *
     * @param factor the ratio, not negative
     */
    public Pressure times(Ratio factor) {
        return new Pressure(si() * factor.si());
    }

    @Override
    public QuantityKind<Pressure, PressureDifference> kind() {
        return KIND;
    }
}
