package lostwork.quantity;

/**
 * The dimension of a quantity: the exponents of the seven base quantities of the SI (ISO 80000-1:2009, 3.7; VIM 3rd
 * edition, 1.7), with money as an eighth.
 *
 * <p>Dimensions are built from the constants: {@code MASS.dividedBy(TIME)} is the dimension of a mass flow. Two kinds of
 * quantity may share a dimension and still be different kinds: an entropy rate is no conductance. Immutable and
 * thread-safe.
 */
public final class Dimension {
    /** The dimension of a plain number. */
    public static final Dimension ONE = new Dimension(0, 0, 0, 0, 0, 0, 0, 0);
    /** Length, in m. */
    public static final Dimension LENGTH = new Dimension(1, 0, 0, 0, 0, 0, 0, 0);
    /** Mass, in kg. */
    public static final Dimension MASS = new Dimension(0, 1, 0, 0, 0, 0, 0, 0);
    /** Time, in s. */
    public static final Dimension TIME = new Dimension(0, 0, 1, 0, 0, 0, 0, 0);
    /** Electric current, in A. */
    public static final Dimension ELECTRIC_CURRENT = new Dimension(0, 0, 0, 1, 0, 0, 0, 0);
    /** Thermodynamic temperature, in K. */
    public static final Dimension TEMPERATURE = new Dimension(0, 0, 0, 0, 1, 0, 0, 0);
    /** Amount of substance, in mol. */
    public static final Dimension AMOUNT = new Dimension(0, 0, 0, 0, 0, 1, 0, 0);
    /** Luminous intensity, in cd. */
    public static final Dimension LUMINOUS_INTENSITY = new Dimension(0, 0, 0, 0, 0, 0, 1, 0);
    /** Money, in the one currency that the caller uses; outside the SI. */
    public static final Dimension MONEY = new Dimension(0, 0, 0, 0, 0, 0, 0, 1);

    private final int length;
    private final int mass;
    private final int time;
    private final int electricCurrent;
    private final int temperature;
    private final int amount;
    private final int luminousIntensity;
    private final int money;

    private Dimension(
            int length,
            int mass,
            int time,
            int electricCurrent,
            int temperature,
            int amount,
            int luminousIntensity,
            int money) {
        this.length = length;
        this.mass = mass;
        this.time = time;
        this.electricCurrent = electricCurrent;
        this.temperature = temperature;
        this.amount = amount;
        this.luminousIntensity = luminousIntensity;
        this.money = money;
    }

    /** {@return the exponent of length} */
    public int length() {
        return length;
    }

    /** {@return the exponent of mass} */
    public int mass() {
        return mass;
    }

    /** {@return the exponent of time} */
    public int time() {
        return time;
    }

    /** {@return the exponent of electric current} */
    public int electricCurrent() {
        return electricCurrent;
    }

    /** {@return the exponent of thermodynamic temperature} */
    public int temperature() {
        return temperature;
    }

    /** {@return the exponent of amount of substance} */
    public int amount() {
        return amount;
    }

    /** {@return the exponent of luminous intensity} */
    public int luminousIntensity() {
        return luminousIntensity;
    }

    /** {@return the exponent of money} */
    public int money() {
        return money;
    }

    /**
     * {@return the dimension of a product}
     *
     * @param other the dimension of the other factor
     */
    public Dimension times(Dimension other) {
        return plus(other, 1);
    }

    /**
     * {@return the dimension of a quotient}
     *
     * @param other the dimension of the divisor
     */
    public Dimension dividedBy(Dimension other) {
        return plus(other, -1);
    }

    /**
     * {@return the dimension of a power of a quantity}
     *
     * @param exponent the exponent, of either sign
     */
    public Dimension pow(int exponent) {
        return ONE.plus(this, exponent);
    }

    private Dimension plus(Dimension other, int count) {
        return new Dimension(
                length + count * other.length,
                mass + count * other.mass,
                time + count * other.time,
                electricCurrent + count * other.electricCurrent,
                temperature + count * other.temperature,
                amount + count * other.amount,
                luminousIntensity + count * other.luminousIntensity,
                money + count * other.money);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Dimension d
                && length == d.length
                && mass == d.mass
                && time == d.time
                && electricCurrent == d.electricCurrent
                && temperature == d.temperature
                && amount == d.amount
                && luminousIntensity == d.luminousIntensity
                && money == d.money;
    }

    @Override
    public int hashCode() {
        int hash = length;
        hash = 31 * hash + mass;
        hash = 31 * hash + time;
        hash = 31 * hash + electricCurrent;
        hash = 31 * hash + temperature;
        hash = 31 * hash + amount;
        hash = 31 * hash + luminousIntensity;
        return 31 * hash + money;
    }

    /** {@return the dimension in base units, such as {@code m^2 kg s^-3}; {@code 1} for a plain number} */
    @Override
    public String toString() {
        final StringBuilder text = new StringBuilder();
        append(text, "m", length);
        append(text, "kg", mass);
        append(text, "s", time);
        append(text, "A", electricCurrent);
        append(text, "K", temperature);
        append(text, "mol", amount);
        append(text, "cd", luminousIntensity);
        append(text, "¤", money);
        return text.length() == 0 ? "1" : text.toString();
    }

    private static void append(StringBuilder text, String unit, int exponent) {
        if (exponent != 0) {
            text.append(text.length() == 0 ? "" : " ").append(unit);
            if (exponent != 1) {
                text.append('^').append(exponent);
            }
        }
    }
}
