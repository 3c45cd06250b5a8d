package lostwork.quantity;

/**
 * The dimension of a quantity as the exponents of its base quantities (ISO 80000-1, 6.5), with money added.
 *
 * @param length exponent of length, m
 * @param mass exponent of mass, kg
 * @param time exponent of time, s
 * @param temperature exponent of thermodynamic temperature, K
 * @param amount exponent of amount of substance, mol
 * @param money exponent of money
 */
public record Dimension(int length, int mass, int time, int temperature, int amount, int money) {
    /** The dimension of a plain number. */
    public static final Dimension ONE = new Dimension(0, 0, 0, 0, 0, 0);

    /**
     * {@return the dimension of a product}
     *
     * @param other the dimension of the other factor
     */
    public Dimension times(Dimension other) {
        return new Dimension(
                length + other.length,
                mass + other.mass,
                time + other.time,
                temperature + other.temperature,
                amount + other.amount,
                money + other.money);
    }

    /**
     * {@return the dimension of a quotient}
     *
     * @param other the dimension of the divisor
     */
    public Dimension dividedBy(Dimension other) {
        return new Dimension(
                length - other.length,
                mass - other.mass,
                time - other.time,
                temperature - other.temperature,
                amount - other.amount,
                money - other.money);
    }

    /** {@return the dimension in base units, such as {@code m^2 kg s^-3}; {@code 1} for a plain number} */
    @Override
    public String toString() {
        final StringBuilder text = new StringBuilder();
        append(text, "m", length);
        append(text, "kg", mass);
        append(text, "s", time);
        append(text, "K", temperature);
        append(text, "mol", amount);
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
