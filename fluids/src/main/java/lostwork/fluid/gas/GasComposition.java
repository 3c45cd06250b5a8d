package lostwork.fluid.gas;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import lostwork.quantity.MolarMass;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Ratio;

/**
 * What a gas consists of: species and their mole fractions, which sum to one.
 *
 * <p>Fractions that are meant to be complete must sum to 1 within 1e-6, the rounding of a printed analysis, and are then
 * scaled to sum to 1 exactly; {@link Builder#buildNormalised} scales any amounts. Species with fraction 0 are dropped.
 * The order is that of the entries.
 *
 * <pre>{@code
 * GasComposition.of(nitrogen(0.79), oxygen(0.21));
 * GasComposition.byMass().add(Species.N2, percent(77)).add(Species.O2, percent(23)).build();
 * }</pre>
 *
 * <p>Immutable and thread-safe.
 */
public final class GasComposition {
    /** How far the fractions of a complete analysis may sum from 1. */
    static final double SUM_TOLERANCE = 1e-6;

    private final List<Species> species;
    private final double[] fractions;
    private final double molarMass;

    private GasComposition(List<Species> species, double[] fractions) {
        this.species = List.copyOf(species);
        this.fractions = fractions;
        double mass = 0;
        for (int i = 0; i < fractions.length; i++) {
            mass += fractions[i] * species.get(i).molarMassKilogramPerMole();
        }
        molarMass = mass;
    }

    /**
     * {@return a composition from mole fractions}
     *
     * @param parts the shares of the species, each species once, summing to 1 within 1e-6
     * @throws IllegalArgumentException if a species occurs twice or is not a gas, or the sum is off
     */
    public static GasComposition of(MoleFraction... parts) {
        final Builder builder = byMole();
        for (MoleFraction part : parts) {
            builder.add(part.species(), part.fraction());
        }
        return builder.build();
    }

    /**
     * {@return the composition of a pure gas}
     *
     * @param species the species, a gas
     * @throws IllegalArgumentException if the species is not a gas
     */
    public static GasComposition pure(Species species) {
        return byMole().add(species, 1).build();
    }

    /** {@return a builder that takes mole fractions} */
    public static Builder byMole() {
        return new Builder(false);
    }

    /** {@return a builder that takes mass fractions} */
    public static Builder byMass() {
        return new Builder(true);
    }

    /** {@return the species, those with a fraction above 0, in the order of the entries} */
    public List<Species> species() {
        return species;
    }

    /**
     * {@return the share of a species in the moles; 0 if it is absent}
     *
     * @param wanted the species
     */
    public Ratio moleFraction(Species wanted) {
        return Ratio.fraction(fraction(wanted));
    }

    /**
     * {@return the share of a species in the mass; 0 if it is absent}
     *
     * @param wanted the species
     */
    public Ratio massFraction(Species wanted) {
        return Ratio.fraction(fraction(wanted) * wanted.molarMassKilogramPerMole() / molarMass);
    }

    /** {@return the mean molar mass} */
    public MolarMass molarMass() {
        return MolarMass.kilogramsPerMole(molarMass);
    }

    /**
     * {@return the composition that remains when one species is taken out, such as the dry gas without its water}
     *
     * @param removed the species to take out
     * @throws IllegalArgumentException if nothing remains
     */
    public GasComposition without(Species removed) {
        final Builder builder = byMole();
        for (int i = 0; i < fractions.length; i++) {
            if (species.get(i) != removed) {
                builder.add(species.get(i), fractions[i]);
            }
        }
        return builder.buildNormalised();
    }

    /**
     * {@return the composition in which one species has a share of the moles, the others keeping their proportions, such as
     * the wet gas from a dry analysis and its water}
     *
     * @param added the species, present or not
     * @param share its mole fraction in the result, 0 to less than 1
     * @throws OutOfRangeException if the share is outside 0 to 1
     * @throws IllegalArgumentException if nothing else remains
     */
    public GasComposition with(Species added, Ratio share) {
        final double x = MoleFraction.of(added, share.si()).fraction();
        final GasComposition others = without(added);
        final Builder builder = byMole();
        for (int i = 0; i < others.fractions.length; i++) {
            builder.add(others.species.get(i), others.fractions[i] * (1 - x));
        }
        return builder.add(added, x).buildNormalised();
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof GasComposition that
                && species.equals(that.species)
                && java.util.Arrays.equals(fractions, that.fractions);
    }

