package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An absolute pressure: a point on a scale that starts at vacuum. Gauge pressures enter and leave with the atmosphere
 * that they are counted from.
 *
 * <p>SI unit Pa. Never below 0 Pa. Immutable and thread-safe.
 */
public final class Pressure extends ScalarQuantity<Pressure, PressureDifference> {
    private static final long serialVersionUID = 1L;

    private static final List<Unit<Pressure>> UNITS = List.of(
            Units.BAR,
            Units.PASCAL,
            Units.KILOPASCAL,
            Units.MEGAPASCAL,
            Units.MILLIBAR,
            Units.ATMOSPHERE,
            Units.TECHNICAL_ATMOSPHERE,
            Units.TORR,
            Units.MILLIMETRE_OF_MERCURY,
            Units.PSI);

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Pressure, PressureDifference> KIND = QuantityKind.point(
                    "pressure", Pressure.class, Pressure::new, 0, 1e5, PressureDifference.KIND, UNITS)
            .withLimit("vacuum", "for a gauge pressure use barGauge(value, atmosphere) or its relatives")
            .withHints(GaugeUnit.hints(UNITS));

    private Pressure(double si) {
        super(si, KIND);
    }

    private Pressure(double value, Unit<Pressure> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a pressure in bar}
     *
     * @param value the number of bar
     * @throws OutOfRangeException if the value is NaN, infinite or below zero
     */
    public static Pressure bar(double value) {
        return new Pressure(value, Units.BAR);
    }

    /**
     * {@return a pressure in pascal}
     *
     * @param value the number of pascal
     * @throws OutOfRangeException if the value is NaN, infinite or below zero
     */
    public static Pressure pascal(double value) {
        return new Pressure(value);
    }

    /**
     * {@return a pressure in kilopascal}
     *
     * @param value the number of kilopascal
     * @throws OutOfRangeException if the value is NaN, infinite or below zero
     */
    public static Pressure kilopascal(double value) {
        return new Pressure(value, Units.KILOPASCAL);
    }

    /**
     * {@return a pressure in megapascal}
     *
     * @param value the number of megapascal
     * @throws OutOfRangeException if the value is NaN, infinite or below zero
     */
    public static Pressure megapascal(double value) {
        return new Pressure(value, Units.MEGAPASCAL);
    }

    /**
     * {@return a pressure in millibar}
     *
     * @param value the number of millibar
     * @throws OutOfRangeException if the value is NaN, infinite or below zero
     */
    public static Pressure mbar(double value) {
        return new Pressure(value, Units.MILLIBAR);
    }

    /**
     * {@return a pressure in standard atmospheres}
     *
     * @param value the number of standard atmospheres
     * @throws OutOfRangeException if the value is NaN, infinite or below zero
     */
    public static Pressure atm(double value) {
        return new Pressure(value, Units.ATMOSPHERE);
    }

    /**
     * {@return a pressure in pounds-force per square inch}
     *
     * @param value the number of pounds-force per square inch
     * @throws OutOfRangeException if the value is NaN, infinite or below zero
     */
    public static Pressure psi(double value) {
        return new Pressure(value, Units.PSI);
    }

    /**
     * {@return a pressure from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Pressure of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the pressure that a text states, such as {@code "3.5 bar"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Pressure parse(String text) {
        return KIND.parse(text);
    }

    /**
     * {@return the absolute pressure that a text states, absolute such as {@code "3.5 bar"} or gauge such as
     * {@code "4 bar(g)"}}
     *
     * @param text a number with a decimal point, then a unit, for a gauge pressure followed by {@code (g)}, {@code g} or
     *     {@code gauge}
     * @param atmosphere the absolute pressure that a gauge pressure is counted from
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Pressure parse(String text, Pressure atmosphere) {
        final QuantityText.Split split = QuantityText.split(text, KIND);
        final Unit<Pressure> unit = GaugeUnit.find(split.unit());
        return unit == null ? KIND.parse(text) : gauge(split.number(), unit, atmosphere);
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
     * @throws OutOfRangeException if the result does not exist
     */
    public Pressure plus(PressureDifference difference) {
        return new Pressure(si() + difference.si());
    }

    /**
     * {@return a value that lies below this one}
     *
     * @param difference how far
     * @throws OutOfRangeException if the result does not exist
     */
    public Pressure minus(PressureDifference difference) {
        return new Pressure(si() - difference.si());
    }

