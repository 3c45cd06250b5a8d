package lostwork.exergy;

import java.io.Serializable;
import java.util.Collections;
import java.util.EnumMap;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.StringJoiner;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Ratio;

/**
 * What an atmosphere consists of, as mole fractions that add up to 1.
 *
 * <h2>Example</h2>
 * <pre>{@code
 * var dry = AirComposition.szargut1988().dry().with(AtmosphericGas.CARBON_DIOXIDE, Ratio.partsPerMillion(420));
 * dry.moleFraction(AtmosphericGas.OXYGEN).inPercent();
 * }</pre>
 *
 * <p>Immutable, thread-safe and serializable.
 */
public final class AirComposition implements Serializable {
    private static final long serialVersionUID = 1L;

    /** How far the mole fractions that a caller gives may miss a sum of 1; the rest is scaled away. */
    private static final double SUM_TOLERANCE = 1e-3;

    /** Mole fractions above 0, adding up to 1. */
    private final transient EnumMap<AtmosphericGas, Double> fractions;

    private AirComposition(Map<AtmosphericGas, Double> amounts) {
        fractions = new EnumMap<>(AtmosphericGas.class);
        double sum = 0;
        for (final double amount : amounts.values()) {
            sum += amount;
        }
        for (final Map.Entry<AtmosphericGas, Double> entry : amounts.entrySet()) {
            if (entry.getValue() > 0) {
                fractions.put(entry.getKey(), entry.getValue() / sum);
            }
        }
    }

    /**
     * {@return the atmosphere with the mean composition that Szargut's tables of standard chemical exergy refer to, its
     * water vapour included}
     *
     * <p>The partial pressures of the source do not add up to the standard pressure; here they are scaled to add up to 1.
     * Source: J. Szargut, D. R. Morris, F. R. Steward, Exergy Analysis of Thermal, Chemical and Metallurgical Processes,
     * Hemisphere 1988; the figures with their provenance stand in the resource {@code reference-atmosphere.tsv}.
     */
    public static AirComposition szargut1988() {
        return new AirComposition(AtmosphereTable.read("reference-atmosphere.tsv"));
    }

    /**
     * {@return dry air near sea level}
     *
     * <p>Source: U.S. Standard Atmosphere, 1976, table 3, from memory; 314 ppm carbon dioxide, as in that year. The figures
     * stand in the resource {@code standard-atmosphere-1976.tsv}.
     */
    public static AirComposition standardAtmosphere1976() {
        return new AirComposition(AtmosphereTable.read("standard-atmosphere-1976.tsv"));
    }

    /**
     * {@return a composition from its mole fractions}
     *
     * @param moleFractions the share of each gas, 0 or above; together 1 within 0.001, and scaled to be 1
     * @throws OutOfRangeException if a share is negative or the shares do not add up to 1
     */
    public static AirComposition of(Map<AtmosphericGas, Ratio> moleFractions) {
        final Map<AtmosphericGas, Double> amounts = new EnumMap<>(AtmosphericGas.class);
        double sum = 0;
        for (final Map.Entry<AtmosphericGas, Ratio> entry : moleFractions.entrySet()) {
            final double share = requireShare(entry.getKey(), entry.getValue());
            amounts.put(entry.getKey(), share);
            sum += share;
        }
        if (!(Math.abs(sum - 1) <= SUM_TOLERANCE)) {
            throw new OutOfRangeException(
                    "sum of mole fractions",
                    sum,
                    1 - SUM_TOLERANCE,
                    1 + SUM_TOLERANCE,
                    "mol/mol",
                    "composition of an atmosphere",
                    "give the share of every gas, as parts of the whole");
        }
        return new AirComposition(amounts);
    }

    private static double requireShare(AtmosphericGas gas, Ratio share) {
        if (!(share.si() >= 0 && share.si() <= 1)) {
            throw new OutOfRangeException(
                    "mole fraction of " + gas.formula(), share.si(), 0, 1, "mol/mol", "a part of the whole", "");
        }
        return share.si();
    }

    /**
     * {@return this atmosphere with another share of one gas, the other gases keeping their proportions}
     *
     * @param gas the gas
     * @param moleFraction its new share, 0 to 1
     * @throws OutOfRangeException if the share is outside 0 to 1
     * @throws IllegalArgumentException if the gas is the only one here, so that nothing could fill the rest
     */
    public AirComposition with(AtmosphericGas gas, Ratio moleFraction) {
        final double share = requireShare(gas, moleFraction);
        final double others = 1 - fraction(gas);
        final EnumMap<AtmosphericGas, Double> amounts = new EnumMap<>(fractions);
        amounts.remove(gas);
        if (amounts.isEmpty() && share < 1) {
            throw new IllegalArgumentException("mole fraction of " + gas.formula() + " = " + share
                    + ": it is the only gas here, so its share is 1; compose the atmosphere with of(...)");
        }
        amounts.replaceAll((other, fraction) -> fraction / others * (1 - share));
        amounts.put(gas, share);
        return new AirComposition(amounts);
    }

    /**
     * {@return this atmosphere without its water vapour}
     *
     * @throws IllegalArgumentException if it consists of water vapour only
     */
    public AirComposition dry() {
        return fractions.containsKey(AtmosphericGas.WATER) ? with(AtmosphericGas.WATER, Ratio.fraction(0)) : this;
    }

    /**
     * {@return the share of a gas, 0 if it is not present}
     *
     * @param gas the gas
     */
    public Ratio moleFraction(AtmosphericGas gas) {
        return Ratio.fraction(fraction(gas));
    }

    /** {@return the gases that are present, in a fixed order; cannot be changed} */
    public Set<AtmosphericGas> gases() {
        return Collections.unmodifiableSet(fractions.keySet());
    }

    double fraction(AtmosphericGas gas) {
        return fractions.getOrDefault(gas, 0.0);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof AirComposition that && fractions.equals(that.fractions);
    }

    @Override
    public int hashCode() {
        return Objects.hashCode(fractions);
    }

    /** {@return the mole fractions by formula, such as {@code N2 0.78084, O2 0.20948}} */
    @Override
    public String toString() {
        final StringJoiner text = new StringJoiner(", ");
        fractions.forEach((gas, share) -> text.add(gas.formula() + " " + String.format(Locale.ROOT, "%.5g", share)));
        return text.toString();
    }

    /** {@return what is written to a stream} */
    private Object writeReplace() {
        return new Form(new EnumMap<>(fractions));
    }

    /**
     * The serial form; read back through the checks.
     *
     * @param fractions mole fractions
     */
    private record Form(EnumMap<AtmosphericGas, Double> fractions) implements Serializable {
        private static final long serialVersionUID = 1L;

        /** {@return the composition, checked} */
        private Object readResolve() {
            final Map<AtmosphericGas, Ratio> shares = new EnumMap<>(AtmosphericGas.class);
            fractions.forEach((gas, share) -> shares.put(gas, Ratio.fraction(share)));
            of(shares);
            return new AirComposition(fractions);
        }
    }
}