    @Override
    public int hashCode() {
        return 31 * species.hashCode() + java.util.Arrays.hashCode(fractions);
    }

    /** {@return species and mole fractions in one line, such as {@code N2 0.7900, O2 0.2100}} */
    @Override
    public String toString() {
        final List<String> words = new ArrayList<>();
        for (int i = 0; i < fractions.length; i++) {
            words.add(String.format(
                    Locale.ROOT,
                    fractions[i] >= 1e-3 ? "%s %.4f" : "%s %.3g",
                    species.get(i).name(),
                    fractions[i]));
        }
        return String.join(", ", words);
    }

    double fraction(Species wanted) {
        for (int i = 0; i < fractions.length; i++) {
            if (species.get(i) == wanted) {
                return fractions[i];
            }
        }
        return 0;
    }

    double fraction(int i) {
        return fractions[i];
    }

    double molarMassKilogramPerMole() {
        return molarMass;
    }

    /** Collects the shares of a composition; not thread-safe. */
    public static final class Builder {
        private final Map<Species, Double> shares = new LinkedHashMap<>();
        private final boolean mass;

        private Builder(boolean mass) {
            this.mass = mass;
        }

        /**
         * Adds a species.
         *
         * @param species the species, a gas, not added before
         * @param share its share, not negative
         * @return this builder
         * @throws IllegalArgumentException if the species was added before or is not a gas, or the share is negative
         */
        public Builder add(Species species, Ratio share) {
            return add(species, share.si());
        }

        Builder add(Species species, double share) {
            if (species.aggregation() != Species.Aggregation.GAS) {
                throw new IllegalArgumentException(species.name() + " (" + species.description()
                        + ") is no gas and cannot be part of an ideal gas mixture");
            }
            if (!(share >= 0 && share < Double.POSITIVE_INFINITY)) {
                throw new OutOfRangeException(
                        "share of " + species.name(),
                        share,
                        0,
                        Double.MAX_VALUE,
                        "1",
                        "a share of a mixture is not negative",
                        "");
            }
            if (shares.put(species, share) != null) {
                throw new IllegalArgumentException(species.name() + " is given twice; add its shares first");
            }
            return this;
        }

        /**
         * {@return the composition, whose shares sum to 1}
         *
         * @throws IllegalArgumentException if the shares do not sum to 1 within 1e-6
         */
        public GasComposition build() {
            final double sum = sum();
            if (!(Math.abs(sum - 1) <= SUM_TOLERANCE)) {
                throw new IllegalArgumentException(String.format(
                        Locale.ROOT,
                        "the shares of %s sum to %s, not to 1 within %s; complete the analysis, or scale it with"
                                + " buildNormalised()",
                        Species.names(List.copyOf(shares.keySet())),
                        sum,
                        SUM_TOLERANCE));
            }
            return buildNormalised();
        }

        /**
         * {@return the composition, with the shares scaled to sum to 1}
         *
         * @throws IllegalArgumentException if the shares sum to 0
         */
        public GasComposition buildNormalised() {
            if (!(sum() > 0)) {
                throw new IllegalArgumentException("a composition needs a species with a share above 0");
            }
            final List<Species> present = new ArrayList<>();
            final double[] moles = new double[shares.size()];
            double total = 0;
            for (Map.Entry<Species, Double> entry : shares.entrySet()) {
                if (entry.getValue() > 0) {
                    final Species one = entry.getKey();
                    final double amount = mass ? entry.getValue() / one.molarMassKilogramPerMole() : entry.getValue();
                    moles[present.size()] = amount;
                    present.add(one);
                    total += amount;
                }
            }
            final double[] fractions = new double[present.size()];
            for (int i = 0; i < fractions.length; i++) {
                fractions[i] = moles[i] / total;
            }
            return new GasComposition(present, fractions);
        }

        private double sum() {
            double sum = 0;
            for (double share : shares.values()) {
                sum += share;
            }
            return sum;
        }
    }
}
