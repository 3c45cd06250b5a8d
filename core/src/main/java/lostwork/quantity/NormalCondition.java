package lostwork.quantity;

import java.io.Serializable;

/**
 * The temperature and pressure at which a "normal" or "standard" gas volume is counted.
 *
 * <p>There is no single one: a normal cubic metre by DIN 1343 holds 5.5 % more gas than a standard cubic metre by
 * ISO 13443, so a volume counted this way is only read with its condition. Others than the two constants are made with
 * {@link #of}. Immutable and thread-safe.
 */
public final class NormalCondition implements Serializable {
    private static final long serialVersionUID = 1L;

    /** Molar gas constant, exact: 8.31446261815324 J/(mol K) (SI Brochure, 9th edition). */
    private static final double MOLAR_GAS_CONSTANT = 8.31446261815324;

    /** 0 °C and 101.325 kPa (DIN 1343), often marked Nm³. */
    public static final NormalCondition DIN_1343 =
            new NormalCondition("DIN 1343", Temperature.kelvin(273.15), Pressure.pascal(101325));

    /** 15 °C and 101.325 kPa (ISO 13443), often marked Sm³. */
    public static final NormalCondition ISO_13443 =
            new NormalCondition("ISO 13443", Temperature.kelvin(288.15), Pressure.pascal(101325));

    /** What it is called. */
    private final String name;
    /** The temperature of the counted gas. */
    private final Temperature temperature;
    /** The pressure of the counted gas. */
    private final Pressure pressure;

    private NormalCondition(String name, Temperature temperature, Pressure pressure) {
        if (!(pressure.si() > 0)) {
            throw OutOfRangeException.ofKind(
                    "pressure of the condition " + name,
                    pressure.inBar(),
                    0,
                    "bar",
                    "a gas at no pressure has no volume",
                    "is not allowed: it must be above 0 bar",
                    "");
        }
        this.name = name;
        this.temperature = temperature;
        this.pressure = pressure;
    }

    /**
     * {@return a condition by agreement, such as 20 °C and 1 bar for compressed air}
     *
     * @param name what it is called, such as the standard or contract that sets it
     * @param temperature the temperature of the counted gas
     * @param pressure the absolute pressure of the counted gas, above 0
     * @throws OutOfRangeException if the pressure is 0
     */
    public static NormalCondition of(String name, Temperature temperature, Pressure pressure) {
        return new NormalCondition(name, temperature, pressure);
    }

    /** {@return what it is called} */
    public String name() {
        return name;
    }

    /** {@return the temperature} */
    public Temperature temperature() {
        return temperature;
    }

    /** {@return the absolute pressure} */
    public Pressure pressure() {
        return pressure;
    }

    /** {@return the volume of one mole of an ideal gas at this condition: R T/p} */
    public MolarVolume molarVolume() {
        return MolarVolume.cubicMetresPerMole(MOLAR_GAS_CONSTANT * temperature.si() / pressure.si());
    }

    /** {@return whether another object is a condition of the same temperature and pressure, by whatever name} */
    @Override
    public boolean equals(Object other) {
        return other instanceof NormalCondition that
                && temperature.equals(that.temperature)
                && pressure.equals(that.pressure);
    }

    @Override
    public int hashCode() {
        return 31 * temperature.hashCode() + pressure.hashCode();
    }

    /** {@return the name with temperature and pressure, such as {@code DIN 1343 (0 °C, 1.01325 bar)}} */
    @Override
    public String toString() {
        return name + " (" + temperature + ", " + pressure + ")";
    }
}
