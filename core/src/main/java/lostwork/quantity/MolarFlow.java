package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An amount of substance per time.
 *
 * <p>SI unit mol/s. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class MolarFlow extends LinearQuantity<MolarFlow> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MolarFlow, MolarFlow> KIND = QuantityKind.linear(
                    "molar flow",
                    MolarFlow.class,
                    Dimension.AMOUNT.dividedBy(Dimension.TIME),
                    MolarFlow::new,
                    10,
                    List.of(Units.MOLE_PER_SECOND, Units.KILOMOLE_PER_HOUR))
            .withHints(NormalVolumeUnit.hints());

    private MolarFlow(double si) {
        super(si, KIND);
    }

    private MolarFlow(double value, Unit<MolarFlow> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a molar flow in moles per second}
     *
     * @param value the number of moles per second
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MolarFlow molesPerSecond(double value) {
        return new MolarFlow(value);
    }

    /**
     * {@return a molar flow in kilomoles per hour}
     *
     * @param value the number of kilomoles per hour
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MolarFlow kilomolesPerHour(double value) {
        return new MolarFlow(value, Units.KILOMOLE_PER_HOUR);
    }

    /**
     * {@return a molar flow from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarFlow of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the molar flow that a text states, such as {@code "12.5 mol/s"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarFlow parse(String text) {
        return KIND.parse(text);
    }

    /**
     * {@return the molar flow that a text states, in moles such as {@code "3 kmol/h"} or as the volume flow of an ideal
     * gas at a normal condition such as {@code "12000 Nm³/h"}}
     *
     * @param text a number with a decimal point, then a unit; a volume is marked with {@code N} or {@code S}
     * @param condition the condition that a volume is counted at; {@code N} is refused for
     *     {@link NormalCondition#ISO_13443} and {@code S} for {@link NormalCondition#DIN_1343}
     * @throws UnreadableQuantityException if the text is not read, or its mark contradicts the condition
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarFlow parse(String text, NormalCondition condition) {
        final QuantityText.Split split = QuantityText.split(text, KIND);
        final Unit<VolumeFlow> unit = NormalVolumeUnit.find(text, split.unit(), condition);
        return unit == null
                ? KIND.parse(text)
                : new MolarFlow(
                        unit.toSi(split.number()) / condition.molarVolume().si());
    }

    /** {@return the value in moles per second} */
    public double inMolesPerSecond() {
        return si();
    }

    /** {@return the value in kilomoles per hour} */
    public double inKilomolesPerHour() {
        return Units.KILOMOLE_PER_HOUR.fromSi(si());
    }

    /**
     * {@return this molar flow times a molar mass}
     *
     * @param molarMass the other factor
     */
    public MassFlow times(MolarMass molarMass) {
        return MassFlow.kilogramsPerSecond(si() * molarMass.si());
    }

    /**
     * {@return this molar flow times a molar energy}
     *
     * @param molarEnergy the other factor
     */
    public Power times(MolarEnergy molarEnergy) {
        return Power.watts(si() * molarEnergy.si());
    }

    /**
     * {@return this molar flow times a molar entropy}
     *
     * @param molarEntropy the other factor
     */
    public EntropyRate times(MolarEntropy molarEntropy) {
        return EntropyRate.wattsPerKelvin(si() * molarEntropy.si());
    }

    /**
     * {@return this molar flow times a molar volume}
     *
     * @param molarVolume the other factor
     */
    public VolumeFlow times(MolarVolume molarVolume) {
        return VolumeFlow.cubicMetresPerSecond(si() * molarVolume.si());
    }

    /**
     * {@return this molar flow times a duration}
     *
     * @param duration the other factor
     */
    public AmountOfSubstance times(Duration duration) {
        return AmountOfSubstance.moles(si() * duration.si());
    }

    /**
     * {@return the molar flow of an ideal gas from its volume flow counted at a normal condition}
     *
     * @param value volume flow in cubic metres per hour at the normal condition
     * @param condition the temperature and pressure that the volume is counted at
     */
    public static MolarFlow normalCubicMetresPerHour(double value, NormalCondition condition) {
        return new MolarFlow(value / 3600 / condition.molarVolume().si());
    }

    /**
     * {@return the volume flow of an ideal gas in cubic metres per hour, counted at a normal condition}
     *
     * @param condition the temperature and pressure that the volume is counted at
     */
    public double inNormalCubicMetresPerHour(NormalCondition condition) {
        return si() * condition.molarVolume().si() * 3600;
    }

    /**
     * {@return this molar flow times a molar heat capacity}
     *
     * @param molarHeatCapacity the other factor
     */
    public HeatCapacityRate times(MolarHeatCapacity molarHeatCapacity) {
        return HeatCapacityRate.wattsPerKelvin(si() * molarHeatCapacity.si());
    }

    @Override
    public QuantityKind<MolarFlow, MolarFlow> kind() {
        return KIND;
    }

    @Override
    protected MolarFlow with(double si) {
        return new MolarFlow(si);
    }
}