    /**
     * {@return the absolute pressure of a gauge pressure in bar}
     *
     * @param value the gauge pressure in bar, negative below the atmosphere
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     * @throws OutOfRangeException if the value is NaN, infinite or further below the atmosphere than vacuum
     */
    public static Pressure barGauge(double value, Pressure atmosphere) {
        return gauge(value, Units.BAR, atmosphere);
    }

    /**
     * {@return the absolute pressure of a gauge pressure in millibar}
     *
     * @param value the gauge pressure in millibar, negative below the atmosphere
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     * @throws OutOfRangeException if the value is NaN, infinite or further below the atmosphere than vacuum
     */
    public static Pressure mbarGauge(double value, Pressure atmosphere) {
        return gauge(value, Units.MILLIBAR, atmosphere);
    }

    /**
     * {@return the absolute pressure of a gauge pressure in kilopascal}
     *
     * @param value the gauge pressure in kilopascal, negative below the atmosphere
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     * @throws OutOfRangeException if the value is NaN, infinite or further below the atmosphere than vacuum
     */
    public static Pressure kilopascalGauge(double value, Pressure atmosphere) {
        return gauge(value, Units.KILOPASCAL, atmosphere);
    }

    /**
     * {@return the absolute pressure of a gauge pressure in megapascal}
     *
     * @param value the gauge pressure in megapascal, negative below the atmosphere
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     * @throws OutOfRangeException if the value is NaN, infinite or further below the atmosphere than vacuum
     */
    public static Pressure megapascalGauge(double value, Pressure atmosphere) {
        return gauge(value, Units.MEGAPASCAL, atmosphere);
    }

    /**
     * {@return the absolute pressure of a gauge pressure in pounds-force per square inch}
     *
     * @param value the gauge pressure in pounds-force per square inch, negative below the atmosphere
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     * @throws OutOfRangeException if the value is NaN, infinite or further below the atmosphere than vacuum
     */
    public static Pressure psiGauge(double value, Pressure atmosphere) {
        return gauge(value, Units.PSI, atmosphere);
    }

    private static Pressure gauge(double value, Unit<Pressure> unit, Pressure atmosphere) {
        final double si = unit.toSi(value) + atmosphere.si();
        if (!(si >= 0 && si <= Double.MAX_VALUE)) {
            final double lowest = unit.fromSi(-atmosphere.si());
            throw OutOfRangeException.ofKind(
                    "gauge pressure",
                    value,
                    lowest,
                    unit.symbol(),
                    "vacuum at an atmosphere of " + atmosphere.toString(),
                    "is not allowed: it must be finite and at least " + QuantityText.shortest(lowest) + " "
                            + unit.symbol(),
                    "check the atmosphere, or whether the pressure is an absolute one");
        }
        return new Pressure(si);
    }

    /**
     * {@return how far this pressure lies above the atmosphere, in bar}
     *
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     */
    public double inBarGauge(Pressure atmosphere) {
        return Units.BAR.fromSi(si() - atmosphere.si());
    }

    /**
     * {@return how far this pressure lies above the atmosphere, in millibar}
     *
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     */
    public double inMbarGauge(Pressure atmosphere) {
        return Units.MILLIBAR.fromSi(si() - atmosphere.si());
    }

    /**
     * {@return how far this pressure lies above the atmosphere, in kilopascal}
     *
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     */
    public double inKilopascalGauge(Pressure atmosphere) {
        return Units.KILOPASCAL.fromSi(si() - atmosphere.si());
    }

    /**
     * {@return how far this pressure lies above the atmosphere, in megapascal}
     *
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     */
    public double inMegapascalGauge(Pressure atmosphere) {
        return Units.MEGAPASCAL.fromSi(si() - atmosphere.si());
    }

    /**
     * {@return how far this pressure lies above the atmosphere, in pounds-force per square inch}
     *
     * @param atmosphere the absolute pressure of the atmosphere around the gauge
     */
    public double inPsiGauge(Pressure atmosphere) {
        return Units.PSI.fromSi(si() - atmosphere.si());
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
     * @throws OutOfRangeException if the divisor is zero
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

    /**
     * {@return this pressure times a molar volume}
     *
     * @param molarVolume the other factor
     */
    public MolarEnergy times(MolarVolume molarVolume) {
        return MolarEnergy.joulesPerMole(si() * molarVolume.si());
    }

    /**
     * {@return this pressure times a volume flow}
     *
     * @param volumeFlow the other factor
     */
    public Power times(VolumeFlow volumeFlow) {
        return Power.watts(si() * volumeFlow.si());
    }

    @Override
    public QuantityKind<Pressure, PressureDifference> kind() {
        return KIND;
    }
}
